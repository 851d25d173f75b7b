package gapwright.study.tolerance;

import java.util.Arrays;
import java.util.SplittableRandom;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.stream.IntStream;

import gapwright.study.Progress;
import gapwright.study.vary.DesignNumbers;

/**
 * Draws samples in blocks, each with a generator of its own, so that the outcome depends on the seed alone and not on how
 * many threads share the work.
 */
final class MonteCarlo {

	private static final int BLOCK = 500;
	/** Figures × samples; NaN where a sample has no solution. */
	final double[][] values;
	final int failed;

	MonteCarlo(PointRun run, ToleranceRequest request, Progress progress) {
		values = new double[run.figureCount()][request.samples()];
		int blocks = (request.samples() + BLOCK - 1) / BLOCK;
		SplittableRandom whole = new SplittableRandom(request.seed());
		// split one after another, so that each block's generator is the same on any number of threads
		SplittableRandom[] random = new SplittableRandom[blocks];
		Arrays.setAll(random, block -> whole.split());
		AtomicInteger done = new AtomicInteger();
		AtomicInteger failures = new AtomicInteger();
		IntStream.range(0, blocks).parallel().forEach(block -> {
			if (!progress.cancelled()) {
				failures.addAndGet(block(run, request, block, random[block]));
				int count = done.incrementAndGet();
				synchronized (this) {
					progress.done((double) count / blocks);
				}
			}
		});
		Cancelling.check(progress);
		failed = failures.get();
	}

	private int block(PointRun run, ToleranceRequest request, int block, SplittableRandom random) {
		double[] figures = new double[values.length];
		DesignNumbers numbers = run.numbers(new double[run.deviations().size()]);
		int failures = 0;
		for (int i = block * BLOCK; i < Math.min(request.samples(), (block + 1) * BLOCK); i++) {
			for (Deviation deviation : run.deviations()) {
				deviation.apply(numbers, Draw.share(random, deviation.isNormal()));
			}
			boolean solved = run.figures(numbers, figures);
			failures += solved ? 0 : 1;
			for (int f = 0; f < figures.length; f++) {
				values[f][i] = solved ? figures[f] : Double.NaN;
			}
		}
		return failures;
	}

	Samples samples(int figure) {
		return new Samples(Arrays.stream(values[figure]).filter(v -> !Double.isNaN(v)).toArray());
	}
}
