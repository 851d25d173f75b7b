package gapwright.ui.views;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.RowLayout;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Label;
import org.eclipse.ui.PlatformUI;

import gapwright.model.Design;
import gapwright.model.Ids;
import gapwright.study.Progress;
import gapwright.study.StudyInput;
import gapwright.study.sensitivity.SensitivityResult;
import gapwright.study.sensitivity.SensitivityStudy;
import gapwright.ui.fields.Accessibles;
import gapwright.ui.fields.FeatureText;
import gapwright.ui.fields.FigureFormat;
import gapwright.ui.session.DesignSession;

/** View: what every number of the design does to one of its figures, the strongest first. */
public final class SensitivityView extends ComputingView<SensitivityResult> {

	public static final String ID = "gapwright.ui.views.sensitivity";

	private static final int BAR = 3;

	private Combo figure;
	private Label message;
	private LedgerTable<SensitivityRow> table;
	private EffectPainter painter;
	private SensitivityResult result;
	private DesignSession session;
	private int wanted;

	@Override
	String subject() {
		return "what its figures depend on";
	}

	@Override
	String task() {
		return "Working out sensitivities";
	}

	@Override
	void createContent(Composite parent) {
		PlatformUI.getWorkbench().getHelpSystem().setHelp(parent, "gapwright.help.sensitivity");
		Composite bar = new Composite(parent, SWT.NONE);
		RowLayout row = new RowLayout(SWT.HORIZONTAL);
		row.center = true;
		row.spacing = 6;
		row.marginTop = 0;
		row.marginBottom = 0;
		bar.setLayout(row);
		bar.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
		new Label(bar, SWT.NONE).setText("Effect on");
		figure = new Combo(bar, SWT.READ_ONLY);
		Accessibles.name(figure, "Figure");
		figure.addListener(SWT.Selection, event -> {
			wanted = Math.max(0, figure.getSelectionIndex());
			rows();
		});
		message = new Label(bar, SWT.NONE);
		table = new LedgerTable<>(parent, columns(), LedgerSettings.of("sensitivity"));
		table.control().setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
		table.onSelect(rows -> publish(rows.stream().map(SensitivityRow::element).filter(e -> e != null).distinct().toList()));
		painter = new EffectPainter(table, BAR);
	}

	private static List<LedgerColumn<SensitivityRow>> columns() {
		return List.of(LedgerColumn.words("Element", "Name of the element, else its id", 150, SensitivityRow::name),
				LedgerColumn.words("Number", "Which of its numbers", 140, SensitivityRow::what),
				new LedgerColumn<>("Value", "Value", "SI", "As drawn; materials at the operating point's temperature", 100, true,
						SensitivityRow::figure, row -> Double.toString(row.value()), Comparator.comparingDouble(SensitivityRow::value)),
				new LedgerColumn<>("Bar", "", "", "Right: the figure rises with the number; left and hatched: it falls", 160, false, row -> "",
						row -> "", Comparator.comparingDouble(row -> Math.abs(row.elasticity()))),
				new LedgerColumn<>("Effect", "% per %", "% per %", "Change of the figure in % when the number changes by 1 %; exact, from the"
						+ " solved network by the adjoint method", 90, true, row -> FigureFormat.plain(row.elasticity()),
						row -> Double.toString(row.elasticity()), Comparator.comparingDouble(row -> Math.abs(row.elasticity()))),
				LedgerColumn.figures("Derivative", "SI", "Change of the figure per SI unit of the number", 110, SensitivityRow::derivative,
						FigureFormat::plain));
	}

	@Override
	boolean startsByItself() {
		session = getAdapter(DesignSession.class);
		return true;
	}

	@Override
	SensitivityResult compute(StudyInput input, String operatingPoint, Progress progress) {
		return SensitivityStudy.of(input, operatingPoint, progress);
	}

	@Override
	void showFigures(DesignSession shown, SensitivityResult figures) {
		result = figures;
		String[] names = figures.figures().stream().map(f -> name(shown.design(), f)).toArray(String[]::new);
		if (!Arrays.equals(names, figure.getItems())) {
			figure.setItems(names);
		}
		wanted = Math.min(wanted, names.length - 1);
		figure.select(wanted);
		message.setText("");
		figure.getParent().layout();
		rows();
	}

	private static String name(Design design, SensitivityResult.Figure f) {
		String subject = name(design, f.subject());
		if (f.kind() == SensitivityResult.Kind.UTILISATION) {
			return "utilisation of " + subject + ", " + FigureFormat.percent(f.value());
		}
		return f.subject().equals(f.second()) ? "inductance of " + subject + ", " + FigureFormat.si(f.value(), "H")
				: "mutual inductance of " + subject + " and " + name(design, f.second()) + ", " + FigureFormat.si(f.value(), "H");
	}

	private static String name(Design design, String id) {
		EObject element = Ids.find(design, id);
		return element == null ? id : FeatureText.name(element);
	}

	private void rows() {
		if (result == null || session == null) {
			return;
		}
		List<SensitivityRow> rows = new ArrayList<>();
		for (int p = 0; p < result.parameters().size(); p++) {
			rows.add(SensitivityRow.of(session.design(), result, wanted, p));
		}
		rows.sort(Comparator.comparingDouble(row -> -Math.abs(row.elasticity())));
		painter.scale(rows.isEmpty() ? 1 : Math.abs(rows.get(0).elasticity()));
		table.show(rows);
	}

	@Override
	void say(String sentence) {
		result = null;
		table.show(List.of());
		message.setText(sentence);
		message.getParent().layout();
	}

	@Override
	Control anchor() {
		return table.control();
	}

	@Override
	String note() {
		return table.note();
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
		table.select(table.rows().stream().filter(row -> elements.contains(row.element())).toList());
	}

	@Override
	public void setFocus() {
		table.control().setFocus();
	}
}
