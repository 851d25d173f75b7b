package gapwright.ui.canvas.parts;

import org.eclipse.draw2d.FreeformLayer;
import org.eclipse.draw2d.Graphics;
import org.eclipse.draw2d.geometry.Rectangle;

import gapwright.ui.canvas.CanvasScale;
import gapwright.ui.canvas.looks.Picture;
import gapwright.ui.canvas.paint.GraphicsPen;
import gapwright.ui.canvas.paint.Tone;
import gapwright.ui.fields.ThemeColours;

/** The page: paper with a millimetre grid below the elements, labels above them. */
final class PageLayer extends FreeformLayer {

	/** Room round the drawing that can be scrolled to, px. */
	private static final int MARGIN = 60;
	/** Grid lines lie at least this far apart, px. */
	private static final double LEAST_CELL = 24;
	private static final int MAJOR = 2;

	private CanvasScale scale = CanvasScale.zoom(1);
	private Picture picture;

	PageLayer() {
		setOpaque(true);
	}

	void show(Picture next, CanvasScale at) {
		picture = next;
		scale = at;
		fireExtentChanged();
		repaint();
	}

	@Override
	public Rectangle getFreeformExtent() {
		Rectangle extent = super.getFreeformExtent().getCopy();
		if (picture != null) {
			double[] box = picture.bounds();
			extent = new Rectangle((int) box[0] - MARGIN, (int) box[1] - MARGIN, (int) box[2] + 2 * MARGIN,
					(int) box[3] + 2 * MARGIN);
		}
		return extent.union(0, 0);
	}

	@Override
	protected void paintFigure(Graphics graphics) {
		Rectangle clip = graphics.getClip(new Rectangle());
		graphics.setBackgroundColor(ThemeColours.PAPER.get());
		graphics.fillRectangle(clip);
		double step = scale.gridMillimetres(LEAST_CELL);
		graphics.setForegroundColor(ThemeColours.valueOf(Tone.GRID.name()).get());
		graphics.setLineWidth(1);
		for (long k = (long) Math.floor(scale.millimetres(clip.x) / step); scale.pixels(k * step) <= clip.right(); k++) {
			int x = (int) Math.round(scale.pixels(k * step));
			graphics.setLineWidth(k % MAJOR == 0 ? 2 : 1);
			graphics.drawLine(x, clip.y, x, clip.bottom());
		}
		for (long k = (long) Math.floor(scale.millimetres(clip.y) / step); scale.pixels(k * step) <= clip.bottom(); k++) {
			int y = (int) Math.round(scale.pixels(k * step));
			graphics.setLineWidth(k % MAJOR == 0 ? 2 : 1);
			graphics.drawLine(clip.x, y, clip.right(), y);
		}
		graphics.setLineWidth(1);
	}

	@Override
	protected void paintChildren(Graphics graphics) {
		super.paintChildren(graphics);
		if (picture != null) {
			picture.paintLabels(new GraphicsPen(graphics));
		}
	}
}
