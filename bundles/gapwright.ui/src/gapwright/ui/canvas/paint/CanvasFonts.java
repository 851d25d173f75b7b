package gapwright.ui.canvas.paint;

import java.util.HashMap;
import java.util.Map;

import org.eclipse.draw2d.FigureUtilities;
import org.eclipse.jface.resource.FontRegistry;
import org.eclipse.jface.resource.JFaceResources;
import org.eclipse.swt.graphics.Font;
import org.eclipse.swt.graphics.FontData;

/** The workbench's font in the sizes of the canvas; owned by JFace's registry. */
public final class CanvasFonts {

	private static final double POINTS_PER_PIXEL = 0.75;

	/** A text in a size. */
	private record Written(String text, double pixels, boolean bold) {
	}

	/** Widths of the texts shown of late: measuring is slow, and a drag writes most of them again. */
	private static final Map<Written, Double> WIDTHS = new HashMap<>();
	private static final int MOST_WIDTHS = 5000;
	private static Font measuredWith;

	private CanvasFonts() {
	}

	static Font get(double pixels, boolean bold) {
		FontRegistry registry = JFaceResources.getFontRegistry();
		FontData base = JFaceResources.getDefaultFont().getFontData()[0];
		int points = Math.max(5, (int) Math.round(pixels * POINTS_PER_PIXEL));
		String key = "gapwright.ui.canvas." + base.getName() + points;
		if (!registry.hasValueFor(key)) {
			registry.put(key, new FontData[] { new FontData(base.getName(), points, base.getStyle()) });
		}
		return bold ? registry.getBold(key) : registry.get(key);
	}

	/** @return width in pixels of a text in a size of pixels */
	public static double width(String text, double pixels, boolean bold) {
		Font base = JFaceResources.getDefaultFont();
		if (base != measuredWith || WIDTHS.size() > MOST_WIDTHS) {
			measuredWith = base;
			WIDTHS.clear();
		}
		return WIDTHS.computeIfAbsent(new Written(text, pixels, bold), key -> width(text, get(pixels, bold)));
	}

	static double width(String text, Font font) {
		return FigureUtilities.getTextWidth(text, font);
	}
}
