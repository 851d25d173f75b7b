package gapwright.physics.leakage;

import static gapwright.physics.material.BhCurve.MU_0;

/**
 * Permeance through air between two facing legs of a window: a uniform field across it, and the tubes out of its two
 * open faces. An estimate, good to some tens of per cent. Sources: definition, P = µ₀A/l; faces by flux tubes of
 * estimated shape, Roters, Electromagnetic Devices (1941), chapter 5, from memory.
 *
 * @param height   of the window along the legs, m, &gt; 0
 * @param distance clear between the legs, m, &gt; 0
 * @param depth    of the legs into the page, m, &gt; 0
 * @param reach    how far the tubes out of a face reach over the leg: its width, m, ≥ 0
 */
public record WindowPath(double height, double distance, double depth, double reach) {

	/** @throws IllegalArgumentException when a size is out of its domain */
	public WindowPath {
		if (!(height > 0 && distance > 0 && depth > 0 && reach >= 0)) {
			throw new IllegalArgumentException("a window of " + height + " m by " + distance + " m, " + depth
					+ " m deep: all must be above 0");
		}
	}

	/** @return H, all of it between two equipotential legs */
	public double permeance() {
		double faces = 0.26 * MU_0 * height + MU_0 * height / Math.PI * Math.log1p(2 * reach / distance);
		return MU_0 * height * depth / distance + 2 * faces;
	}

	/**
	 * Spread over the legs cut into n pieces: P/n between facing joints, half of it at both ends. With the MMF rising
	 * linearly along the legs the energy is then high by 1/(2n²).
	 *
	 * @param pieces n ≥ 1
	 * @return H, n + 1 permeances from one end of the window to the other
	 */
	public double[] ladder(int pieces) {
		double[] rungs = new double[pieces + 1];
		double each = permeance() / pieces;
		for (int i = 0; i <= pieces; i++) {
			rungs[i] = i == 0 || i == pieces ? each / 2 : each;
		}
		return rungs;
	}
}
