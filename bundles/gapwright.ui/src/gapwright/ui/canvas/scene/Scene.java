package gapwright.ui.canvas.scene;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

import gapwright.model.Design;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.LegGeometry;

/** A design's geometry on the page in millimetres. What has no place yet, for want of a joint or a size, is left out. */
public final class Scene {

	/** Width a bar is drawn with while its own is missing, mm. */
	private static final double UNKNOWN_WIDTH = 4;

	private final Map<Leg, Bar> bars = new LinkedHashMap<>();

	public Scene(Design design) {
		Map<Joint, List<Leg>> at = new HashMap<>();
		for (Leg leg : design.getLegs()) {
			if (isPlaced(leg)) {
				at.computeIfAbsent(leg.getFrom(), j -> new ArrayList<>()).add(leg);
				at.computeIfAbsent(leg.getTo(), j -> new ArrayList<>()).add(leg);
			}
		}
		for (Leg leg : design.getLegs()) {
			if (isPlaced(leg)) {
				bars.put(leg, bar(leg, at));
			}
		}
	}

	/** @return the bar, or null while the leg has no place */
	public Bar bar(Leg leg) {
		return bars.get(leg);
	}

	public Iterable<Bar> bars() {
		return bars.values();
	}

	/** @return x in mm, NaN while it is missing */
	public static double x(Joint joint) {
		return LegGeometry.si(joint.getX()) * 1e3;
	}

	/** @return y in mm, NaN while it is missing */
	public static double y(Joint joint) {
		return LegGeometry.si(joint.getY()) * 1e3;
	}

	private static boolean isPlaced(Leg leg) {
		return LegGeometry.jointDistance(leg) > 0;
	}

	/** @return width on the page, mm */
	public static double width(Leg leg) {
		double width = LegGeometry.drawnWidth(leg) * 1e3;
		return width > 0 ? width : UNKNOWN_WIDTH;
	}

	private static Bar bar(Leg leg, Map<Joint, List<Leg>> at) {
		double length = LegGeometry.jointDistance(leg) * 1e3;
		double ux = (x(leg.getTo()) - x(leg.getFrom())) / length;
		double uy = (y(leg.getTo()) - y(leg.getFrom())) / length;
		double width = width(leg);
		BarEnds.Cut start = BarEnds.cut(ux, uy, width, others(leg, leg.getFrom(), at));
		BarEnds.Cut end = BarEnds.cut(-ux, -uy, width, others(leg, leg.getTo(), at));
		// seen from the far end left and right change sides
		return new Bar(leg, x(leg.getFrom()), y(leg.getFrom()), ux, uy, length, width, start.left(), start.right(),
				length - end.right(), length - end.left());
	}

	private static List<BarEnds.Other> others(Leg leg, Joint joint, Map<Joint, List<Leg>> at) {
		List<BarEnds.Other> others = new ArrayList<>();
		for (Leg other : at.get(joint)) {
			if (other == leg) {
				continue;
			}
			Joint far = other.getFrom() == joint ? other.getTo() : other.getFrom();
			double dx = x(far) - x(joint);
			double dy = y(far) - y(joint);
			double length = Math.hypot(dx, dy);
			others.add(new BarEnds.Other(dx / length, dy / length, width(other)));
		}
		return others;
	}
}
