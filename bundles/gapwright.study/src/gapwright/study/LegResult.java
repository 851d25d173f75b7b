package gapwright.study;

/**
 * A leg at an operating point; flux to mmfDrop at the drives' mean currents.
 *
 * @param id              of the leg
 * @param flux            Wb, positive from → to
 * @param fluxDensity     T, in the iron
 * @param fieldStrength   A/m, in the iron
 * @param mmfDrop         A, of the iron alone
 * @param saturation      T, at the operating point's temperature; NaN when none is known
 * @param peakFluxDensity T, largest |B| over the ripple or voltage swing
 * @param utilisation     peakFluxDensity/saturation, a ratio; NaN when no saturation is known
 * @param state           by utilisation
 */
public record LegResult(String id, double flux, double fluxDensity, double fieldStrength, double mmfDrop,
		double saturation, double peakFluxDensity, double utilisation, LegState state) {
}
