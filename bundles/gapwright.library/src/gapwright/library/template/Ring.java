package gapwright.library.template;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

import gapwright.model.Design;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.Winding;
import gapwright.physics.core.EffectiveParameters;
import gapwright.physics.core.PathPart;
import gapwright.physics.core.ThickRing;

/**
 * A ring of rectangular section, drawn as twelve straight legs on the mean circle; each has a twelfth of the ring's core
 * constant, so that the whole has the ring's exactly. Turns are spread over every second leg.
 *
 * @param inner  radius, m
 * @param outer  radius, m
 * @param height m
 */
record Ring(double inner, double outer, double height) {

	private static final double MARGIN = 25;
	private static final int SEGMENTS = 12;

	static Ring of(Entries entries) {
		Ring ring = new Ring(entries.metres("inner") / 2, entries.metres("outer") / 2, entries.metres("height"));
		if (ring.inner() >= ring.outer()) {
			throw new IllegalArgumentException("Inner diameter: must be below the outer diameter");
		}
		return ring;
	}

	private EffectiveParameters parameters() {
		return EffectiveParameters.of(List.of(PathPart.ring(inner, outer, height)));
	}

	String figures() {
		double lead = ThickRing.innerEdge(inner, outer);
		return ShapeFigures.of(parameters()) + (outer / inner > ThickRing.NOTED_FROM
				? String.format(Locale.ROOT, "\nring-inner-edge: flux density at the inner edge is %.3g times the mean that is judged", lead)
				: "");
	}

	Design draw(CoreSketch sketch, Entries entries) {
		double radius = (outer + inner) / 2 * 1e3;
		double centre = MARGIN + outer * 1e3;
		List<Joint> joints = new ArrayList<>();
		for (int s = 0; s < SEGMENTS; s++) {
			// half a step turned, so that a leg lies flat on top and at the bottom
			double angle = 2 * Math.PI * (s + 0.5) / SEGMENTS;
			joints.add(sketch.joint("joint-" + (s + 1), centre + radius * Math.sin(angle), centre - radius * Math.cos(angle)));
		}
		double arc = parameters().c1() * height * (outer - inner) / SEGMENTS * 1e3;
		List<Leg> legs = new ArrayList<>();
		for (int s = 0; s < SEGMENTS; s++) {
			Leg leg = sketch.leg("arc-" + (s + 1), "arc " + (s + 1), joints.get(s), joints.get((s + 1) % SEGMENTS),
					(outer - inner) * 1e3, entries.size("height"));
			leg.setPathLength(CoreSketch.exactMillimetres(arc));
			legs.add(leg);
		}
		Winding main = sketch.winding("main", "main");
		int turns = entries.turns("turns");
		int coils = Math.min(turns, SEGMENTS / 2);
		for (int c = 0; c < coils; c++) {
			// the first coils take the remainder
			sketch.coil(main, legs.get(2 * c + 1), turns / coils + (c < turns % coils ? 1 : 0), 0.5);
		}
		OneWinding.judge(sketch, main, entries);
		return sketch.design();
	}
}
