package gapwright.ui.properties;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.jface.viewers.ISelection;
import org.eclipse.jface.viewers.LabelProvider;

import gapwright.ui.fields.FeatureText;

/** Title of the Properties view: "Leg top yoke", "Leg a". */
public final class ElementTitle extends LabelProvider {

	@Override
	public String getText(Object selection) {
		EObject element = selection instanceof ISelection workbench ? Selected.of(workbench) : Selected.element(selection);
		if (element == null) {
			return "";
		}
		String kind = FeatureText.kind(element.eClass());
		String name = FeatureText.name(element);
		String title = name.startsWith(kind) ? name : kind + ' ' + name;
		return Character.toUpperCase(title.charAt(0)) + title.substring(1);
	}
}
