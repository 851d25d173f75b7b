package gapwright.model.edit;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.Set;

import gapwright.model.Design;
import gapwright.model.GapwrightFactory;
import gapwright.model.Ids;
import gapwright.model.Joint;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;

/**
 * Where a leg or air path ends: at a joint that exists, or at a place where one is to be made.
 *
 * @param joint null for a new one
 * @param x     of a new one, mm
 * @param y     of a new one, mm
 */
public record JointSpot(Joint joint, double x, double y) {

	/** @return the spot of an existing joint */
	public static JointSpot of(Joint joint) {
		return new JointSpot(joint, Double.NaN, Double.NaN);
	}

	/** @return the spot of a joint to be made, mm */
	public static JointSpot at(double x, double y) {
		return new JointSpot(null, x, y);
	}

	/** @return the joint, made and added to the design where there is none */
	Joint in(Design design, Set<String> ids) {
		if (joint != null) {
			return joint;
		}
		Joint made = GapwrightFactory.eINSTANCE.createJoint();
		made.setId(Ids.next(ids, "joint"));
		made.setX(millimetres(x));
		made.setY(millimetres(y));
		design.getJoints().add(made);
		return made;
	}

	/** @return a length rounded to a micrometre */
	static Quantity millimetres(double value) {
		double rounded = BigDecimal.valueOf(value).setScale(3, RoundingMode.HALF_EVEN).doubleValue();
		return Quantity.of(rounded, "mm", Dimension.LENGTH);
	}
}
