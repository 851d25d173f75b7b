package gapwright.ui.canvas;

import java.util.EnumMap;
import java.util.Map;
import java.util.function.Supplier;

import org.eclipse.gef.EditDomain;
import org.eclipse.gef.Tool;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Image;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.ToolBar;
import org.eclipse.swt.widgets.ToolItem;

import gapwright.ui.canvas.tools.BetweenTool;
import gapwright.ui.canvas.tools.JointTool;
import gapwright.ui.canvas.tools.OnLegTool;

/** The tools beside the page; in the theme's own colours, unlike a palette that knows only light ones. */
final class ToolStrip {

	/** The tools, with the key that chooses each. */
	enum Kind {
		SELECT("Select", 's', "Select, move and change what is drawn"),
		JOINT("Joint", 'j', "Click to add a joint"),
		LEG("Leg", 'l', "Drag from joint to joint, or click at both ends"),
		GAP("Gap", 'g', "Click on a leg to cut a gap"),
		MAGNET("Magnet", 'm', "Click on a leg to put a magnet across it"),
		COIL("Coil", 'c', "Click on a leg to wind a coil; a selected winding gets it"),
		AIR_PATH("Air path", 'a', "Drag from joint to joint");

		final String title;
		final char key;
		final String hint;

		Kind(String title, char key, String hint) {
			this.title = title;
			this.key = key;
			this.hint = hint;
		}
	}

	private final EditDomain domain;
	private final ToolBar bar;
	private final Map<Kind, ToolItem> items = new EnumMap<>(Kind.class);
	private final Map<Kind, Supplier<Tool>> makers = new EnumMap<>(Kind.class);
	private Tool chosen;
	private Kind chosenKind = Kind.SELECT;

	ToolStrip(Composite parent, EditDomain domain, CanvasModel canvas) {
		this.domain = domain;
		makers.put(Kind.SELECT, domain::getDefaultTool);
		makers.put(Kind.JOINT, () -> new JointTool(canvas));
		makers.put(Kind.LEG, () -> new BetweenTool(canvas, false));
		makers.put(Kind.GAP, () -> new OnLegTool(canvas, Additions.Kind.GAP));
		makers.put(Kind.MAGNET, () -> new OnLegTool(canvas, Additions.Kind.MAGNET));
		makers.put(Kind.COIL, () -> new OnLegTool(canvas, Additions.Kind.COIL));
		makers.put(Kind.AIR_PATH, () -> new BetweenTool(canvas, true));
		bar = new ToolBar(parent, SWT.VERTICAL | SWT.FLAT | SWT.RIGHT);
		bar.setLayoutData(new GridData(SWT.BEGINNING, SWT.FILL, false, true));
		for (Kind kind : Kind.values()) {
			ToolItem item = new ToolItem(bar, SWT.RADIO);
			item.setText(kind.title);
			item.setToolTipText(kind.hint + "  (" + Character.toUpperCase(kind.key) + ")");
			item.setImage(ToolIcons.image(bar.getDisplay(), kind));
			item.addListener(SWT.Selection, event -> {
				if (item.getSelection()) {
					choose(kind);
				}
			});
			items.put(kind, item);
		}
		bar.addListener(SWT.Dispose, event -> items.values().forEach(item -> disposeImage(item.getImage())));
	}

	private static void disposeImage(Image image) {
		if (image != null) {
			image.dispose();
		}
	}

	void choose(Kind kind) {
		chosen = makers.get(kind).get();
		chosenKind = kind;
		domain.setActiveTool(chosen);
	}

	/** Follows the domain, which goes back to selecting by itself. */
	void showActive(Tool tool) {
		Kind active = tool == chosen ? chosenKind : Kind.SELECT;
		items.forEach((kind, item) -> item.setSelection(kind == active));
	}

	/** The theme has changed. */
	void redraw() {
		items.forEach((kind, item) -> {
			Image old = item.getImage();
			item.setImage(ToolIcons.image(bar.getDisplay(), kind));
			disposeImage(old);
		});
	}
}
