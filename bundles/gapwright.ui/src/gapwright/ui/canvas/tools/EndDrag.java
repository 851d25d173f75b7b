package gapwright.ui.canvas.tools;

import java.util.List;

import gapwright.model.AirPath;
import gapwright.model.Design;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.edit.JointSpot;
import gapwright.model.edit.LegEdits;
import gapwright.model.edit.history.Edit;
import gapwright.ui.canvas.parts.ElementPart;

/** Drags one end of a leg or an air path to another joint, or to a place where a new joint is made. */
public final class EndDrag extends DragEdit {

	private final ElementPart part;
	private final boolean atFrom;

	/** @param part of a leg or an air path */
	public EndDrag(ElementPart part, boolean atFrom) {
		super(part, part.canvas());
		this.part = part;
		this.atFrom = atFrom;
	}

	@Override
	Edit edit(double[] from, double[] to) {
		Design design = canvas.session().design();
		JointSpot spot = Spots.at(to[0], to[1], canvas, List.of(), isSnappingOff());
		if (part.element() instanceof AirPath path) {
			Joint other = atFrom ? path.getTo() : path.getFrom();
			return spot.joint() == other ? null : LegEdits.reattach(design, path, atFrom, spot);
		}
		Leg leg = (Leg) part.element();
		Joint other = atFrom ? leg.getTo() : leg.getFrom();
		return spot.joint() == other ? null : LegEdits.reattach(design, leg, atFrom, spot);
	}
}
