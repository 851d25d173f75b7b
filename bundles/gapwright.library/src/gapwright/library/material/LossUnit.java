package gapwright.library.material;

import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Core loss as sheets print it, per volume or per mass. */
final class LossUnit {

	static final String ALLOWED = "W/m³, kW/m³, MW/m³, mW/cm³, W/cm³ or W/kg, e.g. 60 kW/m³";

	/** To W/m³. */
	private static final Map<String, Double> PER_VOLUME = Map.of("W/m³", 1.0, "kW/m³", 1e3, "MW/m³", 1e6, "mW/cm³", 1e3,
			"W/cm³", 1e6, "W/l", 1e3, "W/dm³", 1e3);
	private static final Map<String, Double> PER_MASS = Map.of("W/kg", 1.0, "mW/g", 1.0);
	private static final Pattern NUMBER_AND_UNIT = Pattern
			.compile("([+-]?(?:\\d+\\.?\\d*|\\.\\d+)(?:[eE][+-]?\\d{1,3})?)[\\s\u00A0\u2009\u202F]*(.*)");

	/**
	 * @param value   in W/m³ or W/kg
	 * @param perMass whether it is W/kg
	 */
	record Loss(double value, boolean perMass) {
	}

	private LossUnit() {
	}

	/** @throws IllegalArgumentException saying what is wrong with the text */
	static Loss parse(String text) {
		Matcher parts = NUMBER_AND_UNIT.matcher(text);
		if (!parts.matches()) {
			throw new IllegalArgumentException("'" + text + "': not a number with a unit");
		}
		String unit = parts.group(2).replace("^", "").replace('3', '³').strip();
		if (unit.isEmpty()) {
			throw new IllegalArgumentException("'" + text + "': a loss needs a unit");
		}
		Double factor = PER_VOLUME.get(unit);
		boolean perMass = factor == null;
		if (perMass) {
			factor = PER_MASS.get(unit);
		}
		if (factor == null) {
			throw new IllegalArgumentException("'" + text + "': unknown unit '" + parts.group(2) + "' of a loss");
		}
		double value = Double.parseDouble(parts.group(1)) * factor;
		if (!(value > 0) || Double.isInfinite(value)) {
			throw new IllegalArgumentException("'" + text + "': a loss must be above 0");
		}
		return new Loss(value, perMass);
	}
}
