package gapwright.model.edit;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Collection;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Consumer;

import org.eclipse.emf.common.util.TreeIterator;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.util.EcoreUtil;

import gapwright.model.AirPath;
import gapwright.model.Coil;
import gapwright.model.Design;
import gapwright.model.DesignReader;
import gapwright.model.DesignWriter;
import gapwright.model.Element;
import gapwright.model.GapwrightFactory;
import gapwright.model.Ids;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.LegGeometry;
import gapwright.model.Material;
import gapwright.model.Winding;
import gapwright.model.edit.history.Edit;

/**
 * Part of a design for the clipboard: a small design file of its own as text, with everything the copied legs need.
 */
public final class Snippet {

	private Snippet() {
	}

	/**
	 * Legs with their joints, gaps, magnets and materials; windings with the coils that sit on those legs; air paths
	 * between joints that are copied.
	 *
	 * @return the text, or "" when nothing selected can be copied
	 */
	public static String copy(Collection<? extends EObject> selected) {
		Set<EObject> chosen = new HashSet<>(selected);
		Set<Joint> joints = JointEdits.movedBy(selected);
		if (joints.isEmpty()) {
			return "";
		}
		Design design = (Design) joints.iterator().next().eContainer();
		EcoreUtil.Copier copier = new EcoreUtil.Copier();
		Design part = GapwrightFactory.eINSTANCE.createDesign();
		part.setName("copied");
		Set<Material> materials = new HashSet<>();
		Set<Leg> legs = new HashSet<>();
		for (Leg leg : design.getLegs()) {
			if (chosen.contains(leg)) {
				legs.add(leg);
				materials.add(leg.getMaterial());
			}
		}
		design.getMaterials().stream().filter(materials::contains)
				.forEach(m -> part.getMaterials().add((Material) copier.copy(m)));
		design.getJoints().stream().filter(joints::contains)
				.forEach(j -> part.getJoints().add((Joint) copier.copy(j)));
		design.getLegs().stream().filter(legs::contains).forEach(l -> part.getLegs().add((Leg) copier.copy(l)));
		design.getAirPaths().stream().filter(chosen::contains)
				.forEach(p -> part.getAirPaths().add((AirPath) copier.copy(p)));
		for (Winding winding : design.getWindings()) {
			if (winding.getCoils().stream().anyMatch(coil -> legs.contains(coil.getLeg()))) {
				Winding copy = (Winding) copier.copy(winding);
				List<Coil> elsewhere = new ArrayList<>();
				for (Coil coil : winding.getCoils()) {
					if (!legs.contains(coil.getLeg())) {
						elsewhere.add((Coil) copier.get(coil));
					}
				}
				copy.getCoils().removeAll(elsewhere);
				part.getWindings().add(copy);
			}
		}
		copier.copyReferences();
		return new String(DesignWriter.bytes(part), StandardCharsets.UTF_8);
	}

	/** @return whether a text is something {@link #paste} understands */
	public static boolean isSnippet(String text) {
		return text != null && text.startsWith("<?xml") && text.contains("gapwright:Design") && read(text) != null;
	}

	/**
	 * Adds a copied part with fresh ids, a step right and down; a material that the design already has, the
	 * same in every figure, is used; others are added.
	 *
	 * @param text   from {@link #copy}
	 * @param pasted is told of the legs and joints once they are there
	 * @throws IllegalArgumentException when the text is no snippet
	 */
	public static Edit paste(Design design, String text, double dx, double dy, Consumer<List<EObject>> pasted) {
		Design part = read(text);
		if (part == null) {
			throw new IllegalArgumentException("the clipboard holds no part of a design");
		}
		return new Edit("Paste", design, () -> {
			useOwnMaterials(design, part);
			Set<String> used = Ids.used(design);
			for (TreeIterator<EObject> all = part.eAllContents(); all.hasNext();) {
				EObject next = all.next();
				if (next instanceof Element element) {
					element.setId(Ids.next(used, element.getId().replaceFirst("-\\d+$", "")));
				}
				if (next instanceof Joint joint) {
					joint.setX(JointSpot.millimetres(LegGeometry.si(joint.getX()) * 1e3 + dx));
					joint.setY(JointSpot.millimetres(LegGeometry.si(joint.getY()) * 1e3 + dy));
				}
			}
			List<EObject> selection = new ArrayList<>(part.getJoints());
			selection.addAll(part.getLegs());
			selection.addAll(part.getAirPaths());
			design.getMaterials().addAll(List.copyOf(part.getMaterials()));
			design.getJoints().addAll(List.copyOf(part.getJoints()));
			design.getLegs().addAll(List.copyOf(part.getLegs()));
			design.getAirPaths().addAll(List.copyOf(part.getAirPaths()));
			design.getWindings().addAll(List.copyOf(part.getWindings()));
			pasted.accept(selection);
		});
	}

	private static void useOwnMaterials(Design design, Design part) {
		for (Material theirs : List.copyOf(part.getMaterials())) {
			if (Ids.find(design, theirs.getId()) instanceof Material ours && EcoreUtil.equals(ours, theirs)) {
				for (Leg leg : part.getLegs()) {
					if (leg.getMaterial() == theirs) {
						leg.setMaterial(ours);
					}
				}
				part.getMaterials().remove(theirs);
			}
		}
	}

	private static Design read(String text) {
		try {
			return DesignReader.read(new ByteArrayInputStream(text.getBytes(StandardCharsets.UTF_8)), "clipboard");
		} catch (IOException e) {
			return null;
		}
	}
}
