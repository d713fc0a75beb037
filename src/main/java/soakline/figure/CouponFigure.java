package soakline.figure;

import java.awt.RenderingHints;
import java.util.List;
import java.util.Locale;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.block.BlockBorder;
import org.jfree.chart.plot.CombinedDomainXYPlot;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.title.LegendTitle;
import org.jfree.chart.title.TextTitle;
import org.jfree.chart.ui.HorizontalAlignment;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.RectangleInsets;
import org.jfree.data.Range;
import soakline.figure.ChartStyle.Ink;
import soakline.inference.Assessment;
import soakline.quantity.Unit;

/** The picture of one coupon: content against √t with the fitted curve, and the residuals below on the same axis. */
public final class CouponFigure {

    private static final int CONTENT_WEIGHT = 3;
    private static final int RESIDUAL_WEIGHT = 1;
    /** Room right of the last weighing. */
    private static final double BEYOND = 1.04;

    private CouponFigure() {}

    /** Draws an assessment. Where D is not determined neither D nor a plateau is in it. */
    public static JFreeChart chart(Assessment assessment, ChartStyle style) {
        double last = assessment.estimate().task().data().lastTime();
        RootTime rootTime = RootTime.forSpan(last);
        DrawnWeighings points = new DrawnWeighings(assessment, rootTime);
        double right = Math.max(rootTime.of(last), 1e-9) * BEYOND;

        NumberAxis domain = axis(rootTime.label(), style);
        domain.setAutoRange(false);
        domain.setRange(-0.015 * right, right);
        CombinedDomainXYPlot plot = new CombinedDomainXYPlot(domain);
        plot.setGap(style.length(14));
        plot.setBackgroundPaint(style.ink(Ink.BACKGROUND));
        plot.setOutlineVisible(false);
        plot.setInsets(RectangleInsets.ZERO_INSETS);

        ContentPlot content = new ContentPlot(assessment, points, rootTime, style, right);
        XYPlot contentPlot = content.plot();
        plot.add(contentPlot, CONTENT_WEIGHT);
        addTimeReading(contentPlot, domain, rootTime, style);
        if (assessment.estimate().isOptimum()) {
            plot.add(ResidualPlot.plot(assessment, points, rootTime, style), RESIDUAL_WEIGHT);
        }
        return framed(plot, assessment, points, content.range(), style);
    }

    /** The same without name and result, for a page that says them itself. What the picture leaves out is still said on it. */
    public static JFreeChart chartWithoutHead(Assessment assessment, ChartStyle style) {
        JFreeChart chart = chart(assessment, style);
        chart.setTitle((TextTitle) null);
        List<String> head = FigureWords.result(assessment);
        for (int i = chart.getSubtitleCount() - 1; i >= 0; i--) {
            if (chart.getSubtitle(i) instanceof TextTitle line && head.contains(line.getText())) {
                chart.removeSubtitle(line);
            }
        }
        return chart;
    }

    /** The unit in which a test of some length is read. */
    public static Unit timeUnit(double seconds) {
        return RootTime.forSpan(seconds).unit();
    }

    /** The same axis read in t, along the top; it follows the √t axis when that is zoomed. */
    private static void addTimeReading(XYPlot plot, NumberAxis domain, RootTime rootTime, ChartStyle style) {
        TimeTicksAxis times =
                new TimeTicksAxis(rootTime.timeLabel(), style.font().getSize2D() * 3.4);
        dress(times, style);
        times.setLabelFont(style.smallFont());
        times.setTickLabelFont(style.smallFont());
        times.setRange(domain.getRange());
        domain.addChangeListener(event -> times.setRange(domain.getRange()));
        plot.setDomainAxis(1, times);
    }

    private static JFreeChart framed(
            CombinedDomainXYPlot plot, Assessment assessment, DrawnWeighings points, Range shown, ChartStyle style) {
        JFreeChart chart = new JFreeChart(null, style.titleFont(), plot, false);
        chart.setBackgroundPaint(style.ink(Ink.BACKGROUND));
        chart.setBorderVisible(false);
        chart.setAntiAlias(true);
        chart.setTextAntiAlias(true);
        chart.getRenderingHints().put(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
        double pad = style.length(12);
        chart.setPadding(new RectangleInsets(pad, pad, pad * 0.7, pad * 1.3));
        TextTitle title = new TextTitle(assessment.run().name(), style.titleFont());
        title.setPaint(style.ink(Ink.TEXT));
        leftAlign(title, 0, style);
        chart.setTitle(title);
        List<String> lines = FigureWords.result(assessment);
        for (String line : lines) {
            addLine(chart, line, assessment.determined() ? Ink.TEXT : Ink.CURVE, style);
        }
        if (points.isReduced()) {
            addLine(chart, FigureWords.reduced(points.total(), points.drawn()), Ink.QUIET_TEXT, style);
        }
        int outside = points.asideOutside(shown);
        if (outside > 0) {
            addLine(chart, FigureWords.outside(outside), Ink.QUIET_TEXT, style);
        }
        chart.addLegend(legend(plot, style));
        return chart;
    }

    private static void addLine(JFreeChart chart, String text, Ink ink, ChartStyle style) {
        TextTitle line = new TextTitle(text, style.font());
        line.setPaint(style.ink(ink));
        leftAlign(line, 2, style);
        chart.addSubtitle(line);
    }

    private static void leftAlign(TextTitle title, double above, ChartStyle style) {
        title.setHorizontalAlignment(HorizontalAlignment.LEFT);
        title.setTextAlignment(HorizontalAlignment.LEFT);
        title.setPadding(style.length(above), style.length(6), style.length(1), 0);
    }

    private static LegendTitle legend(CombinedDomainXYPlot plot, ChartStyle style) {
        LegendTitle legend = new LegendTitle(plot);
        legend.setPosition(RectangleEdge.BOTTOM);
        legend.setFrame(BlockBorder.NONE);
        legend.setBackgroundPaint(null);
        legend.setItemFont(style.font());
        legend.setItemPaint(style.ink(Ink.TEXT));
        double gap = style.length(6);
        legend.setLegendItemGraphicPadding(new RectangleInsets(2, gap, 2, gap / 2));
        legend.setItemLabelPadding(new RectangleInsets(2, 2, 2, gap));
        legend.setPadding(gap, 0, 0, 0);
        return legend;
    }

    /** A number axis in the style, with a decimal point in every locale. */
    static NumberAxis axis(String label, ChartStyle style) {
        NumberAxis axis = new NumberAxis(label);
        axis.setStandardTickUnits(NumberAxis.createStandardTickUnits(Locale.ROOT));
        dress(axis, style);
        return axis;
    }

    private static void dress(NumberAxis axis, ChartStyle style) {
        axis.setLabelFont(style.font());
        axis.setTickLabelFont(style.font());
        axis.setLabelPaint(style.ink(Ink.TEXT));
        axis.setTickLabelPaint(style.ink(Ink.QUIET_TEXT));
        axis.setAxisLineVisible(false);
        axis.setTickMarksVisible(false);
        double inset = style.length(6);
        axis.setTickLabelInsets(new RectangleInsets(inset, inset, inset, inset));
    }

    /** Grid, ground and gaps of a subplot. */
    static void dress(XYPlot plot, ChartStyle style) {
        plot.setBackgroundPaint(style.ink(Ink.BACKGROUND));
        plot.setOutlineVisible(false);
        plot.setDomainGridlinePaint(style.ink(Ink.GRID));
        plot.setRangeGridlinePaint(style.ink(Ink.GRID));
        plot.setDomainGridlineStroke(style.solid(1));
        plot.setRangeGridlineStroke(style.solid(1));
        plot.setDomainZeroBaselineVisible(false);
        plot.setRangeZeroBaselineVisible(false);
        plot.setAxisOffset(RectangleInsets.ZERO_INSETS);
    }
}
