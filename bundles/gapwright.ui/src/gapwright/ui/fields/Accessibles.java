package gapwright.ui.fields;

import org.eclipse.swt.accessibility.AccessibleAdapter;
import org.eclipse.swt.accessibility.AccessibleEvent;
import org.eclipse.swt.widgets.Control;

/** Names for screen readers, where a control has no label of its own beside it. */
public final class Accessibles {

	private Accessibles() {
	}

	public static void name(Control control, String name) {
		control.getAccessible().addAccessibleListener(new AccessibleAdapter() {
			@Override
			public void getName(AccessibleEvent event) {
				event.result = name;
			}
		});
	}
}
