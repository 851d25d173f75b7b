package gapwright.ui.views;

import java.util.List;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.jface.action.Action;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.StackLayout;
import org.eclipse.swt.layout.FillLayout;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;
import org.eclipse.ui.ISharedImages;
import org.eclipse.ui.PlatformUI;
import org.eclipse.ui.actions.ActionFactory;
import org.eclipse.ui.part.ViewPart;
import org.eclipse.ui.views.properties.IPropertySheetPage;
import org.eclipse.ui.views.properties.tabbed.ITabbedPropertySheetPageContributor;
import org.eclipse.ui.views.properties.tabbed.TabbedPropertySheetPage;

import gapwright.ui.editor.DesignEditor;
import gapwright.ui.editor.HistoryAction;
import gapwright.ui.fields.FeatureText;
import gapwright.ui.session.DesignSession;
import gapwright.ui.session.SelectionHub;
import gapwright.ui.session.SessionListener;

/**
 * A view about the design in the editor in front, at its chosen operating point. Where there is nothing to show it
 * says why; figures of an earlier state are never left standing.
 */
abstract class DesignView extends ViewPart implements ITabbedPropertySheetPageContributor {

	private final SessionListener sessionListener = this::refresh;
	private final SelectionHub.Listener hubListener = this::selectedElsewhere;
	private final Runnable bandListener = this::bandsCame;
	private EditorFollower follower;
	private DesignSession session;
	private Composite stack;
	private Composite content;
	private Label heading;
	private Label message;
	private PublishedSelection published;

	/** What the view shows, for its explanations: "the legs". */
	abstract String subject();

	abstract void createContent(Composite parent);

	/** Shows the result of {@link DesignSession#pointResult()}, which is there. */
	abstract void showResult(DesignSession shown);

	/** Shows the bands of {@link DesignSession#pointBands()} beside the result, in views that have a place for them. */
	void showBands(DesignSession shown) {
		// most views have none
	}

	/** Drops everything shown. */
	abstract void clear();

	abstract void copy(boolean all);

	/** Selects what was selected on the canvas. */
	abstract void select(List<EObject> elements);

	@Override
	public final void createPartControl(Composite parent) {
		parent.setLayout(new FillLayout());
		stack = new Composite(parent, SWT.NONE);
		stack.setLayout(new StackLayout());
		message = new Label(stack, SWT.WRAP);
		content = new Composite(stack, SWT.NONE);
		GridLayout grid = new GridLayout();
		grid.marginWidth = 0;
		grid.marginHeight = 0;
		content.setLayout(grid);
		heading = new Label(content, SWT.NONE);
		GridData wide = new GridData(SWT.FILL, SWT.TOP, true, false);
		wide.horizontalIndent = 6;
		heading.setLayoutData(wide);
		createContent(content);
		createActions();
		published = new PublishedSelection();
		getSite().setSelectionProvider(published);
		follower = new EditorFollower(getSite().getPage(), this::follow);
		follower.update();
		refresh();
	}

	private void createActions() {
		Action copy = action("Copy", "Copy the selected rows, or all when none is selected, for a spreadsheet", () -> copy(false));
		copy.setActionDefinitionId(ActionFactory.COPY.getCommandId());
		copy.setImageDescriptor(PlatformUI.getWorkbench().getSharedImages().getImageDescriptor(ISharedImages.IMG_TOOL_COPY));
		Action all = action("Copy all rows", "Copy every row for a spreadsheet", () -> copy(true));
		getViewSite().getActionBars().setGlobalActionHandler(ActionFactory.COPY.getId(), copy);
		getViewSite().getActionBars().getToolBarManager().add(copy);
		getViewSite().getActionBars().getMenuManager().add(copy);
		getViewSite().getActionBars().getMenuManager().add(all);
	}

	private static Action action(String text, String tip, Runnable run) {
		Action action = new Action(text) {
			@Override
			public void run() {
				run.run();
			}
		};
		action.setToolTipText(tip);
		return action;
	}

	private void follow(DesignSession next) {
		if (next == session) {
			return;
		}
		unfollow();
		session = next;
		if (session != null) {
			session.addListener(sessionListener);
			session.addBandListener(bandListener);
			session.selection().addListener(hubListener);
		}
		HistoryAction.install(getViewSite().getActionBars(), session == null ? null : session.history());
		clear();
		refresh();
	}

	private void unfollow() {
		if (session != null) {
			session.removeListener(sessionListener);
			session.removeBandListener(bandListener);
			session.selection().removeListener(hubListener);
		}
	}

	private void bandsCame() {
		if (!stack.isDisposed() && session.trouble().isEmpty()) {
			showBands(session);
		}
	}

	private void refresh() {
		if (stack == null || stack.isDisposed()) {
			return;
		}
		String trouble = session == null ? "Open a Gapwright design to see " + subject() + " here." : session.trouble();
		if (trouble.isEmpty()) {
			showResult(session);
			title();
			select(session.selection().selected());
		} else {
			clear();
			message.setText("\n   " + trouble.replace("\n", "\n   "));
		}
		StackLayout layout = (StackLayout) stack.getLayout();
		if (layout.topControl != (trouble.isEmpty() ? content : message)) {
			layout.topControl = trouble.isEmpty() ? content : message;
			stack.layout();
		}
	}

	/** The heading: what is shown, and what is not. */
	final void title() {
		String name = session.design().getName();
		String text = (name == null || name.isBlank() ? "Design without a name" : name) + "  ·  " + FeatureText.name(session.operatingPoint())
				+ "  ·  " + session.operatingPoint().getTemperature() + note();
		if (!text.equals(heading.getText())) {
			heading.setText(text);
		}
	}

	/** What the table leaves out; empty when nothing. */
	abstract String note();

	/** Rows were selected here: the canvas and the Properties view follow. */
	final void publish(List<? extends EObject> elements) {
		if (session != null) {
			session.selection().select(elements, this);
			published.publish(elements);
		}
	}

	private void selectedElsewhere(List<EObject> elements, Object source) {
		if (source != this && !stack.isDisposed()) {
			select(elements);
		}
	}

	@Override
	public <T> T getAdapter(Class<T> type) {
		if (type == DesignSession.class) {
			return type.cast(session);
		}
		if (type == IPropertySheetPage.class) {
			return type.cast(new TabbedPropertySheetPage(this));
		}
		return super.getAdapter(type);
	}

	@Override
	public final String getContributorId() {
		return DesignEditor.ID;
	}

	@Override
	public void dispose() {
		if (follower != null) {
			follower.dispose();
		}
		unfollow();
		super.dispose();
	}
}
