package gapwright.help;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

import javax.xml.parsers.DocumentBuilderFactory;

import org.junit.jupiter.api.Test;
import org.w3c.dom.NodeList;

import gapwright.study.provenance.FigureGroup;
import gapwright.study.provenance.Origin;
import gapwright.study.provenance.Provenance;

/** The guide's table of sources says what the program says. */
class ProvenancePageTest {

	@Test
	void theTableOfSourcesIsTheProgramsOwn() throws Exception {
		DocumentBuilderFactory factory = DocumentBuilderFactory.newInstance();
		factory.setFeature("http://apache.org/xml/features/nonvalidating/load-external-dtd", false);
		NodeList cells = factory.newDocumentBuilder().parse(Path.of("../../bundles/gapwright.help/html/provenance.html").toFile())
				.getElementsByTagName("td");
		List<String> printed = new ArrayList<>();
		for (int i = 0; i < cells.getLength(); i++) {
			printed.add(cells.item(i).getTextContent());
		}
		List<String> ours = new ArrayList<>();
		for (FigureGroup group : FigureGroup.values()) {
			Origin origin = Provenance.of(group);
			ours.addAll(List.of(group.key(), group.title(), origin.formula(), origin.source(), origin.validity()));
		}
		assertEquals(ours, printed);
	}
}
