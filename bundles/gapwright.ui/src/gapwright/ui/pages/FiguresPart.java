package gapwright.ui.pages;

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

/** What was reckoned for an element of a form page at the chosen operating point, kept true as results come. */
final class FiguresPart {

	private final Composite area;
	private final DesignSession session;
	private EObject element;
	private List<Figure> shown;
	private String explained;

	FiguresPart(Composite area, DesignSession session) {
		this.area = area;
		this.session = session;
		area.setLayout(FormLayouts.grid(2));
		SessionListener listener = this::refresh;
		session.addListener(listener);
		area.addListener(SWT.Dispose, event -> session.removeListener(listener));
	}

	void show(EObject next) {
		element = next;
		refresh();
	}

	private void refresh() {
		if (area.isDisposed()) {
			return;
		}
		List<Figure> figures = element == null ? List.of() : ElementFigures.of(element, session.pointResult());
		String explanation = explanation(figures);
		if (!figures.equals(shown) || !explanation.equals(explained)) {
			shown = figures;
			explained = explanation;
			rebuild();
		}
	}

	private String explanation(List<Figure> figures) {
		if (figures.isEmpty()) {
			return session.trouble().isEmpty() ? "Nothing is computed for it: see the Problems view." : session.trouble();
		}
		OperatingPoint point = session.operatingPoint();
		return "At " + FeatureText.name(point) + ", " + point.getTemperature();
	}

	private void rebuild() {
		for (Control child : area.getChildren()) {
			child.dispose();
		}
		Headings.note(area, explained, 2);
		for (Figure figure : shown) {
			label(figure.name());
			label(figure.value()).setFont(JFaceResources.getFontRegistry().getBold(JFaceResources.DIALOG_FONT));
			Label origin = Headings.note(area, figure.origin(), 2);
			origin.setForeground(ThemeColours.NOTE.get());
			((GridData) origin.getLayoutData()).horizontalIndent = 12;
		}
		FormLayouts.relayout(area);
	}

	private Label label(String text) {
		Label label = new Label(area, SWT.NONE);
		label.setText(text);
		label.setLayoutData(new GridData(SWT.BEGINNING, SWT.TOP, false, false));
		return label;
	}
}
