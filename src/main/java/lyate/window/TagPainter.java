package lyate.window;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Dimension;
import java.awt.Font;
import java.awt.FontMetrics;
import java.awt.Graphics2D;
import java.awt.geom.Arc2D;
import java.awt.geom.Dimension2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Path2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.awt.geom.RoundRectangle2D;
import lyate.report.LetteredSite;

/** Paints site tags and rings: letter in a chip, value beside it, ring filled by the fraction taken, double for the intended site. */
final class TagPainter {

    private final Palette palette;
    private final Font font;
    private final Font letterFont;

    TagPainter(Palette palette, Font font) {
        this.palette = palette;
        this.font = font;
        this.letterFont = font.deriveFont(Font.BOLD);
    }

    /** Room a tag needs with its value. */
    Dimension2D fullSize(Graphics2D g, LetteredSite tag) {
        int width = chipWidth(g, tag) + g.getFontMetrics(font).stringWidth(tag.value()) + 2 * palette.space("small");
        return new Dimension(width, height(g));
    }

    /** Room a tag needs as a letter alone. */
    Dimension2D letterSize(Graphics2D g, LetteredSite tag) {
        return new Dimension(chipWidth(g, tag), height(g));
    }

    /** The accent of a site: what is meant, what else can go, what stays. */
    Color accent(LetteredSite tag) {
        return palette.color(tag.intended() ? "intended" : tag.counts() ? "site" : "ink.soft");
    }

    private Color ground(LetteredSite tag) {
        return tag.intended() ? palette.ground("intended") : tag.counts() ? palette.ground("site") : palette.color("ground.soft");
    }

    void paintTag(Graphics2D g, LetteredSite tag, Rectangle2D box, boolean full, boolean focused) {
        double arc = palette.space("gap");
        RoundRectangle2D outline = new RoundRectangle2D.Double(box.getX(), box.getY(), box.getWidth(), box.getHeight(), arc, arc);
        g.setColor(ground(tag));
        g.fill(outline);
        double chip = full ? chipWidth(g, tag) : box.getWidth();
        Graphics2D inner = (Graphics2D) g.create();
        inner.clip(outline);
        inner.setColor(tag.counts() ? accent(tag) : ground(tag));
        inner.fill(new Rectangle2D.Double(box.getX(), box.getY(), chip, box.getHeight()));
        inner.dispose();
        g.setColor(focused ? palette.color("focus") : accent(tag));
        g.setStroke(new BasicStroke(focused ? palette.space("small") : tag.intended() ? palette.space("tiny") : palette.space("hair")));
        g.draw(outline);
        g.setFont(letterFont);
        FontMetrics metrics = g.getFontMetrics();
        float baseline = (float) (box.getCenterY() + (metrics.getAscent() - metrics.getDescent()) / 2.0);
        g.setColor(palette.color(tag.counts() ? "ground" : "ink.soft"));
        g.drawString(tag.letter(), (float) (box.getX() + (chip - metrics.stringWidth(tag.letter())) / 2), baseline);
        if (full) {
            g.setFont(font);
            g.setColor(palette.color("ink"));
            g.drawString(tag.value(), (float) (box.getX() + chip + palette.space("small")), baseline);
        }
    }

    void paintRing(Graphics2D g, LetteredSite tag, Point2D centre, double radius) {
        g.setColor(accent(tag));
        g.setStroke(new BasicStroke(palette.space("hair")));
        g.draw(circle(centre, radius));
        if (tag.intended()) {
            g.draw(circle(centre, radius + 1.5 * palette.space("small")));
        }
        if (tag.fraction() > 0.005) {
            g.setStroke(new BasicStroke(palette.space("small"), BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND));
            g.draw(new Arc2D.Double(centre.getX() - radius, centre.getY() - radius, 2 * radius, 2 * radius, 90, -360 * tag.fraction(), Arc2D.OPEN));
        }
    }

    /** A diamond round a stereocentre that may epimerise. */
    void paintAtRisk(Graphics2D g, Point2D centre, double radius) {
        double r = radius * 1.5;
        Path2D diamond = new Path2D.Double();
        diamond.moveTo(centre.getX() - r, centre.getY());
        diamond.lineTo(centre.getX(), centre.getY() - r);
        diamond.lineTo(centre.getX() + r, centre.getY());
        diamond.lineTo(centre.getX(), centre.getY() + r);
        diamond.closePath();
        g.setColor(palette.color("caution"));
        g.setStroke(new BasicStroke(palette.space("tiny")));
        g.draw(diamond);
    }

    /** A thin line from a tag to its ring, where there is a gap between them. */
    void paintLeader(Graphics2D g, LetteredSite tag, Rectangle2D box, Point2D atom, double radius) {
        double x = Math.max(box.getMinX(), Math.min(atom.getX(), box.getMaxX()));
        double y = Math.max(box.getMinY(), Math.min(atom.getY(), box.getMaxY()));
        double distance = atom.distance(x, y);
        if (distance > radius + palette.space("small")) {
            double start = radius / distance;
            Path2D line = new Path2D.Double();
            line.moveTo(atom.getX() + (x - atom.getX()) * start, atom.getY() + (y - atom.getY()) * start);
            line.lineTo(x, y);
            g.setColor(accent(tag));
            g.setStroke(new BasicStroke(palette.space("hair")));
            g.draw(line);
        }
    }

    private int chipWidth(Graphics2D g, LetteredSite tag) {
        FontMetrics metrics = g.getFontMetrics(letterFont);
        return Math.max(height(g), metrics.stringWidth(tag.letter()) + 2 * palette.space("small"));
    }

    private int height(Graphics2D g) {
        return g.getFontMetrics(font).getHeight() + palette.space("tiny");
    }

    private static Ellipse2D circle(Point2D centre, double radius) {
        return new Ellipse2D.Double(centre.getX() - radius, centre.getY() - radius, 2 * radius, 2 * radius);
    }
}
