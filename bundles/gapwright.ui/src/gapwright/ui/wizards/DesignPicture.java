package gapwright.ui.wizards;

import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.graphics.Transform;
import org.eclipse.swt.widgets.Canvas;
import org.eclipse.swt.widgets.Composite;

import gapwright.model.Coil;
import gapwright.model.Design;
import gapwright.model.Gap;
import gapwright.model.Leg;
import gapwright.model.LegGeometry;
import gapwright.model.Winding;
import gapwright.ui.fields.ThemeColours;

/** A small picture of a design to scale, as large as fits: bars, slots, magnets and coils. */
final class DesignPicture extends Canvas {

	private static final int MARGIN = 14;
	/** A slot is drawn at least this wide, else a gap of 0.5 mm could not be seen, px. */
	private static final float LEAST_SLOT = 3;

	private Design design;

	DesignPicture(Composite parent) {
		super(parent, SWT.DOUBLE_BUFFERED | SWT.BORDER);
		addListener(SWT.Paint, event -> paint(event.gc));
	}

	/** @param next null while there is no core to show */
	void show(Design next) {
		design = next;
		redraw();
	}

	private void paint(GC gc) {
		Rectangle area = getClientArea();
		gc.setBackground(ThemeColours.PAPER.get());
		gc.fillRectangle(area);
		if (design == null || design.getLegs().isEmpty()) {
			return;
		}
		gc.setAntialias(SWT.ON);
		PictureScale scale = PictureScale.fit(design, area.width - 2 * MARGIN, area.height - 2 * MARGIN);
		for (Leg leg : design.getLegs()) {
			paintLeg(gc, leg, scale);
		}
		for (Winding winding : design.getWindings()) {
			for (Coil coil : winding.getCoils()) {
				along(gc, coil.getLeg(), scale, () -> paintCoil(gc, coil, scale));
			}
		}
	}

	/** Runs with the leg's start at the origin and the leg along the x axis. */
	private void along(GC gc, Leg leg, PictureScale scale, Runnable painter) {
		float x = MARGIN + scale.x(leg.getFrom());
		float y = MARGIN + scale.y(leg.getFrom());
		double angle = Math.atan2(scale.y(leg.getTo()) - scale.y(leg.getFrom()), scale.x(leg.getTo()) - scale.x(leg.getFrom()));
		Transform transform = new Transform(gc.getDevice());
		transform.translate(x, y);
		transform.rotate((float) Math.toDegrees(angle));
		gc.setTransform(transform);
		painter.run();
		gc.setTransform(null);
		transform.dispose();
	}

	private void paintLeg(GC gc, Leg leg, PictureScale scale) {
		along(gc, leg, scale, () -> {
			int length = Math.round(scale.pixels(LegGeometry.jointDistance(leg)));
			int width = Math.round(scale.pixels(LegGeometry.drawnWidth(leg)));
			gc.setBackground(ThemeColours.IRON.get());
			gc.setForeground(ThemeColours.INK.get());
			gc.fillRectangle(0, -width / 2, length, width);
			gc.drawRectangle(0, -width / 2, length, width);
			for (Gap gap : leg.getGaps()) {
				double slot = LegGeometry.si(gap.getLength()) * gap.getPieces();
				paintSlot(gc, (int) Math.round(length * gap.getPosition()), Math.max(LEAST_SLOT, scale.pixels(slot)), width);
			}
			if (leg.getMagnet() != null) {
				int thick = Math.round(Math.max(LEAST_SLOT, scale.pixels(LegGeometry.si(leg.getMagnet().getLength()))));
				gc.setBackground(ThemeColours.MAGNET.get());
				gc.fillRectangle((int) Math.round(length * leg.getMagnet().getPosition()) - thick / 2, -width / 2, thick, width);
			}
		});
	}

	private static void paintSlot(GC gc, int middle, float slot, int width) {
		int left = Math.round(middle - slot / 2);
		int right = Math.round(middle + slot / 2);
		gc.setBackground(ThemeColours.PAPER.get());
		gc.fillRectangle(left, -width / 2 - 1, right - left, width + 3);
		gc.drawLine(left, -width / 2, left, width / 2);
		gc.drawLine(right, -width / 2, right, width / 2);
	}

	private static void paintCoil(GC gc, Coil coil, PictureScale scale) {
		float length = scale.pixels(LegGeometry.jointDistance(coil.getLeg()));
		int half = Math.round(scale.pixels(LegGeometry.drawnWidth(coil.getLeg())) / 2);
		int count = Math.max(2, Math.min(6, coil.getTurns()));
		int size = Math.max(5, Math.min(11, Math.round(length * 0.5f / count)));
		int start = (int) Math.round(length * coil.getPosition() - count * size / 2.0);
		gc.setBackground(ThemeColours.COPPER.get());
		gc.setForeground(ThemeColours.COIL.get());
		for (int side : new int[] { -half - size - 3, half + 3 }) {
			for (int k = 0; k < count; k++) {
				gc.fillOval(start + k * size, side, size - 1, size - 1);
				gc.drawOval(start + k * size, side, size - 1, size - 1);
			}
		}
	}
}
