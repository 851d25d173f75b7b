package gapwright.study.tolerance;

import java.util.List;

import gapwright.study.Finding;

/**
 * What the tolerances of a design do to its figures.
 *
 * @param request  as asked
 * @param points   operating points that could be computed, in the order of the design
 * @param findings doubts about the run
 */
public record ToleranceResult(ToleranceRequest request, List<PointBands> points, List<Finding> findings) {

	/**
	 * @param id     of the operating point
	 * @param bands  differential inductance of every winding, then utilisation of every leg that can be judged
	 * @param failed samples without a solution; they are in no band
	 */
	public record PointBands(String id, List<Band> bands, int failed) {

		/** @return the band of that winding's inductance or leg's utilisation, or null */
		public Band band(Band.Kind kind, String subject) {
			return bands.stream().filter(b -> b.kind() == kind && b.subject().equals(subject)).findFirst().orElse(null);
		}
	}

	/** @return the operating point with that id, or null */
	public PointBands point(String id) {
		return points.stream().filter(point -> point.id().equals(id)).findFirst().orElse(null);
	}
}
