package gapwright.study.sweep;

/**
 * What to sweep.
 *
 * @param operatingPoint id; its temperature and the mean currents of all other windings hold
 * @param winding        id of the winding whose current is varied
 * @param from           A
 * @param to             A, another value than from
 * @param steps          ≥ 1, equal; the sweep has one more point
 */
public record SweepRequest(String operatingPoint, String winding, double from, double to, int steps) {

	/** More points than a screen has would only cost time. */
	public static final int MOST_STEPS = 100_000;

	/** @throws IllegalArgumentException naming the value, what was found and what is allowed */
	public SweepRequest {
		if (!Double.isFinite(from) || !Double.isFinite(to) || from == to) {
			throw new IllegalArgumentException("a sweep from " + from + " A to " + to + " A: needs two different currents");
		}
		if (steps < 1 || steps > MOST_STEPS) {
			throw new IllegalArgumentException("steps = " + steps + ": must be from 1 to " + MOST_STEPS);
		}
	}
}
