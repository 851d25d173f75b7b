package gapwright.ui.canvas.looks;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;

import org.junit.jupiter.api.Test;

import gapwright.library.Example;
import gapwright.library.Examples;
import gapwright.model.Coil;
import gapwright.model.Design;
import gapwright.model.DesignReader;
import gapwright.model.Leg;
import gapwright.model.OperatingPoint;
import gapwright.model.Winding;
import gapwright.study.LegResult;
import gapwright.study.LegState;
import gapwright.study.OperatingPointResult;
import gapwright.study.Study;
import gapwright.study.StudyResult;
import gapwright.ui.canvas.CanvasScale;
import gapwright.ui.canvas.paint.Pen;
import gapwright.ui.canvas.paint.SvgPen;

/** The looks of the example designs, without a display: what is drawn follows from design and result alone. */
class ExampleLooksTest {

	private static final double[] ZOOMS = { 0.5, 0.67, 1, 1.5, 2, 4 };
	private static final Pen MEASURE = new SvgPen(tone -> "#000000");

	/** A picture of an example at one of its operating points. */
	private record Shown(String name, Design design, OperatingPointResult result, CanvasScale scale, Picture picture) {

		LegLook look(Leg leg) {
			return (LegLook) picture.look(leg);
		}
	}

	private static List<Shown> all(double... zooms) throws Exception {
		List<Shown> shown = new ArrayList<>();
		for (Example example : Examples.all()) {
			Design design = DesignReader.read(example.open(), example.fileName());
			StudyResult study = Study.of(design);
			for (OperatingPoint point : design.getOperatingPoints()) {
				OperatingPointResult result = study.operatingPoints().stream().filter(r -> r.id().equals(point.getId()))
						.findFirst().orElseThrow();
				for (double zoom : zooms) {
					CanvasScale scale = CanvasScale.zoom(zoom);
					shown.add(new Shown(example.fileName() + " " + point.getId() + " at " + zoom, design, result, scale,
							new PictureMaker(design, point, result, scale, MEASURE).make()));
				}
			}
		}
		assertTrue(shown.size() >= 6 * zooms.length, "examples are missing");
		return shown;
	}

	@Test
	void noTwoLabelsOverlapAtAnyZoom() throws Exception {
		for (Shown shown : all(ZOOMS)) {
			List<LabelLook> labels = new ArrayList<>(shown.picture().labels().values());
			labels.addAll(shown.picture().headings());
			for (int i = 0; i < labels.size(); i++) {
				for (int k = i + 1; k < labels.size(); k++) {
					assertFalse(Shapes.overlap(labels.get(i).box(), labels.get(k).box()),
							shown.name() + ": " + labels.get(i).lines() + " over " + labels.get(k).lines());
				}
			}
		}
	}

	@Test
	void noLabelCoversIronOrTurns() throws Exception {
		for (Shown shown : all(ZOOMS)) {
			for (LabelLook label : shown.picture().labels().values()) {
				for (Leg leg : shown.design().getLegs()) {
					double[] box = label.box();
					double x = box[0] + box[2] / 2;
					double y = box[1] + box[3] / 2;
					assertFalse(Shapes.contains(shown.look(leg).outline(), x, y, 0),
							shown.name() + ": " + label.lines() + " on leg " + leg.getId());
				}
				for (Winding winding : shown.design().getWindings()) {
					for (Coil coil : winding.getCoils()) {
						for (double[] turn : ((CoilLook) shown.picture().look(coil)).boxes()) {
							assertFalse(Shapes.overlap(label.box(), turn), shown.name() + ": " + label.lines() + " on a turn");
						}
					}
				}
			}
		}
	}

	@Test
	void everyLegNearOrOverHasItsLabelWithABadgeAtEveryZoom() throws Exception {
		int loud = 0;
		for (Shown shown : all(ZOOMS)) {
			for (Leg leg : shown.design().getLegs()) {
				LegState state = shown.result().leg(leg.getId()).state();
				if (state == LegState.NEAR || state == LegState.OVER) {
					loud++;
					LabelLook label = shown.picture().labels().get(leg);
					assertNotNull(label, shown.name() + ": no label at " + leg.getId());
					assertNotNull(label.badge(), shown.name() + ": no badge at " + leg.getId());
				}
			}
		}
		assertTrue(loud > 0, "no example has a leg near or over");
	}

	@Test
	void theFluxTubeFillsTheShareOfTheBarThatIsUsed() throws Exception {
		for (Shown shown : all(1)) {
			for (Leg leg : shown.design().getLegs()) {
				LegResult result = shown.result().leg(leg.getId());
				LegLook look = shown.look(leg);
				if (result.state() != LegState.UNKNOWN) {
					double share = Math.min(1, result.utilisation());
					assertEquals(share * look.width(), across(look.tube(), look.axis()), 1e-9 * look.width(), shown.name());
				}
				assertEquals((int) Math.signum(result.flux()), look.fluxSign(), shown.name() + " " + leg.getId());
			}
		}
	}

	/** Extent at right angles to the axis. */
	private static double across(double[] polygon, double[] axis) {
		double dx = axis[2] - axis[0];
		double dy = axis[3] - axis[1];
		double length = Math.hypot(dx, dy);
		double least = Double.POSITIVE_INFINITY;
		double most = Double.NEGATIVE_INFINITY;
		for (int i = 0; i < polygon.length; i += 2) {
			double t = (-(polygon[i] - axis[0]) * dy + (polygon[i + 1] - axis[1]) * dx) / length;
			least = Math.min(least, t);
			most = Math.max(most, t);
		}
		return most - least;
	}

	/** Right-hand rule, common practice: with the thumb along the flux, current comes out on the left and goes in on the right of flux that points up. */
	@Test
	void dotsLieOnTheSideThatTheRightHandRuleGives() throws Exception {
		int checked = 0;
		for (Shown shown : all(1)) {
			for (Winding winding : shown.design().getWindings()) {
				double current = shown.result().winding(winding.getId()).current();
				for (Coil coil : winding.getCoils()) {
					CoilLook look = (CoilLook) shown.picture().look(coil);
					if (current != 0) {
						checked++;
						double[] axis = shown.look(coil.getLeg()).axis();
						double sense = Math.signum(current) * (coil.isReversed() ? -1 : 1);
						double fx = sense * (axis[2] - axis[0]);
						double fy = sense * (axis[3] - axis[1]);
						double side = fx * (look.toward()[1] - axis[1]) - fy * (look.toward()[0] - axis[0]);
						assertTrue(side < 0, shown.name() + ": dots of " + coil.getId() + " lie on the wrong side");
					}
				}
			}
		}
		assertTrue(checked > 0);
	}

	@Test
	void everyTurnIsDrawnOnBothSidesToScale() throws Exception {
		for (Shown shown : all(1, 4)) {
			for (Winding winding : shown.design().getWindings()) {
				for (Coil coil : winding.getCoils()) {
					CoilLook look = (CoilLook) shown.picture().look(coil);
					assertEquals(coil.getTurns(), look.toward().length / 2, shown.name());
					assertEquals(coil.getTurns(), look.away().length / 2, shown.name());
				}
			}
		}
	}

	@Test
	void withoutAResultNothingOfAnOlderOneIsShown() throws Exception {
		for (Example example : Examples.all()) {
			Design design = DesignReader.read(example.open(), example.fileName());
			OperatingPoint point = design.getOperatingPoints().get(0);
			Picture picture = new PictureMaker(design, point, null, CanvasScale.zoom(1), MEASURE).make();
			for (Leg leg : design.getLegs()) {
				LegLook look = (LegLook) picture.look(leg);
				assertEquals(0, look.tube().length);
				assertEquals(0, look.fluxSign());
			}
			picture.labels().values().forEach(label -> label.lines()
					.forEach(line -> assertFalse(line.text().contains("%"), line.text())));
		}
	}
}
