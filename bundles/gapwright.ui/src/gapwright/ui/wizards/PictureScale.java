package gapwright.ui.wizards;

import gapwright.model.Design;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.LegGeometry;

/**
 * From metres on the design's page to pixels of a picture that holds all of it.
 *
 * @param left  m, leftmost edge of any bar
 * @param top   m, topmost edge of any bar
 * @param scale px per m
 * @param dx    px, to centre the picture
 * @param dy    px
 */
record PictureScale(double left, double top, double scale, double dx, double dy) {

	static PictureScale fit(Design design, int width, int height) {
		double left = Double.POSITIVE_INFINITY;
		double top = left;
		double right = Double.NEGATIVE_INFINITY;
		double bottom = right;
		for (Leg leg : design.getLegs()) {
			// room for the bar itself and for a coil beside it
			double half = 0.9 * LegGeometry.drawnWidth(leg);
			for (Joint joint : new Joint[] { leg.getFrom(), leg.getTo() }) {
				left = Math.min(left, joint.getX().si() - half);
				right = Math.max(right, joint.getX().si() + half);
				top = Math.min(top, joint.getY().si() - half);
				bottom = Math.max(bottom, joint.getY().si() + half);
			}
		}
		double scale = Math.min(width / (right - left), height / (bottom - top));
		return new PictureScale(left, top, scale, (width - scale * (right - left)) / 2, (height - scale * (bottom - top)) / 2);
	}

	float x(Joint joint) {
		return (float) (dx + (joint.getX().si() - left) * scale);
	}

	float y(Joint joint) {
		return (float) (dy + (joint.getY().si() - top) * scale);
	}

	float pixels(double metres) {
		return (float) (metres * scale);
	}
}
