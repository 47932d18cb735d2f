package lyate.window;

import java.awt.geom.Rectangle2D;
import java.util.Optional;
import org.jfree.chart.ChartPanel;

/** Chart panels as the window uses them: drawn at the size they have, no pop-up menu, no zooming by mouse. */
final class Charts {

    private Charts() {}

    static ChartPanel panel(String name) {
        ChartPanel panel = new ChartPanel(null, true);
        panel.setPopupMenu(null);
        panel.setMouseZoomable(false);
        panel.setMinimumDrawWidth(0);
        panel.setMinimumDrawHeight(0);
        panel.setMaximumDrawWidth(Integer.MAX_VALUE);
        panel.setMaximumDrawHeight(Integer.MAX_VALUE);
        panel.getAccessibleContext().setAccessibleName(name);
        return panel;
    }

    /** A chart as a picture, once there is one. */
    static Optional<Picture> picture(String name, ChartPanel panel, Theme theme) {
        return Optional.ofNullable(panel.getChart()).map(chart -> new Picture(name, panel.getSize(), theme.color("ground"),
                g -> chart.draw(g, new Rectangle2D.Double(0, 0, panel.getWidth(), panel.getHeight()))));
    }
}
