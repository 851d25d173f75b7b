package gapwright.ui.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;

import org.eclipse.e4.ui.css.swt.theme.IThemeEngine;
import org.eclipse.swt.graphics.ImageData;
import org.eclipse.swt.graphics.RGB;
import org.eclipse.swt.widgets.Display;
import org.eclipse.ui.PlatformUI;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

import gapwright.library.Example;
import gapwright.library.Examples;
import gapwright.ui.canvas.CanvasModel;
import gapwright.ui.canvas.CanvasPage;
import gapwright.ui.canvas.CanvasScale;
import gapwright.ui.canvas.export.PictureExport;
import gapwright.ui.editor.DesignEditor;
import gapwright.ui.fields.ThemeColours;
import gapwright.ui.session.DesignSession;

/** Takes a picture of every example on the canvas, light and dark, in the window and exported: target/pictures. */
class ExamplePicturesTest {

	private static final String LIGHT = "org.eclipse.e4.ui.css.theme.e4_default";
	private static final String DARK = "org.eclipse.e4.ui.css.theme.e4_dark";
	private static final double[] ZOOMS = { 0.5, 1, 4 };

	@BeforeEach
	void start() throws Exception {
		Workbench.start();
	}

	@AfterEach
	void end() {
		Workbench.closeAll();
		theme(LIGHT);
	}

	@Test
	void everyExampleIsDrawnInTheLightTheme() throws Exception {
		theme(LIGHT);
		pictures("light");
	}

	@Test
	void everyExampleIsDrawnInTheDarkTheme() throws Exception {
		RGB light = ThemeColours.PAPER.get().getRGB();
		theme(DARK);
		assertNotEquals(light, ThemeColours.PAPER.get().getRGB(), "the page takes its colour from the theme");
		pictures("dark");
	}

	@Test
	void theSvgPictureShowsTheSameWordsAsTheCanvas() throws Exception {
		DesignEditor editor = Workbench.open(Workbench.example("boost-choke.gapwright"));
		CanvasModel canvas = editor.getAdapter(CanvasPage.class).canvas();
		String svg = PictureExport.svg(canvas);
		canvas.picture().labels().values().forEach(label -> label.lines()
				.forEach(line -> assertTrue(svg.contains('>' + line.text() + '<'), line.text() + " is not in the picture")));
		save("boost-choke.svg", svg.getBytes(java.nio.charset.StandardCharsets.UTF_8));
	}

	/** What the README shows of a leg over saturation. */
	@Test
	void theStalledPumpIsDrawnOverSaturation() throws Exception {
		theme(LIGHT);
		DesignEditor editor = Workbench.open(Workbench.example("three-phase-reactor.gapwright"));
		DesignSession session = editor.getAdapter(DesignSession.class);
		session.choose(session.design().getOperatingPoints().stream().filter(point -> point.getId().equals("stalled-pump"))
				.findFirst().orElseThrow());
		Workbench.settle();
		CanvasModel canvas = editor.getAdapter(CanvasPage.class).canvas();
		byte[] png = PictureExport.png(canvas.pictureAt(CanvasScale.zoom(0.25)), Display.getCurrent(), 1);
		assertTrue(share(new ImageData(new ByteArrayInputStream(png)), ThemeColours.OVER.get().getRGB()) > 0.001,
				"the middle leg is outlined in the colour of over");
		save("three-phase-reactor-stalled-light.png", png);
	}

	private static void pictures(String theme) throws Exception {
		for (Example example : Examples.all()) {
			DesignEditor editor = Workbench.open(Workbench.example(example.fileName()));
			editor.showPage(0);
			String name = example.fileName().replace(".gapwright", "");
			Pictures.of(Workbench.shell(), name + "-canvas-" + theme);
			CanvasModel canvas = editor.getAdapter(CanvasPage.class).canvas();
			for (double zoom : ZOOMS) {
				byte[] png = PictureExport.png(canvas.pictureAt(CanvasScale.zoom(zoom)), Display.getCurrent(), 1);
				ImageData picture = new ImageData(new ByteArrayInputStream(png));
				assertEquals(ThemeColours.PAPER.get().getRGB(), picture.palette.getRGB(picture.getPixel(1, 1)), name);
				assertTrue(share(picture, ThemeColours.PAPER.get().getRGB()) < 0.99, name + " is as good as blank");
				save(name + "-" + (int) (100 * zoom) + "-" + theme + ".png", png);
			}
			Workbench.closeAll();
		}
	}

	/** Share of the pixels that have a colour. */
	private static double share(ImageData picture, RGB colour) {
		int wanted = picture.palette.getPixel(colour);
		int found = 0;
		int all = 0;
		for (int x = 0; x < picture.width; x += 3) {
			for (int y = 0; y < picture.height; y += 3) {
				all++;
				found += picture.getPixel(x, y) == wanted ? 1 : 0;
			}
		}
		return (double) found / all;
	}

	private static void save(String name, byte[] content) throws IOException {
		Files.createDirectories(Path.of("target/pictures"));
		Files.write(Path.of("target/pictures", name), content);
	}

	private static void theme(String id) {
		PlatformUI.getWorkbench().getService(IThemeEngine.class).setTheme(id, false);
		Workbench.settle();
	}
}
