package gapwright.ui.editor;

import java.util.Comparator;
import java.util.Locale;

import gapwright.model.Leg;
import gapwright.study.LegResult;
import gapwright.study.LegState;
import gapwright.study.OperatingPointResult;
import gapwright.ui.fields.FeatureText;
import gapwright.ui.fields.FigureFormat;
import gapwright.ui.session.DesignSession;

/** How the design fares at the chosen operating point, in one line. */
final class PointSummary {

	private PointSummary() {
	}

	static String of(DesignSession session) {
		String trouble = session.trouble();
		if (!trouble.isEmpty()) {
			return trouble;
		}
		OperatingPointResult point = session.pointResult();
		long over = count(point, LegState.OVER);
		long near = count(point, LegState.NEAR);
		LegResult fullest = point.legs().stream().filter(leg -> !Double.isNaN(leg.utilisation()))
				.max(Comparator.comparingDouble(LegResult::utilisation)).orElse(null);
		if (fullest == null) {
			return "No leg can be judged: its material states no saturation.";
		}
		String name = session.design().getLegs().stream().filter(leg -> fullest.id().equals(leg.getId())).findFirst()
				.map((Leg leg) -> FeatureText.name(leg)).orElse(fullest.id());
		String counts = over + near == 0 ? "All legs within" : (over > 0 ? over + " over" : "") + (over > 0 && near > 0 ? ", " : "") + (near > 0 ? near + " near" : "");
		return counts + ".  Fullest: " + name + ", " + FigureFormat.percent(fullest.utilisation()) + " of "
				+ FigureFormat.fluxDensity(fullest.saturation()) + " (" + fullest.state().name().toLowerCase(Locale.ROOT) + ")";
	}

	private static long count(OperatingPointResult point, LegState state) {
		return point.legs().stream().filter(leg -> leg.state() == state).count();
	}
}
