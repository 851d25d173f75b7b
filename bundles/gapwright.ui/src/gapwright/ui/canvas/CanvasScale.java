package gapwright.ui.canvas;

/**
 * From millimetres on the page to canvas pixels. The one place where they meet; text and line widths stay the same at
 * every zoom, only the iron grows.
 *
 * @param pixelsPerMillimetre &gt; 0
 */
public record CanvasScale(double pixelsPerMillimetre) {

	/** Pixels of a millimetre at 100 %. */
	public static final double FULL = 8;
	private static final double LEAST = 0.1;
	private static final double MOST = 16;

	/** @return the scale of a zoom, 1 for 100 %, kept within 10 % to 1600 % */
	public static CanvasScale zoom(double zoom) {
		return new CanvasScale(FULL * Math.max(LEAST, Math.min(MOST, zoom)));
	}

	/** @return 1 for 100 % */
	public double zoom() {
		return pixelsPerMillimetre / FULL;
	}

	public double pixels(double millimetres) {
		return millimetres * pixelsPerMillimetre;
	}

	public double millimetres(double pixels) {
		return pixels / pixelsPerMillimetre;
	}

	/** @return every coordinate in pixels */
	public double[] pixels(double[] millimetres) {
		double[] scaled = new double[millimetres.length];
		for (int i = 0; i < scaled.length; i++) {
			scaled[i] = pixels(millimetres[i]);
		}
		return scaled;
	}

	/** @return distance in mm of lines that lie at least so many pixels apart: 0.1, 0.2, 0.5, 1 … */
	public double gridMillimetres(double leastPixels) {
		double decade = 0.1;
		while (true) {
			for (int factor : new int[] { 1, 2, 5 }) {
				if (pixels(decade * factor) >= leastPixels) {
					return decade * factor;
				}
			}
			decade *= 10;
		}
	}

	/** @return distance in mm of the finest places told apart with the mouse */
	public double gridMillimetres() {
		return gridMillimetres(8);
	}
}
