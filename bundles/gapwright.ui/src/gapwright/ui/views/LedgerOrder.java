package gapwright.ui.views;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** The order of a ledger's rows: by one column, up or down, or as in the design; ties stay as in the design. */
final class LedgerOrder<R> {

	private LedgerColumn<R> column;
	private boolean descending;

	/** A heading was clicked: first up, then down, then as in the design. */
	void next(LedgerColumn<R> clicked) {
		if (column != clicked) {
			column = clicked;
			descending = false;
		} else if (!descending) {
			descending = true;
		} else {
			column = null;
		}
	}

	LedgerColumn<R> column() {
		return column;
	}

	boolean descending() {
		return descending;
	}

	List<R> sorted(List<R> rows) {
		List<R> sorted = new ArrayList<>(rows);
		if (column != null) {
			Comparator<R> order = column.order();
			sorted.sort(descending ? order.reversed() : order);
		}
		return sorted;
	}
}
