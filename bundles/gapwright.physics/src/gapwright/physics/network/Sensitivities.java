package gapwright.physics.network;

import java.util.Arrays;

/**
 * Exact derivatives of linkages, fluxes, flux densities and differential inductances with respect to any
 * {@link Parameter}, by the adjoint method: W = N − C·Y⁻¹·CᵀG·N answers for every linkage without a further solve, each
 * flux and each inductance costs one back-substitution for all parameters together.
 * <p>
 * All winding currents count as imposed, also where the solution came of an imposed linkage. At a point of a table,
 * where d²B/dH² jumps, the derivative of an inductance is one-sided. Results are per SI unit of the parameter. Source:
 * derivation from the leg law f = H·l + R·φ, φ = A·B(H) and flux balance at every joint.
 */
public final class Sensitivities {

	private final Network network;
	private final OperatingState at;
	/** W by windings: MMF across iron and gap of every branch per ampere, the network answering. */
	private final double[][] response;
	private final double[][] fluxAdjoint;
	private final double[][][] inductanceAdjoint;

	/**
	 * @param network  what was solved
	 * @param solution its converged solution
	 * @throws IllegalArgumentException when the solution did not converge or belongs to another network
	 */
	public Sensitivities(Network network, Solution solution) {
		if (!solution.converged()) {
			throw new IllegalArgumentException("the solution did not converge: it has no sensitivities");
		}
		if (solution.legFlux().length != network.legCount() || solution.airFlux().length != network.airPathCount()
				|| solution.windingCurrent().length != network.windingCount()) {
			throw new IllegalArgumentException("the solution is of another network: it has " + solution.legFlux().length
					+ " legs, the network " + network.legCount());
		}
		this.network = network;
		at = new OperatingState(network, solution);
		int windings = network.windingCount();
		double[][] turns = new double[windings][network.branchCount()];
		for (int c = 0; c < network.coilCount(); c++) {
			turns[network.coilWinding(c)][network.coilLeg(c)] += network.coilTurns(c);
		}
		response = new double[windings][];
		for (int w = 0; w < windings; w++) {
			response[w] = respond(turns[w]);
		}
		fluxAdjoint = new double[network.legCount()][];
		inductanceAdjoint = new double[windings][windings][];
	}

	public Network network() {
		return network;
	}

	/** @return dλ/dp of one winding, Wb per unit of p */
	public double linkage(int winding, Parameter p) {
		double sum = 0;
		for (ExplicitEffect effect : ExplicitEffect.of(p, at)) {
			sum += response[winding][effect.branch()] * ownFlux(effect);
		}
		if (p instanceof Parameter.CoilTurns turns && network.coilWinding(turns.coil()) == winding) {
			sum += at.flux(network.coilLeg(turns.coil()));
		}
		return sum;
	}

	/** @return dφ/dp of one leg, Wb per unit of p */
	public double legFlux(int leg, Parameter p) {
		if (at.isBridge(leg)) {
			return 0;
		}
		if (fluxAdjoint[leg] == null) {
			double[] unit = new double[network.branchCount()];
			unit[leg] = 1;
			fluxAdjoint[leg] = respond(unit);
		}
		double sum = 0;
		for (ExplicitEffect effect : ExplicitEffect.of(p, at)) {
			sum += fluxAdjoint[leg][effect.branch()] * ownFlux(effect);
		}
		return sum;
	}

	/** @return dB/dp in the iron of one leg, T per unit of p */
	public double legFluxDensity(int leg, Parameter p) {
		boolean ownArea = p instanceof Parameter.IronArea area && area.leg() == leg;
		return (legFlux(leg, p) - (ownArea ? at.fluxDensity(leg) : 0)) / network.ironArea(leg);
	}

	/** @return dL/dp of the differential inductance between two windings, or of one (i = j), H per unit of p */
	public double inductance(int i, int j, Parameter p) {
		double[] adjoint = inductanceAdjoint(Math.min(i, j), Math.max(i, j));
		double sum = 0;
		for (ExplicitEffect effect : ExplicitEffect.of(p, at)) {
			int k = effect.branch();
			double both = response[i][k] * response[j][k];
			sum += both * effect.conductance() - adjoint[k] * ownFlux(effect);
			if (k < network.legCount()) {
				sum += both * at.conductanceSlope(k) * (effect.field() + effect.mmf() / at.stiffness(k));
			}
		}
		if (p instanceof Parameter.CoilTurns turns) {
			int winding = network.coilWinding(turns.coil());
			int leg = network.coilLeg(turns.coil());
			sum += winding == i ? at.conductance(leg) * response[j][leg] : 0;
			sum += winding == j ? at.conductance(leg) * response[i][leg] : 0;
		}
		return sum;
	}

	/** Flux a parameter drives in its own branch with all potentials held, Wb per unit. */
	private double ownFlux(ExplicitEffect effect) {
		return effect.flux() + at.conductance(effect.branch()) * effect.mmf();
	}

	private double[] respond(double[] source) {
		double[] flux = new double[source.length];
		Arrays.setAll(flux, k -> at.conductance(k) * source[k]);
		double[] drop = at.throughNetwork(flux);
		double[] answer = new double[source.length];
		Arrays.setAll(answer, k -> source[k] - drop[k]);
		return answer;
	}

	/** C·a with Y·a = Cᵀ(q/D), q = W_i·W_j·dG/dH: how the bend of every leg's curve turns moved potentials into L. */
	private double[] inductanceAdjoint(int i, int j) {
		if (inductanceAdjoint[i][j] == null) {
			double[] bend = new double[network.branchCount()];
			for (int k = 0; k < network.legCount(); k++) {
				bend[k] = at.isBridge(k) ? 0
						: response[i][k] * response[j][k] * at.conductanceSlope(k) / at.stiffness(k);
			}
			inductanceAdjoint[i][j] = at.throughNetwork(bend);
		}
		return inductanceAdjoint[i][j];
	}
}
