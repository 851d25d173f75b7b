package gapwright.study;

/**
 * A winding at an operating point's mean currents.
 *
 * @param id                 of the winding
 * @param current            A
 * @param linkage            Wb
 * @param apparentInductance H, linkage/current; NaN unless it alone carries current and no magnet acts
 * @param lowestCurrent      A, at one end of the ripple or voltage swing
 * @param highestCurrent     A, at the other end
 * @param inductanceFactor   H per turn², A_L: differential inductance over the square of all its turns
 */
public record WindingResult(String id, double current, double linkage, double apparentInductance, double lowestCurrent,
		double highestCurrent, double inductanceFactor) {

	/** A winding without ripple, its A_L unknown. */
	public WindingResult(String id, double current, double linkage, double apparentInductance) {
		this(id, current, linkage, apparentInductance, current, current, Double.NaN);
	}
}
