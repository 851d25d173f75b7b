package gapwright.physics.material;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;

import org.junit.jupiter.api.Test;

class ChangedCurvesTest {

	private static final BhCurve COLD = new TableBh(new double[] { 40, 200, 1200 }, new double[] { 0.12, 0.38, 0.49 });
	private static final BhCurve HOT = new TableBh(new double[] { 30, 200, 1200 }, new double[] { 0.13, 0.32, 0.39 });
	private static final List<BhCurve> CURVES = List.of(new LinearBh(60), new KneeBh(2300, 0.569), new ArctanBh(30000, 1.2),
			new RollOffBh(60, 7500, 1.8), COLD, new BlendedBh(COLD, HOT, 0.4));
	private static final double[] FIELDS = { -900, -3, 0.5, 7, 55, 190, 260, 900, 2500, 30000 };

	@Test
	void aBlendLiesBetweenItsCurvesAndMeetsThemAtTheEnds() {
		for (double h : FIELDS) {
			assertEquals(COLD.fluxDensity(h), new BlendedBh(COLD, HOT, 0).fluxDensity(h), 1e-12);
			assertEquals(HOT.fluxDensity(h), new BlendedBh(COLD, HOT, 1).fluxDensity(h), 1e-12);
			double b = new BlendedBh(COLD, HOT, 0.4).fluxDensity(h);
			assertTrue(b >= Math.min(COLD.fluxDensity(h), HOT.fluxDensity(h)) && b <= Math.max(COLD.fluxDensity(h), HOT.fluxDensity(h)));
			assertEquals(h, new BlendedBh(COLD, HOT, 0.4).fieldStrength(b), 1e-9 * Math.abs(h));
		}
	}

	@Test
	void derivativesAndEnergyOfABlendAreExact() {
		BhCurve blend = new BlendedBh(COLD, HOT, 0.4);
		for (double h : FIELDS) {
			double step = 1e-5 * Math.abs(h);
			assertEquals((blend.fluxDensity(h + step) - blend.fluxDensity(h - step)) / (2 * step), blend.slope(h), 1e-6 * blend.slope(h));
			double bend = (blend.slope(h + step) - blend.slope(h - step)) / (2 * step);
			assertEquals(bend, blend.curvature(h), 1e-5 * Math.max(Math.abs(bend), blend.slope(h) / Math.abs(h)));
			assertEquals(blend.fluxDensity(h), (blend.coEnergyDensity(h + step) - blend.coEnergyDensity(h - step)) / (2 * step), 1e-6);
		}
		assertEquals(0, blend.coEnergyDensity(0), 0);
	}

	/** Twice the permeability, the same saturation: for small fields twice the flux density, for large ones the same polarisation. */
	@Test
	void permeabilityChangesTheStartAndSaturationTheEnd() {
		for (BhCurve curve : CURVES) {
			BhCurve changed = CurveChange.apply(curve, 1.25, 1);
			assertEquals(1.25, CurveChange.initialPermeability(changed) / CurveChange.initialPermeability(curve), 1e-9);
			if (CurveChange.followsSaturation(curve)) {
				double far = 1e9;
				assertEquals(curve.fluxDensity(far), changed.fluxDensity(far), 2e-3 * curve.fluxDensity(far));
				BhCurve weaker = CurveChange.apply(curve, 1, 0.8);
				assertEquals(CurveChange.initialPermeability(curve), CurveChange.initialPermeability(weaker), 1e-9 * CurveChange.initialPermeability(curve));
				// J = Js·g(χH/Js): at 0.8 of the field 0.8 of the polarisation
				assertEquals(0.8 * (curve.fluxDensity(100) - BhCurve.MU_0 * 100), weaker.fluxDensity(80) - BhCurve.MU_0 * 80, 1e-12);
			}
		}
		assertThrows(IllegalArgumentException.class, () -> CurveChange.apply(new KneeBh(2, 1), 0.4, 1));
	}

	@Test
	void theEffectOfASmallChangeIsExact() {
		double d = 1e-5;
		for (BhCurve curve : CURVES) {
			BhCurve more = CurveChange.apply(curve, 1 + d, 1);
			BhCurve less = CurveChange.apply(curve, 1 - d, 1);
			BhCurve stronger = CurveChange.apply(curve, 1, 1 + d);
			BhCurve weaker = CurveChange.apply(curve, 1, 1 - d);
			for (double h : FIELDS) {
				double b = Math.abs(curve.fluxDensity(h));
				double slope = curve.slope(h) + Math.abs(h * curve.curvature(h));
				String at = curve + " at " + h;
				assertEquals((more.fluxDensity(h) - less.fluxDensity(h)) / (2 * d), CurveChange.byPermeability(curve).applyAsDouble(h), 1e-7 * b, at);
				assertEquals((more.slope(h) - less.slope(h)) / (2 * d), CurveChange.slopeByPermeability(curve).applyAsDouble(h), 1e-6 * slope, at);
				assertEquals((stronger.fluxDensity(h) - weaker.fluxDensity(h)) / (2 * d), CurveChange.bySaturation(curve).applyAsDouble(h), 1e-7 * b, at);
				assertEquals((stronger.slope(h) - weaker.slope(h)) / (2 * d), CurveChange.slopeBySaturation(curve).applyAsDouble(h), 1e-6 * slope, at);
			}
		}
		assertEquals(BhCurve.MU_0 * 5, CurveChange.byPermeability(new LinearBh(1)).applyAsDouble(5), 1e-18);
		assertEquals(BhCurve.MU_0, CurveChange.slopeByPermeability(new LinearBh(1)).applyAsDouble(5), 1e-18);
	}
}
