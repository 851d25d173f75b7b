package gapwright.physics.network;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

import gapwright.physics.material.BhCurve;
import gapwright.physics.material.BlendedBh;
import gapwright.physics.material.LinearBh;
import gapwright.physics.material.Permeability;

/** Networks at a temperature between two curves, which the solver treats by flux density instead of field strength. */
class BlendedNetworksTest {

	private static final double SHARE = 0.37;

	/** The same network with every saturating curve half way to a hotter one: a fifth less saturation, more permeable. */
	private static Network warm(Network cold) {
		NetworkValues values = cold.values();
		for (int k = 0; k < values.curve.length; k++) {
			BhCurve curve = values.curve[k];
			if (!(curve instanceof LinearBh)) {
				values.curve[k] = new BlendedBh(curve, curve.with(1.3 * Permeability.initial(curve), 0.8), SHARE);
			}
		}
		return cold.with(values);
	}

	@Test
	void anyNetworkIsSolvedAndEveryLegIsOnItsBlendedCurve() {
		for (RandomNetworks.Case each : RandomNetworks.many(80, 40, true, false)) {
			Network network = warm(each.network());
			Solution solution = new NetworkSolver(network).solve(Excitation.currents(each.current()));
			assertTrue(solution.converged() && solution.iterations() <= 40, each + " " + solution.iterations());
			assertTrue(solution.fluxResidual() <= 1e-12, each + " " + solution.fluxResidual());
			assertTrue(solution.mmfResidual() <= 1e-10, each.toString());
			for (int k = 0; k < network.legCount(); k++) {
				if (network.curve(k) instanceof BlendedBh blended) {
					double b = solution.legFluxDensity()[k];
					double h = (1 - SHARE) * blended.first().fieldStrength(b) + SHARE * blended.second().fieldStrength(b);
					// H is known as well as B is: to rounding of B times the slope there
					double known = 1e-12 * Math.abs(h) + 1e-14 * Math.abs(b) * blended.fieldSlope(b);
					assertEquals(h, solution.legFieldStrength()[k], known, each + ", leg " + k);
				}
			}
		}
	}

	/** Methods: L against central differences of the linkage, relative step 1e-5, to 1e-7 of the largest. */
	@Test
	void differentialInductanceIsTheSlopeOfTheLinkage() {
		for (RandomNetworks.Case each : RandomNetworks.many(12, 12, false, false)) {
			Network network = warm(each.network());
			NetworkSolver solver = new NetworkSolver(network);
			double[][] exact = solver.solve(Excitation.currents(each.current())).differentialInductance();
			double largest = 0;
			for (double[] row : exact) {
				for (double value : row) {
					largest = Math.max(largest, Math.abs(value));
				}
			}
			for (int w = 0; w < exact.length; w++) {
				double step = 1e-5 * Math.max(1e-6, Math.abs(each.current()[w]));
				double[] up = each.current().clone();
				double[] down = each.current().clone();
				up[w] += step;
				down[w] -= step;
				double[] high = solver.solve(Excitation.currents(up)).linkage();
				double[] low = solver.solve(Excitation.currents(down)).linkage();
				for (int v = 0; v < exact.length; v++) {
					assertEquals((high[v] - low[v]) / (2 * step), exact[v][w], 1e-7 * largest, each.toString());
				}
			}
		}
	}
}
