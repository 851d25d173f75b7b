package gapwright.cli;

import java.io.PrintStream;
import java.util.List;
import java.util.Set;

import gapwright.model.Design;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;
import gapwright.model.quantity.QuantityFormatException;
import gapwright.report.SweepReport;
import gapwright.study.Lowering;
import gapwright.study.Progress;
import gapwright.study.StudyInput;
import gapwright.study.sweep.BiasSweep;
import gapwright.study.sweep.SweepLeg;
import gapwright.study.sweep.SweepRequest;
import gapwright.study.sweep.SweepResult;

/** {@code sweep FILE… [--winding ID] [--point ID] [--from A] [--to A] [--steps N] [--json | --csv]} */
final class SweepCommand {

	private static final int STEPS = 20;
	/** Beyond the largest current of the operating points, to show what happens there. */
	private static final double BEYOND = 1.5;

	private final PrintStream out;
	private final PrintStream err;

	SweepCommand(PrintStream out, PrintStream err) {
		this.out = out;
		this.err = err;
	}

	/** @return an exit status: the worst state any leg reaches in the range */
	int run(List<String> arguments) throws UsageException {
		Options options = new Options("sweep", arguments, Set.of("--json", "--csv"),
				Set.of("--winding", "--point", "--from", "--to", "--steps"));
		if (options.has("--csv") && options.files().size() > 1) {
			throw new UsageException("sweep: --csv takes one file, for the columns differ from design to design");
		}
		int steps = options.whole("--steps", STEPS, 1, SweepRequest.MOST_STEPS);
		Quantity from = current(options, "--from");
		Quantity to = current(options, "--to");
		int status = ExitStatus.WITHIN;
		for (String file : options.files()) {
			status = ExitStatus.worse(status, sweep(file, options, from, to, steps));
		}
		return status;
	}

	private static Quantity current(Options options, String name) throws UsageException {
		String text = options.value(name);
		try {
			return text == null ? null : Quantity.parse(text, Dimension.CURRENT);
		} catch (QuantityFormatException e) {
			throw new UsageException("sweep: " + name + " " + e.getMessage());
		}
	}

	private int sweep(String file, Options options, Quantity from, Quantity to, int steps) {
		Design design = DesignFile.read(file, err);
		if (design == null) {
			return ExitStatus.DATA;
		}
		StudyInput input = Lowering.of(design);
		DesignFile.messages(file, input.findings(), err);
		SweepResult sweep;
		try {
			String point = point(input, options.value("--point"));
			String winding = winding(input, point, options.value("--winding"));
			double start = from == null ? 0 : from.si();
			double end = to == null ? BEYOND * BiasSweep.largestCurrent(input, winding) : to.si();
			if (start == end) {
				throw new IllegalArgumentException("nothing to sweep from " + start + " A to " + end + " A; give --to");
			}
			sweep = BiasSweep.run(input, new SweepRequest(point, winding, start, end, steps), Progress.NONE);
		} catch (IllegalArgumentException e) {
			err.println(file + ":: " + e.getMessage());
			return ExitStatus.DATA;
		}
		if (options.has("--json")) {
			out.println(SweepReport.json(sweep, file, Version.NUMBER));
		} else {
			out.print(options.has("--csv") ? SweepReport.csv(sweep) : SweepReport.table(sweep, file));
		}
		return status(file, sweep);
	}

	private static String point(StudyInput input, String asked) {
		if (asked == null && input.points().isEmpty()) {
			throw new IllegalArgumentException("the design has no operating point");
		}
		return asked == null ? input.points().get(0).id() : asked;
	}

	/** The winding asked for, else the one that carries the most current there. */
	private static String winding(StudyInput input, String point, String asked) {
		if (asked != null) {
			if (input.winding(asked) < 0) {
				throw new IllegalArgumentException("there is no winding '" + asked + "'");
			}
			return asked;
		}
		if (input.windings().isEmpty()) {
			throw new IllegalArgumentException("the design has no winding");
		}
		int most = 0;
		StudyInput.PointData data = input.point(point);
		for (int w = 0; data != null && data.drives() != null && w < input.windings().size(); w++) {
			boolean more = Math.abs(data.drives().get(w).meanCurrent()) > Math.abs(data.drives().get(most).meanCurrent());
			most = more ? w : most;
		}
		return input.windings().get(most).id();
	}

	private int status(String file, SweepResult sweep) {
		for (double value : sweep.linkage()) {
			if (Double.isNaN(value)) {
				err.println(file + ":" + sweep.winding() + ": no solution at some of the currents");
				return ExitStatus.DATA;
			}
		}
		int status = ExitStatus.WITHIN;
		for (SweepLeg leg : sweep.legs()) {
			boolean near = !Double.isNaN(leg.nearAt()) || Double.isNaN(leg.saturation());
			status = ExitStatus.worse(status, !Double.isNaN(leg.overAt()) ? ExitStatus.OVER : near ? ExitStatus.NEAR : ExitStatus.WITHIN);
		}
		return status;
	}
}
