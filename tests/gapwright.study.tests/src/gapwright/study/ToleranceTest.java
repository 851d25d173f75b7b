package gapwright.study;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.concurrent.CancellationException;
import java.util.concurrent.ForkJoinPool;

import org.junit.jupiter.api.Test;

import gapwright.study.tolerance.Band;
import gapwright.study.tolerance.Samples;
import gapwright.study.tolerance.ToleranceRequest;
import gapwright.study.tolerance.ToleranceResult;
import gapwright.study.tolerance.ToleranceStudy;

class ToleranceTest {

	private static final String END = "</gapwright:Design>";
	private static final String TOLERANCES = "<tolerances id=\"grinding\" targets=\"gap\" deviation=\"0.05 mm\"/>"
			+ "<tolerances id=\"firing\" targets=\"ferrite\" feature=\"PERMEABILITY\" deviation=\"25 %\" distribution=\"NORMAL\"/>"
			+ "<tolerances id=\"batch\" targets=\"ferrite\" feature=\"SATURATION\" deviation=\"5 %\"/>"
			+ "<tolerances id=\"pressing\" targets=\"wound back\" feature=\"WIDTH\" deviation=\"0.2 mm\"/>"
			+ "<tolerances id=\"load\" targets=\"main\" feature=\"CURRENT\" deviation=\"1 A\"/>";

	private static ToleranceResult run(String tolerances, int samples, long seed, String... changes) {
		String[] all = new String[changes.length + 2];
		System.arraycopy(changes, 0, all, 0, changes.length);
		all[changes.length] = END;
		all[changes.length + 1] = tolerances + END;
		return ToleranceStudy.run(Lowering.of(Designs.ring(all)), new ToleranceRequest(samples, seed), Progress.NONE);
	}

	private static Band inductance(ToleranceResult result) {
		return result.points().get(0).band(Band.Kind.INDUCTANCE, "main");
	}

	private static Band utilisation(ToleranceResult result) {
		return result.points().get(0).band(Band.Kind.UTILISATION, "wound");
	}

	@Test
	void cornersContainEverySample() {
		ToleranceResult result = run(TOLERANCES, 5000, 7);
		assertEquals(0, result.points().get(0).failed());
		assertTrue(result.findings().isEmpty(), () -> result.findings().toString());
		for (Band band : result.points().get(0).bands()) {
			assertEquals(5000, band.samples().count());
			assertTrue(band.samples().least() >= band.cornerLow() && band.samples().greatest() <= band.cornerHigh(), band.subject());
			assertTrue(band.cornerLow() < band.nominal() && band.nominal() < band.cornerHigh());
			assertTrue(band.rootSum() < band.firstOrder());
		}
	}

	/** For small deviations the slopes tell all: corners, and the spread √3 times smaller than a uniform bound. */
	@Test
	void firstOrderIsExactForSmallDeviations() {
		ToleranceResult small = run("<tolerances id=\"grinding\" targets=\"gap\" deviation=\"0.001 %\"/>", 20000, 1);
		for (Band band : new Band[] { inductance(small), utilisation(small) }) {
			assertEquals(band.firstOrder(), band.cornerHigh() - band.nominal(), 1e-3 * band.firstOrder());
			assertEquals(band.firstOrder(), band.nominal() - band.cornerLow(), 1e-3 * band.firstOrder());
			assertEquals(band.firstOrder() / Math.sqrt(3), band.samples().deviation(), 0.02 * band.firstOrder());
		}
		// normal, the bound at 3σ and cut there: σ is 0.9866 of a third
		Band normal = inductance(run("<tolerances id=\"g\" targets=\"gap\" deviation=\"0.001 %\" distribution=\"NORMAL\"/>", 20000, 1));
		assertEquals(0.9866 / 3, normal.samples().deviation() / normal.firstOrder(), 0.01);
	}

	/** Without iron's saturation and fringing L = N²/(R_iron + g/µ₀A): the corners are those of the formula. */
	@Test
	void cornersOfALinearGapAreThoseOfItsFormula() {
		String knee = "<curve xsi:type=\"gapwright:KneeCurve\" initialPermeability=\"2300.0\" saturationPolarisation=\"0.569 T\"/>";
		ToleranceResult result = run("<tolerances id=\"g\" targets=\"gap\" deviation=\"10 %\"/>", 0, 0, knee,
				"<curve xsi:type=\"gapwright:LinearCurve\" relativePermeability=\"2300\"/>", "WIDENED", "NONE");
		double area = 0.012 * 0.015;
		double mu = 4e-7 * Math.PI;
		assertEquals(400 / ((0.0391 + 0.090) / (2300 * mu * area) + 0.9e-3 / (mu * area)), inductance(result).cornerHigh(), 1e-12);
		assertEquals(400 / ((0.0389 + 0.090) / (2300 * mu * area) + 1.1e-3 / (mu * area)), inductance(result).cornerLow(), 1e-12);
	}

	@Test
	void aSeedRepeatsBitByBitOnAnyNumberOfThreads() throws Exception {
		Samples first = inductance(run(TOLERANCES, 3000, 42)).samples();
		ForkJoinPool single = new ForkJoinPool(1);
		try {
			StudyInput input = Lowering.of(Designs.ring(END, TOLERANCES + END));
			Samples second = single.submit(() -> inductance(ToleranceStudy.run(input, new ToleranceRequest(3000, 42), Progress.NONE))
					.samples()).get();
			assertEquals(first.mean(), second.mean(), 0);
			for (int i = 0; i <= 10; i++) {
				assertEquals(first.quantile(i / 10.0), second.quantile(i / 10.0), 0);
			}
			assertArrayEquals(first.histogram(20), second.histogram(20));
		} finally {
			single.shutdown();
		}
		assertTrue(first.mean() != inductance(run(TOLERANCES, 3000, 43)).samples().mean());
	}

	/** A uniform current of 10 A ± 100 %: utilisation is uniform too, so a third of it lies above two thirds of its reach. */
	@Test
	void theProbabilityOfALimitIsTheShareOfSamplesBeyondIt() {
		String knee = "<curve xsi:type=\"gapwright:KneeCurve\" initialPermeability=\"2300.0\" saturationPolarisation=\"0.569 T\"/>";
		ToleranceResult result = run("<tolerances id=\"load\" targets=\"main\" feature=\"CURRENT\" deviation=\"100 %\"/>", 20000, 5, knee,
				"<curve xsi:type=\"gapwright:LinearCurve\" relativePermeability=\"2300\"/>", " ripple=\"4 A\"", "");
		Band band = utilisation(result);
		double reach = band.cornerHigh();
		assertEquals(2 * band.nominal(), reach, 1e-9);
		double p = band.samples().probabilityFrom(2 * reach / 3);
		assertEquals(1.0 / 3, p, 4 * band.samples().probabilityError(2 * reach / 3));
		assertEquals(Math.sqrt(p * (1 - p) / 20000), band.samples().probabilityError(2 * reach / 3), 1e-15);
		assertEquals(20000, Arrays.stream(band.samples().histogram(17)).sum());
	}

	/**
	 * One uniform tolerance on a linear core: every tenth of the range holds a tenth of the samples, within four standard
	 * errors, and no sample comes twice, from block to block either.
	 */
	@Test
	void samplesAreSpreadEvenlyAndIndependentOfOneAnother() {
		String knee = "<curve xsi:type=\"gapwright:KneeCurve\" initialPermeability=\"2300.0\" saturationPolarisation=\"0.569 T\"/>";
		ToleranceResult result = run("<tolerances id=\"load\" targets=\"main\" feature=\"CURRENT\" deviation=\"50 %\"/>", 40000, 11, knee,
				"<curve xsi:type=\"gapwright:LinearCurve\" relativePermeability=\"2300\"/>", " ripple=\"4 A\"", "");
		Band band = utilisation(result);
		double low = band.cornerLow();
		double width = band.cornerHigh() - low;
		for (int tenth = 1; tenth < 10; tenth++) {
			double p = 1 - band.samples().probabilityFrom(low + tenth * width / 10);
			assertEquals(tenth / 10.0, p, 4 * Math.sqrt(0.25 / 40000), "up to " + tenth);
		}
		int[] fine = band.samples().histogram(100);
		double chiSquare = 0;
		for (int count : fine) {
			chiSquare += (count - 400.0) * (count - 400.0) / 400;
		}
		// 99 degrees of freedom: 99.9 % lie below 148.2 (table of chi-square)
		assertTrue(chiSquare < 148.2 && chiSquare > 60, "chi-square " + chiSquare);
		int twice = 0;
		for (int i = 1; i < 40000; i++) {
			twice += band.samples().quantile(i / 39999.0) == band.samples().quantile((i - 1) / 39999.0) ? 1 : 0;
		}
		assertTrue(twice < 5, twice + " samples come twice");
	}

	@Test
	void targetsOfOneToleranceDeviateTogether() {
		ToleranceResult together = run("<tolerances id=\"w\" targets=\"wound back\" feature=\"DEPTH\" deviation=\"5 %\"/>", 0, 0);
		ToleranceResult apart = run("<tolerances id=\"w\" targets=\"wound\" feature=\"DEPTH\" deviation=\"5 %\"/>"
				+ "<tolerances id=\"bb\" targets=\"back\" feature=\"DEPTH\" deviation=\"5 %\"/>", 0, 0);
		assertEquals(inductance(apart).firstOrder(), inductance(together).firstOrder(), 1e-12);
		assertTrue(inductance(apart).rootSum() < inductance(together).rootSum());
	}

	@Test
	void cancellingAndNonsenseEndIt() {
		assertThrows(IllegalArgumentException.class, () -> run("", 10, 1));
		assertThrows(IllegalArgumentException.class, () -> new ToleranceRequest(-1, 0));
		Progress stop = new Progress() {
			@Override
			public boolean cancelled() {
				return true;
			}

			@Override
			public void done(double fraction) {
				// not shown
			}
		};
		StudyInput input = Lowering.of(Designs.ring(END, TOLERANCES + END));
		assertThrows(CancellationException.class, () -> ToleranceStudy.run(input, new ToleranceRequest(1000, 1), stop));
	}
}
