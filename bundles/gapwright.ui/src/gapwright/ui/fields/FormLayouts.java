package gapwright.ui.fields;

import org.eclipse.swt.custom.ScrolledComposite;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Shell;

/** Measures shared by all forms, and the new layout of a form whose rows came or went. */
public final class FormLayouts {

	/** Narrower than this a form page scrolls sideways, px. */
	private static final int NARROWEST = 420;

	/** Room left of a field for its mark. */
	static final int MARK = 10;

	private FormLayouts() {
	}

	/** A grid with room for the marks between its columns. */
	public static GridLayout grid(int columns) {
		GridLayout grid = new GridLayout(columns, false);
		grid.horizontalSpacing = MARK;
		grid.verticalSpacing = 5;
		grid.marginWidth = 2;
		return grid;
	}

	/** Hides a control and gives its room away, or shows it again. */
	public static void show(Control control, boolean visible) {
		GridData data = (GridData) control.getLayoutData();
		data.exclude = !visible;
		control.setVisible(visible);
	}

	/** Lays out anew up to the scrolled page round the form, whose scroll bars follow. */
	public static void relayout(Composite changed) {
		Composite page = changed;
		while (!(page.getParent() instanceof ScrolledComposite) && page.getParent() != null && !(page.getParent() instanceof Shell)) {
			page = page.getParent();
		}
		page.layout(true, true);
		if (page.getParent() instanceof ScrolledComposite scrolled) {
			int width = Math.max(NARROWEST, scrolled.getClientArea().width);
			scrolled.setMinSize(NARROWEST, page.computeSize(width, -1).y);
		}
	}
}
