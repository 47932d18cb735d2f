package lyate.window;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.text.NumberFormat;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import javax.swing.UIManager;
import lyate.review.DoseResponse;
import org.jfree.chart.ChartFactory;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.NumberTickUnit;
import org.jfree.chart.plot.ValueMarker;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.chart.ui.RectangleAnchor;
import org.jfree.chart.ui.RectangleInsets;
import org.jfree.chart.ui.TextAnchor;
import org.jfree.data.xy.XYSeries;
import org.jfree.data.xy.XYSeriesCollection;

/** Draws a dose curve: per cent of each proton taken against equivalents, every line named, the dose chosen as a vertical line. */
final class DoseChart {

    /** Donors that never lose more than this stay out of the picture. */
    private static final double WORTH_A_LINE = 0.5;

    private final Palette palette;

    DoseChart(Palette palette) {
        this.palette = palette;
    }

    JFreeChart chart(DoseResponse doses, Shown shown) {
        XYSeriesCollection data = new XYSeriesCollection();
        JFreeChart chart = ChartFactory.createXYLineChart(null, "equivalents of " + shown.review().step().base().shortName(),
                "% taken", data);
        XYPlot plot = chart.getXYPlot();
        XYLineAndShapeRenderer renderer = new XYLineAndShapeRenderer(true, false);
        plot.setRenderer(renderer);
        for (Map.Entry<String, List<Double>> donor : doses.percentTaken().entrySet()) {
            if (donor.getValue().stream().anyMatch(percent -> percent > WORTH_A_LINE)) {
                add(donor.getKey(), donor.getValue(), doses, shown, data, renderer);
            }
        }
        dress(chart, plot);
        plot.getRangeAxis().setRange(0, 120);
        double span = doses.highest();
        plot.getDomainAxis().setRange(0, span);
        ((NumberAxis) plot.getDomainAxis()).setTickUnit(new NumberTickUnit(span > 6 ? 1 : 0.5, NumberFormat.getInstance(Locale.ROOT)));
        ((NumberAxis) plot.getRangeAxis()).setTickUnit(new NumberTickUnit(25, NumberFormat.getInstance(Locale.ROOT)));
        plot.addDomainMarker(marker(shown.review().step().equivalents()));
        return chart;
    }

    private void add(String donor, List<Double> percent, DoseResponse doses, Shown shown, XYSeriesCollection data, XYLineAndShapeRenderer renderer) {
        XYSeries series = new XYSeries(shown.tags().labelled(donor).map(site -> site.letter() + "  " + donor).orElse(donor));
        for (int i = 0; i < percent.size(); i++) {
            series.add(doses.equivalents().get(i), percent.get(i));
        }
        int index = data.getSeriesCount();
        data.addSeries(series);
        boolean intended = donor.equals(shown.review().intendedSite());
        boolean site = shown.tags().labelled(donor).isPresent();
        renderer.setSeriesPaint(index, palette.color(intended ? "intended" : site ? "site" : "solvent"));
        renderer.setSeriesStroke(index, line(intended, index));
    }

    /** Lines differ by their dashes too, so that they are told apart without colour. */
    private BasicStroke line(boolean intended, int index) {
        float unit = palette.space("tiny");
        float[][] dashes = {null, {4 * unit, 2 * unit}, {unit, 2 * unit}, {6 * unit, 2 * unit, unit, 2 * unit}};
        float[] dash = intended ? null : dashes[1 + index % 3];
        return new BasicStroke(intended ? 1.6f * unit : unit, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 10, dash, 0);
    }

    ValueMarker marker(double equivalents) {
        ValueMarker marker = new ValueMarker(equivalents, palette.color("base"), new BasicStroke(palette.space("tiny")));
        marker.setLabel(String.format(Locale.ROOT, "%.2f eq", equivalents));
        marker.setLabelFont(UIManager.getFont("Label.font").deriveFont(Font.BOLD));
        marker.setLabelPaint(palette.color("base"));
        marker.setLabelBackgroundColor(new Color(0, true));
        marker.setLabelAnchor(RectangleAnchor.TOP_RIGHT);
        marker.setLabelTextAnchor(TextAnchor.TOP_LEFT);
        return marker;
    }

    /** Gives a chart the window's colours and font. */
    void dress(JFreeChart chart, XYPlot plot) {
        Font font = UIManager.getFont("Label.font");
        Color ink = palette.color("ink");
        chart.setBackgroundPaint(palette.color("ground"));
        plot.setBackgroundPaint(palette.color("ground"));
        plot.setDomainGridlinePaint(palette.color("line"));
        plot.setRangeGridlinePaint(palette.color("line"));
        plot.setOutlineVisible(false);
        plot.setAxisOffset(RectangleInsets.ZERO_INSETS);
        List.of(plot.getDomainAxis(), plot.getRangeAxis()).forEach(axis -> {
            axis.setLabelFont(font);
            axis.setTickLabelFont(font);
            axis.setLabelPaint(ink);
            axis.setTickLabelPaint(ink);
            axis.setAxisLinePaint(palette.color("ink.soft"));
            axis.setTickMarkPaint(palette.color("ink.soft"));
        });
        if (chart.getLegend() != null) {
            chart.getLegend().setItemFont(font);
            chart.getLegend().setItemPaint(ink);
            chart.getLegend().setBackgroundPaint(palette.color("ground"));
            chart.getLegend().setPosition(org.jfree.chart.ui.RectangleEdge.RIGHT);
            chart.getLegend().setFrame(org.jfree.chart.block.BlockBorder.NONE);
        }
    }
}
