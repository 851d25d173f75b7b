package gapwright.ui.pages;

import gapwright.model.ArctanCurve;
import gapwright.model.Curve;
import gapwright.model.KneeCurve;
import gapwright.model.Material;
import gapwright.model.Saturation;
import gapwright.model.TableCurve;

/** How far the picture of a material's curve reaches. */
final class PlotRange {

	/** Where nothing in the material says better: above most soft ferrites and powders, below iron. */
	private static final double USUAL = 0.5;

	private PlotRange() {
	}

	/** T; a little above whatever the material calls saturation. */
	static double fluxDensity(Material material) {
		double highest = 0;
		for (Saturation saturation : material.getSaturations()) {
			if (saturation.getFluxDensity() != null) {
				highest = Math.max(highest, saturation.getFluxDensity().si());
			}
		}
		double known = highest > 0 ? highest : ofCurve(material.getCurve());
		return known > 0 && Double.isFinite(known) ? known : USUAL;
	}

	private static double ofCurve(Curve curve) {
		if (curve instanceof KneeCurve knee && knee.getSaturationPolarisation() != null) {
			return 0.9 * knee.getSaturationPolarisation().si();
		}
		if (curve instanceof ArctanCurve arctan && arctan.getSaturationPolarisation() != null) {
			return 0.9 * arctan.getSaturationPolarisation().si();
		}
		if (curve instanceof TableCurve table && !table.getPoints().isEmpty()) {
			var last = table.getPoints().get(table.getPoints().size() - 1).getFluxDensity();
			return last == null ? 0 : last.si();
		}
		return 0;
	}

	/** The next of 1, 1.2, 1.5, 2, 2.5, 3, 4, 5, 6, 8 times a power of ten: an axis ends on a figure that can be read. */
	static double round(double value) {
		double power = Math.pow(10, Math.floor(Math.log10(value)));
		for (double step : new double[] { 1, 1.2, 1.5, 2, 2.5, 3, 4, 5, 6, 8 }) {
			if (value <= step * power * (1 + 1e-9)) {
				return step * power;
			}
		}
		return 10 * power;
	}
}
