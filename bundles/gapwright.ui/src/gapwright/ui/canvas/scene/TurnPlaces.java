package gapwright.ui.canvas.scene;

import java.util.ArrayList;
import java.util.List;

import gapwright.model.Coil;
import gapwright.model.Gap;
import gapwright.model.LegGeometry;
import gapwright.model.Winding;

/**
 * Where a coil's turns are cut open beside its bar: packed in rows from the wall outwards, to the wire's scale where it
 * is known, leaving a gap beneath them free.
 *
 * @param along   position along the bar's axis of each turn, mm
 * @param outward distance of each turn's centre from the axis, mm
 * @param pitch   between turns, mm
 */
public record TurnPlaces(double[] along, double[] outward, double pitch) {

	/** Clear distance of the first row from the iron, mm, in place of former and insulation. */
	private static final double CLEARANCE = 1;
	/** Insulated over bare diameter, about (common practice). */
	private static final double INSULATION = 1.12;
	/** Pitch where no wire is chosen, mm. */
	private static final double PITCH = 2.1;
	/** Kept free on either side of a gap, mm: fringing heats turns there, and its length is written there. */
	private static final double SLOT_CLEAR = 1;
	/** Share of the visible leg that all its coils may cover. */
	private static final double COVERED = 0.8;
	/** Rows that a coil may have before its turns are drawn smaller than they are. */
	private static final int MOST_ROWS = 6;
	/** More turns than this are not told apart by anybody; the rest is not drawn. */
	private static final int MOST_TURNS = 240;

	/** @return the places, none when the coil has no turns */
	public static TurnPlaces of(Coil coil, Bar bar, int coilsOnLeg) {
		int turns = Math.min(coil.getTurns(), MOST_TURNS);
		double room = COVERED * (bar.end() - bar.start()) / Math.max(1, coilsOnLeg);
		double centre = coil.getPosition() * bar.length();
		List<double[]> slots = slots(bar);
		double pitch = pitch(coil, turns, room);
		int perRow = Math.max(1, Math.min(turns, (int) Math.floor(room / pitch)));
		// even rows look wound, a lone last turn does not
		int rows = (turns + perRow - 1) / Math.max(1, perRow);
		perRow = rows == 0 ? 1 : (turns + rows - 1) / rows;
		double[] places = row(perRow, pitch, centre, slots);
		double[] along = new double[Math.max(0, turns)];
		double[] outward = new double[along.length];
		for (int t = 0; t < along.length; t++) {
			along[t] = places[t % perRow];
			outward[t] = bar.width() / 2 + CLEARANCE + (t / perRow + 0.5) * pitch;
		}
		return new TurnPlaces(along, outward, pitch);
	}

	private static double pitch(Coil coil, int turns, double room) {
		double wire = coil.eContainer() instanceof Winding winding ? LegGeometry.si(winding.getWire()) * 1e3 : Double.NaN;
		double wanted = wire > 0 ? wire * INSULATION : PITCH;
		double most = room * MOST_ROWS / Math.max(1, turns);
		return Math.min(wanted, Math.max(most, 1e-3));
	}

	/** Positions of one row: symmetric about the centre, or packed from both sides of the first slot beneath it. */
	private static double[] row(int count, double pitch, double centre, List<double[]> slots) {
		double first = centre - (count - 1) / 2.0 * pitch;
		double[] places = new double[count];
		for (int i = 0; i < count; i++) {
			places[i] = first + i * pitch;
		}
		for (double[] slot : slots) {
			if (slot[0] > first - pitch && slot[0] < first + count * pitch) {
				int before = (int) Math.max(0, Math.min(count, Math.round((slot[0] - first) / pitch + 0.5)));
				for (int i = 0; i < count; i++) {
					places[i] = i < before ? slot[0] - slot[1] - (before - i - 0.5) * pitch
							: slot[0] + slot[1] + (i - before + 0.5) * pitch;
				}
				break;
			}
		}
		return places;
	}

	/** Middle and half length of each gap along the axis, with room for its label. */
	private static List<double[]> slots(Bar bar) {
		List<double[]> slots = new ArrayList<>();
		for (Gap gap : bar.leg().getGaps()) {
			double length = Math.max(0, LegGeometry.si(gap.getLength()) * 1e3) * gap.getPieces();
			slots.add(new double[] { gap.getPosition() * bar.length(), length / 2 + SLOT_CLEAR });
		}
		return slots;
	}
}
