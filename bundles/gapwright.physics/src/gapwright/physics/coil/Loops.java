package gapwright.physics.coil;

import static gapwright.physics.material.BhCurve.MU_0;

/** Circular loops, and rings wound all round. All lengths in m, inductances in H. */
public final class Loops {

	private Loops() {
	}

	/** Mutual inductance of two coaxial filaments. Source: Maxwell, Treatise, art. 701; from memory. @param distance between their planes */
	public static double mutual(double firstRadius, double secondRadius, double distance) {
		double sum = firstRadius + secondRadius;
		double k2 = 4 * firstRadius * secondRadius / (sum * sum + distance * distance);
		double difference = firstRadius - secondRadius;
		double complement = Math.sqrt((difference * difference + distance * distance) / (sum * sum + distance * distance));
		double k = Math.sqrt(k2);
		Elliptic e = Elliptic.of(k, complement);
		return MU_0 * Math.sqrt(firstRadius * secondRadius) * ((2 / k - k) * e.first() - 2 / k * e.second());
	}

	/** A single turn of round wire, current through its whole section: µ₀a(ln(8a/ρ) − 7/4). Textbook. @param wireRadius ρ, far below a */
	public static double turn(double radius, double wireRadius) {
		return MU_0 * radius * (Math.log(8 * radius / wireRadius) - 1.75);
	}

	/** A ring of rectangular section, wound all round. Exact for linear material: µ₀µ_rN²h·ln(r_o/r_i)/(2π). */
	public static double rectangularToroid(double relativePermeability, double turns, double inner, double outer, double height) {
		return MU_0 * relativePermeability * turns * turns * height * Math.log(outer / inner) / (2 * Math.PI);
	}

	/** A ring of circular section, wound all round. Exact: µ₀µ_rN²(R − √(R² − a²)). @param centre R, m @param section a, radius of the section, m */
	public static double roundToroid(double relativePermeability, double turns, double centre, double section) {
		return MU_0 * relativePermeability * turns * turns * section * section
				/ (centre + Math.sqrt(centre * centre - section * section));
	}
}
