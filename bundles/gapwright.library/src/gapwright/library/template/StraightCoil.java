package gapwright.library.template;

import gapwright.model.Design;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.SectionShape;

/** A straight round bar, of iron or of air, whose flux returns through the air outside: one leg closed by one air path. */
final class StraightCoil {

	private static final double LEFT = 60;
	private static final double MARGIN = 20;

	private StraightCoil() {
	}

	/**
	 * @param diameter mm
	 * @param drawn    length on the page, mm
	 * @param path     length of the leg's path, mm
	 * @param outside  permeance of the return, H
	 */
	static Design draw(CoreSketch sketch, double diameter, double drawn, double path, double outside, Entries entries) {
		Joint top = sketch.joint("top", LEFT, MARGIN);
		Joint bottom = sketch.joint("bottom", LEFT, MARGIN + drawn);
		Leg leg = sketch.leg("bar", "bar", bottom, top);
		leg.setShape(SectionShape.ROUND);
		leg.setDiameter(CoreSketch.exactMillimetres(diameter));
		leg.setPathLength(CoreSketch.exactMillimetres(path));
		sketch.airPath("outside", "air outside", top, bottom, outside);
		OneWinding.add(sketch, leg, entries);
		return sketch.design();
	}
}
