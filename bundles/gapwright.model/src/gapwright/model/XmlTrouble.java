package gapwright.model;

import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** What the JDK's XML reader says, in words a user can do something with. */
final class XmlTrouble {

	private static final Pattern WORDLESS = Pattern.compile("http://www\\.w3\\.org/\\S*#(\\w+)\\?(\\S*)");

	private XmlTrouble() {
	}

	/** @return the message without the parser's own address lines */
	static String inWords(String message) {
		int at = message.indexOf("Message: ");
		String plain = (at < 0 ? message : message.substring(at + 9)).strip();
		Matcher wordless = WORDLESS.matcher(plain);
		return wordless.find() ? nameTrouble(wordless.group(1), wordless.group(2).split("&")) : FileChecker.clip(plain);
	}

	/** The JDK's reader has no words for its errors with names and namespaces; it prints an address instead. */
	private static String nameTrouble(String error, String[] names) {
		String last = FileChecker.clip(names[error.equals("ElementPrefixUnbound") ? 0 : names.length - 1]);
		return error.endsWith("NotUnique")
				? "the attribute " + FileChecker.clip(names[Math.min(1, names.length - 1)]) + " is given twice in one element"
				: error.endsWith("PrefixUnbound") ? "the prefix " + last + " is not declared by an xmlns:" + last
						: "the name " + last + " is not allowed (" + ModelWords.words(error) + ")";
	}
}
