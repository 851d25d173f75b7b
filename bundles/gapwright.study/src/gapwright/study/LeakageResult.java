package gapwright.study;

/**
 * Leakage between two windings, from the energy of the field between them.
 *
 * @param id                of the leakage
 * @param first             winding it is referred to
 * @param second            the other winding
 * @param inductance        H, referred to the first winding's turns, by the builds of the windings alone
 * @param rogowskiFactor    K_R, a ratio: how much the field's spreading at the ends of the windings lowers it
 * @param shortCircuit      H, seen at the first winding with the second short-circuited: the inductance above and what
 *                          the drawn network adds by flux that links one winding only
 * @param coupling          coefficient of both windings with all that leakage on the first winding's side, −1 to 1
 */
public record LeakageResult(String id, String first, String second, double inductance, double rogowskiFactor,
		double shortCircuit, double coupling) {
}
