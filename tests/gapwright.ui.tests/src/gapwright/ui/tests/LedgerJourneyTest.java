package gapwright.ui.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;

import org.eclipse.swt.SWT;
import org.eclipse.swt.dnd.Clipboard;
import org.eclipse.swt.dnd.TextTransfer;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableColumn;
import org.eclipse.swt.widgets.TableItem;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

import gapwright.model.Design;
import gapwright.model.edit.DesignEdits;
import gapwright.study.LegResult;
import gapwright.study.LegState;
import gapwright.study.OperatingPointResult;
import gapwright.ui.editor.DesignEditor;
import gapwright.ui.fields.FigureFormat;
import gapwright.ui.views.LegLedger;
import gapwright.ui.views.WindingLedger;

/** A designer at the ledgers. */
class LedgerJourneyTest {

	private static final String UTILISATION = "Of saturation";

	private DesignEditor editor;
	private Design design;

	@BeforeEach
	void start() throws Exception {
		Workbench.start();
	}

	@AfterEach
	void end() {
		Workbench.closeAll();
	}

	private Table open(String example, String view) throws Exception {
		editor = Workbench.open(Workbench.example(example));
		design = editor.session().design();
		Workbench.page().showView(view);
		Workbench.settle();
		return Forms.table(view.equals(LegLedger.ID) ? UTILISATION : "Linkage");
	}

	private static int column(Table table, String title) {
		return Arrays.stream(table.getColumns()).map(TableColumn::getText).toList().indexOf(title);
	}

	private static List<String> texts(Table table, String title) {
		int column = column(table, title);
		return Arrays.stream(table.getItems()).map(item -> item.getText(column)).toList();
	}

	@Test
	void everyLegStandsThereWithTheFiguresOfTheStudy() throws Exception {
		Table table = open("three-phase-reactor.gapwright", LegLedger.ID);
		OperatingPointResult point = editor.session().pointResult();
		assertEquals(design.getLegs().size(), table.getItemCount());
		assertEquals(point.legs().stream().map(LegResult::utilisation).map(FigureFormat::percent).toList(), texts(table, UTILISATION));
		assertEquals(point.legs().stream().map(LegResult::fluxDensity).map(FigureFormat::fluxDensity).toList(), texts(table, "B"));
	}

	@Test
	void anotherOperatingPointChangesTheFiguresAndStatesAreSaidInWords() throws Exception {
		Table table = open("three-phase-reactor.gapwright", LegLedger.ID);
		var worst = design.getOperatingPoints().stream().filter(point -> editor.session().result().operatingPoint(point.getId()).legs().stream()
				.anyMatch(leg -> leg.state() == LegState.OVER)).findFirst().orElseThrow();
		List<String> before = texts(table, "B");
		editor.session().choose(worst);
		Workbench.settle();
		assertTrue(!before.equals(texts(table, "B")));
		assertTrue(texts(table, "State").contains("over"), texts(table, "State").toString());
	}

	@Test
	void aClickedRowSelectsTheLegAndASelectedLegItsRow() throws Exception {
		Table table = open("boost-choke.gapwright", LegLedger.ID);
		Rectangle cell = table.getItem(2).getBounds(0);
		Workbench.click(table, cell.x + 20, cell.y + cell.height / 2);
		assertEquals(List.of(design.getLegs().get(2)), editor.session().selection().selected());
		editor.session().selection().select(List.of(design.getLegs().get(4)), this);
		assertEquals(List.of(table.getItem(4)), Arrays.asList(table.getSelection()));
		editor.session().selection().select(List.of(design.getLegs().get(0).getGaps().get(0)), this);
		assertEquals(List.of(table.getItem(0)), Arrays.asList(table.getSelection()), "a gap shows its leg");
	}

	@Test
	void aHeadingSortsUpThenDownThenAsInTheDesign() throws Exception {
		Table table = open("boost-choke.gapwright", LegLedger.ID);
		List<String> inOrder = texts(table, "Leg");
		sort(table, UTILISATION);
		List<Double> up = utilisations();
		assertEquals(up.stream().sorted().map(FigureFormat::percent).toList(), texts(table, UTILISATION));
		sort(table, UTILISATION);
		assertEquals(up.stream().sorted((a, b) -> Double.compare(b, a)).map(FigureFormat::percent).toList(), texts(table, UTILISATION));
		sort(table, UTILISATION);
		assertEquals(inOrder, texts(table, "Leg"));
	}

	private List<Double> utilisations() {
		return editor.session().pointResult().legs().stream().map(LegResult::utilisation).toList();
	}

	private static void sort(Table table, String title) {
		table.getColumn(column(table, title)).notifyListeners(SWT.Selection, new Event());
		Workbench.settle();
	}

	@Test
	void whatIsCopiedHasHeadingsWithUnitsAndFullPrecision() throws Exception {
		Table table = open("boost-choke.gapwright", LegLedger.ID);
		Workbench.focus(table);
		table.deselectAll();
		Workbench.key('c', SWT.MOD1);
		Clipboard clipboard = new Clipboard(table.getDisplay());
		String copied = (String) clipboard.getContents(TextTransfer.getInstance());
		clipboard.dispose();
		String[] lines = copied.split("\n");
		assertEquals(1 + design.getLegs().size(), lines.length, copied);
		List<String> headings = List.of(lines[0].split("\t"));
		int b = headings.indexOf("B [T]");
		assertTrue(b > 0, lines[0]);
		assertEquals(editor.session().pointResult().legs().get(0).fluxDensity(), Double.parseDouble(lines[1].split("\t")[b]));
	}

	@Test
	void theWindingLedgerShowsTheInductancesAndTheirMatrix() throws Exception {
		Table table = open("coupled-choke.gapwright", WindingLedger.ID);
		double[][] matrix = editor.session().pointResult().inductance().differential();
		assertEquals(FigureFormat.si(matrix[0][0], "H"), texts(table, "Differential L").get(0));
		Table matrixTable = Workbench.find(Workbench.shell(), Table.class, each -> each != table && each.getColumnCount() == 1 + matrix.length
				&& each.getColumn(0).getText().equals("Differential L"));
		TableItem first = matrixTable.getItem(0);
		assertTrue(first.getText(2).startsWith(FigureFormat.si(matrix[0][1], "H")), first.getText(2));
		assertTrue(first.getText(2).contains("k "), "the coupling stands beside it");
	}

	@Test
	void aDesignWithoutOperatingPointExplainsWhyThereAreNoFigures() throws Exception {
		Table table = open("output-choke-toroid.gapwright", LegLedger.ID);
		editor.session().history().run(DesignEdits.delete(design.getOperatingPoints()));
		Workbench.settle();
		assertEquals(0, table.getItemCount(), "no figure of before is left");
		assertTrue(Forms.says("no operating point"));
		editor.session().history().undo();
		Workbench.settle();
		assertEquals(design.getLegs().size(), table.getItemCount());
	}

	@Test
	void aDesignOfManyLegsShowsTheFirstOfThemSaysSoAndCopiesAll() throws Exception {
		editor = Workbench.open(Workbench.file("lattice.gapwright", Lattice.bytes(35)));
		design = editor.session().design();
		Workbench.page().showView(LegLedger.ID);
		Workbench.await("the result", () -> editor.session().pointResult() != null);
		Table table = Forms.table(UTILISATION);
		assertTrue(design.getLegs().size() > 2000);
		assertEquals(2000, table.getItemCount());
		assertTrue(Forms.says("the first 2000 of " + design.getLegs().size() + " rows"));
		Workbench.focus(table);
		table.deselectAll();
		Workbench.key('c', SWT.MOD1);
		Clipboard clipboard = new Clipboard(table.getDisplay());
		String copied = (String) clipboard.getContents(TextTransfer.getInstance());
		clipboard.dispose();
		assertEquals(1 + design.getLegs().size(), copied.split("\n").length);
	}

	@Test
	void withoutAnEditorTheViewSaysWhatToOpen() throws Exception {
		open("boost-choke.gapwright", LegLedger.ID);
		Workbench.closeAll();
		assertTrue(Forms.says("Open a Gapwright design"));
	}
}
