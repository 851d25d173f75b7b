package gapwright.library.template;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

import gapwright.library.StockMaterials;
import gapwright.model.AirPath;
import gapwright.model.Coil;
import gapwright.model.CurrentDrive;
import gapwright.model.Design;
import gapwright.model.Fringing;
import gapwright.model.Gap;
import gapwright.model.GapwrightFactory;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.Material;
import gapwright.model.OperatingPoint;
import gapwright.model.SectionShape;
import gapwright.model.Winding;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;

/** Draws a design element by element; positions in millimetres on the page, y downwards. */
public final class CoreSketch {

	private static final GapwrightFactory FACTORY = GapwrightFactory.eINSTANCE;

	private static final MathContext DIGITS = new MathContext(13);

	private final Design design = FACTORY.createDesign();
	private Material material;

	public CoreSketch(String name) {
		design.setName(name);
	}

	/** Legs drawn from now on are made of a copy of this stock material. */
	public CoreSketch material(String stockId) {
		material = design.getMaterials().stream().filter(m -> m.getId().equals(stockId)).findFirst().orElse(null);
		if (material == null) {
			material = StockMaterials.get(stockId);
			design.getMaterials().add(material);
		}
		return this;
	}

	public Joint joint(String id, double x, double y) {
		Joint joint = FACTORY.createJoint();
		joint.setId(id);
		joint.setX(millimetres(x));
		joint.setY(millimetres(y));
		design.getJoints().add(joint);
		return joint;
	}

	/** A leg whose section is to be set. */
	public Leg leg(String id, String name, Joint from, Joint to) {
		Leg leg = FACTORY.createLeg();
		leg.setId(id);
		leg.setName(name);
		leg.setFrom(from);
		leg.setTo(to);
		leg.setMaterial(material);
		design.getLegs().add(leg);
		return leg;
	}

	/** Air between two joints, by its permeance in H. */
	public AirPath airPath(String id, String name, Joint from, Joint to, double permeance) {
		AirPath path = FACTORY.createAirPath();
		path.setId(id);
		path.setName(name);
		path.setFrom(from);
		path.setTo(to);
		path.setPermeance(Quantity.of(new BigDecimal(permeance * 1e9).round(DIGITS).doubleValue(), "nH", Dimension.PERMEANCE));
		design.getAirPaths().add(path);
		return path;
	}

	/** A leg of rectangular section. */
	public Leg leg(String id, String name, Joint from, Joint to, double width, Quantity depth) {
		Leg leg = FACTORY.createLeg();
		leg.setId(id);
		leg.setName(name);
		leg.setFrom(from);
		leg.setTo(to);
		leg.setMaterial(material);
		leg.setWidth(exactMillimetres(width));
		leg.setDepth(depth);
		design.getLegs().add(leg);
		return leg;
	}

	/** @param width mm */
	static EDrawing.Shape rectangle(double width, Quantity depth) {
		return leg -> {
			leg.setWidth(exactMillimetres(width));
			leg.setDepth(depth);
		};
	}

	/** @param area m² */
	static EDrawing.Shape given(double area) {
		return leg -> {
			leg.setShape(SectionShape.GIVEN);
			leg.setArea(exactSquareMillimetres(area * 1e6));
		};
	}

	/** A gap of one piece in the middle of a leg; none when the length is 0. */
	public CoreSketch gap(Leg leg, Quantity length) {
		if (length.si() > 0) {
			Gap gap = FACTORY.createGap();
			gap.setId(leg.getId() + "-gap");
			gap.setLength(length);
			gap.setFringing(Fringing.WIDENED);
			leg.getGaps().add(gap);
		}
		return this;
	}

	public Winding winding(String id, String name) {
		Winding winding = FACTORY.createWinding();
		winding.setId(id);
		winding.setName(name);
		design.getWindings().add(winding);
		return winding;
	}

	public Coil coil(Winding winding, Leg leg, int turns, double position) {
		Coil coil = FACTORY.createCoil();
		coil.setId(winding.getId() + "-on-" + leg.getId());
		coil.setLeg(leg);
		coil.setTurns(turns);
		coil.setPosition(position);
		winding.getCoils().add(coil);
		return coil;
	}

	public OperatingPoint operatingPoint(String id, String name, Quantity temperature) {
		OperatingPoint point = FACTORY.createOperatingPoint();
		point.setId(id);
		point.setName(name);
		point.setTemperature(temperature);
		design.getOperatingPoints().add(point);
		return point;
	}

	public CoreSketch current(OperatingPoint point, Winding winding, Quantity current, Quantity ripple) {
		CurrentDrive drive = FACTORY.createCurrentDrive();
		drive.setId(point.getId() + "-" + winding.getId());
		drive.setWinding(winding);
		drive.setCurrent(current);
		if (ripple.si() != 0) {
			drive.setRipple(ripple);
		}
		point.getDrives().add(drive);
		return this;
	}

	public Design design() {
		return design;
	}

	/** @return a length to thirteen digits, for sums that must hold */
	static Quantity exactMillimetres(double value) {
		return Quantity.of(new BigDecimal(value).round(DIGITS).doubleValue(), "mm", Dimension.LENGTH);
	}

	/** @return an area to thirteen digits */
	static Quantity exactSquareMillimetres(double value) {
		return Quantity.of(new BigDecimal(value).round(DIGITS).doubleValue(), "mm²", Dimension.AREA);
	}

	/** @return a length rounded to a micrometre */
	static Quantity millimetres(double value) {
		double rounded = BigDecimal.valueOf(value).setScale(3, RoundingMode.HALF_EVEN).doubleValue();
		return Quantity.of(rounded, "mm", Dimension.LENGTH);
	}
}
