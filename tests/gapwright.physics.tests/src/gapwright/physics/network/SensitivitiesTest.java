package gapwright.physics.network;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.function.ToDoubleFunction;

import org.junit.jupiter.api.Test;

import gapwright.physics.material.BhCurve;
import gapwright.physics.material.KneeBh;
import gapwright.physics.material.LinearBh;

/** Every derivative against differences of re-solved networks, and against formulas where there is one. */
class SensitivitiesTest {

	private static final List<RandomNetworks.Case> CASES = RandomNetworks.many(60, 8, true, false);

	/** A network as numbers that can be changed one by one. */
	private static final class Copy {

		private final Network n;
		private final double[] current;
		private Parameter changed;
		private double factor;

		Copy(Network n, double[] current) {
			this.n = n;
			this.current = current;
		}

		private double value(Parameter p, double nominal) {
			return p.equals(changed) ? nominal * factor : nominal;
		}

		Solution solve(Parameter p, double factor) {
			changed = p;
			this.factor = factor;
			Network.Builder b = Network.builder();
			for (int j = 0; j < n.jointCount(); j++) {
				b.joint();
			}
			for (int k = 0; k < n.legCount(); k++) {
				b.leg(n.from(k), n.to(k), n.curve(k), value(new Parameter.PathLength(k), n.pathLength(k)),
						value(new Parameter.IronArea(k), n.ironArea(k)),
						value(new Parameter.SeriesReluctance(k), n.seriesReluctance(k)),
						value(new Parameter.MagnetMmf(k), n.magnetMmf(k)));
			}
			for (int a = 0; a < n.airPathCount(); a++) {
				b.airPath(n.from(n.legCount() + a), n.to(n.legCount() + a),
						value(new Parameter.Permeance(a), n.permeance(a)));
			}
			double[] amperes = current.clone();
			for (int w = 0; w < n.windingCount(); w++) {
				b.winding();
				amperes[w] = value(new Parameter.Current(w), amperes[w]);
			}
			for (int c = 0; c < n.coilCount(); c++) {
				b.coil(n.coilWinding(c), n.coilLeg(c), value(new Parameter.CoilTurns(c), n.coilTurns(c)));
			}
			return new NetworkSolver(b.build()).solve(Excitation.currents(amperes));
		}

		/** Every number of the network that is not zero, with its size. */
		List<Sized> parameters() {
			List<Sized> all = new ArrayList<>();
			for (int k = 0; k < n.legCount(); k++) {
				all.add(new Sized(new Parameter.PathLength(k), n.pathLength(k)));
				all.add(new Sized(new Parameter.IronArea(k), n.ironArea(k)));
				all.add(new Sized(new Parameter.SeriesReluctance(k), n.seriesReluctance(k)));
				all.add(new Sized(new Parameter.MagnetMmf(k), n.magnetMmf(k)));
			}
			for (int a = 0; a < n.airPathCount(); a++) {
				all.add(new Sized(new Parameter.Permeance(a), n.permeance(a)));
			}
			for (int w = 0; w < n.windingCount(); w++) {
				all.add(new Sized(new Parameter.Current(w), current[w]));
			}
			for (int c = 0; c < n.coilCount(); c++) {
				all.add(new Sized(new Parameter.CoilTurns(c), n.coilTurns(c)));
			}
			all.removeIf(sized -> sized.value == 0);
			return all;
		}
	}

	private record Sized(Parameter parameter, double value) {
	}

	/**
	 * Differences at two steps; where they disagree, as at a table's point or a field that changes sign, their
	 * disagreement is the doubt. Enough must be free of doubt.
	 */
	private static void compare(ToDoubleFunction<Solution> answer, Exact exact,
			ToDoubleFunction<Solution> scaleOf, int least) {
		int sharp = 0;
		for (RandomNetworks.Case c : CASES) {
			Copy copy = new Copy(c.network(), c.current());
			Solution s = copy.solve(null, 1);
			Sensitivities sensitivities = new Sensitivities(c.network(), s);
			List<Sized> all = copy.parameters();
			for (int p = (int) (c.seed() % 7); p < all.size(); p += 7) {
				Sized sized = all.get(p);
				double fine = difference(copy, sized.parameter, answer, 1e-4);
				double coarse = difference(copy, sized.parameter, answer, 2e-4);
				double found = sized.value * exact.of(sensitivities, sized.parameter);
				double scale = Math.max(scaleOf.applyAsDouble(s), 1e-13);
				double doubt = Math.abs(fine - coarse);
				assertEquals(fine, found, 1e-6 * scale + 2 * doubt, c + ", " + sized.parameter);
				sharp += doubt < 1e-6 * scale && Math.abs(fine) > 1e-4 * scale ? 1 : 0;
			}
		}
		assertTrue(sharp >= least, "only " + sharp + " could be judged sharply");
	}

	private interface Exact {
		double of(Sensitivities sensitivities, Parameter p);
	}

	private static double difference(Copy copy, Parameter p, ToDoubleFunction<Solution> answer, double step) {
		double[] weight = { 1, -8, 8, -1 };
		double[] steps = { -2, -1, 1, 2 };
		double sum = 0;
		for (int i = 0; i < steps.length; i++) {
			sum += weight[i] * answer.applyAsDouble(copy.solve(p, 1 + steps[i] * step));
		}
		return sum / (12 * step);
	}

	@Test
	void linkagesFollowEveryNumberOfTheNetwork() {
		compare(s -> s.linkage()[0], (d, p) -> d.linkage(0, p), s -> Math.abs(s.linkage()[0]), 150);
	}

	@Test
	void fluxesFollowEveryNumberOfTheNetwork() {
		compare(s -> s.legFlux()[0], (d, p) -> d.legFlux(0, p), s -> Math.abs(s.legFlux()[0]), 50);
	}

	@Test
	void fluxDensitiesFollowEveryNumberOfTheNetwork() {
		compare(s -> s.legFluxDensity()[0], (d, p) -> d.legFluxDensity(0, p), s -> Math.abs(s.legFluxDensity()[0]), 50);
	}

	@Test
	void inductancesFollowEveryNumberOfTheNetwork() {
		compare(s -> s.differentialInductance()[0][0], (d, p) -> d.inductance(0, 0, p), s -> s.differentialInductance()[0][0], 150);
	}

	@Test
	void mutualInductancesFollowEveryNumberOfTheNetwork() {
		compare(s -> s.differentialInductance()[0][last(s)], (d, p) -> d.inductance(0, d.network().windingCount() - 1, p),
				s -> Math.sqrt(s.differentialInductance()[0][0] * s.differentialInductance()[last(s)][last(s)]), 100);
	}

	private static int last(Solution s) {
		return s.linkage().length - 1;
	}

	/** One closed path of reluctances: L = N²/R, so ∂L/∂R = −N²/R² and ∂B/∂R = −B/R. */
	@Test
	void aLinearGappedRingFollowsItsOwnFormula() {
		Network.Builder b = Network.builder();
		int top = b.joint();
		int bottom = b.joint();
		int gapped = b.leg(bottom, top, new LinearBh(2000), 0.05, 1e-4, 5e6, 0);
		b.leg(top, bottom, new LinearBh(2000), 0.05, 1e-4, 0, 0);
		b.coil(b.winding(), gapped, 40);
		Network n = b.build();
		Solution s = new NetworkSolver(n).solve(Excitation.currents(2));
		Sensitivities d = new Sensitivities(n, s);
		double r = 5e6 + 0.1 / (BhCurve.MU_0 * 2000 * 1e-4);
		Parameter gap = new Parameter.SeriesReluctance(gapped);
		assertEquals(-1600 / (r * r), d.inductance(0, 0, gap), 1e-12 * 1600 / (r * r));
		assertEquals(-2 * 1600 / (r * r), d.linkage(0, gap), 1e-12 * 3200 / (r * r));
		double fluxDensity = 80 / r / 1e-4;
		assertEquals(-fluxDensity / r, d.legFluxDensity(1, gap), 1e-12 * fluxDensity / r);
		// twice L/N for a winding of one coil
		assertEquals(2 * 40 / r, d.inductance(0, 0, new Parameter.CoilTurns(0)), 1e-12 * 80 / r);
		assertEquals(0, d.inductance(0, 0, new Parameter.Current(0)), 0);
	}

	/** ∂λ/∂i is the differential inductance itself, whatever the curves. */
	@Test
	void theSensitivityOfLinkageToCurrentIsTheInductance() {
		for (RandomNetworks.Case c : CASES) {
			Solution s = new NetworkSolver(c.network()).solve(c.excitation());
			Sensitivities d = new Sensitivities(c.network(), s);
			for (int i = 0; i < c.current().length; i++) {
				for (int j = 0; j < c.current().length; j++) {
					double[][] l = s.differentialInductance();
					assertEquals(l[i][j], d.linkage(i, new Parameter.Current(j)), 1e-11 * Math.sqrt(l[i][i] * l[j][j]),
							c.toString());
				}
			}
		}
	}

	/** Knee with y = χH/Js: J = Js·y/(1 + y), so ∂J/∂Js = (y/(1 + y))²; its slope by H. */
	@Test
	void aCurvesParameterIsFollowedAsWell() {
		double permeability = 2300;
		double saturation = 0.5;
		double chi = BhCurve.MU_0 * (permeability - 1);
		for (double amperes : new double[] { 1, 6, 15, 60 }) {
			Network n = core(new KneeBh(permeability, saturation));
			Solution s = new NetworkSolver(n).solve(Excitation.currents(amperes));
			Parameter js = new Parameter.Curve(0, h -> {
				double y = chi * Math.abs(h) / saturation;
				return Math.signum(h) * y * y / ((1 + y) * (1 + y));
			}, h -> {
				double y = chi * Math.abs(h) / saturation;
				return 2 * y * chi / saturation / Math.pow(1 + y, 3);
			});
			Sensitivities d = new Sensitivities(n, s);
			double linkage = bySaturation(at -> at.linkage()[0], permeability, saturation, amperes);
			double inductance = bySaturation(at -> at.differentialInductance()[0][0], permeability, saturation, amperes);
			assertEquals(linkage, d.linkage(0, js), 1e-8 * Math.abs(linkage));
			assertEquals(inductance, d.inductance(0, 0, js), 1e-8 * s.differentialInductance()[0][0]);
		}
	}

	private static double bySaturation(ToDoubleFunction<Solution> answer, double permeability, double saturation,
			double amperes) {
		double[] weight = { 1, -8, 8, -1 };
		double[] steps = { -2, -1, 1, 2 };
		double step = 1e-4;
		double sum = 0;
		for (int i = 0; i < steps.length; i++) {
			sum += weight[i] * answer.applyAsDouble(new NetworkSolver(
					core(new KneeBh(permeability, saturation + steps[i] * step))).solve(Excitation.currents(amperes)));
		}
		return sum / (12 * step);
	}

	private static Network core(BhCurve first) {
		Network.Builder b = Network.builder();
		int top = b.joint();
		int bottom = b.joint();
		int wound = b.leg(bottom, top, first, 0.04, 1.5e-4, 3e6, 0);
		b.leg(top, bottom, new KneeBh(2300, 0.5), 0.09, 0.9e-4, 0, 0);
		b.airPath(top, bottom, 2e-8);
		return b.coil(b.winding(), wound, 24).build();
	}

	@Test
	void nothingIsSaidAboutASolutionOfAnotherNetwork() {
		Solution s = new NetworkSolver(core(new LinearBh(50))).solve(Excitation.currents(1));
		RandomNetworks.Case other = CASES.get(3);
		assertThrows(IllegalArgumentException.class, () -> new Sensitivities(other.network(), s));
	}
}
