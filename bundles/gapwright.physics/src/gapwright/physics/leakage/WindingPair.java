package gapwright.physics.leakage;

import static gapwright.physics.material.BhCurve.MU_0;

/**
 * Leakage inductance of two windings in one window by the energy of the field between them: all ampere-turns of one
 * balanced by the other, spread evenly, the field running along the layers.
 * <p>
 * L = µ₀N²(ℓ/h)·(Σ builds/3 + Σ insulations)·K_R/M², K_R = 1 − (1 − e^(−πh/σ))·σ/(πh), σ the thickness of one section
 * with its insulation. Valid for h above σ; no third winding carrying current. K_R is good to some per cent inside an
 * iron window, and 4 to 14 % high for the part of the turns outside it. Source: energy method, elementary; K_R:
 * Rogowski (1909), from memory.
 *
 * @param firstBuild  m, thickness of the first winding from one winding to the other, &gt; 0
 * @param secondBuild m, &gt; 0
 * @param separation  m, insulation at each interface, ≥ 0
 * @param height      m, extent along the interface: along the leg when concentric, across it when side by side, &gt; 0
 * @param meanTurn    m, over both windings, &gt; 0
 * @param interfaces  M ≥ 1; more than one when the windings are interleaved
 */
public record WindingPair(double firstBuild, double secondBuild, double separation, double height, double meanTurn,
		int interfaces) {

	/** @throws IllegalArgumentException naming the size, what was found and what is allowed */
	public WindingPair {
		require("firstBuild", firstBuild > 0, firstBuild);
		require("secondBuild", secondBuild > 0, secondBuild);
		require("separation", separation >= 0, separation);
		require("height", height > 0, height);
		require("meanTurn", meanTurn > 0, meanTurn);
		if (interfaces < 1) {
			throw new IllegalArgumentException("interfaces = " + interfaces + ": must be 1 or more");
		}
	}

	private static void require(String name, boolean holds, double found) {
		if (!holds || Double.isInfinite(found)) {
			throw new IllegalArgumentException(name + " = " + found + " m: out of its domain");
		}
	}

	/** @return σ, m: thickness of one section with its insulation, across the field */
	public double sectionThickness() {
		return (firstBuild + secondBuild) / interfaces + separation;
	}

	/** @return K_R, 0 to 1: how much the field's spreading at the ends lowers the inductance */
	public double rogowskiFactor() {
		double ratio = sectionThickness() / (Math.PI * height);
		return 1 + Math.expm1(-1 / ratio) * ratio;
	}

	/** @return H, referred to a winding of that many turns */
	public double inductance(double turns) {
		double m = interfaces;
		double thickness = (firstBuild + secondBuild) / 3 + m * separation;
		return MU_0 * turns * turns * meanTurn / height * thickness * rogowskiFactor() / (m * m);
	}

	/** @return height over section thickness; the formula wants it above 1 and makes no sense below one half */
	public double slenderness() {
		return height / sectionThickness();
	}
}
