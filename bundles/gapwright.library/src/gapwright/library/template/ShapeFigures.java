package gapwright.library.template;

import java.util.Locale;

import gapwright.physics.core.EffectiveParameters;

/** The effective parameters of a shape in words. */
final class ShapeFigures {

	private ShapeFigures() {
	}

	/** In the units of makers' tables: 1/mm, mm, mm², mm³. */
	static String of(EffectiveParameters core) {
		return String.format(Locale.ROOT, "IEC 60205: C\u2081 %.4f /mm, l\u2091 %.1f mm, A\u2091 %.1f mm², V\u2091 %.0f mm³, A min %.1f mm²",
				core.c1() * 1e-3, core.length() * 1e3, core.area() * 1e6, core.volume() * 1e9, core.minimumArea() * 1e6);
	}

	/** @param henries for example 1.2e-4 */
	static String inductance(String how, double henries) {
		return String.format(Locale.ROOT, "%s: %.4g µH", how, henries * 1e6);
	}
}
