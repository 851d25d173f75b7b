package gapwright.ui.fields;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;

/** A tick with its label. */
final class FlagField implements FeatureField {

	private final EStructuralFeature feature;
	private final EditRunner runner;
	private final Button tick;
	private Runnable afterProblem = () -> { };
	private String problem;
	private EObject element;

	FlagField(Composite parent, EStructuralFeature feature, EditRunner runner) {
		this.feature = feature;
		this.runner = runner;
		tick = new Button(parent, SWT.CHECK);
		tick.setText(FeatureText.label(feature));
		tick.addListener(SWT.Selection, event -> take());
	}

	private void take() {
		if (element != null) {
			problem = runner.run(FeatureEdits.set(element, feature, tick.getSelection()));
			refresh();
			afterProblem.run();
		}
	}

	@Override
	public void bind(EObject next) {
		element = next;
		problem = null;
		tick.setEnabled(next != null);
		refresh();
		afterProblem.run();
	}

	@Override
	public void refresh() {
		tick.setSelection(element != null && Boolean.TRUE.equals(element.eGet(feature)));
	}

	@Override
	public EStructuralFeature feature() {
		return feature;
	}

	@Override
	public Control control() {
		return tick;
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
