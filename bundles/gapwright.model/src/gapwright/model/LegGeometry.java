package gapwright.model;

import gapwright.model.quantity.Quantity;

/** Lengths and areas that follow from a leg's features. All in SI; NaN where a feature they need is missing. */
public final class LegGeometry {

	private LegGeometry() {
	}

	/** @return distance of the leg's joints on the page, m */
	public static double jointDistance(Leg leg) {
		Joint from = leg.getFrom();
		Joint to = leg.getTo();
		return from == null || to == null ? Double.NaN
				: Math.hypot(si(to.getX()) - si(from.getX()), si(to.getY()) - si(from.getY()));
	}

	/** @return Σ lengths of all pieces of all gaps, and the magnet's, m */
	public static double insertedLength(Leg leg) {
		double sum = leg.getMagnet() == null ? 0 : si(leg.getMagnet().getLength());
		for (Gap gap : leg.getGaps()) {
			sum += si(gap.getLength()) * gap.getPieces();
		}
		return sum;
	}

	/** @return length of the path in iron, m: as given, else joint distance less gaps and magnet */
	public static double ironLength(Leg leg) {
		return leg.getPathLength() != null ? leg.getPathLength().si() : jointDistance(leg) - insertedLength(leg);
	}

	/** @return gross area of the cross-section, m² */
	public static double grossArea(Leg leg) {
		return switch (leg.getShape()) {
		case RECTANGULAR -> si(leg.getWidth()) * si(leg.getDepth());
		case ROUND -> Math.PI / 4 * si(leg.getDiameter()) * si(leg.getDiameter());
		case GIVEN -> si(leg.getArea());
		};
	}

	/** @return width of the bar on the page, m; a given area is drawn as a square's side */
	public static double drawnWidth(Leg leg) {
		return switch (leg.getShape()) {
		case RECTANGULAR -> si(leg.getWidth());
		case ROUND -> si(leg.getDiameter());
		case GIVEN -> Math.sqrt(si(leg.getArea()));
		};
	}

	/** @return SI value, NaN for none */
	public static double si(Quantity quantity) {
		return quantity == null ? Double.NaN : quantity.si();
	}
}
