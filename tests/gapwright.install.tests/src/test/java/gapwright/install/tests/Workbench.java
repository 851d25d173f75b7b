package gapwright.install.tests;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;

/** An installed workbench in a folder of its own, used from outside as its owner would: the p2 director, and a start. */
final class Workbench {

	/** Long enough for any machine; reached only when something hangs. */
	private static final int MINUTES = 5;

	/** Where the director keeps its own data: it notes that at its first use, whatever it is used for. */
	private static final String DIRECTORS_OWN = "eclipse.p2.data.area=";

	private final Path folder;
	private final Path bundles;

	/** A copy of the stock workbench. */
	Workbench(String name) throws IOException {
		folder = Path.of("target", name).toAbsolutePath();
		bundles = folder.resolve("configuration/org.eclipse.equinox.simpleconfigurator/bundles.info");
		delete(folder);
		try (Stream<Path> files = Files.walk(Built.STOCK)) {
			for (Path file : (Iterable<Path>) files::iterator) {
				Files.copy(file, folder.resolve(Built.STOCK.relativize(file).toString()), StandardCopyOption.COPY_ATTRIBUTES);
			}
		}
	}

	private static void delete(Path old) throws IOException {
		if (Files.exists(old)) {
			try (Stream<Path> files = Files.walk(old)) {
				for (Path file : files.sorted((a, b) -> b.compareTo(a)).toList()) {
					Files.delete(file);
				}
			}
		}
	}

	void install(String... features) throws Exception {
		director("-repository", Built.SITE.toUri().toString(), "-installIU", units(features));
	}

	/** Uninstalls, and drops what nobody needs any more. */
	void uninstall(String... features) throws Exception {
		director("-uninstallIU", units(features));
		run("-application", "org.eclipse.equinox.p2.garbagecollector.application", "-profile", profile());
	}

	private static String units(String... features) {
		return String.join(",", Stream.of(features).map(f -> f + ".feature.group").toList());
	}

	/** @return names of everything that was asked for, in the director's words */
	List<String> roots() throws Exception {
		return director("-listInstalledRoots").lines().filter(line -> line.matches("[\\w.]+[/ ]\\d.*")).sorted().toList();
	}

	private String director(String... what) throws Exception {
		List<String> arguments = new ArrayList<>(List.of("-application", "org.eclipse.equinox.p2.director", "-destination",
				folder.toString(), "-profile", profile()));
		arguments.addAll(List.of(what));
		return run(arguments.toArray(String[]::new));
	}

	private String profile() throws IOException {
		return Files.readAllLines(folder.resolve("configuration/config.ini")).stream().filter(l -> l.startsWith("eclipse.p2.profile="))
				.map(l -> l.substring(l.indexOf('=') + 1)).findFirst().orElseThrow();
	}

	/**
	 * Starts the workbench in a real window.
	 *
	 * @param reading what the reading bundle is asked to do
	 * @return what it saw
	 */
	List<String> look(String... reading) throws Exception {
		Path answer = folder.resolveSibling(folder.getFileName() + "-" + (reading.length == 0 ? "window" : "canvas") + ".txt");
		Files.deleteIfExists(answer);
		List<String> before = Files.readAllLines(bundles);
		Path reader = Built.reader();
		List<String> with = new ArrayList<>(before);
		with.add("gapwright.install.reader," + Bundles.version(reader) + "," + reader.toUri() + ",4,false");
		Files.write(bundles, with);
		try {
			List<String> arguments = new ArrayList<>(List.of("-data", folder.resolve("workspace").toString(), "-reader.answer", answer.toString()));
			arguments.addAll(List.of(reading));
			run(arguments.toArray(String[]::new));
		} finally {
			Files.write(bundles, before);
		}
		List<String> lines = Files.readAllLines(answer);
		return lines.subList(1, lines.size());
	}

	/** @return one line for each bundle that is configured, each file that is stored, each artefact that is known */
	TreeSet<String> footprint() throws Exception {
		TreeSet<String> all = new TreeSet<>();
		Files.readAllLines(bundles).forEach(line -> all.add("bundle " + line));
		for (String part : List.of("plugins", "features")) {
			if (Files.exists(folder.resolve(part))) {
				try (Stream<Path> files = Files.walk(folder.resolve(part))) {
					files.filter(f -> Files.isRegularFile(f)).forEach(f -> all.add("file " + folder.relativize(f)));
				}
			}
		}
		Files.readAllLines(folder.resolve("artifacts.xml")).stream().filter(l -> l.contains("<artifact ")).forEach(l -> all.add("artefact " + l.strip()));
		Files.readAllLines(folder.resolve("configuration/config.ini")).stream().filter(l -> !l.startsWith("#") && !l.startsWith(DIRECTORS_OWN))
				.forEach(l -> all.add("setting " + l));
		roots().forEach(root -> all.add("root " + root));
		return all;
	}

	/** @return errors that the workbench wrote to its log */
	List<String> errors() throws IOException {
		Path log = folder.resolve("workspace/.metadata/.log");
		if (!Files.exists(log)) {
			return List.of();
		}
		List<String> lines = Files.readAllLines(log);
		List<String> errors = new ArrayList<>();
		for (int i = 0; i < lines.size(); i++) {
			if (lines.get(i).matches("!ENTRY \\S+ 4 .*")) {
				errors.add(lines.get(i) + " " + (i + 1 < lines.size() ? lines.get(i + 1) : ""));
			}
		}
		return errors;
	}

	private String run(String... arguments) throws Exception {
		Path output = Files.createTempFile("gapwright", ".out");
		List<String> command = new ArrayList<>(List.of(Path.of(System.getProperty("java.home"), "bin", "java").toString(), "-jar",
				Built.one(folder.resolve("plugins"), "org.eclipse.equinox.launcher_", ".jar").toString(), "-nosplash", "-consoleLog"));
		command.addAll(List.of(arguments));
		Process process = new ProcessBuilder(command).directory(folder.toFile()).redirectErrorStream(true).redirectOutput(output.toFile()).start();
		try {
			if (!process.waitFor(MINUTES, TimeUnit.MINUTES) || process.exitValue() != 0) {
				throw new AssertionError(String.join(" ", arguments) + (process.isAlive() ? " hangs" : " ends with " + process.exitValue())
						+ ":\n" + Files.readString(output));
			}
			return Files.readString(output);
		} finally {
			process.destroyForcibly();
			Files.delete(output);
		}
	}
}
