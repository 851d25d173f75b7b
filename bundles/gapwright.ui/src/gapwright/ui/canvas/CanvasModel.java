package gapwright.ui.canvas;

import java.util.List;
import java.util.concurrent.CopyOnWriteArrayList;

import gapwright.ui.canvas.looks.Picture;
import gapwright.ui.canvas.looks.PictureMaker;
import gapwright.ui.canvas.paint.Pen;
import gapwright.ui.session.DesignSession;
import gapwright.ui.session.SessionListener;

/**
 * What a canvas shows: a session at a scale, as a picture made anew after every change. The picture never holds figures
 * of an older design, because the session has none then.
 */
public final class CanvasModel {

	private final DesignSession session;
	private final Pen measure;
	private final List<Runnable> listeners = new CopyOnWriteArrayList<>();
	private final SessionListener sessionListener = this::changed;
	private CanvasScale scale = CanvasScale.zoom(1);
	private Picture picture;

	/** @param measure measures texts */
	public CanvasModel(DesignSession session, Pen measure) {
		this.session = session;
		this.measure = measure;
		session.addListener(sessionListener);
	}

	public DesignSession session() {
		return session;
	}

	public CanvasScale scale() {
		return scale;
	}

	public void setScale(CanvasScale next) {
		if (!next.equals(scale)) {
			scale = next;
			changed();
		}
	}

	public Picture picture() {
		if (picture == null) {
			picture = pictureAt(scale);
		}
		return picture;
	}

	/** @return a picture of the design as it is at another scale */
	public Picture pictureAt(CanvasScale other) {
		return maker(other).make();
	}

	/** @return the same without labels */
	public Picture drawingAt(CanvasScale other) {
		return maker(other).makeDrawing();
	}

	private PictureMaker maker(CanvasScale at) {
		return new PictureMaker(session.design(), session.operatingPoint(), session.pointResult(), at, measure);
	}

	/** The picture is made anew when it is next asked for; listeners are told at once. */
	public void changed() {
		picture = null;
		listeners.forEach(Runnable::run);
	}

	public void addListener(Runnable listener) {
		listeners.add(listener);
	}

	public void removeListener(Runnable listener) {
		listeners.remove(listener);
	}

	public void dispose() {
		session.removeListener(sessionListener);
		listeners.clear();
	}
}
