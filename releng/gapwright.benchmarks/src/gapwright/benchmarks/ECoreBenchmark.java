package gapwright.benchmarks;

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

import gapwright.physics.material.BhCurve;
import gapwright.physics.material.KneeBh;
import gapwright.physics.network.Excitation;
import gapwright.physics.network.Network;
import gapwright.physics.network.NetworkSolver;
import gapwright.physics.network.Solution;

/** An E core of seven legs with three gaps and two windings, solved with its inductance matrix. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 5, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(2)
public class ECoreBenchmark {

	/** Mean current of the first winding; 14 A is near saturation, 40 A deep in it. */
	@Param({ "14", "40" })
	double amperes;

	private NetworkSolver solver;
	private Excitation excitation;
	private Excitation neighbour;
	private Solution before;

	@Setup
	public void build() {
		Network.Builder b = Network.builder();
		int[] top = { b.joint(), b.joint(), b.joint() };
		int[] bottom = { b.joint(), b.joint(), b.joint() };
		KneeBh ferrite = new KneeBh(2300, 0.569);
		double[] width = { 6.6e-3, 12e-3, 6.6e-3 };
		int centre = -1;
		for (int i = 0; i < 3; i++) {
			double area = width[i] * 15e-3;
			double gap = (i == 1 ? 1.1e-3 : 0.2e-3) / (BhCurve.MU_0 * area);
			int leg = b.leg(bottom[i], top[i], ferrite, 38e-3, area, gap, 0);
			centre = i == 1 ? leg : centre;
		}
		for (int i = 0; i < 2; i++) {
			b.leg(top[i], top[i + 1], ferrite, 18e-3, 7e-3 * 15e-3, 0, 0);
			b.leg(bottom[i], bottom[i + 1], ferrite, 18e-3, 7e-3 * 15e-3, 0, 0);
		}
		b.coil(b.winding(), centre, 18);
		b.coil(b.winding(), centre, 4);
		solver = new NetworkSolver(b.build());
		excitation = Excitation.currents(amperes, 0.5);
		neighbour = Excitation.currents(amperes * 1.1, 0.5);
		before = solver.solve(neighbour);
	}

	@Benchmark
	public Solution fromZero() {
		return solver.solve(excitation);
	}

	@Benchmark
	public Solution fromANeighbour() {
		return solver.solve(excitation, before);
	}
}
