package gapwright.ui.fields;

import java.util.ArrayList;
import java.util.List;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Text;

/** Rows of label and field for the features of one element at a time; the parent gets a grid. */
public final class FeatureForm {

	private static final int LINES = 3;

	private final Composite parent;
	private final int columns;
	private final EditRunner runner;
	private final List<Row> rows = new ArrayList<>();
	private EObject element;

	public FeatureForm(Composite parent, EditRunner runner) {
		this(parent, runner, 1);
	}

	/** @param pairs of label and field on one line */
	public FeatureForm(Composite parent, EditRunner runner, int pairs) {
		this.parent = parent;
		this.runner = runner;
		columns = 2 * pairs;
		parent.setLayout(FormLayouts.grid(columns));
	}

	public FeatureForm add(EStructuralFeature... features) {
		for (EStructuralFeature feature : features) {
			rows.add(new Row(feature));
		}
		// with several pairs on a line, what is wrong with one of them stands below the whole line
		if (columns > 2) {
			rows.forEach(row -> row.problem.last());
		}
		return this;
	}

	/** @param next shown and edited from now on; null empties the form */
	public void bind(EObject next) {
		boolean changed = false;
		element = next;
		for (Row row : rows) {
			changed |= row.bind();
		}
		if (changed) {
			FormLayouts.relayout(parent);
		}
	}

	/** Shows what the model says now. */
	public void refresh() {
		bind(element);
	}

	public EObject element() {
		return element;
	}

	public Composite control() {
		return parent;
	}

	/** The field of a feature, or null. */
	public FeatureField field(EStructuralFeature feature) {
		return rows.stream().filter(row -> row.feature == feature).map(row -> row.field).findFirst().orElse(null);
	}

	private final class Row {

		private final EStructuralFeature feature;
		private final Label label;
		private final FeatureField field;
		private final ProblemLine problem;
		private boolean shown = true;

		Row(EStructuralFeature feature) {
			this.feature = feature;
			label = new Label(parent, SWT.NONE);
			label.setLayoutData(new GridData(SWT.BEGINNING, SWT.CENTER, false, false));
			label.setToolTipText(FeatureText.hint(feature));
			field = FeatureField.of(parent, feature, runner);
			GridData wide = new GridData(SWT.FILL, SWT.CENTER, true, false);
			wide.widthHint = columns > 2 ? 70 : 160;
			field.control().setLayoutData(wide);
			if (field instanceof FlagField) {
				label.setText("");
			} else {
				label.setText(FeatureText.label(feature));
			}
			if (field.control() instanceof Text text && (text.getStyle() & SWT.MULTI) != 0) {
				wide.heightHint = LINES * text.getLineHeight();
				((GridData) label.getLayoutData()).verticalAlignment = SWT.TOP;
			}
			problem = new ProblemLine(parent, columns);
			field.onProblem(() -> {
				if (problem.show(field.problem())) {
					FormLayouts.relayout(parent);
				}
			});
		}

		/** @return whether the row came or went */
		boolean bind() {
			boolean visible = element == null || Relevance.of(feature, element);
			field.bind(visible ? element : null);
			boolean changed = visible != shown;
			if (changed) {
				shown = visible;
				FormLayouts.show(label, visible);
				FormLayouts.show(field.control(), visible);
			}
			return changed;
		}
	}
}
