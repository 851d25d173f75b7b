package gapwright.ui.fields;

import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;

import gapwright.model.GapwrightPackage;

/** A text for a name, a number or a quantity. */
final class TextField implements FeatureField {

	private final EAttribute feature;
	private final EditRunner runner;
	private final EntryText<Object> text;
	private EObject element;

	TextField(Composite parent, EAttribute feature, EditRunner runner) {
		this.feature = feature;
		this.runner = runner;
		text = new EntryText<>(parent, style(feature), new FeatureEntry(feature, () -> element), this::take);
	}

	private static int style(EAttribute feature) {
		boolean several = feature == GapwrightPackage.Literals.DESIGN__NOTES || feature == GapwrightPackage.Literals.MATERIAL__SOURCE;
		return SWT.BORDER | (several ? SWT.MULTI | SWT.WRAP | SWT.V_SCROLL : SWT.SINGLE);
	}

	private String take(Object value) {
		return element == null ? null : runner.run(FeatureEdits.set(element, feature, value));
	}

	@Override
	public void bind(EObject next) {
		if (element != next) {
			element = next;
			text.control().setEnabled(next != null);
			text.replace(read());
		} else {
			refresh();
		}
	}

	@Override
	public void refresh() {
		text.show(read());
	}

	private Object read() {
		return element == null ? null : element.eGet(feature);
	}

	@Override
	public EStructuralFeature feature() {
		return feature;
	}

	@Override
	public Control control() {
		return text.control();
	}

	@Override
	public String problem() {
		return text.problem();
	}

	@Override
	public void onProblem(Runnable listener) {
		text.onProblem(listener);
	}
}
