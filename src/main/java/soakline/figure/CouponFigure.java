package soakline.figure;

import org.jfree.chart.JFreeChart;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.data.xy.XYSeries;
import org.jfree.data.xy.XYSeriesCollection;
import soakline.inference.Assessment;
import soakline.specimen.ContentSeries;

/** Stand-in: the weighings of a coupon. */
public final class CouponFigure {

    private CouponFigure() {}

    public static JFreeChart chart(Assessment assessment, ChartStyle style) {
        XYSeries series = new XYSeries(assessment.run().name());
        ContentSeries data = assessment.estimate().task().data();
        for (int i = 0; i < data.size(); i++) {
            series.add(Math.sqrt(Math.max(0, data.time(i)) / 3600), data.content(i) * 100);
        }
        XYPlot plot = new XYPlot(
                new XYSeriesCollection(series),
                new NumberAxis("√t (√h)"),
                new NumberAxis("content (%)"),
                new XYLineAndShapeRenderer(false, true));
        return new JFreeChart(assessment.run().name(), plot);
    }
}
