package gapwright.library.material;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import java.util.regex.Pattern;

import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;
import gapwright.model.quantity.QuantityFormatException;

/** What the records of a material file say, each checked by itself; {@link MaterialAssembly} checks them together. */
final class MaterialRecords {

	private static final Pattern BARE = Pattern.compile("[+\u2212-]?(?:\\d+\\.?\\d*|\\.\\d+)(?:[eE][+-]?\\d{1,3})?");
	private static final String HEAD = "gapwright-material";
	private static final String KINDS = "name, source, units, temperature, point, initial, knee, arctan, rolloff, saturation,"
			+ " curie, density, loss or steinmetz";

	/** A value and where it stands. */
	record At<T>(CsvRecord record, int column, T value) {
	}

	/** @param bare whether both numbers carried no unit */
	record Point(CsvRecord record, Quantity h, Quantity b, int columnH, int columnB, boolean bare) {
	}

	/** A curve given by its parameters. */
	record Closed(CsvRecord record, String kind, double permeability, Quantity quantity, double exponent) {
	}

	/** @param celsius null when left out */
	record Initial(CsvRecord record, double permeability, Quantity celsius) {
	}

	record LossRow(CsvRecord record, Quantity frequency, Quantity fluxDensity, Quantity celsius, LossUnit.Loss loss) {
	}

	record Steinmetz(CsvRecord record, double k, double alpha, double beta, Quantity celsius) {
	}

	record SaturationRow(CsvRecord record, Quantity celsius, Quantity fluxDensity) {
	}

	/** The records of one curve. */
	static final class CurveRows {
		final CsvRecord begin;
		final Quantity celsius;
		final List<Point> points = new ArrayList<>();
		final List<Closed> closed = new ArrayList<>();

		CurveRows(CsvRecord begin, Quantity celsius) {
			this.begin = begin;
			this.celsius = celsius;
		}
	}

	At<String> name;
	At<String> source;
	At<Quantity> curie;
	At<Quantity> density;
	final List<CurveRows> curves = new ArrayList<>();
	final List<Initial> initials = new ArrayList<>();
	final List<SaturationRow> saturations = new ArrayList<>();
	final List<LossRow> losses = new ArrayList<>();
	Steinmetz steinmetz;
	int lastLine = 1;

	private final BareUnits chosen;
	private final List<FileProblem> problems;
	private String fieldUnit;
	private String fluxUnit;

	MaterialRecords(BareUnits chosen, List<FileProblem> problems) {
		this.chosen = chosen;
		this.problems = problems;
		fieldUnit = chosen.fieldStrength();
		fluxUnit = chosen.fluxDensity();
	}

	void all(List<CsvRecord> records) {
		if (records.isEmpty()) {
			problems.add(new FileProblem(1, 1, "the file has no record", "It begins with " + HEAD + ",1"));
			return;
		}
		if (!head(records.get(0))) {
			return;
		}
		for (CsvRecord record : records.subList(1, records.size())) {
			lastLine = record.line();
			record(record);
		}
	}

	private boolean head(CsvRecord record) {
		if (!record.kind().equals(HEAD)) {
			problem(record, 0, "'" + record.kind() + "': the first record must be the head", HEAD + ",1");
			return false;
		}
		if (record.count() != 2 || !record.field(1).text().equals("1")) {
			String found = record.count() < 2 ? "no version" : "version '" + record.field(1).text() + "'";
			problem(record, Math.min(1, record.count() - 1), found + ": this program reads version 1", HEAD + ",1");
			return false;
		}
		return true;
	}

	private void record(CsvRecord r) {
		switch (r.kind()) {
		case "name" -> once(r, name, "name,Example ferrite", at -> name = at);
		case "source" -> once(r, source, "source,\"maker's sheet, curve at 100 °C\"", at -> source = at);
		case "units" -> units(r);
		case "temperature" -> temperature(r);
		case "point" -> point(r);
		case "initial" -> initial(r);
		case "knee", "arctan" -> closed(r, "µi and saturation polarisation", 2, r.kind() + ",2300,0.45 T");
		case "rolloff" -> closed(r, "µi, half field strength and exponent", 3, "rolloff,60,7.5 kA/m,1.8");
		case "saturation" -> saturation(r);
		case "curie" -> curie = single(r, curie, Dimension.TEMPERATURE, "curie,215 °C");
		case "density" -> density = single(r, density, Dimension.DENSITY, "density,4800 kg/m³");
		case "loss" -> loss(r);
		case "steinmetz" -> steinmetz(r);
		case HEAD -> problem(r, 0, "a second head", "One material a file.");
		default -> problem(r, 0, "'" + r.kind() + "': no such kind of record", "Allowed are " + KINDS + ".");
		}
	}

	private void once(CsvRecord r, At<String> former, String example, Consumer<At<String>> keep) {
		if (counts(r, 2, 2, example) && first(r, former)) {
			if (r.field(1).text().isEmpty()) {
				problem(r, 1, "the " + r.kind() + " is empty", example);
			} else {
				keep.accept(new At<>(r, r.field(1).column(), r.field(1).text()));
			}
		}
	}

	private boolean first(CsvRecord r, At<?> former) {
		if (former != null) {
			problem(r, 0, "a second '" + r.kind() + "', the first is in line " + former.record().line(), "Keep one.");
		}
		return former == null;
	}

	private void units(CsvRecord r) {
		if (counts(r, 3, 3, "units,A/m,T")) {
			String h = unit(r, 1, Dimension.FIELD_STRENGTH, "A/m, kA/m, A/cm, Oe or kOe");
			String b = unit(r, 2, Dimension.FLUX_DENSITY, "T, mT, G or kG");
			fieldUnit = chosen.fieldStrength() == null ? h : chosen.fieldStrength();
			fluxUnit = chosen.fluxDensity() == null ? b : chosen.fluxDensity();
		}
	}

	private String unit(CsvRecord r, int index, Dimension dimension, String allowed) {
		String unit = r.field(index).text();
		try {
			Quantity.parse("1 " + unit, dimension);
			return unit;
		} catch (QuantityFormatException e) {
			problem(r, index, "'" + unit + "': no unit of " + dimension.noun(), "Allowed are " + allowed + ".");
			// a sound one instead, so that the numbers below are not refused as well
			return dimension.unit();
		}
	}

	private void temperature(CsvRecord r) {
		if (counts(r, 2, 2, "temperature,100 °C")) {
			Quantity celsius = quantity(r, 1, Dimension.TEMPERATURE);
			curves.add(new CurveRows(r, celsius));
		}
	}

	private CurveRows curve(CsvRecord r) {
		if (curves.isEmpty()) {
			curves.add(new CurveRows(r, null));
		}
		return curves.get(curves.size() - 1);
	}

	private void point(CsvRecord r) {
		if (counts(r, 3, 3, "point,1200 A/m,0.395 T")) {
			boolean bare = BARE.matcher(r.field(1).text()).matches() && BARE.matcher(r.field(2).text()).matches();
			Quantity h = bareOr(r, 1, Dimension.FIELD_STRENGTH, fieldUnit);
			Quantity b = bareOr(r, 2, Dimension.FLUX_DENSITY, fluxUnit);
			if (h != null && b != null) {
				curve(r).points.add(new Point(r, h, b, r.field(1).column(), r.field(2).column(), bare));
			}
		}
	}

	private void closed(CsvRecord r, String what, int values, String example) {
		if (counts(r, values + 1, values + 1, what, example)) {
			double permeability = above(r, 1, 1, "initial permeability");
			Quantity quantity = positive(r, 2, values == 3 ? bareOr(r, 2, Dimension.FIELD_STRENGTH, fieldUnit)
					: bareOr(r, 2, Dimension.FLUX_DENSITY, fluxUnit));
			double exponent = values == 3 ? above(r, 3, 1, "exponent") : Double.NaN;
			curve(r).closed.add(new Closed(r, r.kind(), permeability, quantity, exponent));
		}
	}

	private void initial(CsvRecord r) {
		if (counts(r, 2, 3, "initial,2300,25 °C")) {
			double permeability = number(r, 1);
			if (permeability < 1) {
				problem(r, 1, "'" + r.field(1).text() + "': a relative permeability is at least 1", "initial,2300");
			}
			initials.add(new Initial(r, permeability, r.count() == 3 ? quantity(r, 2, Dimension.TEMPERATURE) : null));
		}
	}

	private void saturation(CsvRecord r) {
		if (counts(r, 3, 3, "saturation,100 °C,0.39 T")) {
			saturations.add(new SaturationRow(r, quantity(r, 1, Dimension.TEMPERATURE),
					positive(r, 2, bareOr(r, 2, Dimension.FLUX_DENSITY, fluxUnit))));
		}
	}

	private At<Quantity> single(CsvRecord r, At<Quantity> former, Dimension dimension, String example) {
		if (!counts(r, 2, 2, example) || !first(r, former)) {
			return former;
		}
		Quantity value = quantity(r, 1, dimension);
		return new At<>(r, r.field(1).column(), dimension == Dimension.TEMPERATURE ? value : positive(r, 1, value));
	}

	private void loss(CsvRecord r) {
		if (counts(r, 5, 5, "loss,100 kHz,0.1 T,100 °C,60 kW/m³")) {
			Quantity f = positive(r, 1, quantity(r, 1, Dimension.FREQUENCY));
			Quantity b = positive(r, 2, bareOr(r, 2, Dimension.FLUX_DENSITY, fluxUnit));
			Quantity t = quantity(r, 3, Dimension.TEMPERATURE);
			try {
				losses.add(new LossRow(r, f, b, t, LossUnit.parse(r.field(4).text())));
			} catch (IllegalArgumentException e) {
				problem(r, 4, e.getMessage(), "Allowed are " + LossUnit.ALLOWED + ".");
			}
		}
	}

	private void steinmetz(CsvRecord r) {
		if (counts(r, 5, 5, "steinmetz,1.48,1.45,2.6,100 °C")) {
			if (steinmetz != null) {
				problem(r, 0, "a second 'steinmetz', the first is in line " + steinmetz.record().line(), "Keep one.");
			}
			steinmetz = new Steinmetz(r, above(r, 1, 0, "coefficient"), above(r, 2, 0, "frequency exponent"),
					above(r, 3, 0, "flux density exponent"), quantity(r, 4, Dimension.TEMPERATURE));
		}
	}

	private boolean counts(CsvRecord r, int least, int most, String example) {
		return counts(r, least, most, "", example);
	}

	private boolean counts(CsvRecord r, int least, int most, String what, String example) {
		String allowed = (what.isEmpty() ? "e.g. " : what + ", e.g. ") + example;
		if (r.count() < least) {
			problems.add(new FileProblem(r.line(), r.end(), "'" + r.kind() + "' ends after " + (r.count() - 1)
					+ (r.count() == 2 ? " value" : " values") + ", it needs " + (least - 1), allowed));
		} else if (r.count() > most) {
			problem(r, most, "'" + r.kind() + "' has " + (r.count() - 1) + " values, it takes "
					+ (most - 1) + ": a comma parts values, decimals take a point, and text with a comma takes quotes", allowed);
		}
		return r.count() >= least && r.count() <= most;
	}

	private Quantity bareOr(CsvRecord r, int index, Dimension dimension, String unit) {
		String text = r.field(index).text();
		if (!BARE.matcher(text).matches()) {
			return quantity(r, index, dimension);
		}
		if (unit == null) {
			problem(r, index, "'" + text + "': " + dimension.noun() + " needs a unit",
					"Write " + text + " " + dimension.unit() + ", or put units,A/m,T above.");
			return null;
		}
		return quantity(r, index, dimension, text + " " + unit);
	}

	private Quantity quantity(CsvRecord r, int index, Dimension dimension) {
		return quantity(r, index, dimension, r.field(index).text());
	}

	private Quantity quantity(CsvRecord r, int index, Dimension dimension, String text) {
		try {
			return Quantity.parse(text, dimension);
		} catch (QuantityFormatException e) {
			problem(r, index, "'" + r.field(index).text() + "': " + e.problem(), "");
			return null;
		}
	}

	private Quantity positive(CsvRecord r, int index, Quantity value) {
		if (value != null && !(value.si() > 0)) {
			problem(r, index, "'" + r.field(index).text() + "': must be above 0", "");
			return null;
		}
		return value;
	}

	private double above(CsvRecord r, int index, double bound, String what) {
		double value = number(r, index);
		if (value <= bound) {
			problem(r, index, "'" + r.field(index).text() + "': the " + what + " must be above "
					+ (bound == 1 ? "1" : "0"), "");
		}
		return value;
	}

	/** @return NaN when it is none, which is then a problem already */
	private double number(CsvRecord r, int index) {
		String text = r.field(index).text();
		double value = BARE.matcher(text).matches() ? Double.parseDouble(text.replace('\u2212', '-')) : Double.NaN;
		if (!Double.isFinite(value)) {
			problem(r, index, "'" + text + "': not a number", "A plain number with a point for decimals, without a unit.");
			return Double.NaN;
		}
		return value;
	}

	private void problem(CsvRecord r, int index, String message, String allowed) {
		problems.add(new FileProblem(r.line(), r.field(index).column(), message, allowed));
	}
}
