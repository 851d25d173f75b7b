package gapwright.library.material;

/**
 * Why a material file cannot be read.
 *
 * @param line    from 1
 * @param column  from 1, where the field at fault begins
 * @param message what was found and what is wrong with it
 * @param allowed what would do, with an example; may be empty
 */
public record FileProblem(int line, int column, String message, String allowed) {

	/** @return "line 5, column 7: …; …" */
	@Override
	public String toString() {
		return "line " + line + ", column " + column + ": " + message + (allowed.isEmpty() ? "" : "; " + allowed);
	}
}
