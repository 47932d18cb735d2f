package lyate.window;

import java.awt.Component;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import javax.swing.Icon;

/** An icon drawn at any size. */
abstract class SquareIcon implements Icon {

    private final int size;

    SquareIcon(int size) {
        this.size = size;
    }

    /** Draws into a square of the icon's size at the origin. */
    abstract void paint(Graphics2D g, Component component);

    @Override
    public final void paintIcon(Component component, Graphics graphics, int x, int y) {
        Graphics2D g = (Graphics2D) graphics.create(x, y, size, size);
        g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
        paint(g, component);
        g.dispose();
    }

    final int size() {
        return size;
    }

    @Override
    public final int getIconWidth() {
        return size;
    }

    @Override
    public final int getIconHeight() {
        return size;
    }
}
