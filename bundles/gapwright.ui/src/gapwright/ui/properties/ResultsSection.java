package gapwright.ui.properties;

import java.util.List;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.jface.resource.JFaceResources;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Label;

import gapwright.model.OperatingPoint;
import gapwright.ui.fields.ElementFigures;
import gapwright.ui.fields.FeatureText;
import gapwright.ui.fields.Figure;
import gapwright.ui.fields.FormLayouts;
import gapwright.ui.fields.Headings;
import gapwright.ui.fields.ThemeColours;
import gapwright.ui.session.DesignSession;
import gapwright.ui.session.SessionListener;

/** What was reckoned for the element at the chosen operating point, each figure with its origin. */
public final class ResultsSection extends ElementSection {

	/** Origins wrap from here on, px. */
	private static final int NARROW = 150;

	private final SessionListener listener = this::refresh;
	private DesignSession listening;
	private Composite area;
	private List<Figure> shown = List.of();
	private String explained;

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
		List<Figure> figures = element == null ? List.of() : ElementFigures.of(element, session().pointResult());
		String explanation = explanation(figures);
		if (!figures.equals(shown) || !explanation.equals(explained)) {
			shown = figures;
			explained = explanation;
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

	private String explanation(List<Figure> figures) {
		if (session() == null) {
			return "";
		}
		OperatingPoint point = session().operatingPoint();
		if (figures.isEmpty()) {
			String trouble = session().trouble();
			return trouble.isEmpty() ? "Nothing is computed for this element." : trouble;
		}
		return "At " + FeatureText.name(point) + ", " + point.getTemperature();
	}

	private void rebuild() {
		for (Control child : area.getChildren()) {
			child.dispose();
		}
		((GridData) Headings.note(area, explained, 2).getLayoutData()).widthHint = NARROW;
		for (Figure figure : shown) {
			label(figure.name());
			Label value = label(figure.value());
			value.setFont(JFaceResources.getFontRegistry().getBold(JFaceResources.DIALOG_FONT));
			Label origin = Headings.note(area, figure.origin(), 2);
			origin.setForeground(ThemeColours.NOTE.get());
			((GridData) origin.getLayoutData()).horizontalIndent = 12;
			((GridData) origin.getLayoutData()).widthHint = NARROW;
		}
		FormLayouts.relayout(area);
	}

	private Label label(String text) {
		Label label = new Label(area, SWT.NONE);
		label.setText(text);
		label.setLayoutData(new GridData(SWT.BEGINNING, SWT.TOP, false, false));
		return label;
	}

	@Override
	public void dispose() {
		dropListener();
		super.dispose();
	}
}
