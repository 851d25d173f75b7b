package gapwright.ui.fields;

import java.util.Objects;

/**
 * What goes on in a text field, without a display: the last value taken, what is typed now, and why it cannot be taken.
 *
 * @param <T> kind of the value
 */
public final class EntryState<T> {

	private final Entry<T> entry;
	private T value;
	private String typed = "";
	private String problem;

	public EntryState(Entry<T> entry) {
		this.entry = entry;
	}

	/** A value from outside. A half-typed text stays, so that an edit made elsewhere does not pull it from under the fingers. */
	public boolean accept(T outside, boolean keepTyped) {
		boolean keep = keepTyped && isTouched();
		value = outside;
		if (!keep) {
			revert();
		}
		return !keep;
	}

	public void type(String text) {
		typed = text;
		if (problem != null) {
			problem = check(text);
		}
	}

	/** @return whether there is a new value to hand on */
	public boolean commit() {
		try {
			T next = entry.parse(typed);
			problem = null;
			boolean changed = !Objects.equals(next, value);
			value = next;
			typed = entry.text(next);
			return changed;
		} catch (BadEntryException e) {
			problem = e.getMessage();
			return false;
		}
	}

	/** The model would not have it after all. */
	public void refuse(T previous, String text, String message) {
		value = previous;
		typed = text;
		problem = message;
	}

	public void revert() {
		typed = entry.text(value);
		problem = null;
	}

	private String check(String text) {
		try {
			entry.parse(text);
			return null;
		} catch (BadEntryException e) {
			return e.getMessage();
		}
	}

	public boolean isTouched() {
		return !typed.equals(entry.text(value));
	}

	public T value() {
		return value;
	}

	public String typed() {
		return typed;
	}

	/** Null when all is well. */
	public String problem() {
		return problem;
	}
}
