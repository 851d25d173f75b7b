package gapwright.ui.fields;

import java.util.ArrayList;
import java.util.List;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;

/** One of the enumerated values, or one of the elements of the design. */
final class ChoiceField implements FeatureField {

	private final EStructuralFeature feature;
	private final Choices choices;
	private final EditRunner runner;
	private final Combo combo;
	private Runnable afterProblem = () -> { };
	private List<?> offered = new ArrayList<>();
	private String problem;
	private EObject element;

	ChoiceField(Composite parent, EStructuralFeature feature, Choices choices, EditRunner runner) {
		this.feature = feature;
		this.choices = choices;
		this.runner = runner;
		combo = new Combo(parent, SWT.READ_ONLY | SWT.DROP_DOWN);
		combo.addListener(SWT.Selection, event -> take());
	}

	private void take() {
		int index = combo.getSelectionIndex();
		if (index < 0 || element == null || offered.get(index) == element.eGet(feature)) {
			return;
		}
		problem = runner.run(FeatureEdits.set(element, feature, offered.get(index)));
		refresh();
		afterProblem.run();
	}

	@Override
	public void bind(EObject next) {
		element = next;
		problem = null;
		combo.setEnabled(next != null);
		refresh();
		afterProblem.run();
	}

	@Override
	public void refresh() {
		offered = element == null ? new ArrayList<>() : choices.values().apply(element);
		String[] labels = offered.stream().map(choices.label()).toArray(String[]::new);
		if (!List.of(labels).equals(List.of(combo.getItems()))) {
			combo.setItems(labels);
		}
		int index = element == null ? -1 : offered.indexOf(element.eGet(feature));
		if (index < 0) {
			combo.deselectAll();
		} else if (index != combo.getSelectionIndex()) {
			combo.select(index);
		}
	}

	@Override
	public EStructuralFeature feature() {
		return feature;
	}

	@Override
	public Control control() {
		return combo;
	}

	@Override
	public String problem() {
		return problem;
	}

	@Override
	public void onProblem(Runnable listener) {
		afterProblem = listener;
	}
}
