package gapwright.study.provenance;

/**
 * Where a figure comes from.
 *
 * @param formula  how it is reckoned, in symbols or words
 * @param source   who stands for the formula: a law, a book, a standard; "from memory" where the print was not at hand
 * @param validity where it holds, and what it leaves out
 */
public record Origin(String formula, String source, String validity) {
}
