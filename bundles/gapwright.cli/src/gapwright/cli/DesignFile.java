package gapwright.cli;

import java.io.IOException;
import java.io.PrintStream;
import java.nio.file.InvalidPathException;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.List;

import gapwright.model.Design;
import gapwright.model.DesignReader;
import gapwright.model.ReadProblem;
import gapwright.model.UnreadableDesignException;
import gapwright.model.check.Severity;
import gapwright.study.Finding;
import gapwright.study.Findings;

/** Reads a design's file and says on standard error what is wrong, each time as {@code file:element: message}. */
final class DesignFile {

	private DesignFile() {
	}

	/** @return null when it cannot be read, which has been said */
	static Design read(String file, PrintStream err) {
		try {
			return DesignReader.read(Path.of(file));
		} catch (UnreadableDesignException e) {
			for (ReadProblem problem : e.problems()) {
				// file:element: message, also where the element is the whole file
				String shown = problem.element().isEmpty() ? file + ":" : file;
				err.println(new ReadProblem(shown, problem.line(), problem.element(), problem.attribute(),
						problem.found(), problem.expected()).text());
			}
		} catch (NoSuchFileException e) {
			err.println(file + ":: no such file");
		} catch (IOException | InvalidPathException e) {
			err.println(file + ":: cannot be read: " + e.getMessage());
		}
		return null;
	}

	/** What keeps a figure from being computed also goes to standard error, where a build's log shows it. */
	static void messages(String file, List<Finding> findings, PrintStream err) {
		for (Finding finding : findings) {
			if (finding.severity() == Severity.ERROR && !finding.code().equals(Findings.OVER)) {
				err.println(file + ":" + finding.subject() + ": " + finding.message());
			}
		}
	}
}
