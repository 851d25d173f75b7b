package gapwright.install.tests;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;

/**
 * A script of {@code releng} as somebody ran it, without a display.
 *
 * @param status its exit status
 * @param out    its standard output
 * @param err    its standard error
 */
record Script(int status, String out, String err) {

	/** Long enough for any machine; reached only when something hangs. */
	private static final int MINUTES = 5;

	/**
	 * @param cache  where it keeps what it builds
	 * @param folder where it is started
	 */
	static Script run(Path cache, Path folder, Path script, String... arguments) throws Exception {
		List<String> command = new ArrayList<>(List.of(script.toString()));
		command.addAll(List.of(arguments));
		Path out = Files.createTempFile("gapwright", ".out");
		Path err = Files.createTempFile("gapwright", ".err");
		ProcessBuilder builder = new ProcessBuilder(command).directory(folder.toFile()).redirectOutput(out.toFile()).redirectError(err.toFile());
		builder.environment().put("GAPWRIGHT_CACHE", cache.toString());
		builder.environment().remove("DISPLAY");
		Process process = builder.start();
		try {
			if (!process.waitFor(MINUTES, TimeUnit.MINUTES)) {
				throw new AssertionError(command + " hangs:\n" + Files.readString(err));
			}
			return new Script(process.exitValue(), Files.readString(out), Files.readString(err));
		} finally {
			process.destroyForcibly();
			Files.delete(out);
			Files.delete(err);
		}
	}
}
