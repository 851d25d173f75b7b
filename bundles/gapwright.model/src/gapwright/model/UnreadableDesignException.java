package gapwright.model;

import java.io.IOException;
import java.util.List;
import java.util.stream.Collectors;

/** A file that cannot be read as a design, with every reason found. Nothing of it has been loaded. */
public final class UnreadableDesignException extends IOException {

	private static final long serialVersionUID = 1L;

	private final transient List<ReadProblem> problems;

	UnreadableDesignException(List<ReadProblem> problems) {
		super(problems.stream().map(ReadProblem::text).collect(Collectors.joining("\n")));
		this.problems = List.copyOf(problems);
	}

	/** @return at least one, in the order of the file */
	public List<ReadProblem> problems() {
		return problems;
	}
}
