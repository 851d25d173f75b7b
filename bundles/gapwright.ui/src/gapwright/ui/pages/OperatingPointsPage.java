package gapwright.ui.pages;

import static gapwright.model.GapwrightPackage.Literals.ELEMENT__ID;
import static gapwright.model.GapwrightPackage.Literals.ELEMENT__NAME;
import static gapwright.model.GapwrightPackage.Literals.OPERATING_POINT__FREQUENCY;
import static gapwright.model.GapwrightPackage.Literals.OPERATING_POINT__TEMPERATURE;

import java.util.List;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.ui.PlatformUI;

import gapwright.model.Design;
import gapwright.model.OperatingPoint;
import gapwright.model.edit.DesignEdits;
import gapwright.model.edit.OperatingPointEdits;
import gapwright.ui.fields.FeatureForm;
import gapwright.ui.fields.FeatureText;
import gapwright.ui.fields.Headings;
import gapwright.ui.session.DesignSession;

/** The conditions the design is judged at, with what drives each winding. */
public final class OperatingPointsPage extends MasterDetailPage {

	private FeatureForm form;
	private DriveRows drives;

	public OperatingPointsPage(Composite parent, DesignSession session) {
		super(parent, session, "Operating points", "This design has no operating point yet, so nothing is computed. Add one.");
		PlatformUI.getWorkbench().getHelpSystem().setHelp(this, "gapwright.help.operatingPointsPage");
		start();
	}

	@Override
	List<? extends EObject> elements(Design design) {
		return design.getOperatingPoints();
	}

	@Override
	String label(EObject element) {
		return FeatureText.name(element);
	}

	@Override
	void createButtons(MasterList into) {
		into.button("Add", "Add an operating point", () -> add(OperatingPointEdits.add(session().design())));
		into.button("Duplicate", "Add a copy of the chosen operating point", () -> onChosen(true));
		into.button("Remove", "Remove the chosen operating point", () -> onChosen(false));
	}

	private void onChosen(boolean duplicate) {
		if (chosen() != null) {
			add(duplicate ? OperatingPointEdits.duplicate((OperatingPoint) chosen()) : DesignEdits.delete(List.of(chosen())));
		}
	}

	@Override
	void createDetails(Composite into) {
		form = new FeatureForm(Headings.part(into, "Operating point", ""), runner())
				.add(ELEMENT__NAME, ELEMENT__ID, OPERATING_POINT__TEMPERATURE, OPERATING_POINT__FREQUENCY);
		drives = new DriveRows(Headings.part(into, "Drives", "A winding that is not driven is open: it carries no current."), this);
	}

	@Override
	void showDetails(EObject element) {
		form.bind(element);
		drives.show((OperatingPoint) element);
	}
}
