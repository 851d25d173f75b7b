package gapwright.report;

import java.util.Locale;
import java.util.stream.Collectors;
import java.util.stream.IntStream;

import gapwright.study.ConnectionResult;
import gapwright.study.Finding;
import gapwright.study.GapResult;
import gapwright.study.LeakageResult;
import gapwright.study.LegResult;
import gapwright.study.LegState;
import gapwright.study.OperatingPointResult;
import gapwright.study.StudyResult;
import gapwright.study.WindingResult;

/** The result of a check as tables for people. */
public final class CheckTable {

	private static final int DIGITS = 4;

	private CheckTable() {
	}

	/** @param file name of the design's file as given */
	public static String of(StudyResult result, String file) {
		StringBuilder text = new StringBuilder(file);
		if (!result.design().isEmpty()) {
			text.append("  ").append(result.design());
		}
		text.append('\n');
		for (OperatingPointResult point : result.operatingPoints()) {
			operatingPoint(text, point);
		}
		if (!result.findings().isEmpty()) {
			text.append("\n  findings\n");
			for (Finding finding : result.findings()) {
				text.append("    ").append(line(finding)).append('\n');
			}
		}
		text.append("\n  worst: ").append(result.isIncomplete() ? "not computed" : result.worst().word()).append('\n');
		return text.toString();
	}

	/** @return severity, code, where, message and hint of a finding on one line */
	public static String line(Finding finding) {
		String where = finding.subject().isEmpty() ? "" : " " + finding.subject();
		String when = finding.operatingPoint() == null || finding.operatingPoint().equals(finding.subject()) ? ""
				: " at " + finding.operatingPoint();
		return finding.severity().name().toLowerCase(Locale.ROOT) + " " + finding.code() + where + when + ": "
				+ finding.message() + (finding.hint().isEmpty() ? "" : ". " + finding.hint());
	}

	private static void operatingPoint(StringBuilder text, OperatingPointResult point) {
		text.append("\n  operating point ").append(point.id());
		if (!point.converged()) {
			text.append(": no solution, see the findings\n");
			return;
		}
		if (Double.isFinite(point.energy())) {
			text.append("   energy ").append(Engineering.of(point.energy(), "J", DIGITS));
		}
		text.append('\n');
		TextTable legs = new TextTable().row("leg", "flux", "flux density", "peak", "saturation", "used", "state");
		for (LegResult leg : point.legs()) {
			legs.row(leg.id(), Engineering.of(leg.flux(), "Wb", DIGITS), tesla(leg.fluxDensity()),
					tesla(leg.peakFluxDensity()), tesla(leg.saturation()), Engineering.perCent(leg.utilisation()),
					leg.state() == LegState.WITHIN ? "within" : leg.state().word().toUpperCase(Locale.ROOT));
		}
		legs.appendTo(text, "    ");
		TextTable gaps = new TextTable().row("gap", "permeance", "fringing factor", "MMF drop");
		for (GapResult gap : point.gaps()) {
			gaps.row(gap.id(), Engineering.of(gap.permeance(), "H", DIGITS),
					String.format(Locale.ROOT, "%.3f", gap.fringingFactor()), Engineering.of(gap.mmfDrop(), "A", DIGITS));
		}
		gaps.appendTo(text, "    ");
		windings(text, point);
	}

	private static void windings(StringBuilder text, OperatingPointResult point) {
		TextTable windings = new TextTable().row("winding", "current", "swing", "linkage", "L differential", "L apparent",
				"A_L");
		for (WindingResult winding : point.windings()) {
			double swing = winding.highestCurrent() - winding.lowestCurrent();
			windings.row(winding.id(), Engineering.of(winding.current(), "A", DIGITS), Engineering.of(swing, "A", DIGITS),
					Engineering.of(winding.linkage(), "Wb", DIGITS),
					Engineering.of(point.inductance().of(winding.id()), "H", DIGITS),
					Engineering.of(winding.apparentInductance(), "H", DIGITS),
					Engineering.of(winding.inductanceFactor(), "H", DIGITS));
		}
		windings.appendTo(text, "    ");
		TextTable pairs = new TextTable().row("windings", "L mutual", "coupling", "leakage of the first");
		int n = point.windings().size();
		for (int i = 0; i < n; i++) {
			for (int j = i + 1; j < n; j++) {
				String first = point.windings().get(i).id();
				String second = point.windings().get(j).id();
				pairs.row(first + ", " + second,
						Engineering.of(point.inductance().differential()[i][j], "H", DIGITS),
						ratio(point.inductance().coupling(first, second)),
						Engineering.of(point.inductance().leakage(first, second), "H", DIGITS));
			}
		}
		pairs.appendTo(text, "    ");
		TextTable leakages = new TextTable().row("leakage", "by builds", "short-circuit L", "coupling");
		for (LeakageResult leakage : point.leakages()) {
			leakages.row(leakage.id() + " of " + leakage.first() + " to " + leakage.second(),
					Engineering.of(leakage.inductance(), "H", DIGITS), Engineering.of(leakage.shortCircuit(), "H", DIGITS),
					ratio(leakage.coupling()));
		}
		leakages.appendTo(text, "    ");
		TextTable connections = new TextTable().row("connection", "joined", "L");
		for (ConnectionResult connection : point.connections()) {
			connections.row(connection.id() + ": " + members(connection),
					connection.series() ? "in series" : "in parallel", Engineering.of(connection.inductance(), "H", DIGITS));
		}
		connections.appendTo(text, "    ");
	}

	private static String members(ConnectionResult connection) {
		return IntStream.range(0, connection.windings().size())
				.mapToObj(i -> connection.windings().get(i) + (connection.isReversed(i) ? " reversed" : ""))
				.collect(Collectors.joining(", "));
	}

	private static String ratio(double value) {
		return Double.isFinite(value) ? String.format(Locale.ROOT, "%.4f", value) : "–";
	}

	static String tesla(double value) {
		return Double.isFinite(value) ? String.format(Locale.ROOT, "%.4f T", value) : "–";
	}
}
