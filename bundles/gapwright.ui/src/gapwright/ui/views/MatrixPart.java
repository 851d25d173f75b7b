package gapwright.ui.views;

import java.util.HashMap;
import java.util.List;
import java.util.Map;

import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.FillLayout;
import org.eclipse.swt.widgets.Composite;

import gapwright.study.InductanceMatrix;
import gapwright.ui.fields.Accessibles;

/** The matrix of differential inductances; its columns change with the windings of the design. */
final class MatrixPart {

	private final Composite area;
	private LedgerTable<MatrixRow> table;
	private List<String> shownNames = List.of();

	MatrixPart(Composite parent) {
		area = new Composite(parent, SWT.NONE);
		area.setLayout(new FillLayout());
	}

	/** @param rows of the windings of the design, for their names */
	void show(List<WindingRow> rows, InductanceMatrix matrix) {
		Map<String, String> names = new HashMap<>();
		rows.forEach(row -> names.put(row.winding().getId(), row.name()));
		List<String> inOrder = matrix.windings().stream().map(id -> names.getOrDefault(id, id)).toList();
		if (table == null || !inOrder.equals(shownNames)) {
			rebuild(inOrder);
		}
		table.show(MatrixRow.of(matrix, inOrder));
	}

	private void rebuild(List<String> names) {
		if (table != null) {
			table.control().dispose();
		}
		shownNames = names;
		table = new LedgerTable<>(area, MatrixRow.columns(names), LedgerSettings.of("matrix"));
		Accessibles.name(table.control(), "Inductance matrix");
		area.layout();
	}

	void clear() {
		if (table != null) {
			table.show(List.of());
		}
	}

	boolean hasFocus() {
		return table != null && table.control().isFocusControl();
	}

	void copy() {
		table.copyAll();
	}
}
