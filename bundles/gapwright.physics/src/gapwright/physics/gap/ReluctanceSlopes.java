package gapwright.physics.gap;

import gapwright.physics.material.BhCurve;

/**
 * Reluctance of a gap, all pieces together, with its exact partial derivatives: R = n·g/(µ₀·A·F), so
 * dR/R = dg/g − dA/A − dF/F.
 *
 * @param reluctance 1/H
 * @param byA        ∂R/∂a of a rectangle, ∂R/∂d of a round section, 1/(H·m)
 * @param byB        ∂R/∂b of a rectangle, 0 of a round section, 1/(H·m)
 * @param byLength   ∂R/∂ of the length of one piece, 1/(H·m)
 * @param byFirst    ∂R/∂ of the distance to the first end of the window, 1/(H·m)
 * @param bySecond   ∂R/∂ of the distance to its other end, 1/(H·m)
 */
public record ReluctanceSlopes(double reluctance, double byA, double byB, double byLength, double byFirst, double bySecond) {

	public static ReluctanceSlopes of(Fringing method, GapGeometry gap) {
		FringingFactor factor = method.factor(gap);
		double f = factor.value();
		double r = gap.pieces() * gap.length() / (BhCurve.MU_0 * gap.section().area() * f);
		double areaByA = gap.section() instanceof Section.Rectangular rectangle ? 1 / rectangle.a()
				: 2 / gap.section().leastSide();
		double areaByB = gap.section() instanceof Section.Rectangular rectangle ? 1 / rectangle.b() : 0;
		return new ReluctanceSlopes(r, -r * (areaByA + factor.byA() / f), -r * (areaByB + factor.byB() / f),
				r * (1 / gap.length() - factor.byLength() / f), -r * factor.byFirst() / f, -r * factor.bySecond() / f);
	}
}
