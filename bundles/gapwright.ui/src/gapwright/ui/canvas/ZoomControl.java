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
	private static final int FITS = 4;

	private final FigureCanvas control;
	private final CanvasModel canvas;
	private boolean fitted;

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
		Point view = control.getViewport().getViewLocation();
		double millimetreX = canvas.scale().millimetres(view.x + x);
		double millimetreY = canvas.scale().millimetres(view.y + y);
		canvas.setScale(CanvasScale.zoom(canvas.scale().zoom() * factor));
		control.getLightweightSystem().getUpdateManager().performUpdate();
		control.getViewport().setViewLocation((int) Math.round(canvas.scale().pixels(millimetreX)) - x,
				(int) Math.round(canvas.scale().pixels(millimetreY)) - y);
	}

	/** Fits when the control first gets a size. */
	void fitOnce() {
		if (!fitted && control.getClientArea().width > 2 * MARGIN) {
			fitted = true;
			fit();
		}
	}

	/** Shows the whole drawing with its labels as large as it goes, at most at 200 %. */
	public void fit() {
		org.eclipse.swt.graphics.Rectangle room = control.getClientArea();
		// labels keep their size, so the box does not scale with the zoom: a few rounds settle it
		double zoom = canvas.scale().zoom();
		for (int round = 0; round < FITS; round++) {
			double[] box = canvas.pictureAt(CanvasScale.zoom(zoom)).bounds();
			if (box[2] <= 0 || box[3] <= 0) {
				return;
			}
			zoom *= Math.min((room.width - 2 * MARGIN) / box[2], (room.height - 2 * MARGIN) / box[3]);
			zoom = Math.max(0.1, Math.min(2, zoom));
		}
		canvas.setScale(CanvasScale.zoom(zoom));
		control.getLightweightSystem().getUpdateManager().performUpdate();
		double[] box = canvas.picture().bounds();
		Rectangle all = new Rectangle((int) box[0], (int) box[1], (int) box[2], (int) box[3]);
		control.getViewport().setViewLocation(all.getCenter().x - room.width / 2, all.getCenter().y - room.height / 2);
	}
}
