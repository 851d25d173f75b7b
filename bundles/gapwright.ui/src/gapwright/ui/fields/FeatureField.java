package gapwright.ui.fields;

import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EEnum;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;

/** A control for one feature of whichever element it is bound to. Changes go through the history, never straight into the model. */
public interface FeatureField {

	/** The fitting control: a text, a choice, or a tick. */
	static FeatureField of(Composite parent, EStructuralFeature feature, EditRunner runner) {
		FeatureField field;
		if (feature instanceof EReference reference) {
			field = new ChoiceField(parent, reference, Choices.elements(reference), runner);
		} else if (feature.getEType() instanceof EEnum type) {
			field = new ChoiceField(parent, feature, Choices.literals(type), runner);
		} else if (feature.getEType().getInstanceClass() == boolean.class) {
			field = new FlagField(parent, feature, runner);
		} else {
			field = new TextField(parent, (EAttribute) feature, runner);
		}
		field.control().setToolTipText(FeatureText.hint(feature));
		Accessibles.name(field.control(), FeatureText.label(feature));
		return field;
	}

	EStructuralFeature feature();

	Control control();

	/** @param element shown and edited from now on; null shows an empty, disabled control */
	void bind(EObject element);

	/** Shows what the model says now. */
	void refresh();

	/** Null when what stands in the field is good. */
	String problem();

	/** Called when the problem came, went or changed. */
	void onProblem(Runnable listener);
}
