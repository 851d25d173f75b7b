package gapwright.ui.fields;

import static gapwright.model.GapwrightPackage.Literals.LEG__AREA;
import static gapwright.model.GapwrightPackage.Literals.LEG__DEPTH;
import static gapwright.model.GapwrightPackage.Literals.LEG__DIAMETER;
import static gapwright.model.GapwrightPackage.Literals.LEG__WIDTH;

import java.util.Map;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;

import gapwright.model.Leg;
import gapwright.model.SectionShape;

/** Whether a feature has a meaning for an element as it is: a round leg has no width. */
final class Relevance {

	private static final Map<EStructuralFeature, SectionShape> SHAPES = Map.of(LEG__WIDTH, SectionShape.RECTANGULAR,
			LEG__DEPTH, SectionShape.RECTANGULAR, LEG__DIAMETER, SectionShape.ROUND, LEG__AREA, SectionShape.GIVEN);

	private Relevance() {
	}

	static boolean of(EStructuralFeature feature, EObject element) {
		SectionShape shape = SHAPES.get(feature);
		return element.eClass().getEAllStructuralFeatures().contains(feature)
				&& (shape == null || element instanceof Leg leg && leg.getShape() == shape);
	}
}
