package gapwright.ui.plot;

import java.util.function.DoubleConsumer;

import org.eclipse.draw2d.SWTGraphics;
import org.eclipse.swt.SWT;
import org.eclipse.swt.accessibility.AccessibleAdapter;
import org.eclipse.swt.accessibility.AccessibleEvent;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Canvas;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Event;

import gapwright.ui.canvas.paint.GraphicsPen;
import gapwright.ui.canvas.paint.Pen;
import gapwright.ui.fields.ThemeColours;

/**
 * Shows a plot. The mouse or the arrow keys read the lines out; the wheel, or plus and minus, zooms the x axis about the
 * cursor, a double click or 0 shows all of it.
 */
public final class PlotCanvas extends Canvas {

	private static final double ZOOM = 1.25;
	private static final double STEP = 0.01;

	private final String name;
	private Plot whole;
	private Plot shown;
	private String message = "";
	private double cursor = Double.NaN;
	private DoubleConsumer onCursor = value -> { };

	public PlotCanvas(Composite parent, String name) {
		super(parent, SWT.DOUBLE_BUFFERED);
		this.name = name;
		addListener(SWT.Paint, event -> paint(event.gc));
		addListener(SWT.MouseMove, event -> point(valueAt(event.x)));
		addListener(SWT.MouseExit, event -> point(Double.NaN));
		addListener(SWT.MouseDown, event -> setFocus());
		addListener(SWT.MouseDoubleClick, event -> showAll());
		addListener(SWT.MouseWheel, event -> zoom(event.count > 0 ? 1 / ZOOM : ZOOM));
		addListener(SWT.KeyDown, this::key);
		addListener(SWT.Traverse, event -> event.doit = event.detail == SWT.TRAVERSE_TAB_NEXT || event.detail == SWT.TRAVERSE_TAB_PREVIOUS);
		addListener(SWT.FocusIn, event -> redraw());
		addListener(SWT.FocusOut, event -> redraw());
		getAccessible().addAccessibleListener(new AccessibleAdapter() {
			@Override
			public void getName(AccessibleEvent event) {
				event.result = shown == null ? name + ": " + message : Double.isNaN(cursor) ? name : name + ": " + PlotPainter.words(shown, cursor);
			}
		});
		setToolTipText(null);
	}

	/** Shows a plot; a zoom into the same range is kept. */
	public void show(Plot plot) {
		boolean same = whole != null && shown != null && whole.x().from() == plot.x().from() && whole.x().to() == plot.x().to();
		shown = same ? plot.over(shown.x().from(), shown.x().to()) : plot;
		whole = plot;
		redraw();
	}

	/** Shows a sentence instead. */
	public void say(String sentence) {
		whole = null;
		shown = null;
		message = sentence;
		redraw();
	}

	/** @return what is shown, zoomed as it is; null when nothing is */
	public Plot plot() {
		return shown;
	}

	/** @param listener told of every move of the cursor here, NaN when it leaves */
	public void onCursor(DoubleConsumer listener) {
		onCursor = listener;
	}

	/** Puts the cursor somewhere, without telling the listener. */
	public void cursor(double value) {
		if (Double.compare(cursor, value) != 0) {
			cursor = value;
			redraw();
		}
	}

	private void point(double value) {
		cursor(value);
		onCursor.accept(value);
	}

	private double valueAt(int pixel) {
		if (shown == null) {
			return Double.NaN;
		}
		GC gc = new GC(this);
		SWTGraphics graphics = new SWTGraphics(gc);
		Rectangle area = getClientArea();
		double value = PlotPainter.valueAt(shown, new GraphicsPen(graphics), area.width, area.height, pixel);
		graphics.dispose();
		gc.dispose();
		return value;
	}

	private void zoom(double factor) {
		if (shown == null) {
			return;
		}
		double about = Double.isNaN(cursor) ? (shown.x().from() + shown.x().to()) / 2 : cursor;
		double from = Math.max(whole.x().from(), about - (about - shown.x().from()) * factor);
		double to = Math.min(whole.x().to(), about + (shown.x().to() - about) * factor);
		if (to - from > 1e-6 * (whole.x().to() - whole.x().from())) {
			shown = whole.over(from, to);
			redraw();
		}
	}

	private void showAll() {
		shown = whole;
		redraw();
	}

	private void key(Event event) {
		if (shown == null) {
			return;
		}
		double step = (shown.x().to() - shown.x().from()) * STEP * ((event.stateMask & SWT.SHIFT) != 0 ? 10 : 1);
		double from = Double.isNaN(cursor) ? shown.x().from() : cursor;
		switch (event.keyCode) {
		case SWT.ARROW_RIGHT -> point(Math.min(shown.x().to(), from + step));
		case SWT.ARROW_LEFT -> point(Math.max(shown.x().from(), from - step));
		case SWT.HOME -> point(shown.x().from());
		case SWT.END -> point(shown.x().to());
		case SWT.ESC -> point(Double.NaN);
		default -> {
			switch (event.character) {
			case '+' -> zoom(1 / ZOOM);
			case '-' -> zoom(ZOOM);
			case '0' -> showAll();
			default -> {
				// not ours
			}
			}
		}
		}
	}

	private void paint(GC gc) {
		Rectangle area = getClientArea();
		gc.setBackground(ThemeColours.PAPER.get());
		gc.fillRectangle(area);
		if (shown == null) {
			gc.setForeground(ThemeColours.NOTE.get());
			gc.drawText(message, 12, 12, true);
			return;
		}
		SWTGraphics graphics = new SWTGraphics(gc);
		Pen pen = new GraphicsPen(graphics);
		PlotPainter.paint(shown, pen, area.width, area.height, cursor);
		graphics.dispose();
		if (isFocusControl()) {
			gc.setForeground(ThemeColours.SELECTION.get());
			gc.setLineStyle(SWT.LINE_DOT);
			gc.drawRectangle(0, 0, area.width - 1, area.height - 1);
		}
	}
}
