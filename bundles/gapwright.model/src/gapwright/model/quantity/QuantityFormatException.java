package gapwright.model.quantity;

/** A text that is no quantity of the dimension asked for. */
public final class QuantityFormatException extends IllegalArgumentException {

	private static final long serialVersionUID = 1L;

	private final String found;
	private final String problem;

	QuantityFormatException(String found, String problem, String expected) {
		super("'" + found + "': " + problem + (expected.isEmpty() ? "" : ", " + expected));
		this.found = found;
		this.problem = problem + (expected.isEmpty() ? "" : ", " + expected);
	}

	/** @return the text as typed */
	public String found() {
		return found;
	}

	/** @return what is wrong and what would do, for example "a length needs a unit, e.g. 0.5 mm" */
	public String problem() {
		return problem;
	}
}
