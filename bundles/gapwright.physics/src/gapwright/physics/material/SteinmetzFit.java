package gapwright.physics.material;

import java.util.List;

/**
 * Core loss per volume P = k·f^α·B^β fitted to measured points, by least squares of ln P on ln f and ln B. Source:
 * Steinmetz 1892 (from memory) for the law; the fit is the ordinary one.
 *
 * @param coefficient          k, for f in Hz, B in T and P in W/m³
 * @param frequencyExponent    α
 * @param fluxDensityExponent  β
 * @param greatestMisfit       largest |fit/measured − 1| of a point
 * @param minimumFrequency     Hz, of the points
 * @param maximumFrequency     Hz, of the points
 * @param minimumFluxDensity   T, of the points
 * @param maximumFluxDensity   T, of the points
 */
public record SteinmetzFit(double coefficient, double frequencyExponent, double fluxDensityExponent,
		double greatestMisfit, double minimumFrequency, double maximumFrequency, double minimumFluxDensity,
		double maximumFluxDensity) {

	/** Square of the spread across the line the points lie nearest to, over that along it, below which they lie on it. */
	private static final double FLAT = 1e-6;

	/**
	 * A measured loss.
	 *
	 * @param frequency   Hz, &gt; 0
	 * @param fluxDensity peak, T, &gt; 0
	 * @param loss        W/m³, &gt; 0, sinusoidal, without bias
	 */
	public record Point(double frequency, double fluxDensity, double loss) {

		/** @throws IllegalArgumentException when a value is not finite and above 0 */
		public Point {
			Domain.above(0, "frequency", frequency);
			Domain.above(0, "fluxDensity", fluxDensity);
			Domain.above(0, "loss", loss);
		}
	}

	/**
	 * @param points at one temperature, at least three, not all on a line of ln f and ln B
	 * @throws IllegalArgumentException when they determine no fit
	 */
	public static SteinmetzFit of(List<Point> points) {
		int n = points.size();
		if (n < 3) {
			throw new IllegalArgumentException(n + " loss points: a fit needs at least 3");
		}
		double x0 = points.stream().mapToDouble(p -> Math.log(p.frequency)).sum() / n;
		double y0 = points.stream().mapToDouble(p -> Math.log(p.fluxDensity)).sum() / n;
		double z0 = points.stream().mapToDouble(p -> Math.log(p.loss)).sum() / n;
		double xx = 0;
		double xy = 0;
		double yy = 0;
		double xz = 0;
		double yz = 0;
		for (Point point : points) {
			double x = Math.log(point.frequency) - x0;
			double y = Math.log(point.fluxDensity) - y0;
			double z = Math.log(point.loss) - z0;
			xx += x * x;
			xy += x * y;
			yy += y * y;
			xz += x * z;
			yz += y * z;
		}
		double determinant = xx * yy - xy * xy;
		if (!(determinant > FLAT * (xx + yy) * (xx + yy))) {
			throw new IllegalArgumentException("the loss points lie on a line: they must differ in frequency as well as in"
					+ " flux density, not in one proportion");
		}
		double alpha = (yy * xz - xy * yz) / determinant;
		double beta = (xx * yz - xy * xz) / determinant;
		double k = Math.exp(z0 - alpha * x0 - beta * y0);
		double misfit = 0;
		for (Point point : points) {
			double fit = k * Math.pow(point.frequency, alpha) * Math.pow(point.fluxDensity, beta);
			misfit = Math.max(misfit, Math.abs(fit / point.loss - 1));
		}
		return new SteinmetzFit(k, alpha, beta, misfit, points.stream().mapToDouble(Point::frequency).min().orElseThrow(),
				points.stream().mapToDouble(Point::frequency).max().orElseThrow(),
				points.stream().mapToDouble(Point::fluxDensity).min().orElseThrow(),
				points.stream().mapToDouble(Point::fluxDensity).max().orElseThrow());
	}

	/** @return W/m³ at f in Hz and a peak B in T */
	public double loss(double frequency, double fluxDensity) {
		return coefficient * Math.pow(frequency, frequencyExponent) * Math.pow(fluxDensity, fluxDensityExponent);
	}
}
