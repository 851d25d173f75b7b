package gapwright.library.template;

import java.util.List;

import gapwright.physics.core.EffectiveParameters;
import gapwright.physics.core.PathPart;

/**
 * A core of a centre leg and two outer legs between two yokes, alike on both sides: each bar's own piece of the flux path
 * with half of every corner it meets, so that the drawn network has the standard's core constant and every bar its own
 * least area. Source: IEC 60205, E and EI cores (from memory).
 *
 * @param centre  whole centre leg
 * @param yokeTop one of the two bars of the top yoke; corners likewise of one side
 */
record ESection(PathPart centre, PathPart yokeTop, PathPart yokeBottom, PathPart outer, PathPart centreCornerTop,
		PathPart centreCornerBottom, PathPart outerCornerTop, PathPart outerCornerBottom) {

	/** @return of one half with half the centre leg, doubled */
	EffectiveParameters parameters() {
		return EffectiveParameters.of(List.of(centre.share(0.5), yokeTop, yokeBottom, outer, centreCornerTop,
				centreCornerBottom, outerCornerTop, outerCornerBottom)).doubled();
	}

	/** @return m of iron at the bar's least area that has its own C₁ and half of its corners' */
	double centreLength() {
		// both halves' corners lie side by side
		return (centre.c1() + (centreCornerTop.c1() + centreCornerBottom.c1()) / 4) * centre.minimumArea();
	}

	double outerLength() {
		return (outer.c1() + (outerCornerTop.c1() + outerCornerBottom.c1()) / 2) * outer.minimumArea();
	}

	double topYokeLength() {
		return (yokeTop.c1() + (centreCornerTop.c1() + outerCornerTop.c1()) / 2) * yokeTop.minimumArea();
	}

	double bottomYokeLength() {
		return (yokeBottom.c1() + (centreCornerBottom.c1() + outerCornerBottom.c1()) / 2) * yokeBottom.minimumArea();
	}
}
