package gapwright.physics.network;

import java.util.ArrayList;
import java.util.List;

/**
 * What a parameter does to one branch by itself, before the network answers: with f = u_a − u_b + F held for flux and
 * field, and with H held for the permeance G = dφ/df. From f = H·l + R·A·B, D = l + R·A·B′ and G = A·B′/D.
 *
 * @param branch      leg, or leg count + air path
 * @param flux        ∂φ/∂p at fixed f, Wb per unit
 * @param field       ∂H/∂p at fixed f, A/m per unit; 0 for an air path
 * @param conductance ∂G/∂p at fixed H, H per unit
 * @param mmf         ∂F/∂p, A per unit
 */
record ExplicitEffect(int branch, double flux, double field, double conductance, double mmf) {

	static List<ExplicitEffect> of(Parameter parameter, OperatingState at) {
		List<ExplicitEffect> effects = new ArrayList<>();
		Network n = at.network();
		if (parameter instanceof Parameter.PathLength p) {
			int k = p.leg();
			double d = at.stiffness(k);
			effects.add(new ExplicitEffect(k, -at.conductance(k) * at.field(k), -at.field(k) / d,
					-at.conductance(k) / d, 0));
		} else if (parameter instanceof Parameter.IronArea p) {
			int k = p.leg();
			double d = at.stiffness(k);
			effects.add(new ExplicitEffect(k, at.fluxDensity(k) * n.pathLength(k) / d,
					-n.seriesReluctance(k) * at.fluxDensity(k) / d, at.slope(k) * n.pathLength(k) / (d * d), 0));
		} else if (parameter instanceof Parameter.SeriesReluctance p) {
			int k = p.leg();
			double g = at.conductance(k);
			effects.add(new ExplicitEffect(k, -g * at.flux(k), -at.flux(k) / at.stiffness(k), -g * g, 0));
		} else if (parameter instanceof Parameter.MagnetMmf p) {
			effects.add(new ExplicitEffect(p.leg(), 0, 0, 0, 1));
		} else if (parameter instanceof Parameter.Permeance p) {
			int k = n.legCount() + p.airPath();
			effects.add(new ExplicitEffect(k, at.flux(k) / n.permeance(p.airPath()), 0, 1, 0));
		} else if (parameter instanceof Parameter.Current p) {
			for (int c = 0; c < n.coilCount(); c++) {
				if (n.coilWinding(c) == p.winding()) {
					effects.add(new ExplicitEffect(n.coilLeg(c), 0, 0, 0, n.coilTurns(c)));
				}
			}
		} else if (parameter instanceof Parameter.CoilTurns p) {
			effects.add(new ExplicitEffect(n.coilLeg(p.coil()), 0, 0, 0, at.current(n.coilWinding(p.coil()))));
		} else if (parameter instanceof Parameter.Curve p) {
			int k = p.leg();
			double d = at.stiffness(k);
			double area = n.ironArea(k);
			double b = p.fluxDensity().applyAsDouble(at.field(k));
			effects.add(new ExplicitEffect(k, area * b * n.pathLength(k) / d, -n.seriesReluctance(k) * area * b / d,
					area * p.slope().applyAsDouble(at.field(k)) * n.pathLength(k) / (d * d), 0));
		}
		// a branch on no closed path carries nothing whatever its numbers
		effects.removeIf(effect -> at.isBridge(effect.branch()));
		return effects;
	}
}
