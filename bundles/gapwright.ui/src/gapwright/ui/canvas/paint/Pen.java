package gapwright.ui.canvas.paint;

/**
 * Draws in canvas pixels, x rightwards, y downwards. One pen paints the screen and pictures, another writes SVG, so that
 * both show the same. Polygons are x, y, x, y …
 */
public interface Pen {

	/** @param opacity 0 … 1 */
	void fill(double[] polygon, Tone tone, double opacity);

	/** A closed outline. */
	void outline(double[] polygon, Tone tone, double width);

	/** An open line; dashed for what is only air. */
	void line(double[] points, Tone tone, double width, boolean dashed);

	void disc(double x, double y, double radius, Tone fill, Tone stroke, double width);

	/** @param y baseline; the text has a halo of paper so that it reads on anything */
	void text(String text, double x, double y, Align align, double size, boolean bold, Tone tone);

	/** @return width in pixels */
	double textWidth(String text, double size, boolean bold);

	/** Lines rising to the right across a convex polygon. */
	default void hatch(double[] polygon, Tone tone, double spacing, double width) {
		for (double[] stroke : Hatching.across(polygon, spacing)) {
			line(stroke, tone, width, false);
		}
	}
}
