package gapwright.physics.coil;

/** Complete elliptic integrals by the arithmetic-geometric mean. Source: Gauss; textbook. */
record Elliptic(double first, double second) {

	private static final int MOST_STEPS = 40;

	/** @param k modulus, 0 ≤ k &lt; 1 @param complement √(1 − k²), given to keep its digits */
	static Elliptic of(double k, double complement) {
		double a = 1;
		double b = complement;
		double c = k;
		double sum = 0.5 * c * c;
		double power = 0.5;
		for (int i = 0; i < MOST_STEPS && c > 1e-17 * a; i++) {
			double mean = 0.5 * (a + b);
			double root = Math.sqrt(a * b);
			c = 0.5 * (a - b);
			a = mean;
			b = root;
			power *= 2;
			sum += power * c * c;
		}
		double complete = Math.PI / (2 * a);
		return new Elliptic(complete, complete * (1 - sum));
	}
}
