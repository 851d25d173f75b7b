package gapwright.ui.tests;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IMarker;
import org.eclipse.core.resources.ResourceAttributes;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.NullProgressMonitor;
import org.eclipse.swt.widgets.Table;
import org.eclipse.ui.ide.IDE;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

import gapwright.model.Design;
import gapwright.model.DesignWriter;
import gapwright.model.Ids;
import gapwright.model.edit.OperatingPointEdits;
import gapwright.ui.editor.DesignEditor;

/** The file under an editor: saved, not saved, changed by others, damaged. */
class FileJourneyTest {

	private static final NullProgressMonitor NOW = new NullProgressMonitor();

	private IFile file;
	private DesignEditor editor;

	@BeforeEach
	void start() throws Exception {
		Workbench.start();
		file = Workbench.example("boost-choke.gapwright");
		editor = Workbench.open(file);
	}

	@AfterEach
	void end() throws Exception {
		Workbench.closeAll();
		for (IFile each : List.of(file, Workbench.project().getFile("renamed.gapwright"))) {
			if (each.exists()) {
				writable(each, true);
				each.delete(true, NOW);
			}
		}
	}

	/** The editor on the file as it is now: reading again opens another. */
	private static DesignEditor now() {
		return (DesignEditor) Workbench.page().getActiveEditor();
	}

	private Design design() {
		return editor.session().design();
	}

	private void change() {
		editor.session().history().run(OperatingPointEdits.add(design()));
	}

	private static void writable(IFile file, boolean writable) throws Exception {
		ResourceAttributes attributes = file.getResourceAttributes();
		attributes.setReadOnly(!writable);
		file.setResourceAttributes(attributes);
	}

	private static byte[] bytes(IFile file) throws Exception {
		return file.getContents(true).readAllBytes();
	}

	@Test
	void openingAndSavingWithoutAChangeLeavesEveryByte() throws Exception {
		byte[] before = bytes(file);
		editor.doSave(NOW);
		assertArrayEquals(before, bytes(file));
	}

	@Test
	void whatIsSavedIsTheDesignAndTheEditorIsClean() throws Exception {
		change();
		assertTrue(editor.isDirty());
		editor.doSave(NOW);
		assertArrayEquals(DesignWriter.bytes(design()), bytes(file));
		assertFalse(editor.isDirty());
		editor.session().history().undo();
		assertTrue(editor.isDirty(), "the file is ahead of the design now");
	}

	@Test
	void aFailedSaveKeepsTheOldFileTheChangesAndTheDirtyMark() throws Exception {
		byte[] before = bytes(file);
		change();
		writable(file, false);
		NullProgressMonitor monitor = new NullProgressMonitor();
		String said = Answer.with("OK", () -> editor.doSave(monitor));
		assertTrue(said.contains("could not be saved"), said);
		assertTrue(monitor.isCanceled(), "so that closing does not go on");
		assertTrue(editor.isDirty());
		assertArrayEquals(before, bytes(file));
	}

	@Test
	void aFileChangedByAnotherProgramIsReadAgain() throws Exception {
		file.setContents(other(), true, false, NOW);
		Workbench.await("the new name", () -> now() != null && "Another".equals(now().session().design().getName()));
		assertFalse(now().isDirty());
		assertTrue(now().session().pointResult().converged());
		assertEquals(1, Workbench.page().getEditorReferences().length);
	}

	@Test
	void unsavedChangesAreKeptWhenSomebodySaysSo() throws Exception {
		change();
		byte[] mine = DesignWriter.bytes(design());
		String said = Answer.with("No", () -> {
			try {
				file.setContents(other(), true, false, NOW);
			} catch (CoreException e) {
				throw new AssertionError(e);
			}
			Workbench.drain(300);
		});
		assertTrue(said.contains("unsaved changes"), said);
		assertArrayEquals(mine, DesignWriter.bytes(design()));
		assertTrue(editor.isDirty());
	}

	private ByteArrayInputStream other() {
		String text = new String(DesignWriter.bytes(design()), StandardCharsets.UTF_8).replace("Boost choke of the panel converter", "Another");
		return new ByteArrayInputStream(text.getBytes(StandardCharsets.UTF_8));
	}

	@Test
	void aDeletedFileLeavesTheDesignOpenAndUnsaved() throws Exception {
		file.delete(true, NOW);
		Workbench.await("the dirty mark", editor::isDirty);
		editor.doSave(NOW);
		assertTrue(file.exists());
		assertFalse(editor.isDirty());
	}

	@Test
	void aRenamedFileTakesTheEditorAlong() throws Exception {
		file.move(file.getFullPath().removeLastSegments(1).append("renamed.gapwright"), true, NOW);
		Workbench.await("the new title", () -> "renamed.gapwright".equals(editor.getTitle()));
		change();
		editor.doSave(NOW);
		assertArrayEquals(DesignWriter.bytes(design()), bytes(Workbench.project().getFile("renamed.gapwright")));
		assertFalse(file.exists());
	}

	@Test
	void aDamagedFileIsExplainedAndOpensOnceItIsMended() throws Exception {
		String good = new String(bytes(file), StandardCharsets.UTF_8);
		byte[] bad = good.replace("width=\"12 mm\"", "width=\"12\"").getBytes(StandardCharsets.UTF_8);
		DesignEditor broken = Workbench.open(Workbench.file("renamed.gapwright", bad));
		assertNull(broken.session());
		Table problems = Forms.table("Expected");
		assertEquals("centre-leg", problems.getItem(0).getText(1));
		assertEquals("width", problems.getItem(0).getText(2));
		assertEquals("12", problems.getItem(0).getText(3));
		assertTrue(problems.getItem(0).getText(4).contains("needs a unit"));
		Workbench.file("renamed.gapwright", good.getBytes(StandardCharsets.UTF_8));
		Workbench.await("the design", () -> now() != null && now() != broken && now().session() != null);
		assertTrue(now().session().pointResult().converged());
	}

	@Test
	void aMarkerLeadsToItsLegAtItsOperatingPoint() throws Exception {
		IMarker marker = file.createMarker(IMarker.PROBLEM, Map.of("gapwright.subject", "left-leg", "gapwright.operatingPoint", "morning"));
		IDE.gotoMarker(editor, marker);
		assertEquals("morning", editor.session().operatingPoint().getId());
		assertEquals(List.of(Ids.find(design(), "left-leg")), editor.session().selection().selected());
	}
}
