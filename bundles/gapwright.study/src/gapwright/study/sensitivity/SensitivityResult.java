package gapwright.study.sensitivity;

import java.util.List;

import gapwright.study.vary.Knob;

/**
 * Exact derivatives of the figures of an operating point by every number of the design.
 *
 * @param operatingPoint id
 * @param figures        inductances first, then the utilisation of every leg that can be judged
 * @param parameters     in the order of the design
 * @param derivative     figures × parameters, in the figure's unit per SI unit of the parameter
 */
public record SensitivityResult(String operatingPoint, List<Figure> figures, List<Value> parameters, double[][] derivative) {

	/** What a figure is. */
	public enum Kind {
		/** H, differential, between two windings or of one. */
		INDUCTANCE,
		/** Ratio, of a leg at the end of the ripple where its flux density peaks. */
		UTILISATION
	}

	/**
	 * @param subject id of the winding or leg
	 * @param second  id of the other winding of a mutual inductance, else the same as subject
	 * @param value   in H, or a ratio
	 */
	public record Figure(Kind kind, String subject, String second, double value) {
	}

	/**
	 * A number of the design.
	 *
	 * @param subject id of its element
	 * @param value   SI; of a permeability and a saturation the ones at the operating point's temperature
	 */
	public record Value(String subject, Knob.Feature feature, double value) {
	}

	/** @return % of the figure per % of the parameter; NaN where the figure is 0 */
	public double elasticity(int figure, int parameter) {
		return derivative[figure][parameter] * parameters.get(parameter).value() / figures.get(figure).value();
	}
}
