package gapwright.ui.canvas.paint;

/** What a colour is for; the pen knows which it is in the theme in force. Names as in the theme's colours. */
public enum Tone {
	PAPER, GRID, IRON, INK, NOTE, WITHIN, NEAR, OVER, UNKNOWN, COIL, COPPER, MAGNET, SELECTION
}
