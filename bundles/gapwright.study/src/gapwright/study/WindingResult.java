package gapwright.study;

/**
 * A winding at an operating point's mean currents.
 *
 * @param id                 of the winding
 * @param current            A
 * @param linkage            Wb
 * @param apparentInductance H, linkage/current; NaN unless it alone carries current and no magnet acts
 */
public record WindingResult(String id, double current, double linkage, double apparentInductance) {
}
