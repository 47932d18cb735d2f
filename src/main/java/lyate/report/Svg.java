package lyate.report;

import java.awt.geom.Point2D;
import java.util.Locale;

/** Writes one picture as inline scalable vector graphics with a title and a description for those who cannot see it. */
final class Svg {

    /** Characters of the report's sans serif are about this wide, in font sizes. */
    private static final double LETTER_WIDTH = 0.56;

    private final StringBuilder body = new StringBuilder();
    private final double width;
    private final double top;
    private final double height;

    /** A picture of so many px at most. */
    Svg(double width, double height) {
        this(width, 0, height);
    }

    /** A picture whose upper edge is not at zero. */
    Svg(double width, double top, double height) {
        this.width = width;
        this.top = top;
        this.height = height;
    }

    Svg line(double x1, double y1, double x2, double y2, String colour, double stroke, String... more) {
        return shape("line", colour, stroke, more, "x1", x1, "y1", y1, "x2", x2, "y2", y2);
    }

    Svg ring(Point2D centre, double radius, String colour, double stroke) {
        body.append(String.format(Locale.ROOT, "<circle fill=\"none\" stroke=\"%s\" stroke-width=\"%.1f\" cx=\"%.1f\" cy=\"%.1f\" r=\"%.1f\"/>%s",
                colour, stroke, centre.getX(), centre.getY(), radius, "\n"));
        return this;
    }

    Svg disc(Point2D centre, double radius, String fill, String colour) {
        body.append(String.format(Locale.ROOT, "<circle fill=\"%s\" stroke=\"%s\" stroke-width=\"1.4\" cx=\"%.1f\" cy=\"%.1f\" r=\"%.1f\"/>%s",
                fill, colour, centre.getX(), centre.getY(), radius, "\n"));
        return this;
    }

    Svg box(double x, double y, double w, double h, double corner, String fill, String colour, double stroke) {
        body.append(String.format(Locale.ROOT,
                "<rect fill=\"%s\" stroke=\"%s\" stroke-width=\"%.1f\" x=\"%.1f\" y=\"%.1f\" width=\"%.1f\" height=\"%.1f\" rx=\"%.1f\"/>%s",
                fill, colour, stroke, x, y, w, h, corner, "\n"));
        return this;
    }

    /** An arc that starts at the top and runs clockwise over a fraction of the circle. */
    Svg arc(Point2D centre, double radius, double fraction, String colour, double stroke) {
        if (fraction > 0.999) {
            return ring(centre, radius, colour, stroke);
        }
        double angle = 2 * Math.PI * fraction;
        return path(String.format(Locale.ROOT, "M%.1f %.1fA%.1f %.1f 0 %d 1 %.1f %.1f", centre.getX(), centre.getY() - radius, radius, radius,
                fraction > 0.5 ? 1 : 0, centre.getX() + radius * Math.sin(angle), centre.getY() - radius * Math.cos(angle)), "none", colour, stroke);
    }

    Svg path(String d, String fill, String colour, double stroke, String... more) {
        body.append(String.format(Locale.ROOT, "<path fill=\"%s\" stroke=\"%s\" stroke-width=\"%.1f\"", fill, colour, stroke));
        attributes(more);
        body.append(" d=\"").append(d).append("\"/>\n");
        return this;
    }

    /** Text; {@code anchor} is start, middle or end. */
    Svg text(double x, double y, String text, double size, String colour, String anchor, boolean bold) {
        body.append(String.format(Locale.ROOT, "<text x=\"%.1f\" y=\"%.1f\" font-size=\"%.1f\" fill=\"%s\" text-anchor=\"%s\"%s>", x, y, size,
                colour, anchor, bold ? " font-weight=\"bold\"" : "")).append(Html.escape(text)).append("</text>\n");
        return this;
    }

    Svg markup(String made) {
        body.append(made);
        return this;
    }

    /** Room a text takes, px. */
    static double width(String text, double size) {
        return text.length() * LETTER_WIDTH * size;
    }

    /** The whole element; {@code id} is unique in the document. */
    String write(String id, String title, String description) {
        return String.format(Locale.ROOT, "<svg xmlns=\"http://www.w3.org/2000/svg\" role=\"img\" aria-labelledby=\"%s-t %s-d\""
                + " width=\"%.0f\" height=\"%.0f\" viewBox=\"0 %.0f %.0f %.0f\" font-family=\"Roboto, Helvetica, Arial, sans-serif\">\n",
                id, id, width, height, top, width, height)
                + "<title id=\"" + id + "-t\">" + Html.escape(title) + "</title>\n<desc id=\"" + id + "-d\">" + Html.escape(description)
                + "</desc>\n" + body + "</svg>\n";
    }

    private Svg shape(String name, String colour, double stroke, String[] more, Object... geometry) {
        body.append('<').append(name).append(String.format(Locale.ROOT, " stroke=\"%s\" stroke-width=\"%.1f\"", colour, stroke));
        for (int i = 0; i < geometry.length; i += 2) {
            body.append(String.format(Locale.ROOT, " %s=\"%.1f\"", geometry[i], ((Number) geometry[i + 1]).doubleValue()));
        }
        attributes(more);
        body.append("/>\n");
        return this;
    }

    private void attributes(String... pairs) {
        for (int i = 0; i < pairs.length; i += 2) {
            body.append(' ').append(pairs[i]).append("=\"").append(pairs[i + 1]).append('"');
        }
    }
}
