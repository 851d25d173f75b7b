package gapwright.model.edit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;

import org.eclipse.emf.ecore.EObject;
import org.junit.jupiter.api.Test;

import gapwright.model.Coil;
import gapwright.model.Design;
import gapwright.model.GapwrightFactory;
import gapwright.model.Leg;
import gapwright.model.Winding;
import gapwright.model.check.DesignCheck;
import gapwright.model.check.Severity;
import gapwright.model.edit.history.EditHistory;

/** Copy and paste, within a design and between two. */
class SnippetTest {

	private final Design design = Sample.design();
	private final EditHistory history = new EditHistory();

	private List<EObject> paste(Design into, String text) {
		List<EObject> pasted = new ArrayList<>();
		history.run(Snippet.paste(into, text, 5, 5, pasted::addAll));
		return pasted;
	}

	@Test
	void aPastedLegStandsBesideItsOriginalWithIdsOfItsOwn() {
		List<EObject> pasted = paste(design, Snippet.copy(List.of(Sample.<Leg>get(design, "top"))));
		Leg leg = (Leg) pasted.get(2);
		assertEquals("top-1", leg.getId());
		assertEquals(List.of("gap-3", "gap-4"), leg.getGaps().stream().map(gap -> gap.getId()).toList());
		assertEquals("0.80 mm", leg.getGaps().get(0).getLength().text());
		assertEquals("5 mm", leg.getFrom().getX().text());
		assertEquals("43.1 mm", leg.getTo().getX().text());
		assertSame(design.getMaterials().get(0), leg.getMaterial());
		assertEquals(2, design.getMaterials().size());
	}

	@Test
	void coilsOnCopiedLegsComeAlongInWindingsOfTheirOwn() {
		paste(design, Snippet.copy(List.of(Sample.<Leg>get(design, "top"))));
		assertEquals(List.of("main", "sense", "main-1", "sense-1"), design.getWindings().stream().map(Winding::getId).toList());
		List<Coil> coils = design.getWindings().get(2).getCoils();
		assertEquals(1, coils.size());
		assertEquals("top-1", coils.get(0).getLeg().getId());
	}

	@Test
	void pastingTwiceGivesTwoIndependentCopies() {
		String text = Snippet.copy(design.getLegs());
		paste(design, text);
		paste(design, text);
		assertEquals(12, design.getLegs().size());
		Sample.read(Sample.text(design));
		assertTrue(DesignCheck.check(design).stream().noneMatch(problem -> problem.severity() == Severity.ERROR),
				DesignCheck.check(design).toString());
	}

	@Test
	void pastingIntoAnotherDesignBringsTheMaterialsAlong() {
		Design empty = Sample.read(Sample.text(GapwrightFactory.eINSTANCE.createDesign()));
		paste(empty, Snippet.copy(design.getLegs()));
		assertEquals(4, empty.getLegs().size());
		assertEquals(2, empty.getMaterials().size());
		assertEquals(Sample.text(empty), Sample.text(Sample.read(Sample.text(empty))));
	}

	/** A material is not its name: the same id with other figures must not be taken for it. */
	@Test
	void aMaterialOfTheSameIdWithOtherFiguresIsAddedUnderAnother() {
		String text = Snippet.copy(List.of(Sample.<Leg>get(design, "left")));
		Design other = Sample.design();
		other.getMaterials().get(0).getSaturations().remove(1);
		Leg leg = (Leg) paste(other, text).get(2);
		assertEquals("ferrite-1", leg.getMaterial().getId());
		assertEquals(2, leg.getMaterial().getSaturations().size());
		assertEquals(1, other.getMaterials().get(0).getSaturations().size());
	}

	@Test
	void airPathsAreCopiedWithTheirJoints() {
		List<EObject> pasted = paste(design, Snippet.copy(List.of(design.getAirPaths().get(0))));
		assertEquals(3, pasted.size());
		assertEquals("window-1", design.getAirPaths().get(2).getId());
		assertSame(pasted.get(0), design.getAirPaths().get(2).getFrom());
	}

	@Test
	void whatCannotBeDrawnByItselfCopiesNothing() {
		assertEquals("", Snippet.copy(List.of()));
		assertEquals("", Snippet.copy(List.of(design.getMaterials().get(0))));
	}

	@Test
	void otherTextOnTheClipboardIsLeftAlone() {
		for (String text : new String[] { null, "", "12 mm", "<?xml version=\"1.0\"?><html/>",
				"<?xml version=\"1.0\"?><gapwright:Design xmlns:gapwright=\"urn:gapwright:design:9\"/>" }) {
			assertFalse(Snippet.isSnippet(text));
		}
		assertTrue(Snippet.isSnippet(Snippet.copy(design.getLegs())));
		assertThrows(IllegalArgumentException.class, () -> Snippet.paste(design, "12 mm", 0, 0, pasted -> { }));
	}
}
