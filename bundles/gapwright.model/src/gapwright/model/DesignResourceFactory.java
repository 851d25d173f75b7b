package gapwright.model;

import org.eclipse.emf.common.util.URI;
import org.eclipse.emf.ecore.resource.Resource;
import org.eclipse.emf.ecore.resource.impl.ResourceFactoryImpl;

/** Makes {@link DesignResource}s; registered for the extension {@code gapwright}. */
public final class DesignResourceFactory extends ResourceFactoryImpl {

	/** File extension of a design, without the dot. */
	public static final String EXTENSION = "gapwright";

	@Override
	public Resource createResource(URI uri) {
		return new DesignResource(uri);
	}
}
