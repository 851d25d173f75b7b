package gapwright.study;

/**
 * A gap at an operating point's mean currents.
 *
 * @param id             of the gap
 * @param leg            id of its leg
 * @param permeance      H, of all pieces together with fringing
 * @param fringingFactor permeance over that without fringing, a ratio ≥ 1
 * @param mmfDrop        A, over all pieces
 */
public record GapResult(String id, String leg, double permeance, double fringingFactor, double mmfDrop) {
}
