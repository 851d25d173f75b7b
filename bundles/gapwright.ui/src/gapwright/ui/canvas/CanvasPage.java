package gapwright.ui.canvas;

import java.util.ArrayList;
import java.util.List;

import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.draw2d.FigureCanvas;
import org.eclipse.draw2d.SWTGraphics;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.gef.DefaultEditDomain;
import org.eclipse.gef.EditPart;
import org.eclipse.gef.GraphicalViewer;
import org.eclipse.gef.Tool;
import org.eclipse.gef.editparts.FreeformGraphicalRootEditPart;
import org.eclipse.gef.tools.PanningSelectionTool;
import org.eclipse.gef.ui.actions.ActionRegistry;
import org.eclipse.gef.ui.parts.ScrollingGraphicalViewer;
import org.eclipse.jface.resource.JFaceResources;
import org.eclipse.jface.util.IPropertyChangeListener;
import org.eclipse.jface.viewers.ISelectionChangedListener;
import org.eclipse.jface.viewers.StructuredSelection;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Image;
import org.eclipse.swt.layout.FillLayout;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.ui.IEditorInput;
import org.eclipse.ui.IEditorSite;
import org.eclipse.ui.PlatformUI;
import org.eclipse.ui.part.EditorPart;
import org.eclipse.ui.views.contentoutline.IContentOutlinePage;

import gapwright.ui.canvas.paint.GraphicsPen;
import gapwright.ui.canvas.parts.CanvasPartFactory;
import gapwright.ui.fields.ThemeColours;
import gapwright.ui.session.DesignSession;
import gapwright.ui.session.SelectionHub;

/** The canvas: tools at the left, rulers along two sides, the page between them. It wires things up. */
public final class CanvasPage extends EditorPart {

	private final DesignSession session;
	private final ActionRegistry actions = new ActionRegistry();
	private final SelectionHub.Listener hubListener = this::reveal;
	private final IPropertyChangeListener themeListener = event -> repaintAll();
	private Image sheet;
	private GC gc;
	private CanvasModel canvas;
	private ScrollingGraphicalViewer viewer;
	private ZoomControl zoom;
	private ToolStrip tools;
	private boolean following;

	public CanvasPage(DesignSession session) {
		this.session = session;
	}

	@Override
	public void init(IEditorSite site, IEditorInput input) {
		setSite(site);
		setInput(input);
	}

	@Override
	public void createPartControl(Composite parent) {
		// a pen for measuring needs something to draw on that exists before the first paint
		sheet = new Image(parent.getDisplay(), 1, 1);
		gc = new GC(sheet);
		canvas = new CanvasModel(session, new GraphicsPen(new SWTGraphics(gc)));
		Composite area = new Composite(parent, SWT.NONE);
		GridLayout grid = new GridLayout(2, false);
		grid.marginWidth = 0;
		grid.marginHeight = 0;
		grid.horizontalSpacing = 0;
		area.setLayout(grid);
		viewer = new ScrollingGraphicalViewer();
		DefaultEditDomain domain = new DefaultEditDomain(this) {

			@Override
			public void setActiveTool(Tool tool) {
				super.setActiveTool(tool);
				if (tools != null) {
					tools.showActive(tool);
				}
			}
		};
		tools = new ToolStrip(area, domain, canvas);
		Composite page = new Composite(area, SWT.NONE);
		page.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
		RulerFrame frame = new RulerFrame(page, canvas);
		Composite middle = frame.middle();
		middle.setLayout(new FillLayout());
		viewer.createControl(middle);
		FigureCanvas control = (FigureCanvas) viewer.getControl();
		control.setScrollBarVisibility(FigureCanvas.AUTOMATIC);
		control.setBackground(ThemeColours.PAPER.get());
		viewer.setRootEditPart(new FreeformGraphicalRootEditPart());
		viewer.setEditPartFactory(new CanvasPartFactory(canvas));
		domain.setDefaultTool(new PanningSelectionTool());
		domain.addViewer(viewer);
		domain.loadDefaultTool();
		zoom = new ZoomControl(control, canvas);
		frame.follow(control);
		new CanvasActions(this, actions, canvas, zoom, viewer, tools).install();
		viewer.setContents(session.design());
		viewer.addSelectionChangedListener(selectionListener());
		session.selection().addListener(hubListener);
		JFaceResources.getColorRegistry().addListener(themeListener);
		getSite().setSelectionProvider(new CanvasSelection(viewer));
		PlatformUI.getWorkbench().getHelpSystem().setHelp(control, "gapwright.help.canvas");
		control.addListener(SWT.Resize, event -> zoom.resized());
	}

	private ISelectionChangedListener selectionListener() {
		return event -> {
			if (!following) {
				session.selection().select(selected(), this);
			}
		};
	}

	/** @return the elements selected on the canvas, the primary one last */
	public List<EObject> selected() {
		List<EObject> elements = new ArrayList<>();
		for (Object part : viewer.getSelectedEditParts()) {
			if (((EditPart) part).getModel() instanceof EObject element && element != session.design()) {
				elements.add(element);
			}
		}
		return elements;
	}

	/** Selects on the canvas what was selected elsewhere. */
	private void reveal(List<EObject> elements, Object source) {
		if (source == this) {
			return;
		}
		following = true;
		try {
			List<EditPart> parts = new ArrayList<>();
			for (EObject element : elements) {
				if (viewer.getEditPartRegistry().get(element) instanceof EditPart part) {
					parts.add(part);
				}
			}
			viewer.setSelection(new StructuredSelection(parts));
			if (!parts.isEmpty()) {
				viewer.reveal(parts.get(parts.size() - 1));
			}
		} finally {
			following = false;
		}
	}

	private void repaintAll() {
		if (viewer.getControl() != null && !viewer.getControl().isDisposed()) {
			viewer.getControl().setBackground(ThemeColours.PAPER.get());
			tools.redraw();
			canvas.changed();
		}
	}

	/** @return what the canvas shows */
	public CanvasModel canvas() {
		return canvas;
	}

	@Override
	public <T> T getAdapter(Class<T> type) {
		if (type == ActionRegistry.class) {
			return type.cast(actions);
		}
		if (type == GraphicalViewer.class) {
			return type.cast(viewer);
		}
		if (type == IContentOutlinePage.class) {
			return type.cast(new DesignOutline(canvas, viewer));
		}
		return super.getAdapter(type);
	}

	@Override
	public void setFocus() {
		viewer.getControl().setFocus();
	}

	@Override
	public void doSave(IProgressMonitor monitor) {
		// the editor around this page saves
	}

	@Override
	public void doSaveAs() {
		// the editor around this page saves
	}

	@Override
	public boolean isDirty() {
		return false;
	}

	@Override
	public boolean isSaveAsAllowed() {
		return false;
	}

	@Override
	public void dispose() {
		session.selection().removeListener(hubListener);
		JFaceResources.getColorRegistry().removeListener(themeListener);
		actions.dispose();
		if (canvas != null) {
			canvas.dispose();
			gc.dispose();
			sheet.dispose();
		}
		super.dispose();
	}
}
