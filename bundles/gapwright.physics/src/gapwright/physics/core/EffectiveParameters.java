package gapwright.physics.core;

import java.util.List;

/**
 * Effective parameters of a core: an ideal ring with them behaves like the core for low, uniform excitation, without
 * gaps and fringing. Source: IEC 60205:2016 (from memory).
 *
 * @param c1          core constant Σl/A, 1/m
 * @param c2          core constant Σl/A², 1/m³
 * @param minimumArea m², least area the flux passes
 */
public record EffectiveParameters(double c1, double c2, double minimumArea) {

	/** All pieces of one closed path, in series. */
	public static EffectiveParameters of(List<PathPart> parts) {
		double c1 = 0;
		double c2 = 0;
		double least = Double.POSITIVE_INFINITY;
		for (PathPart part : parts) {
			c1 += part.c1();
			c2 += part.c2();
			least = Math.min(least, part.minimumArea());
		}
		return new EffectiveParameters(c1, c2, least);
	}

	/** @return two such paths side by side: C₁ halves, C₂ is a quarter, areas double */
	public EffectiveParameters doubled() {
		return new EffectiveParameters(c1 / 2, c2 / 4, 2 * minimumArea);
	}

	/** @return l_e = C₁²/C₂, m */
	public double length() {
		return c1 * c1 / c2;
	}

	/** @return A_e = C₁/C₂, m² */
	public double area() {
		return c1 / c2;
	}

	/** @return V_e = C₁³/C₂², m³ */
	public double volume() {
		return c1 * c1 * c1 / (c2 * c2);
	}
}
