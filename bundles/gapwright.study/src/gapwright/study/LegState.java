package gapwright.study;

import java.util.Locale;

/** How a leg stands against saturation, by the peak of its flux density. */
public enum LegState {
	WITHIN,
	/** At or above the design's near fraction. */
	NEAR,
	/** At or above saturation. */
	OVER,
	/** No saturation is known for its material. */
	UNKNOWN;

	/** @return "within", "near", "over" or "unknown" */
	public String word() {
		return name().toLowerCase(Locale.ROOT);
	}
}
