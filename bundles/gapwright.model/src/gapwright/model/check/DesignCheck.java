package gapwright.model.check;

import static gapwright.model.GapwrightPackage.Literals.*;
import static gapwright.model.LegGeometry.si;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;

import org.eclipse.emf.common.util.TreeIterator;
import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;

import gapwright.model.AirPath;
import gapwright.model.Coil;
import gapwright.model.CurvePoint;
import gapwright.model.Design;
import gapwright.model.Drive;
import gapwright.model.Element;
import gapwright.model.Gap;
import gapwright.model.GapwrightPackage;
import gapwright.model.Leg;
import gapwright.model.LegGeometry;
import gapwright.model.Material;
import gapwright.model.OperatingPoint;
import gapwright.model.Saturation;
import gapwright.model.SectionShape;
import gapwright.model.TableCurve;
import gapwright.model.Winding;

/** Finds what is wrong or doubtful with a design before anything is computed. */
public final class DesignCheck {

	/** µ₀, H/m: a table that rises slower than air has mixed-up units. */
	private static final double MU_0 = 4e-7 * Math.PI;

	private final List<Problem> problems = new ArrayList<>();

	private DesignCheck() {
	}

	/** @return all problems, in the order of the file */
	public static List<Problem> check(Design design) {
		DesignCheck check = new DesignCheck();
		check.values(design);
		for (TreeIterator<EObject> all = design.eAllContents(); all.hasNext();) {
			check.values(all.next());
		}
		check.duplicateIds(design);
		design.getMaterials().forEach(check::material);
		design.getLegs().forEach(check::leg);
		design.getAirPaths().forEach(check::airPath);
		design.getWindings().forEach(check::winding);
		design.getOperatingPoints().forEach(point -> check.operatingPoint(design, point));
		if (design.getOperatingPoints().isEmpty()) {
			check.add("operating-point-missing", Severity.NOTE, design, DESIGN__OPERATING_POINTS,
					"there is no operating point, so nothing is computed", "Add one on the Operating points page.");
		}
		return check.problems;
	}

	private void add(String code, Severity severity, EObject element, EStructuralFeature feature, String message,
			String hint) {
		problems.add(new Problem(code, severity, element, feature, message, hint));
	}

	private void values(EObject object) {
		for (EAttribute attribute : object.eClass().getEAllAttributes()) {
			if (!concerns(object, attribute)) {
				continue;
			}
			Object value = object.eGet(attribute);
			if (value == null) {
				if (attribute.isRequired() || attribute == neededBy(object)) {
					add("value-missing", Severity.ERROR, object, attribute, attribute.getName() + " is missing", "");
				}
				continue;
			}
			String wrong = FeatureDomain.problem(attribute, value);
			if (wrong != null) {
				add("value-out-of-domain", Severity.ERROR, object, attribute,
						attribute.getName() + " = '" + value + "': " + wrong, "");
				continue;
			}
			String usual = FeatureDomain.unlikely(attribute, value);
			if (usual != null) {
				add("value-implausible", Severity.WARNING, object, attribute, attribute.getName() + " = '" + value
						+ "': units? Usual is " + usual, areaHint(attribute, value.toString()));
			}
		}
	}

	/** Dimensions of another shape than the leg's are kept for when it is switched back, but not judged. */
	private static boolean concerns(EObject object, EAttribute attribute) {
		if (!(object instanceof Leg leg)) {
			return true;
		}
		SectionShape shape = leg.getShape();
		if (attribute == LEG__WIDTH || attribute == LEG__DEPTH) {
			return shape == SectionShape.RECTANGULAR;
		}
		return attribute == LEG__DIAMETER ? shape == SectionShape.ROUND
				: attribute != LEG__AREA || shape == SectionShape.GIVEN;
	}

	private static EStructuralFeature neededBy(EObject object) {
		if (!(object instanceof Leg leg)) {
			return null;
		}
		return switch (leg.getShape()) {
		case RECTANGULAR -> leg.getWidth() == null ? LEG__WIDTH : LEG__DEPTH;
		case ROUND -> LEG__DIAMETER;
		case GIVEN -> LEG__AREA;
		};
	}

	private static String areaHint(EAttribute attribute, String value) {
		return attribute.getEAttributeType() == GapwrightPackage.Literals.AREA && value.endsWith(" m²")
				? "Did you mean " + value.replace(" m²", " mm²") + "?" : "";
	}

	private void duplicateIds(Design design) {
		Set<String> seen = new HashSet<>();
		for (TreeIterator<EObject> all = design.eAllContents(); all.hasNext();) {
			if (all.next() instanceof Element element && element.getId() != null && !seen.add(element.getId())) {
				add("id-twice", Severity.ERROR, element, ELEMENT__ID,
						"the id '" + element.getId() + "' is given twice", "Give one of them another id.");
			}
		}
	}

	private void material(Material material) {
		if (material.getCurve() == null) {
			add("value-missing", Severity.ERROR, material, MATERIAL__CURVE, "the material has no B-H curve", "");
		} else if (material.getCurve() instanceof TableCurve table) {
			table(material, table);
		}
		if (material.getSaturations().isEmpty()) {
			add("saturation-missing", Severity.WARNING, material, MATERIAL__SATURATIONS,
					"no saturation is given, so legs of this material cannot be judged",
					"Add the saturation flux density of the maker's data sheet with its temperature.");
		}
		saturations(material);
	}

	private void table(Material material, TableCurve table) {
		double h = 0;
		double b = 0;
		int number = 0;
		boolean any = false;
		for (CurvePoint point : table.getPoints()) {
			number++;
			double nextH = si(point.getFieldStrength());
			double nextB = si(point.getFluxDensity());
			if (number == 1 && nextH == 0 && nextB == 0) {
				continue;
			}
			if (!(nextH > h && nextB > b)) {
				add("table-not-rising", Severity.ERROR, point, null, "point " + number + " (" + point.getFieldStrength()
						+ ", " + point.getFluxDensity() + ") does not rise above the one before it",
						"Both values must rise from point to point.");
				return;
			}
			if ((nextB - b) / (nextH - h) < MU_0 * (1 - 1e-9)) {
				add("table-slope-below-air", Severity.WARNING, point, null, "between point " + (number - 1) + " and "
						+ number + " the flux density rises slower than in air",
						"Are the units right? 1 Oe is 79.58 A/m, 1 G is 0.1 mT.");
			}
			h = nextH;
			b = nextB;
			any = true;
		}
		if (!any) {
			add("table-not-rising", Severity.ERROR, material, MATERIAL__CURVE,
					"the table has no point besides the origin", "");
		}
	}

	private void saturations(Material material) {
		List<Saturation> sorted = new ArrayList<>(material.getSaturations());
		sorted.removeIf(s -> s.getTemperature() == null || s.getFluxDensity() == null);
		sorted.sort((s, t) -> Double.compare(s.getTemperature().si(), t.getTemperature().si()));
		for (int i = 1; i < sorted.size(); i++) {
			Saturation before = sorted.get(i - 1);
			Saturation here = sorted.get(i);
			if (before.getTemperature().si() == here.getTemperature().si()) {
				add("saturation-temperature-twice", Severity.ERROR, here, SATURATION__TEMPERATURE,
						"two saturations are given at " + here.getTemperature(), "Keep one of them.");
			} else if (here.getFluxDensity().si() > before.getFluxDensity().si()) {
				add("saturation-rises", Severity.WARNING, here, SATURATION__FLUX_DENSITY, "saturation rises from "
						+ before.getFluxDensity() + " at " + before.getTemperature() + " to " + here.getFluxDensity()
						+ " at " + here.getTemperature() + "; magnetic materials lose saturation when hot", "");
			}
		}
	}

	private void leg(Leg leg) {
		ends(leg, leg.getFrom(), leg.getTo(), LEG__FROM, LEG__TO);
		if (leg.getMaterial() == null) {
			add("material-missing", Severity.ERROR, leg, LEG__MATERIAL, "the leg has no material",
					"Choose one in the Properties view.");
		}
		for (Gap gap : leg.getGaps()) {
			if (si(gap.getLength()) == 0) {
				add("gap-zero", Severity.NOTE, gap, GAP__LENGTH, "a gap of length 0 is no gap", "");
			}
		}
		double inserted = LegGeometry.insertedLength(leg);
		double distance = LegGeometry.jointDistance(leg);
		double iron = LegGeometry.ironLength(leg);
		if (leg.getFrom() != leg.getTo() && leg.getPathLength() == null && inserted >= distance) {
			add("gap-longer-than-leg", Severity.ERROR, leg, LEG__GAPS,
					"gaps and magnet take " + millimetres(inserted) + " of the " + millimetres(distance)
							+ " between the joints", "Shorten them or move the joints apart.");
		} else if (iron == 0 && inserted == 0) {
			add("leg-without-length", Severity.ERROR, leg, null, "the leg has neither iron nor gap", "");
		}
	}

	private void ends(EObject element, Object from, Object to, EStructuralFeature fromFeature,
			EStructuralFeature toFeature) {
		if (from == null || to == null) {
			add("value-missing", Severity.ERROR, element, from == null ? fromFeature : toFeature,
					"an end is attached to no joint", "");
		} else if (from == to) {
			add("same-joint-twice", Severity.ERROR, element, toFeature,
					"both ends are attached to the joint '" + ((Element) to).getId() + "'",
					"Attach one end to another joint.");
		}
	}

	private void airPath(AirPath path) {
		ends(path, path.getFrom(), path.getTo(), AIR_PATH__FROM, AIR_PATH__TO);
		boolean measured = path.getArea() != null && path.getLength() != null;
		if (path.getPermeance() == null && !measured) {
			add("air-path-incomplete", Severity.ERROR, path, AIR_PATH__PERMEANCE,
					"an air path needs a permeance, or an area with a length", "");
		} else if (path.getPermeance() != null && (path.getArea() != null || path.getLength() != null)) {
			add("air-path-twice", Severity.ERROR, path, AIR_PATH__PERMEANCE,
					"permeance and area or length are both given", "Keep the one that is meant.");
		}
	}

	private void winding(Winding winding) {
		if (winding.getCoils().isEmpty()) {
			add("winding-without-coil", Severity.ERROR, winding, WINDING__COILS, "the winding has no coil",
					"Add a coil, or delete the winding.");
		}
		for (Coil coil : winding.getCoils()) {
			if (coil.getLeg() == null) {
				add("value-missing", Severity.ERROR, coil, COIL__LEG, "the coil is on no leg", "");
			}
		}
	}

	private void operatingPoint(Design design, OperatingPoint point) {
		Set<Winding> driven = new HashSet<>();
		for (Drive drive : point.getDrives()) {
			Winding winding = drive.getWinding();
			if (winding == null || !design.getWindings().contains(winding)) {
				add("drive-without-winding", Severity.ERROR, drive, DRIVE__WINDING, "the drive belongs to no winding",
						"Choose its winding, or delete it.");
			} else if (!driven.add(winding)) {
				add("drive-twice", Severity.ERROR, drive, DRIVE__WINDING,
						"the winding '" + winding.getId() + "' has two drives at this operating point", "Keep one.");
			}
		}
		boolean undriven = driven.isEmpty() && !design.getWindings().isEmpty();
		if (undriven) {
			add("operating-point-without-drive", Severity.NOTE, point, OPERATING_POINT__DRIVES,
					"no winding is driven at this operating point, so all currents are 0", "");
		}
	}

	private static String millimetres(double metres) {
		return Double.isNaN(metres) ? "?" : String.format(Locale.ROOT, "%.4g mm", metres * 1e3);
	}
}
