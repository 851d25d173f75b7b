package gapwright.ui.pages;

/** What a plot of a material shows. */
enum PlotKind {
	FLUX_DENSITY("B against H"),
	PERMEABILITY_BY_FIELD("Permeability against H"),
	PERMEABILITY_BY_FLUX("Permeability against B");

	private final String label;

	PlotKind(String label) {
		this.label = label;
	}

	String label() {
		return label;
	}
}
