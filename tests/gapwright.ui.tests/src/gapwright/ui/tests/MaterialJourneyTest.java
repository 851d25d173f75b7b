package gapwright.ui.tests;

import static gapwright.model.GapwrightPackage.Literals.CURVE_AT_TEMPERATURE__TEMPERATURE;
import static gapwright.model.GapwrightPackage.Literals.KNEE_CURVE__SATURATION_POLARISATION;
import static gapwright.model.GapwrightPackage.Literals.MATERIAL__CURIE_TEMPERATURE;
import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

import org.eclipse.e4.ui.css.swt.theme.IThemeEngine;
import org.eclipse.jface.viewers.StructuredSelection;
import org.eclipse.jface.wizard.WizardDialog;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Display;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Link;
import org.eclipse.swt.widgets.Shell;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.Text;
import org.eclipse.ui.PlatformUI;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

import gapwright.model.Design;
import gapwright.model.DesignWriter;
import gapwright.model.KneeCurve;
import gapwright.model.Material;
import gapwright.model.TableCurve;
import gapwright.ui.editor.DesignEditor;
import gapwright.ui.wizards.ImportMaterialWizard;

/** A designer with a maker's sheet: reads it in as a file, and enters what it says about temperature. */
class MaterialJourneyTest {

	private static final String FILE = """
			gapwright-material,1
			name,Sheet ferrite
			source,"invented sheet, digitised"
			units,A/m,T
			temperature,25 °C
			point,20,0.07
			point,60,0.22
			point,200,0.38
			point,1200,0.49
			temperature,100 °C
			point,20,0.09
			point,60,0.22
			point,200,0.33
			point,1200,0.39
			saturation,25 °C,0.49 T
			saturation,100 °C,0.39 T
			curie,215 °C
			density,4800 kg/m³
			loss,25 kHz,0.2 T,100 °C,54 kW/m³
			loss,100 kHz,0.1 T,100 °C,66 kW/m³
			loss,100 kHz,0.2 T,100 °C,401 kW/m³
			""";

	private Path folder;
	private DesignEditor editor;
	private Design design;

	@BeforeEach
	void start() throws Exception {
		Workbench.start();
		folder = Files.createTempDirectory("gapwright-materials");
		editor = Workbench.open(Workbench.example("boost-choke.gapwright"));
		design = editor.session().design();
	}

	@AfterEach
	void end() throws Exception {
		Workbench.closeAll();
		theme("org.eclipse.e4.ui.css.theme.e4_default");
		Files.deleteIfExists(folder.resolve("sheet.gapmaterial.csv"));
		Files.deleteIfExists(folder);
	}

	private static void theme(String id) {
		PlatformUI.getWorkbench().getService(IThemeEngine.class).setTheme(id, false);
		Workbench.settle();
	}

	private final class Import implements AutoCloseable {

		private final ImportMaterialWizard wizard = new ImportMaterialWizard();
		private final WizardDialog dialog = new WizardDialog(Workbench.shell(), wizard);

		Import(String content) throws Exception {
			wizard.init(PlatformUI.getWorkbench(), StructuredSelection.EMPTY);
			dialog.setBlockOnOpen(false);
			dialog.open();
			Path file = folder.resolve("sheet.gapmaterial.csv");
			Files.write(file, content.getBytes(StandardCharsets.UTF_8));
			Text path = Workbench.find(dialog.getShell(), Text.class, text -> (text.getStyle() & SWT.READ_ONLY) == 0);
			path.setText(file.toString());
			Workbench.settle();
		}

		String error() {
			return dialog.getCurrentPage().getErrorMessage();
		}

		Combo units(String name) {
			return Workbench.find(dialog.getShell(), Combo.class, combo -> name.equals(combo.getToolTipText()));
		}

		@Override
		public void close() {
			dialog.close();
			Workbench.drain();
		}
	}

	@Test
	void anImportedMaterialIsInTheDesignAndOneUndoTakesItOut() throws Exception {
		byte[] before = DesignWriter.bytes(design);
		try (Import sheet = new Import(FILE)) {
			assertNull(sheet.error());
			assertTrue(sheet.wizard.canFinish());
			Pictures.of(sheet.dialog.getShell(), "import-material-light");
			assertTrue(sheet.wizard.performFinish());
		}
		Material material = design.getMaterials().get(design.getMaterials().size() - 1);
		assertEquals("Sheet ferrite", material.getName());
		assertEquals(1, material.getOtherCurves().size());
		assertNotNull(material.getLoss());
		Text name = Workbench.find(Workbench.shell(), Text.class, text -> "Sheet ferrite".equals(text.getText()));
		assertTrue(name.isVisible(), "it is shown on its page");
		assertTrue(editor.isDirty());
		editor.session().history().undo();
		assertArrayEquals(before, DesignWriter.bytes(design));
		assertFalse(editor.isDirty());
	}

	@Test
	void aFileWithErrorsNamesEachLineAndIsNotTaken() throws Exception {
		byte[] before = DesignWriter.bytes(design);
		try (Import sheet = new Import(FILE.replace("point,200,0.38", "point,200,0,38").replace("curie,215 °C", "curie,215"))) {
			assertFalse(sheet.wizard.canFinish());
			assertEquals("The file has 2 errors and is not read.", sheet.error());
			Table table = Workbench.find(sheet.dialog.getShell(), Table.class, Table::isVisible);
			assertEquals("8", table.getItem(0).getText(0));
			assertEquals("13", table.getItem(0).getText(1));
			assertEquals("17", table.getItem(1).getText(0));
			assertTrue(table.getItem(1).getText(2).contains("needs a unit"));
			Pictures.of(sheet.dialog.getShell(), "import-material-errors");
		}
		assertArrayEquals(before, DesignWriter.bytes(design));
	}

	@Test
	void figuresInOerstedAreOfferedAsSuchAndOnlyAClickConvertsThem() throws Exception {
		String oersted = "gapwright-material,1\nname,Old sheet\nunits,A/m,T\npoint,0.5,1100\npoint,2.5,3200\npoint,15,3950\nsaturation,25 °C,0.39 T\n";
		try (Import sheet = new Import(oersted)) {
			Link offers = Workbench.find(sheet.dialog.getShell(), Link.class, Link::isVisible);
			assertTrue(offers.getText().contains("Oe"), offers.getText());
			assertEquals("as the file says", sheet.units("Unit of field strengths without one").getText());
			Pictures.of(sheet.dialog.getShell(), "import-material-units");
			String offer = offers.getText().replaceAll("(?s).*href=\"(\\d+)\">Read them in Oe and G<.*", "$1");
			Event click = new Event();
			click.text = offer;
			offers.notifyListeners(SWT.Selection, click);
			Workbench.settle();
			assertEquals("Oe", sheet.units("Unit of field strengths without one").getText());
			assertFalse(offers.isVisible());
			assertTrue(sheet.wizard.performFinish());
		}
		TableCurve table = (TableCurve) design.getMaterials().get(design.getMaterials().size() - 1).getCurve();
		// 15 Oe and 3950 G, by the definitions of both
		assertEquals(1193.66, table.getPoints().get(2).getFieldStrength().si(), 0.01);
		assertEquals(0.395, table.getPoints().get(2).getFluxDensity().si(), 1e-12);
	}

	@Test
	void withoutAFileThereIsNothingToFinishAndAMissingOneIsSaid() throws Exception {
		try (Import sheet = new Import("")) {
			assertFalse(sheet.wizard.canFinish());
			Text path = Workbench.find(sheet.dialog.getShell(), Text.class, text -> (text.getStyle() & SWT.READ_ONLY) == 0);
			path.setText(folder.resolve("nowhere.csv").toString());
			assertTrue(sheet.error().startsWith("The file cannot be read"), sheet.error());
		}
	}

	@Test
	void aHotCurveTypedOnThePageChangesTheInductanceAndUndoTakesItBack() {
		editor.reveal(design.getMaterials().get(0));
		byte[] before = DesignWriter.bytes(design);
		double inductance = inductance();
		Combo which = Workbench.find(Workbench.shell(), Combo.class, combo -> combo.indexOf("Curve at 100 °C") > 0);
		Forms.choose(which, "Curve at 100 °C");
		assertEquals("100 °C", Forms.text(CURVE_AT_TEMPERATURE__TEMPERATURE).getText());
		Forms.enter(Forms.text(KNEE_CURVE__SATURATION_POLARISATION), "0.42 T");
		Workbench.await("an earlier knee, less inductance at full load", () -> inductance() < inductance);
		assertEquals(0.569, ((KneeCurve) design.getMaterials().get(0).getCurve()).getSaturationPolarisation().si(), "the cold curve stays");
		editor.session().history().undo();
		assertArrayEquals(before, DesignWriter.bytes(design));
	}

	@Test
	void aFurtherTemperatureStartsAsACopyAndIsShownAtOnce() {
		editor.reveal(design.getMaterials().get(0));
		Forms.click(Forms.button("Add temperature"));
		Workbench.await("a second curve", () -> design.getMaterials().get(0).getOtherCurves().size() == 2);
		assertEquals("175 °C", Forms.text(CURVE_AT_TEMPERATURE__TEMPERATURE).getText());
		Forms.click(Forms.button("Remove temperature"));
		Workbench.await("the first curves", () -> design.getMaterials().get(0).getOtherCurves().size() == 1);
	}

	/** Methods' own example: MnZn, µi 2300, 0.49 T at 1200 A/m leads to 0.569 T; undone byte for byte. */
	@Test
	void aKneeCurveIsLedThroughASheetsPoint() {
		editor.reveal(design.getMaterials().get(0));
		Forms.enter(Forms.text(KNEE_CURVE__SATURATION_POLARISATION), "0.5 T");
		byte[] before = DesignWriter.bytes(design);
		Display display = Workbench.shell().getDisplay();
		display.timerExec(500, () -> {
			Shell dialog = display.getActiveShell();
			Pictures.of(dialog, "sheet-point");
			Text entry = Workbench.find(dialog, Text.class, text -> (text.getStyle() & SWT.READ_ONLY) == 0);
			entry.setText("0.49 T at 1200");
			assertFalse(Workbench.find(dialog, Button.class, button -> "OK".equals(button.getText())).isEnabled());
			entry.setText("0.49 T at 1200 A/m");
			Workbench.find(dialog, Button.class, button -> "OK".equals(button.getText())).notifyListeners(SWT.Selection, new Event());
		});
		Forms.button("Through a sheet's point…").notifyListeners(SWT.Selection, new Event());
		KneeCurve curve = (KneeCurve) design.getMaterials().get(0).getCurve();
		assertEquals(0.569, curve.getSaturationPolarisation().si(), 5e-4);
		editor.session().history().undo();
		assertArrayEquals(before, DesignWriter.bytes(design));
	}

	@Test
	void aCurieTemperatureBelowThePointsTakesItsNumbersAway() {
		editor.reveal(design.getMaterials().get(0));
		Forms.enter(Forms.text(MATERIAL__CURIE_TEMPERATURE), "90 degC");
		Workbench.await("no numbers above the Curie temperature",
				() -> editor.session().result().findings().stream().anyMatch(each -> each.code().equals("above-curie")));
	}

	@Test
	void everyPlotCanBeLookedAtInBothThemes() {
		for (String theme : List.of("light", "dark")) {
			theme(theme.equals("dark") ? "org.eclipse.e4.ui.css.theme.e4_dark" : "org.eclipse.e4.ui.css.theme.e4_default");
			editor.reveal(design.getMaterials().get(0));
			Combo kind = Workbench.find(Workbench.shell(), Combo.class, combo -> combo.indexOf("B against H") == 0);
			for (String each : kind.getItems()) {
				Forms.choose(kind, each);
				Pictures.of(Workbench.shell(), "material-" + each.toLowerCase().replace(' ', '-') + "-" + theme);
			}
			Text temperatures = Workbench.find(Workbench.shell(), Text.class, text -> text.getMessage().equals("those given"));
			Forms.typeOver(temperatures, "60");
			Workbench.await("the unit asked for", () -> Forms.says("needs a unit"));
			Workbench.type(" degC");
			Workbench.await("a plot at 60 °C", () -> !Forms.says("needs a unit"));
			temperatures.setText("");
			Forms.choose(kind, "B against H");
		}
	}

	private double inductance() {
		return editor.session().pointResult().inductance().differential()[0][0];
	}
}
