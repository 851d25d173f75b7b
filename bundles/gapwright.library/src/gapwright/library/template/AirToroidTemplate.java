package gapwright.library.template;

import java.util.List;
import java.util.Map;

import gapwright.model.Design;
import gapwright.physics.coil.Loops;

/** A ring without iron, wound all round. */
final class AirToroidTemplate implements Template {

	private static final List<TemplateField> FIELDS = List.of(
			StandardFields.length("outer", "Outer diameter", "60 mm", "Of the former."),
			StandardFields.length("inner", "Inner diameter", "30 mm", "Of the former."),
			StandardFields.length("height", "Height", "20 mm", "Into the page."),
			StandardFields.turns("120", "Spread evenly round the ring."), StandardFields.current("5 A"),
			StandardFields.RIPPLE, StandardFields.TEMPERATURE);

	@Override
	public String id() {
		return "air-toroid";
	}

	@Override
	public String title() {
		return "Air-core toroid";
	}

	@Override
	public String summary() {
		return "No iron, so nothing saturates; the field stays inside but for the one turn of the winding's progress round the ring.";
	}

	@Override
	public List<TemplateField> fields() {
		return FIELDS;
	}

	@Override
	public String figures(Map<String, String> values) {
		Entries entries = new Entries(FIELDS, values);
		Ring ring = Ring.of(entries);
		return ShapeFigures.inductance("Closed form of the rectangular ring",
				Loops.rectangularToroid(1, entries.turns("turns"), ring.inner(), ring.outer(), ring.height()));
	}

	@Override
	public Design build(Map<String, String> values) {
		Entries entries = new Entries(FIELDS, values);
		return Ring.of(entries).draw(new CoreSketch(title()).material("nonmagnetic"), entries);
	}
}
