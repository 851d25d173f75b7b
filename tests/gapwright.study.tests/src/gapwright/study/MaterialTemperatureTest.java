package gapwright.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;

import org.junit.jupiter.api.Test;

import gapwright.model.check.Severity;
import gapwright.physics.material.KneeBh;

/** A material follows the operating point's temperature as far as it was told how, and says where it was not. */
class MaterialTemperatureTest {

	private static final String CURVE = "<curve xsi:type=\"gapwright:KneeCurve\" initialPermeability=\"2300.0\" saturationPolarisation=\"0.569 T\"/>";
	private static final String HOT = "<otherCurves temperature=\"100.0 °C\"><curve xsi:type=\"gapwright:KneeCurve\" initialPermeability=\"2300.0\" saturationPolarisation=\"0.438 T\"/></otherCurves>";
	private static final String MATERIAL = "<materials id=\"ferrite\">";
	private static final String SATURATION = "<saturations temperature=\"25 °C\"";
	private static final String POINT = "temperature=\"100 °C\">";

	@Test
	void atAFurtherCurvesTemperatureThatCurveHolds() {
		double further = inductance(Designs.study(SATURATION, HOT + SATURATION));
		double only = inductance(Designs.study("0.569 T", "0.438 T"));
		assertEquals(only, further, 1e-12 * only);
		assertNotEquals(inductance(Designs.study()), further);
	}

	@Test
	void betweenTwoCurvesTheFieldStrengthIsInterpolatedAtTheFluxDensity() {
		StudyResult result = Designs.study(SATURATION, HOT + SATURATION, POINT, "temperature=\"62.5 °C\">");
		for (LegResult leg : result.operatingPoints().get(0).legs()) {
			double b = leg.fluxDensity();
			double h = 0.5 * (new KneeBh(2300, 0.569).fieldStrength(b) + new KneeBh(2300, 0.438).fieldStrength(b));
			assertEquals(h, leg.fieldStrength(), 1e-9 * h);
		}
	}

	/** 0.569 T · 0.39/0.49: the law of the scaling, worked by hand. */
	@Test
	void aScaledCurveFollowsTheSaturation() {
		double scaled = inductance(Designs.study(MATERIAL, "<materials id=\"ferrite\" curveScaling=\"WITH_SATURATION\">"));
		double byHand = inductance(Designs.study("0.569 T", 0.569 * 0.39 / 0.49 + " T"));
		assertEquals(byHand, scaled, 1e-12 * byHand);
	}

	@Test
	void initialPermeabilitiesReplaceTheCurvesAndAreLinearBetween() {
		String given = "<permeabilities temperature=\"25 °C\" relativePermeability=\"2300\"/>"
				+ "<permeabilities temperature=\"125 °C\" relativePermeability=\"4300\"/>";
		double ours = inductance(Designs.study(SATURATION, given + SATURATION));
		double byHand = inductance(Designs.study("2300.0", "3800.0"));
		assertEquals(byHand, ours, 1e-12 * byHand);
	}

	@Test
	void aboveItsCurieTemperatureThereIsNoNumber() {
		StudyResult result = Designs.study(MATERIAL, "<materials id=\"ferrite\" curieTemperature=\"90 °C\">",
				"<operatingPoints id=\"full\"", "<operatingPoints id=\"cool\" temperature=\"40 °C\"/><operatingPoints id=\"full\"");
		assertTrue(result.operatingPoints().get(0).converged());
		assertFalse(result.operatingPoints().get(1).converged());
		assertTrue(result.operatingPoints().get(1).legs().isEmpty());
		Finding finding = only(result, "above-curie");
		assertEquals(Severity.ERROR, finding.severity());
		assertEquals("full", finding.operatingPoint());
		assertEquals("ferrite", finding.subject());
	}

	@Test
	void withinThirtyKelvinOfTheCurieTemperatureFiguresAreDoubted() {
		assertEquals(Severity.WARNING, only(Designs.study(MATERIAL, "<materials id=\"ferrite\" curieTemperature=\"129 °C\">"),
				"near-curie").severity());
		assertTrue(of(Designs.study(MATERIAL, "<materials id=\"ferrite\" curieTemperature=\"130 °C\">"), "near-curie").isEmpty());
	}

	@Test
	void outsideTheTemperaturesGivenTheEndCurveHoldsAndIsSaid() {
		StudyResult result = Designs.study(SATURATION, HOT + SATURATION, POINT, "temperature=\"120 °C\">");
		assertEquals(inductance(Designs.study("0.569 T", "0.438 T")), inductance(result), 1e-15);
		assertTrue(of(result, "temperature-outside-data").stream().anyMatch(f -> f.message().contains("curves are given")));
	}

	@Test
	void aPermeabilityKeptForWantOfFiguresIsSaid() {
		String scaled = "<materials id=\"ferrite\" curveScaling=\"WITH_SATURATION\">";
		assertEquals(Severity.NOTE, only(Designs.study(MATERIAL, scaled), "permeability-kept").severity());
		assertTrue(of(Designs.study(MATERIAL, scaled, POINT, "temperature=\"25 °C\">"), "permeability-kept").isEmpty());
		assertTrue(of(Designs.study(MATERIAL, scaled, SATURATION,
				"<permeabilities temperature=\"25 °C\" relativePermeability=\"2300\"/>" + SATURATION), "permeability-kept").isEmpty());
	}

	@Test
	void aCurveUsedAtAnotherTemperatureThanItsOwnIsSaid() {
		assertEquals(Severity.NOTE,
				only(Designs.study(MATERIAL, "<materials id=\"ferrite\" curveTemperature=\"25 °C\">"), "curve-at-other-temperature").severity());
		assertTrue(of(Designs.study(MATERIAL, "<materials id=\"ferrite\" curveTemperature=\"100 °C\">"), "curve-at-other-temperature").isEmpty());
	}

	@Test
	void aTableThatEndsTooSoonIsSaidForAFurtherCurveToo() {
		String table = "<otherCurves temperature=\"150 °C\"><curve xsi:type=\"gapwright:TableCurve\">"
				+ "<points fieldStrength=\"10 A/m\" fluxDensity=\"0.05 T\"/><points fieldStrength=\"40 A/m\" fluxDensity=\"0.1 T\"/></curve></otherCurves>";
		assertFalse(of(Designs.study(SATURATION, table + SATURATION), "table-end-not-saturated").isEmpty());
	}

	/** Real material answers a small ripple with less than the slope of its curve, where there is no gap to mask it. */
	@Test
	void aRippleOnABiasIsNotedWhereTheIronTakesMostOfTheAmpereTurns() {
		String tiny = "length=\"1 mm\"";
		assertTrue(of(Designs.study(), "ripple-on-bias").isEmpty());
		StudyResult ungapped = Designs.study(tiny, "length=\"1 µm\"", "current=\"10 A\" ripple=\"4 A\"", "current=\"0.4 A\" ripple=\"0.1 A\"");
		assertEquals("main", only(ungapped, "ripple-on-bias").subject());
		StudyResult wholeSwing = Designs.study(tiny, "length=\"1 µm\"", "current=\"10 A\" ripple=\"4 A\"", "current=\"0.4 A\" ripple=\"0.8 A\"");
		assertTrue(of(wholeSwing, "ripple-on-bias").isEmpty());
		StudyResult powder = Designs.study(tiny, "length=\"1 µm\"", "current=\"10 A\" ripple=\"4 A\"", "current=\"0.4 A\" ripple=\"0.1 A\"",
				CURVE, "<curve xsi:type=\"gapwright:RollOffCurve\" initialPermeability=\"60\" halfFieldStrength=\"3.6 kA/m\" exponent=\"1.8\"/>");
		assertTrue(of(powder, "ripple-on-bias").isEmpty());
	}

	@Test
	void everyOperatingPointHasItsOwnTemperature() {
		String cold = "<operatingPoints id=\"cold\" temperature=\"25 °C\"><drives xsi:type=\"gapwright:CurrentDrive\" id=\"d2\" winding=\"main\" current=\"10 A\"/></operatingPoints>";
		StudyResult result = Designs.study(SATURATION, HOT + SATURATION, "<operatingPoints id=\"full\"", cold + "<operatingPoints id=\"full\"");
		assertEquals(inductance(Designs.study(POINT, "temperature=\"25 °C\">")), result.operatingPoints().get(0).inductance().differential()[0][0], 1e-15);
		assertEquals(inductance(Designs.study("0.569 T", "0.438 T")), result.operatingPoints().get(1).inductance().differential()[0][0], 1e-15);
	}

	private static double inductance(StudyResult result) {
		return result.operatingPoints().get(0).inductance().differential()[0][0];
	}

	private static List<Finding> of(StudyResult result, String code) {
		return result.findings().stream().filter(finding -> finding.code().equals(code)).toList();
	}

	private static Finding only(StudyResult result, String code) {
		List<Finding> found = of(result, code);
		assertEquals(1, found.size(), result.findings().toString());
		return found.get(0);
	}
}
