package gapwright.library.template;

import java.util.List;
import java.util.Map;

import gapwright.model.Design;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.Winding;
import gapwright.model.quantity.Quantity;

/** Three legs and two yokes, the winding on the gapped centre leg. */
final class ECoreTemplate implements Template {

	private static final double MARGIN = 20;
	private static final List<TemplateField> FIELDS = List.of(
			StandardFields.length("centreWidth", "Width of the centre leg", "12 mm", "Across the flux, on the page."),
			StandardFields.length("outerWidth", "Width of the outer legs", "6 mm", "Each carries half of the flux."),
			StandardFields.length("yokeHeight", "Height of the yokes", "6 mm", "Across the flux, on the page."),
			StandardFields.length("depth", "Depth", "15 mm", "Into the page; stack height."),
			StandardFields.length("windowWidth", "Window width", "9 mm", "Clear distance between the legs."),
			StandardFields.length("windowHeight", "Window height", "32 mm", "Clear distance between the yokes."),
			StandardFields.length("gap", "Gap", "1.1 mm", "In the centre leg; 0 mm for none."),
			StandardFields.turns("18", "Of the winding on the centre leg."), StandardFields.current("12 A"),
			StandardFields.RIPPLE, StandardFields.TEMPERATURE);

	@Override
	public String id() {
		return "e-core";
	}

	@Override
	public String title() {
		return "Gapped E core";
	}

	@Override
	public String summary() {
		return "Ferrite, one winding on a gapped centre leg.";
	}

	@Override
	public List<TemplateField> fields() {
		return FIELDS;
	}

	@Override
	public Design build(Map<String, String> values) {
		Entries entries = new Entries(FIELDS, values);
		double centre = entries.millimetres("centreWidth");
		double outer = entries.millimetres("outerWidth");
		double yoke = entries.millimetres("yokeHeight");
		double window = entries.millimetres("windowWidth");
		Quantity depth = entries.size("depth");
		double left = MARGIN + outer / 2;
		double middle = left + outer / 2 + window + centre / 2;
		double right = middle + centre / 2 + window + outer / 2;
		double top = MARGIN + yoke / 2;
		double bottom = top + yoke + entries.millimetres("windowHeight");
		CoreSketch sketch = new CoreSketch("Gapped E core").material("mnzn-power-ferrite");
		Joint topLeft = sketch.joint("top-left", left, top);
		Joint topMiddle = sketch.joint("top-middle", middle, top);
		Joint topRight = sketch.joint("top-right", right, top);
		Joint bottomLeft = sketch.joint("bottom-left", left, bottom);
		Joint bottomMiddle = sketch.joint("bottom-middle", middle, bottom);
		Joint bottomRight = sketch.joint("bottom-right", right, bottom);
		Leg wound = sketch.leg("centre-leg", "centre leg", bottomMiddle, topMiddle, centre, depth);
		sketch.leg("top-yoke-left", "top yoke, left", topMiddle, topLeft, yoke, depth);
		sketch.leg("top-yoke-right", "top yoke, right", topMiddle, topRight, yoke, depth);
		sketch.leg("left-leg", "left leg", topLeft, bottomLeft, outer, depth);
		sketch.leg("right-leg", "right leg", topRight, bottomRight, outer, depth);
		sketch.leg("bottom-yoke-left", "bottom yoke, left", bottomLeft, bottomMiddle, yoke, depth);
		sketch.leg("bottom-yoke-right", "bottom yoke, right", bottomRight, bottomMiddle, yoke, depth);
		sketch.gap(wound, entries.notNegative("gap"));
		Winding main = sketch.winding("main", "main");
		sketch.coil(main, wound, entries.turns("turns"), 0.5);
		sketch.current(sketch.operatingPoint("full-load", "full load, hot", entries.quantity("temperature")), main,
				entries.quantity("current"), entries.notNegative("ripple"));
		return sketch.design();
	}
}
