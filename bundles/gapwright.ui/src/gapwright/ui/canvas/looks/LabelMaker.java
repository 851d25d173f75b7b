package gapwright.ui.canvas.looks;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.IdentityHashMap;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

import org.eclipse.emf.ecore.EObject;

import gapwright.model.Coil;
import gapwright.model.CurrentDrive;
import gapwright.model.Design;
import gapwright.model.Drive;
import gapwright.model.Gap;
import gapwright.model.Leg;
import gapwright.model.OperatingPoint;
import gapwright.model.VoltageDrive;
import gapwright.model.Winding;
import gapwright.study.LegResult;
import gapwright.study.LegState;
import gapwright.study.OperatingPointResult;
import gapwright.study.WindingResult;
import gapwright.ui.canvas.CanvasScale;
import gapwright.ui.canvas.paint.Align;
import gapwright.ui.canvas.paint.Pen;
import gapwright.ui.canvas.paint.Tone;
import gapwright.ui.canvas.scene.Bar;
import gapwright.ui.canvas.scene.Scene;
import gapwright.ui.fields.FeatureText;
import gapwright.ui.fields.FigureFormat;

/** Writes the labels and finds room for them: gaps and magnets first, then legs by their share of saturation. */
final class LabelMaker {

	private static final double TITLE = 12;
	/** Peak over mean flux density from which it is said that the peak is shown. */
	private static final double LEAST_SWING = 1.001;
	private static final double SMALL = 11;
	private static final double NEAR_BY = 6;
	private static final double[] DISTANCES = { NEAR_BY, 26, 52 };
	/** Pixels of visible bar from which a leg gets its whole label. */
	private static final double ROOMY = 70;
	private static final double[] SHARES = { 0.5, 0.3, 0.7, 0.15, 0.85 };

	private final Design design;
	private final OperatingPoint point;
	private final OperatingPointResult result;
	private final Map<String, LegResult> results;
	private final CanvasScale scale;
	private final Pen measure;
	private final Scene scene;
	private final Picture picture;
	private final Map<Leg, Double> build;
	/** Gaps without room for their length beside them: it goes into the leg's label. */
	private final Map<Leg, List<String>> crowded = new HashMap<>();
	private final LabelLayout layout = new LabelLayout();

	LabelMaker(Design design, OperatingPoint point, OperatingPointResult result, Map<String, LegResult> results,
			CanvasScale scale, Pen measure,
			Scene scene, Picture picture, Map<Leg, Double> build) {
		this.design = design;
		this.point = point;
		this.result = result;
		this.results = results;
		this.scale = scale;
		this.measure = measure;
		this.scene = scene;
		this.picture = picture;
		this.build = build;
	}

	void make() {
		blockDrawing();
		double[] middle = middle();
		for (Bar bar : scene.bars()) {
			for (Gap gap : bar.leg().getGaps()) {
				String pieces = gap.getPieces() > 1 ? gap.getPieces() + " × " : "";
				String length = pieces + (gap.getLength() == null ? "?" : gap.getLength().text());
				if (!beside(gap, bar, gap.getPosition(), length)) {
					crowded.computeIfAbsent(bar.leg(), leg -> new ArrayList<>()).add("gap " + length);
				}
			}
			if (bar.leg().getMagnet() != null && bar.leg().getMagnet().getRemanence() != null) {
				beside(bar.leg().getMagnet(), bar, bar.leg().getMagnet().getPosition(),
						bar.leg().getMagnet().getRemanence().text());
			}
		}
		List<Bar> bars = new ArrayList<>();
		scene.bars().forEach(bars::add);
		Map<Bar, Double> urgency = new IdentityHashMap<>();
		bars.forEach(bar -> urgency.put(bar, urgency(bar.leg())));
		bars.sort(Comparator.comparingDouble((Bar bar) -> -urgency.get(bar)));
		for (Bar bar : bars) {
			leg(bar, middle);
		}
		headings();
	}

	private double urgency(Leg leg) {
		LegResult found = results.get(leg.getId());
		return found == null || Double.isNaN(found.utilisation()) ? 0 : found.utilisation();
	}

	/** Bars in pieces of their width, so that a slanting one does not block its whole rectangle. */
	private void blockDrawing() {
		for (Bar bar : scene.bars()) {
			double width = bar.width();
			int pieces = (int) Math.max(1, Math.min(60, Math.ceil((bar.end() - bar.start()) / width)));
			double step = (bar.end() - bar.start()) / pieces;
			for (int i = 0; i < pieces; i++) {
				double s = bar.start() + i * step;
				layout.blockIron(Shapes.bounds(1, scale.pixels(bar.block(s, s + step, -width / 2, width / 2))));
			}
		}
		for (EObject element : picture.elements()) {
			if (picture.look(element) instanceof CoilLook coil) {
				coil.boxes().forEach(layout::block);
			} else if (picture.look(element) instanceof JointLook joint) {
				layout.block(joint.bounds());
			}
		}
	}

	private double[] middle() {
		double x = 0;
		double y = 0;
		int n = 0;
		for (Bar bar : scene.bars()) {
			double[] at = bar.at(bar.length() / 2, 0);
			x += at[0];
			y += at[1];
			n++;
		}
		return n == 0 ? new double[2] : new double[] { x / n, y / n };
	}

	/** A single line next to the bar's wall, or beyond the coil with a leader. */
	private boolean beside(EObject element, Bar bar, double position, String text) {
		double s = position * bar.length();
		List<LabelLayout.Place> places = new ArrayList<>();
		double coil = scale.pixels(build.getOrDefault(bar.leg(), 0.0));
		for (double distance : new double[] { 8, coil + 10, coil + 40 }) {
			for (int side : new int[] { 1, -1 }) {
				places.add(place(bar, s, side, distance, 4));
			}
		}
		return put(element, List.of(new LabelLine(text, SMALL, false, Tone.NOTE)), places, null);
	}

	/** The anchor lies off the wall by a distance; anything but next to the wall gets a leader from it. */
	private LabelLayout.Place place(Bar bar, double s, int side, double distance, double leaderFrom) {
		double[] wall = scale.pixels(bar.at(s, side * bar.width() / 2));
		double nx = -bar.uy() * side;
		double ny = bar.ux() * side;
		double x = wall[0] + nx * distance;
		double y = wall[1] + ny * distance;
		double[] leader = distance <= leaderFrom ? new double[0]
				: new double[] { wall[0] + nx * 3, wall[1] + ny * 3, x - nx * 2, y - ny * 2 };
		return new LabelLayout.Place(x, y, nx, ny, leader);
	}

	private void leg(Bar bar, double[] middle) {
		LegResult found = results.get(bar.leg().getId());
		List<LabelLayout.Place> places = new ArrayList<>();
		double[] centre = bar.at(bar.length() / 2, 0);
		int outward = (middle[0] - centre[0]) * -bar.uy() + (middle[1] - centre[1]) * bar.ux() > 1e-6 ? -1 : 1;
		double coil = scale.pixels(build.getOrDefault(bar.leg(), 0.0));
		for (double distance : DISTANCES) {
			if (distance > NEAR_BY && places.size() == 2 * SHARES.length) {
				ends(bar, places);
			}
			for (int side : new int[] { outward, -outward }) {
				for (double share : SHARES) {
					double s = bar.start() + share * (bar.end() - bar.start());
					places.add(place(bar, s, side, distance + coil, NEAR_BY + coil));
				}
			}
		}
		List<LabelLine> lines = new ArrayList<>(lines(bar.leg(), found));
		for (String gap : crowded.getOrDefault(bar.leg(), List.of())) {
			lines.add(new LabelLine(gap, SMALL, false, Tone.NOTE));
		}
		Tone badge = found == null ? null : found.state() == LegState.OVER ? Tone.OVER
				: found.state() == LegState.NEAR ? Tone.NEAR : null;
		boolean roomy = scale.pixels(bar.end() - bar.start()) >= ROOMY || badge != null
				|| crowded.containsKey(bar.leg());
		if (!(roomy && put(bar.leg(), lines, places, badge)) && found != null) {
			put(bar.leg(), brief(found, lines), places, badge);
		}
	}

	/** Beyond either end along the axis, past whatever the bar ends in: for a leg enclosed by others. */
	private void ends(Bar bar, List<LabelLayout.Place> places) {
		for (double distance : new double[] { 20, 44, 74 }) {
			for (int end : new int[] { -1, 1 }) {
				double[] at = scale.pixels(end > 0 ? bar.at(bar.length(), 0) : bar.at(0, 0));
				double dx = end * bar.ux();
				double dy = end * bar.uy();
				double wall = scale.pixels(end > 0 ? bar.length() - bar.end() : bar.start());
				double x = at[0] + dx * (wall + distance);
				double y = at[1] + dy * (wall + distance);
				double[] leader = { at[0] + dx * (wall + 3), at[1] + dy * (wall + 3), x - dx * 2, y - dy * 2 };
				places.add(new LabelLayout.Place(x, y, dx, dy, leader));
			}
		}
	}

	private List<LabelLine> lines(Leg leg, LegResult found) {
		LabelLine name = new LabelLine(FeatureText.name(leg), TITLE, false, Tone.INK);
		if (found == null) {
			return List.of(name);
		}
		boolean loud = found.state() == LegState.NEAR || found.state() == LegState.OVER;
		Tone tone = found.state() == LegState.OVER ? Tone.OVER : found.state() == LegState.NEAR ? Tone.NEAR : Tone.INK;
		boolean swings = found.peakFluxDensity() > Math.abs(found.fluxDensity()) * LEAST_SWING;
		LabelLine density = new LabelLine(FigureFormat.fluxDensity(found.peakFluxDensity()) + (swings ? " peak" : ""),
				TITLE, true, tone);
		if (found.state() == LegState.UNKNOWN) {
			return List.of(name, density, new LabelLine("saturation unknown", SMALL, false, Tone.NOTE));
		}
		String used = FigureFormat.percent(found.utilisation()) + " of " + FigureFormat.fluxDensity(found.saturation());
		return List.of(name, density, new LabelLine(used, SMALL, false, loud ? tone : Tone.NOTE));
	}

	/** The share of saturation alone, for a leg without room for more. */
	private static List<LabelLine> brief(LegResult found, List<LabelLine> lines) {
		LabelLine last = lines.get(Math.min(2, lines.size() - 1));
		return Double.isNaN(found.utilisation()) ? List.of(last)
				: List.of(new LabelLine(FigureFormat.percent(found.utilisation()), SMALL, last.tone() != Tone.NOTE,
						last.tone()));
	}

	private boolean put(EObject element, List<LabelLine> lines, List<LabelLayout.Place> places, Tone badge) {
		double width = badge == null ? 0 : LabelLook.BADGE;
		double text = lines.stream().mapToDouble(l -> measure.textWidth(l.text(), l.size(), l.bold())).max().orElse(0);
		double height = Math.max(LabelLook.height(lines), badge == null ? 0 : 22);
		LabelLayout.Placed placed = layout.place(places, width + text + 2, height);
		if (placed == null) {
			return false;
		}
		picture.label(element, new LabelLook(lines, placed.box(), placed.align(), placed.place().leader(), badge));
		return true;
	}

	/** A line for each winding above everything, the temperature with the first. */
	private void headings() {
		double[] all = picture.bounds();
		List<LabelLine> lines = new ArrayList<>();
		for (Winding winding : design.getWindings()) {
			lines.add(new LabelLine(heading(winding), TITLE, false, Tone.INK));
		}
		if (point != null && point.getTemperature() != null) {
			lines.add(new LabelLine("core at " + point.getTemperature(), SMALL, false, Tone.NOTE));
		}
		if (!lines.isEmpty()) {
			double height = LabelLook.height(lines);
			double width = lines.stream().mapToDouble(l -> measure.textWidth(l.text(), l.size(), l.bold())).max().orElse(0);
			picture.heading(new LabelLook(lines, new double[] { all[0], all[1] - height - 14, width, height },
					Align.START, new double[0], null));
		}
	}

	private String heading(Winding winding) {
		int turns = winding.getCoils().stream().mapToInt(Coil::getTurns).sum();
		StringBuilder text = new StringBuilder(FeatureText.name(winding)).append(": ").append(turns).append(" turns");
		if (point != null) {
			for (Drive drive : point.getDrives()) {
				if (drive.getWinding() == winding) {
					text.append(", ").append(driven(drive));
				}
			}
		}
		WindingResult found = result == null ? null : result.winding(winding.getId());
		if (found != null) {
			text.append(" · L ").append(FigureFormat.si(result.inductance().of(winding.getId()), "H"));
			text.append(found.current() == 0 ? "" : " at bias");
		}
		return text.toString();
	}

	private static String driven(Drive drive) {
		if (drive instanceof CurrentDrive current) {
			boolean ripple = current.getRipple() != null && current.getRipple().si() != 0;
			return current.getCurrent() + (ripple ? " with " + current.getRipple() + " ripple" : "");
		}
		VoltageDrive voltage = (VoltageDrive) drive;
		return voltage.getVoltage() + " for " + voltage.getOnTime();
	}
}
