package gapwright.ui.views;

import java.util.List;

import gapwright.ui.fields.FigureFormat;

/** The columns of the Winding ledger. */
final class WindingColumns {

	private WindingColumns() {
	}

	static List<LedgerColumn<WindingRow>> all() {
		return List.of(
				LedgerColumn.words("Winding", "Name of the winding, else its id", 85, WindingRow::name),
				LedgerColumn.figures("Turns", "1", "Of all its coils together", 50, WindingRow::turns,
						turns -> Integer.toString(turns.intValue())),
				LedgerColumn.figures("Current", "A", "Mean current at the operating point", 75,
						row -> row.result().current(), value -> FigureFormat.si(value, "A")),
				LedgerColumn.figures("Linkage", "Wb", "Sum of turns times flux, each coil with its sense", 85,
						row -> row.result().linkage(), value -> FigureFormat.si(value, "Wb")),
				LedgerColumn.figures("Apparent L", "H",
						"Linkage over current; there is one only where this winding alone carries current and no magnet acts", 85,
						row -> row.result().apparentInductance(), value -> FigureFormat.si(value, "H")),
				LedgerColumn.figures("Differential L", "H",
						"Slope of the linkage over the winding's own current at the operating point; what the ripple sees", 100,
						WindingRow::differentialInductance, value -> FigureFormat.si(value, "H")),
				LedgerColumn.figures("Least L", "H", "Least differential inductance over all corners of the tolerances; run them in the Tolerances view", 80,
						WindingRow::least, value -> FigureFormat.si(value, "H")),
				LedgerColumn.figures("Greatest L", "H", "Greatest differential inductance over all corners of the tolerances", 85,
						WindingRow::greatest, value -> FigureFormat.si(value, "H")));
	}
}
