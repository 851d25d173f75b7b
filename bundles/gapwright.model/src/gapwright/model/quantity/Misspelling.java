package gapwright.model.quantity;

import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Numbers as other habits write them: not guessed at, but answered with the spelling that is read. */
final class Misspelling {

	private static final String BLANK = "[ \u00A0\u2009\u202F]";
	private static final String REST = "((?:[eE][+-]?\\d+)?)(?![\\d.,])\\s*(.*)";
	private static final Pattern NO_NUMBER = Pattern.compile("[+\u2212-]?(?:nan|inf|infinity|\u221E)(?![a-z]).*",
			Pattern.CASE_INSENSITIVE);
	/** 1,200 or 1'200 or 1 200, then perhaps .5 */
	private static final Pattern GROUPED = Pattern
			.compile("([+\u2212-]?\\d{1,3})((?:(?:,|'|\u2019|" + BLANK + ")\\d{3})+)((?:\\.\\d+)?)" + REST);
	/** 1.200,5 */
	private static final Pattern GROUPED_BY_POINT = Pattern
			.compile("([+\u2212-]?\\d{1,3})((?:\\.\\d{3})+),(\\d+)" + REST);
	private static final Pattern COMMA = Pattern.compile("([+\u2212-]?\\d*),(\\d+)" + REST);
	private static final Pattern GAUGE_BEHIND = Pattern.compile("(-?\\d{1,3})\\s*AWG", Pattern.CASE_INSENSITIVE);

	private Misspelling() {
	}

	/** @return what to tell the user, or null when it is none of these */
	static QuantityFormatException of(String typed, Dimension expected) {
		if (NO_NUMBER.matcher(typed).matches()) {
			return new QuantityFormatException(typed, "not a number", "e.g. " + expected.example());
		}
		Matcher match = GAUGE_BEHIND.matcher(typed);
		if (expected == Dimension.WIRE && match.matches()) {
			return new QuantityFormatException(typed, "the gauge comes first", "write AWG " + match.group(1));
		}
		match = GROUPED.matcher(typed);
		if (match.matches()) {
			String digits = match.group(1) + match.group(2).replaceAll("\\D", "") + match.group(3);
			String tail = tail(match.group(4), match.group(5), expected);
			boolean doubtful = match.group(2).matches(",\\d{3}") && match.group(3).isEmpty();
			String other = match.group(1) + match.group(2).replace(',', '.');
			return doubtful
					? new QuantityFormatException(typed, "a comma is not read in numbers",
							"write " + digits + tail + " or " + other + tail)
					: new QuantityFormatException(typed, "a thousands mark is not read", "write " + digits + tail);
		}
		match = GROUPED_BY_POINT.matcher(typed);
		if (match.matches()) {
			return new QuantityFormatException(typed, "a thousands mark is not read",
					"write " + match.group(1) + match.group(2).replace(".", "") + "." + match.group(3)
							+ tail(match.group(4), match.group(5), expected));
		}
		match = COMMA.matcher(typed);
		if (match.matches()) {
			String whole = match.group(1).matches(".*\\d") ? match.group(1) : match.group(1) + "0";
			return new QuantityFormatException(typed, "a comma is not read in numbers",
					"write " + whole + "." + match.group(2) + tail(match.group(3), match.group(4), expected));
		}
		return null;
	}

	/** The exponent and unit as typed; where the unit is missing too, words that say so. */
	private static String tail(String exponent, String unit, Dimension expected) {
		return exponent + (unit.isEmpty() ? " with a unit, e.g. " + expected.example() : " " + unit);
	}
}
