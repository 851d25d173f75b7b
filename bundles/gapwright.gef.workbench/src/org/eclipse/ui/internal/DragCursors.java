package org.eclipse.ui.internal;

import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Cursor;
import org.eclipse.swt.widgets.Display;

/**
 * The cursors GEF Classic 3.2 expects in the workbench, where they no longer are; shown while its palette is dragged
 * to another side. They are the system's own, so there is nothing to dispose.
 */
public class DragCursors {

	public static final int INVALID = 0;
	public static final int LEFT = 1;
	public static final int RIGHT = 2;
	public static final int TOP = 3;
	public static final int BOTTOM = 4;
	public static final int CENTER = 5;
	public static final int OFFSCREEN = 6;

	/** @return the cursor constant for a side given as SWT.LEFT, RIGHT, TOP, BOTTOM or CENTER */
	public static int positionToDragCursor(int side) {
		return switch (side) {
		case SWT.LEFT -> LEFT;
		case SWT.RIGHT -> RIGHT;
		case SWT.TOP -> TOP;
		case SWT.BOTTOM -> BOTTOM;
		case SWT.CENTER -> CENTER;
		default -> INVALID;
		};
	}

	/** @return a system cursor for one of the constants above */
	public static Cursor getCursor(int dragCursor) {
		int system = switch (dragCursor) {
		case LEFT -> SWT.CURSOR_SIZEW;
		case RIGHT -> SWT.CURSOR_SIZEE;
		case TOP -> SWT.CURSOR_SIZEN;
		case BOTTOM -> SWT.CURSOR_SIZES;
		case CENTER -> SWT.CURSOR_SIZEALL;
		case OFFSCREEN -> SWT.CURSOR_HAND;
		default -> SWT.CURSOR_NO;
		};
		return Display.getCurrent().getSystemCursor(system);
	}
}
