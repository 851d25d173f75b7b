package gapwright.study.vary;

import java.util.Comparator;
import java.util.stream.IntStream;

/**
 * The legs whose utilisation is followed when numbers change: all that can be judged, but of a large design only the
 * fullest, since each costs memory and time of its own.
 */
public final class JudgedLegs {

	/** Up to so many, all are followed. */
	public static final int ALL_UP_TO = 300;
	/** Of more, so many of the fullest. */
	public static final int FULLEST = 50;

	private JudgedLegs() {
	}

	/** @return indices in the network, rising */
	public static int[] of(PointSolver.State state) {
		int[] judged = IntStream.range(0, state.utilisation().length).filter(k -> !Double.isNaN(state.utilisation(k))).toArray();
		return judged.length <= ALL_UP_TO ? judged
				: IntStream.of(judged).boxed().sorted(Comparator.comparingDouble(k -> -state.utilisation(k))).limit(FULLEST)
						.mapToInt(Integer::intValue).sorted().toArray();
	}
}
