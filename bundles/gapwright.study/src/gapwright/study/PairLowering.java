package gapwright.study;

import java.util.ArrayList;
import java.util.Collections;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

import org.eclipse.emf.ecore.EObject;

import gapwright.model.Coil;
import gapwright.model.ConnectedWinding;
import gapwright.model.ConnectionKind;
import gapwright.model.Design;
import gapwright.model.Leg;
import gapwright.model.Winding;
import gapwright.model.WindingConnection;
import gapwright.model.WindingLeakage;
import gapwright.physics.leakage.WindingPair;

/** Lowers what joins windings, with a finding where a formula does not hold. */
final class PairLowering {

	private static final double SLENDER_FROM = 1;
	private static final double SENSELESS_BELOW = 0.5;

	private final Design design;
	private final Map<Winding, Integer> index;
	private final List<StudyInput.WindingData> windings;
	private final Set<EObject> broken;
	private final Findings findings;

	PairLowering(Design design, Map<Winding, Integer> index, List<StudyInput.WindingData> windings, Set<EObject> broken,
			Findings findings) {
		this.design = design;
		this.index = index;
		this.windings = windings;
		this.broken = broken;
		this.findings = findings;
	}

	List<StudyInput.LeakageData> leakages() {
		List<StudyInput.LeakageData> data = new ArrayList<>();
		for (WindingLeakage leakage : design.getLeakages()) {
			if (!broken.contains(leakage) && isWhole(leakage.getFirst()) && isWhole(leakage.getSecond())) {
				WindingPair pair = new WindingPair(leakage.getFirstBuild().si(), leakage.getSecondBuild().si(),
						leakage.getSeparation().si(), leakage.getHeight().si(), leakage.getMeanTurn().si(), leakage.getInterfaces());
				if (judge(leakage, pair)) {
					data.add(new StudyInput.LeakageData(Lowering.id(leakage), index.get(leakage.getFirst()),
							index.get(leakage.getSecond()), pair));
				}
			}
		}
		return data;
	}

	private boolean isWhole(Winding winding) {
		return winding != null && index.containsKey(winding) && windings.get(index.get(winding)).whole();
	}

	private boolean judge(WindingLeakage leakage, WindingPair pair) {
		String ratio = "the windings extend " + leakage.getHeight() + ", " + Figures.of(pair.slenderness())
				+ " of their thickness with the insulation, " + Figures.millimetres(pair.sectionThickness());
		if (pair.slenderness() < SENSELESS_BELOW) {
			findings.error("leakage-refused", Lowering.id(leakage), ratio + "; the energy method has no meaning below 0.5",
					"Measure it, or draw the leakage as air paths.");
			return false;
		}
		if (pair.slenderness() < SLENDER_FROM) {
			findings.warning("leakage-outside-validity", Lowering.id(leakage), ratio + "; the energy method holds from 1 on",
					"Expect the leakage inductance to be off by more than 10 %.");
		}
		if (Collections.disjoint(legs(leakage.getFirst()), legs(leakage.getSecond()))) {
			findings.warning("leakage-windings-apart", Lowering.id(leakage),
					"the windings share no leg, the energy method is for windings in one window round one leg",
					"Draw their leakage as air paths across the window.");
		}
		return true;
	}

	private static Set<Leg> legs(Winding winding) {
		Set<Leg> legs = new HashSet<>();
		for (Coil coil : winding.getCoils()) {
			legs.add(coil.getLeg());
		}
		return legs;
	}

	List<StudyInput.ConnectionData> connections() {
		List<StudyInput.ConnectionData> data = new ArrayList<>();
		for (WindingConnection connection : design.getConnections()) {
			boolean whole = !broken.contains(connection)
					&& connection.getMembers().stream().map(ConnectedWinding::getWinding).allMatch(this::isWhole);
			boolean series = connection.getKind() == ConnectionKind.SERIES;
			if (whole && (series || sameTurns(connection))) {
				data.add(new StudyInput.ConnectionData(Lowering.id(connection), series,
						connection.getMembers().stream().mapToInt(m -> index.get(m.getWinding())).toArray(),
						connection.getMembers().stream().mapToInt(m -> m.isReversed() ? -1 : 1).toArray()));
			}
		}
		return data;
	}

	/** Unequal turns round one and the same flux would drive a current through each other's resistance alone. */
	private boolean sameTurns(WindingConnection connection) {
		List<ConnectedWinding> members = connection.getMembers();
		for (int i = 0; i < members.size(); i++) {
			for (int j = 0; j < i; j++) {
				Set<Leg> first = legs(members.get(i).getWinding());
				if (first.size() == 1 && first.equals(legs(members.get(j).getWinding()))
						&& signedTurns(members.get(i)) != signedTurns(members.get(j))) {
					findings.error("unequal-parallel-turns", Lowering.id(connection), "'" + Lowering.id(members.get(j).getWinding())
							+ "' with " + signedTurns(members.get(j)) + " turns and '" + Lowering.id(members.get(i).getWinding())
							+ "' with " + signedTurns(members.get(i))
							+ " round the same leg cannot be in parallel: a current would circulate between them",
							"Give both the same number of turns and the same sense.");
					return false;
				}
			}
		}
		return true;
	}

	private static int signedTurns(ConnectedWinding member) {
		int sum = 0;
		for (Coil coil : member.getWinding().getCoils()) {
			sum += coil.isReversed() ? -coil.getTurns() : coil.getTurns();
		}
		return member.isReversed() ? -sum : sum;
	}
}
