package gapwright.ui.fields;

import gapwright.study.provenance.FigureGroup;
import gapwright.study.provenance.Origin;
import gapwright.study.provenance.Provenance;

/**
 * One reckoned figure of an element, for people.
 *
 * @param name   for example "Flux density B"
 * @param value  with unit
 * @param origin how it was reckoned and where that holds
 * @param group  what it is; null for a judgement, which has no formula
 */
public record Figure(String name, String value, String origin, FigureGroup group) {

	/** A figure named and explained as every one of its group. */
	public Figure(FigureGroup group, String value) {
		this(group.title(), value, brief(Provenance.of(group)), group);
	}

	private static String brief(Origin origin) {
		return origin.formula() + ". " + origin.validity();
	}
}
