package gapwright.physics.network;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.function.IntToDoubleFunction;

import org.junit.jupiter.api.Test;

import gapwright.physics.material.ArctanBh;
import gapwright.physics.material.BhCurve;
import gapwright.physics.material.KneeBh;
import gapwright.physics.material.LinearBh;
import gapwright.physics.material.RollOffBh;

/** What must happen to a network's answer when the network is scaled, turned round, driven weakly or to its end. */
class ScalingAndLimitsTest {

	private static final List<RandomNetworks.Case> CASES = RandomNetworks.many(80, 25, true, false);
	private static final List<RandomNetworks.Case> LINEAR = RandomNetworks.many(60, 25, false, true);

	private static Solution solve(Network network, double... current) {
		Solution solution = new NetworkSolver(network).solve(Excitation.currents(current));
		assertTrue(solution.converged());
		return solution;
	}

	private static double largest(double... values) {
		return Arrays.stream(values).map(Math::abs).max().orElse(0);
	}

	private static void assertClose(double[] expected, double[] found, double tolerance, Object what) {
		double scale = largest(expected);
		for (int i = 0; i < expected.length; i++) {
			assertEquals(expected[i], found[i], tolerance * scale, what.toString());
		}
	}

	private static double[] times(double factor, double[] values) {
		return Arrays.stream(values).map(v -> factor * v).toArray();
	}

	/** Dimensional analysis of H·l + R·φ = N·i with R = g/(µ₀A): currents as lengths leave every field as it is. */
	@Test
	void everyLengthAndCurrentTimesSevenLeavesFieldsAndMakesInductanceSevenTimes() {
		double s = 7;
		for (RandomNetworks.Case c : CASES) {
			Network n = c.network();
			Network.Builder b = Network.builder();
			for (int j = 0; j < n.jointCount(); j++) {
				b.joint();
			}
			for (int k = 0; k < n.legCount(); k++) {
				b.leg(n.from(k), n.to(k), n.curve(k), s * n.pathLength(k), s * s * n.ironArea(k),
						n.seriesReluctance(k) / s, s * n.magnetMmf(k));
			}
			for (int p = 0; p < n.airPathCount(); p++) {
				b.airPath(n.from(n.legCount() + p), n.to(n.legCount() + p), s * n.permeance(p));
			}
			for (int w = 0; w < n.windingCount(); w++) {
				b.winding();
			}
			for (int coil = 0; coil < n.coilCount(); coil++) {
				b.coil(n.coilWinding(coil), n.coilLeg(coil), n.coilTurns(coil));
			}
			Solution small = solve(n, c.current());
			Solution big = solve(b.build(), times(s, c.current()));
			assertClose(small.legFluxDensity(), big.legFluxDensity(), 1e-11, c);
			assertClose(small.legFieldStrength(), big.legFieldStrength(), 1e-9, c);
			assertClose(times(s * s, small.legFlux()), big.legFlux(), 1e-11, c);
			for (int w = 0; w < n.windingCount(); w++) {
				assertEquals(s * small.differentialInductance()[w][w], big.differentialInductance()[w][w],
						1e-9 * s * small.differentialInductance()[w][w], c.toString());
			}
		}
	}

	@Test
	void drawingEveryOtherLegTheOtherWayRoundChangesOnlyItsSigns() {
		for (RandomNetworks.Case c : CASES) {
			Network n = c.network();
			Network.Builder b = Network.builder();
			for (int j = 0; j < n.jointCount(); j++) {
				b.joint();
			}
			for (int k = 0; k < n.legCount(); k++) {
				boolean turned = k % 2 == 1;
				b.leg(turned ? n.to(k) : n.from(k), turned ? n.from(k) : n.to(k), n.curve(k), n.pathLength(k),
						n.ironArea(k), n.seriesReluctance(k), turned ? -n.magnetMmf(k) : n.magnetMmf(k));
			}
			for (int p = 0; p < n.airPathCount(); p++) {
				b.airPath(n.from(n.legCount() + p), n.to(n.legCount() + p), n.permeance(p));
			}
			for (int w = 0; w < n.windingCount(); w++) {
				b.winding();
			}
			for (int coil = 0; coil < n.coilCount(); coil++) {
				boolean turned = n.coilLeg(coil) % 2 == 1;
				b.coil(n.coilWinding(coil), n.coilLeg(coil), turned ? -n.coilTurns(coil) : n.coilTurns(coil));
			}
			Solution drawn = solve(n, c.current());
			Solution turned = solve(b.build(), c.current());
			double[] back = turned.legFlux().clone();
			for (int k = 1; k < back.length; k += 2) {
				back[k] = -back[k];
			}
			assertClose(drawn.legFlux(), back, 1e-11, c);
			assertClose(drawn.linkage(), turned.linkage(), 1e-10, c);
		}
	}

	@Test
	void reversingEveryCoilOfOneWindingReversesItsCurrentAndItsLinkage() {
		for (RandomNetworks.Case c : CASES) {
			Network n = c.network();
			Network.Builder b = Rebuild.of(n, k -> k, j -> j, false);
			for (int coil = 0; coil < n.coilCount(); coil++) {
				b.coil(n.coilWinding(coil), n.coilLeg(coil),
						n.coilWinding(coil) == 0 ? -n.coilTurns(coil) : n.coilTurns(coil));
			}
			double[] current = c.current().clone();
			current[0] = -current[0];
			Solution as = solve(n, c.current());
			Solution reversed = solve(b.build(), current);
			assertClose(as.legFlux(), reversed.legFlux(), 1e-12, c);
			assertEquals(-as.linkage()[0], reversed.linkage()[0], 1e-12 * largest(as.linkage()), c.toString());
			for (int w = 1; w < current.length; w++) {
				assertEquals(-as.differentialInductance()[0][w], reversed.differentialInductance()[0][w], 1e-11 * Math.sqrt(
						as.differentialInductance()[0][0] * as.differentialInductance()[w][w]), c.toString());
			}
		}
	}

	/** Two legs more on a joint of every network, at the end of which there is nothing. */
	@Test
	void aDeadEndLeavesEveryNetworkAsItWas() {
		for (RandomNetworks.Case c : CASES) {
			Network n = c.network();
			Network.Builder b = Rebuild.of(n, k -> k, j -> j, true);
			int first = b.joint();
			int second = b.joint();
			b.leg(n.jointCount() / 2, first, new KneeBh(900, 0.4), 0.02, 1e-4, 0, 0);
			int dead = b.leg(second, first, new KneeBh(900, 0.4), 0.02, 1e-4, 3e6, 100);
			b.coil(0, dead, 25);
			Solution without = solve(n, c.current());
			Solution with = solve(b.build(), c.current());
			assertEquals(0, with.legFlux()[dead], 0);
			assertClose(without.legFlux(), Arrays.copyOf(with.legFlux(), n.legCount()), 1e-13, c);
			assertClose(without.linkage(), with.linkage(), 1e-12, c);
			// beyond the joint where it is met at its far end, the sources alone set the potential
			double sources = 100 + 25 * c.current()[0];
			double[] u = with.jointPotential();
			assertEquals(sources, u[first] - u[second], 1e-12 * (Math.abs(sources) + largest(u)), c.toString());
		}
	}

	/** Energy in the linearised field: i·L·j = Σ φ_i·φ_j/G, where the air paths store their share as well. */
	@Test
	void inductanceIsTheEnergyOfUnitCurrentsInEveryBranchAirPathsIncluded() {
		int airMattered = 0;
		for (RandomNetworks.Case c : LINEAR) {
			Network n = c.network();
			int windings = n.windingCount();
			double[][] l = null;
			Solution[] unit = new Solution[windings];
			for (int w = 0; w < windings; w++) {
				double[] current = new double[windings];
				current[w] = 1;
				unit[w] = solve(n, current);
				l = unit[w].differentialInductance();
			}
			for (int i = 0; i < windings; i++) {
				for (int j = 0; j < windings; j++) {
					double iron = 0;
					for (int k = 0; k < n.legCount(); k++) {
						double reluctance = n.pathLength(k) / (n.curve(k).slope(0) * n.ironArea(k)) + n.seriesReluctance(k);
						iron += reluctance * unit[i].legFlux()[k] * unit[j].legFlux()[k];
					}
					double air = 0;
					for (int p = 0; p < n.airPathCount(); p++) {
						air += unit[i].airFlux()[p] * unit[j].airFlux()[p] / n.permeance(p);
					}
					double scale = Math.sqrt(l[i][i] * l[j][j]);
					assertEquals(l[i][j], iron + air, 1e-11 * scale, c.toString());
					airMattered += Math.abs(air) > 1e-3 * scale ? 1 : 0;
				}
			}
		}
		assertTrue(airMattered > 20, "air paths hardly mattered: " + airMattered);
	}

	/** Rayleigh's monotonicity law for resistive networks, read for permeances. */
	@Test
	void inALinearNetworkMorePermeanceNeverLowersInductanceAndAWiderGapNeverRaisesIt() {
		for (RandomNetworks.Case c : LINEAR) {
			Network n = c.network();
			double[] before = ownInductances(n);
			for (int changed = 0; changed < n.legCount(); changed++) {
				int here = changed;
				assertNowhereAbove(before, ownInductances(withReluctance(n,
						k -> n.seriesReluctance(k) + (k == here ? 0.3 * reluctance(n, k) : 0))), c);
			}
			for (int p = 0; p < n.airPathCount(); p++) {
				Network.Builder b = Rebuild.of(n, k -> k, j -> j, true);
				b.airPath(n.from(n.legCount() + p), n.to(n.legCount() + p), 0.5 * n.permeance(p));
				assertNowhereAbove(ownInductances(b.build()), before, c);
			}
		}
	}

	private static double reluctance(Network n, int k) {
		return n.pathLength(k) / (n.curve(k).slope(0) * n.ironArea(k)) + n.seriesReluctance(k);
	}

	private static void assertNowhereAbove(double[] bound, double[] values, Object what) {
		for (int w = 0; w < bound.length; w++) {
			assertTrue(values[w] <= bound[w] * (1 + 1e-11), () -> what.toString());
		}
	}

	private static double[] ownInductances(Network n) {
		double[][] l = solve(n, new double[n.windingCount()]).differentialInductance();
		double[] own = new double[l.length];
		Arrays.setAll(own, w -> l[w][w]);
		return own;
	}

	private static Network withReluctance(Network n, IntToDoubleFunction reluctance) {
		Network.Builder b = Network.builder();
		for (int j = 0; j < n.jointCount(); j++) {
			b.joint();
		}
		for (int k = 0; k < n.legCount(); k++) {
			b.leg(n.from(k), n.to(k), n.curve(k), n.pathLength(k), n.ironArea(k),
					reluctance.applyAsDouble(k), n.magnetMmf(k));
		}
		for (int p = 0; p < n.airPathCount(); p++) {
			b.airPath(n.from(n.legCount() + p), n.to(n.legCount() + p), n.permeance(p));
		}
		for (int w = 0; w < n.windingCount(); w++) {
			b.winding();
		}
		for (int coil = 0; coil < n.coilCount(); coil++) {
			b.coil(n.coilWinding(coil), n.coilLeg(coil), n.coilTurns(coil));
		}
		return b.build();
	}

	/** Three legs, gap in the middle one, a leakage path, two windings. */
	private static Network threeLegs(BhCurve iron) {
		Network.Builder b = Network.builder();
		int top = b.joint();
		int bottom = b.joint();
		int left = b.leg(top, bottom, iron, 0.09, 0.9e-4, 0, 0);
		int middle = b.leg(bottom, top, iron, 0.04, 1.8e-4, 3e6, 0);
		b.leg(top, bottom, iron, 0.11, 1.1e-4, 1e6, 0);
		b.airPath(top, bottom, 2e-8);
		b.coil(b.winding(), middle, 24);
		return b.coil(b.winding(), left, 9).coil(1, middle, -3).build();
	}

	@Test
	void drivenWeaklyEveryCurveIsItsInitialPermeability() {
		for (double permeability : new double[] { 40, 2300 }) {
			double saturation = 0.5;
			double chi = BhCurve.MU_0 * (permeability - 1);
			double[][] expected = solve(threeLegs(new LinearBh(permeability)), 0, 0).differentialInductance();
			// about 1e-9 of what would saturate the iron
			double current = 1e-9 * saturation / chi * 0.04 / 24;
			for (BhCurve curve : List.of(new KneeBh(permeability, saturation), new ArctanBh(permeability, saturation),
					new RollOffBh(permeability, saturation / chi, 2))) {
				Solution weak = solve(threeLegs(curve), current, 0);
				for (int w = 0; w < 2; w++) {
					assertClose(expected[w], weak.differentialInductance()[w], 1e-6, curve);
				}
				assertEquals(expected[0][0] * current, weak.linkage()[0], 1e-6 * expected[0][0] * current);
			}
		}
	}

	@Test
	void drivenToTheEndOnlyANetworkOfAirIsLeft() {
		double saturation = 0.5;
		double[][] expected = solve(threeLegs(new LinearBh(1)), 0, 0).differentialInductance();
		double chi = BhCurve.MU_0 * 2299;
		for (BhCurve curve : List.of(new KneeBh(2300, saturation), new ArctanBh(2300, saturation),
				new RollOffBh(60, 2000, 1.8))) {
			Solution deep = solve(threeLegs(curve), 1e7, 0);
			assertTrue(Math.abs(deep.legFieldStrength()[1]) > 1e4 * saturation / chi);
			for (int w = 0; w < 2; w++) {
				assertClose(expected[w], deep.differentialInductance()[w], 1e-2, curve);
			}
		}
	}

	@Test
	void twoImposedLinkagesGiveBackBothCurrentsFarIntoSaturation() {
		NetworkSolver solver = new NetworkSolver(threeLegs(new KneeBh(2300, 0.5)));
		double[] none = { Double.NaN, Double.NaN };
		for (double[] current : new double[][] { { 0.01, 0.02 }, { 4, -3 }, { 90, 40 }, { -2000, 900 } }) {
			Solution driven = solver.solve(Excitation.currents(current));
			Solution back = solver.solve(Excitation.mixed(none, driven.linkage()));
			assertTrue(back.converged() && back.iterations() <= 40);
			assertClose(current, back.windingCurrent(), 1e-9, Arrays.toString(current));
			assertClose(driven.legFlux(), back.legFlux(), 1e-11, Arrays.toString(current));
		}
	}

	/** A winding may span islands: its coils are in series whatever iron they sit on. */
	@Test
	void aWindingOverTwoEqualIslandsHasTwiceTheInductanceOfOne() {
		for (double ampere : new double[] { 0.1, 30 }) {
			double one = solve(ringsOnOneWinding(1), ampere).differentialInductance()[0][0];
			double both = solve(ringsOnOneWinding(2), ampere).differentialInductance()[0][0];
			assertEquals(2 * one, both, 1e-12 * both);
		}
	}

	private static Network ringsOnOneWinding(int rings) {
		Network.Builder b = Network.builder();
		int winding = b.winding();
		for (int r = 0; r < rings; r++) {
			int a = b.joint();
			int c = b.joint();
			int wound = b.leg(a, c, new KneeBh(2300, 0.5), 0.05, 1e-4, 2e6, 0);
			b.leg(c, a, new KneeBh(2300, 0.5), 0.08, 1e-4, 0, 0);
			b.coil(winding, wound, 20);
		}
		return b.build();
	}

	@Test
	void aLatticeOfTwentyThousandSaturatingLegsBalancesAtEveryJoint() {
		Network n = Lattices.saturating(102, 100);
		assertTrue(n.branchCount() > 20_000);
		Solution s = solve(n, Lattices.currents(n, 200));
		double[] leaving = new double[n.jointCount()];
		for (int k = 0; k < n.legCount(); k++) {
			leaving[n.from(k)] += s.legFlux()[k];
			leaving[n.to(k)] -= s.legFlux()[k];
		}
		assertTrue(largest(leaving) <= 1e-12 * largest(s.legFlux()), "imbalance " + largest(leaving));
		assertTrue(largest(s.legFluxDensity()) > 0.45, "not saturated at all");
		// the leg law by the joint potentials, its sources added
		double[] source = new double[n.legCount()];
		for (int coil = 0; coil < n.coilCount(); coil++) {
			source[n.coilLeg(coil)] += n.coilTurns(coil) * s.windingCurrent()[n.coilWinding(coil)];
		}
		for (int k = 0; k < n.legCount(); k++) {
			double offered = s.jointPotential()[n.from(k)] - s.jointPotential()[n.to(k)] + source[k];
			assertEquals(offered, s.legMmfDrop()[k] + n.seriesReluctance(k) * s.legFlux()[k], 1e-10 * 2000, "leg " + k);
		}
	}
}
