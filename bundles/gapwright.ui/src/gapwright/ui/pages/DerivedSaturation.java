package gapwright.ui.pages;

import java.util.OptionalDouble;
import java.util.function.Consumer;

import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.swt.widgets.Shell;

import gapwright.model.Material;
import gapwright.model.edit.MaterialEdits;
import gapwright.model.edit.history.Edit;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;
import gapwright.physics.material.Permeability;
import gapwright.study.MaterialData;
import gapwright.ui.fields.FigureFormat;

/** Offers the knee of a material's curve as its saturation, saying that it is derived and not the maker's. */
final class DerivedSaturation {

	private DerivedSaturation() {
	}

	static void offer(Shell shell, Material material, Consumer<Edit> runner) {
		String title = "Saturation derived from the curve";
		try {
			MaterialData data = new MaterialData(material);
			double celsius = data.curveCelsius();
			OptionalDouble knee = Permeability.knee(data.curve(celsius));
			if (knee.isEmpty()) {
				MessageDialog.openInformation(shell, title, "The permeability of this curve never falls to a fifth of its maximum: it has no knee.");
				return;
			}
			Quantity temperature = Quantity.of(celsius, "°C", Dimension.TEMPERATURE);
			Quantity fluxDensity = Quantity.of(Math.round(knee.getAsDouble() * 1000) / 1000.0, "T", Dimension.FLUX_DENSITY);
			if (MessageDialog.openConfirm(shell, title, "At " + FigureFormat.fluxDensity(knee.getAsDouble()) + " and " + temperature
					+ " the differential permeability has fallen to a fifth of its maximum. Add this as a saturation?\n\n"
					+ "It is derived from the curve. Prefer the figure of the maker's data sheet, and say in the source where it comes from.")) {
				runner.accept(MaterialEdits.addSaturation(material, temperature, fluxDensity));
			}
		} catch (IllegalArgumentException e) {
			MessageDialog.openInformation(shell, title, "The curve cannot be computed with: " + e.getMessage());
		}
	}
}
