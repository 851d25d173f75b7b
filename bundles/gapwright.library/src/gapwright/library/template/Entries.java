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

	/** @return metres, above 0 */
	double metres(String key) {
		return size(key).si();
	}

	/** @return a ratio above 0, at most 1 */
	double share(String key) {
		try {
			double value = Double.parseDouble(text(key));
			if (value > 0 && value <= 1) {
				return value;
			}
		} catch (NumberFormatException e) {
			// falls through to the one message
		}
		throw new IllegalArgumentException(field(key).label() + ": must be above 0, at most 1");
	}

	/** @return the sum of two lengths that are 0 or above; the first as typed where the other is 0 */
	Quantity sum(String first, String second) {
		Quantity a = notNegative(first);
		Quantity b = notNegative(second);
		return b.si() == 0 ? a : a.si() == 0 ? b : CoreSketch.exactMillimetres((a.si() + b.si()) * 1e3);
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
