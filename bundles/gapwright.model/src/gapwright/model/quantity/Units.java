package gapwright.model.quantity;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.HashMap;
import java.util.Map;
import java.util.regex.Pattern;
import java.util.stream.Collectors;

/**
 * The units a quantity may be typed in. A table of our own rather than a units library: a design file uses a dozen
 * dimensions, must keep the unit exactly as typed, and the command line reads hundreds of quantities within
 * milliseconds of its start.
 */
final class Units {

	/** SI value = (magnitude + offset)·factor. */
	record Unit(Dimension dimension, BigDecimal factor, BigDecimal offset) {
	}

	private static final Map<String, Unit> UNITS = new HashMap<>();
	private static final String[] PREFIXES = { "f", "p", "n", "µ", "m", "", "k", "M", "G", "T" };
	private static final int[] EXPONENTS = { -15, -12, -9, -6, -3, 0, 3, 6, 9, 12 };
	private static final BigDecimal PI = new BigDecimal("3.14159265358979323846264338327950288");

	/** "kg / m³", "deg C"; but "m m" is no unit. */
	private static final Pattern BLANKS_INSIDE = Pattern.compile("\\s*(/)\\s*|(?<=deg|°)()\\s+");

	static {
		prefixed(Dimension.LENGTH, "m", 1);
		add(Dimension.LENGTH, "cm", "1e-2");
		add(Dimension.LENGTH, "dm", "1e-1");
		add(Dimension.LENGTH, "in", "0.0254");
		add(Dimension.LENGTH, "inch", "0.0254");
		add(Dimension.LENGTH, "mil", "0.0000254");
		prefixed(Dimension.AREA, "m²", 2);
		add(Dimension.AREA, "cm²", "1e-4");
		add(Dimension.AREA, "dm²", "1e-2");
		add(Dimension.AREA, "in²", "0.00064516");
		prefixed(Dimension.FLUX_DENSITY, "T", 1);
		add(Dimension.FLUX_DENSITY, "G", "1e-4");
		add(Dimension.FLUX_DENSITY, "kG", "1e-1");
		add(Dimension.FLUX_DENSITY, "Vs/m²", "1");
		add(Dimension.FLUX_DENSITY, "Wb/m²", "1");
		prefixed(Dimension.FIELD_STRENGTH, "A/m", 1);
		add(Dimension.FIELD_STRENGTH, "A/cm", "1e2");
		add(Dimension.FIELD_STRENGTH, "A/mm", "1e3");
		BigDecimal oersted = new BigDecimal(1000).divide(PI.multiply(new BigDecimal(4)), MathContext.DECIMAL128);
		UNITS.put("Oe", new Unit(Dimension.FIELD_STRENGTH, oersted, BigDecimal.ZERO));
		UNITS.put("kOe", new Unit(Dimension.FIELD_STRENGTH, oersted.scaleByPowerOfTen(3), BigDecimal.ZERO));
		prefixed(Dimension.CURRENT, "A", 1);
		prefixed(Dimension.VOLTAGE, "V", 1);
		prefixed(Dimension.TIME, "s", 1);
		add(Dimension.TIME, "min", "60");
		add(Dimension.TIME, "h", "3600");
		add(Dimension.TEMPERATURE, "°C", "1");
		add(Dimension.TEMPERATURE, "degC", "1");
		UNITS.put("K", new Unit(Dimension.TEMPERATURE, BigDecimal.ONE, new BigDecimal("-273.15")));
		prefixed(Dimension.FREQUENCY, "Hz", 1);
		prefixed(Dimension.RESISTANCE, "Ω", 1);
		prefixed(Dimension.RESISTANCE, "ohm", 1);
		prefixed(Dimension.PERMEANCE, "H", 1);
		add(Dimension.PERMEANCE, "Wb/A", "1");
		add(Dimension.DENSITY, "kg/m³", "1");
		add(Dimension.DENSITY, "g/cm³", "1000");
		add(Dimension.DENSITY, "kg/dm³", "1000");
		add(Dimension.DEVIATION, "%", "0.01");
		add(Dimension.DEVIATION, "‰", "0.001");
	}

	private Units() {
	}

	/** @return the unit, or null when there is none of that name; look-alike spellings are understood */
	static Unit find(String name) {
		Unit unit = UNITS.get(name);
		return unit != null ? unit : UNITS.get(plainSpelling(name));
	}

	/** @return units of the dimension that differ from the name in upper and lower case only, joined by "or"; or "" */
	static String similar(String name, Dimension dimension) {
		String plain = plainSpelling(name);
		return UNITS.entrySet().stream()
				.filter(each -> each.getValue().dimension() == dimension && each.getKey().equalsIgnoreCase(plain))
				.map(Map.Entry::getKey).sorted().collect(Collectors.joining(" or "));
	}

	/** One spelling for µ, squares, cubes, degrees and ohms. */
	private static String plainSpelling(String name) {
		String plain = name.replace('\u03BC', '\u00B5').replace('\u2126', '\u03A9').replace("^", "");
		if (plain.startsWith("u") && plain.length() > 1) {
			plain = "\u00B5" + plain.substring(1);
		}
		plain = plain.replace('2', '²').replace('3', '³').replace("Ohm", "ohm");
		plain = BLANKS_INSIDE.matcher(plain).replaceAll("$1");
		return plain.equals("\u2103") || plain.equals("ºC") ? "°C" : plain;
	}

	private static void prefixed(Dimension dimension, String symbol, int power) {
		for (int i = 0; i < PREFIXES.length; i++) {
			UNITS.put(PREFIXES[i] + symbol,
					new Unit(dimension, BigDecimal.ONE.scaleByPowerOfTen(EXPONENTS[i] * power), BigDecimal.ZERO));
		}
	}

	private static void add(Dimension dimension, String symbol, String factor) {
		UNITS.put(symbol, new Unit(dimension, new BigDecimal(factor), BigDecimal.ZERO));
	}
}
