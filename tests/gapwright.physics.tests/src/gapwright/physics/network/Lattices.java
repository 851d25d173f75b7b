package gapwright.physics.network;

import java.util.Random;

import gapwright.physics.material.KneeBh;

/** Square lattices of ferrite legs, a tenth of them gapped, with windings scattered over them. */
final class Lattices {

	private static final int WINDINGS = 8;

	private Lattices() {
	}

	static Network saturating(int columns, int rows) {
		Random random = new Random(42);
		Network.Builder b = Network.builder();
		for (int j = 0; j < columns * rows; j++) {
			b.joint();
		}
		KneeBh ferrite = new KneeBh(2300, 0.5);
		int legs = 0;
		for (int y = 0; y < rows; y++) {
			for (int x = 0; x < columns; x++) {
				int here = y * columns + x;
				if (x + 1 < columns) {
					b.leg(here, here + 1, ferrite, 0.01, 1e-5, random.nextInt(10) == 0 ? 2e7 : 0, 0);
					legs++;
				}
				if (y + 1 < rows) {
					b.leg(here, here + columns, ferrite, 0.01, 1e-5, random.nextInt(10) == 0 ? 2e7 : 0, 0);
					legs++;
				}
			}
		}
		for (int w = 0; w < WINDINGS; w++) {
			b.coil(b.winding(), random.nextInt(legs), 10);
		}
		return b.build();
	}

	static double[] currents(Network network, double amperes) {
		double[] current = new double[network.windingCount()];
		for (int w = 0; w < current.length; w++) {
			current[w] = (w % 2 == 0 ? 1 : -1) * amperes;
		}
		return current;
	}
}
