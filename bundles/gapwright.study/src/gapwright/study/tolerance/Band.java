package gapwright.study.tolerance;

/**
 * Where a figure may lie. Inductances in H, utilisations as ratios.
 *
 * @param kind       what figure
 * @param subject    id of the winding or leg
 * @param nominal    all values as drawn
 * @param firstOrder greatest deviation to either side by the slopes at the nominal: Σ|∂y/∂p|·δ, all at their worst
 * @param rootSum    √Σ(∂y/∂p·δ)², independent deviations
 * @param cornerLow  least value over all corners of the tolerances
 * @param cornerHigh greatest
 * @param samples    of the Monte Carlo run, null without one
 */
public record Band(Kind kind, String subject, double nominal, double firstOrder, double rootSum, double cornerLow,
		double cornerHigh, Samples samples) {

	/** What a band is of. */
	public enum Kind {
		/** H, differential, of a winding. */
		INDUCTANCE,
		/** Ratio of peak flux density to saturation, of a leg. */
		UTILISATION
	}
}
