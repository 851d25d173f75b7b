package gapwright.study;

import gapwright.model.Material;
import gapwright.model.check.Severity;
import gapwright.physics.material.BhCurve;
import gapwright.physics.material.RollOffBh;

/** Doubts about a material that only its curve's behaviour shows. */
final class MaterialFindings {

	/** Share by which a roll-off may miss the material's saturation before it is doubted (own rule). */
	private static final double MISMATCH = 0.3;
	/** K below the Curie temperature where a material is hardly one any more. */
	private static final double NEAR_CURIE = 30;
	/** K by which a curve may be used beside its temperature without a word. */
	private static final double SAME_WITHIN = 20;

	private MaterialFindings() {
	}

	/** What shows at an operating point's temperature. @return whether the material is magnetic there */
	static boolean addAt(MaterialData material, String point, double celsius, Findings findings) {
		double curie = material.curieCelsius();
		if (celsius >= curie) {
			findings.add(new Finding(Severity.ERROR, "above-curie", material.id(), point, Figures.of(celsius)
					+ " °C is above the Curie temperature of " + Figures.of(curie) + " °C: the material is not magnetic there",
					"Lower the temperature, or choose another material."));
			return false;
		}
		if (celsius > curie - NEAR_CURIE) {
			findings.add(new Finding(Severity.WARNING, "near-curie", material.id(), point, Figures.of(celsius) + " °C is within "
					+ Figures.of(NEAR_CURIE) + " K of the Curie temperature of " + Figures.of(curie)
					+ " °C, where permeability and saturation fall steeply", ""));
		}
		if (material.isOutsideCurves(celsius)) {
			note(material, point, "curves are given from " + material.curveRange() + "; the end curve is used at "
					+ Figures.of(celsius) + " °C", findings);
		}
		if (material.isOutsidePermeabilities(celsius)) {
			note(material, point, "permeability is given from " + material.permeabilityRange() + "; its end value is used at "
					+ Figures.of(celsius) + " °C", findings);
		}
		if (material.keepsPermeabilityOver(celsius) > SAME_WITHIN) {
			findings.add(new Finding(Severity.NOTE, "permeability-kept", material.id(), point, "its curve is scaled to the"
					+ " saturation at " + Figures.of(celsius) + " °C, its initial permeability is kept: none is given by temperature",
					"Give initial permeabilities by temperature."));
		}
		if (material.statesCurveTemperature() && !material.dependsOnTemperature() && Math.abs(celsius - material.curveCelsius()) > SAME_WITHIN) {
			findings.add(new Finding(Severity.NOTE, "curve-at-other-temperature", material.id(), point,
					"the curve, which holds at " + Figures.of(material.curveCelsius()) + " °C, is used at " + Figures.of(celsius)
							+ " °C unchanged",
					"Say what becomes of it on the Materials page: scale it with saturation, or give further curves."));
		}
		return true;
	}

	private static void note(MaterialData material, String point, String message, Findings findings) {
		findings.add(new Finding(Severity.NOTE, "temperature-outside-data", material.id(), point, message,
				"Add figures at this temperature."));
	}

	static void add(Material material, MaterialData data, BhCurve curve, Findings findings) {
		SaturationData saturation = data.saturation();
		if (data.scalesInVain()) {
			findings.note("curve-scaling-in-vain", Lowering.id(material),
					"the curve cannot follow the saturation: " + (saturation.isEmpty() ? "no saturation is given"
							: "a linear curve has none of its own"),
					"Give further curves at other temperatures instead.");
		}
		if (curve instanceof RollOffBh rollOff && !saturation.isEmpty()) {
			double tendsTo = rollOff.limitingPolarisation();
			double given = saturation.at(data.curveCelsius());
			if (Math.abs(tendsTo / given - 1) > MISMATCH) {
				findings.warning("rolloff-saturation-mismatch", Lowering.id(material),
						"the roll-off tends to " + Figures.of(tendsTo) + " T, the saturation given is "
								+ Figures.of(given) + " T",
						"The roll-off may have been fitted over too short a range of bias.");
			}
		}
	}
}
