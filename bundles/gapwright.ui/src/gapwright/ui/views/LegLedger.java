package gapwright.ui.views;

import java.util.List;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.ui.PlatformUI;

import gapwright.model.Coil;
import gapwright.model.Leg;
import gapwright.ui.session.DesignSession;

/** View: every leg against its saturation. */
public final class LegLedger extends DesignView {

	public static final String ID = "gapwright.ui.views.legLedger";

	private LedgerTable<LegRow> table;

	@Override
	String subject() {
		return "its legs against saturation";
	}

	@Override
	void createContent(Composite parent) {
		PlatformUI.getWorkbench().getHelpSystem().setHelp(parent, "gapwright.help.legLedger");
		table = new LedgerTable<>(parent, LegColumns.all(), LedgerSettings.of("legs"));
		table.control().setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
		table.onSelect(rows -> publish(rows.stream().map(LegRow::leg).toList()));
		new StatePainter(table, LegColumns.STATE, LegColumns.UTILISATION);
	}

	@Override
	void showResult(DesignSession shown) {
		table.show(LegRow.of(shown.design(), shown.pointResult(), shown.pointBands()));
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
	}

	@Override
	void copy(boolean all) {
		if (all) {
			table.copyAll();
		} else {
			table.copy();
		}
	}

	@Override
	void select(List<EObject> elements) {
		List<Leg> legs = elements.stream().map(LegLedger::leg).filter(leg -> leg != null).distinct().toList();
		table.select(table.rows().stream().filter(row -> legs.contains(row.leg())).toList());
	}

	/** The leg that an element is, lies in or goes round. */
	private static Leg leg(EObject element) {
		if (element instanceof Coil coil) {
			return coil.getLeg();
		}
		return element instanceof Leg leg ? leg : element.eContainer() instanceof Leg around ? around : null;
	}

	@Override
	public void setFocus() {
		table.control().setFocus();
	}
}
