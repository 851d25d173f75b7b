package gapwright.install.reader;

import java.nio.file.Path;

import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Image;
import org.eclipse.swt.graphics.ImageData;
import org.eclipse.swt.graphics.ImageLoader;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Display;
import org.eclipse.swt.widgets.Shell;

/** A picture of a window as it stands on the screen, for people to look at. */
final class Picture {

	private Picture() {
	}

	static void of(Shell shell, Path file) {
		Display display = shell.getDisplay();
		while (display.readAndDispatch()) {
			// until everything is painted
		}
		Rectangle bounds = shell.getBounds();
		Image image = new Image(display, bounds.width, bounds.height);
		GC gc = new GC(display);
		gc.copyArea(image, bounds.x, bounds.y);
		gc.dispose();
		ImageLoader loader = new ImageLoader();
		loader.data = new ImageData[] { image.getImageData() };
		image.dispose();
		loader.save(file.toString(), SWT.IMAGE_PNG);
	}
}
