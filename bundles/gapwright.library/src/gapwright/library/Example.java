package gapwright.library;

import java.io.InputStream;

/**
 * A design to open and learn from.
 *
 * @param fileName for example "boost-choke.gapwright"
 * @param title    what it is
 * @param summary  a sentence on what it shows
 */
public record Example(String fileName, String title, String summary) {

	/** @return the file's content; to be closed by the caller */
	public InputStream open() {
		return Example.class.getResourceAsStream("/data/examples/" + fileName);
	}
}
