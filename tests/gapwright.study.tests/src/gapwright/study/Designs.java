package gapwright.study;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;

import gapwright.model.Design;
import gapwright.model.DesignReader;

/** A small gapped ring, and whatever a test changes in its text. */
final class Designs {

	private static final String RING = """
			<?xml version="1.0" encoding="UTF-8"?>
			<gapwright:Design xmi:version="2.0" xmlns:xmi="http://www.omg.org/XMI" xmlns:xsi="http://www.w3.org/2001/XMLSchema-instance" xmlns:gapwright="urn:gapwright:design:1" name="ring">
			  <materials id="ferrite">
			    <curve xsi:type="gapwright:KneeCurve" initialPermeability="2300.0" saturationPolarisation="0.569 T"/>
			    <saturations temperature="25 °C" fluxDensity="0.49 T"/>
			    <saturations temperature="100 °C" fluxDensity="0.39 T"/>
			  </materials>
			  <joints id="a" x="0 mm" y="0 mm"/>
			  <joints id="b" x="40 mm" y="0 mm"/>
			  <legs id="wound" from="a" to="b" material="ferrite" width="12 mm" depth="15 mm">
			    <gaps id="gap" length="1 mm" fringing="WIDENED"/>
			  </legs>
			  <legs id="back" from="b" to="a" material="ferrite" width="12 mm" depth="15 mm" pathLength="90 mm"/>
			  <windings id="main">
			    <coils id="coil" leg="wound" turns="20"/>
			  </windings>
			  <operatingPoints id="full" temperature="100 °C">
			    <drives xsi:type="gapwright:CurrentDrive" id="drive" winding="main" current="10 A" ripple="4 A"/>
			  </operatingPoints>
			</gapwright:Design>
			""";

	private Designs() {
	}

	/** @param changes pairs of what to find and what to put there; each must be found */
	static Design ring(String... changes) {
		String text = RING;
		for (int i = 0; i < changes.length; i += 2) {
			if (!text.contains(changes[i])) {
				throw new AssertionError("the ring has no " + changes[i]);
			}
			text = text.replace(changes[i], changes[i + 1]);
		}
		try {
			return DesignReader.read(new ByteArrayInputStream(text.getBytes(StandardCharsets.UTF_8)), "ring.gapwright");
		} catch (IOException e) {
			throw new AssertionError(e);
		}
	}

	static StudyResult study(String... changes) {
		return Study.of(ring(changes));
	}
}
