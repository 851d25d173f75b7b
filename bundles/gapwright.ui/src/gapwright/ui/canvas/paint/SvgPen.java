package gapwright.ui.canvas.paint;

import java.util.Locale;
import java.util.function.Function;

/** Writes SVG 1.1. */
public final class SvgPen implements Pen {

	/** Mean width of a letter over the size of the font; texts are only measured to keep them apart. */
	private static final double LETTER = 0.6;

	private final StringBuilder body = new StringBuilder();
	private final Function<Tone, String> colour;

	/** @param colour "#rrggbb" of a tone */
	public SvgPen(Function<Tone, String> colour) {
		this.colour = colour;
	}

	/** @return the whole document for a view of x, y, width, height in pixels */
	public String document(double x, double y, double width, double height, String title) {
		return "<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n"
				+ format("<svg xmlns=\"http://www.w3.org/2000/svg\" width=\"%s\" height=\"%s\" viewBox=\"%s %s %s %s\""
						+ " font-family=\"sans-serif\">%n", n(width), n(height), n(x), n(y), n(width), n(height))
				+ "<title>" + escape(title) + "</title>\n"
				+ format("<rect x=\"%s\" y=\"%s\" width=\"%s\" height=\"%s\" fill=\"%s\"/>%n", n(x), n(y), n(width),
						n(height), colour.apply(Tone.PAPER))
				+ body + "</svg>\n";
	}

	@Override
	public void fill(double[] polygon, Tone tone, double opacity) {
		body.append(format("<polygon points=\"%s\" fill=\"%s\"%s/>%n", points(polygon), colour.apply(tone),
				opacity < 1 ? " fill-opacity=\"" + n(opacity) + '"' : ""));
	}

	@Override
	public void outline(double[] polygon, Tone tone, double width) {
		body.append(format("<polygon points=\"%s\" fill=\"none\" stroke=\"%s\" stroke-width=\"%s\"/>%n",
				points(polygon), colour.apply(tone), n(width)));
	}

	@Override
	public void line(double[] points, Tone tone, double width, boolean dashed) {
		body.append(format("<polyline points=\"%s\" fill=\"none\" stroke=\"%s\" stroke-width=\"%s\"%s/>%n",
				points(points), colour.apply(tone), n(width), dashed ? " stroke-dasharray=\"5 4\"" : ""));
	}

	@Override
	public void disc(double x, double y, double radius, Tone fill, Tone stroke, double width) {
		body.append(format("<circle cx=\"%s\" cy=\"%s\" r=\"%s\" fill=\"%s\" stroke=\"%s\" stroke-width=\"%s\"/>%n",
				n(x), n(y), n(radius), colour.apply(fill), colour.apply(stroke), n(width)));
	}

	@Override
	public void text(String text, double x, double y, Align align, double size, boolean bold, Tone tone) {
		String weight = bold ? " font-weight=\"bold\"" : "";
		String anchor = align == Align.START ? "start" : align == Align.MIDDLE ? "middle" : "end";
		// the halo is a text of its own: not every reader of SVG knows the order of painting within one
		body.append(format(
				"<text x=\"%s\" y=\"%s\" text-anchor=\"%s\" font-size=\"%s\"%s fill=\"none\" stroke=\"%s\" stroke-width=\"3\""
						+ " stroke-linejoin=\"round\" aria-hidden=\"true\">%s</text>%n",
				n(x), n(y), anchor, n(size), weight, colour.apply(Tone.PAPER), escape(text)));
		body.append(format(
				"<text x=\"%s\" y=\"%s\" text-anchor=\"%s\" font-size=\"%s\"%s fill=\"%s\">%s</text>%n", n(x), n(y), anchor,
				n(size), weight, colour.apply(tone), escape(text)));
	}

	@Override
	public double textWidth(String text, double size, boolean bold) {
		return text.length() * size * LETTER * (bold ? 1.08 : 1);
	}

	private static String points(double[] points) {
		StringBuilder text = new StringBuilder();
		for (int i = 0; i < points.length; i += 2) {
			text.append(i == 0 ? "" : " ").append(n(points[i])).append(',').append(n(points[i + 1]));
		}
		return text.toString();
	}

	private static String n(double value) {
		String text = String.format(Locale.ROOT, "%.2f", value);
		return text.endsWith(".00") ? text.substring(0, text.length() - 3) : text;
	}

	private static String format(String pattern, Object... values) {
		return String.format(Locale.ROOT, pattern.replace("%n", "\n"), values);
	}

	private static String escape(String text) {
		return text.replace("&", "&amp;").replace("<", "&lt;").replace(">", "&gt;");
	}
}
