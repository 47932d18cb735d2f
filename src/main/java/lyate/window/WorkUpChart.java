package lyate.window;

import java.awt.BasicStroke;
import java.text.NumberFormat;
import java.util.List;
import java.util.Locale;
import java.util.function.DoubleUnaryOperator;
import lyate.bench.AqueousForm;
import lyate.bench.ExtractionWindow;
import lyate.bench.WorkUp.Parting;
import lyate.bench.WorkUpKit;
import org.jfree.chart.ChartFactory;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.NumberTickUnit;
import org.jfree.chart.plot.IntervalMarker;
import org.jfree.chart.plot.ValueMarker;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.chart.ui.Layer;
import org.jfree.data.xy.XYSeries;
import org.jfree.data.xy.XYSeriesCollection;

/** Uncharged share of the product and its companions against pH, with the ranges that part them. */
final class WorkUpChart {

    private static final int POINTS_PER_PH = 10;
    private static final int HIGHEST_PH = 14;

    private final Palette palette;

    WorkUpChart(Palette palette) {
        this.palette = palette;
    }

    JFreeChart chart(WorkUpKit.Answer answer, double pH) {
        XYSeriesCollection data = new XYSeriesCollection();
        JFreeChart chart = ChartFactory.createXYLineChart(null, "pH of the water", "% uncharged", data);
        XYPlot plot = chart.getXYPlot();
        XYLineAndShapeRenderer renderer = new XYLineAndShapeRenderer(true, false);
        plot.setRenderer(renderer);
        float unit = palette.space("tiny");
        add(data, "product", answer.workUp().product()::unchargedFraction);
        renderer.setSeriesPaint(0, palette.color("intended"));
        renderer.setSeriesStroke(0, new BasicStroke(1.6f * unit));
        float[][] dashes = {{4 * unit, 2 * unit}, {unit, 2 * unit}, {6 * unit, 2 * unit, unit, 2 * unit}};
        List<AqueousForm> others = answer.others();
        for (int i = 0; i < others.size(); i++) {
            add(data, others.get(i).name(), others.get(i)::unchargedFraction);
            renderer.setSeriesPaint(i + 1, palette.color(i % 2 == 0 ? "base" : "site"));
            renderer.setSeriesStroke(i + 1, new BasicStroke(unit, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 10, dashes[i % dashes.length], 0));
        }
        for (Parting parting : answer.workUp().partings()) {
            for (ExtractionWindow window : parting.windows()) {
                plot.addDomainMarker(new IntervalMarker(window.fromPH(), window.toPH(), palette.ground("good")), Layer.BACKGROUND);
            }
        }
        new DoseChart(palette).dress(chart, plot);
        plot.getDomainAxis().setRange(0, HIGHEST_PH);
        plot.getRangeAxis().setRange(0, 105);
        ((NumberAxis) plot.getDomainAxis()).setTickUnit(new NumberTickUnit(1, NumberFormat.getInstance(Locale.ROOT)));
        ((NumberAxis) plot.getRangeAxis()).setTickUnit(new NumberTickUnit(25, NumberFormat.getInstance(Locale.ROOT)));
        plot.addDomainMarker(new ValueMarker(pH, palette.color("ink.soft"), new BasicStroke(palette.space("hair"))));
        return chart;
    }

    private static void add(XYSeriesCollection data, String name, DoubleUnaryOperator share) {
        XYSeries series = new XYSeries(name);
        for (int point = 0; point <= HIGHEST_PH * POINTS_PER_PH; point++) {
            double pH = point / (double) POINTS_PER_PH;
            series.add(pH, 100 * share.applyAsDouble(pH));
        }
        data.addSeries(series);
    }
}
