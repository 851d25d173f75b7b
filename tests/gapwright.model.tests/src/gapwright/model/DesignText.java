package gapwright.model;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.List;

/** A small valid design file to break in one place. */
public final class DesignText {

	public static final String HEAD = "<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n";
	public static final String GOOD = HEAD
			+ "<gapwright:Design xmi:version=\"2.0\" xmlns:xmi=\"http://www.omg.org/XMI\" xmlns:xsi=\"http://www.w3.org/2001/XMLSchema-instance\" xmlns:gapwright=\"urn:gapwright:design:1\" name=\"small\">\n"
			+ "  <materials id=\"ferrite\" name=\"ferrite\">\n"
			+ "    <curve xsi:type=\"gapwright:KneeCurve\" initialPermeability=\"2300.0\" saturationPolarisation=\"0.5 T\"/>\n"
			+ "    <saturations temperature=\"25 °C\" fluxDensity=\"0.49 T\"/>\n"
			+ "  </materials>\n"
			+ "  <joints id=\"a\" x=\"0 mm\" y=\"0 mm\"/>\n"
			+ "  <joints id=\"b\" x=\"40 mm\" y=\"0 mm\"/>\n"
			+ "  <legs id=\"wound\" from=\"a\" to=\"b\" material=\"ferrite\" width=\"12 mm\" depth=\"15 mm\">\n"
			+ "    <gaps id=\"gap\" length=\"0.80 mm\"/>\n"
			+ "  </legs>\n"
			+ "  <legs id=\"back\" from=\"b\" to=\"a\" material=\"ferrite\" width=\"12 mm\" depth=\"15 mm\" pathLength=\"90 mm\"/>\n"
			+ "  <windings id=\"main\">\n"
			+ "    <coils id=\"coil\" leg=\"wound\" turns=\"20\"/>\n"
			+ "  </windings>\n"
			+ "  <operatingPoints id=\"full\" temperature=\"25 °C\">\n"
			+ "    <drives xsi:type=\"gapwright:CurrentDrive\" id=\"drive\" winding=\"main\" current=\"5 A\"/>\n"
			+ "  </operatingPoints>\n"
			+ "</gapwright:Design>\n";

	private DesignText() {
	}

	public static Design read(String text) throws IOException {
		return DesignReader.read(new ByteArrayInputStream(text.getBytes(StandardCharsets.UTF_8)), "small.gapwright");
	}

	/** @return every problem's text, empty when it reads */
	public static List<String> problems(String text) {
		return problems(text.getBytes(StandardCharsets.UTF_8));
	}

	public static List<String> problems(byte[] content) {
		try {
			DesignReader.read(new ByteArrayInputStream(content), "small.gapwright");
			return List.of();
		} catch (UnreadableDesignException e) {
			return e.problems().stream().map(ReadProblem::text).toList();
		} catch (IOException e) {
			throw new AssertionError(e);
		}
	}
}
