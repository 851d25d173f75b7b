package gapwright.ui.canvas;

import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Color;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Image;
import org.eclipse.swt.graphics.ImageData;
import org.eclipse.swt.graphics.ImageDataProvider;
import org.eclipse.swt.graphics.PaletteData;
import org.eclipse.swt.graphics.RGB;
import org.eclipse.swt.widgets.Display;

import gapwright.ui.fields.ThemeColours;

/** Icons of the tools, drawn as the canvas draws what they add, in the theme's colours and at any resolution. */
final class ToolIcons {

	private static final int SIZE = 18;
	private static final int OVERSAMPLING = 4;

	private ToolIcons() {
	}

	static Image image(Display display, ToolStrip.Kind kind) {
		ImageDataProvider provider = zoom -> draw(display, kind, SIZE * zoom / 100);
		return new Image(display, provider);
	}

	/** Draws large on a colour that the icon does not use, then averages down with that colour as transparency. */
	private static ImageData draw(Display display, ToolStrip.Kind kind, int size) {
		int large = size * OVERSAMPLING;
		RGB back = ThemeColours.PAPER.get().getRGB();
		Image image = new Image(display, new ImageData(large, large, 24, new PaletteData(0xFF0000, 0xFF00, 0xFF)));
		GC gc = new GC(image);
		Color paper = new Color(back);
		gc.setBackground(paper);
		gc.fillRectangle(0, 0, large, large);
		gc.setForeground(ThemeColours.INK.get());
		gc.setLineWidth(Math.max(1, large / 14));
		shape(gc, kind, large / 18.0);
		gc.dispose();
		ImageData full = image.getImageData(100);
		image.dispose();
		return shrink(full, size, back);
	}

	private static ImageData shrink(ImageData full, int size, RGB back) {
		ImageData small = new ImageData(size, size, 24, new PaletteData(0xFF0000, 0xFF00, 0xFF));
		small.alphaData = new byte[size * size];
		int step = full.width / size;
		for (int y = 0; y < size; y++) {
			for (int x = 0; x < size; x++) {
				int r = 0;
				int g = 0;
				int b = 0;
				int drawn = 0;
				for (int k = 0; k < step * step; k++) {
					RGB rgb = full.palette.getRGB(full.getPixel(x * step + k % step, y * step + k / step));
					if (!rgb.equals(back)) {
						r += rgb.red;
						g += rgb.green;
						b += rgb.blue;
						drawn++;
					}
				}
				if (drawn > 0) {
					small.setPixel(x, y, small.palette.getPixel(new RGB(r / drawn, g / drawn, b / drawn)));
				}
				small.setAlpha(x, y, 255 * drawn / (step * step));
			}
		}
		return small;
	}

	/** @param u an eighteenth of the icon's side */
	private static void shape(GC gc, ToolStrip.Kind kind, double u) {
		switch (kind) {
		case SELECT -> {
			gc.setBackground(ThemeColours.INK.get());
			gc.fillPolygon(scaled(u, 4, 2, 4, 15, 8, 11, 10, 16, 12, 15, 10, 10, 15, 10));
		}
		case JOINT -> gc.drawOval(i(5 * u), i(5 * u), i(8 * u), i(8 * u));
		case LEG -> bar(gc, u);
		case GAP -> {
			gc.drawLine(i(5 * u), i(u), i(5 * u), i(7 * u));
			gc.drawLine(i(13 * u), i(u), i(13 * u), i(7 * u));
			gc.drawLine(i(5 * u), i(7 * u), i(13 * u), i(7 * u));
			gc.drawLine(i(5 * u), i(11 * u), i(13 * u), i(11 * u));
			gc.drawLine(i(5 * u), i(11 * u), i(5 * u), i(17 * u));
			gc.drawLine(i(13 * u), i(11 * u), i(13 * u), i(17 * u));
		}
		case MAGNET -> {
			bar(gc, u);
			gc.setBackground(ThemeColours.MAGNET.get());
			gc.fillRectangle(i(5 * u), i(6 * u), i(8 * u), i(6 * u));
		}
		case COIL -> {
			gc.setForeground(ThemeColours.COIL.get());
			for (int k = 0; k < 3; k++) {
				gc.drawOval(i(u), i((1.5 + 5.5 * k) * u), i(4.4 * u), i(4.4 * u));
				gc.drawOval(i(12.5 * u), i((1.5 + 5.5 * k) * u), i(4.4 * u), i(4.4 * u));
			}
			gc.setForeground(ThemeColours.INK.get());
			gc.drawLine(i(7.5 * u), i(u), i(7.5 * u), i(17 * u));
			gc.drawLine(i(10.5 * u), i(u), i(10.5 * u), i(17 * u));
		}
		case AIR_PATH -> {
			gc.setLineStyle(SWT.LINE_DASH);
			gc.drawArc(i(2 * u), i(5 * u), i(14 * u), i(16 * u), 20, 140);
			gc.setLineStyle(SWT.LINE_SOLID);
			gc.drawOval(i(u), i(11 * u), i(4 * u), i(4 * u));
			gc.drawOval(i(13 * u), i(11 * u), i(4 * u), i(4 * u));
		}
		}
	}

	private static void bar(GC gc, double u) {
		gc.drawRectangle(i(5 * u), i(u), i(8 * u), i(16 * u));
	}

	private static int[] scaled(double u, int... points) {
		int[] scaled = new int[points.length];
		for (int k = 0; k < points.length; k++) {
			scaled[k] = i(points[k] * u);
		}
		return scaled;
	}

	private static int i(double value) {
		return (int) Math.round(value);
	}
}
