package gapwright.library.template;

import java.util.List;
import java.util.Map;

import gapwright.model.Design;

/** A core with its winding and an operating point, drawn to scale from a few figures. */
public interface Template {

	/** @return all templates, in the order to show them */
	static List<Template> all() {
		return List.of(new CCoreTemplate(), new ECoreTemplate(), new EICoreTemplate(), new RoundLegTemplate(),
				new PotCoreTemplate(false), new PotCoreTemplate(true), new ThreeLegTemplate(), new ToroidTemplate(),
				new RodTemplate(), new AirSolenoidTemplate(false), new AirSolenoidTemplate(true), new AirToroidTemplate(),
				new EmptyTemplate());
	}

	/** @return stable name */
	String id();

	/** @return what people read */
	String title();

	/** @return a sentence on what comes of it */
	String summary();

	/** @return what it asks for, in the order to ask */
	List<TemplateField> fields();

	/**
	 * What the shape amounts to, for the line below the dimensions: effective parameters of a core by IEC 60205, inductance
	 * of an air-core coil by its formula.
	 *
	 * @param values as in {@link #build}
	 * @return one sentence a line, "" when there is nothing to say
	 * @throws IllegalArgumentException as in {@link #build}
	 */
	default String figures(Map<String, String> values) {
		return "";
	}

	/**
	 * @param values text by field key, as typed; a missing key means the standard
	 * @return a new design, in no resource
	 * @throws IllegalArgumentException with a sentence for the user, naming the field
	 */
	Design build(Map<String, String> values);
}
