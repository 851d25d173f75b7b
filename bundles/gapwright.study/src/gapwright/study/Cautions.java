package gapwright.study;

import java.util.List;

/** What everybody who builds what is designed here must know. Shown in the wizard, the report and the user guide. */
public final class Cautions {

	private static final List<String> ALL = List.of(
			"The energy stored in an inductor, ½·L·I², can injure, burn and destroy when it is released.",
			"Interrupting an inductor's current makes a high voltage, limited only by stray capacitance or breakdown."
					+ " Always provide a path for the current.",
			"Insulation, creepage, clearance and working voltages are set by the safety standard in force, for example"
					+ " IEC 61558, IEC 62368-1 or IEC 60664-1, and by local codes. This tool does not check them.",
			"The temperature class of every insulating material (IEC 60085) and the hot spot, not the mean, decide its"
					+ " life.",
			"A saturated core loses its inductance, and the current then rises limited by resistance alone. Hot cores"
					+ " saturate earlier.",
			"Magnets lose strength when hot or opposed; a lost bias cannot be seen at rest.",
			"The field round a gap heats metal nearby, and leakage field couples into neighbours.",
			"Direct current in a transformer's winding, unequal pulses and rectifier loads drive the flux to one side.",
			"A network is a model: expect a few per cent in inductance with a gap, more for open cores. Measure a"
					+ " prototype, at temperature and at peak current, before production.",
			"The material figures of the library are indicative classes; replace them by the maker's data.",
			"Work on mains-connected or high-energy parts belongs to qualified persons; safety approval needs the"
					+ " licensed practice and test house the law asks for.");

	private Cautions() {
	}

	/** @return one or two sentences each */
	public static List<String> all() {
		return ALL;
	}
}
