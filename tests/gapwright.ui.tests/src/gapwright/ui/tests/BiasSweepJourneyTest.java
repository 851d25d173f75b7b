package gapwright.ui.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.List;

import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Text;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

import gapwright.model.GapwrightPackage.Literals;
import gapwright.model.Leg;
import gapwright.model.edit.DesignEdits;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;
import gapwright.ui.editor.DesignEditor;
import gapwright.ui.plot.Plot;
import gapwright.ui.plot.PlotCanvas;
import gapwright.ui.plot.PlotExport;
import gapwright.ui.views.BiasSweepView;

/** A designer asks what inductance is left at a bias, and from which current a leg saturates. */
class BiasSweepJourneyTest {

	private DesignEditor editor;

	@BeforeEach
	void start() throws Exception {
		Workbench.start();
		editor = Workbench.open(Workbench.example("boost-choke.gapwright"));
		Workbench.page().showView(BiasSweepView.ID);
		Workbench.await("a sweep", () -> shown(0) != null && shown(1) != null);
	}

	@AfterEach
	void end() {
		Workbench.closeAll();
	}

	private static PlotCanvas canvas(int number) {
		String name = number == 0 ? "Inductance in" : "Flux density";
		return Workbench.find(Workbench.shell(), PlotCanvas.class, canvas -> canvas.plot() == null ? number == 0
				: (canvas.plot().y().title() + " in").startsWith(name));
	}

	private static Plot shown(int number) {
		try {
			return canvas(number).plot();
		} catch (AssertionError e) {
			return null;
		}
	}

	/** The plotted line goes through what the operating point has. */
	@Test
	void thePlotGoesThroughTheFiguresOfTheOperatingPoint() {
		Plot.Line line = shown(0).lines().get(0);
		double current = editor.session().pointResult().winding("main").current();
		double below = 0;
		double above = 0;
		for (int i = 1; i < line.x().length; i++) {
			if (line.x()[i - 1] <= current && line.x()[i] >= current) {
				below = line.y()[i];
				above = line.y()[i - 1];
			}
		}
		double inductance = editor.session().pointResult().inductance().of("main");
		assertTrue(inductance >= below && inductance <= above, below + " " + inductance + " " + above);
		assertEquals(2, shown(1).spots().size(), "near from, over from");
		Pictures.of(Workbench.shell(), "bias-sweep");
	}

	@Test
	void anEditGivesAnotherPlotAndUndoTheFirstAgain() {
		double before = shown(0).lines().get(0).y()[0];
		editor.session().history().run(DesignEdits.set("Lengthen gap", editor.session().design().getLegs().get(0).getGaps().get(0),
				Literals.GAP__LENGTH, Quantity.parse("2 mm", Dimension.LENGTH)));
		Workbench.await("a sweep of the longer gap", () -> shown(0) != null && shown(0).lines().get(0).y()[0] < before);
		editor.session().history().undo();
		Workbench.await("the sweep as before", () -> shown(0) != null && shown(0).lines().get(0).y()[0] == before);
	}

	@Test
	void theRangeIsTypedWithItsUnitAndAWrongOneIsSaid() {
		Text to = Workbench.find(Workbench.shell(), Text.class, text -> text.getToolTipText() != null && text.getToolTipText().startsWith("Where it ends"));
		Forms.enter(to, "40 A");
		Workbench.await("a sweep to 40 A", () -> shown(0) != null && shown(0).x().to() == 40);
		Forms.enter(to, "40");
		Workbench.await("no plot", () -> canvas(0).plot() == null);
		Forms.enter(to, "-30 A");
		Workbench.await("a sweep to -30 A", () -> shown(0) != null && shown(0).x().from() == -30);
	}

	@Test
	void theLegSelectedOnTheCanvasIsTheOneShown() {
		Leg leg = editor.session().design().getLegs().get(3);
		editor.session().selection().select(List.of(leg), this);
		Workbench.await("one leg", () -> shown(1) != null && shown(1).lines().size() == 1);
		assertEquals(leg.getName(), shown(1).lines().get(0).name());
	}

	@Test
	void arrowKeysReadTheLinesOutAndPlusZooms() {
		Workbench.focus(canvas(0));
		Workbench.key(SWT.HOME, 0);
		Workbench.key(SWT.ARROW_RIGHT, 0);
		double whole = shown(0).x().to() - shown(0).x().from();
		Workbench.type("+");
		assertTrue(shown(0).x().to() - shown(0).x().from() < whole);
		Workbench.type("0");
		assertEquals(whole, shown(0).x().to() - shown(0).x().from(), 1e-12);
	}

	@Test
	void bothPlotsGoIntoOnePicture() {
		List<Plot> plots = List.of(shown(0), shown(1));
		String svg = PlotExport.svg(plots, "sweep");
		assertTrue(svg.startsWith("<?xml") && svg.contains("differential") && svg.contains("saturation"), svg.substring(0, 200));
		byte[] png = PlotExport.png(plots, Workbench.shell().getDisplay());
		assertNotEquals(0, png.length);
		assertEquals("PNG", new String(png, 1, 3, StandardCharsets.US_ASCII));
	}
}
