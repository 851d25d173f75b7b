package gapwright.library.template;

import java.util.List;
import java.util.Map;

import gapwright.model.quantity.Quantity;
import gapwright.model.quantity.QuantityFormatException;

/** What was typed into a template's fields, read with the fields' own words in every message. */
final class Entries {

	private static final int MOST_TURNS = 1_000_000;

	private final List<TemplateField> fields;
	private final Map<String, String> values;

	Entries(List<TemplateField> fields, Map<String, String> values) {
		this.fields = fields;
		this.values = values;
	}

	private TemplateField field(String key) {
		return fields.stream().filter(field -> field.key().equals(key)).findFirst().orElseThrow();
	}

	private String text(String key) {
		String typed = values.get(key);
		return typed == null ? field(key).standard() : typed.strip();
	}

	Quantity quantity(String key) {
		try {
			return Quantity.parse(text(key), field(key).dimension());
		} catch (QuantityFormatException e) {
			throw new IllegalArgumentException(field(key).label() + ": " + e.problem());
		}
	}

	/** @return above 0 */
	Quantity size(String key) {
		Quantity quantity = quantity(key);
		if (!(quantity.si() > 0)) {
			throw new IllegalArgumentException(field(key).label() + ": must be above 0");
		}
		return quantity;
	}

	/** @return 0 or above */
	Quantity notNegative(String key) {
		Quantity quantity = quantity(key);
		if (!(quantity.si() >= 0)) {
			throw new IllegalArgumentException(field(key).label() + ": must not be negative");
		}
		return quantity;
	}

	/** @return millimetres, above 0 */
	double millimetres(String key) {
		return size(key).si() * 1e3;
	}

	int turns(String key) {
		try {
			int turns = Integer.parseInt(text(key));
			if (turns >= 1 && turns <= MOST_TURNS) {
				return turns;
			}
		} catch (NumberFormatException e) {
			// falls through to the one message
		}
		throw new IllegalArgumentException(field(key).label() + ": must be a whole number from 1 to " + MOST_TURNS);
	}
}
