package gapwright.ui.pages;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;

import gapwright.model.Material;
import gapwright.model.Saturation;
import gapwright.physics.material.BhCurve;
import gapwright.physics.material.Permeability;
import gapwright.study.MaterialData;
import gapwright.ui.fields.FigureFormat;

/**
 * What a plot of a material has to show, in its own units and without a display: lines at some temperatures, and the
 * saturations legs are judged against.
 *
 * @param lines  at least one
 * @param levels saturations, along B where there is a B axis
 */
record CurvePicture(PlotKind kind, PlotAxis across, PlotAxis upwards, List<Line> lines, List<Level> levels) {

	private static final int SAMPLES = 240;
	/** More lines than these nobody can tell apart. */
	private static final int MOST_TEMPERATURES = 4;
	/** Decades of field strength shown below the one at saturation, where the axis has decades. */
	private static final double DECADES_BELOW = 1e-4;
	private static final double BEYOND = 5;

	/**
	 * @param name   for example "25 °C"
	 * @param order  of the temperature, from 0
	 * @param dashed the second of two lines at one temperature
	 * @param markX  of the point at saturation; NaN when none is known
	 * @param markY  of it
	 */
	record Line(String name, int order, boolean dashed, double[] x, double[] y, double markX, double markY) {

		/** @return y at an x between the samples, on a straight line; NaN outside */
		double at(double value) {
			for (int k = 1; k < x.length; k++) {
				if (value >= x[k - 1] && value <= x[k]) {
					double span = x[k] - x[k - 1];
					return span == 0 ? y[k] : y[k - 1] + (y[k] - y[k - 1]) * (value - x[k - 1]) / span;
				}
			}
			return Double.NaN;
		}
	}

	/** @param value T */
	record Level(String label, double value) {
	}

	/**
	 * @param celsius temperatures to show; empty leaves the choice to the material
	 * @throws IllegalArgumentException with a sentence when there is nothing to show
	 */
	static CurvePicture of(Material material, PlotKind kind, List<Double> celsius) {
		MaterialData data = new MaterialData(material);
		List<Double> shown = celsius.isEmpty() ? usual(material, data) : celsius;
		List<BhCurve> curves = new ArrayList<>();
		double widest = 0;
		double highest = PlotRange.fluxDensity(material);
		for (double t : shown) {
			if (t >= data.curieCelsius()) {
				throw new IllegalArgumentException("At " + FigureFormat.plain(t) + " °C, above its Curie temperature, it is not magnetic.");
			}
			BhCurve curve = data.curve(t);
			curves.add(curve);
			widest = Math.max(widest, curve.fieldStrength(saturation(data, t, highest)));
		}
		List<Level> levels = new ArrayList<>();
		for (Saturation saturation : material.getSaturations()) {
			if (saturation.getFluxDensity() != null) {
				levels.add(new Level(saturation.getFluxDensity() + (saturation.getTemperature() == null ? "" : " at " + saturation.getTemperature()),
						saturation.getFluxDensity().si()));
			}
		}
		List<Line> lines = new ArrayList<>();
		for (int k = 0; k < shown.size(); k++) {
			String name = FigureFormat.plain(shown.get(k)).replaceAll("\\.0+$", "") + " °C";
			lines(lines, kind, curves.get(k), name, k, widest, 1.1 * highest, saturation(data, shown.get(k), highest),
					!data.saturation().isEmpty());
		}
		double most = lines.stream().flatMapToDouble(line -> java.util.Arrays.stream(line.y)).max().orElse(1);
		double least = lines.stream().flatMapToDouble(line -> java.util.Arrays.stream(line.y)).min().orElse(1);
		PlotAxis field = kind == PlotKind.PERMEABILITY_BY_FIELD ? PlotAxis.decades("H", "A/m", widest * DECADES_BELOW, widest * BEYOND)
				: PlotAxis.linear("H", "A/m", widest);
		PlotAxis flux = PlotAxis.linear("B", "T", 1.1 * highest);
		PlotAxis permeability = PlotAxis.decades("µr", "", Math.max(1, least), Math.max(10, most));
		return new CurvePicture(kind, kind == PlotKind.PERMEABILITY_BY_FLUX ? flux : field,
				kind == PlotKind.FLUX_DENSITY ? flux : permeability, List.copyOf(lines),
				kind == PlotKind.PERMEABILITY_BY_FIELD ? List.of() : List.copyOf(levels));
	}

	/** The temperatures the material's figures are given at, where its curve depends on them. */
	private static List<Double> usual(Material material, MaterialData data) {
		if (!data.dependsOnTemperature()) {
			return List.of(data.curveCelsius());
		}
		TreeSet<Double> given = new TreeSet<>();
		for (double t : data.temperatures()) {
			given.add(t);
		}
		material.getSaturations().stream().filter(s -> s.getTemperature() != null).forEach(s -> given.add(s.getTemperature().si()));
		material.getPermeabilities().stream().filter(p -> p.getTemperature() != null).forEach(p -> given.add(p.getTemperature().si()));
		given.removeIf(t -> t >= data.curieCelsius());
		List<Double> all = new ArrayList<>(given);
		while (all.size() > MOST_TEMPERATURES) {
			all.remove(all.size() / 2);
		}
		return all.isEmpty() ? List.of(data.curveCelsius()) : all;
	}

	private static double saturation(MaterialData data, double celsius, double otherwise) {
		return data.saturation().isEmpty() ? otherwise : data.saturation().at(celsius);
	}

	private static void lines(List<Line> into, PlotKind kind, BhCurve curve, String name, int order, double widest, double highest,
			double saturation, boolean known) {
		double[] h = new double[SAMPLES + 1];
		double[] b = new double[SAMPLES + 1];
		double[] differential = new double[SAMPLES + 1];
		double[] amplitude = new double[SAMPLES + 1];
		for (int k = 0; k <= SAMPLES; k++) {
			double share = k / (double) SAMPLES;
			h[k] = switch (kind) {
			// close together where the curve bends
			case FLUX_DENSITY -> PlotRange.round(widest) * share * share;
			case PERMEABILITY_BY_FIELD -> Math.pow(10, Math.floor(Math.log10(widest * DECADES_BELOW)))
					* Math.pow(10, share * Math.ceil(Math.log10(BEYOND / DECADES_BELOW) + 1));
			case PERMEABILITY_BY_FLUX -> curve.fieldStrength(PlotRange.round(highest) * share);
			};
			b[k] = curve.fluxDensity(h[k]);
			differential[k] = Permeability.differential(curve, h[k]);
			amplitude[k] = Permeability.amplitude(curve, h[k]);
		}
		double at = curve.fieldStrength(saturation);
		if (kind == PlotKind.FLUX_DENSITY) {
			into.add(new Line(name, order, false, h, b, known ? at : Double.NaN, saturation));
		} else {
			double[] x = kind == PlotKind.PERMEABILITY_BY_FIELD ? h : b;
			double mark = !known ? Double.NaN : kind == PlotKind.PERMEABILITY_BY_FIELD ? at : saturation;
			into.add(new Line(name + " differential", order, false, x, differential, mark, Permeability.differential(curve, at)));
			into.add(new Line(name + " amplitude", order, true, x, amplitude, mark, Permeability.amplitude(curve, at)));
		}
	}
}
