package gapwright.physics.gap;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

import gapwright.physics.gap.Fringing.Validity;

class FringingTest {

	private static final Section POLE = new Section.Rectangular(0.012, 0.015);
	private static final Section ROUND = new Section.Round(0.010);

	/** 12 mm × 15 mm, 1 mm: 4.4210e6 1/H and 2.2619e-7 H by µ₀A/g, worked by hand. */
	@Test
	void aPlainGapIsMuZeroAreaOverLength() {
		assertEquals(2.2619e-7, Fringing.NONE.permeance(POLE, 0.001, 1), 5e-12);
		assertEquals(4.4210e6, 1 / Fringing.NONE.permeance(POLE, 0.001, 1), 50);
	}

	/** (13 × 16)/(12 × 15) and (11/10)², worked by hand from the textbook rule (common practice). */
	@Test
	void wideningAddsTheGapToEverySide() {
		assertEquals(208.0 / 180, Fringing.WIDENED.factor(POLE, 0.001), 1e-15);
		assertEquals(1.21, Fringing.WIDENED.factor(ROUND, 0.001), 1e-15);
	}

	@Test
	void fringingNeverLowersAPermeanceAndVanishesWithTheGap() {
		for (Fringing method : Fringing.values()) {
			for (double gap = 1e-9; gap < 0.01; gap *= 3) {
				assertTrue(method.factor(POLE, gap) >= 1);
			}
			assertEquals(1, method.factor(POLE, 1e-12), 1e-9);
			assertEquals(1, method.factor(ROUND, 1e-12), 1e-9);
		}
	}

	@Test
	void splittingAGapIsAllItsPiecesInSeriesWithLessFringing() {
		assertEquals(Fringing.NONE.permeance(POLE, 0.002, 1), Fringing.NONE.permeance(POLE, 0.001, 2), 1e-22);
		assertTrue(Fringing.WIDENED.permeance(POLE, 0.001, 2) < Fringing.WIDENED.permeance(POLE, 0.002, 1));
		assertThrows(IllegalArgumentException.class, () -> Fringing.NONE.permeance(POLE, 0.001, 0));
	}

	@Test
	void eachMethodSaysWhereItHolds() {
		assertEquals(Validity.VALID, Fringing.NONE.validity(POLE, 0.0002));
		assertEquals(Validity.DOUBTFUL, Fringing.NONE.validity(POLE, 0.001));
		assertEquals(Validity.VALID, Fringing.WIDENED.validity(POLE, 0.001));
		assertEquals(Validity.DOUBTFUL, Fringing.WIDENED.validity(POLE, 0.002));
		assertEquals(Validity.REFUSED, Fringing.WIDENED.validity(POLE, 0.013));
		assertThrows(IllegalArgumentException.class, () -> Fringing.WIDENED.factor(POLE, 0));
		assertThrows(IllegalArgumentException.class, () -> new Section.Round(-1));
	}
}
