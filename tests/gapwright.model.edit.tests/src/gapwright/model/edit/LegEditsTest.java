package gapwright.model.edit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.ArrayList;
import java.util.List;

import org.junit.jupiter.api.Test;

import gapwright.model.Coil;
import gapwright.model.Design;
import gapwright.model.GapwrightFactory;
import gapwright.model.GapwrightPackage.Literals;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.edit.history.EditHistory;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;

/** What edits of the drawing do to the figures. */
class LegEditsTest {

	private final Design design = Sample.design();
	private final EditHistory history = new EditHistory();

	static Quantity mm(String text) {
		return Quantity.parse(text, Dimension.LENGTH);
	}

	@Test
	void aMovedJointKeepsTheUnitOfACoordinateThatStays() {
		Joint joint = Sample.get(design, "b");
		history.run(JointEdits.move(List.of(joint), 0, 2.5));
		assertEquals("1.5 in", joint.getX().text());
		assertEquals("2.5 mm", joint.getY().text());
		history.run(JointEdits.move(List.of(joint), 1, 0));
		assertEquals("39.1 mm", joint.getX().text());
	}

	@Test
	void aJointWithoutAPlaceGetsOneByMoving() {
		Joint joint = GapwrightFactory.eINSTANCE.createJoint();
		design.getJoints().add(joint);
		history.run(JointEdits.move(List.of(joint), 3, 0));
		assertEquals("3 mm", joint.getX().text());
		assertEquals("0 mm", joint.getY().text());
	}

	@Test
	void moveAndAlignTakeLegsByTheirJoints() {
		assertEquals(List.of("a", "b", "c"), JointEdits.movedBy(List.of(Sample.<Leg>get(design, "top"), Sample.<Leg>get(design, "right")))
				.stream().map(Joint::getId).toList());
		history.run(JointEdits.align(List.of(Sample.get(design, "a"), Sample.get(design, "c")), true));
		assertEquals("1.5 in", Sample.<Joint>get(design, "a").getX().text());
	}

	@Test
	void aNewLegIsLikeTheLastOneDrawn() {
		List<Leg> made = new ArrayList<>();
		history.run(LegEdits.add(design, JointSpot.of(Sample.get(design, "a")), JointSpot.at(-10, 0), made::add));
		Leg leg = made.get(0);
		assertEquals("leg-1", leg.getId());
		assertEquals("12 mm", leg.getWidth().text());
		assertSame(design.getMaterials().get(0), leg.getMaterial());
		assertEquals("joint-1", leg.getTo().getId());
		assertEquals("-10 mm", leg.getTo().getX().text());
	}

	@Test
	void wideningChangesTheFigureThatMakesTheWidth() {
		Leg top = Sample.get(design, "top");
		Leg right = Sample.get(design, "right");
		Leg bottom = Sample.get(design, "bottom");
		history.run(LegEdits.widen(top, 13.5));
		history.run(LegEdits.widen(right, 13.5));
		history.run(LegEdits.widen(bottom, 13.5));
		assertEquals("13.5 mm", top.getWidth().text());
		assertEquals("13.5 mm", right.getDiameter().text());
		assertEquals("182.25 mm²", bottom.getArea().text());
		for (double width : new double[] { 0, -1, Double.NaN, Double.POSITIVE_INFINITY }) {
			assertThrows(IllegalArgumentException.class, () -> LegEdits.widen(top, width));
		}
	}

	@Test
	void aCoilWithItsOwnWindingIsDrivenAtEveryOperatingPoint() {
		List<Coil> made = new ArrayList<>();
		history.run(CoilEdits.add(design, null, Sample.get(design, "right"), 12, 0.5, made::add));
		assertEquals(List.of("full-main", "full-sense", "drive-1"),
				design.getOperatingPoints().get(0).getDrives().stream().map(drive -> drive.getId()).toList());
		assertSame(made.get(0).eContainer(), design.getOperatingPoints().get(1).getDrives().get(1).getWinding());
	}

	@Test
	void anIdThatIsTakenOrNoneIsRefusedWithTheReason() {
		String before = Sample.text(design);
		assertEquals("the id 'a' belongs to another joint", refused("a"));
		assertEquals("an id must not contain blanks, # or :, nor begin with /", refused("my leg"));
		assertEquals("an id is needed, short and unique in the design", refused(null));
		assertEquals(before, Sample.text(design));
		history.run(DesignEdits.set("Rename", Sample.<Leg>get(design, "top"), Literals.ELEMENT__ID, "top"));
		assertEquals(before, Sample.text(design));
	}

	private String refused(String id) {
		return assertThrows(IllegalArgumentException.class,
				() -> history.run(DesignEdits.set("Rename", Sample.<Leg>get(design, "top"), Literals.ELEMENT__ID, id)))
				.getMessage();
	}
}
