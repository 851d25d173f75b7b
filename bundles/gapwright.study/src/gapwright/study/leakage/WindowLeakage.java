package gapwright.study.leakage;

import static gapwright.model.LegGeometry.si;

import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;

import gapwright.model.AirPath;
import gapwright.model.Design;
import gapwright.model.Fringing;
import gapwright.model.Gap;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.LegGeometry;
import gapwright.physics.leakage.WindowPath;

/**
 * Estimates the leakage across the windows of a core as air paths between facing legs: parallel ones with nothing between
 * them, joined by bars at both ends. Where the legs are cut in n pieces, a path of P/n joins every pair of facing cuts:
 * with the MMF rising along the legs the energy is then high by 1/(2n²). At an end of the window half of that is added, but
 * only where a gap, magnet or coil in the bars puts an MMF between the legs there: along plain iron there is next to none.
 * Left in one piece, legs that have an MMF between them at one end only get P/3 there, which has the right energy, and at
 * both ends P/2 each. Sources: {@link WindowPath}; the thirds by integration.
 */
public final class WindowLeakage {

	/** Pieces that keep the energy within 2 %, odd so that a gap half way lies within one. */
	public static final int USUAL_PIECES = 5;

	/** Part of the window's height by which facing joints may miss one another. */
	private static final double FACING = 0.02;
	/** Part of a leg from which on two cuts are two. */
	private static final double SAME_CUT = 1e-4;

	private final int pieces;
	private final Set<Leg> wound;
	private final List<AirPath> there;
	private final List<Column> columns;
	private final Map<Leg, TreeSet<Double>> cuts = new LinkedHashMap<>();
	private final Map<Leg, double[]> windows = new LinkedHashMap<>();

	private WindowLeakage(Design design, int pieces) {
		this.pieces = pieces;
		wound = CountedTwice.woundLegs(design);
		there = design.getAirPaths();
		columns = Column.of(design);
	}

	/**
	 * @param pieces 1 to leave the legs as they are, else what each facing leg is to be cut into
	 * @param among  ids of legs that a window must have on both sides to count; empty for every window beside a wound leg,
	 *               since the field of a coil crosses the window away from the coil's own leg
	 * @throws IllegalArgumentException when pieces is below 1
	 */
	public static LeakageEstimate of(Design design, int pieces, Collection<String> among) {
		if (pieces < 1) {
			throw new IllegalArgumentException("pieces = " + pieces + ": must be 1 or more");
		}
		return new WindowLeakage(design, pieces).estimate(among);
	}

	private LeakageEstimate estimate(Collection<String> among) {
		List<FacingLegs> found = new ArrayList<>();
		for (int i = 0; i < columns.size(); i++) {
			for (int j = i + 1; j < columns.size(); j++) {
				Window window = window(columns.get(i), columns.get(j));
				if (window != null && (among.isEmpty() ? isWound(window.first) || isWound(window.second)
						: touches(window.first, among) && touches(window.second, among))) {
					found.add(facing(window));
				}
			}
		}
		List<LegCut> made = new ArrayList<>();
		cuts.forEach((leg, at) -> made.add(new LegCut(leg.getId(), List.copyOf(at), windows.get(leg)[0], windows.get(leg)[1])));
		return new LeakageEstimate(List.copyOf(found), List.copyOf(made));
	}

	private boolean isWound(Column column) {
		return column.legs.stream().anyMatch(wound::contains);
	}

	private static boolean touches(Column column, Collection<String> ids) {
		return column.legs.stream().anyMatch(leg -> ids.contains(leg.getId()));
	}

	/** A window between two columns, in coordinates along the first. */
	private record Window(Column first, Column second, double from, double to, double distance, boolean startLive, boolean endLive) {

		double height() {
			return to - from;
		}

		WindowPath path() {
			return new WindowPath(height(), distance, Math.min(first.depth(), second.depth()),
					Math.min(first.width(), second.width()));
		}
	}

	private Window window(Column first, Column second) {
		if (!first.isParallelTo(second)) {
			return null;
		}
		double[] u = first.direction;
		double from = Math.max(first.clearFrom(u), second.clearFrom(u));
		double to = Math.min(first.clearTo(u), second.clearTo(u));
		double here = first.across(u);
		double there = second.across(u);
		double distance = Math.abs(here - there) - (first.width() + second.width()) / 2;
		if (!(to > from && distance > 0 && Math.min(first.depth(), second.depth()) > 0)) {
			return null;
		}
		for (Column other : columns) {
			double place = other.across(u);
			boolean between = other.isParallelTo(first) && place > Math.min(here, there) && place < Math.max(here, there);
			if (other != first && other != second && between
					&& Math.min(to, other.clearTo(u)) > Math.max(from, other.clearFrom(u))) {
				return null;
			}
		}
		List<Leg> start = first.barsTo(second, true);
		List<Leg> end = first.barsTo(second, false);
		return start == null || end == null ? null
				: new Window(first, second, from, to, distance, hasMmf(start), hasMmf(end));
	}

	private boolean hasMmf(List<Leg> bars) {
		return bars.stream().anyMatch(bar -> !bar.getGaps().isEmpty() || bar.getMagnet() != null || wound.contains(bar));
	}

	private FacingLegs facing(Window window) {
		List<LeakagePath> paths = new ArrayList<>();
		String reason = alreadyThere(window) ? "there are air paths between them already" : "";
		if (reason.isEmpty()) {
			reason = pieces == 1 ? uncut(window, paths) : cut(window, paths);
		}
		List<String> twice = new ArrayList<>();
		for (Column column : List.of(window.first, window.second)) {
			CountedTwice.gaps(column, wound).forEach(gap -> twice.add(gap.getId()));
		}
		return new FacingLegs(ids(window.first), ids(window.second), window.path(), List.copyOf(paths), reason, List.copyOf(twice));
	}

	private boolean alreadyThere(Window window) {
		return there.stream().anyMatch(path -> joins(path.getFrom(), path.getTo(), window) || joins(path.getTo(), path.getFrom(), window));
	}

	private static boolean joins(Joint a, Joint b, Window window) {
		return window.first.joints.contains(a) && window.second.joints.contains(b);
	}

	private static List<String> ids(Column column) {
		return column.legs.stream().map(Leg::getId).toList();
	}

	/** @return why there are none, "" when there are */
	private String uncut(Window window, List<LeakagePath> paths) {
		double[] u = window.first.direction;
		// facing joints with where they are: both ends of the window, and inner ones that exist
		List<LegPoint[]> points = new ArrayList<>();
		List<Double> places = new ArrayList<>();
		points.add(ends(window, true));
		places.add(window.from);
		for (int i = 1; i + 1 < window.first.joints.size(); i++) {
			double place = Column.along(window.first.joints.get(i), u);
			for (int j = 1; j + 1 < window.second.joints.size(); j++) {
				double other = Column.along(window.second.joints.get(j), u);
				if (Math.abs(place - other) < FACING * window.height() && place > window.from && place < window.to) {
					points.add(new LegPoint[] { atJoint(window.first, i), atJoint(window.second, j) });
					places.add(place);
				}
			}
		}
		points.add(ends(window, false));
		places.add(window.to);
		double permeance = window.path().permeance();
		int last = points.size() - 1;
		if (last == 1) {
			if (window.startLive != window.endLive) {
				add(paths, points.get(window.startLive ? 0 : 1), permeance / 3);
			} else if (window.startLive) {
				add(paths, points.get(0), permeance / 2);
				add(paths, points.get(1), permeance / 2);
			} else {
				return "the bars at both ends leave no MMF between the legs' ends: cut the legs in pieces";
			}
			return "";
		}
		for (int i = 0; i <= last; i++) {
			boolean live = i == 0 ? window.startLive : i < last || window.endLive;
			double share = (places.get(Math.min(i + 1, last)) - places.get(Math.max(i - 1, 0))) / 2 / window.height();
			if (live) {
				add(paths, points.get(i), permeance * share);
			}
		}
		return "";
	}

	private String cut(Window window, List<LeakagePath> paths) {
		Map<Leg, TreeSet<Double>> wanted = new LinkedHashMap<>();
		List<LegPoint[]> points = new ArrayList<>();
		for (int k = 1; k < pieces; k++) {
			double place = window.from + k * window.height() / pieces;
			points.add(new LegPoint[] { at(window.first, place, window, wanted), at(window.second, place, window, wanted) });
		}
		for (Map.Entry<Leg, TreeSet<Double>> each : wanted.entrySet()) {
			String obstacle = obstacle(each.getKey(), each.getValue());
			if (!obstacle.isEmpty()) {
				return obstacle;
			}
		}
		wanted.forEach((leg, at) -> {
			cuts.computeIfAbsent(leg, key -> new TreeSet<>()).addAll(at);
			windows.computeIfAbsent(leg, key -> ends(leg, window));
		});
		double[] rungs = window.path().ladder(pieces);
		if (window.startLive) {
			add(paths, ends(window, true), rungs[0]);
		}
		for (int k = 1; k < pieces; k++) {
			add(paths, points.get(k - 1), rungs[k]);
		}
		if (window.endLive) {
			add(paths, ends(window, false), rungs[pieces]);
		}
		return "";
	}

	private static void add(List<LeakagePath> paths, LegPoint[] ends, double permeance) {
		paths.add(new LeakagePath(ends[0], ends[1], permeance));
	}

	private static LegPoint[] ends(Window window, boolean first) {
		return new LegPoint[] { atJoint(window.first, first ? 0 : window.first.legs.size()),
				atJoint(window.second, first ? 0 : window.second.legs.size()) };
	}

	private static LegPoint atJoint(Column column, int joint) {
		Leg leg = column.legs.get(Math.min(joint, column.legs.size() - 1));
		return new LegPoint(leg.getId(), leg.getFrom() == column.joints.get(joint) ? 0 : 1);
	}

	/** The point of a column beside a place of the window: a joint that is there, a cut already planned, or a new cut. */
	private LegPoint at(Column column, double place, Window window, Map<Leg, TreeSet<Double>> wanted) {
		double[] u = window.first.direction;
		for (int j = 1; j + 1 < column.joints.size(); j++) {
			if (Math.abs(Column.along(column.joints.get(j), u) - place) < FACING * window.height()) {
				return atJoint(column, j);
			}
		}
		for (int k = 0; k < column.legs.size(); k++) {
			double from = Column.along(column.joints.get(k), u);
			double to = Column.along(column.joints.get(k + 1), u);
			if (place > from && place < to) {
				Leg leg = column.legs.get(k);
				double at = (place - from) / (to - from);
				double fromEnd = leg.getFrom() == column.joints.get(k) ? at : 1 - at;
				double same = cuts.getOrDefault(leg, new TreeSet<>()).stream().filter(c -> Math.abs(c - fromEnd) < SAME_CUT)
						.findFirst().orElse(fromEnd);
				wanted.computeIfAbsent(leg, key -> new TreeSet<>()).add(same);
				return new LegPoint(leg.getId(), same);
			}
		}
		throw new IllegalStateException("the window lies within both legs");
	}

	/** Part of a leg that lies within the window, from its from joint on a scale of 0 to 1. */
	private static double[] ends(Leg leg, Window window) {
		double[] u = window.first.direction;
		double from = Column.along(leg.getFrom(), u);
		double to = Column.along(leg.getTo(), u);
		double a = clamped((window.from - from) / (to - from));
		double b = clamped((window.to - from) / (to - from));
		return new double[] { Math.min(a, b), Math.max(a, b) };
	}

	private static double clamped(double at) {
		return Math.max(0, Math.min(1, at));
	}

	/** @return what in the leg is in the way of the cuts, or would change its meaning by them; "" for nothing */
	private static String obstacle(Leg leg, TreeSet<Double> at) {
		double length = LegGeometry.jointDistance(leg);
		for (Gap gap : leg.getGaps()) {
			if (gap.getPieces() > 1) {
				return "gap '" + gap.getId() + "' is spread over the leg in " + gap.getPieces() + " pieces: draw them one by one";
			}
			double half = si(gap.getLength()) / 2 / length;
			double position = gap.getPosition();
			if (at.subSet(position - half, true, position + half, true).size() > 0) {
				return "gap '" + gap.getId() + "' lies where the leg would be cut: choose another number of pieces";
			}
			if (gap.getFringing() == Fringing.CONFORMAL && gap.getWindowHeight() != null
					&& Math.abs(within(position, at) - position) > SAME_CUT) {
				return "gap '" + gap.getId() + "' has its window height typed in and would lose its place in it: leave it to the drawing";
			}
		}
		if (leg.getMagnet() != null) {
			double half = si(leg.getMagnet().getLength()) / 2 / length;
			double position = leg.getMagnet().getPosition();
			if (at.subSet(position - half, true, position + half, true).size() > 0) {
				return "magnet '" + leg.getMagnet().getId() + "' lies where the leg would be cut: choose another number of pieces";
			}
		}
		return "";
	}

	/** @return position in the piece it falls in */
	private static double within(double position, TreeSet<Double> at) {
		Double low = at.floor(position);
		Double high = at.higher(position);
		double from = low == null ? 0 : low;
		return (position - from) / ((high == null ? 1 : high) - from);
	}
}
