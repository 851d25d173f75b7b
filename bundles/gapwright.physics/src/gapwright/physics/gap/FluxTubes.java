package gapwright.physics.gap;

import static gapwright.physics.material.BhCurve.MU_0;

/**
 * Permeance of a gap between equal poles from flux tubes of estimated shape: a check on the other methods that knows
 * nothing of them. Valid for a reach up to the pole's height and a gap up to the least side.
 * Source: Roters, Electromagnetic Devices (1941), chapter 5; from memory.
 */
public final class FluxTubes {

	private FluxTubes() {
	}

	/** Half cylinder along an edge, from edge to edge. @param edge m @return H */
	public static double alongEdge(double edge) {
		return 0.26 * MU_0 * edge;
	}

	/** Half hollow cylinder along an edge, from side to side. @param edge m @param reach up the side, m @param gap m @return H */
	public static double betweenSides(double edge, double reach, double gap) {
		return MU_0 * edge / Math.PI * Math.log(1 + 2 * reach / gap);
	}

	/** Quadrant of a sphere at a corner. @param gap m @return H */
	public static double atCorner(double gap) {
		return 0.077 * MU_0 * gap;
	}

	/** Quadrant of a spherical shell at a corner. @param reach up the sides, m @return H */
	public static double aroundCorner(double reach) {
		return MU_0 * reach / 4;
	}

	/**
	 * @param a     m
	 * @param b     m
	 * @param gap   m
	 * @param reach how far up the sides the tubes reach, m
	 * @return permeance of the gap between two rectangular poles with all tubes, H
	 */
	public static double rectangular(double a, double b, double gap, double reach) {
		double sides = 0;
		for (double edge : new double[] { a, a, b, b }) {
			sides += alongEdge(edge) + betweenSides(edge, reach, gap);
		}
		return MU_0 * a * b / gap + sides + 4 * (atCorner(gap) + aroundCorner(reach));
	}
}
