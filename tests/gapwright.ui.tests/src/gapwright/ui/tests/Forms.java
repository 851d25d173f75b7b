package gapwright.ui.tests;

import java.util.Arrays;

import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.Text;

import gapwright.ui.fields.FeatureText;

/** The hand of somebody who fills in forms: finds controls by what they say and types with the real keyboard. */
final class Forms {

	private Forms() {
	}

	/** The visible field of a feature. */
	static Text text(EStructuralFeature feature) {
		return Workbench.find(Workbench.shell(), Text.class, text -> FeatureText.hint(feature).equals(text.getToolTipText()));
	}

	static Combo combo(EStructuralFeature feature) {
		return Workbench.find(Workbench.shell(), Combo.class, combo -> FeatureText.hint(feature).equals(combo.getToolTipText()));
	}

	static Button button(String text) {
		return Workbench.find(Workbench.shell(), Button.class, button -> text.equals(button.getText()));
	}

	static Table table(String heading) {
		return Workbench.find(Workbench.shell(), Table.class,
				table -> Arrays.stream(table.getColumns()).anyMatch(column -> heading.equals(column.getText())));
	}

	static boolean says(String words) {
		try {
			Workbench.find(Workbench.shell(), Label.class, label -> label.getText().contains(words));
			return true;
		} catch (AssertionError e) {
			return false;
		}
	}

	/** Puts the keyboard into a field, selects what is there and types over it. */
	static void typeOver(Text field, String text) {
		Workbench.focus(field);
		field.selectAll();
		Workbench.type(text);
	}

	static void enter(Text field, String text) {
		typeOver(field, text);
		Workbench.key(SWT.CR, 0);
	}

	/** Clicks into the middle of a control with the real mouse. */
	static void click(Control control) {
		Workbench.click(control, control.getSize().x / 2, control.getSize().y / 2);
	}

	/** Chooses an entry with the keyboard's meaning: the widget's own selection, then the event that follows it. */
	static void choose(Combo combo, String entry) {
		combo.select(combo.indexOf(entry));
		combo.notifyListeners(SWT.Selection, new Event());
		Workbench.settle();
	}
}
