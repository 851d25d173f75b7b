package gapwright.study.vary;

import java.util.ArrayList;
import java.util.List;

import gapwright.model.SectionShape;
import gapwright.physics.gap.ReluctanceSlopes;
import gapwright.physics.material.BhCurve;
import gapwright.physics.material.CurveChange;
import gapwright.physics.network.Network;
import gapwright.physics.network.Parameter;

/**
 * One number of a design that may be turned: what it is, how to set it, and its exact effect on the network's own
 * parameters. Values are SI; a material's permeability and saturation are factors on what is given, a winding's current
 * is a change in A.
 */
public final class Knob {

	/** Which number of its subject. */
	public enum Feature {
		WIDTH("width", "m"), DEPTH("depth", "m"), DIAMETER("diameter", "m"), AREA("area", "m²"),
		STACKING_FACTOR("stackingFactor", ""), PATH_LENGTH("pathLength", "m"), GAP_LENGTH("length", "m"),
		MAGNET_LENGTH("length", "m"), REMANENCE("remanence", "T"), RECOIL_PERMEABILITY("recoilPermeability", ""),
		PERMEABILITY("permeability", ""), SATURATION("saturation", "T"), CURRENT("current", "A"), TURNS("turns", ""),
		PERMEANCE("permeance", "H");

		private final String word;
		private final String unit;

		Feature(String word, String unit) {
			this.word = word;
			this.unit = unit;
		}

		/** @return as the feature is called in a file, where it is one */
		public String word() {
			return word;
		}

		/** @return SI unit, "" for a ratio */
		public String unit() {
			return unit;
		}
	}

	/** A network parameter with how fast it moves with the knob. */
	public record Effect(Parameter parameter, double rate) {
	}

	private final String subject;
	private final Feature feature;
	private final int index;
	private final int second;

	/**
	 * @param index  of the leg, material, winding, coil or air path
	 * @param second of the gap within its leg; else 0
	 */
	Knob(String subject, Feature feature, int index, int second) {
		this.subject = subject;
		this.feature = feature;
		this.index = index;
		this.second = second;
	}

	/** @return id of the element */
	public String subject() {
		return subject;
	}

	public Feature feature() {
		return feature;
	}

	/** @return index of the winding or material it belongs to, where it is of one */
	public int index() {
		return index;
	}

	/** @return present setting, in the unit of the feature; a factor for PERMEABILITY and SATURATION, a change for CURRENT */
	public double get(DesignNumbers n) {
		return switch (feature) {
		case WIDTH -> n.legs.get(index).width;
		case DEPTH -> n.legs.get(index).depth;
		case DIAMETER -> n.legs.get(index).diameter;
		case AREA -> n.legs.get(index).area;
		case STACKING_FACTOR -> n.legs.get(index).stackingFactor;
		case PATH_LENGTH -> n.legs.get(index).ironLength();
		case GAP_LENGTH -> n.legs.get(index).gaps.get(second).length;
		case MAGNET_LENGTH -> n.legs.get(index).magnetLength;
		case REMANENCE -> n.legs.get(index).remanence;
		case RECOIL_PERMEABILITY -> n.legs.get(index).recoilPermeability;
		case PERMEABILITY -> n.permeabilityFactor[index];
		case SATURATION -> n.saturationFactor[index];
		case CURRENT -> n.currentChange[index];
		case TURNS -> n.coilTurns[index];
		case PERMEANCE -> n.permeance[index];
		};
	}

	/** Sets it; a path that follows from the drawing keeps following it, with the difference added. */
	public void set(DesignNumbers n, double value) {
		switch (feature) {
		case WIDTH -> n.legs.get(index).width = value;
		case DEPTH -> n.legs.get(index).depth = value;
		case DIAMETER -> n.legs.get(index).diameter = value;
		case AREA -> n.legs.get(index).area = value;
		case STACKING_FACTOR -> n.legs.get(index).stackingFactor = value;
		case PATH_LENGTH -> path(n.legs.get(index), value);
		case GAP_LENGTH -> n.legs.get(index).gaps.get(second).length = value;
		case MAGNET_LENGTH -> n.legs.get(index).magnetLength = value;
		case REMANENCE -> n.legs.get(index).remanence = value;
		case RECOIL_PERMEABILITY -> n.legs.get(index).recoilPermeability = value;
		case PERMEABILITY -> n.permeabilityFactor[index] = value;
		case SATURATION -> n.saturationFactor[index] = value;
		case CURRENT -> n.currentChange[index] = value;
		case TURNS -> n.coilTurns[index] = value;
		case PERMEANCE -> n.permeance[index] = value;
		}
	}

	private static void path(LegNumbers leg, double value) {
		if (leg.followsDrawing()) {
			leg.pathChange += value - leg.ironLength();
		} else {
			leg.pathLength = value;
		}
	}

	/** @return effects on the network at these numbers; those of a current are its winding's, whatever drives it */
	public List<Effect> effects(DesignNumbers n, Network network) {
		List<Effect> effects = new ArrayList<>();
		switch (feature) {
		case WIDTH, DEPTH, DIAMETER, AREA -> section(effects, n);
		case STACKING_FACTOR -> effects.add(new Effect(new Parameter.IronArea(index), n.legs.get(index).grossArea()));
		case PATH_LENGTH -> effects.add(new Effect(new Parameter.PathLength(index), 1));
		case GAP_LENGTH -> {
			LegNumbers leg = n.legs.get(index);
			GapNumbers gap = leg.gaps.get(second);
			effects.add(new Effect(new Parameter.SeriesReluctance(index), leg.slopes(gap, n.legs).byLength()));
			shorten(effects, leg, gap.pieces);
		}
		case MAGNET_LENGTH, REMANENCE, RECOIL_PERMEABILITY -> magnet(effects, n.legs.get(index));
		case PERMEABILITY -> curves(effects, n, network, true);
		case SATURATION -> {
			if (n.materials.get(index).scales()) {
				curves(effects, n, network, false);
			}
		}
		case CURRENT -> effects.add(new Effect(new Parameter.Current(index), 1));
		case TURNS -> effects.add(new Effect(new Parameter.CoilTurns(index), 1));
		case PERMEANCE -> effects.add(new Effect(new Parameter.Permeance(index), 1));
		}
		return effects;
	}

	/** Iron area, gaps and magnet of the leg itself, and the windows of gaps that its bar ends. */
	private void section(List<Effect> effects, DesignNumbers n) {
		LegNumbers leg = n.legs.get(index);
		double gross = leg.grossArea();
		double areaRate = switch (feature) {
		case WIDTH -> leg.depth;
		case DEPTH -> leg.width;
		case DIAMETER -> Math.PI / 2 * leg.diameter;
		default -> 1;
		};
		effects.add(new Effect(new Parameter.IronArea(index), areaRate * leg.stackingFactor));
		double reluctance = -leg.magnetReluctance() / gross * areaRate;
		for (GapNumbers gap : leg.gaps) {
			ReluctanceSlopes slopes = leg.slopes(gap, n.legs);
			reluctance += switch (feature) {
			case DEPTH -> slopes.byB();
			case AREA -> (slopes.byA() + slopes.byB()) / (2 * Math.sqrt(leg.area));
			default -> slopes.byA();
			};
		}
		if (reluctance != 0) {
			effects.add(new Effect(new Parameter.SeriesReluctance(index), reluctance));
		}
		double widening = feature == Feature.DEPTH ? 0 : leg.shape == SectionShape.GIVEN ? 0.5 / Math.sqrt(leg.area) : 1;
		for (int k = 0; k < n.legs.size() && widening != 0; k++) {
			for (GapNumbers gap : n.legs.get(k).gaps) {
				if (gap.firstBar == index || gap.secondBar == index) {
					ReluctanceSlopes slopes = n.legs.get(k).slopes(gap, n.legs);
					double rate = (gap.firstBar == index ? slopes.byFirst() : 0) + (gap.secondBar == index ? slopes.bySecond() : 0);
					effects.add(new Effect(new Parameter.SeriesReluctance(k), -0.5 * widening * rate));
				}
			}
		}
	}

	private void shorten(List<Effect> effects, LegNumbers leg, double rate) {
		if (leg.followsDrawing() && leg.ironLength() > 0) {
			effects.add(new Effect(new Parameter.PathLength(index), -rate));
		}
	}

	private void magnet(List<Effect> effects, LegNumbers leg) {
		double perArea = 1 / (BhCurve.MU_0 * leg.recoilPermeability);
		double mmfPerLength = leg.magnetSense * leg.remanence * perArea;
		switch (feature) {
		case MAGNET_LENGTH -> {
			effects.add(new Effect(new Parameter.SeriesReluctance(index), perArea / leg.grossArea()));
			effects.add(new Effect(new Parameter.MagnetMmf(index), mmfPerLength));
			shorten(effects, leg, 1);
		}
		case REMANENCE -> effects.add(new Effect(new Parameter.MagnetMmf(index), leg.magnetSense * leg.magnetLength * perArea));
		default -> {
			effects.add(new Effect(new Parameter.SeriesReluctance(index), -leg.magnetReluctance() / leg.recoilPermeability));
			effects.add(new Effect(new Parameter.MagnetMmf(index), -leg.magnetMmf() / leg.recoilPermeability));
		}
		}
	}

	private void curves(List<Effect> effects, DesignNumbers n, Network network, boolean permeability) {
		double factor = permeability ? n.permeabilityFactor[index] : n.saturationFactor[index];
		for (int k = 0; k < n.legs.size(); k++) {
			if (n.materialOf[k] == index) {
				BhCurve curve = network.curve(k);
				effects.add(new Effect(permeability
						? new Parameter.Curve(k, CurveChange.byPermeability(curve), CurveChange.slopeByPermeability(curve))
						: new Parameter.Curve(k, CurveChange.bySaturation(curve), CurveChange.slopeBySaturation(curve)),
						1 / factor));
			}
		}
	}
}
