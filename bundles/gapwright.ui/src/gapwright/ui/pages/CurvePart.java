package gapwright.ui.pages;

import static gapwright.model.GapwrightPackage.Literals.ARCTAN_CURVE__INITIAL_PERMEABILITY;
import static gapwright.model.GapwrightPackage.Literals.ARCTAN_CURVE__SATURATION_POLARISATION;
import static gapwright.model.GapwrightPackage.Literals.CURVE_POINT__FIELD_STRENGTH;
import static gapwright.model.GapwrightPackage.Literals.CURVE_POINT__FLUX_DENSITY;
import static gapwright.model.GapwrightPackage.Literals.KNEE_CURVE__INITIAL_PERMEABILITY;
import static gapwright.model.GapwrightPackage.Literals.KNEE_CURVE__SATURATION_POLARISATION;
import static gapwright.model.GapwrightPackage.Literals.LINEAR_CURVE__RELATIVE_PERMEABILITY;
import static gapwright.model.GapwrightPackage.Literals.ROLL_OFF_CURVE__EXPONENT;
import static gapwright.model.GapwrightPackage.Literals.ROLL_OFF_CURVE__HALF_FIELD_STRENGTH;
import static gapwright.model.GapwrightPackage.Literals.ROLL_OFF_CURVE__INITIAL_PERMEABILITY;

import java.util.List;

import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;

import gapwright.model.Curve;
import gapwright.model.Material;
import gapwright.model.TableCurve;
import gapwright.model.edit.DesignEdits;
import gapwright.model.edit.MaterialEdits;
import gapwright.ui.fields.Accessibles;
import gapwright.ui.fields.ElementRows;
import gapwright.ui.fields.FeatureForm;
import gapwright.ui.fields.FormLayouts;

/** The B-H curve of a material: its kind, its parameters or points, and its picture. */
final class CurvePart {

	private final MasterDetailPage page;
	private final Combo kind;
	private final Label law;
	private final FeatureForm parameters;
	private final Composite table;
	private final ElementRows points;
	private final CurvePlot plot;
	private Material material;

	CurvePart(Composite parent, MasterDetailPage page) {
		this.page = page;
		parent.setLayout(new GridLayout(2, false));
		Composite fields = new Composite(parent, SWT.NONE);
		fields.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
		fields.setLayout(FormLayouts.grid(1));
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
		table = new Composite(fields, SWT.NONE);
		table.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
		table.setLayout(FormLayouts.grid(1));
		Composite rows = new Composite(table, SWT.NONE);
		rows.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
		points = new ElementRows(rows, page.runner(), List.of(CURVE_POINT__FIELD_STRENGTH, CURVE_POINT__FLUX_DENSITY),
				point -> "point", point -> page.run(DesignEdits.remove("Remove curve point", point)));
		Button add = new Button(table, SWT.PUSH);
		add.setText("Add point");
		add.addListener(SWT.Selection, event -> page.run(MaterialEdits.addPoint((TableCurve) material.getCurve())));
		plot = new CurvePlot(parent);
		GridData square = new GridData(SWT.FILL, SWT.TOP, true, false);
		square.widthHint = 270;
		square.minimumWidth = 200;
		square.heightHint = 220;
		plot.setLayoutData(square);
	}

	private void changeKind() {
		CurveKind wanted = CurveKind.values()[kind.getSelectionIndex()];
		if (wanted != CurveKind.of(material.getCurve())) {
			page.run(MaterialEdits.changeCurve(material, wanted.create(material.getCurve())));
		}
	}

	void show(Material next) {
		material = next;
		Curve curve = material.getCurve();
		CurveKind current = CurveKind.of(curve);
		if (current == null) {
			kind.deselectAll();
		} else {
			kind.select(current.ordinal());
		}
		law.setText(current == null ? "This material has no curve yet: choose a kind." : current.law());
		parameters.bind(curve instanceof TableCurve ? null : curve);
		FormLayouts.show(parameters.control(), curve != null && !(curve instanceof TableCurve));
		FormLayouts.show(table, curve instanceof TableCurve);
		points.show(curve instanceof TableCurve tabled ? tabled.getPoints() : List.of());
		plot.show(material);
		FormLayouts.relayout(table);
	}
}
