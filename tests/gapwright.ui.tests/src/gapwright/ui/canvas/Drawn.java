package gapwright.ui.canvas;

import java.io.IOException;
import java.io.InputStream;

import gapwright.library.Example;
import gapwright.library.Examples;
import gapwright.model.Design;
import gapwright.model.DesignReader;
import gapwright.model.OperatingPoint;
import gapwright.study.Study;
import gapwright.study.StudyResult;
import gapwright.ui.canvas.looks.Picture;
import gapwright.ui.canvas.looks.PictureMaker;
import gapwright.ui.canvas.paint.SvgPen;

/** A design, solved and drawn without a display. */
final class Drawn {

	final Design design;
	final StudyResult result;

	private Drawn(Design design) {
		this.design = design;
		result = Study.of(design);
	}

	static Drawn example(String fileName) {
		Example example = Examples.all().stream().filter(e -> e.fileName().equals(fileName)).findFirst().orElseThrow();
		try (InputStream content = example.open()) {
			return new Drawn(DesignReader.read(content, fileName));
		} catch (IOException e) {
			throw new AssertionError(e);
		}
	}

	Picture at(OperatingPoint point, double zoom) {
		return new PictureMaker(design, point, result.operatingPoint(point.getId()), CanvasScale.zoom(zoom),
				new SvgPen(tone -> "#000000")).make();
	}

	Picture at(double zoom) {
		return at(design.getOperatingPoints().get(0), zoom);
	}
}
