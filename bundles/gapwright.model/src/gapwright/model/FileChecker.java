package gapwright.model;

import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;

import javax.xml.stream.XMLStreamConstants;
import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamReader;

import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EClassifier;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.ecore.EStructuralFeature;

/**
 * Checks a whole file against the model before EMF builds one object of it, so that every problem is found with its
 * line and said in the user's words, and nothing is ever half loaded. Streams; follows no reference out of the file.
 */
final class FileChecker {

	private static final String XMI = "http://www.omg.org/XMI";
	private static final String XSI = "http://www.w3.org/2001/XMLSchema-instance";
	private static final String FAMILY = "urn:gapwright:design:";
	private static final String ELSEWHERE = "a design must not refer to other files";
	/** A file with more wrong than this is no design; the rest would only hide the cause. */
	private static final int MOST_PROBLEMS = 100;

	/** An open element: what it is, and which single children it has had. */
	private record Frame(EClass type, String name, Set<String> singles) {
	}

	private record Reference(String element, EReference feature, String id, int line) {
	}

	private record Known(EClass type, int line) {
	}

	private final String file;
	private final List<ReadProblem> problems = new ArrayList<>();
	private final Map<String, Known> known = new HashMap<>();
	private final List<Reference> references = new ArrayList<>();
	private final Deque<Frame> open = new ArrayDeque<>();

	private FileChecker(String file) {
		this.file = file;
	}

	/** @return what is wrong; empty when EMF can load it */
	static List<ReadProblem> check(String file, byte[] content) {
		FileChecker checker = new FileChecker(file);
		if (content.length == 0) {
			checker.add(0, "", "", "", "the file is empty, expected a design");
		} else {
			String text = checker.decode(content);
			if (text != null) {
				checker.read(text);
			}
		}
		return checker.problems;
	}

	/** @return the text without a byte order mark, or null when it is none in UTF-8 */
	private String decode(byte[] content) {
		ByteBuffer bytes = ByteBuffer.wrap(content);
		try {
			String text = StandardCharsets.UTF_8.newDecoder().decode(bytes).toString();
			return text.startsWith("\uFEFF") ? text.substring(1) : text;
		} catch (CharacterCodingException e) {
			String before = new String(content, 0, bytes.position(), StandardCharsets.UTF_8);
			add(1 + (int) before.chars().filter(c -> c == '\n').count(), "", "", "",
					"not text in UTF-8, so not a design or a damaged one");
			return null;
		}
	}

	private void read(String text) {
		try {
			XMLStreamReader xml = HardenedXml.reader(text);
			String encoding = xml.getCharacterEncodingScheme();
			if (encoding != null && !encoding.equalsIgnoreCase("UTF-8")) {
				add(1, "", "", "encoding=\"" + clip(encoding) + "\"", "a design is written in UTF-8");
				return;
			}
			while (xml.hasNext() && problems.size() < MOST_PROBLEMS) {
				if (!event(xml, xml.next())) {
					return;
				}
			}
		} catch (XMLStreamException e) {
			int line = e.getLocation() == null ? 0 : Math.max(0, e.getLocation().getLineNumber());
			add(line, "", "", "", "truncated or malformed XML: " + XmlTrouble.inWords(e.getMessage()));
			return;
		} catch (RuntimeException e) {
			// the parser's own failure
			add(0, "", "", "", "not readable as XML: " + XmlTrouble.inWords(String.valueOf(e.getMessage())));
			return;
		}
		resolve();
	}

	/** @return whether to read on */
	private boolean event(XMLStreamReader xml, int event) {
		int line = xml.getLocation().getLineNumber();
		switch (event) {
		case XMLStreamConstants.START_ELEMENT:
			return open.isEmpty() ? root(xml, line) : child(xml, line);
		case XMLStreamConstants.END_ELEMENT:
			open.pop();
			return true;
		case XMLStreamConstants.DTD:
		case XMLStreamConstants.ENTITY_REFERENCE:
			add(line, "", "", "", "a document type declaration or entity is not allowed in a design");
			return false;
		case XMLStreamConstants.CHARACTERS:
			if (!xml.isWhiteSpace()) {
				add(line, open.peek().name(), "", clip(xml.getText()), "text between elements is not allowed");
			}
			return true;
		default:
			return true;
		}
	}

	private boolean root(XMLStreamReader xml, int line) {
		String namespace = xml.getNamespaceURI() == null ? "" : xml.getNamespaceURI();
		if (!namespace.equals(GapwrightPackage.eNS_URI)) {
			boolean ours = namespace.startsWith(FAMILY);
			add(line, "", "", ours ? namespace : xml.getLocalName(), ours
					? "written by another version of the format, this program reads " + GapwrightPackage.eNS_URI
							+ "; update it to open the file"
					: "not a Gapwright design, expected a root element gapwright:Design in the namespace "
							+ GapwrightPackage.eNS_URI);
			return false;
		}
		if (!xml.getLocalName().equals("Design")) {
			add(line, "", "", xml.getLocalName(), "expected the root element Design");
			return false;
		}
		enter(xml, GapwrightPackage.Literals.DESIGN, line);
		return true;
	}

	private boolean child(XMLStreamReader xml, int line) {
		Frame parent = open.peek();
		String tag = xml.getLocalName();
		if (xml.getNamespaceURI() != null && !xml.getNamespaceURI().isEmpty()) {
			add(line, parent.name(), "", tag,
					"elements inside a design are written without a namespace, this one is in " + clip(xml.getNamespaceURI()));
			return skip(xml);
		}
		EStructuralFeature feature = parent.type().getEStructuralFeature(tag);
		if (!(feature instanceof EReference reference) || !reference.isContainment()) {
			add(line, parent.name(), "", tag, feature == null
					? "no such element in " + ModelWords.article(parent.type()) + ", allowed are " + ModelWords.children(parent.type())
					: "must be written as an attribute");
			return skip(xml);
		}
		if (!feature.isMany() && !parent.singles().add(tag)) {
			add(line, parent.name(), "", tag, "given twice, allowed once");
		}
		EClass type = typeOf(xml, reference, line);
		if (type == null) {
			return skip(xml);
		}
		enter(xml, type, line);
		return true;
	}

	private EClass typeOf(XMLStreamReader xml, EReference reference, int line) {
		EClass expected = reference.getEReferenceType();
		String given = xml.getAttributeValue(XSI, "type");
		if (given == null) {
			if (!expected.isAbstract()) {
				return expected;
			}
			add(line, open.peek().name(), "xsi:type", "", "missing, allowed are " + ModelWords.concrete(expected));
			return null;
		}
		String name = given.substring(given.indexOf(':') + 1);
		String prefix = given.contains(":") ? given.substring(0, given.indexOf(':')) : "";
		boolean ours = GapwrightPackage.eNS_URI.equals(xml.getNamespaceContext().getNamespaceURI(prefix));
		EClassifier found = ours ? GapwrightPackage.eINSTANCE.getEClassifier(name) : null;
		if (found instanceof EClass type && !type.isAbstract() && expected.isSuperTypeOf(type)) {
			return type;
		}
		add(line, open.peek().name(), "xsi:type", given, "no such " + ModelWords.words(reference.getName()) + ", allowed are "
				+ ModelWords.concrete(expected));
		return null;
	}

	private void enter(XMLStreamReader xml, EClass type, int line) {
		String id = xml.getAttributeValue(null, "id");
		boolean hasId = GapwrightPackage.Literals.ELEMENT.isSuperTypeOf(type);
		String name = hasId && id != null && !id.isBlank() ? id : nameless(type);
		if (hasId) {
			identify(type, id, name, line);
		}
		for (int i = 0; i < xml.getAttributeCount(); i++) {
			String namespace = xml.getAttributeNamespace(i);
			String own = xml.getAttributeLocalName(i);
			if (XSI.equals(namespace) && own.equals("type") && !open.isEmpty()
					|| XMI.equals(namespace) && own.equals("version") && open.isEmpty()) {
				continue;
			}
			if (XSI.equals(namespace) && own.toLowerCase(Locale.ROOT).endsWith("schemalocation")) {
				add(line, name, "xsi:" + own, clip(xml.getAttributeValue(i)), ELSEWHERE);
				continue;
			}
			attribute(type, name, xml.getAttributeLocalName(i), xml.getAttributeValue(i),
					namespace == null || namespace.isEmpty(), line);
		}
		open.push(new Frame(type, name, new HashSet<>()));
	}

	/** Plain values have no id; the message names them with the element they belong to. */
	private String nameless(EClass type) {
		String own = type == GapwrightPackage.Literals.DESIGN ? "Design" : type.getName();
		return open.isEmpty() ? own : open.peek().name() + "/" + own;
	}

	private void identify(EClass type, String id, String name, int line) {
		if (id == null || id.isBlank()) {
			add(line, name, "id", id == null ? "" : id, "an id is needed, short and unique in the design");
			return;
		}
		String wrong = Ids.problem(id);
		if (wrong != null) {
			add(line, name, "id", clip(id), wrong);
		}
		Known before = known.putIfAbsent(id, new Known(type, line));
		if (before != null) {
			add(line, name, "id", id, "given twice, also to " + ModelWords.article(before.type()) + " in line " + before.line());
		}
	}

	private void attribute(EClass type, String element, String name, String value, boolean plainName, int line) {
		if (name.equals("href")) {
			add(line, element, name, clip(value), ELSEWHERE);
			return;
		}
		EStructuralFeature feature = plainName ? type.getEStructuralFeature(name) : null;
		if (feature instanceof EReference reference && !reference.isContainment()) {
			String[] ids = reference.isMany() ? value.strip().split("\\s+") : new String[] { value };
			for (String id : ids) {
				references.add(new Reference(element, reference, id, line));
			}
		} else if (feature instanceof EAttribute attribute) {
			String expected = AttributeText.problem(attribute, value);
			if (expected != null) {
				add(line, element, name, clip(value), expected);
			}
		} else {
			add(line, element, name, clip(value),
					"no such attribute in " + ModelWords.article(type) + ", allowed are " + ModelWords.attributes(type));
		}
	}

	private void resolve() {
		for (Reference reference : references) {
			EClass expected = reference.feature().getEReferenceType();
			Known target = known.get(reference.id());
			if (target == null) {
				add(reference.line(), reference.element(), reference.feature().getName(), clip(reference.id()),
						"there is no " + ModelWords.words(expected.getName()) + " with this id" + (reference.id().contains("#")
								? "; " + ELSEWHERE
								: ""));
			} else if (!expected.isSuperTypeOf(target.type())) {
				add(reference.line(), reference.element(), reference.feature().getName(), reference.id(),
						"that is " + ModelWords.article(target.type()) + ", expected " + ModelWords.article(expected));
			}
		}
	}

	/** Passes over an element that has been reported, with all below it. */
	private boolean skip(XMLStreamReader xml) {
		try {
			int depth = 1;
			while (depth > 0 && xml.hasNext()) {
				int event = xml.next();
				depth += event == XMLStreamConstants.START_ELEMENT ? 1
						: event == XMLStreamConstants.END_ELEMENT ? -1 : 0;
			}
			return true;
		} catch (XMLStreamException e) {
			add(e.getLocation().getLineNumber(), "", "", "", "truncated or malformed XML: " + XmlTrouble.inWords(e.getMessage()));
			return false;
		}
	}

	private void add(int line, String element, String attribute, String found, String expected) {
		if (problems.size() < MOST_PROBLEMS) {
			problems.add(new ReadProblem(file, line, element, attribute, found, expected));
		}
	}

	/** One line, not endlessly long. */
	static String clip(String text) {
		String oneLine = text.strip().replaceAll("\\s+", " ");
		return oneLine.length() > 200 ? oneLine.substring(0, 200) + "…" : oneLine;
	}
}
