package gapwright.library.template;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;

import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

import gapwright.model.Design;
import gapwright.model.DesignReader;
import gapwright.model.DesignWriter;
import gapwright.model.GapwrightFactory;
import gapwright.model.LinearCurve;
import gapwright.model.check.DesignCheck;
import gapwright.study.LegState;
import gapwright.study.OperatingPointResult;
import gapwright.study.Study;
import gapwright.study.StudyResult;

/** A new design is sound from its first moment and has the inductance that reckoning by hand gives. */
class TemplatesTest {

	private static final double MU_0 = 4e-7 * Math.PI;
	private static final double FERRITE = MU_0 * 2300;
	/** Share by which iron at 1 µA may differ from its initial permeability. */
	private static final double SMALL_SIGNAL = 1e-4;

	@TestFactory
	List<DynamicTest> standardFieldsGiveADesignWithNothingToFind() {
		return each(template -> {
			Design design = template.build(Map.of());
			assertEquals(List.of(), DesignCheck.check(design));
			StudyResult result = Study.of(design);
			boolean empty = design.getLegs().isEmpty();
			assertEquals(empty, result.isIncomplete());
			assertEquals(empty ? List.of("design-empty") : List.of(),
					result.findings().stream().map(finding -> finding.code()).toList());
		});
	}

	@TestFactory
	List<DynamicTest> theDesignSurvivesItsFile() {
		return each(template -> {
			byte[] written = DesignWriter.bytes(template.build(Map.of()));
			assertArrayEquals(written, DesignWriter.bytes(read(written)));
		});
	}

	@TestFactory
	List<DynamicTest> everyFieldExplainsItselfAndItsStandardIsAccepted() {
		return each(template -> {
			assertFalse(template.title().isBlank() || template.summary().isBlank());
			assertEquals(template.fields().size(),
					new HashSet<>(template.fields().stream().map(TemplateField::key).toList()).size());
			Map<String, String> standards = new HashMap<>();
			for (TemplateField field : template.fields()) {
				assertTrue(field.hint().endsWith("."), field.key());
				standards.put(field.key(), field.standard());
			}
			assertArrayEquals(DesignWriter.bytes(template.build(Map.of())),
					DesignWriter.bytes(template.build(standards)));
		});
	}

	@TestFactory
	List<DynamicTest> aFieldWithoutUnitIsRefusedByItsLabel() {
		List<DynamicTest> tests = new ArrayList<>();
		for (Template template : Template.all()) {
			for (TemplateField field : template.fields()) {
				String bad = field.dimension() == null ? "12.5" : "7";
				tests.add(DynamicTest.dynamicTest(template.id() + " " + field.key(), () -> {
					String message = refusal(template, Map.of(field.key(), bad));
					assertTrue(message.startsWith(field.label() + ": "), message);
				}));
			}
		}
		return tests;
	}

	@Test
	void impossibleFiguresAreRefusedByTheFieldsLabel() {
		assertTrue(refusal(template("e-core"), Map.of("depth", "0 mm")).startsWith("Depth: "));
		assertTrue(refusal(template("e-core"), Map.of("gap", "-1 mm")).startsWith("Gap: "));
		assertTrue(refusal(template("c-core"), Map.of("turns", "0")).startsWith("Turns: "));
		assertTrue(refusal(template("c-core"), Map.of("turns", "many")).startsWith("Turns: "));
		assertTrue(refusal(template("toroid"), Map.of("inner", "40 mm")).startsWith("Inner diameter: "));
		assertTrue(refusal(template("three-leg-core"), Map.of("gap", "3 T")).startsWith("Gap: "));
	}

	/** A corner of two bars p and q wide: l/A with l = (π/8)(p + q), A = depth·(p + q)/2, so π/(4·depth). IEC 60205, from memory. */
	private static double corner(double depth) {
		return Math.PI / (4 * depth);
	}

	/** L = N²µ₀µ/C₁ of the template's core, all iron of one constant permeability, without gaps. */
	private static void hasCoreConstant(double c1, String template, int turns, Map<String, String> values) {
		Map<String, String> all = new HashMap<>(values);
		all.put("turns", Integer.toString(turns));
		Design design = template(template).build(all);
		boolean air = design.getMaterials().get(0).getCurve() instanceof LinearCurve;
		if (!air) {
			LinearCurve linear = GapwrightFactory.eINSTANCE.createLinearCurve();
			linear.setRelativePermeability(2300);
			design.getMaterials().get(0).setCurve(linear);
			design.getMaterials().get(0).getOtherCurves().clear();
			design.getMaterials().get(0).getPermeabilities().clear();
		}
		double inductance = Study.of(design).operatingPoints().get(0).inductance().of("main");
		double expected = turns * turns * MU_0 * (air ? 1 : 2300) / c1;
		assertEquals(1, inductance / expected, 1e-12, template);
	}

	/** The bar of the standard: 2(l/A) of legs and yokes each and four corners. */
	@Test
	void cCoreHasTheStandardsCoreConstant() {
		double c1 = 2 * 30e-3 / 150e-6 + 2 * 15e-3 / 150e-6 + 4 * corner(15e-3);
		hasCoreConstant(c1, "c-core", 24, Map.of("gap", "0 mm"));
		assertTrue(template("c-core").figures(Map.of()).contains(String.format("%.4f", c1 * 1e-3)));
	}

	/**
	 * E 42/21/15: window 29.5 mm, centre leg 12.2 mm, inner height 14.8 mm of each half. 517.3 1/m, 95.9 mm, 185.4 mm² by
	 * the standard's formulas; makers print 97 mm and 178 mm² (from memory), with radii and mean dimensions.
	 */
	@Test
	void eCoreHasTheStandardsCoreConstant() {
		Map<String, String> e42 = Map.of("centreWidth", "12.2 mm", "outerWidth", "6.25 mm", "yokeHeight", "6.2 mm", "depth", "15 mm",
				"windowWidth", "8.65 mm", "windowHeight", "29.6 mm", "gap", "0 mm");
		double half = 29.6e-3 / (6.1e-3 * 15e-3) + 2 * 8.65e-3 / (6.2e-3 * 15e-3) + 29.6e-3 / (6.25e-3 * 15e-3) + 4 * corner(15e-3);
		assertEquals(517.3, half / 2, 0.05);
		hasCoreConstant(half / 2, "e-core", 18, e42);
		String line = template("e-core").figures(e42);
		assertTrue(line.contains("0.5173 /mm") && line.contains("95.9 mm") && line.contains("185.4 mm²"), line);
	}

	@Test
	void eiStackHasTheStandardsCoreConstantByItsIron() {
		double half = 48e-3 / (16e-3 * 35e-3) + 2 * 16e-3 / (16e-3 * 35e-3) + 48e-3 / (16e-3 * 35e-3) + 4 * corner(35e-3);
		hasCoreConstant(half / 2 / 0.96, "ei-stack", 120, Map.of("gap", "0 mm"));
	}

	/** The yoke's plate widens from the leg to the depth: l·ln(w₂/w₁)/(h(w₂ − w₁)); corners are means of their faces. */
	@Test
	void roundCentreLegHasTheCoreConstantOfItsPieces() {
		double area = Math.PI / 4 * 144e-6;
		double plate = 9e-3 * Math.log(14.0 / 12) / (6.5e-3 * 2e-3);
		double inner = Math.PI / 8 * (area / 2 / 12e-3 + 6.5e-3) / ((area / 2 + 12e-3 * 6.5e-3) / 2);
		double outer = Math.PI / 8 * (6e-3 + 6.5e-3) / ((6e-3 * 14e-3 + 6.5e-3 * 14e-3) / 2);
		double half = 30e-3 / (area / 2) + 2 * plate + 30e-3 / (6e-3 * 14e-3) + 2 * inner + 2 * outer;
		hasCoreConstant(half / 2, "round-centre-leg", 18, Map.of("gap", "0 mm"));
	}

	/**
	 * Pot 26/16 without slots, radii 2.7/5.65/10.7/12.75 mm: 367.8 1/m, 36.3 mm, 98.8 mm² by the standard's formulas; makers
	 * print 37.6 mm and 94 mm² for the slotted one (from memory).
	 */
	@Test
	void potCoreHasTheStandardsCoreConstant() {
		Map<String, String> pot = Map.of("hole", "5.4 mm", "post", "11.3 mm", "inner", "21.4 mm", "outer", "25.5 mm", "windowHeight",
				"11.1 mm", "plate", "2.5 mm", "gap", "0 mm");
		String line = template("pot-core").figures(pot);
		assertTrue(line.contains("0.3678 /mm") && line.contains("36.3 mm") && line.contains("98.8 mm²"), line);
		double r1 = 2.7e-3;
		double r2 = 5.65e-3;
		double r3 = 10.7e-3;
		double r4 = 12.75e-3;
		double h = 2.5e-3;
		double s1 = r2 - Math.sqrt((r1 * r1 + r2 * r2) / 2);
		double s2 = Math.sqrt((r3 * r3 + r4 * r4) / 2) - r3;
		double c1 = 11.1e-3 / (Math.PI * (r2 * r2 - r1 * r1)) + 2 * Math.log(r3 / r2) / (2 * Math.PI * h)
				+ 11.1e-3 / (Math.PI * (r4 * r4 - r3 * r3))
				+ 2 * (Math.PI / 8 * (2 * s1 + h)) / (Math.PI / 2 * (r2 * r2 - r1 * r1 + 2 * r2 * h))
				+ 2 * (Math.PI / 8 * (2 * s2 + h)) / (Math.PI / 2 * (r4 * r4 - r3 * r3 + 2 * r3 * h));
		assertEquals(367.8, c1, 0.05);
		hasCoreConstant(c1, "pot-core", 30, pot);
	}

	/** Cutting takes its share off the wall, the plates and the plates' faces at both corners; the post stays whole. */
	@Test
	void aCutPotCoreHasTheCoreConstantOfWhatIsLeft() {
		double wall = 0.6;
		double r2 = 5.65e-3;
		double r3 = 12e-3;
		double r4 = 14.5e-3;
		double h = 2.5e-3;
		double s1 = r2 - r2 / Math.sqrt(2);
		double s2 = Math.sqrt((r3 * r3 + r4 * r4) / 2) - r3;
		double c1 = 12e-3 / (Math.PI * r2 * r2) + 2 * Math.log(r3 / r2) / (2 * Math.PI * wall * h)
				+ 12e-3 / (Math.PI * wall * (r4 * r4 - r3 * r3))
				+ 2 * (Math.PI / 8 * (2 * s1 + h)) / ((Math.PI * r2 * r2 + 2 * Math.PI * wall * r2 * h) / 2)
				+ 2 * (Math.PI / 8 * (2 * s2 + h)) / (Math.PI / 2 * wall * (r4 * r4 - r3 * r3 + 2 * r3 * h));
		hasCoreConstant(c1, "cut-pot-core", 30, Map.of("gap", "0 mm"));
	}

	/** An inch is 25.4 mm exactly: 473 mil are 12.0142 mm, which a whole number of micrometres is not. */
	@Test
	void dimensionsInMilsKeepAllTheirDigits() {
		double width = 473 * 25.4e-6;
		hasCoreConstant((2 * 30e-3 + 2 * 15e-3) / (width * 15e-3) + 4 * corner(15e-3), "c-core", 24, Map.of("gap", "0 mm", "width", "473 mil"));
		hasCoreConstant(2 * Math.PI / (14.5e-3 * Math.log(787.0 / 472)), "toroid", 48, Map.of("outer", "787 mil", "inner", "472 mil"));
		Design both = template("e-core").build(Map.of("gap", "1 mil", "spacer", "1 mil"));
		assertEquals(50.8e-6, both.getLegs().get(0).getGaps().get(0).getLength().si(), 1e-17);
	}

	@Test
	void aWindingWithoutAnInsideIsRefused() {
		assertTrue(refusal(template("air-coil"), Map.of("build", "60 mm")).startsWith("Build: "));
		assertTrue(template("air-coil").build(Map.of("build", "59 mm")).getLegs().size() == 1);
	}

	@Test
	void cuttingTheWallOfAPotRaisesItsCoreConstant() {
		Map<String, String> closed = Map.of("wall", "1", "gap", "0 mm");
		double whole = smallSignal("cut-pot-core", closed)[0][0];
		assertTrue(smallSignal("cut-pot-core", Map.of("wall", "0.5", "gap", "0 mm"))[0][0] < whole);
	}

	/** Exactly µ₀µN²·h·ln(r_o/r_i)/2π, the ring's closed form, for iron and for air. */
	@Test
	void ringsHaveTheInductanceOfTheirClosedForm() {
		double c1 = 2 * Math.PI / (14.5e-3 * Math.log(20.0 / 12));
		hasCoreConstant(c1, "toroid", 48, Map.of());
		hasCoreConstant(2 * Math.PI / (20e-3 * Math.log(2)), "air-toroid", 120, Map.of());
		assertTrue(template("toroid").figures(Map.of()).contains("ring-inner-edge"));
	}

	/** L = N²/ΣR with a gap whose section is widened by its length on each side; the iron is shorter by the gap. */
	@Test
	void aGapTakesItsLengthOffTheIron() {
		double inductance = smallSignal("c-core", Map.of("gap", "0.8 mm", "turns", "24"))[0][0];
		double iron = (2 * 30e-3 + 2 * 15e-3 - 0.8e-3) / (FERRITE * 150e-6) + 4 * corner(15e-3) / FERRITE;
		double gap = 0.8e-3 / (MU_0 * 10.8e-3 * 15.8e-3);
		assertEquals(24 * 24 / (iron + gap), inductance, SMALL_SIGNAL * inductance);
	}

	/** A spacer between the halves opens the centre leg and both outer legs: like a centre gap of twice its thickness but for fringing. */
	@Test
	void aSpacerOpensEveryLegOnce() {
		double spacer = smallSignal("e-core", Map.of("gap", "0 mm", "spacer", "0.5 mm"))[0][0];
		double ground = smallSignal("e-core", Map.of("gap", "1 mm", "spacer", "0 mm"))[0][0];
		assertEquals(1, spacer / ground, 0.06);
		assertEquals(3, template("e-core").build(Map.of("spacer", "0.5 mm")).getLegs().stream().mapToInt(l -> l.getGaps().size()).sum());
	}

	/** Nagaoka: D 25 mm, l 50 mm, 50 turns: D/l 0.5, 0.8181 (his table, from memory): µ₀N²(π/4)D²/l·0.8181 = 25.24 µH. */
	@Test
	void airSolenoidsHaveTheInductanceOfTheirFormula() {
		assertEquals(MU_0 * 2500 * Math.PI / 4 * 25e-3 * 25e-3 / 50e-3 * 0.818136, smallSignal("air-solenoid", Map.of())[0][0], 1e-10);
		assertEquals(3.15e-5 * 0.03 * 0.03 * 160000 / (6 * 0.03 + 9 * 0.02 + 10 * 0.015), smallSignal("air-coil", Map.of())[0][0], 1e-9);
		assertTrue(Study.of(template("air-coil").build(Map.of())).operatingPoints().get(0).legs().stream()
				.allMatch(leg -> leg.state() == LegState.WITHIN));
	}

	/** µ_app = µ/(1 + N(µ − 1)) with N of a rod 7.5 diameters long: L = µ₀µ_app·N²A/l. */
	@Test
	void aRodHasItsApparentPermeability() {
		double factor = 0.0399 * Math.pow(0.0153 / 0.0399, Math.log(7.5 / 5) / Math.log(2));
		double apparent = 2300 / (1 + factor * 2299);
		assertEquals(MU_0 * apparent * 3600 * Math.PI / 4 * 64e-6 / 60e-3, smallSignal("rod", Map.of())[0][0], 1e-3 * 1e-4);
	}

	@Test
	void toroidKeepsEveryTurnWhenTheyDoNotDivideEvenly() {
		double all = smallSignal("toroid", Map.of("turns", "47"))[0][0];
		double few = smallSignal("toroid", Map.of("turns", "2"))[0][0];
		assertEquals(47.0 * 47 / 4, all / few, 1e-4 * all / few);
	}

	/** The middle leg sees the two outer ones in parallel, an outer leg sees the middle one first. */
	@Test
	void threeLegCoreHasTheInductanceOfEachLegWithItsReturns() {
		double[][] inductance = smallSignal("three-leg-core", Map.of());
		double steel = MU_0 * 4000 * 40e-3 * 60e-3 * 0.96;
		double leg = (160e-3 - 3e-3) / steel + 3e-3 / (MU_0 * 43e-3 * 63e-3);
		double yokes = 2 * 80e-3 / steel;
		double middle = 900 / (leg + (leg + yokes) / 2);
		double outer = 900 / (leg + yokes + 1 / (1 / leg + 1 / (leg + yokes)));
		assertEquals(middle, inductance[1][1], SMALL_SIGNAL * middle);
		assertEquals(outer, inductance[0][0], SMALL_SIGNAL * outer);
		assertEquals(outer, inductance[2][2], SMALL_SIGNAL * outer);
		assertTrue(inductance[0][1] < 0);
	}

	@Test
	void threeLegCoreIsJudgedAtTheCrestOfEachPhaseWithCurrentsThatSumToZero() {
		List<OperatingPointResult> points = Study.of(template("three-leg-core").build(Map.of())).operatingPoints();
		assertEquals(3, points.size());
		for (OperatingPointResult point : points) {
			assertEquals(0, point.windings().stream().mapToDouble(w -> w.current()).sum(), 1e-9);
		}
	}

	private static double[][] smallSignal(String template, Map<String, String> values) {
		Map<String, String> all = new HashMap<>(values);
		all.put("current", "1 µA");
		all.put("ripple", "0 A");
		return Study.of(template(template).build(all)).operatingPoints().get(0).inductance().differential();
	}

	private static String refusal(Template template, Map<String, String> values) {
		return assertThrows(IllegalArgumentException.class, () -> template.build(values)).getMessage();
	}

	private static Template template(String id) {
		return Template.all().stream().filter(t -> t.id().equals(id)).findFirst().orElseThrow();
	}

	private static Design read(byte[] file) throws IOException {
		return DesignReader.read(new ByteArrayInputStream(file), "template.gapwright");
	}

	private interface Check {
		void accept(Template template) throws IOException;
	}

	private static List<DynamicTest> each(Check check) {
		List<DynamicTest> tests = new ArrayList<>();
		for (Template template : Template.all()) {
			tests.add(DynamicTest.dynamicTest(template.id(), () -> check.accept(template)));
		}
		assertEquals(13, tests.size());
		return tests;
	}
}
