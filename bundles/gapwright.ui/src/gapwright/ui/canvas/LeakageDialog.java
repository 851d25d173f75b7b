package gapwright.ui.canvas;

import java.util.List;
import java.util.function.IntFunction;

import org.eclipse.jface.dialogs.IDialogConstants;
import org.eclipse.jface.dialogs.IMessageProvider;
import org.eclipse.jface.dialogs.TitleAreaDialog;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Shell;
import org.eclipse.swt.widgets.Spinner;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableColumn;
import org.eclipse.swt.widgets.TableItem;
import org.eclipse.ui.PlatformUI;

import gapwright.study.leakage.FacingLegs;
import gapwright.study.leakage.LeakageEstimate;
import gapwright.study.leakage.WindowLeakage;
import gapwright.ui.fields.FigureFormat;

/** Shows the windows of a core with the air paths that would be added, and asks in how many pieces to cut the legs. */
final class LeakageDialog extends TitleAreaDialog {

	private static final String[] HEADS = { "Between", "And", "Height × distance", "Permeance", "Paths" };
	private static final int[] WIDTHS = { 120, 120, 140, 90, 330 };
	private static final int MOST_PIECES = 99;

	private final IntFunction<LeakageEstimate> estimates;
	private LeakageEstimate estimate;
	private int pieces = WindowLeakage.USUAL_PIECES;
	private Table table;

	/** @param estimates what is found for a number of pieces */
	LeakageDialog(Shell shell, IntFunction<LeakageEstimate> estimates) {
		super(shell);
		this.estimates = estimates;
		estimate = estimates.apply(pieces);
	}

	/** @return as last shown */
	LeakageEstimate estimate() {
		return estimate;
	}

	@Override
	protected void configureShell(Shell shell) {
		super.configureShell(shell);
		shell.setText("Leakage across windows");
		PlatformUI.getWorkbench().getHelpSystem().setHelp(shell, "gapwright.help.canvas");
	}

	@Override
	protected boolean isResizable() {
		return true;
	}

	@Override
	protected Control createDialogArea(Composite parent) {
		setTitle("Air paths for the leakage across windows");
		Composite area = new Composite((Composite) super.createDialogArea(parent), SWT.NONE);
		area.setLayout(new GridLayout(2, false));
		area.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
		new Label(area, SWT.NONE).setText("&Pieces each leg is cut in:");
		Spinner spinner = new Spinner(area, SWT.BORDER);
		spinner.setValues(pieces, 1, MOST_PIECES, 0, 1, 2);
		spinner.setToolTipText("1 leaves the legs as they are. An odd number keeps a gap half way along a leg in one piece.");
		spinner.addListener(SWT.Modify, event -> show(spinner.getSelection()));
		table = new Table(area, SWT.BORDER | SWT.FULL_SELECTION);
		table.setHeaderVisible(true);
		for (int k = 0; k < HEADS.length; k++) {
			TableColumn column = new TableColumn(table, SWT.NONE);
			column.setText(HEADS[k]);
			column.setWidth(WIDTHS[k]);
		}
		GridData fill = new GridData(SWT.FILL, SWT.FILL, true, true, 2, 1);
		fill.heightHint = 140;
		table.setLayoutData(fill);
		return area;
	}

	@Override
	protected void createButtonsForButtonBar(Composite parent) {
		createButton(parent, IDialogConstants.OK_ID, "Add", true);
		createButton(parent, IDialogConstants.CANCEL_ID, IDialogConstants.CANCEL_LABEL, false);
		show(pieces);
	}

	private void show(int wanted) {
		pieces = wanted;
		estimate = estimates.apply(wanted);
		table.removeAll();
		for (FacingLegs window : estimate.windows()) {
			int count = window.paths().size();
			new TableItem(table, SWT.NONE).setText(new String[] { String.join(", ", window.first()), String.join(", ", window.second()),
					FigureFormat.length(window.window().height()) + " × " + FigureFormat.length(window.window().distance()),
					FigureFormat.si(window.window().permeance(), "H"),
					count == 0 ? "none: " + window.reason() : count == 1 ? "1 path" : count + " paths" });
		}
		List<String> twice = estimate.windows().stream().filter(window -> !window.paths().isEmpty())
				.flatMap(window -> window.countedTwice().stream()).distinct().toList();
		if (estimate.windows().isEmpty()) {
			setMessage("No window found: two parallel legs, joined by bars at both ends, one of them with a coil.", IMessageProvider.WARNING);
		} else if (!twice.isEmpty()) {
			setMessage("The conformal gap " + String.join(", ", twice)
					+ " reckons the field of its window already. With these paths it counts twice, and the inductance reads high.",
					IMessageProvider.WARNING);
		} else {
			setMessage("An estimate from the sizes as drawn. The paths are ordinary air paths, to be changed or deleted like any other.");
		}
		getButton(IDialogConstants.OK_ID).setEnabled(!estimate.paths().isEmpty());
	}
}
