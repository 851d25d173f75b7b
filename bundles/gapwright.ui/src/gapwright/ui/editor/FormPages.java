package gapwright.ui.editor;

import java.util.function.BiConsumer;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;

import gapwright.model.Drive;
import gapwright.model.Material;
import gapwright.model.OperatingPoint;
import gapwright.model.Tolerance;
import gapwright.model.Winding;
import gapwright.model.WindingConnection;
import gapwright.model.WindingLeakage;
import gapwright.ui.pages.CouplingsPage;
import gapwright.ui.pages.MaterialsPage;
import gapwright.ui.pages.OperatingPointsPage;
import gapwright.ui.pages.TolerancesPage;
import gapwright.ui.pages.WindingsPage;
import gapwright.ui.session.DesignSession;

/** The pages beside the canvas, in their order. */
final class FormPages {

	private final WindingsPage windings;
	private final CouplingsPage couplings;
	private final OperatingPointsPage points;
	private final MaterialsPage materials;
	private final TolerancesPage tolerances;

	FormPages(Composite parent, DesignSession session) {
		windings = new WindingsPage(parent, session);
		couplings = new CouplingsPage(parent, session);
		points = new OperatingPointsPage(parent, session);
		materials = new MaterialsPage(parent, session);
		tolerances = new TolerancesPage(parent, session);
	}

	void addTo(BiConsumer<Control, String> adder) {
		adder.accept(windings, "Windings");
		adder.accept(couplings, "Couplings");
		adder.accept(points, "Operating points");
		adder.accept(materials, "Materials");
		adder.accept(tolerances, "Tolerances");
	}

	/** Chooses the element on its page; answers the page's place among these, or −1 when it belongs on the canvas. */
	int reveal(EObject element) {
		if (element instanceof Winding) {
			windings.reveal(element);
			return 0;
		}
		if (element instanceof WindingLeakage || element instanceof WindingConnection) {
			couplings.reveal(element);
			return 1;
		}
		if (element instanceof OperatingPoint || element instanceof Drive) {
			points.reveal(element);
			return 2;
		}
		if (element instanceof Material) {
			materials.reveal(element);
			return 3;
		}
		if (element instanceof Tolerance) {
			tolerances.reveal(element);
			return 4;
		}
		return -1;
	}


	/** @param listener called when a page has chosen another element */
	void onChoose(Runnable listener) {
		windings.onChoose(listener);
		couplings.onChoose(listener);
		points.onChoose(listener);
		materials.onChoose(listener);
		tolerances.onChoose(listener);
	}

	/** What a page has chosen; null when the control is none of these. */
	EObject chosen(Control page) {
		if (page == windings) {
			return windings.chosen();
		}
		if (page == couplings) {
			return couplings.chosen();
		}
		return page == points ? points.chosen() : page == materials ? materials.chosen()
				: page == tolerances ? tolerances.chosen() : null;
	}
}
