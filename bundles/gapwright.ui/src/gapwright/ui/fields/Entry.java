package gapwright.ui.fields;

/**
 * What a text field takes: turns what was typed into a value or says why not, and back.
 *
 * @param <T> kind of the value; null means "left out" where that is allowed
 */
public interface Entry<T> {

	/**
	 * @param typed as it stands in the field, never null
	 * @throws BadEntryException with a sentence that says what was found and what is expected
	 */
	T parse(String typed) throws BadEntryException;

	/** What the field shows for a value; empty for null. */
	String text(T value);

	/** Shown greyed in the empty field, for example {@code 0.5 mm}. */
	default String example() {
		return "";
	}
}
