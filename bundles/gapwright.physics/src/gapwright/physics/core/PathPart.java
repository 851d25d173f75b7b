package gapwright.physics.core;

/**
 * One piece of a closed flux path with its contributions to the core constants, integrated along the path. Source of the
 * pieces and corners: IEC 60205 (from memory); the integrals are elementary and checked by quadrature.
 *
 * @param c1          ∫dl/A, 1/m
 * @param c2          ∫dl/A², 1/m³
 * @param minimumArea m², least area the flux passes
 */
public record PathPart(double c1, double c2, double minimumArea) {

	private static final double CORNER = Math.PI / 8;

	/** A bar of constant area. @param length m, ≥ 0 @param area m², &gt; 0 */
	public static PathPart prism(double length, double area) {
		check("length", length, length >= 0);
		check("area", area, area > 0);
		return new PathPart(length / area, length / (area * area), area);
	}

	/** A plate whose width goes linearly from one value to another. All in m, &gt; 0; the length may be 0. */
	public static PathPart taperingPlate(double length, double firstWidth, double secondWidth, double thickness) {
		check("length", length, length >= 0);
		check("firstWidth", firstWidth, firstWidth > 0);
		check("secondWidth", secondWidth, secondWidth > 0);
		check("thickness", thickness, thickness > 0);
		double growth = secondWidth - firstWidth;
		// the logarithm of the ratio would lose its digits where the widths are almost alike
		double spread = growth == 0 ? 1 / firstWidth : Math.log1p(growth / firstWidth) / growth;
		return new PathPart(length * spread / thickness, length / (thickness * thickness * firstWidth * secondWidth),
				thickness * Math.min(firstWidth, secondWidth));
	}

	/** Part of a disc with radial flux. @param angle rad, up to 2π @param inner radius, m @param outer radius, m @param thickness m */
	public static PathPart fan(double angle, double inner, double outer, double thickness) {
		check("angle", angle, angle > 0 && angle <= 2 * Math.PI * (1 + 1e-12));
		check("inner", inner, inner > 0);
		check("outer", outer, outer > inner);
		check("thickness", thickness, thickness > 0);
		double round = angle * thickness;
		return new PathPart(Math.log(outer / inner) / round, (1 / inner - 1 / outer) / (round * round), round * inner);
	}

	/** A whole ring of rectangular section with circumferential flux. All in m. */
	public static PathPart ring(double inner, double outer, double height) {
		check("inner", inner, inner > 0);
		check("outer", outer, outer > inner);
		check("height", height, height > 0);
		double log = Math.log(outer / inner);
		return new PathPart(2 * Math.PI / (height * log),
				2 * Math.PI * (1 / inner - 1 / outer) / (height * height * log * log * log), height * (outer - inner));
	}

	/** Where two bars of one depth meet: l = (π/8)(p + q), A = depth·(p + q)/2. All in m. */
	public static PathPart corner(double p, double q, double depth) {
		return prism(CORNER * (p + q), depth * (p + q) / 2);
	}

	/**
	 * Where two faces of given area meet, p and q wide along the bend: l = (π/8)(p + q), the mean of both areas.
	 *
	 * @param p m
	 * @param q m
	 */
	public static PathPart corner(double p, double q, double firstArea, double secondArea) {
		return prism(CORNER * (p + q), (firstArea + secondArea) / 2);
	}

	/**
	 * From a round post with a hole into a plate: to the circle that halves the post's area. Radii and thickness in m.
	 *
	 * @param round share of the whole circle that the plate takes, above 0 to 1; the post is whole
	 */
	public static PathPart postCorner(double hole, double post, double thickness, double round) {
		check("round", round, round > 0 && round <= 1);
		double s = post - Math.sqrt((hole * hole + post * post) / 2);
		return prism(CORNER * (2 * s + thickness), Math.PI / 2 * (post * post - hole * hole + 2 * round * post * thickness));
	}

	/** From a plate into an outer ring, likewise. */
	public static PathPart wallCorner(double inner, double outer, double thickness) {
		double s = Math.sqrt((inner * inner + outer * outer) / 2) - inner;
		return prism(CORNER * (2 * s + thickness), Math.PI / 2 * (outer * outer - inner * inner + 2 * inner * thickness));
	}

	/** @return n of them in series */
	public PathPart times(double n) {
		return new PathPart(n * c1, n * c2, minimumArea);
	}

	/** @return the piece cut to a part of its section: 0.5 for one of two halves */
	public PathPart share(double part) {
		return new PathPart(c1 / part, c2 / (part * part), minimumArea * part);
	}

	/** @return m; of a bar with the least area all along that has the same C₁ */
	public double lengthAtMinimumArea() {
		return c1 * minimumArea;
	}

	private static void check(String name, double found, boolean holds) {
		if (!holds || Double.isNaN(found) || Double.isInfinite(found)) {
			throw new IllegalArgumentException(name + " = " + found + ": is outside its domain");
		}
	}
}
