package gapwright.reference;

import static gapwright.physics.material.BhCurve.MU_0;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

import gapwright.model.DesignReader;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;
import gapwright.physics.coil.Solenoid;
import gapwright.physics.core.EffectiveParameters;
import gapwright.physics.core.OpenCore;
import gapwright.physics.core.PathPart;
import gapwright.study.OperatingPointResult;
import gapwright.study.Study;

/**
 * Figures printed in textbooks, handbooks and standards, each with the digits it is printed with; all quoted from memory,
 * checked by hand beside each.
 */
final class TextbookRows {

	private static final String FITZGERALD = "Fitzgerald, Kingsley, Umans, Electric Machinery, chapter 1, example of a core with one gap (from memory)";
	private static final String CHAPMAN = "Chapman, Electric Machinery Fundamentals, chapter 1, example ";
	private static final String SERWAY = "Serway, Physics for Scientists and Engineers, example inductance of a solenoid (from memory)";
	private static final String NAGAOKA = "Nagaoka's table of solenoids (1909), also in Grover (from memory)";
	private static final String OSBORN = "Osborn, Demagnetizing factors of the general ellipsoid, Phys. Rev. 67 (1945) (from memory)";
	private static final String ASTM = "ASTM B258, table of wire diameters in inches (from memory)";
	private static final String NIST = "NIST SP 811, conversion factors (from memory)";
	private static final String CODATA = "CODATA 2018, magnetic constant (from memory)";
	private static final String GROVER = "Grover, Inductance Calculations, Brooks coil (from memory)";
	private static final String WHEELER = "Wheeler, Proc. IRE 16 (1928): r²N²/(9r + 10l) µH in inches (from memory)";
	private static final String MAKERS = "makers' tables of ring cores by IEC 60205, 25/15/10 mm (from memory)";

	private final List<Row> rows = new ArrayList<>();

	static List<Row> all() throws IOException {
		TextbookRows all = new TextbookRows();
		all.fitzgerald();
		all.chapman();
		all.coils();
		all.tables();
		return all.rows;
	}

	/** One leg of iron and a closing leg all of gap, by a design file: lengths in m, areas in m². */
	private static OperatingPointResult study(String legs, int turns, double amperes) throws IOException {
		String text = "<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n<gapwright:Design xmi:version=\"2.0\" xmlns:xmi=\"http://www.omg.org/XMI\""
				+ " xmlns:xsi=\"http://www.w3.org/2001/XMLSchema-instance\" xmlns:gapwright=\"urn:gapwright:design:1\">" + legs
				+ "<windings id=\"main\"><coils id=\"coil\" leg=\"core\" turns=\"" + turns + "\"/></windings><operatingPoints id=\"p\""
				+ " temperature=\"20 °C\"><drives xsi:type=\"gapwright:CurrentDrive\" id=\"drive\" winding=\"main\" current=\"" + amperes
				+ " A\"/></operatingPoints></gapwright:Design>";
		return Study.of(DesignReader.read(new ByteArrayInputStream(text.getBytes(StandardCharsets.UTF_8)), "textbook")).operatingPoints().get(0);
	}

	private static String iron(double permeability) {
		return "<materials id=\"iron\"><curve xsi:type=\"gapwright:LinearCurve\" relativePermeability=\"" + permeability + "\"/></materials>"
				+ "<joints id=\"a\" x=\"0 mm\" y=\"0 mm\"/><joints id=\"b\" x=\"100 mm\" y=\"0 mm\"/>";
	}

	private static String leg(String id, String ends, double centimetres, double squareCentimetres, String gaps) {
		return "<legs id=\"" + id + "\" " + ends + " material=\"iron\" shape=\"GIVEN\" area=\"" + squareCentimetres + " cm²\" pathLength=\""
				+ centimetres + " cm\">" + gaps + "</legs>";
	}

	private static String gap(String id, double millimetres) {
		return "<gaps id=\"" + id + "\" length=\"" + millimetres + " mm\"/>";
	}

	/** 9 cm², 30 cm of iron µr 70 000, gap 0.5 mm, 500 turns, B = 1 T. The path is given whole, so iron and gap add. */
	private void fitzgerald() throws IOException {
		String kase = "core with one gap";
		OperatingPointResult p = study(iron(70000) + leg("core", "from=\"a\" to=\"b\"", 15, 9, gap("gap", 0.5))
				+ leg("back", "from=\"b\" to=\"a\"", 15, 9, ""), 500, 1);
		double flux = p.leg("core").flux();
		rows.add(Row.printed(kase, FITZGERALD, "reluctance of the core, 1/H",
				(p.leg("core").mmfDrop() + p.leg("back").mmfDrop()) / flux, 3.79e3, 3));
		rows.add(Row.printed(kase, FITZGERALD, "reluctance of the gap, 1/H", p.gaps().get(0).mmfDrop() / flux, 4.42e5, 3));
		// linear: solved at 1 A
		double current = 9e-4 / flux;
		rows.add(Row.printed(kase, FITZGERALD, "current for 1 T, A", current, 0.80, 2));
		rows.add(Row.printed(kase, FITZGERALD, "inductance, H", p.inductance().of("main"), 0.56, 2));
		rows.add(Row.printed(kase, FITZGERALD, "stored energy, J", p.energy() * current * current, 0.18, 2));
	}

	private void chapman() throws IOException {
		// µr 2500: 45 cm of 100 cm² and 130 cm of 150 cm², 200 turns, 1 A
		String source = CHAPMAN + "of a core with one narrow side (from memory)";
		OperatingPointResult p = study(iron(2500) + leg("core", "from=\"a\" to=\"b\"", 45, 100, "")
				+ leg("back", "from=\"b\" to=\"a\"", 130, 150, ""), 200, 1);
		double flux = p.leg("core").flux();
		rows.add(Row.printed("core with one narrow side", source, "reluctance of the narrow side, 1/H", p.leg("core").mmfDrop() / flux, 14300, 3));
		rows.add(Row.printed("core with one narrow side", source, "reluctance of the rest, 1/H", p.leg("back").mmfDrop() / flux, 27600, 3));
		rows.add(Row.printed("core with one narrow side", source, "reluctance of the whole, 1/H", 200 / flux, 41900, 3));
		rows.add(Row.printed("core with one narrow side", source, "flux, Wb", flux, 0.0048, 2));
		// µr 4000, 40 cm of 12 cm², gap 0.05 cm counted 5 % wider: a leg of its own, 400 turns
		source = CHAPMAN + "of a core with a gap widened by 5 % (from memory)";
		p = study(iron(4000) + leg("core", "from=\"a\" to=\"b\"", 40, 12, "") + leg("slot", "from=\"b\" to=\"a\"", 1e-6, 12.6, gap("gap", 0.5)), 400, 1);
		flux = p.leg("core").flux();
		rows.add(Row.printed("core with a widened gap", source, "reluctance of the core, 1/H", p.leg("core").mmfDrop() / flux, 66300, 3));
		rows.add(Row.printed("core with a widened gap", source, "reluctance of the gap, 1/H", p.gaps().get(0).mmfDrop() / flux, 316000, 3));
		rows.add(Row.printed("core with a widened gap", source, "current for 0.5 T in the gap, A", 0.5 * 12.6e-4 / flux, 0.602, 3));
		// µr 2000: stator 50 cm, rotor 5 cm of 12 cm², two gaps 0.05 cm of 14 cm², 200 turns, 1 A
		source = CHAPMAN + "of a stator and a rotor (from memory)";
		p = study(iron(2000) + "<joints id=\"c\" x=\"50 mm\" y=\"50 mm\"/><joints id=\"d\" x=\"50 mm\" y=\"90 mm\"/>"
				+ leg("core", "from=\"a\" to=\"b\"", 50, 12, "") + leg("first", "from=\"b\" to=\"c\"", 1e-6, 14, gap("g1", 0.5))
				+ leg("rotor", "from=\"c\" to=\"d\"", 5, 12, "") + leg("second", "from=\"d\" to=\"a\"", 1e-6, 14, gap("g2", 0.5)), 200, 1);
		flux = p.leg("core").flux();
		rows.add(Row.printed("stator and rotor", source, "reluctance of the stator, 1/H", p.leg("core").mmfDrop() / flux, 166000, 3));
		rows.add(Row.printed("stator and rotor", source, "reluctance of one gap, 1/H", p.gaps().get(0).mmfDrop() / flux, 284000, 3));
		rows.add(Row.printed("stator and rotor", source, "reluctance of the rotor, 1/H", p.leg("rotor").mmfDrop() / flux, 16600, 3));
		rows.add(Row.printed("stator and rotor", source, "flux density in the gap, T", flux / 14e-4, 0.19, 2));
	}

	private void coils() {
		// 300 turns, 25.0 cm, 4.00 cm², without the ends' effect: 1.81e-4 H
		double area = 4e-4;
		double diameter = Math.sqrt(4 * area / Math.PI);
		double ideal = Solenoid.currentSheet(300, diameter, 0.25) / Solenoid.nagaoka(diameter / 0.25);
		rows.add(Row.printed("solenoid of 300 turns", SERWAY, "inductance, H", ideal, 1.81e-4, 3));
		for (double[] row : new double[][] { { 0.1, 0.9588 }, { 0.2, 0.9201 }, { 0.5, 0.8181 }, { 1, 0.6884 }, { 2, 0.5255 } }) {
			rows.add(Row.printed("solenoid, D/l = " + row[0], NAGAOKA, "coefficient", Solenoid.nagaoka(row[0]), row[1], 4));
		}
		for (double[] row : new double[][] { { 2, 0.1736 }, { 5, 0.05582 }, { 10, 0.02029 }, { 20, 0.006749 } }) {
			rows.add(Row.printed("prolate ellipsoid, " + row[0] + " diameters long", OSBORN, "demagnetising factor",
					OpenCore.ellipsoid(row[0]), row[1], 4));
		}
		// l = c, r = 1.5c, as several coils of one layer: Wheeler's formula is within a per cent of it
		rows.add(Row.of("Brooks coil", GROVER, "inductance over r·N², H/m (Wheeler's formula for several layers, good to 1 %)",
				Solenoid.wheelerMultilayer(1, 1, 2.0 / 3, 2.0 / 3), 1.6994e-6, 0.01));
		// r = l = 1 inch, 10 turns: 100/19 = 5.263 µH
		rows.add(Row.printed("coil of one inch by one inch", WHEELER, "inductance, H", Solenoid.wheelerSingleLayer(10, 0.0254, 0.0254), 5.263e-6, 4));
		EffectiveParameters ring = EffectiveParameters.of(List.of(PathPart.ring(7.5e-3, 12.5e-3, 10e-3)));
		rows.add(Row.printed("ring core", MAKERS, "effective length, m", ring.length(), 60.2e-3, 3));
		rows.add(Row.printed("ring core", MAKERS, "effective area, m²", ring.area(), 48.9e-6, 3));
	}

	private void tables() {
		for (Object[] row : new Object[][] { { 10, 0.1019, 4 }, { 18, 0.0403, 3 }, { 20, 0.0320, 3 }, { 24, 0.0201, 3 }, { 30, 0.0100, 3 } }) {
			rows.add(Row.printed("AWG " + row[0], ASTM, "bare diameter, in", Quantity.parse("AWG " + row[0], Dimension.WIRE).si() / 0.0254,
					(double) row[1], (int) row[2]));
		}
		rows.add(Row.printed("oersted", NIST, "A/m", Quantity.parse("1 Oe", Dimension.FIELD_STRENGTH).si(), 79.57747, 7));
		rows.add(Row.printed("gauss", NIST, "T", Quantity.parse("1 G", Dimension.FLUX_DENSITY).si(), 1e-4, 7));
		rows.add(Row.printed("mil", NIST, "m", Quantity.parse("1 mil", Dimension.LENGTH).si(), 2.54e-5, 7));
		rows.add(Row.of("permeability of free space", CODATA, "H/m", MU_0, 1.25663706212e-6, 6e-10));
	}
}
