package gapwright.study;

import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.regex.MatchResult;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;

import org.junit.jupiter.api.Test;

import gapwright.model.Design;
import gapwright.model.DesignReader;
import gapwright.model.UnreadableDesignException;

/** Figures of the examples are turned into extreme ones or left out: the answer is numbers or findings, nothing else. */
class AnyFigureTest {

	private static final Path EXAMPLES = Path.of("../../bundles/gapwright.library/data/examples");
	private static final Pattern ATTRIBUTE = Pattern.compile(" \\w+=\"([^\"]*)\"");
	private static final Pattern NUMBER = Pattern.compile("^[-+]?[0-9.]+(?:[eE][-+]?\\d+)?");
	private static final String[] EXTREMES = { "0", "-1", "1e-300", "1e300", "1e-9", "1e9", "1e150", "-1e200", "5e-324",
			"1e-3", "1e3" };
	private static final int DESIGNS_PER_EXAMPLE = 60;

	private static List<String> examples() throws IOException {
		List<String> texts = new ArrayList<>();
		try (Stream<Path> files = Files.list(EXAMPLES)) {
			for (Path file : files.sorted().toList()) {
				texts.add(Files.readString(file));
			}
		}
		assertFalse(texts.isEmpty(), "no examples in " + EXAMPLES);
		return texts;
	}

	/** One attribute behind the head of the file with another number, or gone. */
	private static String change(String text, Random random) {
		Matcher matcher = ATTRIBUTE.matcher(text);
		matcher.region(text.indexOf("<materials"), text.length());
		List<MatchResult> attributes = matcher.results().toList();
		MatchResult chosen = attributes.get(random.nextInt(attributes.size()));
		if (random.nextInt(8) == 0) {
			return text.substring(0, chosen.start()) + text.substring(chosen.end());
		}
		String value = NUMBER.matcher(chosen.group(1)).replaceFirst(EXTREMES[random.nextInt(EXTREMES.length)]);
		return text.substring(0, chosen.start(1)) + value + text.substring(chosen.end(1));
	}

	@Test
	void whateverFigureIsChangedTheAnswerIsNumbersOrFindings() throws IOException {
		int computed = 0;
		for (String example : examples()) {
			for (int seed = 0; seed < DESIGNS_PER_EXAMPLE; seed++) {
				Random random = new Random(seed);
				String text = example;
				for (int changes = 1 + random.nextInt(3); changes > 0; changes--) {
					text = change(text, random);
				}
				computed += judge(text, "seed " + seed + "\n" + text) ? 1 : 0;
			}
		}
		assertTrue(computed > DESIGNS_PER_EXAMPLE, "only " + computed + " designs gave figures");
	}

	/** @return whether a figure was computed */
	private static boolean judge(String text, String message) throws IOException {
		Design design;
		try {
			design = DesignReader.read(new ByteArrayInputStream(text.getBytes(StandardCharsets.UTF_8)), "changed");
		} catch (UnreadableDesignException e) {
			assertFalse(e.problems().isEmpty(), message);
			return false;
		}
		boolean any = false;
		StudyResult result = Study.of(design);
		for (OperatingPointResult point : result.operatingPoints()) {
			for (LegResult leg : point.converged() ? point.legs() : List.<LegResult>of()) {
				assertTrue(Double.isFinite(leg.flux()) && Double.isFinite(leg.fluxDensity())
						&& Double.isFinite(leg.fieldStrength()) && Double.isFinite(leg.mmfDrop()), message);
				any = true;
			}
		}
		assertTrue(any || !result.findings().isEmpty(), message);
		return any;
	}
}
