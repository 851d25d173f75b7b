package gapwright.ui.views;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;

import gapwright.study.InductanceMatrix;
import gapwright.ui.fields.FigureFormat;

/** One line of the inductance matrix. Two rows are equal when they are about the same winding. */
record MatrixRow(String id, String name, int index, InductanceMatrix matrix) {

	/** @param names of the windings, in the matrix's order */
	static List<MatrixRow> of(InductanceMatrix matrix, List<String> names) {
		List<MatrixRow> rows = new ArrayList<>();
		for (int k = 0; k < names.size(); k++) {
			rows.add(new MatrixRow(matrix.windings().get(k), names.get(k), k, matrix));
		}
		return rows;
	}

	static List<LedgerColumn<MatrixRow>> columns(List<String> names) {
		List<LedgerColumn<MatrixRow>> columns = new ArrayList<>();
		columns.add(LedgerColumn.words("Differential L", "Slope of the row's linkage over the column's current", 90, MatrixRow::name));
		for (int k = 0; k < names.size(); k++) {
			int other = k;
			columns.add(new LedgerColumn<>("matrix", names.get(k), "H", "Per ampere in " + names.get(k) + "; k is the coupling, its sign tells aiding or opposing",
					130, true, row -> row.shown(other), row -> Double.toString(row.inductance(other)),
					(a, b) -> Double.compare(a.inductance(other), b.inductance(other))));
		}
		return columns;
	}

	private String shown(int other) {
		String own = FigureFormat.si(inductance(other), "H");
		double coupling = coupling(other);
		return other == index || Double.isNaN(coupling) ? own : own + "  k " + FigureFormat.plain(coupling);
	}

	double inductance(int other) {
		return matrix.differential()[index][other];
	}

	/** L₁₂/√(L₁₁L₂₂), −1 to 1; NaN where a winding has no inductance of its own. */
	double coupling(int other) {
		double[][] l = matrix.differential();
		double own = l[index][index] * l[other][other];
		return own > 0 ? l[index][other] / Math.sqrt(own) : Double.NaN;
	}

	@Override
	public boolean equals(Object other) {
		return other instanceof MatrixRow row && row.id.equals(id);
	}

	@Override
	public int hashCode() {
		return Objects.hashCode(id);
	}
}
