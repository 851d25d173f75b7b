package gapwright.model.edit.history;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.concurrent.atomic.AtomicInteger;

import org.eclipse.emf.common.command.AbstractCommand;
import org.eclipse.emf.edit.command.SetCommand;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

import gapwright.model.Design;
import gapwright.model.GapwrightFactory;
import gapwright.model.GapwrightPackage;
import gapwright.model.Joint;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;

class EditHistoryTest {

	private final EditHistory history = new EditHistory();
	private final Design design = GapwrightFactory.eINSTANCE.createDesign();
	private final Joint joint = GapwrightFactory.eINSTANCE.createJoint();

	@BeforeEach
	void aDesignWithOneJoint() {
		joint.setX(mm(10));
		design.getJoints().add(joint);
	}

	private static Quantity mm(double value) {
		return Quantity.of(value, "mm", Dimension.LENGTH);
	}

	private Edit moveTo(double x) {
		return new Edit("Move joint", joint, () -> joint.setX(mm(x)));
	}

	@Test
	void undoRestoresWhatWasThereAndRedoRepeatsIt() {
		history.run(moveTo(12));
		history.undo();
		assertEquals("10 mm", joint.getX().text());
		history.redo();
		assertEquals("12 mm", joint.getX().text());
		history.undo();
		assertEquals("10 mm", joint.getX().text());
	}

	@Test
	void anEditThatThrowsHalfWayLeavesDesignAndHistoryAsTheyWere() {
		history.run(moveTo(12));
		history.markSaved();
		Edit broken = new Edit("Break", design, () -> {
			joint.setX(mm(99));
			design.getJoints().clear();
			throw new IllegalStateException("half way");
		});
		IllegalStateException thrown = assertThrows(IllegalStateException.class, () -> history.run(broken));
		assertEquals("half way", thrown.getMessage());
		assertEquals(List.of(joint), design.getJoints());
		assertEquals("12 mm", joint.getX().text());
		assertFalse(history.isDirty());
		assertEquals("Move joint", history.undoLabel());
	}

	@Test
	void editsJoinedAsOneStepUndoTogetherAndFailTogether() {
		Joint other = GapwrightFactory.eINSTANCE.createJoint();
		Edit add = new Edit("Add joint", design, () -> design.getJoints().add(other));
		history.run(Edit.all("Add and move", List.of(add, moveTo(5))));
		history.undo();
		assertEquals(List.of(joint), design.getJoints());
		assertEquals("10 mm", joint.getX().text());

		Edit broken = new Edit("Break", joint, () -> {
			throw new IllegalArgumentException();
		});
		Edit again = new Edit("Add joint", design, () -> design.getJoints().add(other));
		assertThrows(IllegalArgumentException.class,
				() -> history.run(Edit.all("Both", List.of(again, moveTo(5), broken))));
		assertEquals(List.of(joint), design.getJoints());
		assertEquals("10 mm", joint.getX().text());
	}

	@Test
	void anEditThatChangesNothingLeavesNoStep() {
		history.run(new Edit("Nothing", joint, () -> joint.setX(joint.getX())));
		assertFalse(history.canUndo());
		assertFalse(history.isDirty());
	}

	@Test
	void dirtyTellsWhetherTheDesignDiffersFromTheSavedOne() {
		assertFalse(history.isDirty());
		history.run(moveTo(11));
		assertTrue(history.isDirty());
		history.markSaved();
		history.run(moveTo(12));
		history.undo();
		assertFalse(history.isDirty());
		history.undo();
		assertTrue(history.isDirty());
		history.redo();
		history.markUnsaved();
		assertTrue(history.isDirty());
	}

	@Test
	void theSavedStateIsGoneOnceAnotherBranchOverwritesIt() {
		history.run(moveTo(11));
		history.markSaved();
		history.undo();
		history.run(moveTo(14));
		assertTrue(history.isDirty());
		history.undo();
		assertTrue(history.isDirty());
	}

	@Test
	void aGestureShowsEveryIntermediateStateAndLeavesOneStep() {
		Gesture drag = history.begin();
		for (int x = 11; x <= 20; x++) {
			double to = x;
			drag.show(() -> new Edit("Move joint by " + (to - joint.getX().si() * 1e3), joint, () -> joint.setX(mm(to))));
			assertEquals(x + " mm", joint.getX().text());
			assertFalse(history.canUndo());
		}
		drag.commit();
		assertEquals("Move joint by 10.0", history.undoLabel());
		history.undo();
		assertEquals("10 mm", joint.getX().text());
		assertFalse(history.canUndo());
		history.redo();
		assertEquals("20 mm", joint.getX().text());
	}

	@Test
	void aCancelledGestureLeavesNoTrace() {
		Gesture drag = history.begin();
		drag.show(() -> moveTo(30));
		drag.cancel();
		assertEquals("10 mm", joint.getX().text());
		assertFalse(history.canUndo());
		assertFalse(history.isDirty());
		assertThrows(IllegalStateException.class, () -> drag.show(() -> moveTo(31)));
	}

	@Test
	void anEditFromElsewhereEndsAGestureUnderWay() {
		Gesture drag = history.begin();
		drag.show(() -> moveTo(30));
		history.run(new Edit("Rename", joint, () -> joint.setName("top")));
		assertEquals("10 mm", joint.getX().text());
		history.undo();
		assertEquals(null, joint.getName());
	}

	@Test
	void listenersHearOfStepsUndoRedoSaveAndGestures() {
		AtomicInteger heard = new AtomicInteger();
		history.addListener(heard::incrementAndGet);
		List<Runnable> deeds = List.of(() -> history.run(moveTo(11)), history::undo, history::redo, history::markSaved,
				() -> history.begin().show(() -> moveTo(12)), () -> history.undo());
		for (Runnable deed : deeds) {
			int before = heard.get();
			deed.run();
			assertTrue(heard.get() > before);
		}
	}

	/** EMF's own stack would log the exception and go on as if nothing had happened. */
	@Test
	void anExceptionOfAFrameworksCommandReachesTheCaller() {
		AbstractCommand broken = new AbstractCommand("Break") {

			@Override
			protected boolean prepare() {
				return true;
			}

			@Override
			public void execute() {
				throw new IllegalStateException("half way");
			}

			@Override
			public void redo() {
				execute();
			}
		};
		assertEquals("half way",
				assertThrows(IllegalStateException.class, () -> history.stack().execute(broken)).getMessage());
		assertFalse(history.canUndo());
		assertFalse(history.isDirty());
	}

	@Test
	void aFrameworksCommandAndAnEditShareOneHistory() {
		history.run(moveTo(11));
		history.stack().execute(SetCommand.create(history.domain(), joint, GapwrightPackage.Literals.ELEMENT__NAME, "top"));
		history.run(moveTo(12));
		history.undo();
		assertEquals("11 mm", joint.getX().text());
		history.undo();
		assertEquals(null, joint.getName());
		assertEquals("11 mm", joint.getX().text());
		history.undo();
		assertEquals("10 mm", joint.getX().text());
		assertFalse(history.isDirty());
	}

	@Test
	void anErrorThrownHalfWayIsPutRightAsWell() {
		Edit broken = new Edit("Break", joint, () -> {
			joint.setX(mm(99));
			throw new StackOverflowError();
		});
		assertThrows(StackOverflowError.class, () -> history.run(broken));
		assertEquals("10 mm", joint.getX().text());
	}
}
