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

	/** The limit is passed between two points on both sides of 0 A: what counts is the least current of either sense. */
	@Test
	void aLimitPassedOnTheWayFromNoCurrentIsFoundInEitherSense() {
		double at = sweep(0, 100, 9).leg("wound").overAt();
		assertEquals(at, sweep(-1.5 * at, 3 * at, 1).leg("wound").overAt(), 1e-6);
		assertEquals(-at, sweep(-3 * at, 0.9 * at, 1).leg("wound").overAt(), 1e-6);
		assertEquals(at, sweep(3 * at, -0.5 * at, 2).leg("wound").overAt(), 1e-6);
		assertEquals(2 * at, sweep(2 * at, 3 * at, 2).leg("wound").overAt(), 0);
		assertTrue(Double.isNaN(sweep(-0.9 * at, 0.9 * at, 1).leg("wound").overAt()));
	}

	/** λ/i of one winding means nothing where a magnet or another winding acts too. */
	@Test
	void besideAMagnetOrAnotherCurrentThereIsNoApparentInductance() {
		String end = "</gapwright:Design>";
		SweepResult magnet = sweep(0, 20, 4, "<gaps id=\"gap\" length=\"1 mm\" fringing=\"WIDENED\"/>",
				"<magnet id=\"biasing\" length=\"1 mm\" remanence=\"0.4 T\" recoilPermeability=\"1.05\"/>");
		String other = "<windings id=\"other\"><coils id=\"other-coil\" leg=\"back\" turns=\"5\"/></windings>";
		String drive = "<drives xsi:type=\"gapwright:CurrentDrive\" id=\"held\" winding=\"other\" current=\"6 A\"/>";
		SweepResult held = sweep(0, 20, 4, end, other + end, "</operatingPoints>", drive + "</operatingPoints>");
		for (int i = 0; i <= 4; i++) {
			assertTrue(Double.isNaN(magnet.apparent()[i]) && Double.isNaN(held.apparent()[i]));
			assertTrue(magnet.differential()[i] > 0 && held.differential()[i] > 0);
		}
		// 6 A in 5 turns are 1.5 A in 20: the same ampere-turns give the same flux
		SweepResult shifted = sweep(1.5, 21.5, 4);
		for (int i = 0; i <= 4; i++) {
			assertEquals(shifted.leg("back").fluxDensity()[i], held.leg("back").fluxDensity()[i], 1e-12);
		}
		assertTrue(Math.abs(magnet.leg("wound").fluxDensity()[0]) > 0.1);
	}

	/** The slope of the linkage between neighbours lies between the differential inductances at both. */
	@Test
	void differentialInductanceIsTheSlopeOfTheLinkage() {
		SweepResult sweep = sweep(-80, 80, 64);
		for (int i = 1; i <= 64; i++) {
			double slope = (sweep.linkage()[i] - sweep.linkage()[i - 1]) / (sweep.current()[i] - sweep.current()[i - 1]);
			double least = Math.min(sweep.differential()[i], sweep.differential()[i - 1]);
			double most = Math.max(sweep.differential()[i], sweep.differential()[i - 1]);
			assertTrue(least - 1e-12 <= slope && slope <= most + 1e-12, sweep.current()[i] + " A");
		}
	}

	@Test
	void theLargestCurrentIncludesWhatAVoltageDrives() {
		StudyInput current = Lowering.of(Designs.ring());
		assertEquals(12, BiasSweep.largestCurrent(current, "main"), 0);
		StudyInput voltage = Lowering.of(Designs.ring("xsi:type=\"gapwright:CurrentDrive\"", "xsi:type=\"gapwright:VoltageDrive\"",
				"current=\"10 A\" ripple=\"4 A\"", "voltage=\"30 V\" onTime=\"10 µs\" bias=\"0 A\""));
		double swing = BiasSweep.largestCurrent(voltage, "main");
		double linkage = BiasSweep.run(voltage, new SweepRequest("full", "main", 0, swing, 1), Progress.NONE).linkage()[1];
		assertEquals(30 * 10e-6 / 2, linkage, 1e-9 * linkage);
		assertEquals(0, BiasSweep.largestCurrent(current, "none"), 0);
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

	/** Of 401 legs, those that matter most are found exactly, the others to the distance of two points. */
	@Test
	void ofALargeDesignTheFullestLegsAreFoundExactly() {
		StringBuilder chain = new StringBuilder();
		for (int i = 0; i < 399; i++) {
			chain.append("<joints id=\"j").append(i).append("\" x=\"").append(i).append(" mm\" y=\"90 mm\"/>");
		}
		for (int i = 0; i < 400; i++) {
			chain.append("<legs id=\"l").append(i).append("\" from=\"").append(i == 0 ? "b" : "j" + (i - 1)).append("\" to=\"")
					.append(i == 399 ? "a" : "j" + i).append("\" material=\"ferrite\" width=\"").append(12 + 0.01 * i)
					.append(" mm\" depth=\"15 mm\" pathLength=\"1 mm\"/>");
		}
		String back = "<legs id=\"back\" from=\"b\" to=\"a\" material=\"ferrite\" width=\"12 mm\" depth=\"15 mm\" pathLength=\"90 mm\"/>";
		SweepResult coarse = sweep(0, 300, 6, back, chain.toString());
		SweepResult fine = sweep(0, 300, 60, back, chain.toString());
		assertEquals(fine.leg("l0").nearAt(), coarse.leg("l0").nearAt(), 1e-6);
		assertEquals(fine.leg("l399").nearAt(), coarse.leg("l399").nearAt(), 50);
		assertTrue(coarse.leg("l0").nearAt() < coarse.leg("l399").nearAt());
	}
}
