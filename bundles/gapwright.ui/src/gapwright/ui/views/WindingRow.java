package gapwright.ui.views;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

import gapwright.model.Coil;
import gapwright.model.Design;
import gapwright.model.Winding;
import gapwright.study.InductanceMatrix;
import gapwright.study.OperatingPointResult;
import gapwright.study.WindingResult;
import gapwright.study.tolerance.Band;
import gapwright.study.tolerance.ToleranceResult.PointBands;
import gapwright.ui.fields.FeatureText;

/**
 * A winding with what was reckoned for it. Two rows are equal when they are about the same winding.
 *
 * @param differentialInductance H
 * @param band                   of that inductance, null where tolerances have not been worked out
 */
record WindingRow(Winding winding, WindingResult result, double differentialInductance, Band band) {

	/** The rows of an operating point in the design's order. */
	static List<WindingRow> of(Design design, OperatingPointResult point, PointBands bands) {
		Map<String, WindingResult> byId = new HashMap<>();
		point.windings().forEach(winding -> byId.put(winding.id(), winding));
		List<WindingRow> rows = new ArrayList<>();
		for (Winding winding : design.getWindings()) {
			WindingResult result = byId.get(winding.getId());
			if (result != null) {
				rows.add(new WindingRow(winding, result, own(point.inductance(), winding.getId()),
						bands == null ? null : bands.band(Band.Kind.INDUCTANCE, winding.getId())));
			}
		}
		return rows;
	}

	private static double own(InductanceMatrix matrix, String id) {
		int index = matrix.windings().indexOf(id);
		return index < 0 ? Double.NaN : matrix.differential()[index][index];
	}

	String name() {
		return FeatureText.name(winding);
	}

	double least() {
		return band == null ? Double.NaN : band.cornerLow();
	}

	double greatest() {
		return band == null ? Double.NaN : band.cornerHigh();
	}

	int turns() {
		return winding.getCoils().stream().mapToInt(Coil::getTurns).sum();
	}

	@Override
	public boolean equals(Object other) {
		return other instanceof WindingRow row && row.winding == winding;
	}

	@Override
	public int hashCode() {
		return System.identityHashCode(winding);
	}
}
