package gapwright.model.check;

/** How much a finding matters. */
public enum Severity {
	/** What depends on it gets no number. */
	ERROR,
	/** The numbers are shown; somebody must look. */
	WARNING,
	/** Worth knowing. */
	NOTE
}
