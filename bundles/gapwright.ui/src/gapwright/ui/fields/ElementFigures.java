package gapwright.ui.fields;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Predicate;

import org.eclipse.emf.ecore.EObject;

import gapwright.model.AirPath;
import gapwright.model.Coil;
import gapwright.model.Gap;
import gapwright.model.Leg;
import gapwright.model.Winding;
import gapwright.model.WindingConnection;
import gapwright.model.WindingLeakage;
import gapwright.study.AirPathResult;
import gapwright.study.ConnectionResult;
import gapwright.study.GapResult;
import gapwright.study.InductanceMatrix;
import gapwright.study.LeakageResult;
import gapwright.study.LegResult;
import gapwright.study.OperatingPointResult;
import gapwright.study.WindingResult;

/** What was reckoned for an element at an operating point, each figure with its origin. */
public final class ElementFigures {

	private ElementFigures() {
	}

	/** @return empty where nothing is reckoned for the element, or the operating point did not converge */
	public static List<Figure> of(EObject element, OperatingPointResult point) {
		if (point == null || !point.converged()) {
			return List.of();
		}
		if (element instanceof Leg leg) {
			return find(point.legs(), r -> r.id().equals(leg.getId())).map(ElementFigures::leg).orElse(List.of());
		}
		if (element instanceof Gap gap) {
			return find(point.gaps(), r -> r.id().equals(gap.getId())).map(ElementFigures::gap).orElse(List.of());
		}
		if (element instanceof AirPath path) {
			return find(point.airPaths(), r -> r.id().equals(path.getId())).map(ElementFigures::airPath).orElse(List.of());
		}
		if (element instanceof Winding winding) {
			return find(point.windings(), r -> r.id().equals(winding.getId())).map(r -> winding(r, point.inductance())).orElse(List.of());
		}
		if (element instanceof WindingLeakage leakage) {
			return find(point.leakages(), r -> r.id().equals(leakage.getId())).map(ElementFigures::leakage).orElse(List.of());
		}
		if (element instanceof WindingConnection connection) {
			return find(point.connections(), r -> r.id().equals(connection.getId())).map(ElementFigures::connection).orElse(List.of());
		}
		if (element instanceof Coil coil) {
			return of(coil.eContainer(), point);
		}
		return List.of();
	}

	private static List<Figure> leg(LegResult leg) {
		List<Figure> figures = new ArrayList<>();
		figures.add(new Figure("Flux Φ", FigureFormat.si(leg.flux(), "Wb"),
				"At the mean current. Balance of flux at every joint; positive from the leg's start to its end."));
		figures.add(new Figure("Flux density B", FigureFormat.fluxDensity(leg.fluxDensity()),
				"Φ over gross area × stacking factor: in the iron, taken as even over the section."));
		figures.add(new Figure("Field strength H", FigureFormat.si(leg.fieldStrength(), "A/m"),
				"From B by the material's curve; no hysteresis, even over the section."));
		figures.add(new Figure("MMF drop", FigureFormat.si(leg.mmfDrop(), "A"), "H × iron path length; the iron alone, without gaps and magnet."));
		figures.add(new Figure("Peak flux density", FigureFormat.fluxDensity(leg.peakFluxDensity()),
				"The larger |B| of the two ends of the ripple or of the linkage swing."));
		figures.add(new Figure("Saturation used", FigureFormat.fluxDensity(leg.saturation()), Double.isNaN(leg.saturation())
				? "The material states no saturation, so the leg cannot be judged."
				: "The material's saturation at the temperature of the operating point; between two points on a straight line."));
		figures.add(new Figure("Of saturation", FigureFormat.percent(leg.utilisation()), "Peak flux density over the saturation used."));
		figures.add(new Figure("State", leg.state().name().toLowerCase(Locale.ROOT), "Near from the design's limit on; over from 100 %."));
		return figures;
	}

	private static List<Figure> gap(GapResult gap) {
		return List.of(
				new Figure("Permeance", FigureFormat.si(gap.permeance(), "H"), "µ₀ × gross area × fringing factor over the length of all pieces."),
				new Figure("Fringing factor", FigureFormat.plain(gap.fringingFactor()), "By the gap's fringing method; 1 without fringing."),
				new Figure("MMF drop", FigureFormat.si(gap.mmfDrop(), "A"), "Flux of the leg over the gap's permeance."));
	}

	private static List<Figure> airPath(AirPathResult path) {
		return List.of(new Figure("Flux Φ", FigureFormat.si(path.flux(), "Wb"), "Permeance × the MMF between its joints; positive from start to end."));
	}

	private static List<Figure> winding(WindingResult winding, InductanceMatrix matrix) {
		int own = matrix.windings().indexOf(winding.id());
		return List.of(
				new Figure("Current", FigureFormat.si(winding.current(), "A"), "Mean; imposed by the drive, or computed for an imposed linkage."),
				new Figure("Linkage", FigureFormat.si(winding.linkage(), "Wb"), "Sum of turns × flux, each coil with its sense."),
				new Figure("Apparent inductance", FigureFormat.si(winding.apparentInductance(), "H"),
						"Linkage over current; only where this winding alone carries current and no magnet acts."),
				new Figure("Differential inductance", FigureFormat.si(own < 0 ? Double.NaN : matrix.differential()[own][own], "H"),
						"Slope of the linkage over the current at this point, exact from the solved network; what the ripple sees."));
	}

	private static List<Figure> leakage(LeakageResult leakage) {
		return List.of(
				new Figure("Leakage inductance", FigureFormat.si(leakage.inductance(), "H"),
						"Energy of the field between the windings, referred to the first one's turns; for evenly spread, balanced ampere-turns."),
				new Figure("Rogowski factor K_R", FigureFormat.plain(leakage.rogowskiFactor()),
						"How much the spreading of the field at the ends of the windings lowers it; Rogowski 1909."),
				new Figure("Short-circuit inductance", FigureFormat.si(leakage.shortCircuit(), "H"),
						"Seen at the first winding with the second short-circuited: the leakage, and what the drawn network adds by flux that links one winding only."),
				new Figure("Coupling k", FigureFormat.plain(leakage.coupling()),
						"Mutual over the root of both own inductances, with all the leakage on the first winding's side; negative where they oppose."));
	}

	private static List<Figure> connection(ConnectionResult connection) {
		return List.of(new Figure("Inductance together", FigureFormat.si(connection.inductance(), "H"), connection.series()
				? "In series: the sum of all own and mutual differential inductances, with the sense of each winding."
				: "In parallel: from the inverse of the differential inductance matrix; what the common terminals see."));
	}

	private static <T> Optional<T> find(List<T> all, Predicate<T> wanted) {
		return all.stream().filter(wanted).findFirst();
	}
}
