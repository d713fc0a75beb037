package soakline.figure;

import java.util.Map;
import org.jfree.data.Range;
import org.jfree.data.xy.DefaultXYDataset;
import soakline.estimate.Estimate;
import soakline.inference.Assessment;
import soakline.specimen.ContentSeries;
import soakline.specimen.Weighings;

/** The points of a figure: weighings that took part, their residuals, and those set aside; in √t and percent. */
final class DrawnWeighings {

    static final double PERCENT = 100;

    private final RootTime axis;
    private final double[][] used;
    private final double[][] residuals;
    private final double[][] aside;
    private final int total;

    DrawnWeighings(Assessment assessment, RootTime axis) {
        this.axis = axis;
        Estimate estimate = assessment.estimate();
        ContentSeries data = estimate.task().data();
        double[] times = data.times();
        double[] roots = roots(times);
        this.total = times.length;
        double[] contents = percent(data.contents());
        this.used = picked(roots, contents);
        this.residuals = estimate.isOptimum() ? picked(roots, percent(estimate.residuals())) : new double[][] {{}, {}};
        this.aside = aside(assessment.run().weighings(), data);
    }

    private double[] roots(double[] times) {
        double[] roots = new double[times.length];
        for (int i = 0; i < times.length; i++) {
            roots[i] = axis.of(times[i]);
        }
        return roots;
    }

    private double[][] aside(Weighings weighings, ContentSeries data) {
        Map<Integer, String> setAside = weighings.setAside();
        double[] roots = new double[setAside.size()];
        double[] contents = new double[setAside.size()];
        double reference = data.referenceMass();
        int k = 0;
        for (int index : setAside.keySet()) {
            roots[k] = axis.of(weighings.time(index));
            double value = weighings.value(index);
            contents[k++] = PERCENT * (Double.isNaN(reference) ? value : (value - reference) / reference);
        }
        return picked(roots, contents);
    }

    /** Number of weighings that took part. */
    int total() {
        return total;
    }

    int drawn() {
        return used[0].length;
    }

    boolean isReduced() {
        return drawn() < total;
    }

    boolean hasAside() {
        return aside[0].length > 0;
    }

    /** How many of those set aside lie above or below a range, %. */
    int asideOutside(Range range) {
        int count = 0;
        for (double content : aside[1]) {
            count += range.contains(content) ? 0 : 1;
        }
        return count;
    }

    /** The range of the used contents, %. */
    Range contentRange() {
        Range range = null;
        for (double content : used[1]) {
            range = Range.expandToInclude(range, content);
        }
        return range;
    }

    /** A range made to hold those set aside that lie within {@code reach} of it, so that one wild cell cannot flatten the rest. */
    Range withAsideNear(Range range, double reach) {
        Range result = range;
        for (double content : aside[1]) {
            if (content > range.getLowerBound() - reach && content < range.getUpperBound() + reach) {
                result = Range.expandToInclude(result, content);
            }
        }
        return result;
    }

    /** Largest residual by size, %. */
    double largestResidual() {
        double largest = 0;
        for (double r : residuals[1]) {
            largest = Math.max(largest, Math.abs(r));
        }
        return largest;
    }

    DefaultXYDataset usedSet() {
        return set("weighings", used);
    }

    DefaultXYDataset residualSet() {
        return set("residuals", residuals);
    }

    DefaultXYDataset asideSet() {
        return set("set aside", aside);
    }

    static DefaultXYDataset set(String name, double[][] points) {
        DefaultXYDataset set = new DefaultXYDataset();
        set.addSeries(name, points);
        return set;
    }

    private static double[][] picked(double[] x, double[] y) {
        int[] picks = SeriesReduction.pick(x, y, SeriesReduction.COLUMNS);
        double[][] points = new double[2][picks.length];
        for (int i = 0; i < picks.length; i++) {
            points[0][i] = x[picks[i]];
            points[1][i] = y[picks[i]];
        }
        return points;
    }

    private static double[] percent(double[] fractions) {
        for (int i = 0; i < fractions.length; i++) {
            fractions[i] *= PERCENT;
        }
        return fractions;
    }
}
