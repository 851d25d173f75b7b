package gapwright.study.leakage;

import java.util.List;

/**
 * Where a leg is to be cut in pieces.
 *
 * @param leg        id
 * @param at         between 0 and 1 from its from to its to joint, rising
 * @param windowFrom where the window beside it begins, on the same scale: coils lie within it, evenly spread
 * @param windowTo   where the window ends
 */
public record LegCut(String leg, List<Double> at, double windowFrom, double windowTo) {
}
