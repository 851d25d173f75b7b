package gapwright.cli;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;

/**
 * The command line. A few verbs and options do not repay an argument library, whose start alone would take a good
 * part of the time a cold check may last.
 */
public final class Main {

	private static final String HELP = """
			usage: gapwright check FILE… [--json | --csv] [--tolerances [--samples N] [--seed S]]
			       gapwright sweep FILE… [--winding ID] [--point ID] [--from A] [--to A] [--steps N] [--json | --csv]
			       gapwright library [FILE… [--field-unit U] [--flux-unit U]]
			       gapwright --help | --version

			check   computes every design at all its operating points and judges each leg against saturation
			        --json   one JSON object a line and file, SI units
			        --csv    one line per leg and operating point, SI units
			        --tolerances  also what the design's tolerances do: slopes, corners, samples
			        --samples N   how many samples to draw; left out: 10000
			        --seed S      the same seed draws the same samples; left out: 1
			sweep   inductance and flux densities against the current of a winding, the others held
			        --winding ID  what is swept; left out: the winding with the most current
			        --point ID    operating point whose temperature and other currents hold; left out: the first
			        --from, --to  currents with a unit, "14 A"; left out: 0 A to 1.5 times the largest of all points
			        --steps N     equal steps; left out: 20
			library without a file: lists the stock materials; with NAME.gapmaterial.csv files: writes a design file that holds
			        those materials to standard output, or says by line and column why it cannot
			        --field-unit U, --flux-unit U  for numbers without a unit, instead of what the file says

			exit status: 0 all within, 1 something near saturation or not judged, 2 something over,
			             64 wrong usage, 65 a design cannot be read or solved, 70 a fault of this program
			""";

	private Main() {
	}

	public static void main(String[] arguments) {
		PrintStream out = utf8(FileDescriptor.out);
		PrintStream err = utf8(FileDescriptor.err);
		int status = run(Arrays.asList(arguments), out, err);
		out.flush();
		err.flush();
		System.exit(status);
	}

	/**
	 * @param arguments as typed after the command's name
	 * @return an exit status; nothing is thrown
	 */
	public static int run(List<String> arguments, PrintStream out, PrintStream err) {
		try {
			String verb = arguments.isEmpty() ? "" : arguments.get(0);
			switch (verb) {
			case "--help", "-h", "help":
				out.print(HELP);
				return ExitStatus.WITHIN;
			case "--version":
				out.println("gapwright " + Version.NUMBER);
				return ExitStatus.WITHIN;
			case "check":
				return new CheckCommand(out, err).run(arguments.subList(1, arguments.size()));
			case "sweep":
				return new SweepCommand(out, err).run(arguments.subList(1, arguments.size()));
			case "library":
				return new LibraryCommand(out, err).run(arguments.subList(1, arguments.size()));
			case "":
				throw new UsageException("no verb is given");
			default:
				throw new UsageException("unknown verb '" + verb + "'");
			}
		} catch (UsageException e) {
			err.println("gapwright: " + e.getMessage());
			err.print(HELP);
			return ExitStatus.USAGE;
		} catch (RuntimeException | StackOverflowError | OutOfMemoryError e) {
			err.println("gapwright: a fault of this program, please report it: " + e);
			return ExitStatus.FAULT;
		}
	}

	private static PrintStream utf8(FileDescriptor descriptor) {
		return new PrintStream(new FileOutputStream(descriptor), true, StandardCharsets.UTF_8);
	}
}
