package gapwright.report;

import java.io.IOException;
import java.util.List;
import java.util.Locale;

import com.google.gson.stream.JsonWriter;

import gapwright.study.Finding;
import gapwright.study.tolerance.Band;
import gapwright.study.tolerance.ToleranceResult;

/** What tolerances do, as tables for people and as part of a check's JSON. */
public final class ToleranceReport {

	private static final int DIGITS = 4;
	private static final double LOW = 0.0015;
	private static final double HIGH = 0.9985;

	private ToleranceReport() {
	}

	/** @return one table per operating point, and the doubts */
	public static String table(ToleranceResult result) {
		StringBuilder text = new StringBuilder();
		for (ToleranceResult.PointBands point : result.points()) {
			text.append("\n  tolerances at ").append(point.id()).append(", ").append(result.request().samples()).append(" samples, seed ")
					.append(result.request().seed()).append('\n');
			TextTable rows = new TextTable().row("figure", "nominal", "worst low", "worst high", "mean", "0.15 %", "99.85 %", "over");
			for (Band band : point.bands()) {
				boolean drawn = band.samples() != null && band.samples().count() > 0;
				rows.row((band.kind() == Band.Kind.INDUCTANCE ? "L " : "use ") + band.subject(), figure(band, band.nominal()),
						figure(band, band.cornerLow()), figure(band, band.cornerHigh()),
						figure(band, drawn ? band.samples().mean() : Double.NaN), figure(band, drawn ? band.samples().quantile(LOW) : Double.NaN),
						figure(band, drawn ? band.samples().quantile(HIGH) : Double.NaN), over(band, drawn));
			}
			rows.appendTo(text, "    ");
		}
		for (Finding finding : result.findings()) {
			text.append("    ").append(CheckTable.line(finding)).append('\n');
		}
		return text.toString();
	}

	private static String figure(Band band, double value) {
		return band.kind() == Band.Kind.INDUCTANCE ? Engineering.of(value, "H", DIGITS) : Engineering.perCent(value);
	}

	private static String over(Band band, boolean drawn) {
		return band.kind() == Band.Kind.INDUCTANCE || !drawn ? "" : String.format(Locale.ROOT, "%.2f ± %.2f %%",
				100 * band.samples().probabilityFrom(1), 100 * band.samples().probabilityError(1));
	}

	/** Writes the object {@code "tolerances"} of a check. */
	static void write(JsonWriter json, ToleranceResult result) throws IOException {
		json.name("tolerances").beginObject().name("samples").value(result.request().samples()).name("seed").value(result.request().seed());
		json.name("operatingPoints").beginArray();
		for (ToleranceResult.PointBands point : result.points()) {
			json.beginObject().name("id").value(point.id()).name("failed").value(point.failed());
			bands(json, "inductance", point.bands().stream().filter(b -> b.kind() == Band.Kind.INDUCTANCE).toList());
			bands(json, "utilisation", point.bands().stream().filter(b -> b.kind() == Band.Kind.UTILISATION).toList());
			json.endObject();
		}
		json.endArray().endObject();
	}

	private static void bands(JsonWriter json, String name, List<Band> bands) throws IOException {
		json.name(name).beginArray();
		for (Band band : bands) {
			json.beginObject().name("id").value(band.subject());
			number(json, "nominal", band.nominal());
			number(json, "firstOrder", band.firstOrder());
			number(json, "rootSumSquares", band.rootSum());
			number(json, "cornerLow", band.cornerLow());
			number(json, "cornerHigh", band.cornerHigh());
			if (band.samples() != null && band.samples().count() > 0) {
				number(json, "mean", band.samples().mean());
				number(json, "deviation", band.samples().deviation());
				number(json, "least", band.samples().least());
				number(json, "greatest", band.samples().greatest());
				if (band.kind() == Band.Kind.UTILISATION) {
					number(json, "overProbability", band.samples().probabilityFrom(1));
					number(json, "overProbabilityError", band.samples().probabilityError(1));
				}
			}
			json.endObject();
		}
		json.endArray();
	}

	private static void number(JsonWriter json, String name, double value) throws IOException {
		json.name(name);
		if (Double.isFinite(value)) {
			json.value(value);
		} else {
			json.nullValue();
		}
	}
}
