package gapwright.study;

import java.util.ArrayList;
import java.util.List;

import gapwright.model.check.Severity;

/** Collects findings; the codes are listed in the user guide. */
public final class Findings {

	/** Code: a leg's peak flux density is at or above the near fraction of saturation. */
	public static final String NEAR = "leg-near-saturation";
	/** Code: a leg's peak flux density is at or above saturation. */
	public static final String OVER = "leg-over-saturation";

	private final List<Finding> all = new ArrayList<>();

	void error(String code, String subject, String message, String hint) {
		all.add(new Finding(Severity.ERROR, code, subject, null, message, hint));
	}

	void warning(String code, String subject, String message, String hint) {
		all.add(new Finding(Severity.WARNING, code, subject, null, message, hint));
	}

	void note(String code, String subject, String message, String hint) {
		all.add(new Finding(Severity.NOTE, code, subject, null, message, hint));
	}

	void add(Finding finding) {
		all.add(finding);
	}

	List<Finding> list() {
		return List.copyOf(all);
	}
}
