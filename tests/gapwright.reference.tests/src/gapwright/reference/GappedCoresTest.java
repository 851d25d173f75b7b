package gapwright.reference;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

import org.junit.jupiter.api.Test;

import com.google.gson.JsonObject;

import gapwright.physics.gap.Fringing;
import gapwright.physics.gap.GapGeometry;
import gapwright.physics.gap.Section;
import gapwright.physics.leakage.WindowPath;
import gapwright.physics.material.LinearBh;
import gapwright.physics.network.Excitation;
import gapwright.physics.network.Network;
import gapwright.physics.network.NetworkSolver;

/**
 * Whole gapped E cores, as networks of legs, yokes and corners, against field solutions, see data/fields/SOURCES.md:
 * how far a designer's inductance is from the field's with each gap method.
 */
class GappedCoresTest {

	private static final Path GUIDE = Path.of("../../bundles/gapwright.help/html/gaps.html");
	private static final double ENDLESS = 1e9;

	/** A planar core, per metre of depth; lengths in m. */
	private record Core(double centre, double window, double outer, double halfHeight, double yoke, double centreGap,
			double outerGap, double permeability, double inductance) {

		/** @return inductance per turn squared and metre, H/m */
		double solved(Fringing method) {
			LinearBh iron = new LinearBh(permeability);
			Network.Builder builder = Network.builder();
			int top = builder.joint();
			int bottom = builder.joint();
			double height = 2 * halfHeight;
			int wound = builder.leg(bottom, top, iron, height - centreGap, centre, reluctance(method, centre, centreGap), 0);
			for (int side = 0; side < 2; side++) {
				int[] joints = new int[7];
				for (int i = 1; i < 6; i++) {
					joints[i] = builder.joint();
				}
				joints[0] = top;
				joints[6] = bottom;
				corner(builder, joints[0], joints[1], iron, centre / 2);
				builder.leg(joints[1], joints[2], iron, window, yoke, 0, 0);
				corner(builder, joints[2], joints[3], iron, outer);
				builder.leg(joints[3], joints[4], iron, height - outerGap, outer, reluctance(method, outer, outerGap), 0);
				corner(builder, joints[4], joints[5], iron, outer);
				int last = builder.joint();
				builder.leg(joints[5], last, iron, window, yoke, 0, 0);
				corner(builder, last, joints[6], iron, centre / 2);
			}
			int winding = builder.winding();
			builder.coil(winding, wound, 1);
			return new NetworkSolver(builder.build()).solve(Excitation.currents(1)).differentialInductance()[0][0];
		}

		/** Corner between a leg and the yoke: IEC 60205 (from memory), quarter circle of the mean of both widths. */
		private void corner(Network.Builder builder, int from, int to, LinearBh iron, double leg) {
			builder.leg(from, to, iron, Math.PI / 8 * (leg + yoke), (leg + yoke) / 2, 0, 0);
		}

		private double reluctance(Fringing method, double width, double gap) {
			return gap == 0 ? 0
					: ENDLESS / method.permeance(GapGeometry.centred(new Section.Rectangular(width, ENDLESS), gap, 1, 2 * halfHeight));
		}

		/**
		 * Both windows' leakage: their MMF rises from 0 at each yoke to half of the winding's at the gap, so that the
		 * energy is that of a third of the permeance at half the MMF.
		 */
		double leakage() {
			double planar = new WindowPath(2 * halfHeight, window, ENDLESS, 0).permeance() / ENDLESS;
			return 2 * planar / 3 / 4;
		}

		double error(Fringing method) {
			return solved(method) / inductance - 1;
		}
	}

	private static List<Core> cores() throws IOException {
		List<Core> cores = new ArrayList<>();
		for (JsonObject row : FieldTable.read("gapped-e-core.json")) {
			JsonObject in = row.getAsJsonObject("inputs");
			cores.add(new Core(of(in, "centreWidth"), of(in, "windowWidth"), of(in, "outerWidth"), of(in, "halfWindowHeight"),
					of(in, "yokeThickness"), of(in, "centreGap"), of(in, "outerGap"), of(in, "relativePermeability"),
					of(row.getAsJsonObject("expected"), "inductancePerMetre")));
		}
		assertEquals(4, cores.size());
		return cores;
	}

	private static double of(JsonObject object, String name) {
		return object.get(name).getAsDouble();
	}

	/** The errors stated for these cores beforehand, in tenths of a per cent; nothing was adjusted to them. */
	@Test
	void everyMethodIsOffByAsMuchAsStated() throws IOException {
		double[][] stated = { { -12.7, -7.2, 2.4, 5.8 }, { -5.0, -3.8, -0.4, 0.7 }, { -13.2, -9.2, -0.3, 3.1 },
				{ -15.0, -6.9, 3.5, 7.9 } };
		List<Core> cores = cores();
		for (int i = 0; i < stated.length; i++) {
			Core core = cores.get(i);
			assertEquals(stated[i][0], core.error(Fringing.NONE) * 100, 0.051);
			assertEquals(stated[i][1], core.error(Fringing.WIDENED) * 100, 0.051);
			assertEquals(stated[i][2], core.error(Fringing.CONFORMAL) * 100, 0.051);
			assertEquals(stated[i][3], (core.error(Fringing.CONFORMAL) + core.leakage() / core.inductance()) * 100, 0.1);
		}
	}

	/** A window's leakage beside a conformal gap in the wound leg counts the same field twice: it only makes things worse. */
	@Test
	void leakageBesideAConformalGapInTheWoundLegReadsHigh() throws IOException {
		for (Core core : cores()) {
			double with = core.error(Fringing.CONFORMAL) + core.leakage() / core.inductance();
			assertTrue(with > 0);
			assertTrue(with > core.error(Fringing.CONFORMAL));
		}
	}

	@Test
	void theGuideShowsTheErrorOfTheInductanceOfEveryCore() throws IOException {
		FieldTable table = new FieldTable();
		for (Core core : cores()) {
			table.add(core.outerGap() > 0 ? "spacer under all legs" : "centre gap",
					String.format(Locale.ROOT, "%.3f", core.centreGap() / core.centre()), FieldTable.perCent(core.error(Fringing.NONE)),
					FieldTable.perCent(core.error(Fringing.WIDENED)), FieldTable.perCent(core.error(Fringing.CONFORMAL)),
					FieldTable.perCent(core.error(Fringing.CONFORMAL) + core.leakage() / core.inductance()));
		}
		table.write("gapped-e-cores.txt");
		String page = Files.readString(GUIDE);
		for (String row : table.html()) {
			assertTrue(page.contains(row), "gaps.html lacks " + row);
		}
	}
}
