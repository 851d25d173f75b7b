package gapwright.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.concurrent.CancellationException;

import org.junit.jupiter.api.Test;

import gapwright.study.sweep.BiasSweep;
import gapwright.study.sweep.SweepLeg;
import gapwright.study.sweep.SweepRequest;
import gapwright.study.sweep.SweepResult;

class SweepTest {

	private static SweepResult sweep(double from, double to, int steps, String... changes) {
		return BiasSweep.run(Lowering.of(Designs.ring(changes)), new SweepRequest("full", "main", from, to, steps), Progress.NONE);
	}

	/** Every point is what the study computes with that current. */
	@Test
	void aSweepIsTheStudyAtEveryCurrent() {
		SweepResult sweep = sweep(-30, 60, 9);
		for (int i = 0; i < sweep.current().length; i++) {
			OperatingPointResult p = Designs.study("current=\"10 A\" ripple=\"4 A\"", "current=\"" + sweep.current()[i] + " A\"")
					.operatingPoints().get(0);
			assertEquals(p.winding("main").linkage(), sweep.linkage()[i], 1e-12 * Math.abs(sweep.linkage()[0]));
			assertEquals(p.inductance().of("main"), sweep.differential()[i], 1e-10 * sweep.differential()[3]);
			assertEquals(p.leg("back").fluxDensity(), sweep.leg("back").fluxDensity()[i], 1e-12);
		}
	}

	@Test
	void inductanceFallsAndFluxDensityRisesTowardsSaturation() {
		SweepResult sweep = sweep(0, 100, 50);
		assertEquals(sweep.differential()[0], sweep.apparent()[0], 0);
		for (int i = 1; i <= 50; i++) {
			assertTrue(sweep.differential()[i] < sweep.differential()[i - 1]);
			assertTrue(sweep.differential()[i] <= sweep.apparent()[i]);
			assertTrue(sweep.leg("wound").fluxDensity()[i] > sweep.leg("wound").fluxDensity()[i - 1]);
		}
	}

	@Test
	void theCurrentWhereALegReachesItsLimitIsFoundBetweenThePoints() {
		SweepLeg coarse = sweep(0, 100, 3).leg("wound");
		SweepLeg fine = sweep(0, 100, 97).leg("wound");
		assertEquals(fine.nearAt(), coarse.nearAt(), 1e-6);
		assertEquals(fine.overAt(), coarse.overAt(), 1e-6);
		assertTrue(coarse.nearAt() < coarse.overAt());
		SweepResult there = sweep(0, coarse.overAt(), 1);
		assertEquals(0.39, there.leg("wound").fluxDensity()[1], 1e-7);
		assertTrue(Double.isNaN(sweep(0, 1, 4).leg("wound").nearAt()));
		assertEquals(-coarse.nearAt(), sweep(0, -100, 7).leg("wound").nearAt(), 1e-6);
	}

	@Test
	void whatIsNotThereIsRefusedAndCancellingEndsIt() {
		StudyInput input = Lowering.of(Designs.ring());
		assertThrows(IllegalArgumentException.class,
				() -> BiasSweep.run(input, new SweepRequest("none", "main", 0, 1, 2), Progress.NONE));
		assertThrows(IllegalArgumentException.class,
				() -> BiasSweep.run(input, new SweepRequest("full", "none", 0, 1, 2), Progress.NONE));
		assertThrows(IllegalArgumentException.class, () -> new SweepRequest("full", "main", 1, 1, 2));
		Progress stop = new Progress() {
			@Override
			public boolean cancelled() {
				return true;
			}

			@Override
			public void done(double fraction) {
				throw new AssertionError("cancelled work goes on");
			}
		};
		assertThrows(CancellationException.class, () -> BiasSweep.run(input, new SweepRequest("full", "main", 0, 1, 2), stop));
	}
}
