package gapwright.ui.canvas.paint;

/** Where a text lies against its anchor. */
public enum Align {
	START, MIDDLE, END
}
