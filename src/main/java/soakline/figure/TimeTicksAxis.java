package soakline.figure;

import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.NumberTick;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.TextAnchor;
import soakline.quantity.Numbers;

/** A second reading of the √t axis in t: round times, where they lie on the √t scale. */
final class TimeTicksAxis extends NumberAxis {

    private static final long serialVersionUID = 1L;

    /** First digits from the roundest on: where two ticks would touch, the rounder one stays. */
    private static final int[] FIRST_DIGITS = {1, 5, 2, 3, 4, 6, 8};

    private final double gap;

    /**
     * @param gap least distance of two ticks, pixels
     */
    TimeTicksAxis(String label, double gap) {
        super(label);
        this.gap = gap;
    }

    @Override
    protected List<NumberTick> refreshTicksHorizontal(Graphics2D g2, Rectangle2D dataArea, RectangleEdge edge) {
        List<NumberTick> ticks = new ArrayList<>();
        for (double time : times(getRange().getLowerBound(), getRange().getUpperBound(), gap / dataArea.getWidth())) {
            ticks.add(new NumberTick(
                    Math.sqrt(time), Numbers.shortest(time), TextAnchor.BOTTOM_CENTER, TextAnchor.BOTTOM_CENTER, 0));
        }
        return ticks;
    }

    /**
     * Round times whose roots lie between two values.
     *
     * @param share least distance of two ticks as a share of the axis
     */
    static List<Double> times(double fromRoot, double toRoot, double share) {
        double least = share * (toRoot - fromRoot);
        List<Double> times = new ArrayList<>();
        if (fromRoot <= 0) {
            times.add(0.0);
        }
        int top = (int) Math.floor(Math.log10(toRoot * toRoot));
        for (int digit : FIRST_DIGITS) {
            for (int power = top; power > top - 4; power--) {
                double time = digit * Math.pow(10, power);
                double root = Math.sqrt(time);
                if (root >= fromRoot
                        && root <= toRoot
                        && times.stream().noneMatch(t -> Math.abs(Math.sqrt(t) - root) < least)) {
                    times.add(time);
                }
            }
        }
        times.sort(Double::compare);
        return times;
    }
}
