package gapwright.ui.fields;

/**
 * One reckoned figure of an element, for people.
 *
 * @param name   for example "Flux density B"
 * @param value  with unit
 * @param origin how it was reckoned and where that holds
 */
public record Figure(String name, String value, String origin) {
}
