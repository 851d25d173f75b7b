package gapwright.model.edit;

import gapwright.model.Design;
import gapwright.model.Fringing;
import gapwright.model.Gap;
import gapwright.model.GapwrightFactory;
import gapwright.model.Ids;
import gapwright.model.Leg;
import gapwright.model.Magnet;
import gapwright.model.edit.history.Edit;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;

/** Edits of what lies across a leg: gaps and a magnet. */
public final class GapEdits {

	private GapEdits() {
	}

	/**
	 * @param length   of the gap
	 * @param position of its middle along the leg, 0 to 1
	 */
	public static Edit add(Leg leg, Quantity length, double position) {
		return new Edit("Add gap", leg, () -> {
			Gap gap = GapwrightFactory.eINSTANCE.createGap();
			gap.setId(Ids.next((Design) leg.eContainer(), "gap"));
			gap.setLength(length);
			gap.setFringing(Fringing.WIDENED);
			gap.setPosition(position);
			leg.getGaps().add(gap);
		});
	}

	/**
	 * Puts a magnet across the leg in place of the one there: 1 T, a mid-range sintered magnet (indicative).
	 *
	 * @param length   along the flux
	 * @param position of its middle along the leg, 0 to 1
	 */
	public static Edit addMagnet(Leg leg, Quantity length, double position) {
		return new Edit("Add magnet", leg, () -> {
			Magnet magnet = GapwrightFactory.eINSTANCE.createMagnet();
			magnet.setId(Ids.next((Design) leg.eContainer(), "magnet"));
			magnet.setLength(length);
			magnet.setRemanence(Quantity.parse("1 T", Dimension.FLUX_DENSITY));
			magnet.setPosition(position);
			leg.setMagnet(magnet);
		});
	}
}
