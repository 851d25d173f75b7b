package gapwright.ui.wizards;

import org.eclipse.draw2d.Graphics;
import org.eclipse.draw2d.SWTGraphics;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Canvas;
import org.eclipse.swt.widgets.Composite;

import gapwright.model.Design;
import gapwright.model.OperatingPoint;
import gapwright.study.OperatingPointResult;
import gapwright.study.Study;
import gapwright.ui.canvas.CanvasScale;
import gapwright.ui.canvas.looks.Picture;
import gapwright.ui.canvas.looks.PictureMaker;
import gapwright.ui.canvas.paint.GraphicsPen;
import gapwright.ui.fields.ThemeColours;

/** The drawing that a start would give, computed, as large as fits; painted as the canvas paints it, without labels. */
final class DesignPicture extends Canvas {

	private static final int MARGIN = 14;

	private Design design;
	private OperatingPointResult result;

	DesignPicture(Composite parent) {
		super(parent, SWT.DOUBLE_BUFFERED | SWT.BORDER);
		addListener(SWT.Paint, event -> paint(event.gc));
		addListener(SWT.Resize, event -> redraw());
	}

	/** @param next null while there is no core to show */
	void show(Design next) {
		design = next;
		result = next == null || next.getOperatingPoints().isEmpty() ? null : Study.of(next).operatingPoints().get(0);
		redraw();
	}

	private void paint(GC gc) {
		Rectangle area = getClientArea();
		gc.setBackground(ThemeColours.PAPER.get());
		gc.fillRectangle(area);
		if (design == null || design.getLegs().isEmpty()) {
			return;
		}
		Graphics graphics = new SWTGraphics(gc);
		GraphicsPen pen = new GraphicsPen(graphics);
		double[] box = picture(CanvasScale.zoom(1), pen).drawingBounds();
		double fit = Math.min((area.width - 2.0 * MARGIN) / box[2], (area.height - 2.0 * MARGIN) / box[3]);
		Picture picture = picture(CanvasScale.zoom(fit), pen);
		double[] bounds = picture.drawingBounds();
		graphics.translate((int) ((area.width - bounds[2]) / 2 - bounds[0]), (int) ((area.height - bounds[3]) / 2 - bounds[1]));
		picture.paintDrawing(pen);
		graphics.dispose();
	}

	private Picture picture(CanvasScale scale, GraphicsPen pen) {
		OperatingPoint point = design.getOperatingPoints().isEmpty() ? null : design.getOperatingPoints().get(0);
		return new PictureMaker(design, point, result, scale, pen).make();
	}
}
