package gapwright.model.check;

import static gapwright.model.GapwrightPackage.Literals.*;

import java.util.HashMap;
import java.util.Map;

import org.eclipse.emf.ecore.EStructuralFeature;

import gapwright.model.AttributeText;
import gapwright.model.Ids;
import gapwright.model.quantity.Quantity;

/** What values a single feature may take, and which are legal but unlikely to be meant. */
public final class FeatureDomain {

	/** Bounds in SI units; a bound may be excluded. */
	private record Range(double least, boolean orEqual, double most, String rule) {

		boolean holds(double value) {
			return (orEqual ? value >= least : value > least) && value <= most;
		}
	}

	private static final Map<EStructuralFeature, Range> ALLOWED = new HashMap<>();
	private static final Map<EStructuralFeature, Range> LIKELY = new HashMap<>();
	private static final double INFINITE = Double.POSITIVE_INFINITY;

	static {
		for (EStructuralFeature size : new EStructuralFeature[] { LEG__WIDTH, LEG__DEPTH, LEG__DIAMETER,
				LEG__PATH_LENGTH, MAGNET__LENGTH, GAP__WINDOW_HEIGHT, AIR_PATH__LENGTH, WINDING_LEAKAGE__FIRST_BUILD,
				WINDING_LEAKAGE__SECOND_BUILD, WINDING_LEAKAGE__HEIGHT, WINDING_LEAKAGE__MEAN_TURN }) {
			above0(size, "must be above 0");
			LIKELY.put(size, new Range(1e-5, true, 2, "10 µm to 2 m"));
		}
		allow(GAP__LENGTH, 0, true, INFINITE, "a gap cannot be negative");
		LIKELY.put(GAP__LENGTH, new Range(0, true, 0.5, "up to 0.5 m"));
		for (EStructuralFeature area : new EStructuralFeature[] { LEG__AREA, AIR_PATH__AREA }) {
			above0(area, "must be above 0");
			LIKELY.put(area, new Range(1e-7, true, 0.1, "0.1 mm² to 0.1 m²"));
		}
		allow(LEG__STACKING_FACTOR, 0, false, 1, "must be above 0, at most 1");
		LIKELY.put(LEG__STACKING_FACTOR, new Range(0.5, true, 1, "0.5 to 1"));
		allow(GAP__PIECES, 1, true, 1000, "must be a whole number from 1 to 1000");
		allow(COIL__TURNS, 1, true, 1e6, "must be a whole number from 1 to 1000000");
		for (EStructuralFeature place : new EStructuralFeature[] { GAP__POSITION, COIL__POSITION, MAGNET__POSITION }) {
			allow(place, 0, true, 1, "must be from 0 to 1");
		}
		allow(MAGNET__REMANENCE, 0, true, INFINITE, "must be 0 or above; reverse the magnet instead");
		LIKELY.put(MAGNET__REMANENCE, new Range(0.1, true, 1.5, "0.1 T to 1.5 T"));
		allow(MAGNET__RECOIL_PERMEABILITY, 1, true, INFINITE, "must be 1 or above");
		LIKELY.put(MAGNET__RECOIL_PERMEABILITY, new Range(1, true, 1.3, "1 to 1.3"));
		allow(LINEAR_CURVE__RELATIVE_PERMEABILITY, 1, true, INFINITE, "must be 1 or above");
		LIKELY.put(LINEAR_CURVE__RELATIVE_PERMEABILITY, new Range(1, true, 1e6, "1 to 1000000"));
		for (EStructuralFeature initial : new EStructuralFeature[] { KNEE_CURVE__INITIAL_PERMEABILITY,
				ARCTAN_CURVE__INITIAL_PERMEABILITY, ROLL_OFF_CURVE__INITIAL_PERMEABILITY }) {
			allow(initial, 1, false, INFINITE, "must be above 1");
			LIKELY.put(initial, new Range(1, true, 1e6, "up to 1000000"));
		}
		for (EStructuralFeature saturation : new EStructuralFeature[] { KNEE_CURVE__SATURATION_POLARISATION,
				ARCTAN_CURVE__SATURATION_POLARISATION, SATURATION__FLUX_DENSITY }) {
			above0(saturation, "must be above 0");
			LIKELY.put(saturation, new Range(0.05, true, 2.6, "0.05 T to 2.6 T"));
		}
		LIKELY.put(CURVE_POINT__FLUX_DENSITY, new Range(0, true, 5, "up to 5 T"));
		allow(INITIAL_PERMEABILITY__RELATIVE_PERMEABILITY, 1, false, INFINITE, "must be above 1");
		LIKELY.put(INITIAL_PERMEABILITY__RELATIVE_PERMEABILITY, new Range(1, true, 1e6, "up to 1000000"));
		allow(WINDING_LEAKAGE__SEPARATION, 0, true, INFINITE, "must be 0 or above");
		LIKELY.put(WINDING_LEAKAGE__SEPARATION, new Range(0, true, 0.5, "up to 0.5 m"));
		allow(WINDING_LEAKAGE__INTERFACES, 1, true, 1000, "must be a whole number from 1 to 1000");
		allow(TOLERANCE__DEVIATION, 0, true, INFINITE, "must be 0 or above, to either side");
		above0(ROLL_OFF_CURVE__HALF_FIELD_STRENGTH, "must be above 0");
		allow(ROLL_OFF_CURVE__EXPONENT, 1, false, INFINITE, "must be above 1");
		above0(AIR_PATH__PERMEANCE, "must be above 0");
		for (EStructuralFeature temperature : new EStructuralFeature[] { OPERATING_POINT__TEMPERATURE,
				SATURATION__TEMPERATURE, STEINMETZ_LOSS__TEMPERATURE, MATERIAL__CURVE_TEMPERATURE,
				CURVE_AT_TEMPERATURE__TEMPERATURE, INITIAL_PERMEABILITY__TEMPERATURE }) {
			allow(temperature, -273.15, true, 1000, "must be from -273.15 °C to 1000 °C");
			LIKELY.put(temperature, new Range(-60, true, 250, "-60 °C to 250 °C"));
		}
		allow(MATERIAL__CURIE_TEMPERATURE, -273.15, true, 1500, "must be from -273.15 °C to 1500 °C");
		LIKELY.put(MATERIAL__CURIE_TEMPERATURE, new Range(50, true, 1150, "50 °C to 1150 °C"));
		for (EStructuralFeature positive : new EStructuralFeature[] { OPERATING_POINT__FREQUENCY,
				VOLTAGE_DRIVE__ON_TIME, MATERIAL__DENSITY, WINDING__WIRE, STEINMETZ_LOSS__COEFFICIENT,
				STEINMETZ_LOSS__FREQUENCY_EXPONENT, STEINMETZ_LOSS__FLUX_DENSITY_EXPONENT,
				STEINMETZ_LOSS__MINIMUM_FREQUENCY, STEINMETZ_LOSS__MAXIMUM_FREQUENCY }) {
			above0(positive, "must be above 0");
		}
		allow(CURRENT_DRIVE__RIPPLE, 0, true, INFINITE, "must be 0 or above, peak to peak");
		allow(WINDING__RESISTANCE, 0, true, INFINITE, "must be 0 or above");
		allow(LIMITS__NEAR_FRACTION, 0, false, 1, "must be above 0, at most 1");
	}

	private FeatureDomain() {
	}

	private static void allow(EStructuralFeature feature, double least, boolean orEqual, double most, String rule) {
		ALLOWED.put(feature, new Range(least, orEqual, most, rule));
	}

	private static void above0(EStructuralFeature feature, String rule) {
		allow(feature, 0, false, INFINITE, rule);
	}

	/**
	 * @param value a {@link Quantity}, a number, a text, or anything without a domain
	 * @return why the feature must not have that value, for example "a gap cannot be negative", or null
	 */
	public static String problem(EStructuralFeature feature, Object value) {
		if (value instanceof String text) {
			String wrong = feature == ELEMENT__ID ? Ids.problem(text) : null;
			return wrong != null ? wrong : AttributeText.unstorable(text);
		}
		Range range = ALLOWED.get(feature);
		double number = number(value);
		if (range == null || Double.isNaN(number) && !(value instanceof Double)) {
			return null;
		}
		if (range.holds(number)) {
			return null;
		}
		boolean perCent = feature == LEG__STACKING_FACTOR && number > 1 && number <= 100;
		return range.rule() + (perCent ? "; did you mean " + number / 100 + "?" : "");
	}

	/** @return the range a legal value usually lies in, when it does not, for example "10 µm to 2 m"; else null */
	public static String unlikely(EStructuralFeature feature, Object value) {
		Range range = LIKELY.get(feature);
		double number = number(value);
		return range == null || Double.isNaN(number) || range.holds(number) ? null : range.rule();
	}

	private static double number(Object value) {
		return value instanceof Quantity quantity ? quantity.si()
				: value instanceof Number number ? number.doubleValue() : Double.NaN;
	}
}
