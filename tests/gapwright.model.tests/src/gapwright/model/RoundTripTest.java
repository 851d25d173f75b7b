package gapwright.model;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.File;
import java.io.IOException;
import java.net.URL;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.List;
import java.util.Map;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;

import org.eclipse.core.runtime.FileLocator;
import org.eclipse.emf.common.util.URI;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

class RoundTripTest {

	private Path folder;

	@BeforeEach
	void anEmptyFolder() throws IOException {
		folder = Files.createTempDirectory("gapwright-model");
	}

	@AfterEach
	void isRemoved() throws IOException {
		for (Path file : files()) {
			Files.delete(file);
		}
		Files.delete(folder);
	}

	@Test
	void whatIsReadIsWrittenBackByteForByte() throws IOException {
		byte[] written = DesignWriter.bytes(DesignText.read(DesignText.GOOD));
		assertEquals(DesignText.GOOD, new String(written, StandardCharsets.UTF_8));
	}

	@Test
	void namesInAnyScriptAndAwkwardCharactersSurvive() throws IOException {
		Design design = DesignText.read(DesignText.GOOD);
		design.setName("Drossel <für> \"Pumpe\" & 水泵\n2");
		Path file = folder.resolve("design.gapwright");
		DesignWriter.write(design, file);
		assertEquals(design.getName(), DesignReader.read(file).getName());
	}

	@Test
	void savingAResourceReplacesItsFile() throws IOException {
		Path file = folder.resolve("design.gapwright");
		Files.writeString(file, DesignText.GOOD);
		DesignResource resource = new DesignResource(URI.createFileURI(file.toString()));
		resource.load(Map.of());
		resource.design().setName("another");
		resource.save(Map.of());
		assertEquals(DesignText.GOOD.replace("name=\"small\"", "name=\"another\""), Files.readString(file));
	}

	@Test
	void aFailedSaveLeavesTheOldFileAndNothingElse() throws IOException {
		Path file = folder.resolve("design.gapwright");
		Files.writeString(file, DesignText.GOOD);
		Path inside = file.resolve("not-a-folder.gapwright");
		Design design = DesignText.read(DesignText.GOOD);
		assertThrows(IOException.class, () -> DesignWriter.write(design, inside));
		assertThrows(IOException.class, () -> DesignWriter.write(design, folder.resolve("missing").resolve("d.gapwright")));
		assertEquals(DesignText.GOOD, Files.readString(file));
		assertEquals(List.of(file), files());
	}

	@Test
	void permissionsAndLinksStay() throws IOException {
		Path file = folder.resolve("design.gapwright");
		Files.writeString(file, "old");
		Files.setPosixFilePermissions(file, PosixFilePermissions.fromString("rw-rw----"));
		Path link = Files.createSymbolicLink(folder.resolve("link.gapwright"), file);
		AtomicFile.write(link, "new".getBytes(StandardCharsets.UTF_8));
		assertTrue(Files.isSymbolicLink(link));
		assertEquals("new", Files.readString(file));
		assertEquals("rw-rw----", PosixFilePermissions.toString(Files.getPosixFilePermissions(file)));
	}

	@Test
	void aNewFileIsAsReadableAsOthers() throws IOException {
		Path usual = Files.createFile(folder.resolve("usual"));
		Path file = folder.resolve("design.gapwright");
		AtomicFile.write(file, new byte[] { 1 });
		assertEquals(Files.getPosixFilePermissions(usual), Files.getPosixFilePermissions(file));
		assertEquals(List.of(file, usual), files());
	}

	/** A process that saves two contents in turn without end is killed at fifty moments. */
	@Test
	void aKilledSaveLeavesTheOldFileOrTheNewOneWhole() throws Exception {
		Path file = folder.resolve("design.gapwright");
		byte[] even = SaveForever.content(0);
		byte[] odd = SaveForever.content(1);
		Files.write(file, even);
		String classPath = classPathOf(SaveForever.class) + File.pathSeparator + classPathOf(AtomicFile.class);
		int changed = 0;
		for (int kill = 0; kill < 50; kill++) {
			Process process = new ProcessBuilder(Path.of(System.getProperty("java.home"), "bin", "java").toString(),
					"-XX:TieredStopAtLevel=1", "-Xshare:auto", "-cp", classPath, SaveForever.class.getName(),
					file.toString()).redirectErrorStream(true).start();
			assertEquals('!', process.getInputStream().read(), "the saving process did not start");
			TimeUnit.MICROSECONDS.sleep(1370L * kill);
			process.destroyForcibly().waitFor();
			byte[] found = Files.readAllBytes(file);
			byte[] expected = found.length > 0 && found[0] == even[0] ? even : odd;
			assertArrayEquals(expected, found, "after kill " + kill);
			changed += expected == odd ? 1 : 0;
		}
		assertTrue(changed > 0, "no process ever saved anything");
	}

	private static String classPathOf(Class<?> type) throws Exception {
		String resource = type.getName().replace('.', '/') + ".class";
		URL url = FileLocator.toFileURL(type.getClassLoader().getResource(resource));
		String text = url.getPath();
		return text.substring(0, text.length() - resource.length());
	}

	private List<Path> files() throws IOException {
		try (Stream<Path> all = Files.list(folder)) {
			return all.sorted().toList();
		}
	}
}
