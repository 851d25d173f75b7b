package gapwright.ui.canvas.policies;

import org.eclipse.draw2d.Graphics;
import org.eclipse.draw2d.geometry.Point;
import org.eclipse.draw2d.geometry.Rectangle;

import gapwright.ui.fields.ThemeColours;

/** The small square that all handles are. */
final class HandleBox {

	static final int SIZE = 9;
	/** Distance of a handle from the end it is for, beside the joint there, pixels. */
	static final double INSET = 14;

	private HandleBox() {
	}

	static Rectangle around(Point at) {
		return new Rectangle(at.x - SIZE / 2, at.y - SIZE / 2, SIZE, SIZE);
	}

	static void paint(Graphics graphics, Rectangle box) {
		graphics.setBackgroundColor(ThemeColours.PAPER.get());
		graphics.fillRectangle(box);
		graphics.setForegroundColor(ThemeColours.SELECTION.get());
		graphics.setLineWidth(2);
		graphics.drawRectangle(box.x + 1, box.y + 1, box.width - 3, box.height - 3);
	}
}
