package gapwright.ui.canvas.looks;

import gapwright.ui.canvas.paint.Pen;

/** What an element looks like at one moment, in canvas pixels. Immutable, and free of the model. */
public interface Look {

	/** @return left, top, width, height of everything painted */
	double[] bounds();

	/** @return whether a click there means this element */
	boolean contains(double x, double y);

	void paint(Pen pen);

	/** @return the polygon outlined while selected; null for its bounds */
	default double[] highlight() {
		return null;
	}
}
