package lyate.window;

import java.awt.Font;
import java.awt.FontMetrics;
import java.awt.Graphics2D;

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

    static LadderText fitted(Rung rung, FontMetrics metrics, Font font, Graphics2D g, double room) {
        Font bold = font.deriveFont(Font.BOLD);
        FontMetrics boldMetrics = g.getFontMetrics(bold);
        String value = "  " + rung.text();
        double valueWidth = metrics.stringWidth(value);
        String whole = rung.site().map(site -> site.letter() + "  ").orElse("") + rung.name();
        String name = whole;
        while (name.length() > 2 && boldMetrics.stringWidth(name) + valueWidth > room) {
            name = name.substring(0, name.endsWith(DOTS) ? name.length() - 2 : name.length() - 1) + DOTS;
        }
        double nameWidth = boldMetrics.stringWidth(name);
        return new LadderText(name, value, bold, font, nameWidth, nameWidth + valueWidth, rung.accent());
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
