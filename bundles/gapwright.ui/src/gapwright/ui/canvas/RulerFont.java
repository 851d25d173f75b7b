package gapwright.ui.canvas;

import org.eclipse.jface.resource.FontRegistry;
import org.eclipse.jface.resource.JFaceResources;
import org.eclipse.swt.graphics.Font;
import org.eclipse.swt.graphics.FontData;

/** A small font for rulers, owned by JFace's registry. */
final class RulerFont {

	private static final String KEY = "gapwright.ui.canvas.ruler";
	private static final int POINTS = 7;

	private RulerFont() {
	}

	static Font get() {
		FontRegistry registry = JFaceResources.getFontRegistry();
		if (!registry.hasValueFor(KEY)) {
			FontData base = JFaceResources.getDefaultFont().getFontData()[0];
			registry.put(KEY, new FontData[] { new FontData(base.getName(), POINTS, base.getStyle()) });
		}
		return registry.get(KEY);
	}
}
