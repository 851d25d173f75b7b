package gapwright.ui.properties;

import static gapwright.model.GapwrightPackage.Literals.COIL__LEG;
import static gapwright.model.GapwrightPackage.Literals.COIL__REVERSED;
import static gapwright.model.GapwrightPackage.Literals.COIL__TURNS;

import java.util.List;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.swt.widgets.Composite;

import gapwright.model.Coil;
import gapwright.model.Design;
import gapwright.model.Leg;
import gapwright.model.Winding;
import gapwright.model.edit.DesignEdits;
import gapwright.ui.fields.ElementRows;
import gapwright.ui.fields.FeatureText;

/** The coils of a winding, or those round a leg, a row each. */
public final class CoilsSection extends ElementSection {

	private ElementRows coils;

	@Override
	void build(Composite into) {
		coils = new ElementRows(into, runner(), List.of(COIL__LEG, COIL__TURNS, COIL__REVERSED), FeatureText::name,
				coil -> run(DesignEdits.delete(List.of(coil))));
	}

	@Override
	void show(EObject next) {
		coils.show(coilsOf(next));
	}

	private static List<Coil> coilsOf(EObject element) {
		if (element instanceof Winding winding) {
			return winding.getCoils();
		}
		if (element instanceof Leg leg && leg.eContainer() instanceof Design design) {
			return design.getWindings().stream().flatMap(winding -> winding.getCoils().stream()).filter(coil -> coil.getLeg() == leg).toList();
		}
		return List.of();
	}
}
