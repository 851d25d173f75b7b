package gapwright.study.leakage;

import static gapwright.model.LegGeometry.si;

import java.util.ArrayList;
import java.util.Collections;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedList;
import java.util.List;
import java.util.Map;
import java.util.Set;

import gapwright.model.Design;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.LegGeometry;

/**
 * A straight run of legs from one crossing bar to the next: a leg of the core as a designer sees it, in however many
 * pieces it is drawn. Lengths in m on the page.
 */
final class Column {

	/** Legs closer in line than this (sine of the angle) continue a column, others cross it. */
	private static final double IN_LINE = 0.5;
	private static final double PARALLEL = 0.05;

	final List<Leg> legs;
	/** One more than legs, in order; {@link #direction} runs from the first to the last. */
	final List<Joint> joints;
	/** Unit vector. */
	final double[] direction;
	private final Map<Joint, List<Leg>> byJoint;

	private Column(List<Leg> legs, List<Joint> joints, Map<Joint, List<Leg>> byJoint) {
		double[] first = place(joints.get(0));
		double[] last = place(joints.get(joints.size() - 1));
		double dx = last[0] - first[0];
		double dy = last[1] - first[1];
		// columns beside one another are to run the same way
		boolean turned = Math.abs(dy) >= Math.abs(dx) ? dy < 0 : dx < 0;
		if (turned) {
			Collections.reverse(legs);
			Collections.reverse(joints);
		}
		double length = Math.hypot(dx, dy) * (turned ? -1 : 1);
		this.legs = List.copyOf(legs);
		this.joints = List.copyOf(joints);
		this.direction = new double[] { dx / length, dy / length };
		this.byJoint = byJoint;
	}

	/** @return every leg with a place on the page in exactly one column */
	static List<Column> of(Design design) {
		Map<Joint, List<Leg>> byJoint = new HashMap<>();
		List<Leg> placed = design.getLegs().stream().filter(leg -> LegGeometry.jointDistance(leg) > 0).toList();
		for (Leg leg : placed) {
			byJoint.computeIfAbsent(leg.getFrom(), key -> new ArrayList<>()).add(leg);
			byJoint.computeIfAbsent(leg.getTo(), key -> new ArrayList<>()).add(leg);
		}
		List<Column> columns = new ArrayList<>();
		Set<Leg> taken = new HashSet<>();
		for (Leg leg : placed) {
			if (taken.add(leg)) {
				LinkedList<Leg> legs = new LinkedList<>(List.of(leg));
				LinkedList<Joint> joints = new LinkedList<>(List.of(leg.getFrom(), leg.getTo()));
				for (Leg next; (next = next(legs.getLast(), joints.getLast(), byJoint)) != null && taken.add(next);) {
					legs.addLast(next);
					joints.addLast(far(next, joints.getLast()));
				}
				for (Leg next; (next = next(legs.getFirst(), joints.getFirst(), byJoint)) != null && taken.add(next);) {
					legs.addFirst(next);
					joints.addFirst(far(next, joints.getFirst()));
				}
				if (distance(joints.getFirst(), joints.getLast()) > 0) {
					columns.add(new Column(legs, joints, byJoint));
				}
			}
		}
		return columns;
	}

	/** @return the leg that continues this one at a joint; null where a bar crosses there, or more than one goes on */
	private static Leg next(Leg leg, Joint at, Map<Joint, List<Leg>> byJoint) {
		Leg next = null;
		for (Leg other : byJoint.get(at)) {
			if (other != leg) {
				if (sine(vector(leg), vector(other)) > IN_LINE || next != null) {
					return null;
				}
				next = other;
			}
		}
		return next;
	}

	boolean isParallelTo(Column other) {
		return sine(direction, other.direction) < PARALLEL;
	}

	/** @return coordinate of a joint along a direction, m */
	static double along(Joint joint, double[] direction) {
		double[] place = place(joint);
		return place[0] * direction[0] + place[1] * direction[1];
	}

	/** @return coordinate of the column's middle across a direction, m */
	double across(double[] direction) {
		double[] first = place(joints.get(0));
		double[] last = place(joints.get(joints.size() - 1));
		return (first[1] + last[1]) / 2 * direction[0] - (first[0] + last[0]) / 2 * direction[1];
	}

	/** @return where the window beside the column begins along a direction, m: its first joint and half the bar there */
	double clearFrom(double[] direction) {
		return along(joints.get(0), direction) + halfBar(joints.get(0));
	}

	/** @return where the window beside the column ends, m */
	double clearTo(double[] direction) {
		Joint last = joints.get(joints.size() - 1);
		return along(last, direction) - halfBar(last);
	}

	private double halfBar(Joint end) {
		return byJoint.get(end).stream().filter(this::isCrossedBy).mapToDouble(LegGeometry::drawnWidth).max().orElse(0) / 2;
	}

	private boolean isCrossedBy(Leg leg) {
		return sine(direction, vector(leg)) > IN_LINE;
	}

	/** @return width on the page, m: that of the widest leg */
	double width() {
		return legs.stream().mapToDouble(LegGeometry::drawnWidth).max().orElseThrow();
	}

	/** @return into the page, m: that of the shallowest leg; of a round one the diameter, of a given area a square's side */
	double depth() {
		return legs.stream().mapToDouble(Column::depth).min().orElseThrow();
	}

	private static double depth(Leg leg) {
		return switch (leg.getShape()) {
		case RECTANGULAR -> si(leg.getDepth());
		case ROUND, GIVEN -> LegGeometry.drawnWidth(leg);
		};
	}

	/**
	 * @param first whether at the first ends, or at the last
	 * @return the crossing bars that join both columns there; null when none do
	 */
	List<Leg> barsTo(Column other, boolean first) {
		Joint start = first ? joints.get(0) : joints.get(joints.size() - 1);
		Joint goal = first ? other.joints.get(0) : other.joints.get(other.joints.size() - 1);
		Map<Joint, Leg> arrivedBy = new HashMap<>();
		LinkedList<Joint> open = new LinkedList<>(List.of(start));
		while (!open.isEmpty()) {
			Joint here = open.removeFirst();
			if (here == goal) {
				List<Leg> bars = new ArrayList<>();
				for (Joint at = goal; at != start; at = far(arrivedBy.get(at), at)) {
					bars.add(arrivedBy.get(at));
				}
				return bars;
			}
			for (Leg leg : byJoint.get(here)) {
				Joint there = far(leg, here);
				if (isCrossedBy(leg) && there != start && !arrivedBy.containsKey(there)) {
					arrivedBy.put(there, leg);
					open.add(there);
				}
			}
		}
		return null;
	}

	static Joint far(Leg leg, Joint near) {
		return leg.getFrom() == near ? leg.getTo() : leg.getFrom();
	}

	private static double[] place(Joint joint) {
		return new double[] { si(joint.getX()), si(joint.getY()) };
	}

	private static double distance(Joint a, Joint b) {
		return Math.hypot(place(a)[0] - place(b)[0], place(a)[1] - place(b)[1]);
	}

	private static double[] vector(Leg leg) {
		double[] from = place(leg.getFrom());
		double[] to = place(leg.getTo());
		return new double[] { to[0] - from[0], to[1] - from[1] };
	}

	private static double sine(double[] a, double[] b) {
		return Math.abs(a[0] * b[1] - a[1] * b[0]) / (Math.hypot(a[0], a[1]) * Math.hypot(b[0], b[1]));
	}
}
