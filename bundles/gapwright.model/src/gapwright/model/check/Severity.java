package gapwright.model.check;

/** How much a finding matters. */
public enum Severity {
	/** Must be mended: an element that cannot be computed with, or a leg over saturation. */
	ERROR,
	/** The numbers are shown; somebody must look. */
	WARNING,
	/** Worth knowing. */
	NOTE
}
