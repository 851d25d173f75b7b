package gapwright.study.tolerance;

import java.util.Arrays;
import java.util.Comparator;
import java.util.stream.IntStream;

import gapwright.study.Progress;

/**
 * Least and greatest value of each figure over the corners of the tolerances. Exact where the figure is monotone in each.
 * Beyond {@value #ALL_UP_TO} tolerances those with the most effect on a figure take all signs, the others their worst.
 */
final class Corners {

	static final int ALL_UP_TO = 12;
	/** Each figure has corners of its own then. */
	private static final int CHOSEN = 8;

	final double[] low;
	final double[] high;
	/** Shares at the corner with the least and the greatest value, per figure. */
	final double[][] lowAt;
	final double[][] highAt;

	Corners(PointRun run, double[][] slopes, double[] nominal, Progress progress) {
		int figures = run.figureCount();
		low = nominal.clone();
		high = nominal.clone();
		lowAt = new double[figures][run.deviations().size()];
		highAt = new double[figures][run.deviations().size()];
		int n = run.deviations().size();
		if (n <= ALL_UP_TO) {
			enumerate(run, IntStream.range(0, n).toArray(), new double[n], -1, progress);
			return;
		}
		for (int f = 0; f < figures; f++) {
			double[] slope = slopes[f];
			int[] most = IntStream.range(0, n).boxed().sorted(Comparator.comparingDouble(t -> -Math.abs(slope[t])))
					.limit(CHOSEN).mapToInt(Integer::intValue).toArray();
			for (int sign = -1; sign <= 1; sign += 2) {
				double worse = sign;
				enumerate(run, most, Arrays.stream(slope).map(s -> worse * Math.signum(s)).toArray(), f, progress);
			}
		}
	}

	/** @param only the figure looked at, or −1 for all */
	private void enumerate(PointRun run, int[] varied, double[] others, int only, Progress progress) {
		double[] figures = new double[run.figureCount()];
		double[] shares = others.clone();
		for (int corner = 0; corner < 1 << varied.length; corner++) {
			Cancelling.check(progress);
			for (int i = 0; i < varied.length; i++) {
				shares[varied[i]] = (corner >> i & 1) == 0 ? -1 : 1;
			}
			if (run.figures(shares, figures)) {
				for (int f = only < 0 ? 0 : only; f < (only < 0 ? figures.length : only + 1); f++) {
					if (figures[f] < low[f]) {
						low[f] = figures[f];
						lowAt[f] = shares.clone();
					}
					if (figures[f] > high[f]) {
						high[f] = figures[f];
						highAt[f] = shares.clone();
					}
				}
			}
		}
	}
}
