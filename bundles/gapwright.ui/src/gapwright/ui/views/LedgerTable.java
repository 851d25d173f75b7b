package gapwright.ui.views;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Consumer;
import java.util.stream.IntStream;

import org.eclipse.jface.dialogs.IDialogSettings;
import org.eclipse.swt.SWT;
import org.eclipse.swt.dnd.Clipboard;
import org.eclipse.swt.dnd.TextTransfer;
import org.eclipse.swt.dnd.Transfer;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableColumn;
import org.eclipse.swt.widgets.TableItem;

/**
 * A read-only table of figures: sorts by a click on a heading, copies, remembers its column widths and keeps its
 * selection by row identity. New figures go into the rows that are there, cell by cell where they differ.
 * (A table that asks for its rows when they come into sight crashes GTK when the theme is changed.)
 *
 * @param <R> a row; equal rows count as the same one, whatever their figures
 */
final class LedgerTable<R> {

	/** Rows on the screen at once: filling more would hold up the window. What is copied is never cut short. */
	static final int MOST = 2000;

	/** How long no step may have come before rows out of sight are filled, ms. */
	private static final int REST = 50;

	private final Table table;
	private final List<LedgerColumn<R>> columns;
	private final LedgerOrder<R> order = new LedgerOrder<>();
	private final IDialogSettings settings;
	private List<R> design = List.of();
	private List<R> rows = List.of();
	// one object, so that a new step puts the timer off
	private final Runnable filler = this::fillOutOfSight;
	private boolean outOfSight;
	private Consumer<List<R>> onSelect = selected -> { };

	LedgerTable(Composite parent, List<LedgerColumn<R>> columns, IDialogSettings settings) {
		this.columns = List.copyOf(columns);
		this.settings = settings;
		table = new Table(parent, SWT.MULTI | SWT.FULL_SELECTION);
		table.setHeaderVisible(true);
		for (LedgerColumn<R> column : columns) {
			create(column);
		}
		table.addListener(SWT.Selection, event -> onSelect.accept(selection()));
		table.addListener(SWT.KeyDown, this::key);
		table.addListener(SWT.Resize, event -> fillOutOfSight());
		table.getVerticalBar().addListener(SWT.Selection, event -> fillOutOfSight());
	}

	private void create(LedgerColumn<R> column) {
		TableColumn control = new TableColumn(table, column.figures() ? SWT.RIGHT : SWT.LEFT);
		control.setText(column.title());
		control.setToolTipText(column.tip());
		control.setMoveable(true);
		control.setWidth(width(column));
		control.addListener(SWT.Resize, event -> settings.put(column.key(), control.getWidth()));
		control.addListener(SWT.Selection, event -> sort(column, control));
	}

	private int width(LedgerColumn<R> column) {
		try {
			return settings.getInt(column.key());
		} catch (NumberFormatException e) {
			return column.width();
		}
	}

	private void sort(LedgerColumn<R> column, TableColumn control) {
		List<R> selected = selection();
		order.next(column);
		table.setSortColumn(order.column() == null ? null : control);
		table.setSortDirection(order.column() == null ? SWT.NONE : order.descending() ? SWT.DOWN : SWT.UP);
		show(design);
		select(selected);
	}

	private void key(Event event) {
		if ((event.stateMask & SWT.MOD1) != 0 && event.keyCode == 'c') {
			copy();
		} else if ((event.stateMask & SWT.MOD1) != 0 && event.keyCode == 'a') {
			selectAll();
		}
	}

	void onSelect(Consumer<List<R>> listener) {
		onSelect = listener;
	}

	/** Shows rows, keeping the order asked for and what is selected. */
	void show(List<R> next) {
		List<R> selected = selection();
		design = List.copyOf(next);
		rows = order.sorted(design);
		table.setRedraw(false);
		int shown = Math.min(rows.size(), MOST);
		if (table.getItemCount() > shown) {
			table.remove(shown, table.getItemCount() - 1);
		}
		int top = table.getTopIndex();
		int bottom = top + table.getClientArea().height / Math.max(1, table.getItemHeight()) + 1;
		for (int index = 0; index < shown; index++) {
			boolean isNew = index >= table.getItemCount();
			TableItem item = isNew ? new TableItem(table, SWT.NONE) : table.getItem(index);
			if (isNew || index >= top && index <= bottom) {
				fill(item, rows.get(index));
			}
		}
		outOfSight = true;
		table.getDisplay().timerExec(REST, filler);
		table.setRedraw(true);
		table.redraw();
		select(selected);
	}

	/** Rows that nobody sees need not follow every step of a drag; they do before they come into sight. */
	private void fillOutOfSight() {
		if (outOfSight && !table.isDisposed()) {
			outOfSight = false;
			for (int index = 0; index < Math.min(table.getItemCount(), rows.size()); index++) {
				fill(table.getItem(index), rows.get(index));
			}
		}
	}

	/** The texts last shown are kept beside the item: asking the widget costs more than reckoning the leg did. */
	private void fill(TableItem item, R row) {
		String[] shown = item.getData() instanceof String[] before ? before : new String[columns.size()];
		for (int k = 0; k < columns.size(); k++) {
			String text = columns.get(k).shown().apply(row);
			if (!text.equals(shown[k])) {
				shown[k] = text;
				item.setText(k, text);
			}
		}
		item.setData(shown);
	}

	/** Says what is not on the screen; empty when all is. */
	String note() {
		return rows.size() <= MOST ? "" : "  ·  the first " + MOST + " of " + rows.size() + " rows in this order; Copy all rows takes every one";
	}

	/** In the order shown. */
	List<R> rows() {
		return rows;
	}

	List<R> selection() {
		List<R> selected = new ArrayList<>();
		for (int index : sortedSelection()) {
			if (index < rows.size()) {
				selected.add(rows.get(index));
			}
		}
		return selected;
	}

	private int[] sortedSelection() {
		int[] indices = table.getSelectionIndices();
		Arrays.sort(indices);
		return indices;
	}

	/** Selects these rows and scrolls to the first, without telling the listener. */
	void select(List<R> wanted) {
		Set<R> set = new LinkedHashSet<>(wanted);
		int[] indices = IntStream.range(0, Math.min(rows.size(), MOST)).filter(k -> set.contains(rows.get(k))).toArray();
		int[] before = sortedSelection();
		if (!Arrays.equals(before, indices)) {
			table.setSelection(indices);
		}
	}

	void selectAll() {
		table.selectAll();
		onSelect.accept(selection());
	}

	/** Puts the selected rows on the clipboard; all rows when none is selected. */
	void copy() {
		List<R> selected = selection();
		copy(selected.isEmpty() ? rows : selected);
	}

	void copyAll() {
		copy(rows);
	}

	private void copy(List<R> wanted) {
		if (wanted.isEmpty()) {
			return;
		}
		Clipboard clipboard = new Clipboard(table.getDisplay());
		try {
			clipboard.setContents(new Object[] { LedgerCopy.text(columns, wanted) },
					new Transfer[] { TextTransfer.getInstance() });
		} finally {
			clipboard.dispose();
		}
	}

	Table control() {
		return table;
	}
}
