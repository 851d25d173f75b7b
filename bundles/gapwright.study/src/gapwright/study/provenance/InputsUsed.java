package gapwright.study.provenance;

import java.util.ArrayList;
import java.util.List;

import org.eclipse.emf.ecore.EObject;

import gapwright.model.AirPath;
import gapwright.model.ArctanCurve;
import gapwright.model.Coil;
import gapwright.model.CurrentDrive;
import gapwright.model.Curve;
import gapwright.model.CurveAtTemperature;
import gapwright.model.Design;
import gapwright.model.Drive;
import gapwright.model.Element;
import gapwright.model.Gap;
import gapwright.model.KneeCurve;
import gapwright.model.Leg;
import gapwright.model.LegGeometry;
import gapwright.model.LinearCurve;
import gapwright.model.Magnet;
import gapwright.model.Material;
import gapwright.model.OperatingPoint;
import gapwright.model.RollOffCurve;
import gapwright.model.Saturation;
import gapwright.model.TableCurve;
import gapwright.model.VoltageDrive;
import gapwright.model.Winding;
import gapwright.model.WindingConnection;
import gapwright.model.WindingLeakage;

/** The values of the design that an element's figures were reckoned from, as they were typed. */
public final class InputsUsed {

	private final List<Input> inputs = new ArrayList<>();
	private final OperatingPoint point;

	private InputsUsed(OperatingPoint point) {
		this.point = point;
	}

	/**
	 * @param point the figures hold at; may be null
	 * @return empty for an element that has no figures; all other elements of its network act on it too, by their fluxes
	 */
	public static List<Input> of(EObject element, OperatingPoint point) {
		InputsUsed used = new InputsUsed(point);
		if (element instanceof Leg leg) {
			used.leg(leg);
		} else if (element instanceof Gap gap) {
			used.gap(gap);
		} else if (element instanceof AirPath path) {
			used.airPath(path);
		} else if (element instanceof Winding winding) {
			used.winding(winding);
		} else if (element instanceof WindingLeakage leakage) {
			used.leakage(leakage);
		} else if (element instanceof WindingConnection connection) {
			used.connection(connection);
		} else if (element instanceof Coil coil && coil.eContainer() instanceof Winding winding) {
			used.winding(winding);
		}
		return List.copyOf(used.inputs);
	}

	private void add(String name, Object value) {
		if (value != null) {
			inputs.add(new Input(name, value.toString()));
		}
	}

	private void leg(Leg leg) {
		section(leg);
		add("Stacking factor", leg.getStackingFactor());
		add("Iron path length", leg.getPathLength() == null
				? millimetres(LegGeometry.ironLength(leg)) + ", distance of the joints less gaps and magnet" : leg.getPathLength());
		for (Gap gap : leg.getGaps()) {
			add("Gap " + name(gap), gap.getLength() + (gap.getPieces() > 1 ? " × " + gap.getPieces() : "") + ", " + gap.getFringing());
		}
		Magnet magnet = leg.getMagnet();
		if (magnet != null) {
			add("Magnet " + name(magnet), magnet.getLength() + ", " + magnet.getRemanence() + ", µrec " + magnet.getRecoilPermeability());
		}
		if (leg.eContainer() instanceof Design design) {
			for (Winding winding : design.getWindings()) {
				winding.getCoils().stream().filter(coil -> coil.getLeg() == leg)
						.forEach(coil -> add("Coil of " + name(winding), turns(coil)));
			}
		}
		if (leg.getMaterial() != null) {
			material(leg.getMaterial());
		}
	}

	private void section(Leg leg) {
		switch (leg.getShape()) {
		case RECTANGULAR -> {
			add("Width", leg.getWidth());
			add("Depth", leg.getDepth());
		}
		case ROUND -> add("Diameter", leg.getDiameter());
		case GIVEN -> add("Area", leg.getArea());
		}
	}

	private void material(Material material) {
		add("Material", name(material));
		add("Curve at " + (material.getCurveTemperature() == null ? "25 °C" : material.getCurveTemperature()), words(material.getCurve()));
		for (CurveAtTemperature other : material.getOtherCurves()) {
			add("Curve at " + other.getTemperature(), words(other.getCurve()));
		}
		material.getPermeabilities().forEach(each -> add("Initial permeability at " + each.getTemperature(), each.getRelativePermeability()));
		for (Saturation saturation : material.getSaturations()) {
			add("Saturation at " + saturation.getTemperature(), saturation.getFluxDensity());
		}
		if (point != null) {
			add("Temperature", point.getTemperature());
		}
		add("Source of the material", material.getSource());
	}

	private static String words(Curve curve) {
		if (curve instanceof LinearCurve linear) {
			return "linear, µr " + linear.getRelativePermeability();
		}
		if (curve instanceof KneeCurve knee) {
			return "Knee, µi " + knee.getInitialPermeability() + ", Js " + knee.getSaturationPolarisation();
		}
		if (curve instanceof ArctanCurve arctan) {
			return "Arctan, µi " + arctan.getInitialPermeability() + ", Js " + arctan.getSaturationPolarisation();
		}
		if (curve instanceof RollOffCurve rollOff) {
			return "Roll-off, µi " + rollOff.getInitialPermeability() + ", H½ " + rollOff.getHalfFieldStrength() + ", c " + rollOff.getExponent();
		}
		return curve instanceof TableCurve table ? "Table of " + table.getPoints().size() + " points" : null;
	}

	private void gap(Gap gap) {
		add("Length", gap.getLength());
		add("Pieces", gap.getPieces());
		add("Fringing", gap.getFringing());
		boolean window = gap.getFringing() == gapwright.model.Fringing.LOGARITHMIC || gap.getFringing() == gapwright.model.Fringing.CONFORMAL;
		if (window) {
			add("Place", gap.getPlace());
			add("Window height", gap.getWindowHeight() == null ? "from the drawing" : gap.getWindowHeight());
		}
		if (gap.eContainer() instanceof Leg leg) {
			section(leg);
		}
	}

	private void airPath(AirPath path) {
		add("Permeance", path.getPermeance());
		add("Area", path.getArea());
		add("Length", path.getLength());
	}

	private void winding(Winding winding) {
		for (Coil coil : winding.getCoils()) {
			add("Coil on " + (coil.getLeg() == null ? "no leg" : name(coil.getLeg())), turns(coil));
		}
		if (point == null) {
			return;
		}
		for (Drive drive : point.getDrives()) {
			if (drive.getWinding() == winding && drive instanceof CurrentDrive current) {
				add("Current", current.getCurrent());
				add("Ripple, peak to peak", current.getRipple());
			} else if (drive.getWinding() == winding && drive instanceof VoltageDrive voltage) {
				add("Voltage", voltage.getVoltage() + " for " + voltage.getOnTime() + ", " + voltage.getWaveform());
				add("Bias", voltage.getBias());
			}
		}
	}

	private void leakage(WindingLeakage leakage) {
		add("Arrangement", leakage.getArrangement());
		add("Build of the first winding", leakage.getFirstBuild());
		add("Build of the second winding", leakage.getSecondBuild());
		add("Separation", leakage.getSeparation());
		add("Height", leakage.getHeight());
		add("Mean turn", leakage.getMeanTurn());
		add("Interfaces", leakage.getInterfaces());
		if (leakage.getFirst() != null) {
			leakage.getFirst().getCoils().forEach(coil -> add("Coil of " + name(leakage.getFirst()), turns(coil)));
		}
	}

	private void connection(WindingConnection connection) {
		add("Kind", connection.getKind());
		connection.getMembers().stream().filter(member -> member.getWinding() != null)
				.forEach(member -> add("Winding", name(member.getWinding()) + (member.isReversed() ? ", reversed" : "")));
	}

	private static String turns(Coil coil) {
		return coil.getTurns() + (coil.isReversed() ? " turns, reversed" : " turns");
	}

	private static String name(Element element) {
		return element.getName() == null || element.getName().isBlank() ? element.getId() : element.getName();
	}

	private static String millimetres(double metres) {
		return new java.math.BigDecimal(metres * 1e3).round(new java.math.MathContext(4)).stripTrailingZeros().toPlainString() + " mm";
	}
}
