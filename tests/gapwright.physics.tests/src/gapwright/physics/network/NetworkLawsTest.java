package gapwright.physics.network;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.Random;
import java.util.function.Consumer;

import org.junit.jupiter.api.Test;

/** Laws that hold for every network, tried on many; a failure names the seed. */
class NetworkLawsTest {

	private static final List<RandomNetworks.Case> SMALL = RandomNetworks.many(150, 12, false, false);
	private static final List<RandomNetworks.Case> LARGE = RandomNetworks.many(12, 200, false, false);
	private static final List<RandomNetworks.Case> MAGNETS = RandomNetworks.many(60, 30, true, false);
	private static final List<RandomNetworks.Case> LINEAR = RandomNetworks.many(60, 40, false, true);

	private static Solution solve(RandomNetworks.Case c) {
		Solution solution = new NetworkSolver(c.network()).solve(c.excitation());
		assertTrue(solution.converged(), () -> c + " did not converge, flux residual " + solution.fluxResidual());
		return solution;
	}

	@SafeVarargs
	private static void each(Consumer<RandomNetworks.Case> check, List<RandomNetworks.Case>... groups) {
		for (List<RandomNetworks.Case> group : groups) {
			group.forEach(check);
		}
	}

	private static double largest(double[] values) {
		return Arrays.stream(values).map(Math::abs).max().orElse(0);
	}

	@Test
	void fluxBalancesAtEveryJoint() {
		each(c -> {
			Solution s = solve(c);
			Network n = c.network();
			double[] leaving = new double[n.jointCount()];
			for (int k = 0; k < n.branchCount(); k++) {
				double flux = k < n.legCount() ? s.legFlux()[k] : s.airFlux()[k - n.legCount()];
				leaving[n.from(k)] += flux;
				leaving[n.to(k)] -= flux;
			}
			double scale = Math.max(largest(s.legFlux()), largest(s.airFlux()));
			assertTrue(largest(leaving) <= Math.max(1e-12 * scale, 1e-18), c + ": " + largest(leaving) / scale);
		}, SMALL, LARGE, MAGNETS);
	}

	/** Round every fundamental loop of a spanning tree: potentials exist, so it is enough that every branch obeys its law. */
	@Test
	void mmfRoundEveryLoopIsTheEnclosedAmpereTurns() {
		each(c -> {
			Solution s = solve(c);
			Network n = c.network();
			double[] source = new double[n.branchCount()];
			for (int k = 0; k < n.legCount(); k++) {
				source[k] = n.magnetMmf(k);
			}
			for (int coil = 0; coil < n.coilCount(); coil++) {
				source[n.coilLeg(coil)] += n.coilTurns(coil) * c.current()[n.coilWinding(coil)];
			}
			double[] drop = new double[n.branchCount()];
			for (int k = 0; k < n.branchCount(); k++) {
				drop[k] = k < n.legCount() ? s.legMmfDrop()[k] + n.seriesReluctance(k) * s.legFlux()[k]
						: s.airFlux()[k - n.legCount()] / n.permeance(k - n.legCount());
			}
			double scale = Math.max(largest(source), 1e-12);
			for (double[] loop : loops(n)) {
				double sum = 0;
				for (int k = 0; k < loop.length; k++) {
					sum += loop[k] * (drop[k] - source[k]);
				}
				assertEquals(0, sum, 1e-10 * scale, c.toString());
			}
		}, SMALL, MAGNETS);
	}

	/** Fundamental loops: each branch outside a spanning tree closed through the tree; +1 along, -1 against a branch. */
	private static List<double[]> loops(Network n) {
		int[] parentBranch = new int[n.jointCount()];
		int[] depth = new int[n.jointCount()];
		Arrays.fill(parentBranch, -1);
		Arrays.fill(depth, -1);
		for (int root = 0; root < n.jointCount(); root++) {
			if (depth[root] >= 0) {
				continue;
			}
			depth[root] = 0;
			boolean grown = true;
			while (grown) {
				grown = false;
				for (int k = 0; k < n.branchCount(); k++) {
					int a = n.from(k);
					int b = n.to(k);
					if (depth[a] >= 0 != depth[b] >= 0) {
						int known = depth[a] >= 0 ? a : b;
						int other = known == a ? b : a;
						depth[other] = depth[known] + 1;
						parentBranch[other] = k;
						grown = true;
					}
				}
			}
		}
		List<double[]> loops = new java.util.ArrayList<>();
		for (int k = 0; k < n.branchCount(); k++) {
			if (parentBranch[n.from(k)] == k || parentBranch[n.to(k)] == k) {
				continue;
			}
			double[] loop = new double[n.branchCount()];
			loop[k] = 1;
			climb(n, parentBranch, n.to(k), 1, loop);
			climb(n, parentBranch, n.from(k), -1, loop);
			loops.add(loop);
		}
		return loops;
	}

	private static void climb(Network n, int[] parentBranch, int start, double sign, double[] loop) {
		int j = start;
		while (parentBranch[j] >= 0) {
			int k = parentBranch[j];
			boolean along = n.from(k) == j;
			loop[k] += along ? sign : -sign;
			j = along ? n.to(k) : n.from(k);
		}
	}

	@Test
	void theInductanceMatrixIsSymmetricAndPositiveSemidefinite() {
		each(c -> {
			double[][] l = solve(c).differentialInductance();
			double scale = 0;
			for (double[] row : l) {
				scale = Math.max(scale, largest(row));
			}
			Random random = new Random(c.seed());
			for (int i = 0; i < l.length; i++) {
				for (int j = 0; j < l.length; j++) {
					assertEquals(l[i][j], l[j][i], 1e-12 * scale);
				}
			}
			for (int trial = 0; trial < 20; trial++) {
				double[] x = random.doubles(l.length, -1, 1).toArray();
				double quadratic = 0;
				for (int i = 0; i < l.length; i++) {
					for (int j = 0; j < l.length; j++) {
						quadratic += x[i] * l[i][j] * x[j];
					}
				}
				assertTrue(quadratic >= -1e-12 * scale, c.toString());
			}
		}, SMALL, LARGE, MAGNETS);
	}

	/** Fourth-order differences; the table's curvature jumps at its points, so a case may not straddle one. */
	@Test
	void inductanceIsTheDerivativeOfLinkage() {
		int[] compared = { 0 };
		each(c -> {
			Solution s = solve(c);
			NetworkSolver solver = new NetworkSolver(c.network());
			double scale = 0;
			for (double[] row : s.differentialInductance()) {
				scale = Math.max(scale, largest(row));
			}
			for (int w = 0; w < c.current().length; w++) {
				double step = 1e-3 * Math.max(Math.abs(c.current()[w]), 1e-9);
				double[] fine = difference(solver, c, w, step / 4);
				double[] coarse = difference(solver, c, w, step / 2);
				for (int i = 0; i < fine.length; i++) {
					double doubt = Math.abs(fine[i] - coarse[i]);
					assertEquals(fine[i], s.differentialInductance()[i][w], 1e-7 * scale + 2 * doubt, c.toString());
					compared[0] += doubt < 1e-6 * scale ? 1 : 0;
				}
			}
		}, SMALL);
		assertTrue(compared[0] > 500, "only " + compared[0] + " entries could be judged sharply");
	}

	private static double[] difference(NetworkSolver solver, RandomNetworks.Case c, int winding, double step) {
		double[] sum = new double[c.current().length];
		double[] weight = { 1, -8, 8, -1 };
		double[] at = { -2, -1, 1, 2 };
		for (int p = 0; p < 4; p++) {
			double[] current = c.current().clone();
			current[winding] += at[p] * step;
			double[] linkage = solver.solve(Excitation.currents(current)).linkage();
			for (int i = 0; i < sum.length; i++) {
				sum[i] += weight[p] * linkage[i] / (12 * step);
			}
		}
		return sum;
	}

	@Test
	void energyAndCoEnergySumToCurrentTimesLinkage() {
		each(c -> {
			Solution s = solve(c);
			double work = 0;
			for (int w = 0; w < s.linkage().length; w++) {
				work += s.linkage()[w] * s.windingCurrent()[w];
			}
			assertEquals(work, s.energy() + s.coEnergy(), 1e-12 * Math.abs(work), c.toString());
			assertTrue(s.coEnergy() >= 0 && s.energy() >= -1e-12 * s.coEnergy(), c.toString());
		}, SMALL, LARGE, LINEAR);
	}

	@Test
	void linkageIsTheDerivativeOfCoEnergy() {
		each(c -> {
			Solution s = solve(c);
			NetworkSolver solver = new NetworkSolver(c.network());
			for (int w = 0; w < c.current().length; w++) {
				double step = 1e-4 * Math.max(Math.abs(c.current()[w]), 1e-9);
				double[] up = c.current().clone();
				double[] down = c.current().clone();
				up[w] += step;
				down[w] -= step;
				double slope = (solver.solve(Excitation.currents(up)).coEnergy()
						- solver.solve(Excitation.currents(down)).coEnergy()) / (2 * step);
				assertEquals(s.linkage()[w], slope, 1e-6 * largest(s.linkage()), c.toString());
			}
		}, SMALL);
	}

	@Test
	void aLinearNetworkStoresHalfCurrentTimesInductanceTimesCurrent() {
		each(c -> {
			Solution s = solve(c);
			double half = 0;
			for (int i = 0; i < c.current().length; i++) {
				for (int j = 0; j < c.current().length; j++) {
					half += 0.5 * c.current()[i] * s.differentialInductance()[i][j] * c.current()[j];
				}
			}
			assertEquals(half, s.coEnergy(), 1e-10 * s.coEnergy(), c.toString());
			assertEquals(half, s.energy(), 1e-10 * s.coEnergy(), c.toString());
		}, LINEAR);
	}

	@Test
	void inALinearNetworkOneAmpereInEitherOfTwoWindingsLinksTheOtherAlike() {
		each(c -> {
			int n = c.current().length;
			NetworkSolver solver = new NetworkSolver(c.network());
			double[][] linkage = new double[n][];
			for (int w = 0; w < n; w++) {
				double[] unit = new double[n];
				unit[w] = 1;
				linkage[w] = solver.solve(Excitation.currents(unit)).linkage();
			}
			for (int i = 0; i < n; i++) {
				for (int j = 0; j < n; j++) {
					double scale = Math.sqrt(linkage[i][i] * linkage[j][j]);
					assertEquals(linkage[i][j], linkage[j][i], 1e-10 * scale, c.toString());
				}
			}
		}, LINEAR);
	}

	@Test
	void anImposedLinkageGivesBackTheCurrentThatMadeIt() {
		each(c -> {
			Solution s = solve(c);
			double[] current = c.current().clone();
			double[] linkage = new double[current.length];
			Arrays.fill(linkage, Double.NaN);
			double[][] l = s.differentialInductance();
			// the first winding alone, so that no two imposed ones can be proportional
			if (!(l[0][0] > 1e-15)) {
				return;
			}
			linkage[0] = s.linkage()[0];
			current[0] = Double.NaN;
			Solution back = new NetworkSolver(c.network()).solve(Excitation.mixed(current, linkage));
			assertTrue(back.converged(), c.toString());
			double ill = 1 + Math.abs(s.linkage()[0] / (l[0][0] * c.current()[0]));
			assertEquals(c.current()[0], back.windingCurrent()[0], 1e-9 * ill * Math.abs(c.current()[0]), c.toString());
			assertClose(s.legFlux(), back.legFlux(), 1e-9, c);
		}, SMALL, LINEAR);
	}

	@Test
	void theStartDoesNotMatter() {
		each(c -> {
			Solution s = solve(c);
			double[] much = c.current().clone();
			for (int w = 0; w < much.length; w++) {
				much[w] = -30 * much[w];
			}
			NetworkSolver solver = new NetworkSolver(c.network());
			Solution far = solver.solve(Excitation.currents(much));
			Solution back = solver.solve(c.excitation(), far);
			assertTrue(back.converged() && back.iterations() <= 40, c.toString());
			assertClose(s.legFlux(), back.legFlux(), 1e-10, c);
			assertClose(s.jointPotential(), back.jointPotential(), 1e-9, c);
		}, SMALL, MAGNETS);
	}

	@Test
	void reversingAllCurrentsReversesAllFluxes() {
		each(c -> {
			double[] reversed = Arrays.stream(c.current()).map(i -> -i).toArray();
			Solution back = new NetworkSolver(c.network()).solve(Excitation.currents(reversed));
			assertClose(solve(c).legFlux(), Arrays.stream(back.legFlux()).map(f -> -f).toArray(), 1e-12, c);
		}, SMALL);
	}

	@Test
	void turnsTimesThreeAndCurrentOverThreeLeaveFluxesAndMakeInductanceNineTimes() {
		each(c -> {
			Network n = c.network();
			Network.Builder builder = Rebuild.of(n, k -> k, j -> j, false);
			for (int coil = 0; coil < n.coilCount(); coil++) {
				builder.coil(n.coilWinding(coil), n.coilLeg(coil), 3 * n.coilTurns(coil));
			}
			double[] third = Arrays.stream(c.current()).map(i -> i / 3).toArray();
			Solution s = solve(c);
			Solution t = new NetworkSolver(builder.build()).solve(Excitation.currents(third));
			assertClose(s.legFlux(), t.legFlux(), 1e-11, c);
			for (int w = 0; w < third.length; w++) {
				assertClose(Arrays.stream(s.differentialInductance()[w]).map(l -> 9 * l).toArray(),
						t.differentialInductance()[w], 1e-9, c);
			}
		}, SMALL);
	}

	@Test
	void theOrderOfElementsDoesNotMatter() {
		each(c -> {
			Network n = c.network();
			int legs = n.legCount();
			int joints = n.jointCount();
			Network.Builder builder = Rebuild.of(n, k -> legs - 1 - k, j -> joints - 1 - j, true);
			double[] there = new NetworkSolver(builder.build()).solve(c.excitation()).legFlux();
			double[] back = new double[legs];
			for (int k = 0; k < legs; k++) {
				back[k] = there[legs - 1 - k];
			}
			assertClose(solve(c).legFlux(), back, 1e-11, c);
		}, SMALL, LARGE, MAGNETS);
	}

	@Test
	void aMagnetActsAsACoilOfItsAmpereTurns() {
		each(c -> {
			Network n = c.network();
			Network.Builder builder = Rebuild.withoutMagnets(n);
			double[] current = Arrays.copyOf(c.current(), c.current().length + 1);
			current[current.length - 1] = 1;
			int magnetising = builder.winding();
			for (int k = 0; k < n.legCount(); k++) {
				if (n.magnetMmf(k) != 0) {
					builder.coil(magnetising, k, n.magnetMmf(k));
				}
			}
			Solution coils = new NetworkSolver(builder.build()).solve(Excitation.currents(current));
			assertClose(solve(c).legFlux(), coils.legFlux(), 1e-11, c);
		}, MAGNETS);
	}

	private static void assertClose(double[] expected, double[] found, double tolerance, RandomNetworks.Case c) {
		double scale = Math.max(largest(expected), 1e-17 / tolerance);
		for (int i = 0; i < expected.length; i++) {
			assertEquals(expected[i], found[i], tolerance * scale, c.toString());
		}
	}
}
