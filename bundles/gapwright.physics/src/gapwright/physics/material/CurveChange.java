package gapwright.physics.material;

import java.util.function.DoubleUnaryOperator;

/**
 * A material's curve with its permeability or its saturation polarisation changed by a factor, and what a small change
 * does. With J = B − µ₀H the polarisation, every analytic curve is J = Js·g(χH/Js): a change of permeability stretches H
 * at the same Js, a change of saturation scales both. A table, or a blend, is stretched as it stands.
 */
public final class CurveChange {

	private CurveChange() {
	}

	/**
	 * @param permeability factor on the initial relative permeability, &gt; 0
	 * @param saturation   factor on the saturation polarisation, &gt; 0; without effect on a linear curve, a table, a blend
	 * @throws IllegalArgumentException when a changed value leaves its domain
	 */
	public static BhCurve apply(BhCurve curve, double permeability, double saturation) {
		if (permeability == 1 && saturation == 1) {
			return curve;
		}
		if (curve instanceof LinearBh linear) {
			return new LinearBh(linear.relativePermeability() * permeability);
		}
		if (curve instanceof KneeBh knee) {
			return new KneeBh(knee.initialPermeability() * permeability, knee.saturationPolarisation() * saturation);
		}
		if (curve instanceof ArctanBh arctan) {
			return new ArctanBh(arctan.initialPermeability() * permeability, arctan.saturationPolarisation() * saturation);
		}
		if (curve instanceof RollOffBh rollOff) {
			double changed = rollOff.initialPermeability() * permeability;
			// the polarisation it tends to goes with χ·H½
			double half = rollOff.halfFieldStrength() * saturation * (rollOff.initialPermeability() - 1) / (changed - 1);
			return new RollOffBh(changed, half, rollOff.exponent());
		}
		return permeability == 1 ? curve : new StretchedBh(curve, permeability);
	}

	/** @return whether a change of saturation has an effect */
	public static boolean followsSaturation(BhCurve curve) {
		return curve instanceof KneeBh || curve instanceof ArctanBh || curve instanceof RollOffBh;
	}

	/** @return initial relative permeability */
	public static double initialPermeability(BhCurve curve) {
		return curve.slope(0) / BhCurve.MU_0;
	}

	/** @return H ↦ ∂B/∂ ln of the permeability, T */
	public static DoubleUnaryOperator byPermeability(BhCurve curve) {
		if (isStretched(curve)) {
			return h -> h * curve.slope(h);
		}
		double weight = weight(curve);
		return h -> weight * h * (curve.slope(h) - BhCurve.MU_0) + (1 - Math.signum(weight)) * h * BhCurve.MU_0;
	}

	/** @return H ↦ ∂(dB/dH)/∂ ln of the permeability, H/m */
	public static DoubleUnaryOperator slopeByPermeability(BhCurve curve) {
		if (isStretched(curve)) {
			return h -> curve.slope(h) + h * curve.curvature(h);
		}
		double weight = weight(curve);
		return h -> weight * (curve.slope(h) - BhCurve.MU_0 + h * curve.curvature(h))
				+ (1 - Math.signum(weight)) * BhCurve.MU_0;
	}

	/** @return H ↦ ∂B/∂ ln of the saturation polarisation, T */
	public static DoubleUnaryOperator bySaturation(BhCurve curve) {
		return followsSaturation(curve)
				? h -> curve.fluxDensity(h) - BhCurve.MU_0 * h - h * (curve.slope(h) - BhCurve.MU_0)
				: h -> 0;
	}

	/** @return H ↦ ∂(dB/dH)/∂ ln of the saturation polarisation, H/m */
	public static DoubleUnaryOperator slopeBySaturation(BhCurve curve) {
		return followsSaturation(curve) ? h -> -h * curve.curvature(h) : h -> 0;
	}

	private static boolean isStretched(BhCurve curve) {
		return !(curve instanceof LinearBh) && !followsSaturation(curve);
	}

	/** d ln χ / d ln µ = µ/(µ − 1); 0 stands for air, which has no χ. */
	private static double weight(BhCurve curve) {
		double mu = initialPermeability(curve);
		return mu > 1 ? mu / (mu - 1) : 0;
	}
}
