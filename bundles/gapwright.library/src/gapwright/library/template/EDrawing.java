package gapwright.library.template;

import gapwright.model.Design;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.LegGeometry;
import gapwright.model.quantity.Quantity;

/** Draws a core of three legs and two yokes to scale, each bar with the path length that its section says. */
final class EDrawing {

	private static final double MARGIN = 20;

	/** What a bar's section is. */
	interface Shape {
		/** Sets shape and dimensions. */
		void apply(Leg leg);
	}

	/** Widths and clearances as drawn, mm. */
	record Frame(double centreWidth, double outerWidth, double topYoke, double bottomYoke, double windowWidth,
			double windowHeight) {
	}

	private final CoreSketch sketch;
	private final Leg[] legs = new Leg[7];

	EDrawing(CoreSketch sketch, Frame frame, ESection section, Shape centre, Shape top, Shape bottom, Shape outer) {
		this.sketch = sketch;
		double left = MARGIN + frame.outerWidth() / 2;
		double middle = left + frame.outerWidth() / 2 + frame.windowWidth() + frame.centreWidth() / 2;
		double right = middle + frame.centreWidth() / 2 + frame.windowWidth() + frame.outerWidth() / 2;
		double high = MARGIN + frame.topYoke() / 2;
		double low = high + frame.topYoke() / 2 + frame.windowHeight() + frame.bottomYoke() / 2;
		Joint topLeft = sketch.joint("top-left", left, high);
		Joint topMiddle = sketch.joint("top-middle", middle, high);
		Joint topRight = sketch.joint("top-right", right, high);
		Joint bottomLeft = sketch.joint("bottom-left", left, low);
		Joint bottomMiddle = sketch.joint("bottom-middle", middle, low);
		Joint bottomRight = sketch.joint("bottom-right", right, low);
		add(0, "centre-leg", "centre leg", bottomMiddle, topMiddle, centre, section.centreLength());
		add(1, "top-yoke-left", "top yoke, left", topMiddle, topLeft, top, section.topYokeLength());
		add(2, "top-yoke-right", "top yoke, right", topMiddle, topRight, top, section.topYokeLength());
		add(3, "left-leg", "left leg", topLeft, bottomLeft, outer, section.outerLength());
		add(4, "right-leg", "right leg", topRight, bottomRight, outer, section.outerLength());
		add(5, "bottom-yoke-left", "bottom yoke, left", bottomLeft, bottomMiddle, bottom, section.bottomYokeLength());
		add(6, "bottom-yoke-right", "bottom yoke, right", bottomRight, bottomMiddle, bottom, section.bottomYokeLength());
	}

	private void add(int index, String id, String name, Joint from, Joint to, Shape shape, double length) {
		legs[index] = sketch.leg(id, name, from, to);
		shape.apply(legs[index]);
		legs[index].setPathLength(CoreSketch.exactMillimetres(length * 1e3));
	}

	Leg centre() {
		return legs[0];
	}

	/** Outer legs, left and right. */
	Leg[] outer() {
		return new Leg[] { legs[3], legs[4] };
	}

	/** Puts a gap into a leg, whose iron gets shorter by it. @throws IllegalArgumentException when it is longer than the leg's iron */
	EDrawing gap(Leg leg, Quantity length, String field) {
		if (length.si() > 0) {
			double iron = LegGeometry.ironLength(leg) - length.si();
			if (!(iron > 0)) {
				throw new IllegalArgumentException(field + ": must be shorter than the leg");
			}
			leg.setPathLength(CoreSketch.exactMillimetres(iron * 1e3));
			sketch.gap(leg, length);
		}
		return this;
	}

	Design design() {
		return sketch.design();
	}
}
