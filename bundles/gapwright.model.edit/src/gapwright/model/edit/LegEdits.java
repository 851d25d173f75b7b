package gapwright.model.edit;

import java.util.Set;
import java.util.function.Consumer;

import gapwright.model.AirPath;
import gapwright.model.Design;
import gapwright.model.GapwrightFactory;
import gapwright.model.Ids;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.SectionShape;
import gapwright.model.edit.history.Edit;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;

/** Edits that attach legs and air paths to joints, and the width of a leg. */
public final class LegEdits {

	private static final String WIDTH = "10 mm";
	private static final String DEPTH = "15 mm";
	private static final String PERMEANCE = "20 nH";

	private LegEdits() {
	}

	/**
	 * A leg between two spots, with the section and material of the last one drawn.
	 *
	 * @param made is told of the leg once it is there
	 */
	public static Edit add(Design design, JointSpot from, JointSpot to, Consumer<Leg> made) {
		return new Edit("Add leg", design, () -> {
			Set<String> ids = Ids.used(design);
			Leg leg = GapwrightFactory.eINSTANCE.createLeg();
			leg.setId(Ids.next(ids, "leg"));
			leg.setFrom(from.in(design, ids));
			leg.setTo(to.in(design, ids));
			takeAfter(design, leg);
			design.getLegs().add(leg);
			made.accept(leg);
		});
	}

	private static void takeAfter(Design design, Leg leg) {
		Leg last = design.getLegs().isEmpty() ? null : design.getLegs().get(design.getLegs().size() - 1);
		if (last == null) {
			leg.setWidth(Quantity.parse(WIDTH, Dimension.LENGTH));
			leg.setDepth(Quantity.parse(DEPTH, Dimension.LENGTH));
			leg.setMaterial(design.getMaterials().isEmpty() ? null : design.getMaterials().get(0));
			return;
		}
		leg.setMaterial(last.getMaterial());
		leg.setShape(last.getShape());
		leg.setWidth(last.getWidth());
		leg.setDepth(last.getDepth());
		leg.setDiameter(last.getDiameter());
		leg.setArea(last.getArea());
		leg.setStackingFactor(last.getStackingFactor());
	}

	/** @param made is told of the air path once it is there */
	public static Edit addAirPath(Design design, JointSpot from, JointSpot to, Consumer<AirPath> made) {
		return new Edit("Add air path", design, () -> {
			Set<String> ids = Ids.used(design);
			AirPath path = GapwrightFactory.eINSTANCE.createAirPath();
			path.setId(Ids.next(ids, "air"));
			path.setFrom(from.in(design, ids));
			path.setTo(to.in(design, ids));
			path.setPermeance(Quantity.parse(PERMEANCE, Dimension.PERMEANCE));
			design.getAirPaths().add(path);
			made.accept(path);
		});
	}

	/** @param atFrom which end goes to the spot */
	public static Edit reattach(Design design, Leg leg, boolean atFrom, JointSpot spot) {
		return new Edit("Re-attach leg", design, () -> {
			Joint joint = spot.in(design, Ids.used(design));
			if (atFrom) {
				leg.setFrom(joint);
			} else {
				leg.setTo(joint);
			}
		});
	}

	/** @param atFrom which end goes to the spot */
	public static Edit reattach(Design design, AirPath path, boolean atFrom, JointSpot spot) {
		return new Edit("Re-attach air path", design, () -> {
			Joint joint = spot.in(design, Ids.used(design));
			if (atFrom) {
				path.setFrom(joint);
			} else {
				path.setTo(joint);
			}
		});
	}

	/**
	 * @param width mm, &gt; 0; of a round leg the diameter, of a given area the side of its square
	 */
	public static Edit widen(Leg leg, double width) {
		if (!(width > 0 && width < Double.POSITIVE_INFINITY)) {
			throw new IllegalArgumentException("width = " + width + " mm: must be above 0");
		}
		Quantity length = JointSpot.millimetres(width);
		return new Edit("Change leg width", leg, () -> {
			if (leg.getShape() == SectionShape.ROUND) {
				leg.setDiameter(length);
			} else if (leg.getShape() == SectionShape.RECTANGULAR) {
				leg.setWidth(length);
			} else {
				leg.setArea(Quantity.of(Math.round(width * width * 1e3) / 1e3, "mm²", Dimension.AREA));
			}
		});
	}
}
