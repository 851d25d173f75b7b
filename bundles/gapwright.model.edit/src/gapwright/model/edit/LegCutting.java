package gapwright.model.edit;

import static gapwright.model.LegGeometry.si;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;

import org.eclipse.emf.ecore.util.EcoreUtil;

import gapwright.model.Coil;
import gapwright.model.Design;
import gapwright.model.Gap;
import gapwright.model.Ids;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.Magnet;
import gapwright.model.Tolerance;
import gapwright.model.TolerancedFeature;
import gapwright.model.Winding;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;

/** Cuts a leg in pieces in series, with all that is on it. The leg itself stays as the piece that holds its gap. */
final class LegCutting {

	private final Design design;
	private final LeakageEdits.Cut cut;
	private final Set<String> ids;
	private final Leg leg;
	/** Ends of the pieces, 0 and 1 among them. */
	private final double[] bounds;
	private final Leg[] pieces;

	private LegCutting(Design design, LeakageEdits.Cut cut, Set<String> ids) {
		this.design = design;
		this.cut = cut;
		this.ids = ids;
		leg = cut.leg();
		int n = cut.at().size() + 1;
		bounds = new double[n + 1];
		bounds[n] = 1;
		for (int k = 1; k < n; k++) {
			bounds[k] = cut.at().get(k - 1);
			if (!(bounds[k] > bounds[k - 1] && bounds[k] < 1)) {
				throw new IllegalArgumentException("cuts at " + cut.at() + ": must rise between 0 and 1");
			}
		}
		pieces = new Leg[n];
	}

	/** @return the joints made, one for each cut */
	static List<Joint> cut(Design design, LeakageEdits.Cut cut, Set<String> ids) {
		return new LegCutting(design, cut, ids).cut();
	}

	private List<Joint> cut() {
		List<Joint> ends = ends();
		List<Gap> gaps = List.copyOf(leg.getGaps());
		Magnet magnet = leg.getMagnet();
		int kept = !gaps.isEmpty() ? pieceAt(gaps.get(0).getPosition()) : magnet != null ? pieceAt(magnet.getPosition()) : 0;
		Quantity path = leg.getPathLength();
		int index = design.getLegs().indexOf(leg);
		leg.getGaps().clear();
		leg.setMagnet(null);
		Leg pattern = EcoreUtil.copy(leg);
		for (int k = 0; k < pieces.length; k++) {
			pieces[k] = k == kept ? leg : EcoreUtil.copy(pattern);
			if (k != kept) {
				pieces[k].setId(Ids.next(ids, leg.getId()));
				pieces[k].setName(leg.getName() == null ? null : leg.getName() + ", part " + (k + 1));
				design.getLegs().add(index + k, pieces[k]);
			}
			pieces[k].setFrom(ends.get(k));
			pieces[k].setTo(ends.get(k + 1));
			if (path != null) {
				double part = path.si() * (bounds[k + 1] - bounds[k]) * 1e3;
				pieces[k].setPathLength(JointSpot.millimetres(part));
			}
		}
		gaps.forEach(this::place);
		if (magnet != null) {
			int k = pieceAt(magnet.getPosition());
			magnet.setPosition(within(k, magnet.getPosition()));
			pieces[k].setMagnet(magnet);
		}
		for (Winding winding : design.getWindings()) {
			for (Coil coil : List.copyOf(winding.getCoils())) {
				if (coil.getLeg() == leg) {
					spread(winding, coil);
				}
			}
		}
		tolerances();
		return ends.subList(1, pieces.length);
	}

	private List<Joint> ends() {
		List<Joint> ends = new ArrayList<>(List.of(leg.getFrom()));
		double x = si(leg.getFrom().getX()) * 1e3;
		double y = si(leg.getFrom().getY()) * 1e3;
		double dx = si(leg.getTo().getX()) * 1e3 - x;
		double dy = si(leg.getTo().getY()) * 1e3 - y;
		for (double at : cut.at()) {
			ends.add(JointSpot.at(x + at * dx, y + at * dy).in(design, ids));
		}
		ends.add(leg.getTo());
		return ends;
	}

	private int pieceAt(double position) {
		int k = 0;
		while (k + 1 < pieces.length && position > bounds[k + 1]) {
			k++;
		}
		return k;
	}

	private double within(int piece, double position) {
		double part = (position - bounds[piece]) / (bounds[piece + 1] - bounds[piece]);
		return BigDecimal.valueOf(part).setScale(6, RoundingMode.HALF_EVEN).doubleValue();
	}

	private void place(Gap gap) {
		int k = pieceAt(gap.getPosition());
		gap.setPosition(within(k, gap.getPosition()));
		pieces[k].getGaps().add(gap);
	}

	/** Turns go to the pieces by their parts of the window, whole, and all of them. */
	private void spread(Winding winding, Coil coil) {
		double wound = 0;
		double[] upTo = new double[pieces.length];
		for (int k = 0; k < pieces.length; k++) {
			wound += Math.max(0, Math.min(bounds[k + 1], cut.windowTo()) - Math.max(bounds[k], cut.windowFrom()));
			upTo[k] = wound;
		}
		int turns = coil.getTurns();
		int given = 0;
		int place = winding.getCoils().indexOf(coil);
		Coil last = null;
		for (int k = 0; k < pieces.length; k++) {
			int share = (int) Math.round(turns * upTo[k] / wound) - given;
			if (share > 0) {
				Coil part = last == null ? coil : EcoreUtil.copy(coil);
				if (part != coil) {
					part.setId(Ids.next(ids, coil.getId()));
					winding.getCoils().add(++place, part);
				}
				double from = Math.max(bounds[k], cut.windowFrom());
				double to = Math.min(bounds[k + 1], cut.windowTo());
				part.setLeg(pieces[k]);
				part.setTurns(share);
				part.setPosition(within(k, (from + to) / 2));
				last = part;
				given += share;
			}
		}
	}

	/** What holds for the leg's section holds for all pieces; a deviation of a path length in mm would count once for each. */
	private void tolerances() {
		for (Tolerance tolerance : design.getTolerances()) {
			boolean amountOfPath = tolerance.getFeature() == TolerancedFeature.PATH_LENGTH
					&& tolerance.getDeviation() != null && tolerance.getDeviation().dimension() == Dimension.LENGTH;
			if (tolerance.getTargets().contains(leg) && !amountOfPath) {
				for (Leg piece : pieces) {
					if (!tolerance.getTargets().contains(piece)) {
						tolerance.getTargets().add(piece);
					}
				}
			}
		}
	}
}
