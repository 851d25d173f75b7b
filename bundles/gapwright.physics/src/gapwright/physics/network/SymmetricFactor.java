package gapwright.physics.network;

/**
 * Cholesky factor of Y = CᵀGC, the network's Jacobian. Structure is fixed at construction; numbers change at each
 * {@link #factor}.
 */
interface SymmetricFactor {

	/**
	 * @param conductance dφ/df of each branch, H, &gt; 0; bridges are ignored
	 * @return -1, or the unknown at which the matrix was found not positive definite
	 */
	int factor(double[] conductance);

	/** Solves Y·x = b in place, b one value per unknown. Valid after a successful {@link #factor}. */
	void solve(double[] b);
}
