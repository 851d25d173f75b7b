package gapwright.study.tolerance;

/**
 * What to run.
 *
 * @param samples of the Monte Carlo run, 0 for none
 * @param seed    the same seed gives the same samples, whatever the machine
 */
public record ToleranceRequest(int samples, long seed) {

	/** More would resolve nothing a tolerance is known to. */
	public static final int MOST_SAMPLES = 10_000_000;

	/** @throws IllegalArgumentException naming the value, what was found and what is allowed */
	public ToleranceRequest {
		if (samples < 0 || samples > MOST_SAMPLES) {
			throw new IllegalArgumentException("samples = " + samples + ": must be from 0 to " + MOST_SAMPLES);
		}
	}
}
