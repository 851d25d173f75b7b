package gapwright.library.material;

/**
 * Figures of a curve that are legal but not of this world, as a mistaken unit makes them. Offered, never acted upon.
 *
 * @param message why they are doubted, with the figures
 * @param instead the bare numbers' units that would make them plausible
 * @param apt     whether choosing them has an effect: the points are bare numbers
 */
public record UnitDoubt(String message, BareUnits instead, boolean apt) {
}
