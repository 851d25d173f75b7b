package gapwright.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

import org.junit.jupiter.api.Test;

import gapwright.library.Example;
import gapwright.library.Examples;
import gapwright.model.Design;
import gapwright.model.DesignReader;
import gapwright.physics.network.Network;
import gapwright.study.sensitivity.SensitivityResult;
import gapwright.study.sensitivity.SensitivityStudy;
import gapwright.study.vary.DesignNumbers;
import gapwright.study.vary.Knob;
import gapwright.study.vary.Knobs;
import gapwright.study.vary.PointSolver;

/** Every derivative of every figure by every number, against central differences of the whole computation. */
class SensitivityTest {

	private static final String GAP = "<gaps id=\"gap\" length=\"1 mm\" fringing=\"WIDENED\"/>";

	static Map<String, Design> designs() throws IOException {
		Map<String, Design> designs = new LinkedHashMap<>();
		for (Example example : Examples.all()) {
			try (InputStream input = example.open()) {
				designs.put(example.fileName(), DesignReader.read(input, example.fileName()));
			}
		}
		designs.put("ring", Designs.ring());
		designs.put("logarithmic", Designs.ring(GAP, "<gaps id=\"gap\" length=\"1 mm\" fringing=\"LOGARITHMIC\" windowHeight=\"30 mm\"/>"));
		designs.put("conformal", Designs.ring(GAP, "<gaps id=\"gap\" length=\"1 mm\" pieces=\"2\" fringing=\"CONFORMAL\" windowHeight=\"30 mm\"/>"));
		designs.put("against a yoke", Designs.ring(GAP, "<gaps id=\"gap\" length=\"1 mm\" fringing=\"CONFORMAL\" place=\"AGAINST_YOKE\" windowHeight=\"30 mm\"/>"));
		designs.put("round", Designs.ring("id=\"wound\" from=\"a\" to=\"b\" material=\"ferrite\" width=\"12 mm\" depth=\"15 mm\"",
				"id=\"wound\" from=\"a\" to=\"b\" material=\"ferrite\" shape=\"ROUND\" diameter=\"14 mm\""));
		designs.put("given", Designs.ring("id=\"wound\" from=\"a\" to=\"b\" material=\"ferrite\" width=\"12 mm\" depth=\"15 mm\"",
				"id=\"wound\" from=\"a\" to=\"b\" material=\"ferrite\" shape=\"GIVEN\" area=\"170 mm²\" stackingFactor=\"0.95\""));
		designs.put("scaled", Designs.ring("<materials id=\"ferrite\">", "<materials id=\"ferrite\" curveScaling=\"WITH_SATURATION\">"));
		designs.put("pulsed", Designs.ring("<drives xsi:type=\"gapwright:CurrentDrive\" id=\"drive\" winding=\"main\" current=\"10 A\" ripple=\"4 A\"/>",
				"<drives xsi:type=\"gapwright:VoltageDrive\" id=\"drive\" winding=\"main\" voltage=\"24 V\" onTime=\"5 µs\" bias=\"12 A\"/>"));
		designs.put("air path", Designs.ring("  <windings", "<airPaths id=\"air\" from=\"a\" to=\"b\" permeance=\"30 nH\"/>  <windings"));
		return designs;
	}

	private static double[] figures(StudyInput input, StudyInput.PointData point, Knob knob, double value) {
		DesignNumbers numbers = input.numbers().copy();
		knob.set(numbers, value);
		Network network = numbers.network(point.network(), point.celsius());
		PointSolver.State state = new PointSolver(input, point).solve(numbers, network, null);
		List<Double> figures = new ArrayList<>();
		for (int i = 0; i < input.windings().size(); i++) {
			for (int j = i; j < input.windings().size(); j++) {
				figures.add(state.mean().differentialInductance()[i][j]);
			}
		}
		for (int k = 0; k < input.legs().size(); k++) {
			figures.add(state.utilisation(k));
		}
		return figures.stream().mapToDouble(Double::doubleValue).toArray();
	}

	@Test
	void everyDerivativeIsThatOfTheWholeComputation() throws IOException {
		int compared = 0;
		for (Map.Entry<String, Design> each : designs().entrySet()) {
			StudyInput input = Lowering.of(each.getValue());
			List<Knob> knobs = Knobs.of(input);
			for (StudyInput.PointData point : input.points()) {
				SensitivityResult result = SensitivityStudy.of(input, point.id(), Progress.NONE);
				for (int p = 0; p < knobs.size(); p++) {
					Knob knob = knobs.get(p);
					double at = knob.get(input.numbers());
					double step = knob.feature() == Knob.Feature.CURRENT ? 1e-3 : 1e-5 * Math.abs(at);
					double[] more = figures(input, point, knob, at + step);
					double[] less = figures(input, point, knob, at - step);
					boolean factor = knob.feature() == Knob.Feature.PERMEABILITY || knob.feature() == Knob.Feature.SATURATION;
					for (int f = 0; f < more.length; f++) {
						double difference = (more[f] - less[f]) / (2 * step);
						double exact = result.derivative()[f][p] * (factor ? result.parameters().get(p).value() : 1);
						double scale = Math.max(Math.abs(difference), 1e-3 * Math.abs(result.figures().get(f).value() / (at == 0 ? 1 : at)));
						if (Math.abs(result.figures().get(f).value()) > 1e-9) {
							assertEquals(difference, exact, 2e-6 * scale, each.getKey() + " " + point.id() + ": "
									+ result.figures().get(f) + " by " + knob.subject() + "." + knob.feature());
							compared++;
						}
					}
				}
			}
		}
		assertTrue(compared > 3000, compared + " derivatives");
	}

	/** A gap-dominated core: 1 % more gap is nearly 1 % less inductance; turns count twice; saturation counts against utilisation. */
	@Test
	void elasticitiesAreWhatADesignerExpects() {
		SensitivityResult result = SensitivityStudy.of(Lowering.of(Designs.ring("current=\"10 A\" ripple=\"4 A\"", "current=\"0.1 A\"")),
				"full", Progress.NONE);
		int gap = index(result, "gap", Knob.Feature.GAP_LENGTH);
		int turns = index(result, "coil", Knob.Feature.TURNS);
		int saturation = index(result, "ferrite", Knob.Feature.SATURATION);
		assertEquals(-0.9, result.elasticity(0, gap), 0.15);
		assertEquals(2, result.elasticity(0, turns), 1e-3);
		assertEquals(1, result.elasticity(1, turns), 1e-3);
		assertEquals(-1, result.elasticity(1, saturation), 1e-12);
		assertEquals(0, result.elasticity(0, saturation), 0);
		assertEquals(2300, result.parameters().get(index(result, "ferrite", Knob.Feature.PERMEABILITY)).value(), 1e-9);
	}

	private static int index(SensitivityResult result, String subject, Knob.Feature feature) {
		for (int p = 0; p < result.parameters().size(); p++) {
			if (result.parameters().get(p).subject().equals(subject) && result.parameters().get(p).feature() == feature) {
				return p;
			}
		}
		throw new AssertionError(subject + " has no " + feature);
	}

	@Test
	void turningAKnobBackLeavesTheNetworkAsItWas() throws IOException {
		for (Design design : designs().values()) {
			StudyInput input = Lowering.of(design);
			DesignNumbers numbers = input.numbers().copy();
			for (Knob knob : Knobs.of(input)) {
				double at = knob.get(numbers);
				knob.set(numbers, at * 1.01 + 1e-9);
				knob.set(numbers, at);
			}
			StudyInput.PointData point = input.points().get(0);
			Network again = numbers.network(point.network(), point.celsius());
			for (int k = 0; k < again.legCount(); k++) {
				assertEquals(point.network().pathLength(k), again.pathLength(k), 1e-12);
				assertEquals(point.network().seriesReluctance(k), again.seriesReluctance(k), 1e-9 * point.network().seriesReluctance(k));
				assertEquals(point.network().ironArea(k), again.ironArea(k), 1e-15);
				assertEquals(point.network().magnetMmf(k), again.magnetMmf(k), 1e-9);
			}
		}
	}

	/** A ring of 400 legs in series: the 50 with the highest utilisation are followed, and their derivatives are the same. */
	@Test
	void ofALargeDesignTheFullestLegsAreFollowed() {
		StringBuilder legs = new StringBuilder();
		for (int i = 0; i < 399; i++) {
			legs.append("<joints id=\"j").append(i).append("\" x=\"").append(i).append(" mm\" y=\"90 mm\"/>");
		}
		for (int i = 0; i < 400; i++) {
			legs.append("<legs id=\"l").append(i).append("\" from=\"").append(i == 0 ? "a" : "j" + (i - 1)).append("\" to=\"")
					.append(i == 399 ? "b" : "j" + i).append("\" material=\"ferrite\" width=\"").append(12 + 0.01 * i)
					.append(" mm\" depth=\"15 mm\" pathLength=\"1 mm\"/>");
		}
		String back = "<legs id=\"back\" from=\"b\" to=\"a\" material=\"ferrite\" width=\"12 mm\" depth=\"15 mm\" pathLength=\"90 mm\"/>";
		StudyInput input = Lowering.of(Designs.ring(back, legs.toString()));
		SensitivityResult result = SensitivityStudy.of(input, "full", Progress.NONE);
		assertEquals(1 + 50, result.figures().size());
		assertTrue(result.figures().stream().noneMatch(f -> f.subject().equals("l399")));
		assertTrue(result.figures().stream().anyMatch(f -> f.subject().equals("l0")));
	}

	@Test
	void aPointThatCannotBeComputedHasNoSensitivities() {
		StudyInput input = Lowering.of(Designs.ring("length=\"1 mm\"", "length=\"14 mm\""));
		assertThrows(IllegalArgumentException.class, () -> SensitivityStudy.of(input, "full", Progress.NONE));
		assertThrows(IllegalArgumentException.class, () -> SensitivityStudy.of(input, "none", Progress.NONE));
		assertFalse(Knobs.of(input).isEmpty());
	}
}
