package gapwright.model.check;

import static gapwright.model.GapwrightPackage.Literals.*;

import java.util.HashSet;
import java.util.Set;

import gapwright.model.ConnectedWinding;
import gapwright.model.Design;
import gapwright.model.Winding;
import gapwright.model.WindingConnection;
import gapwright.model.WindingLeakage;

/** Judges what joins windings: leakages between two of them, connections of several. */
final class PairCheck {

	private final Problems problems;

	PairCheck(Problems problems) {
		this.problems = problems;
	}

	void check(Design design) {
		design.getLeakages().forEach(this::leakage);
		design.getConnections().forEach(this::connection);
	}

	private void leakage(WindingLeakage leakage) {
		if (leakage.getFirst() == null || leakage.getSecond() == null) {
			problems.add(ProblemCode.VALUE_MISSING, leakage,
					leakage.getFirst() == null ? WINDING_LEAKAGE__FIRST : WINDING_LEAKAGE__SECOND,
					"a leakage lies between two windings, one is missing", "Choose it on the Windings page.");
		} else if (leakage.getFirst() == leakage.getSecond()) {
			problems.add(ProblemCode.WINDING_TWICE, leakage, WINDING_LEAKAGE__SECOND,
					"both windings are '" + leakage.getFirst().getId() + "'", "Choose another for one of them.");
		}
	}

	private void connection(WindingConnection connection) {
		if (connection.getMembers().size() < 2) {
			problems.add(ProblemCode.CONNECTION_INCOMPLETE, connection, WINDING_CONNECTION__MEMBERS,
					"a connection joins at least two windings, this one has " + connection.getMembers().size(),
					"Join another winding, or delete it.");
		}
		Set<Winding> seen = new HashSet<>();
		for (ConnectedWinding member : connection.getMembers()) {
			if (member.getWinding() == null) {
				problems.add(ProblemCode.VALUE_MISSING, member, CONNECTED_WINDING__WINDING, "winding is missing", "");
			} else if (!seen.add(member.getWinding())) {
				problems.add(ProblemCode.WINDING_TWICE, member, CONNECTED_WINDING__WINDING,
						"the winding '" + member.getWinding().getId() + "' is joined twice", "Keep it once.");
			}
		}
	}
}
