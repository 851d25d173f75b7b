package gapwright.model.edit.history;

import org.eclipse.emf.common.command.AbstractCommand;
import org.eclipse.emf.ecore.change.ChangeDescription;

/** An edit that has been made and can be taken back and repeated. */
final class RecordedEdit extends AbstractCommand {

	private final ChangeDescription change;

	/** @param change how to revert the edit, which has been made already */
	RecordedEdit(String label, ChangeDescription change) {
		super(label);
		this.change = change;
	}

	@Override
	protected boolean prepare() {
		return true;
	}

	@Override
	public void execute() {
		// made before it came onto the stack
	}

	@Override
	public void undo() {
		change.applyAndReverse();
	}

	@Override
	public void redo() {
		change.applyAndReverse();
	}
}
