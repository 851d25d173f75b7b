package gapwright.study.vary;

import java.util.ArrayList;
import java.util.List;

import gapwright.model.SectionShape;
import gapwright.study.StudyInput;
import gapwright.study.vary.Knob.Feature;

/** All numbers of a design that can be turned, in the order of the design. */
public final class Knobs {

	private Knobs() {
	}

	public static List<Knob> of(StudyInput input) {
		DesignNumbers n = input.numbers();
		List<Knob> knobs = new ArrayList<>();
		for (int k = 0; k < n.legs.size(); k++) {
			leg(knobs, input.legs().get(k).id(), n.legs.get(k), k, input);
		}
		for (int p = 0; p < n.permeance.length; p++) {
			knobs.add(new Knob(input.airPaths().get(p), Feature.PERMEANCE, p, 0));
		}
		for (int m = 0; m < n.materials.size(); m++) {
			knobs.add(new Knob(n.materials.get(m).id(), Feature.PERMEABILITY, m, 0));
			if (!n.materials.get(m).saturation().isEmpty()) {
				knobs.add(new Knob(n.materials.get(m).id(), Feature.SATURATION, m, 0));
			}
		}
		for (int c = 0; c < n.coilTurns.length; c++) {
			knobs.add(new Knob(input.coils().get(c), Feature.TURNS, c, 0));
		}
		for (int w = 0; w < input.windings().size(); w++) {
			knobs.add(new Knob(input.windings().get(w).id(), Feature.CURRENT, w, 0));
		}
		return knobs;
	}

	private static void leg(List<Knob> knobs, String id, LegNumbers leg, int k, StudyInput input) {
		if (leg.shape == SectionShape.RECTANGULAR) {
			knobs.add(new Knob(id, Feature.WIDTH, k, 0));
			knobs.add(new Knob(id, Feature.DEPTH, k, 0));
		} else {
			knobs.add(new Knob(id, leg.shape == SectionShape.ROUND ? Feature.DIAMETER : Feature.AREA, k, 0));
		}
		if (leg.ironLength() > 0) {
			knobs.add(new Knob(id, Feature.PATH_LENGTH, k, 0));
			knobs.add(new Knob(id, Feature.STACKING_FACTOR, k, 0));
		}
		for (int g = 0; g < leg.gaps.size(); g++) {
			knobs.add(new Knob(leg.gaps.get(g).id, Feature.GAP_LENGTH, k, g));
		}
		if (leg.magnetLength > 0) {
			String magnet = input.legs().get(k).magnet();
			knobs.add(new Knob(magnet, Feature.MAGNET_LENGTH, k, 0));
			knobs.add(new Knob(magnet, Feature.REMANENCE, k, 0));
			knobs.add(new Knob(magnet, Feature.RECOIL_PERMEABILITY, k, 0));
		}
	}
}
