package gapwright.ui.fields;

import java.util.Locale;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;

import gapwright.model.edit.DesignEdits;
import gapwright.model.edit.history.Edit;

/** The edit behind every form field: one feature of one element. */
final class FeatureEdits {

	private FeatureEdits() {
	}

	/** @param value null leaves the feature out */
	static Edit set(EObject element, EStructuralFeature feature, Object value) {
		String label = "Change " + FeatureText.kind(element.eClass()) + ' ' + FeatureText.label(feature).toLowerCase(Locale.ROOT);
		return DesignEdits.set(label, element, feature, value);
	}
}
