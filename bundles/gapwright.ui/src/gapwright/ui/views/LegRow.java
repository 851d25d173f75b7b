package gapwright.ui.views;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

import gapwright.model.Design;
import gapwright.model.Leg;
import gapwright.study.LegResult;
import gapwright.study.OperatingPointResult;
import gapwright.study.tolerance.Band;
import gapwright.study.tolerance.ToleranceResult.PointBands;
import gapwright.ui.fields.FeatureText;

/**
 * A leg with what was reckoned for it. Two rows are equal when they are about the same leg.
 *
 * @param band of its utilisation, null where tolerances have not been worked out
 */
record LegRow(Leg leg, LegResult result, Band band) {

	/** The rows of an operating point in the design's order. */
	static List<LegRow> of(Design design, OperatingPointResult point, PointBands bands) {
		Map<String, LegResult> byId = new HashMap<>();
		point.legs().forEach(leg -> byId.put(leg.id(), leg));
		List<LegRow> rows = new ArrayList<>();
		for (Leg leg : design.getLegs()) {
			LegResult result = byId.get(leg.getId());
			if (result != null) {
				rows.add(new LegRow(leg, result, bands == null ? null : bands.band(Band.Kind.UTILISATION, leg.getId())));
			}
		}
		return rows;
	}

	String name() {
		return FeatureText.name(leg);
	}

	double least() {
		return band == null ? Double.NaN : band.cornerLow();
	}

	double worst() {
		return band == null ? Double.NaN : band.cornerHigh();
	}

	/** Share of samples at or over saturation; NaN without samples. */
	double overProbability() {
		return band == null || band.samples() == null ? Double.NaN : band.samples().probabilityFrom(1);
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
