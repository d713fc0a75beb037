package soakline.figure;

import java.util.Optional;
import java.util.OptionalDouble;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.plot.DatasetRenderingOrder;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.data.Range;
import org.jfree.data.xy.DefaultXYDataset;
import soakline.estimate.Estimate;
import soakline.estimate.Parameter;
import soakline.figure.ChartStyle.Ink;
import soakline.inference.Assessment;
import soakline.inference.ParameterResult;
import soakline.inference.ShortTimeLine;

/** Content against √t: weighings, the fitted curve, the short-time line and, where determined, the plateau. */
final class ContentPlot {

    private static final int CURVE_POINTS = 600;
    /** The short-time line is drawn this much longer than the stretch it was made from, to show where the curve leaves it. */
    private static final double LINE_BEYOND = 1.6;
    /** Share of the range above and below all that is drawn. */
    private static final double MARGIN = 0.06;

    private final Assessment assessment;
    private final DrawnWeighings points;
    private final RootTime rootTime;
    private final ChartStyle style;
    private final double right;
    private final Range range;

    ContentPlot(
            Assessment assessment, DrawnWeighings points, RootTime rootTime, ChartStyle style, double rightmostRoot) {
        this.assessment = assessment;
        this.points = points;
        this.rootTime = rootTime;
        this.style = style;
        this.right = rightmostRoot;
        this.range = makeRange();
    }

    /** What the content axis shows, %. */
    Range range() {
        return range;
    }

    XYPlot plot() {
        NumberAxis contentAxis = CouponFigure.axis("content [%]", style);
        contentAxis.setAutoRange(false);
        contentAxis.setRange(range);
        XYPlot plot = new XYPlot(null, null, contentAxis, null);
        CouponFigure.dress(plot, style);
        plot.setDatasetRenderingOrder(DatasetRenderingOrder.FORWARD);
        int next = 0;
        add(plot, next++, points.usedSet(), Markers.used(points, rootTime, style));
        if (points.hasAside()) {
            add(plot, next++, points.asideSet(), Markers.aside(rootTime, style));
        }
        Optional<DefaultXYDataset> line = shortTimeLine();
        if (line.isPresent()) {
            add(plot, next++, line.get(), Markers.line(style.ink(Ink.SHORT_TIME), style.dashed(1.8), style));
        }
        OptionalDouble plateau = plateau();
        if (plateau.isPresent()) {
            double[][] ends = {{0, right}, {plateau.getAsDouble(), plateau.getAsDouble()}};
            add(
                    plot,
                    next++,
                    DrawnWeighings.set("plateau M∞", ends),
                    Markers.line(style.ink(Ink.PLATEAU), style.dotted(2.2), style));
        }
        if (assessment.estimate().isOptimum()) {
            add(plot, next, curve(), Markers.line(style.ink(Ink.CURVE), style.solid(2), style));
        }
        return plot;
    }

    private static void add(XYPlot plot, int index, DefaultXYDataset set, XYLineAndShapeRenderer renderer) {
        plot.setDataset(index, set);
        plot.setRenderer(index, renderer);
    }

    /** Beyond the last weighing only where the plateau is known: a curve of an early stop must not suggest one. */
    private DefaultXYDataset curve() {
        Estimate estimate = assessment.estimate();
        double end = assessment.determined()
                ? right
                : rootTime.of(estimate.task().data().lastTime());
        double[] roots = new double[CURVE_POINTS];
        double[] times = new double[CURVE_POINTS];
        for (int i = 0; i < CURVE_POINTS; i++) {
            roots[i] = end * i / (CURVE_POINTS - 1);
            times[i] = rootTime.seconds(roots[i]);
        }
        double[] contents = estimate.contents(times);
        for (int i = 0; i < CURVE_POINTS; i++) {
            contents[i] *= DrawnWeighings.PERCENT;
        }
        return DrawnWeighings.set("fitted curve", new double[][] {roots, contents});
    }

    private Optional<DefaultXYDataset> shortTimeLine() {
        if (assessment.shortTimeLine().isEmpty()) {
            return Optional.empty();
        }
        ShortTimeLine line = assessment.shortTimeLine().get();
        double end = line.lastRootTime() * LINE_BEYOND;
        double[][] ends = {
            {0, Math.min(right, rootTime.of(end * end))},
            {DrawnWeighings.PERCENT * line.intercept(), 0}
        };
        double endRootSeconds = Math.sqrt(rootTime.seconds(ends[0][1]));
        ends[1][1] = DrawnWeighings.PERCENT * (line.intercept() + line.slope() * endRootSeconds);
        return Optional.of(DrawnWeighings.set("short-time line", ends));
    }

    private OptionalDouble plateau() {
        if (!assessment.determined()) {
            return OptionalDouble.empty();
        }
        OptionalDouble si = assessment
                .parameter(Parameter.EQUILIBRIUM_CONTENT.name())
                .map(ParameterResult::value)
                .orElse(OptionalDouble.empty());
        return si.isEmpty() ? si : OptionalDouble.of(DrawnWeighings.PERCENT * si.getAsDouble());
    }

    private Range makeRange() {
        Range shown = points.contentRange();
        OptionalDouble plateau = plateau();
        if (plateau.isPresent()) {
            shown = Range.expandToInclude(shown, plateau.getAsDouble());
        }
        if (assessment.estimate().isOptimum()) {
            shown = Range.expandToInclude(
                    shown, DrawnWeighings.PERCENT * assessment.estimate().startContent());
        }
        double span = shown.getLength() > 0 ? shown.getLength() : Math.max(1e-9, Math.abs(shown.getUpperBound()));
        shown = points.withAsideNear(shown, span);
        return new Range(shown.getLowerBound() - MARGIN * span, shown.getUpperBound() + MARGIN * span);
    }
}
