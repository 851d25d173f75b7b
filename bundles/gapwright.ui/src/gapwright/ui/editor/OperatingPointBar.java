package gapwright.ui.editor;

import java.util.List;

import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;

import gapwright.model.OperatingPoint;
import gapwright.ui.fields.Accessibles;
import gapwright.ui.fields.FeatureText;
import gapwright.ui.session.DesignSession;

/** Stands above the pages of the editor: chooses the operating point and says in one line how the design fares there. */
final class OperatingPointBar {

	private final Composite area;
	private final Combo points;
	private final Label summary;
	private DesignSession session;

	OperatingPointBar(Composite parent) {
		area = new Composite(parent, SWT.NONE);
		area.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
		GridLayout grid = new GridLayout(3, false);
		grid.marginWidth = 10;
		area.setLayout(grid);
		new Label(area, SWT.NONE).setText("Operating point");
		points = new Combo(area, SWT.READ_ONLY);
		GridData wide = new GridData(SWT.BEGINNING, SWT.CENTER, false, false);
		wide.widthHint = 240;
		points.setLayoutData(wide);
		points.setToolTipText("Canvas, ledgers and Properties show the design at this operating point");
		points.addListener(SWT.Selection, event -> choose());
		Accessibles.name(points, "Operating point");
		summary = new Label(area, SWT.NONE);
		summary.setLayoutData(new GridData(SWT.FILL, SWT.CENTER, true, false));
	}

	void show(DesignSession next) {
		session = next;
		session.addListener(this::refresh);
		session.history().addListener(this::refresh);
		((GridData) area.getLayoutData()).exclude = false;
		area.setVisible(true);
		area.getParent().layout();
		refresh();
	}

	/** There is no design to say anything about. */
	void hide() {
		((GridData) area.getLayoutData()).exclude = true;
		area.setVisible(false);
		area.getParent().layout();
	}

	private void choose() {
		session.choose(session.design().getOperatingPoints().get(points.getSelectionIndex()));
	}

	private void refresh() {
		if (area.isDisposed()) {
			return;
		}
		List<OperatingPoint> all = session.design().getOperatingPoints();
		String[] labels = all.stream().map(OperatingPointBar::label).toArray(String[]::new);
		if (!List.of(labels).equals(List.of(points.getItems()))) {
			points.setItems(labels);
		}
		int index = session.operatingPoint() == null ? -1 : all.indexOf(session.operatingPoint());
		if (index >= 0 && index != points.getSelectionIndex()) {
			points.select(index);
		}
		points.setEnabled(all.size() > 1);
		String text = PointSummary.of(session);
		if (!text.equals(summary.getText())) {
			summary.setText(text);
			summary.setToolTipText(text);
		}
	}

	private static String label(OperatingPoint point) {
		return FeatureText.name(point) + (point.getTemperature() == null ? "" : ", " + point.getTemperature());
	}
}
