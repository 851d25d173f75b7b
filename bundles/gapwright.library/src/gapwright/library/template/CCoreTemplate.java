package gapwright.library.template;

import java.util.List;
import java.util.Map;

import gapwright.model.Design;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.quantity.Quantity;
import gapwright.physics.core.EffectiveParameters;
import gapwright.physics.core.PathPart;

/** Two legs and two yokes of one width; the winding on the gapped right leg. */
final class CCoreTemplate implements Template {

	private static final double MARGIN = 20;
	private static final List<TemplateField> FIELDS = List.of(
			StandardFields.length("width", "Width of the bars", "10 mm", "Across the flux, on the page."),
			StandardFields.length("depth", "Depth", "15 mm", "Into the page; stack height."),
			StandardFields.length("windowWidth", "Window width", "15 mm", "Clear distance between the legs."),
			StandardFields.length("windowHeight", "Window height", "30 mm", "Clear distance between the yokes."),
			StandardFields.length("gap", "Gap", "1 mm", "In the right leg; 0 mm for none."),
			StandardFields.turns("24", "Of the winding on the right leg."), StandardFields.current("7.5 A"),
			StandardFields.RIPPLE, StandardFields.TEMPERATURE);

	@Override
	public String id() {
		return "c-core";
	}

	@Override
	public String title() {
		return "Gapped C core";
	}

	@Override
	public String summary() {
		return "Ferrite, one winding on a gapped leg.";
	}

	@Override
	public List<TemplateField> fields() {
		return FIELDS;
	}

	private record Path(PathPart leg, PathPart yoke, PathPart corner) {

		EffectiveParameters parameters() {
			return EffectiveParameters.of(List.of(leg.times(2), yoke.times(2), corner.times(4)));
		}

		/** Half of both its corners goes to each bar, in mm of its own area. */
		double millimetres(PathPart bar) {
			return (bar.c1() + corner.c1()) * bar.minimumArea() * 1e3;
		}
	}

	private static Path path(Entries entries) {
		double width = entries.metres("width");
		double depth = entries.metres("depth");
		return new Path(PathPart.prism(entries.metres("windowHeight"), width * depth),
				PathPart.prism(entries.metres("windowWidth"), width * depth), PathPart.corner(width, width, depth));
	}

	@Override
	public String figures(Map<String, String> values) {
		return ShapeFigures.of(path(new Entries(FIELDS, values)).parameters());
	}

	@Override
	public Design build(Map<String, String> values) {
		Entries entries = new Entries(FIELDS, values);
		double width = entries.millimetres("width");
		Quantity depth = entries.size("depth");
		double left = MARGIN + width / 2;
		double right = left + width + entries.millimetres("windowWidth");
		double top = MARGIN + width / 2;
		double bottom = top + width + entries.millimetres("windowHeight");
		Path path = path(entries);
		Quantity gap = entries.notNegative("gap");
		double iron = path.millimetres(path.leg()) - gap.si() * 1e3;
		if (!(iron > 0)) {
			throw new IllegalArgumentException("Gap: must be shorter than the leg");
		}
		CoreSketch sketch = new CoreSketch("Gapped C core").material("mnzn-power-ferrite");
		Joint topLeft = sketch.joint("top-left", left, top);
		Joint topRight = sketch.joint("top-right", right, top);
		Joint bottomLeft = sketch.joint("bottom-left", left, bottom);
		Joint bottomRight = sketch.joint("bottom-right", right, bottom);
		Leg wound = sketch.leg("right-leg", "right leg", bottomRight, topRight, width, depth);
		wound.setPathLength(CoreSketch.exactMillimetres(iron));
		sketch.leg("top-yoke", "top yoke", topRight, topLeft, width, depth)
				.setPathLength(CoreSketch.exactMillimetres(path.millimetres(path.yoke())));
		sketch.leg("left-leg", "left leg", topLeft, bottomLeft, width, depth)
				.setPathLength(CoreSketch.exactMillimetres(path.millimetres(path.leg())));
		sketch.leg("bottom-yoke", "bottom yoke", bottomLeft, bottomRight, width, depth)
				.setPathLength(CoreSketch.exactMillimetres(path.millimetres(path.yoke())));
		sketch.gap(wound, gap);
		OneWinding.add(sketch, wound, entries);
		return sketch.design();
	}
}
