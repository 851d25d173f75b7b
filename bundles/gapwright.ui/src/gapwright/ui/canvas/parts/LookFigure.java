package gapwright.ui.canvas.parts;

import java.util.function.Supplier;

import org.eclipse.draw2d.Figure;
import org.eclipse.draw2d.Graphics;
import org.eclipse.draw2d.IFigure;
import org.eclipse.draw2d.geometry.Rectangle;

import gapwright.ui.canvas.looks.Look;
import gapwright.ui.canvas.looks.Shapes;
import gapwright.ui.canvas.paint.GraphicsPen;
import gapwright.ui.canvas.paint.Pen;
import gapwright.ui.canvas.paint.Tone;

/** Paints one look, and an outline round it while it is selected. */
public final class LookFigure extends Figure {

	private static final int OUTLINE = 3;

	private final Supplier<IFigure> hover;
	private Look look;
	private boolean selected;

	/** @param hover makes what is shown while the pointer rests on the figure, or answers null */
	public LookFigure(Supplier<IFigure> hover) {
		this.hover = hover;
	}

	/** @param next null hides the figure */
	public void show(Look next) {
		if (next != null && next.equals(look) && isVisible()) {
			return;
		}
		look = next;
		setVisible(next != null);
		if (next != null) {
			double[] box = next.bounds();
			int left = (int) Math.floor(box[0]) - OUTLINE;
			int top = (int) Math.floor(box[1]) - OUTLINE;
			setBounds(new Rectangle(left, top, (int) Math.ceil(box[0] + box[2]) + OUTLINE - left,
					(int) Math.ceil(box[1] + box[3]) + OUTLINE - top));
			repaint();
		}
	}

	/** @return null while hidden */
	public Look look() {
		return look;
	}

	void setSelected(boolean now) {
		selected = now;
		repaint();
	}

	@Override
	public boolean containsPoint(int x, int y) {
		return look != null && look.contains(x, y);
	}

	@Override
	public IFigure getToolTip() {
		return hover.get();
	}

	@Override
	protected void paintFigure(Graphics graphics) {
		if (look != null) {
			Pen pen = new GraphicsPen(graphics);
			look.paint(pen);
			if (selected) {
				double[] box = look.bounds();
				double[] frame = look.highlight();
				pen.outline(frame == null ? Shapes.corners(box) : frame, Tone.SELECTION, 2);
			}
		}
	}
}
