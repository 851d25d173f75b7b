package gapwright.physics.network;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.Random;

import org.junit.jupiter.api.Test;

class ExchangeTest {

	/** A solver that goes on with other numbers gives what a new one gives. */
	@Test
	void aSolverGoesOnWithOtherNumbersOfTheSameStructure() {
		Random random = new Random(3);
		for (int i = 0; i < 50; i++) {
			Network network = RandomNetworks.one(random.nextLong(), 12, true, false).network();
			double[] current = new double[network.windingCount()];
			for (int w = 0; w < current.length; w++) {
				current[w] = random.nextGaussian();
			}
			NetworkSolver solver = new NetworkSolver(network);
			solver.solve(Excitation.currents(current));
			NetworkValues values = network.values();
			for (int k = 0; k < values.ironArea.length; k++) {
				values.ironArea[k] *= 1 + 0.2 * random.nextDouble();
				values.seriesReluctance[k] *= 1 + random.nextDouble();
			}
			for (int c = 0; c < values.coilTurns.length; c++) {
				values.coilTurns[c] *= 1.5;
			}
			Network changed = network.with(values);
			solver.exchange(changed);
			Solution same = solver.solve(Excitation.currents(current));
			Solution fresh = new NetworkSolver(changed).solve(Excitation.currents(current));
			for (int k = 0; k < network.legCount(); k++) {
				assertEquals(fresh.legFlux()[k], same.legFlux()[k], 0);
			}
			for (int w = 0; w < current.length; w++) {
				assertEquals(fresh.differentialInductance()[w][w], same.differentialInductance()[w][w], 0);
			}
		}
	}

	@Test
	void anotherStructureOrANumberOutsideItsDomainIsRefused() {
		Random random = new Random(4);
		Network network = RandomNetworks.one(random.nextLong(), 12, true, false).network();
		assertThrows(IllegalArgumentException.class, () -> new NetworkSolver(network).exchange(RandomNetworks.one(random.nextLong(), 12, true, false).network()));
		NetworkValues values = network.values();
		values.ironArea[0] = -1;
		assertThrows(IllegalArgumentException.class, () -> network.with(values));
	}
}
