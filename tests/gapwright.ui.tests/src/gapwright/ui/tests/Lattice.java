package gapwright.ui.tests;

import gapwright.library.StockMaterials;
import gapwright.model.Coil;
import gapwright.model.CurrentDrive;
import gapwright.model.Design;
import gapwright.model.DesignWriter;
import gapwright.model.GapwrightFactory;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.Material;
import gapwright.model.OperatingPoint;
import gapwright.model.Winding;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;

/** A square mesh of legs, far larger than any core: what a window must bear. */
final class Lattice {

	private static final GapwrightFactory FACTORY = GapwrightFactory.eINSTANCE;

	private Lattice() {
	}

	/** @param side joints along a side; gives 2·side·(side − 1) legs */
	static byte[] bytes(int side) {
		Design design = FACTORY.createDesign();
		Material material = StockMaterials.all().get(0);
		design.getMaterials().add(material);
		for (int k = 0; k < side * side; k++) {
			Joint joint = FACTORY.createJoint();
			joint.setId("j" + k);
			joint.setX(length(10 * (k % side)));
			joint.setY(length(10 * (k / side)));
			design.getJoints().add(joint);
		}
		for (int k = 0; k < side * side; k++) {
			if (k % side < side - 1) {
				leg(design, k, k + 1, material);
			}
			if (k / side < side - 1) {
				leg(design, k, k + side, material);
			}
		}
		drive(design);
		return DesignWriter.bytes(design);
	}

	private static void leg(Design design, int from, int to, Material material) {
		Leg leg = FACTORY.createLeg();
		leg.setId("l" + design.getLegs().size());
		leg.setFrom(design.getJoints().get(from));
		leg.setTo(design.getJoints().get(to));
		leg.setMaterial(material);
		leg.setWidth(length(4));
		leg.setDepth(length(4));
		design.getLegs().add(leg);
	}

	private static void drive(Design design) {
		Winding winding = FACTORY.createWinding();
		winding.setId("w");
		Coil coil = FACTORY.createCoil();
		coil.setId("c");
		coil.setLeg(design.getLegs().get(0));
		coil.setTurns(10);
		winding.getCoils().add(coil);
		design.getWindings().add(winding);
		OperatingPoint point = FACTORY.createOperatingPoint();
		point.setId("p");
		point.setTemperature(Quantity.parse("25 °C", Dimension.TEMPERATURE));
		CurrentDrive drive = FACTORY.createCurrentDrive();
		drive.setId("d");
		drive.setWinding(winding);
		drive.setCurrent(Quantity.parse("1 A", Dimension.CURRENT));
		point.getDrives().add(drive);
		design.getOperatingPoints().add(point);
	}

	private static Quantity length(int millimetres) {
		return Quantity.of(millimetres, "mm", Dimension.LENGTH);
	}
}
