package gapwright.ui.canvas.paint;

import org.eclipse.draw2d.Graphics;
import org.eclipse.draw2d.geometry.PointList;
import org.eclipse.jface.resource.JFaceResources;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Color;
import org.eclipse.swt.graphics.Font;

import gapwright.ui.fields.ThemeColours;

/** Paints through draw2d: the screen, a printer, a bitmap. */
public final class GraphicsPen implements Pen {

	private static final int HALO = 1;

	private final Graphics graphics;

	public GraphicsPen(Graphics graphics) {
		this.graphics = graphics;
		graphics.setAntialias(SWT.ON);
		graphics.setTextAntialias(SWT.ON);
	}

	private static Color colour(Tone tone) {
		return ThemeColours.valueOf(tone.name()).get();
	}

	@Override
	public void fill(double[] polygon, Tone tone, double opacity) {
		graphics.setBackgroundColor(colour(tone));
		graphics.setAlpha((int) Math.round(255 * opacity));
		graphics.fillPolygon(points(polygon));
		graphics.setAlpha(255);
	}

	@Override
	public void outline(double[] polygon, Tone tone, double width) {
		stroke(tone, width, false);
		graphics.drawPolygon(points(polygon));
	}

	@Override
	public void line(double[] points, Tone tone, double width, boolean dashed) {
		stroke(tone, width, dashed);
		graphics.drawPolyline(points(points));
		graphics.setLineStyle(Graphics.LINE_SOLID);
	}

	private void stroke(Tone tone, double width, boolean dashed) {
		graphics.setForegroundColor(colour(tone));
		graphics.setLineWidth(Math.max(1, (int) Math.round(width)));
		graphics.setLineStyle(dashed ? Graphics.LINE_DASH : Graphics.LINE_SOLID);
	}

	@Override
	public void disc(double x, double y, double radius, Tone fill, Tone stroke, double width) {
		int left = (int) Math.round(x - radius);
		int top = (int) Math.round(y - radius);
		int size = (int) Math.round(2 * radius);
		graphics.setBackgroundColor(colour(fill));
		graphics.fillOval(left, top, size, size);
		stroke(stroke, width, false);
		graphics.drawOval(left, top, size, size);
	}

	@Override
	public void text(String text, double x, double y, Align align, double size, boolean bold, Tone tone) {
		Font font = CanvasFonts.get(size, bold);
		graphics.setFont(font);
		double width = CanvasFonts.width(text, font);
		double left = align == Align.START ? x : align == Align.MIDDLE ? x - width / 2 : x - width;
		int px = (int) Math.round(left);
		int py = (int) Math.round(y) - graphics.getFontMetrics().getAscent();
		graphics.setForegroundColor(colour(Tone.PAPER));
		for (int dx = -HALO; dx <= HALO; dx++) {
			for (int dy = -HALO; dy <= HALO; dy++) {
				if (dx != 0 || dy != 0) {
					graphics.drawString(text, px + dx, py + dy);
				}
			}
		}
		graphics.setForegroundColor(colour(tone));
		graphics.drawString(text, px, py);
		graphics.setFont(JFaceResources.getDefaultFont());
	}

	@Override
	public double textWidth(String text, double size, boolean bold) {
		return CanvasFonts.width(text, size, bold);
	}

	private static PointList points(double[] polygon) {
		PointList list = new PointList(polygon.length / 2);
		for (int i = 0; i < polygon.length; i += 2) {
			list.addPoint((int) Math.round(polygon[i]), (int) Math.round(polygon[i + 1]));
		}
		return list;
	}
}
