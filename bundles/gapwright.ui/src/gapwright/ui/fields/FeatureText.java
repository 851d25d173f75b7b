package gapwright.ui.fields;

import java.util.Locale;
import java.util.MissingResourceException;
import java.util.ResourceBundle;

import org.eclipse.emf.common.util.Enumerator;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EEnum;
import org.eclipse.emf.ecore.EEnumLiteral;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;

import gapwright.model.Element;

/** The words the user reads for features, enumerated values and elements of the model. */
public final class FeatureText {

	private static final ResourceBundle TEXTS = ResourceBundle.getBundle("gapwright.ui.fields.features");

	private FeatureText() {
	}

	/** For example "Stacking factor". */
	public static String label(EStructuralFeature feature) {
		return part(key(feature), 0);
	}

	/** One or two sentences for a tooltip. */
	public static String hint(EStructuralFeature feature) {
		return part(key(feature), 1);
	}

	public static String label(EEnum type, Enumerator value) {
		return part(key(type, value), 0);
	}

	public static String hint(EEnum type, Enumerator value) {
		return part(key(type, value), 1);
	}

	/** Kind of an element within a sentence, for example "air path". */
	public static String kind(EClass type) {
		return type.getName().replaceAll("(?<=[a-z])(?=[A-Z])", " ").toLowerCase(Locale.ROOT);
	}

	/** What an element is called: its name, else its id, else its kind. */
	public static String name(EObject element) {
		if (element instanceof Element named) {
			if (named.getName() != null && !named.getName().isBlank()) {
				return named.getName();
			}
			if (named.getId() != null && !named.getId().isBlank()) {
				return named.getId();
			}
		}
		return element == null ? FigureFormat.NONE : kind(element.eClass());
	}

	private static String key(EStructuralFeature feature) {
		return feature.getEContainingClass().getName() + '.' + feature.getName();
	}

	private static String key(EEnum type, Enumerator value) {
		EEnumLiteral literal = type.getEEnumLiteral(value.getName());
		return type.getName() + '.' + literal.getName();
	}

	private static String part(String key, int index) {
		try {
			return TEXTS.getString(key).split("\\s*\\|\\s*", 2)[index];
		} catch (MissingResourceException e) {
			throw new IllegalStateException("features.properties says nothing about " + key, e);
		}
	}
}
