package gapwright.physics.material;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;

import org.junit.jupiter.api.Test;

/** A material hot and cold: its curve between two temperatures, and with another saturation and permeability. */
class StatesOfACurveTest {

	private static final double[] TABLE_H = { 10, 40, 100, 300, 1200 };
	private static final double[] TABLE_B = { 0.03, 0.16, 0.3, 0.42, 0.49 };
	private static final double[] HOT_B = { 0.04, 0.18, 0.28, 0.345, 0.39 };

	@Test
	void betweenTwoTemperaturesTheFieldStrengthIsTheWeightedMeanAtEveryFluxDensity() {
		TableBh cold = new TableBh(TABLE_H, TABLE_B);
		TableBh hot = new TableBh(TABLE_H, HOT_B);
		BlendedBh warm = new BlendedBh(cold, hot, 1 / 3.0);
		for (double b = -0.6; b < 0.6; b += 0.0137) {
			double h = (2 * cold.fieldStrength(b) + hot.fieldStrength(b)) / 3;
			assertEquals(h, warm.fieldStrength(b), 1e-12 * Math.abs(h));
			assertEquals(b, warm.fluxDensity(h), 1e-13);
		}
	}

	@Test
	void atEitherEndABlendIsTheCurveItself() {
		BhCurve cold = new KneeBh(2300, 0.569);
		BhCurve hot = new KneeBh(2300, 0.438);
		for (double h : new double[] { -3e4, -50, 0, 1e-3, 12, 1200, 4e5 }) {
			assertEquals(cold.fluxDensity(h), new BlendedBh(cold, hot, 0).fluxDensity(h), 1e-15);
			assertEquals(hot.slope(h), new BlendedBh(cold, hot, 1).slope(h), 1e-12 * hot.slope(0));
			assertEquals(hot.coEnergyDensity(h), new BlendedBh(cold, hot, 1).coEnergyDensity(h),
					1e-12 * hot.coEnergyDensity(h));
		}
		assertThrows(IllegalArgumentException.class, () -> new BlendedBh(cold, hot, 1.01));
		assertThrows(IllegalArgumentException.class, () -> new BlendedBh(cold, hot, Double.NaN));
	}

	/** The blended curve of a table keeps its corners where either table has one. */
	@Test
	void aBlendOfTablesIsSmoothBetweenTheCornersItNames() {
		BlendedBh warm = new BlendedBh(new TableBh(TABLE_H, TABLE_B), new TableBh(TABLE_H, HOT_B), 0.5);
		double[] corners = warm.corners();
		assertEquals(TABLE_B.length + HOT_B.length, corners.length);
		for (int i = 1; i < corners.length; i++) {
			double middle = 0.5 * (corners[i - 1] + corners[i]);
			double step = 1e-4 * (corners[i] - corners[i - 1]);
			double curvature = (warm.slope(middle + step) - warm.slope(middle - step)) / (2 * step);
			assertEquals(curvature, warm.curvature(middle), 1e-6 * Math.max(Math.abs(curvature), warm.slope(middle) / middle));
		}
	}

	@Test
	void scalingTheSaturationScalesTheLimitAndKeepsTheInitialPermeability() {
		for (double ratio : new double[] { 0.5, 0.796, 1, 1.3 }) {
			BhCurve knee = new KneeBh(2300, 0.569).with(2300, ratio);
			BhCurve arctan = new ArctanBh(2300, 0.569).with(2300, ratio);
			RollOffBh rollOff = new RollOffBh(60, 7500, 1.8);
			RollOffBh scaled = rollOff.with(60, ratio);
			assertEquals(ratio * rollOff.limitingPolarisation(), scaled.limitingPolarisation(), 1e-14);
			for (BhCurve curve : List.of(knee, arctan)) {
				assertEquals(2300, Permeability.initial(curve), 1e-9);
				double far = 1e9;
				assertEquals(ratio * 0.569, curve.fluxDensity(far) - BhCurve.MU_0 * far, 1e-6 + 1e-13 * far * BhCurve.MU_0);
			}
			assertEquals(60, Permeability.initial(scaled), 1e-12);
		}
	}

	/** J(H) becomes r·J(k·H), for every kind of curve alike, a table's points included. */
	@Test
	void thePolarisationKeepsItsShape() {
		double ratio = 0.8;
		double permeability = 3500;
		for (BhCurve curve : List.of(new KneeBh(2300, 0.569), new ArctanBh(2300, 0.569), new RollOffBh(2300, 200, 1.8),
				new TableBh(TABLE_H, TABLE_B))) {
			BhCurve other = curve.with(permeability, ratio);
			assertEquals(permeability, Permeability.initial(other), 1e-9 * permeability);
			double faster = (permeability - 1) / (Permeability.initial(curve) - 1) / ratio;
			for (double h : new double[] { 10, 40, 100, 300, 1200 }) {
				double field = h / faster;
				assertEquals(ratio * polarisation(curve, h), polarisation(other, field), 1e-12, curve.toString());
			}
		}
	}

	private static double polarisation(BhCurve curve, double h) {
		return curve.fluxDensity(h) - BhCurve.MU_0 * h;
	}

	@Test
	void aTableThatRisesNoFasterThanAirCannotBeMadeMorePermeable() {
		TableBh air = new TableBh(new double[] { 1 }, new double[] { BhCurve.MU_0 });
		assertThrows(IllegalArgumentException.class, () -> air.with(100, 1));
		// falls below air between its points: twice as permeable it would fall outright
		TableBh doubtful = new TableBh(new double[] { 100, 1e6 }, new double[] { 1.0, 1.05 });
		assertThrows(IllegalArgumentException.class, () -> doubtful.with(60_000, 1));
	}

	/** Outside law: makers print 1/(a + b·H^c) per cent with H in oersted; worked by hand for 1 Oe = 79.5775 A/m. */
	@Test
	void aMakersPerCentFitLeavesTheShareItSays() {
		double a = 0.01;
		double perOersted = 2.9e-5;
		double c = 1.6;
		RollOffBh curve = RollOffBh.ofPerCentFit(60, a, perOersted / Math.pow(79.5775, c), c);
		for (double oersted : new double[] { 1, 20, 50, 100, 300 }) {
			double share = 0.01 / (a + perOersted * Math.pow(oersted, c));
			double susceptibility = Permeability.differential(curve, oersted * 79.5775) - 1;
			assertEquals(59 * share, susceptibility, 1e-10);
		}
	}

	@Test
	void theKneeOfAClosedFormIsWhereItsPermeabilityHasFallenToAFifth() {
		// by hand: slope µ0 + χ/(1 + y)² = 0.2·(µ0 + χ) at y = sqrt(χ/(0.2(µ0 + χ) − µ0)) − 1
		double chi = BhCurve.MU_0 * 2299;
		double y = Math.sqrt(chi / (0.2 * (BhCurve.MU_0 + chi) - BhCurve.MU_0)) - 1;
		double h = y * 0.569 / chi;
		double b = BhCurve.MU_0 * h + chi * h / (1 + y);
		assertEquals(b, Permeability.knee(new KneeBh(2300, 0.569)).orElseThrow(), 1e-12);
		assertEquals(0.2, Permeability.differential(new KneeBh(2300, 0.569), h) / 2300, 1e-12);
		assertTrue(Permeability.knee(new LinearBh(2300)).isEmpty());
		// from air's own slope no curve falls to a fifth of five
		assertTrue(Permeability.knee(new KneeBh(4, 1)).isEmpty());
	}

	/** The published table of the steel of TEAM Workshop problem 13 is steepest near 0.25 T, where 100 mT take 12 A/m. */
	@Test
	void theKneeOfATableLiesBeyondItsSteepestPart() {
		double[] h = { 16, 30, 54, 93, 143, 191, 210, 222, 233, 247, 258, 272, 289, 313, 342, 377, 433, 509, 648, 933, 1228,
				1934, 2913, 4993, 7189, 9423 };
		double[] b = { 0.0025, 0.005, 0.0125, 0.025, 0.05, 0.1, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9, 1, 1.1, 1.2, 1.3,
				1.4, 1.5, 1.55, 1.6, 1.65, 1.7, 1.75, 1.8 };
		TableBh steel = new TableBh(h, b);
		double knee = Permeability.knee(steel).orElseThrow();
		assertTrue(knee > 1.1 && knee < 1.3, "knee at " + knee + " T");
		double greatest = 0;
		for (double x = 0; x < 2000; x += 0.01) {
			greatest = Math.max(greatest, steel.slope(x));
		}
		assertEquals(0.2 * greatest, steel.slope(steel.fieldStrength(knee)), 1e-7 * greatest);
		assertEquals(1.8 / (BhCurve.MU_0 * 9423), Permeability.amplitude(steel, 9423), 1e-9);
		assertEquals(Permeability.initial(steel), Permeability.amplitude(steel, 0), 0);
	}

	@Test
	void endPermeabilityTellsASaturatedTableFromOneThatStopsTooSoon() {
		assertEquals(0.07 / 900 / BhCurve.MU_0, new TableBh(TABLE_H, TABLE_B).endPermeability(), 1e-9);
	}

	@Test
	void aFitOfLossesGivesBackTheLawTheyWereMadeBy() {
		SteinmetzFit fit = SteinmetzFit.of(List.of(loss(25e3, 0.1, 1), loss(25e3, 0.3, 1), loss(100e3, 0.05, 1),
				loss(100e3, 0.2, 1), loss(300e3, 0.1, 1)));
		assertArrayEquals(new double[] { 1.48, 1.45, 2.6 },
				new double[] { fit.coefficient(), fit.frequencyExponent(), fit.fluxDensityExponent() }, 1e-10);
		assertEquals(0, fit.greatestMisfit(), 1e-12);
		assertArrayEquals(new double[] { 25e3, 300e3, 0.05, 0.3 }, new double[] { fit.minimumFrequency(),
				fit.maximumFrequency(), fit.minimumFluxDensity(), fit.maximumFluxDensity() }, 0);
		// the class figure of power ferrite, from memory: about 400 kW/m³ at 100 kHz and 0.2 T
		assertEquals(401e3, fit.loss(100e3, 0.2), 2e3);
	}

	/** Four points in a square, one a tenth high: least squares spreads the misfit evenly, by hand 1.1^(1/4). */
	@Test
	void theGreatestMisfitIsThatOfTheWorstPoint() {
		SteinmetzFit fit = SteinmetzFit.of(List.of(loss(1e4, 0.1, 1.1), loss(1e4, 0.2, 1), loss(2e4, 0.1, 1),
				loss(2e4, 0.2, 1)));
		double residual = Math.pow(1.1, 0.25);
		assertEquals(residual - 1, fit.greatestMisfit(), 1e-12);
	}

	@Test
	void lossesThatDetermineNoFitAreRefused() {
		assertThrows(IllegalArgumentException.class, () -> SteinmetzFit.of(List.of(loss(1e4, 0.1, 1), loss(2e4, 0.2, 1))));
		String line = assertThrows(IllegalArgumentException.class, () -> SteinmetzFit.of(
				List.of(loss(1e4, 0.1, 1), loss(2e4, 0.2, 1), loss(4e4, 0.4, 1), loss(8e4, 0.8, 1)))).getMessage();
		assertTrue(line.contains("on a line"), line);
		assertThrows(IllegalArgumentException.class, () -> SteinmetzFit.of(
				List.of(loss(1e4, 0.1, 1), loss(1e4, 0.2, 1), loss(1e4, 0.4, 1))));
		assertThrows(IllegalArgumentException.class, () -> new SteinmetzFit.Point(0, 0.1, 1));
	}

	private static SteinmetzFit.Point loss(double f, double b, double factor) {
		return new SteinmetzFit.Point(f, b, factor * 1.48 * Math.pow(f, 1.45) * Math.pow(b, 2.6));
	}
}
