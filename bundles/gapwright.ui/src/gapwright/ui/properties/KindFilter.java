package gapwright.ui.properties;

import java.util.Set;

import org.eclipse.core.runtime.IConfigurationElement;
import org.eclipse.core.runtime.IExecutableExtension;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.jface.viewers.IFilter;

/** Lets through the elements of the classes named in the extension, {@code KindFilter:Gap,Magnet}; subclasses too. */
public final class KindFilter implements IFilter, IExecutableExtension {

	private Set<String> kinds = Set.of();

	@Override
	public void setInitializationData(IConfigurationElement config, String attribute, Object data) {
		kinds = Set.of(((String) data).split(","));
	}

	@Override
	public boolean select(Object selected) {
		EObject element = Selected.element(selected);
		return element != null && (named(element.eClass()) || element.eClass().getEAllSuperTypes().stream().anyMatch(this::named));
	}

	private boolean named(EClass type) {
		return kinds.contains(type.getName());
	}
}
