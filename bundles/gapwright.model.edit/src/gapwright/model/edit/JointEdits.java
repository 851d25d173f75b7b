package gapwright.model.edit;

import java.util.Collection;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Consumer;

import org.eclipse.emf.ecore.EObject;

import gapwright.model.AirPath;
import gapwright.model.Design;
import gapwright.model.Ids;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.edit.history.Edit;
import gapwright.model.quantity.Quantity;

/** Edits of joints; legs follow their joints. Places in millimetres on the page. */
public final class JointEdits {

	private JointEdits() {
	}

	/** @param made is told of the joint once it is there */
	public static Edit add(Design design, double x, double y, Consumer<Joint> made) {
		return new Edit("Add joint", design, () -> made.accept(JointSpot.at(x, y).in(design, Ids.used(design))));
	}

	/** @return joints that move when these elements are moved: the joints among them and the ends of legs and air paths */
	public static Set<Joint> movedBy(Collection<? extends EObject> elements) {
		Set<Joint> joints = new LinkedHashSet<>();
		for (EObject element : elements) {
			if (element instanceof Joint joint) {
				joints.add(joint);
			} else if (element instanceof Leg leg) {
				joints.add(leg.getFrom());
				joints.add(leg.getTo());
			} else if (element instanceof AirPath path) {
				joints.add(path.getFrom());
				joints.add(path.getTo());
			}
		}
		joints.remove(null);
		return joints;
	}

	/**
	 * Moves joints; a coordinate that does not change keeps the unit it was typed in, one that is missing counts as 0.
	 *
	 * @param joints at least one
	 */
	public static Edit move(Collection<Joint> joints, double dx, double dy) {
		List<Joint> moved = List.copyOf(joints);
		return new Edit(moved.size() == 1 ? "Move joint" : "Move joints", moved, () -> {
			for (Joint joint : moved) {
				joint.setX(moved(joint.getX(), dx));
				joint.setY(moved(joint.getY(), dy));
			}
		});
	}

	/**
	 * Puts joints on one line.
	 *
	 * @param joints   at least one
	 * @param vertical true for one x, false for one y; that of the last joint
	 */
	public static Edit align(List<Joint> joints, boolean vertical) {
		Joint last = joints.get(joints.size() - 1);
		return new Edit(vertical ? "Align joints vertically" : "Align joints horizontally", joints, () -> {
			for (Joint joint : joints) {
				if (vertical) {
					joint.setX(last.getX());
				} else {
					joint.setY(last.getY());
				}
			}
		});
	}

	private static Quantity moved(Quantity place, double millimetres) {
		if (place == null) {
			return JointSpot.millimetres(millimetres);
		}
		return millimetres == 0 ? place : JointSpot.millimetres(place.si() * 1e3 + millimetres);
	}
}
