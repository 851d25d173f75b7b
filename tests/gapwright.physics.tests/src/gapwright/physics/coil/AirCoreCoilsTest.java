package gapwright.physics.coil;

import static gapwright.physics.material.BhCurve.MU_0;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

class AirCoreCoilsTest {

	/**
	 * Nagaoka's coefficient by elliptic integrals of a general numerical library; his published table has 0.8181 at D/l
	 * 0.5 and 0.6884 at 1 (from memory).
	 */
	@Test
	void nagaokasCoefficientIsThatOfHisTable() {
		double[][] table = { { 0.1, 0.9588071242037166 }, { 0.2, 0.9200926708277795 }, { 0.5, 0.8181357519347039 },
				{ 1, 0.6884226073203766 }, { 2, 0.5255100242519278 }, { 5, 0.31982546778185833 }, { 10, 0.20332351752191274 } };
		for (double[] row : table) {
			assertEquals(row[1], Solenoid.nagaoka(row[0]), 1e-12);
		}
		assertEquals(0.8181, Solenoid.nagaoka(0.5), 5e-5);
		assertEquals(0.6884, Solenoid.nagaoka(1), 5e-5);
		assertEquals(1, Solenoid.nagaoka(0), 0);
		assertEquals(Solenoid.nagaoka(0.0100001), Solenoid.nagaoka(0.0099999), 1e-6);
	}

	/** A band far wider than long: L = µ₀a(ln(8a/l) − 1/2), Rayleigh and Niven (1881), from memory. */
	@Test
	void aVeryShortCoilTendsToRayleighsBand() {
		for (double ratio : new double[] { 1e4, 1e6, 1e8 }) {
			double band = MU_0 * 0.5 * (Math.log(4 * ratio) - 0.5);
			assertEquals(1, Solenoid.currentSheet(1, 1, 1 / ratio) / band, 1e-8);
		}
		// by elliptic integrals of forty digits of a general numerical library, on both sides of the change of formula
		double[][] exact = { { 199, 0.019769190712951938 }, { 201, 0.019604153963275037 }, { 1000, 0.0049618467876171734 }, { 1000000, 9.3594597009811782e-6 } };
		for (double[] row : exact) {
			assertEquals(1, Solenoid.nagaoka(row[0]) / row[1], 2e-11);
		}
	}

	/** Wheeler's formulas against the current sheet, within what they are published to be good for. */
	@Test
	void wheelersFormulasHoldWhereTheyAreSaidTo() {
		for (double length = 0.8; length < 20; length *= 1.2) {
			assertEquals(1, Solenoid.wheelerSingleLayer(10, 1, length) / Solenoid.currentSheet(10, 2, length), 0.006);
		}
		for (double ratio = 0.1; ratio <= 5; ratio *= 1.1) {
			assertEquals(1, Solenoid.wheelerSheet(7, 1, 2 / ratio) / Solenoid.currentSheet(7, 2, 2 / ratio), 0.001);
		}
		// the Brooks coil, l = c, r = 1.5c: 1.6994e-6·r·N² (from memory)
		assertEquals(1.6994e-6, Solenoid.wheelerMultilayer(1, 1, 2.0 / 3, 2.0 / 3), 0.01 * 1.6994e-6);
		assertTrue(Solenoid.isMultilayerValid(1, 1, 1));
		assertFalse(Solenoid.isMultilayerValid(1, 20, 1));
	}

	/** Mutual inductance of coaxial loops by elliptic integrals of a general numerical library (Maxwell's formula). */
	@Test
	void coaxialLoopsFollowMaxwell() {
		assertEquals(1.1126108935219641e-08, Loops.mutual(0.01, 0.01, 0.005), 1e-20);
		assertEquals(1.0972358946947965e-08, Loops.mutual(0.02, 0.01, 0), 1e-20);
		assertEquals(4.9757471808437945e-08, Loops.mutual(0.05, 0.04, 0.02), 1e-19);
		assertEquals(Loops.mutual(0.05, 0.04, 0.02), Loops.mutual(0.04, 0.05, 0.02), 1e-22);
	}

	/** Rosa's correction against the sum over all pairs of turns by Maxwell's formula. */
	@Test
	void rosasCorrectionMakesASheetOutOfRoundTurns() {
		for (int turns : new int[] { 2, 5, 10, 30 }) {
			double radius = 0.02;
			double pitch = 0.002;
			double wire = 0.0015;
			double sum = turns * Loops.turn(radius, wire / 2);
			for (int i = 0; i < turns; i++) {
				for (int j = 0; j < turns; j++) {
					sum += i == j ? 0 : Loops.mutual(radius, radius, (i - j) * pitch);
				}
			}
			double sheet = Solenoid.currentSheet(turns, 2 * radius, turns * pitch) + Solenoid.rosaCorrection(turns, 2 * radius, pitch, wire);
			assertEquals(1, sheet / sum, 2e-3, turns + " turns");
		}
	}

	/** µ_r 60, 12/22/10 mm, 40 turns: 116.378 µH, the closed form by hand; a thin ring is a long solenoid bent round. */
	@Test
	void toroidsFollowTheirClosedForms() {
		assertEquals(0.00011637807428550059, Loops.rectangularToroid(60, 40, 0.012, 0.022, 0.010), 1e-16);
		double thin = Loops.roundToroid(1, 100, 1, 0.001);
		assertEquals(MU_0 * 1e4 * Math.PI * 1e-6 / (2 * Math.PI), thin, 1e-6 * thin);
	}

	/** The long limit: µ₀N²A/l; 300 turns, 1 cm², 0.5 m: 22.6195 µH (elementary). */
	@Test
	void aLongSolenoidTendsToTheElementaryFormula() {
		double area = 1e-4;
		double diameter = Math.sqrt(4 * area / Math.PI);
		assertEquals(2.2619467e-05, Solenoid.currentSheet(300, diameter, 0.5) / Solenoid.nagaoka(diameter / 0.5), 1e-11);
	}
}
