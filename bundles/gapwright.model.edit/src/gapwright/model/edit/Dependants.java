package gapwright.model.edit;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Collection;
import java.util.Deque;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.util.EcoreUtil;

import gapwright.model.AirPath;
import gapwright.model.Coil;
import gapwright.model.ConnectedWinding;
import gapwright.model.Design;
import gapwright.model.Element;
import gapwright.model.Leg;
import gapwright.model.Material;
import gapwright.model.Tolerance;
import gapwright.model.Winding;
import gapwright.model.WindingConnection;
import gapwright.model.WindingLeakage;

/** What cannot be without an element. */
final class Dependants {

	/** What names an element and cannot be without it: legs by joint, coils by leg, drives and leakages by winding. */
	private final Map<EObject, List<EObject>> needing = new HashMap<>();
	private final Set<EObject> doomed = new LinkedHashSet<>();
	private final Deque<EObject> open = new ArrayDeque<>();

	private Dependants(Design design) {
		for (Leg leg : design.getLegs()) {
			needs(leg, leg.getFrom());
			needs(leg, leg.getTo());
		}
		for (AirPath path : design.getAirPaths()) {
			needs(path, path.getFrom());
			needs(path, path.getTo());
		}
		design.getWindings().forEach(winding -> winding.getCoils().forEach(coil -> needs(coil, coil.getLeg())));
		design.getOperatingPoints().forEach(point -> point.getDrives().forEach(drive -> needs(drive, drive.getWinding())));
		for (WindingLeakage leakage : design.getLeakages()) {
			needs(leakage, leakage.getFirst());
			needs(leakage, leakage.getSecond());
		}
		design.getConnections().forEach(connection -> connection.getMembers().forEach(member -> needs(member, member.getWinding())));
	}

	private void needs(EObject element, EObject needed) {
		if (needed != null) {
			needing.computeIfAbsent(needed, key -> new ArrayList<>()).add(element);
		}
	}

	/** The elements and all that goes with them, without what lies inside something that goes anyway. */
	static Set<EObject> of(Collection<? extends EObject> elements) {
		if (elements.isEmpty()) {
			throw new IllegalArgumentException("nothing to delete");
		}
		if (!(EcoreUtil.getRootContainer(elements.iterator().next()) instanceof Design design) || elements.contains(design)) {
			throw new IllegalArgumentException("only what is in a design can be deleted from it");
		}
		Dependants search = new Dependants(design);
		elements.forEach(search::add);
		while (!search.open.isEmpty()) {
			search.follow(search.open.pop());
		}
		design.getTolerances().stream().filter(t -> !t.getTargets().isEmpty() && search.doomedTargets(t).containsAll(t.getTargets()))
				.forEach(search.doomed::add);
		Set<EObject> outermost = new LinkedHashSet<>(search.doomed);
		outermost.removeIf(search::goesWithItsContainer);
		return outermost;
	}

	private boolean goesWithItsContainer(EObject element) {
		return inside(element.eContainer(), doomed);
	}

	private static boolean inside(EObject element, Set<EObject> doomed) {
		for (EObject around = element; around != null; around = around.eContainer()) {
			if (doomed.contains(around)) {
				return true;
			}
		}
		return false;
	}

	private List<Element> doomedTargets(Tolerance tolerance) {
		return lostTargets(tolerance, doomed);
	}

	/** @return the targets of a tolerance that go, by themselves or with what they are part of */
	static List<Element> lostTargets(Tolerance tolerance, Set<EObject> doomed) {
		return tolerance.getTargets().stream().filter(target -> inside(target, doomed)).toList();
	}

	private void add(EObject element) {
		if (doomed.add(element)) {
			open.push(element);
		}
	}

	private void follow(EObject element) {
		needing.getOrDefault(element, List.of()).forEach(this::add);
		if (element instanceof Coil coil && coil.eContainer() instanceof Winding winding
				&& doomed.containsAll(winding.getCoils())) {
			add(winding);
		}
		if (element instanceof ConnectedWinding member && member.eContainer() instanceof WindingConnection connection
				&& doomed.containsAll(connection.getMembers())) {
			add(connection);
		}
	}

	/** The tolerances that stay but lose a target. */
	static List<Tolerance> tolerancesOf(Set<EObject> doomed) {
		EObject any = doomed.iterator().next();
		return ((Design) EcoreUtil.getRootContainer(any)).getTolerances().stream()
				.filter(t -> !doomed.contains(t) && !lostTargets(t, doomed).isEmpty()).toList();
	}

	/** The legs that stay but lose their material. */
	static List<Leg> legsOf(Set<EObject> doomed) {
		return doomed.stream().filter(Material.class::isInstance)
				.flatMap(material -> ((Design) material.eContainer()).getLegs().stream()
						.filter(leg -> leg.getMaterial() == material && !doomed.contains(leg)))
				.toList();
	}
}
