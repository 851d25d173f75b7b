package gapwright.workspace;

import java.util.HashMap;
import java.util.Map;

import org.eclipse.core.resources.IMarker;

import gapwright.model.ReadProblem;
import gapwright.model.check.Severity;
import gapwright.study.Finding;

/**
 * What a problem marker says.
 *
 * @param attributes of the marker; a record so that two with the same text are equal
 */
record MarkerText(Map<String, Object> attributes) {

	/** Code of a marker for a file that is no design. */
	static final String UNREADABLE = "design-unreadable";

	static MarkerText of(Finding finding) {
		String where = finding.subject();
		if (finding.operatingPoint() != null && !finding.operatingPoint().equals(where)) {
			where += " at " + finding.operatingPoint();
		}
		Map<String, Object> attributes = new HashMap<>();
		attributes.put(IMarker.SEVERITY, severity(finding.severity()));
		attributes.put(IMarker.MESSAGE, where.isEmpty() ? finding.message() : where + ": " + finding.message());
		attributes.put(IMarker.LOCATION, where.isEmpty() ? "design" : where);
		attributes.put(FindingMarkers.CODE, finding.code());
		attributes.put(FindingMarkers.SUBJECT, finding.subject());
		attributes.put(FindingMarkers.OPERATING_POINT, finding.operatingPoint() == null ? "" : finding.operatingPoint());
		attributes.put(FindingMarkers.HINT, finding.hint());
		return new MarkerText(attributes);
	}

	static MarkerText of(ReadProblem problem) {
		Map<String, Object> attributes = new HashMap<>();
		attributes.put(IMarker.SEVERITY, IMarker.SEVERITY_ERROR);
		attributes.put(IMarker.MESSAGE, problem.text());
		attributes.put(FindingMarkers.CODE, UNREADABLE);
		attributes.put(FindingMarkers.SUBJECT, problem.element());
		if (problem.line() > 0) {
			attributes.put(IMarker.LINE_NUMBER, problem.line());
			attributes.put(IMarker.LOCATION, "line " + problem.line());
		}
		return new MarkerText(attributes);
	}

	static MarkerText unreadable(String name, Exception reason) {
		return new MarkerText(Map.of(IMarker.SEVERITY, IMarker.SEVERITY_ERROR, IMarker.MESSAGE,
				name + ": cannot be read: " + reason.getMessage(), FindingMarkers.CODE, UNREADABLE));
	}

	private static int severity(Severity severity) {
		return switch (severity) {
		case ERROR -> IMarker.SEVERITY_ERROR;
		case WARNING -> IMarker.SEVERITY_WARNING;
		case NOTE -> IMarker.SEVERITY_INFO;
		};
	}
}
