package gapwright.physics.network;

import gapwright.physics.material.BhCurve;

/** The numbers of a network without its structure, open to change; arrays in the order of legs, air paths and coils. */
public final class NetworkValues {

	/** Of each leg. */
	public final BhCurve[] curve;
	/** m, ≥ 0, of each leg. */
	public final double[] pathLength;
	/** m², &gt; 0, of each leg. */
	public final double[] ironArea;
	/** 1/H, ≥ 0, of each leg. */
	public final double[] seriesReluctance;
	/** A, positive from → to, of each leg. */
	public final double[] magnetMmf;
	/** H, &gt; 0, of each air path. */
	public final double[] permeance;
	/** Signed, not 0, of each coil. */
	public final double[] coilTurns;

	NetworkValues(BhCurve[] curve, double[] pathLength, double[] ironArea, double[] seriesReluctance, double[] magnetMmf,
			double[] permeance, double[] coilTurns) {
		this.curve = curve;
		this.pathLength = pathLength;
		this.ironArea = ironArea;
		this.seriesReluctance = seriesReluctance;
		this.magnetMmf = magnetMmf;
		this.permeance = permeance;
		this.coilTurns = coilTurns;
	}

	void check(int legs, int airPaths, int coils) {
		if (curve.length != legs || permeance.length != airPaths || coilTurns.length != coils) {
			throw new IllegalArgumentException("the numbers are of another network: " + curve.length + " legs, not " + legs);
		}
		for (int k = 0; k < legs; k++) {
			require(curve[k] != null, "curve", k, Double.NaN);
			require(pathLength[k] >= 0 && pathLength[k] < Double.POSITIVE_INFINITY, "pathLength", k, pathLength[k]);
			require(ironArea[k] > 0 && ironArea[k] < Double.POSITIVE_INFINITY, "ironArea", k, ironArea[k]);
			require(seriesReluctance[k] >= 0 && seriesReluctance[k] < Double.POSITIVE_INFINITY, "seriesReluctance", k,
					seriesReluctance[k]);
			require(pathLength[k] > 0 || seriesReluctance[k] > 0, "pathLength", k, pathLength[k]);
			require(Double.isFinite(magnetMmf[k]), "magnetMmf", k, magnetMmf[k]);
		}
		for (int p = 0; p < airPaths; p++) {
			require(permeance[p] > 0 && permeance[p] < Double.POSITIVE_INFINITY, "permeance", p, permeance[p]);
		}
		for (int c = 0; c < coils; c++) {
			require(coilTurns[c] != 0 && Double.isFinite(coilTurns[c]), "coilTurns", c, coilTurns[c]);
		}
	}

	private static void require(boolean holds, String name, int index, double found) {
		if (!holds) {
			throw new IllegalArgumentException(name + "[" + index + "] = " + found + ": is outside its domain");
		}
	}
}
