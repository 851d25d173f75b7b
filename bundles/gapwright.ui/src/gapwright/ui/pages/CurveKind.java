package gapwright.ui.pages;

import java.util.Arrays;

import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EStructuralFeature;

import gapwright.model.Curve;
import gapwright.model.CurvePoint;
import gapwright.model.GapwrightFactory;
import gapwright.model.GapwrightPackage.Literals;
import gapwright.model.TableCurve;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;

/** The curves a material can have, and a first one of each to start from. */
enum CurveKind {
	LINEAR(Literals.LINEAR_CURVE, "Linear", "B = µ₀·µr·H: no saturation of its own."),
	KNEE(Literals.KNEE_CURVE, "Knee", "Fröhlich-Kennelly: one smooth bend towards the saturation polarisation."),
	ARCTAN(Literals.ARCTAN_CURVE, "Arctan", "An arc tangent: a softer bend towards the saturation polarisation."),
	TABLE(Literals.TABLE_CURVE, "Table", "A monotone cubic through measured points; µ₀ beyond the last."),
	ROLL_OFF(Literals.ROLL_OFF_CURVE, "Roll-off", "Incremental permeability falling with field strength, as powder cores are specified.");

	/** Starting values: a mid-range soft ferrite, indicative. */
	private static final double INITIAL_PERMEABILITY = 2000;
	private static final String POLARISATION = "0.4 T";

	private final EClass type;
	private final String label;
	private final String law;

	CurveKind(EClass type, String label, String law) {
		this.type = type;
		this.label = label;
		this.law = law;
	}

	String label() {
		return label;
	}

	String law() {
		return law;
	}

	/** @param curve null where the material has none: then null */
	static CurveKind of(Curve curve) {
		return Arrays.stream(values()).filter(kind -> curve != null && kind.type == curve.eClass()).findFirst().orElse(null);
	}

	/** A curve of this kind that keeps whatever the former one says under the same name. */
	Curve create(Curve former) {
		Curve curve = (Curve) GapwrightFactory.eINSTANCE.create(type);
		for (EStructuralFeature feature : type.getEStructuralFeatures()) {
			Object value = kept(former, feature);
			if (value != null) {
				curve.eSet(feature, value);
			}
		}
		if (curve instanceof TableCurve table) {
			table.getPoints().add(point("100 A/m", "0.2 T"));
			table.getPoints().add(point("1000 A/m", "0.4 T"));
		}
		return curve;
	}

	private static Object kept(Curve former, EStructuralFeature feature) {
		String name = feature.getName();
		EStructuralFeature same = former == null ? null : former.eClass().getEStructuralFeature(name);
		if (same == null && former != null && name.endsWith("Permeability")) {
			same = former.eClass().getEAllAttributes().stream().filter(other -> other.getName().endsWith("Permeability")).findFirst().orElse(null);
		}
		if (same != null) {
			return former.eGet(same);
		}
		return switch (name) {
		case "relativePermeability", "initialPermeability" -> INITIAL_PERMEABILITY;
		case "saturationPolarisation" -> Quantity.parse(POLARISATION, Dimension.FLUX_DENSITY);
		case "halfFieldStrength" -> Quantity.parse("5 kA/m", Dimension.FIELD_STRENGTH);
		case "exponent" -> 1.5;
		default -> null;
		};
	}

	private static CurvePoint point(String fieldStrength, String fluxDensity) {
		CurvePoint point = GapwrightFactory.eINSTANCE.createCurvePoint();
		point.setFieldStrength(Quantity.parse(fieldStrength, Dimension.FIELD_STRENGTH));
		point.setFluxDensity(Quantity.parse(fluxDensity, Dimension.FLUX_DENSITY));
		return point;
	}
}
