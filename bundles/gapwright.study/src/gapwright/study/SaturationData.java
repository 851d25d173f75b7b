package gapwright.study;

import java.util.Comparator;
import java.util.List;

import gapwright.model.Material;

/** Saturation flux density against temperature: linear between the points given, the end value outside. */
public final class SaturationData {

	private record Point(double celsius, double tesla) {
	}

	private final List<Point> points;

	/** @param material its saturations in any order; incomplete ones are passed over */
	public SaturationData(Material material) {
		points = material.getSaturations().stream()
				.filter(s -> s.getTemperature() != null && s.getFluxDensity() != null)
				.map(s -> new Point(s.getTemperature().si(), s.getFluxDensity().si()))
				.sorted(Comparator.comparingDouble(Point::celsius)).toList();
	}

	public boolean isEmpty() {
		return points.isEmpty();
	}

	/** @return whether the temperature lies outside the points given; never so for a single point, which is a constant */
	public boolean isOutside(double celsius) {
		return points.size() > 1
				&& (celsius < points.get(0).celsius() || celsius > points.get(points.size() - 1).celsius());
	}

	/** @return "25 °C to 100 °C" */
	public String range() {
		return points.isEmpty() ? "" : Figures.of(points.get(0).celsius()) + " °C to "
				+ Figures.of(points.get(points.size() - 1).celsius()) + " °C";
	}

	/** @return T, or NaN when no point is given */
	public double at(double celsius) {
		if (points.isEmpty()) {
			return Double.NaN;
		}
		Point below = points.get(0);
		if (celsius <= below.celsius()) {
			return below.tesla();
		}
		for (Point above : points) {
			if (above.celsius() >= celsius) {
				double share = (celsius - below.celsius()) / (above.celsius() - below.celsius());
				return below.tesla() + (above.tesla() - below.tesla()) * share;
			}
			below = above;
		}
		return below.tesla();
	}
}
