package gapwright.benchmarks;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.TimeUnit;

import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

import gapwright.model.Design;
import gapwright.model.DesignReader;
import gapwright.study.Lowering;
import gapwright.study.Progress;
import gapwright.study.StudyInput;
import gapwright.study.tolerance.ToleranceRequest;
import gapwright.study.tolerance.ToleranceResult;
import gapwright.study.tolerance.ToleranceStudy;

/** A tolerance run over the boost choke's E core at full load: first order, corners and Monte Carlo on all processors. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 3, time = 2)
@Measurement(iterations = 5, time = 2)
@Fork(1)
public class ToleranceBenchmark {

	private static final Path CHOKE = Path.of("../../bundles/gapwright.library/data/examples/boost-choke.gapwright");
	private static final String TOLERANCES = "<tolerances id=\"t1\" targets=\"centre-leg-gap\" deviation=\"0.05 mm\"/>"
			+ "<tolerances id=\"t2\" targets=\"mnzn-power-ferrite\" feature=\"PERMEABILITY\" deviation=\"25 %\" distribution=\"NORMAL\"/>"
			+ "<tolerances id=\"t3\" targets=\"mnzn-power-ferrite\" feature=\"SATURATION\" deviation=\"5 %\"/>"
			+ "<tolerances id=\"t4\" targets=\"main\" feature=\"CURRENT\" deviation=\"5 %\"/>";

	@Param({ "100000" })
	int samples;

	private StudyInput input;
	private ToleranceRequest request;

	@Setup
	public void build() throws IOException {
		String text = Files.readString(CHOKE).replaceAll("\\s*<tolerances[^>]*/>", "").replace("</gapwright:Design>",
				TOLERANCES + "</gapwright:Design>");
		Design design = DesignReader.read(new ByteArrayInputStream(text.getBytes(StandardCharsets.UTF_8)), "choke");
		while (design.getOperatingPoints().size() > 1) {
			design.getOperatingPoints().remove(1);
		}
		input = Lowering.of(design);
		request = new ToleranceRequest(samples, 1);
	}

	@Benchmark
	public ToleranceResult run() {
		return ToleranceStudy.run(input, request, Progress.NONE);
	}
}
