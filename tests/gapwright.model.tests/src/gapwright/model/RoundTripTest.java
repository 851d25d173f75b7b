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
import java.util.function.Consumer;
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

	@Test
	void aLinkToNothingYetGetsItsFile() throws IOException {
		Path file = folder.resolve("later.gapwright");
		Path link = Files.createSymbolicLink(folder.resolve("link.gapwright"), Path.of("later.gapwright"));
		AtomicFile.write(link, new byte[] { 7 });
		assertTrue(Files.isSymbolicLink(link));
		assertArrayEquals(new byte[] { 7 }, Files.readAllBytes(file));
	}

	@Test
	void linksInACircleAndFoldersAreRefused() throws IOException {
		Path one = folder.resolve("one");
		Path two = Files.createSymbolicLink(folder.resolve("two"), one);
		Files.createSymbolicLink(one, two);
		assertTrue(assertThrows(IOException.class, () -> AtomicFile.write(one, new byte[1])).getMessage()
				.endsWith("the symbolic links lead round in a circle"));
		assertTrue(assertThrows(IOException.class, () -> AtomicFile.write(folder, new byte[1])).getMessage()
				.endsWith("is a folder"));
	}

	@Test
	void aFailedSaveLeavesTheResourceModified() throws IOException {
		DesignResource resource = new DesignResource(URI.createFileURI(folder.resolve("missing/d.gapwright").toString()));
		resource.setTrackingModification(true);
		resource.getContents().add(DesignText.read(DesignText.GOOD));
		assertThrows(IOException.class, () -> resource.save(Map.of()));
		assertTrue(resource.isModified());
	}

	@Test
	void aCharacterThatNoFileCanHoldIsNamedBeforeAnythingIsWritten() throws IOException {
		Path file = folder.resolve("design.gapwright");
		Files.writeString(file, DesignText.GOOD);
		Design design = DesignText.read(DesignText.GOOD);
		design.getLegs().get(0).setName("a\u0001b");
		assertEquals("wound: name: the character U+0001 cannot be stored in a file, delete it",
				assertThrows(IOException.class, () -> DesignWriter.write(design, file)).getMessage());
		assertEquals(DesignText.GOOD, Files.readString(file));
	}

	/** What the reader would refuse is never written. */
	@Test
	void whatCouldNotBeReadBackIsNamedBeforeAnythingIsWritten() throws IOException {
		Map<Consumer<Design>, String> faults = Map.of(
				design -> design.getJoints().get(1).setId("a"), "a: id: is given twice, give one of the elements another",
				design -> design.getJoints().get(1).setId(null), "Joint: id: is missing",
				design -> design.getJoints().get(1).setId("a b"), "a b: id: an id must not contain blanks, # or :, nor begin with /",
				design -> design.getLegs().get(0).setStackingFactor(Double.NaN), "wound: stackingFactor: not a number, e.g. 0.95");
		for (Map.Entry<Consumer<Design>, String> fault : faults.entrySet()) {
			Design design = DesignText.read(DesignText.GOOD);
			fault.getKey().accept(design);
			Path file = folder.resolve("design.gapwright");
			assertEquals(fault.getValue(), assertThrows(IOException.class, () -> DesignWriter.write(design, file)).getMessage());
			assertEquals(List.of(), files());
		}
	}

	@Test
	void aReferenceToSomethingOutsideIsNamedBeforeAnythingIsWritten() throws IOException {
		Path file = folder.resolve("design.gapwright");
		Design design = DesignText.read(DesignText.GOOD);
		design.getMaterials().clear();
		assertEquals("wound: material refers to something that is not in the design any more",
				assertThrows(IOException.class, () -> DesignWriter.write(design, file)).getMessage());
		assertEquals(List.of(), files());
	}

	/**
	 * A process that saves two contents in turn without end is killed fifty times: while it saves for the first time,
	 * or after it has done so once or twice, each time at another moment of the save that follows.
	 */
	@Test
	void aKilledSaveLeavesTheOldFileOrTheNewOneWhole() throws Exception {
		Path file = folder.resolve("design.gapwright");
		byte[] even = SaveForever.content(0);
		byte[] odd = SaveForever.content(1);
		Files.write(file, even);
		String classPath = classPathOf(SaveForever.class) + File.pathSeparator + classPathOf(AtomicFile.class);
		boolean oldSeen = false;
		boolean newSeen = false;
		for (int kill = 0; kill < 50; kill++) {
			Process process = new ProcessBuilder(Path.of(System.getProperty("java.home"), "bin", "java").toString(),
					"-XX:TieredStopAtLevel=1", "-Xshare:auto", "-cp", classPath, SaveForever.class.getName(),
					file.toString()).redirectErrorStream(true).start();
			for (int saves = 0; saves <= kill % 3; saves++) {
				assertEquals(saves == 0 ? '!' : '.', process.getInputStream().read(), "the process stopped saving");
			}
			TimeUnit.MICROSECONDS.sleep(700L * (kill / 3));
			process.destroyForcibly().waitFor();
			byte[] found = Files.readAllBytes(file);
			byte[] expected = found.length > 0 && found[0] == even[0] ? even : odd;
			assertArrayEquals(expected, found, "after kill " + kill);
			oldSeen |= expected == even;
			newSeen |= expected == odd;
		}
		assertTrue(oldSeen && newSeen, "the kills always met the same content");
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
