package gapwright.study;

import java.math.BigDecimal;
import java.math.MathContext;

/** Numbers as they stand in messages. */
final class Figures {

	private static final MathContext THREE = new MathContext(3);

	private Figures() {
	}

	/** @return three significant figures without an exponent: "0.358", "92", "-10" */
	static String of(double value) {
		if (!Double.isFinite(value)) {
			return "?";
		}
		BigDecimal rounded = new BigDecimal(value).round(THREE);
		return (rounded.signum() == 0 ? BigDecimal.ZERO : rounded.stripTrailingZeros()).toPlainString();
	}

	/** @return "92 %" */
	static String perCent(double ratio) {
		return of(ratio * 100) + " %";
	}

	/** @return "0.8 mm" */
	static String millimetres(double metres) {
		return of(metres * 1e3) + " mm";
	}
}
