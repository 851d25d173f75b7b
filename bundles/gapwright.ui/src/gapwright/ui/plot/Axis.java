package gapwright.ui.plot;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.List;

/**
 * A straight axis.
 *
 * @param title what it measures: "Current"
 * @param unit  SI, "" for a ratio shown in per cent
 * @param from  value at its beginning
 * @param to    value at its end, above from
 */
public record Axis(String title, String unit, double from, double to) {

	private static final int STEPS = 6;
	private static final String[] PREFIXES = { "p", "n", "µ", "m", "", "k", "M", "G" };
	private static final int UNITY = 4;

	/** An axis that ends at round figures and has both values on it. */
	public static Axis round(String title, String unit, double least, double greatest) {
		double low = Math.min(least, greatest);
		double high = Math.max(least, greatest);
		if (!(high > low)) {
			double margin = high == 0 ? 1 : Math.abs(high) * 0.1;
			low -= margin;
			high += margin;
		}
		double step = step(high - low);
		return new Axis(title, unit, Math.floor(low / step + 1e-9) * step, Math.ceil(high / step - 1e-9) * step);
	}

	/** The same axis over another part. */
	public Axis over(double begin, double end) {
		return new Axis(title, unit, begin, end);
	}

	private static double step(double span) {
		double raw = span / STEPS;
		double power = Math.pow(10, Math.floor(Math.log10(raw)));
		for (double factor : new double[] { 1, 2, 2.5, 5 }) {
			if (raw <= factor * power * (1 + 1e-9)) {
				return factor * power;
			}
		}
		return 10 * power;
	}

	/** @return values to draw a line and a figure at */
	List<Double> ticks() {
		double step = step(to - from);
		List<Double> ticks = new ArrayList<>();
		for (double k = Math.ceil(from / step - 1e-9); k * step <= to + 1e-9 * step; k++) {
			ticks.add(k * step);
		}
		return ticks;
	}

	double share(double value) {
		return (value - from) / (to - from);
	}

	double value(double share) {
		return from + share * (to - from);
	}

	private int prefix() {
		double size = Math.max(Math.abs(from), Math.abs(to));
		if (unit.equals("T") && size >= 1e-2) {
			// legs of a core compare at a glance
			return UNITY;
		}
		int exponent = unit.isEmpty() || size == 0 ? 0 : (int) Math.floor(Math.log10(size) / 3 + 1e-9);
		return Math.max(0, Math.min(PREFIXES.length - 1, UNITY + exponent));
	}

	/** @return "Inductance in µH" */
	String heading() {
		return title + (unit.isEmpty() ? " in %" : " in " + PREFIXES[prefix()] + unit);
	}

	/** @return the figure at a tick in the heading's unit */
	String figure(double value) {
		double shown = unit.isEmpty() ? value * 100 : value * Math.pow(1000, UNITY - prefix());
		double least = Math.abs(to - from) * (unit.isEmpty() ? 100 : Math.pow(1000, UNITY - prefix())) * 1e-6;
		BigDecimal rounded = new BigDecimal(shown).round(new MathContext(6));
		return Math.abs(shown) < least ? "0" : rounded.stripTrailingZeros().toPlainString().replace('-', '−');
	}
}
