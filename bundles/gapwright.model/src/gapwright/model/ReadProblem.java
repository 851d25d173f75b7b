package gapwright.model;

/**
 * One reason why a file cannot be read as a design.
 *
 * @param file      the file's name as given
 * @param line      from 1, or 0 when unknown
 * @param element   what is wrong where: an id, else a class name, else ""
 * @param attribute its attribute, or ""
 * @param found     what stands there, or ""
 * @param expected  a sentence saying what is wrong and what would do
 */
public record ReadProblem(String file, int line, String element, String attribute, String found, String expected) {

	/** @return {@code file:element: attribute = 'found': expected (line n)}, without what is unknown */
	public String text() {
		StringBuilder text = new StringBuilder(file).append(':');
		if (!element.isEmpty()) {
			text.append(element).append(':');
		}
		text.append(' ');
		if (!attribute.isEmpty()) {
			text.append(attribute).append(" = '").append(found).append("': ");
		} else if (!found.isEmpty()) {
			text.append('\'').append(found).append("': ");
		}
		text.append(expected);
		if (line > 0) {
			text.append(" (line ").append(line).append(')');
		}
		return text.toString();
	}

	@Override
	public String toString() {
		return text();
	}
}
