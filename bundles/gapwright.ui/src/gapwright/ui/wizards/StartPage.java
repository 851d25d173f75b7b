package gapwright.ui.wizards;

import java.util.List;

import org.eclipse.jface.wizard.WizardPage;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableItem;
import org.eclipse.swt.widgets.Text;
import org.eclipse.ui.PlatformUI;

import gapwright.study.Cautions;
import gapwright.ui.fields.Accessibles;

/** First page: what to start from, and the cautions of the trade. */
final class StartPage extends WizardPage {

	private final List<Start> starts = Start.all();
	private Table table;
	private Label summary;
	private DesignPicture picture;

	StartPage() {
		super("start");
		setTitle("New Gapwright design");
		setDescription("Choose a core to start from. Every dimension can be changed later.");
	}

	@Override
	public void createControl(Composite parent) {
		Composite area = new Composite(parent, SWT.NONE);
		area.setLayout(new GridLayout(2, false));
		createChoice(area);
		createPicture(area);
		createCautions(area);
		setControl(area);
		PlatformUI.getWorkbench().getHelpSystem().setHelp(area, "gapwright.help.newDesign");
		table.setSelection(0);
		chosen();
	}

	private void createChoice(Composite area) {
		table = new Table(area, SWT.SINGLE | SWT.BORDER | SWT.FULL_SELECTION | SWT.V_SCROLL);
		GridData data = new GridData(SWT.FILL, SWT.FILL, false, true);
		data.widthHint = 350;
		data.heightHint = 9 * table.getItemHeight();
		table.setLayoutData(data);
		Accessibles.name(table, "Start from");
		for (Start start : starts) {
			new TableItem(table, SWT.NONE).setText((start.isExample() ? "Example: " : "") + start.title());
		}
		table.addListener(SWT.Selection, event -> chosen());
		table.addListener(SWT.DefaultSelection, event -> getContainer().showPage(getNextPage()));
	}

	private void createPicture(Composite area) {
		Composite right = new Composite(area, SWT.NONE);
		right.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
		right.setLayout(new GridLayout());
		picture = new DesignPicture(right);
		GridData data = new GridData(SWT.FILL, SWT.FILL, true, true);
		data.widthHint = 320;
		data.heightHint = 200;
		picture.setLayoutData(data);
		summary = new Label(right, SWT.WRAP);
		GridData wide = new GridData(SWT.FILL, SWT.BOTTOM, true, false);
		wide.widthHint = 320;
		wide.heightHint = 3 * table.getItemHeight();
		summary.setLayoutData(wide);
	}

	private void createCautions(Composite area) {
		Label label = new Label(area, SWT.NONE);
		label.setText("Before you build what you design here:");
		label.setLayoutData(new GridData(SWT.FILL, SWT.BOTTOM, true, false, 2, 1));
		Text cautions = new Text(area, SWT.MULTI | SWT.READ_ONLY | SWT.WRAP | SWT.V_SCROLL | SWT.BORDER);
		cautions.setText("•  " + String.join("\n•  ", Cautions.all()));
		GridData data = new GridData(SWT.FILL, SWT.FILL, true, false, 2, 1);
		data.widthHint = 760;
		data.heightHint = 13 * cautions.getLineHeight();
		cautions.setLayoutData(data);
		Accessibles.name(cautions, "Cautions");
	}

	private void chosen() {
		summary.setText(start().summary());
		picture.show(NewDesignWizard.standard(start()));
		((NewDesignWizard) getWizard()).starting(start());
	}

	Start start() {
		return starts.get(Math.max(0, table.getSelectionIndex()));
	}
}
