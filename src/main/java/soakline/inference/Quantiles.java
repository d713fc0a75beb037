package soakline.inference;

import org.apache.commons.statistics.distribution.NormalDistribution;
import org.apache.commons.statistics.distribution.TDistribution;

/** Quantiles and tails of Student's t and the normal distribution, from Apache Commons Statistics. */
final class Quantiles {

    private static final NormalDistribution NORMAL = NormalDistribution.of(0, 1);

    /** The quantile asked for last: a bootstrap or a study asks for the same one thousands of times. */
    private static volatile Last last = new Last(Double.NaN, Double.NaN, Double.NaN);

    private Quantiles() {}

    private record Last(double degreesOfFreedom, double level, double value) {}

    /** The t that a two-sided interval of this level reaches to either side. */
    static double twoSidedT(double level, double degreesOfFreedom) {
        Last known = last;
        if (known.degreesOfFreedom == degreesOfFreedom && known.level == level) {
            return known.value;
        }
        double value = TDistribution.of(degreesOfFreedom).inverseSurvivalProbability((1 - level) / 2);
        last = new Last(degreesOfFreedom, level, value);
        return value;
    }

    /** P(|t| ≥ x). */
    static double twoSidedTailOfT(double x, double degreesOfFreedom) {
        return 2 * TDistribution.of(degreesOfFreedom).survivalProbability(Math.abs(x));
    }

    /** P(z ≤ x). */
    static double normal(double x) {
        return NORMAL.cumulativeProbability(x);
    }

    /** P(z > x). */
    static double normalTail(double x) {
        return NORMAL.survivalProbability(x);
    }
}
