package gapwright.library.template;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;

import gapwright.model.Design;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.Winding;
import gapwright.model.quantity.Quantity;

/**
 * A ring of twelve straight legs on the mean circle, each with the path length of its arc, so that the whole has the
 * ring's mean path exactly; turns are spread over every second one.
 */
final class ToroidTemplate implements Template {

	private static final double MARGIN = 25;
	private static final int SEGMENTS = 12;
	private static final List<TemplateField> FIELDS = List.of(
			StandardFields.length("outer", "Outer diameter", "40 mm", "Of the bare core."),
			StandardFields.length("inner", "Inner diameter", "24 mm", "Of the bare core."),
			StandardFields.length("height", "Height", "14.5 mm", "Into the page."),
			StandardFields.turns("48", "Spread evenly round the ring."), StandardFields.current("12 A"),
			StandardFields.RIPPLE, StandardFields.TEMPERATURE);

	@Override
	public String id() {
		return "toroid";
	}

	@Override
	public String title() {
		return "Toroid";
	}

	@Override
	public String summary() {
		return "Alloy powder with its gap distributed in the material, one winding all round.";
	}

	@Override
	public List<TemplateField> fields() {
		return FIELDS;
	}

	@Override
	public Design build(Map<String, String> values) {
		Entries entries = new Entries(FIELDS, values);
		double outer = entries.millimetres("outer");
		double inner = entries.millimetres("inner");
		if (inner >= outer) {
			throw new IllegalArgumentException("Inner diameter: must be below the outer diameter");
		}
		Quantity height = entries.size("height");
		double radius = (outer + inner) / 4;
		double centre = MARGIN + outer / 2;
		CoreSketch sketch = new CoreSketch("Toroid").material("fesial-powder-60");
		List<Joint> joints = new ArrayList<>();
		for (int s = 0; s < SEGMENTS; s++) {
			// half a step turned, so that a leg lies flat on top and at the bottom
			double angle = 2 * Math.PI * (s + 0.5) / SEGMENTS;
			joints.add(sketch.joint("joint-" + (s + 1), centre + radius * Math.sin(angle),
					centre - radius * Math.cos(angle)));
		}
		Quantity arc = CoreSketch.millimetres(2 * Math.PI * radius / SEGMENTS);
		List<Leg> legs = new ArrayList<>();
		for (int s = 0; s < SEGMENTS; s++) {
			Leg leg = sketch.leg("arc-" + (s + 1), "arc " + (s + 1), joints.get(s), joints.get((s + 1) % SEGMENTS),
					(outer - inner) / 2, height);
			leg.setPathLength(arc);
			legs.add(leg);
		}
		Winding main = sketch.winding("main", "main");
		int turns = entries.turns("turns");
		int coils = Math.min(turns, SEGMENTS / 2);
		for (int c = 0; c < coils; c++) {
			// the first coils take the remainder
			sketch.coil(main, legs.get(2 * c + 1), turns / coils + (c < turns % coils ? 1 : 0), 0.5);
		}
		sketch.current(sketch.operatingPoint("full-load", "full load, hot",
				entries.quantity("temperature")), main,
				entries.quantity("current"), entries.notNegative("ripple"));
		return sketch.design();
	}
}
