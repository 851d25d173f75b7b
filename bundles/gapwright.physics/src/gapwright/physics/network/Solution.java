package gapwright.physics.network;

/**
 * Fluxes of a network at one excitation. Arrays are in the order of the network's elements and must not be written to;
 * when the solver did not converge every number but the residuals and the count is NaN.
 *
 * @param converged              whether the residuals are within the solver's bounds
 * @param iterations             Newton steps taken
 * @param fluxResidual           largest |Σ flux| at any joint over the largest |flux|, a ratio
 * @param mmfResidual            largest |H·l + R·φ − f| of any leg over the largest MMF, a ratio
 * @param legFlux                Wb, positive from → to
 * @param legFluxDensity         T, in the iron
 * @param legFieldStrength       A/m, in the iron
 * @param legMmfDrop             A, H·l: the iron's alone
 * @param airFlux                Wb, positive from → to
 * @param jointPotential         A; 0 at the first joint of each island
 * @param windingCurrent         A; found where the linkage was imposed
 * @param linkage                Wb, Σ ±turns·flux of each winding
 * @param differentialInductance H, ∂linkage/∂current, windings × windings, symmetric
 * @param energy                 J, Σ current·linkage − co-energy; NaN with magnets, where its zero is a convention
 * @param coEnergy               J; NaN with magnets
 */
public record Solution(boolean converged, int iterations, double fluxResidual, double mmfResidual, double[] legFlux,
		double[] legFluxDensity, double[] legFieldStrength, double[] legMmfDrop, double[] airFlux,
		double[] jointPotential, double[] windingCurrent, double[] linkage, double[][] differentialInductance,
		double energy, double coEnergy) {
}
