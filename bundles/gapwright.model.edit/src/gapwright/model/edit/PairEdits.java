package gapwright.model.edit;

import java.util.Collection;
import java.util.Set;

import gapwright.model.ConnectedWinding;
import gapwright.model.ConnectionKind;
import gapwright.model.Design;
import gapwright.model.GapwrightFactory;
import gapwright.model.Ids;
import gapwright.model.Winding;
import gapwright.model.WindingConnection;
import gapwright.model.WindingLeakage;
import gapwright.model.edit.history.Edit;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;

/** Edits of what joins windings to one another: leakages between two, connections of several. */
public final class PairEdits {

	private PairEdits() {
	}

	/** Adds a leakage between two windings, concentric, with builds to be typed over. */
	public static Edit addLeakage(Design design, Winding first, Winding second) {
		return new Edit("Add leakage", design, () -> {
			WindingLeakage leakage = GapwrightFactory.eINSTANCE.createWindingLeakage();
			leakage.setId(Ids.next(design, "leakage"));
			leakage.setFirst(first);
			leakage.setSecond(second);
			leakage.setFirstBuild(millimetres("3 mm"));
			leakage.setSecondBuild(millimetres("3 mm"));
			leakage.setSeparation(millimetres("0.5 mm"));
			leakage.setHeight(millimetres("20 mm"));
			leakage.setMeanTurn(millimetres("60 mm"));
			design.getLeakages().add(leakage);
		});
	}

	/** Adds a connection of windings, all in the same sense. */
	public static Edit addConnection(Design design, ConnectionKind kind, Collection<? extends Winding> windings) {
		String label = kind == ConnectionKind.SERIES ? "Connect in series" : "Connect in parallel";
		return new Edit(label, design, () -> {
			Set<String> used = Ids.used(design);
			WindingConnection connection = GapwrightFactory.eINSTANCE.createWindingConnection();
			connection.setId(Ids.next(used, kind.getName().toLowerCase()));
			connection.setKind(kind);
			windings.forEach(winding -> connection.getMembers().add(member(winding)));
			design.getConnections().add(connection);
		});
	}

	/** Adds one winding to a connection. */
	public static Edit join(WindingConnection connection, Winding winding) {
		return new Edit("Join winding", connection, () -> connection.getMembers().add(member(winding)));
	}

	private static ConnectedWinding member(Winding winding) {
		ConnectedWinding member = GapwrightFactory.eINSTANCE.createConnectedWinding();
		member.setWinding(winding);
		return member;
	}

	private static Quantity millimetres(String text) {
		return Quantity.parse(text, Dimension.LENGTH);
	}
}
