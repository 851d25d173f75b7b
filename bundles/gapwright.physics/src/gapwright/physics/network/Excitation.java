package gapwright.physics.network;

import java.util.Arrays;

/**
 * What the windings are connected to: each has either its current imposed, or its flux linkage with the current left to
 * be found.
 */
public final class Excitation {

	private final double[] current;
	private final double[] linkage;

	private Excitation(double[] current, double[] linkage) {
		this.current = current;
		this.linkage = linkage;
	}

	/** @param current A, one per winding, finite */
	public static Excitation currents(double... current) {
		double[] free = new double[current.length];
		Arrays.fill(free, Double.NaN);
		return mixed(current, free);
	}

	/**
	 * @param current A, one per winding; NaN where the linkage is imposed
	 * @param linkage Wb, one per winding; NaN where the current is imposed
	 * @throws IllegalArgumentException when a winding has both or neither, or a value is infinite
	 */
	public static Excitation mixed(double[] current, double[] linkage) {
		if (current.length != linkage.length) {
			throw new IllegalArgumentException(current.length + " currents but " + linkage.length + " linkages");
		}
		for (int w = 0; w < current.length; w++) {
			if (Double.isNaN(current[w]) == Double.isNaN(linkage[w])) {
				throw new IllegalArgumentException("winding " + w + " needs either a current or a linkage, found "
						+ current[w] + " A and " + linkage[w] + " Wb");
			}
			if (Double.isInfinite(current[w]) || Double.isInfinite(linkage[w])) {
				throw new IllegalArgumentException("winding " + w + ": found " + current[w] + " A and " + linkage[w]
						+ " Wb, must be finite");
			}
		}
		return new Excitation(current.clone(), linkage.clone());
	}

	public int windingCount() {
		return current.length;
	}

	/** @return whether the winding's linkage is imposed and its current unknown */
	public boolean imposesLinkage(int winding) {
		return Double.isNaN(current[winding]);
	}

	/** @return whether any winding's current is unknown */
	public boolean imposesAnyLinkage() {
		for (double amperes : current) {
			if (Double.isNaN(amperes)) {
				return true;
			}
		}
		return false;
	}

	/** @return A, or NaN where the linkage is imposed */
	public double current(int winding) {
		return current[winding];
	}

	/** @return Wb, or NaN where the current is imposed */
	public double linkage(int winding) {
		return linkage[winding];
	}
}
