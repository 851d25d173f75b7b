package gapwright.ui.wizards;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

import org.eclipse.jface.wizard.WizardPage;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Text;
import org.eclipse.ui.PlatformUI;

import gapwright.library.template.TemplateField;
import gapwright.model.Design;
import gapwright.ui.fields.Accessibles;
import gapwright.ui.fields.EntryText;
import gapwright.ui.fields.FormLayouts;

/** Second page: the dimensions of the core, with a picture that follows. */
final class DimensionsPage extends WizardPage {

	private final Map<String, String> values = new HashMap<>();
	private final List<EntryText<String>> fields = new ArrayList<>();
	private Start start;
	private Composite form;
	private DesignPicture picture;
	private Text figures;
	private Design design;

	DimensionsPage() {
		super("dimensions");
		setTitle("Dimensions");
		setDescription("With their units: 0.5 mm, 20 mil, 1.2 cm². The picture follows each entry.");
	}

	@Override
	public void createControl(Composite parent) {
		Composite area = new Composite(parent, SWT.NONE);
		area.setLayout(new GridLayout(2, false));
		form = new Composite(area, SWT.NONE);
		GridData narrow = new GridData(SWT.FILL, SWT.TOP, false, true);
		narrow.widthHint = 330;
		form.setLayoutData(narrow);
		form.setLayout(FormLayouts.grid(2));
		picture = new DesignPicture(area);
		GridData wide = new GridData(SWT.FILL, SWT.FILL, true, true);
		wide.widthHint = 360;
		wide.heightHint = 320;
		picture.setLayoutData(wide);
		figures = new Text(area, SWT.MULTI | SWT.READ_ONLY | SWT.WRAP);
		GridData below = new GridData(SWT.FILL, SWT.BOTTOM, true, false, 2, 1);
		below.widthHint = 700;
		below.heightHint = 2 * figures.getLineHeight() + 4;
		figures.setLayoutData(below);
		figures.setBackground(area.getBackground());
		Accessibles.name(figures, "What the dimensions amount to");
		setControl(area);
		PlatformUI.getWorkbench().getHelpSystem().setHelp(area, "gapwright.help.newDesign");
		rebuild();
	}

	/** The first page chose something else to start from. */
	void start(Start next) {
		if (next != start) {
			start = next;
			values.clear();
			start.fields().forEach(field -> values.put(field.key(), field.standard()));
			rebuild();
		}
	}

	private void rebuild() {
		if (form == null || start == null) {
			return;
		}
		fields.clear();
		for (Control child : form.getChildren()) {
			child.dispose();
		}
		start.fields().forEach(this::createRow);
		form.getParent().layout(true, true);
		update();
	}

	private void createRow(TemplateField field) {
		Label label = new Label(form, SWT.NONE);
		label.setText(field.label());
		label.setToolTipText(field.hint());
		EntryText<String> text = new EntryText<>(form, new TemplateEntry(field), value -> {
			values.put(field.key(), value);
			update();
			return null;
		});
		text.control().setToolTipText(field.hint());
		text.control().setLayoutData(new GridData(SWT.FILL, SWT.CENTER, true, false));
		text.replace(values.get(field.key()));
		text.onProblem(this::update);
		fields.add(text);
	}

	private void update() {
		String problem = fields.stream().map(EntryText::problem).filter(text -> text != null).findFirst().orElse(null);
		design = null;
		if (problem == null) {
			try {
				design = start.build(values);
			} catch (IllegalArgumentException e) {
				problem = e.getMessage();
			}
		}
		setErrorMessage(problem);
		setPageComplete(problem == null);
		picture.show(design);
		figures.setText(design == null ? "" : start.figures(values));
	}

	/** Null while what is typed makes no core. */
	Design design() {
		EntryText.commitFocused();
		return design;
	}
}
