package gapwright.library.material;

import java.util.List;

import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;

/**
 * Units somebody chose for the numbers of a material file that carry none, whatever its units record says.
 *
 * @param fieldStrength for example "Oe"; null leaves it to the file
 * @param fluxDensity   for example "mT"; null leaves it to the file
 */
public record BareUnits(String fieldStrength, String fluxDensity) {

	/** Everything is left to the file. */
	public static final BareUnits AS_IN_FILE = new BareUnits(null, null);

	/** Units to choose from, the SI's first. */
	public static final List<String> FIELD_STRENGTHS = List.of("A/m", "kA/m", "A/cm", "Oe");
	/** Units to choose from, the SI's first. */
	public static final List<String> FLUX_DENSITIES = List.of("T", "mT", "G", "kG");

	/** @throws IllegalArgumentException when a unit is none of its kind */
	public BareUnits {
		check(fieldStrength, Dimension.FIELD_STRENGTH);
		check(fluxDensity, Dimension.FLUX_DENSITY);
	}

	private static void check(String unit, Dimension dimension) {
		if (unit != null) {
			Quantity.parse("1 " + unit, dimension);
		}
	}
}
