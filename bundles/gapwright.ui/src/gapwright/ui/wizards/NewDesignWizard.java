package gapwright.ui.wizards;

import java.util.Map;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IProject;
import org.eclipse.core.runtime.jobs.Job;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.jface.viewers.IStructuredSelection;
import org.eclipse.jface.viewers.StructuredSelection;
import org.eclipse.jface.wizard.IWizardPage;
import org.eclipse.jface.wizard.Wizard;
import org.eclipse.ui.INewWizard;
import org.eclipse.ui.IWorkbench;
import org.eclipse.ui.PartInitException;
import org.eclipse.ui.ide.IDE;
import org.eclipse.ui.wizards.newresource.BasicNewResourceWizard;

import gapwright.model.Design;
import gapwright.model.DesignWriter;
import gapwright.workspace.DesignNature;

/** Makes a design file from a core of given dimensions or from an example, and opens it. */
public final class NewDesignWizard extends Wizard implements INewWizard {

	private final StartPage startPage = new StartPage();
	private final DimensionsPage dimensionsPage = new DimensionsPage();
	private DesignFilePage filePage;
	private IWorkbench workbench;

	public NewDesignWizard() {
		setWindowTitle("New Gapwright design");
	}

	@Override
	public void init(IWorkbench next, IStructuredSelection selection) {
		workbench = next;
		filePage = new DesignFilePage(selection == null ? StructuredSelection.EMPTY : selection);
	}

	@Override
	public void addPages() {
		addPage(startPage);
		addPage(dimensionsPage);
		addPage(filePage);
	}

	/** A core as it comes, before any dimension is changed. */
	static Design standard(Start start) {
		return start.build(Map.of());
	}

	void starting(Start start) {
		dimensionsPage.start(start);
		filePage.suggest(start.title());
	}

	/** An example has no dimensions to ask for. */
	@Override
	public IWizardPage getNextPage(IWizardPage page) {
		return page == startPage && startPage.start().fields().isEmpty() ? filePage : super.getNextPage(page);
	}

	@Override
	public IWizardPage getPreviousPage(IWizardPage page) {
		return page == filePage && startPage.start().fields().isEmpty() ? startPage : super.getPreviousPage(page);
	}

	@Override
	public boolean performFinish() {
		Design design = dimensionsPage.design();
		if (design == null) {
			return false;
		}
		if (!startPage.start().isExample()) {
			design.setName(filePage.designName());
		}
		filePage.content(DesignWriter.bytes(design));
		IFile file = filePage.createNewFile();
		if (file == null) {
			return false;
		}
		checkAtEveryBuild(file.getProject());
		BasicNewResourceWizard.selectAndReveal(file, workbench.getActiveWorkbenchWindow());
		try {
			IDE.openEditor(workbench.getActiveWorkbenchWindow().getActivePage(), file, true);
		} catch (PartInitException e) {
			MessageDialog.openError(getShell(), getWindowTitle(), "The file was made, but it could not be opened: " + e.getMessage());
		}
		return true;
	}

	private static void checkAtEveryBuild(IProject project) {
		Job job = Job.create("Switching the checks of designs on", monitor -> {
			DesignNature.addTo(project, monitor);
		});
		job.setRule(project.getWorkspace().getRoot());
		job.schedule();
	}
}
