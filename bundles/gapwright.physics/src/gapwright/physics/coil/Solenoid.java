package gapwright.physics.coil;

import static gapwright.physics.material.BhCurve.MU_0;

/** Air-core coils wound on a cylinder. All lengths in m, inductances in H. Skin effect, which lowers L a little, is left out. */
public final class Solenoid {

	/** Below this ratio the closed form of Nagaoka's coefficient cancels; its series is good to 1e-9. */
	private static final double LONG = 0.01;
	/** Above this ratio the closed form loses digits to cancellation; the series of short coils is good to 1e-11. */
	private static final double SHORT = 200;

	private Solenoid() {
	}

	/**
	 * Nagaoka's coefficient of a current sheet: inductance over that of an endless one.
	 * Source: Nagaoka (1909), Lorenz; for very short coils Rayleigh and Niven (1881); from memory, checked against
	 * published tables.
	 *
	 * @param ratio diameter over length, ≥ 0
	 */
	public static double nagaoka(double ratio) {
		if (!(ratio >= 0)) {
			throw new IllegalArgumentException("diameter over length = " + ratio + ": must be 0 or above");
		}
		if (ratio < LONG) {
			return 1 - 4 * ratio / (3 * Math.PI) + ratio * ratio / 8;
		}
		if (ratio > SHORT) {
			double log = Math.log(4 * ratio);
			return 2 / (Math.PI * ratio) * (log - 0.5 + (log + 0.25) / (8 * ratio * ratio));
		}
		double hypotenuse = Math.hypot(ratio, 1);
		double k = ratio / hypotenuse;
		double complement = 1 / hypotenuse;
		Elliptic e = Elliptic.of(k, complement);
		return 4 / (3 * Math.PI * complement)
				* (complement * complement / (k * k) * (e.first() - e.second()) + e.second() - k);
	}

	/** A single layer as a current sheet: µ₀N²·(π/4)·D²/l·k_L. Exact for a thin tape wound without space between. */
	public static double currentSheet(double turns, double diameter, double length) {
		return MU_0 * turns * turns * Math.PI / 4 * diameter * diameter / length * nagaoka(diameter / length);
	}

	/**
	 * What round wire of a pitch takes off the current sheet of length N·p: Rosa's correction, matters for few turns.
	 * Source: Rosa (1906), Grover, Inductance Calculations; from memory, checked against summed filaments to 5e-5.
	 *
	 * @param turns ≥ 1
	 * @param wire  diameter of the conductor
	 */
	public static double rosaCorrection(double turns, double diameter, double pitch, double wire) {
		double shape = 1.25 - Math.log(2 * pitch / wire);
		double mutual = Math.log(2 * Math.PI) - 1.5 - Math.log(turns) / (6 * turns) - 0.33084236 / turns
				- 1 / (120 * turns * turns * turns);
		return -MU_0 * diameter / 2 * turns * (shape + mutual);
	}

	/**
	 * Wheeler's formula of 1928 for a single layer, within 1 % for a length above 0.8 of the radius.
	 * Source: Wheeler, Proc. IRE 16 (1928); from memory: r²N²/(9r + 10l) µH with inches.
	 */
	public static double wheelerSingleLayer(double turns, double radius, double length) {
		return 3.937e-5 * radius * radius * turns * turns / (9 * radius + 10 * length);
	}

	/** Wheeler's formula of 1982 for a current sheet, within 0.1 % for diameter over length of 0.1 to 5. From memory. */
	public static double wheelerSheet(double turns, double radius, double length) {
		double x = length / radius;
		return MU_0 * turns * turns * radius * (Math.log1p(Math.PI / x) + 1 / (2.3 + 1.6 * x + 0.44 * x * x));
	}

	/**
	 * Wheeler's formula for several layers, within about 2 % where 6r, 9l and 10c are alike.
	 * Source: Wheeler, Proc. IRE 16 (1928); from memory.
	 *
	 * @param radius mean radius of the winding
	 * @param build  radial depth of the winding, c
	 */
	public static double wheelerMultilayer(double turns, double radius, double length, double build) {
		return 3.15e-5 * radius * radius * turns * turns / (6 * radius + 9 * length + 10 * build);
	}

	/** @return whether 6r, 9l and 10c are alike within a factor of ten, where {@link #wheelerMultilayer} holds */
	public static boolean isMultilayerValid(double radius, double length, double build) {
		double most = Math.max(6 * radius, Math.max(9 * length, 10 * build));
		double least = Math.min(6 * radius, Math.min(9 * length, 10 * build));
		return most <= 10 * least;
	}
}
