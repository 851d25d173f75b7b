package gapwright.ui.pages;

import static gapwright.model.GapwrightPackage.Literals.ELEMENT__ID;
import static gapwright.model.GapwrightPackage.Literals.ELEMENT__NAME;
import static gapwright.model.GapwrightPackage.Literals.INITIAL_PERMEABILITY__RELATIVE_PERMEABILITY;
import static gapwright.model.GapwrightPackage.Literals.INITIAL_PERMEABILITY__TEMPERATURE;
import static gapwright.model.GapwrightPackage.Literals.MATERIAL__CURIE_TEMPERATURE;
import static gapwright.model.GapwrightPackage.Literals.MATERIAL__DENSITY;
import static gapwright.model.GapwrightPackage.Literals.MATERIAL__SOURCE;
import static gapwright.model.GapwrightPackage.Literals.SATURATION__FLUX_DENSITY;
import static gapwright.model.GapwrightPackage.Literals.SATURATION__TEMPERATURE;

import java.util.List;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.jface.window.Window;
import org.eclipse.jface.wizard.WizardDialog;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.ui.PlatformUI;

import gapwright.library.material.MaterialFile;
import gapwright.model.Design;
import gapwright.model.Material;
import gapwright.model.edit.DesignEdits;
import gapwright.model.edit.MaterialEdits;
import gapwright.ui.fields.ElementRows;
import gapwright.ui.fields.FeatureForm;
import gapwright.ui.fields.FeatureText;
import gapwright.ui.fields.Headings;
import gapwright.ui.session.DesignSession;
import gapwright.ui.wizards.ImportMaterialWizard;

/** The materials of the design, copied in, so that the file stands alone. */
public final class MaterialsPage extends MasterDetailPage {

	private FeatureForm form;
	private CurvePart curve;
	private PlotPart plot;
	private ElementRows permeabilities;
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
		into.button("Import…", "Read a material from a " + MaterialFile.ENDING + " file", this::importMaterial);
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
				.add(ELEMENT__NAME, ELEMENT__ID, MATERIAL__DENSITY, MATERIAL__CURIE_TEMPERATURE, MATERIAL__SOURCE);
		Composite row = new Composite(into, SWT.NONE);
		row.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
		GridLayout grid = new GridLayout(2, false);
		grid.marginWidth = 0;
		grid.marginHeight = 0;
		grid.horizontalSpacing = 14;
		row.setLayout(grid);
		curve = new CurvePart(beside(Headings.part(row, "Curve", ""), 300), this);
		plot = new PlotPart(beside(Headings.part(row, "Plot", ""), 240));
		permeabilities = new ElementRows(Headings.part(into, "Initial permeability by temperature", "Replaces that of the curve; between temperatures on a straight line, beyond them the end value and a note."),
				runner(), List.of(INITIAL_PERMEABILITY__TEMPERATURE, INITIAL_PERMEABILITY__RELATIVE_PERMEABILITY), each -> "permeability",
				each -> run(DesignEdits.remove("Remove permeability", each)));
		button(into, "Add permeability", () -> run(MaterialEdits.addPermeability((Material) chosen())));
		saturations = new ElementRows(Headings.part(into, "Saturation", "What a leg is judged against; between temperatures on a straight line, beyond them the end value and a note."),
				runner(), List.of(SATURATION__TEMPERATURE, SATURATION__FLUX_DENSITY), point -> "saturation",
				point -> run(DesignEdits.remove("Remove saturation", point)));
		Composite buttons = new Composite(into, SWT.NONE);
		buttons.setLayout(new GridLayout(2, false));
		button(buttons, "Add saturation", () -> run(MaterialEdits.addSaturation((Material) chosen())));
		button(buttons, "Derive from the curve…", this::deriveSaturation)
				.setToolTipText("For want of a maker's figure: the flux density where the differential permeability has fallen to a fifth of its maximum");
		loss = new LossPart(Headings.part(into, "Core loss", "Per volume, k·f^α·B^β in W/m³ with f in Hz and peak B in T, for a sine without bias."), this);
	}

	/** @param width least of a part that stands beside another, px */
	private static Composite beside(Composite body, int width) {
		((GridData) body.getParent().getLayoutData()).widthHint = width;
		return body;
	}

	private static Button button(Composite parent, String text, Runnable action) {
		Button button = new Button(parent, SWT.PUSH);
		button.setText(text);
		button.addListener(SWT.Selection, event -> action.run());
		return button;
	}

	private void deriveSaturation() {
		DerivedSaturation.offer(getShell(), (Material) chosen(), this::run);
	}

	private void importMaterial() {
		ImportMaterialWizard wizard = new ImportMaterialWizard(session());
		WizardDialog dialog = new WizardDialog(getShell(), wizard);
		if (dialog.open() == Window.OK && wizard.imported() != null) {
			refresh();
			reveal(wizard.imported());
		}
	}

	@Override
	void showDetails(EObject element) {
		Material material = (Material) element;
		form.bind(material);
		curve.show(material);
		plot.show(material);
		permeabilities.show(material.getPermeabilities());
		saturations.show(material.getSaturations());
		loss.show(material);
	}
}
