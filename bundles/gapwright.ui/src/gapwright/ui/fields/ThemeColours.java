package gapwright.ui.fields;

import java.util.Locale;

import org.eclipse.jface.resource.JFaceResources;
import org.eclipse.swt.graphics.Color;

import gapwright.study.LegState;

/** Our colours, from the workbench's theme (Preferences, Colors and Fonts, Gapwright); never to be disposed. */
public enum ThemeColours {
	/** Page of the canvas. */
	PAPER,
	/** Millimetre grid. */
	GRID,
	/** Inside of a bar. */
	IRON,
	/** Outlines and words. */
	INK,
	/** Remarks and dimensions. */
	NOTE,
	WITHIN, NEAR, OVER, UNKNOWN,
	/** Outline of a turn. */
	COIL,
	/** Inside of a turn. */
	COPPER,
	MAGNET,
	/** Handles and outline of what is selected. */
	SELECTION;

	/** @return as the theme in force has it; ask anew at every painting */
	public Color get() {
		return JFaceResources.getColorRegistry().get(id());
	}

	/** Id in the theme, for listeners of changes. */
	public String id() {
		return "gapwright.ui.colour." + name().toLowerCase(Locale.ROOT);
	}

	public static ThemeColours of(LegState state) {
		return valueOf(state.name());
	}
}
