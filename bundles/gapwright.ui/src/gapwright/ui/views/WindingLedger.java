package gapwright.ui.views;

import java.util.List;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.SashForm;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.ui.PlatformUI;

import gapwright.model.Winding;
import gapwright.ui.session.DesignSession;

/** View: every winding's current, linkage and inductance, and the inductance matrix. */
public final class WindingLedger extends DesignView {

	public static final String ID = "gapwright.ui.views.windingLedger";

	private LedgerTable<WindingRow> table;
	private MatrixPart matrix;

	@Override
	String subject() {
		return "the inductances of its windings";
	}

	@Override
	void createContent(Composite parent) {
		PlatformUI.getWorkbench().getHelpSystem().setHelp(parent, "gapwright.help.windingLedger");
		SashForm sash = new SashForm(parent, SWT.HORIZONTAL | SWT.SMOOTH);
		sash.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
		table = new LedgerTable<>(sash, WindingColumns.all(), LedgerSettings.of("windings"));
		table.onSelect(rows -> publish(rows.stream().map(WindingRow::winding).toList()));
		matrix = new MatrixPart(sash);
		sash.setWeights(60, 40);
	}

	@Override
	void showResult(DesignSession shown) {
		table.show(WindingRow.of(shown.design(), shown.pointResult(), shown.pointBands()));
		matrix.show(table.rows(), shown.pointResult().inductance());
	}

	@Override
	void showBands(DesignSession shown) {
		showResult(shown);
	}

	@Override
	String note() {
		return table.note();
	}

	@Override
	void clear() {
		table.show(List.of());
		matrix.clear();
	}

	@Override
	void copy(boolean all) {
		if (matrix.hasFocus()) {
			matrix.copy();
		} else if (all) {
			table.copyAll();
		} else {
			table.copy();
		}
	}

	@Override
	void select(List<EObject> elements) {
		List<Winding> windings = elements.stream().map(WindingLedger::winding).filter(winding -> winding != null).distinct().toList();
		table.select(table.rows().stream().filter(row -> windings.contains(row.winding())).toList());
	}

	private static Winding winding(EObject element) {
		return element instanceof Winding winding ? winding : element.eContainer() instanceof Winding owner ? owner : null;
	}

	@Override
	public void setFocus() {
		table.control().setFocus();
	}
}
