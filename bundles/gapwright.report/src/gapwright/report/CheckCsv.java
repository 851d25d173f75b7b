package gapwright.report;

import java.util.stream.Collectors;
import java.util.stream.Stream;

import gapwright.study.LegResult;
import gapwright.study.OperatingPointResult;
import gapwright.study.StudyResult;

/** The legs of a check as comma-separated values (RFC 4180), SI units in the head, full precision. */
public final class CheckCsv {

	private static final String HEAD = "file,operatingPoint,leg,flux_Wb,fluxDensity_T,fieldStrength_A_per_m,mmfDrop_A,"
			+ "saturation_T,peakFluxDensity_T,utilisation,state";

	private CheckCsv() {
	}

	/** @return the head line, without its end */
	public static String head() {
		return HEAD;
	}

	/** @return one line per leg and operating point, without the head, each with its end */
	public static String of(StudyResult result, String file) {
		StringBuilder text = new StringBuilder();
		for (OperatingPointResult point : result.operatingPoints()) {
			for (LegResult leg : point.legs()) {
				text.append(Stream.of(file, point.id(), leg.id(), leg.flux(), leg.fluxDensity(), leg.fieldStrength(),
						leg.mmfDrop(), leg.saturation(), leg.peakFluxDensity(), leg.utilisation(), leg.state().word())
						.map(CsvCell::of).collect(Collectors.joining(","))).append("\r\n");
			}
		}
		return text.toString();
	}
}
