package gapwright.study;

import gapwright.model.quantity.Significant;

/** Numbers as they stand in messages. */
final class Figures {

	private static final int DIGITS = 3;

	private Figures() {
	}

	/** @return three significant figures without an exponent: "0.358", "92", "-10" */
	static String of(double value) {
		if (!Double.isFinite(value)) {
			return "?";
		}
		return Significant.of(value, DIGITS).stripTrailingZeros().toPlainString();
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
