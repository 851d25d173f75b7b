package gapwright.physics.core;

/** A ring's flux density falls outwards as 1/r. Source: Ampère's law, linear iron. */
public final class ThickRing {

	/** Outer over inner radius from which the inner edge leads the mean by more than a fifth. */
	public static final double NOTED_FROM = 1.5;

	private ThickRing() {
	}

	/** @return flux density at the inner edge over the mean, (r_o − r_i)/(r_i·ln(r_o/r_i)) */
	public static double innerEdge(double inner, double outer) {
		return (outer - inner) / (inner * Math.log(outer / inner));
	}
}
