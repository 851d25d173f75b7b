package gapwright.ui.wizards;

import gapwright.library.template.TemplateField;
import gapwright.ui.fields.BadEntryException;
import gapwright.ui.fields.Entries;
import gapwright.ui.fields.Entry;

/** What the field of a template takes: a quantity or a whole number, handed on as it was typed. */
final class TemplateEntry implements Entry<String> {

	private final TemplateField field;
	private final Entry<?> kind;

	TemplateEntry(TemplateField field) {
		this.field = field;
		kind = field.dimension() == null ? Entries.whole(false) : Entries.quantity(field.dimension(), false);
	}

	@Override
	public String parse(String typed) throws BadEntryException {
		kind.parse(typed);
		return typed.strip();
	}

	@Override
	public String text(String value) {
		return value == null ? "" : value;
	}

	@Override
	public String example() {
		return field.standard();
	}
}
