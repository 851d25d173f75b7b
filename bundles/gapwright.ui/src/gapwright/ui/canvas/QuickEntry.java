package gapwright.ui.canvas;

import java.beans.PropertyChangeListener;

import org.eclipse.draw2d.FigureCanvas;
import org.eclipse.draw2d.Viewport;
import org.eclipse.draw2d.geometry.Rectangle;
import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.util.EcoreUtil;
import org.eclipse.jface.fieldassist.ControlDecoration;
import org.eclipse.jface.fieldassist.FieldDecorationRegistry;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Text;

import gapwright.model.AirPath;
import gapwright.model.AttributeText;
import gapwright.model.Coil;
import gapwright.model.Gap;
import gapwright.model.GapwrightPackage.Literals;
import gapwright.model.Magnet;
import gapwright.model.check.FeatureDomain;
import gapwright.model.edit.DesignEdits;
import gapwright.ui.canvas.parts.ElementPart;
import gapwright.ui.fields.FeatureText;

/**
 * A field on the canvas for the one value of an element that matters most: the length of a gap, the turns of a coil, a
 * magnet's remanence, an air path's permeance, the name of anything else. Enter takes it over, Escape does not; a bad
 * entry is marked with what would do and never reaches the design.
 */
public final class QuickEntry {

	private static final int WIDTH = 130;

	private final ElementPart part;
	private final EAttribute attribute;
	private final Text field;
	private final ControlDecoration mark;
	private final Runnable moved = this::place;

	private QuickEntry(ElementPart part, EAttribute attribute) {
		this.part = part;
		this.attribute = attribute;
		field = new Text((Composite) part.getViewer().getControl(), SWT.BORDER | SWT.SINGLE);
		mark = new ControlDecoration(field, SWT.LEFT | SWT.TOP);
		mark.setImage(FieldDecorationRegistry.getDefault().getFieldDecoration(FieldDecorationRegistry.DEC_ERROR).getImage());
		mark.hide();
		Object value = element().eGet(attribute);
		field.setText(value == null ? "" : EcoreUtil.convertToString(attribute.getEAttributeType(), value));
		field.setToolTipText(FeatureText.label(attribute));
		place();
		Viewport view = ((FigureCanvas) field.getParent()).getViewport();
		PropertyChangeListener scrolled = event -> place();
		view.addPropertyChangeListener(Viewport.PROPERTY_VIEW_LOCATION, scrolled);
		part.canvas().addListener(moved);
		field.addListener(SWT.Dispose, event -> {
			view.removePropertyChangeListener(Viewport.PROPERTY_VIEW_LOCATION, scrolled);
			part.canvas().removeListener(moved);
		});
		field.selectAll();
		field.setFocus();
		field.addListener(SWT.Modify, event -> problem());
		field.addListener(SWT.DefaultSelection, event -> take());
		field.addListener(SWT.Traverse, event -> {
			if (event.detail == SWT.TRAVERSE_ESCAPE) {
				event.doit = false;
				close();
			}
		});
		field.addListener(SWT.FocusOut, event -> {
			if (problem() == null) {
				take();
			} else {
				close();
			}
		});
	}

	/** Over the middle of the element, wherever that is now. */
	private void place() {
		if (field.isDisposed()) {
			return;
		}
		if (!part.isActive()) {
			close();
			return;
		}
		Rectangle box = part.getFigure().getBounds().getCopy();
		part.getFigure().translateToAbsolute(box);
		int height = field.computeSize(SWT.DEFAULT, SWT.DEFAULT).y;
		field.setBounds(box.getCenter().x - WIDTH / 2, box.getCenter().y - height / 2, WIDTH, height);
	}

	/** Opens the field over an element. */
	public static void open(ElementPart part) {
		new QuickEntry(part, attribute(part.element()));
	}

	static EAttribute attribute(EObject element) {
		if (element instanceof Gap) {
			return Literals.GAP__LENGTH;
		}
		if (element instanceof Coil) {
			return Literals.COIL__TURNS;
		}
		if (element instanceof Magnet) {
			return Literals.MAGNET__REMANENCE;
		}
		return element instanceof AirPath path && path.getArea() == null ? Literals.AIR_PATH__PERMEANCE
				: Literals.ELEMENT__NAME;
	}

	private EObject element() {
		return part.element();
	}

	private String problem() {
		String text = field.getText().strip();
		String problem = AttributeText.problem(attribute, text);
		if (problem == null) {
			problem = FeatureDomain.problem(attribute, EcoreUtil.createFromString(attribute.getEAttributeType(), text));
		}
		if (problem == null) {
			mark.hide();
		} else {
			mark.setDescriptionText(problem);
			mark.show();
			mark.showHoverText(problem);
		}
		return problem;
	}

	private void take() {
		if (field.isDisposed() || problem() != null) {
			return;
		}
		Object value = EcoreUtil.createFromString(attribute.getEAttributeType(), field.getText().strip());
		EObject element = element();
		CanvasModel canvas = part.canvas();
		var shell = field.getShell();
		close();
		if (!value.equals(element.eGet(attribute))) {
			Messages.run(canvas.session(), DesignEdits.set("Change " + FeatureText.label(attribute), element, attribute,
					value), shell);
		}
	}

	private void close() {
		if (!field.isDisposed()) {
			Composite canvas = field.getParent();
			mark.dispose();
			field.dispose();
			canvas.setFocus();
		}
	}
}
