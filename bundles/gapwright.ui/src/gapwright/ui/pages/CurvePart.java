package gapwright.ui.pages;

import static gapwright.model.GapwrightPackage.Literals.ARCTAN_CURVE__INITIAL_PERMEABILITY;
import static gapwright.model.GapwrightPackage.Literals.ARCTAN_CURVE__SATURATION_POLARISATION;
import static gapwright.model.GapwrightPackage.Literals.CURVE_AT_TEMPERATURE__TEMPERATURE;
import static gapwright.model.GapwrightPackage.Literals.CURVE_POINT__FIELD_STRENGTH;
import static gapwright.model.GapwrightPackage.Literals.CURVE_POINT__FLUX_DENSITY;
import static gapwright.model.GapwrightPackage.Literals.KNEE_CURVE__INITIAL_PERMEABILITY;
import static gapwright.model.GapwrightPackage.Literals.KNEE_CURVE__SATURATION_POLARISATION;
import static gapwright.model.GapwrightPackage.Literals.LINEAR_CURVE__RELATIVE_PERMEABILITY;
import static gapwright.model.GapwrightPackage.Literals.MATERIAL__CURVE_SCALING;
import static gapwright.model.GapwrightPackage.Literals.MATERIAL__CURVE_TEMPERATURE;
import static gapwright.model.GapwrightPackage.Literals.ROLL_OFF_CURVE__EXPONENT;
import static gapwright.model.GapwrightPackage.Literals.ROLL_OFF_CURVE__HALF_FIELD_STRENGTH;
import static gapwright.model.GapwrightPackage.Literals.ROLL_OFF_CURVE__INITIAL_PERMEABILITY;

import java.util.ArrayList;
import java.util.List;

import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;

import gapwright.model.Curve;
import gapwright.model.CurveAtTemperature;
import gapwright.model.KneeCurve;
import gapwright.model.Material;
import gapwright.model.TableCurve;
import gapwright.model.edit.DesignEdits;
import gapwright.model.edit.MaterialEdits;
import gapwright.model.edit.history.Edit;
import gapwright.ui.fields.Accessibles;
import gapwright.ui.fields.ElementRows;
import gapwright.ui.fields.FeatureForm;
import gapwright.ui.fields.FormLayouts;

/** The B-H curves of a material, one of them at a time: its temperature, its kind, its parameters or points. */
final class CurvePart {

	private final MasterDetailPage page;
	private final Combo which;
	private final Button remove;
	private final FeatureForm place;
	private final Combo kind;
	private final Label law;
	private final FeatureForm parameters;
	private final Button sheetPoint;
	private final Composite table;
	private final ElementRows points;
	private Material material;
	/** Null where the material's first curve is shown. */
	private CurveAtTemperature other;

	CurvePart(Composite parent, MasterDetailPage page) {
		this.page = page;
		Composite fields = parent;
		fields.setLayout(FormLayouts.grid(1));
		which = new Combo(fields, SWT.READ_ONLY);
		which.setLayoutData(new GridData(SWT.FILL, SWT.CENTER, true, false));
		which.setToolTipText("Which of the material's curves is shown below");
		which.addListener(SWT.Selection, event -> chooseCurve(which.getSelectionIndex()));
		Accessibles.name(which, "Curve shown");
		Composite choice = new Composite(fields, SWT.NONE);
		choice.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
		GridLayout row = new GridLayout(2, false);
		row.marginWidth = 0;
		row.marginHeight = 0;
		choice.setLayout(row);
		Button another = new Button(choice, SWT.PUSH);
		another.setText("Add temperature");
		another.setToolTipText("Add the curve at a further temperature");
		another.addListener(SWT.Selection, event -> addTemperature());
		remove = new Button(choice, SWT.PUSH);
		remove.setText("Remove temperature");
		remove.setToolTipText("Remove the curve shown; the first one stays");
		remove.addListener(SWT.Selection, event -> page.run(DesignEdits.remove("Remove curve", other)));
		Composite placing = new Composite(fields, SWT.NONE);
		placing.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
		place = new FeatureForm(placing, page.runner()).add(MATERIAL__CURVE_TEMPERATURE, CURVE_AT_TEMPERATURE__TEMPERATURE,
				MATERIAL__CURVE_SCALING);
		kind = new Combo(fields, SWT.READ_ONLY);
		for (CurveKind each : CurveKind.values()) {
			kind.add(each.label());
		}
		kind.setLayoutData(new GridData(SWT.FILL, SWT.CENTER, true, false));
		kind.addListener(SWT.Selection, event -> changeKind());
		Accessibles.name(kind, "Kind of curve");
		law = new Label(fields, SWT.WRAP);
		GridData wide = new GridData(SWT.FILL, SWT.TOP, true, false);
		wide.widthHint = 160;
		law.setLayoutData(wide);
		Composite form = new Composite(fields, SWT.NONE);
		form.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
		parameters = new FeatureForm(form, page.runner()).add(LINEAR_CURVE__RELATIVE_PERMEABILITY, KNEE_CURVE__INITIAL_PERMEABILITY,
				KNEE_CURVE__SATURATION_POLARISATION, ARCTAN_CURVE__INITIAL_PERMEABILITY, ARCTAN_CURVE__SATURATION_POLARISATION,
				ROLL_OFF_CURVE__INITIAL_PERMEABILITY, ROLL_OFF_CURVE__HALF_FIELD_STRENGTH, ROLL_OFF_CURVE__EXPONENT);
		sheetPoint = new Button(fields, SWT.PUSH);
		sheetPoint.setText("Through a sheet's point…");
		sheetPoint.setToolTipText("Find the saturation polarisation that leads the curve through the data sheet's B at a field strength");
		sheetPoint.setLayoutData(new GridData(SWT.BEGINNING, SWT.TOP, false, false));
		sheetPoint.addListener(SWT.Selection, event -> throughSheetPoint());
		table = new Composite(fields, SWT.NONE);
		table.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
		table.setLayout(FormLayouts.grid(1));
		Composite rows = new Composite(table, SWT.NONE);
		rows.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
		points = new ElementRows(rows, page.runner(), List.of(CURVE_POINT__FIELD_STRENGTH, CURVE_POINT__FLUX_DENSITY),
				point -> "point", point -> page.run(DesignEdits.remove("Remove curve point", point)));
		Button add = new Button(table, SWT.PUSH);
		add.setText("Add point");
		add.addListener(SWT.Selection, event -> page.run(MaterialEdits.addPoint((TableCurve) curve())));
	}

	private Curve curve() {
		return other == null ? material.getCurve() : other.getCurve();
	}

	private void throughSheetPoint() {
		Edit edit = SheetPoint.ask(sheetPoint.getShell(), (KneeCurve) curve());
		if (edit != null) {
			page.run(edit);
		}
	}

	private void chooseCurve(int index) {
		other = index <= 0 ? null : material.getOtherCurves().get(index - 1);
		show(material);
	}

	private void addTemperature() {
		int before = material.getOtherCurves().size();
		page.run(MaterialEdits.addCurve(material));
		if (material.getOtherCurves().size() > before) {
			chooseCurve(before + 1);
		}
	}

	private void changeKind() {
		CurveKind wanted = CurveKind.values()[kind.getSelectionIndex()];
		if (wanted != CurveKind.of(curve())) {
			Curve next = wanted.create(curve());
			page.run(other == null ? MaterialEdits.changeCurve(material, next) : MaterialEdits.changeCurve(other, next));
		}
	}

	void show(Material next) {
		material = next;
		if (!material.getOtherCurves().contains(other)) {
			other = null;
		}
		showChoice();
		Curve curve = curve();
		CurveKind current = CurveKind.of(curve);
		if (current == null) {
			kind.deselectAll();
		} else {
			kind.select(current.ordinal());
		}
		law.setText(current == null ? "This material has no curve yet: choose a kind." : current.law());
		parameters.bind(curve instanceof TableCurve ? null : curve);
		FormLayouts.show(parameters.control(), curve != null && !(curve instanceof TableCurve));
		FormLayouts.show(sheetPoint, curve instanceof KneeCurve);
		FormLayouts.show(table, curve instanceof TableCurve);
		points.show(curve instanceof TableCurve tabled ? tabled.getPoints() : List.of());
		FormLayouts.relayout(table);
	}

	private void showChoice() {
		List<String> names = new ArrayList<>();
		names.add("Curve at " + (material.getCurveTemperature() == null ? "25 °C" : material.getCurveTemperature()));
		material.getOtherCurves().forEach(each -> names.add("Curve at " + (each.getTemperature() == null ? "?" : each.getTemperature())));
		if (!names.equals(List.of(which.getItems()))) {
			which.setItems(names.toArray(new String[0]));
		}
		which.select(other == null ? 0 : 1 + material.getOtherCurves().indexOf(other));
		remove.setEnabled(other != null);
		place.bind(other == null ? material : other);
	}
}
