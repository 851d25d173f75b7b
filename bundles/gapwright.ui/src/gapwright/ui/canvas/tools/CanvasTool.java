package gapwright.ui.canvas.tools;

import java.util.List;

import org.eclipse.draw2d.Cursors;
import org.eclipse.draw2d.geometry.Point;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.gef.EditPart;
import org.eclipse.gef.GraphicalEditPart;
import org.eclipse.gef.tools.AbstractTool;
import org.eclipse.swt.SWT;
import org.eclipse.swt.events.KeyEvent;

import gapwright.model.edit.history.Edit;
import gapwright.ui.canvas.CanvasModel;
import gapwright.ui.canvas.Messages;

/** A tool that adds something where it is clicked. Escape, or having added one thing, goes back to selecting. */
abstract class CanvasTool extends AbstractTool {

	protected final CanvasModel canvas;

	CanvasTool(CanvasModel canvas) {
		this.canvas = canvas;
		setDefaultCursor(Cursors.CROSS);
	}

	@Override
	protected String getCommandName() {
		return "add";
	}

	final double[] millimetres() {
		Point there = getLocation().getCopy();
		((GraphicalEditPart) getCurrentViewer().getContents()).getFigure().translateToRelative(there);
		return new double[] { canvas.scale().millimetres(there.x), canvas.scale().millimetres(there.y) };
	}

	final boolean isSnappingOff() {
		return getCurrentInput().isModKeyDown(SWT.MOD1);
	}

	/** Runs an edit and selects what it added; a failure is said and leaves nothing behind. */
	final void run(Edit edit, EObject[] added) {
		Messages.run(canvas.session(), edit, getCurrentViewer().getControl().getShell());
		if (added[0] != null) {
			canvas.session().selection().select(List.of(added[0]), this);
			Object part = getCurrentViewer().getEditPartRegistry().get(added[0]);
			if (part instanceof EditPart there) {
				getCurrentViewer().select(there);
			}
		}
		handleFinished();
	}

	@Override
	protected boolean handleKeyDown(KeyEvent event) {
		if (event.keyCode == SWT.ESC) {
			getDomain().loadDefaultTool();
			return true;
		}
		return super.handleKeyDown(event);
	}
}
