package gapwright.study.leakage;

/**
 * An air path to be added across a window.
 *
 * @param permeance H
 */
public record LeakagePath(LegPoint first, LegPoint second, double permeance) {
}
