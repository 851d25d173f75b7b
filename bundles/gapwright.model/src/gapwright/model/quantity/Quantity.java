package gapwright.model.quantity;

import java.math.BigDecimal;
import java.util.EnumSet;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A physical quantity as somebody typed it, magnitude and unit, with its SI value derived. Immutable; two are equal
 * when their texts and dimensions are, so that nothing of what was typed is lost on a round trip.
 */
public final class Quantity {

	/** Blanks may be those that text processors put between a number and its unit. */
	private static final Pattern NUMBER_AND_UNIT = Pattern.compile(
			"([+\u2212-]?(?:\\d+\\.?\\d*|\\.\\d+)(?:[eE][+-]?\\d{1,3})?)[\\s\u00A0\u2009\u202F]*(.*)");
	private static final Pattern GAUGE = Pattern.compile("AWG\\s*(-?\\d{1,3})", Pattern.CASE_INSENSITIVE);
	/** A longer text is no quantity; reading its digits would only cost time. */
	private static final int MOST_CHARACTERS = 100;
	/** What an amount of deviation may measure. */
	private static final Set<Dimension> DEVIATING = EnumSet.of(Dimension.LENGTH, Dimension.AREA, Dimension.FLUX_DENSITY,
			Dimension.CURRENT);
	private static final int FINEST_GAUGE = 56;
	private static final int COARSEST_GAUGE = -3;

	private final String text;
	private final Dimension dimension;
	private final double si;

	private Quantity(String text, Dimension dimension, double si) {
		this.text = text;
		this.dimension = dimension;
		this.si = si;
	}

	/**
	 * Reads a quantity. A point separates decimals; the unit is never left out; blanks between them are optional.
	 *
	 * @param text     for example "0.5 mm", "20mil", "1.2 cm²", "100 °C"; "AWG 18" where a wire is asked for
	 * @param expected what it must measure; a deviation may be a share or an amount, its dimension is then the amount's
	 * @throws QuantityFormatException saying what was found, why it will not do, and an example of what would
	 */
	public static Quantity parse(String text, Dimension expected) {
		String typed = text.strip();
		if (typed.isEmpty()) {
			throw new QuantityFormatException(text, "empty, expected " + expected.noun(), "e.g. " + expected.example());
		}
		if (typed.length() > MOST_CHARACTERS) {
			throw new QuantityFormatException(typed.substring(0, MOST_CHARACTERS) + "…", "too long for a quantity",
					"e.g. " + expected.example());
		}
		if (expected == Dimension.WIRE) {
			Matcher gauge = GAUGE.matcher(typed);
			if (gauge.matches()) {
				return new Quantity(typed, expected, diameter(typed, Integer.parseInt(gauge.group(1))));
			}
		}
		Matcher parts = NUMBER_AND_UNIT.matcher(typed);
		if (!parts.matches()) {
			refuseMisspelling(typed, expected);
			throw new QuantityFormatException(text, "not a number with a unit", "e.g. " + expected.example());
		}
		if (parts.group(2).isEmpty()) {
			throw new QuantityFormatException(text, expected.noun() + " needs a unit", "e.g. " + expected.example());
		}
		Units.Unit unit = unit(typed, parts.group(2), expected);
		BigDecimal magnitude = new BigDecimal(parts.group(1).replace('\u2212', '-'));
		double si = magnitude.add(unit.offset()).multiply(unit.factor()).doubleValue();
		if (Double.isInfinite(si) || si == 0 && magnitude.add(unit.offset()).signum() != 0) {
			throw new QuantityFormatException(text, "out of the range of numbers", "e.g. " + expected.example());
		}
		return new Quantity(typed, expected == Dimension.DEVIATION ? unit.dimension() : expected, si);
	}

	private static void refuseMisspelling(String typed, Dimension expected) {
		QuantityFormatException misspelt = Misspelling.of(typed, expected);
		if (misspelt != null) {
			throw misspelt;
		}
	}

	private static Units.Unit unit(String text, String name, Dimension expected) {
		Dimension needed = expected == Dimension.WIRE ? Dimension.LENGTH : expected;
		Units.Unit unit = Units.find(name);
		if (unit == null) {
			refuseMisspelling(text, expected);
			String similar = Units.similar(name, needed);
			throw new QuantityFormatException(text, "unknown unit '" + name + "'", similar.isEmpty()
					? "expected " + expected.noun() + ", e.g. " + expected.example() : "did you mean " + similar + "?");
		}
		boolean amount = expected == Dimension.DEVIATION && DEVIATING.contains(unit.dimension());
		if (unit.dimension() != needed && !amount) {
			throw new QuantityFormatException(text, "that is " + unit.dimension().noun(),
					"expected " + expected.noun() + ", e.g. " + expected.example());
		}
		return unit;
	}

	/**
	 * @param magnitude finite; written in its shortest decimal form without an exponent
	 * @param unit      for example "mm"
	 */
	public static Quantity of(double magnitude, String unit, Dimension dimension) {
		if (!Double.isFinite(magnitude)) {
			throw new QuantityFormatException(magnitude + " " + unit, "not a number", "");
		}
		BigDecimal decimal = new BigDecimal(Double.toString(magnitude)).stripTrailingZeros();
		return parse(decimal.toPlainString() + " " + unit, dimension);
	}

	/** Bare diameter of an AWG size, m. Source: ASTM B258, d = 0.005 in · 92^((36 − n)/39); from memory. */
	private static double diameter(String text, int gauge) {
		if (gauge < COARSEST_GAUGE || gauge > FINEST_GAUGE) {
			throw new QuantityFormatException(text, "no such wire gauge",
					"AWG " + COARSEST_GAUGE + " (4/0) to AWG " + FINEST_GAUGE);
		}
		return 0.005 * 0.0254 * Math.pow(92, (36 - gauge) / 39.0);
	}

	/** @return magnitude and unit exactly as typed */
	public String text() {
		return text;
	}

	public Dimension dimension() {
		return dimension;
	}

	/** @return value in {@link Dimension#unit()}, correctly rounded */
	public double si() {
		return si;
	}

	/** @return the unit as typed, "" for a wire gauge */
	public String unit() {
		Matcher parts = NUMBER_AND_UNIT.matcher(text);
		return parts.matches() ? parts.group(2) : "";
	}

	@Override
	public boolean equals(Object other) {
		return other instanceof Quantity quantity && quantity.dimension == dimension && quantity.text.equals(text);
	}

	@Override
	public int hashCode() {
		return text.hashCode();
	}

	@Override
	public String toString() {
		return text;
	}
}
