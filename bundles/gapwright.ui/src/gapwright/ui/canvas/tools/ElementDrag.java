package gapwright.ui.canvas.tools;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;

import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.gef.EditPart;

import gapwright.model.Coil;
import gapwright.model.Design;
import gapwright.model.Gap;
import gapwright.model.GapwrightPackage.Literals;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.Magnet;
import gapwright.model.edit.DesignEdits;
import gapwright.model.edit.JointEdits;
import gapwright.model.edit.history.Edit;
import gapwright.ui.canvas.Snapping;
import gapwright.ui.canvas.parts.ElementPart;
import gapwright.ui.canvas.scene.Bar;
import gapwright.ui.canvas.scene.Scene;

/** Drags joints, and legs by their joints; slides gaps, magnets and coils along their leg. */
public final class ElementDrag extends DragEdit {

	private final EObject element;
	private double[] anchor;
	private Bar bar;

	public ElementDrag(ElementPart part) {
		super(part, part.canvas());
		element = part.element();
	}

	@Override
	protected boolean handleDragStarted() {
		Scene scene = new Scene(design());
		Leg leg = legUnder();
		bar = leg == null ? null : scene.bar(leg);
		Joint joint = element instanceof Joint own ? own : element instanceof Leg own ? own.getFrom() : null;
		anchor = joint == null ? null : new double[] { Scene.x(joint), Scene.y(joint) };
		return super.handleDragStarted();
	}

	private Design design() {
		return canvas.session().design();
	}

	private Leg legUnder() {
		if (element instanceof Coil coil) {
			return coil.getLeg();
		}
		return element instanceof Gap || element instanceof Magnet ? (Leg) element.eContainer() : null;
	}

	@Override
	Edit edit(double[] from, double[] to) {
		if (bar != null) {
			return DesignEdits.set("Move along the leg", element, position(),
					Math.round(bar.fraction(to[0], to[1]) * 100) / 100.0);
		}
		if (anchor == null) {
			return null;
		}
		List<EObject> selected = new ArrayList<>();
		for (Object each : getCurrentViewer().getSelectedEditParts()) {
			selected.add((EObject) ((EditPart) each).getModel());
		}
		if (!selected.contains(element)) {
			selected.add(element);
		}
		Set<Joint> joints = JointEdits.movedBy(selected);
		double[] place = Snapping.snap(anchor[0] + to[0] - from[0], anchor[1] + to[1] - from[1], design(), canvas.scale(),
				joints, isSnappingOff());
		return JointEdits.move(joints, place[0] - anchor[0], place[1] - anchor[1]);
	}

	private EAttribute position() {
		return element instanceof Coil ? Literals.COIL__POSITION
				: element instanceof Gap ? Literals.GAP__POSITION : Literals.MAGNET__POSITION;
	}
}
