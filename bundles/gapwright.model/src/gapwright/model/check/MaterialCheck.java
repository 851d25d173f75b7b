package gapwright.model.check;

import static gapwright.model.GapwrightPackage.Literals.*;
import static gapwright.model.LegGeometry.si;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

import gapwright.model.CurveAtTemperature;
import gapwright.model.CurvePoint;
import gapwright.model.InitialPermeability;
import gapwright.model.LinearCurve;
import gapwright.model.Material;
import gapwright.model.Saturation;
import gapwright.model.SteinmetzLoss;
import gapwright.model.TableCurve;

/** Judges a material: its curve, its saturations, the range of its loss figures. */
final class MaterialCheck {

	/** µ₀, H/m: a table that rises slower than air has mixed-up units. */
	private static final double MU_0 = 4e-7 * Math.PI;

	/** No soft magnetic material is more permeable at its first point. */
	private static final double MOST_PERMEABLE = 1e6;
	/** °C; what a curve without a temperature holds at. */
	private static final double ROOM_TEMPERATURE = 25;
	private static final String UNITS = "Are the units right? 1 Oe is 79.58 A/m, 1 G is 0.1 mT.";

	private final Problems problems;

	MaterialCheck(Problems problems) {
		this.problems = problems;
	}

	void check(Material material) {
		if (material.getCurve() == null) {
			problems.add(ProblemCode.VALUE_MISSING, material, MATERIAL__CURVE, "the material has no B-H curve", "");
		} else if (material.getCurve() instanceof TableCurve table) {
			table(material, table);
		}
		otherCurves(material);
		permeabilities(material);
		if (material.getSaturations().isEmpty() && !isAir(material)) {
			problems.add(ProblemCode.SATURATION_MISSING, material, MATERIAL__SATURATIONS,
					"no saturation is given, so legs of this material cannot be judged",
					"Add the saturation flux density of the maker's data sheet with its temperature.");
		}
		saturations(material);
		loss(material.getLoss());
	}

	/** What is no more permeable than air does not saturate. */
	private static boolean isAir(Material material) {
		return material.getCurve() instanceof LinearCurve linear && linear.getRelativePermeability() == 1;
	}

	private void otherCurves(Material material) {
		Set<Double> temperatures = new HashSet<>();
		temperatures.add(material.getCurveTemperature() == null ? ROOM_TEMPERATURE : material.getCurveTemperature().si());
		for (CurveAtTemperature other : material.getOtherCurves()) {
			if (other.getCurve() == null) {
				problems.add(ProblemCode.VALUE_MISSING, other, CURVE_AT_TEMPERATURE__CURVE, "the B-H curve is missing", "");
			} else if (other.getCurve() instanceof TableCurve table) {
				table(material, table);
			}
			if (other.getTemperature() != null && !temperatures.add(other.getTemperature().si())) {
				problems.add(ProblemCode.CURVE_TEMPERATURE_TWICE, other, CURVE_AT_TEMPERATURE__TEMPERATURE,
						"two curves are given at " + other.getTemperature(), "Keep one of them.");
			}
		}
	}

	private void permeabilities(Material material) {
		Set<Double> temperatures = new HashSet<>();
		for (InitialPermeability permeability : material.getPermeabilities()) {
			if (permeability.getTemperature() != null && !temperatures.add(permeability.getTemperature().si())) {
				problems.add(ProblemCode.PERMEABILITY_TEMPERATURE_TWICE, permeability, INITIAL_PERMEABILITY__TEMPERATURE,
						"two initial permeabilities are given at " + permeability.getTemperature(), "Keep one of them.");
			}
		}
	}

	private void loss(SteinmetzLoss loss) {
		if (loss != null && si(loss.getMinimumFrequency()) > si(loss.getMaximumFrequency())) {
			problems.add(ProblemCode.LOSS_RANGE_EMPTY, loss, STEINMETZ_LOSS__MINIMUM_FREQUENCY, "minimumFrequency = '"
					+ loss.getMinimumFrequency() + "': above maximumFrequency = '" + loss.getMaximumFrequency() + "'",
					"Exchange them.");
		}
	}

	private void table(Material material, TableCurve table) {
		double h = 0;
		double b = 0;
		int number = 0;
		boolean any = false;
		for (CurvePoint point : table.getPoints()) {
			number++;
			double nextH = si(point.getFieldStrength());
			double nextB = si(point.getFluxDensity());
			if (number == 1 && nextH == 0 && nextB == 0) {
				continue;
			}
			if (!(nextH > h && nextB > b)) {
				problems.add(ProblemCode.TABLE_NOT_RISING, point, null, "point " + number + " (" + point.getFieldStrength()
						+ ", " + point.getFluxDensity() + ") does not rise above the one before it",
						"Both values must rise from point to point.");
				return;
			}
			if ((nextB - b) / (nextH - h) < MU_0 * (1 - 1e-9)) {
				problems.add(ProblemCode.TABLE_SLOPE_BELOW_AIR, point, null, "between point " + (number - 1) + " and "
						+ number + " the flux density rises slower than in air",
						UNITS);
			}
			if (!any && nextB / (nextH * MU_0) > MOST_PERMEABLE) {
				problems.add(ProblemCode.TABLE_SLOPE_IMPLAUSIBLE, point, null, "the first points make a relative"
						+ " permeability above 1000000", UNITS);
			}
			h = nextH;
			b = nextB;
			any = true;
		}
		if (!any) {
			problems.add(ProblemCode.TABLE_NOT_RISING, material, MATERIAL__CURVE,
					"the table has no point besides the origin", "");
		}
	}

	private void saturations(Material material) {
		List<Saturation> sorted = new ArrayList<>(material.getSaturations());
		sorted.removeIf(s -> s.getTemperature() == null || s.getFluxDensity() == null);
		sorted.sort((s, t) -> Double.compare(s.getTemperature().si(), t.getTemperature().si()));
		for (int i = 1; i < sorted.size(); i++) {
			Saturation before = sorted.get(i - 1);
			Saturation here = sorted.get(i);
			if (before.getTemperature().si() == here.getTemperature().si()) {
				problems.add(ProblemCode.SATURATION_TEMPERATURE_TWICE, here, SATURATION__TEMPERATURE,
						"two saturations are given at " + here.getTemperature(), "Keep one of them.");
			} else if (here.getFluxDensity().si() > before.getFluxDensity().si()) {
				problems.add(ProblemCode.SATURATION_RISES, here, SATURATION__FLUX_DENSITY, "saturation rises from "
						+ before.getFluxDensity() + " at " + before.getTemperature() + " to " + here.getFluxDensity()
						+ " at " + here.getTemperature() + "; magnetic materials lose saturation when hot", "");
			}
		}
	}
}
