package gapwright.ui.fields;

import java.util.function.Supplier;

import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EDataType;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.util.EcoreUtil;

import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;

/** What the field of an attribute takes: its data type, within its domain. */
final class FeatureEntry implements Entry<Object> {

	private final EAttribute feature;
	private final Entry<?> kind;
	private final Supplier<EObject> element;

	FeatureEntry(EAttribute feature, Supplier<EObject> element) {
		this.feature = feature;
		this.element = element;
		kind = kind(feature);
	}

	private static Entry<?> kind(EAttribute feature) {
		boolean optional = !feature.isRequired();
		Class<?> type = feature.getEAttributeType().getInstanceClass();
		if (type == Quantity.class) {
			return Entries.quantity(dimension(feature.getEAttributeType()), optional);
		}
		if (type == double.class) {
			return Entries.number(optional);
		}
		if (type == int.class) {
			return Entries.whole(optional);
		}
		return Entries.text();
	}

	/** The data types of the model are named after the dimensions, LENGTH as Length. */
	static Dimension dimension(EDataType type) {
		return Dimension.valueOf(type.getName().replaceAll("(?<=[a-z])(?=[A-Z])", "_").toUpperCase());
	}

	@Override
	public Object parse(String typed) throws BadEntryException {
		Object value = kind.parse(typed);
		if (value == null && feature.getDefaultValue() != null) {
			value = feature.getDefaultValue();
		}
		String problem = FieldDomain.problem(element.get(), feature, value);
		if (problem != null) {
			throw new BadEntryException(problem);
		}
		return value;
	}

	@Override
	@SuppressWarnings("unchecked")
	public String text(Object value) {
		return value == null ? "" : ((Entry<Object>) kind).text(value);
	}

	@Override
	public String example() {
		if (feature.getDefaultValueLiteral() != null) {
			return text(EcoreUtil.createFromString(feature.getEAttributeType(), feature.getDefaultValueLiteral()));
		}
		return feature.getEAttributeType().getInstanceClass() == Quantity.class && feature.isRequired() ? kind.example() : "";
	}
}
