package gapwright.physics.material;

/** Refuses parameters outside their domain, saying which, what was found and what is allowed. */
final class Domain {

	private Domain() {
	}

	static double above(double bound, String name, double value) {
		if (!(value > bound) || Double.isInfinite(value)) {
			throw new IllegalArgumentException(name + " = " + value + ": must be finite and above " + bound);
		}
		return value;
	}

	static double atLeast(double bound, String name, double value) {
		if (!(value >= bound) || Double.isInfinite(value)) {
			throw new IllegalArgumentException(name + " = " + value + ": must be finite and at least " + bound);
		}
		return value;
	}
}
