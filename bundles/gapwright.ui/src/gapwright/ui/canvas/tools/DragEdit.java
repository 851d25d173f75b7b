package gapwright.ui.canvas.tools;

import org.eclipse.draw2d.geometry.Point;
import org.eclipse.gef.GraphicalEditPart;
import org.eclipse.gef.tools.SelectEditPartTracker;
import org.eclipse.swt.SWT;
import org.eclipse.swt.events.KeyEvent;

import gapwright.model.edit.history.Edit;
import gapwright.model.edit.history.Gesture;
import gapwright.ui.canvas.CanvasModel;

/**
 * A drag that edits the design while it goes on: figures follow the pointer, and the whole is one step when the button
 * comes up, none when Escape is pressed.
 */
abstract class DragEdit extends SelectEditPartTracker {

	protected final CanvasModel canvas;
	private final GraphicalEditPart part;
	private Gesture gesture;
	private double[] start;

	DragEdit(GraphicalEditPart part, CanvasModel canvas) {
		super(part);
		this.part = part;
		this.canvas = canvas;
	}

	/**
	 * @param from where the drag began, mm
	 * @param to   where the pointer is, mm
	 * @return the whole edit against the design as it was when the drag began, or null for none there
	 */
	abstract Edit edit(double[] from, double[] to);

	/** @return whether the user holds snapping off */
	final boolean isSnappingOff() {
		return getCurrentInput().isModKeyDown(SWT.MOD1);
	}

	final double[] millimetres(Point location) {
		Point there = location.getCopy();
		part.getFigure().translateToRelative(there);
		return new double[] { canvas.scale().millimetres(there.x), canvas.scale().millimetres(there.y) };
	}

	@Override
	protected boolean handleDragStarted() {
		if (stateTransition(STATE_DRAG, STATE_DRAG_IN_PROGRESS)) {
			performConditionalSelection();
			start = millimetres(getStartLocation());
			gesture = canvas.session().history().begin();
		}
		return true;
	}

	@Override
	protected boolean handleDragInProgress() {
		if (isInState(STATE_DRAG_IN_PROGRESS) && gesture != null) {
			double[] now = millimetres(getLocation());
			// asked for once the design is again as it was when the drag began: it may look for joints there
			gesture.show(() -> {
				Edit edit = edit(start, now);
				return edit == null ? nothing() : edit;
			});
		}
		return true;
	}

	private Edit nothing() {
		return new Edit("Move", canvas.session().design(), () -> {
			// the pointer is where there is nothing to do: the design shows as before
		});
	}

	@Override
	protected boolean handleButtonUp(int button) {
		if (gesture == null) {
			return super.handleButtonUp(button);
		}
		Gesture done = gesture;
		gesture = null;
		done.commit();
		setState(STATE_TERMINAL);
		return true;
	}

	@Override
	protected boolean handleKeyDown(KeyEvent event) {
		if (event.keyCode == SWT.ESC && gesture != null) {
			abandon();
			setState(STATE_INVALID);
			return true;
		}
		return super.handleKeyDown(event);
	}

	@Override
	public void deactivate() {
		abandon();
		super.deactivate();
	}

	private void abandon() {
		if (gesture != null) {
			Gesture open = gesture;
			gesture = null;
			open.cancel();
		}
	}
}
