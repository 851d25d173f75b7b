package gapwright.study;

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
import gapwright.physics.gap.Fringing;
import gapwright.physics.gap.GapGeometry;
import gapwright.physics.gap.Judgement;
import gapwright.physics.gap.Section;

/** Permeances of the gaps, with a finding wherever a method is used outside its validity. */
final class GapLowering {

	/** Width of a pole whose ends add nothing, m. */
	private static final double ENDLESS = 1e9;

	private final Findings findings;
	private final Map<Joint, List<Leg>> byJoint;
	private final Map<Gap, GapGeometry> geometries = new HashMap<>();
	private final Map<Gap, GapWindow> windows = new HashMap<>();

	GapLowering(Design design, Findings findings) {
		this.findings = findings;
		byJoint = GapWindow.legsByJoint(design);
	}

	/** Reports what is wrong with the leg's gaps. @return whether every gap has a number */
	boolean read(Leg leg) {
		boolean all = true;
		Section section = section(leg);
		for (Gap gap : leg.getGaps()) {
			all &= section == null || !isSlot(gap) || read(leg, gap, section);
		}
		return all;
	}

	private boolean read(Leg leg, Gap gap, Section section) {
		Fringing method = method(gap);
		GapGeometry geometry = GapGeometry.plain(section, gap.getLength().si(), gap.getPieces());
		if (method.needsWindow()) {
			GapWindow window = GapWindow.of(leg, gap, byJoint);
			if (window == null) {
				findings.error("gap-window-height-missing", Lowering.id(gap), method
						+ " needs the height of the window beside the gap, which " + (leg.getShape() == SectionShape.GIVEN
								? "a leg of given area does not show"
								: "the bars at both ends of the leg leave no room for"),
						"Type the window height, or choose WIDENED.");
				return false;
			}
			windows.put(gap, window);
			geometry = new GapGeometry(section, geometry.length(), gap.getPieces(), place(gap), window.toFirst(), window.toSecond());
			if (!window.given()) {
				findings.note("gap-window-height-derived", Lowering.id(gap), "the window beside the gap is "
						+ Figures.millimetres(geometry.windowHeight()) + " high as drawn, since its height is not given", "");
			}
		}
		geometries.put(gap, geometry);
		if (!judge(gap, method, geometry)) {
			return false;
		}
		if (leg.getShape() == SectionShape.GIVEN && method != Fringing.NONE) {
			findings.note("gap-square-assumed", Lowering.id(gap),
					"the leg gives only an area, so its section is taken as a square of that area", "");
		}
		judgeYoke(leg, gap, geometry);
		if (gap.getPlace() == GapPlace.BETWEEN_POLES && method == Fringing.CONFORMAL) {
			findings.note("gap-in-open-air", Lowering.id(gap), "between poles in the open CONFORMAL reads the permeance low: "
					+ (section instanceof Section.Round ? "7 % at a gap of 3 % of the diameter, 23 % at 20 %"
							: "2 % at a gap of 3 % of the width, 16 % at 40 %"),
					"");
		}
		return true;
	}

	/**
	 * CONFORMAL has the yoke go on beyond the pole on every side. Where it is no deeper than the pole, the field of the
	 * faces out of the page is that of two poles alike, with half the distance to the mirror plane.
	 */
	private void judgeYoke(Leg leg, Gap gap, GapGeometry geometry) {
		GapWindow window = windows.get(gap);
		if (window == null || gap.getPlace() != GapPlace.AGAINST_YOKE || gap.getFringing() != gapwright.model.Fringing.CONFORMAL) {
			return;
		}
		Leg bar = window.toFirst() < window.toSecond() ? window.firstBar() : window.secondBar();
		if (bar == null || !(depth(bar) < depth(leg) + 2 * geometry.length())) {
			return;
		}
		Section faces = new Section.Rectangular(ENDLESS, depth(leg));
		double half = geometry.firstPole() + geometry.length() / 2;
		double wide = Fringing.CONFORMAL.factor(new GapGeometry(faces, geometry.length(), 1, geometry.place(), geometry.toFirst(),
				geometry.toSecond())).value();
		double flush = Fringing.CONFORMAL.factor(new GapGeometry(faces, geometry.length(), 1, GapGeometry.Place.BETWEEN_POLES, half, half)).value();
		findings.note("gap-yoke-not-wider", Lowering.id(gap), "the yoke '" + Lowering.id(bar) + "' is " + Figures.millimetres(depth(bar))
				+ " deep, the pole " + Figures.millimetres(depth(leg))
				+ ": CONFORMAL takes it as wider on every side and reads the permeance up to " + Figures.perCent(wide / flush - 1) + " high",
				"Expect less inductance by up to the gap's share of it.");
	}

	private static double depth(Leg leg) {
		return leg.getShape() == SectionShape.RECTANGULAR ? LegGeometry.si(leg.getDepth()) : LegGeometry.drawnWidth(leg);
	}

	private boolean judge(Gap gap, Fringing method, GapGeometry geometry) {
		Judgement judgement = method.judge(geometry);
		switch (judgement.validity()) {
		case REFUSED -> {
			findings.error("gap-method-refused", Lowering.id(gap), method + " cannot give a number: " + judgement.reason(),
					judgement.better());
			return false;
		}
		case DOUBTFUL -> findings.warning("gap-method-outside-validity", Lowering.id(gap),
				method + " is used outside its range: " + judgement.reason(), judgement.better());
		case VALID -> {
			// nothing to say
		}
		}
		return true;
	}

	/** @return 1/H */
	double reluctance(Leg leg) {
		double sum = 0;
		for (Gap gap : leg.getGaps()) {
			if (isSlot(gap)) {
				sum += 1 / method(gap).permeance(geometries.get(gap));
			}
		}
		return sum;
	}

	List<StudyInput.GapData> data(Leg leg, int legIndex) {
		List<StudyInput.GapData> data = new ArrayList<>();
		for (Gap gap : leg.getGaps()) {
			if (isSlot(gap)) {
				GapWindow window = windows.get(gap);
				data.add(new StudyInput.GapData(Lowering.id(gap), Lowering.id(leg), legIndex, method(gap), geometries.get(gap),
						window == null ? null : barId(window.firstBar()), window == null ? null : barId(window.secondBar())));
			}
		}
		return data;
	}

	private static String barId(Leg bar) {
		return bar == null ? null : Lowering.id(bar);
	}

	private static boolean isSlot(Gap gap) {
		return LegGeometry.si(gap.getLength()) > 0;
	}

	private static Fringing method(Gap gap) {
		return Fringing.valueOf(gap.getFringing().getName());
	}

	private static GapGeometry.Place place(Gap gap) {
		return GapGeometry.Place.valueOf(gap.getPlace().getName());
	}

	/** @return null when the leg's dimensions are not usable, which has been reported */
	private static Section section(Leg leg) {
		double area = LegGeometry.grossArea(leg);
		if (!(area > 0)) {
			return null;
		}
		return switch (leg.getShape()) {
		case RECTANGULAR -> new Section.Rectangular(leg.getWidth().si(), leg.getDepth().si());
		case ROUND -> new Section.Round(leg.getDiameter().si());
		case GIVEN -> new Section.Rectangular(Math.sqrt(area), Math.sqrt(area));
		};
	}
}
