package gapwright.library;

import java.util.List;

/** Parts of an invented solar irrigation-pump station; no figure belongs to a product. */
public final class Examples {

	private static final List<Example> ALL = List.of(
			new Example("boost-choke.gapwright", "Boost choke of the panel converter",
					"A gapped ferrite E core whose legs near saturation at the ripple peak."),
			new Example("output-choke-toroid.gapwright", "Output choke of the battery charger",
					"An alloy-powder toroid, whose gap is distributed in the material."),
			new Example("flyback-transformer.gapwright", "Flyback transformer of the controller supply",
					"Two windings on a gapped core, one conducting at a time."),
			new Example("three-phase-reactor.gapwright", "Line reactor of the pump drive",
					"Three laminated legs at five operating points; a stalled pump drives them over saturation."),
			new Example("coupled-choke.gapwright", "Coupled choke of the two-phase converter",
					"Windings on the outer legs share a gapped centre leg; air paths stand for the field across the windows."),
			new Example("magnet-biased-choke.gapwright", "Magnet-biased choke of the tracker motor",
					"A magnet holds the core below zero, so that the current has twice the room."));

	private Examples() {
	}

	/** @return the examples in the order in which to look at them */
	public static List<Example> all() {
		return ALL;
	}
}
