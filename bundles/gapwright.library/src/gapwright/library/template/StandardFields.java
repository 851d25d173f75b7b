package gapwright.library.template;

import gapwright.model.quantity.Dimension;

/** Fields that several templates ask for. */
final class StandardFields {

	static final TemplateField TEMPERATURE = new TemplateField("temperature", "Core temperature", Dimension.TEMPERATURE,
			"100 °C", "The hottest the core gets; saturation is judged there.");
	static final TemplateField RIPPLE = new TemplateField("ripple", "Ripple", Dimension.CURRENT, "3 A",
			"Peak to peak, about the mean current.");

	private StandardFields() {
	}

	static TemplateField length(String key, String label, String standard, String hint) {
		return new TemplateField(key, label, Dimension.LENGTH, standard, hint);
	}

	static TemplateField current(String standard) {
		return new TemplateField("current", "Current", Dimension.CURRENT, standard, "Mean current of the winding.");
	}

	static TemplateField turns(String standard, String hint) {
		return new TemplateField("turns", "Turns", null, standard, hint);
	}
}
