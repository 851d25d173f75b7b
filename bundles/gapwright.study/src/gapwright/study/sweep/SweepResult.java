package gapwright.study.sweep;

import java.util.List;

/**
 * Inductance and flux densities against the current of one winding.
 *
 * @param operatingPoint id
 * @param winding        id
 * @param current        A, rising or falling evenly
 * @param linkage        Wb; NaN where it did not converge
 * @param apparent       H, linkage/current, at 0 A the differential one; NaN throughout where another winding carries
 *                       current or a magnet acts
 * @param differential   H, ∂linkage/∂current
 * @param legs           in the order of the design
 */
public record SweepResult(String operatingPoint, String winding, double[] current, double[] linkage, double[] apparent,
		double[] differential, List<SweepLeg> legs) {

	/** @return the leg with that id, or null */
	public SweepLeg leg(String id) {
		return legs.stream().filter(leg -> leg.id().equals(id)).findFirst().orElse(null);
	}
}
