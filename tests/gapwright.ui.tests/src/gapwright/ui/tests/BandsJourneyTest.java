package gapwright.ui.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;

import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableColumn;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

import gapwright.model.Design;
import gapwright.model.TolerancedFeature;
import gapwright.model.edit.DesignEdits;
import gapwright.model.edit.ToleranceEdits;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;
import gapwright.study.tolerance.Band;
import gapwright.ui.editor.DesignEditor;
import gapwright.ui.fields.FigureFormat;
import gapwright.ui.session.DesignSession;
import gapwright.ui.views.LegLedger;
import gapwright.ui.views.ToleranceView;
import gapwright.ui.views.WindingLedger;

/** A designer has the tolerances worked out and finds what they do beside the figures of legs and windings. */
class BandsJourneyTest {

	private DesignSession session;

	@BeforeEach
	void start() throws Exception {
		Workbench.start();
		DesignEditor editor = Workbench.open(Workbench.example("boost-choke.gapwright"));
		session = editor.session();
		Design design = session.design();
		for (var old : List.copyOf(design.getTolerances())) {
			session.history().run(DesignEdits.delete(List.of(old)));
		}
		session.history().run(ToleranceEdits.add(design, List.of(design.getLegs().get(0).getGaps().get(0)), TolerancedFeature.GAP_LENGTH,
				Quantity.parse("0.05 mm", Dimension.DEVIATION)));
		Workbench.settle();
	}

	@AfterEach
	void end() {
		Workbench.closeAll();
	}

	private static List<String> texts(String title) {
		Table table = Forms.table(title);
		int column = Arrays.stream(table.getColumns()).map(TableColumn::getText).toList().indexOf(title);
		return Arrays.stream(table.getItems()).map(item -> item.getText(column)).toList();
	}

	private List<String> bands(Band.Kind kind) {
		return session.pointBands().bands().stream().filter(band -> band.kind() == kind)
				.map(band -> kind == Band.Kind.INDUCTANCE ? FigureFormat.si(band.cornerHigh(), "H") : FigureFormat.percent(band.cornerHigh())).toList();
	}

	@Test
	void bandsStandInBothLedgersUntilTheNextEdit() throws Exception {
		Workbench.page().showView(LegLedger.ID);
		Workbench.drain();
		assertEquals(List.of(FigureFormat.NONE), texts("Worst use").stream().distinct().toList(), "nothing is worked out yet");
		Workbench.page().showView(ToleranceView.ID);
		Workbench.drain();
		Forms.click(Forms.button("Run"));
		Workbench.await("bands", () -> session.bands() != null);
		Workbench.page().showView(LegLedger.ID);
		Workbench.drain();
		assertEquals(bands(Band.Kind.UTILISATION), texts("Worst use"));
		assertTrue(texts("Chance over").stream().allMatch(text -> text.endsWith("%")), texts("Chance over").toString());
		Pictures.of(Workbench.shell(), "bands-legs");
		Workbench.page().showView(WindingLedger.ID);
		Workbench.drain();
		assertEquals(bands(Band.Kind.INDUCTANCE), texts("Greatest L"));
		Workbench.page().showView(ToleranceView.ID);
		Workbench.drain();
		assertTrue(Forms.table("Worst low").getItemCount() > 0, "what was worked out is still shown");
		Pictures.of(Workbench.shell(), "bands-view");
		session.history().undo();
		Workbench.page().showView(LegLedger.ID);
		Workbench.drain();
		assertNull(session.bands(), "no band outlives the edit that made it old");
		assertEquals(List.of(FigureFormat.NONE), texts("Worst use").stream().distinct().toList());
	}
}
