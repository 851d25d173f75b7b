package gapwright.model.edit;

import java.util.Set;
import java.util.function.Consumer;

import gapwright.model.Coil;
import gapwright.model.CurrentDrive;
import gapwright.model.Design;
import gapwright.model.GapwrightFactory;
import gapwright.model.Ids;
import gapwright.model.Leg;
import gapwright.model.OperatingPoint;
import gapwright.model.Winding;
import gapwright.model.edit.history.Edit;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;

/** Edits that put coils on legs. */
public final class CoilEdits {

	private static final String FIRST_CURRENT = "1 A";

	private CoilEdits() {
	}

	/**
	 * Winds a coil on a leg. A new winding is driven with 1 A at every operating point, so that figures appear at once.
	 *
	 * @param winding  that the coil belongs to, or null for a new one
	 * @param turns    1 or more
	 * @param position of its middle along the leg, 0 to 1
	 * @param made     is told of the coil once it is there
	 */
	public static Edit add(Design design, Winding winding, Leg leg, int turns, double position, Consumer<Coil> made) {
		return new Edit("Add coil", design, () -> {
			Set<String> ids = Ids.used(design);
			Winding owner = winding == null ? newWinding(design, ids) : winding;
			Coil coil = GapwrightFactory.eINSTANCE.createCoil();
			coil.setId(Ids.next(ids, "coil"));
			coil.setLeg(leg);
			coil.setTurns(turns);
			coil.setPosition(position);
			owner.getCoils().add(coil);
			made.accept(coil);
		});
	}

	private static Winding newWinding(Design design, Set<String> ids) {
		Winding winding = GapwrightFactory.eINSTANCE.createWinding();
		winding.setId(Ids.next(ids, "winding"));
		design.getWindings().add(winding);
		for (OperatingPoint point : design.getOperatingPoints()) {
			CurrentDrive drive = GapwrightFactory.eINSTANCE.createCurrentDrive();
			drive.setId(Ids.next(ids, "drive"));
			drive.setWinding(winding);
			drive.setCurrent(Quantity.parse(FIRST_CURRENT, Dimension.CURRENT));
			point.getDrives().add(drive);
		}
		return winding;
	}
}
