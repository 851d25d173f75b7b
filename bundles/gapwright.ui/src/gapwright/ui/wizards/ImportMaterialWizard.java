package gapwright.ui.wizards;

import java.util.List;

import org.eclipse.jface.viewers.IStructuredSelection;
import org.eclipse.jface.wizard.Wizard;
import org.eclipse.ui.IEditorPart;
import org.eclipse.ui.IImportWizard;
import org.eclipse.ui.IWorkbench;
import org.eclipse.ui.IWorkbenchPage;
import org.eclipse.ui.IWorkbenchWindow;

import gapwright.model.Material;
import gapwright.model.edit.MaterialEdits;
import gapwright.ui.editor.DesignEditor;
import gapwright.ui.fields.EditRunner;
import gapwright.ui.session.DesignSession;

/** Reads a material from a file into the design in the editor, as one step that can be undone. */
public final class ImportMaterialWizard extends Wizard implements IImportWizard {

	private final ImportMaterialPage page = new ImportMaterialPage();
	private DesignSession session;
	private DesignEditor editor;
	private Material imported;

	/** For the workbench, which then calls {@link #init}. */
	public ImportMaterialWizard() {
		this(null);
	}

	/** @param session of the design the material goes into */
	public ImportMaterialWizard(DesignSession session) {
		this.session = session;
		setWindowTitle("Import material");
	}

	@Override
	public void init(IWorkbench workbench, IStructuredSelection selection) {
		IWorkbenchWindow window = workbench.getActiveWorkbenchWindow();
		IWorkbenchPage active = window == null ? null : window.getActivePage();
		IEditorPart part = active == null ? null : active.getActiveEditor();
		if (part instanceof DesignEditor design) {
			editor = design;
			session = design.session();
		}
	}

	@Override
	public void addPages() {
		page.design(session == null ? null : session.design());
		addPage(page);
	}

	/** @return what was read in; null before that */
	public Material imported() {
		return imported;
	}

	@Override
	public boolean performFinish() {
		List<Material> before = List.copyOf(session.design().getMaterials());
		String refusal = EditRunner.on(session.history()).run(MaterialEdits.addCopy(session.design(), page.material()));
		if (refusal != null) {
			page.setErrorMessage(refusal);
			return false;
		}
		imported = session.design().getMaterials().stream().filter(each -> !before.contains(each)).findFirst().orElse(null);
		if (editor != null && imported != null) {
			editor.reveal(imported);
		}
		return true;
	}
}
