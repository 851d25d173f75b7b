package gapwright.study.vary;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

import gapwright.model.Leg;
import gapwright.physics.material.BhCurve;
import gapwright.physics.network.Network;
import gapwright.physics.network.NetworkValues;
import gapwright.study.MaterialData;
import gapwright.study.StudyInput;

/**
 * All numbers of a design that may be changed one by one, and the network that follows from them: what sensitivities and
 * tolerances work on. Copies share nothing that changes.
 */
public final class DesignNumbers {

	final List<LegNumbers> legs = new ArrayList<>();
	final double[] permeance;
	final double[] coilTurns;
	/** By material, in the order of {@link #materials}. */
	final double[] permeabilityFactor;
	final double[] saturationFactor;
	/** A, added to each winding's current at every operating point. */
	final double[] currentChange;
	/** Distinct, in the order of their first leg. */
	final List<MaterialData> materials;
	final int[] materialOf;

	/**
	 * @param drawn the legs of the network, in its order
	 * @param gaps  of all legs
	 */
	public DesignNumbers(Network network, List<Leg> drawn, List<StudyInput.LegData> legData, List<StudyInput.GapData> gaps) {
		Map<String, Integer> index = new HashMap<>();
		for (int k = 0; k < legData.size(); k++) {
			index.put(legData.get(k).id(), k);
		}
		materials = legData.stream().map(StudyInput.LegData::material).distinct().toList();
		materialOf = legData.stream().mapToInt(leg -> materials.indexOf(leg.material())).toArray();
		Map<Integer, List<StudyInput.GapData>> byLeg = new HashMap<>();
		gaps.forEach(gap -> byLeg.computeIfAbsent(gap.legIndex(), key -> new ArrayList<>()).add(gap));
		for (int k = 0; k < drawn.size(); k++) {
			legs.add(new LegNumbers(drawn.get(k), byLeg.getOrDefault(k, List.of()), id -> index.getOrDefault(id, -1)));
		}
		legs.forEach(leg -> leg.gaps.replaceAll(gap -> gap.withoutBars(legs)));
		NetworkValues values = network.values();
		permeance = values.permeance;
		coilTurns = values.coilTurns;
		permeabilityFactor = ones(materials.size());
		saturationFactor = ones(materials.size());
		currentChange = new double[network.windingCount()];
	}

	private DesignNumbers(DesignNumbers other) {
		other.legs.forEach(leg -> legs.add(leg.copy()));
		permeance = other.permeance.clone();
		coilTurns = other.coilTurns.clone();
		permeabilityFactor = other.permeabilityFactor.clone();
		saturationFactor = other.saturationFactor.clone();
		currentChange = other.currentChange.clone();
		materials = other.materials;
		materialOf = other.materialOf;
	}

	private static double[] ones(int length) {
		double[] ones = new double[length];
		Arrays.fill(ones, 1);
		return ones;
	}

	public DesignNumbers copy() {
		return new DesignNumbers(this);
	}

	/**
	 * @param like    a network of the design at that temperature; gives the structure
	 * @param celsius of the core
	 * @throws IllegalArgumentException when a number has left its domain
	 */
	public Network network(Network like, double celsius) {
		NetworkValues values = like.values();
		BhCurve[] changed = new BhCurve[materials.size()];
		for (int k = 0; k < legs.size(); k++) {
			LegNumbers leg = legs.get(k);
			int m = materialOf[k];
			if (permeabilityFactor[m] != 1 || saturationFactor[m] != 1 && materials.get(m).scales()) {
				if (changed[m] == null) {
					changed[m] = materials.get(m).curve(celsius, permeabilityFactor[m], saturationFactor[m]);
				}
				values.curve[k] = changed[m];
			}
			values.pathLength[k] = leg.ironLength();
			values.ironArea[k] = leg.grossArea() * leg.stackingFactor;
			values.seriesReluctance[k] = leg.reluctance(legs);
			values.magnetMmf[k] = leg.magnetMmf();
		}
		System.arraycopy(permeance, 0, values.permeance, 0, permeance.length);
		System.arraycopy(coilTurns, 0, values.coilTurns, 0, coilTurns.length);
		return like.with(values);
	}

	/** @return saturation of a leg's material with its factor, T; NaN when none is known */
	public double saturation(int leg, double celsius) {
		int m = materialOf[leg];
		return materials.get(m).saturation().at(celsius) * saturationFactor[m];
	}

	/** @return A, added to the winding's current */
	public double currentChange(int winding) {
		return currentChange[winding];
	}
}
