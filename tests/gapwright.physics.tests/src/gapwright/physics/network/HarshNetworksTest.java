package gapwright.physics.network;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.Random;

import org.junit.jupiter.api.Test;

import gapwright.physics.material.ArctanBh;
import gapwright.physics.material.BhCurve;
import gapwright.physics.material.KneeBh;
import gapwright.physics.material.LinearBh;
import gapwright.physics.material.RollOffBh;
import gapwright.physics.material.TableBh;

/** Sections, lengths and currents over many decades, knees as sharp as tables can make them, legs that are all gap. */
class HarshNetworksTest {

	private static final int NETWORKS = 600;
	/** The solver gives up at 100. */
	private static final int MOST_STEPS = 100;

	@Test
	void everyNetworkIsSolvedAndGivesBackItsCurrentsLinkage() {
		for (int seed = 0; seed < NETWORKS; seed++) {
			Random random = new Random(seed);
			Network network = network(random);
			double[] current = new double[network.windingCount()];
			for (int w = 0; w < current.length; w++) {
				current[w] = (random.nextBoolean() ? 1 : -1) * between(random, 1e-9, 1e5);
			}
			NetworkSolver solver = new NetworkSolver(network);
			Solution s = solver.solve(Excitation.currents(current));
			assertTrue(s.converged() && s.iterations() < MOST_STEPS, "seed " + seed + ": " + s.fluxResidual());
			assertTrue(s.mmfResidual() <= 1e-10, "seed " + seed);
			if (!(s.differentialInductance()[0][0] > 0)) {
				continue;
			}
			double[] linkage = new double[current.length];
			Arrays.fill(linkage, Double.NaN);
			linkage[0] = s.linkage()[0];
			current[0] = Double.NaN;
			Solution back = solver.solve(Excitation.mixed(current, linkage));
			assertTrue(back.converged() && back.iterations() < MOST_STEPS, "linkage of seed " + seed);
		}
	}

	private static Network network(Random random) {
		Network.Builder b = Network.builder();
		int joints = 3 + random.nextInt(28);
		for (int j = 0; j < joints; j++) {
			b.joint();
		}
		int legs = joints + random.nextInt(2 * joints);
		for (int k = 0; k < legs; k++) {
			int from = random.nextInt(joints);
			int to = (from + 1 + random.nextInt(joints - 1)) % joints;
			double area = between(random, 1e-7, 1e-1);
			double length = random.nextInt(12) == 0 ? 0 : between(random, 1e-5, 2);
			boolean gap = random.nextBoolean() || length == 0;
			b.leg(from, to, curve(random), length, area, gap ? between(random, 1e-6, 0.1) / (BhCurve.MU_0 * area) : 0,
					random.nextInt(10) == 0 ? between(random, 1, 1e5) : 0);
		}
		for (int p = random.nextInt(joints); p > 0; p--) {
			int from = random.nextInt(joints);
			b.airPath(from, (from + 1 + random.nextInt(joints - 1)) % joints, between(random, 1e-12, 1e-5));
		}
		for (int w = random.nextInt(4); w >= 0; w--) {
			int winding = b.winding();
			for (int c = random.nextInt(3); c >= 0; c--) {
				b.coil(winding, random.nextInt(legs),
						(random.nextBoolean() ? 1 : -1) * Math.ceil(between(random, 1, 1e4)));
			}
		}
		return b.build();
	}

	private static double between(Random random, double least, double most) {
		return least * Math.pow(most / least, random.nextDouble());
	}

	private static BhCurve curve(Random random) {
		double permeability = between(random, 1.001, 1e6);
		double saturation = between(random, 0.05, 2.6);
		return switch (random.nextInt(6)) {
		case 0 -> new LinearBh(permeability);
		case 1 -> new KneeBh(permeability, saturation);
		case 2 -> new ArctanBh(permeability, saturation);
		case 3 -> new RollOffBh(permeability, between(random, 1, 1e5), 1.01 + 4 * random.nextDouble());
		default -> table(random);
		};
	}

	private static TableBh table(Random random) {
		int points = 1 + random.nextInt(20);
		double[] h = new double[points];
		double[] b = new double[points];
		for (int i = 0; i < points; i++) {
			h[i] = (i == 0 ? 0 : h[i - 1]) + between(random, 0.1, 1e4);
			b[i] = (i == 0 ? 0 : b[i - 1]) + between(random, 1e-5, 0.3);
		}
		return new TableBh(h, b);
	}

	/** Where a curve is S-shaped, plain Newton steps can go to and fro between two fields for ever. */
	@Test
	void aGappedLegObeysItsLawOnSShapedTables() {
		for (int seed = 0; seed < 300; seed++) {
			Random random = new Random(seed);
			TableBh table = table(random);
			double length = between(random, 1e-3, 1);
			double reactive = between(random, 1e-2, 1e4);
			for (double f = 1e-3; f < 1e6; f *= 1.7) {
				double h = LegKernel.fieldStrength(table, f, random.nextBoolean() ? 0 : 1e3, length, reactive);
				// no better than the last digit of H, which a steep table magnifies
				double digit = 2 * Math.ulp(h) * (length + reactive * table.slope(h));
				assertEquals(f, h * length + reactive * table.fluxDensity(h), 1e-12 * f + digit, "seed " + seed);
			}
		}
	}

	/**
	 * A thick short leg with a steep knee beside a strongly driven one: a search that stops at the first fall of the
	 * co-energy jumps across the knee at every step.
	 */
	@Test
	void aSteepKneeUnderAStrongSourceTakesFewSteps() {
		Network.Builder b = Network.builder();
		int a = b.joint();
		int c = b.joint();
		int d = b.joint();
		BhCurve steep = new TableBh(new double[] { 2, 10, 2000 }, new double[] { 0.3, 0.6, 0.7 });
		b.leg(d, c, steep, 0.003, 2.3e-3, 0, 0);
		b.leg(d, a, new KneeBh(2300, 0.5), 0.1, 3e-6, 4.5e9, 0);
		b.leg(d, c, new KneeBh(4400, 0.5), 0.0033, 4e-6, 1.1e9, 0);
		int driven = b.leg(a, d, new LinearBh(28_000), 0.18, 3.5e-4, 1.8e6, 0);
		b.leg(c, a, new LinearBh(67_000), 0.0016, 1.6e-3, 0, 0);
		b.coil(b.winding(), driven, 1000);
		for (double amperes : new double[] { 0.1, 1, 6.8, 68, 680 }) {
			Solution s = new NetworkSolver(b.build()).solve(Excitation.currents(amperes));
			assertTrue(s.converged() && s.iterations() <= 40, amperes + " A: " + s.iterations() + " steps");
		}
	}
}
