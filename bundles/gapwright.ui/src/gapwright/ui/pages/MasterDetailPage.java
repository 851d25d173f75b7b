package gapwright.ui.pages;

import java.util.List;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.SashForm;
import org.eclipse.swt.custom.ScrolledComposite;
import org.eclipse.swt.custom.StackLayout;
import org.eclipse.swt.layout.FillLayout;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;

import gapwright.model.Design;
import gapwright.model.edit.history.Edit;
import gapwright.ui.fields.EditRunner;
import gapwright.ui.fields.FormLayouts;
import gapwright.ui.fields.Headings;
import gapwright.ui.session.DesignSession;

/**
 * A page of the editor with the elements of one kind on the left and the chosen one's fields on the right. Everything
 * goes through the design's one history; whatever changes elsewhere shows here after each of its steps.
 */
public abstract class MasterDetailPage extends Composite {

	private final DesignSession session;
	private final MasterList list;
	private final ScrolledComposite scrolled;
	private final Composite details;
	private final Composite emptiness;
	private final Runnable refresher = this::refreshLater;
	private Runnable onChoose = () -> { };
	private EObject told;
	private boolean pending;
	/** A step has come while the page was hidden; laying out its fields at each would cost a fifth of a drag. */
	private boolean outdated;

	MasterDetailPage(Composite parent, DesignSession session, String title, String whenEmpty) {
		super(parent, SWT.NONE);
		this.session = session;
		setLayout(new FillLayout());
		SashForm sash = new SashForm(this, SWT.HORIZONTAL);
		// both sides scroll, because what does not has another background in either theme
		ScrolledComposite left = scrolled(sash);
		list = new MasterList(left, title, this::label, this::chosen);
		left.setContent(list.control());
		scrolled = scrolled(sash);
		Composite stack = new Composite(scrolled, SWT.NONE);
		stack.setLayout(new StackLayout());
		details = new Composite(stack, SWT.NONE);
		GridLayout grid = new GridLayout(1, false);
		grid.marginWidth = 14;
		grid.marginHeight = 8;
		details.setLayout(grid);
		emptiness = new Composite(stack, SWT.NONE);
		emptiness.setLayout(new GridLayout());
		Headings.note(emptiness, whenEmpty, 1);
		scrolled.setContent(stack);
		scrolled.addListener(SWT.Resize, event -> FormLayouts.relayout(stack));
		sash.setWeights(28, 72);
		session.history().addListener(refresher);
		addListener(SWT.Show, event -> {
			if (outdated) {
				refresh();
			}
		});
		// shown again together with the whole editor, a page gets no other word of it than that it is to be painted
		addListener(SWT.Paint, event -> {
			if (outdated) {
				outdated = false;
				refreshLater();
			}
		});
		addListener(SWT.Dispose, event -> session.history().removeListener(refresher));
	}

	private static ScrolledComposite scrolled(Composite parent) {
		ScrolledComposite scrolled = new ScrolledComposite(parent, SWT.V_SCROLL | SWT.H_SCROLL);
		scrolled.setExpandHorizontal(true);
		scrolled.setExpandVertical(true);
		// a field that Tab comes to scrolls into sight
		scrolled.setShowFocusedControl(true);
		return scrolled;
	}

	/** Builds the fields; called once by the constructor of the page. */
	final void start() {
		createButtons(list);
		createDetails(details);
		refresh();
	}

	abstract List<? extends EObject> elements(Design design);

	abstract String label(EObject element);

	abstract void createButtons(MasterList into);

	abstract void createDetails(Composite into);

	/** Shows an element, or what has changed of it; never null. */
	abstract void showDetails(EObject element);

	/** Chooses the element, or the one it belongs to. */
	public final void reveal(EObject element) {
		// the element may have come with a step that this page has not shown yet
		refresh();
		List<? extends EObject> all = elements(session.design());
		for (EObject next = element; next != null; next = next.eContainer()) {
			if (all.contains(next)) {
				list.choose(next);
				return;
			}
		}
	}

	@Override
	public final boolean setFocus() {
		return list.table().setFocus();
	}

	final DesignSession session() {
		return session;
	}

	/** The element shown on the right; null when there is none. */
	public final EObject chosen() {
		return list.chosen();
	}

	/** @param listener called when another element is chosen */
	public final void onChoose(Runnable listener) {
		onChoose = listener;
	}

	/** For fields, which show a refusal beside themselves. */
	final EditRunner runner() {
		return EditRunner.on(session.history());
	}

	/** For buttons, which have nowhere to show a refusal. */
	final void run(Edit edit) {
		String refusal = runner().run(edit);
		if (refusal != null) {
			MessageDialog.openError(getShell(), edit.label(), refusal);
		}
		refresh();
	}

	/** As {@link #run}, and chooses the element that has come, if one has. */
	final void add(Edit edit) {
		List<? extends EObject> before = List.copyOf(elements(session.design()));
		run(edit);
		elements(session.design()).stream().filter(element -> !before.contains(element)).findFirst().ifPresent(list::choose);
	}

	private void chosen(EObject element) {
		StackLayout layout = (StackLayout) emptiness.getParent().getLayout();
		Composite top = element == null ? emptiness : details;
		if (element != null) {
			showDetails(element);
		}
		if (layout.topControl != top) {
			layout.topControl = top;
			FormLayouts.relayout(emptiness.getParent());
		}
		if (told != element) {
			told = element;
			onChoose.run();
		}
	}

	final void refresh() {
		outdated = false;
		list.show(elements(session.design()));
	}

	/** Once after a burst of steps: a drag on the canvas makes one for each move of the mouse. */
	private void refreshLater() {
		if (!pending) {
			pending = true;
			getDisplay().asyncExec(() -> {
				pending = false;
				if (!isDisposed()) {
					outdated = !isVisible();
					if (!outdated) {
						refresh();
					}
				}
			});
		}
	}
}
