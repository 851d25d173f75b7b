package gapwright.library.template;

import static gapwright.physics.material.BhCurve.MU_0;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;

import gapwright.model.Design;
import gapwright.physics.coil.Solenoid;

/**
 * A straight coil without iron: the air inside is a leg of the winding's length, the air outside a path such that the
 * whole has the inductance of the formula, Nagaoka's for a single layer, Wheeler's for several.
 */
final class AirSolenoidTemplate implements Template {

	private final boolean layers;
	private final List<TemplateField> fields;

	AirSolenoidTemplate(boolean layers) {
		this.layers = layers;
		List<TemplateField> all = new ArrayList<>(List.of(
				StandardFields.length("diameter", "Mean diameter", layers ? "60 mm" : "25 mm", "Of the winding, middle of the wire to middle of the wire."),
				StandardFields.length("length", "Length", layers ? "20 mm" : "50 mm", "Of the winding, along the axis.")));
		if (layers) {
			all.add(StandardFields.length("build", "Build", "15 mm", "Of the winding, across its layers."));
		}
		all.addAll(List.of(StandardFields.turns(layers ? "400" : "50", "In all."), StandardFields.current("5 A"),
				StandardFields.RIPPLE, StandardFields.TEMPERATURE));
		fields = List.copyOf(all);
	}

	@Override
	public String id() {
		return layers ? "air-coil" : "air-solenoid";
	}

	@Override
	public String title() {
		return layers ? "Air-core coil of several layers" : "Air-core solenoid of one layer";
	}

	@Override
	public String summary() {
		return "No iron, so nothing saturates; its field reaches far outside.";
	}

	@Override
	public List<TemplateField> fields() {
		return fields;
	}

	private double perTurnSquared(Entries entries) {
		double diameter = entries.metres("diameter");
		double length = entries.metres("length");
		if (!layers) {
			return Solenoid.currentSheet(1, diameter, length);
		}
		double build = entries.metres("build");
		if (!(build < diameter)) {
			throw new IllegalArgumentException("Build: must be below the mean diameter, or the winding has no inside");
		}
		return Solenoid.wheelerMultilayer(1, diameter / 2, length, build);
	}

	@Override
	public String figures(Map<String, String> values) {
		Entries entries = new Entries(fields, values);
		double turns = entries.turns("turns");
		String line = ShapeFigures.inductance(layers ? "Wheeler's formula for several layers" : "Nagaoka's current sheet",
				turns * turns * perTurnSquared(entries));
		double diameter = entries.metres("diameter");
		if (layers && !Solenoid.isMultilayerValid(diameter / 2, entries.metres("length"), entries.metres("build"))) {
			return line + "\ncoil-outside-validity: radius, length and build differ so much that the formula may be far off";
		}
		return line;
	}

	@Override
	public Design build(Map<String, String> values) {
		Entries entries = new Entries(fields, values);
		double diameter = entries.metres("diameter");
		double length = entries.metres("length");
		double inside = length / (MU_0 * Math.PI / 4 * diameter * diameter);
		double outside = 1 / perTurnSquared(entries) - inside;
		if (!(outside > 0)) {
			throw new IllegalArgumentException("Length: so long that the formula leaves nothing of the field outside");
		}
		CoreSketch sketch = new CoreSketch(title()).material("nonmagnetic");
		return StraightCoil.draw(sketch, diameter * 1e3, length * 1e3, length * 1e3, 1 / outside, entries);
	}
}
