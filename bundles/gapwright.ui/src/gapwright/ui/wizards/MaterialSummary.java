package gapwright.ui.wizards;

import java.util.stream.Collectors;

import gapwright.library.material.MaterialReading;
import gapwright.model.Curve;
import gapwright.model.Material;
import gapwright.model.SteinmetzLoss;
import gapwright.model.TableCurve;
import gapwright.physics.material.Permeability;
import gapwright.physics.material.SteinmetzFit;
import gapwright.study.MaterialLowering;
import gapwright.ui.fields.FigureFormat;

/** What a material file holds, in words. */
final class MaterialSummary {

	private MaterialSummary() {
	}

	static String of(MaterialReading reading) {
		Material material = reading.material();
		StringBuilder text = new StringBuilder(material.getName()).append('\n');
		curve(text, "Curve", material.getCurve(), material.getCurveTemperature());
		material.getOtherCurves().forEach(other -> curve(text, "Curve", other.getCurve(), other.getTemperature()));
		line(text, "Initial permeability", material.getPermeabilities().stream()
				.map(each -> FigureFormat.plain(each.getRelativePermeability()) + " at " + each.getTemperature()).collect(Collectors.joining(", ")));
		line(text, "Saturation", material.getSaturations().stream()
				.map(each -> each.getFluxDensity() + " at " + each.getTemperature()).collect(Collectors.joining(", ")));
		line(text, "Curie temperature", material.getCurieTemperature());
		line(text, "Density", material.getDensity());
		loss(text, material.getLoss(), reading.lossFit());
		line(text, "Source", material.getSource());
		reading.remarks().forEach(remark -> text.append('\n').append(remark));
		return text.toString();
	}

	private static void line(StringBuilder text, String title, Object value) {
		if (value != null && !value.toString().isEmpty()) {
			text.append(title).append(": ").append(value).append('\n');
		}
	}

	private static void curve(StringBuilder text, String title, Curve curve, Object temperature) {
		String kind = curve.eClass().getName().replace("Curve", "").replace("RollOff", "Roll-off");
		String points = curve instanceof TableCurve table ? " of " + table.getPoints().size() + " points" : "";
		line(text, title + (temperature == null ? "" : " at " + temperature), kind + points + ", initial permeability "
				+ FigureFormat.plain(Permeability.initial(MaterialLowering.curve(curve))));
	}

	private static void loss(StringBuilder text, SteinmetzLoss loss, SteinmetzFit fit) {
		if (loss != null) {
			line(text, "Core loss at " + loss.getTemperature(), "k " + FigureFormat.plain(loss.getCoefficient()) + ", α "
					+ FigureFormat.plain(loss.getFrequencyExponent()) + ", β " + FigureFormat.plain(loss.getFluxDensityExponent()));
		}
		if (fit != null) {
			line(text, "Fitted from", FigureFormat.si(fit.minimumFrequency(), "Hz") + " to " + FigureFormat.si(fit.maximumFrequency(), "Hz")
					+ " and " + FigureFormat.fluxDensity(fit.minimumFluxDensity()) + " to " + FigureFormat.fluxDensity(fit.maximumFluxDensity())
					+ "; misses a point by " + FigureFormat.percent(fit.greatestMisfit()) + " at most");
		}
	}
}
