package gapwright.ui.tests;

import gapwright.model.Coil;
import gapwright.model.CurrentDrive;
import gapwright.model.Design;
import gapwright.model.Gap;
import gapwright.model.GapwrightFactory;
import gapwright.model.Joint;
import gapwright.model.KneeCurve;
import gapwright.model.Leg;
import gapwright.model.Material;
import gapwright.model.OperatingPoint;
import gapwright.model.Saturation;
import gapwright.model.Winding;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;

/** A ladder of iron with any number of legs: rungs between two rails, a gap in each rung, a coil on the first. */
final class Ladder {

	private static final GapwrightFactory MAKE = GapwrightFactory.eINSTANCE;
	private static final int PITCH = 20;

	private final Design design = MAKE.createDesign();
	private final Material material = MAKE.createMaterial();

	private Ladder() {
	}

	/** @param legs how many, at least 4 */
	static Design of(int legs) {
		Ladder ladder = new Ladder();
		ladder.build(legs);
		return ladder.design;
	}

	private void build(int legs) {
		material();
		Joint top = joint(0, 0);
		Joint bottom = joint(0, 2);
		Leg first = leg(bottom, top);
		for (int k = 1; design.getLegs().size() < legs; k++) {
			Joint nextTop = joint(k, 0);
			Joint nextBottom = joint(k, 2);
			leg(top, nextTop);
			leg(bottom, nextBottom);
			leg(nextBottom, nextTop);
			if (legs - design.getLegs().size() < 3) {
				// what is left of the count runs askew from the last rung to the one before
				while (design.getLegs().size() < legs) {
					leg(nextBottom, top);
				}
			}
			top = nextTop;
			bottom = nextBottom;
		}
		wind(first);
	}

	private void material() {
		KneeCurve curve = MAKE.createKneeCurve();
		curve.setInitialPermeability(2300);
		curve.setSaturationPolarisation(q("0.5 T", Dimension.FLUX_DENSITY));
		material.setId("ferrite");
		material.setCurve(curve);
		Saturation saturation = MAKE.createSaturation();
		saturation.setTemperature(q("100 °C", Dimension.TEMPERATURE));
		saturation.setFluxDensity(q("0.39 T", Dimension.FLUX_DENSITY));
		material.getSaturations().add(saturation);
		design.getMaterials().add(material);
	}

	private void wind(Leg leg) {
		Winding winding = MAKE.createWinding();
		winding.setId("main");
		Coil coil = MAKE.createCoil();
		coil.setId("main-coil");
		coil.setLeg(leg);
		coil.setTurns(20);
		winding.getCoils().add(coil);
		design.getWindings().add(winding);
		OperatingPoint point = MAKE.createOperatingPoint();
		point.setId("load");
		point.setTemperature(q("100 °C", Dimension.TEMPERATURE));
		CurrentDrive drive = MAKE.createCurrentDrive();
		drive.setId("load-main");
		drive.setWinding(winding);
		drive.setCurrent(q("8 A", Dimension.CURRENT));
		point.getDrives().add(drive);
		design.getOperatingPoints().add(point);
	}

	private Joint joint(int column, int row) {
		Joint joint = MAKE.createJoint();
		joint.setId("j" + column + "-" + row);
		joint.setX(q(20 + column * PITCH + " mm", Dimension.LENGTH));
		joint.setY(q(20 + row * PITCH + " mm", Dimension.LENGTH));
		design.getJoints().add(joint);
		return joint;
	}

	private Leg leg(Joint from, Joint to) {
		Leg leg = MAKE.createLeg();
		leg.setId("leg-" + (design.getLegs().size() + 1));
		leg.setFrom(from);
		leg.setTo(to);
		leg.setMaterial(material);
		leg.setWidth(q("6 mm", Dimension.LENGTH));
		leg.setDepth(q("12 mm", Dimension.LENGTH));
		if (from.getX().equals(to.getX())) {
			Gap gap = MAKE.createGap();
			gap.setId(leg.getId() + "-gap");
			gap.setLength(q("0.2 mm", Dimension.LENGTH));
			leg.getGaps().add(gap);
		}
		design.getLegs().add(leg);
		return leg;
	}

	private static Quantity q(String text, Dimension dimension) {
		return Quantity.parse(text, dimension);
	}
}
