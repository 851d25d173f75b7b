package gapwright.ui.canvas.parts;

import java.util.List;
import java.util.stream.Collectors;

import org.eclipse.draw2d.IFigure;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.gef.AccessibleEditPart;
import org.eclipse.gef.DragTracker;
import org.eclipse.gef.EditPolicy;
import org.eclipse.gef.Request;
import org.eclipse.gef.RequestConstants;
import org.eclipse.gef.editparts.AbstractGraphicalEditPart;
import org.eclipse.swt.accessibility.AccessibleControlEvent;
import org.eclipse.swt.accessibility.AccessibleEvent;

import gapwright.model.Coil;
import gapwright.ui.canvas.CanvasModel;
import gapwright.ui.canvas.QuickEntry;
import gapwright.ui.canvas.looks.Picture;
import gapwright.ui.canvas.policies.MarkSelected;
import gapwright.ui.canvas.tools.ElementDrag;
import gapwright.ui.fields.ElementFigures;
import gapwright.ui.fields.FeatureText;
import gapwright.ui.fields.Figure;

/** An element with a place on the page; how it looks comes with the picture. */
public class ElementPart extends AbstractGraphicalEditPart {

	protected final CanvasModel canvas;
	private AccessibleEditPart accessible;

	public ElementPart(CanvasModel canvas, EObject element) {
		this.canvas = canvas;
		setModel(element);
	}

	public EObject element() {
		return (EObject) getModel();
	}

	public CanvasModel canvas() {
		return canvas;
	}

	@Override
	protected IFigure createFigure() {
		return new LookFigure(this::hover);
	}

	@Override
	protected void createEditPolicies() {
		installEditPolicy(EditPolicy.SELECTION_FEEDBACK_ROLE, new MarkSelected());
	}

	/** Shows what the element looks like in a picture. */
	public void show(Picture picture) {
		((LookFigure) getFigure()).show(picture.look(element()));
	}

	/** Draws the outline of the selection. */
	public void mark(boolean selected) {
		((LookFigure) getFigure()).setSelected(selected);
	}

	@Override
	public DragTracker getDragTracker(Request request) {
		return new ElementDrag(this);
	}

	@Override
	public void performRequest(Request request) {
		if (RequestConstants.REQ_OPEN.equals(request.getType())
				|| RequestConstants.REQ_DIRECT_EDIT.equals(request.getType())) {
			QuickEntry.open(this);
		}
	}

	/** @return one line, for screen readers and tests: what it is, its name, how full it is */
	public String spokenName() {
		String kind = FeatureText.kind(element().eClass());
		StringBuilder text = new StringBuilder().append(Character.toUpperCase(kind.charAt(0))).append(kind, 1, kind.length())
				.append(' ').append(FeatureText.name(element()));
		for (Figure figure : figures()) {
			if (figure.name().equals("Of saturation")) {
				text.append(", ").append(figure.value()).append(" of saturation");
			} else if (figure.name().equals("State")) {
				text.append(", ").append(figure.value());
			}
		}
		return text.toString();
	}

	private List<Figure> figures() {
		EObject subject = element() instanceof Coil coil ? coil.eContainer() : element();
		return ElementFigures.of(subject, canvas.session().pointResult());
	}

	private IFigure hover() {
		return new HoverCard(spokenName(), figures());
	}

	@Override
	protected AccessibleEditPart getAccessibleEditPart() {
		if (accessible == null) {
			accessible = new AccessibleGraphicalEditPart() {

				@Override
				public void getName(AccessibleEvent event) {
					event.result = spokenName();
				}

				@Override
				public void getValue(AccessibleControlEvent event) {
					event.result = figures().stream().map(figure -> figure.name() + ' ' + figure.value())
							.collect(Collectors.joining(", "));
				}
			};
		}
		return accessible;
	}
}
