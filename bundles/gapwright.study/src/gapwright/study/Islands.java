package gapwright.study;

import java.util.HashMap;
import java.util.HashSet;
import java.util.Map;
import java.util.Set;

import org.eclipse.emf.ecore.EObject;

import gapwright.model.AirPath;
import gapwright.model.Design;
import gapwright.model.Joint;
import gapwright.model.Leg;

/** Joints that hang together through legs and air paths, sound or not; an island with a broken branch is not sound. */
final class Islands {

	private final Map<Joint, Joint> parent = new HashMap<>();
	private final Set<Joint> unsound = new HashSet<>();

	Islands(Design design, Set<EObject> broken) {
		design.getJoints().forEach(joint -> parent.put(joint, joint));
		for (Leg leg : design.getLegs()) {
			join(leg.getFrom(), leg.getTo());
		}
		for (AirPath path : design.getAirPaths()) {
			join(path.getFrom(), path.getTo());
		}
		for (Leg leg : design.getLegs()) {
			if (broken.contains(leg)) {
				spoil(leg.getFrom());
				spoil(leg.getTo());
			}
		}
		for (AirPath path : design.getAirPaths()) {
			if (broken.contains(path)) {
				spoil(path.getFrom());
				spoil(path.getTo());
			}
		}
	}

	boolean isSound(Joint joint) {
		return joint != null && parent.containsKey(joint) && !unsound.contains(root(joint));
	}

	/** @return number of islands that have at least one branch */
	int count(Design design) {
		Set<Joint> roots = new HashSet<>();
		design.getLegs().forEach(leg -> roots.add(root(leg.getFrom())));
		design.getAirPaths().forEach(path -> roots.add(root(path.getFrom())));
		roots.remove(null);
		return roots.size();
	}

	private void spoil(Joint joint) {
		if (joint != null) {
			unsound.add(root(joint));
		}
	}

	private void join(Joint a, Joint b) {
		if (a != null && b != null) {
			parent.put(root(a), root(b));
		}
	}

	private Joint root(Joint joint) {
		Joint at = joint;
		while (at != null && parent.getOrDefault(at, at) != at) {
			Joint above = parent.get(at);
			parent.put(at, parent.get(above));
			at = above;
		}
		return at;
	}
}
