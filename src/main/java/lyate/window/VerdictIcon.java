package lyate.window;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Component;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Arc2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Path2D;
import lyate.review.Verdict;

/** A shape for each kind of outcome: tick, half-filled circle, crossed octagon, question mark. */
final class VerdictIcon extends SquareIcon {

    private final Verdict verdict;
    private final Palette palette;

    VerdictIcon(Verdict verdict, Palette palette, int size) {
        super(size);
        this.verdict = verdict;
        this.palette = palette;
    }

    /** The palette's accent for a verdict. */
    static String accent(Verdict verdict) {
        return switch (verdict) {
            case SELECTIVE -> "good";
            case PARTIAL -> "caution";
            case UNDECIDED -> "note";
            case TOO_WEAK, WRONG_SITE, LEVELLED, INCOMPATIBLE -> "stop";
        };
    }

    @Override
    void paint(Graphics2D g, Component component) {
        int size = size();
        Color accent = palette.color(accent(verdict));
        g.setColor(accent);
        double line = size / 9.0;
        g.setStroke(new BasicStroke((float) line, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND));
        switch (verdict) {
            case SELECTIVE -> {
                g.fill(new Ellipse2D.Double(0, 0, size, size));
                g.setColor(palette.color("ground"));
                g.draw(path(0.28, 0.52, 0.44, 0.68, 0.73, 0.34));
            }
            case PARTIAL -> {
                g.draw(new Ellipse2D.Double(line / 2, line / 2, size - line, size - line));
                g.fill(new Arc2D.Double(line / 2, line / 2, size - line, size - line, 90, 180, Arc2D.PIE));
            }
            case UNDECIDED -> {
                g.draw(new Ellipse2D.Double(line / 2, line / 2, size - line, size - line));
                g.setFont(component.getFont().deriveFont(Font.BOLD, size * 0.62f));
                g.drawString("?", (float) (size - g.getFontMetrics().stringWidth("?")) / 2, size * 0.72f);
            }
            default -> {
                g.fill(SeverityIcon.octagon(size));
                g.setColor(palette.color("ground"));
                g.draw(path(0.32, 0.32, 0.68, 0.68));
                g.draw(path(0.68, 0.32, 0.32, 0.68));
            }
        }
    }

    private Path2D path(double... points) {
        Path2D path = new Path2D.Double();
        path.moveTo(points[0] * size(), points[1] * size());
        for (int i = 2; i < points.length; i += 2) {
            path.lineTo(points[i] * size(), points[i + 1] * size());
        }
        return path;
    }
}
