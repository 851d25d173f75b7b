package gapwright.library.template;

import java.util.List;
import java.util.Map;

import gapwright.model.Design;
import gapwright.model.SectionShape;
import gapwright.model.quantity.Quantity;
import gapwright.physics.core.EffectiveParameters;
import gapwright.physics.core.PathPart;

/**
 * A post in a round wall, whole or cut to two segments for the leads: drawn in section, each half of the wall with its
 * half of the plates. Cut walls take their angle off the plates too. Source: IEC 60205, pot cores and their relatives
 * (from memory).
 */
final class PotCoreTemplate implements Template {

	private final boolean cut;
	private final List<TemplateField> fields;

	PotCoreTemplate(boolean cut) {
		this.cut = cut;
		fields = List.of(StandardFields.length("hole", "Diameter of the hole", "0 mm", "Through the post; 0 mm for none."),
				StandardFields.length("post", "Diameter of the post", "11.3 mm", "The wound leg in the middle."),
				StandardFields.length("inner", "Inner diameter of the wall", cut ? "24 mm" : "21.4 mm", "Between wall and wall."),
				StandardFields.length("outer", "Outer diameter", cut ? "29 mm" : "25.5 mm", "Of the whole core."),
				StandardFields.length("windowHeight", "Inner height", cut ? "12 mm" : "11.1 mm", "Of both halves together."),
				StandardFields.length("plate", "Thickness of the plates", "2.5 mm", "Top and bottom."),
				new TemplateField("wall", "Share of the wall", null, cut ? "0.6" : "1",
						"Of the whole circle that the wall takes; 1 for a closed wall, less for slots and cut sides."),
				StandardFields.length("gap", "Gap", "0.5 mm", "In the post; 0 mm for none."),
				StandardFields.turns("30", "Round the post."), StandardFields.current("1.5 A"), new TemplateField("ripple", "Ripple",
						StandardFields.RIPPLE.dimension(), "0.6 A", StandardFields.RIPPLE.hint()), StandardFields.TEMPERATURE);
	}

	@Override
	public String id() {
		return cut ? "cut-pot-core" : "pot-core";
	}

	@Override
	public String title() {
		return cut ? "Pot core with cut walls" : "Pot core";
	}

	@Override
	public String summary() {
		return cut ? "Ferrite, a round post between two wall segments, open at the sides for the leads."
				: "Ferrite, the winding enclosed by the core.";
	}

	@Override
	public List<TemplateField> fields() {
		return fields;
	}

	/** Radii in m. */
	private record Radii(double hole, double post, double inner, double outer) {
	}

	private static Radii radii(Entries entries) {
		Radii r = new Radii(entries.notNegative("hole").si() / 2, entries.metres("post") / 2, entries.metres("inner") / 2,
				entries.metres("outer") / 2);
		if (!(r.hole() < r.post())) {
			throw new IllegalArgumentException("Diameter of the hole: must be below that of the post");
		}
		if (!(r.post() < r.inner())) {
			throw new IllegalArgumentException("Diameter of the post: must be below the inner diameter of the wall");
		}
		if (!(r.inner() < r.outer())) {
			throw new IllegalArgumentException("Inner diameter of the wall: must be below the outer diameter");
		}
		return r;
	}

	/** The whole of it: post, plates, wall and corners all round; one side has half of each but the post. */
	private static ESection section(Entries entries) {
		Radii r = radii(entries);
		double plate = entries.metres("plate");
		double height = entries.metres("windowHeight");
		double wall = entries.share("wall");
		PathPart post = PathPart.prism(height, Math.PI * (r.post() * r.post() - r.hole() * r.hole()));
		PathPart disc = PathPart.fan(2 * Math.PI * wall, r.post(), r.inner(), plate).share(0.5);
		PathPart ring = PathPart.prism(height, Math.PI * wall * (r.outer() * r.outer() - r.inner() * r.inner())).share(0.5);
		PathPart inside = PathPart.postCorner(r.hole(), r.post(), plate, wall).share(0.5);
		PathPart outside = PathPart.wallCorner(r.inner(), r.outer(), plate).share(0.5 * wall);
		return new ESection(post, disc, disc, ring, inside, inside, outside, outside);
	}

	@Override
	public String figures(Map<String, String> values) {
		EffectiveParameters core = section(new Entries(fields, values)).parameters();
		return ShapeFigures.of(core);
	}

	@Override
	public Design build(Map<String, String> values) {
		Entries entries = new Entries(fields, values);
		Radii r = radii(entries);
		ESection section = section(entries);
		double plate = entries.millimetres("plate");
		EDrawing.Frame frame = new EDrawing.Frame(2e3 * r.post(), 1e3 * (r.outer() - r.inner()), plate, plate,
				1e3 * (r.inner() - r.post()), entries.millimetres("windowHeight"));
		CoreSketch sketch = new CoreSketch(title()).material("mnzn-power-ferrite");
		Quantity post = entries.size("post");
		EDrawing.Shape plates = CoreSketch.given(section.yokeTop().minimumArea());
		EDrawing drawing = new EDrawing(sketch, frame, section, r.hole() > 0 ? CoreSketch.given(section.centre().minimumArea()) : leg -> {
			leg.setShape(SectionShape.ROUND);
			leg.setDiameter(post);
		}, plates, plates, CoreSketch.given(section.outer().minimumArea()));
		drawing.gap(drawing.centre(), entries.notNegative("gap"), "Gap");
		OneWinding.add(sketch, drawing.centre(), entries);
		return sketch.design();
	}
}
