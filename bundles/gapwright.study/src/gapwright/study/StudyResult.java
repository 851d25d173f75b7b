package gapwright.study;

import java.util.List;

import gapwright.model.check.Severity;

/**
 * What came of a design.
 *
 * @param design          its name, or ""
 * @param operatingPoints in the order of the design
 * @param findings        errors and doubts about the design, then what was found at each operating point
 * @param worst           over all legs and points; a leg that cannot be judged counts as near, never as within
 */
public record StudyResult(String design, List<OperatingPointResult> operatingPoints, List<Finding> findings,
		LegState worst) {

	/** @return the operating point with that id, or null */
	public OperatingPointResult operatingPoint(String id) {
		return operatingPoints.stream().filter(point -> point.id().equals(id)).findFirst().orElse(null);
	}

	/** @return whether something could not be computed at all */
	public boolean isIncomplete() {
		return operatingPoints.stream().anyMatch(point -> !point.converged()) || findings.stream()
				.anyMatch(f -> f.severity() == Severity.ERROR && !f.code().equals(Findings.OVER));
	}
}
