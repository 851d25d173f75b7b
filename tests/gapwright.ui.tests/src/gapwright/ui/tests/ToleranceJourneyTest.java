package gapwright.ui.tests;

import static gapwright.model.GapwrightPackage.Literals.TOLERANCE__DEVIATION;
import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;

import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableColumn;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

import gapwright.model.Design;
import gapwright.model.DesignWriter;
import gapwright.model.TolerancedFeature;
import gapwright.ui.editor.DesignEditor;
import gapwright.ui.plot.PlotCanvas;
import gapwright.ui.views.SensitivityView;
import gapwright.ui.views.ToleranceView;

/** A designer gives tolerances, sees what they do, and asks what matters most. */
class ToleranceJourneyTest {

	private static final int PAGE = 5;

	private DesignEditor editor;
	private Design design;

	@BeforeEach
	void start() throws Exception {
		Workbench.start();
		editor = Workbench.open(Workbench.example("flyback-transformer.gapwright"));
		design = editor.session().design();
	}

	@AfterEach
	void end() {
		Workbench.closeAll();
	}

	private static String cell(Table table, int row, String heading) {
		return table.getItem(row).getText(Arrays.stream(table.getColumns()).map(TableColumn::getText).toList().indexOf(heading));
	}

	@Test
	void tolerancesAreAddedTypedRunAndUndone() throws Exception {
		byte[] before = DesignWriter.bytes(design);
		editor.showPage(PAGE);
		Workbench.drain();
		Forms.click(Forms.button("Add"));
		assertEquals(TolerancedFeature.GAP_LENGTH, design.getTolerances().get(0).getFeature());
		Forms.enter(Forms.text(TOLERANCE__DEVIATION), "0.04 mm");
		assertEquals("0.04 mm", design.getTolerances().get(0).getDeviation().text());
		Forms.enter(Forms.text(TOLERANCE__DEVIATION), "0.04 A m");
		assertEquals("0.04 mm", design.getTolerances().get(0).getDeviation().text());
		Workbench.key(SWT.ESC, 0);
		Workbench.page().showView(ToleranceView.ID);
		Workbench.settle();
		Forms.click(Forms.button("Run"));
		Workbench.await("bands", () -> Forms.table("± slopes").getItemCount() > 0);
		Table table = Forms.table("± slopes");
		assertTrue(cell(table, 0, "Figure").startsWith("L of"), cell(table, 0, "Figure"));
		assertFalse(cell(table, 0, "Worst low").equals(cell(table, 0, "Worst high")));
		PlotCanvas histogram = Workbench.find(Workbench.shell(), PlotCanvas.class, canvas -> canvas.plot() != null && !canvas.plot().bars().isEmpty());
		assertEquals(1, histogram.plot().bars().stream().mapToDouble(bar -> bar.y()).sum(), 1e-9);
		Pictures.of(Workbench.shell(), "tolerances");
		// an edit empties the view: nothing of an earlier state is left standing
		editor.session().history().undo();
		Workbench.settle();
		assertEquals(0, Forms.table("± slopes").getItemCount());
		while (editor.session().history().canUndo()) {
			editor.session().history().undo();
		}
		assertArrayEquals(before, DesignWriter.bytes(design));
	}

	@Test
	void whatMattersMostStandsFirstAndAnotherFigureIsChosen() throws Exception {
		Workbench.page().showView(SensitivityView.ID);
		Workbench.await("sensitivities", () -> Forms.table("% per %").getItemCount() > 5);
		Table table = Forms.table("% per %");
		double before = Double.POSITIVE_INFINITY;
		for (int i = 0; i < 6; i++) {
			double effect = Math.abs(number(cell(table, i, "% per %")));
			assertTrue(effect <= before + 1e-9, i + ": " + effect);
			before = effect;
		}
		Combo figure = Workbench.find(Workbench.shell(), Combo.class, combo -> combo.getItemCount() > 0 && combo.getItem(0).startsWith("inductance of"));
		String first = cell(table, 0, "Value") + cell(table, 0, "% per %");
		Forms.choose(figure, figure.getItem(figure.getItemCount() - 1));
		assertTrue(figure.getText().startsWith("utilisation of"));
		assertFalse(first.equals(cell(table, 0, "Value") + cell(table, 0, "% per %")));
		Pictures.of(Workbench.shell(), "sensitivity");
	}

	private static double number(String shown) {
		String[] parts = shown.replace('−', '-').split("·10");
		double factor = parts.length == 1 ? 1 : Math.pow(10, Integer.parseInt(parts[1].replace("⁻", "-").chars()
				.mapToObj(c -> c == '-' ? "-" : Integer.toString("⁰¹²³⁴⁵⁶⁷⁸⁹".indexOf(c))).reduce("", String::concat)));
		return Double.parseDouble(parts[0]) * factor;
	}
}
