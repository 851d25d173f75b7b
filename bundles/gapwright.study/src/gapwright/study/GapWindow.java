package gapwright.study;

import static gapwright.model.LegGeometry.si;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

import gapwright.model.Design;
import gapwright.model.Gap;
import gapwright.model.GapPlace;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.LegGeometry;
import gapwright.model.SectionShape;

/**
 * Where the winding window beside a gap ends: as given, or taken from the drawing, along the leg and those in line with
 * it to the nearest bar that crosses, less half that bar's width.
 *
 * @param toFirst   from the middle of the gap towards the leg's from end, m
 * @param toSecond  towards its to end, m
 * @param given     whether the height was given rather than drawn
 * @param firstBar  the bar that ends the window towards the from end, null where none does
 * @param secondBar towards the to end
 */
record GapWindow(double toFirst, double toSecond, boolean given, Leg firstBar, Leg secondBar) {

	/** Bars closer in line than this (sine of the angle) continue a leg, others cross it. */
	private static final double IN_LINE = 0.5;

	/** How far it is to the end of the window from a joint on, and what ends it there. */
	private record Reach(double beyond, Leg bar) {
	}

	/** Which legs end at a joint; made once for a design. */
	static Map<Joint, List<Leg>> legsByJoint(Design design) {
		Map<Joint, List<Leg>> byJoint = new HashMap<>();
		for (Leg leg : design.getLegs()) {
			for (Joint end : new Joint[] { leg.getFrom(), leg.getTo() }) {
				if (end != null) {
					byJoint.computeIfAbsent(end, key -> new ArrayList<>()).add(leg);
				}
			}
		}
		return byJoint;
	}

	/** @return null when it is neither given nor to be had from the drawing */
	static GapWindow of(Leg leg, Gap gap, Map<Joint, List<Leg>> byJoint) {
		double position = gap.getPosition();
		if (gap.getWindowHeight() != null) {
			double height = gap.getWindowHeight().si();
			return new GapWindow(position * height, (1 - position) * height, true, null, null);
		}
		double distance = LegGeometry.jointDistance(leg);
		if (leg.getShape() == SectionShape.GIVEN || !(distance > 0)) {
			return null;
		}
		boolean open = gap.getPlace() == GapPlace.BETWEEN_POLES;
		Reach first = open ? new Reach(0, null) : reach(leg, leg.getFrom(), leg.getTo(), byJoint);
		Reach second = open ? new Reach(0, null) : reach(leg, leg.getTo(), leg.getFrom(), byJoint);
		GapWindow window = new GapWindow(position * distance + first.beyond(), (1 - position) * distance + second.beyond(), false,
				first.bar(), second.bar());
		return window.toFirst + window.toSecond > 0 ? window : null;
	}

	/** @param end where the leg arrives, coming from the joint {@code behind} */
	private static Reach reach(Leg leg, Joint end, Joint behind, Map<Joint, List<Leg>> byJoint) {
		double sum = 0;
		Leg here = leg;
		Joint at = end;
		Joint from = behind;
		for (int steps = 0; steps <= byJoint.size(); steps++) {
			Leg widest = null;
			Leg next = null;
			for (Leg other : byJoint.get(at)) {
				if (other == here) {
					continue;
				}
				double sine = sine(other, from, at);
				if (sine > IN_LINE && (widest == null || LegGeometry.drawnWidth(other) > LegGeometry.drawnWidth(widest))) {
					widest = other;
				} else if (sine <= IN_LINE) {
					next = other;
				}
			}
			if (widest != null) {
				return new Reach(sum - LegGeometry.drawnWidth(widest) / 2, widest);
			}
			if (next == null || far(next, at) == null || far(next, at) == end) {
				return new Reach(sum, null);
			}
			sum += LegGeometry.jointDistance(next);
			from = at;
			at = far(next, at);
			here = next;
		}
		return new Reach(sum, null);
	}

	private static Joint far(Leg leg, Joint near) {
		return leg.getFrom() == near ? leg.getTo() : leg.getFrom();
	}

	/** @return |sine| of the angle between a leg and the line of two joints */
	private static double sine(Leg leg, Joint from, Joint to) {
		if (leg.getFrom() == null || leg.getTo() == null) {
			return 0;
		}
		double ax = si(to.getX()) - si(from.getX());
		double ay = si(to.getY()) - si(from.getY());
		double bx = si(leg.getTo().getX()) - si(leg.getFrom().getX());
		double by = si(leg.getTo().getY()) - si(leg.getFrom().getY());
		return Math.abs(ax * by - ay * bx) / (Math.hypot(ax, ay) * Math.hypot(bx, by));
	}
}
