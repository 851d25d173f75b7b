package gapwright.cli;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;

/** Splits a verb's words into files and options; an option with a value takes the next word. */
final class Options {

	private final String verb;
	private final List<String> files = new ArrayList<>();
	private final Map<String, String> given = new HashMap<>();

	/**
	 * @param flags  options without a value, for example "--json"
	 * @param valued options with one
	 * @throws UsageException for an unknown option, one given twice, or one without its value
	 */
	Options(String verb, List<String> arguments, Set<String> flags, Set<String> valued) throws UsageException {
		this.verb = verb;
		boolean optionsOver = false;
		for (int i = 0; i < arguments.size(); i++) {
			String argument = arguments.get(i);
			if (optionsOver || !argument.startsWith("-") || argument.equals("-")) {
				files.add(argument);
			} else if (argument.equals("--")) {
				optionsOver = true;
			} else if (flags.contains(argument)) {
				given.put(argument, "");
			} else if (valued.contains(argument)) {
				if (i + 1 == arguments.size()) {
					throw new UsageException(verb + ": " + argument + " needs a value");
				}
				if (given.put(argument, arguments.get(++i)) != null) {
					throw new UsageException(verb + ": " + argument + " is given twice");
				}
			} else {
				throw new UsageException(verb + ": unknown option '" + argument + "'");
			}
		}
		if (files.isEmpty()) {
			throw new UsageException(verb + ": no file is named");
		}
		if (has("--json") && has("--csv")) {
			throw new UsageException(verb + ": --json and --csv exclude each other");
		}
	}

	List<String> files() {
		return files;
	}

	boolean has(String option) {
		return given.containsKey(option);
	}

	/** @return the option's value, or null when it is not given */
	String value(String option) {
		return given.get(option);
	}

	/** @throws UsageException when the value is no whole number in the range */
	int whole(String option, int otherwise, int least, int most) throws UsageException {
		String text = value(option);
		if (text == null) {
			return otherwise;
		}
		try {
			int number = Integer.parseInt(text);
			if (number >= least && number <= most) {
				return number;
			}
		} catch (NumberFormatException e) {
			// said below, together with what is out of range
		}
		throw new UsageException(verb + ": " + option + " '" + text + "': expected a whole number from " + least + " to " + most);
	}
}
