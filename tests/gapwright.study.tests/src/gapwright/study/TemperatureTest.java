package gapwright.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

import gapwright.physics.material.BhCurve;

/** A material at other temperatures than its curve's. */
class TemperatureTest {

	private static final String MATERIAL = "<materials id=\"ferrite\">";
	private static final String END = "</materials>";

	private static StudyResult study(String attributes, String inside) {
		return Designs.study(MATERIAL, "<materials id=\"ferrite\" " + attributes + ">", END, inside + END);
	}

	private static MaterialData data(String attributes, String inside) {
		return new MaterialData(Designs.ring(MATERIAL, "<materials id=\"ferrite\" " + attributes + ">", END, inside + END)
				.getMaterials().get(0));
	}

	private static boolean has(StudyResult result, String code) {
		return result.findings().stream().anyMatch(f -> f.code().equals(code));
	}

	/** Js(100 °C) = 0.569 T·0.39/0.49 = 0.4529 T, by hand. */
	@Test
	void theCurveGoesWithTheSaturationsGiven() {
		BhCurve hot = data("curveScaling=\"WITH_SATURATION\"", "").curve(100);
		double far = 1e9;
		assertEquals(0.4529, hot.fluxDensity(far) - BhCurve.MU_0 * far, 5e-4);
		double cold = study("", "").operatingPoints().get(0).inductance().of("main");
		assertTrue(study("curveScaling=\"WITH_SATURATION\"", "").operatingPoints().get(0).inductance().of("main") < cold);
	}

	@Test
	void betweenTwoCurvesTheFieldStrengthIsInterpolatedAtEachFluxDensity() {
		MaterialData data = data("", "<otherCurves temperature=\"100 °C\"><curve xsi:type=\"gapwright:KneeCurve\""
				+ " initialPermeability=\"3000\" saturationPolarisation=\"0.438 T\"/></otherCurves>");
		double h = 0.5 * data.curve(25).fieldStrength(0.3) + 0.5 * data.curve(100).fieldStrength(0.3);
		assertEquals(h, data.curve(62.5).fieldStrength(0.3), 1e-9 * h);
		assertEquals(0.3, data.curve(62.5).fluxDensity(h), 1e-9);
		assertEquals(data.curve(100).fluxDensity(50), data.curve(140).fluxDensity(50), 0);
	}

	@Test
	void permeabilitiesByTemperatureReplaceTheCurves() {
		MaterialData data = data("", "<permeabilities temperature=\"25 °C\" relativePermeability=\"2000\"/>"
				+ "<permeabilities temperature=\"100 °C\" relativePermeability=\"3000\"/>");
		assertEquals(2000, data.curve(25).slope(0) / BhCurve.MU_0, 1e-6);
		assertEquals(2500, data.curve(62.5).slope(0) / BhCurve.MU_0, 1e-6);
	}

	@Test
	void aboveTheCurieTemperatureThereIsNoNumber() {
		StudyResult result = study("curieTemperature=\"90 °C\"", "");
		assertTrue(has(result, "above-curie"));
		assertTrue(result.isIncomplete());
		assertFalse(result.operatingPoints().get(0).converged());
		assertTrue(has(study("curieTemperature=\"120 °C\"", ""), "near-curie"));
		assertFalse(has(study("curieTemperature=\"131 °C\"", ""), "near-curie"));
	}

	@Test
	void aCurveUsedFarFromItsTemperatureIsNoted() {
		assertTrue(has(study("curveTemperature=\"25 °C\"", ""), "curve-at-other-temperature"));
		assertFalse(has(study("curveTemperature=\"95 °C\"", ""), "curve-at-other-temperature"));
		assertFalse(has(study("curveTemperature=\"25 °C\" curveScaling=\"WITH_SATURATION\"", ""), "curve-at-other-temperature"));
	}

	@Test
	void scalingThatHasNoEffectIsNoted() {
		StudyResult result = Designs.study(MATERIAL, "<materials id=\"ferrite\" curveScaling=\"WITH_SATURATION\">",
				"<curve xsi:type=\"gapwright:KneeCurve\" initialPermeability=\"2300.0\" saturationPolarisation=\"0.569 T\"/>",
				"<curve xsi:type=\"gapwright:LinearCurve\" relativePermeability=\"2300\"/>");
		assertTrue(has(result, "curve-scaling-in-vain"));
	}
}
