package gapwright.ui.pages;

import static gapwright.model.GapwrightPackage.Literals.STEINMETZ_LOSS__COEFFICIENT;
import static gapwright.model.GapwrightPackage.Literals.STEINMETZ_LOSS__FLUX_DENSITY_EXPONENT;
import static gapwright.model.GapwrightPackage.Literals.STEINMETZ_LOSS__FREQUENCY_EXPONENT;
import static gapwright.model.GapwrightPackage.Literals.STEINMETZ_LOSS__MAXIMUM_FREQUENCY;
import static gapwright.model.GapwrightPackage.Literals.STEINMETZ_LOSS__MINIMUM_FREQUENCY;
import static gapwright.model.GapwrightPackage.Literals.STEINMETZ_LOSS__TEMPERATURE;

import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Composite;

import gapwright.model.Material;
import gapwright.model.edit.MaterialEdits;
import gapwright.ui.fields.FeatureForm;
import gapwright.ui.fields.FormLayouts;

/** Core loss of a material: given or not, and its figures. */
final class LossPart {

	private final Button given;
	private final FeatureForm form;
	private Material material;

	LossPart(Composite parent, MasterDetailPage page) {
		parent.setLayout(FormLayouts.grid(1));
		given = new Button(parent, SWT.CHECK);
		given.setText("Loss figures are known");
		given.addListener(SWT.Selection, event -> page.run(MaterialEdits.loss(material, given.getSelection())));
		Composite fields = new Composite(parent, SWT.NONE);
		fields.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
		form = new FeatureForm(fields, page.runner()).add(STEINMETZ_LOSS__COEFFICIENT, STEINMETZ_LOSS__FREQUENCY_EXPONENT,
				STEINMETZ_LOSS__FLUX_DENSITY_EXPONENT, STEINMETZ_LOSS__MINIMUM_FREQUENCY, STEINMETZ_LOSS__MAXIMUM_FREQUENCY,
				STEINMETZ_LOSS__TEMPERATURE);
	}

	void show(Material next) {
		material = next;
		boolean known = material.getLoss() != null;
		given.setSelection(known);
		if (((GridData) form.control().getLayoutData()).exclude == known) {
			FormLayouts.show(form.control(), known);
			FormLayouts.relayout(form.control());
		}
		form.bind(material.getLoss());
	}
}
