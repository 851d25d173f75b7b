package gapwright.ui.pages;

import static gapwright.model.GapwrightPackage.Literals.CURRENT_DRIVE__CURRENT;
import static gapwright.model.GapwrightPackage.Literals.CURRENT_DRIVE__RIPPLE;
import static gapwright.model.GapwrightPackage.Literals.VOLTAGE_DRIVE__BIAS;
import static gapwright.model.GapwrightPackage.Literals.VOLTAGE_DRIVE__ON_TIME;
import static gapwright.model.GapwrightPackage.Literals.VOLTAGE_DRIVE__VOLTAGE;
import static gapwright.model.GapwrightPackage.Literals.VOLTAGE_DRIVE__WAVEFORM;

import java.util.ArrayList;
import java.util.List;

import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;

import gapwright.model.Drive;
import gapwright.model.OperatingPoint;
import gapwright.model.Winding;
import gapwright.ui.fields.Accessibles;
import gapwright.ui.fields.FeatureForm;
import gapwright.ui.fields.FeatureText;
import gapwright.ui.fields.FormLayouts;
import gapwright.ui.fields.Headings;

/** What each winding is connected to at one operating point: a block for every winding of the design, driven or not. */
final class DriveRows {

	private static final int NAME_WIDTH = 110;

	private final Composite parent;
	private final MasterDetailPage page;
	private final List<Block> blocks = new ArrayList<>();
	private OperatingPoint point;

	DriveRows(Composite parent, MasterDetailPage page) {
		this.parent = parent;
		this.page = page;
		GridLayout grid = new GridLayout(1, false);
		grid.marginWidth = 0;
		parent.setLayout(grid);
	}

	void show(OperatingPoint next) {
		point = next;
		List<Winding> windings = page.session().design().getWindings();
		if (!blocks.stream().map(block -> block.winding).toList().equals(windings) || blocks.isEmpty()) {
			rebuild(windings);
		}
		blocks.forEach(Block::show);
	}

	private void rebuild(List<Winding> windings) {
		for (var child : parent.getChildren()) {
			child.dispose();
		}
		blocks.clear();
		if (windings.isEmpty()) {
			Headings.note(parent, "There is no winding to drive. Add one on the Windings page.", 1);
		}
		windings.forEach(winding -> blocks.add(new Block(winding)));
		FormLayouts.relayout(parent);
	}

	/** @return the drive of a winding at the operating point shown, or null */
	private Drive driveOf(Winding winding) {
		return point.getDrives().stream().filter(drive -> drive.getWinding() == winding).findFirst().orElse(null);
	}

	private final class Block {

		private final Winding winding;
		private final Label name;
		private final Combo kind;
		private final FeatureForm form;

		Block(Winding winding) {
			this.winding = winding;
			Composite area = new Composite(parent, SWT.NONE);
			area.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
			area.setLayout(new GridLayout(3, false));
			name = new Label(area, SWT.NONE);
			GridData narrow = new GridData(SWT.BEGINNING, SWT.CENTER, false, false);
			narrow.widthHint = NAME_WIDTH;
			name.setLayoutData(narrow);
			kind = new Combo(area, SWT.READ_ONLY);
			for (DriveKind each : DriveKind.values()) {
				kind.add(each.label());
			}
			kind.setLayoutData(new GridData(SWT.FILL, SWT.CENTER, false, false));
			kind.addListener(SWT.Selection, event -> connect());
			Accessibles.name(kind, "Drive");
			Composite fields = new Composite(area, SWT.NONE);
			fields.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
			form = new FeatureForm(fields, page.runner(), 3).add(CURRENT_DRIVE__CURRENT, CURRENT_DRIVE__RIPPLE, VOLTAGE_DRIVE__VOLTAGE,
					VOLTAGE_DRIVE__ON_TIME, VOLTAGE_DRIVE__BIAS, VOLTAGE_DRIVE__WAVEFORM);
		}

		private void connect() {
			DriveKind wanted = DriveKind.values()[kind.getSelectionIndex()];
			if (wanted != DriveKind.of(driveOf(winding))) {
				page.run(wanted.connect(point, winding));
			}
		}

		void show() {
			Drive drive = driveOf(winding);
			name.setText(FeatureText.name(winding));
			kind.select(DriveKind.of(drive).ordinal());
			GridData data = (GridData) form.control().getLayoutData();
			if (data.exclude != (drive == null)) {
				data.exclude = drive == null;
				form.control().setVisible(drive != null);
				FormLayouts.relayout(parent);
			}
			form.bind(drive);
		}
	}
}
