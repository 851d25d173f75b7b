package gapwright.ui.canvas;

import java.util.List;
import java.util.function.Consumer;

import org.eclipse.emf.ecore.EObject;

import gapwright.model.Leg;
import gapwright.model.Winding;
import gapwright.model.edit.CoilEdits;
import gapwright.model.edit.GapEdits;
import gapwright.model.edit.history.Edit;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;
import gapwright.ui.session.DesignSession;

/** What can be put on a leg, with what it has to begin with. */
public final class Additions {

	/** Things that go on a leg. */
	public enum Kind {
		GAP, MAGNET, COIL
	}

	private static final String GAP = "0.5 mm";
	private static final String MAGNET = "2 mm";
	private static final int TURNS = 10;

	private Additions() {
	}

	/**
	 * @param position along the leg, 0 to 1
	 * @param made     is told of what was added
	 */
	public static Edit onLeg(Kind kind, DesignSession session, Leg leg, double position, Consumer<EObject> made) {
		return switch (kind) {
		case GAP -> then(GapEdits.add(leg, Quantity.parse(GAP, Dimension.LENGTH), position), leg,
				() -> made.accept(leg.getGaps().get(leg.getGaps().size() - 1)));
		case MAGNET -> then(GapEdits.addMagnet(leg, Quantity.parse(MAGNET, Dimension.LENGTH), position), leg,
				() -> made.accept(leg.getMagnet()));
		case COIL -> CoilEdits.add(session.design(), selectedWinding(session), leg, TURNS, position, made::accept);
		};
	}

	private static Edit then(Edit edit, Leg leg, Runnable after) {
		return Edit.all(edit.label(), List.of(edit, new Edit(edit.label(), leg, after)));
	}

	/** A selected winding gets the coil; without one a new winding begins. */
	private static Winding selectedWinding(DesignSession session) {
		return session.selection().selected().stream().filter(Winding.class::isInstance).map(Winding.class::cast)
				.findFirst().orElse(null);
	}
}
