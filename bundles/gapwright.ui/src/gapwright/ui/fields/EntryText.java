package gapwright.ui.fields;

import java.util.function.Function;

import org.eclipse.jface.fieldassist.ControlDecoration;
import org.eclipse.jface.fieldassist.FieldDecorationRegistry;
import org.eclipse.swt.SWT;
import org.eclipse.swt.accessibility.AccessibleAdapter;
import org.eclipse.swt.accessibility.AccessibleEvent;
import org.eclipse.swt.events.KeyEvent;
import org.eclipse.swt.events.KeyListener;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Display;
import org.eclipse.swt.widgets.Text;

/**
 * A text field that hands on only what its {@link Entry} takes: on Enter and on leaving the field. Esc puts the last
 * value back. A bad entry stays where it was typed, marked at the field with the reason, and goes no further.
 *
 * @param <T> kind of the value
 */
public class EntryText<T> {

	private static final String KEY = EntryText.class.getName();

	private final Text text;
	private final ControlDecoration mark;
	private final EntryState<T> state;
	private final Entry<T> entry;
	private final Function<T, String> taker;
	private Runnable afterProblem = () -> { };
	private boolean showing;

	/**
	 * @param taker takes a new value; answers null, or why it cannot be taken after all
	 */
	public EntryText(Composite parent, Entry<T> entry, Function<T, String> taker) {
		this(parent, SWT.SINGLE | SWT.BORDER, entry, taker);
	}

	public EntryText(Composite parent, int style, Entry<T> entry, Function<T, String> taker) {
		this.entry = entry;
		this.taker = taker;
		state = new EntryState<>(entry);
		text = new Text(parent, style);
		text.setData(KEY, this);
		if ((style & SWT.SINGLE) != 0) {
			text.setMessage(entry.example());
		}
		mark = new ControlDecoration(text, SWT.LEFT | SWT.TOP);
		mark.setImage(FieldDecorationRegistry.getDefault().getFieldDecoration(FieldDecorationRegistry.DEC_ERROR).getImage());
		mark.setMarginWidth(2);
		mark.hide();
		text.addModifyListener(event -> typed());
		text.addListener(SWT.FocusOut, event -> commit());
		text.addKeyListener(KeyListener.keyPressedAdapter(this::key));
		text.getAccessible().addAccessibleListener(new AccessibleAdapter() {
			@Override
			public void getDescription(AccessibleEvent event) {
				event.result = state.problem() == null ? text.getToolTipText() : state.problem();
			}
		});
	}

	/** Commits the field that has the focus, if it is one of these: called before saving. */
	public static void commitFocused() {
		Display display = Display.getCurrent();
		Control focused = display == null ? null : display.getFocusControl();
		if (focused != null && focused.getData(KEY) instanceof EntryText<?> field) {
			field.commit();
		}
	}

	public Text control() {
		return text;
	}

	/** A value from the model. What is half typed in the focused field stays. */
	public void show(T value) {
		if (state.accept(value, text.isFocusControl() || state.problem() != null)) {
			mirror();
		}
	}

	/** A value of another element: what was half typed is dropped. */
	public void replace(T value) {
		state.accept(value, false);
		mirror();
	}

	/** The last value taken. */
	public T value() {
		return state.value();
	}

	/** Null when what stands in the field is good. */
	public String problem() {
		return state.problem();
	}

	/** Called when the problem came, went or changed. */
	public void onProblem(Runnable listener) {
		afterProblem = listener;
	}

	public void setEditable(boolean editable) {
		text.setEditable(editable);
	}

	/** Hands on what is typed if it is good; marks it if it is not. */
	public void commit() {
		T before = state.value();
		String typed = state.typed();
		if (state.commit()) {
			String refusal = taker.apply(state.value());
			if (refusal != null) {
				state.refuse(before, typed, refusal);
			}
		}
		if (!text.isDisposed()) {
			mirror();
		}
	}

	/** Puts the last value back. */
	public void revert() {
		state.revert();
		mirror();
	}

	private void typed() {
		if (!showing) {
			state.type(text.getText());
			mirrorProblem();
		}
	}

	private void key(KeyEvent event) {
		boolean single = (text.getStyle() & SWT.SINGLE) != 0;
		if (event.keyCode == SWT.CR || event.keyCode == SWT.KEYPAD_CR) {
			if (single || (event.stateMask & SWT.MOD1) != 0) {
				commit();
				event.doit = !single;
			}
		} else if (event.keyCode == SWT.ESC && (state.isTouched() || state.problem() != null)) {
			revert();
			text.selectAll();
			event.doit = false;
		}
	}

	private void mirror() {
		if (!text.getText().equals(state.typed())) {
			showing = true;
			try {
				text.setText(state.typed());
			} finally {
				showing = false;
			}
		}
		mirrorProblem();
	}

	private void mirrorProblem() {
		String problem = state.problem();
		if (problem == null) {
			mark.hide();
			mark.hideHover();
		} else {
			mark.setDescriptionText(problem);
			mark.show();
		}
		afterProblem.run();
	}

	/** What the field takes. */
	public Entry<T> entry() {
		return entry;
	}
}
