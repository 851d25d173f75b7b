package gapwright.ui.pages;

import java.util.ArrayList;
import java.util.List;

import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Text;

import gapwright.model.Material;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;
import gapwright.model.quantity.QuantityFormatException;
import gapwright.ui.fields.Accessibles;
import gapwright.ui.fields.FormLayouts;
import gapwright.ui.fields.ProblemLine;

/** The plot of a material with what it shows and at which temperatures; neither changes the design. */
final class PlotPart {

	private static final String HINT = "Temperatures to show, parted by commas, e.g. 25 °C, 100 °C; left empty: those the figures are given at.";

	private final Combo kind;
	private final Text temperatures;
	private final ProblemLine problem;
	private final Composite area;
	private final CurvePlot plot;
	private Material material;

	PlotPart(Composite parent) {
		area = parent;
		parent.setLayout(new GridLayout(2, false));
		kind = new Combo(parent, SWT.READ_ONLY);
		for (PlotKind each : PlotKind.values()) {
			kind.add(each.label());
		}
		kind.select(0);
		kind.setLayoutData(new GridData(SWT.FILL, SWT.CENTER, true, false, 2, 1));
		kind.addListener(SWT.Selection, event -> refresh());
		Accessibles.name(kind, "What the plot shows");
		Label at = new Label(parent, SWT.NONE);
		at.setText("at temperatures");
		temperatures = new Text(parent, SWT.BORDER);
		temperatures.setMessage("those given");
		temperatures.setToolTipText(HINT);
		temperatures.setLayoutData(new GridData(SWT.FILL, SWT.CENTER, true, false));
		temperatures.addListener(SWT.Modify, event -> refresh());
		Accessibles.name(temperatures, "Temperatures of the plot");
		problem = new ProblemLine(parent, 2);
		plot = new CurvePlot(parent);
		GridData wide = new GridData(SWT.FILL, SWT.TOP, true, false, 2, 1);
		wide.heightHint = 300;
		wide.widthHint = 240;
		plot.setLayoutData(wide);
	}

	void show(Material next) {
		material = next;
		refresh();
	}

	private void refresh() {
		List<Double> celsius = new ArrayList<>();
		String wrong = null;
		try {
			for (String each : temperatures.getText().split("[,;]")) {
				if (!each.isBlank()) {
					celsius.add(Quantity.parse(each, Dimension.TEMPERATURE).si());
				}
			}
		} catch (QuantityFormatException e) {
			wrong = e.getMessage();
		}
		if (problem.show(wrong)) {
			FormLayouts.relayout(area);
		}
		if (wrong == null) {
			plot.show(material, PlotKind.values()[kind.getSelectionIndex()], celsius);
		}
	}
}
