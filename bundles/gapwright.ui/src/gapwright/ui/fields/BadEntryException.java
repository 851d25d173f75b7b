package gapwright.ui.fields;

/** What was typed cannot be taken; the message is a sentence for the person who typed it and says what would do. */
public final class BadEntryException extends Exception {

	private static final long serialVersionUID = 1L;

	public BadEntryException(String message) {
		super(message);
	}
}
