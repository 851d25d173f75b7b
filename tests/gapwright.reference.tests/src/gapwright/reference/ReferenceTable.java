package gapwright.reference;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/** The rows as comma-separated values, all of them, and as a page of the user guide, one line for figures of one kind. */
final class ReferenceTable {

	private static final String HEAD = """
			<!DOCTYPE html>
			<html xmlns="http://www.w3.org/1999/xhtml" lang="en-GB">
			<head>
			<meta charset="UTF-8"/>
			<title>Figures from outside</title>
			<link rel="stylesheet" href="guide.css"/>
			</head>
			<body>
			<p class="nav"><a href="index.html">User guide</a></p>
			<h1>Figures from outside</h1>
			<p>What this program computes, beside figures that others computed or printed. Where a case has many figures of one kind, the
			largest stands here and the difference is the greatest of all, relative to the largest. Printed figures are held to half a unit of
			their last digit. What gap methods and whole gapped cores are worth against field solutions stands under
			<a href="gaps.html">Gaps and magnets</a>. The program's tests make this page and fail when it is not current.</p>
			<table>
			<tr><th>case</th><th>source</th><th>figure</th><th>ours</th><th>theirs</th><th>difference</th></tr>
			""";

	private final List<Row> rows;

	ReferenceTable(List<Row> rows) {
		this.rows = rows;
	}

	String csv() {
		StringBuilder text = new StringBuilder("case,source,figure,ours,theirs,difference\n");
		for (Row row : rows) {
			text.append(String.format(Locale.ROOT, "\"%s\",\"%s\",\"%s\",%s,%s,%.3e%n", row.kase(), row.source(), row.figure(), row.ours(),
					row.theirs(), row.difference()));
		}
		return text.toString().replace("\r", "");
	}

	String page() {
		Map<String, List<Row>> groups = new LinkedHashMap<>();
		for (Row row : rows) {
			groups.computeIfAbsent(row.kase() + "|" + row.source() + "|" + row.figure().replaceAll(" \\[.*", ""), key -> new ArrayList<>()).add(row);
		}
		StringBuilder text = new StringBuilder(HEAD);
		for (List<Row> group : groups.values()) {
			Row largest = group.get(0);
			double worst = 0;
			for (Row row : group) {
				largest = Math.abs(row.theirs()) > Math.abs(largest.theirs()) ? row : largest;
				worst = Math.abs(row.difference()) > Math.abs(worst) ? row.difference() : worst;
			}
			text.append("<tr><td>").append(escape(largest.kase())).append("</td><td>").append(escape(largest.source())).append("</td><td>")
					.append(escape(group.size() == 1 ? largest.figure().replaceAll(" \\[.*", "")
							: largest.figure().replaceAll(" \\[.*", "") + ", largest of " + group.size()))
					.append("</td><td>").append(figure(largest.ours())).append("</td><td>").append(figure(largest.theirs())).append("</td><td>")
					.append(difference(worst)).append("</td></tr>\n");
		}
		return text + "</table>\n</body>\n</html>\n";
	}

	private static String escape(String text) {
		return text.replace("&", "&amp;").replace("<", "&lt;").replace(">", "&gt;");
	}

	/** Five digits: more would differ from machine to machine. */
	private static String figure(double value) {
		return String.format(Locale.ROOT, "%.5g", value);
	}

	private static String difference(double value) {
		return Math.abs(value) < 1e-9 ? "below 10⁻⁹" : String.format(Locale.ROOT, "%+.1e", value);
	}
}
