package gapwright.model.edit;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;

import gapwright.model.AirPath;
import gapwright.model.Design;
import gapwright.model.GapwrightFactory;
import gapwright.model.Ids;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.edit.history.Edit;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;

/** Adds estimated air paths across windows, cutting the legs they end at. */
public final class LeakageEdits {

	/**
	 * Where a leg is to be cut.
	 *
	 * @param at         between 0 and 1 from its from to its to joint, rising, at least one
	 * @param windowFrom where the window begins on that scale; coils lie within it, evenly spread
	 * @param windowTo   where it ends
	 */
	public record Cut(Leg leg, List<Double> at, double windowFrom, double windowTo) {
	}

	/**
	 * A point that an air path ends at.
	 *
	 * @param at 0 at the from joint, 1 at the to joint, else one of the leg's cuts
	 */
	public record Point(Leg leg, double at) {
	}

	/** @param henry permeance, H, &gt; 0 */
	public record Path(Point first, Point second, double henry) {
	}

	private LeakageEdits() {
	}

	/**
	 * @param cuts  at most one for each leg
	 * @param paths each of whose ends is an end of a leg or a cut
	 */
	public static Edit add(Design design, List<Cut> cuts, List<Path> paths) {
		return new Edit("Add leakage across windows", design, () -> {
			Set<String> ids = Ids.used(design);
			Map<Point, Joint> joints = new HashMap<>();
			for (Cut cut : cuts) {
				joints.put(new Point(cut.leg(), 0), cut.leg().getFrom());
				joints.put(new Point(cut.leg(), 1), cut.leg().getTo());
				List<Joint> made = LegCutting.cut(design, cut, ids);
				for (int k = 0; k < made.size(); k++) {
					joints.put(new Point(cut.leg(), cut.at().get(k)), made.get(k));
				}
			}
			for (Path path : paths) {
				AirPath air = GapwrightFactory.eINSTANCE.createAirPath();
				air.setId(Ids.next(ids, "leakage"));
				air.setFrom(joint(joints, path.first()));
				air.setTo(joint(joints, path.second()));
				air.setPermeance(Quantity.of(rounded(path.henry() * 1e9), "nH", Dimension.PERMEANCE));
				air.setLeakage(true);
				design.getAirPaths().add(air);
			}
		});
	}

	private static Joint joint(Map<Point, Joint> joints, Point point) {
		Joint joint = joints.get(point);
		if (joint == null && point.at() == 0) {
			return point.leg().getFrom();
		}
		if (joint == null && point.at() == 1) {
			return point.leg().getTo();
		}
		if (joint == null) {
			throw new IllegalArgumentException("leg " + point.leg().getId() + " has no cut at " + point.at());
		}
		return joint;
	}

	/** Four figures: it is an estimate. */
	private static double rounded(double value) {
		return new BigDecimal(value).round(new MathContext(4)).doubleValue();
	}
}
