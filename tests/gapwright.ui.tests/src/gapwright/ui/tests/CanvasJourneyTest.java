package gapwright.ui.tests;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;

import org.eclipse.core.runtime.NullProgressMonitor;
import org.eclipse.gef.GraphicalViewer;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Text;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

import gapwright.library.template.Template;
import gapwright.model.AirPath;
import gapwright.model.Design;
import gapwright.model.DesignWriter;
import gapwright.model.Gap;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.study.LegResult;
import gapwright.ui.canvas.CanvasModel;
import gapwright.ui.canvas.CanvasPage;
import gapwright.ui.canvas.looks.AirPathLook;
import gapwright.ui.canvas.parts.ElementPart;
import gapwright.ui.editor.DesignEditor;

/** A designer at the canvas, with a real mouse and keyboard in a real window. */
class CanvasJourneyTest {

	private DesignEditor editor;
	private Mouse mouse;

	@BeforeEach
	void start() throws Exception {
		Workbench.start();
	}

	@AfterEach
	void end() {
		Workbench.closeAll();
	}

	private void open(String example) throws Exception {
		editor = Workbench.open(Workbench.example(example));
		mouse = new Mouse(editor);
	}

	private Design design() {
		return editor.session().design();
	}

	private byte[] bytes() {
		return DesignWriter.bytes(design());
	}

	private Leg leg(String id) {
		return design().getLegs().stream().filter(l -> l.getId().equals(id)).findFirst().orElseThrow();
	}

	private LegResult result(String leg) {
		return editor.session().pointResult().leg(leg);
	}

	private static double x(Joint joint) {
		return joint.getX().si() * 1e3;
	}

	private static double y(Joint joint) {
		return joint.getY().si() * 1e3;
	}

	private String spoken(Object element) {
		Object part = editor.getAdapter(GraphicalViewer.class).getEditPartRegistry().get(element);
		return ((ElementPart) part).spokenName();
	}

	@Test
	void aCoreIsDrawnFromNothingAndShowsItsFluxAtOnce() throws Exception {
		Template empty = Template.all().stream().filter(t -> t.id().equals("empty")).findFirst().orElseThrow();
		editor = Workbench.open(Workbench.file("drawn.gapwright", DesignWriter.bytes(empty.build(Map.of()))));
		mouse = new Mouse(editor);
		double[][] corners = { { 10, 10 }, { 50, 10 }, { 50, 40 }, { 10, 40 }, { 10, 10 } };
		for (int i = 0; i < 4; i++) {
			Workbench.type("l");
			mouse.dragAndDrop(corners[i][0], corners[i][1], corners[i + 1][0], corners[i + 1][1]);
		}
		assertEquals(4, design().getLegs().size());
		assertEquals(4, design().getJoints().size(), "a joint is shared where a leg begins at one");
		Workbench.type("g");
		mouse.click(30, 10);
		Workbench.type("c");
		mouse.click(30, 40);
		assertEquals(1, design().getLegs().get(0).getGaps().size());
		assertEquals(1, design().getWindings().get(0).getCoils().size());
		LegResult wound = editor.session().pointResult().legs().get(2);
		assertNotEquals(0, wound.flux());
		assertTrue(spoken(design().getLegs().get(2)).contains("% of saturation"), spoken(design().getLegs().get(2)));
		assertTrue(editor.isDirty());
		editor.doSave(new NullProgressMonitor());
		assertFalse(editor.isDirty());
		while (editor.session().history().canUndo()) {
			Workbench.key('z', SWT.MOD1);
		}
		assertTrue(design().getLegs().isEmpty() && design().getJoints().isEmpty());
		assertTrue(editor.isDirty());
	}

	@Test
	void figuresFollowAJointWhileItIsDragged() throws Exception {
		open("boost-choke.gapwright");
		byte[] before = bytes();
		double flux = result("left-leg").flux();
		Joint corner = leg("left-leg").getFrom();
		double x = x(corner);
		double y = y(corner);
		mouse.drag(x, y, x - 8, y - 6);
		assertTrue(x(corner) < x - 6 && y(corner) < y - 4, corner.getX() + ", " + corner.getY());
		assertTrue(Math.abs(result("left-leg").flux()) < Math.abs(flux), "a longer leg carries less");
		assertFalse(editor.session().history().canUndo(), "nothing is done before the button comes up");
		Workbench.key(SWT.ESC, 0);
		mouse.up();
		assertArrayEquals(before, bytes(), "Escape leaves no trace");

		mouse.dragAndDrop(x, y, x - 8, y - 6);
		assertEquals("Move joint", editor.session().history().undoLabel());
		Workbench.key('z', SWT.MOD1);
		assertArrayEquals(before, bytes());
		assertFalse(editor.isDirty());
		Workbench.key('Z', SWT.MOD1);
		assertTrue(x(corner) < x - 6);
	}

	@Test
	void aDeletedJointTakesItsLegsAndCoilsAlongAndComesBackWithThem() throws Exception {
		open("boost-choke.gapwright");
		byte[] before = bytes();
		Joint top = leg("centre-leg").getTo();
		mouse.click(x(top), y(top));
		Workbench.key(SWT.DEL, 0);
		assertEquals(4, design().getLegs().size());
		assertTrue(design().getWindings().isEmpty(), "a winding goes with its last coil");
		Workbench.key('z', SWT.MOD1);
		assertArrayEquals(before, bytes());
		assertNotNull(result("centre-leg"));
	}

	@Test
	void aCopiedLegIsPastedWithItsGapAndCoil() throws Exception {
		open("boost-choke.gapwright");
		Leg centre = leg("centre-leg");
		mouse.click(x(centre.getFrom()) + 3, y(centre.getTo()) + 9);
		assertEquals(List.of(centre), editor.getAdapter(CanvasPage.class).selected());
		Workbench.key('c', SWT.MOD1);
		Workbench.key('v', SWT.MOD1);
		assertEquals(8, design().getLegs().size());
		Leg pasted = design().getLegs().get(7);
		assertEquals("1.1 mm", pasted.getGaps().get(0).getLength().text());
		assertEquals(2, design().getWindings().size());
		assertEquals(centre.getMaterial(), pasted.getMaterial());
		assertEquals("Paste", editor.session().history().undoLabel());
	}

	@Test
	void aValueIsTypedOnTheCanvasAndABadOneNeverReachesTheDesign() throws Exception {
		open("boost-choke.gapwright");
		Leg centre = leg("centre-leg");
		Gap gap = centre.getGaps().get(0);
		mouse.click(x(centre.getFrom()) + 2, (y(centre.getFrom()) + y(centre.getTo())) / 2);
		assertEquals(List.of(gap), editor.getAdapter(CanvasPage.class).selected());
		Workbench.key(SWT.F2, 0);
		Text field = Workbench.find(mouse.control(), Text.class, text -> true);
		field.setText("0.9");
		Workbench.key(SWT.CR, 0);
		assertEquals("1.1 mm", gap.getLength().text());
		assertFalse(field.isDisposed(), "a bad entry stays to be mended");
		field.setText("0.9 mm");
		Workbench.focus(field);
		Workbench.key(SWT.CR, 0);
		assertEquals("0.9 mm", gap.getLength().text());
		assertTrue(field.isDisposed());
	}

	@Test
	void theWheelZoomsAtThePointerAndZeroFits() throws Exception {
		open("three-phase-reactor.gapwright");
		CanvasPage page = editor.getAdapter(CanvasPage.class);
		double fitted = page.canvas().scale().zoom();
		var viewport = mouse.control().getViewport();
		double anchor = page.canvas().scale().pixels(100) - viewport.getViewLocation().x;
		mouse.zoom(100, 80, 1);
		mouse.zoom(100, 80, 1);
		assertEquals(fitted * 1.25 * 1.25, page.canvas().scale().zoom(), 1e-9);
		assertEquals(anchor, page.canvas().scale().pixels(100) - viewport.getViewLocation().x, 2);
		Workbench.type("0");
		assertEquals(fitted, page.canvas().scale().zoom(), 1e-9);
	}

	@Test
	void keysAloneMoveAddAndReverse() throws Exception {
		open("boost-choke.gapwright");
		Leg left = leg("left-leg");
		mouse.click(x(left.getFrom()), y(left.getFrom()) + 12);
		double x = x(left.getFrom());
		Workbench.key(SWT.ARROW_LEFT, SWT.MOD1);
		assertEquals(x - 1, x(left.getFrom()), 1e-9);
		Workbench.key('G', SWT.SHIFT);
		assertEquals(1, left.getGaps().size());
		mouse.click(x(left.getFrom()), y(left.getFrom()) + 12);
		Joint from = left.getFrom();
		double flux = result("left-leg").flux();
		Workbench.type("r");
		assertEquals(from, left.getTo());
		assertEquals(-flux, result("left-leg").flux(), 1e-12 * Math.abs(flux));
	}

	@Test
	void aLegsEndIsDraggedToAnotherJointAndItsWallChangesItsWidth() throws Exception {
		open("boost-choke.gapwright");
		Leg right = leg("right-leg");
		mouse.click(x(right.getFrom()), y(right.getFrom()) + 20);
		double width = right.getWidth().si() * 1e3;
		double wallY = y(right.getFrom()) + 3.5 + 0.38 * (y(right.getTo()) - y(right.getFrom()) - 7);
		mouse.dragAndDrop(x(right.getFrom()) + width / 2, wallY, x(right.getFrom()) + width / 2 + 2, wallY);
		assertEquals(width + 4, right.getWidth().si() * 1e3, 0.6);
		assertEquals("Change leg width", editor.session().history().undoLabel());
		Joint middle = leg("centre-leg").getFrom();
		double inset = 14 / editor.getAdapter(CanvasPage.class).canvas().scale().pixelsPerMillimetre();
		mouse.dragAndDrop(x(right.getTo()), y(right.getTo()) - 3.5 - inset, x(middle), y(middle));
		assertEquals(middle, right.getTo());
	}

	@Test
	void anAirPathsEndIsDraggedToAnotherJoint() throws Exception {
		open("coupled-choke.gapwright");
		byte[] before = bytes();
		AirPath path = design().getAirPaths().get(0);
		double[] middle = onCurve(path, true, 1e9);
		mouse.click(middle[0], middle[1]);
		assertEquals(List.of(path), editor.getAdapter(CanvasPage.class).selected());
		Pictures.of(Workbench.shell(), "air-path-selected");
		double[] end = onCurve(path, false, 14);
		Joint other = leg("centre-leg").getTo();
		mouse.dragAndDrop(end[0], end[1], x(other), y(other));
		assertEquals(other, path.getTo());
		assertEquals("Re-attach air path", editor.session().history().undoLabel());
		Workbench.key('z', SWT.MOD1);
		assertArrayEquals(before, bytes());
	}

	/** A point of an air path as drawn, mm. */
	private double[] onCurve(AirPath path, boolean first, double pixels) {
		CanvasModel canvas = editor.getAdapter(CanvasPage.class).canvas();
		double[] at = ((AirPathLook) canvas.picture().look(path)).near(first, pixels);
		return new double[] { canvas.scale().millimetres(at[0]), canvas.scale().millimetres(at[1]) };
	}
}
