package gapwright.study.leakage;

import java.util.List;

/**
 * Air paths for the leakage across the windows of a core; an estimate.
 *
 * @param windows every pair of facing legs, with its paths or the reason for having none
 * @param cuts    to be made before the paths are drawn, at most one for each leg
 */
public record LeakageEstimate(List<FacingLegs> windows, List<LegCut> cuts) {

	/** @return all paths of all windows */
	public List<LeakagePath> paths() {
		return windows.stream().flatMap(window -> window.paths().stream()).toList();
	}
}
