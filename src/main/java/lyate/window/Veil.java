package lyate.window;

import java.awt.BorderLayout;
import java.awt.Color;
import java.awt.Graphics;
import javax.swing.JComponent;
import javax.swing.JPanel;

/** Greys what it holds while that does not belong to what the fields say; everything under it still works. */
final class Veil extends JPanel {

    /** Enough to be noticed, little enough to read through. */
    private static final int OPACITY = 150;

    private final transient Theme theme;
    private boolean set;

    Veil(JComponent content, Theme theme) {
        super(new BorderLayout());
        this.theme = theme;
        add(content);
    }

    void set(boolean next) {
        if (next != set) {
            set = next;
            repaint();
        }
    }

    boolean isSet() {
        return set;
    }

    /** Whatever is repainted below must get its part of the veil as well. */
    @Override
    protected boolean isPaintingOrigin() {
        return set;
    }

    @Override
    protected void paintChildren(Graphics graphics) {
        super.paintChildren(graphics);
        if (set) {
            Color ground = theme.color("ground.soft");
            graphics.setColor(new Color(ground.getRed(), ground.getGreen(), ground.getBlue(), OPACITY));
            graphics.fillRect(0, 0, getWidth(), getHeight());
        }
    }
}
