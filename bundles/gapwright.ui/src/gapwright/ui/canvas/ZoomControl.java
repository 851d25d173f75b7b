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
	/** Kept free round a fitted picture, px. */
	private static final int MARGIN = 6;
	private static final double MOST_FIT = 2;
	/** A fit goes no smaller: labels alone would fill a tiny canvas. */
	private static final double LEAST_FIT = 0.1;
	private static final double BIGGEST_STEP = 0.75;
	private static final double SMALLEST_STEP = 0.97;

	private final FigureCanvas control;
	private final CanvasModel canvas;
	/** Until the user zooms or edits, the drawing is fitted again whenever the control changes its size. */
	private boolean fitting = true;

	ZoomControl(FigureCanvas control, CanvasModel canvas) {
		this.control = control;
		this.canvas = canvas;
		control.addListener(SWT.MouseVerticalWheel, this::wheel);
		canvas.session().history().addListener(() -> fitting = false);
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
		if (fitting && control.getClientArea().width > 4 * MARGIN && control.getClientArea().height > 4 * MARGIN) {
			fit();
		}
	}

	/** How many times larger than the room the picture is. */
	private double over(double zoom, org.eclipse.swt.graphics.Rectangle room) {
		double[] box = canvas.pictureAt(CanvasScale.zoom(zoom)).bounds();
		return Math.max(box[2] / (room.width - 2 * MARGIN), box[3] / (room.height - 2 * MARGIN));
	}

	/** Shows the whole drawing with its labels as large as it goes, at most at 200 %. */
	public void fit() {
		fitting = true;
		org.eclipse.swt.graphics.Rectangle room = control.getClientArea();
		double[] full = canvas.drawingAt(CanvasScale.zoom(1)).drawingBounds();
		if (full[2] <= 0 || full[3] <= 0) {
			return;
		}
		double zoom = Math.min(MOST_FIT, Math.min(room.width / full[2], room.height / full[3]));
		// labels keep their size at every zoom and find other places: only a try shows what room they take
		for (double over = over(zoom, room); over > 1 && zoom > LEAST_FIT; over = over(zoom, room)) {
			zoom *= Math.max(BIGGEST_STEP, Math.min(SMALLEST_STEP, 1 / over));
		}
		canvas.setScale(CanvasScale.zoom(zoom));
		control.getLightweightSystem().getUpdateManager().performUpdate();
		double[] box = canvas.picture().bounds();
		Rectangle all = new Rectangle((int) box[0], (int) box[1], (int) box[2], (int) box[3]);
		control.getViewport().setViewLocation(all.getCenter().x - room.width / 2, all.getCenter().y - room.height / 2);
	}
}
