package gapwright.study;

import java.util.ArrayList;
import java.util.List;

import gapwright.model.Gap;
import gapwright.model.Leg;
import gapwright.model.LegGeometry;
import gapwright.model.SectionShape;
import gapwright.physics.gap.Fringing;
import gapwright.physics.gap.Section;

/** Permeances of a leg's gaps, with a finding wherever a method is used outside its validity. */
final class GapLowering {

	private final Findings findings;

	GapLowering(Findings findings) {
		this.findings = findings;
	}

	/** Reports what is wrong with the leg's gaps. @return whether every gap has a number */
	boolean read(Leg leg) {
		boolean all = true;
		for (Gap gap : leg.getGaps()) {
			all &= read(leg, gap);
		}
		return all;
	}

	private boolean read(Leg leg, Gap gap) {
		Fringing method = method(gap);
		if (method == null) {
			findings.error("gap-method-unavailable", Lowering.id(gap),
					"the method " + gap.getFringing() + " is not available in this version",
					"Choose WIDENED, or NONE for a lower bound of the inductance.");
			return false;
		}
		Section section = section(leg);
		if (section == null || !isSlot(gap)) {
			return true;
		}
		double length = gap.getLength().si();
		String ratio = "a gap of " + gap.getLength() + " across a least side of "
				+ Figures.millimetres(section.leastSide());
		switch (method.validity(section, length)) {
		case REFUSED -> {
			findings.error("gap-method-refused", Lowering.id(gap), ratio + " is outside what " + method + " can give",
					"Split the gap in pieces.");
			return false;
		}
		case DOUBTFUL -> findings.warning("gap-method-outside-validity", Lowering.id(gap),
				ratio + " is outside the range of " + method + ", which reads the inductance low there",
				method == Fringing.NONE ? "WIDENED comes closer." : "Split the gap in pieces.");
		case VALID -> {
			// nothing to say
		}
		}
		if (leg.getShape() == SectionShape.GIVEN && method != Fringing.NONE) {
			findings.note("gap-square-assumed", Lowering.id(gap),
					"the leg gives only an area, so its section is taken as a square of that area", "");
		}
		return true;
	}

	/** @return 1/H */
	double reluctance(Leg leg) {
		double sum = 0;
		for (Gap gap : leg.getGaps()) {
			if (isSlot(gap)) {
				sum += 1 / method(gap).permeance(section(leg), gap.getLength().si(), gap.getPieces());
			}
		}
		return sum;
	}

	List<StudyInput.GapData> data(Leg leg, int legIndex) {
		List<StudyInput.GapData> data = new ArrayList<>();
		for (Gap gap : leg.getGaps()) {
			if (isSlot(gap)) {
				Fringing method = method(gap);
				double length = gap.getLength().si();
				data.add(new StudyInput.GapData(Lowering.id(gap), Lowering.id(leg), legIndex,
						method.permeance(section(leg), length, gap.getPieces()), method.factor(section(leg), length)));
			}
		}
		return data;
	}

	private static boolean isSlot(Gap gap) {
		return LegGeometry.si(gap.getLength()) > 0;
	}

	private static Fringing method(Gap gap) {
		return switch (gap.getFringing()) {
		case NONE -> Fringing.NONE;
		case WIDENED -> Fringing.WIDENED;
		default -> null;
		};
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
