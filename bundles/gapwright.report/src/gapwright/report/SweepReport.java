package gapwright.report;

import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;

import com.google.gson.stream.JsonWriter;

import gapwright.study.sweep.SweepLeg;
import gapwright.study.sweep.SweepResult;

/** A sweep as a table for people, as JSON and as comma-separated values. */
public final class SweepReport {

	private static final int DIGITS = 4;

	private SweepReport() {
	}

	/** @param file name of the design's file as given */
	public static String table(SweepResult sweep, String file) {
		StringBuilder text = new StringBuilder(file).append("\n\n  winding ").append(sweep.winding())
				.append(" at operating point ").append(sweep.operatingPoint()).append('\n');
		List<String> head = new ArrayList<>(List.of("current", "L differential", "L apparent"));
		sweep.legs().forEach(leg -> head.add("B " + leg.id()));
		TextTable rows = new TextTable().row(head.toArray(String[]::new));
		for (int i = 0; i < sweep.current().length; i++) {
			int at = i;
			List<String> row = new ArrayList<>(List.of(Engineering.of(sweep.current()[i], "A", DIGITS),
					Engineering.of(sweep.differential()[i], "H", DIGITS), Engineering.of(sweep.apparent()[i], "H", DIGITS)));
			sweep.legs().forEach(leg -> row.add(CheckTable.tesla(leg.fluxDensity()[at])));
			rows.row(row.toArray(String[]::new));
		}
		rows.appendTo(text, "    ");
		TextTable limits = new TextTable().row("leg", "saturation", "near from", "over from");
		for (SweepLeg leg : sweep.legs()) {
			limits.row(leg.id(), Engineering.of(leg.saturation(), "T", DIGITS), Engineering.of(leg.nearAt(), "A", DIGITS),
					Engineering.of(leg.overAt(), "A", DIGITS));
		}
		text.append('\n');
		limits.appendTo(text, "    ");
		return text.toString();
	}

	/** @return head and one line per current, SI units, each with its end */
	public static String csv(SweepResult sweep) {
		StringBuilder text = new StringBuilder("current_A,linkage_Wb,apparentInductance_H,differentialInductance_H");
		sweep.legs().forEach(leg -> text.append(',').append(CsvCell.of("fluxDensity_T_" + leg.id())));
		text.append("\r\n");
		for (int i = 0; i < sweep.current().length; i++) {
			int at = i;
			List<Object> row = new ArrayList<>(
					List.of(sweep.current()[i], sweep.linkage()[i], sweep.apparent()[i], sweep.differential()[i]));
			sweep.legs().forEach(leg -> row.add(leg.fluxDensity()[at]));
			text.append(row.stream().map(CsvCell::of).collect(Collectors.joining(","))).append("\r\n");
		}
		return text.toString();
	}

	/** @return one object on one line: SI units, full precision, null for no number */
	public static String json(SweepResult sweep, String file, String version) {
		StringWriter text = new StringWriter();
		try (JsonWriter json = new JsonWriter(text)) {
			json.beginObject().name("tool").value("gapwright").name("version").value(version).name("file").value(file);
			json.name("operatingPoint").value(sweep.operatingPoint()).name("winding").value(sweep.winding());
			array(json, "current", sweep.current());
			array(json, "linkage", sweep.linkage());
			array(json, "apparentInductance", sweep.apparent());
			array(json, "differentialInductance", sweep.differential());
			json.name("legs").beginArray();
			for (SweepLeg leg : sweep.legs()) {
				json.beginObject().name("id").value(leg.id());
				array(json, "fluxDensity", leg.fluxDensity());
				number(json.name("saturation"), leg.saturation());
				number(json.name("near"), leg.near());
				number(json.name("nearAt"), leg.nearAt());
				number(json.name("overAt"), leg.overAt());
				json.endObject();
			}
			json.endArray().endObject();
		} catch (IOException e) {
			throw new UncheckedIOException(e);
		}
		return text.toString();
	}

	private static void array(JsonWriter json, String name, double[] values) throws IOException {
		json.name(name).beginArray();
		for (double value : values) {
			number(json, value);
		}
		json.endArray();
	}

	private static void number(JsonWriter json, double value) throws IOException {
		if (Double.isFinite(value)) {
			json.value(value);
		} else {
			json.nullValue();
		}
	}
}
