package gapwright.physics.gap;

/** Cross-section of the poles of a gap, gross: air does not know about laminations. */
public sealed interface Section {

	/** @return m² */
	double area();

	/** @return m; what the length of a gap is judged against */
	double leastSide();

	/**
	 * @param a m, &gt; 0
	 * @param b m, &gt; 0
	 */
	record Rectangular(double a, double b) implements Section {

		/** @throws IllegalArgumentException when a side is not above 0 */
		public Rectangular {
			Positive.check("a", a);
			Positive.check("b", b);
		}

		@Override
		public double area() {
			return a * b;
		}

		@Override
		public double leastSide() {
			return Math.min(a, b);
		}
	}

	/** @param diameter m, &gt; 0 */
	record Round(double diameter) implements Section {

		/** @throws IllegalArgumentException when the diameter is not above 0 */
		public Round {
			Positive.check("diameter", diameter);
		}

		@Override
		public double area() {
			return Math.PI * diameter * diameter / 4;
		}

		@Override
		public double leastSide() {
			return diameter;
		}
	}
}
