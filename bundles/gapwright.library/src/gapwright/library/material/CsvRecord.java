package gapwright.library.material;

import java.util.List;

/**
 * One line of a comma-separated file.
 *
 * @param line   from 1
 * @param fields at least one
 */
record CsvRecord(int line, List<Field> fields) {

	/**
	 * @param column from 1, where it begins
	 * @param text   stripped of blanks, and of its quotes
	 */
	record Field(int column, String text) {
	}

	String kind() {
		return fields.get(0).text();
	}

	Field field(int index) {
		return fields.get(index);
	}

	int count() {
		return fields.size();
	}

	/** @return column just behind the last field, where one is missing */
	int end() {
		Field last = fields.get(fields.size() - 1);
		return last.column() + last.text().length();
	}
}
