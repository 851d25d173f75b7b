package gapwright.model;

import static gapwright.model.LegGeometry.si;

import java.util.Locale;

import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;

/** What a tolerance is on: which elements have a toleranced value, and how far it may be off. All in SI units. */
public final class TolerancedValue {

	/** µ₀, H/m: a table's initial permeability is its first secant over this. */
	private static final double MU_0 = 4e-7 * Math.PI;

	private TolerancedValue() {
	}

	/** @return whether an element has the value now; a leg's dimensions follow its shape */
	public static boolean has(Element element, TolerancedFeature feature) {
		return switch (feature) {
		case GAP_LENGTH -> element instanceof Gap;
		case WIDTH, DEPTH -> element instanceof Leg leg && leg.getShape() == SectionShape.RECTANGULAR;
		case DIAMETER -> element instanceof Leg leg && leg.getShape() == SectionShape.ROUND;
		case AREA -> element instanceof Leg leg && leg.getShape() == SectionShape.GIVEN;
		case PATH_LENGTH, STACKING_FACTOR -> element instanceof Leg;
		case MAGNET_LENGTH, REMANENCE -> element instanceof Magnet;
		case PERMEABILITY, SATURATION -> element instanceof Material;
		case CURRENT -> element instanceof Winding;
		};
	}

	/**
	 * @return value as drawn, in SI units; of a material's saturation the lowest given, of a winding's current the
	 *         largest of all operating points; NaN when the element does not have it or it is left out
	 */
	public static double nominal(Element element, TolerancedFeature feature) {
		if (!has(element, feature)) {
			return Double.NaN;
		}
		return switch (feature) {
		case GAP_LENGTH -> si(((Gap) element).getLength());
		case WIDTH -> si(((Leg) element).getWidth());
		case DEPTH -> si(((Leg) element).getDepth());
		case DIAMETER -> si(((Leg) element).getDiameter());
		case AREA -> si(((Leg) element).getArea());
		case PATH_LENGTH -> LegGeometry.ironLength((Leg) element);
		case STACKING_FACTOR -> ((Leg) element).getStackingFactor();
		case MAGNET_LENGTH -> si(((Magnet) element).getLength());
		case REMANENCE -> si(((Magnet) element).getRemanence());
		case PERMEABILITY -> permeability(((Material) element).getCurve());
		case SATURATION -> ((Material) element).getSaturations().stream().mapToDouble(s -> si(s.getFluxDensity())).min()
				.orElse(Double.NaN);
		case CURRENT -> largestCurrent((Winding) element);
		};
	}

	/** @return greatest deviation of a nominal value to either side, in its SI unit; NaN when there is none */
	public static double amount(Tolerance tolerance, double nominal) {
		Quantity deviation = tolerance.getDeviation();
		return deviation == null ? Double.NaN
				: deviation.dimension() == Dimension.DEVIATION ? Math.abs(nominal) * deviation.si() : deviation.si();
	}

	/** @return what an amount of deviation of the value measures; DEVIATION when only a share makes sense */
	public static Dimension dimension(TolerancedFeature feature) {
		return switch (feature) {
		case GAP_LENGTH, WIDTH, DEPTH, DIAMETER, PATH_LENGTH, MAGNET_LENGTH -> Dimension.LENGTH;
		case AREA -> Dimension.AREA;
		case REMANENCE, SATURATION -> Dimension.FLUX_DENSITY;
		case CURRENT -> Dimension.CURRENT;
		case STACKING_FACTOR, PERMEABILITY -> Dimension.DEVIATION;
		};
	}

	/** @return for messages: "gap length" */
	public static String words(TolerancedFeature feature) {
		return feature.getName().replace('_', ' ').toLowerCase(Locale.ROOT);
	}

	/** Relative, at a field strength of 0. */
	private static double permeability(Curve curve) {
		if (curve instanceof LinearCurve linear) {
			return linear.getRelativePermeability();
		}
		if (curve instanceof KneeCurve knee) {
			return knee.getInitialPermeability();
		}
		if (curve instanceof ArctanCurve arctan) {
			return arctan.getInitialPermeability();
		}
		if (curve instanceof RollOffCurve rollOff) {
			return rollOff.getInitialPermeability();
		}
		return curve instanceof TableCurve table ? table.getPoints().stream().filter(p -> si(p.getFieldStrength()) > 0)
				.mapToDouble(p -> si(p.getFluxDensity()) / (MU_0 * si(p.getFieldStrength()))).findFirst().orElse(Double.NaN)
				: Double.NaN;
	}

	private static double largestCurrent(Winding winding) {
		if (!(winding.eContainer() instanceof Design design)) {
			return Double.NaN;
		}
		return design.getOperatingPoints().stream().flatMap(point -> point.getDrives().stream())
				.filter(drive -> drive.getWinding() == winding)
				.mapToDouble(drive -> Math.abs(drive instanceof CurrentDrive current ? si(current.getCurrent())
						: si(((VoltageDrive) drive).getBias()))).max().orElse(Double.NaN);
	}
}
