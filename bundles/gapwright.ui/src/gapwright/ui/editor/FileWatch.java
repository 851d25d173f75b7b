package gapwright.ui.editor;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IResourceChangeEvent;
import org.eclipse.core.resources.IResourceChangeListener;
import org.eclipse.core.resources.IResourceDelta;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.swt.widgets.Display;
import org.eclipse.ui.part.FileEditorInput;

/**
 * Follows the file under an editor: renamed or moved, the editor goes along; deleted, it keeps the design and counts
 * as not saved; written by somebody else, it is read again, after a question when there are unsaved changes.
 */
final class FileWatch implements IResourceChangeListener {

	private final DesignEditor editor;
	private final Display display = Display.getCurrent();
	private long stamp;
	private boolean disposed;

	FileWatch(DesignEditor editor) {
		this.editor = editor;
		stamp = editor.file().stamp();
		if (editor.file().resource() != null) {
			ResourcesPlugin.getWorkspace().addResourceChangeListener(this, IResourceChangeEvent.POST_CHANGE);
		}
	}

	/** The editor itself wrote the file. */
	void saved() {
		stamp = editor.file().stamp();
	}

	@Override
	public void resourceChanged(IResourceChangeEvent event) {
		IFile file = editor.file().resource();
		IResourceDelta delta = file == null || event.getDelta() == null ? null : event.getDelta().findMember(file.getFullPath());
		if (delta == null) {
			return;
		}
		if (delta.getKind() == IResourceDelta.REMOVED && (delta.getFlags() & IResourceDelta.MOVED_TO) != 0) {
			IFile target = ResourcesPlugin.getWorkspace().getRoot().getFile(delta.getMovedToPath());
			later(() -> editor.moveTo(new FileEditorInput(target)));
		} else if (delta.getKind() == IResourceDelta.REMOVED) {
			later(this::deleted);
		} else if ((delta.getFlags() & (IResourceDelta.CONTENT | IResourceDelta.REPLACED)) != 0) {
			later(this::changed);
		}
	}

	private void later(Runnable reaction) {
		display.asyncExec(() -> {
			if (!disposed) {
				reaction.run();
			}
		});
	}

	private void deleted() {
		if (editor.session() == null) {
			editor.getSite().getPage().closeEditor(editor, false);
		} else {
			editor.session().history().markUnsaved();
			stamp = -1;
		}
	}

	private void changed() {
		long now = editor.file().stamp();
		if (now == stamp) {
			return;
		}
		stamp = now;
		if (!editor.isDirty() || MessageDialog.openQuestion(editor.getSite().getShell(), "File changed",
				"'" + editor.file().name() + "' was changed by another program. Read it again? Your unsaved changes would be lost.")) {
			Reopening.of(editor);
		} else {
			editor.session().history().markUnsaved();
		}
	}

	void dispose() {
		disposed = true;
		ResourcesPlugin.getWorkspace().removeResourceChangeListener(this);
	}
}
