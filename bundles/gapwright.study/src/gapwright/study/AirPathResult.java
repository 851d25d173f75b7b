package gapwright.study;

/**
 * An air path at an operating point's mean currents.
 *
 * @param id   of the air path
 * @param flux Wb, positive from → to
 */
public record AirPathResult(String id, double flux) {
}
