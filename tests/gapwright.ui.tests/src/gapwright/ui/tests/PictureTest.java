package gapwright.ui.tests;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

import org.eclipse.e4.ui.css.swt.theme.IThemeEngine;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.jface.viewers.StructuredSelection;
import org.eclipse.jface.wizard.IWizardPage;
import org.eclipse.jface.wizard.WizardDialog;
import org.eclipse.swt.graphics.ImageData;
import org.eclipse.swt.widgets.Shell;
import org.eclipse.ui.PlatformUI;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

import gapwright.model.Design;
import gapwright.ui.editor.DesignEditor;
import gapwright.ui.views.LegLedger;
import gapwright.ui.views.WindingLedger;
import gapwright.ui.wizards.NewDesignWizard;

/** Takes pictures of every page and view, in the light and the dark theme. */
class PictureTest {

	@BeforeEach
	void start() throws Exception {
		Workbench.start();
	}

	@AfterEach
	void end() {
		Workbench.closeAll();
		theme("org.eclipse.e4.ui.css.theme.e4_default");
	}

	@Test
	void everyPageAndViewShowsSomethingInBothThemes() throws Exception {
		for (String theme : List.of("light", "dark")) {
			theme(theme.equals("dark") ? "org.eclipse.e4.ui.css.theme.e4_dark" : "org.eclipse.e4.ui.css.theme.e4_default");
			picture("three-phase-reactor.gapwright", theme);
			picture("flyback-transformer.gapwright", theme);
		}
	}

	private static void picture(String example, String theme) throws Exception {
		DesignEditor editor = Workbench.open(Workbench.example(example));
		Design design = editor.session().design();
		String name = example.replace(".gapwright", "");
		Workbench.page().showView(WindingLedger.ID);
		show(editor, design.getWindings().get(0), name + "-winding-" + theme);
		Workbench.page().showView(LegLedger.ID);
		show(editor, design.getOperatingPoints().get(0), name + "-point-" + theme);
		show(editor, design.getMaterials().get(0), name + "-material-" + theme);
		show(editor, design.getLegs().get(0), name + "-leg-" + theme);
		Workbench.closeAll();
	}

	private static void show(DesignEditor editor, EObject element, String name) {
		Workbench.page().activate(editor);
		editor.reveal(element);
		look(Workbench.shell(), name);
	}

	@Test
	void everyPageOfTheWizardShowsSomethingInBothThemes() throws Exception {
		Workbench.project();
		for (String theme : List.of("light", "dark")) {
			theme(theme.equals("dark") ? "org.eclipse.e4.ui.css.theme.e4_dark" : "org.eclipse.e4.ui.css.theme.e4_default");
			NewDesignWizard wizard = new NewDesignWizard();
			wizard.init(PlatformUI.getWorkbench(), new StructuredSelection(Workbench.project()));
			WizardDialog dialog = new WizardDialog(Workbench.shell(), wizard);
			dialog.setBlockOnOpen(false);
			dialog.open();
			for (IWizardPage page : wizard.getPages()) {
				dialog.showPage(page);
				look(dialog.getShell(), "wizard-" + page.getName() + "-" + theme);
			}
			dialog.close();
		}
	}

	@Test
	void aFileThatCannotBeReadSaysWhyInBothThemes() throws Exception {
		String broken = new String(Workbench.example("boost-choke.gapwright").getContents().readAllBytes(), StandardCharsets.UTF_8)
				.replace("width=\"12 mm\"", "width=\"12\"").replace("turns=\"18\"", "turns=\"many\"");
		for (String theme : List.of("light", "dark")) {
			theme(theme.equals("dark") ? "org.eclipse.e4.ui.css.theme.e4_dark" : "org.eclipse.e4.ui.css.theme.e4_default");
			Workbench.open(Workbench.file("broken.gapwright", broken.getBytes(StandardCharsets.UTF_8)));
			look(Workbench.shell(), "unreadable-" + theme);
			Workbench.closeAll();
		}
	}

	private static void look(Shell shell, String name) {
		ImageData picture = Pictures.of(shell, name);
		Set<Integer> colours = new HashSet<>();
		for (int x = 0; x < picture.width; x += 7) {
			for (int y = 0; y < picture.height; y += 7) {
				colours.add(picture.getPixel(x, y));
			}
		}
		assertTrue(colours.size() > 10, name + " is as good as blank");
	}

	private static void theme(String id) {
		PlatformUI.getWorkbench().getService(IThemeEngine.class).setTheme(id, false);
		Workbench.settle();
	}
}
