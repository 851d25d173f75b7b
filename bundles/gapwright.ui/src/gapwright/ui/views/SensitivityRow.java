package gapwright.ui.views;

import java.util.Locale;

import org.eclipse.emf.ecore.EObject;

import gapwright.model.Design;
import gapwright.model.Ids;
import gapwright.study.sensitivity.SensitivityResult;
import gapwright.study.vary.Knob;
import gapwright.ui.fields.FeatureText;
import gapwright.ui.fields.FigureFormat;

/**
 * What one number of the design does to the figure chosen.
 *
 * @param element    that has the number
 * @param value      SI
 * @param derivative of the figure per SI unit
 * @param elasticity % of the figure per % of the number
 */
record SensitivityRow(EObject element, Knob.Feature feature, double value, double derivative, double elasticity) {

	static SensitivityRow of(Design design, SensitivityResult result, int figure, int parameter) {
		SensitivityResult.Value value = result.parameters().get(parameter);
		return new SensitivityRow(Ids.find(design, value.subject()), value.feature(), value.value(), result.derivative()[figure][parameter],
				result.elasticity(figure, parameter));
	}

	String name() {
		return element == null ? "?" : FeatureText.name(element);
	}

	/** For example "stacking factor". */
	String what() {
		return feature.word().replaceAll("([A-Z])", " $1").toLowerCase(Locale.ROOT);
	}

	String figure() {
		return switch (feature) {
		case WIDTH, DEPTH, DIAMETER, PATH_LENGTH, GAP_LENGTH, MAGNET_LENGTH -> FigureFormat.length(value);
		case AREA -> FigureFormat.area(value);
		case REMANENCE, SATURATION -> FigureFormat.fluxDensity(value);
		case CURRENT -> FigureFormat.si(value, "A");
		case PERMEANCE -> FigureFormat.si(value, "H");
		default -> FigureFormat.plain(value);
		};
	}

	/** Equal when about the same number. */
	@Override
	public boolean equals(Object other) {
		return other instanceof SensitivityRow row && row.element == element && row.feature == feature;
	}

	@Override
	public int hashCode() {
		return 31 * System.identityHashCode(element) + feature.hashCode();
	}
}
