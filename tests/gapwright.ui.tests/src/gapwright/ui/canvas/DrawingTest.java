package gapwright.ui.canvas;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.regex.Pattern;

import org.junit.jupiter.api.Test;

import gapwright.library.Example;
import gapwright.library.Examples;
import gapwright.model.Coil;
import gapwright.model.Leg;
import gapwright.model.edit.JointEdits;
import gapwright.model.edit.history.EditHistory;
import gapwright.study.LegResult;
import gapwright.study.LegState;
import gapwright.ui.canvas.looks.CoilLook;
import gapwright.ui.canvas.looks.LegLook;
import gapwright.ui.canvas.looks.Picture;
import gapwright.ui.canvas.looks.PictureMaker;
import gapwright.ui.canvas.looks.Shapes;
import gapwright.ui.canvas.paint.SvgPen;
import gapwright.ui.canvas.scene.Bar;
import gapwright.ui.canvas.scene.Scene;

/** The drawing means what it says: to scale, flux by its width, currents by the right-hand rule. */
class DrawingTest {

	private final Drawn boost = Drawn.example("boost-choke.gapwright");

	private static Leg leg(Drawn drawn, String id) {
		return drawn.design.getLegs().stream().filter(l -> l.getId().equals(id)).findFirst().orElseThrow();
	}

	@Test
	void barsAreToScale() {
		LegLook look = (LegLook) boost.at(1.5).look(leg(boost, "centre-leg"));
		assertEquals(12 * CanvasScale.FULL * 1.5, look.width(), 1e-9);
	}

	@Test
	void theTubesWidthIsTheShareOfSaturation() {
		for (Example example : Examples.all()) {
			Drawn drawn = Drawn.example(example.fileName());
			Picture picture = drawn.at(1);
			for (Leg leg : drawn.design.getLegs()) {
				LegResult found = drawn.result.operatingPoints().get(0).leg(leg.getId());
				LegLook look = (LegLook) picture.look(leg);
				assertEquals(Math.min(1, found.utilisation()) * area(look.outline()), area(look.tube()),
						1e-9 * area(look.outline()), example.fileName() + " " + leg.getId());
			}
		}
	}

	private static double area(double[] polygon) {
		double sum = 0;
		int n = polygon.length;
		for (int i = 0; i < n; i += 2) {
			sum += polygon[i] * polygon[(i + 3) % n] - polygon[(i + 2) % n] * polygon[i + 1];
		}
		return Math.abs(sum) / 2;
	}

	/** The corners are filled: legs stop at the yokes' walls, yokes reach the legs' outer walls. */
	@Test
	void theIronOfAnECoreClosesWithoutHolesOrOverlaps() {
		Scene scene = new Scene(boost.design);
		Bar centre = scene.bar(leg(boost, "centre-leg"));
		Bar left = scene.bar(leg(boost, "left-leg"));
		Bar yoke = scene.bar(leg(boost, "top-yoke-left"));
		assertEquals(yoke.width() / 2, left.start(), 1e-9);
		assertEquals(yoke.width() / 2, centre.length() - centre.end(), 1e-9);
		assertEquals(yoke.length() + left.width() / 2, yoke.end(), 1e-9);
		double iron = 0;
		for (Bar bar : scene.bars()) {
			iron += area(bar.outline(1));
		}
		double wide = 2 * yoke.length() + left.width();
		double high = left.length() + yoke.width();
		double windows = (wide - 2 * left.width() - centre.width()) * (high - 2 * yoke.width());
		assertEquals(wide * high - windows, iron, 1e-6);
	}

	@Test
	void aRingMeetsInMitres() {
		Drawn ring = Drawn.example("output-choke-toroid.gapwright");
		Scene scene = new Scene(ring.design);
		double iron = 0;
		for (Bar bar : scene.bars()) {
			iron += area(bar.outline(1));
		}
		// a regular polygon's ring: mean perimeter times width, exactly
		Bar one = scene.bars().iterator().next();
		assertEquals(12 * one.length() * one.width(), iron, 1e-3 * iron);
	}

	/** Flux goes up in the centre leg: seen from the front the current comes out at the left and goes in at the right. */
	@Test
	void turnsShowTheCurrentByTheRightHandRule() {
		Coil coil = boost.design.getWindings().get(0).getCoils().get(0);
		assertTrue(boost.result.operatingPoints().get(0).leg("centre-leg").flux() > 0);
		Bar centre = new Scene(boost.design).bar(leg(boost, "centre-leg"));
		assertEquals(-1, centre.uy(), 1e-9);
		CoilLook look = (CoilLook) boost.at(1).look(coil);
		double axis = CanvasScale.FULL * centre.x();
		for (int i = 0; i < look.toward().length; i += 2) {
			assertTrue(look.toward()[i] < axis && look.away()[i] > axis);
		}
		assertEquals(2 * coil.getTurns(), look.toward().length);
	}

	@Test
	void statesAreToldApartWithoutColour() {
		Drawn reactor = Drawn.example("three-phase-reactor.gapwright");
		Picture picture = reactor.at(reactor.design.getOperatingPoints().get(4), 0.5);
		assertEquals(LegState.OVER, ((LegLook) picture.look(leg(reactor, "leg-b"))).state());
		SvgPen within = new SvgPen(tone -> "#000000");
		SvgPen over = new SvgPen(tone -> "#000000");
		picture.look(leg(reactor, "leg-a")).paint(within);
		picture.look(leg(reactor, "leg-b")).paint(over);
		String plain = within.document(0, 0, 1, 1, "");
		String loud = over.document(0, 0, 1, 1, "");
		assertEquals(1, count(plain, "fill=\"none\" stroke=\"#000000\" stroke-width=\"1.40\"/>"));
		assertEquals(1, count(loud, "stroke-width=\"2.40\"/>"));
		assertEquals(1, count(loud, "stroke-width=\"1.20\"/>"));
		assertTrue(count(loud, "<polyline") > 10 + count(plain, "<polyline"), "no hatching");
	}

	private static int count(String text, String part) {
		return text.split(Pattern.quote(part), -1).length - 1;
	}

	@Test
	void withoutAResultNothingOfAnOlderOneIsShown() {
		Picture picture = new PictureMaker(boost.design, boost.design.getOperatingPoints().get(0), null,
				CanvasScale.zoom(1), new SvgPen(tone -> "#000000")).make();
		LegLook look = (LegLook) picture.look(leg(boost, "centre-leg"));
		assertNull(look.state());
		assertEquals(0, look.fluxSign());
		assertArrayEquals(new double[0], look.tube());
		picture.labels().values().forEach(label -> label.lines().forEach(
				line -> assertFalse(line.text().contains("%") || line.text().endsWith(" T"), line.text())));
	}

	@Test
	void clicksMeanWhatIsUnderThem() {
		Picture picture = boost.at(1);
		Bar centre = new Scene(boost.design).bar(leg(boost, "centre-leg"));
		double[] quarter = centre.at(0.75 * centre.length(), 3);
		assertTrue(picture.look(centre.leg()).contains(quarter[0] * CanvasScale.FULL, quarter[1] * CanvasScale.FULL));
		assertFalse(picture.look(centre.leg()).contains(0, 0));
		double[] gap = centre.at(0.5 * centre.length(), 0);
		assertTrue(picture.look(centre.leg().getGaps().get(0)).contains(gap[0] * CanvasScale.FULL,
				gap[1] * CanvasScale.FULL));
	}

	@Test
	void theSceneFollowsItsJoints() {
		EditHistory history = new EditHistory();
		Leg left = leg(boost, "left-leg");
		double before = new Scene(boost.design).bar(left).length();
		history.run(JointEdits.move(List.of(left.getFrom()), 0, -5));
		assertEquals(before + 5, new Scene(boost.design).bar(left).length(), 1e-9);
	}

	@Test
	void theGridKeepsLinesApartAtEveryZoom() {
		for (double zoom = 0.1; zoom <= 16; zoom *= 1.1) {
			CanvasScale scale = CanvasScale.zoom(zoom);
			double step = scale.gridMillimetres(24);
			assertTrue(scale.pixels(step) >= 24 && scale.pixels(step) < 24 * 2.6 || step == 0.1, zoom + ": " + step);
		}
		assertEquals(16, CanvasScale.zoom(99).zoom(), 0);
		assertEquals(0.1, CanvasScale.zoom(0.001).zoom(), 1e-12);
		assertArrayEquals(new double[] { 16, 40 }, CanvasScale.zoom(1).pixels(new double[] { 2, 5 }), 0);
		assertTrue(Shapes.overlap(new double[] { 0, 0, 2, 2 }, new double[] { 1, 1, 2, 2 }));
	}
}
