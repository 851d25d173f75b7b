package gapwright.study.provenance;

/**
 * One of the values a figure was reckoned from.
 *
 * @param name  what it is, for example "Width of centre-leg"
 * @param value with its unit as typed, or computed
 */
public record Input(String name, String value) {
}
