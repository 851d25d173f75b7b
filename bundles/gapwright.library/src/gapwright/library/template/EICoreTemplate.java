package gapwright.library.template;

import java.util.List;
import java.util.Map;

import gapwright.model.Design;
import gapwright.model.Leg;
import gapwright.model.quantity.Quantity;
import gapwright.physics.core.PathPart;

/** A stack of E and I laminations: the I closes the E with a butt joint on every leg. */
final class EICoreTemplate implements Template {

	private static final List<TemplateField> FIELDS = List.of(
			StandardFields.length("centreWidth", "Width of the centre leg", "32 mm", "Across the flux, on the page."),
			StandardFields.length("outerWidth", "Width of the outer legs", "16 mm", "Each carries half of the flux."),
			StandardFields.length("yokeHeight", "Height of the E's yoke", "16 mm", "Across the flux, on the page."),
			StandardFields.length("barHeight", "Height of the I", "16 mm", "Across the flux, on the page."),
			StandardFields.length("depth", "Stack height", "35 mm", "Into the page, laminations with their insulation."),
			new TemplateField("stacking", "Stacking factor", null, "0.96", "Iron over gross area: 0.95 to 0.97 for sheets of 0.35 to"
					+ " 0.5 mm, 0.93 to 0.96 for 0.2 to 0.3 mm (common practice)."),
			StandardFields.length("windowWidth", "Window width", "16 mm", "Clear distance between the legs."),
			StandardFields.length("windowHeight", "Window height", "48 mm", "Clear distance between E and I."),
			StandardFields.length("gap", "Butt joint", "0.03 mm", "On every leg: 10 to 50 µm each for butt joints, more for an air gap"
					+ " (common practice); 0 mm for interleaved sheets."),
			StandardFields.turns("120", "Of the winding on the centre leg."), StandardFields.current("1 A"),
			new TemplateField("ripple", "Ripple", StandardFields.RIPPLE.dimension(), "0 A", StandardFields.RIPPLE.hint()), StandardFields.TEMPERATURE);

	@Override
	public String id() {
		return "ei-stack";
	}

	@Override
	public String title() {
		return "E-I lamination stack";
	}

	@Override
	public String summary() {
		return "Laminated steel, E and I with butt joints, one winding on the centre leg.";
	}

	@Override
	public List<TemplateField> fields() {
		return FIELDS;
	}

	/** By gross area, as the network takes gaps; the stacking factor is the leg's. */
	private static ESection section(Entries entries) {
		double centre = entries.metres("centreWidth");
		double outer = entries.metres("outerWidth");
		double yoke = entries.metres("yokeHeight");
		double bar = entries.metres("barHeight");
		double depth = entries.metres("depth");
		double window = entries.metres("windowWidth");
		double height = entries.metres("windowHeight");
		return new ESection(PathPart.prism(height, centre * depth), PathPart.prism(window, bar * depth),
				PathPart.prism(window, yoke * depth), PathPart.prism(height, outer * depth), PathPart.corner(centre / 2, bar, depth),
				PathPart.corner(centre / 2, yoke, depth), PathPart.corner(outer, bar, depth), PathPart.corner(outer, yoke, depth));
	}

	@Override
	public String figures(Map<String, String> values) {
		return ShapeFigures.of(section(new Entries(FIELDS, values)).parameters()) + ", by gross areas";
	}

	@Override
	public Design build(Map<String, String> values) {
		Entries entries = new Entries(FIELDS, values);
		Quantity depth = entries.size("depth");
		double stacking = entries.share("stacking");
		EDrawing.Frame frame = new EDrawing.Frame(entries.millimetres("centreWidth"), entries.millimetres("outerWidth"),
				entries.millimetres("barHeight"), entries.millimetres("yokeHeight"), entries.millimetres("windowWidth"),
				entries.millimetres("windowHeight"));
		CoreSketch sketch = new CoreSketch("E-I lamination stack").material("non-oriented-steel");
		EDrawing drawing = new EDrawing(sketch, frame, section(entries), CoreSketch.rectangle(frame.centreWidth(), depth),
				CoreSketch.rectangle(frame.topYoke(), depth), CoreSketch.rectangle(frame.bottomYoke(), depth),
				CoreSketch.rectangle(frame.outerWidth(), depth));
		sketch.design().getLegs().forEach(leg -> leg.setStackingFactor(stacking));
		Quantity joint = entries.notNegative("gap");
		drawing.gap(drawing.centre(), joint, "Butt joint");
		for (Leg outer : drawing.outer()) {
			drawing.gap(outer, joint, "Butt joint");
		}
		OneWinding.add(sketch, drawing.centre(), entries);
		return sketch.design();
	}
}
