package gapwright.ui.fields;

import java.util.Iterator;
import java.util.regex.Pattern;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.emf.ecore.util.EcoreUtil;

import gapwright.model.Element;
import gapwright.model.GapwrightPackage;
import gapwright.model.check.FeatureDomain;

/** Says why a value cannot be that of a feature, before it reaches the model. */
final class FieldDomain {

	/** References are lists of ids separated by blanks, so an id holds none. */
	private static final Pattern ID = Pattern.compile("[\\p{L}_][\\p{L}\\p{N}._-]*");

	private FieldDomain() {
	}

	/** @return null when the value is in the domain, else a sentence */
	static String problem(EObject element, EStructuralFeature feature, Object value) {
		if (feature == GapwrightPackage.Literals.ELEMENT__ID) {
			return problemOfId(element, (String) value);
		}
		String rule = value == null ? null : FeatureDomain.problem(feature, value);
		return rule == null ? null : "'" + (value instanceof Double number ? Entries.number(number) : value) + "': " + rule;
	}

	private static String problemOfId(EObject element, String id) {
		if (id == null) {
			return "An id is needed: findings and references use it.";
		}
		if (!ID.matcher(id).matches()) {
			return "'" + id + "': an id starts with a letter and has letters, digits, '.', '_' and '-' only";
		}
		if (element != null) {
			for (Iterator<EObject> all = EcoreUtil.getRootContainer(element).eAllContents(); all.hasNext();) {
				EObject other = all.next();
				if (other != element && other instanceof Element named && id.equals(named.getId())) {
					return "'" + id + "' is taken by a " + FeatureText.kind(other.eClass());
				}
			}
		}
		return null;
	}
}
