package gapwright.ui.canvas.looks;

import gapwright.ui.canvas.paint.Tone;

/** A line of a label. */
public record LabelLine(String text, double size, boolean bold, Tone tone) {
}
