package gapwright.ui.canvas;

import java.util.List;

import org.eclipse.draw2d.FigureCanvas;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.edit.provider.IStructuredItemContentProvider;
import org.eclipse.gef.ui.parts.ScrollingGraphicalViewer;
import org.eclipse.jface.viewers.ITreeContentProvider;
import org.eclipse.jface.viewers.LabelProvider;
import org.eclipse.jface.viewers.StructuredSelection;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.SashForm;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.ui.views.contentoutline.ContentOutlinePage;

import gapwright.model.Element;
import gapwright.ui.fields.FeatureText;
import gapwright.ui.session.DesignSession;
import gapwright.ui.session.SelectionHub;

/** The design as a tree, and below it the whole page in small. */
final class DesignOutline extends ContentOutlinePage {

	private final DesignSession session;
	private final CanvasModel canvas;
	private final ScrollingGraphicalViewer viewer;
	/** A drag makes a step for each move of the mouse; the tree, which shows no figures, is read anew once they cease, ms. */
	private static final int REST = 150;

	private final Runnable historyListener = this::refreshLater;
	private final Runnable refresher = this::refreshNow;
	private final SelectionHub.Listener hubListener = this::reveal;
	private SashForm sash;
	private boolean following;
	private boolean outdated;

	DesignOutline(CanvasModel canvas, ScrollingGraphicalViewer viewer) {
		this.canvas = canvas;
		session = canvas.session();
		this.viewer = viewer;
	}

	@Override
	public void createControl(Composite parent) {
		sash = new SashForm(parent, SWT.VERTICAL);
		super.createControl(sash);
		getTreeViewer().setContentProvider(new Tree());
		getTreeViewer().setLabelProvider(new LabelProvider() {

			@Override
			public String getText(Object element) {
				return label((EObject) element);
			}
		});
		getTreeViewer().setInput(session.design());
		getTreeViewer().expandToLevel(2);
		getTreeViewer().addSelectionChangedListener(event -> {
			if (!following) {
				List<EObject> chosen = event.getStructuredSelection().toList();
				session.selection().select(chosen, this);
			}
		});
		new Thumbnail(sash, canvas, (FigureCanvas) viewer.getControl());
		sash.setWeights(new int[] { 62, 38 });
		session.history().addListener(historyListener);
		session.selection().addListener(hubListener);
	}

	private static String label(EObject element) {
		String kind = FeatureText.kind(element.eClass());
		String name = element instanceof Element ? FeatureText.name(element) : "";
		return name.isEmpty() ? kind : kind + "  " + name;
	}

	private void refreshLater() {
		if (getControl() != null && !getControl().isDisposed()) {
			outdated = true;
			getControl().getDisplay().timerExec(REST, refresher);
		}
	}

	private void refreshNow() {
		if (outdated && getControl() != null && !getControl().isDisposed()) {
			outdated = false;
			getTreeViewer().refresh();
		}
	}

	private void reveal(List<EObject> elements, Object source) {
		if (source != this && getControl() != null && !getControl().isDisposed()) {
			// what is to be shown may have come with a step not shown yet
			refreshNow();
			following = true;
			try {
				getTreeViewer().setSelection(new StructuredSelection(elements), true);
			} finally {
				following = false;
			}
		}
	}

	@Override
	public Control getControl() {
		return sash;
	}

	@Override
	public void setFocus() {
		getTreeViewer().getControl().setFocus();
	}

	@Override
	public void dispose() {
		session.history().removeListener(historyListener);
		session.selection().removeListener(hubListener);
		super.dispose();
	}

	/** Children as the model's item providers give them, elements only. */
	private final class Tree implements ITreeContentProvider {

		@Override
		public Object[] getElements(Object input) {
			return getChildren(input);
		}

		@Override
		public Object[] getChildren(Object parent) {
			Object adapter = session.history().domain().getAdapterFactory().adapt(parent,
					IStructuredItemContentProvider.class);
			return adapter instanceof IStructuredItemContentProvider provider
					? provider.getElements(parent).stream().filter(Element.class::isInstance).toArray()
					: new Object[0];
		}

		@Override
		public Object getParent(Object element) {
			return ((EObject) element).eContainer();
		}

		@Override
		public boolean hasChildren(Object element) {
			return getChildren(element).length > 0;
		}
	}
}
