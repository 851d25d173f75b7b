package gapwright.ui.pages;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import java.util.function.Function;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableItem;

import gapwright.ui.fields.Accessibles;
import gapwright.ui.fields.Headings;

/** The list on the left of a form page: elements by name, with buttons below. Exactly one is chosen as long as there is one. */
final class MasterList {

	/** More buttons than these would not fit beside each other. */
	private static final int MOST_IN_A_ROW = 3;

	private final Composite area;
	private final Table table;
	private final Composite buttons;
	private final Function<EObject, String> label;
	private final Consumer<EObject> onChoose;
	private List<EObject> shown = new ArrayList<>();
	private EObject chosen;

	MasterList(Composite parent, String title, Function<EObject, String> label, Consumer<EObject> onChoose) {
		this.label = label;
		this.onChoose = onChoose;
		area = new Composite(parent, SWT.NONE);
		GridLayout grid = new GridLayout(1, false);
		grid.marginWidth = 10;
		grid.marginHeight = 8;
		area.setLayout(grid);
		Headings.title(area, title);
		table = new Table(area, SWT.SINGLE | SWT.BORDER | SWT.FULL_SELECTION | SWT.V_SCROLL);
		GridData wide = new GridData(SWT.FILL, SWT.FILL, true, true);
		wide.minimumWidth = 160;
		table.setLayoutData(wide);
		table.addListener(SWT.Selection, event -> choose(shown.get(table.getSelectionIndex())));
		Accessibles.name(table, title);
		buttons = new Composite(area, SWT.NONE);
		GridLayout row = new GridLayout(0, false);
		row.marginWidth = 0;
		buttons.setLayout(row);
		buttons.setLayoutData(new GridData(SWT.FILL, SWT.BOTTOM, true, false));
	}

	Button button(String text, String tip, Runnable action) {
		Button button = new Button(buttons, SWT.PUSH);
		int count = buttons.getChildren().length;
		((GridLayout) buttons.getLayout()).numColumns = count > MOST_IN_A_ROW ? 2 : count;
		button.setText(text);
		button.setToolTipText(tip);
		button.setLayoutData(new GridData(SWT.FILL, SWT.CENTER, true, false));
		button.addListener(SWT.Selection, event -> action.run());
		return button;
	}

	/** Shows these; the chosen one stays chosen, or its neighbour when it has gone. */
	void show(List<? extends EObject> elements) {
		int place = shown.indexOf(chosen);
		shown = new ArrayList<>(elements);
		while (table.getItemCount() > shown.size()) {
			table.remove(table.getItemCount() - 1);
		}
		for (int k = 0; k < shown.size(); k++) {
			TableItem item = k < table.getItemCount() ? table.getItem(k) : new TableItem(table, SWT.NONE);
			String text = label.apply(shown.get(k));
			if (!text.equals(item.getText())) {
				item.setText(text);
			}
		}
		if (!shown.contains(chosen)) {
			chosen = shown.isEmpty() ? null : shown.get(Math.max(0, Math.min(place, shown.size() - 1)));
		}
		if (chosen != null) {
			table.setSelection(shown.indexOf(chosen));
		}
		onChoose.accept(chosen);
	}

	void choose(EObject element) {
		if (shown.contains(element)) {
			chosen = element;
			table.setSelection(shown.indexOf(element));
			onChoose.accept(element);
		}
	}

	EObject chosen() {
		return chosen;
	}

	Composite control() {
		return area;
	}

	Table table() {
		return table;
	}
}
