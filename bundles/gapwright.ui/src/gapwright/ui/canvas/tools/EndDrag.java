package gapwright.ui.canvas.tools;

import java.util.List;

import gapwright.model.Design;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.edit.JointSpot;
import gapwright.model.edit.LegEdits;
import gapwright.model.edit.history.Edit;
import gapwright.ui.canvas.parts.LegPart;

/** Drags one end of a leg to another joint, or to a place where a new joint is made. */
public final class EndDrag extends DragEdit {

	private final Leg leg;
	private final boolean atFrom;

	public EndDrag(LegPart part, boolean atFrom) {
		super(part, part.canvas());
		leg = part.leg();
		this.atFrom = atFrom;
	}

	@Override
	Edit edit(double[] from, double[] to) {
		Design design = canvas.session().design();
		Joint other = atFrom ? leg.getTo() : leg.getFrom();
		JointSpot spot = Spots.at(to[0], to[1], canvas, List.of(), isSnappingOff());
		return spot.joint() == other ? null : LegEdits.reattach(design, leg, atFrom, spot);
	}
}
