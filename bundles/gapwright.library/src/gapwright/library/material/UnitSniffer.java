package gapwright.library.material;

import java.util.ArrayList;
import java.util.List;

import gapwright.physics.material.BhCurve;

/**
 * Doubts the units of a table whose figures no soft magnetic material has. Bounds are generous, from memory: flux
 * densities end between 0.1 and 2.6 T, and the steepest chord from the origin is 5 to 150 000 times as steep as air.
 */
final class UnitSniffer {

	private static final double LEAST_FLUX = 0.1;
	private static final double GREATEST_FLUX = 2.6;
	private static final double LEAST_PERMEABILITY = 5;
	private static final double GREATEST_PERMEABILITY = 150_000;
	private static final double OERSTED = 1000 / (4 * Math.PI);

	private final double[] h;
	private final double[] b;
	private final double fieldFactor;
	private final double fluxFactor;
	private final boolean bare;

	/**
	 * @param h           A/m, as read
	 * @param b           T, as read
	 * @param fieldFactor A/m of the unit they were read in
	 * @param fluxFactor  T of the unit they were read in
	 * @param bare        whether the unit was not written with the numbers
	 */
	UnitSniffer(double[] h, double[] b, double fieldFactor, double fluxFactor, boolean bare) {
		this.h = h;
		this.b = b;
		this.fieldFactor = fieldFactor;
		this.fluxFactor = fluxFactor;
		this.bare = bare;
	}

	List<UnitDoubt> doubts() {
		double greatest = b[b.length - 1];
		boolean fluxOdd = !isFlux(greatest);
		double permeability = permeability(1, 1);
		List<UnitDoubt> doubts = new ArrayList<>();
		if (!fluxOdd && isPermeability(permeability)) {
			return doubts;
		}
		String message = fluxOdd ? "the flux density reaches " + figure(greatest) + " T"
				: "the permeability reaches " + figure(permeability);
		for (Unit flux : FLUXES) {
			for (Unit field : FIELDS) {
				double r = flux.factor / fluxFactor;
				double s = field.factor / fieldFactor;
				boolean same = Math.abs(r - 1) < 1e-9 && Math.abs(s - 1) < 1e-9;
				// a unit that fits already is left alone
				boolean needless = !fluxOdd && Math.abs(r - 1) > 1e-9;
				if (!same && !needless && isFlux(greatest * r) && isPermeability(permeability(r, s))) {
					String units = (s == 1 ? "" : "H in " + field.name) + (s == 1 || r == 1 ? "" : " and ")
							+ (r == 1 ? "" : "B in " + flux.name);
					doubts.add(new UnitDoubt(message + ". With " + units + " it would be " + figure(greatest * r)
							+ " T and a permeability of " + figure(permeability(r, s)),
							new BareUnits(field.name, flux.name), bare));
				}
			}
		}
		if (doubts.isEmpty()) {
			doubts.add(new UnitDoubt(message + ": are the units right?", BareUnits.AS_IN_FILE, false));
		}
		// the choice that changes least comes first
		doubts.sort((x, y) -> Integer.compare(changes(x), changes(y)));
		return doubts;
	}

	private int changes(UnitDoubt doubt) {
		return (factor(FIELDS, doubt.instead().fieldStrength()) == fieldFactor ? 0 : 1)
				+ (factor(FLUXES, doubt.instead().fluxDensity()) == fluxFactor ? 0 : 1);
	}

	private record Unit(String name, double factor) {
	}

	private static final List<Unit> FIELDS = List.of(new Unit("A/m", 1), new Unit("Oe", OERSTED), new Unit("kA/m", 1000));
	private static final List<Unit> FLUXES = List.of(new Unit("T", 1), new Unit("mT", 1e-3), new Unit("G", 1e-4));

	private static double factor(List<Unit> units, String name) {
		return units.stream().filter(unit -> unit.name.equals(name)).mapToDouble(Unit::factor).findFirst().orElse(Double.NaN);
	}

	private static boolean isFlux(double tesla) {
		return tesla >= LEAST_FLUX && tesla <= GREATEST_FLUX;
	}

	private static boolean isPermeability(double permeability) {
		return permeability >= LEAST_PERMEABILITY && permeability <= GREATEST_PERMEABILITY;
	}

	/** Greatest amplitude permeability of a point, with both columns multiplied. */
	private double permeability(double fluxRatio, double fieldRatio) {
		double greatest = 0;
		for (int i = 0; i < h.length; i++) {
			if (h[i] > 0) {
				greatest = Math.max(greatest, b[i] * fluxRatio / (BhCurve.MU_0 * h[i] * fieldRatio));
			}
		}
		return greatest;
	}

	private static String figure(double value) {
		return new java.math.BigDecimal(value).round(new java.math.MathContext(3)).stripTrailingZeros().toPlainString();
	}
}
