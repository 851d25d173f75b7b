package gapwright.ui.editor;

import java.io.IOException;
import java.util.List;

import org.eclipse.core.resources.IMarker;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.core.runtime.NullProgressMonitor;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.gef.GraphicalViewer;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.swt.layout.FillLayout;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.ui.IEditorInput;
import org.eclipse.ui.IEditorSite;
import org.eclipse.ui.IFileEditorInput;
import org.eclipse.ui.PartInitException;
import org.eclipse.ui.dialogs.SaveAsDialog;
import org.eclipse.ui.ide.IGotoMarker;
import org.eclipse.ui.part.FileEditorInput;
import org.eclipse.ui.part.MultiPageEditorPart;
import org.eclipse.ui.views.contentoutline.IContentOutlinePage;
import org.eclipse.ui.views.properties.IPropertySheetPage;
import org.eclipse.ui.views.properties.tabbed.ITabbedPropertySheetPageContributor;
import org.eclipse.ui.views.properties.tabbed.TabbedPropertySheetPage;

import gapwright.model.Design;
import gapwright.ui.canvas.CanvasPage;
import gapwright.ui.fields.EntryText;
import gapwright.ui.session.DesignSession;

/** Editor of a design: the canvas and the form pages over one session. It wires things up and does nothing else. */
public final class DesignEditor extends MultiPageEditorPart implements ITabbedPropertySheetPageContributor {

	public static final String ID = "gapwright.ui.editor";

	private DesignFile file;
	private DesignSession session;
	private CanvasPage canvas;
	private FormPages forms;
	private FileWatch watch;
	private EditorSelection selection;
	private OperatingPointBar bar;
	private boolean dirty;

	@Override
	public void init(IEditorSite site, IEditorInput input) throws PartInitException {
		super.init(site, input);
		selection = new EditorSelection(this, this::chosenOnForm, () -> session == null ? null : session.design());
		site.setSelectionProvider(selection);
		setPartName(input.getName());
		try {
			file = DesignFile.of(input);
		} catch (CoreException e) {
			throw new PartInitException(e.getStatus());
		}
	}

	/** The operating point bar stands above all pages. */
	@Override
	protected Composite createPageContainer(Composite parent) {
		GridLayout grid = new GridLayout();
		grid.marginWidth = 0;
		grid.marginHeight = 0;
		grid.verticalSpacing = 0;
		Composite container = super.createPageContainer(parent);
		container.setLayout(grid);
		bar = new OperatingPointBar(container);
		Composite pages = new Composite(container, 0);
		pages.setLayoutData(new GridData(GridData.FILL_BOTH));
		pages.setLayout(new FillLayout());
		return pages;
	}

	@Override
	protected void createPages() {
		try {
			open(file.read());
		} catch (IOException e) {
			bar.hide();
			setPageText(addPage(new UnreadablePage(getContainer(), e, this)), "Problems");
		}
		watch = new FileWatch(this);
	}

	private void open(Design design) {
		session = new DesignSession(design, getContainer().getDisplay()::asyncExec);
		session.history().addListener(this::tellDirty);
		bar.show(session);
		canvas = new CanvasPage(session);
		try {
			setPageText(addPage(canvas, getEditorInput()), "Canvas");
		} catch (PartInitException e) {
			throw new IllegalStateException(e);
		}
		forms = new FormPages(getContainer(), session);
		forms.addTo((control, title) -> setPageText(addPage(control), title));
		forms.onChoose(selection::changed);
	}

	/** The workbench looks at all its parts when told, so it is told of a change alone. */
	private void tellDirty() {
		if (dirty != isDirty()) {
			dirty = isDirty();
			firePropertyChange(PROP_DIRTY);
		}
	}

	private EObject chosenOnForm() {
		return forms == null || getActivePage() < 0 ? null : forms.chosen(getControl(getActivePage()));
	}

	@Override
	protected void pageChange(int index) {
		super.pageChange(index);
		selection.changed();
	}

	/** @return the page in front, to be shown again by {@link #showPage} */
	int frontPage() {
		return getActivePage();
	}

	@Override
	public void doSave(IProgressMonitor monitor) {
		EntryText.commitFocused();
		try {
			file.write(session.design(), monitor);
			watch.saved();
			session.history().markSaved();
		} catch (IOException | CoreException e) {
			monitor.setCanceled(true);
			MessageDialog.openError(getSite().getShell(), "Save",
					"'" + file.name() + "' could not be saved. The file on disk is as it was, your changes are still here.\n\n" + e.getMessage());
		}
	}

	@Override
	public void doSaveAs() {
		SaveAsDialog dialog = new SaveAsDialog(getSite().getShell());
		if (getEditorInput() instanceof IFileEditorInput input) {
			dialog.setOriginalFile(input.getFile());
		}
		if (dialog.open() == SaveAsDialog.OK && dialog.getResult() != null) {
			moveTo(new FileEditorInput(ResourcesPlugin.getWorkspace().getRoot().getFile(dialog.getResult())));
			doSave(new NullProgressMonitor());
		}
	}

	/** Edits another file from now on: the same one under a new name, or where it was saved to. */
	void moveTo(IEditorInput input) {
		try {
			file = DesignFile.of(input);
			setInput(input);
			setPartName(input.getName());
			firePropertyChange(PROP_INPUT);
		} catch (CoreException e) {
			MessageDialog.openError(getSite().getShell(), "Save as", e.getMessage());
		}
	}

	@Override
	public boolean isDirty() {
		return session != null && session.history().isDirty();
	}

	@Override
	public boolean isSaveAsAllowed() {
		return session != null;
	}

	/** Null when the file could not be read. */
	public DesignSession session() {
		return session;
	}

	DesignFile file() {
		return file;
	}

	/** Brings the page of an element to the front and selects it there. */
	public void reveal(EObject element) {
		if (session != null && element != null) {
			setActivePage(forms.reveal(element) + 1);
			session.selection().select(List.of(element), this);
		}
	}

	/** @param index 0 the canvas, then the form pages in their order */
	public void showPage(int index) {
		if (index >= 0 && index < getPageCount()) {
			setActivePage(index);
		}
	}

	@Override
	public <T> T getAdapter(Class<T> type) {
		if (type == DesignSession.class) {
			return type.cast(session);
		}
		if (type == IPropertySheetPage.class) {
			return type.cast(new TabbedPropertySheetPage(this));
		}
		if (type == IGotoMarker.class) {
			IGotoMarker reveal = (IMarker marker) -> MarkerTarget.reveal(marker, this);
			return type.cast(reveal);
		}
		if (canvas != null && (type == GraphicalViewer.class || type == IContentOutlinePage.class || type == CanvasPage.class)) {
			return type == CanvasPage.class ? type.cast(canvas) : canvas.getAdapter(type);
		}
		return super.getAdapter(type);
	}

	@Override
	public String getContributorId() {
		return ID;
	}

	@Override
	public void setFocus() {
		if (getPageCount() > 0) {
			super.setFocus();
		}
	}

	@Override
	public void dispose() {
		if (watch != null) {
			watch.dispose();
		}
		if (session != null) {
			session.dispose();
		}
		super.dispose();
	}
}
