package gapwright.library.template;

import java.util.List;
import java.util.Map;

import gapwright.model.Design;
import gapwright.model.quantity.Quantity;

/** Nothing drawn; a material, a winding to come and an operating point to start from. */
final class EmptyTemplate implements Template {

	private static final List<TemplateField> FIELDS = List.of(StandardFields.TEMPERATURE);

	@Override
	public String id() {
		return "empty";
	}

	@Override
	public String title() {
		return "Empty page";
	}

	@Override
	public String summary() {
		return "A ferrite to draw with and an operating point; the rest is yours.";
	}

	@Override
	public List<TemplateField> fields() {
		return FIELDS;
	}

	@Override
	public Design build(Map<String, String> values) {
		Quantity temperature = new Entries(FIELDS, values).quantity("temperature");
		CoreSketch sketch = new CoreSketch("New design").material("mnzn-power-ferrite");
		sketch.operatingPoint("full-load", "full load, hot", temperature);
		return sketch.design();
	}
}
