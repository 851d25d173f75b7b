package gapwright.physics.network;

import java.util.function.DoubleUnaryOperator;

/**
 * A number of a network whose influence on its answer is asked for, others held. What sets several of these at once (the
 * length of a gap through reluctance, a common stack depth through many areas) is the sum of their sensitivities, each
 * times its own derivative.
 */
public sealed interface Parameter {

	/** Length of a leg's path in iron, m. */
	record PathLength(int leg) implements Parameter {
	}

	/** Iron area of a leg, m², its series reluctance held. */
	record IronArea(int leg) implements Parameter {
	}

	/** Reluctance of gaps and magnet in series with a leg's iron, 1/H. */
	record SeriesReluctance(int leg) implements Parameter {
	}

	/** MMF of a leg's magnet, A, positive from → to. */
	record MagnetMmf(int leg) implements Parameter {
	}

	/** Permeance of an air path, H. */
	record Permeance(int airPath) implements Parameter {
	}

	/** Current of a winding, A. */
	record Current(int winding) implements Parameter {
	}

	/** Signed turns of one coil, the current of its winding held. */
	record CoilTurns(int coil) implements Parameter {
	}

	/**
	 * A parameter θ of the B-H curve of one leg.
	 *
	 * @param fluxDensity H ↦ ∂B/∂θ at that field strength, T per unit of θ
	 * @param slope       H ↦ ∂(dB/dH)/∂θ, H/m per unit of θ
	 */
	record Curve(int leg, DoubleUnaryOperator fluxDensity, DoubleUnaryOperator slope) implements Parameter {
	}
}
