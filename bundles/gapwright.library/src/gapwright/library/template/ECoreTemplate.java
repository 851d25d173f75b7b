package gapwright.library.template;

import java.util.List;
import java.util.Map;

import gapwright.model.Design;
import gapwright.model.Leg;
import gapwright.model.quantity.Quantity;
import gapwright.physics.core.PathPart;

/** Two E halves: three legs and two yokes, the winding on the gapped centre leg. */
final class ECoreTemplate implements Template {

	private static final List<TemplateField> FIELDS = List.of(
			StandardFields.length("centreWidth", "Width of the centre leg", "12 mm", "Across the flux, on the page."),
			StandardFields.length("outerWidth", "Width of the outer legs", "6 mm", "Each carries half of the flux."),
			StandardFields.length("yokeHeight", "Height of the yokes", "6 mm", "Across the flux, on the page."),
			StandardFields.length("depth", "Depth", "15 mm", "Into the page; stack height."),
			StandardFields.length("windowWidth", "Window width", "9 mm", "Clear distance between the legs."),
			StandardFields.length("windowHeight", "Window height", "32 mm", "Clear distance between the yokes; both halves together."),
			StandardFields.length("gap", "Gap", "1.1 mm", "In the centre leg; 0 mm for none."),
			StandardFields.length("spacer", "Spacer", "0 mm", "Between the halves, so in all three legs; 0 mm for none."),
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

	private static ESection section(Entries entries) {
		double centre = entries.metres("centreWidth");
		double outer = entries.metres("outerWidth");
		double yoke = entries.metres("yokeHeight");
		double depth = entries.metres("depth");
		double window = entries.metres("windowWidth");
		double height = entries.metres("windowHeight");
		PathPart bar = PathPart.prism(window, yoke * depth);
		PathPart inner = PathPart.corner(centre / 2, yoke, depth);
		PathPart side = PathPart.corner(outer, yoke, depth);
		return new ESection(PathPart.prism(height, centre * depth), bar, bar, PathPart.prism(height, outer * depth), inner, inner,
				side, side);
	}

	@Override
	public String figures(Map<String, String> values) {
		return ShapeFigures.of(section(new Entries(FIELDS, values)).parameters());
	}

	@Override
	public Design build(Map<String, String> values) {
		Entries entries = new Entries(FIELDS, values);
		Quantity depth = entries.size("depth");
		double yoke = entries.millimetres("yokeHeight");
		EDrawing.Frame frame = new EDrawing.Frame(entries.millimetres("centreWidth"), entries.millimetres("outerWidth"), yoke, yoke,
				entries.millimetres("windowWidth"), entries.millimetres("windowHeight"));
		CoreSketch sketch = new CoreSketch("Gapped E core").material("mnzn-power-ferrite");
		EDrawing drawing = new EDrawing(sketch, frame, section(entries), CoreSketch.rectangle(frame.centreWidth(), depth),
				CoreSketch.rectangle(yoke, depth), CoreSketch.rectangle(yoke, depth), CoreSketch.rectangle(frame.outerWidth(), depth));
		drawing.gap(drawing.centre(), entries.sum("gap", "spacer"), "Gap");
		for (Leg outer : drawing.outer()) {
			drawing.gap(outer, entries.notNegative("spacer"), "Spacer");
		}
		OneWinding.add(sketch, drawing.centre(), entries);
		return sketch.design();
	}
}
