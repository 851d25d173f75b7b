package gapwright.ui.pages;

import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Canvas;
import org.eclipse.swt.widgets.Composite;

import gapwright.model.Material;
import gapwright.model.Saturation;
import gapwright.physics.material.BhCurve;
import gapwright.study.MaterialLowering;
import gapwright.ui.fields.FigureFormat;

/** Picture of a material's B against H, with the saturations legs are judged against as dashed lines. */
final class CurvePlot extends Canvas {

	private static final int SAMPLES = 200;
	private static final int LEFT = 52;
	private static final int BOTTOM = 34;
	private static final int TOP = 18;
	private static final int RIGHT = 14;

	private Material material;

	CurvePlot(Composite parent) {
		super(parent, SWT.DOUBLE_BUFFERED);
		addListener(SWT.Paint, event -> paint(event.gc));
	}

	void show(Material next) {
		material = next;
		redraw();
	}

	private void paint(GC gc) {
		Rectangle all = getClientArea();
		Rectangle area = new Rectangle(LEFT, TOP, all.width - LEFT - RIGHT, all.height - TOP - BOTTOM);
		if (material == null || area.width < 20 || area.height < 20) {
			return;
		}
		gc.setAntialias(SWT.ON);
		try {
			BhCurve curve = MaterialLowering.curve(material.getCurve());
			double highest = PlotRange.fluxDensity(material);
			paint(gc, area, curve, PlotRange.round(curve.fieldStrength(highest)), PlotRange.round(highest * 1.1));
		} catch (IllegalArgumentException e) {
			gc.drawText(e.getMessage(), LEFT, TOP + area.height / 2, true);
		}
	}

	private void paint(GC gc, Rectangle area, BhCurve curve, double widest, double highest) {
		int ink = gc.getAlpha();
		gc.setAlpha(60);
		for (int k = 0; k <= 4; k++) {
			int x = area.x + area.width * k / 4;
			int y = area.y + area.height * k / 4;
			gc.drawLine(x, area.y, x, area.y + area.height);
			gc.drawLine(area.x, y, area.x + area.width, y);
		}
		gc.setAlpha(ink);
		label(gc, "B", LEFT - 16, 0);
		label(gc, FigureFormat.fluxDensity(highest), 0, area.y - 6);
		label(gc, "0", LEFT - 12, area.y + area.height - 6);
		String end = "H  " + FigureFormat.si(widest, "A/m");
		label(gc, end, area.x + area.width - gc.textExtent(end).x, area.y + area.height + 6);
		for (Saturation saturation : material.getSaturations()) {
			saturation(gc, area, saturation, highest);
		}
		int[] line = new int[2 * (SAMPLES + 1)];
		for (int k = 0; k <= SAMPLES; k++) {
			line[2 * k] = area.x + area.width * k / SAMPLES;
			line[2 * k + 1] = y(area, curve.fluxDensity(widest * k / SAMPLES), highest);
		}
		gc.setLineWidth(2);
		gc.setClipping(area);
		gc.drawPolyline(line);
		gc.setClipping((Rectangle) null);
	}

	private void saturation(GC gc, Rectangle area, Saturation saturation, double highest) {
		if (saturation.getFluxDensity() == null) {
			return;
		}
		int y = y(area, saturation.getFluxDensity().si(), highest);
		gc.setLineWidth(1);
		gc.setLineStyle(SWT.LINE_DASH);
		gc.drawLine(area.x, y, area.x + area.width, y);
		gc.setLineStyle(SWT.LINE_SOLID);
		String text = saturation.getFluxDensity() + (saturation.getTemperature() == null ? "" : " at " + saturation.getTemperature());
		Point size = gc.textExtent(text);
		label(gc, text, area.x + area.width - size.x - 4, y - size.y - 1);
	}

	private static int y(Rectangle area, double fluxDensity, double highest) {
		return area.y + area.height - (int) Math.round(area.height * fluxDensity / highest);
	}

	private static void label(GC gc, String text, int x, int y) {
		gc.drawText(text, x, y, true);
	}
}
