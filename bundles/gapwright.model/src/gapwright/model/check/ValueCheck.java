package gapwright.model.check;

import static gapwright.model.GapwrightPackage.Literals.*;

import java.util.List;
import java.util.Map;

import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;

import gapwright.model.Leg;
import gapwright.model.SectionShape;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;
import gapwright.model.quantity.QuantityFormatException;

/** Judges every attribute of an object by itself: missing, out of its domain, legal but unlikely. */
final class ValueCheck {

	/** Units that are taken for one another, the usual one first. */
	private static final Map<Dimension, List<String>> MIXED_UP = Map.of(Dimension.LENGTH, List.of("mm", "mil", "m"),
			Dimension.AREA, List.of("mm²", "cm²"), Dimension.FLUX_DENSITY, List.of("mT", "G", "T"),
			Dimension.TEMPERATURE, List.of("K"));

	private final Problems problems;

	ValueCheck(Problems problems) {
		this.problems = problems;
	}

	void check(EObject object) {
		for (EAttribute attribute : object.eClass().getEAllAttributes()) {
			if (!concerns(object, attribute)) {
				continue;
			}
			Object value = object.eGet(attribute);
			if (value == null) {
				if (attribute.isRequired() || attribute == neededBy(object)) {
					problems.add(ProblemCode.VALUE_MISSING, object, attribute, attribute.getName() + " is missing", "");
				}
				continue;
			}
			String wrong = FeatureDomain.problem(attribute, value);
			if (wrong != null) {
				problems.add(ProblemCode.VALUE_OUT_OF_DOMAIN, object, attribute,
						attribute.getName() + " = '" + value + "': " + wrong, "");
				continue;
			}
			String usual = FeatureDomain.unlikely(attribute, value);
			if (usual != null) {
				problems.add(ProblemCode.VALUE_IMPLAUSIBLE, object, attribute, attribute.getName() + " = '" + value
						+ "': units? Usual is " + usual, hint(attribute, value));
			}
		}
	}

	/** Dimensions of another shape than the leg's are kept for when it is switched back, but not judged. */
	private static boolean concerns(EObject object, EAttribute attribute) {
		if (!(object instanceof Leg leg)) {
			return true;
		}
		SectionShape shape = leg.getShape();
		if (attribute == LEG__WIDTH || attribute == LEG__DEPTH) {
			return shape == SectionShape.RECTANGULAR;
		}
		return attribute == LEG__DIAMETER ? shape == SectionShape.ROUND
				: attribute != LEG__AREA || shape == SectionShape.GIVEN;
	}

	private static EStructuralFeature neededBy(EObject object) {
		if (!(object instanceof Leg leg)) {
			return null;
		}
		return switch (leg.getShape()) {
		case RECTANGULAR -> leg.getWidth() == null ? LEG__WIDTH : LEG__DEPTH;
		case ROUND -> LEG__DIAMETER;
		case GIVEN -> LEG__AREA;
		};
	}

	/** The same number in another unit, if that would be usual: 180 m² of core is 180 mm², 390 T is 390 mT. */
	private static String hint(EAttribute attribute, Object value) {
		if (!(value instanceof Quantity quantity)) {
			return "";
		}
		String number = quantity.text().substring(0, quantity.text().length() - quantity.unit().length()).strip();
		for (String unit : MIXED_UP.getOrDefault(quantity.dimension(), List.of())) {
			try {
				Quantity meant = Quantity.parse(number + " " + unit, quantity.dimension());
				if (FeatureDomain.problem(attribute, meant) == null && FeatureDomain.unlikely(attribute, meant) == null) {
					return "Did you mean " + meant + "?";
				}
			} catch (QuantityFormatException e) {
				// a number at the end of what a double can hold leaves it in this unit: not what was meant
			}
		}
		return "";
	}
}
