package gapwright.ui.views;

import org.eclipse.ui.IFolderLayout;
import org.eclipse.ui.IPageLayout;
import org.eclipse.ui.IPerspectiveFactory;

/** Files left, the editor in the middle with ledgers and problems below, outline and properties right. */
public final class DesignPerspective implements IPerspectiveFactory {

	@Override
	public void createInitialLayout(IPageLayout layout) {
		String editor = layout.getEditorArea();
		layout.addView(IPageLayout.ID_PROJECT_EXPLORER, IPageLayout.LEFT, 0.16f, editor);
		layout.addView(IPageLayout.ID_OUTLINE, IPageLayout.RIGHT, 0.68f, editor);
		layout.addView(IPageLayout.ID_PROP_SHEET, IPageLayout.BOTTOM, 0.35f, IPageLayout.ID_OUTLINE);
		IFolderLayout below = layout.createFolder("below", IPageLayout.BOTTOM, 0.62f, editor);
		below.addView(LegLedger.ID);
		below.addView(WindingLedger.ID);
		below.addView(BiasSweepView.ID);
		below.addView(SensitivityView.ID);
		below.addView(ToleranceView.ID);
		below.addView(IPageLayout.ID_PROBLEM_VIEW);
		layout.addShowViewShortcut(LegLedger.ID);
		layout.addShowViewShortcut(WindingLedger.ID);
		layout.addShowViewShortcut(BiasSweepView.ID);
		layout.addShowViewShortcut(SensitivityView.ID);
		layout.addShowViewShortcut(ToleranceView.ID);
		layout.addNewWizardShortcut("gapwright.ui.wizards.newDesign");
	}
}
