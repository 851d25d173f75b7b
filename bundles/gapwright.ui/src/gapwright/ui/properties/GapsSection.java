package gapwright.ui.properties;

import static gapwright.model.GapwrightPackage.Literals.GAP__FRINGING;
import static gapwright.model.GapwrightPackage.Literals.GAP__LENGTH;
import static gapwright.model.GapwrightPackage.Literals.GAP__PIECES;
import static gapwright.model.GapwrightPackage.Literals.MAGNET__LENGTH;
import static gapwright.model.GapwrightPackage.Literals.MAGNET__RECOIL_PERMEABILITY;
import static gapwright.model.GapwrightPackage.Literals.MAGNET__REMANENCE;
import static gapwright.model.GapwrightPackage.Literals.MAGNET__REVERSED;

import java.util.List;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Composite;

import gapwright.model.Leg;
import gapwright.model.edit.DesignEdits;
import gapwright.model.edit.GapEdits;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;
import gapwright.ui.fields.ElementRows;
import gapwright.ui.fields.FeatureText;

/** Gaps and magnet of a leg, a row each. */
public final class GapsSection extends ElementSection {

	private ElementRows gaps;
	private ElementRows magnets;
	private Button addMagnet;
	private Leg leg;

	@Override
	void build(Composite into) {
		into.setLayout(new GridLayout(2, false));
		gaps = rows(into, List.of(GAP__LENGTH, GAP__PIECES, GAP__FRINGING));
		magnets = rows(into, List.of(MAGNET__LENGTH, MAGNET__REMANENCE, MAGNET__RECOIL_PERMEABILITY, MAGNET__REVERSED));
		button(into, "Add gap", () -> run(GapEdits.add(leg, Quantity.parse("0.5 mm", Dimension.LENGTH), 0.5)));
		addMagnet = button(into, "Add magnet", () -> run(GapEdits.addMagnet(leg, Quantity.parse("2 mm", Dimension.LENGTH), 0.5)));
	}

	private ElementRows rows(Composite into, List<? extends EStructuralFeature> features) {
		Composite area = new Composite(into, SWT.NONE);
		area.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false, 2, 1));
		return new ElementRows(area, runner(), features, FeatureText::name, element -> run(DesignEdits.delete(List.of(element))));
	}

	private static Button button(Composite into, String text, Runnable action) {
		Button button = new Button(into, SWT.PUSH);
		button.setText(text);
		button.setLayoutData(new GridData(SWT.BEGINNING, SWT.CENTER, false, false));
		button.addListener(SWT.Selection, event -> action.run());
		return button;
	}

	@Override
	void show(EObject next) {
		leg = (Leg) next;
		gaps.show(leg == null ? List.of() : leg.getGaps());
		magnets.show(leg == null || leg.getMagnet() == null ? List.of() : List.of(leg.getMagnet()));
		addMagnet.setEnabled(leg != null && leg.getMagnet() == null);
	}
}
