package gapwright.study.sweep;

/**
 * A leg over a sweep.
 *
 * @param id          of the leg
 * @param fluxDensity T, in the iron, one per point of the sweep; NaN where it did not converge
 * @param saturation  T, at the operating point's temperature; NaN when none is known
 * @param near        T, from which on the leg is near saturation; NaN likewise
 * @param nearAt      A, the swept current of least magnitude at which it is near; NaN when it is not in the range
 * @param overAt      A, likewise for saturation; of a design with more than 300 legs both are exact for the 50 fullest and
 *                    on a straight line between the points of the sweep for the others
 */
public record SweepLeg(String id, double[] fluxDensity, double saturation, double near, double nearAt, double overAt) {
}
