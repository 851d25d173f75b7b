package gapwright.model.edit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.lang.reflect.Method;
import java.lang.reflect.Modifier;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.Function;
import java.util.stream.Stream;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.util.EcoreUtil;
import org.junit.jupiter.api.Test;

import gapwright.model.Coil;
import gapwright.model.ConnectionKind;
import gapwright.model.Design;
import gapwright.model.GapwrightFactory;
import gapwright.model.GapwrightPackage.Literals;
import gapwright.model.Joint;
import gapwright.model.KneeCurve;
import gapwright.model.Leg;
import gapwright.model.Material;
import gapwright.model.OperatingPoint;
import gapwright.model.TableCurve;
import gapwright.model.TolerancedFeature;
import gapwright.model.Winding;
import gapwright.model.edit.history.Edit;
import gapwright.model.edit.history.EditHistory;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;

/**
 * Every edit there is goes through do, undo, redo and undo, and the file is compared byte for byte. A new edit joins by
 * one line; a test fails until it has.
 */
class EveryEditTest {

	private static final Path SOURCES = Path.of("../../bundles/gapwright.model.edit/src/gapwright/model/edit");
	/** Class and method, then what distinguishes the case, to an edit of the sample. */
	private static final Map<String, Function<Design, Edit>> EDITS = new LinkedHashMap<>();

	static {
		EDITS.put("JointEdits.add", d -> JointEdits.add(d, 12.3456, -7, made -> { }));
		EDITS.put("JointEdits.move", d -> JointEdits.move(List.of(joint(d, "a"), joint(d, "b")), 2.5, 0));
		EDITS.put("JointEdits.align vertically", d -> JointEdits.align(List.of(joint(d, "a"), joint(d, "b")), true));
		EDITS.put("JointEdits.align horizontally", d -> JointEdits.align(List.of(joint(d, "c"), joint(d, "b")), false));
		EDITS.put("LegEdits.add", d -> LegEdits.add(d, JointSpot.of(joint(d, "a")), JointSpot.at(5, 80), made -> { }));
		EDITS.put("LegEdits.add to nothing yet", d -> LegEdits.add(d, JointSpot.at(0, 80), JointSpot.at(5, 80), made -> { }));
		EDITS.put("LegEdits.addAirPath", d -> LegEdits.addAirPath(d, JointSpot.of(joint(d, "b")), JointSpot.at(5, 80), made -> { }));
		EDITS.put("LegEdits.reattach", d -> LegEdits.reattach(d, leg(d, "top"), true, JointSpot.of(joint(d, "c"))));
		EDITS.put("LegEdits.reattach to a new joint", d -> LegEdits.reattach(d, leg(d, "top"), false, JointSpot.at(60, 60)));
		EDITS.put("LegEdits.reattach an air path", d -> LegEdits.reattach(d, d.getAirPaths().get(0), true, JointSpot.of(joint(d, "b"))));
		EDITS.put("LegEdits.reattach an air path's end", d -> LegEdits.reattach(d, d.getAirPaths().get(0), false, JointSpot.at(60, 60)));
		EDITS.put("LegEdits.widen", d -> LegEdits.widen(leg(d, "top"), 14.25));
		EDITS.put("LegEdits.widen a round leg", d -> LegEdits.widen(leg(d, "right"), 15));
		EDITS.put("LegEdits.widen a leg of given area", d -> LegEdits.widen(leg(d, "bottom"), 12));
		EDITS.put("GapEdits.add", d -> GapEdits.add(leg(d, "left"), mm("0.5 mm"), 0.3));
		EDITS.put("GapEdits.addMagnet", d -> GapEdits.addMagnet(leg(d, "left"), mm("2 mm"), 0.6));
		EDITS.put("GapEdits.addMagnet in place of another", d -> GapEdits.addMagnet(leg(d, "top"), mm("3 mm"), 0.6));
		EDITS.put("CoilEdits.add", d -> CoilEdits.add(d, Sample.get(d, "main"), leg(d, "right"), 7, 0.4, made -> { }));
		EDITS.put("CoilEdits.add with a winding", d -> CoilEdits.add(d, null, leg(d, "right"), 7, 0.4, made -> { }));
		EDITS.put("WindingEdits.add", d -> WindingEdits.add(d, leg(d, "right"), 9));
		EDITS.put("WindingEdits.add on no leg", d -> WindingEdits.add(d, null, 9));
		EDITS.put("WindingEdits.addCoil", d -> WindingEdits.addCoil(Sample.get(d, "sense"), leg(d, "left"), 3));
		EDITS.put("MaterialEdits.add", MaterialEdits::add);
		EDITS.put("MaterialEdits.addCopy", d -> MaterialEdits.addCopy(d, Sample.design().getMaterials().get(1)));
		EDITS.put("MaterialEdits.polarisation", d -> MaterialEdits.polarisation((KneeCurve) material(d).getCurve(),
				Quantity.parse("0.6 T", Dimension.FLUX_DENSITY)));
		EDITS.put("MaterialEdits.changeCurve",
				d -> MaterialEdits.changeCurve(material(d), GapwrightFactory.eINSTANCE.createTableCurve()));
		EDITS.put("MaterialEdits.addCurve", d -> MaterialEdits.addCurve(material(d)));
		EDITS.put("MaterialEdits.addPermeability", d -> MaterialEdits.addPermeability(material(d)));
		EDITS.put("MaterialEdits.addSaturation worked out", d -> MaterialEdits.addSaturation(material(d),
				material(d).getSaturations().get(0).getTemperature(), material(d).getSaturations().get(0).getFluxDensity()));
		EDITS.put("MaterialEdits.addPoint", d -> MaterialEdits.addPoint((TableCurve) d.getMaterials().get(1).getCurve()));
		EDITS.put("MaterialEdits.addSaturation", d -> MaterialEdits.addSaturation(material(d)));
		EDITS.put("MaterialEdits.addSaturation as the first", d -> MaterialEdits.addSaturation(d.getMaterials().get(1)));
		EDITS.put("MaterialEdits.loss", d -> MaterialEdits.loss(material(d), false));
		EDITS.put("MaterialEdits.loss given", d -> MaterialEdits.loss(d.getMaterials().get(1), true));
		EDITS.put("OperatingPointEdits.add", OperatingPointEdits::add);
		EDITS.put("OperatingPointEdits.duplicate", d -> OperatingPointEdits.duplicate(point(d)));
		EDITS.put("OperatingPointEdits.driveByCurrent", d -> OperatingPointEdits.driveByCurrent(point(d), winding(d, "sense")));
		EDITS.put("OperatingPointEdits.driveByVoltage", d -> OperatingPointEdits.driveByVoltage(point(d), winding(d, "main")));
		EDITS.put("OperatingPointEdits.disconnect", d -> OperatingPointEdits.disconnect(point(d), winding(d, "main")));
		EDITS.put("DesignEdits.set", d -> DesignEdits.set("Change", leg(d, "top"), Literals.LEG__DEPTH, mm("16 mm")));
		EDITS.put("DesignEdits.set nothing", d -> DesignEdits.set("Change", leg(d, "left"), Literals.LEG__PATH_LENGTH, null));
		EDITS.put("DesignEdits.set an id", d -> DesignEdits.set("Change", joint(d, "d"), Literals.ELEMENT__ID, "south-west"));
		EDITS.put("DesignEdits.set a reference", d -> DesignEdits.set("Change", leg(d, "left"), Literals.LEG__MATERIAL, d.getMaterials().get(1)));
		EDITS.put("DesignEdits.set a name", d -> DesignEdits.set("Change", d, Literals.DESIGN__NAME, "<\u6c34 & \"pump\">\n2"));
		for (String id : List.of("a", "top", "gap-1", "magnet", "window", "main", "main-top", "sense-top", "full", "full-main",
				"ferrite", "steel", "sense", "main-sense", "both", "grinding", "gap-2")) {
			EDITS.put("DesignEdits.delete " + id, d -> DesignEdits.delete(List.of(Sample.get(d, id))));
		}
		EDITS.put("DesignEdits.delete some of everything",
				d -> DesignEdits.delete(List.of(leg(d, "top"), joint(d, "a"), d.getMaterials().get(0), winding(d, "main"),
						point(d), leg(d, "top").getGaps().get(0), winding(d, "main").getCoils().get(0))));
		EDITS.put("DesignEdits.delete all that is drawn", d -> DesignEdits.delete(d.getJoints()));
		EDITS.put("DesignEdits.remove", d -> DesignEdits.remove("Remove", material(d).getSaturations().get(0)));
		EDITS.put("DesignEdits.limits", d -> DesignEdits.limits(d, false));
		EDITS.put("ToleranceEdits.add", d -> ToleranceEdits.add(d, List.of(leg(d, "top")), TolerancedFeature.WIDTH, mm("0.1 mm")));
		EDITS.put("ToleranceEdits.retarget", d -> ToleranceEdits.retarget(d.getTolerances().get(0), leg(d, "top").getGaps().subList(0, 1)));
		EDITS.put("LeakageEdits.add", d -> LeakageEdits.add(d,
				List.of(new LeakageEdits.Cut(leg(d, "top"), List.of(0.3, 0.8), 0.1, 0.9),
						new LeakageEdits.Cut(leg(d, "left"), List.of(0.5), 0.1, 0.9)),
				List.of(new LeakageEdits.Path(new LeakageEdits.Point(leg(d, "top"), 0.3), new LeakageEdits.Point(leg(d, "left"), 0.5), 12.3456e-9),
						new LeakageEdits.Path(new LeakageEdits.Point(leg(d, "bottom"), 0), new LeakageEdits.Point(leg(d, "top"), 1), 5e-9))));
		EDITS.put("PairEdits.addLeakage", d -> PairEdits.addLeakage(d, winding(d, "sense"), winding(d, "main")));
		EDITS.put("PairEdits.addConnection", d -> PairEdits.addConnection(d, ConnectionKind.PARALLEL, d.getWindings()));
		EDITS.put("PairEdits.join", d -> PairEdits.join(d.getConnections().get(0), winding(d, "main")));
		EDITS.put("Snippet.paste", d -> Snippet.paste(d, Snippet.copy(d.getLegs()), 5, 5, made -> { }));
		EDITS.put("Snippet.paste a joint", d -> Snippet.paste(d, Snippet.copy(List.of(joint(d, "b"))), 5, 5, made -> { }));
	}

	private static Joint joint(Design design, String id) {
		return Sample.get(design, id);
	}

	private static Leg leg(Design design, String id) {
		return Sample.get(design, id);
	}

	private static Winding winding(Design design, String id) {
		return Sample.get(design, id);
	}

	private static OperatingPoint point(Design design) {
		return design.getOperatingPoints().get(0);
	}

	private static Material material(Design design) {
		return design.getMaterials().get(0);
	}

	private static Quantity mm(String text) {
		return Quantity.parse(text, Dimension.LENGTH);
	}

	@Test
	void everyEditUndoesAndRedoesByteForByte() {
		EDITS.forEach((name, make) -> {
			Design design = Sample.design();
			String before = Sample.text(design);
			EditHistory history = new EditHistory();
			Edit edit = make.apply(design);
			history.run(edit);
			String after = Sample.text(design);
			assertNotEquals(before, after, name + ": do");
			assertEquals(edit.label(), history.undoLabel(), name);
			assertTrue(history.isDirty(), name);
			history.undo();
			assertEquals(before, Sample.text(design), name + ": undo");
			assertFalse(history.isDirty(), name);
			history.redo();
			assertEquals(after, Sample.text(design), name + ": redo");
			history.undo();
			assertEquals(before, Sample.text(design), name + ": undo again");
		});
	}

	@Test
	void whateverAnEditLeavesCanBeSavedAndReadBack() {
		EDITS.forEach((name, make) -> {
			Design design = Sample.design();
			new EditHistory().run(make.apply(design));
			String saved = Sample.text(design);
			assertEquals(saved, Sample.text(Sample.read(saved)), name);
		});
	}

	@Test
	void everyEditThatFailsAfterItsChangeLeavesNoTrace() {
		EDITS.forEach((name, make) -> {
			Design design = Sample.design();
			String before = Sample.text(design);
			EditHistory history = new EditHistory();
			Edit failing = new Edit("Fail", design, () -> {
				throw new IllegalStateException(name);
			});
			Edit both = Edit.all("Both", List.of(make.apply(design), failing));
			assertEquals(name, assertThrows(IllegalStateException.class, () -> history.run(both)).getMessage());
			assertEquals(before, Sample.text(design), name);
			assertFalse(history.canUndo() || history.isDirty(), name);
		});
	}

	@Test
	void editsOfAllKindsUndoInTheOrderTheyWereMade() {
		Design design = Sample.design();
		EditHistory history = new EditHistory();
		List<String> texts = new ArrayList<>(List.of(Sample.text(design)));
		for (Map.Entry<String, Function<Design, Edit>> each : EDITS.entrySet()) {
			if (!each.getKey().startsWith("DesignEdits.delete")) {
				history.run(each.getValue().apply(design));
				texts.add(Sample.text(design));
			}
		}
		for (int i = texts.size() - 2; i >= 0; i--) {
			history.undo();
			assertEquals(texts.get(i), Sample.text(design));
		}
		for (int i = 1; i < texts.size(); i++) {
			history.redo();
			assertEquals(texts.get(i), Sample.text(design));
		}
	}

	@Test
	void noEditIsLeftOut() throws IOException, ReflectiveOperationException {
		Set<String> there = new TreeSet<>();
		List<Path> sources;
		try (Stream<Path> all = Files.list(SOURCES)) {
			sources = all.filter(Files::isRegularFile).toList();
		}
		assertTrue(sources.size() > 8, "sources of the bundle not found");
		for (Path source : sources) {
			String type = source.getFileName().toString().replace(".java", "");
			for (Method method : Class.forName("gapwright.model.edit." + type).getDeclaredMethods()) {
				if (method.getReturnType() == Edit.class && Modifier.isPublic(method.getModifiers())) {
					there.add(type + "." + method.getName());
				}
			}
		}
		Set<String> tried = new TreeSet<>();
		EDITS.keySet().forEach(name -> tried.add(name.split(" ")[0]));
		assertEquals(there, tried);
	}

	/** The rule the harness relies on: two designs are equal exactly when their files are. */
	@Test
	void theSampleHasOneOfEverythingSoThatNothingIsLeftUntried() {
		Design design = Sample.design();
		Set<String> kinds = new TreeSet<>();
		for (EObject each : (Iterable<EObject>) design::eAllContents) {
			kinds.add(each.eClass().getName());
		}
		assertTrue(kinds.containsAll(List.of("AirPath", "Coil", "CurrentDrive", "CurvePoint", "Gap", "Joint", "KneeCurve", "Leg",
				"Limits", "Magnet", "Material", "OperatingPoint", "Saturation", "SteinmetzLoss", "TableCurve",
				"VoltageDrive", "Winding")), kinds.toString());
		assertTrue(EcoreUtil.equals(design, Sample.design()));
		Coil coil = winding(design, "main").getCoils().get(1);
		assertTrue(coil.isReversed());
	}
}
