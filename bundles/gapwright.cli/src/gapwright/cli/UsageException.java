package gapwright.cli;

/** The words on the command line make no sense. */
final class UsageException extends Exception {

	private static final long serialVersionUID = 1L;

	UsageException(String message) {
		super(message);
	}
}
