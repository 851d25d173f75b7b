package gapwright.ui.fields;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Predicate;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Text;

/** Rows of label and field for the features of one element at a time; the parent gets a grid of two columns. */
public final class FeatureForm {

	private static final int LINES = 3;

	private final Composite parent;
	private final EditRunner runner;
	private final List<Row> rows = new ArrayList<>();
	private EObject element;

	public FeatureForm(Composite parent, EditRunner runner) {
		this.parent = parent;
		this.runner = runner;
		parent.setLayout(FormLayouts.grid(2));
	}

	public FeatureForm add(EStructuralFeature... features) {
		for (EStructuralFeature feature : features) {
			add(feature, any -> true);
		}
		return this;
	}

	/** @param when whether the row has a meaning for an element */
	public FeatureForm add(EStructuralFeature feature, Predicate<EObject> when) {
		rows.add(new Row(feature, when));
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
		private final Predicate<EObject> when;
		private final Label label;
		private final FeatureField field;
		private final ProblemLine problem;
		private boolean shown = true;

		Row(EStructuralFeature feature, Predicate<EObject> when) {
			this.feature = feature;
			this.when = when;
			label = new Label(parent, SWT.NONE);
			label.setLayoutData(new GridData(SWT.BEGINNING, SWT.CENTER, false, false));
			label.setToolTipText(FeatureText.hint(feature));
			field = FeatureField.of(parent, feature, runner);
			GridData wide = new GridData(SWT.FILL, SWT.CENTER, true, false);
			wide.widthHint = 160;
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
			problem = new ProblemLine(parent, 2);
			field.onProblem(() -> {
				if (problem.show(field.problem())) {
					FormLayouts.relayout(parent);
				}
			});
		}

		/** @return whether the row came or went */
		boolean bind() {
			boolean visible = element == null || has(element) && when.test(element);
			field.bind(visible ? element : null);
			boolean changed = visible != shown;
			if (changed) {
				shown = visible;
				FormLayouts.show(label, visible);
				FormLayouts.show(field.control(), visible);
			}
			return changed;
		}

		private boolean has(EObject next) {
			return next.eClass().getEAllStructuralFeatures().contains(feature);
		}
	}
}
