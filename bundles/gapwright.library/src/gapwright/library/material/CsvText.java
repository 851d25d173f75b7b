package gapwright.library.material;

import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/**
 * Splits comma-separated text into records, keeping the column of every field for messages, which readers of the kind do
 * not. Quoting as in RFC 4180 (from memory), within one line. Lines that are blank or begin with # are passed over.
 */
final class CsvText {

	private final List<FileProblem> problems;
	private final List<CsvRecord> records = new ArrayList<>();

	private CsvText(List<FileProblem> problems) {
		this.problems = problems;
	}

	/** @param problems receives what is wrong with the text; the records are then incomplete */
	static List<CsvRecord> records(byte[] bytes, List<FileProblem> problems) {
		CsvText csv = new CsvText(problems);
		String text = csv.decode(bytes);
		if (text != null) {
			String[] lines = text.split("\r\n|\r|\n", -1);
			for (int i = 0; i < lines.length; i++) {
				csv.line(i + 1, lines[i]);
			}
		}
		return csv.records;
	}

	private String decode(byte[] bytes) {
		CharsetDecoder decoder = StandardCharsets.UTF_8.newDecoder();
		CharBuffer text = CharBuffer.allocate(bytes.length + 1);
		ByteBuffer input = ByteBuffer.wrap(bytes);
		CoderResult result = decoder.decode(input, text, true);
		text.flip();
		String read = text.toString();
		try {
			if (result.isError()) {
				result.throwException();
			}
		} catch (CharacterCodingException e) {
			String[] before = read.split("\r\n|\r|\n", -1);
			problems.add(new FileProblem(before.length, before[before.length - 1].length() + 1,
					"a byte that is no UTF-8 text", "Save the file as UTF-8, as µ, ² and ° need it."));
			return null;
		}
		return read.startsWith("\uFEFF") ? read.substring(1) : read;
	}

	private void line(int number, String line) {
		String stripped = line.strip();
		if (stripped.isEmpty() || stripped.startsWith("#")) {
			return;
		}
		for (int i = 0; i < line.length(); i++) {
			char c = line.charAt(i);
			if (c < ' ' && c != '\t' || c == 0x7F || c >= 0xFFFE) {
				problems.add(new FileProblem(number, i + 1, "a control character, code " + (int) c, "Plain text only."));
				return;
			}
		}
		List<CsvRecord.Field> fields = new ArrayList<>();
		int at = 0;
		while (true) {
			at = field(number, line, at, fields);
			if (at < 0) {
				return;
			}
			if (at >= line.length()) {
				break;
			}
			at++;
		}
		// spreadsheets pad short rows with empty fields
		while (fields.size() > 1 && fields.get(fields.size() - 1).text().isEmpty()) {
			fields.remove(fields.size() - 1);
		}
		records.add(new CsvRecord(number, List.copyOf(fields)));
	}

	/** @return index of the comma behind the field, or of the line's end; -1 when it cannot be read */
	private int field(int number, String line, int from, List<CsvRecord.Field> fields) {
		int start = from;
		while (start < line.length() && Character.isWhitespace(line.charAt(start))) {
			start++;
		}
		if (start < line.length() && line.charAt(start) == '"') {
			return quoted(number, line, start, fields);
		}
		int comma = line.indexOf(',', from);
		int end = comma < 0 ? line.length() : comma;
		fields.add(new CsvRecord.Field(Math.min(start, end) + 1, line.substring(from, end).strip()));
		return end;
	}

	private int quoted(int number, String line, int quote, List<CsvRecord.Field> fields) {
		StringBuilder text = new StringBuilder();
		int at = quote + 1;
		while (true) {
			int next = line.indexOf('"', at);
			if (next < 0) {
				problems.add(new FileProblem(number, quote + 1, "the quote that begins here does not end on this line",
						"Close it with \", and write a quote inside as \"\"."));
				return -1;
			}
			text.append(line, at, next);
			at = next + 1;
			if (at >= line.length() || line.charAt(at) != '"') {
				break;
			}
			text.append('"');
			at++;
		}
		int comma = line.indexOf(',', at);
		int end = comma < 0 ? line.length() : comma;
		if (!line.substring(at, end).isBlank()) {
			problems.add(new FileProblem(number, at + 1, "text behind a closing quote: '" + line.substring(at, end).strip() + "'",
					"A quote inside a quoted field is written as \"\"."));
			return -1;
		}
		fields.add(new CsvRecord.Field(quote + 1, text.toString().strip()));
		return end;
	}
}
