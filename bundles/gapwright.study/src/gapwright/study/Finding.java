package gapwright.study;

import gapwright.model.check.Severity;

/**
 * Something a designer must know.
 *
 * @param severity       how much it matters
 * @param code           stable name, see the user guide
 * @param subject        id of the element, or "" for the whole design
 * @param operatingPoint id, or null when it holds at every one
 * @param message        a sentence with what was found
 * @param hint           what to do, or ""
 */
public record Finding(Severity severity, String code, String subject, String operatingPoint, String message,
		String hint) {
}
