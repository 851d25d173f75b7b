package gapwright.library.template;

import java.util.List;
import java.util.Map;

import gapwright.model.Design;

/** A ring of alloy powder, one winding all round. */
final class ToroidTemplate implements Template {

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
	public String figures(Map<String, String> values) {
		return Ring.of(new Entries(FIELDS, values)).figures();
	}

	@Override
	public Design build(Map<String, String> values) {
		Entries entries = new Entries(FIELDS, values);
		return Ring.of(entries).draw(new CoreSketch("Toroid").material("fesial-powder-60"), entries);
	}
}
