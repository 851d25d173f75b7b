package gapwright.model.quantity;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/**
 * Numbers rounded to significant digits, and scaled to an SI prefix whose power is a multiple of three. The one place
 * where that is done; how a figure is dressed is up to who shows it.
 */
public final class Significant {

	private static final String[] PREFIXES = { "f", "p", "n", "µ", "m", "", "k", "M", "G", "T" };
	private static final int UNITY = 5;

	/**
	 * A figure with its prefix.
	 *
	 * @param figure from 1 to below 1000, unless the prefixes end before, with all its digits, zeros too
	 * @param prefix from f to T, empty for none
	 */
	public record Prefixed(BigDecimal figure, String prefix) {
	}

	private Significant() {
	}

	/**
	 * @param value  finite
	 * @param digits ≥ 1
	 * @return rounded half to even, with all its digits, zeros too: 71.0 for 71 with three; 0 for zero
	 */
	public static BigDecimal of(double value, int digits) {
		BigDecimal figure = new BigDecimal(value).round(new MathContext(digits, RoundingMode.HALF_EVEN));
		int missing = digits - figure.precision();
		return figure.signum() == 0 ? BigDecimal.ZERO : missing > 0 ? figure.setScale(figure.scale() + missing) : figure;
	}

	/** @return power of ten of the first digit; 0 for zero */
	public static int exponent(BigDecimal figure) {
		return figure.signum() == 0 ? 0 : figure.precision() - figure.scale() - 1;
	}

	/**
	 * The prefix is chosen after rounding: 999.7 µ with three digits is 1.00 m, not 1000 µ.
	 *
	 * @param value  finite
	 * @param digits ≥ 1
	 */
	public static Prefixed prefixed(double value, int digits) {
		BigDecimal figure = of(value, digits);
		int prefix = Math.min(PREFIXES.length - 1, Math.max(0, UNITY + Math.floorDiv(exponent(figure), 3)));
		return new Prefixed(figure.scaleByPowerOfTen(3 * (UNITY - prefix)), PREFIXES[prefix]);
	}
}
