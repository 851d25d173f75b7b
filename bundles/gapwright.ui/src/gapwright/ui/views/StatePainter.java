package gapwright.ui.views;

import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableItem;

import gapwright.study.LegState;
import gapwright.ui.fields.ThemeColours;

/**
 * Draws what the canvas draws, small, into the Leg ledger: a bar filled to the utilisation, hatched once near,
 * outlined twice once over; and a badge before the state's word. Readable without colour.
 */
final class StatePainter {

	private static final int BAR = 64;
	private static final int BADGE = 12;

	private final LedgerTable<LegRow> ledger;
	private final int stateColumn;
	private final int barColumn;

	StatePainter(LedgerTable<LegRow> ledger, int stateColumn, int barColumn) {
		this.ledger = ledger;
		this.stateColumn = stateColumn;
		this.barColumn = barColumn;
		ledger.control().addListener(SWT.PaintItem, this::paint);
	}

	private void paint(Event event) {
		Table table = ledger.control();
		int index = table.indexOf((TableItem) event.item);
		if (index < 0 || index >= ledger.rows().size()) {
			return;
		}
		LegRow row = ledger.rows().get(index);
		if (event.index == barColumn) {
			Rectangle cell = ((TableItem) event.item).getBounds(barColumn);
			bar(event.gc, new Rectangle(cell.x + 6, cell.y + 4, BAR, cell.height - 9), row.result().utilisation(), row.result().state());
		} else if (event.index == stateColumn) {
			Rectangle cell = ((TableItem) event.item).getBounds(stateColumn);
			badge(event.gc, cell.x + cell.width - BADGE - 6, cell.y + (cell.height - BADGE) / 2, row.result().state());
		}
	}

	private static void bar(GC gc, Rectangle bar, double utilisation, LegState state) {
		gc.setAntialias(SWT.ON);
		if (!Double.isNaN(utilisation)) {
			int filled = (int) Math.round(bar.width * Math.min(1, utilisation));
			gc.setBackground(ThemeColours.of(state).get());
			gc.setAlpha(state == LegState.WITHIN ? 150 : 70);
			gc.fillRectangle(bar.x, bar.y, filled, bar.height);
			gc.setAlpha(255);
			if (state != LegState.WITHIN) {
				hatch(gc, new Rectangle(bar.x, bar.y, filled, bar.height), state);
			}
		}
		gc.setForeground(ThemeColours.INK.get());
		gc.drawRectangle(bar.x, bar.y, bar.width, bar.height);
		if (state == LegState.OVER) {
			gc.setForeground(ThemeColours.of(state).get());
			gc.drawRectangle(bar.x - 2, bar.y - 2, bar.width + 4, bar.height + 4);
		}
	}

	private static void hatch(GC gc, Rectangle area, LegState state) {
		gc.setForeground(ThemeColours.of(state).get());
		Rectangle clip = gc.getClipping();
		gc.setClipping(clip.intersection(area));
		for (int x = area.x - area.height; x < area.x + area.width; x += 5) {
			gc.drawLine(x, area.y + area.height, x + area.height, area.y);
		}
		gc.setClipping(clip);
	}

	/** Nothing within; a diamond near; the same with an outline round it over; a hollow one when unknown. */
	private static void badge(GC gc, int x, int y, LegState state) {
		if (state == LegState.WITHIN) {
			return;
		}
		int half = BADGE / 2;
		gc.setAntialias(SWT.ON);
		if (state == LegState.UNKNOWN) {
			gc.setForeground(ThemeColours.INK.get());
			gc.drawPolygon(diamond(x + half, y + half, half - 1));
			return;
		}
		gc.setBackground(ThemeColours.of(state).get());
		gc.fillPolygon(diamond(x + half, y + half, state == LegState.OVER ? half - 2 : half));
		if (state == LegState.OVER) {
			gc.setForeground(ThemeColours.of(state).get());
			gc.drawPolygon(diamond(x + half, y + half, half + 1));
		}
	}

	private static int[] diamond(int x, int y, int r) {
		return new int[] { x, y - r, x + r, y, x, y + r, x - r, y };
	}
}
