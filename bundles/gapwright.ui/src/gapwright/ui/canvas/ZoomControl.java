package gapwright.ui.canvas;

import org.eclipse.draw2d.FigureCanvas;
import org.eclipse.draw2d.geometry.Point;
import org.eclipse.draw2d.geometry.Rectangle;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Event;

/**
 * Zooms by changing the scale of millimetres, so that words and line widths stay as large as they are. Control and the
 * wheel zoom at the pointer.
 */
public final class ZoomControl {

	private static final double STEP = 1.25;
	private static final int MARGIN = 24;
	/** Room for labels on either side, px. */
	private static final int BESIDE = 130;
	/** Room for labels above and below, px. */
	private static final int ABOVE = 85;
	private static final double MOST_FIT = 2;

	private final FigureCanvas control;
	private final CanvasModel canvas;
	/** Until the user zooms, the drawing is fitted again whenever the control changes its size. */
	private boolean fitting = true;

	ZoomControl(FigureCanvas control, CanvasModel canvas) {
		this.control = control;
		this.canvas = canvas;
		control.addListener(SWT.MouseVerticalWheel, this::wheel);
	}

	private void wheel(Event event) {
		if ((event.stateMask & SWT.MOD1) != 0) {
			event.doit = false;
			zoomAt(event.x, event.y, event.count > 0 ? STEP : 1 / STEP);
		}
	}

	/** Makes everything larger. */
	public void in() {
		zoomAt(control.getClientArea().width / 2, control.getClientArea().height / 2, STEP);
	}

	/** Makes everything smaller. */
	public void out() {
		zoomAt(control.getClientArea().width / 2, control.getClientArea().height / 2, 1 / STEP);
	}

	/** @param zoom 1 for 100 % */
	public void to(double zoom) {
		zoomAt(control.getClientArea().width / 2, control.getClientArea().height / 2, zoom / canvas.scale().zoom());
	}

	/** Keeps the place on the page that is under a point of the control where it is. */
	private void zoomAt(int x, int y, double factor) {
		fitting = false;
		Point view = control.getViewport().getViewLocation();
		double millimetreX = canvas.scale().millimetres(view.x + x);
		double millimetreY = canvas.scale().millimetres(view.y + y);
		canvas.setScale(CanvasScale.zoom(canvas.scale().zoom() * factor));
		control.getLightweightSystem().getUpdateManager().performUpdate();
		control.getViewport().setViewLocation((int) Math.round(canvas.scale().pixels(millimetreX)) - x,
				(int) Math.round(canvas.scale().pixels(millimetreY)) - y);
	}

	/** The control has another size. */
	void resized() {
		if (fitting && control.getClientArea().width > 2 * MARGIN) {
			fit();
		}
	}

	/** Shows the whole drawing with its labels as large as it goes, at most at 200 %. */
	public void fit() {
		fitting = true;
		org.eclipse.swt.graphics.Rectangle room = control.getClientArea();
		// labels keep their size at every zoom: room is left for them round the drawing
		double[] full = canvas.drawingAt(CanvasScale.zoom(1)).drawingBounds();
		if (full[2] <= 0 || full[3] <= 0) {
			return;
		}
		double zoom = Math.min(Math.max(room.width - 2 * BESIDE, room.width / 3) / full[2],
				Math.max(room.height - 2 * ABOVE, room.height / 3) / full[3]);
		canvas.setScale(CanvasScale.zoom(Math.min(MOST_FIT, zoom)));
		control.getLightweightSystem().getUpdateManager().performUpdate();
		double[] box = canvas.picture().bounds();
		Rectangle all = new Rectangle((int) box[0], (int) box[1], (int) box[2], (int) box[3]);
		control.getViewport().setViewLocation(all.getCenter().x - room.width / 2, all.getCenter().y - room.height / 2);
	}
}
