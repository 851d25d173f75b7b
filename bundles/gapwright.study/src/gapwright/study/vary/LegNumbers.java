package gapwright.study.vary;

import java.util.ArrayList;
import java.util.List;
import java.util.function.ToIntFunction;

import gapwright.model.Leg;
import gapwright.model.LegGeometry;
import gapwright.model.Magnet;
import gapwright.model.SectionShape;
import gapwright.physics.gap.GapGeometry;
import gapwright.physics.gap.ReluctanceSlopes;
import gapwright.physics.gap.Section;
import gapwright.physics.material.BhCurve;
import gapwright.study.StudyInput;

/** The numbers a leg is drawn with, SI, open to change; what the network needs of it follows. */
final class LegNumbers {

	final SectionShape shape;
	double width;
	double depth;
	double diameter;
	double area;
	double stackingFactor;
	/** NaN where the path follows from the joints' distance. */
	double pathLength;
	/** Added to a path that follows from the drawing. */
	double pathChange;
	final double jointDistance;
	final List<GapNumbers> gaps = new ArrayList<>();
	double magnetLength;
	double remanence;
	double recoilPermeability;
	final double magnetSense;

	/** @param bars index of the leg with that id in the network */
	LegNumbers(Leg leg, List<StudyInput.GapData> data, ToIntFunction<String> bars) {
		shape = leg.getShape();
		width = LegGeometry.si(leg.getWidth());
		depth = LegGeometry.si(leg.getDepth());
		diameter = LegGeometry.si(leg.getDiameter());
		area = LegGeometry.si(leg.getArea());
		stackingFactor = leg.getStackingFactor();
		pathLength = LegGeometry.si(leg.getPathLength());
		jointDistance = LegGeometry.jointDistance(leg);
		for (StudyInput.GapData gap : data) {
			gaps.add(new GapNumbers(gap, bars));
		}
		Magnet magnet = leg.getMagnet();
		magnetLength = magnet == null ? 0 : LegGeometry.si(magnet.getLength());
		remanence = magnet == null ? 0 : LegGeometry.si(magnet.getRemanence());
		recoilPermeability = magnet == null ? 1 : magnet.getRecoilPermeability();
		magnetSense = magnet != null && magnet.isReversed() ? -1 : 1;
	}

	private LegNumbers(LegNumbers other) {
		shape = other.shape;
		width = other.width;
		depth = other.depth;
		diameter = other.diameter;
		area = other.area;
		stackingFactor = other.stackingFactor;
		pathLength = other.pathLength;
		pathChange = other.pathChange;
		jointDistance = other.jointDistance;
		other.gaps.forEach(gap -> gaps.add(gap.copy()));
		magnetLength = other.magnetLength;
		remanence = other.remanence;
		recoilPermeability = other.recoilPermeability;
		magnetSense = other.magnetSense;
	}

	LegNumbers copy() {
		return new LegNumbers(this);
	}

	/** m² */
	double grossArea() {
		return switch (shape) {
		case RECTANGULAR -> width * depth;
		case ROUND -> Math.PI / 4 * diameter * diameter;
		case GIVEN -> area;
		};
	}

	/** m, across the bar on the page */
	double drawnWidth() {
		return switch (shape) {
		case RECTANGULAR -> width;
		case ROUND -> diameter;
		case GIVEN -> Math.sqrt(area);
		};
	}

	/** m */
	double ironLength() {
		if (!Double.isNaN(pathLength)) {
			return pathLength;
		}
		double inserted = magnetLength;
		for (GapNumbers gap : gaps) {
			inserted += gap.length * gap.pieces;
		}
		return Math.max(0, jointDistance - inserted + pathChange);
	}

	boolean followsDrawing() {
		return Double.isNaN(pathLength);
	}

	Section section() {
		return switch (shape) {
		case RECTANGULAR -> new Section.Rectangular(width, depth);
		case ROUND -> new Section.Round(diameter);
		case GIVEN -> new Section.Rectangular(Math.sqrt(area), Math.sqrt(area));
		};
	}

	GapGeometry geometry(GapNumbers gap, List<LegNumbers> legs) {
		return new GapGeometry(section(), gap.length, gap.pieces, gap.place, gap.toFirst(legs), gap.toSecond(legs));
	}

	ReluctanceSlopes slopes(GapNumbers gap, List<LegNumbers> legs) {
		return ReluctanceSlopes.of(gap.method, geometry(gap, legs));
	}

	/** 1/H */
	double magnetReluctance() {
		return magnetLength == 0 ? 0 : magnetLength / (BhCurve.MU_0 * recoilPermeability * grossArea());
	}

	/** 1/H, of gaps and magnet */
	double reluctance(List<LegNumbers> legs) {
		double sum = magnetReluctance();
		for (GapNumbers gap : gaps) {
			sum += 1 / gap.method.permeance(geometry(gap, legs));
		}
		return sum;
	}

	/** A */
	double magnetMmf() {
		return magnetSense * remanence * magnetLength / (BhCurve.MU_0 * recoilPermeability);
	}
}
