package gapwright.ui.session;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.concurrent.BlockingQueue;
import java.util.concurrent.LinkedBlockingQueue;

import org.junit.jupiter.api.Test;

import gapwright.library.template.CoreSketch;
import gapwright.model.Coil;
import gapwright.model.Design;
import gapwright.model.GapwrightPackage.Literals;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.OperatingPoint;
import gapwright.model.Winding;
import gapwright.model.edit.DesignEdits;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;
import gapwright.study.Study;

/** Figures on the screen belong to the design as it stands, whatever is edited while the solver runs. */
class DesignSessionTest {

	private static final Quantity DEPTH = Quantity.parse("10 mm", Dimension.LENGTH);

	/** What would run on the user interface's thread, in the order it was handed over. */
	private final BlockingQueue<Runnable> waiting = new LinkedBlockingQueue<>();

	/** A ladder of so many rungs with a wound one. */
	private static Design ladder(int rungs) {
		CoreSketch sketch = new CoreSketch("ladder").material("mnzn-power-ferrite");
		Joint above = null;
		Joint below = null;
		Leg first = null;
		for (int k = 0; k < rungs; k++) {
			Joint top = sketch.joint("t" + k, 30 * k, 0);
			Joint bottom = sketch.joint("b" + k, 30 * k, 60);
			Leg rung = sketch.leg("rung" + k, "", bottom, top, 8, DEPTH);
			first = first == null ? rung : first;
			if (above != null) {
				sketch.leg("top" + k, "", above, top, 8, DEPTH);
				sketch.leg("bottom" + k, "", bottom, below, 8, DEPTH);
			}
			above = top;
			below = bottom;
		}
		Winding winding = sketch.winding("main", "main");
		sketch.coil(winding, first, 20, 0.5);
		OperatingPoint point = sketch.operatingPoint("full", "full", Quantity.parse("25 °C", Dimension.TEMPERATURE));
		Quantity none = Quantity.parse("0 A", Dimension.CURRENT);
		sketch.current(point, winding, Quantity.parse("5 A", Dimension.CURRENT), none);
		return sketch.design();
	}

	private static void wind(DesignSession session, int turns) {
		Coil coil = session.design().getWindings().get(0).getCoils().get(0);
		session.history().run(DesignEdits.set("Change turns", coil, Literals.COIL__TURNS, turns));
	}

	@Test
	void aSmallDesignIsSolvedBeforeAnythingIsPainted() {
		DesignSession session = new DesignSession(ladder(4), waiting::add);
		double before = session.pointResult().leg("rung0").flux();
		wind(session, 40);
		assertNotEquals(before, session.pointResult().leg("rung0").flux());
		assertTrue(waiting.isEmpty());
		session.dispose();
	}

	@Test
	void anAnswerToAnOlderEditIsNeverShownAndNoEditIsLost() throws InterruptedException {
		DesignSession session = new DesignSession(ladder(900), waiting::add);
		assertNull(session.result(), "nothing is shown before it is computed");
		Runnable old = waiting.take();
		wind(session, 40);
		assertNull(session.result());
		old.run();
		assertNull(session.result(), "the answer to the older design was shown");
		waiting.take().run();
		assertNotNull(session.result());
		assertEquals(40, session.design().getWindings().get(0).getCoils().get(0).getTurns());
		double expected = Study.of(session.design()).operatingPoints().get(0).leg("rung0").flux();
		assertEquals(expected, session.pointResult().leg("rung0").flux(), 1e-12 * Math.abs(expected));

		session.history().undo();
		assertNull(session.result(), "figures of the edit taken back are shown");
		waiting.take().run();
		assertEquals(20, session.design().getWindings().get(0).getCoils().get(0).getTurns());
		double undone = Study.of(session.design()).operatingPoints().get(0).leg("rung0").flux();
		assertEquals(undone, session.pointResult().leg("rung0").flux(), 1e-12 * Math.abs(undone));
		session.dispose();
	}

	@Test
	void manyEditsInARowEndWithTheFiguresOfTheLast() throws InterruptedException {
		DesignSession session = new DesignSession(ladder(900), waiting::add);
		for (int turns = 21; turns <= 60; turns++) {
			wind(session, turns);
			assertNull(session.result());
		}
		while (session.result() == null) {
			waiting.take().run();
		}
		double expected = Study.of(session.design()).operatingPoints().get(0).leg("rung0").flux();
		assertEquals(expected, session.pointResult().leg("rung0").flux(), 1e-12 * Math.abs(expected));
		session.dispose();
	}
}
