package gapwright.study;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;

import org.eclipse.emf.ecore.EObject;

import gapwright.model.AirPath;
import gapwright.model.Coil;
import gapwright.model.CurrentDrive;
import gapwright.model.Design;
import gapwright.model.Distribution;
import gapwright.model.Drive;
import gapwright.model.Element;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.LegGeometry;
import gapwright.model.Limits;
import gapwright.model.Magnet;
import gapwright.model.Material;
import gapwright.model.OperatingPoint;
import gapwright.model.Tolerance;
import gapwright.model.VoltageDrive;
import gapwright.model.Winding;
import gapwright.model.check.DesignCheck;
import gapwright.model.check.Problem;
import gapwright.model.check.Severity;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;
import gapwright.physics.material.BhCurve;
import gapwright.physics.network.Network;
import gapwright.physics.network.NetworkValues;
import gapwright.study.leakage.CountedTwice;
import gapwright.study.vary.DesignNumbers;

/**
 * Lowers a design to plain numbers. An element with an error takes its whole island out of the network, because every
 * flux there depends on it; other islands are computed all the same.
 */
public final class Lowering {

	private static final double DEFAULT_NEAR = 0.8;

	private final Design design;
	private final Findings findings = new Findings();
	private final Set<EObject> broken = new HashSet<>();
	private final Map<Material, MaterialData> materials = new HashMap<>();
	private final List<MaterialData> legMaterials = new ArrayList<>();
	private final Map<Double, Network> networks = new HashMap<>();
	private final Network.Builder builder = Network.builder();
	private final Map<Joint, Integer> joints = new HashMap<>();
	private final Map<Leg, Integer> legIndex = new HashMap<>();
	private final List<StudyInput.LegData> legs = new ArrayList<>();
	private final List<StudyInput.GapData> gaps = new ArrayList<>();
	private final List<Leg> drawn = new ArrayList<>();
	private final List<String> coils = new ArrayList<>();
	private final List<String> airPaths = new ArrayList<>();
	private final List<StudyInput.WindingData> windings = new ArrayList<>();
	private final Map<Winding, Integer> windingIndex = new HashMap<>();

	private Lowering(Design design) {
		this.design = design;
	}

	/** Reads the design; to be called where it may be read, in a workbench the user interface's thread. */
	public static StudyInput of(Design design) {
		return new Lowering(design).lower();
	}

	private StudyInput lower() {
		for (Problem problem : DesignCheck.check(design)) {
			findings.add(new Finding(problem.severity(), problem.code(), problem.subject(), null, problem.message(),
					problem.hint()));
			if (problem.severity() == Severity.ERROR) {
				markBroken(problem.element());
			}
		}
		materials();
		GapLowering gapLowering = new GapLowering(design, findings);
		for (Leg leg : design.getLegs()) {
			boolean unplaced = broken.contains(leg.getFrom()) || broken.contains(leg.getTo());
			if (unplaced || broken.contains(leg.getMaterial()) || !gapLowering.read(leg)) {
				broken.add(leg);
			}
		}
		Islands islands = new Islands(design, broken);
		for (Joint joint : design.getJoints()) {
			joints.put(joint, builder.joint());
		}
		for (Leg leg : design.getLegs()) {
			if (islands.isSound(leg.getFrom()) && islands.isSound(leg.getTo()) && !broken.contains(leg)) {
				leg(leg, gapLowering);
			}
		}
		for (AirPath path : design.getAirPaths()) {
			if (islands.isSound(path.getFrom()) && islands.isSound(path.getTo()) && !broken.contains(path)) {
				builder.airPath(joints.get(path.getFrom()), joints.get(path.getTo()), permeance(path));
				airPaths.add(path.getId());
			}
		}
		design.getWindings().forEach(this::winding);
		Network network = builder.build();
		CountedTwice.of(design).forEach((gap, paths) -> findings.warning("leakage-counted-twice", id(gap),
				"the field across the window beside the gap is part of its conformal figure, and is counted again by "
						+ paths.stream().map(path -> "'" + id(path) + "'").collect(Collectors.joining(", ")),
				"Delete these air paths: the inductance comes closer without them."));
		new TopologyFindings(design, network, legIndex, joints, islands, findings).add();
		Limits limits = design.getLimits();
		double near = limits == null || broken.contains(limits) ? DEFAULT_NEAR : limits.getNearFraction();
		if (design.getLegs().isEmpty() && design.getAirPaths().isEmpty()) {
			findings.note("design-empty", "", "nothing is drawn yet, so nothing is computed",
					"Draw joints and legs between them, or start from a template.");
		}
		List<StudyInput.PointData> points = new ArrayList<>();
		for (OperatingPoint point : design.getOperatingPoints()) {
			points.add(point(point, network));
		}
		PairLowering pairs = new PairLowering(design, windingIndex, windings, broken, findings);
		return new StudyInput(design.getName() == null ? "" : design.getName(), near, network, legs, gaps, airPaths,
				windings, pairs.leakages(), pairs.connections(), points, findings.list(), coils,
				new DesignNumbers(network, drawn, legs, gaps), tolerances());
	}

	/** A gap's error is its leg's, a curve's its material's; a coil is judged by its winding, a drive by its point. */
	private void markBroken(EObject element) {
		for (EObject object = element; object != null && object != design; object = object.eContainer()) {
			broken.add(object);
		}
	}

	private void materials() {
		for (Material material : design.getMaterials()) {
			if (broken.contains(material)) {
				continue;
			}
			try {
				MaterialData data = new MaterialData(material);
				materials.put(material, data);
				MaterialFindings.add(material, data, data.curve(data.curveCelsius()), findings);
			} catch (IllegalArgumentException e) {
				findings.error("value-out-of-domain", id(material), e.getMessage(), "");
				broken.add(material);
			}
		}
	}

	private void leg(Leg leg, GapLowering gapLowering) {
		double gross = LegGeometry.grossArea(leg);
		double reluctance = gapLowering.reluctance(leg);
		double mmf = 0;
		Magnet magnet = leg.getMagnet();
		if (magnet != null) {
			double perArea = magnet.getLength().si() / (BhCurve.MU_0 * magnet.getRecoilPermeability());
			reluctance += perArea / gross;
			mmf = (magnet.isReversed() ? -1 : 1) * magnet.getRemanence().si() * perArea;
			findings.note("magnet-demagnetisation-unchecked", id(magnet),
					"whether the field opposing the magnet demagnetises it is not checked: the material gives no knee",
					"Check the maker's demagnetisation curve at the highest temperature.");
		}
		MaterialData data = materials.get(leg.getMaterial());
		int index = builder.leg(joints.get(leg.getFrom()), joints.get(leg.getTo()), data.curve(data.curveCelsius()),
				Math.max(0, LegGeometry.ironLength(leg)), gross * leg.getStackingFactor(), reluctance, mmf);
		legIndex.put(leg, index);
		legs.add(new StudyInput.LegData(id(leg), data, magnet == null ? null : id(magnet)));
		drawn.add(leg);
		legMaterials.add(data);
		gaps.addAll(gapLowering.data(leg, index));
	}

	private static double permeance(AirPath path) {
		return path.getPermeance() != null ? path.getPermeance().si()
				: BhCurve.MU_0 * path.getArea().si() / path.getLength().si();
	}

	private void winding(Winding winding) {
		if (winding.getCoils().isEmpty()) {
			return;
		}
		int index = builder.winding();
		windingIndex.put(winding, index);
		boolean whole = !broken.contains(winding);
		int turns = 0;
		for (Coil coil : winding.getCoils()) {
			Integer leg = legIndex.get(coil.getLeg());
			turns += coil.getTurns();
			if (leg == null || broken.contains(coil)) {
				whole = false;
			} else {
				coils.add(id(coil));
				builder.coil(index, leg, coil.isReversed() ? -coil.getTurns() : coil.getTurns());
			}
		}
		windings.add(new StudyInput.WindingData(id(winding), whole, turns));
	}

	private StudyInput.PointData point(OperatingPoint point, Network network) {
		double celsius = LegGeometry.si(point.getTemperature());
		StudyInput.DriveData[] drives = new StudyInput.DriveData[windings.size()];
		Arrays.fill(drives, StudyInput.DriveData.NONE);
		boolean sound = !broken.contains(point) && legs.size() + airPaths.size() > 0;
		for (Drive drive : point.getDrives()) {
			Integer winding = windingIndex.get(drive.getWinding());
			if (winding == null) {
				sound &= drive.getWinding() != null && drive.getWinding().getCoils().isEmpty();
			} else if (!broken.contains(drive) && drive instanceof CurrentDrive current) {
				drives[winding] = new StudyInput.DriveData(current.getCurrent().si(), current.getRipple().si(), 0, false);
			} else if (!broken.contains(drive) && drive instanceof VoltageDrive voltage) {
				sound &= windings.get(winding).whole();
				drives[winding] = new StudyInput.DriveData(voltage.getBias().si(), 0, VoltSeconds.of(voltage), true);
			}
		}
		for (MaterialData material : new LinkedHashSet<>(legMaterials)) {
			sound &= Double.isNaN(celsius) || MaterialFindings.addAt(material, id(point), celsius, findings);
			sound &= Double.isNaN(celsius) || hasCurve(material, id(point), celsius);
		}
		return new StudyInput.PointData(id(point), celsius, sound ? List.of(drives) : null, sound ? at(celsius, network) : network);
	}

	private boolean hasCurve(MaterialData material, String point, double celsius) {
		try {
			material.curve(celsius);
			return true;
		} catch (IllegalArgumentException e) {
			findings.add(new Finding(Severity.ERROR, "value-out-of-domain", material.id(), point,
					"at " + Figures.of(celsius) + " °C its curve would have " + e.getMessage(), ""));
			return false;
		}
	}

	/** @return the network with every curve at that temperature; the same one where no curve depends on it */
	private Network at(double celsius, Network network) {
		if (legMaterials.stream().noneMatch(MaterialData::dependsOnTemperature)) {
			return network;
		}
		return networks.computeIfAbsent(celsius, key -> {
			Map<MaterialData, BhCurve> curves = new HashMap<>();
			NetworkValues values = network.values();
			for (int k = 0; k < values.curve.length; k++) {
				values.curve[k] = curves.computeIfAbsent(legMaterials.get(k), material -> material.curve(celsius));
			}
			return network.with(values);
		});
	}

	private List<StudyInput.ToleranceData> tolerances() {
		List<StudyInput.ToleranceData> data = new ArrayList<>();
		for (Tolerance tolerance : design.getTolerances()) {
			if (!broken.contains(tolerance)) {
				Quantity deviation = tolerance.getDeviation();
				boolean share = deviation.dimension() == Dimension.DEVIATION;
				data.add(new StudyInput.ToleranceData(id(tolerance), tolerance.getFeature(),
						tolerance.getTargets().stream().map(Lowering::id).toList(), share ? deviation.si() : Double.NaN,
						share ? Double.NaN : deviation.si(), tolerance.getDistribution() == Distribution.NORMAL));
			}
		}
		return data;
	}

	static String id(Element element) {
		return element.getId() == null ? "" : element.getId();
	}
}
