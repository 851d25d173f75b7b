package gapwright.study;

import java.util.List;

/**
 * Windings joined to one pair of terminals, for small changes about the operating point.
 *
 * @param id         of the connection
 * @param series     in series, else in parallel
 * @param windings   ids, in the order joined
 * @param reversed   one per winding, whether it is joined the other way round
 * @param inductance H, at the terminals; NaN where the windings cannot be joined so
 */
public record ConnectionResult(String id, boolean series, List<String> windings, List<Boolean> reversed,
		double inductance) {

	/** @return whether the winding at that place in the order is joined the other way round */
	public boolean isReversed(int at) {
		return reversed.get(at);
	}
}
