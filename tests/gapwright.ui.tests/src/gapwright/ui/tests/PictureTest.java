package gapwright.ui.tests;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashSet;
import java.util.List;
import java.util.Set;

import org.eclipse.swt.graphics.ImageData;
import org.eclipse.ui.IWorkbenchPage;
import org.eclipse.ui.IPageLayout;
import org.eclipse.ui.PlatformUI;
import org.eclipse.e4.ui.css.swt.theme.IThemeEngine;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

import gapwright.ui.editor.DesignEditor;
import gapwright.ui.views.LegLedger;
import gapwright.ui.views.WindingLedger;

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
		IWorkbenchPage page = Workbench.page();
		String name = example.replace(".gapwright", "");
		page.showView(WindingLedger.ID);
		page.showView(IPageLayout.ID_PROP_SHEET);
		editor.reveal(editor.session().design().getWindings().get(0));
		look(name + "-windings-" + theme);
		page.showView(LegLedger.ID);
		editor.reveal(editor.session().design().getOperatingPoints().get(0));
		look(name + "-points-" + theme);
		editor.reveal(editor.session().design().getMaterials().get(0));
		look(name + "-materials-" + theme);
		Workbench.closeAll();
	}

	private static void look(String name) {
		ImageData picture = Pictures.of(Workbench.shell(), name);
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
