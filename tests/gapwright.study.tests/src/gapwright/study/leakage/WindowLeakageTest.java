package gapwright.study.leakage;

import static gapwright.physics.material.BhCurve.MU_0;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Set;

import org.junit.jupiter.api.Test;

import gapwright.model.Coil;
import gapwright.model.Design;
import gapwright.model.DesignReader;
import gapwright.model.Ids;
import gapwright.model.Leg;
import gapwright.model.LegGeometry;
import gapwright.model.Winding;
import gapwright.model.edit.LeakageEdits;
import gapwright.model.edit.history.EditHistory;
import gapwright.study.Finding;
import gapwright.study.Study;
import gapwright.study.StudyResult;

class WindowLeakageTest {

	private static final int TURNS = 103;

	/** Two legs of 10 mm × 12 mm, yokes of 8 mm, a window of 30 mm × 40 mm; iron that takes next to no MMF. */
	private static final String U_CORE = """
			<?xml version="1.0" encoding="UTF-8"?>
			<gapwright:Design xmi:version="2.0" xmlns:xmi="http://www.omg.org/XMI" xmlns:xsi="http://www.w3.org/2001/XMLSchema-instance" xmlns:gapwright="urn:gapwright:design:1">
			  <materials id="iron">
			    <curve xsi:type="gapwright:LinearCurve" relativePermeability="1000000.0"/>
			  </materials>
			  <joints id="a" x="0 mm" y="0 mm"/>
			  <joints id="b" x="40 mm" y="0 mm"/>
			  <joints id="c" x="40 mm" y="48 mm"/>
			  <joints id="d" x="0 mm" y="48 mm"/>
			  <legs id="left" from="d" to="a" material="iron" width="10 mm" depth="12 mm"/>
			  <legs id="top" from="a" to="b" material="iron" width="8 mm" depth="12 mm">
			    <gaps id="gap" length="1 mm"/>
			  </legs>
			  <legs id="right" from="b" to="c" material="iron" width="10 mm" depth="12 mm"/>
			  <legs id="bottom" from="c" to="d" material="iron" width="8 mm" depth="12 mm"/>
			  <windings id="main">
			    <coils id="coil" leg="left" turns="103"/>
			  </windings>
			  <operatingPoints id="full" temperature="25 °C">
			    <drives xsi:type="gapwright:CurrentDrive" id="drive" winding="main" current="1 A"/>
			  </operatingPoints>
			</gapwright:Design>
			""";
	private static final double PERMEANCE = MU_0 * 0.040
			* (0.012 / 0.030 + 2 * (0.26 + Math.log(1 + 2 * 0.010 / 0.030) / Math.PI));
	private static final double GAP = MU_0 * 0.008 * 0.012 / 0.001;

	private static Design core(String... changes) {
		String text = U_CORE;
		for (int i = 0; i < changes.length; i += 2) {
			assertTrue(text.contains(changes[i]), changes[i]);
			text = text.replace(changes[i], changes[i + 1]);
		}
		try {
			return DesignReader.read(new ByteArrayInputStream(text.getBytes(StandardCharsets.UTF_8)), "core.gapwright");
		} catch (IOException e) {
			throw new AssertionError(e);
		}
	}

	private static LeakageEstimate estimate(Design design, int pieces) {
		return WindowLeakage.of(design, pieces, List.of());
	}

	/** What the workbench does with an estimate. */
	private static void draw(Design design, LeakageEstimate estimate) {
		new EditHistory().run(LeakageEdits.add(design,
				estimate.cuts().stream().map(c -> new LeakageEdits.Cut(leg(design, c.leg()), c.at(), c.windowFrom(), c.windowTo())).toList(),
				estimate.paths().stream().map(p -> new LeakageEdits.Path(point(design, p.first()), point(design, p.second()),
						p.permeance())).toList()));
	}

	private static Leg leg(Design design, String id) {
		return (Leg) Ids.find(design, id);
	}

	private static LeakageEdits.Point point(Design design, LegPoint point) {
		return new LeakageEdits.Point(leg(design, point.leg()), point.at());
	}

	private static double inductance(Design design) {
		StudyResult result = Study.of(design);
		assertFalse(result.isIncomplete(), () -> result.findings().toString());
		return result.operatingPoint("full").inductance().of("main");
	}

	private static boolean has(StudyResult result, String code) {
		return result.findings().stream().map(Finding::code).anyMatch(code::equals);
	}

	@Test
	void aWindowIsMeasuredBetweenTheIron() {
		FacingLegs window = estimate(core(), 1).windows().get(0);
		assertEquals(0.040, window.window().height(), 1e-12);
		assertEquals(0.030, window.window().distance(), 1e-12);
		assertEquals(0.012, window.window().depth(), 1e-12);
		assertEquals(PERMEANCE, window.window().permeance(), 1e-12 * PERMEANCE);
		assertEquals(1, estimate(core(), 1).windows().size());
	}

	/** MMF rising linearly from nothing at the yoke to all of it at the gap: a third of the permeance, by integration. */
	@Test
	void legsInOnePieceGetAThirdWhereTheMmfIs() {
		Design design = core();
		LeakageEstimate estimate = estimate(design, 1);
		assertEquals(List.of(), estimate.cuts());
		assertEquals(1, estimate.paths().size());
		draw(design, estimate);
		assertEquals(1, inductance(design) / (TURNS * TURNS * (GAP + PERMEANCE / 3)), 1e-3);
		assertTrue(design.getAirPaths().get(0).isLeakage());
		assertEquals(Set.of("a", "b"), Set.of(design.getAirPaths().get(0).getFrom().getId(), design.getAirPaths().get(0).getTo().getId()));
	}

	/** The sum over n rungs is high by 1/(2n²) against the integral. */
	@Test
	void cuttingTheLegsNearsTheThirdFromAbove() {
		for (int pieces : new int[] { 2, 3, 5, 8 }) {
			Design design = core("turns=\"103\"", "turns=\"120\"");
			draw(design, estimate(design, pieces));
			double leakage = inductance(design) / (120 * 120) - GAP;
			assertEquals(PERMEANCE / 3 * (1 + 0.5 / (pieces * pieces)), leakage, 2e-3 * PERMEANCE, pieces + " pieces");
		}
	}

	@Test
	void cutLegsKeepTheirIronTheirTurnsAndTheirInductance() {
		Design design = core("to=\"a\" material=\"iron\"", "to=\"a\" material=\"iron\" pathLength=\"50 mm\"");
		double before = inductance(design);
		LeakageEstimate estimate = estimate(design, 5);
		draw(design, new LeakageEstimate(List.of(), estimate.cuts()));
		assertEquals(4 + 2 * 4, design.getLegs().size());
		assertEquals(4 + 2 * 4, design.getJoints().size());
		assertEquals(before, inductance(design), 1e-6 * before);
		Winding main = design.getWindings().get(0);
		assertEquals(TURNS, main.getCoils().stream().mapToInt(Coil::getTurns).sum());
		assertEquals(5, main.getCoils().size());
		assertTrue(main.getCoils().stream().allMatch(coil -> Math.abs(coil.getTurns() - TURNS / 5.0) < 1));
		double left = design.getLegs().stream().filter(leg -> leg.getPathLength() != null).mapToDouble(LegGeometry::ironLength).sum();
		assertEquals(0.050, left, 5e-6);
	}

	@Test
	void aGapStaysWhereItIs() {
		Design design = core("<legs id=\"right\" from=\"b\" to=\"c\" material=\"iron\" width=\"10 mm\" depth=\"12 mm\"/>",
				"<legs id=\"right\" from=\"b\" to=\"c\" material=\"iron\" width=\"10 mm\" depth=\"12 mm\"><gaps id=\"gap-2\" length=\"2 mm\" position=\"0.7\" fringing=\"CONFORMAL\"/></legs>");
		double before = inductance(design);
		draw(design, new LeakageEstimate(List.of(), estimate(design, 5).cuts()));
		Leg holds = (Leg) Ids.find(design, "gap-2").eContainer();
		assertEquals("right", holds.getId());
		double from = holds.getFrom().getY().si();
		double to = holds.getTo().getY().si();
		assertEquals(0.7 * 0.048, from + holds.getGaps().get(0).getPosition() * (to - from), 2e-6);
		assertEquals(before, inductance(design), 1e-5 * before);
	}

	@Test
	void plainBarsAtBothEndsCallForCutLegs() {
		Design closed = core("<gaps id=\"gap\" length=\"1 mm\"/>", "");
		FacingLegs uncut = estimate(closed, 1).windows().get(0);
		assertEquals(List.of(), uncut.paths());
		assertTrue(uncut.reason().contains("cut"));
		FacingLegs cut = estimate(closed, 5).windows().get(0);
		assertEquals("", cut.reason());
		assertEquals(4, cut.paths().size());
	}

	@Test
	void aGapAtACutIsInTheWayAndSaidSo() {
		Design design = core("<legs id=\"right\" from=\"b\" to=\"c\" material=\"iron\" width=\"10 mm\" depth=\"12 mm\"/>",
				"<legs id=\"right\" from=\"b\" to=\"c\" material=\"iron\" width=\"10 mm\" depth=\"12 mm\"><gaps id=\"gap-2\" length=\"2 mm\"/></legs>");
		LeakageEstimate even = estimate(design, 4);
		assertEquals(List.of(), even.cuts());
		assertTrue(even.windows().get(0).reason().contains("gap-2"), even.windows().get(0).reason());
		assertEquals("", estimate(design, 5).windows().get(0).reason());
	}

	@Test
	void whatIsThereAlreadyIsNotAddedAgain() {
		Design design = core();
		draw(design, estimate(design, 5));
		assertEquals(5, design.getAirPaths().size());
		LeakageEstimate again = estimate(design, 5);
		assertEquals(List.of(), again.paths());
		assertEquals(List.of(), again.cuts());
		assertTrue(again.windows().get(0).reason().contains("already"));
	}

	/** A third leg between two others takes the window apart; outer legs do not face one another through it. */
	@Test
	void onlyNeighboursFaceOneAnother() {
		Design design = core(
				"<legs id=\"top\" from=\"a\" to=\"b\" material=\"iron\" width=\"8 mm\" depth=\"12 mm\">",
				"""
						<legs id="middle" from="e" to="f" material="iron" width="10 mm" depth="12 mm"/>
						<legs id="top-2" from="e" to="b" material="iron" width="8 mm" depth="12 mm"/>
						<legs id="bottom-2" from="f" to="d" material="iron" width="8 mm" depth="12 mm"/>
						<legs id="top" from="a" to="e" material="iron" width="8 mm" depth="12 mm">""",
				"<joints id=\"d\"", "<joints id=\"e\" x=\"20 mm\" y=\"0 mm\"/><joints id=\"f\" x=\"20 mm\" y=\"48 mm\"/><joints id=\"d\"",
				"from=\"c\" to=\"d\"", "from=\"c\" to=\"f\"");
		List<FacingLegs> windows = estimate(design, 1).windows();
		assertEquals(1, windows.size());
		assertEquals(Set.of("left", "middle"), Set.of(windows.get(0).first().get(0), windows.get(0).second().get(0)));
		assertEquals(1, WindowLeakage.of(design, 1, List.of("right", "middle")).windows().size());
		assertEquals(0, WindowLeakage.of(design, 1, List.of("right", "left")).windows().size());
	}

	@Test
	void legsThatNoBarsJoinDoNotFaceOneAnother() {
		assertEquals(List.of(), estimate(core("<legs id=\"bottom\" from=\"c\" to=\"d\" material=\"iron\" width=\"8 mm\" depth=\"12 mm\"/>", ""), 5).windows());
		assertThrows(IllegalArgumentException.class, () -> estimate(core(), 0));
	}

	@Test
	void leakageBesideAConformalGapInTheWoundLegIsFoundToCountTwice() {
		String[] gapped = { "<legs id=\"left\" from=\"d\" to=\"a\" material=\"iron\" width=\"10 mm\" depth=\"12 mm\"/>",
				"<legs id=\"left\" from=\"d\" to=\"a\" material=\"iron\" width=\"10 mm\" depth=\"12 mm\"><gaps id=\"gap-2\" length=\"2 mm\" fringing=\"CONFORMAL\"/></legs>" };
		Design design = core(gapped);
		assertFalse(has(Study.of(design), "leakage-counted-twice"));
		LeakageEstimate estimate = estimate(design, 5);
		assertEquals(List.of("gap-2"), estimate.windows().get(0).countedTwice());
		draw(design, estimate);
		assertTrue(has(Study.of(design), "leakage-counted-twice"));
		Design other = core(gapped[0], gapped[1].replace("CONFORMAL", "WIDENED"));
		draw(other, estimate(other, 5));
		assertFalse(has(Study.of(other), "leakage-counted-twice"));
	}
}
