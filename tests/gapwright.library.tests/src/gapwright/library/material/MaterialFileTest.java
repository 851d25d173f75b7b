package gapwright.library.material;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;

import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

import gapwright.model.KneeCurve;
import gapwright.model.LinearCurve;
import gapwright.model.Material;
import gapwright.model.RollOffCurve;
import gapwright.model.TableCurve;

/** A material file is read whole or not at all, and every reason has its line and column. */
class MaterialFileTest {

	private static final String EXAMPLE = """
			gapwright-material,1
			# a comment
			name,Example ferrite
			source,"maker's sheet, curve at 100 °C, digitised 2026"
			units,A/m,T
			temperature,100 °C
			point,40,0.110
			point,200,0.320
			point,1200,0.395
			saturation,25 °C,0.49 T
			saturation,100 °C,0.39
			curie,215 °C
			density,4800 kg/m³
			loss,25 kHz,0.2 T,100 °C,54 kW/m³
			loss,100 kHz,0.1 T,100 °C,66 kW/m3
			loss,100 kHz,200 mT,100 °C,401 mW/cm³
			loss,300 kHz,0.05 T,100 °C,53.6 kW/m³
			""";

	@Test
	void theWholeFileBecomesAMaterial() {
		MaterialReading reading = read(EXAMPLE);
		assertEquals(List.of(), reading.problems());
		Material material = reading.material();
		assertEquals("Example ferrite", material.getName());
		assertEquals("example-ferrite", material.getId());
		assertEquals("maker's sheet, curve at 100 °C, digitised 2026", material.getSource());
		TableCurve table = (TableCurve) material.getCurve();
		assertEquals(3, table.getPoints().size());
		assertEquals("1200 A/m", table.getPoints().get(2).getFieldStrength().text());
		assertEquals(0.395, table.getPoints().get(2).getFluxDensity().si());
		assertEquals(100, material.getCurveTemperature().si());
		assertEquals(0.39, material.getSaturations().get(1).getFluxDensity().si());
		assertEquals("215 °C", material.getCurieTemperature().text());
		assertEquals(4800, material.getDensity().si());
		assertEquals("25 kHz", material.getLoss().getMinimumFrequency().text());
		assertEquals("300 kHz", material.getLoss().getMaximumFrequency().text());
		assertEquals(List.of(), reading.doubts());
		// made from the class figures of power ferrite, k 1.48, α 1.45, β 2.6, rounded to three digits
		assertEquals(1.45, material.getLoss().getFrequencyExponent(), 0.01);
		assertEquals(2.6, material.getLoss().getFluxDensityExponent(), 0.01);
		assertTrue(reading.lossFit().greatestMisfit() < 0.01);
	}

	@Test
	void twoTemperaturesMakeTwoCurves() {
		Material material = read(EXAMPLE + """
				temperature,25 °C
				point,40,0.13
				point,1200,0.49
				initial,2300,25 °C
				initial,3800,100 °C
				""").material();
		assertEquals(1, material.getOtherCurves().size());
		assertEquals(25, material.getOtherCurves().get(0).getTemperature().si());
		assertEquals(2, material.getPermeabilities().size());
	}

	@Test
	void aCurveMayBeGivenByItsParameters() {
		assertEquals(0.45, ((KneeCurve) curve("knee,2300,0.45 T")).getSaturationPolarisation().si());
		assertEquals(7500, ((RollOffCurve) curve("rolloff,60,7.5 kA/m,1.8")).getHalfFieldStrength().si());
		assertEquals(2300, ((LinearCurve) curve("initial,2300")).getRelativePermeability());
		assertNotNull(curve("arctan,30000,1.2 T"));
	}

	private static Object curve(String record) {
		MaterialReading reading = read("gapwright-material,1\nname,X\n" + record + "\n");
		assertEquals(List.of(), reading.problems());
		return reading.material().getCurve();
	}

	@Test
	void lossesPerMassNeedTheDensity() {
		String file = "gapwright-material,1\nname,X\nknee,4000,1.9 T\nsaturation,25 °C,1.9 T\nloss,50 Hz,1 T,25 °C,1.5 W/kg\n"
				+ "loss,50 Hz,1.5 T,25 °C,3.5 W/kg\nloss,400 Hz,1 T,25 °C,30 W/kg\n";
		assertProblem(file, 5, 22, "a loss per mass needs the density");
		MaterialReading reading = read(file + "density,7650 kg/m³\n");
		assertEquals(3.5 * 7650, reading.lossFit().loss(50, 1.5), 1e-6);
	}

	@Test
	void theIdIsMadeOfTheNameAndBeginsWithALetter() {
		assertEquals("material-3c-ferrite-u-2300", read(EXAMPLE.replace("Example ferrite", "3C Ferrite µ 2300")).material().getId());
		assertEquals("material", read(EXAMPLE.replace("Example ferrite", "磁性")).material().getId());
	}

	@Test
	void tooFewLossPointsAreSaidAndLeftOut() {
		MaterialReading reading = read("gapwright-material,1\nname,X\nknee,2300,0.569 T\nloss,100 kHz,0.1 T,100 °C,60 kW/m³\n");
		assertNull(reading.material().getLoss());
		assertTrue(reading.remarks().stream().anyMatch(r -> r.contains("needs at least 3")), reading.remarks().toString());
		assertTrue(reading.remarks().stream().anyMatch(r -> r.contains("No saturation")));
	}

	@Test
	void aPoorLossFitIsSaidWithItsMisfit() {
		MaterialReading reading = read("gapwright-material,1\nname,X\nknee,2300,0.569 T\nloss,10 kHz,0.1 T,100 °C,1 kW/m³\n"
				+ "loss,10 kHz,0.2 T,100 °C,20 kW/m³\nloss,100 kHz,0.1 T,100 °C,20 kW/m³\nloss,100 kHz,0.2 T,100 °C,40 kW/m³\n");
		assertTrue(reading.remarks().stream().anyMatch(r -> r.startsWith("The loss fit misses")), reading.remarks().toString());
	}

	/** A fault put into the example: what replaces what, and where the reader must point. */
	private record Fault(String find, String put, int line, int column, String says) {
	}

	private static final List<Fault> FAULTS = List.of(
			new Fault("gapwright-material,1", "name,A", 1, 1, "the first record must be the head"),
			new Fault("gapwright-material,1", "gapwright-material,2", 1, 20, "version '2'"),
			new Fault("gapwright-material,1", "gapwright-material", 1, 1, "no version"),
			new Fault("curie,215 °C", "curi,215 °C", 12, 1, "no such kind of record"),
			new Fault("curie,215 °C", "curie,215", 12, 7, "a temperature needs a unit"),
			new Fault("curie,215 °C", "curie,215 T", 12, 7, "that is a flux density"),
			new Fault("curie,215 °C", "curie", 12, 6, "'curie' ends after 0 values, it needs 1"),
			new Fault("curie,215 °C", "curie,215 °C\ncurie,216 °C", 13, 1, "a second 'curie', the first is in line 12"),
			new Fault("units,A/m,T", "", 7, 7, "a field strength needs a unit"),
			new Fault("units,A/m,T", "units,A/m,Tesla", 5, 11, "no unit of a flux density"),
			new Fault("units,A/m,T", "units,A/m", 5, 10, "'units' ends after 1 value, it needs 2"),
			new Fault("point,200,0.320", "point,200,0,320", 8, 13, "a comma parts values"),
			new Fault("point,200,0.320", "point,30,0.320", 8, 7, "'30 A/m' does not rise above the point before, 40.0 A/m and 0.11 T"),
			new Fault("point,200,0.320", "point,200,0.110", 8, 11, "does not rise"),
			new Fault("point,40,0.110", "point,-40,0.110", 7, 7, "does not rise above the point before, the origin"),
			new Fault("point,200,0.320", "point,2OO,0.320", 8, 7, "'2OO'"),
			new Fault("point,200,0.320", "point,200,NaN", 8, 11, "'NaN'"),
			new Fault("point,200,0.320", "point,1e999,0.320", 8, 7, "out of the range"),
			new Fault("saturation,25 °C,0.49 T", "saturation,25 °C,-0.49 T", 10, 18, "must be above 0"),
			new Fault("saturation,25 °C,0.49 T", "saturation,100 °C,0.49 T", 11, 12, "a second saturation at 100 °C, the first is in line 10"),
			new Fault("density,4800 kg/m³", "density,0 kg/m³", 13, 9, "must be above 0"),
			new Fault("density,4800 kg/m³", "knee,2300,0.5 T", 13, 1, "a curve by parameters beside points"),
			new Fault("density,4800 kg/m³", "knee,1,0.5 T", 13, 6, "must be above 1"),
			new Fault("density,4800 kg/m³", "rolloff,60,7.5 kA/m,1", 13, 21, "the exponent must be above 1"),
			new Fault("density,4800 kg/m³", "initial,2300", 13, 9, "needs its temperature"),
			new Fault("density,4800 kg/m³", "temperature,25 °C", 13, 1, "no curve follows this temperature"),
			new Fault("density,4800 kg/m³", "temperature,100 °C\npoint,10,0.1", 13, 13, "a second curve at 100 °C, the first begins in line 6"),
			new Fault("density,4800 kg/m³", "steinmetz,1.48,1.45,2.6,100 °C", 14, 1, "loss points beside the steinmetz of line 13"),
			new Fault("density,4800 kg/m³", "steinmetz,0,1.45,2.6,100 °C", 13, 11, "the coefficient must be above 0"),
			new Fault("401 mW/cm³", "401", 16, 28, "a loss needs a unit"),
			new Fault("401 mW/cm³", "401 W", 16, 28, "unknown unit 'W'"),
			new Fault("401 mW/cm³", "-1 W/kg", 16, 28, "a loss must be above 0"),
			new Fault("100 kHz,200 mT,100 °C", "100 kHz,200 mT,25 °C", 16, 21, "a loss at 25 °C"),
			new Fault("name,Example ferrite", "name,\"Example ferrite", 3, 6, "does not end on this line"),
			new Fault("name,Example ferrite", "name,\"Example\" ferrite", 3, 15, "text behind a closing quote"),
			new Fault("name,Example ferrite", "name,", 3, 5, "'name' ends after 0 values, it needs 1"),
			new Fault("name,Example ferrite", "name,\"\"", 3, 5, "'name' ends after 0 values"),
			new Fault("name,Example ferrite", "name,a\u0007b", 3, 7, "a control character"),
			new Fault("name,Example ferrite\n", "", 16, 1, "the file ends without a name"));

	@TestFactory
	List<DynamicTest> everyFaultIsRefusedWhereItStands() {
		List<DynamicTest> tests = new ArrayList<>();
		for (Fault fault : FAULTS) {
			tests.add(DynamicTest.dynamicTest(fault.put().isEmpty() ? "without " + fault.find().strip() : fault.put(), () -> {
				assertTrue(EXAMPLE.contains(fault.find()));
				assertProblem(EXAMPLE.replace(fault.find(), fault.put()), fault.line(), fault.column(), fault.says());
			}));
		}
		return tests;
	}

	private static void assertProblem(String file, int line, int column, String says) {
		MaterialReading reading = read(file);
		assertNull(reading.material(), "nothing may be half-loaded");
		FileProblem first = reading.problems().get(0);
		assertTrue(first.line() == line && first.column() == column && first.message().contains(says), first.toString());
	}

	@Test
	void everyFaultOfAFileIsNamedAtOnce() {
		MaterialReading reading = read(EXAMPLE.replace("curie,215 °C", "curie,215").replace("point,200,0.320", "point,x,0.320")
				.replace("density,4800", "density,-1"));
		assertEquals(List.of(8, 12, 13), reading.problems().stream().map(FileProblem::line).toList());
	}

	@Test
	void anotherEncodingIsSaidAndNotMisread() {
		byte[] latin = EXAMPLE.getBytes(StandardCharsets.ISO_8859_1);
		MaterialReading reading = MaterialFile.read(latin, BareUnits.AS_IN_FILE);
		FileProblem problem = reading.problems().get(0);
		assertTrue(problem.line() == 4 && problem.message().contains("UTF-8"), problem.toString());
	}

	@Test
	void lineEndsOfOtherSystemsAMarkAtTheStartAndPaddedRowsAreRead() {
		assertNotNull(read("\uFEFF" + EXAMPLE.replace("\n", "\r\n")).material());
		assertNotNull(read(EXAMPLE.replace("\n", "\r")).material());
		assertNotNull(read(EXAMPLE.replace("curie,215 °C", "curie,215 °C,,,")).material());
	}

	@Test
	void aChosenUnitHoldsForBareNumbersOnly() {
		String oersted = EXAMPLE.replace("point,1200,0.395", "point,1200 A/m,395 mT");
		MaterialReading reading = read(oersted, new BareUnits("Oe", "G"));
		TableCurve table = (TableCurve) read(EXAMPLE, new BareUnits("Oe", "T")).material().getCurve();
		assertEquals(40 * 79.5775, table.getPoints().get(0).getFieldStrength().si(), 0.01);
		// 200 Oe lies above the 1200 A/m written out
		assertTrue(reading.problems().get(0).message().contains("does not rise"), reading.problems().toString());
	}

	/** 1 Oe = 1000/(4π) A/m, 1 T = 10 000 G: definitions. Each mistake must be offered back, none made silently. */
	@TestFactory
	List<DynamicTest> mistakenUnitsAreDoubtedAndTheRightOnesOffered() {
		return List.of(
				doubted("G read as T", "point,0.5,1100\npoint,2.5,3200\npoint,15,3950", "units,Oe,T", new BareUnits("Oe", "G")),
				doubted("mT read as T", "point,40,110\npoint,200,320\npoint,1200,395", "units,A/m,T", new BareUnits("A/m", "mT")),
				doubted("Oe read as A/m", "point,0.5,0.11\npoint,2.5,0.32\npoint,15,0.395", "units,A/m,T", new BareUnits("Oe", "T")),
				doubted("kA/m read as A/m", "point,0.04,0.11\npoint,0.2,0.32\npoint,1.2,0.395", "units,A/m,T", new BareUnits("kA/m", "T")),
				doubted("A/m read as kA/m", "point,40,0.11\npoint,200,0.32\npoint,1200,0.395", "units,kA/m,T", new BareUnits("A/m", "T")));
	}

	private static DynamicTest doubted(String name, String points, String units, BareUnits right) {
		return DynamicTest.dynamicTest(name, () -> {
			MaterialReading reading = read("gapwright-material,1\nname,X\n" + units + "\n" + points + "\nsaturation,25 °C,0.49 T\n");
			assertEquals(List.of(), reading.problems());
			assertTrue(reading.doubts().stream().anyMatch(d -> d.apt() && d.instead().equals(right)), reading.doubts().toString());
			// what was written is what was read
			assertEquals(units.split(",")[1], ((TableCurve) reading.material().getCurve()).getPoints().get(0).getFieldStrength().unit());
			assertEquals(List.of(), read("gapwright-material,1\nname,X\n" + units + "\n" + points + "\n", right).doubts());
		});
	}

	/** Whatever happens to a file, it is read whole or refused with reasons inside it; nothing is thrown. */
	@Test
	void noDamageMakesAHalfReadMaterial() {
		Random random = new Random(20261201);
		for (int n = 0; n < 3000; n++) {
			byte[] bytes = EXAMPLE.getBytes(StandardCharsets.UTF_8);
			if (n % 3 == 0) {
				bytes = java.util.Arrays.copyOf(bytes, random.nextInt(bytes.length));
			}
			for (int k = 0; k < 1 + n % 4 && bytes.length > 0; k++) {
				bytes[random.nextInt(bytes.length)] = (byte) (k == 0 ? ",\"#\n-.e0°".charAt(random.nextInt(9)) : random.nextInt());
			}
			MaterialReading reading = MaterialFile.read(bytes, BareUnits.AS_IN_FILE);
			assertEquals(reading.material() == null, !reading.problems().isEmpty(), "seed 20261201, case " + n);
			int lines = new String(bytes, StandardCharsets.UTF_8).split("\r\n|\r|\n", -1).length;
			for (FileProblem problem : reading.problems()) {
				assertTrue(problem.line() >= 1 && problem.line() <= lines && problem.column() >= 1, problem.toString());
			}
			if (reading.material() != null) {
				assertNotNull(reading.material().getCurve());
			}
		}
	}

	@Test
	void aStreamIsReadToItsEndAndAHugeOneRefused() throws IOException {
		assertNotNull(MaterialFile.read(new ByteArrayInputStream(EXAMPLE.getBytes(StandardCharsets.UTF_8)), BareUnits.AS_IN_FILE).material());
		assertTrue(MaterialFile.read(new byte[2 << 20], BareUnits.AS_IN_FILE).problems().get(0).message().contains("1 MB"));
		assertTrue(read("").problems().get(0).message().contains("no record"));
	}

	private static MaterialReading read(String text) {
		return read(text, BareUnits.AS_IN_FILE);
	}

	private static MaterialReading read(String text, BareUnits units) {
		return MaterialFile.read(text.getBytes(StandardCharsets.UTF_8), units);
	}
}
