package gapwright.report;

import java.util.ArrayList;
import java.util.List;

/** Columns of text: the first to the left, the others to the right. */
final class TextTable {

	private final List<String[]> rows = new ArrayList<>();

	TextTable row(String... cells) {
		rows.add(cells);
		return this;
	}

	/** Appends all rows, each with the indent before and a line end after it; nothing when only the head is there. */
	void appendTo(StringBuilder text, String indent) {
		if (rows.size() < 2) {
			return;
		}
		int columns = rows.get(0).length;
		int[] width = new int[columns];
		for (String[] row : rows) {
			for (int c = 0; c < columns; c++) {
				width[c] = Math.max(width[c], row[c].codePointCount(0, row[c].length()));
			}
		}
		for (String[] row : rows) {
			StringBuilder line = new StringBuilder(indent);
			for (int c = 0; c < columns; c++) {
				String pad = " ".repeat(width[c] - row[c].codePointCount(0, row[c].length()));
				line.append(c == 0 ? "" : "  ").append(c == 0 ? row[c] + pad : pad + row[c]);
			}
			text.append(line.toString().stripTrailing()).append('\n');
		}
	}
}
