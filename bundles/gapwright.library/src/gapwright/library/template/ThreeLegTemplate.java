package gapwright.library.template;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;

import gapwright.model.Design;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.OperatingPoint;
import gapwright.model.Winding;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;

/** Three equal laminated legs, a winding on each; judged at the crest of each phase. */
final class ThreeLegTemplate implements Template {

	private static final double MARGIN = 30;
	private static final double STACKING = 0.96;
	private static final String[] PHASES = { "a", "b", "c" };
	private static final List<TemplateField> FIELDS = List.of(
			StandardFields.length("legWidth", "Width of the legs", "40 mm", "Across the flux, on the page."),
			StandardFields.length("yokeHeight", "Height of the yokes", "40 mm", "Across the flux, on the page."),
			StandardFields.length("depth", "Depth", "60 mm", "Into the page; stack height."),
			StandardFields.length("windowWidth", "Window width", "40 mm", "Clear distance between the legs."),
			StandardFields.length("windowHeight", "Window height", "120 mm", "Clear distance between the yokes."),
			StandardFields.length("gap", "Gap", "3 mm", "In every leg; 0 mm for none."),
			StandardFields.turns("30", "Of the winding on each leg."),
			new TemplateField("current", "Crest current", Dimension.CURRENT, "90 A",
					"Crest of each phase; the others then carry half of it back."),
			StandardFields.TEMPERATURE);

	@Override
	public String id() {
		return "three-leg-core";
	}

	@Override
	public String title() {
		return "Three-leg three-phase core";
	}

	@Override
	public String summary() {
		return "Laminated steel, a winding on every leg, judged at the crest of each phase.";
	}

	@Override
	public List<TemplateField> fields() {
		return FIELDS;
	}

	@Override
	public Design build(Map<String, String> values) {
		Entries entries = new Entries(FIELDS, values);
		double width = entries.millimetres("legWidth");
		double yoke = entries.millimetres("yokeHeight");
		Quantity depth = entries.size("depth");
		double pitch = width + entries.millimetres("windowWidth");
		double top = MARGIN + yoke / 2;
		double bottom = top + yoke + entries.millimetres("windowHeight");
		CoreSketch sketch = new CoreSketch("Three-leg three-phase core").material("non-oriented-steel");
		List<Joint> tops = new ArrayList<>();
		List<Joint> bottoms = new ArrayList<>();
		List<Winding> windings = new ArrayList<>();
		for (int p = 0; p < PHASES.length; p++) {
			tops.add(sketch.joint("top-" + PHASES[p], MARGIN + width / 2 + p * pitch, top));
		}
		for (int p = 0; p < PHASES.length; p++) {
			bottoms.add(sketch.joint("bottom-" + PHASES[p], MARGIN + width / 2 + p * pitch, bottom));
		}
		for (int p = 0; p < PHASES.length; p++) {
			Leg leg = sketch.leg("leg-" + PHASES[p], "leg " + PHASES[p], bottoms.get(p), tops.get(p), width, depth);
			leg.setStackingFactor(STACKING);
			sketch.gap(leg, entries.notNegative("gap"));
			Winding winding = sketch.winding("phase-" + PHASES[p], "phase " + PHASES[p]);
			sketch.coil(winding, leg, entries.turns("turns"), 0.5);
			windings.add(winding);
		}
		for (int p = 0; p + 1 < PHASES.length; p++) {
			String between = PHASES[p] + PHASES[p + 1];
			sketch.leg("top-yoke-" + between, "top yoke " + between, tops.get(p), tops.get(p + 1), yoke, depth)
					.setStackingFactor(STACKING);
			sketch.leg("bottom-yoke-" + between, "bottom yoke " + between, bottoms.get(p + 1), bottoms.get(p), yoke,
					depth).setStackingFactor(STACKING);
		}
		Quantity crest = entries.quantity("current");
		Quantity back = Quantity.of(-crest.si() / 2, "A", Dimension.CURRENT);
		Quantity none = Quantity.parse("0 A", Dimension.CURRENT);
		for (int p = 0; p < PHASES.length; p++) {
			OperatingPoint point = sketch.operatingPoint("crest-" + PHASES[p], "crest of phase " + PHASES[p],
					entries.quantity("temperature"));
			for (int w = 0; w < PHASES.length; w++) {
				sketch.current(point, windings.get(w), w == p ? crest : back, none);
			}
		}
		return sketch.design();
	}
}
