package gapwright.report;

import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.Locale;

import com.google.gson.stream.JsonWriter;

import gapwright.study.AirPathResult;
import gapwright.study.ConnectionResult;
import gapwright.study.Finding;
import gapwright.study.GapResult;
import gapwright.study.InductanceMatrix;
import gapwright.study.LeakageResult;
import gapwright.study.LegResult;
import gapwright.study.LegState;
import gapwright.study.OperatingPointResult;
import gapwright.study.StudyResult;
import gapwright.study.WindingResult;
import gapwright.study.provenance.FigureGroup;
import gapwright.study.provenance.Origin;
import gapwright.study.provenance.Provenance;
import gapwright.study.tolerance.ToleranceResult;

/** The result of a check as one JSON object on one line: SI units, numbers with full precision, null for no number. */
public final class CheckJson {

	private final JsonWriter json;

	private CheckJson(JsonWriter json) {
		this.json = json;
	}

	/**
	 * @param file    name of the design's file as given
	 * @param version of the tool
	 */
	public static String of(StudyResult result, String file, String version) {
		return of(result, null, file, version);
	}

	/** @param tolerances what they do, or null when that was not asked for */
	public static String of(StudyResult result, ToleranceResult tolerances, String file, String version) {
		StringWriter text = new StringWriter();
		try (JsonWriter json = new JsonWriter(text)) {
			new CheckJson(json).write(result, tolerances, file, version);
		} catch (IOException e) {
			throw new UncheckedIOException(e);
		}
		return text.toString();
	}

	private void write(StudyResult result, ToleranceResult tolerances, String file, String version) throws IOException {
		json.beginObject();
		json.name("tool").value("gapwright").name("version").value(version).name("file").value(file);
		json.name("design").value(result.design()).name("worst").value(worst(result));
		json.name("operatingPoints").beginArray();
		for (OperatingPointResult point : result.operatingPoints()) {
			operatingPoint(point);
		}
		json.endArray();
		if (tolerances != null) {
			ToleranceReport.write(json, tolerances);
		}
		json.name("findings").beginArray();
		for (Finding finding : result.findings()) {
			json.beginObject().name("severity").value(finding.severity().name().toLowerCase(Locale.ROOT));
			json.name("code").value(finding.code()).name("subject").value(finding.subject());
			json.name("operatingPoint").value(finding.operatingPoint());
			json.name("message").value(finding.message()).name("hint").value(finding.hint()).endObject();
		}
		json.endArray();
		sources();
		json.endObject();
	}

	/** Where the figures come from, by the place they stand at: "legs.flux". */
	private void sources() throws IOException {
		json.name("source").beginObject();
		for (FigureGroup group : FigureGroup.values()) {
			Origin origin = Provenance.of(group);
			json.name(group.key()).beginObject().name("formula").value(origin.formula());
			json.name("source").value(origin.source()).name("validity").value(origin.validity()).endObject();
		}
		json.endObject();
	}

	/** @return null when something is not computed: nobody shall read "within" out of a result that is not whole */
	private static String worst(StudyResult result) {
		return result.isIncomplete() && result.worst() != LegState.OVER ? null : result.worst().word();
	}

	private void operatingPoint(OperatingPointResult point) throws IOException {
		json.beginObject().name("id").value(point.id()).name("converged").value(point.converged());
		json.name("iterations").value(point.iterations());
		number("fluxResidual", point.fluxResidual());
		number("energy", point.energy());
		number("coEnergy", point.coEnergy());
		json.name("legs").beginArray();
		for (LegResult leg : point.legs()) {
			json.beginObject().name("id").value(leg.id());
			number("flux", leg.flux());
			number("fluxDensity", leg.fluxDensity());
			number("fieldStrength", leg.fieldStrength());
			number("mmfDrop", leg.mmfDrop());
			number("saturation", leg.saturation());
			number("peakFluxDensity", leg.peakFluxDensity());
			number("utilisation", leg.utilisation());
			json.name("state").value(leg.state().word()).endObject();
		}
		json.endArray().name("gaps").beginArray();
		for (GapResult gap : point.gaps()) {
			json.beginObject().name("id").value(gap.id()).name("leg").value(gap.leg());
			number("permeance", gap.permeance());
			number("fringingFactor", gap.fringingFactor());
			number("mmfDrop", gap.mmfDrop());
			json.endObject();
		}
		json.endArray().name("airPaths").beginArray();
		for (AirPathResult path : point.airPaths()) {
			json.beginObject().name("id").value(path.id());
			number("flux", path.flux());
			json.endObject();
		}
		json.endArray().name("windings").beginArray();
		for (WindingResult winding : point.windings()) {
			json.beginObject().name("id").value(winding.id());
			number("current", winding.current());
			number("linkage", winding.linkage());
			number("apparentInductance", winding.apparentInductance());
			number("lowestCurrent", winding.lowestCurrent());
			number("highestCurrent", winding.highestCurrent());
			number("inductanceFactor", winding.inductanceFactor());
			json.endObject();
		}
		json.endArray();
		inductance(point.inductance());
		leakages(point);
		json.endObject();
	}

	private void leakages(OperatingPointResult point) throws IOException {
		json.name("leakages").beginArray();
		for (LeakageResult leakage : point.leakages()) {
			json.beginObject().name("id").value(leakage.id());
			json.name("first").value(leakage.first()).name("second").value(leakage.second());
			number("inductance", leakage.inductance());
			number("rogowskiFactor", leakage.rogowskiFactor());
			number("shortCircuitInductance", leakage.shortCircuit());
			number("coupling", leakage.coupling());
			json.endObject();
		}
		json.endArray().name("connections").beginArray();
		for (ConnectionResult connection : point.connections()) {
			json.beginObject().name("id").value(connection.id()).name("kind").value(connection.series() ? "series" : "parallel");
			json.name("windings").beginArray();
			for (String winding : connection.windings()) {
				json.value(winding);
			}
			json.endArray().name("reversed").beginArray();
			for (boolean reversed : connection.reversed()) {
				json.value(reversed);
			}
			json.endArray();
			number("inductance", connection.inductance());
			json.endObject();
		}
		json.endArray();
	}

	private void inductance(InductanceMatrix matrix) throws IOException {
		json.name("inductance").beginObject().name("windings").beginArray();
		for (String winding : matrix.windings()) {
			json.value(winding);
		}
		json.endArray();
		square("differential", matrix.windings(), (i, j) -> matrix.differential()[i][j]);
		square("coupling", matrix.windings(),
				(i, j) -> i == j ? 1 : matrix.coupling(matrix.windings().get(i), matrix.windings().get(j)));
		square("leakage", matrix.windings(),
				(i, j) -> i == j ? Double.NaN : matrix.leakage(matrix.windings().get(i), matrix.windings().get(j)));
		json.endObject();
	}

	private interface Entry {
		double at(int row, int column);
	}

	private void square(String name, List<String> windings, Entry entry) throws IOException {
		json.name(name).beginArray();
		for (int i = 0; i < windings.size(); i++) {
			json.beginArray();
			for (int j = 0; j < windings.size(); j++) {
				value(entry.at(i, j));
			}
			json.endArray();
		}
		json.endArray();
	}

	private void number(String name, double value) throws IOException {
		json.name(name);
		value(value);
	}

	private void value(double value) throws IOException {
		if (Double.isFinite(value)) {
			json.value(value);
		} else {
			json.nullValue();
		}
	}
}
