package gapwright.ui.canvas.policies;

import org.eclipse.draw2d.Cursors;
import org.eclipse.draw2d.Graphics;
import org.eclipse.draw2d.geometry.Point;
import org.eclipse.gef.DragTracker;
import org.eclipse.gef.handles.AbstractHandle;

import gapwright.ui.canvas.looks.LegLook;
import gapwright.ui.canvas.parts.LegPart;
import gapwright.ui.canvas.tools.EndDrag;
import gapwright.ui.canvas.tools.WidthDrag;

/** A small square on a selected leg. */
public final class LegHandle extends AbstractHandle {

	/** Where on the leg a handle sits. */
	public enum Place {
		FROM, TO, LEFT_WALL, RIGHT_WALL
	}

	private final Place place;

	LegHandle(LegPart part, Place place) {
		super(part, target -> {
			LegLook look = part.look();
			if (look != null) {
				Point at = position(look, place);
				part.getFigure().translateToAbsolute(at);
				target.translateToRelative(at);
				target.setBounds(HandleBox.around(at));
			}
		});
		this.place = place;
		setPreferredSize(HandleBox.SIZE, HandleBox.SIZE);
		setCursor(place == Place.FROM || place == Place.TO ? Cursors.CROSS : Cursors.SIZEALL);
	}

	private static Point position(LegLook look, Place place) {
		double[] axis = look.axis();
		double dx = axis[2] - axis[0];
		double dy = axis[3] - axis[1];
		double length = Math.max(1e-9, Math.hypot(dx, dy));
		double half = look.width() / 2;
		double inset = Math.min(HandleBox.INSET, length / 4);
		return switch (place) {
		case FROM -> point(axis[0] + inset * dx / length, axis[1] + inset * dy / length);
		case TO -> point(axis[2] - inset * dx / length, axis[3] - inset * dy / length);
		case LEFT_WALL -> point(axis[0] + 0.38 * dx - half * dy / length, axis[1] + 0.38 * dy + half * dx / length);
		case RIGHT_WALL -> point(axis[0] + 0.38 * dx + half * dy / length, axis[1] + 0.38 * dy - half * dx / length);
		};
	}

	private static Point point(double x, double y) {
		return new Point((int) Math.round(x), (int) Math.round(y));
	}

	@Override
	protected DragTracker createDragTracker() {
		LegPart part = (LegPart) getOwner();
		return switch (place) {
		case FROM -> new EndDrag(part, true);
		case TO -> new EndDrag(part, false);
		case LEFT_WALL, RIGHT_WALL -> new WidthDrag(part);
		};
	}

	@Override
	protected void paintFigure(Graphics graphics) {
		HandleBox.paint(graphics, getBounds().getCopy());
	}
}
