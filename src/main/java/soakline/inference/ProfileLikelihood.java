package soakline.inference;

import java.util.OptionalDouble;
import soakline.estimate.Estimate;
import soakline.estimate.EstimationTask;
import soakline.estimate.Estimator;
import soakline.estimate.LevelForm;

/**
 * Profile-likelihood limits of one parameter: the values x at which the best fit with the parameter held at x is worse than the
 * optimum by as much as an F quantile allows, S(x) = S (1 + F(1, ν)/ν) (Bates and Watts, Nonlinear Regression Analysis and Its
 * Applications (1988), ch. 6).
 *
 * <p>The search runs on the signed root ψ(x) = ±√((S(x) − S)/s²), which is nearly a straight line, so a few refits are enough. A
 * side on which ψ never reaches the quantile is open. Limits are good to 1e-7 of the standard error.
 */
final class ProfileLikelihood {

    /** How far a logarithm is followed before its side counts as open: a factor of 1e8. */
    private static final double FARTHEST_LOG = Math.log(1e8);
    /** How far a content is followed, in units of the spread of the contents. */
    private static final double FARTHEST_CONTENT = 1e4;

    private static final double RELATIVE_ACCURACY = 1e-7;
    private static final double NEARLY = 1e-5;
    private static final int MOST_REFITS = 80;

    private final Estimate estimate;
    private final EstimationTask task;
    private final int parameter;
    private final double best;
    private final double error;

    ProfileLikelihood(Estimate estimate, int parameter) {
        this.estimate = estimate;
        this.task = estimate.task();
        this.parameter = parameter;
        this.best = estimate.working(parameter);
        this.error = estimate.workingStandardError(parameter);
    }

    /** Working values of the limits of a two-sided interval. */
    Limits limits(double level) {
        double quantile = Quantiles.twoSidedT(level, estimate.degreesOfFreedom());
        return new Limits(limit(-1, quantile), limit(1, quantile));
    }

    /** Working values; an open side is empty. */
    record Limits(OptionalDouble low, OptionalDouble high) {}

    private OptionalDouble limit(int side, double quantile) {
        double farthest = farthest();
        double step = Math.min(quantile * error, farthest);
        Point inside = new Point(best, 0, estimate.working());
        Point before = inside;
        Point outside = null;
        int refits = 0;
        while (outside == null) {
            double x = best + side * step;
            Point next = refit(x, before, inside);
            refits++;
            if (next == null) {
                return OptionalDouble.empty();
            }
            if (Math.abs(next.root - quantile) < NEARLY * quantile) {
                return OptionalDouble.of(x - (next.root - quantile) * (x - best) / next.root);
            }
            if (next.root >= quantile) {
                outside = next;
            } else {
                before = inside;
                inside = next;
                if (step >= farthest) {
                    return OptionalDouble.empty();
                }
                // far from it on by doubling, near it a little beyond the straight line, very near it on the line
                // itself
                double growth = next.root > 0 ? quantile / next.root : 2;
                step = Math.min(farthest, step * Math.min(2, growth > 1.01 ? 1.02 * growth : growth));
            }
        }
        return OptionalDouble.of(between(inside, outside, quantile, refits));
    }

    /** Regula falsi with the Illinois rule between a point inside and one outside. */
    private double between(Point first, Point second, double quantile, int refitsSoFar) {
        Point inside = first;
        Point outside = second;
        double below = inside.root - quantile;
        double above = outside.root - quantile;
        int lastSide = 0;
        double tolerance = RELATIVE_ACCURACY * error;
        double previous = Double.NaN;
        for (int refits = refitsSoFar; refits < MOST_REFITS; refits++) {
            double x = (inside.x * above - outside.x * below) / (above - below);
            if (Math.abs(x - previous) <= tolerance || Math.abs(outside.x - inside.x) <= tolerance) {
                return x;
            }
            previous = x;
            Point next = refit(x, inside, outside);
            if (next == null) {
                return x;
            }
            double value = next.root - quantile;
            if (Math.abs(value) < NEARLY * quantile) {
                // the chord from the optimum is good enough for what is left
                return x - value * (x - best) / next.root;
            }
            if (value < 0) {
                above = lastSide == -1 ? above / 2 : outside.root - quantile;
                inside = next;
                below = value;
                lastSide = -1;
            } else {
                below = lastSide == 1 ? below / 2 : inside.root - quantile;
                outside = next;
                above = value;
                lastSide = 1;
            }
        }
        return previous;
    }

    /** The best fit with the parameter held at x, started on the straight line through two solved points; null if none. */
    private Point refit(double x, Point a, Point b) {
        if (task.free().length == 1) {
            return new Point(x, root(sumWithout(x)), estimate.working());
        }
        double[] start = new double[a.working.length];
        boolean apart = Math.abs(b.x - a.x) > 0;
        for (int i = 0; i < start.length; i++) {
            double slope = apart
                    ? (b.working[i] - a.working[i]) / (b.x - a.x)
                    : estimate.unscaledCovariance(i, parameter) / estimate.unscaledCovariance(parameter, parameter);
            start[i] = b.working[i] + slope * (x - b.x);
        }
        EstimationTask held = task.withFixed(parameter, x);
        Estimate refit = Estimator.refitFromClose(held, start);
        if (!refit.isOptimum()) {
            refit = Estimator.estimate(held);
        }
        return refit.isOptimum() ? new Point(x, root(refit.sumOfSquares()), refit.working()) : null;
    }

    private double sumWithout(double x) {
        return Estimator.sumOfSquares(task.withFixed(parameter, x));
    }

    private double root(double sumOfSquares) {
        double s = estimate.residualStandardDeviation();
        return Math.sqrt(Math.max(0, sumOfSquares - estimate.sumOfSquares())) / s;
    }

    private double farthest() {
        if (task.parameters().get(parameter).logScale()) {
            return FARTHEST_LOG;
        }
        double[] contents = task.data().contents();
        double low = contents[0];
        double high = contents[0];
        for (double c : contents) {
            low = Math.min(low, c);
            high = Math.max(high, c);
        }
        double spread = high - low;
        return FARTHEST_CONTENT * (parameter == task.levelIndex() && isSlope() ? Math.abs(best) : spread);
    }

    private boolean isSlope() {
        return task.form() == LevelForm.INITIAL_SLOPE;
    }

    /** A solved point of the profile: x, ψ without its sign, and all working values. */
    private static final class Point {
        final double x;
        final double root;
        final double[] working;

        Point(double x, double root, double[] working) {
            this.x = x;
            this.root = root;
            this.working = working;
        }
    }
}
