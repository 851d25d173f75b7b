package gapwright.ui.tests;

import static gapwright.model.GapwrightPackage.Literals.COIL__TURNS;
import static gapwright.model.GapwrightPackage.Literals.CURRENT_DRIVE__CURRENT;
import static gapwright.model.GapwrightPackage.Literals.KNEE_CURVE__INITIAL_PERMEABILITY;
import static gapwright.model.GapwrightPackage.Literals.OPERATING_POINT__TEMPERATURE;
import static gapwright.model.GapwrightPackage.Literals.WINDING__WIRE;
import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.eclipse.core.runtime.NullProgressMonitor;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Text;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

import gapwright.model.ArctanCurve;
import gapwright.model.Design;
import gapwright.model.DesignWriter;
import gapwright.model.edit.WindingEdits;
import gapwright.model.quantity.Quantity;
import gapwright.ui.editor.DesignEditor;

/** A designer at the form pages, with a real keyboard and mouse. */
class FormJourneyTest {

	private DesignEditor editor;
	private Design design;

	@BeforeEach
	void start() throws Exception {
		Workbench.start();
		editor = Workbench.open(Workbench.example("boost-choke.gapwright"));
		design = editor.session().design();
	}

	@AfterEach
	void end() {
		Workbench.closeAll();
	}

	private int turns() {
		return design.getWindings().get(0).getCoils().get(0).getTurns();
	}

	private double inductance() {
		return editor.session().pointResult().inductance().differential()[0][0];
	}

	@Test
	void typedTurnsChangeTheInductanceOnEnterAndUndoTakesThemBack() {
		byte[] before = DesignWriter.bytes(design);
		double inductance = inductance();
		editor.reveal(design.getWindings().get(0));
		Forms.enter(Forms.text(COIL__TURNS), "9");
		assertEquals(9, turns());
		assertTrue(inductance() < inductance, "half the turns, less inductance");
		assertTrue(editor.isDirty());
		Workbench.focus(Forms.button("Add coil"));
		Workbench.key('z', SWT.MOD1);
		assertArrayEquals(before, DesignWriter.bytes(design));
		assertEquals(inductance, inductance());
		assertEquals("18", Forms.text(COIL__TURNS).getText());
		assertFalse(editor.isDirty());
	}

	@Test
	void anEntryWithoutAUnitIsMarkedInPlaceAndNeverReachesTheModel() {
		editor.reveal(design.getOperatingPoints().get(0));
		byte[] before = DesignWriter.bytes(design);
		Forms.enter(Forms.text(OPERATING_POINT__TEMPERATURE), "90");
		assertArrayEquals(before, DesignWriter.bytes(design));
		assertFalse(editor.isDirty());
		assertEquals("90", Forms.text(OPERATING_POINT__TEMPERATURE).getText(), "what was typed stays to be mended");
		assertTrue(Forms.says("needs a unit"));
		Workbench.type(" degC");
		assertFalse(Forms.says("needs a unit"), "the mark goes as soon as the entry is good");
		Workbench.key(SWT.CR, 0);
		assertEquals(90, design.getOperatingPoints().get(0).getTemperature().si());
	}

	@Test
	void escapePutsTheLastValueBack() {
		editor.reveal(design.getOperatingPoints().get(0));
		String before = Forms.text(OPERATING_POINT__TEMPERATURE).getText();
		Forms.enter(Forms.text(OPERATING_POINT__TEMPERATURE), "hot");
		assertTrue(Forms.says("'hot'"));
		Workbench.key(SWT.ESC, 0);
		assertEquals(before, Forms.text(OPERATING_POINT__TEMPERATURE).getText());
		assertFalse(Forms.says("'hot'"));
	}

	@Test
	void leavingTheFieldTakesTheEntry() {
		editor.reveal(design.getWindings().get(0));
		Forms.typeOver(Forms.text(WINDING__WIRE), "AWG 24");
		Forms.click(Forms.text(COIL__TURNS));
		Quantity wire = design.getWindings().get(0).getWire();
		assertEquals("AWG 24", wire.text());
	}

	@Test
	void savingTakesTheEntryBeingTypedAlong() throws Exception {
		editor.reveal(design.getWindings().get(0));
		Forms.typeOver(Forms.text(COIL__TURNS), "20");
		assertEquals(18, turns());
		editor.doSave(new NullProgressMonitor());
		assertEquals(20, turns());
		assertFalse(editor.isDirty());
		String saved = new String(Workbench.project().getFile("boost-choke.gapwright").getContents().readAllBytes());
		assertTrue(saved.contains("turns=\"20\""), saved);
	}

	@Test
	void aPageFollowsWhatIsChangedElsewhere() {
		editor.reveal(design.getWindings().get(0));
		editor.session().history().run(WindingEdits.addCoil(design.getWindings().get(0), design.getLegs().get(1), 7));
		Workbench.settle();
		assertTrue(Forms.says("Turns"));
		Workbench.find(Workbench.shell(), Text.class, text -> "7".equals(text.getText()));
		editor.session().history().undo();
		Workbench.settle();
		assertEquals("18", Forms.text(COIL__TURNS).getText());
	}

	@Test
	void aNewOperatingPointDrivenByACurrentGivesItsOwnResult() {
		editor.reveal(design.getOperatingPoints().get(0));
		int before = design.getOperatingPoints().size();
		Forms.click(Forms.button("Add"));
		assertEquals(before + 1, design.getOperatingPoints().size());
		var point = design.getOperatingPoints().get(before);
		Combo drive = Workbench.find(Workbench.shell(), Combo.class, combo -> combo.indexOf("Not driven") == 0);
		assertEquals("Not driven", drive.getText(), "the new point is shown");
		Forms.choose(drive, "Current");
		Forms.enter(Forms.text(CURRENT_DRIVE__CURRENT), "3 A");
		var result = editor.session().result().operatingPoint(point.getId());
		assertTrue(result.converged());
		assertEquals(3, result.winding("main").current());
	}

	@Test
	void anotherKindOfCurveKeepsThePermeabilityAndUndoesByteForByte() {
		editor.reveal(design.getMaterials().get(0));
		byte[] before = DesignWriter.bytes(design);
		String permeability = Forms.text(KNEE_CURVE__INITIAL_PERMEABILITY).getText();
		Combo kind = Workbench.find(Workbench.shell(), Combo.class, combo -> combo.indexOf("Roll-off") > 0);
		Forms.choose(kind, "Arctan");
		ArctanCurve curve = (ArctanCurve) design.getMaterials().get(0).getCurve();
		assertEquals(Double.parseDouble(permeability), curve.getInitialPermeability());
		editor.session().history().undo();
		assertArrayEquals(before, DesignWriter.bytes(design));
		assertEquals("", editor.session().history().undoLabel(), "it was one step");
	}
}
