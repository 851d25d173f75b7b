package gapwright.model.quantity;

/** A text that is no quantity of the dimension asked for. */
public final class QuantityFormatException extends IllegalArgumentException {

	private static final long serialVersionUID = 1L;

	private final String found;
	private final String expected;

	QuantityFormatException(String found, String problem, String expected) {
		super("'" + found + "': " + problem + (expected.isEmpty() ? "" : ", " + expected));
		this.found = found;
		this.expected = expected;
	}

	/** @return the text as typed */
	public String found() {
		return found;
	}

	/** @return what would do, for example "e.g. 0.5 mm" */
	public String expected() {
		return expected;
	}
}
