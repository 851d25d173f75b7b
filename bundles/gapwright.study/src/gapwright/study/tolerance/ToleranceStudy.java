package gapwright.study.tolerance;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;

import gapwright.model.check.Severity;
import gapwright.study.Finding;
import gapwright.study.Progress;
import gapwright.study.StudyInput;
import gapwright.study.tolerance.ToleranceResult.PointBands;
import gapwright.study.vary.Knob;
import gapwright.study.vary.Knobs;

/**
 * What the tolerances of a design do to inductance and utilisation: by the slopes at the nominal, by the corners, and by
 * chance. Targets of one tolerance deviate together, tolerances independently of one another.
 */
public final class ToleranceStudy {

	/** Figures times samples kept in memory at once, 8 bytes each. */
	private static final long MOST_VALUES = 50_000_000;
	/** Part of the greatest slope below which a change of sign is rounding. */
	private static final double NO_SLOPE = 1e-6;

	private final StudyInput input;
	private final ToleranceRequest request;
	private final List<Finding> findings = new ArrayList<>();

	private ToleranceStudy(StudyInput input, ToleranceRequest request) {
		this.input = input;
		this.request = request;
	}

	/**
	 * Runs in the calling thread, the samples on all processors.
	 *
	 * @param progress asked and told from several threads, never by two at once
	 * @throws IllegalArgumentException                       when the design has no tolerance, or there are too many samples
	 *                                                        for its size
	 * @throws java.util.concurrent.CancellationException when cancelled
	 */
	public static ToleranceResult run(StudyInput input, ToleranceRequest request, Progress progress) {
		if (input.tolerances().isEmpty()) {
			throw new IllegalArgumentException("the design has no tolerance");
		}
		return new ToleranceStudy(input, request).run(progress);
	}

	private ToleranceResult run(Progress progress) {
		List<Knob> knobs = Knobs.of(input);
		List<PointBands> points = new ArrayList<>();
		List<StudyInput.PointData> computable = input.points().stream().filter(p -> p.drives() != null).toList();
		for (int i = 0; i < computable.size(); i++) {
			StudyInput.PointData point = computable.get(i);
			PointRun run = new PointRun(input, point, Deviation.of(input, point, knobs));
			if (run.isSolved()) {
				points.add(bands(point.id(), run, new Part(progress, i, computable.size())));
			}
		}
		return new ToleranceResult(request, List.copyOf(points), List.copyOf(findings));
	}

	private PointBands bands(String point, PointRun run, Progress progress) {
		if ((long) run.figureCount() * request.samples() > MOST_VALUES) {
			throw new IllegalArgumentException(request.samples() + " samples of " + run.figureCount()
					+ " figures are too many to keep: at most " + MOST_VALUES / run.figureCount());
		}
		double[] nominal = run.nominalFigures();
		double[][] slopes = run.slopes(new double[run.deviations().size()]);
		Corners corners = new Corners(run, slopes, nominal, progress);
		MonteCarlo chance = request.samples() == 0 ? null : new MonteCarlo(run, request, progress);
		List<Band> bands = new ArrayList<>();
		for (int f = 0; f < nominal.length; f++) {
			double sum = 0;
			double squares = 0;
			for (double slope : slopes[f]) {
				sum += Math.abs(slope);
				squares += slope * slope;
			}
			bands.add(new Band(run.isInductance(f) ? Band.Kind.INDUCTANCE : Band.Kind.UTILISATION, run.subject(f), nominal[f], sum,
					Math.sqrt(squares), corners.low[f], corners.high[f], chance == null ? null : chance.samples(f)));
			monotone(point, run, f, slopes[f], corners);
		}
		if (chance != null && chance.failed > 0) {
			findings.add(new Finding(Severity.WARNING, "tolerance-samples-failed", point, point,
					chance.failed + " of " + request.samples() + " samples have no solution and are in no band",
					"A deviation may reach a value no method holds for."));
		}
		return new PointBands(point, List.copyOf(bands), chance == null ? 0 : chance.failed);
	}

	/** Corners are exact only where no slope changes its sign on the way to them. */
	private void monotone(String point, PointRun run, int figure, double[] slope, Corners corners) {
		Set<String> turning = new TreeSet<>();
		for (double[] corner : List.of(corners.lowAt[figure], corners.highAt[figure])) {
			double[][] there = run.slopes(corner);
			double greatest = 0;
			for (double s : slope) {
				greatest = Math.max(greatest, Math.abs(s));
			}
			for (int t = 0; there != null && t < slope.length; t++) {
				boolean significant = Math.min(Math.abs(slope[t]), Math.abs(there[figure][t])) > NO_SLOPE * greatest;
				if (significant && Math.signum(slope[t]) != Math.signum(there[figure][t])) {
					turning.add(run.deviations().get(t).id());
				}
			}
		}
		if (!turning.isEmpty()) {
			findings.add(new Finding(Severity.WARNING, "tolerance-not-monotone", run.subject(figure), point,
					"its " + (run.isInductance(figure) ? "inductance" : "utilisation") + " first rises and then falls, or the reverse, with "
							+ String.join(", ", turning) + ", so the worst case may lie inside the corners",
					"Trust the Monte Carlo run."));
		}
	}

	/** The share of one operating point in the whole. */
	private record Part(Progress whole, int index, int count) implements Progress {

		@Override
		public boolean cancelled() {
			return whole.cancelled();
		}

		@Override
		public void done(double fraction) {
			whole.done((index + fraction) / count);
		}
	}
}
