package gapwright.study.vary;

import java.util.List;
import java.util.function.ToIntFunction;

import gapwright.physics.gap.Fringing;
import gapwright.physics.gap.GapGeometry;
import gapwright.study.StudyInput;

/** The numbers a gap is drawn with, SI, open to change. */
final class GapNumbers {

	final String id;
	final Fringing method;
	final int pieces;
	final GapGeometry.Place place;
	double length;
	/** As if the bar that ends the window had no width, where one does. */
	private final double toFirst;
	private final double toSecond;
	final int firstBar;
	final int secondBar;

	GapNumbers(StudyInput.GapData gap, ToIntFunction<String> bars) {
		id = gap.id();
		method = gap.method();
		pieces = gap.geometry().pieces();
		place = gap.geometry().place();
		length = gap.geometry().length();
		firstBar = gap.firstBar() == null ? -1 : bars.applyAsInt(gap.firstBar());
		secondBar = gap.secondBar() == null ? -1 : bars.applyAsInt(gap.secondBar());
		toFirst = gap.geometry().toFirst();
		toSecond = gap.geometry().toSecond();
	}

	private GapNumbers(GapNumbers other, double toFirst, double toSecond) {
		id = other.id;
		method = other.method;
		pieces = other.pieces;
		place = other.place;
		length = other.length;
		firstBar = other.firstBar;
		secondBar = other.secondBar;
		this.toFirst = toFirst;
		this.toSecond = toSecond;
	}

	GapNumbers copy() {
		return new GapNumbers(this, toFirst, toSecond);
	}

	/** Turns the drawn distances into those without the bars' widths, once all legs are known. */
	GapNumbers withoutBars(List<LegNumbers> legs) {
		return new GapNumbers(this, firstBar < 0 ? toFirst : toFirst + legs.get(firstBar).drawnWidth() / 2,
				secondBar < 0 ? toSecond : toSecond + legs.get(secondBar).drawnWidth() / 2);
	}

	double toFirst(List<LegNumbers> legs) {
		return firstBar < 0 ? toFirst : toFirst - legs.get(firstBar).drawnWidth() / 2;
	}

	double toSecond(List<LegNumbers> legs) {
		return secondBar < 0 ? toSecond : toSecond - legs.get(secondBar).drawnWidth() / 2;
	}
}
