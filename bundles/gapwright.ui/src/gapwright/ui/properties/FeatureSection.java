package gapwright.ui.properties;

import java.util.ArrayList;
import java.util.List;

import org.eclipse.core.runtime.IConfigurationElement;
import org.eclipse.core.runtime.IExecutableExtension;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.swt.widgets.Composite;

import gapwright.model.GapwrightPackage;
import gapwright.ui.fields.FeatureForm;

/** Fields for the features named in the extension, {@code FeatureSection:Gap.length,Gap.pieces}. */
public final class FeatureSection extends ElementSection implements IExecutableExtension {

	private List<EStructuralFeature> features = List.of();
	private FeatureForm form;

	@Override
	public void setInitializationData(IConfigurationElement config, String attribute, Object data) {
		features = features((String) data);
	}

	/** @throws IllegalArgumentException naming the feature that the model does not have */
	static List<EStructuralFeature> features(String names) {
		List<EStructuralFeature> found = new ArrayList<>();
		for (String name : names.split(",")) {
			String[] parts = name.strip().split("\\.");
			EClass type = (EClass) GapwrightPackage.eINSTANCE.getEClassifier(parts[0]);
			EStructuralFeature feature = type == null ? null : type.getEStructuralFeature(parts[1]);
			if (feature == null) {
				throw new IllegalArgumentException("the model has no feature " + name);
			}
			found.add(feature);
		}
		return found;
	}

	@Override
	void build(Composite into) {
		form = new FeatureForm(into, runner()).add(features.toArray(EStructuralFeature[]::new));
	}

	@Override
	void show(EObject next) {
		form.bind(next);
	}
}
