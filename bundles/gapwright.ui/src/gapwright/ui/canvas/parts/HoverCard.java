package gapwright.ui.canvas.parts;

import java.util.ArrayList;
import java.util.List;

import org.eclipse.draw2d.Figure;
import org.eclipse.draw2d.Graphics;
import org.eclipse.draw2d.geometry.Dimension;

import gapwright.ui.canvas.paint.Align;
import gapwright.ui.canvas.paint.CanvasFonts;
import gapwright.ui.canvas.paint.GraphicsPen;
import gapwright.ui.canvas.paint.Pen;
import gapwright.ui.canvas.paint.Tone;
import gapwright.ui.fields.ThemeColours;

/** What is known of an element, beside the pointer: a title, then each figure with where it comes from. */
final class HoverCard extends Figure {

	private static final int MARGIN = 10;
	private static final double TITLE = 13;
	private static final double SMALL = 11;
	private static final int ROW = 17;
	private static final int GUTTER = 14;
	/** Room for the origin of a figure; a longer one goes on in the next line, px. */
	private static final int ORIGIN = 330;

	private final String title;
	private final List<gapwright.ui.fields.Figure> figures;
	private final List<List<String>> origins = new ArrayList<>();
	private int names;
	private int values;

	HoverCard(String title, List<gapwright.ui.fields.Figure> figures) {
		this.title = title;
		this.figures = figures;
		int rows = 0;
		for (gapwright.ui.fields.Figure figure : figures) {
			names = Math.max(names, (int) CanvasFonts.width(figure.name(), SMALL, false));
			values = Math.max(values, (int) CanvasFonts.width(figure.value(), SMALL, true));
			List<String> lines = wrap(figure.origin());
			origins.add(lines);
			rows += Math.max(1, lines.size());
		}
		int width = figures.isEmpty() ? 0 : names + values + 2 * GUTTER + ORIGIN;
		setPreferredSize(new Dimension(2 * MARGIN + Math.max(width, (int) CanvasFonts.width(title, TITLE, true) + 4),
				2 * MARGIN + ROW + (figures.isEmpty() ? 0 : 6 + rows * ROW)));
	}

	private static List<String> wrap(String text) {
		List<String> lines = new ArrayList<>();
		String line = "";
		for (String word : text.split(" ")) {
			String longer = line.isEmpty() ? word : line + ' ' + word;
			if (!line.isEmpty() && CanvasFonts.width(longer, SMALL, false) > ORIGIN) {
				lines.add(line);
				line = word;
			} else {
				line = longer;
			}
		}
		lines.add(line);
		return lines;
	}

	@Override
	protected void paintFigure(Graphics graphics) {
		graphics.setBackgroundColor(ThemeColours.PAPER.get());
		graphics.fillRectangle(getBounds());
		graphics.setForegroundColor(ThemeColours.NOTE.get());
		graphics.drawRectangle(getBounds().x, getBounds().y, getBounds().width - 1, getBounds().height - 1);
		Pen pen = new GraphicsPen(graphics);
		double left = getBounds().x + MARGIN;
		double base = getBounds().y + MARGIN + TITLE;
		pen.text(title, left, base, Align.START, TITLE, true, Tone.INK);
		base += 6;
		double value = left + names + GUTTER;
		for (int i = 0; i < figures.size(); i++) {
			base += ROW;
			pen.text(figures.get(i).name(), left, base, Align.START, SMALL, false, Tone.INK);
			pen.text(figures.get(i).value(), value, base, Align.START, SMALL, true, Tone.INK);
			List<String> lines = origins.get(i);
			for (int k = 0; k < lines.size(); k++) {
				base += k == 0 ? 0 : ROW - 3;
				pen.text(lines.get(k), value + values + GUTTER, base, Align.START, SMALL, false, Tone.NOTE);
			}
		}
	}
}
