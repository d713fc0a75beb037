package soakline.figure;

import java.awt.Stroke;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.plot.ValueMarker;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.chart.ui.Layer;
import soakline.figure.ChartStyle.Ink;
import soakline.inference.Assessment;

/** Residuals against √t, between dotted lines at one standard deviation. */
final class ResidualPlot {

    private static final double MARGIN = 1.18;

    private ResidualPlot() {}

    static XYPlot plot(Assessment assessment, DrawnWeighings points, RootTime rootTime, ChartStyle style) {
        double deviation = DrawnWeighings.PERCENT * assessment.estimate().residualStandardDeviation();
        NumberAxis axis = CouponFigure.axis("residual [%]", style);
        double reach = MARGIN * Math.max(points.largestResidual(), Double.isFinite(deviation) ? deviation : 0);
        axis.setAutoRange(false);
        axis.setRange(reach > 0 ? -reach : -1, reach > 0 ? reach : 1);
        XYLineAndShapeRenderer renderer = Markers.used(points, rootTime, style);
        renderer.setDefaultSeriesVisibleInLegend(false);
        XYPlot plot = new XYPlot(points.residualSet(), null, axis, renderer);
        CouponFigure.dress(plot, style);
        // over a band of very many, under single markers
        Layer layer = points.isReduced() ? Layer.FOREGROUND : Layer.BACKGROUND;
        Ink ink = points.isReduced() ? Ink.TEXT : Ink.QUIET_TEXT;
        mark(plot, 0, Ink.CURVE, style.solid(1.4), layer, style);
        if (deviation > 0) {
            mark(plot, deviation, ink, style.dotted(1.4), layer, style);
            mark(plot, -deviation, ink, style.dotted(1.4), layer, style);
        }
        return plot;
    }

    private static void mark(XYPlot plot, double value, Ink ink, Stroke stroke, Layer layer, ChartStyle style) {
        ValueMarker marker = new ValueMarker(value, style.ink(ink), stroke);
        marker.setAlpha(1);
        plot.addRangeMarker(marker, layer);
    }
}
