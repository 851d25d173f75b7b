package gapwright.ui.canvas;

import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;

import org.eclipse.emf.ecore.EObject;
import org.junit.jupiter.api.Test;

import gapwright.library.Example;
import gapwright.library.Examples;
import gapwright.model.Leg;
import gapwright.model.OperatingPoint;
import gapwright.study.LegResult;
import gapwright.study.LegState;
import gapwright.ui.canvas.looks.CoilLook;
import gapwright.ui.canvas.looks.LabelLook;
import gapwright.ui.canvas.looks.LegLook;
import gapwright.ui.canvas.looks.Look;
import gapwright.ui.canvas.looks.Picture;
import gapwright.ui.canvas.looks.Shapes;

/** Labels at every zoom that the canvas must be readable at, on every example and operating point. */
class LabelsTest {

	private static final double[] ZOOMS = { 0.5, 0.67, 1, 1.5, 2, 3, 4 };

	private interface Check {

		void of(Drawn drawn, OperatingPoint point, Picture picture, String where);
	}

	private static void everywhere(Check check) {
		for (Example example : Examples.all()) {
			Drawn drawn = Drawn.example(example.fileName());
			for (OperatingPoint point : drawn.design.getOperatingPoints()) {
				for (double zoom : ZOOMS) {
					check.of(drawn, point, drawn.at(point, zoom),
							example.fileName() + " at " + point.getId() + ", zoom " + zoom);
				}
			}
		}
	}

	private static List<LabelLook> all(Picture picture) {
		List<LabelLook> labels = new ArrayList<>(picture.labels().values());
		labels.addAll(picture.headings());
		return labels;
	}

	@Test
	void noLabelCoversAnother() {
		everywhere((drawn, point, picture, where) -> {
			List<LabelLook> labels = all(picture);
			for (int i = 0; i < labels.size(); i++) {
				for (int j = 0; j < i; j++) {
					assertFalse(Shapes.overlap(labels.get(i).box(), labels.get(j).box()),
							where + ": " + labels.get(i).lines() + " over " + labels.get(j).lines());
				}
			}
		});
	}

	@Test
	void noLabelLiesOnIronOrTurns() {
		everywhere((drawn, point, picture, where) -> {
			for (LabelLook label : picture.labels().values()) {
				for (EObject element : picture.elements()) {
					Look look = picture.look(element);
					if (look instanceof LegLook leg) {
						assertFalse(touches(leg.outline(), label.box()), where + ": " + label.lines() + " on iron");
					} else if (look instanceof CoilLook coil) {
						for (double[] turn : coil.boxes()) {
							assertFalse(Shapes.overlap(turn, label.box()), where + ": " + label.lines() + " on turns");
						}
					}
				}
			}
		});
	}

	private static boolean touches(double[] outline, double[] box) {
		for (int i = 0; i <= 8; i++) {
			for (int j = 0; j <= 8; j++) {
				if (Shapes.contains(outline, box[0] + box[2] * i / 8, box[1] + box[3] * j / 8, 0)) {
					return true;
				}
			}
		}
		return false;
	}

	/** What is near or over must never be without its words, at any zoom. */
	@Test
	void everyLegNearOrOverHasItsLabelWithABadge() {
		everywhere((drawn, point, picture, where) -> {
			for (Leg leg : drawn.design.getLegs()) {
				LegResult found = drawn.result.operatingPoint(point.getId()).leg(leg.getId());
				if (found.state() == LegState.NEAR || found.state() == LegState.OVER) {
					LabelLook label = picture.labels().get(leg);
					assertTrue(label != null && label.badge() != null, where + ": no label at " + leg.getId());
				}
			}
		});
	}

	@Test
	void everyGapShowsItsLengthAtFullSize() {
		for (Example example : Examples.all()) {
			Drawn drawn = Drawn.example(example.fileName());
			Picture picture = drawn.at(1);
			drawn.design.getLegs().forEach(leg -> leg.getGaps().forEach(gap -> {
				boolean own = picture.labels().containsKey(gap);
				boolean legs = picture.labels().containsKey(leg) && picture.labels().get(leg).lines().stream()
						.anyMatch(line -> line.text().endsWith(gap.getLength().text()));
				assertTrue(own || legs, example.fileName() + ": no length at " + gap.getId());
			}));
		}
	}
}
