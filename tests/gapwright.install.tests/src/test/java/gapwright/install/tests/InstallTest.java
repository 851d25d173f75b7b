package gapwright.install.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.TreeSet;

import org.junit.jupiter.api.Test;

/** Into a workbench that somebody already has, and out of it again. */
class InstallTest {

	private static final String GAPWRIGHT = "gapwright.feature";
	private static final String GEF = "gapwright.gef.feature";
	/** As the library's own tests and the command line have it. */
	private static final String CENTRE_LEG = "centre leg, 83 % of saturation, near";

	@Test
	void intoAWorkbenchWithoutGefAndOutAgainWithoutATrace() throws Exception {
		Workbench workbench = new Workbench("without-gef");
		TreeSet<String> before = workbench.footprint();
		workbench.install(GAPWRIGHT, GEF);
		readsTheCentreLegOffTheCanvas(workbench);
		workbench.uninstall(GAPWRIGHT, GEF);
		assertSame(before, workbench.footprint());
		assertTrue(workbench.look().get(0).startsWith("window "), "the workbench no longer starts");
	}

	@Test
	void intoAWorkbenchThatHasGefAndOutAgainLeavingItsGefAlone() throws Exception {
		Workbench workbench = new Workbench("with-gef");
		workbench.install(GEF);
		TreeSet<String> before = workbench.footprint();
		assertTrue(before.stream().anyMatch(line -> line.startsWith("bundle org.eclipse.gef,")));
		workbench.install(GAPWRIGHT);
		readsTheCentreLegOffTheCanvas(workbench);
		workbench.uninstall(GAPWRIGHT);
		assertSame(before, workbench.footprint());
	}

	private static void readsTheCentreLegOffTheCanvas(Workbench workbench) throws Exception {
		List<String> names = workbench.look("-reader.canvas", "-reader.open", Built.EXAMPLE.toString());
		assertTrue(names.stream().anyMatch(name -> name.toLowerCase().contains(CENTRE_LEG)), () -> "the canvas says " + names);
		assertEquals(List.of(), workbench.errors());
	}

	/** Says what differs instead of printing two long lists. */
	private static void assertSame(TreeSet<String> before, TreeSet<String> after) {
		TreeSet<String> left = new TreeSet<>(after);
		left.removeAll(before);
		TreeSet<String> lost = new TreeSet<>(before);
		lost.removeAll(after);
		assertTrue(left.isEmpty() && lost.isEmpty(), () -> "left behind: " + left + "\nlost: " + lost);
	}
}
