package gapwright.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;

import org.junit.jupiter.api.Test;

import gapwright.model.DesignReader;
import gapwright.model.check.Severity;
import gapwright.physics.gap.Fringing;
import gapwright.physics.gap.GapGeometry;
import gapwright.physics.gap.GapGeometry.Place;
import gapwright.physics.gap.Section;

/** What a gap is told about its method and the window beside it: a frame with a clear window of 40 mm beside the leg. */
class GapFindingsTest {

	private static final Section POLE = new Section.Rectangular(0.010, 0.012);
	private static final String SECTION = "width=\"10 mm\" depth=\"12 mm\"";

	private static StudyResult frame(String section, String gap, String yokeDepth) {
		String text = """
				<?xml version="1.0" encoding="UTF-8"?>
				<gapwright:Design xmi:version="2.0" xmlns:xmi="http://www.omg.org/XMI" xmlns:xsi="http://www.w3.org/2001/XMLSchema-instance" xmlns:gapwright="urn:gapwright:design:1">
				  <materials id="iron">
				    <curve xsi:type="gapwright:LinearCurve" relativePermeability="2000.0"/>
				  </materials>
				  <joints id="a" x="0 mm" y="0 mm"/>
				  <joints id="b" x="40 mm" y="0 mm"/>
				  <joints id="c" x="40 mm" y="48 mm"/>
				  <joints id="d" x="0 mm" y="48 mm"/>
				  <legs id="left" from="a" to="d" material="iron" SECTION><gaps id="gap" GAP/></legs>
				  <legs id="top" from="a" to="b" material="iron" width="8 mm" depth="DEPTH_OF_TOP"/>
				  <legs id="right" from="b" to="c" material="iron" width="10 mm" depth="12 mm"/>
				  <legs id="bottom" from="c" to="d" material="iron" width="8 mm" depth="12 mm"/>
				  <windings id="main"><coils id="coil" leg="left" turns="20"/></windings>
				  <operatingPoints id="full" temperature="25 °C">
				    <drives xsi:type="gapwright:CurrentDrive" id="drive" winding="main" current="1 A"/>
				  </operatingPoints>
				</gapwright:Design>
				""".replace("SECTION", section).replace("GAP", gap).replace("DEPTH_OF_TOP", yokeDepth);
		try {
			return Study.of(DesignReader.read(new ByteArrayInputStream(text.getBytes(StandardCharsets.UTF_8)), "frame.gapwright"));
		} catch (IOException e) {
			throw new AssertionError(e);
		}
	}

	private static StudyResult frame(String gap) {
		return frame(SECTION, gap, "12 mm");
	}

	private static Finding find(StudyResult result, String code) {
		return result.findings().stream().filter(f -> f.code().equals(code)).findFirst()
				.orElseThrow(() -> new AssertionError(code + " is not among " + result.findings()));
	}

	private static boolean has(StudyResult result, String code) {
		return result.findings().stream().anyMatch(f -> f.code().equals(code));
	}

	private static double factor(StudyResult result) {
		return result.operatingPoint("full").gaps().get(0).fringingFactor();
	}

	/** Joint distance 48 mm less half of both yokes, 8 mm wide each. */
	@Test
	void theWindowIsTakenFromTheDrawingAndSaidSo() {
		StudyResult drawn = frame("length=\"1 mm\" fringing=\"CONFORMAL\"");
		assertEquals(Severity.NOTE, find(drawn, "gap-window-height-derived").severity());
		assertTrue(find(drawn, "gap-window-height-derived").message().contains("40 mm"));
		assertEquals(Fringing.CONFORMAL.factor(GapGeometry.centred(POLE, 0.001, 1, 0.040)).value(), factor(drawn), 1e-12);
		StudyResult typed = frame("length=\"1 mm\" fringing=\"LOGARITHMIC\" windowHeight=\"20 mm\"");
		assertFalse(has(typed, "gap-window-height-derived"));
		assertEquals(Fringing.LOGARITHMIC.factor(GapGeometry.centred(POLE, 0.001, 1, 0.020)).value(), factor(typed), 1e-12);
	}

	/** 12 mm from joint a along a leg of 48 mm is 8 mm into the window: poles of 7.5 mm and 31.5 mm beside a gap of 1 mm. */
	@Test
	void aGapOffTheMiddleHasPolesOfItsOwnHeights() {
		double expected = Fringing.CONFORMAL.factor(new GapGeometry(POLE, 0.001, 1, Place.WITHIN_LEG, 0.008, 0.032)).value();
		assertEquals(expected, factor(frame("length=\"1 mm\" fringing=\"CONFORMAL\" position=\"0.25\"")), 1e-12);
	}

	@Test
	void aLegOfGivenAreaNeedsTheWindowTypedAndIsTakenAsASquare() {
		StudyResult without = frame("shape=\"GIVEN\" area=\"120 mm²\"", "length=\"1 mm\" fringing=\"CONFORMAL\"", "12 mm");
		assertEquals(Severity.ERROR, find(without, "gap-window-height-missing").severity());
		assertEquals("gap", find(without, "gap-window-height-missing").subject());
		assertTrue(without.isIncomplete());
		StudyResult with = frame("shape=\"GIVEN\" area=\"144 mm²\"", "length=\"1 mm\" fringing=\"CONFORMAL\" windowHeight=\"20 mm\"", "12 mm");
		assertEquals(Severity.NOTE, find(with, "gap-square-assumed").severity());
		assertEquals(Fringing.CONFORMAL.factor(GapGeometry.centred(new Section.Rectangular(0.012, 0.012), 0.001, 1, 0.020)).value(),
				factor(with), 1e-12);
	}

	/** No method is exchanged for another: the finding names the better one, the figure stays that of the method chosen. */
	@Test
	void outsideItsRangeAMethodKeepsItsFigureAndTheFindingNamesABetterOne() {
		StudyResult plain = frame("length=\"1 mm\"");
		assertTrue(find(plain, "gap-method-outside-validity").hint().contains("CONFORMAL"));
		assertEquals(1, factor(plain));
		StudyResult widened = frame("length=\"2 mm\" fringing=\"WIDENED\"");
		assertTrue(find(widened, "gap-method-outside-validity").hint().contains("CONFORMAL"));
		assertEquals((12.0 / 10) * (14.0 / 12), factor(widened), 1e-12);
		StudyResult pieces = frame("length=\"0.5 mm\" pieces=\"3\" fringing=\"LOGARITHMIC\"");
		assertTrue(find(pieces, "gap-method-outside-validity").hint().contains("CONFORMAL"));
		StudyResult refused = frame("length=\"11 mm\" fringing=\"WIDENED\"");
		assertEquals(Severity.ERROR, find(refused, "gap-method-refused").severity());
		assertTrue(refused.isIncomplete());
	}

	@Test
	void polesInTheOpenAreToldThatTheyReadLow() {
		assertEquals(Severity.NOTE, find(frame("length=\"1 mm\" fringing=\"CONFORMAL\" place=\"BETWEEN_POLES\""), "gap-in-open-air").severity());
	}

	/**
	 * Against a yoke as deep as the pole the faces out of the page are those of poles alike; poles of 39 mm, 12 mm deep, 1 mm
	 * apart: 1 + (4/(12π))·(1 + ln(39π/4)) over 1 + (2/(12π))·(1 + ln(39π/2)), by hand 1.4692/1.2714.
	 */
	@Test
	void aYokeNoWiderThanThePoleIsSaidToReadHigh() {
		String gap = "length=\"1 mm\" fringing=\"CONFORMAL\" place=\"AGAINST_YOKE\" position=\"0.1\"";
		Finding note = find(frame(gap), "gap-yoke-not-wider");
		double high = (1 + 4 / (12 * Math.PI) * (1 + Math.log(39 * Math.PI / 4))) / (1 + 2 / (12 * Math.PI) * (1 + Math.log(39 * Math.PI / 2))) - 1;
		assertTrue(note.message().contains(Figures.perCent(high)), note.message());
		assertFalse(has(frame(SECTION, gap, "30 mm"), "gap-yoke-not-wider"));
	}
}
