package gapwright.ui.tests;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;

/**
 * Events as the X server sends them for a real mouse and keyboard, by the general tool xdotool. SWT's own posting moves
 * no pointer on a virtual display and leaves button bits in the state of keys.
 */
final class RealEvents {

	private RealEvents() {
	}

	/** Sends one command of xdotool, then works off what comes of it. */
	static void send(String... command) {
		List<String> line = new ArrayList<>(List.of("xdotool"));
		line.addAll(List.of(command));
		try {
			Process process = new ProcessBuilder(line).redirectErrorStream(true).start();
			String said = new String(process.getInputStream().readAllBytes());
			if (process.waitFor() != 0) {
				throw new AssertionError(line + ": " + said);
			}
		} catch (IOException e) {
			throw new AssertionError("the tests of the window need xdotool, and a display", e);
		} catch (InterruptedException e) {
			Thread.currentThread().interrupt();
			throw new AssertionError(e);
		}
		Workbench.drain();
	}
}
