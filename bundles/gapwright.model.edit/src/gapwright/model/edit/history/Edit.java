package gapwright.model.edit.history;

import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

import org.eclipse.emf.common.notify.Notifier;

/**
 * One change of a design as the user thinks of it: a label and what is to be done. It says nothing of how to
 * undo; {@link EditHistory#run} records that.
 * <p>
 * An edit holds model values, never a request of some canvas, so that the canvas, the form pages, the Properties
 * view and quick fixes share the same ones. It may be run once.
 */
public final class Edit {

	private final String label;
	private final Set<Notifier> owners;
	private final Runnable change;

	/**
	 * @param label  what the undo menu shows, for example "Change leg width"; not blank
	 * @param owner  the narrowest object that holds everything the change touches; recording costs time for every
	 *               object below it
	 * @param change makes the change; may throw, then nothing has happened
	 */
	public Edit(String label, Notifier owner, Runnable change) {
		this(label, List.of(owner), change);
	}

	/** As above, for a change that touches several objects without a narrow common owner. */
	public Edit(String label, Collection<? extends Notifier> owners, Runnable change) {
		if (label.isBlank()) {
			throw new IllegalArgumentException("an edit needs a label for the undo menu");
		}
		if (owners.isEmpty()) {
			throw new IllegalArgumentException("edit '" + label + "': no owner to record");
		}
		this.label = label;
		this.owners = new LinkedHashSet<>(owners);
		this.change = change;
	}

	/** Several edits as one step, in order. If one throws, none has happened. */
	public static Edit all(String label, List<Edit> edits) {
		List<Notifier> owners = new ArrayList<>();
		edits.forEach(edit -> owners.addAll(edit.owners));
		return new Edit(label, owners, () -> edits.forEach(edit -> edit.change.run()));
	}

	public String label() {
		return label;
	}

	Set<Notifier> owners() {
		return owners;
	}

	Runnable change() {
		return change;
	}
}
