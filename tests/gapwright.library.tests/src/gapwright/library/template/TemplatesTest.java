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
import gapwright.model.check.DesignCheck;
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

	/** L = N²/ΣR: four bars in series with the gap, whose section is widened by its length on each side. */
	@Test
	void cCoreHasTheInductanceOfTheSeriesPath() {
		double inductance = smallSignal("c-core", Map.of("gap", "0.8 mm", "turns", "24"))[0][0];
		double iron = (2 * 40e-3 + 2 * 25e-3 - 0.8e-3) / (FERRITE * 10e-3 * 15e-3);
		double gap = 0.8e-3 / (MU_0 * 10.8e-3 * 15.8e-3);
		assertEquals(24 * 24 / (iron + gap), inductance, SMALL_SIGNAL * inductance);
	}

	/** The two outer paths are in parallel. */
	@Test
	void eCoreHasTheInductanceOfItsParallelPaths() {
		double inductance = smallSignal("e-core", Map.of())[0][0];
		double gap = 1.1e-3 / (MU_0 * 13.1e-3 * 16.1e-3);
		double centre = (38e-3 - 1.1e-3) / (FERRITE * 12e-3 * 15e-3);
		double outer = (2 * 18e-3 + 38e-3) / (FERRITE * 6e-3 * 15e-3);
		assertEquals(18 * 18 / (gap + centre + outer / 2), inductance, SMALL_SIGNAL * inductance);
	}

	@Test
	void eCoreWithoutGapHasTheInductanceOfItsIronAlone() {
		double inductance = smallSignal("e-core", Map.of("gap", "0 mm"))[0][0];
		double centre = 38e-3 / (FERRITE * 12e-3 * 15e-3);
		double outer = (2 * 18e-3 + 38e-3) / (FERRITE * 6e-3 * 15e-3);
		assertEquals(18 * 18 / (centre + outer / 2), inductance, SMALL_SIGNAL * inductance);
	}

	/**
	 * The mean path is exact in the drawing; the ring's own inductance µ0·µ·N²·h·ln(ro/ri)/2π (elementary, IEC 60205
	 * gives the same) is some two per cent higher, since flux crowds towards the inside.
	 */
	@Test
	void toroidHasTheInductanceOfItsMeanPathAndNearlyThatOfTheRing() {
		double inductance = smallSignal("toroid", Map.of())[0][0];
		double permeability = MU_0 * 60;
		double meanPath = permeability * 48 * 48 * 8e-3 * 14.5e-3 / (Math.PI * 32e-3);
		double ring = permeability * 48 * 48 * 14.5e-3 * Math.log(20.0 / 12) / (2 * Math.PI);
		assertEquals(meanPath, inductance, SMALL_SIGNAL * inductance);
		assertEquals(ring, inductance, 0.03 * ring);
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
		assertEquals(5, tests.size());
		return tests;
	}
}
