package gapwright.ui.canvas.looks;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.DoubleStream;

import gapwright.model.AirPath;
import gapwright.model.Coil;
import gapwright.model.Design;
import gapwright.model.Gap;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.LegGeometry;
import gapwright.model.Magnet;
import gapwright.model.OperatingPoint;
import gapwright.model.Winding;
import gapwright.study.LegResult;
import gapwright.study.LegState;
import gapwright.study.OperatingPointResult;
import gapwright.study.WindingResult;
import gapwright.ui.canvas.CanvasScale;
import gapwright.ui.canvas.paint.Pen;
import gapwright.ui.canvas.scene.Bar;
import gapwright.ui.canvas.scene.Scene;
import gapwright.ui.canvas.scene.TurnPlaces;

/** Turns a design and its newest result into looks. */
public final class PictureMaker {

	private static final double LEAST_SLOT = 7;
	private static final double SLOT_OVERHANG = 3;
	/** Distance of an air path from the coil or wall it passes, mm. */
	private static final double AIR_CLEARANCE = 2;
	/** Swing of an air path with nothing in its way, as a share of its length. */
	private static final double FREE_SWING = 0.12;

	private final Design design;
	private final OperatingPoint point;
	private final OperatingPointResult result;
	private final CanvasScale scale;
	private final Pen measure;
	private final Scene scene;
	private final Picture picture = new Picture();
	private final Map<Leg, Double> build = new HashMap<>();
	private final Map<String, LegResult> results = new HashMap<>();

	/**
	 * @param point   the chosen operating point, or null
	 * @param result  of the design as it stands, or null: then nothing is shown of an older one
	 * @param measure measures texts; nothing is drawn with it
	 */
	public PictureMaker(Design design, OperatingPoint point, OperatingPointResult result, CanvasScale scale, Pen measure) {
		this.design = design;
		this.point = point;
		this.result = result;
		this.scale = scale;
		this.measure = measure;
		scene = new Scene(design);
		if (result != null) {
			result.legs().forEach(leg -> results.put(leg.id(), leg));
		}
	}

	/** @return drawing and labels */
	public Picture make() {
		makeDrawing();
		new LabelMaker(design, point, result, results, scale, measure, scene, picture, build).make();
		return picture;
	}

	/** @return the drawing alone, for where labels cannot be read */
	public Picture makeDrawing() {
		for (Bar bar : scene.bars()) {
			picture.add(bar.leg(), leg(bar));
		}
		for (Bar bar : scene.bars()) {
			for (Gap gap : bar.leg().getGaps()) {
				picture.add(gap, gap(gap, bar));
			}
			if (bar.leg().getMagnet() != null) {
				picture.add(bar.leg().getMagnet(), magnet(bar.leg().getMagnet(), bar));
			}
		}
		coils();
		airPaths();
		for (Joint joint : design.getJoints()) {
			double x = scale.pixels(Scene.x(joint));
			double y = scale.pixels(Scene.y(joint));
			if (!Double.isNaN(x) && !Double.isNaN(y)) {
				picture.add(joint, new JointLook(x, y));
			}
		}
		return picture;
	}

	private void airPaths() {
		Map<String, Integer> between = new HashMap<>();
		for (AirPath path : design.getAirPaths()) {
			Joint from = path.getFrom();
			Joint to = path.getTo();
			if (from != null && to != null && from != to) {
				int a = design.getJoints().indexOf(from);
				int b = design.getJoints().indexOf(to);
				int rank = between.merge(Math.min(a, b) + "-" + Math.max(a, b), 1, Integer::sum) - 1;
				picture.add(path, AirPathLook.between(scale.pixels(Scene.x(from)), scale.pixels(Scene.y(from)),
						scale.pixels(Scene.x(to)), scale.pixels(Scene.y(to)), scale.pixels(deviation(path, rank))));
			}
		}
	}

	/**
	 * How far an air path swings out, mm: clear of a leg between the same joints and its coils, inwards there. Leakage runs
	 * straight across its window, as the field does.
	 */
	private double deviation(AirPath path, int rank) {
		Joint from = path.getFrom();
		Joint to = path.getTo();
		double dx = Scene.x(to) - Scene.x(from);
		double dy = Scene.y(to) - Scene.y(from);
		double clear = 0;
		for (Bar bar : scene.bars()) {
			Leg leg = bar.leg();
			if (leg.getFrom() == from && leg.getTo() == to || leg.getFrom() == to && leg.getTo() == from) {
				clear = Math.max(clear, bar.width() / 2 + build.getOrDefault(leg, 0.0) + AIR_CLEARANCE);
			}
		}
		double inward = (middleX() - Scene.x(from)) * -dy + (middleY() - Scene.y(from)) * dx;
		double free = FREE_SWING * Math.hypot(dx, dy);
		if (path.isLeakage() && clear == 0) {
			return rank * free / 2;
		}
		return (inward < 0 ? -1 : 1) * ((clear > 0 ? clear : free) + rank * free / 2);
	}

	private double middleX() {
		return design.getJoints().stream().mapToDouble(Scene::x).average().orElse(0);
	}

	private double middleY() {
		return design.getJoints().stream().mapToDouble(Scene::y).average().orElse(0);
	}

	private LegLook leg(Bar bar) {
		LegResult leg = results.get(bar.leg().getId());
		double[] outline = scale.pixels(bar.outline(1));
		double[] start = bar.at(bar.start(), 0);
		double[] end = bar.at(bar.end(), 0);
		double[] axis = scale.pixels(new double[] { start[0], start[1], end[0], end[1] });
		double width = scale.pixels(bar.width());
		if (leg == null) {
			return new LegLook(outline, new double[0], axis, width, null, 0, new double[0]);
		}
		// what cannot be judged shows a thin thread of flux
		double share = leg.state() == LegState.UNKNOWN ? 0.1 : Math.min(1, leg.utilisation());
		return new LegLook(outline, scale.pixels(bar.outline(share)), axis, width, leg.state(),
				(int) Math.signum(leg.flux()), crossed(bar));
	}

	private double[] crossed(Bar bar) {
		DoubleStream gaps = bar.leg().getGaps().stream().mapToDouble(Gap::getPosition);
		Magnet magnet = bar.leg().getMagnet();
		DoubleStream joints = DoubleStream.of(0, 1);
		return DoubleStream.concat(DoubleStream.concat(gaps, joints), magnet == null ? DoubleStream.empty() : DoubleStream.of(magnet.getPosition()))
				.map(position -> scale.pixels(position * bar.length() - bar.start())).toArray();
	}

	private GapLook gap(Gap gap, Bar bar) {
		double half = Math.max(LEAST_SLOT, scale.pixels(LegGeometry.si(gap.getLength()) * 1e3)) / 2;
		double halfMillimetres = scale.millimetres(Double.isNaN(half) ? LEAST_SLOT / 2 : half);
		double across = bar.width() / 2;
		double overhang = across + scale.millimetres(SLOT_OVERHANG);
		int pieces = Math.max(1, Math.min(gap.getPieces(), 50));
		double spread = pieces == 1 ? 0 : 0.6 * (bar.end() - bar.start()) / pieces;
		List<double[]> slots = new ArrayList<>();
		List<double[]> faces = new ArrayList<>();
		for (int piece = 0; piece < pieces; piece++) {
			double s = gap.getPosition() * bar.length() + (piece - (pieces - 1) / 2.0) * spread;
			slots.add(scale.pixels(bar.block(s - halfMillimetres, s + halfMillimetres, -overhang, overhang)));
			for (int side = -1; side <= 1; side += 2) {
				double[] a = bar.at(s + side * halfMillimetres, -across);
				double[] b = bar.at(s + side * halfMillimetres, across);
				faces.add(scale.pixels(new double[] { a[0], a[1], b[0], b[1] }));
			}
		}
		return new GapLook(slots, faces);
	}

	private MagnetLook magnet(Magnet magnet, Bar bar) {
		double length = LegGeometry.si(magnet.getLength()) * 1e3;
		double half = Math.max(scale.millimetres(8), length > 0 ? length : 0) / 2;
		double s = magnet.getPosition() * bar.length();
		double reach = Math.max(half, scale.millimetres(12));
		int sense = magnet.isReversed() ? -1 : 1;
		double[] tail = bar.at(s - sense * reach, 0);
		double[] tip = bar.at(s + sense * reach, 0);
		return new MagnetLook(scale.pixels(bar.block(s - half, s + half, -bar.width() / 2, bar.width() / 2)),
				scale.pixels(new double[] { tail[0], tail[1], tip[0], tip[1] }));
	}

	private void coils() {
		Map<Leg, Integer> count = new HashMap<>();
		for (Winding winding : design.getWindings()) {
			for (Coil coil : winding.getCoils()) {
				count.merge(coil.getLeg() == null ? null : coil.getLeg(), 1, Integer::sum);
			}
		}
		for (Winding winding : design.getWindings()) {
			WindingResult driven = result == null ? null : result.winding(winding.getId());
			double current = driven == null ? 0 : driven.current();
			for (Coil coil : winding.getCoils()) {
				Bar bar = coil.getLeg() == null ? null : scene.bar(coil.getLeg());
				if (bar != null && coil.getTurns() > 0) {
					picture.add(coil, coil(coil, bar, count.get(coil.getLeg()), current));
				}
			}
		}
	}

	/**
	 * Current that drives flux along the axis goes into the page on the side of the axis' normal (-uy, ux), by the
	 * right-hand rule with y downwards.
	 */
	private CoilLook coil(Coil coil, Bar bar, int onLeg, double current) {
		TurnPlaces places = TurnPlaces.of(coil, bar, onLeg);
		boolean along = (current < 0) == coil.isReversed();
		int turns = places.along().length;
		double[] toward = new double[2 * turns];
		double[] away = new double[2 * turns];
		double furthest = 0;
		for (int t = 0; t < turns; t++) {
			double[] plus = scale.pixels(bar.at(places.along()[t], places.outward()[t]));
			double[] minus = scale.pixels(bar.at(places.along()[t], -places.outward()[t]));
			System.arraycopy(along ? minus : plus, 0, toward, 2 * t, 2);
			System.arraycopy(along ? plus : minus, 0, away, 2 * t, 2);
			furthest = Math.max(furthest, places.outward()[t] + places.pitch() / 2 - bar.width() / 2);
		}
		build.merge(bar.leg(), furthest, Math::max);
		return new CoilLook(toward, away, scale.pixels(places.pitch()) / 2, current != 0);
	}
}
