package gapwright.ui.canvas.looks;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

import org.eclipse.emf.ecore.EObject;

import gapwright.ui.canvas.paint.Pen;

/** The looks of a whole design: elements from the bottom to the top, then the labels. */
public final class Picture {

	private static final double[] NOTHING = { 0, 0, 0, 0 };

	private final Map<EObject, Look> looks = new LinkedHashMap<>();
	private final Map<EObject, LabelLook> labels = new LinkedHashMap<>();
	private final List<LabelLook> headings = new ArrayList<>();

	void add(EObject element, Look look) {
		looks.put(element, look);
	}

	void label(EObject element, LabelLook label) {
		labels.put(element, label);
	}

	void heading(LabelLook heading) {
		headings.add(heading);
	}

	/** @return null while the element has no place */
	public Look look(EObject element) {
		return looks.get(element);
	}

	/** @return elements that have a place, from the bottom to the top */
	public Iterable<EObject> elements() {
		return looks.keySet();
	}

	/** @return every label that found room, by its element */
	public Map<EObject, LabelLook> labels() {
		return labels;
	}

	public List<LabelLook> headings() {
		return headings;
	}

	/** @return the element whose label is there, or null */
	public EObject labelled(double x, double y) {
		return labels.entrySet().stream().filter(entry -> entry.getValue().contains(x, y)).map(Map.Entry::getKey)
				.findFirst().orElse(null);
	}

	/** @return left, top, width, height of all */
	public double[] bounds() {
		List<double[]> boxes = new ArrayList<>();
		looks.values().forEach(look -> boxes.add(look.bounds()));
		labels.values().forEach(label -> boxes.add(label.bounds()));
		headings.forEach(label -> boxes.add(label.bounds()));
		return around(boxes);
	}

	/** @return left, top, width, height of the drawing without its labels */
	public double[] drawingBounds() {
		return around(looks.values().stream().map(Look::bounds).toList());
	}

	private static double[] around(List<double[]> boxes) {
		double[] all = null;
		for (double[] box : boxes) {
			double[] corners = { box[0], box[1], box[0] + box[2], box[1] + box[3] };
			all = all == null ? box : Shapes.bounds(0, new double[] { all[0], all[1], all[0] + all[2], all[1] + all[3] },
					corners);
		}
		return all == null ? NOTHING : all;
	}

	public void paint(Pen pen) {
		paintDrawing(pen);
		paintLabels(pen);
	}

	public void paintDrawing(Pen pen) {
		looks.values().forEach(look -> look.paint(pen));
	}

	public void paintLabels(Pen pen) {
		labels.values().forEach(label -> label.paint(pen));
		headings.forEach(label -> label.paint(pen));
	}
}
