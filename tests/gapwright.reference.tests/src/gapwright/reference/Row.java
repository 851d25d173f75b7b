package gapwright.reference;

/**
 * One figure of ours beside one from outside.
 *
 * @param kase      what was computed
 * @param source    where the outside figure is from
 * @param figure    which figure, with its unit
 * @param ours      by this program
 * @param theirs    from outside
 * @param scale     what the difference is measured against; the figure itself but for small parts of a whole
 * @param tolerance relative to the scale: the case's own, or half a unit of the last digit printed
 */
record Row(String kase, String source, String figure, double ours, double theirs, double scale, double tolerance) {

	/** A figure measured against itself. */
	static Row of(String kase, String source, String figure, double ours, double theirs, double tolerance) {
		return new Row(kase, source, figure, ours, theirs, Math.abs(theirs), tolerance);
	}

	/** @param digits significant digits of the printed figure: half a unit of the last is the tolerance */
	static Row printed(String kase, String source, String figure, double ours, double theirs, int digits) {
		double unit = Math.pow(10, Math.floor(Math.log10(Math.abs(theirs))) - digits + 1);
		return of(kase, source, figure, ours, theirs, 0.5000001 * unit / Math.abs(theirs));
	}

	double difference() {
		return scale == 0 ? Math.abs(ours - theirs) : (ours - theirs) / scale;
	}

	boolean holds() {
		return Math.abs(difference()) <= tolerance;
	}
}
