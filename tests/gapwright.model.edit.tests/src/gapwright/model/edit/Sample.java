package gapwright.model.edit;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Map;

import org.eclipse.emf.common.util.URI;

import gapwright.model.Design;
import gapwright.model.DesignResource;
import gapwright.model.DesignWriter;
import gapwright.model.Element;
import gapwright.model.Ids;

/** A design with one of everything, in a resource of its own as in the editor. */
final class Sample {

	private static final String TEXT = """
			<?xml version="1.0" encoding="UTF-8"?>
			<gapwright:Design xmi:version="2.0" xmlns:xmi="http://www.omg.org/XMI" xmlns:xsi="http://www.w3.org/2001/XMLSchema-instance" xmlns:gapwright="urn:gapwright:design:1" name="sample">
			  <materials id="ferrite" density="4800 kg/m³">
			    <curve xsi:type="gapwright:KneeCurve" initialPermeability="2300.0" saturationPolarisation="0.5 T"/>
			    <saturations temperature="25 °C" fluxDensity="0.49 T"/>
			    <saturations temperature="100 °C" fluxDensity="0.39 T"/>
			    <loss coefficient="1.5" frequencyExponent="1.4" fluxDensityExponent="2.5" minimumFrequency="25 kHz"/>
			  </materials>
			  <materials id="steel">
			    <curve xsi:type="gapwright:TableCurve">
			      <points fieldStrength="50 A/m" fluxDensity="0.7 T"/>
			      <points fieldStrength="5 Oe" fluxDensity="1.4 T"/>
			    </curve>
			  </materials>
			  <joints id="a" x="0 mm" y="0 mm"/>
			  <joints id="b" x="1.5 in" y="0 mm"/>
			  <joints id="c" x="1.5 in" y="40 mm"/>
			  <joints id="d" x="0 mm" y="40 mm"/>
			  <legs id="top" from="a" to="b" material="ferrite" width="12 mm" depth="15 mm">
			    <gaps id="gap-1" length="0.80 mm" fringing="WIDENED"/>
			    <gaps id="gap-2" length="20mil" pieces="2" position="0.25"/>
			    <magnet id="magnet" length="2 mm" remanence="1.1 T"/>
			  </legs>
			  <legs id="right" from="b" to="c" material="ferrite" shape="ROUND" diameter="14 mm"/>
			  <legs id="bottom" from="c" to="d" material="steel" shape="GIVEN" area="1.8 cm²" stackingFactor="0.95"/>
			  <legs id="left" from="d" to="a" material="ferrite" width="12 mm" depth="15 mm" pathLength="45 mm"/>
			  <airPaths id="window" from="a" to="c" permeance="20 nH"/>
			  <airPaths id="corner" from="b" to="d" area="10 mm²" length="40 mm"/>
			  <windings id="main" wire="AWG 18">
			    <coils id="main-top" leg="top" turns="20"/>
			    <coils id="main-left" leg="left" turns="10" reversed="true"/>
			  </windings>
			  <windings id="sense" resistance="30 mΩ">
			    <coils id="sense-top" leg="top" turns="5" position="0.75"/>
			  </windings>
			  <operatingPoints id="full" name="full load" temperature="100 °C" frequency="50 kHz">
			    <drives xsi:type="gapwright:CurrentDrive" id="full-main" winding="main" current="5 A" ripple="1 A"/>
			    <drives xsi:type="gapwright:VoltageDrive" id="full-sense" winding="sense" voltage="24 V" onTime="5 µs"/>
			  </operatingPoints>
			  <operatingPoints id="cold" temperature="-20 °C">
			    <drives xsi:type="gapwright:CurrentDrive" id="cold-main" winding="main" current="2 A"/>
			  </operatingPoints>
			  <limits nearFraction="0.75"/>
			  <leakages id="main-sense" first="main" second="sense" firstBuild="3 mm" secondBuild="1 mm" separation="0.2 mm" height="20 mm" meanTurn="60 mm"/>
			  <connections id="both">
			    <members winding="main"/>
			    <members winding="sense" reversed="true"/>
			  </connections>
			  <tolerances id="grinding" targets="gap-1 gap-2" deviation="0.05 mm"/>
			  <tolerances id="firing" targets="ferrite" feature="PERMEABILITY" deviation="25 %" distribution="NORMAL"/>
			</gapwright:Design>
			""";

	private Sample() {
	}

	/** @return a new one at each call */
	static Design design() {
		return read(TEXT);
	}

	static Design read(String text) {
		DesignResource resource = new DesignResource(URI.createURI("sample.gapwright"));
		try {
			resource.load(new ByteArrayInputStream(text.getBytes(StandardCharsets.UTF_8)), Map.of());
		} catch (IOException e) {
			throw new UncheckedIOException(e);
		}
		return resource.design();
	}

	static String text(Design design) {
		return new String(DesignWriter.bytes(design), StandardCharsets.UTF_8);
	}

	/** @return the element with that id, of the type the caller needs */
	@SuppressWarnings("unchecked")
	static <T extends Element> T get(Design design, String id) {
		Element found = Ids.find(design, id);
		if (found == null) {
			throw new IllegalArgumentException("no element " + id);
		}
		return (T) found;
	}
}
