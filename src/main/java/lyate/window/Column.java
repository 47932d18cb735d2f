package lyate.window;

import java.awt.BorderLayout;
import java.awt.Dimension;
import java.awt.Rectangle;
import javax.swing.JComponent;
import javax.swing.JPanel;
import javax.swing.Scrollable;
import javax.swing.SwingUtilities;

/** Makes what it holds as wide as the pane that scrolls it. */
final class Column extends JPanel implements Scrollable {

    Column() {}

    Column(JComponent content) {
        super(new BorderLayout());
        add(content);
    }

    /** Another width means another height. */
    @Override
    @SuppressWarnings("deprecation")
    public void reshape(int x, int y, int width, int height) {
        boolean wider = width != getWidth();
        super.reshape(x, y, width, height);
        if (wider) {
            SwingUtilities.invokeLater(this::revalidate);
        }
    }

    @Override
    public Dimension getPreferredScrollableViewportSize() {
        return getPreferredSize();
    }

    @Override
    public int getScrollableUnitIncrement(Rectangle visible, int orientation, int direction) {
        return getFontMetrics(getFont()).getHeight();
    }

    @Override
    public int getScrollableBlockIncrement(Rectangle visible, int orientation, int direction) {
        return visible.height;
    }

    @Override
    public boolean getScrollableTracksViewportWidth() {
        return true;
    }

    @Override
    public boolean getScrollableTracksViewportHeight() {
        return getParent() != null && getPreferredSize().height < getParent().getHeight();
    }
}
