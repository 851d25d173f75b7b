package gapwright.cli;

import java.io.IOException;
import java.io.InputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.stream.Collectors;

import gapwright.library.StockMaterials;
import gapwright.library.material.BareUnits;
import gapwright.library.material.FileProblem;
import gapwright.library.material.MaterialFile;
import gapwright.library.material.MaterialReading;
import gapwright.library.material.UnitDoubt;
import gapwright.model.Design;
import gapwright.model.DesignWriter;
import gapwright.model.GapwrightFactory;
import gapwright.model.Ids;
import gapwright.model.Material;
import gapwright.physics.material.Permeability;
import gapwright.study.MaterialData;

/** {@code library [FILE… [--field-unit U] [--flux-unit U]]}: lists the stock materials, or turns material files into a design file. */
final class LibraryCommand {

	private final PrintStream out;
	private final PrintStream err;

	LibraryCommand(PrintStream out, PrintStream err) {
		this.out = out;
		this.err = err;
	}

	/** @return an exit status; with a file that cannot be read nothing is written */
	int run(List<String> arguments) throws UsageException {
		if (arguments.isEmpty()) {
			list();
			return ExitStatus.WITHIN;
		}
		Options options = new Options("library", arguments, Set.of(), Set.of("--field-unit", "--flux-unit"));
		BareUnits units;
		try {
			units = new BareUnits(options.value("--field-unit"), options.value("--flux-unit"));
		} catch (IllegalArgumentException e) {
			throw new UsageException("library: " + e.getMessage());
		}
		Design design = GapwrightFactory.eINSTANCE.createDesign();
		design.setName("Imported materials");
		boolean whole = true;
		for (String file : options.files()) {
			whole &= read(file, units, design);
		}
		if (!whole) {
			return ExitStatus.DATA;
		}
		out.print(new String(DesignWriter.bytes(design), StandardCharsets.UTF_8));
		return ExitStatus.WITHIN;
	}

	private void list() {
		List<Material> all = StockMaterials.all();
		int widest = all.stream().mapToInt(material -> material.getId().length()).max().orElse(0);
		for (Material material : all) {
			MaterialData data = new MaterialData(material);
			String saturation = material.getSaturations().stream().map(each -> each.getFluxDensity() + " at " + each.getTemperature())
					.collect(Collectors.joining(", "));
			out.printf(Locale.ROOT, "%-" + widest + "s  µi %6.0f  %-32s %s%n", material.getId(),
					Permeability.initial(data.curve(data.curveCelsius())), saturation, material.getName());
		}
	}

	private boolean read(String file, BareUnits units, Design design) {
		try (InputStream input = Files.newInputStream(Path.of(file))) {
			MaterialReading reading = MaterialFile.read(input, units);
			for (FileProblem problem : reading.problems()) {
				err.println(file + ":" + problem.line() + ":" + problem.column() + ": " + problem.message()
						+ (problem.allowed().isEmpty() ? "" : "; " + problem.allowed()));
			}
			for (String remark : reading.remarks()) {
				err.println(file + ":: " + remark);
			}
			for (UnitDoubt doubt : reading.doubts()) {
				err.println(file + ":: " + doubt.message() + (doubt.apt() ? "; read so with --field-unit "
						+ doubt.instead().fieldStrength() + " --flux-unit " + doubt.instead().fluxDensity() : ""));
			}
			if (reading.material() != null) {
				Material material = reading.material();
				if (Ids.find(design, material.getId()) != null) {
					material.setId(Ids.next(design, material.getId()));
				}
				design.getMaterials().add(material);
			}
			return reading.problems().isEmpty();
		} catch (NoSuchFileException e) {
			err.println(file + ":: no such file");
		} catch (IOException | InvalidPathException e) {
			err.println(file + ":: cannot be read: " + e.getMessage());
		}
		return false;
	}
}
