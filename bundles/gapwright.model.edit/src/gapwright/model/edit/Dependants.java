package gapwright.model.edit;

import java.util.ArrayDeque;
import java.util.Collection;
import java.util.Deque;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.util.EcoreUtil;

import gapwright.model.Coil;
import gapwright.model.Design;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.Material;
import gapwright.model.OperatingPoint;
import gapwright.model.Winding;

/** What cannot be without an element. */
final class Dependants {

	private final Design design;
	private final Set<EObject> doomed = new LinkedHashSet<>();
	private final Deque<EObject> open = new ArrayDeque<>();

	private Dependants(Design design) {
		this.design = design;
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
		Set<EObject> outermost = new LinkedHashSet<>(search.doomed);
		outermost.removeIf(search::goesWithItsContainer);
		return outermost;
	}

	private boolean goesWithItsContainer(EObject element) {
		for (EObject around = element.eContainer(); around != null; around = around.eContainer()) {
			if (doomed.contains(around)) {
				return true;
			}
		}
		return false;
	}

	private void add(EObject element) {
		if (doomed.add(element)) {
			open.push(element);
		}
	}

	private void follow(EObject element) {
		if (element instanceof Joint joint) {
			design.getLegs().stream().filter(leg -> leg.getFrom() == joint || leg.getTo() == joint).forEach(this::add);
			design.getAirPaths().stream().filter(path -> path.getFrom() == joint || path.getTo() == joint).forEach(this::add);
		} else if (element instanceof Leg leg) {
			design.getWindings().forEach(
					winding -> winding.getCoils().stream().filter(coil -> coil.getLeg() == leg).forEach(this::add));
		} else if (element instanceof Coil coil && coil.eContainer() instanceof Winding winding) {
			if (doomed.containsAll(winding.getCoils())) {
				add(winding);
			}
		} else if (element instanceof Winding winding) {
			for (OperatingPoint point : design.getOperatingPoints()) {
				point.getDrives().stream().filter(drive -> drive.getWinding() == winding).forEach(this::add);
			}
		}
	}

	/** The legs that stay but lose their material. */
	static List<Leg> legsOf(Set<EObject> doomed) {
		return doomed.stream().filter(Material.class::isInstance)
				.flatMap(material -> ((Design) material.eContainer()).getLegs().stream()
						.filter(leg -> leg.getMaterial() == material && !doomed.contains(leg)))
				.toList();
	}
}
