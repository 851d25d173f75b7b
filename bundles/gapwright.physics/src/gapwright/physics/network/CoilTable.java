package gapwright.physics.network;

/** The matrix N (branches × windings) by columns: signed turns of each winding on the legs it encloses. */
final class CoilTable {

	private final int[][] leg;
	private final double[][] turns;

	CoilTable(Network network) {
		int windings = network.windingCount();
		int[] count = new int[windings];
		for (int c = 0; c < network.coilCount(); c++) {
			count[network.coilWinding(c)]++;
		}
		leg = new int[windings][];
		turns = new double[windings][];
		for (int w = 0; w < windings; w++) {
			leg[w] = new int[count[w]];
			turns[w] = new double[count[w]];
		}
		for (int c = 0; c < network.coilCount(); c++) {
			int w = network.coilWinding(c);
			int at = --count[w];
			leg[w][at] = network.coilLeg(c);
			turns[w][at] = network.coilTurns(c);
		}
	}

	int windings() {
		return leg.length;
	}

	int coils(int winding) {
		return leg[winding].length;
	}

	int leg(int winding, int coil) {
		return leg[winding][coil];
	}

	double turns(int winding, int coil) {
		return turns[winding][coil];
	}
}
