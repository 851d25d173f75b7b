package gapwright.physics.network;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;

import gapwright.physics.material.ArctanBh;
import gapwright.physics.material.BhCurve;
import gapwright.physics.material.KneeBh;
import gapwright.physics.material.LinearBh;
import gapwright.physics.material.RollOffBh;
import gapwright.physics.material.TableBh;

/**
 * Connected networks with legs of all five curves, gaps on half of them, air paths, magnets on request and windings of
 * several coils with both senses; the seed is all there is to it.
 */
final class RandomNetworks {

	/** A network and what drives it. */
	record Case(long seed, Network network, double[] current) {

		Excitation excitation() {
			return Excitation.currents(current);
		}

		@Override
		public String toString() {
			return "seed " + seed + ": " + network.jointCount() + " joints, " + network.legCount() + " legs, "
					+ network.airPathCount() + " air paths, " + network.windingCount() + " windings";
		}
	}

	/** Steel of TEAM Workshop problem 13, H in A/m and B in T, thinned. Source: published problem definition. */
	private static final BhCurve STEEL = new TableBh(new double[] { 0, 93, 191, 233, 289, 377, 648, 1228, 2913, 7189 },
			new double[] { 0, 0.025, 0.1, 0.4, 0.8, 1.1, 1.4, 1.55, 1.65, 1.75 });

	private RandomNetworks() {
	}

	static List<Case> many(int count, int mostJoints, boolean magnets, boolean linear) {
		List<Case> cases = new ArrayList<>();
		for (int i = 0; i < count; i++) {
			cases.add(one(1000L + i, mostJoints, magnets, linear));
		}
		return cases;
	}

	static Case one(long seed, int mostJoints, boolean magnets, boolean linear) {
		Random random = new Random(seed);
		Network.Builder builder = Network.builder();
		int joints = 2 + random.nextInt(mostJoints - 1);
		for (int j = 0; j < joints; j++) {
			builder.joint();
		}
		int legs = 0;
		// a tree connects all joints, the rest closes loops
		int wanted = joints + 1 + random.nextInt(joints);
		for (int k = 0; k < wanted; k++) {
			int a = k < joints - 1 ? k + 1 : random.nextInt(joints);
			int b = k < joints - 1 ? random.nextInt(k + 1) : random.nextInt(joints);
			if (a == b) {
				continue;
			}
			double area = 1e-5 * Math.pow(100, random.nextDouble());
			double length = 5e-3 * Math.pow(100, random.nextDouble());
			double reluctance = random.nextBoolean() ? 1e-4 * Math.pow(30, random.nextDouble()) / (BhCurve.MU_0 * area) : 0;
			double magnet = magnets && random.nextInt(4) == 0 ? 1000 * (random.nextDouble() - 0.5) : 0;
			boolean forth = random.nextBoolean();
			builder.leg(forth ? a : b, forth ? b : a, curve(random, linear), length, area, reluctance, magnet);
			legs++;
		}
		for (int p = random.nextInt(joints + 1); p > 0; p--) {
			int a = random.nextInt(joints);
			int b = random.nextInt(joints);
			if (a != b) {
				builder.airPath(a, b, 1e-8 * Math.pow(10, random.nextDouble()));
			}
		}
		int windings = 1 + random.nextInt(4);
		double[] current = new double[windings];
		double strength = Math.pow(10, -6 + 8 * random.nextDouble());
		for (int w = 0; w < windings; w++) {
			builder.winding();
			for (int c = 1 + random.nextInt(3); c > 0; c--) {
				builder.coil(w, random.nextInt(legs), (random.nextBoolean() ? 1 : -1) * (1 + random.nextInt(60)));
			}
			current[w] = strength * (2 * random.nextDouble() - 1);
		}
		return new Case(seed, builder.build(), current);
	}

	private static BhCurve curve(Random random, boolean linear) {
		double permeability = 10 * Math.pow(1000, random.nextDouble());
		double saturation = 0.2 + 1.8 * random.nextDouble();
		return switch (linear ? 0 : random.nextInt(5)) {
		case 0 -> new LinearBh(permeability);
		case 1 -> new KneeBh(permeability, saturation);
		case 2 -> new ArctanBh(permeability, saturation);
		case 3 -> new RollOffBh(20 + 100 * random.nextDouble(), 3000 + 9000 * random.nextDouble(),
				1.3 + random.nextDouble());
		default -> STEEL;
		};
	}
}
