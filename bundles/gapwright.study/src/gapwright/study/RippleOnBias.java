package gapwright.study;

import gapwright.model.check.Severity;
import gapwright.physics.material.BhCurve;
import gapwright.physics.material.BlendedBh;
import gapwright.physics.material.LinearBh;
import gapwright.physics.material.RollOffBh;
import gapwright.physics.network.Network;
import gapwright.physics.network.Solution;

/**
 * Notes where a small ripple rides on a large bias and the iron takes most of the MMF: real material answers with its
 * incremental permeability, which hysteresis keeps below the slope of the curve. Own rule: less than half in gaps and
 * air, each branch weighted by its flux, so that the parts add up to all the ampere-turns.
 */
final class RippleOnBias {

	private static final double HALF = 0.5;

	private RippleOnBias() {
	}

	static void add(StudyInput input, StudyInput.PointData point, Solution atMean, Findings findings) {
		if (gapShare(point.network(), atMean) >= HALF) {
			return;
		}
		for (int w = 0; w < input.windings.size(); w++) {
			StudyInput.DriveData drive = point.drives().get(w);
			double swing = drive.imposesLinkage() ? drive.linkageSwing() : drive.ripple();
			double bias = Math.abs(drive.imposesLinkage() ? atMean.linkage()[w] : drive.meanCurrent());
			if (swing > 0 && swing / 2 < bias) {
				findings.add(new Finding(Severity.NOTE, "ripple-on-bias", input.windings.get(w).id(), point.id(),
						"its ripple is small against its bias and the gaps take less than half of the ampere-turns:"
								+ " the material's hysteresis makes the inductance for the ripple lower than shown",
						"Use the maker's incremental permeability under bias, or measure."));
			}
		}
	}

	/** Share of Σ flux × MMF drop that lies in gaps, air and material whose curve is incremental already. */
	private static double gapShare(Network network, Solution s) {
		double iron = 0;
		double rest = 0;
		for (int k = 0; k < network.legCount(); k++) {
			double flux = s.legFlux()[k];
			double drop = flux * s.legMmfDrop()[k];
			if (isReversible(network.curve(k))) {
				rest += drop;
			} else {
				iron += drop;
			}
			rest += network.seriesReluctance(k) * flux * flux;
		}
		for (int p = 0; p < network.airPathCount(); p++) {
			rest += s.airFlux()[p] * s.airFlux()[p] / network.permeance(p);
		}
		return iron == 0 ? 1 : rest / (iron + rest);
	}

	/** Whether the curve has no hysteresis behind it: linear, or integrated from incremental permeability. */
	private static boolean isReversible(BhCurve curve) {
		return curve instanceof LinearBh || curve instanceof RollOffBh
				|| curve instanceof BlendedBh blended && isReversible(blended.first()) && isReversible(blended.second());
	}
}
