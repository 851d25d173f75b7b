package gapwright.ui.views;

import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableItem;

import gapwright.ui.fields.ThemeColours;

/** Draws a signed bar into a column: from the middle to the right when the figure rises, to the left, hatched, when it falls. */
final class EffectPainter {

	private static final int EDGE = 5;

	private final LedgerTable<SensitivityRow> ledger;
	private final int column;
	private double greatest = 1;

	EffectPainter(LedgerTable<SensitivityRow> ledger, int column) {
		this.ledger = ledger;
		this.column = column;
		ledger.control().addListener(SWT.PaintItem, this::paint);
	}

	/** @param most what a bar from the middle to the end stands for */
	void scale(double most) {
		greatest = most > 0 ? most : 1;
	}

	private void paint(Event event) {
		Table table = ledger.control();
		int index = table.indexOf((TableItem) event.item);
		if (event.index != column || index < 0 || index >= ledger.rows().size()) {
			return;
		}
		double effect = ledger.rows().get(index).elasticity();
		Rectangle cell = ((TableItem) event.item).getBounds(column);
		int middle = cell.x + cell.width / 2;
		int half = cell.width / 2 - EDGE;
		int length = (int) Math.round(half * Math.min(1, Math.abs(effect) / greatest));
		Rectangle bar = new Rectangle(effect >= 0 ? middle : middle - length, cell.y + 4, length, cell.height - 9);
		event.gc.setBackground((effect >= 0 ? ThemeColours.WITHIN : ThemeColours.NEAR).get());
		event.gc.setAlpha(effect >= 0 ? 170 : 80);
		event.gc.fillRectangle(bar);
		event.gc.setAlpha(255);
		if (effect < 0) {
			hatch(event.gc, bar);
		}
		event.gc.setForeground(ThemeColours.NOTE.get());
		event.gc.drawLine(middle, cell.y + 2, middle, cell.y + cell.height - 3);
	}

	private static void hatch(GC gc, Rectangle area) {
		gc.setForeground(ThemeColours.NEAR.get());
		Rectangle clip = gc.getClipping();
		gc.setClipping(clip.intersection(area));
		for (int x = area.x - area.height; x < area.x + area.width; x += 5) {
			gc.drawLine(x, area.y + area.height, x + area.height, area.y);
		}
		gc.setClipping(clip);
	}
}
