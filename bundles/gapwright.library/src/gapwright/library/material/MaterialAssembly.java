package gapwright.library.material;

import java.text.Normalizer;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;

import gapwright.model.ArctanCurve;
import gapwright.model.Curve;
import gapwright.model.CurveAtTemperature;
import gapwright.model.CurvePoint;
import gapwright.model.GapwrightFactory;
import gapwright.model.InitialPermeability;
import gapwright.model.KneeCurve;
import gapwright.model.LinearCurve;
import gapwright.model.Material;
import gapwright.model.RollOffCurve;
import gapwright.model.Saturation;
import gapwright.model.SteinmetzLoss;
import gapwright.model.TableCurve;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;
import gapwright.physics.material.BhCurve;
import gapwright.physics.material.SteinmetzFit;

/** Makes a material of the records of a file, once each is sound by itself. */
final class MaterialAssembly {

	/** Share by which a loss may miss its fit before that is said. */
	private static final double MISFIT = 0.2;

	/** °C; what a curve without a temperature holds at. */
	private static final double ROOM_TEMPERATURE = 25;

	private final MaterialRecords records;
	private final List<FileProblem> problems;
	private final List<String> remarks = new ArrayList<>();
	private final List<UnitDoubt> doubts = new ArrayList<>();
	private final Material material = GapwrightFactory.eINSTANCE.createMaterial();
	private SteinmetzFit fit;

	MaterialAssembly(MaterialRecords records, List<FileProblem> problems) {
		this.records = records;
		this.problems = problems;
	}

	MaterialReading assemble() {
		if (records.name == null) {
			problems.add(new FileProblem(records.lastLine, 1, "the file ends without a name", "e.g. name,Example ferrite"));
		} else {
			material.setName(records.name.value());
			material.setId(id(records.name.value()));
		}
		material.setSource(records.source == null ? null : records.source.value());
		material.setDensity(records.density == null ? null : records.density.value());
		material.setCurieTemperature(records.curie == null ? null : records.curie.value());
		curves();
		saturations();
		loss();
		return new MaterialReading(material, List.of(), remarks, doubts, fit);
	}

	private static String id(String name) {
		String plain = Normalizer.normalize(name.replace("µ", "u"), Normalizer.Form.NFD).toLowerCase(Locale.ROOT)
				.replaceAll("[^a-z0-9]+", "-").replaceAll("^-|-$", "");
		String cut = plain.length() > 60 ? plain.substring(0, 60) : plain;
		// an id begins with a letter
		return cut.isEmpty() ? "material" : Character.isDigit(cut.charAt(0)) ? "material-" + cut : cut;
	}

	private void curves() {
		Map<Double, CsvRecord> temperatures = new HashMap<>();
		boolean first = true;
		for (MaterialRecords.CurveRows rows : records.curves) {
			Curve curve = curve(rows);
			CsvRecord former = temperatures.putIfAbsent(rows.celsius == null ? ROOM_TEMPERATURE : rows.celsius.si(), rows.begin);
			if (former != null) {
				problem(rows.begin, 1, "a second curve at " + rows.celsius + ", the first begins in line " + former.line(), "Keep one.");
			}
			if (first) {
				material.setCurve(curve);
				material.setCurveTemperature(rows.celsius);
				first = false;
			} else if (curve != null) {
				CurveAtTemperature other = GapwrightFactory.eINSTANCE.createCurveAtTemperature();
				other.setTemperature(rows.celsius);
				other.setCurve(curve);
				material.getOtherCurves().add(other);
			}
		}
		initials();
	}

	private Curve curve(MaterialRecords.CurveRows rows) {
		if (rows.points.isEmpty() && rows.closed.isEmpty()) {
			problem(rows.begin, 0, "no curve follows this temperature", "Put its points below it.");
			return null;
		}
		if (rows.points.isEmpty()) {
			if (rows.closed.size() > 1) {
				problem(rows.closed.get(1).record(), 0, "a second curve at the same temperature, the first is in line "
						+ rows.closed.get(0).record().line(), "Keep one, or put a temperature record between them.");
			}
			return closed(rows.closed.get(0));
		}
		if (!rows.closed.isEmpty()) {
			problem(rows.closed.get(0).record(), 0, "a curve by parameters beside points", "Keep one of them.");
		}
		return table(rows.points);
	}

	private static Curve closed(MaterialRecords.Closed row) {
		switch (row.kind()) {
		case "knee":
			KneeCurve knee = GapwrightFactory.eINSTANCE.createKneeCurve();
			knee.setInitialPermeability(row.permeability());
			knee.setSaturationPolarisation(row.quantity());
			return knee;
		case "arctan":
			ArctanCurve arctan = GapwrightFactory.eINSTANCE.createArctanCurve();
			arctan.setInitialPermeability(row.permeability());
			arctan.setSaturationPolarisation(row.quantity());
			return arctan;
		default:
			RollOffCurve rollOff = GapwrightFactory.eINSTANCE.createRollOffCurve();
			rollOff.setInitialPermeability(row.permeability());
			rollOff.setHalfFieldStrength(row.quantity());
			rollOff.setExponent(row.exponent());
			return rollOff;
		}
	}

	private Curve table(List<MaterialRecords.Point> points) {
		TableCurve table = GapwrightFactory.eINSTANCE.createTableCurve();
		double h = 0;
		double b = 0;
		boolean slow = false;
		List<double[]> rising = new ArrayList<>();
		for (MaterialRecords.Point point : points) {
			boolean origin = table.getPoints().isEmpty() && point.h().si() == 0 && point.b().si() == 0;
			boolean rises = point.h().si() > h && point.b().si() > b;
			if (!origin && !rises) {
				boolean field = !(point.h().si() > h);
				problems.add(new FileProblem(point.record().line(), field ? point.columnH() : point.columnB(),
						(field ? "field strength '" + point.h() : "flux density '" + point.b())
								+ "' does not rise above the point before, " + (rising.isEmpty() ? "the origin" : figures(h, b)),
						"Both values must rise from point to point."));
				return null;
			}
			if (rises) {
				slow |= (point.b().si() - b) / (point.h().si() - h) < BhCurve.MU_0 * (1 - 1e-9);
				rising.add(new double[] { point.h().si(), point.b().si() });
			}
			CurvePoint each = GapwrightFactory.eINSTANCE.createCurvePoint();
			each.setFieldStrength(point.h());
			each.setFluxDensity(point.b());
			table.getPoints().add(each);
			h = point.h().si();
			b = point.b().si();
		}
		if (rising.isEmpty()) {
			problem(points.get(0).record(), 0, "the only point is the origin", "At least one point besides it.");
			return null;
		}
		if (slow) {
			remarks.add("Between two points the flux density rises slower than in air: are the units right?");
		}
		sniff(points, rising);
		return table;
	}

	private void sniff(List<MaterialRecords.Point> points, List<double[]> rising) {
		MaterialRecords.Point last = points.get(points.size() - 1);
		doubts.addAll(new UnitSniffer(rising.stream().mapToDouble(p -> p[0]).toArray(), rising.stream().mapToDouble(p -> p[1]).toArray(),
				Quantity.parse("1 " + last.h().unit(), Dimension.FIELD_STRENGTH).si(),
				Quantity.parse("1 " + last.b().unit(), Dimension.FLUX_DENSITY).si(),
				points.stream().allMatch(MaterialRecords.Point::bare)).doubts());
	}

	private static String figures(double h, double b) {
		return (float) h + " A/m and " + (float) b + " T";
	}

	/** Alone, an initial permeability is a linear curve; beside a curve it holds at its temperature. */
	private void initials() {
		Map<Double, CsvRecord> temperatures = new HashMap<>();
		for (MaterialRecords.Initial row : records.initials) {
			if (records.curves.isEmpty() && records.initials.size() == 1) {
				LinearCurve linear = GapwrightFactory.eINSTANCE.createLinearCurve();
				linear.setRelativePermeability(row.permeability());
				material.setCurve(linear);
				material.setCurveTemperature(row.celsius());
			} else if (row.celsius() == null) {
				problem(row.record(), 1, "beside another curve or permeability it needs its temperature", "e.g. initial,2300,25 °C");
			} else {
				CsvRecord former = temperatures.putIfAbsent(row.celsius().si(), row.record());
				if (former != null) {
					problem(row.record(), 2, "a second permeability at " + row.celsius() + ", the first is in line " + former.line(), "Keep one.");
				}
				if (row.permeability() <= 1) {
					problem(row.record(), 1, "'" + row.record().field(1).text() + "': must be above 1", "");
				}
				InitialPermeability each = GapwrightFactory.eINSTANCE.createInitialPermeability();
				each.setTemperature(row.celsius());
				each.setRelativePermeability(row.permeability());
				material.getPermeabilities().add(each);
			}
		}
		if (records.curves.isEmpty() && material.getCurve() == null) {
			problems.add(new FileProblem(records.lastLine, 1, "the file ends without a curve",
					"Give points, or one of initial, knee, arctan, rolloff."));
		}
	}

	private void saturations() {
		Map<Double, CsvRecord> temperatures = new HashMap<>();
		for (MaterialRecords.SaturationRow row : records.saturations) {
			CsvRecord former = temperatures.putIfAbsent(row.celsius().si(), row.record());
			if (former != null) {
				problem(row.record(), 1, "a second saturation at " + row.celsius() + ", the first is in line " + former.line(), "Keep one.");
			}
			Saturation saturation = GapwrightFactory.eINSTANCE.createSaturation();
			saturation.setTemperature(row.celsius());
			saturation.setFluxDensity(row.fluxDensity());
			material.getSaturations().add(saturation);
		}
		if (records.saturations.isEmpty()) {
			remarks.add("No saturation is given: legs of this material cannot be judged.");
		}
	}

	private void loss() {
		if (records.steinmetz != null && !records.losses.isEmpty()) {
			problem(records.losses.get(0).record(), 0, "loss points beside the steinmetz of line "
					+ records.steinmetz.record().line(), "Keep one of them.");
		} else if (records.steinmetz != null) {
			MaterialRecords.Steinmetz given = records.steinmetz;
			material.setLoss(loss(given.k(), given.alpha(), given.beta(), given.celsius()));
		} else if (!records.losses.isEmpty()) {
			fitLoss();
		}
	}

	private void fitLoss() {
		List<SteinmetzFit.Point> points = new ArrayList<>();
		MaterialRecords.LossRow first = records.losses.get(0);
		for (MaterialRecords.LossRow row : records.losses) {
			if (row.celsius().si() != first.celsius().si()) {
				problem(row.record(), 3, "a loss at " + row.celsius() + ", the first one, in line " + first.record().line() + ", is at "
						+ first.celsius(), "Losses of one temperature only, preferably the working one.");
				return;
			}
			double loss = row.loss().value();
			if (row.loss().perMass()) {
				if (records.density == null) {
					problem(row.record(), 4, "'" + row.record().field(4).text() + "': a loss per mass needs the density",
							"e.g. density,7650 kg/m³");
					return;
				}
				loss *= records.density.value().si();
			}
			points.add(new SteinmetzFit.Point(row.frequency().si(), row.fluxDensity().si(), loss));
		}
		try {
			fit = SteinmetzFit.of(points);
		} catch (IllegalArgumentException e) {
			remarks.add("No loss figures are taken over: " + e.getMessage() + ".");
			return;
		}
		SteinmetzLoss loss = loss(fit.coefficient(), fit.frequencyExponent(), fit.fluxDensityExponent(), first.celsius());
		loss.setMinimumFrequency(extreme(true));
		loss.setMaximumFrequency(extreme(false));
		material.setLoss(loss);
		if (fit.greatestMisfit() > MISFIT) {
			remarks.add("The loss fit misses a point by " + Math.round(100 * fit.greatestMisfit())
					+ " %: the points follow no one power law.");
		}
	}

	/** The frequency as it was typed. */
	private Quantity extreme(boolean least) {
		Quantity found = null;
		for (MaterialRecords.LossRow row : records.losses) {
			if (found == null || (least ? row.frequency().si() < found.si() : row.frequency().si() > found.si())) {
				found = row.frequency();
			}
		}
		return found;
	}

	private static SteinmetzLoss loss(double k, double alpha, double beta, Quantity celsius) {
		SteinmetzLoss loss = GapwrightFactory.eINSTANCE.createSteinmetzLoss();
		loss.setCoefficient(k);
		loss.setFrequencyExponent(alpha);
		loss.setFluxDensityExponent(beta);
		loss.setTemperature(celsius);
		return loss;
	}

	private void problem(CsvRecord record, int index, String message, String allowed) {
		problems.add(new FileProblem(record.line(), record.field(Math.min(index, record.count() - 1)).column(), message, allowed));
	}
}
