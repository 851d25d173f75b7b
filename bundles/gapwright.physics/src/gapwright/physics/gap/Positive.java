package gapwright.physics.gap;

/** Refuses sizes that are not above zero. */
final class Positive {

	private Positive() {
	}

	static double check(String name, double metres) {
		if (!(metres > 0) || Double.isInfinite(metres)) {
			throw new IllegalArgumentException(name + " = " + metres + " m: must be finite and above 0 m");
		}
		return metres;
	}
}
