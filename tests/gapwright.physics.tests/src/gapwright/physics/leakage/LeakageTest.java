package gapwright.physics.leakage;

import static gapwright.physics.material.BhCurve.MU_0;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;

import org.junit.jupiter.api.Test;

import gapwright.physics.leakage.IdealWindow.Rectangle;

class LeakageTest {

	private static final WindingPair PAIR = new WindingPair(0.003, 0.003, 0.0005, 0.030, 0.080, 1);

	/** N 20, h 30 mm, builds 3 + 3 mm, 0.5 mm between, mean turn 80 mm: energy method and Rogowski's factor by hand. */
	@Test
	void concentricWindingsHaveTheLeakageOfTheFieldBetweenThem() {
		assertEquals(0.93103, PAIR.rogowskiFactor(), 5e-6);
		assertEquals(3.1199e-6, PAIR.inductance(20), 5e-11);
	}

	@Test
	void leakageGrowsWithTheSquareOfTheTurnsAndFallsWithTheSquareOfTheInterfaces() {
		assertEquals(4 * PAIR.inductance(20), PAIR.inductance(40), 1e-18);
		WindingPair without = new WindingPair(0.003, 0.003, 0, 1, 0.080, 1);
		WindingPair interleaved = new WindingPair(0.003, 0.003, 0, 1, 0.080, 2);
		assertEquals(4, without.inductance(20) / interleaved.inductance(20) * interleaved.rogowskiFactor() / without.rogowskiFactor(), 1e-12);
	}

	/** Rogowski's factor tends to 1 for a winding that is long against its thickness. */
	@Test
	void aLongWindingHasAStraightField() {
		assertEquals(1, new WindingPair(0.001, 0.001, 0, 10, 0.080, 1).rogowskiFactor(), 1e-4);
		assertTrue(new WindingPair(0.001, 0.001, 0, 0.001, 0.080, 1).slenderness() < 1);
		assertThrows(IllegalArgumentException.class, () -> new WindingPair(0, 0.001, 0, 0.001, 0.080, 1));
	}

	private static double inWindow(double clearance) {
		double height = 0.030 + 2 * clearance;
		return IdealWindow.inductancePerMetre(0.0105, height, List.of(new Rectangle(0.002, clearance, 0.003, 0.030, 1),
				new Rectangle(0.0055, clearance, 0.003, 0.030, -1)));
	}

	/** Windings as high as the window have a straight field: µ₀/h·(a₁/3 + a₂/3 + d), exactly. */
	@Test
	void theSeriesGivesTheStraightFieldOfAFullWindow() {
		double straight = MU_0 / 0.030 * (0.003 / 3 + 0.003 / 3 + 0.0005);
		assertEquals(1, inWindow(0) / straight, 1e-5);
	}

	/** Two views of one field that share nothing: inside an iron window Rogowski's factor is good to a few per cent 2 mm off the walls. */
	@Test
	void rogowskisFactorIsGoodToAFewPerCentInAnIronWindow() {
		for (double clearance : new double[] { 0.001, 0.002, 0.005 }) {
			assertEquals(1, PAIR.inductance(1) / 0.080 / inWindow(clearance), 0.03);
		}
	}

	@Test
	void ampereTurnsThatDoNotBalanceAreRefused() {
		assertThrows(IllegalArgumentException.class,
				() -> IdealWindow.inductancePerMetre(0.02, 0.03, List.of(new Rectangle(0, 0, 0.01, 0.01, 1))));
	}

	/** A window of 30 mm by 9 mm, 15 mm deep: µ₀·0.03·0.015/0.009 = 62.83 nH across, the faces add to it. */
	@Test
	void facingLegsAreAPlateAirGapWithItsEdges() {
		WindowPath path = new WindowPath(0.030, 0.009, 0.015, 0);
		assertEquals(62.83e-9 + 2 * 0.26 * MU_0 * 0.030, path.permeance(), 5e-12);
		assertTrue(new WindowPath(0.030, 0.009, 0.015, 0.012).permeance() > path.permeance());
	}

	/** With MMF rising linearly from 0 to F along the legs: flux P·F/2 exactly, energy ½(P/3)F² but for 1/(2n²). */
	@Test
	void aLadderCarriesTheFluxAndAlmostTheEnergyOfALinearMmf() {
		WindowPath path = new WindowPath(0.030, 0.009, 0.015, 0.012);
		for (int n : new int[] { 1, 2, 4, 8 }) {
			double[] rungs = path.ladder(n);
			assertEquals(path.permeance(), Arrays.stream(rungs).sum(), 1e-18);
			double flux = 0;
			double energy = 0;
			for (int i = 0; i <= n; i++) {
				double mmf = (double) i / n;
				flux += rungs[i] * mmf;
				energy += 0.5 * rungs[i] * mmf * mmf;
			}
			assertEquals(path.permeance() / 2, flux, 1e-18);
			assertEquals(1 + 0.5 / (n * n), energy / (path.permeance() / 6), 1e-12);
		}
	}
}
