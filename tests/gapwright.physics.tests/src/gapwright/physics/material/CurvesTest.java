package gapwright.physics.material;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.function.DoubleUnaryOperator;

import org.junit.jupiter.api.Test;

class CurvesTest {

	/** B-H table of TEAM Workshop problem 13, thinned; published with the problem. */
	private static final double[] STEEL_H = { 16, 54, 143, 210, 247, 289, 377, 509, 933, 1934, 4993, 9423 };
	private static final double[] STEEL_B = { 0.0025, 0.0125, 0.05, 0.2, 0.5, 0.8, 1.1, 1.3, 1.5, 1.6, 1.7, 1.8 };

	private static final List<BhCurve> ALL = List.of(new LinearBh(60), new KneeBh(2300, 0.569), new KneeBh(30, 1.9),
			new ArctanBh(30000, 1.2), new ArctanBh(5, 0.4), new RollOffBh(60, 7500, 1.8), new RollOffBh(75, 4000, 1.3),
			new RollOffBh(26, 20000, 2.5), new RollOffBh(125, 3000, 1.05), new TableBh(STEEL_H, STEEL_B),
			new BlendedBh(new KneeBh(2300, 0.569), new KneeBh(3500, 0.438), 0.4),
			new BlendedBh(new TableBh(STEEL_H, STEEL_B), new ArctanBh(900, 1.5), 0.7),
			new StretchedBh(new KneeBh(2300, 0.569), 1.3));
	private static final double[] FIELDS = { 1e-3, 0.5, 7, 40, 190, 260, 900, 2500, 7000, 9000, 30000, 2e5, 3e6 };

	@Test
	void everyCurveIsOddAndRises() {
		for (BhCurve curve : ALL) {
			double before = 0;
			for (double h : FIELDS) {
				double b = curve.fluxDensity(h);
				assertTrue(b > before, curve + " at " + h);
				assertEquals(-b, curve.fluxDensity(-h), 0);
				assertTrue(curve.slope(h) >= 0);
				assertEquals(curve.slope(h), curve.slope(-h), 0);
				assertEquals(-curve.curvature(h), curve.curvature(-h), 0);
				assertEquals(curve.coEnergyDensity(h), curve.coEnergyDensity(-h), 0);
				before = b;
			}
			assertEquals(0, curve.fluxDensity(0), 0);
			assertEquals(0, curve.coEnergyDensity(0), 0);
		}
	}

	@Test
	void slopeAndCurvatureAreTheDerivatives() {
		for (BhCurve curve : ALL) {
			for (double h : FIELDS) {
				double step = 1e-3 * h;
				assertEquals(difference(curve::fluxDensity, h, step), curve.slope(h), 1e-8 * curve.slope(0), at(curve, h));
				double curvature = difference(curve::slope, h, step);
				assertEquals(curvature, curve.curvature(h), 1e-6 * Math.max(Math.abs(curvature), curve.slope(h) / h),
						at(curve, h));
			}
		}
	}

	/** Five-point central difference. */
	private static double difference(DoubleUnaryOperator f, double x, double h) {
		return (f.applyAsDouble(x - 2 * h) - 8 * f.applyAsDouble(x - h) + 8 * f.applyAsDouble(x + h)
				- f.applyAsDouble(x + 2 * h)) / (12 * h);
	}

	/** Against composite Gauss-Legendre quadrature of B, octave by octave. */
	@Test
	void coEnergyIsTheIntegralOfFluxDensity() {
		for (BhCurve curve : ALL) {
			for (double h : FIELDS) {
				assertEquals(integral(curve::fluxDensity, h), curve.coEnergyDensity(h),
						2e-9 * curve.coEnergyDensity(h), at(curve, h));
			}
		}
	}

	private static double integral(DoubleUnaryOperator f, double end) {
		double[] nodes = { 0.1488743389816312, 0.4333953941292472, 0.6794095682990244, 0.8650633666889845,
				0.9739065285171717 };
		double[] weights = { 0.2955242247147529, 0.2692667193099963, 0.2190863625159820, 0.1494513491505806,
				0.0666713443086881 };
		double sum = 0;
		double high = end;
		for (int octave = 0; octave < 60; octave++) {
			double low = octave == 59 ? 0 : high / 2;
			int pieces = 240;
			double half = (high - low) / pieces / 2;
			for (int p = 0; p < pieces; p++) {
				double middle = low + (2 * p + 1) * half;
				for (int i = 0; i < nodes.length; i++) {
					sum += weights[i] * half
							* (f.applyAsDouble(middle - half * nodes[i]) + f.applyAsDouble(middle + half * nodes[i]));
				}
			}
			high = low;
		}
		return sum;
	}

	@Test
	void fieldStrengthInvertsFluxDensity() {
		for (BhCurve curve : ALL) {
			for (double h : FIELDS) {
				double b = curve.fluxDensity(h);
				double back = curve.fieldStrength(b);
				assertEquals(b, curve.fluxDensity(back), 4e-16 * Math.max(b, curve.slope(h) * h), at(curve, h));
				assertEquals(-back, curve.fieldStrength(-b), 0);
			}
			assertEquals(0, curve.fieldStrength(0), 0);
		}
	}

	@Test
	void weaklyMagnetisedCurvesHaveTheirInitialPermeability() {
		for (double permeability : new double[] { 5, 60, 2300, 30000 }) {
			double expected = BhCurve.MU_0 * permeability;
			double h = 1e-7 / (BhCurve.MU_0 * permeability);
			assertEquals(expected, new KneeBh(permeability, 1).fluxDensity(h) / h, 1e-6 * expected);
			assertEquals(expected, new ArctanBh(permeability, 1).fluxDensity(h) / h, 1e-6 * expected);
			assertEquals(expected, new RollOffBh(permeability, 1 / (BhCurve.MU_0 * permeability), 1.5).fluxDensity(h) / h,
					1e-6 * expected);
		}
	}

	@Test
	void deepInSaturationOnlyAirIsLeft() {
		for (BhCurve curve : List.of(new KneeBh(2300, 0.5), new ArctanBh(2300, 0.5), new RollOffBh(60, 6000, 1.6))) {
			assertEquals(BhCurve.MU_0, curve.slope(1e8), 0.01 * BhCurve.MU_0);
		}
	}

	/** At χH/Js = 9 the polarisation is 90 % of Js: the form's own arithmetic. */
	@Test
	void theKneeIsAtNinetyPerCentWhereItsFormSaysSo() {
		KneeBh knee = new KneeBh(1000, 0.5);
		double h = 9 * 0.5 / (BhCurve.MU_0 * 999);
		assertEquals(0.45, knee.fluxDensity(h) - BhCurve.MU_0 * h, 1e-15);
	}

	@Test
	void aKneeThroughADataSheetsPointPassesThroughIt() {
		KneeBh knee = KneeBh.through(2300, 1200, 0.49);
		assertEquals(0.49, knee.fluxDensity(1200), 1e-15);
		// worked by hand: 0.569 T to three digits
		assertEquals(0.569, knee.saturationPolarisation(), 5e-4);
		assertThrows(IllegalArgumentException.class, () -> KneeBh.through(2300, 100, 0.49));
	}

	/** Independent value: scipy quadrature behind an outside reference network (e-core-powder-rolloff). */
	@Test
	void rollOffAgreesWithAnOutsideQuadrature() {
		assertEquals(0.34904006324, new RollOffBh(60, 6000, 1.6).fluxDensity(6139.2998067), 1e-10);
	}

	@Test
	void rollOffTendsToItsLimitingPolarisation() {
		RollOffBh curve = new RollOffBh(60, 7500, 1.8);
		double h = 1e9;
		assertEquals(curve.limitingPolarisation(), curve.fluxDensity(h) - BhCurve.MU_0 * h, 1e-3);
		// from the closed form (π/c)/sin(π/c) by hand: 0.985 T
		assertEquals(0.985, curve.limitingPolarisation(), 5e-4);
	}

	@Test
	void aTablePassesThroughItsPointsAndIsMonotoneBetweenThem() {
		TableBh table = new TableBh(STEEL_H, STEEL_B);
		for (int i = 0; i < STEEL_H.length; i++) {
			assertEquals(STEEL_B[i], table.fluxDensity(STEEL_H[i]), 1e-15);
		}
		double before = -1;
		for (int i = 0; i <= 10_000; i++) {
			double b = table.fluxDensity(12_000.0 * i / 10_000);
			assertTrue(b >= before);
			before = b;
		}
		double beyond = STEEL_B[STEEL_B.length - 1] + BhCurve.MU_0 * 1000;
		assertEquals(beyond, table.fluxDensity(STEEL_H[STEEL_H.length - 1] + 1000), 1e-15);
	}

	/** Values of scipy 1.17's PchipInterpolator on the points mirrored in the origin, computed outside. */
	@Test
	void aTableEqualsThePublishedMonotoneCubic() {
		TableBh table = new TableBh(new double[] { 100, 300, 700, 2000 }, new double[] { 0.4, 0.9, 1.2, 1.4 });
		for (double[] point : PCHIP) {
			assertEquals(point[1], table.fluxDensity(point[0]), 1e-12, "H " + point[0]);
		}
	}

	private static final double[][] PCHIP = {
			{ 10.0, 0.040757894736842104 },
			{ 50.0, 0.2105263157894737 },
			{ 99.0, 0.39682534736842107 },
			{ 150.0, 0.5554351076555024 },
			{ 200.0, 0.6982655502392344 },
			{ 280.0, 0.8718023923444976 },
			{ 301.0, 0.9012260390854365 },
			{ 500.0, 1.0969160442956478 },
			{ 690.0, 1.196999174285346 },
			{ 1000.0, 1.2783300947338696 },
			{ 1500.0, 1.3681963945168598 },
			{ 1999.0, 1.3999998672521503 },
	};

	@Test
	void parametersOutsideTheirDomainAreRefusedByName() {
		assertEquals("relativePermeability = 0.5: must be finite and at least 1.0",
				assertThrows(IllegalArgumentException.class, () -> new LinearBh(0.5)).getMessage());
		assertThrows(IllegalArgumentException.class, () -> new KneeBh(1, 0.5));
		assertThrows(IllegalArgumentException.class, () -> new ArctanBh(100, Double.NaN));
		assertThrows(IllegalArgumentException.class, () -> new RollOffBh(60, 6000, 1));
		assertEquals("point 2 (200.0 A/m, 0.3 T) does not rise above the one before (100.0 A/m, 0.4 T)",
				assertThrows(IllegalArgumentException.class,
						() -> new TableBh(new double[] { 100, 200 }, new double[] { 0.4, 0.3 })).getMessage());
		assertThrows(IllegalArgumentException.class, () -> new TableBh(new double[] { 0 }, new double[] { 0 }));
	}

	private static String at(BhCurve curve, double h) {
		return curve + " at " + h + " A/m";
	}
}
