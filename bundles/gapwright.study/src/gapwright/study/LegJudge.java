package gapwright.study;

import java.util.HashSet;
import java.util.Set;

import gapwright.model.check.Severity;
import gapwright.physics.material.BhCurve;
import gapwright.physics.material.BlendedBh;
import gapwright.physics.material.StretchedBh;
import gapwright.physics.material.LinearBh;
import gapwright.physics.material.TableBh;
import gapwright.physics.network.Solution;

/** Judges legs against the saturation of their material at an operating point's temperature. */
final class LegJudge {

	/** Slope of a table's last piece over µ₀ above which its end is no saturation yet. */
	private static final double NOT_SATURATED = 20;

	private final StudyInput input;
	private final StudyInput.PointData point;
	private final Findings findings;
	private final Set<String> outside = new HashSet<>();

	LegJudge(StudyInput input, StudyInput.PointData point, Findings findings) {
		this.input = input;
		this.point = point;
		this.findings = findings;
	}

	LegResult judge(int k, Solution s, double peak) {
		StudyInput.LegData leg = input.legs.get(k);
		double saturation = leg.saturation().at(point.celsius());
		double utilisation = peak / saturation;
		boolean air = Double.isNaN(saturation) && point.network().curve(k) instanceof LinearBh linear
				&& linear.relativePermeability() == 1;
		LegState state = air ? LegState.WITHIN : Double.isNaN(utilisation) ? LegState.UNKNOWN
				: utilisation >= 1 ? LegState.OVER : utilisation >= input.nearFraction ? LegState.NEAR : LegState.WITHIN;
		if (state == LegState.OVER) {
			add(Severity.ERROR, Findings.OVER, leg.id(), reached(peak, utilisation, saturation)
					+ ": the leg is saturated", "Widen the leg or its gap, use fewer turns, or lower the current.");
		} else if (state == LegState.NEAR) {
			add(Severity.WARNING, Findings.NEAR, leg.id(), reached(peak, utilisation, saturation) + ", near is from "
					+ Figures.perCent(input.nearFraction), "");
		}
		if (leg.saturation().isOutside(point.celsius()) && outside.add(leg.material().id())) {
			add(Severity.NOTE, "temperature-outside-data", leg.material().id(),
					"saturation is given from " + leg.saturation().range()
							+ "; its end value is used at " + Figures.of(point.celsius()) + " °C",
					"Add a saturation at this temperature.");
		}
		tableEnd(point.network().curve(k), leg, peak);
		return new LegResult(leg.id(), s.legFlux()[k], s.legFluxDensity()[k], s.legFieldStrength()[k],
				s.legMmfDrop()[k], saturation, peak, utilisation, state);
	}

	private String reached(double peak, double utilisation, double saturation) {
		return "peak flux density " + Figures.of(peak) + " T is " + Figures.perCent(utilisation) + " of "
				+ Figures.of(saturation) + " T at " + Figures.of(point.celsius()) + " °C";
	}

	private void tableEnd(BhCurve curve, StudyInput.LegData leg, double peak) {
		if (endsTooSoon(curve, peak)) {
			add(Severity.NOTE, "table-end-not-saturated", leg.id(),
					"the flux density lies beyond the last point of the table, which still rises steeply there;"
							+ " beyond it the flux density reads low",
					"Add points nearer to saturation.");
		}
	}

	/** Whether a table, or one behind the curve, ends below the flux density and steeply. */
	private static boolean endsTooSoon(BhCurve curve, double fluxDensity) {
		if (curve instanceof BlendedBh blended) {
			return endsTooSoon(blended.first(), fluxDensity) || endsTooSoon(blended.second(), fluxDensity);
		}
		if (curve instanceof StretchedBh stretched) {
			return endsTooSoon(stretched.base(), fluxDensity);
		}
		return curve instanceof TableBh table && fluxDensity > table.fluxDensityAt(table.size() - 1)
				&& table.endPermeability() > NOT_SATURATED;
	}

	private void add(Severity severity, String code, String subject, String message, String hint) {
		findings.add(new Finding(severity, code, subject, point.id(), message, hint));
	}
}
