package lyate.window;

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
}
