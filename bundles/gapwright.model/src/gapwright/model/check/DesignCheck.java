package gapwright.model.check;

import static gapwright.model.GapwrightPackage.Literals.*;
import static gapwright.model.LegGeometry.si;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

import org.eclipse.emf.common.util.TreeIterator;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.emf.ecore.util.EcoreUtil;

import gapwright.model.AirPath;
import gapwright.model.Coil;
import gapwright.model.Design;
import gapwright.model.Drive;
import gapwright.model.Element;
import gapwright.model.Gap;
import gapwright.model.Leg;
import gapwright.model.LegGeometry;
import gapwright.model.OperatingPoint;
import gapwright.model.References;
import gapwright.model.VoltageDrive;
import gapwright.model.Winding;

/** Finds what is wrong or doubtful with a design before anything is computed. */
public final class DesignCheck {

	private static final MathContext FOUR_DIGITS = new MathContext(4);

	private final Problems problems = new Problems();

	private DesignCheck() {
	}

	/** @return all problems, in the order of the file */
	public static List<Problem> check(Design design) {
		DesignCheck check = new DesignCheck();
		ValueCheck values = new ValueCheck(check.problems);
		values.check(design);
		for (TreeIterator<EObject> all = design.eAllContents(); all.hasNext();) {
			EObject object = all.next();
			values.check(object);
			check.references(design, object);
		}
		check.duplicateIds(design);
		MaterialCheck materials = new MaterialCheck(check.problems);
		design.getMaterials().forEach(materials::check);
		design.getLegs().forEach(check::leg);
		design.getAirPaths().forEach(check::airPath);
		design.getWindings().forEach(check::winding);
		design.getOperatingPoints().forEach(point -> check.operatingPoint(design, point));
		new PairCheck(check.problems).check(design);
		new ToleranceCheck(check.problems).check(design);
		if (design.getOperatingPoints().isEmpty()) {
			check.problems.add(ProblemCode.OPERATING_POINT_MISSING, design, DESIGN__OPERATING_POINTS,
					"there is no operating point, so nothing is computed", "Add one on the Operating points page.");
		}
		return check.problems.list();
	}

	/** An element deleted elsewhere may still be referred to; nothing can be computed with it. */
	private void references(Design design, EObject object) {
		for (EReference reference : object.eClass().getEAllReferences()) {
			if (!reference.isContainment() && References.of(object, reference).stream()
					.anyMatch(target -> EcoreUtil.getRootContainer(target) != design)) {
				problems.add(ProblemCode.REFERENCE_OUTSIDE, object, reference,
						reference.getName() + " refers to something that is not in the design any more", "Choose another.");
			}
		}
	}

	private void duplicateIds(Design design) {
		Set<String> seen = new HashSet<>();
		for (TreeIterator<EObject> all = design.eAllContents(); all.hasNext();) {
			if (all.next() instanceof Element element && element.getId() != null && !seen.add(element.getId())) {
				problems.add(ProblemCode.ID_TWICE, element, ELEMENT__ID,
						"the id '" + element.getId() + "' is given twice", "Give one of them another id.");
			}
		}
	}

	private void leg(Leg leg) {
		ends(leg, leg.getFrom(), leg.getTo(), LEG__FROM, LEG__TO);
		if (leg.getMaterial() == null) {
			problems.add(ProblemCode.MATERIAL_MISSING, leg, LEG__MATERIAL, "the leg has no material",
					"Choose one in the Properties view.");
		}
		for (Gap gap : leg.getGaps()) {
			if (si(gap.getLength()) == 0) {
				problems.add(ProblemCode.GAP_ZERO, gap, GAP__LENGTH, "a gap of length 0 is no gap", "");
			}
		}
		double ironArea = LegGeometry.grossArea(leg) * leg.getStackingFactor();
		if (ironArea == 0 && LegGeometry.drawnWidth(leg) > 0 && leg.getStackingFactor() > 0 || Double.isInfinite(ironArea)) {
			problems.add(ProblemCode.VALUE_OUT_OF_DOMAIN, leg, null, "the area of iron is out of the range of numbers",
					"Check the units of its section.");
		}
		double inserted = LegGeometry.insertedLength(leg);
		double distance = LegGeometry.jointDistance(leg);
		double iron = LegGeometry.ironLength(leg);
		if (leg.getFrom() != leg.getTo() && leg.getPathLength() == null && inserted >= distance) {
			problems.add(ProblemCode.GAP_LONGER_THAN_LEG, leg, LEG__GAPS,
					"gaps and magnet take " + millimetres(inserted) + " of the " + millimetres(distance)
							+ " between the joints", "Shorten them or move the joints apart.");
		} else if (leg.getPathLength() != null && inserted > distance) {
			problems.add(ProblemCode.GAP_LONGER_THAN_DRAWN, leg, LEG__GAPS,
					"gaps and magnet take " + millimetres(inserted) + ", but the leg is drawn " + millimetres(distance)
							+ " long; its path length as given is what counts", "");
		} else if (iron == 0 && inserted == 0) {
			problems.add(ProblemCode.LEG_WITHOUT_LENGTH, leg, null, "the leg has neither iron nor gap", "");
		}
	}

	private void ends(EObject element, Object from, Object to, EStructuralFeature fromFeature,
			EStructuralFeature toFeature) {
		if (from == null || to == null) {
			problems.add(ProblemCode.VALUE_MISSING, element, from == null ? fromFeature : toFeature,
					"an end is attached to no joint", "");
		} else if (from == to) {
			problems.add(ProblemCode.SAME_JOINT_TWICE, element, toFeature,
					"both ends are attached to the joint '" + ((Element) to).getId() + "'",
					"Attach one end to another joint.");
		}
	}

	private void airPath(AirPath path) {
		ends(path, path.getFrom(), path.getTo(), AIR_PATH__FROM, AIR_PATH__TO);
		boolean measured = path.getArea() != null && path.getLength() != null;
		if (path.getPermeance() == null && !measured) {
			problems.add(ProblemCode.AIR_PATH_INCOMPLETE, path, AIR_PATH__PERMEANCE,
					"an air path needs a permeance, or an area with a length", "");
		} else if (path.getPermeance() != null && (path.getArea() != null || path.getLength() != null)) {
			problems.add(ProblemCode.AIR_PATH_TWICE, path, AIR_PATH__PERMEANCE,
					"permeance and area or length are both given", "Keep the one that is meant.");
		}
	}

	private void winding(Winding winding) {
		if (winding.getCoils().isEmpty()) {
			problems.add(ProblemCode.WINDING_WITHOUT_COIL, winding, WINDING__COILS, "the winding has no coil",
					"Add a coil, or delete the winding.");
		}
		for (Coil coil : winding.getCoils()) {
			if (coil.getLeg() == null) {
				problems.add(ProblemCode.VALUE_MISSING, coil, COIL__LEG, "the coil is on no leg", "");
			}
		}
	}

	private void operatingPoint(Design design, OperatingPoint point) {
		Set<Winding> driven = new HashSet<>();
		for (Drive drive : point.getDrives()) {
			Winding winding = drive.getWinding();
			if (winding == null || !design.getWindings().contains(winding)) {
				problems.add(ProblemCode.DRIVE_WITHOUT_WINDING, drive, DRIVE__WINDING, "the drive belongs to no winding",
						"Choose its winding, or delete it.");
			} else if (!driven.add(winding)) {
				problems.add(ProblemCode.DRIVE_TWICE, drive, DRIVE__WINDING,
						"the winding '" + winding.getId() + "' has two drives at this operating point", "Keep one.");
			}
		}
		for (Drive drive : point.getDrives()) {
			if (drive instanceof VoltageDrive pulse && si(pulse.getOnTime()) * si(point.getFrequency()) > 1) {
				problems.add(ProblemCode.ON_TIME_LONGER_THAN_PERIOD, drive, VOLTAGE_DRIVE__ON_TIME,
						"onTime = '" + pulse.getOnTime() + "': longer than the period of " + point.getFrequency(),
						"Shorten it, or lower the frequency.");
			}
		}
		boolean undriven = driven.isEmpty() && !design.getWindings().isEmpty();
		if (undriven) {
			problems.add(ProblemCode.OPERATING_POINT_WITHOUT_DRIVE, point, OPERATING_POINT__DRIVES,
					"no winding is driven at this operating point, so all currents are 0", "");
		}
	}

	private static String millimetres(double metres) {
		return Double.isFinite(metres) ? new BigDecimal(metres * 1e3).round(FOUR_DIGITS).stripTrailingZeros().toPlainString() + " mm" : "?";
	}
}
