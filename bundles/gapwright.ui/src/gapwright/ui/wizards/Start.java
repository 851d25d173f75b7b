package gapwright.ui.wizards;

import java.io.IOException;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

import gapwright.library.Example;
import gapwright.library.Examples;
import gapwright.library.template.Template;
import gapwright.library.template.TemplateField;
import gapwright.model.Design;
import gapwright.model.DesignReader;

/** What a new design can start from: a core of given dimensions, or a copy of an example. */
abstract class Start {

	/** All of them, cores first. */
	static List<Start> all() {
		List<Start> all = new ArrayList<>();
		Template.all().forEach(template -> all.add(new FromTemplate(template)));
		Examples.all().forEach(example -> all.add(new FromExample(example)));
		return all;
	}

	abstract String title();

	abstract String summary();

	/** What must be given; empty for an example. */
	abstract List<TemplateField> fields();

	/**
	 * @param values as typed, by {@link TemplateField#key}; one left out means what is proposed
	 * @throws IllegalArgumentException with a sentence for the user when the dimensions make no core
	 */
	abstract Design build(Map<String, String> values);

	/** @return what the dimensions amount to, a sentence a line; "" when there is nothing to say */
	String figures(Map<String, String> values) {
		return "";
	}

	abstract boolean isExample();

	private static final class FromTemplate extends Start {

		private final Template template;

		FromTemplate(Template template) {
			this.template = template;
		}

		@Override
		String title() {
			return template.title();
		}

		@Override
		String summary() {
			return template.summary();
		}

		@Override
		List<TemplateField> fields() {
			return template.fields();
		}

		@Override
		Design build(Map<String, String> values) {
			return template.build(values);
		}

		@Override
		String figures(Map<String, String> values) {
			return template.figures(values);
		}

		@Override
		boolean isExample() {
			return false;
		}
	}

	private static final class FromExample extends Start {

		private final Example example;

		FromExample(Example example) {
			this.example = example;
		}

		@Override
		String title() {
			return example.title();
		}

		@Override
		String summary() {
			return example.summary();
		}

		@Override
		List<TemplateField> fields() {
			return List.of();
		}

		@Override
		Design build(Map<String, String> values) {
			try (InputStream in = example.open()) {
				return DesignReader.read(in, example.fileName());
			} catch (IOException e) {
				throw new IllegalStateException("the example " + example.fileName() + " cannot be read", e);
			}
		}

		@Override
		boolean isExample() {
			return true;
		}
	}
}
