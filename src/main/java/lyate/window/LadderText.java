package lyate.window;

import java.awt.Font;
import java.awt.Graphics2D;
import lyate.report.Rung;

/**
 * The words of a ladder label: letter and name in bold, value in plain type.
 *
 * @param name  bold part, shortened where there is no room
 * @param value plain part
 * @param bold  font of the name
 * @param plain font of the value
 * @param nameWidth width of the name
 * @param width width of all
 * @param accent colour name
 */
record LadderText(String name, String value, Font bold, Font plain, double nameWidth, double width, String accent) {

    private static final String DOTS = "\u2026";

    /** The fullest form that fits: name and value with uncertainty, without it (always where {@code brief}), then a shortened name. */
    static LadderText fitted(Rung rung, Font font, Graphics2D g, double room, boolean brief) {
        Font bold = font.deriveFont(Font.BOLD);
        String name = rung.site().map(site -> site.letter() + "  ").orElse("") + rung.name();
        LadderText whole = of(rung, name, "  " + rung.text(), bold, font, g);
        if (!brief && whole.width() <= room) {
            return whole;
        }
        LadderText shorter = of(rung, name, "  " + rung.brief(), bold, font, g);
        for (int letters = name.length() - 1; shorter.width() > room && letters > 1; letters--) {
            shorter = of(rung, name.substring(0, letters).strip() + DOTS, shorter.value(), bold, font, g);
        }
        return shorter;
    }

    private static LadderText of(Rung rung, String name, String value, Font bold, Font plain, Graphics2D g) {
        double nameWidth = g.getFontMetrics(bold).stringWidth(name);
        return new LadderText(name, value, bold, plain, nameWidth, nameWidth + g.getFontMetrics(plain).stringWidth(value), LadderMarks.accent(rung));
    }

    void paint(Graphics2D g, Palette palette, double x, double baseline, boolean focused) {
        if (focused) {
            g.setColor(palette.color("focus"));
            double top = baseline - g.getFontMetrics(bold).getAscent();
            g.draw(new java.awt.geom.Rectangle2D.Double(x - palette.space("tiny"), top, width + 2 * palette.space("tiny"), g.getFontMetrics(bold).getHeight()));
        }
        g.setFont(bold);
        g.setColor(palette.color(accent));
        g.drawString(name, (float) x, (float) baseline);
        g.setFont(plain);
        g.setColor(palette.color("ink"));
        g.drawString(value, (float) (x + nameWidth), (float) baseline);
    }
}
