package gapwright.ui.views;

import java.util.List;
import java.util.StringJoiner;

/** A ledger as text for a spreadsheet: columns parted by tabs, lines by line feeds, headings first. */
final class LedgerCopy {

	private LedgerCopy() {
	}

	static <R> String text(List<LedgerColumn<R>> columns, List<R> rows) {
		StringBuilder text = new StringBuilder();
		StringJoiner headings = new StringJoiner("\t", "", "\n");
		columns.forEach(column -> headings.add(cell(column.copiedTitle())));
		text.append(headings);
		for (R row : rows) {
			StringJoiner cells = new StringJoiner("\t", "", "\n");
			columns.forEach(column -> cells.add(cell(column.copied().apply(row))));
			text.append(cells);
		}
		return text.toString();
	}

	/** A tab or a line break in a name would shift all that follows. */
	private static String cell(String text) {
		return text.replaceAll("[\\t\\r\\n]+", " ");
	}
}
