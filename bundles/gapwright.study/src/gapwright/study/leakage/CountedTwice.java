package gapwright.study.leakage;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;

import gapwright.model.AirPath;
import gapwright.model.Coil;
import gapwright.model.Design;
import gapwright.model.Fringing;
import gapwright.model.Gap;
import gapwright.model.GapPlace;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.Winding;

/**
 * Finds windows whose field is reckoned twice: by a conformal gap in a wound leg, whose poles' sides reach to the ends of
 * the window, and by air paths across the same window.
 */
public final class CountedTwice {

	private CountedTwice() {
	}

	/** @return to each such gap the air paths beside it */
	public static Map<Gap, List<AirPath>> of(Design design) {
		Map<Gap, List<AirPath>> found = new LinkedHashMap<>();
		if (design.getAirPaths().isEmpty()) {
			return found;
		}
		Set<Leg> wound = woundLegs(design);
		Map<Joint, List<AirPath>> paths = new HashMap<>();
		for (AirPath path : design.getAirPaths()) {
			paths.computeIfAbsent(path.getFrom(), key -> new ArrayList<>()).add(path);
			paths.computeIfAbsent(path.getTo(), key -> new ArrayList<>()).add(path);
		}
		for (Column column : Column.of(design)) {
			List<AirPath> beside = null;
			for (Gap gap : gaps(column, wound)) {
				beside = beside == null ? beside(column, paths) : beside;
				if (!beside.isEmpty()) {
					found.put(gap, beside);
				}
			}
		}
		return found;
	}

	/** At an inner joint of the column any path crosses its window; at its ends only one that says it is leakage. */
	private static List<AirPath> beside(Column column, Map<Joint, List<AirPath>> paths) {
		Set<AirPath> beside = new HashSet<>();
		List<AirPath> ordered = new ArrayList<>();
		for (int j = 0; j < column.joints.size(); j++) {
			boolean end = j == 0 || j == column.joints.size() - 1;
			for (AirPath path : paths.getOrDefault(column.joints.get(j), List.of())) {
				if ((!end || path.isLeakage()) && beside.add(path)) {
					ordered.add(path);
				}
			}
		}
		return ordered;
	}

	/** @return gaps of a column that reckon the field of the window beside them, when a coil makes that field */
	static List<Gap> gaps(Column column, Set<Leg> wound) {
		List<Gap> gaps = new ArrayList<>();
		if (column.legs.stream().anyMatch(wound::contains)) {
			for (Leg leg : column.legs) {
				for (Gap gap : leg.getGaps()) {
					if (gap.getFringing() == Fringing.CONFORMAL && gap.getPlace() != GapPlace.BETWEEN_POLES) {
						gaps.add(gap);
					}
				}
			}
		}
		return gaps;
	}

	static Set<Leg> woundLegs(Design design) {
		Set<Leg> wound = new HashSet<>();
		for (Winding winding : design.getWindings()) {
			for (Coil coil : winding.getCoils()) {
				wound.add(coil.getLeg());
			}
		}
		return wound;
	}
}
