package gapwright.ui.views;

import java.util.Comparator;
import java.util.List;
import java.util.Locale;

import gapwright.ui.fields.FigureFormat;

/** The columns of the Leg ledger. */
final class LegColumns {

	/** Places of the columns that are drawn, in the list below. */
	static final int STATE = 1;
	static final int UTILISATION = 2;

	private LegColumns() {
	}

	static List<LedgerColumn<LegRow>> all() {
		return List.of(
				LedgerColumn.words("Leg", "Name of the leg, else its id", 130, LegRow::name),
				new LedgerColumn<>("State", "State", "", "within, near or over saturation at the ripple's peak; unknown where the material states no saturation",
						100, false, LegColumns::state, LegColumns::state, Comparator.comparing(row -> row.result().state())),
				LedgerColumn.figures("Of saturation", "1", "Largest flux density within the ripple over the saturation used", 150,
						row -> row.result().utilisation(), FigureFormat::percent),
				LedgerColumn.figures("Peak B", "T", "Largest flux density within the ripple", 80,
						row -> row.result().peakFluxDensity(), FigureFormat::fluxDensity),
				LedgerColumn.figures("Saturation", "T", "Of the material at the temperature of the operating point", 85,
						row -> row.result().saturation(), FigureFormat::fluxDensity),
				LedgerColumn.figures("Least use", "1", "Of saturation, at the best corner of all tolerances; run them in the Tolerances view", 80,
						LegRow::least, FigureFormat::percent),
				LedgerColumn.figures("Worst use", "1", "Of saturation, at the worst corner of all tolerances; run them in the Tolerances view", 80,
						LegRow::worst, FigureFormat::percent),
				LedgerColumn.figures("Chance over", "1", "Share of the samples of the Tolerances view that are at or over saturation", 85,
						LegRow::overProbability, FigureFormat::percent),
				LedgerColumn.figures("B", "T", "Flux density in the iron at the mean current: flux over area times stacking factor", 80,
						row -> row.result().fluxDensity(), FigureFormat::fluxDensity),
				LedgerColumn.figures("Φ", "Wb", "Flux at the mean current, positive from the leg's start to its end", 90,
						row -> row.result().flux(), value -> FigureFormat.si(value, "Wb")),
				LedgerColumn.figures("H", "A/m", "Field strength in the iron at the mean current", 90,
						row -> row.result().fieldStrength(), value -> FigureFormat.si(value, "A/m")),
				LedgerColumn.figures("MMF drop", "A", "Magnetomotive force used up along the iron alone, H times length", 90,
						row -> row.result().mmfDrop(), value -> FigureFormat.si(value, "A")),
				LedgerColumn.words("Material", "What the leg is made of", 160, LegRow::material));
	}

	private static String state(LegRow row) {
		return row.result().state().name().toLowerCase(Locale.ROOT);
	}
}
