package gapwright.ui.fields;

import java.util.function.Function;

import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;
import gapwright.model.quantity.QuantityFormatException;

/** The kinds of text fields take. Numbers are written with a decimal point whatever the locale, as in the file. */
public final class Entries {

	private Entries() {
	}

	/** @param optional whether the field may be left empty, which gives null */
	public static Entry<Quantity> quantity(Dimension dimension, boolean optional) {
		return new Kind<>(optional, dimension.example(), typed -> {
			try {
				return Quantity.parse(typed, dimension);
			} catch (QuantityFormatException e) {
				throw new Bad(e.getMessage());
			}
		}, Quantity::text);
	}

	public static Entry<Double> number(boolean optional) {
		return new Kind<>(optional, "", Entries::parseNumber, Entries::number);
	}

	public static Entry<Integer> whole(boolean optional) {
		return new Kind<>(optional, "", Entries::parseWhole, value -> value.toString());
	}

	/** Text on one line; empty gives null. */
	public static Entry<String> text() {
		return new Kind<>(true, "", Function.identity(), Function.identity());
	}

	private static Double parseNumber(String typed) {
		if (typed.matches("[+-]?\\d+,\\d+")) {
			throw new Bad("'" + typed + "': write a decimal point, " + typed.replace(',', '.'));
		}
		try {
			double value = Double.parseDouble(typed);
			if (Double.isFinite(value) && typed.matches("[-+.\\deE]+")) {
				return value;
			}
		} catch (NumberFormatException e) {
			// said below, together with what parses but is no figure
		}
		throw new Bad("'" + typed + "' is not a number");
	}

	private static Integer parseWhole(String typed) {
		try {
			return Integer.valueOf(typed);
		} catch (NumberFormatException e) {
			throw new Bad("'" + typed + "' is not a whole number");
		}
	}

	/** Without a needless ".0", which a permeability of 2300 does not want. */
	static String number(Double value) {
		return value == Math.rint(value) && Math.abs(value) < 1e9 ? Long.toString(value.longValue()) : value.toString();
	}

	private static final class Bad extends RuntimeException {
		private static final long serialVersionUID = 1L;

		Bad(String message) {
			super(message);
		}
	}

	private record Kind<T>(boolean optional, String example, Function<String, T> parser, Function<T, String> writer) implements Entry<T> {

		@Override
		public T parse(String typed) throws BadEntryException {
			String text = typed.strip();
			if (text.isEmpty()) {
				if (optional) {
					return null;
				}
				throw new BadEntryException(example.isEmpty() ? "A value is needed here." : "A value is needed here, e.g. " + example);
			}
			try {
				return parser.apply(text);
			} catch (Bad e) {
				throw new BadEntryException(e.getMessage());
			}
		}

		@Override
		public String text(T value) {
			return value == null ? "" : writer.apply(value);
		}
	}
}
