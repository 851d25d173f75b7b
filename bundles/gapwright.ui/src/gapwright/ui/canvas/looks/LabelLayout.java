package gapwright.ui.canvas.looks;

import java.util.List;

import gapwright.ui.canvas.paint.Align;

/**
 * Finds room for labels: each takes the first of its places that covers neither the drawing nor a label placed before
 * it. One that finds none is left out rather than drawn over something; the element's own view still has the figures.
 */
public final class LabelLayout {

	/** A place for a label: the middle of the side it hangs on, and the way it extends from there. */
	public record Place(double x, double y, double dx, double dy, double[] leader) {
	}

	private static final double STEP = 3;

	private final BoxGrid taken = new BoxGrid();
	private final BoxGrid iron = new BoxGrid();

	/** Keeps labels off a box of left, top, width, height. */
	public void block(double[] box) {
		taken.add(box);
	}

	/** Keeps labels off a box, and leaders from crossing it: iron, or another label. */
	public void blockIron(double[] box) {
		taken.add(box);
		iron.add(box);
	}

	/** A leader over another bar would point at that; its first pixels may touch the bar it comes from. */
	private boolean crossesIron(double[] leader) {
		if (leader.length == 0) {
			return false;
		}
		double dx = leader[2] - leader[0];
		double dy = leader[3] - leader[1];
		double length = Math.hypot(dx, dy);
		for (double s = STEP; s < length; s += STEP) {
			double px = leader[0] + s * dx / length;
			double py = leader[1] + s * dy / length;
			if (iron.covers(px, py)) {
				return true;
			}
		}
		return false;
	}

	/**
	 * @param width  of the label with its badge
	 * @param height of the label
	 * @return left, top, width, height, and which place it was, or null when every place is taken
	 */
	public Placed place(List<Place> places, double width, double height) {
		for (Place place : places) {
			double[] box = box(place, width, height);
			if (!taken.overlaps(box) && !crossesIron(place.leader())) {
				blockIron(new double[] { box[0] - 2, box[1] - 1, box[2] + 4, box[3] + 2 });
				if (place.leader().length > 0) {
					block(Shapes.bounds(2, place.leader()));
				}
				return new Placed(box, place, align(place));
			}
		}
		return null;
	}

	/** A label's place, found. */
	public record Placed(double[] box, Place place, Align align) {
	}

	/** The box touches the anchor with the side that faces it. */
	private static double[] box(Place place, double width, double height) {
		double reach = Math.max(Math.abs(place.dx()), Math.abs(place.dy()));
		double sx = place.dx() / reach;
		double sy = place.dy() / reach;
		return new double[] { place.x() + (sx - 1) * width / 2, place.y() + (sy - 1) * height / 2, width, height };
	}

	private static Align align(Place place) {
		return place.dx() > 0.5 ? Align.START : place.dx() < -0.5 ? Align.END : Align.MIDDLE;
	}
}
