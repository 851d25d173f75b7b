package gapwright.ui.tests;

import java.io.File;

import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Image;
import org.eclipse.swt.graphics.ImageData;
import org.eclipse.swt.graphics.ImageLoader;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Shell;

/** Pictures of windows, painted by the widgets themselves, for people to look at: target/pictures. */
final class Pictures {

	private static final File FOLDER = new File(System.getProperty("gapwright.pictures", "target/pictures"));

	private Pictures() {
	}

	/** @return the picture, so that a test can look at it too */
	static ImageData of(Shell shell, String name) {
		shell.redraw();
		Workbench.drain(250);
		Rectangle bounds = shell.getClientArea();
		Image image = new Image(shell.getDisplay(), bounds.width, bounds.height);
		GC gc = new GC(image);
		// what is copied off the screen of a virtual display is stale; printing asks every widget to paint itself
		shell.print(gc);
		gc.dispose();
		ImageData data = image.getImageData();
		image.dispose();
		FOLDER.mkdirs();
		ImageLoader loader = new ImageLoader();
		loader.data = new ImageData[] { data };
		loader.save(new File(FOLDER, name + ".png").getPath(), SWT.IMAGE_PNG);
		return data;
	}
}
