package gapwright.ui.views;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Objects;
import java.util.Set;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.jface.action.Action;
import org.eclipse.jface.action.IToolBarManager;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.SashForm;
import org.eclipse.swt.dnd.Clipboard;
import org.eclipse.swt.dnd.TextTransfer;
import org.eclipse.swt.dnd.Transfer;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.RowData;
import org.eclipse.swt.layout.RowLayout;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Text;
import org.eclipse.ui.PlatformUI;

import gapwright.model.Design;
import gapwright.model.Leg;
import gapwright.model.Winding;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;
import gapwright.model.quantity.QuantityFormatException;
import gapwright.report.SweepReport;
import gapwright.study.Progress;
import gapwright.study.StudyInput;
import gapwright.study.sweep.BiasSweep;
import gapwright.study.sweep.SweepLeg;
import gapwright.study.sweep.SweepRequest;
import gapwright.study.sweep.SweepResult;
import gapwright.ui.canvas.paint.Tone;
import gapwright.ui.fields.Accessibles;
import gapwright.ui.fields.FeatureText;
import gapwright.ui.fields.FigureFormat;
import gapwright.ui.plot.Axis;
import gapwright.ui.plot.Plot;
import gapwright.ui.plot.PlotCanvas;
import gapwright.ui.plot.PlotExport;
import gapwright.ui.session.DesignSession;

/** View: inductance and flux densities against the current of a winding. */
public final class BiasSweepView extends ComputingView<SweepResult> {

	public static final String ID = "gapwright.ui.views.biasSweep";

	private static final int STEPS = 120;
	private static final double BEYOND = 1.5;
	/** More lines than these nobody can tell apart. */
	private static final int MOST_LEGS = 4;

	private Combo winding;
	private Text from;
	private Text to;
	private PlotCanvas inductance;
	private PlotCanvas density;
	private List<String> windingIds = List.of();
	private String wantedWinding;
	private String wantedFrom = "";
	private String wantedTo = "";
	private SweepResult sweep;
	private DesignSession session;

	@Override
	String subject() {
		return "inductance and flux density against current";
	}

	@Override
	String task() {
		return "Sweeping the current of a winding";
	}

	@Override
	void createContent(Composite parent) {
		PlatformUI.getWorkbench().getHelpSystem().setHelp(parent, "gapwright.help.biasSweep");
		Composite bar = new Composite(parent, SWT.NONE);
		RowLayout row = new RowLayout(SWT.HORIZONTAL);
		row.center = true;
		row.spacing = 6;
		row.marginTop = 0;
		row.marginBottom = 0;
		bar.setLayout(row);
		bar.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
		label(bar, "Winding");
		winding = new Combo(bar, SWT.READ_ONLY);
		Accessibles.name(winding, "Winding swept");
		label(bar, "from");
		from = field(bar, "0 A", "Where the sweep begins, e.g. -20 A; left empty: 0 A");
		label(bar, "to");
		to = field(bar, "1.5 × the largest", "Where it ends, e.g. 30 A; left empty: 1.5 times the winding's largest current");
		SashForm sash = new SashForm(parent, SWT.VERTICAL | SWT.SMOOTH);
		sash.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
		inductance = new PlotCanvas(sash, "Inductance against current");
		density = new PlotCanvas(sash, "Flux density of legs against current");
		inductance.onCursor(density::cursor);
		density.onCursor(inductance::cursor);
		// side by side where the view is wide, one below the other where it is high
		sash.addListener(SWT.Resize, event -> sash.setOrientation(sash.getSize().x > 1.5 * sash.getSize().y ? SWT.HORIZONTAL : SWT.VERTICAL));
		winding.addListener(SWT.Selection, event -> chosen());
		actions();
	}

	private static void label(Composite parent, String text) {
		new Label(parent, SWT.NONE).setText(text);
	}

	private Text field(Composite parent, String message, String tip) {
		Text field = new Text(parent, SWT.BORDER);
		field.setMessage(message);
		field.setToolTipText(tip);
		Accessibles.name(field, tip);
		field.setLayoutData(new RowData(110, SWT.DEFAULT));
		field.addListener(SWT.DefaultSelection, event -> chosen());
		field.addListener(SWT.FocusOut, event -> chosen());
		return field;
	}

	private void actions() {
		IToolBarManager tools = getViewSite().getActionBars().getToolBarManager();
		tools.add(action("Save picture…", "Save both plots as an SVG or PNG picture", () -> {
			if (sweep != null) {
				PlotExport.save(List.of(inductance.plot(), density.plot()), "Bias sweep of " + sweep.winding(), getSite().getShell());
			}
		}));
		tools.add(action("Save CSV…", "Save all figures for a spreadsheet", () -> {
			if (sweep != null) {
				PlotExport.saveText(SweepReport.csv(sweep), ".csv", "Comma-separated values (*.csv)", getSite().getShell());
			}
		}));
	}

	private static Action action(String text, String tip, Runnable run) {
		Action action = new Action(text) {
			@Override
			public void run() {
				run.run();
			}
		};
		action.setToolTipText(tip);
		return action;
	}

	private void chosen() {
		String id = winding.getSelectionIndex() < 0 ? null : windingIds.get(winding.getSelectionIndex());
		boolean same = Objects.equals(id, wantedWinding) && from.getText().equals(wantedFrom) && to.getText().equals(wantedTo);
		wantedWinding = id;
		wantedFrom = from.getText();
		wantedTo = to.getText();
		if (!same && session != null && session.pointResult() != null) {
			start(session);
		}
	}

	@Override
	boolean startsByItself() {
		DesignSession next = getAdapter(DesignSession.class);
		if (next != session) {
			// a range typed for one design means nothing for another
			session = next;
			wantedWinding = null;
			wantedFrom = "";
			wantedTo = "";
			from.setText("");
			to.setText("");
		}
		fill(session.design());
		return true;
	}

	/** The windings to choose from; the choice stays where it can. */
	private void fill(Design design) {
		List<String> ids = design.getWindings().stream().map(Winding::getId).toList();
		String[] names = design.getWindings().stream().map(FeatureText::name).toArray(String[]::new);
		if (!ids.equals(windingIds) || !Arrays.equals(names, winding.getItems())) {
			windingIds = ids;
			winding.setItems(names);
			winding.getParent().layout();
		}
		int index = ids.indexOf(wantedWinding);
		if (index < 0 && !ids.isEmpty()) {
			index = 0;
			wantedWinding = ids.get(0);
		}
		if (index >= 0) {
			winding.select(index);
		}
	}

	@Override
	SweepResult compute(StudyInput input, String operatingPoint, Progress progress) {
		if (wantedWinding == null) {
			throw new IllegalArgumentException("The design has no winding to sweep.");
		}
		double begin = current(wantedFrom, 0);
		double end = current(wantedTo, BEYOND * BiasSweep.largestCurrent(input, wantedWinding));
		if (begin == end) {
			throw new IllegalArgumentException("Nothing to sweep: this winding carries no current. Type where the sweep ends.");
		}
		return BiasSweep.run(input, new SweepRequest(operatingPoint, wantedWinding, begin, end, STEPS), progress);
	}

	private static double current(String typed, double otherwise) {
		try {
			return typed.isBlank() ? otherwise : Quantity.parse(typed, Dimension.CURRENT).si();
		} catch (QuantityFormatException e) {
			throw new IllegalArgumentException(e.getMessage());
		}
	}

	@Override
	void showFigures(DesignSession shown, SweepResult figures) {
		sweep = figures;
		Axis current = Axis.round("Current of " + name(shown, figures.winding()), "A", least(figures.current()), greatest(figures.current()));
		List<Plot.Line> lines = new ArrayList<>();
		lines.add(new Plot.Line("differential", figures.current(), figures.differential(), Plot.tone(0), false));
		double most = greatest(figures.differential());
		if (!Double.isNaN(figures.apparent()[0])) {
			lines.add(new Plot.Line("apparent", figures.current(), figures.apparent(), Plot.tone(1), true));
			most = Math.max(most, greatest(figures.apparent()));
		}
		inductance.show(new Plot(current, Axis.round("Inductance", "H", 0, most), lines, List.of(), List.of(), List.of()));
		showLegs(shown, current);
	}

	private static String name(DesignSession shown, String id) {
		return shown.design().getWindings().stream().filter(w -> id.equals(w.getId())).map(FeatureText::name).findFirst().orElse(id);
	}

	/** The legs selected on the canvas, else those that come nearest to saturation. */
	private List<SweepLeg> shownLegs(DesignSession shown) {
		List<SweepLeg> selected = shown.selection().selected().stream().filter(Leg.class::isInstance)
				.map(leg -> sweep.leg(((Leg) leg).getId())).filter(leg -> leg != null).limit(MOST_LEGS).toList();
		if (!selected.isEmpty()) {
			return selected;
		}
		return sweep.legs().stream().sorted(Comparator.comparingDouble(leg -> -reach(leg))).limit(MOST_LEGS).toList();
	}

	private static double reach(SweepLeg leg) {
		double most = Math.max(Math.abs(least(leg.fluxDensity())), Math.abs(greatest(leg.fluxDensity())));
		return Double.isNaN(leg.saturation()) ? most * 1e-6 : most / leg.saturation();
	}

	private void showLegs(DesignSession shown, Axis current) {
		List<Plot.Line> lines = new ArrayList<>();
		List<Plot.Spot> spots = new ArrayList<>();
		Set<Double> saturations = new LinkedHashSet<>();
		Set<Double> nears = new LinkedHashSet<>();
		double low = 0;
		double high = 0;
		for (SweepLeg leg : shownLegs(shown)) {
			String name = shown.design().getLegs().stream().filter(l -> leg.id().equals(l.getId())).map(FeatureText::name).findFirst().orElse(leg.id());
			lines.add(new Plot.Line(name, sweep.current(), leg.fluxDensity(), Plot.tone(lines.size()), Plot.isDashed(lines.size())));
			low = Math.min(low, least(leg.fluxDensity()));
			high = Math.max(high, greatest(leg.fluxDensity()));
			if (!Double.isNaN(leg.saturation())) {
				saturations.add(leg.saturation());
				nears.add(leg.near());
			}
			spot(spots, "near from ", leg.nearAt(), leg, leg.near(), Tone.NEAR);
			spot(spots, "over from ", leg.overAt(), leg, leg.saturation(), Tone.OVER);
		}
		List<Plot.Level> levels = new ArrayList<>();
		boolean negative = low < 0;
		boolean positive = high > 0;
		for (double value : saturations) {
			levels(levels, "saturation " + FigureFormat.fluxDensity(value), value, Tone.OVER, positive, negative);
			high = positive ? Math.max(high, value) : high;
			low = negative ? Math.min(low, -value) : low;
		}
		nears.forEach(value -> levels(levels, "near", value, Tone.NEAR, positive, negative));
		density.show(new Plot(current, Axis.round("Flux density", "T", low, high), lines, levels, firstOfEach(spots), List.of()));
	}

	private static void levels(List<Plot.Level> into, String name, double value, Tone tone, boolean above, boolean below) {
		if (above) {
			into.add(new Plot.Level(name, value, tone, false));
		}
		if (below) {
			into.add(new Plot.Level(name, -value, tone, false));
		}
	}

	private static void spot(List<Plot.Spot> into, String word, double at, SweepLeg leg, double limit, Tone tone) {
		if (!Double.isNaN(at)) {
			double sign = Math.signum(at) == 0 ? 1 : Math.signum(at);
			boolean falling = leg.fluxDensity()[leg.fluxDensity().length - 1] < leg.fluxDensity()[0];
			into.add(new Plot.Spot(word + FigureFormat.si(at, "A"), at, falling ? -sign * limit : sign * limit, tone));
		}
	}

	/** Only the leg that is first near, and first over, is named: the others would hide it. */
	private static List<Plot.Spot> firstOfEach(List<Plot.Spot> spots) {
		List<Plot.Spot> first = new ArrayList<>();
		for (Tone tone : new Tone[] { Tone.NEAR, Tone.OVER }) {
			spots.stream().filter(spot -> spot.tone() == tone).min(Comparator.comparingDouble(spot -> Math.abs(spot.x()))).ifPresent(first::add);
		}
		return first;
	}

	private static double least(double[] values) {
		return Arrays.stream(values).filter(v -> !Double.isNaN(v)).min().orElse(0);
	}

	private static double greatest(double[] values) {
		return Arrays.stream(values).filter(v -> !Double.isNaN(v)).max().orElse(0);
	}

	@Override
	void say(String sentence) {
		sweep = null;
		inductance.say(sentence);
		density.say("");
	}

	@Override
	Control anchor() {
		return inductance;
	}

	@Override
	String note() {
		return "";
	}

	@Override
	void copy(boolean all) {
		if (sweep != null) {
			Clipboard clipboard = new Clipboard(inductance.getDisplay());
			clipboard.setContents(new Object[] { SweepReport.csv(sweep).replace(',', '\t') }, new Transfer[] { TextTransfer.getInstance() });
			clipboard.dispose();
		}
	}

	@Override
	void select(List<EObject> elements) {
		if (sweep != null && session != null && inductance.plot() != null) {
			showLegs(session, density.plot().x());
		}
	}

	@Override
	public void setFocus() {
		inductance.setFocus();
	}
}
