package gapwright.ui.fields;

import java.math.BigDecimal;
import java.math.RoundingMode;

import gapwright.model.quantity.Significant;

/**
 * Figures as people read them: three significant digits and a prefix of engineering practice (common practice: exponents that are multiples of three).
 * For display only; what is copied or saved keeps its full precision. A figure that is not a number shows as a dash, never as zero.
 */
public final class FigureFormat {

	/** What stands where there is no figure. */
	public static final String NONE = "–";

	private static final int DIGITS = 3;
	private static final char MINUS = '−';

	private FigureFormat() {
	}

	/**
	 * A figure with its prefix and unit, for example {@code 71.4 µH}.
	 *
	 * @param value in the unit without a prefix; NaN gives {@link #NONE}
	 * @param unit  symbol that takes prefixes, for example {@code H}
	 */
	public static String si(double value, String unit) {
		if (Double.isNaN(value)) {
			return NONE;
		}
		if (value == 0 || Double.isInfinite(value)) {
			return plain(value) + ' ' + unit;
		}
		Significant.Prefixed scaled = Significant.prefixed(value, DIGITS);
		return plain(scaled.figure()) + ' ' + scaled.prefix() + unit;
	}

	/**
	 * A flux density in tesla. Tesla without a prefix down to 1 mT, so that the legs of a core compare at a glance.
	 *
	 * @param tesla T
	 */
	public static String fluxDensity(double tesla) {
		double size = Math.abs(tesla);
		return size >= 1e-3 && size < 1e3 ? plain(tesla) + " T" : si(tesla, "T");
	}

	/** @param metres m; shown in mm from 1 µm to 10 m, as drawings do */
	public static String length(double metres) {
		double size = Math.abs(metres);
		return size >= 1e-6 && size < 10 ? plain(metres * 1e3) + " mm" : si(metres, "m");
	}

	/** @param squareMetres m²; shown in mm² */
	public static String area(double squareMetres) {
		return Double.isNaN(squareMetres) ? NONE : plain(squareMetres * 1e6) + " mm²";
	}

	/** @param ratio 1 = 100 %; whole per cents from 10 %, one decimal below */
	public static String percent(double ratio) {
		if (Double.isNaN(ratio)) {
			return NONE;
		}
		double percent = ratio * 100;
		int decimals = percent == 0 || Math.abs(percent) >= 9.95 ? 0 : 1;
		return signed(new BigDecimal(percent).setScale(decimals, RoundingMode.HALF_EVEN).toPlainString()) + " %";
	}

	/** A plain figure of three significant digits; in powers of ten below a thousandth and from a million. */
	public static String plain(double value) {
		if (Double.isNaN(value)) {
			return NONE;
		}
		if (Double.isInfinite(value)) {
			return value > 0 ? "∞" : MINUS + "∞";
		}
		if (value == 0) {
			return "0";
		}
		return plain(Significant.of(value, DIGITS));
	}

	private static String plain(BigDecimal figure) {
		int exponent = Significant.exponent(figure);
		if (exponent < -3 || exponent >= 6) {
			return signed(figure.movePointLeft(exponent).toPlainString()) + "·10" + superscript(exponent);
		}
		return signed(figure.toPlainString());
	}

	private static String signed(String figure) {
		return figure.charAt(0) == '-' ? MINUS + figure.substring(1) : figure;
	}

	private static String superscript(int exponent) {
		StringBuilder text = new StringBuilder();
		for (char c : Integer.toString(exponent).toCharArray()) {
			text.append(c == '-' ? '⁻' : "⁰¹²³⁴⁵⁶⁷⁸⁹".charAt(c - '0'));
		}
		return text.toString();
	}
}
