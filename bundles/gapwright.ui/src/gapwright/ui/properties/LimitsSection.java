package gapwright.ui.properties;

import static gapwright.model.GapwrightPackage.Literals.LIMITS__NEAR_FRACTION;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Composite;

import gapwright.model.Design;
import gapwright.model.edit.DesignEdits;
import gapwright.ui.fields.FeatureForm;
import gapwright.ui.fields.FormLayouts;

/** From where on a leg of the design counts as near saturation. */
public final class LimitsSection extends ElementSection {

	private Button own;
	private FeatureForm form;
	private Design design;

	@Override
	void build(Composite into) {
		into.setLayout(FormLayouts.grid(1));
		own = new Button(into, SWT.CHECK);
		own.setText("This design has a limit of its own (else near from 80 % of saturation)");
		own.addListener(SWT.Selection, event -> run(DesignEdits.limits(design, own.getSelection())));
		Composite fields = new Composite(into, SWT.NONE);
		fields.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
		form = new FeatureForm(fields, runner()).add(LIMITS__NEAR_FRACTION);
	}

	@Override
	void show(EObject next) {
		design = (Design) next;
		own.setSelection(design != null && design.getLimits() != null);
		form.bind(design == null ? null : design.getLimits());
	}
}
