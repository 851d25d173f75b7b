package gapwright.physics.gap;

import static gapwright.physics.gap.Judgement.Validity.DOUBTFUL;
import static gapwright.physics.gap.Judgement.Validity.REFUSED;
import static gapwright.physics.gap.Judgement.Validity.VALID;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleFunction;
import java.util.function.ToDoubleFunction;

import org.junit.jupiter.api.Test;

import gapwright.physics.gap.GapGeometry.Place;
import gapwright.physics.material.BhCurve;

class FringingTest {

	private static final Section POLE = new Section.Rectangular(0.012, 0.015);
	private static final Section ROUND = new Section.Round(0.010);

	private static GapGeometry plain(Section section, double length) {
		return GapGeometry.plain(section, length, 1);
	}

	private static GapGeometry centred(double length, int pieces) {
		return GapGeometry.centred(POLE, length, pieces, 0.020);
	}

	private static double factor(Fringing method, GapGeometry gap) {
		return method.factor(gap).value();
	}

	/** 12 mm × 15 mm, 1 mm: 4.4210e6 1/H and 2.2619e-7 H by µ₀A/g, worked by hand. */
	@Test
	void aPlainGapIsMuZeroAreaOverLength() {
		assertEquals(2.2619e-7, Fringing.NONE.permeance(plain(POLE, 0.001)), 5e-12);
		assertEquals(4.4210e6, 1 / Fringing.NONE.permeance(plain(POLE, 0.001)), 50);
	}

	/** (13 × 16)/(12 × 15) and (11/10)², worked by hand from the textbook rule (common practice). */
	@Test
	void wideningAddsTheGapToEverySide() {
		assertEquals(208.0 / 180, factor(Fringing.WIDENED, plain(POLE, 0.001)), 1e-15);
		assertEquals(1.21, factor(Fringing.WIDENED, plain(ROUND, 0.001)), 1e-15);
	}

	/**
	 * 12 mm × 15 mm, 1 mm, window of 20 mm: 1 + (1/√180)·ln 40; round of 10 mm in 21 mm. McLyman's formula (from
	 * memory), worked by hand.
	 */
	@Test
	void theLogarithmicFactorIsAsPublished() {
		assertEquals(1.27495, factor(Fringing.LOGARITHMIC, centred(0.001, 1)), 5e-6);
		assertEquals(1.4218, factor(Fringing.LOGARITHMIC, GapGeometry.centred(ROUND, 0.001, 1, 0.021)), 5e-5);
	}

	/** Same gaps by the published composition of the corner field, worked by hand: 1.19644 × 1.15715, and 1.2390². */
	@Test
	void theConformalFactorIsAsPublished() {
		assertEquals(1.38447, factor(Fringing.CONFORMAL, centred(0.001, 1)), 5e-6);
		assertEquals(1.53512, factor(Fringing.CONFORMAL, GapGeometry.centred(ROUND, 0.001, 1, 0.021)), 5e-6);
		assertEquals(1.18452, factor(Fringing.CONFORMAL, centred(0.0005, 2)), 5e-6);
		assertEquals(1.09033, factor(Fringing.CONFORMAL, centred(0.00025, 4)), 5e-6);
	}

	/** Mirror law: a pole against a wide plane at g has the field of two poles 2g apart, so the same factor. */
	@Test
	void aYokeMirrorsThePole() {
		GapGeometry against = new GapGeometry(POLE, 0.001, 1, Place.AGAINST_YOKE, 0.0105, 0.0005);
		GapGeometry mirrored = new GapGeometry(POLE, 0.002, 1, Place.WITHIN_LEG, 0.011, 0.011);
		assertEquals(0.010, against.firstPole(), 1e-15);
		assertEquals(factor(Fringing.CONFORMAL, mirrored), factor(Fringing.CONFORMAL, against), 1e-14);
	}

	/** Off the middle the field is that of poles as high as the geometric mean of both, less than at the middle. */
	@Test
	void aGapOffTheMiddleFringesLess() {
		double last = Double.POSITIVE_INFINITY;
		for (double to = 0.010; to > 0.002; to -= 0.001) {
			double factor = factor(Fringing.CONFORMAL, new GapGeometry(POLE, 0.001, 1, Place.WITHIN_LEG, to, 0.020 - to));
			assertTrue(factor < last);
			last = factor;
		}
	}

	@Test
	void fringingNeverLowersAPermeanceAndVanishesWithTheGap() {
		for (Fringing method : Fringing.values()) {
			for (Section section : List.of(POLE, ROUND)) {
				for (double gap = 1e-9; gap < 0.0066; gap *= 3) {
					assertTrue(factor(method, GapGeometry.centred(section, gap, 1, 0.020)) >= 1);
				}
				assertEquals(1, factor(method, GapGeometry.centred(section, 1e-12, 1, 0.020)), 1e-7);
			}
		}
	}

	@Test
	void splittingAGapIsAllItsPiecesInSeriesWithLessFringing() {
		assertEquals(Fringing.NONE.permeance(centred(0.002, 1)), Fringing.NONE.permeance(centred(0.001, 2)), 1e-22);
		for (Fringing method : List.of(Fringing.WIDENED, Fringing.LOGARITHMIC, Fringing.CONFORMAL)) {
			assertTrue(method.permeance(centred(0.001, 2)) < method.permeance(centred(0.002, 1)));
		}
		assertThrows(IllegalArgumentException.class, () -> centred(0.001, 0));
	}

	@Test
	void eachMethodSaysWhereItHolds() {
		assertEquals(VALID, Fringing.NONE.judge(plain(POLE, 0.0002)).validity());
		assertEquals(DOUBTFUL, Fringing.NONE.judge(plain(POLE, 0.001)).validity());
		assertEquals(VALID, Fringing.WIDENED.judge(plain(POLE, 0.001)).validity());
		assertEquals(DOUBTFUL, Fringing.WIDENED.judge(plain(POLE, 0.002)).validity());
		assertEquals(REFUSED, Fringing.WIDENED.judge(plain(POLE, 0.013)).validity());
		assertEquals(VALID, Fringing.LOGARITHMIC.judge(centred(0.003, 1)).validity());
		assertEquals(DOUBTFUL, Fringing.LOGARITHMIC.judge(centred(0.004, 1)).validity());
		assertEquals(DOUBTFUL, Fringing.LOGARITHMIC.judge(centred(0.001, 2)).validity());
		assertEquals(REFUSED, Fringing.LOGARITHMIC.judge(GapGeometry.centred(POLE, 0.001, 1, 0.0005)).validity());
		assertEquals(VALID, Fringing.CONFORMAL.judge(centred(0.005, 1)).validity());
		assertEquals(DOUBTFUL, Fringing.CONFORMAL.judge(centred(0.008, 1)).validity());
		assertEquals(REFUSED, Fringing.CONFORMAL.judge(centred(0.018, 1)).validity());
		assertEquals(REFUSED, Fringing.CONFORMAL.judge(new GapGeometry(POLE, 0.001, 1, Place.WITHIN_LEG, 0.0004, 0.02)).validity());
		assertEquals(REFUSED, Fringing.CONFORMAL.judge(new GapGeometry(POLE, 0.001, 2, Place.AGAINST_YOKE, 0.02, 0.001)).validity());
		assertThrows(IllegalArgumentException.class, () -> plain(POLE, 0));
		assertThrows(IllegalArgumentException.class, () -> new Section.Round(-1));
	}

	private static void slope(String name, double at, double exact, ToDoubleFunction<GapGeometry> value, DoubleFunction<GapGeometry> moved) {
		double step = 1e-5 * at;
		double difference = (value.applyAsDouble(moved.apply(at + step)) - value.applyAsDouble(moved.apply(at - step))) / (2 * step);
		assertEquals(difference, exact, 1e-7 * Math.max(Math.abs(difference), Math.abs(value.applyAsDouble(moved.apply(at)) / at)), name);
	}

	/** Every derivative of every method, section and place, against central differences of the reluctance. */
	@Test
	void derivativesAreExact() {
		List<GapGeometry> gaps = new ArrayList<>();
		for (Section section : List.of(POLE, ROUND)) {
			gaps.add(new GapGeometry(section, 0.0012, 1, Place.WITHIN_LEG, 0.007, 0.013));
			gaps.add(new GapGeometry(section, 0.0006, 3, Place.WITHIN_LEG, 0.010, 0.010));
			gaps.add(new GapGeometry(section, 0.0012, 1, Place.AGAINST_YOKE, 0.019, 0.0006));
			gaps.add(new GapGeometry(section, 0.0012, 1, Place.BETWEEN_POLES, 0.011, 0.008));
		}
		for (Fringing method : Fringing.values()) {
			for (GapGeometry gap : gaps) {
				ReluctanceSlopes slopes = ReluctanceSlopes.of(method, gap);
				assertEquals(1 / method.permeance(gap), slopes.reluctance(), 1e-12 * slopes.reluctance());
				ToDoubleFunction<GapGeometry> r = each -> ReluctanceSlopes.of(method, each).reluctance();
				String name = method + " of " + gap;
				slope(name + " by length", gap.length(), slopes.byLength(), r,
						x -> new GapGeometry(gap.section(), x, gap.pieces(), gap.place(), gap.toFirst(), gap.toSecond()));
				slope(name + " by first", gap.toFirst(), slopes.byFirst(), r,
						x -> new GapGeometry(gap.section(), gap.length(), gap.pieces(), gap.place(), x, gap.toSecond()));
				slope(name + " by second", gap.toSecond(), slopes.bySecond(), r,
						x -> new GapGeometry(gap.section(), gap.length(), gap.pieces(), gap.place(), gap.toFirst(), x));
				boolean round = gap.section() instanceof Section.Round;
				slope(name + " by a", gap.section().leastSide(), slopes.byA(), r,
						x -> new GapGeometry(round ? new Section.Round(x) : new Section.Rectangular(x, 0.015), gap.length(),
								gap.pieces(), gap.place(), gap.toFirst(), gap.toSecond()));
				if (!round) {
					slope(name + " by b", 0.015, slopes.byB(), r, x -> new GapGeometry(new Section.Rectangular(0.012, x),
							gap.length(), gap.pieces(), gap.place(), gap.toFirst(), gap.toSecond()));
				}
			}
		}
	}

	/** Side terms of the exact corner map, tabulated from its own formula by hand to four digits. */
	@Test
	void theExactSideFieldTellsWhatThePublishedFormIsWorth() {
		double[][] table = { { 0, 0.1953 }, { 0.5, 0.6722 }, { 1, 0.8887 }, { 2, 1.1673 }, { 3, 1.3571 }, { 5, 1.6199 },
				{ 10, 2.0083 }, { 20, 2.4207 }, { 50, 2.9859 } };
		for (double[] row : table) {
			assertEquals(row[1], CornerField.exact(row[0]), 5e-5);
		}
		assertEquals(-0.21, CornerField.published(2) / CornerField.exact(2) - 1, 0.005);
		assertEquals(-0.07, CornerField.published(5) / CornerField.exact(5) - 1, 0.005);
		assertEquals(0, CornerField.published(50) / CornerField.exact(50) - 1, 1e-2);
	}

	/** Two pictures of one field that share nothing: Roters' tubes against the map, within the few per cent tubes are good for. */
	@Test
	void estimatedTubesAgreeWithTheExactSideField() {
		for (double[] row : new double[][] { { 1, 0.610, 0.584 }, { 2, 0.772, 0.751 }, { 5, 1.023, 1.004 }, { 10, 1.229, 1.210 } }) {
			double tubes = (FluxTubes.alongEdge(1) + FluxTubes.betweenSides(1, row[0], 1)) / BhCurve.MU_0;
			// between two poles the mirror plane is at g/2
			double exact = CornerField.exact(2 * row[0]) / 2;
			assertEquals(row[1], tubes, 5e-4);
			assertEquals(row[2], exact, 5e-4);
			assertEquals(1, tubes / exact, 0.05);
		}
		double plain = BhCurve.MU_0 * 0.012 * 0.015 / 0.001;
		assertEquals(1.419, FluxTubes.rectangular(0.012, 0.015, 0.001, 0.0095) / plain, 5e-4);
	}
}
