package gapwright.ui.views;

import java.util.Comparator;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;

/**
 * A column of a ledger.
 *
 * @param key     remembers the width by this name
 * @param title   heading
 * @param unit    unit of {@link #copied}, "" for words; stands in the heading that is copied
 * @param tip     what the column says and where it comes from
 * @param width   px at first
 * @param figures whether the column is set right
 * @param shown   text of a cell
 * @param copied  text of a cell in a spreadsheet: a plain number in the unit, with full precision
 * @param order   ascending
 */
record LedgerColumn<R>(String key, String title, String unit, String tip, int width, boolean figures,
		Function<R, String> shown, Function<R, String> copied, Comparator<R> order) {

	/** A column of words. */
	static <R> LedgerColumn<R> words(String title, String tip, int width, Function<R, String> shown) {
		return new LedgerColumn<>(title, title, "", tip, width, false, shown, shown,
				Comparator.comparing(shown, String.CASE_INSENSITIVE_ORDER));
	}

	/** A column of figures; what is no number sorts last and is copied as an empty cell. */
	static <R> LedgerColumn<R> figures(String title, String unit, String tip, int width, ToDoubleFunction<R> value,
			Function<Double, String> format) {
		return new LedgerColumn<>(title, title, unit, tip, width, true, row -> format.apply(value.applyAsDouble(row)),
				row -> plain(value.applyAsDouble(row)), Comparator.comparingDouble(value));
	}

	private static String plain(double value) {
		return Double.isNaN(value) ? "" : Double.toString(value);
	}

	/** Heading in a copied table, for example "B [T]". */
	String copiedTitle() {
		return unit.isEmpty() ? title : title + " [" + unit + "]";
	}
}
