package gapwright.model.edit;

import java.util.Set;

import gapwright.model.Coil;
import gapwright.model.Design;
import gapwright.model.GapwrightFactory;
import gapwright.model.Ids;
import gapwright.model.Leg;
import gapwright.model.Winding;
import gapwright.model.edit.history.Edit;

/** Edits of windings and their coils. */
public final class WindingEdits {

	private WindingEdits() {
	}

	/**
	 * Adds a winding with one coil.
	 *
	 * @param leg   what the coil goes round; null adds a winding without a coil
	 * @param turns 1 or more
	 */
	public static Edit add(Design design, Leg leg, int turns) {
		return new Edit("Add winding", design, () -> {
			Set<String> used = Ids.used(design);
			Winding winding = GapwrightFactory.eINSTANCE.createWinding();
			winding.setId(Ids.next(used, "winding"));
			if (leg != null) {
				winding.getCoils().add(coil(leg, turns, Ids.next(used, "coil")));
			}
			design.getWindings().add(winding);
		});
	}

	/** @param turns 1 or more */
	public static Edit addCoil(Winding winding, Leg leg, int turns) {
		return new Edit("Add coil", winding,
				() -> winding.getCoils().add(coil(leg, turns, Ids.next((Design) winding.eContainer(), "coil"))));
	}

	private static Coil coil(Leg leg, int turns, String id) {
		Coil coil = GapwrightFactory.eINSTANCE.createCoil();
		coil.setId(id);
		coil.setLeg(leg);
		coil.setTurns(turns);
		return coil;
	}
}
