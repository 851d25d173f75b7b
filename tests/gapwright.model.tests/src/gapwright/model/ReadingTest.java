package gapwright.model;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.net.InetAddress;
import java.net.ServerSocket;
import java.net.SocketTimeoutException;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Random;

import org.eclipse.emf.common.util.URI;
import org.junit.jupiter.api.Test;

/** What is wrong with a file is said with file, element, attribute, what was found and what would do. */
class ReadingTest {

	private static void refuses(String found, String replacement, String... messages) {
		String broken = DesignText.GOOD.replace(found, replacement);
		assertFalse(broken.equals(DesignText.GOOD), "the sample has no " + found);
		assertEquals(List.of(messages), DesignText.problems(broken));
	}

	@Test
	void aGoodFileReads() throws IOException {
		Design design = DesignText.read(DesignText.GOOD);
		assertEquals(2, design.getLegs().size());
		assertEquals("0.80 mm", design.getLegs().get(0).getGaps().get(0).getLength().text());
		assertEquals(design.getLegs().get(0), design.getWindings().get(0).getCoils().get(0).getLeg());
	}

	@Test
	void aBareNumber() {
		refuses("length=\"0.80 mm\"", "length=\"0.5\"",
				"small.gapwright:gap: length = '0.5': a length needs a unit, e.g. 0.5 mm (line 10)");
	}

	@Test
	void anUnknownUnit() {
		refuses("width=\"12 mm\" depth=\"15 mm\">", "width=\"12 thou\" depth=\"15 mm\">",
				"small.gapwright:wound: width = '12 thou': unknown unit 'thou', expected a length, e.g. 0.5 mm (line 9)");
	}

	@Test
	void aWrongDimension() {
		refuses("current=\"5 A\"", "current=\"5 V\"",
				"small.gapwright:drive: current = '5 V': that is a voltage, expected a current, e.g. 14 A (line 17)");
	}

	@Test
	void aDecimalComma() {
		refuses("initialPermeability=\"2300.0\"", "initialPermeability=\"2300,5\"",
				"small.gapwright:ferrite/KneeCurve: initialPermeability = '2300,5': a comma is not read in numbers,"
						+ " write a decimal point: 2300.5 (line 4)");
	}

	@Test
	void aDanglingReference() {
		refuses("leg=\"wound\"", "leg=\"centre\"",
				"small.gapwright:coil: leg = 'centre': there is no leg with this id (line 14)");
	}

	@Test
	void aReferenceToSomethingElse() {
		refuses("leg=\"wound\"", "leg=\"ferrite\"",
				"small.gapwright:coil: leg = 'ferrite': that is a material, expected a leg (line 14)");
	}

	@Test
	void aDuplicateId() {
		refuses("id=\"b\"", "id=\"a\"", "small.gapwright:a: id = 'a': given twice, also to a joint in line 7 (line 8)",
				"small.gapwright:wound: to = 'b': there is no joint with this id (line 9)",
				"small.gapwright:back: from = 'b': there is no joint with this id (line 12)");
	}

	@Test
	void aMissingId() {
		refuses("<windings id=\"main\">", "<windings>",
				"small.gapwright:Design/Winding: id = '': an id is needed, short and unique in the design (line 13)",
				"small.gapwright:drive: winding = 'main': there is no winding with this id (line 17)");
	}

	@Test
	void aFractionOfATurn() {
		refuses("turns=\"20\"", "turns=\"20.5\"",
				"small.gapwright:coil: turns = '20.5': a whole number is needed, e.g. 12; half turns exist only on"
						+ " multi-leg cores: place the coil on the leg it encloses (line 14)");
	}

	@Test
	void anUnknownAttribute() {
		refuses("turns=\"20\"", "turns=\"20\" colour=\"red\"",
				"small.gapwright:coil: colour = 'red': no such attribute in a coil, allowed are id, name, leg, turns,"
						+ " reversed, position (line 14)");
	}

	@Test
	void anUnknownElement() {
		refuses("<gaps id=\"gap\" length=\"0.80 mm\"/>", "<slots id=\"gap\" length=\"0.80 mm\"/>",
				"small.gapwright:wound: 'slots': no such element in a leg, allowed are gaps, magnet (line 10)");
	}

	@Test
	void anUnknownKindOfCurve() {
		refuses("gapwright:KneeCurve", "gapwright:SteepCurve",
				"small.gapwright:ferrite: xsi:type = 'gapwright:SteepCurve': no such curve, allowed are"
						+ " gapwright:LinearCurve, gapwright:KneeCurve, gapwright:ArctanCurve, gapwright:TableCurve,"
						+ " gapwright:RollOffCurve (line 4)");
	}

	@Test
	void anUnknownChoice() {
		refuses("length=\"0.80 mm\"", "length=\"0.80 mm\" fringing=\"MAGIC\"",
				"small.gapwright:gap: fringing = 'MAGIC': no such choice, allowed are NONE, WIDENED, LOGARITHMIC,"
						+ " CONFORMAL (line 10)");
	}

	@Test
	void aFileOfANewerVersion() {
		refuses("urn:gapwright:design:1", "urn:gapwright:design:2",
				"small.gapwright: 'urn:gapwright:design:2': written by another version of the format, this program"
						+ " reads urn:gapwright:design:1; update it to open the file (line 2)");
	}

	@Test
	void aFileThatIsNoDesign() {
		assertEquals(List.of("small.gapwright: 'html': not a Gapwright design, expected a root element"
				+ " gapwright:Design in the namespace urn:gapwright:design:1 (line 1)"),
				DesignText.problems("<html></html>"));
		assertEquals(List.of("small.gapwright: the file is empty, expected a design"), DesignText.problems(""));
	}

	@Test
	void aFileCutOffAnywhereIsRefusedAndNeverHalfLoaded() {
		byte[] whole = DesignText.GOOD.getBytes(StandardCharsets.UTF_8);
		for (int length = 0; length < whole.length - 1; length++) {
			byte[] cut = Arrays.copyOf(whole, length);
			assertFalse(DesignText.problems(cut).isEmpty(), "read after " + length + " bytes");
		}
	}

	@Test
	void bytesThatAreNoTextAreRefused() {
		byte[] noise = new byte[4096];
		new Random(7).nextBytes(noise);
		List<String> notText = List.of("small.gapwright: not text in UTF-8, so not a design or a damaged one (line 1)");
		assertEquals(notText, DesignText.problems(noise));
		assertEquals(notText, DesignText.problems(DesignText.GOOD.getBytes(StandardCharsets.UTF_16)));
		assertEquals(List.of("small.gapwright: not text in UTF-8, so not a design or a damaged one (line 5)"),
				DesignText.problems(DesignText.GOOD.getBytes(StandardCharsets.ISO_8859_1)));
		assertEquals(List.of("small.gapwright: 'encoding=\"ISO-8859-1\"': a design is written in UTF-8 (line 1)"),
				DesignText.problems(DesignText.GOOD.replace("UTF-8", "ISO-8859-1")));
		assertEquals(List.of(), DesignText.problems("\uFEFF" + DesignText.GOOD));
	}

	/** A document type, an external entity and a schema location that point to a server here: nobody may call it. */
	@Test
	void nothingIsEverFetched() throws IOException {
		try (ServerSocket server = new ServerSocket(0, 5, InetAddress.getLoopbackAddress())) {
			server.setSoTimeout(300);
			String address = "http://localhost:" + server.getLocalPort() + "/x";
			for (String broken : new String[] {
					DesignText.GOOD.replace(DesignText.HEAD,
							DesignText.HEAD + "<!DOCTYPE d SYSTEM \"" + address + "\">\n"),
					DesignText.GOOD.replace(DesignText.HEAD,
							DesignText.HEAD + "<!DOCTYPE d [<!ENTITY e SYSTEM \"" + address + "\">]>\n")
							.replace("name=\"small\">", "name=\"small\">&e;"),
					DesignText.GOOD.replace("leg=\"wound\"", "leg=\"" + address + "#wound\""),
					DesignText.GOOD.replace("<coils id=\"coil\" leg=\"wound\" turns=\"20\"/>",
							"<coils href=\"" + address + "#coil\"/>") }) {
				assertFalse(DesignText.problems(broken).isEmpty(), broken);
			}
			String located = DesignText.GOOD.replace(" name=\"small\"",
					" xsi:schemaLocation=\"urn:gapwright:design:1 " + address + "\" name=\"small\"");
			assertEquals(List.of("small.gapwright:Design: xsi:schemaLocation = 'urn:gapwright:design:1 " + address
					+ "': a design must not refer to other files (line 2)"), DesignText.problems(located));
			assertThrows(SocketTimeoutException.class, () -> server.accept().close(), "something was fetched");
		}
	}

	@Test
	void entitiesThatGrowAreRefusedAtOnce() {
		StringBuilder bomb = new StringBuilder("<!DOCTYPE d [<!ENTITY a0 \"ha\">");
		for (int i = 1; i < 40; i++) {
			bomb.append("<!ENTITY a").append(i).append(" \"&a").append(i - 1).append(";&a").append(i - 1).append(";\">");
		}
		String broken = DesignText.GOOD.replace(DesignText.HEAD, DesignText.HEAD + bomb + "]>\n");
		assertEquals(1, DesignText.problems(broken).size());
	}

	@Test
	void deeplyNestedNonsenseIsPassedOver() {
		StringBuilder deep = new StringBuilder();
		deep.append("<x>".repeat(20_000)).append("</x>".repeat(20_000));
		assertEquals(1, DesignText.problems(DesignText.GOOD.replace("<windings", deep + "<windings")).size());
	}

	@Test
	void aFileWithEverythingWrongSaysManyThingsButNotEndlessly() {
		String many = "<joints x=\"1\" y=\"2\"/>\n".repeat(500);
		List<String> problems = DesignText.problems(DesignText.GOOD.replace("  <joints id=\"a\"", many + "  <joints id=\"a\""));
		assertEquals(100, problems.size());
	}

	@Test
	void aReferenceIntoAnotherFile() {
		refuses("leg=\"wound\"", "leg=\"other.gapwright#wound\"",
				"small.gapwright:coil: leg = 'other.gapwright#wound': there is no leg with this id; a design must not"
						+ " refer to other files (line 14)");
	}

	@Test
	void anElementOfAnotherFile() {
		refuses("<gaps id=\"gap\" length=\"0.80 mm\"/>", "<gaps href=\"other.gapwright#gap\"/>",
				"small.gapwright:wound/Gap: id = '': an id is needed, short and unique in the design (line 10)",
				"small.gapwright:wound/Gap: href = 'other.gapwright#gap': a design must not refer to other files (line 10)");
	}

	@Test
	void anIdThatReferencesWouldMisread() {
		for (String id : new String[] { "my coil", "a:b", "a#b", "/coil", "c\u00A0d" }) {
			refuses("<coils id=\"coil\"", "<coils id=\"" + id + "\"", "small.gapwright:" + id + ": id = '" + id
					+ "': an id must not contain blanks, # or :, nor begin with / (line 14)");
		}
	}

	@Test
	void anElementOrAttributeOfAForeignNamespace() {
		refuses("<gaps id", "<x:gaps xmlns:x=\"urn:x\" id",
				"small.gapwright:wound: 'gaps': elements inside a design are written without a namespace, this one is in"
						+ " urn:x (line 10)");
		refuses("<gaps id", "<gaps xmlns:x=\"urn:x\" x:length=\"1 mm\" id",
				"small.gapwright:gap: length = '1 mm': no such attribute in a gap, allowed are id, name, length, pieces,"
						+ " fringing, windowHeight, position, place (line 10)");
	}

	@Test
	void anAttributeOrSingleElementGivenTwice() {
		refuses("turns=\"20\"", "turns=\"20\" turns=\"20\"",
				"small.gapwright: truncated or malformed XML: the attribute turns is given twice in one element (line 14)");
		refuses("    <saturations", "    <curve xsi:type=\"gapwright:LinearCurve\" relativePermeability=\"2\"/>\n    <saturations",
				"small.gapwright:ferrite: 'curve': given twice, allowed once (line 5)");
	}

	@Test
	void aPrefixThatNobodyDeclared() {
		refuses("<gaps id", "<x:gaps id",
				"small.gapwright: truncated or malformed XML: the prefix x is not declared by an xmlns:x (line 10)");
	}

	@Test
	void aDriveWithoutItsKind() {
		refuses(" xsi:type=\"gapwright:CurrentDrive\"", "",
				"small.gapwright:full: xsi:type = '': missing, allowed are gapwright:CurrentDrive, gapwright:VoltageDrive (line 17)");
	}

	@Test
	void textBetweenElements() {
		refuses("  <windings id=\"main\">", "  wire <windings id=\"main\">",
				"small.gapwright:Design: 'wire': text between elements is not allowed (line 13)");
	}

	@Test
	void numbersOutOfRange() {
		refuses("turns=\"20\"", "turns=\"20000000000\"",
				"small.gapwright:coil: turns = '20000000000': out of the range of whole numbers (line 14)");
		refuses("initialPermeability=\"2300.0\"", "initialPermeability=\"1e999\"",
				"small.gapwright:ferrite/KneeCurve: initialPermeability = '1e999': out of the range of numbers (line 4)");
		refuses("initialPermeability=\"2300.0\"", "initialPermeability=\"NaN\"",
				"small.gapwright:ferrite/KneeCurve: initialPermeability = 'NaN': not a number, e.g. 0.95 (line 4)");
		refuses("initialPermeability=\"2300.0\"", "initialPermeability=\"" + "1".repeat(500_000) + "\"",
				"small.gapwright:ferrite/KneeCurve: initialPermeability = '" + "1".repeat(200)
						+ "…': too long for a number (line 4)");
	}

	@Test
	void aStreamWithoutEndIsGivenUp() {
		InputStream endless = new InputStream() {

			@Override
			public int read() {
				return 'x';
			}

			@Override
			public int read(byte[] buffer, int from, int length) {
				Arrays.fill(buffer, from, from + length, (byte) 'x');
				return length;
			}
		};
		assertEquals("endless: larger than 64 MiB, not a design",
				assertThrows(UnreadableDesignException.class, () -> DesignReader.read(endless, "endless")).getMessage());
	}

	@Test
	void aResourceThatFailedToLoadIsAsIfNeverLoaded() throws IOException {
		DesignResource resource = new DesignResource(URI.createURI("my%20design.gapwright"));
		byte[] broken = DesignText.GOOD.replace("turns=\"20\"", "turns=\"x\"").getBytes(StandardCharsets.UTF_8);
		UnreadableDesignException refused = assertThrows(UnreadableDesignException.class,
				() -> resource.load(new ByteArrayInputStream(broken), Map.of()));
		assertEquals("my design.gapwright:coil: turns = 'x': not a whole number, e.g. 12 (line 14)", refused.getMessage());
		assertFalse(resource.isLoaded());
		assertTrue(resource.getContents().isEmpty());
		resource.load(new ByteArrayInputStream(DesignText.GOOD.getBytes(StandardCharsets.UTF_8)), Map.of());
		assertEquals("small", resource.design().getName());
	}

	/** Whatever one byte is turned into: the file reads, or is refused with a problem; nothing else ever happens. */
	@Test
	void anySingleDamagedByteEndsInADesignOrAProblem() {
		byte[] whole = DesignText.GOOD.getBytes(StandardCharsets.UTF_8);
		Random random = new Random(42);
		int refused = 0;
		for (int at = 0; at < whole.length; at++) {
			byte[] damaged = whole.clone();
			damaged[at] = (byte) random.nextInt(256);
			for (String problem : DesignText.problems(damaged)) {
				assertTrue(problem.startsWith("small.gapwright:"), problem);
				assertFalse(problem.contains("Exception") || problem.contains("www.w3.org/TR"), problem);
				refused++;
			}
		}
		assertTrue(refused > whole.length / 2, "only " + refused + " refused");
	}
}
