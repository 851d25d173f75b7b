package gapwright.ui.pages;

import static gapwright.model.GapwrightPackage.Literals.ELEMENT__ID;
import static gapwright.model.GapwrightPackage.Literals.ELEMENT__NAME;
import static gapwright.model.GapwrightPackage.Literals.TOLERANCE__DEVIATION;
import static gapwright.model.GapwrightPackage.Literals.TOLERANCE__DISTRIBUTION;
import static gapwright.model.GapwrightPackage.Literals.TOLERANCE__FEATURE;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;

import org.eclipse.emf.common.util.TreeIterator;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableItem;
import org.eclipse.ui.PlatformUI;

import gapwright.model.Design;
import gapwright.model.Element;
import gapwright.model.Tolerance;
import gapwright.model.TolerancedFeature;
import gapwright.model.TolerancedValue;
import gapwright.model.edit.DesignEdits;
import gapwright.model.edit.ToleranceEdits;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;
import gapwright.ui.fields.Accessibles;
import gapwright.ui.fields.FeatureForm;
import gapwright.ui.fields.FeatureText;
import gapwright.ui.fields.Headings;
import gapwright.ui.session.DesignSession;

/** How far single values may be off, and which elements deviate together. */
public final class TolerancesPage extends MasterDetailPage {

	private FeatureForm form;
	private Table targets;
	private List<Element> candidates = List.of();

	public TolerancesPage(Composite parent, DesignSession session) {
		super(parent, session, "Tolerances", "This design has no tolerance yet. Add one to see bands on inductance and saturation"
				+ " in the Tolerances view.");
		PlatformUI.getWorkbench().getHelpSystem().setHelp(this, "gapwright.help.tolerances");
		start();
	}

	@Override
	List<? extends EObject> elements(Design design) {
		return design.getTolerances();
	}

	@Override
	String label(EObject element) {
		Tolerance tolerance = (Tolerance) element;
		String name = tolerance.getName() == null || tolerance.getName().isBlank()
				? tolerance.getTargets().stream().map(FeatureText::name).collect(Collectors.joining(", ")) : tolerance.getName();
		return name + "   " + TolerancedValue.words(tolerance.getFeature()) + " ± " + tolerance.getDeviation();
	}

	@Override
	void createButtons(MasterList into) {
		into.button("Add", "Add a tolerance on the gaps, else on the first material's permeability", this::addOne);
		into.button("Remove", "Remove the chosen tolerance", () -> {
			if (chosen() != null) {
				run(DesignEdits.delete(List.of(chosen())));
			}
		});
	}

	/** Ground gaps are good to some hundredths of a millimetre (common practice). */
	private void addOne() {
		Design design = session().design();
		List<Element> gaps = new ArrayList<>();
		design.getLegs().forEach(leg -> leg.getGaps().stream().filter(gap -> isFree(gap, TolerancedFeature.GAP_LENGTH)).forEach(gaps::add));
		if (!gaps.isEmpty()) {
			add(ToleranceEdits.add(design, gaps, TolerancedFeature.GAP_LENGTH, Quantity.parse("5 %", Dimension.DEVIATION)));
			return;
		}
		List<Element> materials = design.getMaterials().stream().filter(m -> isFree(m, TolerancedFeature.PERMEABILITY))
				.map(Element.class::cast).limit(1).toList();
		add(ToleranceEdits.add(design, materials, TolerancedFeature.PERMEABILITY, Quantity.parse("25 %", Dimension.DEVIATION)));
	}

	private boolean isFree(Element element, TolerancedFeature feature) {
		return session().design().getTolerances().stream().noneMatch(t -> t.getFeature() == feature && t.getTargets().contains(element));
	}

	@Override
	void createDetails(Composite into) {
		form = new FeatureForm(Headings.part(into, "Tolerance", ""), runner())
				.add(TOLERANCE__FEATURE, TOLERANCE__DEVIATION, TOLERANCE__DISTRIBUTION, ELEMENT__NAME, ELEMENT__ID);
		Composite part = Headings.part(into, "Elements", "Ticked elements have this tolerance; they deviate together, as gaps under one spacer do.");
		part.setLayout(new GridLayout());
		targets = new Table(part, SWT.CHECK | SWT.BORDER | SWT.V_SCROLL);
		GridData data = new GridData(SWT.FILL, SWT.TOP, true, false);
		data.heightHint = 10 * targets.getItemHeight();
		targets.setLayoutData(data);
		Accessibles.name(targets, "Elements with this tolerance");
		targets.addListener(SWT.Selection, event -> {
			if (event.detail == SWT.CHECK) {
				ticked();
			}
		});
	}

	private void ticked() {
		List<Element> chosen = new ArrayList<>();
		for (int i = 0; i < targets.getItemCount(); i++) {
			if (targets.getItem(i).getChecked()) {
				chosen.add(candidates.get(i));
			}
		}
		run(ToleranceEdits.retarget((Tolerance) chosen(), chosen));
	}

	@Override
	void showDetails(EObject element) {
		Tolerance tolerance = (Tolerance) element;
		form.bind(tolerance);
		List<Element> all = new ArrayList<>();
		for (TreeIterator<EObject> contents = session().design().eAllContents(); contents.hasNext();) {
			if (contents.next() instanceof Element candidate && (TolerancedValue.has(candidate, tolerance.getFeature())
					|| tolerance.getTargets().contains(candidate))) {
				all.add(candidate);
			}
		}
		candidates = all;
		while (targets.getItemCount() > all.size()) {
			targets.remove(targets.getItemCount() - 1);
		}
		for (int i = 0; i < all.size(); i++) {
			TableItem item = i < targets.getItemCount() ? targets.getItem(i) : new TableItem(targets, SWT.NONE);
			item.setText(FeatureText.name(all.get(i)));
			item.setChecked(tolerance.getTargets().contains(all.get(i)));
		}
	}
}
