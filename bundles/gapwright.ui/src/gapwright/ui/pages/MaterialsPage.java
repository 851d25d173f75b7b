package gapwright.ui.pages;

import static gapwright.model.GapwrightPackage.Literals.ELEMENT__ID;
import static gapwright.model.GapwrightPackage.Literals.ELEMENT__NAME;
import static gapwright.model.GapwrightPackage.Literals.MATERIAL__DENSITY;
import static gapwright.model.GapwrightPackage.Literals.MATERIAL__SOURCE;
import static gapwright.model.GapwrightPackage.Literals.SATURATION__FLUX_DENSITY;
import static gapwright.model.GapwrightPackage.Literals.SATURATION__TEMPERATURE;

import java.util.List;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.ui.PlatformUI;

import gapwright.model.Design;
import gapwright.model.Material;
import gapwright.model.edit.DesignEdits;
import gapwright.model.edit.MaterialEdits;
import gapwright.ui.fields.ElementRows;
import gapwright.ui.fields.FeatureForm;
import gapwright.ui.fields.FeatureText;
import gapwright.ui.fields.Headings;
import gapwright.ui.session.DesignSession;

/** The materials of the design, copied in, so that the file stands alone. */
public final class MaterialsPage extends MasterDetailPage {

	private FeatureForm form;
	private CurvePart curve;
	private ElementRows saturations;
	private LossPart loss;

	public MaterialsPage(Composite parent, DesignSession session) {
		super(parent, session, "Materials", "This design has no material yet. Take one from the library or add your own.");
		PlatformUI.getWorkbench().getHelpSystem().setHelp(this, "gapwright.help.materialsPage");
		start();
	}

	@Override
	List<? extends EObject> elements(Design design) {
		return design.getMaterials();
	}

	@Override
	String label(EObject element) {
		return FeatureText.name(element);
	}

	@Override
	void createButtons(MasterList into) {
		into.button("From library…", "Copy a material of the library into this design", this::addFromLibrary);
		into.button("Add", "Add a material of your own", () -> add(MaterialEdits.add(session().design())));
		into.button("Remove", "Remove the chosen material; legs made of it are left without one", () -> {
			if (chosen() != null) {
				run(DesignEdits.delete(List.of(chosen())));
			}
		});
	}

	private void addFromLibrary() {
		Material picked = StockMaterialDialog.pick(getShell());
		if (picked != null) {
			add(MaterialEdits.addCopy(session().design(), picked));
		}
	}

	@Override
	void createDetails(Composite into) {
		form = new FeatureForm(Headings.part(into, "Material", ""), runner())
				.add(ELEMENT__NAME, ELEMENT__ID, MATERIAL__DENSITY, MATERIAL__SOURCE);
		curve = new CurvePart(Headings.part(into, "Curve", ""), this);
		saturations = new ElementRows(Headings.part(into, "Saturation", "What a leg is judged against; between temperatures on a straight line, beyond them the end value and a note."),
				runner(), List.of(SATURATION__TEMPERATURE, SATURATION__FLUX_DENSITY), point -> "saturation",
				point -> run(DesignEdits.remove("Remove saturation", point)));
		Button add = new Button(into, SWT.PUSH);
		add.setText("Add saturation");
		add.addListener(SWT.Selection, event -> run(MaterialEdits.addSaturation((Material) chosen())));
		loss = new LossPart(Headings.part(into, "Core loss", "Per volume, k·f^α·B^β in W/m³ with f in Hz and peak B in T, for a sine without bias."), this);
	}

	@Override
	void showDetails(EObject element) {
		Material material = (Material) element;
		form.bind(material);
		curve.show(material);
		saturations.show(material.getSaturations());
		loss.show(material);
	}
}
