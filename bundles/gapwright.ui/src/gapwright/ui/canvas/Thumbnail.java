package gapwright.ui.canvas;

import org.eclipse.draw2d.FigureCanvas;
import org.eclipse.draw2d.Graphics;
import org.eclipse.draw2d.SWTGraphics;
import org.eclipse.draw2d.Viewport;
import org.eclipse.draw2d.geometry.Point;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Canvas;
import org.eclipse.swt.widgets.Composite;

import gapwright.ui.canvas.looks.Picture;
import gapwright.ui.canvas.paint.GraphicsPen;
import gapwright.ui.fields.ThemeColours;

/** The whole drawing in small, with a frame round what the canvas shows; clicking or dragging there scrolls it. */
final class Thumbnail extends Canvas {

	private static final int MARGIN = 8;
	private static final int SOON = 150;

	private final CanvasModel canvas;
	private final FigureCanvas shown;
	private final Runnable redraw = () -> {
		if (!isDisposed()) {
			redraw();
		}
	};
	/** A drag changes the drawing many times a second; in small that is seen soon enough a little later. */
	private final Runnable redrawSoon = () -> {
		if (!isDisposed()) {
			getDisplay().timerExec(SOON, redraw);
		}
	};
	private CanvasScale small = CanvasScale.zoom(1);
	private double left;
	private double top;

	Thumbnail(Composite parent, CanvasModel canvas, FigureCanvas shown) {
		super(parent, SWT.DOUBLE_BUFFERED | SWT.NO_BACKGROUND);
		this.canvas = canvas;
		this.shown = shown;
		canvas.addListener(redrawSoon);
		shown.getViewport().addPropertyChangeListener(Viewport.PROPERTY_VIEW_LOCATION, event -> redraw.run());
		addListener(SWT.Paint, event -> paint(event.gc));
		addListener(SWT.Resize, event -> redraw());
		addListener(SWT.Dispose, event -> canvas.removeListener(redrawSoon));
		addListener(SWT.MouseDown, event -> scroll(event.x, event.y));
		addListener(SWT.MouseMove, event -> {
			if ((event.stateMask & SWT.BUTTON1) != 0) {
				scroll(event.x, event.y);
			}
		});
	}

	private void paint(GC gc) {
		Rectangle area = getClientArea();
		gc.setBackground(ThemeColours.PAPER.get());
		gc.fillRectangle(area);
		double[] box = canvas.picture().drawingBounds();
		if (box[2] <= 0) {
			return;
		}
		double now = canvas.scale().pixelsPerMillimetre();
		double factor = Math.min((area.width - 2 * MARGIN) / box[2], (area.height - 2 * MARGIN) / box[3]);
		small = new CanvasScale(Math.max(0.01, now * factor));
		Picture picture = canvas.drawingAt(small);
		double[] bounds = picture.drawingBounds();
		left = bounds[0] - (area.width - bounds[2]) / 2;
		top = bounds[1] - (area.height - bounds[3]) / 2;
		Graphics graphics = new SWTGraphics(gc);
		graphics.translate((int) -left, (int) -top);
		picture.paintDrawing(new GraphicsPen(graphics));
		Point view = shown.getViewport().getViewLocation();
		graphics.setForegroundColor(ThemeColours.SELECTION.get());
		graphics.setLineWidth(1);
		graphics.drawRectangle((int) rescaled(view.x), (int) rescaled(view.y),
				(int) rescaled(shown.getClientArea().width) - 1, (int) rescaled(shown.getClientArea().height) - 1);
		graphics.dispose();
	}

	private double rescaled(double pixels) {
		return small.pixels(canvas.scale().millimetres(pixels));
	}

	private void scroll(int x, int y) {
		double millimetreX = small.millimetres(x + left);
		double millimetreY = small.millimetres(y + top);
		shown.getViewport().setViewLocation(
				(int) (canvas.scale().pixels(millimetreX) - shown.getClientArea().width / 2.0),
				(int) (canvas.scale().pixels(millimetreY) - shown.getClientArea().height / 2.0));
	}
}
