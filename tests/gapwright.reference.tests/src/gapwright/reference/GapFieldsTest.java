package gapwright.reference;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

import org.junit.jupiter.api.Test;

import com.google.gson.JsonObject;

import gapwright.physics.gap.Fringing;
import gapwright.physics.gap.GapGeometry;
import gapwright.physics.gap.GapGeometry.Place;
import gapwright.physics.gap.Section;

/**
 * Every gap method against field solutions of single gaps, see data/fields/SOURCES.md. A network of reluctances is a
 * model; these are the errors it has, and the guide shows them.
 */
class GapFieldsTest {

	private static final Path GUIDE = Path.of("../../bundles/gapwright.help/html/gaps.html");
	/** Depth of a planar pole, m: so long that its ends add nothing. */
	private static final double ENDLESS = 1e9;
	/** The bands are stated in whole per cent. */
	private static final double ROUNDING = 0.0051;

	private record Case(String geometry, double width, double gap, double height, double factor, double published) {

		boolean isRound() {
			return geometry.startsWith("round");
		}

		boolean isOpen() {
			return geometry.endsWith("open");
		}

		/** Two poles of the given height each, whose roots end the window. */
		GapGeometry gapGeometry() {
			Section section = isRound() ? new Section.Round(width) : new Section.Rectangular(width, ENDLESS);
			double half = height + gap / 2;
			return new GapGeometry(section, gap, 1, isOpen() ? Place.BETWEEN_POLES : Place.WITHIN_LEG, half, half);
		}

		/** @return NaN where the method has no meaning: the logarithmic one takes the root of a section */
		double error(Fringing method) {
			return method == Fringing.LOGARITHMIC && !isRound() ? Double.NaN
					: method.factor(gapGeometry()).value() / factor - 1;
		}
	}

	private static List<Case> cases() throws IOException {
		List<Case> cases = new ArrayList<>();
		for (JsonObject row : FieldTable.read("gap-fringing.json")) {
			cases.add(new Case(row.get("geometry").getAsString(),
					row.get(row.has("poleWidth") ? "poleWidth" : "poleDiameter").getAsDouble(), row.get("gap").getAsDouble(),
					row.get("poleHeight").getAsDouble(), row.get("factor").getAsDouble(),
					row.has("conformalFormula") ? row.get("conformalFormula").getAsDouble() : Double.NaN));
		}
		assertEquals(28, cases.size());
		return cases;
	}

	private static Case find(String geometry, double gapOverWidth, double heightOverWidth) throws IOException {
		return cases().stream().filter(c -> c.geometry().equals(geometry))
				.filter(c -> Math.abs(c.gap() / c.width() - gapOverWidth) < 1e-9)
				.filter(c -> Math.abs(c.height() / c.width() - heightOverWidth) < 1e-9).findFirst().orElseThrow();
	}

	@Test
	void theConformalFactorIsThePublishedOneInEveryPlanarCase() throws IOException {
		int planar = 0;
		for (Case each : cases()) {
			if (!each.isRound()) {
				planar++;
				assertEquals(each.published(), Fringing.CONFORMAL.factor(each.gapGeometry()).value(), 1e-6, each.toString());
			}
		}
		assertEquals(24, planar);
	}

	/** Poles in a window of 0.8 of their width: bands by the height of the poles. */
	@Test
	void conformalInAWindowHoldsItsBands() throws IOException {
		for (double gap : new double[] { 0.03, 0.1, 0.2, 0.4 }) {
			assertEquals(0, find("planar, window", gap, 1).error(Fringing.CONFORMAL), 0.011);
			double low = find("planar, window", gap, 0.5).error(Fringing.CONFORMAL);
			assertTrue(low <= -0.02 + ROUNDING && low >= -0.15 - ROUNDING, () -> gap + ": " + low);
			double high = find("planar, window", gap, 2).error(Fringing.CONFORMAL);
			assertTrue(high >= 0.01 - ROUNDING && high <= 0.10 + ROUNDING, () -> gap + ": " + high);
		}
	}

	@Test
	void conformalReadsLowInTheOpenByAsMuchAsTheGuideSays() throws IOException {
		double[][] planar = { { 0.03, -0.02 }, { 0.1, -0.05 }, { 0.2, -0.09 }, { 0.4, -0.16 } };
		for (double[] row : planar) {
			assertEquals(row[1], find("planar, open", row[0], 1).error(Fringing.CONFORMAL), ROUNDING);
		}
		double[][] round = { { 0.03, 1, -0.07 }, { 0.1, 1, -0.16 }, { 0.2, 1, -0.23 }, { 0.1, 2, -0.21 } };
		for (double[] row : round) {
			assertEquals(row[2], find("round pole, open", row[0], row[1]).error(Fringing.CONFORMAL), ROUNDING);
		}
	}

	/** No fringing is a lower bound everywhere, and widening never passes the field either. */
	@Test
	void theSimplerMethodsReadLowEverywhere() throws IOException {
		for (Case each : cases()) {
			assertTrue(each.error(Fringing.NONE) < each.error(Fringing.WIDENED), each.toString());
			assertTrue(each.error(Fringing.WIDENED) < 0, each.toString());
		}
	}

	@Test
	void theGuideShowsTheErrorOfEveryMethodInEveryCase() throws IOException {
		FieldTable table = new FieldTable();
		for (Case each : cases()) {
			table.add(each.geometry(), number(each.gap() / each.width()), number(each.height() / each.width()),
					String.format(Locale.ROOT, "%.3f", each.factor()), FieldTable.perCent(each.error(Fringing.NONE)),
					FieldTable.perCent(each.error(Fringing.WIDENED)), FieldTable.perCent(each.error(Fringing.LOGARITHMIC)),
					FieldTable.perCent(each.error(Fringing.CONFORMAL)));
		}
		table.write("gap-methods.txt");
		String page = Files.readString(GUIDE);
		for (String row : table.html()) {
			assertTrue(page.contains(row), "gaps.html lacks " + row);
		}
	}

	private static String number(double ratio) {
		return String.format(Locale.ROOT, "%.2g", ratio).replaceAll("(\\.\\d*?)0+$", "$1").replaceAll("\\.$", "");
	}
}
