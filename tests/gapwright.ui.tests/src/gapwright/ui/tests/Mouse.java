package gapwright.ui.tests;

import org.eclipse.draw2d.FigureCanvas;
import org.eclipse.draw2d.Viewport;
import org.eclipse.gef.GraphicalViewer;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.widgets.Event;

import gapwright.ui.canvas.CanvasModel;
import gapwright.ui.canvas.CanvasPage;
import gapwright.ui.editor.DesignEditor;

/** The mouse over the canvas of an editor, in millimetres of the page; real events of the X server. */
final class Mouse {

	private static final int STEPS = 6;
	/** ms without any event. */
	private static final long SETTLED = 500;

	private final FigureCanvas control;
	private final CanvasModel canvas;

	Mouse(DesignEditor editor) {
		editor.showPage(0);
		control = (FigureCanvas) editor.getAdapter(GraphicalViewer.class).getControl();
		canvas = editor.getAdapter(CanvasPage.class).canvas();
		Workbench.focus(control);
		// until views beside have found their size the drawing may be fitted anew, under the hand
		Workbench.drain(SETTLED);
	}

	FigureCanvas control() {
		return control;
	}

	private Point place(double x, double y) {
		Viewport viewport = control.getViewport();
		org.eclipse.draw2d.geometry.Point view = viewport.getViewLocation();
		return control.toDisplay((int) Math.round(canvas.scale().pixels(x)) - view.x,
				(int) Math.round(canvas.scale().pixels(y)) - view.y);
	}

	void move(double x, double y) {
		Point to = place(x, y);
		RealEvents.send("mousemove", Integer.toString(to.x), Integer.toString(to.y));
	}

	void down() {
		RealEvents.send("mousedown", "1");
	}

	void up() {
		RealEvents.send("mouseup", "1");
	}

	void click(double x, double y) {
		move(x, y);
		down();
		up();
	}

	/** Presses at one place and moves to another, without letting go. */
	void drag(double x1, double y1, double x2, double y2) {
		move(x1, y1);
		down();
		for (int step = 1; step <= STEPS; step++) {
			move(x1 + (x2 - x1) * step / STEPS, y1 + (y2 - y1) * step / STEPS);
		}
	}

	void dragAndDrop(double x1, double y1, double x2, double y2) {
		drag(x1, y1, x2, y2);
		up();
	}

	/** Turns the wheel with Control held at a place. */
	void zoom(double x, double y, int clicks) {
		Point at = control.toControl(place(x, y));
		Event event = new Event();
		event.x = at.x;
		event.y = at.y;
		event.count = clicks;
		event.stateMask = SWT.MOD1;
		control.notifyListeners(SWT.MouseVerticalWheel, event);
		Workbench.drain();
	}
}
