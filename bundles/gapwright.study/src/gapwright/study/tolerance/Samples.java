package gapwright.study.tolerance;

import java.util.Arrays;

/** Values of one figure over a Monte Carlo run. */
public final class Samples {

	private final double[] sorted;
	private final double mean;
	private final double deviation;

	/** @param values without those that failed; may be empty */
	Samples(double[] values) {
		// summed in the order drawn, so that a seed repeats to the last bit
		double sum = 0;
		for (double value : values) {
			sum += value;
		}
		mean = sum / values.length;
		double squares = 0;
		for (double value : values) {
			squares += (value - mean) * (value - mean);
		}
		deviation = Math.sqrt(squares / Math.max(1, values.length - 1));
		sorted = values;
		Arrays.sort(sorted);
	}

	public int count() {
		return sorted.length;
	}

	public double mean() {
		return mean;
	}

	/** @return standard deviation */
	public double deviation() {
		return deviation;
	}

	/** @return standard error of the mean, σ/√n */
	public double meanError() {
		return deviation / Math.sqrt(sorted.length);
	}

	public double least() {
		return sorted.length == 0 ? Double.NaN : sorted[0];
	}

	public double greatest() {
		return sorted.length == 0 ? Double.NaN : sorted[sorted.length - 1];
	}

	/** @return the value that a share p of all samples lies below, linear between samples; NaN without samples */
	public double quantile(double p) {
		if (sorted.length == 0) {
			return Double.NaN;
		}
		double at = Math.min(Math.max(p, 0), 1) * (sorted.length - 1);
		int below = (int) at;
		int above = Math.min(below + 1, sorted.length - 1);
		return sorted[below] + (at - below) * (sorted[above] - sorted[below]);
	}

	/** @return share of samples at or above a limit */
	public double probabilityFrom(double limit) {
		int at = Arrays.binarySearch(sorted, limit);
		while (at > 0 && sorted[at - 1] == limit) {
			at--;
		}
		int below = at >= 0 ? at : -at - 1;
		return (double) (sorted.length - below) / sorted.length;
	}

	/** @return standard error of such a share, √(p(1 − p)/n) */
	public double probabilityError(double limit) {
		double p = probabilityFrom(limit);
		return Math.sqrt(p * (1 - p) / sorted.length);
	}

	/** @return counts in equal bins from least to greatest */
	public int[] histogram(int bins) {
		int[] counts = new int[bins];
		double width = greatest() - least();
		for (double value : sorted) {
			int bin = width > 0 ? (int) ((value - least()) / width * bins) : bins / 2;
			counts[Math.min(bins - 1, bin)]++;
		}
		return counts;
	}
}
