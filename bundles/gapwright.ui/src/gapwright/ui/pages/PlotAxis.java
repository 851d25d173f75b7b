package gapwright.ui.pages;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.List;

/**
 * An axis of a plot: from where to where, straight or by decades, and the figures along it.
 *
 * @param symbol what it measures, for example "H"
 * @param unit   of the values, "" for a ratio
 * @param low    where it begins; above 0 when logarithmic
 * @param high   where it ends, above low
 */
record PlotAxis(String symbol, String unit, double low, double high, boolean logarithmic) {

	private static final int STEPS = 6;
	private static final double THOUSAND = 1000;

	/** From 0 to a figure that can be read, a little above the greatest. */
	static PlotAxis linear(String symbol, String unit, double greatest) {
		return new PlotAxis(symbol, unit, 0, PlotRange.round(greatest), false);
	}

	/** Whole decades round both. */
	static PlotAxis decades(String symbol, String unit, double least, double greatest) {
		double from = Math.floor(Math.log10(least) + 1e-9);
		double to = Math.max(from + 1, Math.ceil(Math.log10(greatest) - 1e-9));
		return new PlotAxis(symbol, unit, Math.pow(10, from), Math.pow(10, to), true);
	}

	/** @return 0 where the axis begins, 1 where it ends */
	double share(double value) {
		return logarithmic ? Math.log(value / low) / Math.log(high / low) : (value - low) / (high - low);
	}

	double value(double share) {
		return logarithmic ? low * Math.pow(high / low, share) : low + (high - low) * share;
	}

	/** @return values to draw a line and a figure at */
	List<Double> ticks() {
		List<Double> ticks = new ArrayList<>();
		if (logarithmic) {
			int decades = (int) Math.round(Math.log10(high / low));
			int every = 1 + (decades - 1) / STEPS;
			for (int k = 0; k <= decades; k += every) {
				ticks.add(low * Math.pow(10, k));
			}
			return ticks;
		}
		double step = step();
		for (int k = 0; k * step <= high * (1 + 1e-9); k++) {
			ticks.add(k * step);
		}
		return ticks;
	}

	private double step() {
		double raw = (high - low) / STEPS;
		double power = Math.pow(10, Math.floor(Math.log10(raw)));
		for (double factor : new double[] { 1, 2, 2.5, 5 }) {
			if (raw <= factor * power * (1 + 1e-9)) {
				return factor * power;
			}
		}
		return 10 * power;
	}

	/** @return "H in kA/m" */
	String title() {
		return unit.isEmpty() ? symbol : symbol + " in " + (factor() == THOUSAND ? "k" : "") + unit;
	}

	private double factor() {
		return !unit.isEmpty() && high >= 2 * THOUSAND ? THOUSAND : 1;
	}

	/** @return the figure at a tick, in the unit of the title: "0.25", "1000" */
	String figure(double value) {
		BigDecimal rounded = new BigDecimal(value / factor()).round(new MathContext(6));
		return rounded.signum() == 0 ? "0" : rounded.stripTrailingZeros().toPlainString();
	}
}
