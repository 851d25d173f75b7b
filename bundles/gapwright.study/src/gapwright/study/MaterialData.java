package gapwright.study;

import static gapwright.model.LegGeometry.si;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

import gapwright.model.CurveAtTemperature;
import gapwright.model.CurveScaling;
import gapwright.model.InitialPermeability;
import gapwright.model.Material;
import gapwright.physics.material.BhCurve;
import gapwright.physics.material.BlendedBh;
import gapwright.physics.material.CurveChange;
import gapwright.physics.material.LinearBh;

/**
 * A material lowered to numbers: its curve and its saturation at any temperature.
 * <p>
 * With several curves the field strength is interpolated at each flux density, the end curve outside. Permeabilities
 * given by temperature replace that of the curve. Where the curve scales with saturation, its polarisation goes as the
 * saturations given: J(T) = J·Bs(T)/Bs(temperature of the curve), from the end curve on where several are given.
 */
public final class MaterialData {

	/** °C; what a curve without a temperature holds at. */
	public static final double ROOM_CELSIUS = 25;

	private record CurveAt(double celsius, BhCurve curve) {
	}

	private final String id;
	private final List<CurveAt> curves = new ArrayList<>();
	private final double curveCelsius;
	private final boolean statesCurveTemperature;
	private final boolean withSaturation;
	private final TemperatureSeries permeability;
	private final SaturationData saturation;
	private final double curieCelsius;

	/** @throws IllegalArgumentException with a sentence when a curve is missing or a value outside its domain */
	public MaterialData(Material material) {
		id = Lowering.id(material);
		statesCurveTemperature = material.getCurveTemperature() != null;
		curveCelsius = material.getCurveTemperature() == null ? ROOM_CELSIUS : material.getCurveTemperature().si();
		curves.add(new CurveAt(curveCelsius, MaterialLowering.curve(material.getCurve())));
		for (CurveAtTemperature other : material.getOtherCurves()) {
			curves.add(new CurveAt(si(other.getTemperature()), MaterialLowering.curve(other.getCurve())));
		}
		curves.sort(Comparator.comparingDouble(CurveAt::celsius));
		withSaturation = material.getCurveScaling() == CurveScaling.WITH_SATURATION;
		permeability = TemperatureSeries.of(material.getPermeabilities(), InitialPermeability::getTemperature,
				InitialPermeability::getRelativePermeability);
		saturation = new SaturationData(material);
		curieCelsius = si(material.getCurieTemperature());
	}

	public String id() {
		return id;
	}

	public SaturationData saturation() {
		return saturation;
	}

	/** @return °C, NaN when not given */
	public double curieCelsius() {
		return curieCelsius;
	}

	/** @return °C that the first curve holds at */
	public double curveCelsius() {
		return curveCelsius;
	}

	/** @return whether the file says what temperature the curve holds at */
	boolean statesCurveTemperature() {
		return statesCurveTemperature;
	}

	/** @return whether the curve is another at another temperature */
	public boolean dependsOnTemperature() {
		return curves.size() > 1 || !permeability.isEmpty() || followsSaturation();
	}

	/** @return whether a change of saturation at one temperature, as by a tolerance, changes the curve */
	public boolean scales() {
		return followsSaturation() && curves.size() == 1 && CurveChange.followsSaturation(curves.get(0).curve());
	}

	/** Whether the curve goes with the saturation from temperature to temperature; a linear one cannot. */
	private boolean followsSaturation() {
		return withSaturation && !saturation.isEmpty() && curves.stream().noneMatch(c -> c.curve() instanceof LinearBh);
	}

	/** @return whether scaling was asked for where it has no effect */
	boolean scalesInVain() {
		return withSaturation && !followsSaturation();
	}

	boolean isOutsideCurves(double celsius) {
		return curves.size() > 1 && !followsSaturation() && (celsius < curves.get(0).celsius() || celsius > curves.get(curves.size() - 1).celsius());
	}

	/** @return K by which the saturation was scaled while the permeability, for want of figures, was kept; 0 if not so */
	double keepsPermeabilityOver(double celsius) {
		return followsSaturation() && permeability.isEmpty() ? Math.abs(celsius - heldAt(celsius)) : 0;
	}

	boolean isOutsidePermeabilities(double celsius) {
		return permeability.isOutside(celsius);
	}

	/** @return "25 °C to 100 °C" */
	String curveRange() {
		return Figures.of(curves.get(0).celsius()) + " °C to " + Figures.of(curves.get(curves.size() - 1).celsius()) + " °C";
	}

	String permeabilityRange() {
		return permeability.range();
	}

	/** @return the curve at a temperature */
	public BhCurve curve(double celsius) {
		return curve(celsius, 1, 1);
	}

	/**
	 * @param permeabilityFactor on the initial permeability
	 * @param saturationFactor   on the saturation; of effect where the curve scales with it
	 */
	public BhCurve curve(double celsius, double permeabilityFactor, double saturationFactor) {
		BhCurve base = blended(celsius);
		double ratio = followsSaturation() ? saturation.at(celsius) / saturation.at(heldAt(celsius)) : 1;
		if (ratio != 1 || !permeability.isEmpty()) {
			base = base.with(permeability.isEmpty() ? CurveChange.initialPermeability(base) : permeability.at(celsius), ratio);
		}
		return CurveChange.apply(base, permeabilityFactor, scales() ? saturationFactor : 1);
	}

	/** The temperature that the curve used at the one asked for was given at or interpolated to. */
	private double heldAt(double celsius) {
		return Math.min(Math.max(celsius, curves.get(0).celsius()), curves.get(curves.size() - 1).celsius());
	}

	/** @return °C that the curves are given at, rising; at least one */
	public double[] temperatures() {
		return curves.stream().mapToDouble(CurveAt::celsius).toArray();
	}

	private BhCurve blended(double celsius) {
		CurveAt below = curves.get(0);
		if (celsius <= below.celsius()) {
			return below.curve();
		}
		for (CurveAt above : curves) {
			if (above.celsius() >= celsius) {
				double share = (celsius - below.celsius()) / (above.celsius() - below.celsius());
				return share == 1 ? above.curve() : new BlendedBh(below.curve(), above.curve(), share);
			}
			below = above;
		}
		return below.curve();
	}
}
