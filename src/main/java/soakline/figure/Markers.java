package soakline.figure;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Shape;
import java.awt.Stroke;
import java.awt.geom.Ellipse2D;
import java.awt.geom.GeneralPath;
import java.awt.geom.Line2D;
import org.jfree.chart.labels.XYToolTipGenerator;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.data.xy.XYDataset;
import soakline.figure.ChartStyle.Ink;
import soakline.quantity.Numbers;

/** How points and lines are drawn. */
final class Markers {

    private static final int MANY = 300;

    private Markers() {}

    /** Filled translucent discs, smaller where there are many; a band from extreme to extreme where not all are drawn. */
    static XYLineAndShapeRenderer used(DrawnWeighings points, RootTime rootTime, ChartStyle style) {
        if (points.isReduced()) {
            XYLineAndShapeRenderer band = line(style.translucent(Ink.WEIGHING), style.solid(1), style);
            return band;
        }
        double size = style.length(points.drawn() > MANY ? 3.5 : 7);
        XYLineAndShapeRenderer renderer = new XYLineAndShapeRenderer(false, true);
        Shape disc = new Ellipse2D.Double(-size / 2, -size / 2, size, size);
        renderer.setSeriesShape(0, disc);
        renderer.setSeriesPaint(0, style.translucent(Ink.WEIGHING));
        renderer.setDefaultToolTipGenerator(reading(rootTime));
        double legendSize = style.length(7);
        renderer.setLegendShape(0, new Ellipse2D.Double(-legendSize / 2, -legendSize / 2, legendSize, legendSize));
        return renderer;
    }

    /** Hollow discs with a cross: told from the others by shape, not by colour alone. */
    static XYLineAndShapeRenderer aside(RootTime rootTime, ChartStyle style) {
        double r = style.length(4);
        GeneralPath crossed = new GeneralPath(new Ellipse2D.Double(-r, -r, 2 * r, 2 * r));
        double arm = r * Math.sqrt(0.5);
        crossed.append(new Line2D.Double(-arm, -arm, arm, arm), false);
        crossed.append(new Line2D.Double(-arm, arm, arm, -arm), false);
        XYLineAndShapeRenderer renderer = new XYLineAndShapeRenderer(false, true);
        renderer.setSeriesShape(0, crossed);
        renderer.setSeriesShapesFilled(0, false);
        renderer.setSeriesPaint(0, style.ink(Ink.SET_ASIDE));
        renderer.setSeriesOutlineStroke(0, new BasicStroke((float) style.length(1.3)));
        renderer.setSeriesStroke(0, new BasicStroke((float) style.length(1.3)));
        renderer.setDefaultToolTipGenerator(reading(rootTime));
        return renderer;
    }

    static XYLineAndShapeRenderer line(Color ink, Stroke stroke, ChartStyle style) {
        XYLineAndShapeRenderer renderer = new XYLineAndShapeRenderer(true, false);
        renderer.setDrawSeriesLineAsPath(true);
        renderer.setSeriesPaint(0, ink);
        renderer.setSeriesStroke(0, stroke);
        renderer.setLegendLine(new Line2D.Double(-style.length(11), 0, style.length(11), 0));
        return renderer;
    }

    private static XYToolTipGenerator reading(RootTime rootTime) {
        return (XYDataset set, int series, int item) -> "t = "
                + Numbers.significant(rootTime.time(set.getXValue(series, item)), 4) + " "
                + rootTime.unit().symbol() + ", " + Numbers.significant(set.getYValue(series, item), 4) + " %";
    }
}
