package gapwright.help;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;

import javax.xml.parsers.DocumentBuilderFactory;

import org.junit.jupiter.api.Test;
import org.w3c.dom.Document;
import org.w3c.dom.NodeList;

import gapwright.study.Cautions;

/** The guide is true to what is built, as far as a program can tell: codes, links, context ids, cautions. */
class UserGuideTest {

	private static final Path BUNDLES = Path.of("../../bundles");
	private static final Path HELP = BUNDLES.resolve("gapwright.help");
	private static final Path PAGES = HELP.resolve("html");
	private static final Pattern CODE_IN_TABLE = Pattern.compile("<tr><td><code>([a-z-]+)</code></td><td>(error|warning|note)</td>");
	/** A hyphenated word in quotes: in the packages that find things, every one is a code. */
	private static final Pattern CODE_IN_SOURCE = Pattern.compile("\"([a-z]+(?:-[a-z]+)+)\"");
	private static final Pattern CONTEXT_IN_SOURCE = Pattern.compile("\"gapwright\\.help\\.([A-Za-z]+)\"");

	@Test
	void everyCodeTheProgramGivesStandsInTheTableOfFindingsAndNoOther() throws IOException {
		Set<String> given = new TreeSet<>();
		for (String folder : List.of("gapwright.model/src/gapwright/model/check", "gapwright.study/src")) {
			given.addAll(matches(CODE_IN_SOURCE, sources(BUNDLES.resolve(folder))));
		}
		assertTrue(given.size() >= 30, "only " + given);
		List<String> table = all(CODE_IN_TABLE, Files.readString(PAGES.resolve("findings.html")));
		assertEquals(given, new TreeSet<>(table));
		assertEquals(table.size(), new TreeSet<>(table).size(), "a code stands twice in the table");
	}

	@Test
	void everyPageIsWellFormedAndEveryLinkLeadsToAPage() throws Exception {
		List<Path> pages = pages();
		assertTrue(pages.size() >= 14, "only " + pages);
		for (Path page : pages) {
			NodeList links = parse(page).getElementsByTagName("a");
			for (int i = 0; i < links.getLength(); i++) {
				String target = links.item(i).getAttributes().getNamedItem("href").getNodeValue();
				String[] parts = target.split("#", 2);
				Path to = parts[0].isEmpty() ? page : PAGES.resolve(parts[0]);
				assertTrue(Files.exists(to), page + " links to " + target);
				assertTrue(parts.length == 1 || Files.readString(to).contains("id=\"" + parts[1] + "\""), page + " links to " + target);
			}
			NodeList pictures = parse(page).getElementsByTagName("img");
			for (int i = 0; i < pictures.getLength(); i++) {
				String source = pictures.item(i).getAttributes().getNamedItem("src").getNodeValue();
				assertTrue(Files.exists(PAGES.resolve(source)), page + " shows " + source);
				assertFalse(pictures.item(i).getAttributes().getNamedItem("alt").getNodeValue().isBlank(), source);
			}
		}
	}

	@Test
	void theContentsListEveryPageOnce() throws Exception {
		NodeList topics = parse(HELP.resolve("toc.xml")).getElementsByTagName("topic");
		List<String> listed = new ArrayList<>(List.of("index.html"));
		for (int i = 0; i < topics.getLength(); i++) {
			listed.add(topics.item(i).getAttributes().getNamedItem("href").getNodeValue().replace("html/", ""));
		}
		assertEquals(pages().stream().map(page -> page.getFileName().toString()).sorted().toList(),
				listed.stream().sorted().toList());
	}

	@Test
	void everyTopicOfTheContextHelpLeadsToAPage() throws Exception {
		NodeList topics = parse(HELP.resolve("contexts.xml")).getElementsByTagName("topic");
		assertTrue(topics.getLength() > 0);
		for (int i = 0; i < topics.getLength(); i++) {
			String target = topics.item(i).getAttributes().getNamedItem("href").getNodeValue();
			assertTrue(Files.exists(HELP.resolve(target)), target);
		}
	}

	@Test
	void everyContextTheWorkbenchAsksForIsExplainedAndNoOther() throws Exception {
		NodeList contexts = parse(HELP.resolve("contexts.xml")).getElementsByTagName("context");
		Set<String> explained = new TreeSet<>();
		for (int i = 0; i < contexts.getLength(); i++) {
			explained.add(contexts.item(i).getAttributes().getNamedItem("id").getNodeValue());
		}
		Set<String> asked = matches(CONTEXT_IN_SOURCE, sources(BUNDLES.resolve("gapwright.ui/src")));
		assertFalse(asked.isEmpty());
		assertEquals(asked, explained);
	}

	@Test
	void everyCautionOfTheProgramStandsInTheGuide() throws Exception {
		String page = parse(PAGES.resolve("cautions.html")).getDocumentElement().getTextContent();
		for (String caution : Cautions.all()) {
			assertTrue(page.contains(caution), caution);
		}
	}

	@Test
	void theCheatSheetIsWellFormedAndHoldsACaution() throws Exception {
		String sheet = parse(HELP.resolve("cheatsheets/size-check.xml")).getDocumentElement().getTextContent();
		assertTrue(sheet.contains("can injure"));
	}

	private static List<Path> pages() throws IOException {
		try (Stream<Path> files = Files.list(PAGES)) {
			return files.filter(file -> file.toString().endsWith(".html")).sorted().toList();
		}
	}

	private static List<String> sources(Path folder) throws IOException {
		List<String> texts = new ArrayList<>();
		try (Stream<Path> files = Files.walk(folder)) {
			for (Path file : files.filter(f -> f.toString().endsWith(".java")).toList()) {
				texts.add(Files.readString(file));
			}
		}
		assertFalse(texts.isEmpty(), "no sources in " + folder.toAbsolutePath());
		return texts;
	}

	private static Set<String> matches(Pattern pattern, List<String> texts) {
		Set<String> found = new TreeSet<>();
		texts.forEach(text -> found.addAll(all(pattern, text)));
		return found;
	}

	private static List<String> all(Pattern pattern, String text) {
		List<String> found = new ArrayList<>();
		for (Matcher matcher = pattern.matcher(text); matcher.find();) {
			found.add(matcher.group(1));
		}
		return found;
	}

	private static Document parse(Path file) throws Exception {
		DocumentBuilderFactory factory = DocumentBuilderFactory.newInstance();
		// the pages name no document type beyond HTML's own; nothing is to be fetched
		factory.setFeature("http://apache.org/xml/features/nonvalidating/load-external-dtd", false);
		return factory.newDocumentBuilder().parse(file.toFile());
	}
}
