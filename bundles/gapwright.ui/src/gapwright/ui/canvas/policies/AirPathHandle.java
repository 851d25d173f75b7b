package gapwright.ui.canvas.policies;

import org.eclipse.draw2d.Cursors;
import org.eclipse.draw2d.Graphics;
import org.eclipse.draw2d.geometry.Point;
import org.eclipse.gef.DragTracker;
import org.eclipse.gef.handles.AbstractHandle;

import gapwright.ui.canvas.looks.AirPathLook;
import gapwright.ui.canvas.parts.AirPathPart;
import gapwright.ui.canvas.tools.EndDrag;

/** A small square near one end of a selected air path. */
final class AirPathHandle extends AbstractHandle {

	private final boolean atFrom;

	AirPathHandle(AirPathPart part, boolean atFrom) {
		super(part, target -> {
			AirPathLook look = part.look();
			if (look != null) {
				double[] near = look.near(atFrom, HandleBox.INSET);
				Point at = new Point((int) Math.round(near[0]), (int) Math.round(near[1]));
				part.getFigure().translateToAbsolute(at);
				target.translateToRelative(at);
				target.setBounds(HandleBox.around(at));
			}
		});
		this.atFrom = atFrom;
		setPreferredSize(HandleBox.SIZE, HandleBox.SIZE);
		setCursor(Cursors.CROSS);
	}

	@Override
	protected DragTracker createDragTracker() {
		return new EndDrag((AirPathPart) getOwner(), atFrom);
	}

	@Override
	protected void paintFigure(Graphics graphics) {
		HandleBox.paint(graphics, getBounds().getCopy());
	}
}
