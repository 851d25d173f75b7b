package gapwright.help;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;

import org.junit.jupiter.api.Test;

import gapwright.library.Example;
import gapwright.library.Examples;
import gapwright.model.Design;
import gapwright.model.DesignReader;
import gapwright.study.LeakageResult;
import gapwright.study.Lowering;
import gapwright.study.OperatingPointResult;
import gapwright.study.Progress;
import gapwright.study.Study;
import gapwright.study.tolerance.Band;
import gapwright.study.tolerance.ToleranceRequest;
import gapwright.study.tolerance.ToleranceResult;
import gapwright.study.tolerance.ToleranceStudy;

/** The figures the guide tells of the examples are those they have. */
class ExampleFiguresTest {

	private static final Path PAGES = Path.of("../../bundles/gapwright.help/html");
	private static final String WALK = "examples.html";

	@Test
	void boostChoke() throws IOException {
		OperatingPointResult hot = point("boost-choke", "full-load");
		says(WALK, perCent(hot, "centre-leg"));
		says("first-steps.html", perCent(hot, "centre-leg"));
		says(WALK, perCent(point("boost-choke", "morning"), "centre-leg"));
		says("command-line.html", String.format(Locale.ROOT, "%.4f T", hot.leg("centre-leg").peakFluxDensity()));
	}

	@Test
	void tolerancesOfTheBoostChoke() throws IOException {
		ToleranceResult result = ToleranceStudy.run(Lowering.of(design("boost-choke")), new ToleranceRequest(0, 1), Progress.NONE);
		Band worst = result.point("full-load").band(Band.Kind.UTILISATION, "centre-leg");
		says(WALK, "reaches " + Math.round(worst.cornerHigh() * 100) + " %");
	}

	@Test
	void outputChoke() throws IOException {
		says(WALK, micro(point("output-choke-toroid", "full-load").inductance().of("main")));
		says(WALK, micro(point("output-choke-toroid", "battery-full").inductance().of("main")));
	}

	@Test
	void reactor() throws IOException {
		OperatingPointResult stalled = point("three-phase-reactor", "stalled-pump");
		for (String page : new String[] { WALK, "saturation.html" }) {
			says(page, perCent(stalled, "leg-b"));
		}
		says("saturation.html", String.format(Locale.ROOT, "%.3f mH", stalled.inductance().of("phase-b") * 1e3));
		double usual = point("three-phase-reactor", "crest-b").inductance().of("phase-b");
		says("saturation.html", String.format(Locale.ROOT, "%.2f mH", usual * 1e3));
	}

	@Test
	void coupledChoke() throws IOException {
		double coupling = point("coupled-choke", "balanced").inductance().coupling("phase-one", "phase-two");
		says(WALK, String.format(Locale.ROOT, "−%.2f", -coupling));
	}

	@Test
	void flybackTransformer() throws IOException {
		LeakageResult leakage = point("flyback-transformer", "storing").leakages().get(0);
		says(WALK, String.format(Locale.ROOT, "%.1f µH of it, seen from the primary", leakage.inductance() * 1e6));
		says(WALK, String.format(Locale.ROOT, "a coupling of %.3f while the primary conducts", leakage.coupling()));
	}

	@Test
	void magnetBiasedChoke() throws IOException {
		double rest = point("magnet-biased-choke", "no-current").leg("right-leg").fluxDensity();
		double full = point("magnet-biased-choke", "full-load").leg("right-leg").fluxDensity();
		says(WALK, String.format(Locale.ROOT, "−%.2f T at rest, %.2f T at full current", -rest, full));
	}

	private static OperatingPointResult point(String example, String id) throws IOException {
		return Study.of(design(example)).operatingPoint(id);
	}

	private static Design design(String example) throws IOException {
		String name = example + ".gapwright";
		Example file = Examples.all().stream().filter(e -> e.fileName().equals(name)).findFirst().orElseThrow();
		try (InputStream input = file.open()) {
			return DesignReader.read(input, name);
		}
	}

	private static String perCent(OperatingPointResult point, String leg) {
		return Math.round(point.leg(leg).utilisation() * 100) + " %";
	}

	private static String micro(double henry) {
		return Math.round(henry * 1e6) + " µH";
	}

	private static void says(String page, String figure) throws IOException {
		String text = Files.readString(PAGES.resolve(page)).replaceAll("\\s+", " ");
		assertTrue(text.contains(figure), page + " does not say " + figure);
	}
}
