package gapwright.ui.canvas;

import java.util.Locale;

import org.eclipse.draw2d.FigureCanvas;
import org.eclipse.draw2d.Viewport;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Canvas;
import org.eclipse.swt.widgets.Composite;

import gapwright.ui.fields.ThemeColours;

/** Rulers in millimetres above and to the left of the page. */
final class RulerFrame {

	private static final int THICKNESS = 20;
	private static final int LABELLED = 50;

	private final CanvasModel canvas;
	private final Canvas top;
	private final Canvas left;
	private final Composite middle;
	private Viewport viewport;

	RulerFrame(Composite parent, CanvasModel canvas) {
		this.canvas = canvas;
		GridLayout grid = new GridLayout(2, false);
		grid.marginWidth = 0;
		grid.marginHeight = 0;
		grid.horizontalSpacing = 0;
		grid.verticalSpacing = 0;
		parent.setLayout(grid);
		Canvas corner = new Canvas(parent, SWT.DOUBLE_BUFFERED);
		corner.setLayoutData(new GridData(THICKNESS, THICKNESS));
		corner.addListener(SWT.Paint, event -> {
			fill(event.gc, corner);
			event.gc.drawText("mm", 2, 4, true);
		});
		top = new Canvas(parent, SWT.DOUBLE_BUFFERED);
		GridData across = new GridData(SWT.FILL, SWT.FILL, true, false);
		across.heightHint = THICKNESS;
		top.setLayoutData(across);
		top.addListener(SWT.Paint, event -> paint(event.gc, true));
		left = new Canvas(parent, SWT.DOUBLE_BUFFERED);
		GridData down = new GridData(SWT.FILL, SWT.FILL, false, true);
		down.widthHint = THICKNESS;
		left.setLayoutData(down);
		left.addListener(SWT.Paint, event -> paint(event.gc, false));
		middle = new Composite(parent, SWT.NONE);
		middle.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
	}

	/** @return where the page goes */
	Composite middle() {
		return middle;
	}

	/** Keeps the rulers beside what the control shows. */
	void follow(FigureCanvas control) {
		viewport = control.getViewport();
		Runnable redraw = () -> {
			if (!top.isDisposed()) {
				top.redraw();
				left.redraw();
			}
		};
		viewport.addPropertyChangeListener(Viewport.PROPERTY_VIEW_LOCATION, event -> redraw.run());
		canvas.addListener(redraw);
	}

	private static void fill(GC gc, Canvas ruler) {
		gc.setBackground(ThemeColours.IRON.get());
		gc.fillRectangle(ruler.getClientArea());
		gc.setForeground(ThemeColours.NOTE.get());
		gc.setFont(RulerFont.get());
	}

	private void paint(GC gc, boolean horizontal) {
		Canvas ruler = horizontal ? top : left;
		fill(gc, ruler);
		Rectangle area = ruler.getClientArea();
		int length = horizontal ? area.width : area.height;
		int offset = horizontal ? viewport.getViewLocation().x : viewport.getViewLocation().y;
		double step = canvas.scale().gridMillimetres();
		int labelEvery = 1;
		for (int candidate : new int[] { 1, 2, 5, 10, 20, 50, 100 }) {
			labelEvery = candidate;
			if (canvas.scale().pixels(step * candidate) >= LABELLED) {
				break;
			}
		}
		long first = (long) Math.floor(canvas.scale().millimetres(offset) / step);
		for (long k = first; canvas.scale().pixels(k * step) - offset <= length; k++) {
			int at = (int) Math.round(canvas.scale().pixels(k * step)) - offset;
			boolean labelled = Math.floorMod(k, labelEvery) == 0;
			int tick = labelled ? THICKNESS - 2 : 4;
			if (horizontal) {
				gc.drawLine(at, THICKNESS - tick, at, THICKNESS);
			} else {
				gc.drawLine(THICKNESS - tick, at, THICKNESS, at);
			}
			if (labelled) {
				label(gc, k * step, at, horizontal);
			}
		}
	}

	private static void label(GC gc, double millimetres, int at, boolean horizontal) {
		String text = millimetres == Math.rint(millimetres) ? Long.toString((long) millimetres)
				: String.format(Locale.ROOT, "%.1f", millimetres);
		if (horizontal) {
			gc.drawText(text, at + 3, 1, true);
		} else {
			gc.drawText(text, 1, at + 1, true);
		}
	}
}
