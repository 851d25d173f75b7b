package gapwright.model.edit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotSame;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.Set;
import java.util.TreeSet;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.util.EcoreUtil;
import org.junit.jupiter.api.Test;

import gapwright.model.Design;
import gapwright.model.Element;
import gapwright.model.Ids;
import gapwright.model.Leg;
import gapwright.model.edit.history.Edit;
import gapwright.model.edit.history.EditHistory;

/** What goes when something goes: all that cannot be without it, and nothing else. */
class DeletingTest {

	private static void takes(List<String> deleted, String... gone) {
		Design design = Sample.design();
		Set<String> before = Ids.used(design);
		List<EObject> elements = new ArrayList<>();
		deleted.forEach(id -> elements.add(Sample.<Element>get(design, id)));
		new EditHistory().run(DesignEdits.delete(elements));
		Set<String> missing = new TreeSet<>(before);
		missing.removeAll(Ids.used(design));
		assertEquals(new TreeSet<>(List.of(gone)), missing);
	}

	@Test
	void aJointTakesItsLegsAirPathsAndTheirCoils() {
		takes(List.of("b"), "b", "top", "gap-1", "gap-2", "magnet", "right", "corner", "main-top", "sense-top", "sense",
				"full-sense", "main-sense", "grinding");
	}

	@Test
	void aToleranceGoesWithTheLastOfItsTargets() {
		takes(List.of("gap-1"), "gap-1");
		takes(List.of("gap-1", "gap-2"), "gap-1", "gap-2", "grinding");
		takes(List.of("ferrite"), "ferrite", "firing");
	}

	@Test
	void aConnectionGoesWithTheLastOfItsWindings() {
		takes(List.of("main", "sense"), "main", "main-top", "main-left", "full-main", "cold-main", "sense", "sense-top",
				"full-sense", "main-sense", "both");
	}

	@Test
	void aLegTakesItsCoilsAndAWindingThatHasNoOther() {
		takes(List.of("left"), "left", "main-left");
		takes(List.of("top"), "top", "gap-1", "gap-2", "magnet", "main-top", "sense-top", "sense", "full-sense",
				"main-sense", "grinding");
	}

	@Test
	void theLastCoilTakesItsWindingAndTheWindingItsDrives() {
		takes(List.of("main-top"), "main-top");
		takes(List.of("main-top", "main-left"), "main-top", "main-left", "main", "full-main", "cold-main",
				"main-sense");
		takes(List.of("main"), "main-top", "main-left", "main", "full-main", "cold-main",
				"main-sense");
	}

	@Test
	void whatLiesInsideSomethingDeletedNeedsNoStepOfItsOwn() {
		takes(List.of("gap-1", "top", "magnet"), "top", "gap-1", "gap-2", "magnet", "main-top", "sense-top", "sense", "full-sense",
				"main-sense", "grinding");
		takes(List.of("full", "full-main"), "full", "full-main", "full-sense");
	}

	@Test
	void aMaterialLeavesItsLegsWithoutOne() {
		takes(List.of("ferrite"), "ferrite", "firing");
		Design design = Sample.design();
		new EditHistory().run(DesignEdits.delete(List.of(design.getMaterials().get(0))));
		assertNull(Sample.<Leg>get(design, "top").getMaterial());
		assertEquals("steel", Sample.<Leg>get(design, "bottom").getMaterial().getId());
	}

	@Test
	void nothingThatStaysRefersToSomethingDeleted() {
		for (String id : Ids.used(Sample.design())) {
			Design design = Sample.design();
			new EditHistory().run(DesignEdits.delete(List.of(Sample.<Element>get(design, id))));
			// would not be written if it did
			Sample.read(Sample.text(design));
		}
	}

	@Test
	void anySelectionDeletedLeavesAFileThatReadsAndIsBackAfterUndo() {
		for (int seed = 0; seed < 300; seed++) {
			Random random = new Random(seed);
			Design design = Sample.design();
			String before = Sample.text(design);
			List<EObject> chosen = new ArrayList<>();
			for (String id : new TreeSet<>(Ids.used(design))) {
				if (random.nextInt(6) == 0) {
					chosen.add(Sample.<Element>get(design, id));
				}
			}
			if (chosen.isEmpty()) {
				continue;
			}
			EditHistory history = new EditHistory();
			history.run(DesignEdits.delete(chosen));
			String after = Sample.text(design);
			assertEquals(after, Sample.text(Sample.read(after)), "seed " + seed);
			chosen.forEach(gone -> assertNotSame(design, EcoreUtil.getRootContainer(gone)));
			history.undo();
			assertEquals(before, Sample.text(design), "seed " + seed);
		}
	}

	@Test
	void theUndoMenuSaysWhatWasDeleted() {
		Design design = Sample.design();
		assertEquals("Delete air path", DesignEdits.delete(List.of(design.getAirPaths().get(0))).label());
		assertEquals("Delete 2 elements", DesignEdits.delete(design.getAirPaths()).label());
	}

	@Test
	void nothingAndTheDesignItselfCannotBeDeleted() {
		Design design = Sample.design();
		assertThrows(IllegalArgumentException.class, () -> DesignEdits.delete(List.of()));
		assertThrows(IllegalArgumentException.class, () -> DesignEdits.delete(List.of(design)));
		assertThrows(IllegalArgumentException.class, () -> DesignEdits.delete(List.of(design.getLegs().get(0), design)));
	}

	@Test
	void anEditOfSomethingDeletedMeanwhileLeavesNoTrace() {
		Design design = Sample.design();
		EditHistory history = new EditHistory();
		Leg left = Sample.get(design, "left");
		Edit gap = GapEdits.add(left, LegEditsTest.mm("1 mm"), 0.5);
		history.run(DesignEdits.delete(List.of(left)));
		String after = Sample.text(design);
		assertThrows(RuntimeException.class, () -> history.run(gap));
		assertEquals(after, Sample.text(design));
		assertEquals("Delete leg", history.undoLabel());
		assertTrue(left.getGaps().isEmpty());
	}
}
