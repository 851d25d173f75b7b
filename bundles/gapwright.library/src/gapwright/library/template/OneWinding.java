package gapwright.library.template;

import gapwright.model.Leg;
import gapwright.model.Winding;

/** The one winding of most cores, with the operating point it is judged at. */
final class OneWinding {

	private OneWinding() {
	}

	static void add(CoreSketch sketch, Leg wound, Entries entries) {
		Winding main = sketch.winding("main", "main");
		sketch.coil(main, wound, entries.turns("turns"), 0.5);
		judge(sketch, main, entries);
	}

	static void judge(CoreSketch sketch, Winding main, Entries entries) {
		sketch.current(sketch.operatingPoint("full-load", "full load, hot", entries.quantity("temperature")), main,
				entries.quantity("current"), entries.notNegative("ripple"));
	}
}
