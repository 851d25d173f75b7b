package gapwright.library.template;

import java.util.List;
import java.util.Map;

import gapwright.model.Design;
import gapwright.model.SectionShape;
import gapwright.model.quantity.Quantity;
import gapwright.physics.core.PathPart;

/**
 * Two E halves with a round centre leg: the yoke widens like a plate from the leg's diameter to the core's depth. The
 * outer legs count by their own area, which is given where their inner faces are curved.
 */
final class RoundLegTemplate implements Template {

	private static final List<TemplateField> FIELDS = List.of(
			StandardFields.length("diameter", "Diameter of the centre leg", "12 mm", "Round."),
			StandardFields.length("outerWidth", "Width of the outer legs", "6 mm", "Mean, on the page."),
			StandardFields.length("yokeHeight", "Height of the yokes", "6.5 mm", "Across the flux, on the page."),
			StandardFields.length("depth", "Depth", "14 mm", "Into the page, of outer legs and yokes there."),
			StandardFields.length("windowWidth", "Window width", "9 mm", "Clear distance between the legs."),
			StandardFields.length("windowHeight", "Window height", "30 mm", "Clear distance between the yokes; both halves together."),
			StandardFields.length("gap", "Gap", "1 mm", "In the centre leg; 0 mm for none."),
			StandardFields.turns("18", "Of the winding on the centre leg."), StandardFields.current("8 A"),
			StandardFields.RIPPLE, StandardFields.TEMPERATURE);

	@Override
	public String id() {
		return "round-centre-leg";
	}

	@Override
	public String title() {
		return "E core with a round centre leg";
	}

	@Override
	public String summary() {
		return "Ferrite, one winding on a round, gapped centre leg: a shorter turn for the same area.";
	}

	@Override
	public List<TemplateField> fields() {
		return FIELDS;
	}

	private static ESection section(Entries entries) {
		double diameter = entries.metres("diameter");
		double outer = entries.metres("outerWidth");
		double yoke = entries.metres("yokeHeight");
		double depth = entries.metres("depth");
		double window = entries.metres("windowWidth");
		double height = entries.metres("windowHeight");
		double half = Math.PI / 8 * diameter * diameter;
		// the half leg as a bar as deep as the leg is wide
		PathPart inner = PathPart.corner(half / diameter, yoke, half, diameter * yoke);
		PathPart side = PathPart.corner(outer, yoke, outer * depth, yoke * depth);
		PathPart plate = PathPart.taperingPlate(window, diameter, depth, yoke);
		return new ESection(PathPart.prism(height, 2 * half), plate, plate, PathPart.prism(height, outer * depth), inner, inner, side,
				side);
	}

	@Override
	public String figures(Map<String, String> values) {
		return ShapeFigures.of(section(new Entries(FIELDS, values)).parameters());
	}

	@Override
	public Design build(Map<String, String> values) {
		Entries entries = new Entries(FIELDS, values);
		Quantity depth = entries.size("depth");
		Quantity diameter = entries.size("diameter");
		double yoke = entries.millimetres("yokeHeight");
		double narrow = Math.min(entries.millimetres("diameter"), entries.millimetres("depth"));
		EDrawing.Frame frame = new EDrawing.Frame(entries.millimetres("diameter"), entries.millimetres("outerWidth"), yoke, yoke,
				entries.millimetres("windowWidth"), entries.millimetres("windowHeight"));
		CoreSketch sketch = new CoreSketch("E core with a round centre leg").material("mnzn-power-ferrite");
		EDrawing.Shape bar = CoreSketch.rectangle(yoke, CoreSketch.exactMillimetres(narrow));
		EDrawing drawing = new EDrawing(sketch, frame, section(entries), leg -> {
			leg.setShape(SectionShape.ROUND);
			leg.setDiameter(diameter);
		}, bar, bar, CoreSketch.rectangle(frame.outerWidth(), depth));
		drawing.gap(drawing.centre(), entries.notNegative("gap"), "Gap");
		OneWinding.add(sketch, drawing.centre(), entries);
		return sketch.design();
	}
}
