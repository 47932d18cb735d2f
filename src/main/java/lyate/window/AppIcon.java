package lyate.window;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Image;
import java.awt.RenderingHints;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.RoundRectangle2D;
import java.awt.image.BufferedImage;
import java.util.List;
import java.util.stream.IntStream;

/** The program's sign: a ladder whose proton has left its rung. */
final class AppIcon {

    private static final Color GROUND = new Color(0x12, 0x4e, 0x57);
    private static final Color RUNGS = new Color(0xf2, 0xf5, 0xf3);
    private static final Color PROTON = new Color(0xff, 0xa9, 0x4d);

    private AppIcon() {}

    /** The icon in the sizes desktops ask for. */
    static List<Image> images() {
        return IntStream.of(16, 20, 24, 32, 48, 64, 128, 256).<Image>mapToObj(AppIcon::image).toList();
    }

    static BufferedImage image(int size) {
        BufferedImage image = new BufferedImage(size, size, BufferedImage.TYPE_INT_ARGB);
        Graphics2D g = image.createGraphics();
        g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
        g.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
        g.scale(size / 64.0, size / 64.0);
        g.setColor(GROUND);
        g.fill(new RoundRectangle2D.Double(2, 2, 60, 60, 16, 16));
        g.setColor(RUNGS);
        g.setStroke(new BasicStroke(5, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND));
        g.draw(new Line2D.Double(19, 12, 19, 52));
        g.draw(new Line2D.Double(19, 18, 34, 18));
        g.draw(new Line2D.Double(19, 32, 28, 32));
        g.draw(new Line2D.Double(19, 46, 34, 46));
        g.setColor(PROTON);
        g.fill(new Ellipse2D.Double(38, 23, 18, 18));
        g.dispose();
        return image;
    }
}
