package gapwright.report;

/** One cell of comma-separated values: RFC 4180, numbers with full precision, empty where there is none. */
final class CsvCell {

	private CsvCell() {
	}

	static String of(Object value) {
		if (value instanceof Double number) {
			return number.isNaN() ? "" : number.toString();
		}
		String text = value.toString();
		return text.matches("[^\",\r\n]*") ? text : '"' + text.replace("\"", "\"\"") + '"';
	}
}
