package slantfall.figure;

import java.util.Locale;
import java.util.Map;

/** Writes a figure as SVG. */
public final class SvgPen implements Pen {

    private final StringBuilder body = new StringBuilder();
    private final Map<Ink, String> colours;
    private final double width;
    private final double height;
    private int clips;

    /**
     * Starts a picture.
     *
     * @param width [px]
     * @param height [px]
     * @param colours a colour for every ink, from {@link Palette}
     */
    public SvgPen(double width, double height, Map<Ink, String> colours) {
        this.width = width;
        this.height = height;
        this.colours = colours;
    }

    /** The finished picture. */
    public String text() {
        return "<svg xmlns=\"http://www.w3.org/2000/svg\" width=\"" + n(width) + "\" height=\"" + n(height) + "\" viewBox=\"0 0 "
                + n(width) + " " + n(height) + "\" font-family=\"sans-serif\">\n<rect width=\"100%\" height=\"100%\" fill=\""
                + colours.get(Ink.PAPER) + "\"/>\n" + body + "</svg>\n";
    }

    @Override
    public void line(Stroke stroke, double x1, double y1, double x2, double y2) {
        body.append("<line x1=\"").append(n(x1)).append("\" y1=\"").append(n(y1)).append("\" x2=\"").append(n(x2))
                .append("\" y2=\"").append(n(y2)).append('"').append(style(stroke)).append("/>\n");
    }

    @Override
    public void polyline(Stroke stroke, double[] x, double[] y, int count) {
        body.append("<polyline fill=\"none\" points=\"").append(points(x, y, count)).append('"').append(style(stroke))
                .append("/>\n");
    }

    @Override
    public void area(Ink ink, double opacity, double[] x, double[] y, int count) {
        body.append("<polygon points=\"").append(points(x, y, count)).append("\" fill=\"").append(colours.get(ink))
                .append("\" fill-opacity=\"").append(n(opacity)).append("\"/>\n");
    }

    @Override
    public void disc(Ink ink, double x, double y, double radius, boolean filled) {
        String fill = filled ? colours.get(ink) : colours.get(Ink.PAPER);
        String edge = filled ? colours.get(Ink.PAPER) : colours.get(ink);
        body.append("<circle cx=\"").append(n(x)).append("\" cy=\"").append(n(y)).append("\" r=\"").append(n(radius))
                .append("\" fill=\"").append(fill).append("\" stroke=\"").append(edge).append("\" stroke-width=\"1.5\"/>\n");
    }

    @Override
    public void text(Lettering l, String text, double x, double y) {
        String anchor = l.anchor() < 0 ? "start" : l.anchor() > 0 ? "end" : "middle";
        body.append("<text x=\"").append(n(x)).append("\" y=\"").append(n(y)).append("\" font-size=\"").append(n(l.size()))
                .append("\" text-anchor=\"").append(anchor).append("\" fill=\"").append(colours.get(l.ink())).append('"');
        if (l.bold()) {
            body.append(" font-weight=\"bold\"");
        }
        if (l.turn() != 0) {
            body.append(" transform=\"rotate(").append(n(-l.turn())).append(' ').append(n(x)).append(' ').append(n(y)).append(")\"");
        }
        body.append('>').append(escape(text)).append("</text>\n");
    }

    /** An estimate, on the wide side: a file is opened with fonts that are not known here. */
    @Override
    public double width(Lettering l, String text) {
        return Letters.width(text, l.size(), l.bold());
    }

    @Override
    public void clip(Rect r) {
        clips++;
        body.append("<clipPath id=\"c").append(clips).append("\"><rect x=\"").append(n(r.x())).append("\" y=\"").append(n(r.y()))
                .append("\" width=\"").append(n(r.w())).append("\" height=\"").append(n(r.h())).append("\"/></clipPath>\n")
                .append("<g clip-path=\"url(#c").append(clips).append(")\">\n");
    }

    @Override
    public void unclip() {
        body.append("</g>\n");
    }

    private String style(Stroke s) {
        return " stroke=\"" + colours.get(s.ink()) + "\" stroke-width=\"" + n(s.width()) + "\" stroke-linejoin=\"round\""
                + (s.dashed() ? " stroke-dasharray=\"4 3\"" : "");
    }

    private static String points(double[] x, double[] y, int count) {
        StringBuilder points = new StringBuilder();
        for (int i = 0; i < count; i++) {
            points.append(n(x[i])).append(',').append(n(y[i])).append(' ');
        }
        return points.toString().stripTrailing();
    }

    private static String n(double value) {
        return String.format(Locale.ROOT, "%.2f", value);
    }

    private static String escape(String text) {
        StringBuilder escaped = new StringBuilder();
        text.codePoints().filter(SvgPen::allowed).forEach(c -> {
            switch (c) {
                case '&':
                    escaped.append("&amp;");
                    break;
                case '<':
                    escaped.append("&lt;");
                    break;
                case '>':
                    escaped.append("&gt;");
                    break;
                default:
                    escaped.appendCodePoint(c);
            }
        });
        return escaped.toString();
    }

    /** Characters that XML 1.0 may hold (W3C 2008, section 2.2). */
    private static boolean allowed(int c) {
        return c == '\t' || c == '\n' || c == '\r' || c >= 0x20 && c <= 0xD7FF || c >= 0xE000 && c <= 0xFFFD || c >= 0x10000;
    }
}
