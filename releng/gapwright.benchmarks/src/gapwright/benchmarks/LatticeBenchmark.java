package gapwright.benchmarks;

import java.util.Random;
import java.util.concurrent.TimeUnit;

import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

import gapwright.physics.material.KneeBh;
import gapwright.physics.network.Excitation;
import gapwright.physics.network.Network;
import gapwright.physics.network.NetworkSolver;
import gapwright.physics.network.Solution;

/** Square lattices of saturating ferrite legs, a tenth of them gapped, eight windings; solved from zero. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 3, time = 2)
@Measurement(iterations = 5, time = 2)
@Fork(1)
public class LatticeBenchmark {

	@Param({ "1000", "5000", "20000" })
	int branches;

	private Network network;
	private NetworkSolver solver;
	private Excitation excitation;

	@Setup
	public void build() {
		int side = (int) Math.round(Math.sqrt(branches / 2.0)) + 1;
		Random random = new Random(42);
		Network.Builder b = Network.builder();
		for (int j = 0; j < side * side; j++) {
			b.joint();
		}
		KneeBh ferrite = new KneeBh(2300, 0.5);
		int legs = 0;
		for (int y = 0; y < side; y++) {
			for (int x = 0; x < side; x++) {
				int here = y * side + x;
				for (int next : new int[] { x + 1 < side ? here + 1 : -1, y + 1 < side ? here + side : -1 }) {
					if (next >= 0) {
						b.leg(here, next, ferrite, 0.01, 1e-5, random.nextInt(10) == 0 ? 2e7 : 0, 0);
						legs++;
					}
				}
			}
		}
		double[] current = new double[8];
		for (int w = 0; w < current.length; w++) {
			b.coil(b.winding(), random.nextInt(legs), 10);
			current[w] = (w % 2 == 0 ? 1 : -1) * 200;
		}
		network = b.build();
		solver = new NetworkSolver(network);
		excitation = Excitation.currents(current);
		Solution s = solver.solve(excitation);
		if (!s.converged()) {
			throw new IllegalStateException("no convergence");
		}
		System.out.println("branches " + network.branchCount() + ", Newton steps " + s.iterations());
	}

	@Benchmark
	public Solution solve() {
		return solver.solve(excitation);
	}

	/** Ordering and symbolic factorisation included. */
	@Benchmark
	public Solution planAndSolve() {
		return new NetworkSolver(network).solve(excitation);
	}
}
