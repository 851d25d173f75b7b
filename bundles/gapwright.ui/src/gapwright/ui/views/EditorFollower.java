package gapwright.ui.views;

import java.util.function.Consumer;

import org.eclipse.ui.IEditorPart;
import org.eclipse.ui.IPartListener2;
import org.eclipse.ui.IWorkbenchPage;
import org.eclipse.ui.IWorkbenchPartReference;

import gapwright.ui.session.DesignSession;

/** Tells a view whose design it is to show: that of the editor in front, or none. */
final class EditorFollower implements IPartListener2 {

	private final IWorkbenchPage page;
	private final Consumer<DesignSession> taker;

	EditorFollower(IWorkbenchPage page, Consumer<DesignSession> taker) {
		this.page = page;
		this.taker = taker;
		page.addPartListener(this);
	}

	void update() {
		IEditorPart editor = page.getActiveEditor();
		taker.accept(editor == null ? null : editor.getAdapter(DesignSession.class));
	}

	void dispose() {
		page.removePartListener(this);
	}

	@Override
	public void partActivated(IWorkbenchPartReference part) {
		updateFor(part);
	}

	@Override
	public void partBroughtToTop(IWorkbenchPartReference part) {
		updateFor(part);
	}

	@Override
	public void partOpened(IWorkbenchPartReference part) {
		updateFor(part);
	}

	@Override
	public void partClosed(IWorkbenchPartReference part) {
		updateFor(part);
	}

	@Override
	public void partInputChanged(IWorkbenchPartReference part) {
		updateFor(part);
	}

	private void updateFor(IWorkbenchPartReference part) {
		if (part.getPart(false) instanceof IEditorPart || page.getActiveEditor() == null) {
			update();
		}
	}
}
