package gapwright.physics.gap;

/**
 * Whether a method may be used for a gap.
 *
 * @param validity how far it may be
 * @param reason   what speaks against it, with figures; "" when valid
 * @param better   what to do instead; "" when nothing is known to be better
 */
public record Judgement(Validity validity, String reason, String better) {

	/** Whether a factor may be used. */
	public enum Validity {
		VALID,
		/** Outside the range the formula is known to hold in; still a number. */
		DOUBTFUL,
		/** The formula makes no sense there: no number. */
		REFUSED
	}

	static final Judgement VALID = new Judgement(Validity.VALID, "", "");

	static Judgement doubtful(String reason, String better) {
		return new Judgement(Validity.DOUBTFUL, reason, better);
	}

	static Judgement refused(String reason, String better) {
		return new Judgement(Validity.REFUSED, reason, better);
	}
}
