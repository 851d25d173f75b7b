package gapwright.ui.canvas;

import java.util.HashMap;
import java.util.List;
import java.util.Map;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.jface.window.Window;
import org.eclipse.swt.widgets.Shell;

import gapwright.model.Design;
import gapwright.model.Leg;
import gapwright.model.edit.LeakageEdits;
import gapwright.model.edit.history.Edit;
import gapwright.study.leakage.LeakageEstimate;
import gapwright.study.leakage.LegPoint;
import gapwright.study.leakage.WindowLeakage;

/** Turns an estimate of the leakage across windows into an edit of the design, after showing it. */
final class LeakageDrawing {

	private LeakageDrawing() {
	}

	/**
	 * @param selected two legs or more among these limit it to the windows between them
	 * @return null when it was called off
	 */
	static Edit ask(Design design, List<EObject> selected, Shell shell) {
		List<String> legs = selected.stream().filter(Leg.class::isInstance).map(leg -> ((Leg) leg).getId()).toList();
		LeakageDialog dialog = new LeakageDialog(shell,
				pieces -> WindowLeakage.of(design, pieces, legs.size() > 1 ? legs : List.of()));
		return dialog.open() == Window.OK ? edit(design, dialog.estimate()) : null;
	}

	static Edit edit(Design design, LeakageEstimate estimate) {
		Map<String, Leg> legs = new HashMap<>();
		design.getLegs().forEach(leg -> legs.put(leg.getId(), leg));
		return LeakageEdits.add(design,
				estimate.cuts().stream()
						.map(cut -> new LeakageEdits.Cut(legs.get(cut.leg()), cut.at(), cut.windowFrom(), cut.windowTo())).toList(),
				estimate.paths().stream()
						.map(path -> new LeakageEdits.Path(point(legs, path.first()), point(legs, path.second()), path.permeance())).toList());
	}

	private static LeakageEdits.Point point(Map<String, Leg> legs, LegPoint point) {
		return new LeakageEdits.Point(legs.get(point.leg()), point.at());
	}
}
