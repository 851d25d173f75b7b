package gapwright.physics.network;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;

import org.junit.jupiter.api.Test;

import gapwright.physics.gap.Fringing;
import gapwright.physics.gap.GapGeometry;
import gapwright.physics.gap.Section;
import gapwright.physics.material.BhCurve;
import gapwright.physics.material.KneeBh;
import gapwright.physics.material.LinearBh;

/** Networks whose answer is known in closed form or from print. */
class KnownAnswersTest {

	private static final BhCurve FERRITE = new KneeBh(2300, 0.569);

	/**
	 * Fitzgerald, Kingsley, Umans, Electric Machinery, ch. 1, first examples (figures from memory): core 9 cm², 30 cm,
	 * µr 70 000, gap 0.5 mm, 500 turns; at 1 T the print gives 3.79e3 and 4.42e5 1/H, 0.80 A and 0.56 H.
	 */
	@Test
	void theGappedCoreOfATextbookAgreesWithItsPrintedFigures() {
		Network.Builder b = Network.builder();
		int top = b.joint();
		int bottom = b.joint();
		double gap = 1 / Fringing.NONE.permeance(GapGeometry.plain(new Section.Rectangular(0.03, 0.03), 0.0005, 1));
		double core = 0.15 / (BhCurve.MU_0 * 70_000 * 9e-4);
		assertEquals(3.79e3, 2 * core, 5);
		assertEquals(4.42e5, gap, 500);
		int wound = b.leg(bottom, top, new LinearBh(70_000), 0.15, 9e-4, gap, 0);
		b.leg(top, bottom, new LinearBh(70_000), 0.15, 9e-4, 0, 0);
		b.coil(b.winding(), wound, 500);
		NetworkSolver solver = new NetworkSolver(b.build());
		// B = 1 T: the linkage is N·B·A
		Solution s = solver.solve(Excitation.mixed(new double[] { Double.NaN }, new double[] { 500 * 9e-4 }));
		assertEquals(1, s.legFluxDensity()[wound], 1e-12);
		assertEquals(0.80, s.windingCurrent()[0], 0.005);
		assertEquals(0.56, s.differentialInductance()[0][0], 0.005);
		assertEquals(0.180, s.energy(), 0.001);
		assertEquals(0.5 * s.differentialInductance()[0][0] * Math.pow(s.windingCurrent()[0], 2), s.energy(), 1e-12);
	}

	/** Two equal outer legs in parallel, in series with the centre: N²/(Rc + Ro/2) by hand. */
	@Test
	void aLinearECoreHasTheInductanceOfItsReducedReluctance() {
		double centre = 0.04 / (BhCurve.MU_0 * 2000 * 1.8e-4) + 3e6;
		double outer = 0.09 / (BhCurve.MU_0 * 2000 * 0.9e-4);
		Network.Builder b = Network.builder();
		int top = b.joint();
		int bottom = b.joint();
		BhCurve iron = new LinearBh(2000);
		int wound = b.leg(bottom, top, iron, 0.04, 1.8e-4, 3e6, 0);
		b.leg(top, bottom, iron, 0.09, 0.9e-4, 0, 0);
		b.leg(top, bottom, iron, 0.09, 0.9e-4, 0, 0);
		b.coil(b.winding(), wound, 24);
		Solution s = new NetworkSolver(b.build()).solve(Excitation.currents(7));
		double expected = 24 * 24 / (centre + outer / 2);
		assertEquals(expected, s.differentialInductance()[0][0], 1e-12 * expected);
		assertEquals(expected * 7, s.linkage()[0], 1e-12 * expected * 7);
		assertEquals(-s.legFlux()[1] - s.legFlux()[2], -s.legFlux()[0], 1e-18);
	}

	/** A leg of air only: l = 0 with a gap. */
	@Test
	void aLegThatIsAllGapCarriesMmfOverReluctance() {
		Network.Builder b = Network.builder();
		int a = b.joint();
		int c = b.joint();
		int wound = b.leg(a, c, FERRITE, 0, 1e-4, 2e6, 0);
		b.leg(c, a, FERRITE, 0, 1e-4, 3e6, 0);
		b.coil(b.winding(), wound, 10);
		Solution s = new NetworkSolver(b.build()).solve(Excitation.currents(2));
		assertEquals(20 / 5e6, s.legFlux()[wound], 1e-18);
		assertEquals(100 / 5e6, s.differentialInductance()[0][0], 1e-17);
		assertEquals(FERRITE.fieldStrength(s.legFluxDensity()[wound]), s.legFieldStrength()[wound], 1e-9);
	}

	@Test
	void aLegOnNoClosedPathCarriesNothingAndChangesNothing() {
		Network.Builder b = ring();
		Solution without = new NetworkSolver(b.build()).solve(Excitation.currents(3));
		int stub = b.joint();
		int further = b.joint();
		int dead = b.leg(0, stub, FERRITE, 0.02, 1e-4, 0, 0);
		b.leg(stub, further, FERRITE, 0.02, 1e-4, 1e6, 50);
		b.coil(0, dead, 40);
		Network network = b.build();
		assertArrayEquals(new boolean[] { false, false, true, true }, network.legsWithoutReturn());
		Solution with = new NetworkSolver(network).solve(Excitation.currents(3));
		assertEquals(0, with.legFlux()[2], 0);
		assertEquals(0, with.legFlux()[3], 0);
		assertEquals(without.legFlux()[0], with.legFlux()[0], 1e-13 * Math.abs(without.legFlux()[0]));
		assertEquals(without.linkage()[0], with.linkage()[0], 1e-13 * without.linkage()[0]);
		assertEquals(without.differentialInductance()[0][0], with.differentialInductance()[0][0],
				1e-13 * without.differentialInductance()[0][0]);
		// no flux, so the sources alone set the potentials beyond
		assertEquals(40 * 3, with.jointPotential()[stub] - with.jointPotential()[0], 1e-10);
		assertEquals(50, with.jointPotential()[further] - with.jointPotential()[stub], 1e-10);
	}

	private static Network.Builder ring() {
		Network.Builder b = Network.builder();
		int a = b.joint();
		int c = b.joint();
		int wound = b.leg(a, c, FERRITE, 0.05, 1e-4, 2e6, 0);
		b.leg(c, a, FERRITE, 0.08, 1e-4, 0, 0);
		b.coil(b.winding(), wound, 20);
		return b;
	}

	@Test
	void twoIslandsSolvedTogetherAreAsApart() {
		Solution apart = new NetworkSolver(ring().build()).solve(Excitation.currents(4));
		Network.Builder b = ring();
		int a = b.joint();
		int c = b.joint();
		int wound = b.leg(a, c, FERRITE, 0.05, 1e-4, 2e6, 0);
		b.leg(c, a, FERRITE, 0.08, 1e-4, 0, 0);
		b.coil(b.winding(), wound, 20);
		Network network = b.build();
		assertArrayEquals(new int[] { 0, 0, 1, 1 }, network.islands());
		Solution both = new NetworkSolver(network).solve(Excitation.currents(4, -9));
		assertEquals(apart.legFlux()[0], both.legFlux()[0], 1e-13 * apart.legFlux()[0]);
		assertEquals(0, both.differentialInductance()[0][1], 1e-20);
	}

	@Test
	void twoWindingsInSeriesAndInParallelFollowTheMatrix() {
		Network.Builder b = ring();
		b.coil(b.winding(), 1, 12);
		b.airPath(0, 1, 3e-8);
		double[][] l = new NetworkSolver(b.build()).solve(Excitation.currents(0, 0)).differentialInductance();
		Network.Builder series = ring();
		series.coil(0, 1, 12);
		series.airPath(0, 1, 3e-8);
		double both = new NetworkSolver(series.build()).solve(Excitation.currents(0)).differentialInductance()[0][0];
		assertEquals(l[0][0] + l[1][1] + 2 * l[0][1], both, 1e-12 * both);
		// in parallel both link the same flux per time: impose equal linkages, the currents add
		Solution p = new NetworkSolver(b.build()).solve(
				Excitation.mixed(new double[] { Double.NaN, Double.NaN }, new double[] { 1e-9, 1e-9 }));
		double det = l[0][0] * l[1][1] - l[0][1] * l[0][1];
		double parallel = det / (l[0][0] + l[1][1] - 2 * l[0][1]);
		assertEquals(parallel, 1e-9 / (p.windingCurrent()[0] + p.windingCurrent()[1]), 1e-6 * parallel);
	}

	@Test
	void twoIdenticalCoilsInSeriesOnOneLegQuadrupleInductanceAndCancelWhenOpposed() {
		double one = new NetworkSolver(ring().build()).solve(Excitation.currents(0)).differentialInductance()[0][0];
		double aiding = new NetworkSolver(ring().coil(0, 0, 20).build()).solve(Excitation.currents(0))
				.differentialInductance()[0][0];
		double opposed = new NetworkSolver(ring().coil(0, 0, -20).build()).solve(Excitation.currents(0))
				.differentialInductance()[0][0];
		assertEquals(4 * one, aiding, 1e-12 * aiding);
		assertEquals(0, opposed, 1e-18);
	}

	@Test
	void splittingALegInSeriesOrInParallelChangesNothing() {
		Solution whole = new NetworkSolver(ring().build()).solve(Excitation.currents(30));
		Network.Builder series = Network.builder();
		int a = series.joint();
		int c = series.joint();
		int middle = series.joint();
		int wound = series.leg(a, c, FERRITE, 0.05, 1e-4, 2e6, 0);
		series.leg(c, middle, FERRITE, 0.03, 1e-4, 0, 0);
		series.leg(middle, a, FERRITE, 0.05, 1e-4, 0, 0);
		series.coil(series.winding(), wound, 20);
		Network.Builder parallel = Network.builder();
		a = parallel.joint();
		c = parallel.joint();
		wound = parallel.leg(a, c, FERRITE, 0.05, 1e-4, 2e6, 0);
		parallel.leg(c, a, FERRITE, 0.08, 0.3e-4, 0, 0);
		parallel.leg(c, a, FERRITE, 0.08, 0.7e-4, 0, 0);
		parallel.coil(parallel.winding(), wound, 20);
		for (Network.Builder other : new Network.Builder[] { series, parallel }) {
			Solution s = new NetworkSolver(other.build()).solve(Excitation.currents(30));
			assertEquals(whole.legFlux()[0], s.legFlux()[0], 1e-11 * whole.legFlux()[0]);
			assertEquals(whole.differentialInductance()[0][0], s.differentialInductance()[0][0],
					1e-11 * whole.differentialInductance()[0][0]);
		}
	}

	@Test
	void proportionalWindingsCannotBothHaveTheirLinkageImposed() {
		Network.Builder b = ring();
		b.coil(b.winding(), 0, 40);
		NetworkSolver solver = new NetworkSolver(b.build());
		double[] none = { Double.NaN, Double.NaN };
		ImposedLinkagesConflictException conflict = assertThrows(ImposedLinkagesConflictException.class,
				() -> solver.solve(Excitation.mixed(none, new double[] { 1e-4, 3e-4 })));
		assertEquals(1, conflict.winding());
	}

	@Test
	void farBeyondSaturationImposedLinkagesAreFoundInFewSteps() {
		NetworkSolver solver = new NetworkSolver(ring().build());
		for (double times : new double[] { 0.1, 1, 5, 15 }) {
			double linkage = times * 20 * 0.5 * 1e-4;
			Solution s = solver.solve(Excitation.mixed(new double[] { Double.NaN }, new double[] { linkage }));
			assertTrue(s.converged() && s.iterations() <= 40, "linkage " + linkage);
			assertEquals(linkage, s.linkage()[0], 1e-12 * linkage);
		}
	}

	@Test
	void aLatticeOfThousandsOfSaturatingLegsConvergesAndBalances() {
		Network network = Lattices.saturating(40, 40);
		assertTrue(network.branchCount() > 3000);
		Solution s = new NetworkSolver(network).solve(Excitation.currents(Lattices.currents(network, 200)));
		assertTrue(s.converged());
		assertTrue(s.iterations() <= 40, s.iterations() + " steps");
		assertTrue(s.fluxResidual() <= 1e-12);
		assertTrue(Arrays.stream(s.legFluxDensity()).map(Math::abs).max().orElse(0) > 0.45, "not saturated at all");
	}

	/** The sparse factor with its ordering against the dense one, on the same matrix. */
	@Test
	void sparseAndDenseFactorsSolveAlike() {
		Network network = Lattices.saturating(9, 7);
		Topology topology = new Topology(network);
		int n = topology.unknowns();
		int[] first = new int[network.branchCount()];
		int[] second = new int[network.branchCount()];
		double[] g = new double[network.branchCount()];
		for (int k = 0; k < g.length; k++) {
			first[k] = topology.unknown()[network.from(k)];
			second[k] = topology.unknown()[network.to(k)];
			g[k] = 1e-6 * (1 + (k * 7919) % 101);
		}
		DenseFactor dense = new DenseFactor(n, first, second);
		SparseFactor sparse = new SparseFactor(n, first, second);
		assertEquals(-1, dense.factor(g));
		assertEquals(-1, sparse.factor(g));
		double[] x = new double[n];
		double[] y = new double[n];
		for (int i = 0; i < n; i++) {
			x[i] = y[i] = Math.sin(i);
		}
		dense.solve(x);
		sparse.solve(y);
		double scale = Arrays.stream(x).map(Math::abs).max().orElse(0);
		assertArrayEquals(x, y, 1e-12 * scale);
	}

	/** A banded order of a square lattice of side m has m³ entries; a fill-reducing one far fewer. */
	@Test
	void theOrderingKeepsFillLow() {
		Network network = Lattices.saturating(60, 60);
		Topology topology = new Topology(network);
		int[] first = new int[network.branchCount()];
		int[] second = new int[network.branchCount()];
		for (int k = 0; k < first.length; k++) {
			first[k] = topology.unknown()[network.from(k)];
			second[k] = topology.unknown()[network.to(k)];
		}
		int fill = new SparseFactor(topology.unknowns(), first, second).fill();
		assertTrue(fill < 60 * 60 * 60 / 3, fill + " entries");
	}

	@Test
	void elementsOutsideTheirDomainAreRefusedByName() {
		Network.Builder b = Network.builder();
		int a = b.joint();
		int c = b.joint();
		assertEquals("to = 0: must be another joint than from", assertThrows(IllegalArgumentException.class,
				() -> b.leg(a, a, FERRITE, 0.1, 1e-4, 0, 0)).getMessage());
		assertEquals("pathLength = 0.0: must be above 0 m in a leg without a gap",
				assertThrows(IllegalArgumentException.class, () -> b.leg(a, c, FERRITE, 0, 1e-4, 0, 0)).getMessage());
		assertThrows(IllegalArgumentException.class, () -> b.leg(a, c, FERRITE, 0.1, Double.NaN, 0, 0));
		assertThrows(IllegalArgumentException.class, () -> b.airPath(a, c, 0));
		assertThrows(IllegalArgumentException.class, () -> Excitation.mixed(new double[] { 1 }, new double[] { 1 }));
		NetworkSolver solver = new NetworkSolver(ring().build());
		assertThrows(IllegalArgumentException.class, () -> solver.solve(Excitation.currents(1, 2)));
		assertFalse(Double.isNaN(solver.solve(Excitation.currents(0)).energy()));
	}
}
