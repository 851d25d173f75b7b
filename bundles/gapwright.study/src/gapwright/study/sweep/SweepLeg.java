package gapwright.study.sweep;

/**
 * A leg over a sweep.
 *
 * @param id          of the leg
 * @param fluxDensity T, in the iron, one per point of the sweep; NaN where it did not converge
 * @param saturation  T, at the operating point's temperature; NaN when none is known
 * @param near        T, from which on the leg is near saturation; NaN likewise
 * @param nearAt      A, the swept current of least magnitude at which it is near; NaN when it is not in the range
 * @param overAt      A, likewise for saturation
 */
public record SweepLeg(String id, double[] fluxDensity, double saturation, double near, double nearAt, double overAt) {
}
