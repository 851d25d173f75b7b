package gapwright.ui.canvas;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;

import org.eclipse.draw2d.FigureCanvas;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.gef.EditPart;
import org.eclipse.gef.KeyHandler;
import org.eclipse.gef.KeyStroke;
import org.eclipse.gef.ui.actions.ActionRegistry;
import org.eclipse.gef.ui.parts.GraphicalViewerKeyHandler;
import org.eclipse.gef.ui.parts.ScrollingGraphicalViewer;
import org.eclipse.jface.action.Action;
import org.eclipse.jface.action.IAction;
import org.eclipse.jface.action.IMenuManager;
import org.eclipse.jface.action.MenuManager;
import org.eclipse.jface.action.Separator;
import org.eclipse.swt.SWT;
import org.eclipse.swt.dnd.Clipboard;
import org.eclipse.swt.dnd.TextTransfer;
import org.eclipse.swt.dnd.Transfer;
import org.eclipse.ui.actions.ActionFactory;

import gapwright.model.Coil;
import gapwright.model.Design;
import gapwright.model.GapwrightPackage.Literals;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.Magnet;
import gapwright.model.edit.DesignEdits;
import gapwright.model.edit.JointEdits;
import gapwright.model.edit.JointSpot;
import gapwright.model.edit.LegEdits;
import gapwright.model.edit.Snippet;
import gapwright.model.edit.history.Edit;
import gapwright.model.edit.history.EditHistory;
import gapwright.ui.canvas.export.PictureExport;
import gapwright.ui.canvas.parts.ElementPart;
import gapwright.ui.session.DesignSession;

/** Everything that can be done on the canvas without the mouse: menu, keys, and what the workbench's Edit menu does. */
final class CanvasActions {

	/** A pasted part lies this far from what was copied, mm. */
	private static final double PASTE_SHIFT = 5;

	private final CanvasPage page;
	private final ActionRegistry registry;
	private final CanvasModel canvas;
	private final ZoomControl zoom;
	private final ScrollingGraphicalViewer viewer;
	private final ToolStrip tools;
	private final KeyHandler keys = new KeyHandler();
	private final MenuManager menu = new MenuManager();

	CanvasActions(CanvasPage page, ActionRegistry registry, CanvasModel canvas, ZoomControl zoom,
			ScrollingGraphicalViewer viewer, ToolStrip tools) {
		this.page = page;
		this.registry = registry;
		this.canvas = canvas;
		this.zoom = zoom;
		this.viewer = viewer;
		this.tools = tools;
	}

	void install() {
		workbenchActions();
		menu.setRemoveAllWhenShown(true);
		menu.addMenuListener(this::fill);
		viewer.setContextMenu(menu);
		bindKeys();
		// ours come first: the viewer's own would take arrows with Control
		keys.setParent(new GraphicalViewerKeyHandler(viewer));
		viewer.setKeyHandler(keys);
	}

	private void workbenchActions() {
		register(ActionFactory.DELETE.getId(), "Delete", this::delete);
		register(ActionFactory.COPY.getId(), "Copy", this::copy);
		register(ActionFactory.CUT.getId(), "Cut", () -> {
			if (copy()) {
				delete();
			}
		});
		register(ActionFactory.PASTE.getId(), "Paste", this::paste);
		register(ActionFactory.SELECT_ALL.getId(), "Select all", this::selectAll);
		register(ActionFactory.PRINT.getId(), "Print…", () -> PictureExport.print(canvas, viewer.getControl().getShell()));
	}

	private IAction register(String id, String text, Runnable deed) {
		IAction action = action(text, deed);
		action.setId(id);
		registry.registerAction(action);
		return action;
	}

	private static IAction action(String text, Runnable deed) {
		return new Action(text) {

			@Override
			public void run() {
				deed.run();
			}
		};
	}

	private static IAction history(String verb, String step, boolean possible, Runnable deed) {
		IAction action = action(possible ? verb + ' ' + step : verb, deed);
		action.setEnabled(possible);
		return action;
	}

	private void fill(IMenuManager into) {
		EditHistory history = session().history();
		into.add(history("Undo", history.undoLabel(), history.canUndo(), history::undo));
		into.add(history("Redo", history.redoLabel(), history.canRedo(), history::redo));
		into.add(new Separator());
		List<EObject> selected = page.selected();
		EObject last = selected.isEmpty() ? null : selected.get(selected.size() - 1);
		if (last != null) {
			into.add(action("Edit value\tF2", this::editValue));
		}
		if (last instanceof Leg) {
			into.add(action("Add gap\tShift+G", () -> addOnLegs(Additions.Kind.GAP)));
			into.add(action("Add magnet\tShift+M", () -> addOnLegs(Additions.Kind.MAGNET)));
			into.add(action("Add coil\tShift+C", () -> addOnLegs(Additions.Kind.COIL)));
		}
		if (last instanceof Coil || last instanceof Magnet || last instanceof Leg) {
			into.add(action("Reverse\tR", this::reverse));
		}
		if (joints().size() == 2) {
			into.add(action("Add leg between\tShift+L", () -> between(false)));
			into.add(action("Add air path between\tShift+A", () -> between(true)));
		}
		if (joints().size() > 1) {
			into.add(action("Align vertically\tV", () -> align(true)));
			into.add(action("Align horizontally\tH", () -> align(false)));
		}
		into.add(action("Add leakage across windows…\tShift+W", this::leakage));
		into.add(new Separator());
		for (ActionFactory factory : new ActionFactory[] { ActionFactory.CUT, ActionFactory.COPY, ActionFactory.PASTE,
				ActionFactory.DELETE, ActionFactory.SELECT_ALL }) {
			into.add(registry.getAction(factory.getId()));
		}
		into.add(new Separator());
		into.add(action("Fit\t0", zoom::fit));
		into.add(action("Zoom in\t+", zoom::in));
		into.add(action("Zoom out\t-", zoom::out));
		into.add(action("100 %\t1", () -> zoom.to(1)));
		into.add(new Separator());
		into.add(action("Save picture as…\tP", () -> PictureExport.save(canvas, viewer.getControl().getShell())));
		into.add(registry.getAction(ActionFactory.PRINT.getId()));
	}

	private void bindKeys() {
		key(SWT.DEL, 0x7f, 0, this::delete);
		key(SWT.F2, 0, 0, this::editValue);
		for (ToolStrip.Kind kind : ToolStrip.Kind.values()) {
			character(kind.key, 0, () -> tools.choose(kind));
		}
		character('j', SWT.SHIFT, this::addJointInMiddle);
		character('l', SWT.SHIFT, () -> between(false));
		character('a', SWT.SHIFT, () -> between(true));
		character('g', SWT.SHIFT, () -> addOnLegs(Additions.Kind.GAP));
		character('m', SWT.SHIFT, () -> addOnLegs(Additions.Kind.MAGNET));
		character('c', SWT.SHIFT, () -> addOnLegs(Additions.Kind.COIL));
		character('w', SWT.SHIFT, this::leakage);
		character('r', 0, this::reverse);
		character('v', 0, () -> align(true));
		character('h', 0, () -> align(false));
		character('p', 0, () -> PictureExport.save(canvas, viewer.getControl().getShell()));
		character('0', 0, zoom::fit);
		character('1', 0, () -> zoom.to(1));
		for (int mask : new int[] { 0, SWT.SHIFT, SWT.MOD1, SWT.MOD1 | SWT.SHIFT }) {
			character('+', mask, zoom::in);
			character('=', mask, zoom::in);
			character('-', mask, zoom::out);
			key(SWT.KEYPAD_ADD, '+', mask, zoom::in);
			key(SWT.KEYPAD_SUBTRACT, '-', mask, zoom::out);
		}
		nudge(SWT.ARROW_LEFT, -1, 0);
		nudge(SWT.ARROW_RIGHT, 1, 0);
		nudge(SWT.ARROW_UP, 0, -1);
		nudge(SWT.ARROW_DOWN, 0, 1);
	}

	private void key(int code, int character, int mask, Runnable deed) {
		keys.put(KeyStroke.getPressed((char) character, code, mask), action("", deed));
		keys.put(KeyStroke.getPressed(code, mask), action("", deed));
	}

	private void character(char letter, int mask, Runnable deed) {
		char typed = (mask & SWT.SHIFT) != 0 ? Character.toUpperCase(letter) : letter;
		keys.put(KeyStroke.getPressed(typed, letter, mask), action("", deed));
	}

	/** Control and an arrow move what is selected by one step of the grid. */
	private void nudge(int arrow, int dx, int dy) {
		key(arrow, 0, SWT.MOD1, () -> {
			Set<Joint> joints = JointEdits.movedBy(page.selected());
			if (!joints.isEmpty()) {
				double step = Snapping.step(canvas.scale());
				run(JointEdits.move(joints, dx * step, dy * step));
			}
		});
	}

	private DesignSession session() {
		return canvas.session();
	}

	private Design design() {
		return session().design();
	}

	private boolean run(Edit edit) {
		return Messages.run(session(), edit, viewer.getControl().getShell());
	}

	private void select(List<? extends EObject> elements) {
		viewer.deselectAll();
		for (EObject element : elements) {
			if (viewer.getEditPartRegistry().get(element) instanceof EditPart part) {
				viewer.appendSelection(part);
			}
		}
	}

	private void delete() {
		List<EObject> selected = page.selected();
		if (!selected.isEmpty()) {
			viewer.deselectAll();
			run(DesignEdits.delete(selected));
		}
	}

	private boolean copy() {
		String text = Snippet.copy(page.selected());
		if (text.isEmpty()) {
			return false;
		}
		Clipboard clipboard = new Clipboard(viewer.getControl().getDisplay());
		clipboard.setContents(new Object[] { text }, new Transfer[] { TextTransfer.getInstance() });
		clipboard.dispose();
		return true;
	}

	private void paste() {
		Clipboard clipboard = new Clipboard(viewer.getControl().getDisplay());
		Object text = clipboard.getContents(TextTransfer.getInstance());
		clipboard.dispose();
		if (text instanceof String snippet && Snippet.isSnippet(snippet)) {
			List<EObject> pasted = new ArrayList<>();
			run(Snippet.paste(design(), snippet, PASTE_SHIFT, PASTE_SHIFT, pasted::addAll));
			select(pasted);
		}
	}

	private void selectAll() {
		List<EObject> all = new ArrayList<>();
		canvas.picture().elements().forEach(all::add);
		select(all);
	}

	private void editValue() {
		Object focus = viewer.getFocusEditPart();
		if (focus instanceof ElementPart part) {
			QuickEntry.open(part);
		}
	}

	private void addOnLegs(Additions.Kind kind) {
		List<EObject> added = new ArrayList<>();
		List<Edit> edits = new ArrayList<>();
		for (EObject element : page.selected()) {
			if (element instanceof Leg leg) {
				edits.add(Additions.onLeg(kind, session(), leg, 0.5, added::add));
			}
		}
		if (!edits.isEmpty() && run(Edit.all(edits.get(0).label(), edits))) {
			select(added);
		}
	}

	private void addJointInMiddle() {
		var view = viewer.getControl().getBounds();
		var location = ((FigureCanvas) viewer.getControl()).getViewport().getViewLocation();
		double[] place = Snapping.snap(canvas.scale().millimetres(location.x + view.width / 2),
				canvas.scale().millimetres(location.y + view.height / 2), design(), canvas.scale(), List.of(), false);
		List<EObject> added = new ArrayList<>();
		run(JointEdits.add(design(), place[0], place[1], added::add));
		select(added);
	}

	private List<Joint> joints() {
		return page.selected().stream().filter(Joint.class::isInstance).map(Joint.class::cast).toList();
	}

	private void between(boolean air) {
		List<Joint> joints = joints();
		if (joints.size() == 2) {
			JointSpot from = JointSpot.of(joints.get(0));
			JointSpot to = JointSpot.of(joints.get(1));
			List<EObject> added = new ArrayList<>();
			run(air ? LegEdits.addAirPath(design(), from, to, added::add)
					: LegEdits.add(design(), from, to, added::add));
			select(added);
		}
	}

	private void leakage() {
		Edit edit = LeakageDrawing.ask(design(), page.selected(), viewer.getControl().getShell());
		if (edit != null) {
			viewer.deselectAll();
			run(edit);
		}
	}

	private void align(boolean vertical) {
		List<Joint> joints = List.copyOf(JointEdits.movedBy(page.selected()));
		if (joints.size() > 1) {
			run(JointEdits.align(joints, vertical));
		}
	}

	/** Turns the sense of coils and magnets, and the direction in which a leg counts flux. */
	private void reverse() {
		List<Edit> edits = new ArrayList<>();
		for (EObject element : page.selected()) {
			if (element instanceof Coil coil) {
				edits.add(DesignEdits.set("Reverse", coil, Literals.COIL__REVERSED, !coil.isReversed()));
			} else if (element instanceof Magnet magnet) {
				edits.add(DesignEdits.set("Reverse", magnet, Literals.MAGNET__REVERSED, !magnet.isReversed()));
			} else if (element instanceof Leg leg) {
				Joint from = leg.getFrom();
				edits.add(DesignEdits.set("Reverse", leg, Literals.LEG__FROM, leg.getTo()));
				edits.add(DesignEdits.set("Reverse", leg, Literals.LEG__TO, from));
			}
		}
		if (!edits.isEmpty()) {
			run(Edit.all("Reverse", edits));
		}
	}
}
