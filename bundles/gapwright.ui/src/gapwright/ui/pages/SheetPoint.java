package gapwright.ui.pages;

import java.util.Locale;

import org.eclipse.jface.dialogs.InputDialog;
import org.eclipse.jface.window.Window;
import org.eclipse.swt.widgets.Shell;

import gapwright.model.KneeCurve;
import gapwright.model.edit.MaterialEdits;
import gapwright.model.edit.history.Edit;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;
import gapwright.physics.material.KneeBh;

/** Lets a Knee curve pass through the saturation point of a data sheet, B at a field strength, with its initial permeability kept. */
final class SheetPoint {

	private static final String EXAMPLE = "0.49 T at 1200 A/m";

	private SheetPoint() {
	}

	/** @return the edit asked for; null when the dialog was cancelled */
	static Edit ask(Shell shell, KneeCurve curve) {
		InputDialog dialog = new InputDialog(shell, "Through a sheet's point",
				"Saturation point of the data sheet, for example " + EXAMPLE
						+ ".\nThe curve keeps its initial permeability and gets the saturation polarisation that leads through it.",
				"", text -> problem(curve, text));
		return dialog.open() == Window.OK ? MaterialEdits.polarisation(curve, polarisation(curve, dialog.getValue())) : null;
	}

	/** @return null when the curve can pass through the point, else why not */
	static String problem(KneeCurve curve, String text) {
		try {
			polarisation(curve, text);
			return null;
		} catch (IllegalArgumentException e) {
			return e.getMessage();
		}
	}

	/** @return saturation polarisation to four digits: the figures of a sheet have three */
	static Quantity polarisation(KneeCurve curve, String text) {
		String[] parts = text.split("\\bat\\b");
		if (parts.length != 2) {
			throw new IllegalArgumentException("a flux density at a field strength, e.g. " + EXAMPLE);
		}
		double b = Quantity.parse(parts[0], Dimension.FLUX_DENSITY).si();
		double h = Quantity.parse(parts[1], Dimension.FIELD_STRENGTH).si();
		double fitted = KneeBh.through(curve.getInitialPermeability(), h, b).saturationPolarisation();
		return Quantity.of(Double.parseDouble(String.format(Locale.ROOT, "%.3e", fitted)), "T", Dimension.FLUX_DENSITY);
	}
}
