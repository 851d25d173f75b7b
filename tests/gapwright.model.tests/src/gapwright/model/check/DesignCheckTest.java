package gapwright.model.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.Consumer;

import org.junit.jupiter.api.Test;

import gapwright.model.AirPath;
import gapwright.model.Design;
import gapwright.model.DesignText;
import gapwright.model.GapwrightFactory;
import gapwright.model.GapwrightPackage;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;

/** Each fault put into a sound design gives its finding, on the right element, in words a designer understands. */
class DesignCheckTest {

	/** A fault and the one line it must give: severity code subject: message | hint. */
	private record Fault(String found, String replacement, List<String> findings) {
	}

	private static final String KNEE = "<curve xsi:type=\"gapwright:KneeCurve\" initialPermeability=\"2300.0\" saturationPolarisation=\"0.5 T\"/>";
	private static final String SATURATION = "<saturations temperature=\"25 °C\" fluxDensity=\"0.49 T\"/>";
	private static final String DRIVE = "<drives xsi:type=\"gapwright:CurrentDrive\" id=\"drive\" winding=\"main\" current=\"5 A\"/>";
	private static final String UNITS = " | Are the units right? 1 Oe is 79.58 A/m, 1 G is 0.1 mT.";
	private static final List<Fault> FAULTS = new ArrayList<>();

	private static void fault(String found, String replacement, String... findings) {
		FAULTS.add(new Fault(found, replacement, List.of(findings)));
	}

	private static String table(String... points) {
		StringBuilder table = new StringBuilder("<curve xsi:type=\"gapwright:TableCurve\">");
		for (String point : points) {
			String[] pair = point.split(" ");
			table.append("<points fieldStrength=\"").append(pair[0]).append(" A/m\" fluxDensity=\"").append(pair[1]).append(" T\"/>");
		}
		return table + "</curve>";
	}

	private static String tolerance(String attributes) {
		return "<tolerances id=\"t\" " + attributes + "/></gapwright:Design>";
	}

	static {
		// values
		fault("width=\"12 mm\" depth=\"15 mm\">", "width=\"0 mm\" depth=\"15 mm\">",
				"ERROR value-out-of-domain wound: width = '0 mm': must be above 0 | ");
		fault("width=\"12 mm\" depth=\"15 mm\">", "width=\"12 m\" depth=\"15 mm\">",
				"WARNING value-implausible wound: width = '12 m': units? Usual is 10 µm to 2 m | Did you mean 12 mm?");
		fault("width=\"12 mm\" depth=\"15 mm\">", "width=\"-12 mm\" depth=\"15 mm\">",
				"ERROR value-out-of-domain wound: width = '-12 mm': must be above 0 | ");
		fault("width=\"12 mm\" depth=\"15 mm\">", "depth=\"15 mm\">", "ERROR value-missing wound: width is missing | ");
		fault("width=\"12 mm\" depth=\"15 mm\">", "shape=\"ROUND\">", "ERROR value-missing wound: diameter is missing | ");
		fault("width=\"12 mm\" depth=\"15 mm\">", "shape=\"GIVEN\" area=\"180 m²\">",
				"WARNING value-implausible wound: area = '180 m²': units? Usual is 0.1 mm² to 0.1 m² | Did you mean 180 mm²?");
		fault("pathLength=\"90 mm\"", "pathLength=\"0 mm\"",
				"ERROR value-out-of-domain back: pathLength = '0 mm': must be above 0 | ",
				"ERROR leg-without-length back: the leg has neither iron nor gap | ");
		fault("pathLength=\"90 mm\"", "stackingFactor=\"95\"",
				"ERROR value-out-of-domain back: stackingFactor = '95.0': must be above 0, at most 1; did you mean 0.95? | ");
		fault("pathLength=\"90 mm\"", "stackingFactor=\"0.3\"",
				"WARNING value-implausible back: stackingFactor = '0.3': units? Usual is 0.5 to 1 | ");
		fault("turns=\"20\"", "turns=\"0\"",
				"ERROR value-out-of-domain coil: turns = '0': must be a whole number from 1 to 1000000 | ");
		fault("turns=\"20\"", "turns=\"20\" position=\"1.2\"",
				"ERROR value-out-of-domain coil: position = '1.2': must be from 0 to 1 | ");
		fault("length=\"0.80 mm\"", "length=\"0.80 mm\" pieces=\"0\"",
				"ERROR value-out-of-domain gap: pieces = '0': must be a whole number from 1 to 1000 | ");
		fault("length=\"0.80 mm\"", "length=\"0.80 mm\" windowHeight=\"0 mm\"",
				"ERROR value-out-of-domain gap: windowHeight = '0 mm': must be above 0 | ");
		fault("length=\"0.80 mm\"", "length=\"-0.80 mm\"",
				"ERROR value-out-of-domain gap: length = '-0.80 mm': a gap cannot be negative | ");
		fault("initialPermeability=\"2300.0\"", "initialPermeability=\"1\"",
				"ERROR value-out-of-domain ferrite: initialPermeability = '1.0': must be above 1 | ");
		fault("initialPermeability=\"2300.0\"", "initialPermeability=\"3e6\"",
				"WARNING value-implausible ferrite: initialPermeability = '3000000.0': units? Usual is up to 1000000 | ");
		fault("saturationPolarisation=\"0.5 T\"", "saturationPolarisation=\"5000 T\"",
				"WARNING value-implausible ferrite: saturationPolarisation = '5000 T': units? Usual is 0.05 T to 2.6 T | Did you mean 5000 G?");
		fault(KNEE, "<curve xsi:type=\"gapwright:LinearCurve\" relativePermeability=\"0.5\"/>",
				"ERROR value-out-of-domain ferrite: relativePermeability = '0.5': must be 1 or above | ");
		fault(KNEE, "<curve xsi:type=\"gapwright:RollOffCurve\" initialPermeability=\"60\" halfFieldStrength=\"8 kA/m\" exponent=\"1\"/>",
				"ERROR value-out-of-domain ferrite: exponent = '1.0': must be above 1 | ");
		fault(KNEE, "", "ERROR value-missing ferrite: the material has no B-H curve | ");
		fault("operatingPoints id=\"full\" temperature=\"25 °C\"", "operatingPoints id=\"full\" temperature=\"373 °C\"",
				"WARNING value-implausible full: temperature = '373 °C': units? Usual is -60 °C to 250 °C | Did you mean 373 K?");
		fault("operatingPoints id=\"full\" temperature=\"25 °C\"", "operatingPoints id=\"full\" temperature=\"-300 °C\"",
				"ERROR value-out-of-domain full: temperature = '-300 °C': must be from -273.15 °C to 1000 °C | ");
		fault("operatingPoints id=\"full\" temperature=\"25 °C\"", "operatingPoints id=\"full\"",
				"ERROR value-missing full: temperature is missing | ");
		fault("operatingPoints id=\"full\"", "operatingPoints id=\"full\" frequency=\"0 Hz\"",
				"ERROR value-out-of-domain full: frequency = '0 Hz': must be above 0 | ");
		fault("current=\"5 A\"", "current=\"5 A\" ripple=\"-1 A\"",
				"ERROR value-out-of-domain drive: ripple = '-1 A': must be 0 or above, peak to peak | ");
		fault("<windings id=\"main\">", "<windings id=\"main\" resistance=\"-1 mΩ\">",
				"ERROR value-out-of-domain main: resistance = '-1 mΩ': must be 0 or above | ");
		fault("<windings id=\"main\">", "<windings id=\"main\" wire=\"0 mm\">",
				"ERROR value-out-of-domain main: wire = '0 mm': must be above 0 | ");
		fault("</gapwright:Design>", "<limits nearFraction=\"1.5\"/></gapwright:Design>",
				"ERROR value-out-of-domain : nearFraction = '1.5': must be above 0, at most 1 | ");
		// materials
		fault(KNEE, table("100 0.2", "200 0.3", "150 0.35"),
				"ERROR table-not-rising ferrite: point 3 (150 A/m, 0.35 T) does not rise above the one before it | Both values must rise from point to point.");
		fault(KNEE, table("100 0.2", "200 0.2"),
				"ERROR table-not-rising ferrite: point 2 (200 A/m, 0.2 T) does not rise above the one before it | Both values must rise from point to point.");
		fault(KNEE, table("0 0"), "ERROR table-not-rising ferrite: the table has no point besides the origin | ");
		fault(KNEE, table("0 0", "100 0.2", "100100 0.3"),
				"WARNING table-slope-below-air ferrite: between point 2 and 3 the flux density rises slower than in air" + UNITS);
		fault(KNEE, table("0.1 0.2", "100 0.4"),
				"WARNING table-slope-implausible ferrite: the first points make a relative permeability above 1000000" + UNITS);
		fault(SATURATION, "",
				"WARNING saturation-missing ferrite: no saturation is given, so legs of this material cannot be judged | Add the saturation flux density of the maker's data sheet with its temperature.");
		fault(SATURATION, SATURATION + SATURATION,
				"ERROR saturation-temperature-twice ferrite: two saturations are given at 25 °C | Keep one of them.");
		fault(SATURATION, SATURATION + "<saturations temperature=\"100 °C\" fluxDensity=\"0.5 T\"/>",
				"WARNING saturation-rises ferrite: saturation rises from 0.49 T at 25 °C to 0.5 T at 100 °C; magnetic materials lose saturation when hot | ");
		fault(SATURATION, "<saturations temperature=\"25 °C\" fluxDensity=\"390 T\"/>",
				"WARNING value-implausible ferrite: fluxDensity = '390 T': units? Usual is 0.05 T to 2.6 T | Did you mean 390 mT?");
		fault("</materials>",
				"<loss coefficient=\"1\" frequencyExponent=\"1.4\" fluxDensityExponent=\"2.5\" minimumFrequency=\"1 MHz\" maximumFrequency=\"1 kHz\"/></materials>",
				"ERROR loss-range-empty ferrite: minimumFrequency = '1 MHz': above maximumFrequency = '1 kHz' | Exchange them.");
		fault("</materials>", "<permeabilities temperature=\"25 °C\" relativePermeability=\"2300\"/>"
				+ "<permeabilities temperature=\"298.15 K\" relativePermeability=\"2400\"/></materials>",
				"ERROR permeability-temperature-twice ferrite: two initial permeabilities are given at 298.15 K | Keep one of them.");
		fault("</materials>", "<otherCurves temperature=\"25 °C\">" + KNEE + "</otherCurves><otherCurves temperature=\"100 °C\"/></materials>",
				"ERROR curve-temperature-twice ferrite: two curves are given at 25 °C | Keep one of them.",
				"ERROR value-missing ferrite: the B-H curve is missing | ");
		// pairs of windings
		fault("</gapwright:Design>", "<leakages id=\"own\" first=\"main\" second=\"main\" firstBuild=\"3 mm\" secondBuild=\"1 mm\""
				+ " separation=\"-1 mm\" height=\"20 mm\" meanTurn=\"60 mm\"/></gapwright:Design>",
				"ERROR value-out-of-domain own: separation = '-1 mm': must be 0 or above | ",
				"ERROR winding-twice own: both windings are 'main' | Choose another for one of them.");
		fault("</gapwright:Design>", "<connections id=\"pair\"><members winding=\"main\"/></connections></gapwright:Design>",
				"ERROR connection-incomplete pair: a connection joins at least two windings, this one has 1 | Join another winding, or delete it.");
		fault("</gapwright:Design>", "<connections id=\"pair\"><members winding=\"main\"/><members winding=\"main\"/></connections></gapwright:Design>",
				"ERROR winding-twice pair: the winding 'main' is joined twice | Keep it once.");
		// tolerances
		fault("</gapwright:Design>", tolerance("targets=\"gap\" deviation=\"0.9 mm\""),
				"ERROR tolerance-reaches-outside t: deviation = '0.9 mm': the gap length of 'gap' reaches a negative gap | Make the deviation smaller.");
		fault("</gapwright:Design>", tolerance("targets=\"back\" feature=\"STACKING_FACTOR\" deviation=\"5 %\""),
				"ERROR tolerance-reaches-outside t: deviation = '5 %': the stacking factor of 'back' reaches outside 0 to 1 | Make the deviation smaller.");
		fault("</gapwright:Design>", tolerance("deviation=\"5 %\""),
				"ERROR tolerance-without-target t: the tolerance is on no element | Choose the elements it is for, or delete it.");
		fault("</gapwright:Design>", tolerance("targets=\"gap\" feature=\"WIDTH\" deviation=\"5 %\""),
				"ERROR tolerance-unfit t: 'gap' has no width | Choose another value or another element.");
		fault("</gapwright:Design>", tolerance("targets=\"gap\" deviation=\"5 mT\""),
				"ERROR tolerance-unfit t: deviation = '5 mT': the gap length deviates by a share, e.g. 10 %, or by a length, e.g. 0.5 mm | ");
		fault("</gapwright:Design>", tolerance("targets=\"ferrite\" feature=\"PERMEABILITY\" deviation=\"5 mm\""),
				"ERROR tolerance-unfit t: deviation = '5 mm': the permeability deviates by a share, e.g. 10 % | ");
		fault("</gapwright:Design>", "<tolerances id=\"s\" targets=\"gap\" deviation=\"5 %\"/>" + tolerance("targets=\"gap\" deviation=\"5 %\""),
				"ERROR tolerance-twice t: the gap length of 'gap' already has the tolerance 's' | Keep one.");
		fault("</gapwright:Design>", tolerance("targets=\"main\" feature=\"CURRENT\" deviation=\"-1 A\""),
				"ERROR value-out-of-domain t: deviation = '-1 A': must be 0 or above, to either side | ");
		// legs
		fault("to=\"b\" material=\"ferrite\"", "to=\"a\" material=\"ferrite\"",
				"ERROR same-joint-twice wound: both ends are attached to the joint 'a' | Attach one end to another joint.");
		fault("to=\"b\" material=\"ferrite\"", "material=\"ferrite\"",
				"ERROR value-missing wound: an end is attached to no joint | ");
		fault("to=\"b\" material=\"ferrite\"", "to=\"b\"",
				"ERROR material-missing wound: the leg has no material | Choose one in the Properties view.");
		fault("length=\"0.80 mm\"", "length=\"20 mm\" pieces=\"2\"",
				"ERROR gap-longer-than-leg wound: gaps and magnet take 40 mm of the 40 mm between the joints | Shorten them or move the joints apart.");
		fault("length=\"0.80 mm\"/>", "length=\"30 mm\"/><magnet id=\"m\" length=\"15 mm\" remanence=\"1 T\"/>",
				"ERROR gap-longer-than-leg wound: gaps and magnet take 45 mm of the 40 mm between the joints | Shorten them or move the joints apart.");
		fault("pathLength=\"90 mm\"/>", "pathLength=\"90 mm\"><gaps id=\"long\" length=\"50 mm\"/></legs>",
				"NOTE gap-longer-than-drawn back: gaps and magnet take 50 mm, but the leg is drawn 40 mm long; its path length as given is what counts | ");
		fault("width=\"12 mm\" depth=\"15 mm\">", "width=\"12 mm\" depth=\"15 mm\" stackingFactor=\"5e-324\">",
				"WARNING value-implausible wound: stackingFactor = '4.9E-324': units? Usual is 0.5 to 1 | ",
				"ERROR value-out-of-domain wound: the area of iron is out of the range of numbers | Check the units of its section.");
		fault("length=\"0.80 mm\"", "length=\"0 mm\"", "NOTE gap-zero gap: a gap of length 0 is no gap | ");
		fault("length=\"0.80 mm\"/>", "length=\"0.80 mm\"/><magnet id=\"m\" length=\"0 mm\" remanence=\"-1 T\" recoilPermeability=\"0.9\"/>",
				"ERROR value-out-of-domain m: length = '0 mm': must be above 0 | ",
				"ERROR value-out-of-domain m: remanence = '-1 T': must be 0 or above; reverse the magnet instead | ",
				"ERROR value-out-of-domain m: recoilPermeability = '0.9': must be 1 or above | ");
		fault("length=\"0.80 mm\"/>", "length=\"0.80 mm\"/><magnet id=\"m\" length=\"2 mm\" remanence=\"12000 T\" recoilPermeability=\"5\"/>",
				"WARNING value-implausible m: remanence = '12000 T': units? Usual is 0.1 T to 1.5 T | Did you mean 12000 G?",
				"WARNING value-implausible m: recoilPermeability = '5.0': units? Usual is 1 to 1.3 | ");
		// air paths
		fault("  <windings", "<airPaths id=\"air\" from=\"a\" to=\"b\"/><windings",
				"ERROR air-path-incomplete air: an air path needs a permeance, or an area with a length | ");
		fault("  <windings", "<airPaths id=\"air\" from=\"a\" to=\"b\" permeance=\"2 nH\" length=\"2 mm\"/><windings",
				"ERROR air-path-twice air: permeance and area or length are both given | Keep the one that is meant.");
		fault("  <windings", "<airPaths id=\"air\" from=\"a\" to=\"a\" permeance=\"-2 nH\"/><windings",
				"ERROR value-out-of-domain air: permeance = '-2 nH': must be above 0 | ",
				"ERROR same-joint-twice air: both ends are attached to the joint 'a' | Attach one end to another joint.");
		// windings and operating points
		fault("<coils id=\"coil\" leg=\"wound\" turns=\"20\"/>", "",
				"ERROR winding-without-coil main: the winding has no coil | Add a coil, or delete the winding.");
		fault("leg=\"wound\" turns", "turns", "ERROR value-missing coil: the coil is on no leg | ");
		fault("winding=\"main\" ", "",
				"ERROR drive-without-winding drive: the drive belongs to no winding | Choose its winding, or delete it.",
				"NOTE operating-point-without-drive full: no winding is driven at this operating point, so all currents are 0 | ");
		fault(DRIVE, DRIVE + DRIVE.replace("\"drive\"", "\"second\""),
				"ERROR drive-twice second: the winding 'main' has two drives at this operating point | Keep one.");
		fault(DRIVE, "",
				"NOTE operating-point-without-drive full: no winding is driven at this operating point, so all currents are 0 | ");
		fault("temperature=\"25 °C\">\n    " + DRIVE,
				"temperature=\"25 °C\" frequency=\"100 kHz\"><drives xsi:type=\"gapwright:VoltageDrive\" id=\"drive\" winding=\"main\" voltage=\"24 V\" onTime=\"20 µs\"/>",
				"ERROR on-time-longer-than-period drive: onTime = '20 µs': longer than the period of 100 kHz | Shorten it, or lower the frequency.");
		fault("temperature=\"25 °C\">\n    " + DRIVE,
				"temperature=\"25 °C\"><drives xsi:type=\"gapwright:VoltageDrive\" id=\"drive\" winding=\"main\" voltage=\"24 V\" onTime=\"0 s\"/>",
				"ERROR value-out-of-domain drive: onTime = '0 s': must be above 0 | ");
	}

	private static List<String> findings(Design design) {
		return DesignCheck.check(design).stream().map(p -> p.severity() + " " + p.code() + " " + p.subject() + ": "
				+ p.message() + " | " + p.hint()).toList();
	}

	@Test
	void aSoundDesignHasNoFinding() throws IOException {
		assertEquals(List.of(), findings(DesignText.read(DesignText.GOOD)));
	}

	@Test
	void everyFaultGivesItsFindingAndNoOther() throws IOException {
		assertTrue(FAULTS.size() > 50);
		for (Fault fault : FAULTS) {
			String broken = DesignText.GOOD.replace(fault.found(), fault.replacement());
			assertFalse(broken.equals(DesignText.GOOD), "the sample has no " + fault.found());
			assertEquals(fault.findings(), findings(DesignText.read(broken)), fault.replacement());
		}
	}

	private static void edited(Consumer<Design> change, String... expected) throws IOException {
		Design design = DesignText.read(DesignText.GOOD);
		change.accept(design);
		assertEquals(List.of(expected), findings(design));
	}

	/** What no file can hold, but an edit can leave behind. */
	@Test
	void whatOnlyAnEditCanBreakIsFoundToo() throws IOException {
		edited(design -> design.getJoints().get(1).setId("a"),
				"ERROR id-twice a: the id 'a' is given twice | Give one of them another id.");
		edited(design -> design.getJoints().get(1).setId(null), "ERROR value-missing : id is missing | ");
		edited(design -> design.getJoints().get(1).setId("my joint"),
				"ERROR value-out-of-domain my joint: id = 'my joint': an id must not contain blanks, # or :, nor begin with / | ");
		edited(design -> design.getLegs().get(0).setName("a\u0007b"),
				"ERROR value-out-of-domain wound: name = 'a\u0007b': the character U+0007 cannot be stored in a file, delete it | ");
		edited(design -> design.getOperatingPoints().clear(),
				"NOTE operating-point-missing : there is no operating point, so nothing is computed | Add one on the Operating points page.");
		edited(design -> design.getMaterials().clear(),
				"ERROR reference-outside wound: material refers to something that is not in the design any more | Choose another.",
				"ERROR reference-outside back: material refers to something that is not in the design any more | Choose another.");
		edited(design -> design.getLegs().get(0).setStackingFactor(Double.NaN),
				"ERROR value-out-of-domain wound: stackingFactor = 'NaN': must be above 0, at most 1 | ");
	}

	@Test
	void aDesignOfNothingIsJudgedWithoutFailing() {
		Design design = GapwrightFactory.eINSTANCE.createDesign();
		assertEquals(1, DesignCheck.check(design).size());
		AirPath path = GapwrightFactory.eINSTANCE.createAirPath();
		design.getAirPaths().add(path);
		design.getLegs().add(GapwrightFactory.eINSTANCE.createLeg());
		design.getJoints().add(GapwrightFactory.eINSTANCE.createJoint());
		design.getMaterials().add(GapwrightFactory.eINSTANCE.createMaterial());
		design.getWindings().add(GapwrightFactory.eINSTANCE.createWinding());
		assertTrue(DesignCheck.check(design).size() > 10);
	}

	@Test
	void everyCodeIsProvokedByThisTest() throws IOException {
		Set<String> provoked = new TreeSet<>(Set.of("id-twice", "reference-outside", "operating-point-missing"));
		FAULTS.forEach(fault -> fault.findings().forEach(finding -> provoked.add(finding.split(" ")[1])));
		Set<String> all = new TreeSet<>();
		for (ProblemCode code : ProblemCode.values()) {
			all.add(code.code());
		}
		assertEquals(all, provoked);
	}

	@Test
	void aDomainIsToldBeforeAValueReachesTheModel() {
		assertEquals("a gap cannot be negative", FeatureDomain.problem(GapwrightPackage.Literals.GAP__LENGTH,
				Quantity.parse("-1 mm", Dimension.LENGTH)));
		assertEquals(null, FeatureDomain.problem(GapwrightPackage.Literals.GAP__LENGTH, null));
		assertEquals("an id is needed, short and unique in the design",
				FeatureDomain.problem(GapwrightPackage.Literals.ELEMENT__ID, " "));
	}
}
