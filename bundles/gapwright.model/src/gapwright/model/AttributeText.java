package gapwright.model;

import java.util.regex.Pattern;
import java.util.stream.Collectors;

import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EDataType;
import org.eclipse.emf.ecore.EEnum;
import org.eclipse.emf.ecore.EEnumLiteral;
import org.eclipse.emf.ecore.EcorePackage;
import org.eclipse.emf.ecore.util.EcoreUtil;

import gapwright.model.quantity.QuantityFormatException;

/** Whether a text is a value of an attribute, judged more strictly than Java's own readers do. */
public final class AttributeText {

	private static final Pattern NUMBER = Pattern.compile("[+-]?(\\d+\\.?\\d*|\\.\\d+)([eE][+-]?\\d{1,3})?");
	private static final Pattern WHOLE = Pattern.compile("[+-]?\\d{1,9}");

	private AttributeText() {
	}

	/** @return why the text is no value of the attribute and what would be, or null when it is one */
	public static String problem(EAttribute attribute, String text) {
		EDataType type = attribute.getEAttributeType();
		if (type instanceof EEnum choices) {
			return choices.getEEnumLiteralByLiteral(text) != null ? null : "no such choice, allowed are "
					+ choices.getELiterals().stream().map(EEnumLiteral::getLiteral).collect(Collectors.joining(", "));
		}
		if (type == EcorePackage.Literals.EDOUBLE) {
			return numberProblem(text);
		}
		if (type == EcorePackage.Literals.EINT) {
			return WHOLE.matcher(text).matches() ? null : NUMBER.matcher(text).matches()
					? "a whole number is needed, e.g. 12" : "not a whole number, e.g. 12";
		}
		if (type == EcorePackage.Literals.EBOOLEAN) {
			return text.equals("true") || text.equals("false") ? null : "allowed are true, false";
		}
		if (type == EcorePackage.Literals.ESTRING) {
			return null;
		}
		try {
			EcoreUtil.createFromString(type, text);
			return null;
		} catch (QuantityFormatException e) {
			return e.problem();
		}
	}

	private static String numberProblem(String text) {
		if (!NUMBER.matcher(text).matches()) {
			return text.matches("[+-]?\\d+,\\d+") ? "a comma is not read in numbers, write a decimal point: "
					+ text.replace(',', '.') : "not a number, e.g. 0.95";
		}
		return Double.isInfinite(Double.parseDouble(text)) ? "out of the range of numbers" : null;
	}
}
