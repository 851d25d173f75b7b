package gapwright.study;

import gapwright.model.Material;
import gapwright.physics.material.BhCurve;
import gapwright.physics.material.RollOffBh;

/** Doubts about a material that only its curve's behaviour shows. */
final class MaterialFindings {

	/** Share by which a roll-off may miss the material's saturation before it is doubted (own rule). */
	private static final double MISMATCH = 0.3;
	private static final double ROOM_CELSIUS = 25;

	private MaterialFindings() {
	}

	static void add(Material material, BhCurve curve, Findings findings) {
		SaturationData saturation = new SaturationData(material);
		if (curve instanceof RollOffBh rollOff && !saturation.isEmpty()) {
			double tendsTo = rollOff.limitingPolarisation();
			double given = saturation.at(ROOM_CELSIUS);
			if (Math.abs(tendsTo / given - 1) > MISMATCH) {
				findings.warning("rolloff-saturation-mismatch", Lowering.id(material),
						"the roll-off tends to " + Figures.of(tendsTo) + " T, the saturation given is "
								+ Figures.of(given) + " T",
						"The roll-off may have been fitted over too short a range of bias.");
			}
		}
	}
}
