package gapwright.ui.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.eclipse.core.resources.IResource;
import org.eclipse.core.runtime.NullProgressMonitor;
import org.eclipse.jface.viewers.StructuredSelection;
import org.eclipse.jface.wizard.IWizardPage;
import org.eclipse.jface.wizard.WizardDialog;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.Text;
import org.eclipse.ui.PlatformUI;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

import gapwright.library.Examples;
import gapwright.library.template.Template;
import gapwright.library.template.TemplateField;
import gapwright.study.Cautions;
import gapwright.ui.editor.DesignEditor;
import gapwright.ui.wizards.NewDesignWizard;

/** Making a new design. */
class WizardJourneyTest {

	private NewDesignWizard wizard;
	private WizardDialog dialog;

	@BeforeEach
	void start() throws Exception {
		Workbench.start();
		for (IResource each : Workbench.project().members()) {
			if (each.getName().endsWith(".gapwright")) {
				each.delete(true, new NullProgressMonitor());
			}
		}
		wizard = new NewDesignWizard();
		wizard.init(PlatformUI.getWorkbench(), new StructuredSelection(Workbench.project()));
		dialog = new WizardDialog(Workbench.shell(), wizard);
		dialog.setBlockOnOpen(false);
		dialog.open();
		Workbench.drain();
	}

	@AfterEach
	void end() {
		dialog.close();
		Workbench.closeAll();
	}

	private void startFrom(String title) {
		Table starts = Workbench.find(dialog.getShell(), Table.class, table -> true);
		for (int k = 0; k < starts.getItemCount(); k++) {
			if (starts.getItem(k).getText().endsWith(title)) {
				starts.setSelection(k);
				starts.notifyListeners(SWT.Selection, new Event());
				return;
			}
		}
		throw new AssertionError("nothing called " + title);
	}

	private IWizardPage next() {
		IWizardPage page = dialog.getCurrentPage().getNextPage();
		dialog.showPage(page);
		Workbench.settle();
		return page;
	}

	private Text field(TemplateField field) {
		return Workbench.find(dialog.getShell(), Text.class, text -> field.hint().equals(text.getToolTipText()));
	}

	private DesignEditor finish() {
		assertTrue(wizard.canFinish());
		assertTrue(wizard.performFinish());
		dialog.close();
		Workbench.drain();
		return (DesignEditor) Workbench.page().getActiveEditor();
	}

	@Test
	void theFirstPageShowsEveryCaution() {
		Text cautions = Workbench.find(dialog.getShell(), Text.class, text -> (text.getStyle() & SWT.READ_ONLY) != 0);
		for (String caution : Cautions.all()) {
			assertTrue(cautions.getText().contains(caution), caution);
		}
	}

	@Test
	void aTypedWidthAndCurrentAreThoseOfTheNewDesign() {
		Template core = Template.all().stream().filter(each -> each.id().contains("e-core")).findFirst().orElseThrow();
		startFrom(core.title());
		next();
		TemplateField current = core.fields().stream().filter(each -> each.key().equals("current")).findFirst().orElseThrow();
		Workbench.focus(field(current));
		field(current).selectAll();
		Workbench.type("2500 mA");
		next();
		DesignEditor editor = finish();
		assertEquals(2.5, editor.session().pointResult().windings().get(0).current());
		assertFalse(editor.isDirty());
		assertTrue(Workbench.page().getActiveEditor().getTitle().endsWith(".gapwright"));
	}

	@Test
	void aBadDimensionIsExplainedAndKeepsFromGoingOn() {
		Template core = Template.all().get(0);
		startFrom(core.title());
		IWizardPage page = next();
		Text first = field(core.fields().get(0));
		Workbench.focus(first);
		first.selectAll();
		Workbench.type("10");
		Workbench.key(SWT.TAB, 0);
		assertNotNull(page.getErrorMessage());
		assertTrue(page.getErrorMessage().contains("unit"), page.getErrorMessage());
		assertFalse(wizard.canFinish());
		Workbench.focus(first);
		first.selectAll();
		Workbench.type("10 mm");
		Workbench.key(SWT.TAB, 0);
		assertEquals(null, page.getErrorMessage());
		assertTrue(wizard.canFinish());
	}

	@Test
	void anExampleNeedsNoDimensionsAndOpensComputed() {
		startFrom(Examples.all().get(0).title());
		assertEquals("file", next().getName());
		DesignEditor editor = finish();
		assertTrue(editor.session().pointResult().converged());
		assertEquals(Examples.all().get(0).title(), editor.session().design().getName());
	}

	@Test
	void anEmptyPageOpensAndSaysWhatToDoNext() {
		Template empty = Template.all().get(Template.all().size() - 1);
		startFrom(empty.title());
		DesignEditor editor = finish();
		assertTrue(editor.session().design().getLegs().isEmpty());
		assertTrue(editor.session().trouble().contains("canvas"), editor.session().trouble());
	}
}
