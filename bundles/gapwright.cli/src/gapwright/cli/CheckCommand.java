package gapwright.cli;

import java.io.PrintStream;
import java.util.List;
import java.util.Set;

import gapwright.model.Design;
import gapwright.report.CheckCsv;
import gapwright.report.CheckJson;
import gapwright.report.CheckTable;
import gapwright.study.LegState;
import gapwright.study.Study;
import gapwright.study.StudyResult;

/** {@code check FILE… [--json | --csv]}: every leg against saturation, at every operating point. */
final class CheckCommand {

	private enum Format {
		TABLE, JSON, CSV
	}

	private final PrintStream out;
	private final PrintStream err;

	CheckCommand(PrintStream out, PrintStream err) {
		this.out = out;
		this.err = err;
	}

	/** @return an exit status, the worst of all files */
	int run(List<String> arguments) throws UsageException {
		Options options = new Options("check", arguments, Set.of("--json", "--csv"), Set.of());
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

	private int check(String file, Format format) {
		Design design = DesignFile.read(file, err);
		if (design == null) {
			return ExitStatus.DATA;
		}
		StudyResult result = Study.of(design);
		switch (format) {
		case JSON -> out.println(CheckJson.of(result, file, Version.NUMBER));
		case CSV -> out.print(CheckCsv.of(result, file));
		case TABLE -> out.println(CheckTable.of(result, file));
		}
		DesignFile.messages(file, result.findings(), err);
		if (result.isIncomplete()) {
			return ExitStatus.DATA;
		}
		return result.worst() == LegState.OVER ? ExitStatus.OVER
				: result.worst() == LegState.NEAR ? ExitStatus.NEAR : ExitStatus.WITHIN;
	}
}
