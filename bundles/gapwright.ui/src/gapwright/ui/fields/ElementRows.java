package gapwright.ui.fields;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import java.util.function.Function;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Label;

/** One row of fields for each of several small elements, such as the coils of a winding, under common headings, each with a button to take it away. */
public final class ElementRows {

	private final Composite parent;
	private final EditRunner runner;
	private final List<EStructuralFeature> features;
	private final Consumer<EObject> remover;
	private final Function<EObject, String> describer;
	private final List<Row> rows = new ArrayList<>();
	private final List<Label> headings = new ArrayList<>();

	/**
	 * @param describer what the button's tooltip calls an element
	 * @param remover   takes an element away, as an edit
	 */
	public ElementRows(Composite parent, EditRunner runner, List<? extends EStructuralFeature> features,
			Function<EObject, String> describer, Consumer<EObject> remover) {
		this.parent = parent;
		this.runner = runner;
		this.features = List.copyOf(features);
		this.describer = describer;
		this.remover = remover;
		parent.setLayout(FormLayouts.grid(features.size() + 1));
		for (EStructuralFeature feature : features) {
			heading(feature);
		}
		headings.add(new Label(parent, SWT.NONE));
		headings.forEach(label -> label.setLayoutData(new GridData(SWT.FILL, SWT.CENTER, false, false)));
	}

	private void heading(EStructuralFeature feature) {
		Label label = new Label(parent, SWT.NONE);
		label.setText(FeatureText.label(feature));
		label.setToolTipText(FeatureText.hint(feature));
		headings.add(label);
	}

	/** Shows these elements; rows of those shown already stay, with what is typed in them. */
	public void show(List<? extends EObject> elements) {
		List<EObject> before = rows.stream().map(row -> row.element).toList();
		if (before.equals(elements)) {
			rows.forEach(row -> row.fields.forEach(FeatureField::refresh));
			return;
		}
		int kept = 0;
		while (kept < Math.min(before.size(), elements.size()) && before.get(kept) == elements.get(kept)) {
			kept++;
		}
		while (rows.size() > kept) {
			rows.remove(rows.size() - 1).dispose();
		}
		rows.forEach(row -> row.fields.forEach(FeatureField::refresh));
		for (EObject element : elements.subList(kept, elements.size())) {
			rows.add(new Row(element));
		}
		headings.forEach(label -> FormLayouts.show(label, !rows.isEmpty()));
		FormLayouts.relayout(parent);
	}

	/** Puts the focus into the row of an element. */
	public void reveal(EObject element) {
		rows.stream().filter(row -> row.element == element).findFirst().ifPresent(row -> row.fields.get(0).control().setFocus());
	}

	public Composite control() {
		return parent;
	}

	private final class Row {

		private final EObject element;
		private final List<FeatureField> fields = new ArrayList<>();
		private final Button remove;
		private final ProblemLine problem;

		Row(EObject element) {
			this.element = element;
			for (EStructuralFeature feature : features) {
				FeatureField field = FeatureField.of(parent, feature, runner);
				GridData data = new GridData(SWT.FILL, SWT.CENTER, true, false);
				data.widthHint = 90;
				field.control().setLayoutData(data);
				if (field.control() instanceof Button tick) {
					tick.setText("");
				}
				field.onProblem(this::mirrorProblem);
				fields.add(field);
			}
			remove = new Button(parent, SWT.PUSH | SWT.FLAT);
			remove.setText("Remove");
			remove.setToolTipText("Remove " + describer.apply(element));
			remove.addListener(SWT.Selection, event -> remover.accept(element));
			problem = new ProblemLine(parent, features.size() + 1);
			fields.forEach(field -> field.bind(element));
		}

		private void mirrorProblem() {
			String first = fields.stream().map(FeatureField::problem).filter(text -> text != null).findFirst().orElse(null);
			if (problem != null && problem.show(first)) {
				FormLayouts.relayout(parent);
			}
		}

		void dispose() {
			fields.stream().map(FeatureField::control).forEach(Control::dispose);
			remove.dispose();
			problem.dispose();
		}
	}
}
