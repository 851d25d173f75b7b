package gapwright.library.template;

import static gapwright.physics.material.BhCurve.MU_0;

import java.util.List;
import java.util.Locale;
import java.util.Map;

import gapwright.model.Design;
import gapwright.physics.core.OpenCore;

/**
 * A ferrite rod, wound over its whole length: from the field applied H_a = H(1 − N) + N·B/µ₀ it is a leg of (1 − N)·l
 * closed by air of reluctance N·l/(µ₀A), N the demagnetising factor at the rod's middle.
 */
final class RodTemplate implements Template {

	/** Initial permeability of the ferrite drawn; only for judging whether the table of rods holds. */
	private static final double PERMEABILITY = 2300;
	private static final double ESTIMATE_BELOW = 10;
	private static final List<TemplateField> FIELDS = List.of(
			StandardFields.length("diameter", "Diameter", "8 mm", "Of the rod."),
			StandardFields.length("length", "Length", "60 mm", "Of the rod, and of the winding over it; 1 to 50 diameters."),
			StandardFields.turns("60", "Over the whole length."), StandardFields.current("2 A"),
			new TemplateField("ripple", "Ripple", StandardFields.RIPPLE.dimension(), "1 A", StandardFields.RIPPLE.hint()),
			StandardFields.TEMPERATURE);

	@Override
	public String id() {
		return "rod";
	}

	@Override
	public String title() {
		return "Rod core";
	}

	@Override
	public String summary() {
		return "A ferrite rod whose flux returns through the air: an estimate, good to about 30 %.";
	}

	@Override
	public List<TemplateField> fields() {
		return FIELDS;
	}

	private static double factor(Entries entries) {
		double ratio = entries.metres("length") / entries.metres("diameter");
		if (!(ratio >= 1 && ratio <= 50)) {
			throw new IllegalArgumentException("Length: must be 1 to 50 diameters");
		}
		return OpenCore.rodAtMiddle(ratio);
	}

	@Override
	public String figures(Map<String, String> values) {
		double factor = factor(new Entries(FIELDS, values));
		String estimate = factor * (PERMEABILITY - 1) > ESTIMATE_BELOW ? "" : "\nopen-core-estimate: the rod is so long that its"
				+ " own permeability counts too; the demagnetising factor is a guess within 20 %";
		return String.format(Locale.ROOT, "Demagnetising factor %.4g, apparent permeability %.4g; inductance is an estimate within 30 %%",
				factor, OpenCore.apparentPermeability(PERMEABILITY, factor)) + estimate;
	}

	@Override
	public Design build(Map<String, String> values) {
		Entries entries = new Entries(FIELDS, values);
		double factor = factor(entries);
		double diameter = entries.metres("diameter");
		double length = entries.metres("length");
		double area = Math.PI / 4 * diameter * diameter;
		CoreSketch sketch = new CoreSketch(title()).material("mnzn-power-ferrite");
		sketch.design().setNotes("Rod with open ends: inductance is an estimate within about 30 %, from the demagnetising factor of a"
				+ " cylinder at its middle.");
		return StraightCoil.draw(sketch, diameter * 1e3, length * 1e3, (1 - factor) * length * 1e3, MU_0 * area / (factor * length),
				entries);
	}
}
