package gapwright.study.vary;

import gapwright.physics.network.Excitation;
import gapwright.physics.network.ImposedLinkagesConflictException;
import gapwright.physics.network.Network;
import gapwright.physics.network.NetworkSolver;
import gapwright.physics.network.Solution;
import gapwright.study.StudyInput;

/**
 * Solves one operating point with changed numbers: at the mean, and at both ends of the ripple or voltage swing. Not safe
 * for use by several threads at once.
 */
public final class PointSolver {

	private final StudyInput input;
	private final StudyInput.PointData point;
	private final boolean swings;
	private NetworkSolver solver;

	/**
	 * A solved point.
	 *
	 * @param mean        at the mean currents
	 * @param low         at the lower end of the swing, null without one
	 * @param high        at the upper end
	 * @param peakOf      per leg, −1, 0 or 1: which of low, mean, high has its largest flux density
	 * @param utilisation per leg, ratio; NaN when no saturation is known
	 */
	public record State(Solution mean, Solution low, Solution high, int[] peakOf, double[] utilisation) {

		public Solution peak(int leg) {
			return peakOf[leg] < 0 ? low : peakOf[leg] > 0 ? high : mean;
		}

		public double utilisation(int leg) {
			return utilisation[leg];
		}
	}

	public PointSolver(StudyInput input, StudyInput.PointData point) {
		this.input = input;
		this.point = point;
		swings = point.drives().stream().anyMatch(d -> d.ripple() != 0 || d.linkageSwing() != 0);
	}

	/**
	 * @param network of the numbers at the point's temperature
	 * @param near    a solved state to start from, or null
	 * @return null when it does not converge
	 */
	public State solve(DesignNumbers numbers, Network network, State near) {
		int windings = input.windings().size();
		if (solver == null) {
			solver = new NetworkSolver(network);
		} else {
			solver.exchange(network);
		}
		double[] current = new double[windings];
		for (int w = 0; w < windings; w++) {
			current[w] = point.drives().get(w).meanCurrent() + numbers.currentChange(w);
		}
		Solution mean = solve(Excitation.currents(current), near == null ? null : near.mean());
		if (!mean.converged()) {
			return null;
		}
		Solution low = null;
		Solution high = null;
		if (swings) {
			low = end(current, mean, -1, near == null ? mean : near.low());
			high = low == null ? null : end(current, mean, 1, near == null ? mean : near.high());
			if (high == null) {
				return null;
			}
		}
		return judge(numbers, mean, low, high);
	}

	private Solution solve(Excitation excitation, Solution near) {
		return near == null ? solver.solve(excitation) : solver.solve(excitation, near);
	}

	private Solution end(double[] mean, Solution atMean, int sign, Solution near) {
		double[] current = new double[mean.length];
		double[] linkage = new double[mean.length];
		for (int w = 0; w < mean.length; w++) {
			StudyInput.DriveData drive = point.drives().get(w);
			current[w] = drive.imposesLinkage() ? Double.NaN : mean[w] + sign * drive.ripple() / 2;
			linkage[w] = drive.imposesLinkage() ? atMean.linkage()[w] + sign * drive.linkageSwing() / 2 : Double.NaN;
		}
		try {
			Solution solution = solver.solve(Excitation.mixed(current, linkage), near);
			return solution.converged() ? solution : null;
		} catch (ImposedLinkagesConflictException e) {
			return null;
		}
	}

	private State judge(DesignNumbers numbers, Solution mean, Solution low, Solution high) {
		int legs = input.legs().size();
		int[] peakOf = new int[legs];
		double[] utilisation = new double[legs];
		for (int k = 0; k < legs; k++) {
			double peak = Math.abs(mean.legFluxDensity()[k]);
			if (low != null && Math.abs(low.legFluxDensity()[k]) > peak) {
				peak = Math.abs(low.legFluxDensity()[k]);
				peakOf[k] = -1;
			}
			if (high != null && Math.abs(high.legFluxDensity()[k]) > peak) {
				peak = Math.abs(high.legFluxDensity()[k]);
				peakOf[k] = 1;
			}
			utilisation[k] = peak / numbers.saturation(k, point.celsius());
		}
		return new State(mean, low, high, peakOf, utilisation);
	}
}
