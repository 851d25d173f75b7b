package gapwright.ui.pages;

import static gapwright.model.GapwrightPackage.Literals.COIL__LEG;
import static gapwright.model.GapwrightPackage.Literals.COIL__REVERSED;
import static gapwright.model.GapwrightPackage.Literals.COIL__TURNS;
import static gapwright.model.GapwrightPackage.Literals.ELEMENT__ID;
import static gapwright.model.GapwrightPackage.Literals.ELEMENT__NAME;
import static gapwright.model.GapwrightPackage.Literals.WINDING__RESISTANCE;
import static gapwright.model.GapwrightPackage.Literals.WINDING__WIRE;

import java.util.List;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.ui.PlatformUI;

import gapwright.model.Coil;
import gapwright.model.Design;
import gapwright.model.Leg;
import gapwright.model.Winding;
import gapwright.model.edit.DesignEdits;
import gapwright.model.edit.WindingEdits;
import gapwright.ui.fields.ElementRows;
import gapwright.ui.fields.FeatureForm;
import gapwright.ui.fields.FeatureText;
import gapwright.ui.fields.Headings;
import gapwright.ui.session.DesignSession;

/** Windings with their coils. */
public final class WindingsPage extends MasterDetailPage {

	private FeatureForm form;
	private ElementRows coils;
	private Button addCoil;

	public WindingsPage(Composite parent, DesignSession session) {
		super(parent, session, "Windings", "This design has no winding yet. Add one here, or draw a coil on the canvas.");
		PlatformUI.getWorkbench().getHelpSystem().setHelp(this, "gapwright.help.windingsPage");
		start();
	}

	@Override
	List<? extends EObject> elements(Design design) {
		return design.getWindings();
	}

	@Override
	String label(EObject element) {
		int turns = ((Winding) element).getCoils().stream().mapToInt(Coil::getTurns).sum();
		return FeatureText.name(element) + "   " + turns + (turns == 1 ? " turn" : " turns");
	}

	@Override
	void createButtons(MasterList into) {
		into.button("Add", "Add a winding", () -> add(WindingEdits.add(session().design(), firstLeg(), 1)));
		into.button("Remove", "Remove the chosen winding with its coils and drives", () -> remove(chosen()));
	}

	/** Where a new coil goes until another leg is chosen; null without any leg. */
	private Leg firstLeg() {
		List<Leg> legs = session().design().getLegs();
		return legs.isEmpty() ? null : legs.get(0);
	}

	private void remove(EObject element) {
		if (element != null) {
			run(DesignEdits.delete(List.of(element)));
		}
	}

	@Override
	void createDetails(Composite into) {
		form = new FeatureForm(Headings.part(into, "Winding", ""), runner())
				.add(ELEMENT__NAME, ELEMENT__ID, WINDING__WIRE, WINDING__RESISTANCE);
		Composite part = Headings.part(into, "Coils", "In series, carrying one current. A coil of opposing sense drives flux towards its leg's start.");
		coils = new ElementRows(part, runner(), List.of(COIL__LEG, COIL__TURNS, COIL__REVERSED), FeatureText::name, this::remove);
		addCoil = new Button(into, SWT.PUSH);
		addCoil.setText("Add coil");
		addCoil.addListener(SWT.Selection, event -> run(WindingEdits.addCoil((Winding) chosen(), firstLeg(), 1)));
	}

	@Override
	void showDetails(EObject element) {
		form.bind(element);
		coils.show(((Winding) element).getCoils());
		addCoil.setEnabled(!session().design().getLegs().isEmpty());
		addCoil.setToolTipText(addCoil.isEnabled() ? "Add a coil on a leg" : "A coil goes round a leg: draw a leg first");
	}
}
