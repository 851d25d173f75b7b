package gapwright.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.concurrent.CancellationException;

import org.junit.jupiter.api.Test;

import gapwright.model.Design;
import gapwright.physics.material.BhCurve;

class StudyTest {

	private static final String DRIVE = "<drives xsi:type=\"gapwright:CurrentDrive\" id=\"drive\" winding=\"main\" current=\"10 A\" ripple=\"4 A\"/>";

	private static OperatingPointResult point(StudyResult result) {
		return result.operatingPoints().get(0);
	}

	private static OperatingPointResult point(String... changes) {
		return point(Designs.study(changes));
	}

	/** Linear iron by hand: R = l/(µ₀µA) + g/(µ₀·(a + g)(b + g)), l the joint distance less the gap. */
	@Test
	void aLinearRingHasTheFluxOfItsReluctances() {
		OperatingPointResult p = point("KneeCurve\" initialPermeability=\"2300.0\" saturationPolarisation=\"0.569 T\"",
				"LinearCurve\" relativePermeability=\"2000.0\"");
		double area = 12e-3 * 15e-3;
		double iron = (39e-3 + 90e-3) / (BhCurve.MU_0 * 2000 * area);
		double gap = 1e-3 / (BhCurve.MU_0 * 13e-3 * 16e-3);
		double flux = 20 * 10 / (iron + gap);
		assertEquals(flux, p.leg("wound").flux(), 1e-12 * flux);
		assertEquals(flux / area, p.leg("wound").fluxDensity(), 1e-12);
		assertEquals(20 * flux, p.winding("main").linkage(), 1e-12 * 20 * flux);
		assertEquals(20 * flux / 10, p.winding("main").apparentInductance(), 1e-12 * 2 * flux);
		assertEquals(400 / (iron + gap), p.inductance().of("main"), 1e-12 * 400 / (iron + gap));
		assertEquals(1 / gap, p.gaps().get(0).permeance(), 1e-18);
		assertEquals(13.0 * 16 / (12 * 15), p.gaps().get(0).fringingFactor(), 1e-12);
		assertEquals(flux * gap, p.gaps().get(0).mmfDrop(), 1e-9);
		assertEquals(0.5 * 10 * 20 * flux, p.energy(), 1e-12 * p.energy());
		// 12 A at the crest of the ripple
		assertEquals(1.2 * flux / area, p.leg("wound").peakFluxDensity(), 1e-12);
	}

	@Test
	void fluxDensityIsThatOfTheIronAndGapsTakeTheGrossArea() {
		OperatingPointResult whole = point();
		OperatingPointResult stacked = point("id=\"wound\" from=\"a\" to=\"b\" material=\"ferrite\" width=\"12 mm\" depth=\"15 mm\"",
				"id=\"wound\" from=\"a\" to=\"b\" material=\"ferrite\" width=\"12 mm\" depth=\"15 mm\" stackingFactor=\"0.5\"");
		assertEquals(whole.gaps().get(0).permeance(), stacked.gaps().get(0).permeance(), 1e-20);
		double flux = stacked.leg("wound").flux();
		assertEquals(flux / (0.5 * 180e-6), stacked.leg("wound").fluxDensity(), 1e-12);
		assertTrue(flux < whole.leg("wound").flux());
	}

	@Test
	void saturationIsInterpolatedOverTemperature() {
		assertEquals(0.39, point().leg("wound").saturation(), 1e-15);
		assertEquals(0.44, point("id=\"full\" temperature=\"100 °C\"", "id=\"full\" temperature=\"62.5 °C\"").leg("wound")
				.saturation(), 1e-15);
	}

	@Test
	void outsideTheDataTheEndValueHoldsAndIsNoted() {
		StudyResult result = Designs.study("id=\"full\" temperature=\"100 °C\"", "id=\"full\" temperature=\"130 °C\"");
		assertEquals(0.39, point(result).leg("wound").saturation(), 0);
		assertEquals(1, codes(result).stream().filter("temperature-outside-data"::equals).count());
	}

	private static List<String> codes(StudyResult result) {
		return result.findings().stream().map(Finding::code).toList();
	}

	@Test
	void statesAreJudgedAtThePeakOfTheRipple() {
		assertEquals(LegState.WITHIN, state("2 A", "0 A"));
		assertEquals(LegState.NEAR, state("11 A", "6 A"));
		assertEquals(LegState.WITHIN, state("11 A", "0 A"));
		assertEquals(LegState.NEAR, state("-11 A", "6 A"));
		assertEquals(LegState.OVER, state("30 A", "0 A"));
		// a small bias with a large ripple peaks on the negative side too
		assertEquals(LegState.NEAR, state("0 A", "28 A"));
	}

	private static LegState state(String current, String ripple) {
		return point("current=\"10 A\" ripple=\"4 A\"", "current=\"" + current + "\" ripple=\"" + ripple + "\"")
				.leg("wound").state();
	}

	@Test
	void theDesignsOwnLimitDecidesWhereNearBegins() {
		StudyResult strict = Designs.study("</gapwright:Design>", "<limits nearFraction=\"0.3\"/></gapwright:Design>");
		assertEquals(LegState.NEAR, strict.worst());
		assertTrue(codes(strict).contains("leg-near-saturation"));
		assertEquals(LegState.WITHIN, Designs.study().worst());
	}

	@Test
	void aLegWithoutSaturationIsUnknownAndNeverCountsAsWithin() {
		StudyResult result = Designs.study("<saturations temperature=\"25 °C\" fluxDensity=\"0.49 T\"/>", "",
				"<saturations temperature=\"100 °C\" fluxDensity=\"0.39 T\"/>", "");
		assertEquals(LegState.UNKNOWN, point(result).leg("wound").state());
		assertTrue(Double.isNaN(point(result).leg("wound").utilisation()));
		assertEquals(LegState.NEAR, result.worst());
		assertTrue(codes(result).contains("saturation-missing"));
		assertFalse(result.isIncomplete());
	}

	/** Volt-seconds: ±V·t/2 of linkage about that of the bias, whatever current it takes. */
	@Test
	void aVoltageSwingsTheLinkageToBothSidesOfTheBias() {
		StudyResult result = Designs.study(DRIVE,
				"<drives xsi:type=\"gapwright:VoltageDrive\" id=\"drive\" winding=\"main\" voltage=\"100 V\" onTime=\"8 µs\" bias=\"4 A\"/>");
		OperatingPointResult biased = point("current=\"10 A\" ripple=\"4 A\"", "current=\"4 A\"");
		OperatingPointResult swung = point(result);
		assertEquals(4, swung.winding("main").current(), 0);
		assertEquals(biased.leg("wound").fluxDensity(), swung.leg("wound").fluxDensity(), 1e-12);
		double swing = 100 * 8e-6 / 2 / 20 / 180e-6;
		assertEquals(biased.leg("wound").fluxDensity() + swing, swung.leg("wound").peakFluxDensity(), 1e-12);
	}

	@Test
	void twoVoltagesOnProportionalWindingsConflict() {
		String second = "<windings id=\"other\"><coils id=\"other-coil\" leg=\"wound\" turns=\"40\"/></windings>";
		String drives = "<drives xsi:type=\"gapwright:VoltageDrive\" id=\"d1\" winding=\"main\" voltage=\"10 V\" onTime=\"5 µs\"/>"
				+ "<drives xsi:type=\"gapwright:VoltageDrive\" id=\"d2\" winding=\"other\" voltage=\"10 V\" onTime=\"5 µs\"/>";
		StudyResult result = Designs.study("<operatingPoints", second + "<operatingPoints", DRIVE, drives);
		assertTrue(codes(result).contains("imposed-linkages-conflict"));
		assertFalse(point(result).converged());
		assertTrue(result.isIncomplete());
	}

	@Test
	void apparentInductanceIsOnlyGivenWhereOneWindingAloneCarriesCurrent() {
		String second = "<windings id=\"other\"><coils id=\"other-coil\" leg=\"back\" turns=\"5\"/></windings>";
		String drive = "<drives xsi:type=\"gapwright:CurrentDrive\" id=\"d2\" winding=\"other\" current=\"1 A\"/>";
		OperatingPointResult alone = point("<operatingPoints", second + "<operatingPoints");
		assertFalse(Double.isNaN(alone.winding("main").apparentInductance()));
		assertTrue(Double.isNaN(alone.winding("other").apparentInductance()));
		OperatingPointResult both = point("<operatingPoints", second + "<operatingPoints", DRIVE, DRIVE + drive);
		assertTrue(Double.isNaN(both.winding("main").apparentInductance()));
		assertEquals(1, Math.abs(both.inductance().coupling("main", "other")), 1e-9);
	}

	@Test
	void aMagnetBiasesTheFluxAndLeavesEnergiesWithoutNumber() {
		String magnet = "<magnet id=\"magnet\" length=\"1 mm\" remanence=\"0.38 T\" recoilPermeability=\"1.07\"/>";
		OperatingPointResult p = point("pathLength=\"90 mm\"/>", "pathLength=\"90 mm\">" + magnet + "</legs>",
				"current=\"10 A\" ripple=\"4 A\"", "current=\"0 A\"");
		assertTrue(p.leg("back").flux() > 0, "not reversed, it drives flux from from to to");
		assertTrue(Double.isNaN(p.energy()) && Double.isNaN(p.coEnergy()));
		assertTrue(Double.isNaN(p.winding("main").apparentInductance()));
	}

	@Test
	void aMethodThatGivesNoNumberIsSaidAndNeverReplaced() {
		StudyResult result = Designs.study("fringing=\"WIDENED\"", "fringing=\"CONFORMAL\" windowHeight=\"0.9 mm\"");
		Finding finding = result.findings().stream().filter(f -> f.code().equals("gap-method-refused")).findFirst()
				.orElseThrow();
		assertEquals("gap", finding.subject());
		assertFalse(point(result).converged());
		assertNull(point(result).leg("wound"));
		assertTrue(result.isIncomplete());
	}

	@Test
	void gapMethodsOutsideTheirRangeAreFound() {
		assertTrue(codes(Designs.study("length=\"1 mm\"", "length=\"3 mm\"")).contains("gap-method-outside-validity"));
		StudyResult refused = Designs.study("length=\"1 mm\"", "length=\"14 mm\"");
		assertTrue(codes(refused).contains("gap-method-refused"));
		assertTrue(refused.isIncomplete());
	}

	@Test
	void anErrorKeepsNumbersBackOnlyInItsOwnIsland() {
		String island = "<joints id=\"c\" x=\"0 mm\" y=\"50 mm\"/><joints id=\"d\" x=\"40 mm\" y=\"50 mm\"/>";
		String legs = "<legs id=\"broken\" from=\"c\" to=\"d\" material=\"ferrite\" width=\"12 mm\" depth=\"-15 mm\"/>"
				+ "<legs id=\"beside\" from=\"d\" to=\"c\" material=\"ferrite\" width=\"12 mm\" depth=\"15 mm\" pathLength=\"90 mm\"/>";
		StudyResult result = Designs.study("<legs id=\"wound\"", island + "<legs id=\"wound\"", "<windings", legs + "<windings");
		assertTrue(codes(result).contains("value-out-of-domain"));
		assertTrue(point(result).converged());
		assertEquals(point().leg("wound").flux(), point(result).leg("wound").flux(), 1e-18);
		assertNull(point(result).leg("broken"));
		assertNull(point(result).leg("beside"));
		assertTrue(result.isIncomplete());
	}

	@Test
	void legsAndCoilsWithoutReturnAreFoundAndCarryNothing() {
		String stub = "<joints id=\"c\" x=\"0 mm\" y=\"50 mm\"/>";
		String leg = "<legs id=\"stub\" from=\"a\" to=\"c\" material=\"ferrite\" width=\"12 mm\" depth=\"15 mm\"/>";
		StudyResult result = Designs.study("<legs id=\"wound\"", stub + "<legs id=\"wound\"", "<windings id=\"main\">",
				leg + "<windings id=\"main\"><coils id=\"lost\" leg=\"stub\" turns=\"5\"/>");
		assertTrue(codes(result).containsAll(List.of("leg-without-return", "coil-without-return", "joint-without-return")));
		assertEquals(0, point(result).leg("stub").flux(), 0);
		assertEquals(point().winding("main").linkage(), point(result).winding("main").linkage(), 1e-15);
	}

	@Test
	void aCoilWoundInTheOpposingSenseSubtracts() {
		OperatingPointResult p = point("<coils id=\"coil\" leg=\"wound\" turns=\"20\"/>",
				"<coils id=\"coil\" leg=\"wound\" turns=\"20\"/><coils id=\"against\" leg=\"wound\" turns=\"20\" reversed=\"true\"/>");
		assertEquals(0, p.leg("wound").flux(), 1e-18);
		assertEquals(0, p.inductance().of("main"), 1e-18);
	}

	@Test
	void aDesignWithoutAnOperatingPointHasFindingsButNoNumbers() {
		Design design = Designs.ring();
		design.getOperatingPoints().clear();
		StudyResult result = Study.of(design);
		assertTrue(result.operatingPoints().isEmpty());
		assertTrue(codes(result).contains("operating-point-missing"));
	}

	@Test
	void aCancelledStudyGivesNoResult() {
		StudyInput input = Lowering.of(Designs.ring());
		assertThrows(CancellationException.class, () -> Study.run(input, () -> true));
	}

	@Test
	void theInputDoesNotChangeWithTheDesign() {
		Design design = Designs.ring();
		StudyInput input = Lowering.of(design);
		double before = point(Study.run(input)).leg("wound").flux();
		design.getLegs().get(0).getGaps().clear();
		design.getWindings().clear();
		assertEquals(before, point(Study.run(input)).leg("wound").flux(), 0);
	}

	@Test
	void aRollOffFarFromItsSaturationIsDoubted() {
		StudyResult result = Designs.study("KneeCurve\" initialPermeability=\"2300.0\" saturationPolarisation=\"0.569 T\"",
				"RollOffCurve\" initialPermeability=\"60.0\" halfFieldStrength=\"7.5 kA/m\" exponent=\"1.3\"");
		assertTrue(codes(result).contains("rolloff-saturation-mismatch"));
	}
}
