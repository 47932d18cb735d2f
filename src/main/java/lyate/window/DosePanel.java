package lyate.window;

import java.awt.Cursor;
import java.awt.event.MouseAdapter;
import java.awt.event.MouseEvent;
import java.util.Locale;
import java.util.Optional;
import java.util.function.DoubleConsumer;
import lyate.review.DoseResponse;
import org.jfree.chart.ChartPanel;
import org.jfree.chart.plot.XYPlot;

/** The dose curve; the line of the chosen equivalents can be dragged, or moved with the arrow keys. */
final class DosePanel extends LazyTab {

    private static final double KEY_STEP = 0.05;

    private final Theme theme;
    private final transient Engine engine;
    private final transient DoubleConsumer onEquivalents;
    private final ChartPanel panel = Charts.panel("Protons taken against equivalents of base");
    private transient DoseResponse doses;

    DosePanel(Theme theme, Engine engine, DoubleConsumer onEquivalents) {
        super("dose curve");
        this.theme = theme;
        this.engine = engine;
        this.onEquivalents = onEquivalents;
        panel.setFocusable(true);
        Keys.bind(panel, "LEFT", () -> move(shown().review().step().equivalents() - KEY_STEP));
        Keys.bind(panel, "RIGHT", () -> move(shown().review().step().equivalents() + KEY_STEP));
        Drag drag = new Drag();
        panel.addMouseListener(drag);
        panel.addMouseMotionListener(drag);
        add(panel);
        theme.onChange(this::draw);
    }

    @Override
    Optional<Picture> asPicture() {
        return Charts.picture("equivalents", panel, theme);
    }

    @Override
    Object key(Shown next) {
        return StepKey.of(next.review().step()).withoutDose(DoseResponse.span(next.review().step()));
    }

    @Override
    void work(Shown wanted) {
        start("working out the curve \u2026", goOn -> engine.reviewer().doseResponse(wanted.review().step(), DoseResponse.span(wanted.review().step())), result -> {
            doses = result;
            draw();
        });
    }

    @Override
    void refresh() {
        draw();
    }

    private void draw() {
        if (doses != null) {
            panel.setChart(new DoseChart(theme.palette()).chart(doses, shown()));
        }
    }

    /** Where the line of a dose is, or would be. */
    int lineAt(double equivalents) {
        XYPlot plot = panel.getChart().getXYPlot();
        return (int) Math.round(plot.getDomainAxis().valueToJava2D(equivalents, panel.getScreenDataArea(), plot.getDomainAxisEdge()));
    }

    /** What is drawn on. */
    ChartPanel chart() {
        return panel;
    }

    private void move(double equivalents) {
        double rounded = Math.round(Math.max(0, equivalents) / KEY_STEP) * KEY_STEP;
        onEquivalents.accept(Double.parseDouble(String.format(Locale.ROOT, "%.2f", rounded)));
    }

    /** Drags the line of the chosen equivalents. */
    private final class Drag extends MouseAdapter {
        private boolean dragging;

        @Override
        public void mousePressed(MouseEvent event) {
            panel.requestFocusInWindow();
            dragging = near(event);
        }

        @Override
        public void mouseDragged(MouseEvent event) {
            if (dragging) {
                move(valueAt(event));
            }
        }

        @Override
        public void mouseReleased(MouseEvent event) {
            dragging = false;
        }

        @Override
        public void mouseMoved(MouseEvent event) {
            panel.setCursor(Cursor.getPredefinedCursor(near(event) ? Cursor.E_RESIZE_CURSOR : Cursor.DEFAULT_CURSOR));
        }

        private boolean near(MouseEvent event) {
            if (panel.getChart() == null) {
                return false;
            }
            return Math.abs(lineAt(shown().review().step().equivalents()) - event.getX()) < theme.space("gap");
        }

        private double valueAt(MouseEvent event) {
            XYPlot plot = panel.getChart().getXYPlot();
            return plot.getDomainAxis().java2DToValue(event.getX(), panel.getScreenDataArea(), plot.getDomainAxisEdge());
        }
    }
}
