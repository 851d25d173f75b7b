package gapwright.physics.gap;

/**
 * A fringing factor F with its exact partial derivatives, each with the other sizes held.
 *
 * @param value    F, a ratio
 * @param byA      ∂F/∂a of a rectangle, ∂F/∂d of a round section, 1/m
 * @param byB      ∂F/∂b of a rectangle, 0 of a round section, 1/m
 * @param byLength ∂F/∂g, 1/m
 * @param byFirst  ∂F/∂ of the distance to the first end of the window, 1/m
 * @param bySecond ∂F/∂ of the distance to its other end, 1/m
 */
public record FringingFactor(double value, double byA, double byB, double byLength, double byFirst, double bySecond) {
}
