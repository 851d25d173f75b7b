package gapwright.ui.wizards;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.List;

import org.eclipse.jface.wizard.WizardPage;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.StackLayout;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.FileDialog;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Link;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableColumn;
import org.eclipse.swt.widgets.TableItem;
import org.eclipse.swt.widgets.Text;
import org.eclipse.ui.PlatformUI;

import gapwright.library.material.BareUnits;
import gapwright.library.material.FileProblem;
import gapwright.library.material.MaterialFile;
import gapwright.library.material.MaterialReading;
import gapwright.library.material.UnitDoubt;
import gapwright.model.Design;
import gapwright.model.Material;
import gapwright.ui.fields.Accessibles;
import gapwright.ui.pages.CurvePlot;

/** Chooses the file and the units of its bare numbers; shows either what is wrong with it, line by line, or what it holds. */
final class ImportMaterialPage extends WizardPage {

	private static final String AS_IN_FILE = "as the file says";
	private static final int MOST_OFFERS = 3;

	private Design design;
	private Text file;
	private Combo field;
	private Combo flux;
	private Composite results;
	private Composite good;
	private Composite bad;
	private Table problems;
	private Text explanation;
	private Link doubts;
	private Text summary;
	private CurvePlot plot;
	private MaterialReading reading;

	ImportMaterialPage() {
		super("material");
		setTitle("Import material");
		setDescription("Read a material from a " + MaterialFile.ENDING + " file. Nothing is taken over from a file with an error.");
	}

	void design(Design target) {
		design = target;
	}

	/** @return null while there is none to take */
	Material material() {
		return reading == null ? null : reading.material();
	}

	@Override
	public void createControl(Composite parent) {
		Composite area = new Composite(parent, SWT.NONE);
		area.setLayout(new GridLayout(3, false));
		label(area, "File");
		file = new Text(area, SWT.BORDER);
		file.setLayoutData(new GridData(SWT.FILL, SWT.CENTER, true, false));
		file.addListener(SWT.Modify, event -> refresh());
		Accessibles.name(file, "File");
		Button browse = new Button(area, SWT.PUSH);
		browse.setText("Browse…");
		browse.addListener(SWT.Selection, event -> browse());
		label(area, "Bare numbers");
		Composite units = new Composite(area, SWT.NONE);
		units.setLayoutData(new GridData(SWT.FILL, SWT.CENTER, true, false, 2, 1));
		GridLayout row = new GridLayout(4, false);
		row.marginWidth = 0;
		row.marginHeight = 0;
		units.setLayout(row);
		field = units(units, "H", "Unit of field strengths without one", BareUnits.FIELD_STRENGTHS);
		flux = units(units, "B", "Unit of flux densities without one", BareUnits.FLUX_DENSITIES);
		doubts = new Link(area, SWT.WRAP);
		GridData wide = new GridData(SWT.FILL, SWT.TOP, true, false, 3, 1);
		wide.widthHint = 560;
		wide.exclude = true;
		doubts.setLayoutData(wide);
		doubts.addListener(SWT.Selection, event -> accept(Integer.parseInt(event.text)));
		results = new Composite(area, SWT.NONE);
		GridData fill = new GridData(SWT.FILL, SWT.FILL, true, true, 3, 1);
		fill.widthHint = 640;
		fill.heightHint = 300;
		results.setLayoutData(fill);
		results.setLayout(new StackLayout());
		createProblems();
		createGood();
		setControl(area);
		PlatformUI.getWorkbench().getHelpSystem().setHelp(area, "gapwright.help.materialsPage");
		refresh();
	}

	private static void label(Composite area, String text) {
		new Label(area, SWT.NONE).setText(text);
	}

	private Combo units(Composite area, String symbol, String name, List<String> allowed) {
		label(area, symbol);
		Combo combo = new Combo(area, SWT.READ_ONLY);
		combo.add(AS_IN_FILE);
		allowed.forEach(combo::add);
		combo.select(0);
		combo.setToolTipText(name);
		combo.addListener(SWT.Selection, event -> refresh());
		Accessibles.name(combo, name);
		return combo;
	}

	private void createProblems() {
		bad = new Composite(results, SWT.NONE);
		GridLayout grid = new GridLayout(1, false);
		grid.marginWidth = 0;
		bad.setLayout(grid);
		problems = new Table(bad, SWT.BORDER | SWT.FULL_SELECTION);
		problems.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
		problems.setHeaderVisible(true);
		problems.addListener(SWT.Selection, event -> explain());
		column("Line", 60);
		column("Column", 70);
		column("Found", 330);
		column("Allowed", 260);
		Accessibles.name(problems, "What is wrong with the file");
		explanation = new Text(bad, SWT.MULTI | SWT.WRAP | SWT.READ_ONLY);
		GridData lines = new GridData(SWT.FILL, SWT.BOTTOM, true, false);
		lines.heightHint = 4 * explanation.getLineHeight();
		lines.widthHint = 560;
		explanation.setLayoutData(lines);
		Accessibles.name(explanation, "The chosen error");
	}

	/** The chosen error in full: its columns may be too narrow for it. */
	private void explain() {
		int chosen = problems.getSelectionIndex();
		explanation.setText(chosen < 0 ? "" : reading.problems().get(chosen).toString());
	}

	private void column(String title, int width) {
		TableColumn column = new TableColumn(problems, SWT.NONE);
		column.setText(title);
		column.setWidth(width);
	}

	private void createGood() {
		good = new Composite(results, SWT.NONE);
		good.setLayout(new GridLayout(2, true));
		summary = new Text(good, SWT.MULTI | SWT.WRAP | SWT.READ_ONLY | SWT.V_SCROLL);
		summary.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
		Accessibles.name(summary, "What the file holds");
		plot = new CurvePlot(good);
		plot.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
	}

	private void browse() {
		FileDialog dialog = new FileDialog(getShell(), SWT.OPEN);
		dialog.setFilterExtensions(new String[] { "*" + MaterialFile.ENDING, "*.csv", "*.*" });
		dialog.setFilterNames(new String[] { "Materials (*" + MaterialFile.ENDING + ")", "Comma-separated (*.csv)", "All files" });
		String chosen = dialog.open();
		if (chosen != null) {
			file.setText(chosen);
		}
	}

	/** Takes over the units of an offer, which somebody has clicked. */
	private void accept(int offer) {
		BareUnits units = reading.doubts().get(offer).instead();
		choose(field, units.fieldStrength());
		choose(flux, units.fluxDensity());
		refresh();
	}

	private static void choose(Combo combo, String unit) {
		combo.select(unit == null ? 0 : combo.indexOf(unit));
	}

	private static String unit(Combo combo) {
		return combo.getSelectionIndex() == 0 ? null : combo.getText();
	}

	private void refresh() {
		reading = null;
		String trouble = design == null ? "Open the design that the material shall go into first." : null;
		if (trouble == null && !file.getText().isBlank()) {
			trouble = read();
		}
		boolean refused = reading != null && !reading.problems().isEmpty();
		if (refused) {
			int count = reading.problems().size();
			trouble = count == 1 ? "The file has an error and is not read." : "The file has " + count + " errors and is not read.";
			problems.removeAll();
			reading.problems().forEach(this::row);
			problems.select(0);
			explain();
		}
		boolean read = reading != null && !refused;
		summary.setText(read ? MaterialSummary.of(reading) : "");
		plot.show(read ? reading.material() : null);
		showDoubts(read ? reading.doubts() : List.of());
		((StackLayout) results.getLayout()).topControl = refused ? bad : read ? good : null;
		results.layout();
		results.getParent().layout(true, true);
		setErrorMessage(trouble);
		setMessage(read && !reading.doubts().isEmpty() ? "The figures look as if in other units: see below." : null,
				WARNING);
		setPageComplete(read && trouble == null);
	}

	private String read() {
		try (InputStream input = Files.newInputStream(Path.of(file.getText().strip()))) {
			reading = MaterialFile.read(input, new BareUnits(unit(field), unit(flux)));
			return null;
		} catch (InvalidPathException e) {
			return "That is no path of a file: " + e.getReason();
		} catch (IOException e) {
			return "The file cannot be read: " + file.getText().strip();
		}
	}

	private void row(FileProblem problem) {
		TableItem item = new TableItem(problems, SWT.NONE);
		item.setText(new String[] { Integer.toString(problem.line()), Integer.toString(problem.column()), problem.message(),
				problem.allowed() });
	}

	/** Nothing is changed before somebody clicks an offer. */
	private void showDoubts(List<UnitDoubt> all) {
		StringBuilder text = new StringBuilder();
		for (int k = 0; k < Math.min(MOST_OFFERS, all.size()); k++) {
			UnitDoubt doubt = all.get(k);
			String message = doubt.message().substring(0, 1).toUpperCase(java.util.Locale.ROOT) + doubt.message().substring(1);
			text.append(k == 0 ? "" : "\n").append(message.replace("&", "&&"));
			if (doubt.apt()) {
				text.append(". <a href=\"").append(k).append("\">Read them in ").append(doubt.instead().fieldStrength()).append(" and ")
						.append(doubt.instead().fluxDensity()).append("</a>");
			}
		}
		doubts.setText(text.toString());
		boolean any = !all.isEmpty();
		((GridData) doubts.getLayoutData()).exclude = !any;
		doubts.setVisible(any);
	}
}
