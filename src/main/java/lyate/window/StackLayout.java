package lyate.window;

import java.awt.Component;
import java.awt.Container;
import java.awt.Dimension;
import java.awt.Insets;
import java.awt.LayoutManager;

/** Components below each other, each as wide as the container and as high as it wants to be at that width. */
final class StackLayout implements LayoutManager {

    private static final int UNKNOWN_WIDTH = 320;

    private final int gap;

    StackLayout(int gap) {
        this.gap = gap;
    }

    @Override
    public void layoutContainer(Container parent) {
        place(parent, true);
    }

    @Override
    public Dimension preferredLayoutSize(Container parent) {
        int width = parent.getWidth() > 0 ? parent.getWidth() : UNKNOWN_WIDTH;
        return new Dimension(width, place(parent, false));
    }

    @Override
    public Dimension minimumLayoutSize(Container parent) {
        return new Dimension(0, 0);
    }

    /** Returns the height needed. */
    private int place(Container parent, boolean move) {
        Insets insets = parent.getInsets();
        int width = (parent.getWidth() > 0 ? parent.getWidth() : UNKNOWN_WIDTH) - insets.left - insets.right;
        int y = insets.top;
        for (Component child : parent.getComponents()) {
            if (!child.isVisible()) {
                continue;
            }
            child.setSize(width, Math.max(1, child.getHeight()));
            layOut(child);
            int height = child.getPreferredSize().height;
            if (move) {
                child.setBounds(insets.left, y, width, height);
            }
            y += height + gap;
        }
        return y - (parent.getComponentCount() > 0 ? gap : 0) + insets.bottom;
    }

    /** Nested text must know its width before anybody asks for its height. */
    private static void layOut(Component component) {
        if (component instanceof Container container) {
            container.doLayout();
            for (Component child : container.getComponents()) {
                layOut(child);
            }
        }
    }

    @Override
    public void addLayoutComponent(String name, Component component) {}

    @Override
    public void removeLayoutComponent(Component component) {}
}
