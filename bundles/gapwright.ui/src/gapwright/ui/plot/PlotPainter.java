package gapwright.ui.plot;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

import gapwright.ui.canvas.paint.Align;
import gapwright.ui.canvas.paint.Pen;
import gapwright.ui.canvas.paint.Tone;
import gapwright.ui.fields.FigureFormat;

/** Paints a plot with a pen: on the screen, into a bitmap or as SVG. */
public final class PlotPainter {

	private static final double TEXT = 12;
	private static final double LEFT = 64;
	private static final double TOP = 26;
	private static final double BOTTOM = 40;
	private static final double LINE_HEIGHT = 15;
	private static final double LONGEST_NAME = 170;

	private final Plot plot;
	private final Pen pen;
	private final double x;
	private final double y;
	private final double width;
	private final double height;
	private final double right;

	private PlotPainter(Plot plot, Pen pen, double totalWidth, double totalHeight) {
		this.plot = plot;
		this.pen = pen;
		double names = 12;
		for (Plot.Line line : plot.lines()) {
			names = Math.max(names, Math.min(LONGEST_NAME, pen.textWidth(line.name(), TEXT, false) + 16));
		}
		x = LEFT;
		y = TOP;
		width = totalWidth - LEFT - names;
		height = totalHeight - TOP - BOTTOM;
		right = totalWidth - 8;
	}

	/** @param cursor x to read the lines at; NaN for none */
	public static void paint(Plot plot, Pen pen, double width, double height, double cursor) {
		PlotPainter painter = new PlotPainter(plot, pen, width, height);
		if (painter.width > 40 && painter.height > 30) {
			painter.paint(cursor);
		}
	}

	/** @return the x value under a pixel; NaN outside the axes */
	public static double valueAt(Plot plot, Pen pen, double width, double height, double pixel) {
		PlotPainter painter = new PlotPainter(plot, pen, width, height);
		double share = (pixel - painter.x) / painter.width;
		return share < 0 || share > 1 ? Double.NaN : plot.x().value(share);
	}

	private double px(double value) {
		return x + width * plot.x().share(value);
	}

	private double py(double value) {
		return y + height * (1 - plot.y().share(value));
	}

	private void paint(double cursor) {
		for (double tick : plot.x().ticks()) {
			pen.line(new double[] { px(tick), y, px(tick), y + height }, Tone.GRID, 1, false);
			pen.text(plot.x().figure(tick), px(tick), y + height + LINE_HEIGHT, Align.MIDDLE, TEXT, false, Tone.NOTE);
		}
		for (double tick : plot.y().ticks()) {
			pen.line(new double[] { x, py(tick), x + width, py(tick) }, Tone.GRID, 1, false);
			pen.text(plot.y().figure(tick), x - 6, py(tick) + 4, Align.END, TEXT, false, Tone.NOTE);
		}
		plot.bars().forEach(this::bar);
		pen.outline(new double[] { x, y, x + width, y, x + width, y + height, x, y + height }, Tone.NOTE, 1);
		pen.text(plot.x().heading(), x + width, y + height + 2 * LINE_HEIGHT + 2, Align.END, TEXT, false, Tone.NOTE);
		boolean reading = !Double.isNaN(cursor) && plot.x().share(cursor) >= 0 && plot.x().share(cursor) <= 1;
		pen.text(plot.y().heading() + (reading ? " at " + figure(plot.x(), cursor) : ""), 6, y - 10, Align.START, TEXT, true, Tone.INK);
		plot.levels().forEach(this::level);
		plot.lines().forEach(this::line);
		plot.spots().forEach(this::spot);
		names(reading ? cursor : Double.NaN);
		if (reading) {
			readOut(cursor);
		} else {
			spotNames();
		}
	}

	private void bar(Plot.Bar bar) {
		double left = Math.max(x, px(bar.from()));
		double right = Math.min(x + width, px(bar.to()));
		if (right > left && bar.y() > 0) {
			double[] box = { left, py(0), left, py(bar.y()), right, py(bar.y()), right, py(0) };
			pen.fill(box, bar.tone(), 0.45);
			pen.outline(box, bar.tone(), 1);
		}
	}

	private void level(Plot.Level level) {
		double share = level.upright() ? plot.x().share(level.value()) : plot.y().share(level.value());
		if (share < 0 || share > 1) {
			return;
		}
		if (level.upright()) {
			double at = px(level.value());
			pen.line(new double[] { at, y, at, y + height }, level.tone(), 1.5, true);
			boolean right = share < 0.7;
			pen.text(level.name(), right ? at + 4 : at - 4, y + LINE_HEIGHT, right ? Align.START : Align.END, TEXT, false, level.tone());
		} else {
			double at = py(level.value());
			pen.line(new double[] { x, at, x + width, at }, level.tone(), 1.5, true);
			pen.text(level.name(), x + 6, at - 4, Align.START, TEXT, false, level.tone());
		}
	}

	/** Cut at the ends of the x axis, and drawn in pieces where it leaves the frame upwards or downwards. */
	private void line(Plot.Line line) {
		List<Double> points = new ArrayList<>();
		for (int k = 0; k < line.x().length; k++) {
			double share = plot.x().share(line.x()[k]);
			double up = plot.y().share(line.y()[k]);
			boolean inside = share >= -1e-9 && share <= 1 + 1e-9 && up >= -1e-9 && up <= 1 + 1e-9;
			if (inside) {
				points.add(px(line.x()[k]));
				points.add(py(line.y()[k]));
			} else {
				draw(points, line);
			}
		}
		draw(points, line);
	}

	private void draw(List<Double> points, Plot.Line line) {
		if (points.size() > 2) {
			pen.line(points.stream().mapToDouble(Double::doubleValue).toArray(), line.tone(), 2, line.dash());
		}
		points.clear();
	}

	private void spot(Plot.Spot spot) {
		double share = plot.x().share(spot.x());
		double up = plot.y().share(spot.y());
		if (share >= 0 && share <= 1 && up >= 0 && up <= 1) {
			pen.disc(px(spot.x()), py(spot.y()), 4, Tone.PAPER, spot.tone(), 2);
		}
	}

	/** In the line of the heading, where they hide nothing; the read-out takes their place. */
	private void spotNames() {
		double at = right;
		for (int i = plot.spots().size() - 1; i >= 0; i--) {
			Plot.Spot spot = plot.spots().get(i);
			pen.text(spot.name(), at, y - 10, Align.END, TEXT, false, spot.tone());
			at -= pen.textWidth(spot.name(), TEXT, false) + 16;
		}
	}

	/** Names, or values at the cursor, stand at the lines' ends, pushed apart where lines end close to one another. */
	private void names(double cursor) {
		record End(Plot.Line line, double y) {
		}
		List<End> ends = new ArrayList<>();
		for (Plot.Line line : plot.lines()) {
			double value = line.at(Math.min(plot.x().to(), Math.max(line.x()[0], line.x()[line.x().length - 1])));
			if (!Double.isNaN(value)) {
				ends.add(new End(line, Math.max(y + 8, Math.min(y + height, py(value)))));
			}
		}
		ends.sort(Comparator.comparingDouble(End::y));
		double last = Double.NEGATIVE_INFINITY;
		for (End end : ends) {
			last = Math.max(end.y(), last + LINE_HEIGHT);
			String text = Double.isNaN(cursor) ? end.line().name() : figure(plot.y(), end.line().at(cursor));
			pen.text(text, x + width + 6, last + 4, Align.START, TEXT, false, end.line().tone());
		}
	}

	/** A line at the cursor, its value in the heading, those of the lines in place of their names. */
	private void readOut(double cursor) {
		pen.line(new double[] { px(cursor), y, px(cursor), y + height }, Tone.SELECTION, 1, false);
		for (Plot.Line line : plot.lines()) {
			double value = line.at(cursor);
			if (!Double.isNaN(value) && plot.y().share(value) >= 0 && plot.y().share(value) <= 1) {
				pen.disc(px(cursor), py(value), 3, line.tone(), line.tone(), 1);
			}
		}
	}

	private static String figure(Axis axis, double value) {
		return axis.unit().isEmpty() ? FigureFormat.percent(value) : axis.unit().equals("T") ? FigureFormat.fluxDensity(value)
				: FigureFormat.si(value, axis.unit());
	}

	/** @return the read-out in words, for screen readers */
	static String words(Plot plot, double cursor) {
		StringBuilder text = new StringBuilder(plot.x().title()).append(' ').append(figure(plot.x(), cursor));
		for (Plot.Line line : plot.lines()) {
			text.append(", ").append(line.name()).append(' ').append(figure(plot.y(), line.at(cursor)));
		}
		return text.toString();
	}
}
