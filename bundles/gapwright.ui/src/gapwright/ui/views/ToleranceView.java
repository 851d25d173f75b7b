package gapwright.ui.views;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.function.Function;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.SashForm;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.RowData;
import org.eclipse.swt.layout.RowLayout;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Text;
import org.eclipse.ui.PlatformUI;

import gapwright.study.Finding;
import gapwright.study.Progress;
import gapwright.study.StudyInput;
import gapwright.study.tolerance.Samples;
import gapwright.study.tolerance.ToleranceRequest;
import gapwright.study.tolerance.ToleranceResult;
import gapwright.study.tolerance.ToleranceStudy;
import gapwright.ui.canvas.paint.Tone;
import gapwright.ui.fields.Accessibles;
import gapwright.ui.plot.Axis;
import gapwright.ui.plot.Plot;
import gapwright.ui.plot.PlotCanvas;
import gapwright.ui.session.DesignSession;

/** View: what the design's tolerances do to inductances and legs, as bands, with a histogram of the figure chosen. */
public final class ToleranceView extends ComputingView<ToleranceResult> {

	public static final String ID = "gapwright.ui.views.tolerances";

	private static final int SAMPLES = 10_000;
	private static final int BINS = 60;
	/** Quantiles shown: 99.7 % of samples lie between. */
	private static final double LOW = 0.0015;
	private static final double HIGH = 0.9985;

	private Text samples;
	private Text seed;
	private Button run;
	private Label message;
	private LedgerTable<BandRow> table;
	private PlotCanvas histogram;
	private DesignSession session;
	private ToleranceRequest request = new ToleranceRequest(SAMPLES, 1);

	@Override
	String subject() {
		return "what its tolerances do";
	}

	@Override
	String task() {
		return "Drawing samples of the tolerances";
	}

	@Override
	void createContent(Composite parent) {
		PlatformUI.getWorkbench().getHelpSystem().setHelp(parent, "gapwright.help.tolerances");
		Composite bar = new Composite(parent, SWT.NONE);
		RowLayout row = new RowLayout(SWT.HORIZONTAL);
		row.center = true;
		row.spacing = 6;
		row.marginTop = 0;
		row.marginBottom = 0;
		bar.setLayout(row);
		bar.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
		new Label(bar, SWT.NONE).setText("Samples");
		samples = field(bar, Integer.toString(SAMPLES), "How many samples to draw, 0 to " + ToleranceRequest.MOST_SAMPLES);
		new Label(bar, SWT.NONE).setText("seed");
		seed = field(bar, "1", "The same seed draws the same samples");
		run = new Button(bar, SWT.PUSH);
		run.setText("Run");
		run.setToolTipText("Draw samples; the design is not changed");
		run.addListener(SWT.Selection, event -> runOrStop());
		message = new Label(bar, SWT.NONE);
		SashForm sash = new SashForm(parent, SWT.HORIZONTAL | SWT.SMOOTH);
		sash.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
		table = new LedgerTable<>(sash, columns(), LedgerSettings.of("tolerances"));
		table.onSelect(rows -> {
			publish(rows.stream().map(BandRow::element).filter(e -> e != null).toList());
			histogram();
		});
		histogram = new PlotCanvas(sash, "Histogram");
		sash.setWeights(62, 38);
	}

	private static Text field(Composite parent, String text, String tip) {
		Text field = new Text(parent, SWT.BORDER | SWT.RIGHT);
		field.setText(text);
		field.setToolTipText(tip);
		Accessibles.name(field, tip);
		field.setLayoutData(new RowData(80, SWT.DEFAULT));
		return field;
	}

	private static List<LedgerColumn<BandRow>> columns() {
		return List.of(LedgerColumn.words("Figure", "Inductance of a winding, or use of a leg: peak flux density over saturation", 170, BandRow::name),
				column("Nominal", "All values as drawn", row -> row.band().nominal()),
				column("± slopes", "Greatest deviation by the slopes at the nominal, all tolerances at their worst", row -> row.band().firstOrder()),
				column("± independent", "Root of the sum of squares: tolerances independent of one another", row -> row.band().rootSum()),
				column("Worst low", "Least value over all corners of the tolerances", row -> row.band().cornerLow()),
				column("Worst high", "Greatest value over all corners", row -> row.band().cornerHigh()),
				column("Mean", "Of the samples", row -> row.band().samples() == null ? Double.NaN : row.band().samples().mean()),
				column("0.15 %", "Of all samples, 0.15 % lie below", row -> row.quantile(LOW)),
				column("99.85 %", "Of all samples, 0.15 % lie above", row -> row.quantile(HIGH)),
				new LedgerColumn<>("Over", "Over saturation", "1", "Share of samples at or over saturation, with its standard error", 130, true,
						BandRow::overShown, row -> Double.isNaN(row.overProbability()) ? "" : Double.toString(row.overProbability()),
						Comparator.comparingDouble(BandRow::overProbability)));
	}

	private static LedgerColumn<BandRow> column(String title, String tip, Function<BandRow, Double> value) {
		return new LedgerColumn<>(title, title, "SI", tip, 95, true, row -> row.shown(value.apply(row)),
				row -> Double.isNaN(value.apply(row)) ? "" : Double.toString(value.apply(row)), Comparator.comparingDouble(value::apply));
	}

	@Override
	boolean startsByItself() {
		session = getAdapter(DesignSession.class);
		return false;
	}

	@Override
	void idle(DesignSession shown) {
		if (shown.bands() != null) {
			showFigures(shown, shown.bands());
			return;
		}
		boolean any = !shown.design().getTolerances().isEmpty();
		run.setEnabled(any);
		say(any ? "The design has " + shown.design().getTolerances().size() + " tolerances: press Run."
				: "The design has no tolerance yet: add some on the Tolerances page of the editor.");
	}

	private void runOrStop() {
		if (isBusy()) {
			supersede();
			run.setText("Run");
			say("Stopped.");
			return;
		}
		try {
			request = new ToleranceRequest(Integer.parseInt(samples.getText().strip()), Long.parseLong(seed.getText().strip()));
		} catch (NumberFormatException e) {
			say("Samples and seed are whole numbers.");
			return;
		} catch (IllegalArgumentException e) {
			say(e.getMessage());
			return;
		}
		if (session != null && session.pointResult() != null) {
			start(session);
			run.setText("Stop");
			run.getParent().layout();
		}
	}

	@Override
	ToleranceResult compute(StudyInput input, String operatingPoint, Progress progress) {
		return ToleranceStudy.run(input, request, progress);
	}

	@Override
	void showFigures(DesignSession shown, ToleranceResult figures) {
		run.setText("Run");
		shown.keepBands(figures);
		ToleranceResult.PointBands point = figures.point(shown.operatingPoint().getId());
		List<BandRow> rows = point == null ? List.of() : point.bands().stream().map(band -> BandRow.of(shown.design(), band)).toList();
		List<BandRow> before = table.selection();
		table.show(rows);
		table.select(before.isEmpty() ? rows.stream().limit(1).toList() : before);
		String doubts = String.join("  ·  ", figures.findings().stream().filter(f -> point != null && point.id().equals(f.operatingPoint()))
				.map(Finding::message).toList());
		message.setText(point == null ? "This operating point cannot be computed." : doubts);
		message.setToolTipText(doubts);
		message.getParent().layout();
		histogram();
	}

	private void histogram() {
		List<BandRow> selected = table.selection();
		BandRow row = selected.isEmpty() ? null : selected.get(0);
		Samples drawn = row == null ? null : row.band().samples();
		if (drawn == null || drawn.count() < 2 || !(drawn.greatest() > drawn.least())) {
			histogram.say(row == null ? "Choose a figure to see how it is spread." : "No samples of this figure vary.");
			return;
		}
		int[] counts = drawn.histogram(BINS);
		double width = (drawn.greatest() - drawn.least()) / BINS;
		List<Plot.Bar> bars = new ArrayList<>();
		double most = 0;
		for (int i = 0; i < BINS; i++) {
			double share = (double) counts[i] / drawn.count();
			most = Math.max(most, share);
			double from = drawn.least() + i * width;
			bars.add(new Plot.Bar(from, from + width, share, !row.isInductance() && from >= 1 ? Tone.OVER : Tone.WITHIN));
		}
		double low = Math.min(row.band().cornerLow(), drawn.least());
		double high = Math.max(row.band().cornerHigh(), drawn.greatest());
		List<Plot.Level> levels = new ArrayList<>(List.of(new Plot.Level("nominal", row.band().nominal(), Tone.INK, true)));
		if (!row.isInductance() && high >= 1 && low <= 1) {
			levels.add(new Plot.Level("saturation", 1, Tone.OVER, true));
		}
		histogram.show(new Plot(Axis.round(row.name(), row.isInductance() ? "H" : "", low, high), Axis.round("Share of samples", "", 0, most),
				List.of(), levels, List.of(), bars));
	}

	@Override
	void say(String sentence) {
		table.show(List.of());
		histogram.say("");
		message.setText(sentence);
		message.getParent().layout();
	}

	@Override
	Control anchor() {
		return table.control();
	}

	@Override
	String note() {
		return "";
	}

	@Override
	void copy(boolean all) {
		if (all) {
			table.copyAll();
		} else {
			table.copy();
		}
	}

	@Override
	void select(List<EObject> elements) {
		List<BandRow> rows = table.rows().stream().filter(row -> elements.contains(row.element())).toList();
		if (!rows.isEmpty()) {
			table.select(rows);
			histogram();
		}
	}

	@Override
	public void setFocus() {
		run.setFocus();
	}
}
