package gapwright.study;

import java.util.List;

/**
 * Everything computed at one operating point. When it did not converge the lists are empty and the energies NaN: such
 * a result has no numbers.
 *
 * @param id           of the operating point
 * @param converged    whether mean and peaks all converged
 * @param iterations   Newton steps for the mean currents
 * @param fluxResidual largest |Σ flux| at any joint over the largest flux, a ratio
 * @param energy       J; NaN with magnets, where its zero is a convention
 * @param coEnergy     J; NaN with magnets
 * @param legs         in the order of the design, without those that cannot be computed
 * @param gaps         likewise
 * @param airPaths     likewise
 * @param windings     likewise
 * @param inductance   of the windings listed
 * @param leakages     between pairs of windings, in the order of the design, without those that cannot be computed
 * @param connections  of windings, likewise
 */
public record OperatingPointResult(String id, boolean converged, int iterations, double fluxResidual, double energy,
		double coEnergy, List<LegResult> legs, List<GapResult> gaps, List<AirPathResult> airPaths,
		List<WindingResult> windings, InductanceMatrix inductance, List<LeakageResult> leakages,
		List<ConnectionResult> connections) {

	/** A point without leakages and connections. */
	public OperatingPointResult(String id, boolean converged, int iterations, double fluxResidual, double energy,
			double coEnergy, List<LegResult> legs, List<GapResult> gaps, List<AirPathResult> airPaths,
			List<WindingResult> windings, InductanceMatrix inductance) {
		this(id, converged, iterations, fluxResidual, energy, coEnergy, legs, gaps, airPaths, windings, inductance, List.of(),
				List.of());
	}

	/** @return the leg with that id, or null */
	public LegResult leg(String id) {
		return legs.stream().filter(leg -> leg.id().equals(id)).findFirst().orElse(null);
	}

	/** @return the winding with that id, or null */
	public WindingResult winding(String id) {
		return windings.stream().filter(winding -> winding.id().equals(id)).findFirst().orElse(null);
	}
}
