package lyate.window;

import javax.swing.BorderFactory;
import javax.swing.JComponent;
import javax.swing.JSplitPane;

/** Two parts of the window that share its room. The share of the first stays the same at every size until the user moves the divider. */
final class Split extends JSplitPane {

    private double share;
    private boolean placing;

    /** @param share of the first part, 0 to 1 */
    Split(int orientation, JComponent first, JComponent second, double share) {
        super(orientation, true, first, second);
        this.share = share;
        setBorder(BorderFactory.createEmptyBorder());
        addPropertyChangeListener(DIVIDER_LOCATION_PROPERTY, event -> {
            if (!placing && room() > 0) {
                // Half a pixel more, so that the same place comes out when it is rounded down.
                this.share = Math.max(0, Math.min(1, (getDividerLocation() + 0.5) / room()));
            }
        });
    }

    void setShare(double next) {
        share = next;
        revalidate();
    }

    double share() {
        return share;
    }

    private int room() {
        return (getOrientation() == HORIZONTAL_SPLIT ? getWidth() : getHeight()) - getDividerSize();
    }

    @Override
    public void doLayout() {
        placing = true;
        if (room() > 0) {
            setDividerLocation(share);
        }
        super.doLayout();
        placing = false;
    }
}
