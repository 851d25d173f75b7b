package gapwright.ui.pages;

import static gapwright.model.GapwrightPackage.Literals.CONNECTED_WINDING__REVERSED;
import static gapwright.model.GapwrightPackage.Literals.CONNECTED_WINDING__WINDING;
import static gapwright.model.GapwrightPackage.Literals.ELEMENT__ID;
import static gapwright.model.GapwrightPackage.Literals.ELEMENT__NAME;
import static gapwright.model.GapwrightPackage.Literals.WINDING_CONNECTION__KIND;
import static gapwright.model.GapwrightPackage.Literals.WINDING_LEAKAGE__ARRANGEMENT;
import static gapwright.model.GapwrightPackage.Literals.WINDING_LEAKAGE__FIRST;
import static gapwright.model.GapwrightPackage.Literals.WINDING_LEAKAGE__FIRST_BUILD;
import static gapwright.model.GapwrightPackage.Literals.WINDING_LEAKAGE__HEIGHT;
import static gapwright.model.GapwrightPackage.Literals.WINDING_LEAKAGE__INTERFACES;
import static gapwright.model.GapwrightPackage.Literals.WINDING_LEAKAGE__MEAN_TURN;
import static gapwright.model.GapwrightPackage.Literals.WINDING_LEAKAGE__SECOND;
import static gapwright.model.GapwrightPackage.Literals.WINDING_LEAKAGE__SECOND_BUILD;
import static gapwright.model.GapwrightPackage.Literals.WINDING_LEAKAGE__SEPARATION;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.ui.PlatformUI;

import gapwright.model.ConnectionKind;
import gapwright.model.Design;
import gapwright.model.Winding;
import gapwright.model.WindingConnection;
import gapwright.model.WindingLeakage;
import gapwright.model.edit.DesignEdits;
import gapwright.model.edit.PairEdits;
import gapwright.ui.fields.ElementRows;
import gapwright.ui.fields.FeatureForm;
import gapwright.ui.fields.FeatureText;
import gapwright.ui.fields.FormLayouts;
import gapwright.ui.fields.Headings;
import gapwright.ui.session.DesignSession;

/** What couples windings to one another: leakages between two of them, and connections of several, with their figures. */
public final class CouplingsPage extends MasterDetailPage {

	private FeatureForm leakage;
	private FeatureForm connection;
	private ElementRows members;
	private Composite connectionArea;
	private FiguresPart figures;

	public CouplingsPage(Composite parent, DesignSession session) {
		super(parent, session, "Couplings", "Add a leakage between two windings round one leg, from their builds, or a connection of windings in "
				+ "series or in parallel. Leakage across a window, between windings on different legs, is added on the canvas with Shift+W.");
		PlatformUI.getWorkbench().getHelpSystem().setHelp(this, "gapwright.help.couplingsPage");
		start();
	}

	@Override
	List<? extends EObject> elements(Design design) {
		List<EObject> all = new ArrayList<>(design.getLeakages());
		all.addAll(design.getConnections());
		return all;
	}

	@Override
	String label(EObject element) {
		return FeatureText.name(element) + "   " + (element instanceof WindingLeakage ? "leakage"
				: ((WindingConnection) element).getKind() == ConnectionKind.SERIES ? "in series" : "in parallel");
	}

	@Override
	void createButtons(MasterList into) {
		into.button("Add leakage", "Add a leakage between the first two windings, to be changed",
				() -> withTwo(windings -> add(PairEdits.addLeakage(session().design(), windings.get(0), windings.get(1)))));
		into.button("Connect", "Join the first two windings in series, to be changed",
				() -> withTwo(windings -> add(PairEdits.addConnection(session().design(), ConnectionKind.SERIES, windings.subList(0, 2)))));
		into.button("Remove", "Remove the chosen leakage or connection; its windings stay", () -> remove(chosen()));
	}

	private void withTwo(Consumer<List<Winding>> deed) {
		List<Winding> windings = session().design().getWindings();
		if (windings.size() < 2) {
			MessageDialog.openInformation(getShell(), "Couplings", "It takes two windings. This design has "
					+ (windings.isEmpty() ? "none" : "one") + ": add windings on the Windings page first.");
		} else {
			deed.accept(windings);
		}
	}

	private void remove(EObject element) {
		if (element != null) {
			run(DesignEdits.delete(List.of(element)));
		}
	}

	@Override
	void createDetails(Composite into) {
		leakage = new FeatureForm(Headings.part(into, "Leakage", "By the energy of the field between two windings round one leg, all "
				+ "ampere-turns of one balanced by the other. Sizes run from one winding to the other, whichever way they lie."), runner())
				.add(ELEMENT__NAME, ELEMENT__ID, WINDING_LEAKAGE__FIRST, WINDING_LEAKAGE__SECOND, WINDING_LEAKAGE__ARRANGEMENT,
						WINDING_LEAKAGE__FIRST_BUILD, WINDING_LEAKAGE__SECOND_BUILD, WINDING_LEAKAGE__SEPARATION, WINDING_LEAKAGE__HEIGHT,
						WINDING_LEAKAGE__MEAN_TURN, WINDING_LEAKAGE__INTERFACES);
		connectionArea = new Composite(into, SWT.NONE);
		connectionArea.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
		GridLayout plain = new GridLayout();
		plain.marginWidth = 0;
		plain.marginHeight = 0;
		connectionArea.setLayout(plain);
		connection = new FeatureForm(Headings.part(connectionArea, "Connection", "Changes no current: it tells what the windings are together, for small changes."), runner())
				.add(ELEMENT__NAME, ELEMENT__ID, WINDING_CONNECTION__KIND);
		members = new ElementRows(Headings.part(connectionArea, "Windings", ""), runner(),
				List.of(CONNECTED_WINDING__WINDING, CONNECTED_WINDING__REVERSED), element -> "the winding",
				element -> run(DesignEdits.remove("Remove from connection", element)));
		Button join = new Button(connectionArea, SWT.PUSH);
		join.setText("Add winding");
		join.addListener(SWT.Selection, event -> join());
		figures = new FiguresPart(Headings.part(into, "Results", ""), session());
	}

	/** The first winding that is not yet in the connection. */
	private void join() {
		WindingConnection chosen = (WindingConnection) chosen();
		List<Winding> joined = chosen.getMembers().stream().map(member -> member.getWinding()).toList();
		session().design().getWindings().stream().filter(winding -> !joined.contains(winding)).findFirst().ifPresentOrElse(
				winding -> run(PairEdits.join(chosen, winding)),
				() -> MessageDialog.openInformation(getShell(), "Couplings", "Every winding of the design is in this connection already."));
	}

	@Override
	void showDetails(EObject element) {
		boolean isLeakage = element instanceof WindingLeakage;
		Composite leakageArea = leakage.control().getParent();
		boolean changed = ((GridData) leakageArea.getLayoutData()).exclude == isLeakage
				|| ((GridData) connectionArea.getLayoutData()).exclude != isLeakage;
		FormLayouts.show(leakageArea, isLeakage);
		FormLayouts.show(connectionArea, !isLeakage);
		leakage.bind(isLeakage ? element : null);
		connection.bind(isLeakage ? null : element);
		members.show(isLeakage ? List.of() : ((WindingConnection) element).getMembers());
		figures.show(element);
		if (changed) {
			FormLayouts.relayout(leakageArea);
		}
	}
}
