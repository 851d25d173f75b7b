package gapwright.study;

import static gapwright.model.LegGeometry.si;

import gapwright.model.Material;
import gapwright.model.Saturation;

/** Saturation flux density against temperature: linear between the points given, the end value outside. */
public final class SaturationData {

	private final TemperatureSeries points;

	/** @param material its saturations in any order; incomplete ones are passed over */
	public SaturationData(Material material) {
		points = TemperatureSeries.of(material.getSaturations(), Saturation::getTemperature, s -> si(s.getFluxDensity()));
	}

	public boolean isEmpty() {
		return points.isEmpty();
	}

	/** @return whether the temperature lies outside the points given; never so for a single point, which is a constant */
	public boolean isOutside(double celsius) {
		return points.isOutside(celsius);
	}

	/** @return "25 °C to 100 °C" */
	public String range() {
		return points.range();
	}

	/** @return T, or NaN when no point is given */
	public double at(double celsius) {
		return points.at(celsius);
	}
}
