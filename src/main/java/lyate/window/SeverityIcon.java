package lyate.window;

import java.awt.Component;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Path2D;
import lyate.review.Finding.Severity;

/** Octagon for stop, triangle for caution, disc for a note. */
final class SeverityIcon extends SquareIcon {

    private final Severity severity;
    private final Palette palette;

    SeverityIcon(Severity severity, Palette palette, int size) {
        super(size);
        this.severity = severity;
        this.palette = palette;
    }

    @Override
    void paint(Graphics2D g, Component component) {
        int size = size();
        g.setColor(palette.color(severity.word()));
        g.fill(shape());
        g.setColor(palette.color("ground"));
        g.setFont(component.getFont().deriveFont(Font.BOLD, size * 0.66f));
        String sign = severity == Severity.NOTE ? "i" : "!";
        g.drawString(sign, (size - g.getFontMetrics().stringWidth(sign)) / 2f, size * (severity == Severity.CAUTION ? 0.84f : 0.74f));
    }

    private Shape shape() {
        return switch (severity) {
            case STOP -> octagon(size());
            case CAUTION -> triangle();
            case NOTE -> new Ellipse2D.Double(0, 0, size(), size());
        };
    }

    private Path2D triangle() {
        Path2D path = new Path2D.Double();
        path.moveTo(size() / 2.0, 0);
        path.lineTo(size(), size());
        path.lineTo(0, size());
        path.closePath();
        return path;
    }

    static Path2D octagon(double size) {
        Path2D path = new Path2D.Double();
        for (int i = 0; i < 8; i++) {
            double angle = Math.PI / 8 + i * Math.PI / 4;
            double x = size / 2 * (1 + Math.cos(angle));
            double y = size / 2 * (1 + Math.sin(angle));
            if (i == 0) {
                path.moveTo(x, y);
            } else {
                path.lineTo(x, y);
            }
        }
        path.closePath();
        return path;
    }
}
