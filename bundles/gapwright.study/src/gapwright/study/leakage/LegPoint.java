package gapwright.study.leakage;

/**
 * A point of a leg that an air path is to end at.
 *
 * @param leg id
 * @param at  0 at its from joint, 1 at its to joint, between them where the leg is to be cut
 */
public record LegPoint(String leg, double at) {
}
