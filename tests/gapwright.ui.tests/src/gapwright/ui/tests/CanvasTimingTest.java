package gapwright.ui.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.lang.management.ManagementFactory;
import java.lang.management.ThreadMXBean;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;

import org.eclipse.draw2d.FigureCanvas;
import org.eclipse.gef.GraphicalViewer;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Display;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

import gapwright.model.Design;
import gapwright.model.DesignWriter;
import gapwright.model.Joint;
import gapwright.model.edit.JointEdits;
import gapwright.model.edit.history.Gesture;
import gapwright.ui.editor.DesignEditor;
import gapwright.ui.session.DesignSession;

/**
 * Steps of a drag, each waited for until the canvas has painted its result. How long that takes is written to
 * target/canvas-timing.txt and judged by nobody here: releng/bench-canvas takes many steps on a quiet machine.
 */
class CanvasTimingTest {

	private static final Path FIGURES = Path.of("target/canvas-timing.txt");
	private static final int STEPS = Integer.parseInt(System.getenv().getOrDefault("GAPWRIGHT_STEPS", "20"));
	/** Steps until the machine code is made, not counted. */
	private static final int WARM = STEPS / 4;

	private static final ThreadMXBean CPU = ManagementFactory.getThreadMXBean();

	private boolean painted;

	@BeforeEach
	void start() throws Exception {
		Workbench.start();
	}

	@AfterEach
	void end() {
		Workbench.closeAll();
	}

	@Test
	void everyStepOfADragOverFiftyLegsIsPaintedWithItsOwnResult() throws Exception {
		drag(50);
	}

	@Test
	void everyStepOfADragOverFiveHundredLegsIsPaintedWithItsOwnResult() throws Exception {
		drag(500);
	}

	private void drag(int legs) throws Exception {
		Design ladder = Ladder.of(legs);
		assertEquals(legs, ladder.getLegs().size());
		DesignEditor editor = Workbench.open(Workbench.file("ladder-" + legs + ".gapwright", DesignWriter.bytes(ladder)));
		editor.showPage(0);
		DesignSession session = editor.session();
		FigureCanvas control = (FigureCanvas) editor.getAdapter(GraphicalViewer.class).getControl();
		Workbench.await("a result", () -> session.pointResult() != null);
		assertTrue(session.pointResult().converged());
		Display display = control.getDisplay();
		control.addListener(SWT.Paint, event -> painted = session.pointResult() != null);
		Joint joint = session.design().getJoints().get(2);
		Gesture gesture = session.history().begin();
		double[] shown = new double[STEPS];
		double[] busy = new double[STEPS];
		double former = Double.NaN;
		for (int step = 0; step < WARM + STEPS; step++) {
			double dx = 0.1 * (step % 10 + 1);
			painted = false;
			long cpu = CPU.getCurrentThreadCpuTime();
			long began = System.nanoTime();
			gesture.show(() -> JointEdits.move(List.of(joint), dx, 0));
			while (!painted) {
				display.readAndDispatch();
			}
			long done = System.nanoTime();
			long spent = CPU.getCurrentThreadCpuTime();
			double energy = session.pointResult().energy();
			assertNotEquals(former, energy, "the result follows the joint");
			former = energy;
			if (step >= WARM) {
				shown[step - WARM] = (done - began) / 1e6;
				busy[step - WARM] = (spent - cpu) / 1e6;
			}
		}
		gesture.cancel();
		write(legs, shown, busy);
	}

	private static void write(int legs, double[] shown, double[] busy) throws Exception {
		String line = String.format(Locale.ROOT,
				"%d legs, %d steps of a drag: until painted %.1f ms median, %.1f ms 95th percentile; of it the window's own thread was busy %.1f and %.1f ms%n",
				legs, shown.length, at(shown, 0.5), at(shown, 0.95), at(busy, 0.5), at(busy, 0.95));
		Files.createDirectories(FIGURES.getParent());
		Files.writeString(FIGURES, line, StandardOpenOption.CREATE, StandardOpenOption.APPEND);
	}

	private static double at(double[] times, double share) {
		double[] sorted = times.clone();
		Arrays.sort(sorted);
		return sorted[(int) Math.min(sorted.length - 1, Math.floor(share * sorted.length))];
	}
}
