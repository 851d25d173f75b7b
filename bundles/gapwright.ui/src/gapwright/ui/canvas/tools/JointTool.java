package gapwright.ui.canvas.tools;

import java.util.List;

import org.eclipse.emf.ecore.EObject;

import gapwright.model.edit.JointEdits;
import gapwright.ui.canvas.CanvasModel;
import gapwright.ui.canvas.Snapping;

/** Adds a joint where it is clicked. */
public final class JointTool extends CanvasTool {

	public JointTool(CanvasModel canvas) {
		super(canvas);
	}

	@Override
	protected boolean handleButtonDown(int button) {
		if (button == 1) {
			double[] at = millimetres();
			double[] place = Snapping.snap(at[0], at[1], canvas.session().design(), canvas.scale(), List.of(),
					isSnappingOff());
			EObject[] added = new EObject[1];
			run(JointEdits.add(canvas.session().design(), place[0], place[1], joint -> added[0] = joint), added);
		}
		return true;
	}
}
