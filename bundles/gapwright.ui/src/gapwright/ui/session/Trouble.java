package gapwright.ui.session;

import java.util.List;

import gapwright.study.Finding;
import gapwright.study.OperatingPointResult;
import gapwright.model.check.Severity;

/** Puts into words why a design has no figures at the chosen operating point. */
final class Trouble {

	private Trouble() {
	}

	static String of(DesignSession session) {
		if (session.design().getLegs().isEmpty()) {
			return "This design has no leg yet. Draw joints and legs on the canvas.";
		}
		if (session.operatingPoint() == null) {
			return "This design has no operating point, so nothing is computed. Add one on the Operating points page.";
		}
		if (session.result() == null) {
			return "Computing…";
		}
		OperatingPointResult point = session.pointResult();
		if (point != null && point.converged()) {
			return "";
		}
		List<Finding> errors = session.result().findings().stream().filter(finding -> finding.severity() == Severity.ERROR).toList();
		if (errors.isEmpty()) {
			return "This operating point did not converge, so there are no figures.";
		}
		Finding first = errors.get(0);
		String more = errors.size() > 1 ? " (and " + (errors.size() - 1) + " more, see Problems)" : "";
		return "No figures: " + first.message() + more;
	}
}
