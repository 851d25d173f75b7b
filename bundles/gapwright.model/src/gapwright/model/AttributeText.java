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

	/** A longer text is no number; reading its digits would only cost time. */
	private static final int MOST_DIGITS = 100;
	/** What to do instead of half a turn. */
	public static final String HALF_TURNS = "half turns exist only on multi-leg cores: place the coil on the leg it encloses";

	private AttributeText() {
	}

	/** @return why the text is no value of the attribute and what would be, or null when it is one */
	public static String problem(EAttribute attribute, String text) {
		EDataType type = attribute.getEAttributeType();
		if (type instanceof EEnum choices) {
			return choices.getEEnumLiteralByLiteral(text) != null ? null : "no such choice, allowed are "
					+ choices.getELiterals().stream().map(EEnumLiteral::getLiteral).collect(Collectors.joining(", "));
		}
		if (type == EcorePackage.Literals.ESTRING) {
			return null;
		}
		if (text.length() > MOST_DIGITS && (type == EcorePackage.Literals.EDOUBLE || type == EcorePackage.Literals.EINT)) {
			return "too long for a number";
		}
		if (type == EcorePackage.Literals.EDOUBLE) {
			return numberProblem(text);
		}
		if (type == EcorePackage.Literals.EINT) {
			return WHOLE.matcher(text).matches() ? null : wholeProblem(attribute, text);
		}
		if (type == EcorePackage.Literals.EBOOLEAN) {
			return text.equals("true") || text.equals("false") ? null : "allowed are true, false";
		}
		try {
			EcoreUtil.createFromString(type, text);
			return null;
		} catch (QuantityFormatException e) {
			return e.problem();
		}
	}

	/** @return why XML cannot hold a text, or null when it can; pasted text sometimes carries control characters */
	public static String unstorable(String text) {
		return text.codePoints().filter(c -> !storable(c)).mapToObj(c -> String
				.format("the character U+%04X cannot be stored in a file, delete it", c)).findFirst().orElse(null);
	}

	/** Source: XML 1.0, production Char. */
	private static boolean storable(int c) {
		return c == '\t' || c == '\n' || c == '\r' || c >= 0x20 && c <= 0xD7FF || c >= 0xE000 && c <= 0xFFFD
				|| c >= 0x10000;
	}

	private static String wholeProblem(EAttribute attribute, String text) {
		if (!NUMBER.matcher(text).matches()) {
			return "not a whole number, e.g. 12";
		}
		if (text.matches("[+-]?\\d+")) {
			return "out of the range of whole numbers";
		}
		return "a whole number is needed, e.g. 12" + (attribute == GapwrightPackage.Literals.COIL__TURNS ? "; " + HALF_TURNS : "");
	}

	private static String numberProblem(String text) {
		if (!NUMBER.matcher(text).matches()) {
			return text.matches("[+-]?\\d+,\\d+") ? "a comma is not read in numbers, write a decimal point: "
					+ text.replace(',', '.') : "not a number, e.g. 0.95";
		}
		return Double.isInfinite(Double.parseDouble(text)) ? "out of the range of numbers" : null;
	}
}
