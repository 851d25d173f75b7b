package gapwright.model.edit;

import java.util.Locale;

import org.eclipse.emf.ecore.util.EcoreUtil;

import gapwright.model.Curve;
import gapwright.model.CurveAtTemperature;
import gapwright.model.CurvePoint;
import gapwright.model.Design;
import gapwright.model.GapwrightFactory;
import gapwright.model.Ids;
import gapwright.model.InitialPermeability;
import gapwright.model.KneeCurve;
import gapwright.model.LinearCurve;
import gapwright.model.Material;
import gapwright.model.Saturation;
import gapwright.model.SteinmetzLoss;
import gapwright.model.TableCurve;
import gapwright.model.edit.history.Edit;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;

/** Edits of materials. */
public final class MaterialEdits {

	/** A new material starts as a mid-range soft ferrite would, without a saturation: that must be looked up. */
	private static final double PERMEABILITY = 2000;

	private MaterialEdits() {
	}

	/** Adds a linear material to be filled in. */
	public static Edit add(Design design) {
		return new Edit("Add material", design, () -> {
			Material material = GapwrightFactory.eINSTANCE.createMaterial();
			material.setId(Ids.next(design, "material"));
			LinearCurve curve = GapwrightFactory.eINSTANCE.createLinearCurve();
			curve.setRelativePermeability(PERMEABILITY);
			material.setCurve(curve);
			design.getMaterials().add(material);
		});
	}

	/** Copies a material, of the library or of another design, into this one. Keeps its id where that is free. */
	public static Edit addCopy(Design design, Material original) {
		return new Edit("Add material", design, () -> {
			Material copy = EcoreUtil.copy(original);
			String id = original.getId();
			if (id == null || Ids.find(design, id) != null) {
				copy.setId(Ids.next(design, id == null ? "material" : id));
			}
			design.getMaterials().add(copy);
		});
	}

	/** Puts another curve, which belongs to no material yet, in place of the one there. */
	public static Edit changeCurve(Material material, Curve curve) {
		return new Edit("Change curve", material, () -> material.setCurve(curve));
	}

	/** As above, of a further curve. */
	public static Edit changeCurve(CurveAtTemperature place, Curve curve) {
		return new Edit("Change curve", place, () -> place.setCurve(curve));
	}

	/** Gives a Knee curve the saturation polarisation that somebody has worked out. */
	public static Edit polarisation(KneeCurve curve, Quantity polarisation) {
		return new Edit("Fit to a sheet's point", curve, () -> curve.setSaturationPolarisation(polarisation));
	}

	/** Adds a curve 75 K above the hottest, a copy of the first one, to be typed over. */
	public static Edit addCurve(Material material) {
		return new Edit("Add curve", material, () -> {
			double hottest = material.getCurveTemperature() == null ? 25 : material.getCurveTemperature().si();
			for (CurveAtTemperature each : material.getOtherCurves()) {
				hottest = each.getTemperature() == null ? hottest : Math.max(hottest, each.getTemperature().si());
			}
			CurveAtTemperature next = GapwrightFactory.eINSTANCE.createCurveAtTemperature();
			next.setTemperature(Quantity.of(round(hottest + 75), "°C", Dimension.TEMPERATURE));
			next.setCurve(EcoreUtil.copy(material.getCurve()));
			material.getOtherCurves().add(next);
		});
	}

	/** Adds an initial permeability behind the last: the same value 75 K above, or a mid-range ferrite's at 25 °C. */
	public static Edit addPermeability(Material material) {
		return new Edit("Add initial permeability", material, () -> {
			InitialPermeability next = GapwrightFactory.eINSTANCE.createInitialPermeability();
			int count = material.getPermeabilities().size();
			InitialPermeability last = count == 0 ? null : material.getPermeabilities().get(count - 1);
			boolean known = last != null && last.getTemperature() != null;
			next.setTemperature(known ? Quantity.of(round(last.getTemperature().si() + 75), "°C", Dimension.TEMPERATURE)
					: Quantity.parse("25 °C", Dimension.TEMPERATURE));
			next.setRelativePermeability(known ? last.getRelativePermeability() : PERMEABILITY);
			material.getPermeabilities().add(next);
		});
	}

	/** Adds a saturation that somebody has worked out. */
	public static Edit addSaturation(Material material, Quantity temperature, Quantity fluxDensity) {
		return new Edit("Add saturation", material, () -> {
			Saturation saturation = GapwrightFactory.eINSTANCE.createSaturation();
			saturation.setTemperature(temperature);
			saturation.setFluxDensity(fluxDensity);
			material.getSaturations().add(saturation);
		});
	}

	/** Adds a point behind the last, at twice its field strength and a little more flux density, to be typed over. */
	public static Edit addPoint(TableCurve curve) {
		return new Edit("Add curve point", curve, () -> {
			CurvePoint point = GapwrightFactory.eINSTANCE.createCurvePoint();
			CurvePoint last = curve.getPoints().isEmpty() ? null : curve.getPoints().get(curve.getPoints().size() - 1);
			double h = last == null || last.getFieldStrength() == null ? 100 : 2 * last.getFieldStrength().si();
			double b = last == null || last.getFluxDensity() == null ? 0.1 : 1.05 * last.getFluxDensity().si();
			point.setFieldStrength(Quantity.of(round(h), "A/m", Dimension.FIELD_STRENGTH));
			point.setFluxDensity(Quantity.of(round(b), "T", Dimension.FLUX_DENSITY));
			curve.getPoints().add(point);
		});
	}

	/** To four digits: a starting value somebody will type over. */
	private static double round(double value) {
		return Double.parseDouble(String.format(Locale.ROOT, "%.3e", value));
	}

	/** Adds a saturation behind the last: the same flux density at a temperature 75 K higher. */
	public static Edit addSaturation(Material material) {
		return new Edit("Add saturation", material, () -> {
			Saturation saturation = GapwrightFactory.eINSTANCE.createSaturation();
			int count = material.getSaturations().size();
			Saturation last = count == 0 ? null : material.getSaturations().get(count - 1);
			boolean known = last != null && last.getTemperature() != null && last.getFluxDensity() != null;
			saturation.setTemperature(known ? Quantity.of(round(last.getTemperature().si() + 75), "°C", Dimension.TEMPERATURE)
					: Quantity.parse("25 °C", Dimension.TEMPERATURE));
			saturation.setFluxDensity(known ? last.getFluxDensity() : Quantity.parse("0.4 T", Dimension.FLUX_DENSITY));
			material.getSaturations().add(saturation);
		});
	}

	/** Gives a material loss figures, to begin with those of a mid-range power ferrite (indicative), or takes them away. */
	public static Edit loss(Material material, boolean known) {
		return new Edit(known ? "Add core loss" : "Remove core loss", material, () -> {
			SteinmetzLoss loss = known ? GapwrightFactory.eINSTANCE.createSteinmetzLoss() : null;
			if (loss != null) {
				loss.setCoefficient(1.0);
				loss.setFrequencyExponent(1.4);
				loss.setFluxDensityExponent(2.5);
			}
			material.setLoss(loss);
		});
	}
}
