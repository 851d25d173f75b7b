package gapwright.ui.canvas;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;

import org.junit.jupiter.api.Test;

import gapwright.model.Design;
import gapwright.model.GapwrightFactory;
import gapwright.model.Joint;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;

class CanvasScaleTest {

	@Test
	void aMillimetreIsEightPixelsAtFullSizeAndComesBackExactly() {
		CanvasScale full = CanvasScale.zoom(1);
		assertEquals(8, full.pixels(1), 0);
		for (double zoom : new double[] { 0.1, 0.67, 1, 4, 16 }) {
			CanvasScale scale = CanvasScale.zoom(zoom);
			assertEquals(12.34, scale.millimetres(scale.pixels(12.34)), 1e-12);
			assertArrayEquals(new double[] { scale.pixels(1), scale.pixels(-2.5) }, scale.pixels(new double[] { 1, -2.5 }), 0);
		}
	}

	@Test
	void zoomStaysBetweenTenAndSixteenHundredPerCent() {
		assertEquals(0.1, CanvasScale.zoom(0).zoom(), 1e-12);
		assertEquals(16, CanvasScale.zoom(100).zoom(), 1e-12);
	}

	@Test
	void gridLinesAreRoundMillimetresAndNeverCloserThanAsked() {
		for (double zoom = 0.1; zoom <= 16; zoom *= 1.25) {
			CanvasScale scale = CanvasScale.zoom(zoom);
			double step = scale.gridMillimetres(24);
			assertTrue(scale.pixels(step) >= 24, "at " + zoom);
			double decade = Math.pow(10, Math.floor(Math.log10(step) + 1e-9));
			double factor = Math.round(step / decade * 1e6) / 1e6;
			assertTrue(factor == 1 || factor == 2 || factor == 5, step + " mm at " + zoom);
		}
	}

	@Test
	void aPlaceSnapsToTheLineOfAnotherJointBeforeTheGridUnlessHeldOff() {
		Design design = GapwrightFactory.eINSTANCE.createDesign();
		Joint joint = GapwrightFactory.eINSTANCE.createJoint();
		joint.setX(Quantity.of(20.3, "mm", Dimension.LENGTH));
		joint.setY(Quantity.of(5, "mm", Dimension.LENGTH));
		design.getJoints().add(joint);
		CanvasScale scale = CanvasScale.zoom(1);
		assertArrayEquals(new double[] { 20.3, 31 }, Snapping.snap(20.6, 30.8, design, scale, List.of(), false), 1e-12);
		assertArrayEquals(new double[] { 21, 31 }, Snapping.snap(20.6, 30.8, design, scale, List.of(joint), false), 1e-12);
		assertArrayEquals(new double[] { 20.6, 30.8 }, Snapping.snap(20.6, 30.8, design, scale, List.of(), true), 0);
	}
}
