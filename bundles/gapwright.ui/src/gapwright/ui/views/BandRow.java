package gapwright.ui.views;

import org.eclipse.emf.ecore.EObject;

import gapwright.model.Design;
import gapwright.model.Ids;
import gapwright.study.tolerance.Band;
import gapwright.ui.fields.FeatureText;
import gapwright.ui.fields.FigureFormat;

/** A figure with its bands. Two rows are equal when they are about the same figure. */
record BandRow(EObject element, Band band) {

	static BandRow of(Design design, Band band) {
		return new BandRow(Ids.find(design, band.subject()), band);
	}

	boolean isInductance() {
		return band.kind() == Band.Kind.INDUCTANCE;
	}

	String name() {
		return (isInductance() ? "L of " : "use of ") + (element == null ? band.subject() : FeatureText.name(element));
	}

	String shown(double value) {
		return isInductance() ? FigureFormat.si(value, "H") : FigureFormat.percent(value);
	}

	double quantile(double p) {
		return band.samples() == null ? Double.NaN : band.samples().quantile(p);
	}

	/** Of a leg to be at or above saturation. */
	double overProbability() {
		return isInductance() || band.samples() == null ? Double.NaN : band.samples().probabilityFrom(1);
	}

	String overShown() {
		double p = overProbability();
		if (Double.isNaN(p)) {
			return FigureFormat.NONE;
		}
		return FigureFormat.percent(p) + " ± " + FigureFormat.percent(band.samples().probabilityError(1));
	}

	@Override
	public boolean equals(Object other) {
		return other instanceof BandRow row && row.element == element && row.band.kind() == band.kind();
	}

	@Override
	public int hashCode() {
		return 31 * System.identityHashCode(element) + band.kind().hashCode();
	}
}
