package gapwright.ui.properties;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.jface.viewers.ISelection;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.ui.IWorkbenchPart;
import org.eclipse.ui.PlatformUI;
import org.eclipse.ui.views.properties.tabbed.AbstractPropertySection;
import org.eclipse.ui.views.properties.tabbed.TabbedPropertySheetPage;

import gapwright.model.edit.history.Edit;
import gapwright.ui.fields.EditRunner;
import gapwright.ui.session.DesignSession;

/** A section of the Properties view about one element of the design. It follows every step of the history. */
abstract class ElementSection extends AbstractPropertySection {

	private final Runnable refresher = this::refreshLater;
	private DesignSession session;
	private EObject element;
	private Composite area;
	private boolean pending;

	/** Builds the controls, once. */
	abstract void build(Composite into);

	/** Shows the element; null empties the controls. */
	abstract void show(EObject next);

	@Override
	public final void createControls(Composite parent, TabbedPropertySheetPage page) {
		super.createControls(parent, page);
		PlatformUI.getWorkbench().getHelpSystem().setHelp(parent, "gapwright.help.properties");
		area = new Composite(parent, SWT.NONE);
		area.setLayout(new GridLayout());
		Composite body = new Composite(area, SWT.NONE);
		body.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
		build(body);
	}

	@Override
	public final void setInput(IWorkbenchPart part, ISelection selection) {
		super.setInput(part, selection);
		DesignSession next = part.getAdapter(DesignSession.class);
		if (next != session) {
			listen(false);
			session = next;
			listen(true);
		}
		element = session == null ? null : Selected.of(selection);
	}

	private void listen(boolean on) {
		if (session != null && on) {
			session.history().addListener(refresher);
		} else if (session != null) {
			session.history().removeListener(refresher);
		}
	}

	@Override
	public final void refresh() {
		boolean gone = element != null && element.eResource() == null;
		show(gone ? null : element);
	}

	private void refreshLater() {
		if (!pending && area != null && !area.isDisposed()) {
			pending = true;
			area.getDisplay().asyncExec(() -> {
				pending = false;
				if (!area.isDisposed()) {
					refresh();
				}
			});
		}
	}

	@Override
	public void dispose() {
		listen(false);
		session = null;
		super.dispose();
	}

	/** Runs edits of the fields; they show a refusal beside themselves. */
	final EditRunner runner() {
		return edit -> session == null ? null : EditRunner.on(session.history()).run(edit);
	}

	/** Runs the edit of a button and says so when it was refused. */
	final void run(Edit edit) {
		String refusal = runner().run(edit);
		if (refusal != null) {
			MessageDialog.openError(area.getShell(), edit.label(), refusal);
		}
	}

	final DesignSession session() {
		return session;
	}

	@Override
	public boolean shouldUseExtraSpace() {
		return false;
	}
}
