package gapwright.ui.fields;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Predicate;

import org.eclipse.emf.ecore.EObject;

import gapwright.model.AirPath;
import gapwright.model.Coil;
import gapwright.model.Fringing;
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
import gapwright.study.provenance.FigureGroup;
import gapwright.study.provenance.Provenance;

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
			return find(point.gaps(), r -> r.id().equals(gap.getId())).map(r -> gap(r, gap.getFringing())).orElse(List.of());
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
		figures.add(new Figure(FigureGroup.LEG_FLUX, FigureFormat.si(leg.flux(), "Wb")));
		figures.add(new Figure(FigureGroup.LEG_FLUX_DENSITY, FigureFormat.fluxDensity(leg.fluxDensity())));
		figures.add(new Figure(FigureGroup.LEG_FIELD_STRENGTH, FigureFormat.si(leg.fieldStrength(), "A/m")));
		figures.add(new Figure(FigureGroup.LEG_MMF_DROP, FigureFormat.si(leg.mmfDrop(), "A")));
		figures.add(new Figure(FigureGroup.LEG_PEAK, FigureFormat.fluxDensity(leg.peakFluxDensity())));
		figures.add(Double.isNaN(leg.saturation())
				? new Figure(FigureGroup.LEG_SATURATION.title(), FigureFormat.NONE,
						"The material states no saturation, so the leg cannot be judged.", FigureGroup.LEG_SATURATION)
				: new Figure(FigureGroup.LEG_SATURATION, FigureFormat.fluxDensity(leg.saturation())));
		figures.add(new Figure(FigureGroup.LEG_UTILISATION, FigureFormat.percent(leg.utilisation())));
		figures.add(new Figure("State", leg.state().name().toLowerCase(Locale.ROOT), "Near from the design's limit on; over from 100 %.", null));
		return figures;
	}

	private static List<Figure> gap(GapResult gap, Fringing method) {
		return List.of(new Figure(FigureGroup.GAP_PERMEANCE, FigureFormat.si(gap.permeance(), "H")),
				new Figure(Provenance.fringing(method), FigureFormat.plain(gap.fringingFactor())),
				new Figure(FigureGroup.GAP_MMF_DROP, FigureFormat.si(gap.mmfDrop(), "A")));
	}

	private static List<Figure> airPath(AirPathResult path) {
		return List.of(new Figure(FigureGroup.AIR_PATH_FLUX, FigureFormat.si(path.flux(), "Wb")));
	}

	private static List<Figure> winding(WindingResult winding, InductanceMatrix matrix) {
		int own = matrix.windings().indexOf(winding.id());
		return List.of(new Figure(FigureGroup.WINDING_CURRENT, FigureFormat.si(winding.current(), "A")),
				new Figure(FigureGroup.WINDING_LINKAGE, FigureFormat.si(winding.linkage(), "Wb")),
				new Figure(FigureGroup.WINDING_APPARENT, FigureFormat.si(winding.apparentInductance(), "H")),
				new Figure(FigureGroup.INDUCTANCE_DIFFERENTIAL,
						FigureFormat.si(own < 0 ? Double.NaN : matrix.differential()[own][own], "H")));
	}

	private static List<Figure> leakage(LeakageResult leakage) {
		return List.of(new Figure(FigureGroup.LEAKAGE_INDUCTANCE, FigureFormat.si(leakage.inductance(), "H")),
				new Figure(FigureGroup.LEAKAGE_ROGOWSKI, FigureFormat.plain(leakage.rogowskiFactor())),
				new Figure(FigureGroup.LEAKAGE_SHORT_CIRCUIT, FigureFormat.si(leakage.shortCircuit(), "H")),
				new Figure(FigureGroup.LEAKAGE_COUPLING, FigureFormat.plain(leakage.coupling())));
	}

	private static List<Figure> connection(ConnectionResult connection) {
		return List.of(new Figure(FigureGroup.CONNECTION_INDUCTANCE, FigureFormat.si(connection.inductance(), "H")));
	}

	private static <T> Optional<T> find(List<T> all, Predicate<T> wanted) {
		return all.stream().filter(wanted).findFirst();
	}
}
