package gapwright.ui.plot;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;

import org.eclipse.draw2d.SWTGraphics;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Image;
import org.eclipse.swt.graphics.ImageData;
import org.eclipse.swt.graphics.ImageLoader;
import org.eclipse.swt.graphics.RGB;
import org.eclipse.swt.widgets.Display;
import org.eclipse.swt.widgets.FileDialog;
import org.eclipse.swt.widgets.Shell;

import gapwright.model.AtomicFile;
import gapwright.ui.canvas.paint.GraphicsPen;
import gapwright.ui.canvas.paint.Pen;
import gapwright.ui.canvas.paint.SvgPen;
import gapwright.ui.fields.ThemeColours;

/** Plots, one below another, as a picture file. */
public final class PlotExport {

	private static final int WIDTH = 900;
	private static final int HEIGHT = 360;
	/** Picture pixels to each of its own, for documents that are printed. */
	private static final int FINE = 2;

	private PlotExport() {
	}

	/** Asks where to, and writes SVG or PNG by the name's end. */
	public static void save(List<Plot> plots, String title, Shell shell) {
		FileDialog dialog = new FileDialog(shell, SWT.SAVE);
		dialog.setText("Save plot as");
		dialog.setFilterNames(new String[] { "SVG picture (*.svg)", "PNG picture (*.png)" });
		dialog.setFilterExtensions(new String[] { "*.svg", "*.png" });
		dialog.setOverwrite(true);
		String chosen = dialog.open();
		if (chosen == null) {
			return;
		}
		boolean named = chosen.endsWith(".svg") || chosen.endsWith(".png");
		String name = named ? chosen : chosen + (dialog.getFilterIndex() == 1 ? ".png" : ".svg");
		write(name, name.endsWith(".png") ? png(plots, shell.getDisplay()) : svg(plots, title).getBytes(StandardCharsets.UTF_8), shell);
	}

	/** Asks where to, and writes a text file. */
	public static void saveText(String text, String ending, String kind, Shell shell) {
		FileDialog dialog = new FileDialog(shell, SWT.SAVE);
		dialog.setText("Save as");
		dialog.setFilterNames(new String[] { kind });
		dialog.setFilterExtensions(new String[] { "*" + ending });
		dialog.setOverwrite(true);
		String chosen = dialog.open();
		if (chosen != null) {
			write(chosen.endsWith(ending) ? chosen : chosen + ending, text.getBytes(StandardCharsets.UTF_8), shell);
		}
	}

	private static void write(String name, byte[] content, Shell shell) {
		try {
			AtomicFile.write(Path.of(name), content);
		} catch (IOException e) {
			MessageDialog.openError(shell, "Save", "'" + name + "' could not be written: " + e.getMessage());
		}
	}

	/** @return all plots in the colours of the theme in force */
	public static String svg(List<Plot> plots, String title) {
		SvgPen pen = new SvgPen(tone -> hex(ThemeColours.valueOf(tone.name()).get().getRGB()));
		for (int i = 0; i < plots.size(); i++) {
			PlotPainter.paint(plots.get(i), new ShiftedPen(pen, i * (double) HEIGHT), WIDTH, HEIGHT, Double.NaN);
		}
		return pen.document(0, 0, WIDTH, HEIGHT * (double) plots.size(), title);
	}

	private static String hex(RGB rgb) {
		return String.format("#%02x%02x%02x", rgb.red, rgb.green, rgb.blue);
	}

	/** @return all plots as PNG */
	public static byte[] png(List<Plot> plots, Display display) {
		Image image = new Image(display, WIDTH * FINE, HEIGHT * FINE * plots.size());
		GC gc = new GC(image);
		gc.setBackground(ThemeColours.PAPER.get());
		gc.fillRectangle(0, 0, WIDTH * FINE, HEIGHT * FINE * plots.size());
		SWTGraphics graphics = new SWTGraphics(gc);
		graphics.scale(FINE);
		Pen pen = new GraphicsPen(graphics);
		for (int i = 0; i < plots.size(); i++) {
			PlotPainter.paint(plots.get(i), new ShiftedPen(pen, i * (double) HEIGHT), WIDTH, HEIGHT, Double.NaN);
		}
		graphics.dispose();
		gc.dispose();
		ImageLoader loader = new ImageLoader();
		loader.data = new ImageData[] { image.getImageData(100) };
		image.dispose();
		ByteArrayOutputStream output = new ByteArrayOutputStream();
		loader.save(output, SWT.IMAGE_PNG);
		return output.toByteArray();
	}
}
