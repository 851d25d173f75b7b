package gapwright.ui.views;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

import gapwright.model.Design;
import gapwright.model.Leg;
import gapwright.study.LegResult;
import gapwright.study.OperatingPointResult;
import gapwright.ui.fields.FeatureText;

/** A leg with what was reckoned for it. Two rows are equal when they are about the same leg. */
record LegRow(Leg leg, LegResult result) {

	/** The rows of an operating point in the design's order. */
	static List<LegRow> of(Design design, OperatingPointResult point) {
		Map<String, LegResult> byId = new HashMap<>();
		point.legs().forEach(leg -> byId.put(leg.id(), leg));
		List<LegRow> rows = new ArrayList<>();
		for (Leg leg : design.getLegs()) {
			LegResult result = byId.get(leg.getId());
			if (result != null) {
				rows.add(new LegRow(leg, result));
			}
		}
		return rows;
	}

	String name() {
		return FeatureText.name(leg);
	}

	String material() {
		return FeatureText.name(leg.getMaterial());
	}

	@Override
	public boolean equals(Object other) {
		return other instanceof LegRow row && row.leg == leg;
	}

	@Override
	public int hashCode() {
		return System.identityHashCode(leg);
	}
}
