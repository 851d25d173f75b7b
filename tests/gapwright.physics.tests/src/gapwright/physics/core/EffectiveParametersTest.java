package gapwright.physics.core;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import java.util.function.DoubleUnaryOperator;

import org.junit.jupiter.api.Test;

class EffectiveParametersTest {

	private static double integral(DoubleUnaryOperator f, double from, double to) {
		int n = 20000;
		double sum = 0;
		double h = (to - from) / n;
		for (int i = 0; i < n; i++) {
			// three-point Gauss in every strip
			double m = from + (i + 0.5) * h;
			double d = h / 2 * Math.sqrt(0.6);
			sum += h / 18 * (5 * f.applyAsDouble(m - d) + 8 * f.applyAsDouble(m) + 5 * f.applyAsDouble(m + d));
		}
		return sum;
	}

	@Test
	void piecesAreTheIntegralsAlongTheirPath() {
		PathPart plate = PathPart.taperingPlate(0.02, 0.012, 0.030, 0.005);
		DoubleUnaryOperator area = x -> 0.005 * (0.012 + 0.018 * x / 0.02);
		assertEquals(integral(x -> 1 / area.applyAsDouble(x), 0, 0.02), plate.c1(), 1e-10 * plate.c1());
		assertEquals(integral(x -> Math.pow(area.applyAsDouble(x), -2), 0, 0.02), plate.c2(), 1e-10 * plate.c2());
		PathPart fan = PathPart.fan(1.3, 0.006, 0.014, 0.003);
		assertEquals(integral(r -> 1 / (1.3 * 0.003 * r), 0.006, 0.014), fan.c1(), 1e-10 * fan.c1());
		assertEquals(integral(r -> Math.pow(1.3 * 0.003 * r, -2), 0.006, 0.014), fan.c2(), 1e-10 * fan.c2());
		PathPart straight = PathPart.taperingPlate(0.02, 0.012, 0.012, 0.005);
		assertEquals(PathPart.prism(0.02, 6e-5).c1(), straight.c1(), 1e-12 * straight.c1());
		assertThrows(IllegalArgumentException.class, () -> PathPart.fan(7, 1, 2, 1));
		assertThrows(IllegalArgumentException.class, () -> PathPart.taperingPlate(-1, 1, 2, 1));
	}

	/** Series of ln(1 + e)/e about a plate of constant width. */
	@Test
	void aPlateThatHardlyTapersKeepsItsDigits() {
		for (double e : new double[] { 1e-5, 1e-7, 1e-8, 1e-10 }) {
			double expected = 0.02 / (0.005 * 0.012) * (1 - e / 2 + e * e / 3);
			// the width itself is known to a unit in its last place
			assertEquals(1, PathPart.taperingPlate(0.02, 0.012, 0.012 * (1 + e), 0.005).c1() / expected, 1e-14);
		}
	}

	/** Ring 25/15/10 mm; makers' tables print 60.2 mm and 48.9 mm² for it (from memory). */
	@Test
	void aRingHasTheMakersFigures() {
		EffectiveParameters ring = EffectiveParameters.of(List.of(PathPart.ring(0.0075, 0.0125, 0.010)));
		assertEquals(60.18e-3, ring.length(), 5e-6);
		assertEquals(48.93e-6, ring.area(), 5e-9);
		assertEquals(60.2e-3, ring.length(), 1e-3 * 60.2e-3);
		assertEquals(48.9e-6, ring.area(), 1e-3 * 48.9e-6);
	}

	/** l_e of a ring in closed form: 2π·ln(r_o/r_i)/(1/r_i − 1/r_o), A_e = h·ln²(r_o/r_i)/(1/r_i − 1/r_o). IEC 60205, from memory. */
	@Test
	void aRingHasTheStandardsClosedForm() {
		EffectiveParameters ring = EffectiveParameters.of(List.of(PathPart.ring(0.012, 0.022, 0.010)));
		double log = Math.log(22.0 / 12);
		double bracket = 1 / 0.012 - 1 / 0.022;
		assertEquals(2 * Math.PI * log / bracket, ring.length(), 1e-14);
		assertEquals(0.010 * log * log / bracket, ring.area(), 1e-17);
	}

	/** Sections of a U core and of an E core; sums worked in another program with the standard's formulas. */
	@Test
	void seriesOfSectionsGiveTheEffectiveParameters() {
		EffectiveParameters u = EffectiveParameters.of(List.of(PathPart.prism(0.04, 1e-4), PathPart.prism(0.03, 1.1e-4),
				PathPart.prism(0.04, 1e-4), PathPart.prism(0.03, 1.1e-4), PathPart.prism(0.012, 1.05e-4)));
		assertEquals(1459.7402597402597, u.c1(), 1e-9);
		assertEquals(14047113.060100073, u.c2(), 1e-5);
		assertEquals(0.1516924948770492, u.length(), 1e-13);
		assertEquals(0.00010391745645491803, u.area(), 1e-16);
		assertEquals(1.5763498230923635e-05, u.volume(), 1e-17);
		assertEquals(1e-4, u.minimumArea(), 0);
	}

	@Test
	void twoHalvesSideBySideKeepTheirLengthAndDoubleTheirArea() {
		EffectiveParameters half = EffectiveParameters.of(List.of(PathPart.prism(0.1, 1e-4), PathPart.prism(0.03, 2e-4)));
		assertEquals(half.length(), half.doubled().length(), 1e-15);
		assertEquals(2 * half.area(), half.doubled().area(), 1e-18);
		assertEquals(2 * half.volume(), half.doubled().volume(), 1e-18);
	}

	/** Osborn's exact factors of prolate ellipsoids, printed to four digits in his table (from memory). */
	@Test
	void ellipsoidsHaveOsbornsDemagnetisingFactors() {
		double[][] table = { { 1, 0.3333 }, { 2, 0.1736 }, { 5, 0.05582 }, { 10, 0.02029 }, { 20, 0.006749 }, { 50, 0.001443 },
				{ 100, 0.0004299 } };
		for (double[] row : table) {
			assertEquals(row[1], OpenCore.ellipsoid(row[0]), 3e-4 * row[1]);
		}
		assertEquals(OpenCore.ellipsoid(1.00099), OpenCore.ellipsoid(1.00101), 1e-5);
		assertEquals(OpenCore.ellipsoid(1.0011), 1.0 / 3 - 4.0 / 15 * 0.0011, 1e-6);
	}

	@Test
	void aRodOpposesLessTheLongerItIsAndApparentPermeabilityIsBoundedByIt() {
		double before = 1;
		for (double m = 1; m <= 50; m *= 1.3) {
			double factor = OpenCore.rodAtMiddle(m);
			assertEquals(true, factor < before && factor < OpenCore.rodMean(m) && factor > 0);
			assertEquals(true, OpenCore.apparentPermeability(1e9, factor) <= 1 / factor);
			before = factor;
		}
		assertEquals(0.0153, OpenCore.rodAtMiddle(10), 1e-12);
		assertEquals(1, OpenCore.apparentPermeability(1, 0.3), 0);
		assertThrows(IllegalArgumentException.class, () -> OpenCore.rodAtMiddle(60));
	}

	/** r_o/r_i = 1.83: 1.375, by hand. */
	@Test
	void theInnerEdgeOfAThickRingLeads() {
		assertEquals(1.375, ThickRing.innerEdge(0.012, 0.012 * 1.8333), 1e-3);
		assertEquals(1, ThickRing.innerEdge(1, 1.0001), 1e-4);
	}
}
