package gapwright.ui.pages;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.jface.viewers.LabelProvider;
import org.eclipse.jface.window.Window;
import org.eclipse.swt.widgets.Shell;
import org.eclipse.ui.dialogs.ElementListSelectionDialog;

import gapwright.library.StockMaterials;
import gapwright.model.Material;
import gapwright.ui.fields.FeatureText;

/** Chooses a material of the library, with a filter to type in. */
final class StockMaterialDialog {

	private StockMaterialDialog() {
	}

	/** @return a material that belongs to no design yet, or null when the dialog was cancelled */
	static Material pick(Shell shell) {
		ElementListSelectionDialog dialog = new ElementListSelectionDialog(shell, new LabelProvider() {
			@Override
			public String getText(Object material) {
				return FeatureText.name((EObject) material) + source((Material) material);
			}
		});
		dialog.setTitle("Material from the library");
		dialog.setMessage("Figures of the library are indicative classes: replace them by the maker's data.\nType to narrow the list:");
		dialog.setMultipleSelection(false);
		dialog.setSize(90, 18);
		dialog.setElements(StockMaterials.all().toArray());
		return dialog.open() == Window.OK ? (Material) dialog.getFirstResult() : null;
	}

	private static String source(Material material) {
		return material.getSource() == null ? "" : "   " + material.getSource().strip().replaceAll("\\s+", " ");
	}
}
