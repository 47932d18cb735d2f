package lyate.window;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.geom.Arc2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import lyate.report.Rung;

/** Marks of the ladder: ring for a site (filled by the fraction taken, double where intended), triangle for a base, square for solvent and water. */
final class LadderMarks {

    private final Palette palette;

    LadderMarks(Palette palette) {
        this.palette = palette;
    }

    void paint(Graphics2D g, Rung rung, double x, LadderAxis axis) {
        double y = axis.y(rung.pKa());
        double r = palette.space("mark");
        Color accent = palette.color(accent(rung));
        g.setColor(accent);
        bar(g, x, Math.max(axis.top(), axis.y(rung.pKa() + rung.sigma())), Math.min(axis.bottom(), axis.y(rung.pKa() - rung.sigma())), r);
        Shape shape = shape(rung.kind(), x, y, r);
        boolean hollow = rung.kind() == Rung.Kind.SITE || rung.kind() == Rung.Kind.COMPARED || rung.kind() == Rung.Kind.WATER;
        g.setColor(hollow ? palette.color("ground") : accent);
        g.fill(shape);
        g.setColor(accent);
        g.setStroke(new BasicStroke(palette.space("tiny")));
        rung.site().ifPresent(site -> g.fill(new Arc2D.Double(x - r, y - r, 2 * r, 2 * r, 90, -360 * site.fraction(), Arc2D.PIE)));
        g.draw(shape);
        if (rung.intended()) {
            double outer = r + palette.space("small");
            g.setStroke(new BasicStroke(palette.space("hair")));
            g.draw(new Ellipse2D.Double(x - outer, y - outer, 2 * outer, 2 * outer));
        }
    }

    private void bar(Graphics2D g, double x, double top, double bottom, double r) {
        g.setStroke(new BasicStroke(palette.space("tiny")));
        g.draw(new Line2D.Double(x, top, x, bottom));
        g.draw(new Line2D.Double(x - r / 2, top, x + r / 2, top));
        g.draw(new Line2D.Double(x - r / 2, bottom, x + r / 2, bottom));
    }

    /** Name of the colour of a rung in the palette. */
    static String accent(Rung rung) {
        return switch (rung.kind()) {
            case SITE -> rung.intended() ? "intended" : "site";
            case BASE, COMPARED -> "base";
            case SOLVENT, WATER, PARTNER -> "solvent";
        };
    }

    private static Shape shape(Rung.Kind kind, double x, double y, double r) {
        return switch (kind) {
            case SITE -> new Ellipse2D.Double(x - r, y - r, 2 * r, 2 * r);
            case BASE, COMPARED -> triangle(x, y, r);
            case SOLVENT, WATER -> new Rectangle2D.Double(x - 0.8 * r, y - 0.8 * r, 1.6 * r, 1.6 * r);
            case PARTNER -> diamond(x, y, r);
        };
    }

    private static Shape triangle(double x, double y, double r) {
        Path2D path = new Path2D.Double();
        path.moveTo(x - r, y);
        path.lineTo(x + r, y - r);
        path.lineTo(x + r, y + r);
        path.closePath();
        return path;
    }

    private static Shape diamond(double x, double y, double r) {
        Path2D path = new Path2D.Double();
        path.moveTo(x - r, y);
        path.lineTo(x, y - r);
        path.lineTo(x + r, y);
        path.lineTo(x, y + r);
        path.closePath();
        return path;
    }
}
