package gapwright.study;

import java.util.Comparator;
import java.util.List;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;

import gapwright.model.quantity.Quantity;

/** A value by temperature: linear between the points given, the end value outside. */
final class TemperatureSeries {

	private record Point(double celsius, double value) {
	}

	private final List<Point> points;

	private TemperatureSeries(List<Point> points) {
		this.points = points;
	}

	/** Points in any order; those without a temperature or with a NaN are passed over. */
	static <T> TemperatureSeries of(List<T> items, Function<T, Quantity> temperature, ToDoubleFunction<T> value) {
		return new TemperatureSeries(items.stream()
				.filter(item -> temperature.apply(item) != null && !Double.isNaN(value.applyAsDouble(item)))
				.map(item -> new Point(temperature.apply(item).si(), value.applyAsDouble(item)))
				.sorted(Comparator.comparingDouble(Point::celsius)).toList());
	}

	boolean isEmpty() {
		return points.isEmpty();
	}

	/** @return whether the temperature lies outside the points given; never so for a single point, which is a constant */
	boolean isOutside(double celsius) {
		return points.size() > 1
				&& (celsius < points.get(0).celsius() || celsius > points.get(points.size() - 1).celsius());
	}

	/** @return "25 °C to 100 °C" */
	String range() {
		return points.isEmpty() ? "" : Figures.of(points.get(0).celsius()) + " °C to "
				+ Figures.of(points.get(points.size() - 1).celsius()) + " °C";
	}

	/** @return the value there, or NaN when no point is given */
	double at(double celsius) {
		if (points.isEmpty()) {
			return Double.NaN;
		}
		Point below = points.get(0);
		if (celsius <= below.celsius()) {
			return below.value();
		}
		for (Point above : points) {
			if (above.celsius() >= celsius) {
				double share = (celsius - below.celsius()) / (above.celsius() - below.celsius());
				return below.value() + (above.value() - below.value()) * share;
			}
			below = above;
		}
		return below.value();
	}
}
