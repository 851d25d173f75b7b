package gapwright.library.material;

import java.io.IOException;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * Reads a material from NAME.gapmaterial.csv, a plain form of our own: one record a line, its kind first. The user guide
 * describes it. Either everything in the file is read or nothing is, and every reason is named with line and column.
 */
public final class MaterialFile {

	/** Ending of the files' names. */
	public static final String ENDING = ".gapmaterial.csv";
	/** Far more than any sheet's curve needs; a larger file is none of ours. */
	private static final int MOST_BYTES = 1 << 20;

	private MaterialFile() {
	}

	/**
	 * @param input read to its end, not closed
	 * @param units for numbers without a unit
	 * @throws IOException when the input cannot be read
	 */
	public static MaterialReading read(InputStream input, BareUnits units) throws IOException {
		return read(input.readNBytes(MOST_BYTES + 1), units);
	}

	/**
	 * @param bytes the whole file
	 * @param units for numbers without a unit
	 */
	public static MaterialReading read(byte[] bytes, BareUnits units) {
		if (bytes.length > MOST_BYTES) {
			return MaterialReading.refused(List.of(new FileProblem(1, 1, "the file is larger than 1 MB", "A material file has a few kB.")));
		}
		List<FileProblem> problems = new ArrayList<>();
		List<CsvRecord> records = CsvText.records(bytes, problems);
		if (problems.isEmpty()) {
			MaterialRecords read = new MaterialRecords(units, problems);
			read.all(records);
			if (problems.isEmpty()) {
				MaterialReading reading = new MaterialAssembly(read, problems).assemble();
				if (problems.isEmpty()) {
					return reading;
				}
			}
		}
		problems.sort(Comparator.comparingInt(FileProblem::line).thenComparingInt(FileProblem::column));
		return MaterialReading.refused(problems);
	}
}
