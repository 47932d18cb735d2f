package lyate.molecule;

import java.awt.Color;
import java.awt.geom.PathIterator;
import java.awt.geom.Rectangle2D;
import java.util.Locale;

/** Writes a drawing as scalable vector graphics (SVG 1.1). */
public final class MoleculeSvg {

    private static final double MARGIN = 0.3;

    private MoleculeSvg() {}

    /**
     * A complete {@code <svg>} element.
     *
     * @param bondLength width of one bond in px
     */
    public static String write(MoleculeDrawing drawing, DrawingColours colours, double bondLength) {
        Rectangle2D box = drawing.bounds();
        double width = box.getWidth() + 2 * MARGIN;
        double height = box.getHeight() + 2 * MARGIN;
        StringBuilder svg = new StringBuilder(String.format(Locale.ROOT,
                "<svg xmlns=\"http://www.w3.org/2000/svg\" width=\"%.1f\" height=\"%.1f\" viewBox=\"%.3f %.3f %.3f %.3f\">%n",
                width * bondLength, height * bondLength, box.getX() - MARGIN, box.getY() - MARGIN, width, height));
        return svg.append(paths(drawing, colours)).append("</svg>\n").toString();
    }

    /** The shapes as {@code <path>} elements in drawing coordinates, to go into a larger picture. */
    public static String paths(MoleculeDrawing drawing, DrawingColours colours) {
        StringBuilder svg = new StringBuilder();
        for (DrawingMark mark : drawing.marks()) {
            String colour = hex(colours.of(mark.atomicNumber()));
            String style = mark.filled() ? "fill=\"" + colour + "\"" : String.format(Locale.ROOT,
                    "fill=\"none\" stroke=\"%s\" stroke-width=\"%.3f\" stroke-linecap=\"round\" stroke-linejoin=\"round\"",
                    colour, mark.strokeWidth());
            svg.append("<path ").append(style).append(" d=\"").append(path(mark)).append("\"/>\n");
        }
        return svg.toString();
    }

    /** A seam of one colour round the atom symbols, to go below {@link #paths} and over whatever lies behind; width in bond lengths. */
    public static String seam(MoleculeDrawing drawing, String colour, double width) {
        StringBuilder svg = new StringBuilder();
        drawing.marks().stream().filter(DrawingMark::filled).forEach(mark -> svg.append(String.format(Locale.ROOT,
                "<path fill=\"%s\" stroke=\"%s\" stroke-width=\"%.3f\" stroke-linejoin=\"round\" d=\"%s\"/>\n", colour, colour, 2 * width, path(mark))));
        return svg.toString();
    }

    private static String path(DrawingMark mark) {
        StringBuilder text = new StringBuilder();
        double[] p = new double[6];
        for (PathIterator i = mark.shape().getPathIterator(null); !i.isDone(); i.next()) {
            int kind = i.currentSegment(p);
            text.append("MLQCZ".charAt(kind));
            for (int k = 0; k < numbers(kind); k++) {
                text.append(String.format(Locale.ROOT, k == 0 ? "%.3f" : " %.3f", p[k]));
            }
        }
        return text.toString();
    }

    private static int numbers(int kind) {
        return switch (kind) {
            case PathIterator.SEG_MOVETO, PathIterator.SEG_LINETO -> 2;
            case PathIterator.SEG_QUADTO -> 4;
            case PathIterator.SEG_CUBICTO -> 6;
            default -> 0;
        };
    }

    private static String hex(Color colour) {
        return String.format(Locale.ROOT, "#%06x", colour.getRGB() & 0xffffff);
    }
}
