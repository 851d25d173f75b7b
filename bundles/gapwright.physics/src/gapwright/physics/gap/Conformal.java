package gapwright.physics.gap;

import gapwright.physics.gap.GapGeometry.Place;

/**
 * Fringing by conformal mapping: the permeance of a square-edged half pole over a plane, composed side by side. The
 * factors of both cross-directions multiply; the corner regions' own field is left out.
 *
 * Source: Schwarz-Christoffel map of a corner over a plane; Balakrishnan, Joines, Wilson, IEEE Trans. Power Electronics
 * 12 (1997); composed to three dimensions by Mühlethaler, Kolar, Ecklebe, A Novel Approach for 3D Air Gap Reluctance
 * Calculations, ICPE (2011). From memory; re-derived, see {@link CornerField}.
 */
final class Conformal {

	/** Against an equal pole the mirror plane halves the distance: both factors are 2; over a plane 4. */
	private final double weight;
	private final double bracket;
	private final GapGeometry gap;

	Conformal(GapGeometry gap) {
		this.gap = gap;
		weight = gap.place() == Place.AGAINST_YOKE ? 4 : 2;
		double poles = Math.sqrt(gap.firstPole() * gap.secondPole());
		bracket = gap.firstPole() > 0 && gap.secondPole() > 0 ? 1 + Math.log(Math.PI * poles / (weight * gap.length()))
				: Double.NaN;
	}

	/** @return 1 + ln(πh/(2δ)) of the side field; the formula makes no sense unless it is above 0 */
	double bracket() {
		return bracket;
	}

	/** f(w) = 1 + (c·g/(πw))·[1 + ln(πh/(c·g))], c = 2 between poles, 4 over a plane; h the geometric mean of both poles' heights. */
	private double across(double width) {
		return 1 + weight * gap.length() / (Math.PI * width) * bracket;
	}

	/** ∂f/∂ ln h */
	private double acrossByLogHeight(double width) {
		return weight * gap.length() / (Math.PI * width);
	}

	FringingFactor factor() {
		double a;
		double b;
		boolean round = gap.section() instanceof Section.Round;
		if (gap.section() instanceof Section.Rectangular rectangle) {
			a = rectangle.a();
			b = rectangle.b();
		} else {
			a = gap.section().leastSide();
			b = a;
		}
		double fa = across(a);
		double fb = across(b);
		double byA = -(fa - 1) / a * fb;
		double byB = -(fb - 1) / b * fa;
		// at fixed height, ∂f/∂g = c/(πw)·(bracket − 1)
		double byLength = weight / Math.PI * (bracket - 1) * (fb / a + fa / b);
		double byLogHeight = acrossByLogHeight(a) * fb + acrossByLogHeight(b) * fa;
		double h1 = gap.firstPole();
		double h2 = gap.secondPole();
		double[] slopes = gap.poleSlopes();
		byLength += byLogHeight * gap.poleSlopeByLength() * 0.5 * (1 / h1 + 1 / h2);
		double byFirst = byLogHeight * 0.5 * (slopes[0] / h1 + slopes[1] / h2);
		double bySecond = byLogHeight * 0.5 * (slopes[1] / h1 + slopes[0] / h2);
		return new FringingFactor(fa * fb, round ? byA + byB : byA, round ? 0 : byB, byLength, byFirst, bySecond);
	}
}
