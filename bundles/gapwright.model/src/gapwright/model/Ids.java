package gapwright.model;

import java.util.HashSet;
import java.util.Set;

import org.eclipse.emf.common.util.TreeIterator;
import org.eclipse.emf.ecore.EObject;

/** Ids of elements: short, readable, unique in their design. */
public final class Ids {

	private static final int LONGEST = 200;

	private Ids() {
	}

	/** @return stem with the least number from 1 that makes it unused in the design: "leg-3" */
	public static String next(Design design, String stem) {
		return next(used(design), stem);
	}

	/** As above against ids already collected; the new one is added to them. */
	public static String next(Set<String> used, String stem) {
		int number = 1;
		while (!used.add(stem + "-" + number)) {
			number++;
		}
		return stem + "-" + number;
	}

	/** @return why a text is no id, or null when it is one: the characters that have a meaning in references are out */
	public static String problem(String id) {
		if (id.isBlank()) {
			return "an id is needed, short and unique in the design";
		}
		boolean allowed = id.chars().noneMatch(c -> Character.isWhitespace(c) || Character.isSpaceChar(c)
				|| Character.isISOControl(c) || c == '#' || c == ':') && !id.startsWith("/");
		if (!allowed) {
			return "an id must not contain blanks, # or :, nor begin with /";
		}
		return id.length() > LONGEST ? "an id has at most " + LONGEST + " characters" : null;
	}

	/** @return every id in the design */
	public static Set<String> used(Design design) {
		Set<String> used = new HashSet<>();
		for (TreeIterator<EObject> all = design.eAllContents(); all.hasNext();) {
			if (all.next() instanceof Element element && element.getId() != null) {
				used.add(element.getId());
			}
		}
		return used;
	}

	/** @return the element with that id, or null */
	public static Element find(Design design, String id) {
		for (TreeIterator<EObject> all = design.eAllContents(); all.hasNext();) {
			if (all.next() instanceof Element element && id.equals(element.getId())) {
				return element;
			}
		}
		return null;
	}
}
