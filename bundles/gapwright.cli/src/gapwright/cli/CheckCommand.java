package gapwright.cli;

import java.io.IOException;
import java.io.PrintStream;
import java.nio.file.InvalidPathException;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

import gapwright.model.Design;
import gapwright.model.DesignReader;
import gapwright.model.ReadProblem;
import gapwright.model.UnreadableDesignException;
import gapwright.model.check.Severity;
import gapwright.report.CheckCsv;
import gapwright.report.CheckJson;
import gapwright.report.CheckTable;
import gapwright.study.Finding;
import gapwright.study.Findings;
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
		Format format = Format.TABLE;
		List<String> files = new ArrayList<>();
		boolean optionsOver = false;
		for (String argument : arguments) {
			if (optionsOver || !argument.startsWith("-") || argument.equals("-")) {
				files.add(argument);
			} else if (argument.equals("--")) {
				optionsOver = true;
			} else if (argument.equals("--json") || argument.equals("--csv")) {
				Format asked = argument.equals("--json") ? Format.JSON : Format.CSV;
				if (format != Format.TABLE && format != asked) {
					throw new UsageException("check: --json and --csv exclude each other");
				}
				format = asked;
			} else {
				throw new UsageException("check: unknown option '" + argument + "'");
			}
		}
		if (files.isEmpty()) {
			throw new UsageException("check: no file is named");
		}
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
		Design design;
		try {
			design = DesignReader.read(Path.of(file));
		} catch (UnreadableDesignException e) {
			for (ReadProblem problem : e.problems()) {
				// file:element: message, also where the element is the whole file
				String shown = problem.element().isEmpty() ? file + ":" : file;
				err.println(new ReadProblem(shown, problem.line(), problem.element(), problem.attribute(),
						problem.found(), problem.expected()).text());
			}
			return ExitStatus.DATA;
		} catch (NoSuchFileException e) {
			err.println(file + ":: no such file");
			return ExitStatus.DATA;
		} catch (IOException | InvalidPathException e) {
			err.println(file + ":: cannot be read: " + e.getMessage());
			return ExitStatus.DATA;
		}
		StudyResult result = Study.of(design);
		switch (format) {
		case JSON -> out.println(CheckJson.of(result, file, Version.NUMBER));
		case CSV -> out.print(CheckCsv.of(result, file));
		case TABLE -> out.println(CheckTable.of(result, file));
		}
		messages(file, result);
		if (result.isIncomplete()) {
			return ExitStatus.DATA;
		}
		return result.worst() == LegState.OVER ? ExitStatus.OVER
				: result.worst() == LegState.NEAR ? ExitStatus.NEAR : ExitStatus.WITHIN;
	}

	/** What keeps a figure from being computed also goes to standard error, where a build's log shows it. */
	private void messages(String file, StudyResult result) {
		for (Finding finding : result.findings()) {
			if (finding.severity() == Severity.ERROR && !finding.code().equals(Findings.OVER)) {
				err.println(file + ":" + finding.subject() + ": " + finding.message());
			}
		}
	}
}
