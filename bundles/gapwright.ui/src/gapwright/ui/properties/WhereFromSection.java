package gapwright.ui.properties;

import java.util.List;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.jface.resource.JFaceResources;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Label;

import gapwright.study.provenance.Input;
import gapwright.study.provenance.InputsUsed;
import gapwright.study.provenance.Origin;
import gapwright.study.provenance.Provenance;
import gapwright.ui.fields.ElementFigures;
import gapwright.ui.fields.Figure;
import gapwright.ui.fields.FormLayouts;
import gapwright.ui.fields.Headings;
import gapwright.ui.fields.ThemeColours;
import gapwright.ui.session.DesignSession;
import gapwright.ui.session.SessionListener;

/** Where an element's figures come from: of each its formula, source and validity; then the values they were reckoned from. */
public final class WhereFromSection extends ElementSection {

	/** Texts wrap from here on, px. */
	private static final int NARROW = 150;
	private static final int INDENT = 12;

	private final SessionListener listener = this::refresh;
	private DesignSession listening;
	private Composite area;
	private List<Figure> figures = List.of();
	private List<Input> inputs = List.of();
	private boolean built;

	@Override
	void build(Composite into) {
		area = into;
		area.setLayout(FormLayouts.grid(2));
	}

	@Override
	void show(EObject element) {
		listen();
		if (area.isDisposed()) {
			return;
		}
		List<Figure> next = element == null ? List.of() : ElementFigures.of(element, session().pointResult());
		List<Input> used = next.isEmpty() ? List.of() : InputsUsed.of(element, session().operatingPoint());
		if (!built || !next.equals(figures) || !used.equals(inputs)) {
			built = true;
			figures = next;
			inputs = used;
			rebuild();
		}
	}

	/** Another operating point is no step of the history, so the session is listened to as well. */
	private void listen() {
		if (listening != session()) {
			dropListener();
			listening = session();
			if (listening != null) {
				listening.addListener(listener);
			}
		}
	}

	private void dropListener() {
		if (listening != null) {
			listening.removeListener(listener);
			listening = null;
		}
	}

	private void rebuild() {
		for (Control child : area.getChildren()) {
			child.dispose();
		}
		if (figures.isEmpty()) {
			note("Nothing is computed for this element.", 0);
		}
		for (Figure figure : figures) {
			if (figure.group() != null) {
				Origin origin = Provenance.of(figure.group());
				bold(figure.name());
				bold(figure.value());
				note(origin.formula(), INDENT);
				note("Source: " + origin.source(), INDENT);
				note("Valid: " + origin.validity(), INDENT);
			}
		}
		if (!inputs.isEmpty()) {
			bold("Inputs used");
			new Label(area, SWT.NONE);
			for (Input input : inputs) {
				note(input.name() + ": " + input.value(), INDENT);
			}
		}
		FormLayouts.relayout(area);
	}

	private void bold(String text) {
		Label label = new Label(area, SWT.NONE);
		label.setText(text);
		label.setFont(JFaceResources.getFontRegistry().getBold(JFaceResources.DIALOG_FONT));
		label.setLayoutData(new GridData(SWT.BEGINNING, SWT.TOP, false, false));
	}

	private void note(String text, int indent) {
		Label note = Headings.note(area, text, 2);
		note.setForeground(ThemeColours.NOTE.get());
		GridData data = (GridData) note.getLayoutData();
		data.horizontalIndent = indent;
		data.widthHint = NARROW;
	}

	@Override
	public void dispose() {
		dropListener();
		super.dispose();
	}
}
