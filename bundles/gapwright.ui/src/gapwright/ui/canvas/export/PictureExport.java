package gapwright.ui.canvas.export;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;

import org.eclipse.draw2d.Graphics;
import org.eclipse.draw2d.PrinterGraphics;
import org.eclipse.draw2d.SWTGraphics;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Image;
import org.eclipse.swt.graphics.ImageData;
import org.eclipse.swt.graphics.ImageLoader;
import org.eclipse.swt.graphics.RGB;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.printing.PrintDialog;
import org.eclipse.swt.printing.Printer;
import org.eclipse.swt.printing.PrinterData;
import org.eclipse.swt.widgets.Display;
import org.eclipse.swt.widgets.FileDialog;
import org.eclipse.swt.widgets.Shell;

import gapwright.model.AtomicFile;
import gapwright.ui.canvas.CanvasModel;
import gapwright.ui.canvas.CanvasScale;
import gapwright.ui.canvas.looks.Picture;
import gapwright.ui.canvas.paint.GraphicsPen;
import gapwright.ui.canvas.paint.SvgPen;
import gapwright.ui.fields.ThemeColours;

/** The drawing as a picture file (SVG, PNG) or on paper. */
public final class PictureExport {

	private static final int MARGIN = 24;
	/** Picture pixels of a canvas pixel, for documents that are printed. */
	private static final int FINE = 2;

	private PictureExport() {
	}

	/** Asks where to, and writes SVG or PNG by the name's end. */
	public static void save(CanvasModel canvas, Shell shell) {
		FileDialog dialog = new FileDialog(shell, SWT.SAVE);
		dialog.setText("Save picture as");
		dialog.setFilterNames(new String[] { "SVG picture (*.svg)", "PNG picture (*.png)" });
		dialog.setFilterExtensions(new String[] { "*.svg", "*.png" });
		dialog.setOverwrite(true);
		String chosen = dialog.open();
		if (chosen == null) {
			return;
		}
		boolean named = chosen.endsWith(".svg") || chosen.endsWith(".png");
		String name = named ? chosen : chosen + (dialog.getFilterIndex() == 1 ? ".png" : ".svg");
		try {
			byte[] content = name.endsWith(".png") ? png(canvas.picture(), shell.getDisplay(), FINE)
					: svg(canvas).getBytes(StandardCharsets.UTF_8);
			AtomicFile.write(Path.of(name), content);
		} catch (IOException e) {
			MessageDialog.openError(shell, "Save picture", "'" + name + "' could not be written: " + e.getMessage());
		}
	}

	/** @return the drawing at its present scale as SVG */
	public static String svg(CanvasModel canvas) {
		SvgPen pen = new SvgPen(tone -> hex(ThemeColours.valueOf(tone.name()).get().getRGB()));
		Picture picture = canvas.pictureAt(canvas.scale());
		picture.paint(pen);
		double[] box = picture.bounds();
		String name = canvas.session().design().getName();
		return pen.document(box[0] - MARGIN, box[1] - MARGIN, box[2] + 2 * MARGIN, box[3] + 2 * MARGIN,
				name == null ? "" : name);
	}

	private static String hex(RGB rgb) {
		return String.format("#%02x%02x%02x", rgb.red, rgb.green, rgb.blue);
	}

	/** @return the picture as PNG, with so many pixels to each of its own */
	public static byte[] png(Picture picture, Display display, int fineness) {
		double[] box = picture.bounds();
		int width = (int) Math.ceil(box[2]) + 2 * MARGIN;
		int height = (int) Math.ceil(box[3]) + 2 * MARGIN;
		Image image = new Image(display, width * fineness, height * fineness);
		GC gc = new GC(image);
		gc.setBackground(ThemeColours.PAPER.get());
		gc.fillRectangle(0, 0, width * fineness, height * fineness);
		Graphics graphics = new SWTGraphics(gc);
		graphics.scale(fineness);
		graphics.translate(MARGIN - (int) box[0], MARGIN - (int) box[1]);
		picture.paint(new GraphicsPen(graphics));
		graphics.dispose();
		gc.dispose();
		ImageLoader loader = new ImageLoader();
		loader.data = new ImageData[] { image.getImageData(100) };
		image.dispose();
		ByteArrayOutputStream output = new ByteArrayOutputStream();
		loader.save(output, SWT.IMAGE_PNG);
		return output.toByteArray();
	}

	/** Asks for a printer and prints the drawing on one page. */
	public static void print(CanvasModel canvas, Shell shell) {
		PrinterData data = new PrintDialog(shell).open();
		if (data == null) {
			return;
		}
		Printer printer = new Printer(data);
		try {
			if (printer.startJob(String.valueOf(canvas.session().design().getName())) && printer.startPage()) {
				page(canvas.pictureAt(CanvasScale.zoom(1)), printer);
				printer.endPage();
				printer.endJob();
			} else {
				MessageDialog.openError(shell, "Print", "The printer '" + data.name + "' did not accept the job.");
			}
		} finally {
			printer.dispose();
		}
	}

	private static void page(Picture picture, Printer printer) {
		double[] box = picture.bounds();
		Rectangle area = printer.getClientArea();
		double factor = Math.min(area.width / (box[2] + 2 * MARGIN), area.height / (box[3] + 2 * MARGIN));
		GC gc = new GC(printer);
		SWTGraphics swt = new SWTGraphics(gc);
		Graphics graphics = new PrinterGraphics(swt, printer);
		graphics.scale(factor);
		graphics.translate(MARGIN - (int) box[0], MARGIN - (int) box[1]);
		picture.paint(new GraphicsPen(graphics));
		graphics.dispose();
		swt.dispose();
		gc.dispose();
	}
}
