package gapwright.cli;

import java.io.PrintStream;
import java.util.List;
import java.util.Set;

import gapwright.model.Design;
import gapwright.report.CheckCsv;
import gapwright.report.CheckJson;
import gapwright.report.CheckTable;
import gapwright.report.ToleranceReport;
import gapwright.study.LegState;
import gapwright.study.Lowering;
import gapwright.study.Progress;
import gapwright.study.Study;
import gapwright.study.StudyInput;
import gapwright.study.StudyResult;
import gapwright.study.tolerance.ToleranceRequest;
import gapwright.study.tolerance.ToleranceResult;
import gapwright.study.tolerance.ToleranceStudy;

/** {@code check FILE… [--json | --csv] [--tolerances [--samples N] [--seed S]]}: every leg against saturation, at every operating point. */
final class CheckCommand {

	private static final int SAMPLES = 10_000;

	private enum Format {
		TABLE, JSON, CSV
	}

	private final PrintStream out;
	private final PrintStream err;
	/** What to draw; null when tolerances were not asked for. */
	private ToleranceRequest tolerances;

	CheckCommand(PrintStream out, PrintStream err) {
		this.out = out;
		this.err = err;
	}

	/** @return an exit status, the worst of all files */
	int run(List<String> arguments) throws UsageException {
		Options options = new Options("check", arguments, Set.of("--json", "--csv", "--tolerances"), Set.of("--samples", "--seed"));
		tolerances = tolerances(options);
		List<String> files = options.files();
		Format format = options.has("--json") ? Format.JSON : options.has("--csv") ? Format.CSV : Format.TABLE;
		if (format == Format.CSV) {
			out.print(CheckCsv.head() + "\r\n");
		}
		int status = ExitStatus.WITHIN;
		for (String file : files) {
			status = ExitStatus.worse(status, check(file, format));
		}
		return status;
	}

	private static ToleranceRequest tolerances(Options options) throws UsageException {
		if (!options.has("--tolerances")) {
			if (options.has("--samples") || options.has("--seed")) {
				throw new UsageException("check: --samples and --seed belong to --tolerances");
			}
			return null;
		}
		return new ToleranceRequest(options.whole("--samples", SAMPLES, 0, ToleranceRequest.MOST_SAMPLES),
				options.whole("--seed", 1, Integer.MIN_VALUE, Integer.MAX_VALUE));
	}

	private int check(String file, Format format) {
		Design design = DesignFile.read(file, err);
		if (design == null) {
			return ExitStatus.DATA;
		}
		StudyInput input = Lowering.of(design);
		StudyResult result = Study.run(input);
		ToleranceResult bands = null;
		if (tolerances != null) {
			try {
				bands = ToleranceStudy.run(input, tolerances, Progress.NONE);
			} catch (IllegalArgumentException e) {
				err.println(file + ":: " + e.getMessage());
				return ExitStatus.DATA;
			}
		}
		switch (format) {
		case JSON -> out.println(CheckJson.of(result, bands, file, Version.NUMBER));
		case CSV -> out.print(CheckCsv.of(result, file));
		case TABLE -> out.println(CheckTable.of(result, file) + (bands == null ? "" : ToleranceReport.table(bands)));
		}
		DesignFile.messages(file, result.findings(), err);
		if (result.isIncomplete()) {
			return ExitStatus.DATA;
		}
		return result.worst() == LegState.OVER ? ExitStatus.OVER
				: result.worst() == LegState.NEAR ? ExitStatus.NEAR : ExitStatus.WITHIN;
	}
}
