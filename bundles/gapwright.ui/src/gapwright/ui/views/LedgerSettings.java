package gapwright.ui.views;

import org.eclipse.jface.dialogs.IDialogSettings;
import org.eclipse.ui.PlatformUI;
import org.osgi.framework.FrameworkUtil;

/** Where the ledgers remember their column widths between sessions of the workbench. */
final class LedgerSettings {

	private LedgerSettings() {
	}

	static IDialogSettings of(String ledger) {
		IDialogSettings all = PlatformUI.getDialogSettingsProvider(FrameworkUtil.getBundle(LedgerSettings.class)).getDialogSettings();
		String key = "ledger." + ledger;
		IDialogSettings section = all.getSection(key);
		return section == null ? all.addNewSection(key) : section;
	}
}
