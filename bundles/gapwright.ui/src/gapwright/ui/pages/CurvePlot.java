package gapwright.ui.pages;

import java.util.List;

import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Color;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Canvas;
import org.eclipse.swt.widgets.Composite;

import gapwright.model.Material;
import gapwright.ui.fields.FigureFormat;
import gapwright.ui.fields.ThemeColours;

/** Plot of a material, with a read-out under the mouse. Lines differ by their dashes as well as by colour. */
public final class CurvePlot extends Canvas {

	private static final int LEFT = 56;
	private static final int BOTTOM = 40;
	private static final int TOP = 24;
	private static final int RIGHT = 16;
	private static final int SMALLEST = 40;
	private static final int MARK = 3;
	private static final int SAMPLE = 26;
	private static final ThemeColours[] COLOURS = { ThemeColours.INK, ThemeColours.OVER, ThemeColours.WITHIN, ThemeColours.MAGNET };
	private static final int[][] DASHES = { {}, { 9, 3 }, { 9, 3, 2, 3 }, { 2, 3 } };

	private CurvePicture picture;
	private String trouble = "";
	private int cursor = -1;

	public CurvePlot(Composite parent) {
		super(parent, SWT.DOUBLE_BUFFERED);
		addListener(SWT.Paint, event -> paint(event.gc));
		addListener(SWT.MouseMove, event -> point(event.x));
		addListener(SWT.MouseExit, event -> point(-1));
	}

	private void point(int x) {
		cursor = x;
		redraw();
	}

	/** @param material null empties the plot */
	void show(Material material, PlotKind kind, List<Double> celsius) {
		picture = null;
		trouble = "";
		if (material != null) {
			try {
				picture = CurvePicture.of(material, kind, celsius);
			} catch (IllegalArgumentException e) {
				trouble = e.getMessage();
			}
		}
		redraw();
	}

	/** Shows B against H at the temperatures the material is given at. */
	public void show(Material material) {
		show(material, PlotKind.FLUX_DENSITY, List.of());
	}

	private void paint(GC gc) {
		Rectangle all = getClientArea();
		gc.setBackground(ThemeColours.PAPER.get());
		gc.fillRectangle(all);
		int below = picture == null || picture.kind() == PlotKind.FLUX_DENSITY ? 0 : rows(gc, all.width) * gc.getFontMetrics().getHeight();
		Rectangle area = new Rectangle(LEFT, TOP, all.width - LEFT - RIGHT, all.height - TOP - BOTTOM - below);
		gc.setForeground(ThemeColours.INK.get());
		if (picture == null) {
			gc.drawText(trouble, 8, TOP, true);
			return;
		}
		if (area.width < SMALLEST || area.height < SMALLEST) {
			return;
		}
		gc.setAntialias(SWT.ON);
		axes(gc, area);
		gc.setClipping(area);
		picture.levels().forEach(level -> level(gc, area, level));
		picture.lines().forEach(line -> line(gc, area, line));
		gc.setClipping((Rectangle) null);
		legend(gc, area);
		if (cursor >= area.x && cursor <= area.x + area.width) {
			readOut(gc, area);
		}
	}

	private void axes(GC gc, Rectangle area) {
		PlotAxis across = picture.across();
		PlotAxis upwards = picture.upwards();
		int rightmost = area.x + area.width + RIGHT;
		for (double tick : across.ticks()) {
			int x = x(area, tick);
			gc.setForeground(ThemeColours.GRID.get());
			gc.drawLine(x, area.y, x, area.y + area.height);
			gc.setForeground(ThemeColours.NOTE.get());
			String figure = across.figure(tick);
			int width = gc.textExtent(figure).x;
			gc.drawText(figure, Math.min(x - width / 2, rightmost - width), area.y + area.height + 4, true);
		}
		for (double tick : upwards.ticks()) {
			int y = y(area, tick);
			gc.setForeground(ThemeColours.GRID.get());
			gc.drawLine(area.x, y, area.x + area.width, y);
			gc.setForeground(ThemeColours.NOTE.get());
			Point size = gc.textExtent(upwards.figure(tick));
			gc.drawText(upwards.figure(tick), area.x - size.x - 6, y - size.y / 2, true);
		}
		gc.setForeground(ThemeColours.NOTE.get());
		gc.drawRectangle(area);
		String title = across.title();
		Point size = gc.textExtent(title);
		gc.drawText(title, area.x + area.width - size.x, area.y + area.height + BOTTOM - size.y - 2, true);
		gc.drawText(upwards.title(), 6, 3, true);
	}

	private void level(GC gc, Rectangle area, CurvePicture.Level level) {
		gc.setForeground(ThemeColours.NEAR.get());
		gc.setLineStyle(SWT.LINE_DASH);
		Point size = gc.textExtent(level.label());
		if (picture.kind() == PlotKind.FLUX_DENSITY) {
			int y = y(area, level.value());
			gc.drawLine(area.x, y, area.x + area.width, y);
			gc.drawText(level.label(), area.x + area.width - size.x - 4, y - size.y - 1, true);
		} else {
			int x = x(area, level.value());
			gc.drawLine(x, area.y, x, area.y + area.height);
		}
		gc.setLineStyle(SWT.LINE_SOLID);
	}

	private void line(GC gc, Rectangle area, CurvePicture.Line line) {
		int[] points = new int[2 * line.x().length];
		int n = 0;
		for (int k = 0; k < line.x().length; k++) {
			if (!picture.across().logarithmic() || line.x()[k] > 0) {
				points[n++] = x(area, line.x()[k]);
				points[n++] = y(area, line.y()[k]);
			}
		}
		style(gc, line);
		gc.drawPolyline(java.util.Arrays.copyOf(points, n));
		gc.setLineStyle(SWT.LINE_SOLID);
		gc.setLineWidth(1);
		if (!Double.isNaN(line.markX())) {
			gc.setBackground(ThemeColours.PAPER.get());
			int x = x(area, line.markX()) - MARK;
			int y = y(area, line.markY()) - MARK;
			gc.fillOval(x, y, 2 * MARK, 2 * MARK);
			gc.drawOval(x, y, 2 * MARK, 2 * MARK);
		}
	}

	private static void style(GC gc, CurvePicture.Line line) {
		Color colour = COLOURS[line.order() % COLOURS.length].get();
		gc.setForeground(colour);
		gc.setLineWidth(line.dashed() ? 1 : 2);
		int[] dash = DASHES[line.order() % DASHES.length];
		if (dash.length > 0) {
			gc.setLineDash(dash);
		} else {
			gc.setLineStyle(SWT.LINE_SOLID);
		}
	}

	/** Lines of the legend below the axis. */
	private int rows(GC gc, int width) {
		int columns = columns(gc, width);
		return (picture.lines().size() + columns - 1) / columns;
	}

	/** Two names beside each other where they fit. */
	private int columns(GC gc, int width) {
		return 2 * (SAMPLE + widest(gc) + 20) <= width ? 2 : 1;
	}

	private int widest(GC gc) {
		return picture.lines().stream().mapToInt(line -> gc.textExtent(line.name()).x).max().orElse(0);
	}

	/** Inside, below at the right, for rising curves; falling ones would cross it, so theirs stands below the axis. */
	private void legend(GC gc, Rectangle area) {
		int height = gc.getFontMetrics().getHeight();
		int width = widest(gc);
		int total = area.x + area.width + RIGHT;
		int columns = columns(gc, total);
		boolean inside = picture.kind() == PlotKind.FLUX_DENSITY;
		int count = 0;
		for (CurvePicture.Line line : picture.lines()) {
			int x = inside ? area.x + area.width - width - SAMPLE - 16 : 8 + count % columns * total / 2;
			int y = inside ? area.y + area.height - height * (picture.lines().size() - count) - 8
					: area.y + area.height + BOTTOM - 2 + count / columns * height;
			count++;
			style(gc, line);
			gc.drawLine(x, y + height / 2, x + SAMPLE, y + height / 2);
			gc.setLineStyle(SWT.LINE_SOLID);
			gc.setLineWidth(1);
			gc.setForeground(ThemeColours.INK.get());
			gc.drawText(line.name(), x + SAMPLE + 6, y, true);
		}
	}

	private void readOut(GC gc, Rectangle area) {
		double at = picture.across().value((cursor - area.x) / (double) area.width);
		gc.setForeground(ThemeColours.SELECTION.get());
		gc.drawLine(cursor, area.y, cursor, area.y + area.height);
		StringBuilder text = new StringBuilder(picture.across().symbol()).append(' ')
				.append(FigureFormat.si(at, picture.across().unit()));
		for (CurvePicture.Line line : picture.lines()) {
			double y = line.at(at);
			if (!Double.isNaN(y)) {
				text.append("   ").append(picture.kind() == PlotKind.FLUX_DENSITY ? FigureFormat.fluxDensity(y) : FigureFormat.plain(y));
			}
		}
		gc.setForeground(ThemeColours.INK.get());
		Point size = gc.textExtent(text.toString());
		gc.drawText(text.toString(), area.x + area.width - size.x, 3, true);
	}

	private int x(Rectangle area, double value) {
		return area.x + (int) Math.round(area.width * bounded(picture.across().share(value)));
	}

	private int y(Rectangle area, double value) {
		return area.y + area.height - (int) Math.round(area.height * bounded(picture.upwards().share(value)));
	}

	/** Far outside the axes a pixel's number would overflow; the clipping cuts it off anyway. */
	private static double bounded(double share) {
		return Math.max(-10, Math.min(10, share));
	}
}
