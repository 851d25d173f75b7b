package gapwright.ui.fields;

import java.util.function.Function;

import org.eclipse.swt.widgets.Composite;

import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;

/** A field for a figure with its unit: {@code 0.5mm}, {@code 20 mil}, {@code AWG 24}. */
public final class QuantityField extends EntryText<Quantity> {

	/**
	 * @param optional whether it may be left empty, which hands on null
	 * @param taker    takes a new value; answers null, or why it cannot be taken after all
	 */
	public QuantityField(Composite parent, Dimension dimension, boolean optional, Function<Quantity, String> taker) {
		super(parent, Entries.quantity(dimension, optional), taker);
	}
}
