package gapwright.ui.tests;

import static gapwright.model.GapwrightPackage.Literals.CONNECTION_KIND;
import static gapwright.model.GapwrightPackage.Literals.WINDING_CONNECTION__KIND;
import static gapwright.model.GapwrightPackage.Literals.WINDING_LEAKAGE__SEPARATION;
import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.eclipse.swt.SWT;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

import gapwright.model.ConnectionKind;
import gapwright.model.Design;
import gapwright.model.DesignWriter;
import gapwright.study.LeakageResult;
import gapwright.ui.editor.DesignEditor;
import gapwright.ui.fields.FeatureText;
import gapwright.ui.fields.FigureFormat;

/** A designer tells how two windings lie beside one another and reads what couples them. */
class CouplingsJourneyTest {

	private DesignEditor editor;
	private Design design;

	@BeforeEach
	void start() throws Exception {
		Workbench.start();
		editor = Workbench.open(Workbench.example("flyback-transformer.gapwright"));
		design = editor.session().design();
		editor.reveal(design.getWindings().get(0));
		editor.showPage(2);
		Workbench.drain();
	}

	@AfterEach
	void end() {
		Workbench.closeAll();
	}

	@Test
	void theInsulationBetweenIsTypedAndTheCouplingRead() {
		byte[] before = DesignWriter.bytes(design);
		editor.reveal(design.getLeakages().get(0));
		Workbench.await("figures", () -> Forms.says("Coupling k"));
		double tight = leakage(0).inductance();
		Forms.enter(Forms.text(WINDING_LEAKAGE__SEPARATION), "1 mm");
		assertTrue(leakage(0).inductance() > tight, "more insulation between, more leakage");
		assertTrue(Math.abs(leakage(0).coupling()) < 1);
		assertTrue(Forms.says(FigureFormat.si(leakage(0).inductance(), "H")), "the figure on the page is the newest");
		Pictures.of(Workbench.shell(), "couplings-leakage");
		Workbench.key('z', SWT.MOD1);
		assertArrayEquals(before, DesignWriter.bytes(design));
		assertEquals(tight, leakage(0).inductance());
	}

	@Test
	void aLeakageIsAddedAndRemoved() {
		byte[] before = DesignWriter.bytes(design);
		Forms.click(Forms.button("Add leakage"));
		assertEquals(2, design.getLeakages().size());
		assertEquals(2, editor.session().pointResult().leakages().size());
		Forms.click(Forms.button("Remove"));
		assertArrayEquals(before, DesignWriter.bytes(design));
	}

	private LeakageResult leakage(int index) {
		return editor.session().pointResult().leakages().get(index);
	}

	@Test
	void windingsAreJoinedInSeriesAndInParallel() {
		Forms.click(Forms.button("Connect"));
		assertEquals(2, design.getConnections().get(0).getMembers().size());
		Workbench.await("figures", () -> Forms.says("Inductance together"));
		double series = editor.session().pointResult().connections().get(0).inductance();
		assertTrue(series > 0);
		Pictures.of(Workbench.shell(), "couplings-connection");
		Forms.choose(Forms.combo(WINDING_CONNECTION__KIND), FeatureText.label(CONNECTION_KIND, ConnectionKind.PARALLEL));
		assertEquals(ConnectionKind.PARALLEL, design.getConnections().get(0).getKind());
		Workbench.drain();
		assertTrue(Forms.says("Nothing is computed"), "turns of a transformer differ: no figure, and the page says so");
	}
}
