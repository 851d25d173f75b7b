package gapwright.report;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** Figures for people: a few significant digits and a prefix that keeps them between 1 and 1000. */
public final class Engineering {

	private static final String[] PREFIXES = { "f", "p", "n", "µ", "m", "", "k", "M", "G" };
	private static final int UNIT = 5;

	private Engineering() {
	}

	/** @return for example "71.4 µH" with three digits; "–" when there is no number */
	public static String of(double value, String unit, int digits) {
		if (!Double.isFinite(value)) {
			return "–";
		}
		BigDecimal rounded = new BigDecimal(value).round(new MathContext(digits, RoundingMode.HALF_EVEN));
		if (rounded.signum() == 0) {
			return "0 " + unit;
		}
		int exponent = rounded.precision() - rounded.scale() - 1;
		int step = Math.max(-UNIT, Math.min(PREFIXES.length - 1 - UNIT, Math.floorDiv(exponent, 3)));
		BigDecimal scaled = rounded.scaleByPowerOfTen(-3 * step);
		int decimals = Math.max(0, digits - 1 - (exponent - 3 * step));
		return scaled.setScale(decimals, RoundingMode.HALF_EVEN).toPlainString() + " " + PREFIXES[step + UNIT] + unit;
	}

	/** @return for example "92.0 %"; "–" when there is no number */
	public static String perCent(double ratio) {
		return Double.isFinite(ratio)
				? new BigDecimal(ratio * 100).setScale(1, RoundingMode.HALF_EVEN).toPlainString() + " %"
				: "–";
	}
}
