package gapwright.report;

import java.math.BigDecimal;
import java.math.RoundingMode;

import gapwright.model.quantity.Significant;

/** Figures for people: a few significant digits and a prefix that keeps them between 1 and 1000. */
public final class Engineering {

	private Engineering() {
	}

	/** @return for example "71.4 µH" with three digits; "–" when there is no number */
	public static String of(double value, String unit, int digits) {
		if (!Double.isFinite(value)) {
			return "–";
		}
		Significant.Prefixed scaled = Significant.prefixed(value, digits);
		return scaled.figure().signum() == 0 ? "0 " + unit : scaled.figure().toPlainString() + " " + scaled.prefix() + unit;
	}

	/** @return for example "92.0 %"; "–" when there is no number */
	public static String perCent(double ratio) {
		return Double.isFinite(ratio)
				? new BigDecimal(ratio * 100).setScale(1, RoundingMode.HALF_EVEN).toPlainString() + " %"
				: "–";
	}
}
