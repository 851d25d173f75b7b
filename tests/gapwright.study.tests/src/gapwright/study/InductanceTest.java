package gapwright.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;

import org.junit.jupiter.api.Test;

/** What the inductance matrix says about windings, and what volt-seconds do. */
class InductanceTest {

	private static final String END = "</gapwright:Design>";
	private static final String TWIN = "<windings id=\"twin\"><coils id=\"twin-coil\" leg=\"wound\" turns=\"20\"/></windings>";
	private static final String OTHER = "<windings id=\"other\"><coils id=\"other-coil\" leg=\"back\" turns=\"5\"/></windings>";
	private static final String AIR = "<airPaths id=\"air\" from=\"a\" to=\"b\" permeance=\"40 nH\"/>";

	private static OperatingPointResult point(StudyResult result) {
		return result.operatingPoints().get(0);
	}

	private static String connection(String kind, String... members) {
		StringBuilder text = new StringBuilder("<connections id=\"joined\" kind=\"" + kind + "\">");
		for (String member : members) {
			text.append("<members winding=\"").append(member.replace("-", "")).append('"')
					.append(member.startsWith("-") ? " reversed=\"true\"" : "").append("/>");
		}
		return text + "</connections>";
	}

	private static double joined(String... changes) {
		return point(Designs.study(changes)).connections().get(0).inductance();
	}

	/** Two windings with all flux in common: 4L aiding, 0 opposing, L in parallel. Elementary. */
	@Test
	void perfectlyCoupledTwinsJoinAsOneWindingOfTwiceTheTurns() {
		double own = point(Designs.study()).inductance().of("main");
		assertEquals(4 * own, joined(END, TWIN + connection("SERIES", "main", "twin") + END), 1e-10 * own);
		assertEquals(0, joined(END, TWIN + connection("SERIES", "main", "-twin") + END), 1e-10 * own);
		assertEquals(own, joined(END, TWIN + connection("PARALLEL", "main", "twin") + END), 1e-9 * own);
	}

	/** With the mutual inductance M: L₁ + L₂ ± 2M in series, (L₁L₂ − M²)/(L₁ + L₂ ∓ 2M) in parallel. Textbook. */
	@Test
	void partlyCoupledWindingsJoinByTheTextbook() {
		String air = AIR + OTHER;
		OperatingPointResult p = point(Designs.study("  <windings", AIR + "  <windings", END, OTHER + END));
		double l1 = p.inductance().of("main");
		double l2 = p.inductance().of("other");
		double m = p.inductance().mutual("main", "other");
		assertTrue(m != 0 && air.length() > 0);
		String[] base = { "  <windings", AIR + "  <windings", END, "" };
		base[3] = OTHER + connection("SERIES", "main", "other") + END;
		assertEquals(l1 + l2 + 2 * m, joined(base), 1e-10 * l1);
		base[3] = OTHER + connection("SERIES", "main", "-other") + END;
		assertEquals(l1 + l2 - 2 * m, joined(base), 1e-10 * l1);
		base[3] = OTHER + connection("PARALLEL", "main", "other") + END;
		assertEquals((l1 * l2 - m * m) / (l1 + l2 - 2 * m), joined(base), 1e-10 * l1);
		base[3] = OTHER + connection("PARALLEL", "main", "-other") + END;
		assertEquals((l1 * l2 - m * m) / (l1 + l2 + 2 * m), joined(base), 1e-10 * l1);
		double k = p.inductance().coupling("main", "other");
		assertEquals(l1 * (1 - k * k), p.inductance().leakage("main", "other"), 1e-9 * l1);
	}

	@Test
	void unequalTurnsInParallelRoundOneLegAreRefused() {
		StudyResult result = Designs.study(END, TWIN.replace("\"20\"", "\"19\"") + connection("PARALLEL", "main", "twin") + END);
		assertTrue(point(result).connections().isEmpty());
		assertTrue(result.findings().stream().anyMatch(f -> f.code().equals("unequal-parallel-turns") && f.subject().equals("joined")));
		assertTrue(point(result).converged());
	}

	/** Energy method for builds of 3 and 3 mm, 0.5 mm apart, 30 mm high, mean turn 80 mm, 20 turns: 3.1199 µH by hand. */
	@Test
	void leakageOfTwoWindingsComesFromTheirBuildsAndLowersTheirCoupling() {
		OperatingPointResult p = point(Designs.study(END, TWIN + "<leakages id=\"between\" first=\"main\" second=\"twin\""
				+ " firstBuild=\"3 mm\" secondBuild=\"3 mm\" separation=\"0.5 mm\" height=\"30 mm\" meanTurn=\"80 mm\"/>" + END));
		LeakageResult leakage = p.leakages().get(0);
		assertEquals(3.1199e-6, leakage.inductance(), 5e-11);
		assertEquals(leakage.inductance(), leakage.shortCircuit(), 1e-18);
		double l = p.inductance().of("main");
		assertEquals(leakage.shortCircuit(), (l + leakage.inductance()) * (1 - leakage.coupling() * leakage.coupling()), 1e-12 * l);
	}

	@Test
	void leakageOutsideItsFormulaIsSaid() {
		String flat = "<leakages id=\"between\" first=\"main\" second=\"twin\" firstBuild=\"9 mm\" secondBuild=\"9 mm\""
				+ " separation=\"0 mm\" height=\"10 mm\" meanTurn=\"80 mm\"/>";
		StudyResult doubtful = Designs.study(END, TWIN + flat + END);
		assertTrue(doubtful.findings().stream().anyMatch(f -> f.code().equals("leakage-outside-validity")));
		StudyResult refused = Designs.study(END, TWIN + flat.replace("10 mm", "8 mm") + END);
		assertTrue(refused.findings().stream().anyMatch(f -> f.code().equals("leakage-refused")));
		assertTrue(point(refused).leakages().isEmpty());
	}

	/** Windings with 0.98 to 0.999 are usual round one leg (common practice); a fifth of the inductance as leakage is not. */
	@Test
	void aLowCouplingIsNoted() {
		String loose = "<leakages id=\"between\" first=\"main\" second=\"twin\" firstBuild=\"3 mm\" secondBuild=\"3 mm\""
				+ " separation=\"SEPARATION\" height=\"30 mm\" meanTurn=\"80 mm\"/>";
		StudyResult tight = Designs.study(END, TWIN + loose.replace("SEPARATION", "0.1 mm") + END);
		StudyResult apart = Designs.study(END, TWIN + loose.replace("SEPARATION", "22 mm") + END);
		assertTrue(point(tight).leakages().get(0).coupling() > 0.9 && point(apart).leakages().get(0).coupling() < 0.9);
		assertTrue(tight.findings().stream().noneMatch(f -> f.code().equals("coupling-low")));
		assertTrue(apart.findings().stream().anyMatch(f -> f.code().equals("coupling-low") && f.subject().equals("between")));
	}

	@Test
	void inductanceFactorIsInductancePerTurnSquared() {
		OperatingPointResult p = point(Designs.study());
		assertEquals(p.inductance().of("main") / 400, p.winding("main").inductanceFactor(), 1e-18);
	}

	/** Legs in series carry one flux: windings on different legs can short-circuit each other as well. */
	@Test
	void windingsOfUnequalTurnsOnLegsInSeriesAreRefusedInParallelToo() {
		StudyResult result = Designs.study(END, OTHER + connection("PARALLEL", "main", "other") + END);
		assertTrue(Double.isNaN(point(result).connections().get(0).inductance()));
		assertTrue(result.findings().stream().anyMatch(f -> f.code().equals("unequal-parallel-turns") && f.subject().equals("joined")));
		String equal = OTHER.replace("\"5\"", "\"20\"");
		double own = point(Designs.study()).inductance().of("main");
		assertEquals(own, joined(END, equal + connection("PARALLEL", "main", "other") + END), 1e-9 * own);
		StudyResult opposed = Designs.study(END, equal + connection("PARALLEL", "main", "-other") + END);
		assertTrue(opposed.findings().stream().anyMatch(f -> f.code().equals("unequal-parallel-turns")));
	}

	@Test
	void windingsThatShareAllFluxHaveNoLeakageAndThatIsSaid() {
		StudyResult result = Designs.study(END, TWIN + END);
		InductanceMatrix matrix = point(result).inductance();
		assertEquals(0, matrix.leakage("main", "twin"), 0);
		assertEquals(1, matrix.coupling("main", "twin"), 1e-12);
		assertTrue(matrix.coupling("main", "twin") <= 1);
		assertEquals(1, result.findings().stream().filter(f -> f.code().equals("coupling-complete")).count());
		String built = "<leakages id=\"between\" first=\"main\" second=\"twin\" firstBuild=\"3 mm\" secondBuild=\"3 mm\""
				+ " separation=\"0.5 mm\" height=\"30 mm\" meanTurn=\"80 mm\"/>";
		assertTrue(Designs.study(END, TWIN + built + END).findings().stream().noneMatch(f -> f.code().equals("coupling-complete")));
		StudyResult apart = Designs.study("  <windings", AIR + "  <windings", END, OTHER + END);
		assertTrue(apart.findings().stream().noneMatch(f -> f.code().equals("coupling-complete")));
		assertTrue(point(apart).inductance().leakage("main", "other") > 0);
	}

	/** Linear core: energy and co-energy are both half of Σ current·linkage. Elementary. */
	@Test
	void storedEnergyOfALinearCoreIsHalfCurrentTimesLinkage() {
		OperatingPointResult p = point(Designs.study("<curve xsi:type=\"gapwright:KneeCurve\" initialPermeability=\"2300.0\" saturationPolarisation=\"0.569 T\"/>",
				"<curve xsi:type=\"gapwright:LinearCurve\" relativePermeability=\"2300.0\"/>"));
		assertEquals(p.inductance().of("main") * 10 * 10 / 2, p.energy(), 1e-12 * p.energy());
		assertEquals(p.energy(), p.coEnergy(), 1e-12 * p.energy());
		assertEquals(p.inductance().of("main"), p.winding("main").apparentInductance(), 1e-12);
	}

	private static StudyResult driven(String... drives) {
		String current = "<drives xsi:type=\"gapwright:CurrentDrive\" id=\"drive\" winding=\"main\" current=\"10 A\" ripple=\"4 A\"/>";
		return Designs.study(current, String.join("", drives), "  <windings", AIR + "  <windings", END, OTHER + END);
	}

	private static String voltage(String winding, String voltage, String time, String bias, String waveform) {
		return "<drives xsi:type=\"gapwright:VoltageDrive\" id=\"on-" + winding + "\" winding=\"" + winding + "\" voltage=\"" + voltage
				+ "\" onTime=\"" + time + "\" bias=\"" + bias + "\" waveform=\"" + waveform + "\"/>";
	}

	/**
	 * Volts, frequency, turns and iron: V/(4·f·N·A) for a symmetric square wave, V_rms/(4.443·f·N·A) for a sine wave.
	 * Textbook of transformers, from memory. Here 20 turns, 180 mm², half a period of on-time.
	 */
	@Test
	void aSymmetricVoltageGivesThePeakFluxDensityOfTheTextbook() {
		double iron = 180e-6;
		double frequency = 50e3;
		StudyResult square = driven(voltage("main", "36 V", "10 µs", "0 A", "RECTANGULAR"));
		assertEquals(36 / (4 * frequency * 20 * iron), point(square).leg("wound").peakFluxDensity(), 1e-9);
		StudyResult sine = driven(voltage("main", 36 * Math.sqrt(2) + " V", "10 µs", "0 A", "SINUSOIDAL"));
		assertEquals(36 / (Math.PI * Math.sqrt(2) * frequency * 20 * iron), point(sine).leg("wound").peakFluxDensity(), 1e-9);
		assertEquals(36 / (4.443 * frequency * 20 * iron), point(sine).leg("wound").peakFluxDensity(), 1e-5);
		StudyResult triangle = driven(voltage("main", "36 V", "10 µs", "0 A", "TRIANGULAR"));
		assertEquals(36 / (8 * frequency * 20 * iron), point(triangle).leg("wound").peakFluxDensity(), 1e-9);
		WindingResult main = point(square).winding("main");
		assertEquals(0, main.current(), 0);
		assertEquals(-main.lowestCurrent(), main.highestCurrent(), 1e-9 * main.highestCurrent());
	}

	/** The currents a voltage drives, imposed as currents, must give the flux that the voltage gave. */
	@Test
	void currentsFoundForVoltagesGiveBackTheVoltSeconds() {
		StudyResult mixed = driven(voltage("main", "30 V", "8 µs", "9 A", "RECTANGULAR"),
				"<drives xsi:type=\"gapwright:CurrentDrive\" id=\"held\" winding=\"other\" current=\"5 A\" ripple=\"2 A\"/>");
		WindingResult main = point(mixed).winding("main");
		assertEquals(5, point(mixed).winding("other").current(), 0);
		assertEquals(4, point(mixed).winding("other").lowestCurrent(), 0);
		assertEquals(6, point(mixed).winding("other").highestCurrent(), 0);
		double[] linkage = new double[2];
		for (int end = 0; end < 2; end++) {
			StudyResult there = driven(
					"<drives xsi:type=\"gapwright:CurrentDrive\" id=\"drive\" winding=\"main\" current=\""
							+ (end == 0 ? main.lowestCurrent() : main.highestCurrent()) + " A\"/>",
					"<drives xsi:type=\"gapwright:CurrentDrive\" id=\"held\" winding=\"other\" current=\"" + (end == 0 ? 4 : 6) + " A\"/>");
			linkage[end] = point(there).winding("main").linkage();
		}
		assertEquals(30 * 8e-6, linkage[1] - linkage[0], 1e-9 * 30 * 8e-6);
		StudyResult both = driven(voltage("main", "30 V", "8 µs", "9 A", "RECTANGULAR"), voltage("other", "4 V", "8 µs", "2 A", "SINUSOIDAL"));
		assertTrue(point(both).converged());
		assertTrue(point(both).winding("other").highestCurrent() > 2);
	}

	@Test
	void aVoltageOnAWindingThatNoFluxLinksIsRefusedInItsOwnWords() {
		StudyResult cancels = Designs.study("<coils id=\"coil\" leg=\"wound\" turns=\"20\"/>",
				"<coils id=\"coil\" leg=\"wound\" turns=\"20\"/><coils id=\"against\" leg=\"back\" turns=\"20\" reversed=\"true\"/>",
				"xsi:type=\"gapwright:CurrentDrive\"", "xsi:type=\"gapwright:VoltageDrive\"",
				"current=\"10 A\" ripple=\"4 A\"", "voltage=\"30 V\" onTime=\"10 µs\" bias=\"0 A\"");
		assertTrue(cancels.findings().stream().anyMatch(f -> f.code().equals("voltage-without-flux") && f.subject().equals("main")),
				() -> cancels.findings().toString());
		assertTrue(!point(cancels).converged());
	}

	private static WindingResult pulse(String voltage, String time, String waveform) {
		String drive = "<drives xsi:type=\"gapwright:CurrentDrive\" id=\"drive\" winding=\"main\" current=\"10 A\" ripple=\"4 A\"/>";
		return point(Designs.study(drive, "<drives xsi:type=\"gapwright:VoltageDrive\" id=\"drive\" winding=\"main\" voltage=\"" + voltage
				+ "\" onTime=\"" + time + "\" bias=\"10 A\" waveform=\"" + waveform + "\"/>")).winding("main");
	}

	/**
	 * Faraday: pulses of equal volt-seconds swing the current alike, whatever their shape: V·t, V·t/2, 2·V·t/π. For a
	 * small swing the current moves by V·t/L.
	 */
	@Test
	void pulsesOfEqualVoltSecondsSwingTheCurrentAlike() {
		WindingResult rectangular = pulse("10 V", "1 µs", "RECTANGULAR");
		WindingResult triangular = pulse("20 V", "1 µs", "TRIANGULAR");
		WindingResult sinusoidal = pulse("10 V", "1.5707963267948966 µs", "SINUSOIDAL");
		double swing = rectangular.highestCurrent() - rectangular.lowestCurrent();
		assertEquals(swing, triangular.highestCurrent() - triangular.lowestCurrent(), 1e-9 * swing);
		assertEquals(swing, sinusoidal.highestCurrent() - sinusoidal.lowestCurrent(), 1e-9 * swing);
		double l = point(Designs.study()).inductance().of("main");
		assertEquals(10 * 1e-6 / l, swing, 1e-3 * swing);
		assertEquals(10, rectangular.current(), 0);
	}

	@Test
	void aDeepSwingNeedsMoreCurrentOnTheSaturatedSide() {
		WindingResult deep = pulse("100 V", "10 µs", "RECTANGULAR");
		assertTrue(deep.highestCurrent() - 10 > 10 - deep.lowestCurrent());
		assertNull(point(Designs.study()).winding("twin"));
		assertEquals(List.of(), point(Designs.study()).connections());
	}
}
