package gapwright.ui.tests;

import static gapwright.model.GapwrightPackage.Literals.DESIGN__NOTES;
import static gapwright.model.GapwrightPackage.Literals.GAP__LENGTH;
import static gapwright.model.GapwrightPackage.Literals.LEG__DIAMETER;
import static gapwright.model.GapwrightPackage.Literals.LEG__SHAPE;
import static gapwright.model.GapwrightPackage.Literals.LEG__WIDTH;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.swt.SWT;
import org.eclipse.ui.IPageLayout;
import org.eclipse.ui.views.properties.PropertySheet;
import org.eclipse.ui.views.properties.tabbed.TabbedPropertySheetPage;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

import gapwright.model.Design;
import gapwright.model.Ids;
import gapwright.model.Leg;
import gapwright.study.LegResult;
import gapwright.ui.editor.DesignEditor;
import gapwright.ui.fields.FigureFormat;

/** A designer at the Properties view. */
class PropertiesJourneyTest {

	private DesignEditor editor;
	private Design design;

	@BeforeEach
	void start() throws Exception {
		Workbench.start();
		editor = Workbench.open(Workbench.example("boost-choke.gapwright"));
		design = editor.session().design();
		Workbench.view(IPageLayout.ID_PROP_SHEET, PropertySheet.class);
		Workbench.page().activate(editor);
	}

	@AfterEach
	void end() {
		Workbench.closeAll();
	}

	private Leg centre() {
		return (Leg) Ids.find(design, "centre-leg");
	}

	/** Selects an element and brings one tab of its properties to the front. */
	private void show(EObject element, String tab) {
		editor.reveal(element);
		Workbench.settle();
		PropertySheet sheet = (PropertySheet) Workbench.page().findView(IPageLayout.ID_PROP_SHEET);
		TabbedPropertySheetPage page = (TabbedPropertySheetPage) sheet.getCurrentPage();
		var tabs = page.getActiveTabs();
		for (int k = 0; k < tabs.length; k++) {
			if (tabs[k].getLabel().equals(tab)) {
				page.setSelectedTab(tabs[k].getId());
				Workbench.settle();
				return;
			}
		}
		throw new AssertionError("no tab " + tab + " among " + Arrays.stream(tabs).map(each -> each.getLabel()).toList());
	}

	@Test
	void aWidthTypedInPropertiesIsOneStepOnTheSameHistory() {
		double before = leg().fluxDensity();
		show(centre(), "Geometry");
		Forms.enter(Forms.text(LEG__WIDTH), "24mm");
		assertEquals(0.024, centre().getWidth().si());
		assertTrue(leg().fluxDensity() < before, "twice the iron, less flux density");
		assertEquals("Change leg width", editor.session().history().undoLabel());
		editor.session().history().undo();
		Workbench.settle();
		assertEquals("12 mm", Forms.text(LEG__WIDTH).getText());
	}

	private LegResult leg() {
		return editor.session().pointResult().leg("centre-leg");
	}

	@Test
	void onlyTheDimensionsOfTheSectionAreAskedFor() {
		show(centre(), "Geometry");
		Forms.choose(Forms.combo(LEG__SHAPE), "Round");
		assertTrue(Forms.text(LEG__DIAMETER).isVisible());
		assertThrows(AssertionError.class, () -> Forms.text(LEG__WIDTH));
	}

	@Test
	void aNegativeGapIsRefusedInPlace() {
		show(centre().getGaps().get(0), "Geometry");
		Forms.enter(Forms.text(GAP__LENGTH), "-1 mm");
		assertEquals("1.1 mm", centre().getGaps().get(0).getLength().text());
		assertTrue(Forms.says("cannot be negative"));
		Workbench.key(SWT.ESC, 0);
	}

	@Test
	void gapsOfALegAreEditedAndAddedOnOneTab() {
		show(centre(), "Gaps & magnet");
		Forms.enter(Forms.text(GAP__LENGTH), "0.9 mm");
		assertEquals("0.9 mm", centre().getGaps().get(0).getLength().text());
		Forms.click(Forms.button("Add gap"));
		assertEquals(2, centre().getGaps().size());
	}

	@Test
	void resultsFollowTheOperatingPointWithTheirOrigin() {
		show(centre(), "Results");
		assertTrue(Forms.says(FigureFormat.fluxDensity(leg().fluxDensity())));
		assertTrue(Forms.says("stacking factor"), "where it comes from");
		editor.session().choose(design.getOperatingPoints().get(1));
		Workbench.settle();
		assertTrue(Forms.says(FigureFormat.fluxDensity(leg().fluxDensity())));
	}

	@Test
	void everyFigureHasFormulaSourceValidityAndTheInputsUsed() {
		show(centre(), "Where from");
		assertTrue(Forms.says("B = Φ/(gross area × stacking factor)"));
		assertTrue(Forms.says("Source: Ampère's and Gauss's laws"));
		assertTrue(Forms.says("Valid: No hysteresis"));
		assertTrue(Forms.says("12 mm"), "the width that was typed");
		assertTrue(Forms.says("Knee, µi 2300.0, Js 0.438 T"), "the hot curve");
		Pictures.of(Workbench.shell(), "where-from");
	}

	@Test
	void withNothingSelectedTheDesignItselfIsShown() {
		editor.reveal(centre());
		editor.session().selection().select(List.of(), this);
		Workbench.settle();
		show(design, "Name");
		assertEquals(design.getNotes(), Forms.text(DESIGN__NOTES).getText());
	}
}
