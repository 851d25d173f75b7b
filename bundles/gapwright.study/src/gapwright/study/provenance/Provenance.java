package gapwright.study.provenance;

import gapwright.model.Fringing;

/** Where every figure comes from: formula, source, validity. */
public final class Provenance {

	private Provenance() {
	}

	public static Origin of(FigureGroup group) {
		return group.origin();
	}

	/** @return the group of a gap's fringing factor */
	public static FigureGroup fringing(Fringing method) {
		return switch (method) {
		case NONE -> FigureGroup.GAP_FRINGING_NONE;
		case WIDENED -> FigureGroup.GAP_FRINGING_WIDENED;
		case LOGARITHMIC -> FigureGroup.GAP_FRINGING_LOGARITHMIC;
		case CONFORMAL -> FigureGroup.GAP_FRINGING_CONFORMAL;
		};
	}
}
