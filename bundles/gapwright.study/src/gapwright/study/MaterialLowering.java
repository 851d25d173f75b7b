package gapwright.study;

import gapwright.model.ArctanCurve;
import gapwright.model.Curve;
import gapwright.model.CurvePoint;
import gapwright.model.KneeCurve;
import gapwright.model.LegGeometry;
import gapwright.model.LinearCurve;
import gapwright.model.RollOffCurve;
import gapwright.model.TableCurve;
import gapwright.physics.material.ArctanBh;
import gapwright.physics.material.BhCurve;
import gapwright.physics.material.KneeBh;
import gapwright.physics.material.LinearBh;
import gapwright.physics.material.RollOffBh;
import gapwright.physics.material.TableBh;

/** Turns the curves of the model into those of the physics. */
public final class MaterialLowering {

	private MaterialLowering() {
	}

	/** @throws IllegalArgumentException with a sentence when the curve is missing or a value outside its domain */
	public static BhCurve curve(Curve curve) {
		if (curve instanceof LinearCurve linear) {
			return new LinearBh(linear.getRelativePermeability());
		}
		if (curve instanceof KneeCurve knee) {
			return new KneeBh(knee.getInitialPermeability(), LegGeometry.si(knee.getSaturationPolarisation()));
		}
		if (curve instanceof ArctanCurve arctan) {
			return new ArctanBh(arctan.getInitialPermeability(), LegGeometry.si(arctan.getSaturationPolarisation()));
		}
		if (curve instanceof RollOffCurve rollOff) {
			return new RollOffBh(rollOff.getInitialPermeability(), LegGeometry.si(rollOff.getHalfFieldStrength()),
					rollOff.getExponent());
		}
		if (curve instanceof TableCurve table) {
			return new TableBh(
					table.getPoints().stream().map(CurvePoint::getFieldStrength).mapToDouble(LegGeometry::si).toArray(),
					table.getPoints().stream().map(CurvePoint::getFluxDensity).mapToDouble(LegGeometry::si).toArray());
		}
		throw new IllegalArgumentException("there is no B-H curve");
	}
}
