package gapwright.ui.tests;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Display;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Shell;
import org.eclipse.swt.widgets.Table;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

import gapwright.model.AirPath;
import gapwright.model.Design;
import gapwright.model.DesignWriter;
import gapwright.ui.editor.DesignEditor;

/** A designer has the leakage across the windows of a reactor added from its drawing. */
class LeakageJourneyTest {

	@BeforeEach
	void start() throws Exception {
		Workbench.start();
	}

	@AfterEach
	void end() {
		Workbench.closeAll();
	}

	@Test
	void leakageAcrossBothWindowsIsShownAddedAndUndone() throws Exception {
		DesignEditor editor = Workbench.open(Workbench.example("three-phase-reactor.gapwright"));
		Design design = editor.session().design();
		byte[] before = DesignWriter.bytes(design);
		int legs = design.getLegs().size();
		double inductance = editor.session().pointResult().inductance().of("phase-a");
		new Mouse(editor);
		int[] windows = { 0 };
		Display display = Workbench.shell().getDisplay();
		watch(display, windows);
		Workbench.key('W', SWT.SHIFT);
		Workbench.await("paths", () -> !design.getAirPaths().isEmpty());
		Workbench.drain();
		assertEquals(2, windows[0], "a window on each side of the middle leg");
		assertEquals(legs + 3 * 4, design.getLegs().size(), "three legs, each in five pieces");
		assertEquals(8, design.getAirPaths().size());
		assertTrue(design.getAirPaths().stream().allMatch(AirPath::isLeakage));
		assertNotNull(editor.session().pointResult());
		assertTrue(editor.session().pointResult().converged());
		assertTrue(editor.session().pointResult().inductance().of("phase-a") > inductance, "leakage only adds to a winding's own inductance");
		Pictures.of(Workbench.shell(), "leakage-paths");
		Workbench.key('z', SWT.MOD1);
		assertArrayEquals(before, DesignWriter.bytes(design));
	}

	/** The dialog blocks the key that opens it, so it is answered by the clock. */
	private static void watch(Display display, int[] windows) {
		display.timerExec(100, () -> {
			Shell dialog = display.getActiveShell();
			if (dialog == null || !dialog.getText().equals("Leakage across windows")) {
				watch(display, windows);
				return;
			}
			windows[0] = Workbench.find(dialog, Table.class, table -> true).getItemCount();
			Pictures.of(dialog, "leakage-dialog");
			Workbench.find(dialog, Button.class, button -> button.getText().equals("Add")).notifyListeners(SWT.Selection, new Event());
		});
	}
}
