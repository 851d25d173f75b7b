package gapwright.ui.canvas.parts;

import java.util.ArrayList;
import java.util.List;

import org.eclipse.draw2d.IFigure;
import org.eclipse.draw2d.geometry.Point;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.gef.DragTracker;
import org.eclipse.gef.EditPart;
import org.eclipse.gef.Request;
import org.eclipse.gef.editparts.AbstractGraphicalEditPart;
import org.eclipse.gef.tools.MarqueeDragTracker;

import gapwright.ui.canvas.CanvasModel;
import gapwright.ui.canvas.looks.Picture;

/** The whole design: asks for a new picture whenever design, result or zoom change, and hands it out. */
public final class DesignPart extends AbstractGraphicalEditPart {

	private final CanvasModel canvas;
	private final Runnable listener = this::refreshAll;

	public DesignPart(CanvasModel canvas) {
		this.canvas = canvas;
		setModel(canvas.session().design());
	}

	@Override
	public void activate() {
		super.activate();
		canvas.addListener(listener);
		refreshAll();
	}

	@Override
	public void deactivate() {
		canvas.removeListener(listener);
		super.deactivate();
	}

	@Override
	protected IFigure createFigure() {
		return new PageLayer();
	}

	@Override
	protected void createEditPolicies() {
		// every edit goes through tools, trackers and actions, which run edits on the one history
	}

	@Override
	protected List<?> getModelChildren() {
		List<EObject> elements = new ArrayList<>();
		canvas.picture().elements().forEach(elements::add);
		return elements;
	}

	private void refreshAll() {
		refreshChildren();
		Picture picture = canvas.picture();
		((PageLayer) getFigure()).show(picture, canvas.scale());
		for (Object child : getChildren()) {
			((ElementPart) child).show(picture);
		}
	}

	/** A label is the element's own: a click on it means the element. */
	@Override
	public DragTracker getDragTracker(Request request) {
		return new MarqueeDragTracker() {

			@Override
			protected boolean handleButtonDown(int button) {
				EditPart labelled = labelled(getLocation());
				if (button == 1 && labelled != null) {
					getCurrentViewer().select(labelled);
					setState(STATE_TERMINAL);
					return true;
				}
				return super.handleButtonDown(button);
			}
		};
	}

	private EditPart labelled(Point location) {
		Point there = location.getCopy();
		getFigure().translateToRelative(there);
		EObject element = canvas.picture().labelled(there.x, there.y);
		return element == null ? null : (EditPart) getViewer().getEditPartRegistry().get(element);
	}
}
