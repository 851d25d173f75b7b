package gapwright.model.quantity;

/** What a quantity measures, the unit its SI value is in, and how one is typed. */
public enum Dimension {
	LENGTH("a length", "m", "0.5 mm"),
	AREA("an area", "m²", "1.2 cm²"),
	FLUX_DENSITY("a flux density", "T", "0.39 T"),
	FIELD_STRENGTH("a field strength", "A/m", "1200 A/m"),
	CURRENT("a current", "A", "14 A"),
	VOLTAGE("a voltage", "V", "24 V"),
	TIME("a time", "s", "5 µs"),
	/** The value is in °C, not in K: that is what data sheets and insulation classes are given in. */
	TEMPERATURE("a temperature", "°C", "100 °C"),
	FREQUENCY("a frequency", "Hz", "50 kHz"),
	RESISTANCE("a resistance", "Ω", "30 mΩ"),
	PERMEANCE("a permeance", "H", "20 nH"),
	DENSITY("a density", "kg/m³", "4800 kg/m³"),
	/** Bare diameter of a round conductor, in m. */
	WIRE("a wire", "m", "AWG 18 or 1.0 mm"),
	/** How far a value may be off to either side: a share of it, or an amount, which then has the amount's dimension. */
	DEVIATION("a deviation", "1", "10 % or 0.05 mm");

	private final String noun;
	private final String unit;
	private final String example;

	Dimension(String noun, String unit, String example) {
		this.noun = noun;
		this.unit = unit;
		this.example = example;
	}

	/** @return name with its article, for messages: "a length" */
	public String noun() {
		return noun;
	}

	/** @return unit of {@link Quantity#si()} */
	public String unit() {
		return unit;
	}

	/** @return what a user may type */
	public String example() {
		return example;
	}
}
