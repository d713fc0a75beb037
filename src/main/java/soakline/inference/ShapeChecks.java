package soakline.inference;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.IntPredicate;
import java.util.function.IntToDoubleFunction;
import soakline.estimate.Estimate;
import soakline.estimate.EstimationTask;
import soakline.inference.Evidence.ClassicDiffusivity;
import soakline.numeric.Roots;
import soakline.problem.Code;
import soakline.problem.Finding;
import soakline.uptake.FickianModel;

/**
 * The checks of the curve's shape. Each works out a classic statistic of the data and of the fitted curve at the same times and
 * compares the two, so that bare edges are judged as fairly as sealed ones; the difference is a linear contrast of the residuals
 * and gets its exact chance from {@link ResidualSpace}. The classic diffusivity is given for plane sheets only.
 *
 * <p>Formulas: Crank, The Mathematics of Diffusion, 2nd ed. (1975), ch. 4 and 10.
 */
final class ShapeChecks {

    /** The √t line is within 0.1 % in content up to here. */
    private static final double SHORT_TIME_FRACTION = 0.5;

    private static final double LATE_REMAINDER = 0.03;
    private static final double HALF_FROM = 0.3;
    private static final double HALF_TO = 0.7;
    private static final double HALF_TIME_TAU = 0.196730739523705;

    private final ResidualSpace space;
    private final Estimate estimate;
    private final boolean plain;
    private final double path;
    private final boolean determined;
    private final double reachFactor;
    private final double rise;
    private final int start;
    private final int level;

    ShapeChecks(ResidualSpace space, boolean determined, double confidence) {
        this.space = space;
        this.estimate = space.estimate();
        FickianModel model = (FickianModel) estimate.model();
        this.plain = model.isPlain();
        this.path = model.path();
        this.determined = determined;
        this.reachFactor = Quantiles.twoSidedT(confidence, space.degreesOfFreedom()) * space.standardDeviation();
        this.rise = estimate.rise();
        EstimationTask task = estimate.task();
        this.start = task.startIndex();
        this.level = task.levelIndex();
    }

    List<Evidence> all() {
        if (!determined) {
            String why = "the test stopped before its plateau";
            return List.of(
                    shortTime(),
                    Evidence.unknown(CheckName.HALF_TIME, why),
                    Evidence.unknown(CheckName.LATE_TIME_SLOPE, why),
                    Evidence.unknown(CheckName.MEAN_TIME, why),
                    timeExponent());
        }
        return Side.bySide(
                space.size(),
                List.of(this::shortTime, this::halfTime, this::lateTime, this::meanTime, this::timeExponent));
    }

    /** The straight line through the early weighings, for the chart; empty when there are too few. */
    Optional<ShortTimeLine> shortTimeLine() {
        Line line = earlyLine();
        if (line == null) {
            return Optional.empty();
        }
        double slope = 0;
        double intercept = 0;
        double last = 0;
        for (int i = 0; i < space.size(); i++) {
            slope += line.slope[i] * space.content(i);
            intercept += line.intercept[i] * space.content(i);
            if (line.slope[i] != 0 || line.intercept[i] != 0) {
                last = Math.max(last, root(i));
            }
        }
        return Optional.of(new ShortTimeLine(slope, intercept, last));
    }

    private Evidence shortTime() {
        Line line = earlyLine();
        if (line == null) {
            return Evidence.unknown(
                    CheckName.SHORT_TIME_SLOPE, "fewer than three weighings lie in the first half of the rise");
        }
        double slope = 0;
        double intercept = 0;
        for (int i = 0; i < space.size(); i++) {
            slope += line.slope[i] * space.content(i);
            intercept += line.intercept[i] * space.content(i);
        }
        double slopeError = space.apply(line.slope);
        double interceptError = space.apply(line.intercept);
        double ratio = Math.pow(slope / (slope - slopeError), 2);
        double[] none = new double[level + 1];
        double interceptReach = reachFactor * Math.sqrt(space.formVariance(line.intercept, none));
        double slopeReach = reachFactor * Math.sqrt(space.formVariance(line.slope, none));

        ClassicDiffusivity classic = ClassicDiffusivity.NONE;
        if (plain && determined) {
            // ln D = 2 ln slope − 2 ln (M∞ − M0) + constant
            double[] c = line.slope.clone();
            for (int i = 0; i < c.length; i++) {
                c[i] *= 2 / slope;
            }
            double[] u = new double[level + 1];
            u[level] = -2 / rise;
            u[start] = 2 / rise;
            double d = Math.PI / 4 * Math.pow(slope * path / rise, 2);
            classic = ClassicDiffusivity.of(d, reachFactor * Math.sqrt(space.formVariance(c, u)));
        }
        return new Evidence(
                CheckName.SHORT_TIME_SLOPE,
                classic,
                OptionalDouble.of(determined ? ratio : Math.sqrt(ratio)),
                eitherOf(space.probability(line.slope), space.probability(line.intercept)),
                List.of(
                        new Check.Figure("slope", slope),
                        new Check.Figure("slopeLow", slope - slopeReach),
                        new Check.Figure("slopeHigh", slope + slopeReach),
                        new Check.Figure("intercept", intercept),
                        new Check.Figure("interceptLow", intercept - interceptReach),
                        new Check.Figure("interceptHigh", intercept + interceptReach),
                        new Check.Figure("interceptOffFit", interceptError),
                        new Check.Figure("weighings", line.points)),
                determined
                        ? Finding.of(Code.SHORT_TIME_PASS, ratio)
                        : Finding.of(Code.SHORT_TIME_SLOPE_PASS, Math.sqrt(ratio)),
                determined
                        ? Finding.of(Code.SHORT_TIME_DIFFERS, ratio, interceptError * 100)
                        : Finding.of(Code.SHORT_TIME_SLOPE_DIFFERS, Math.sqrt(ratio), interceptError * 100));
    }

    private Evidence halfTime() {
        double half = timeOfFraction(0.5);
        Line line = line(i -> space.fraction(i) >= HALF_FROM && space.fraction(i) <= HALF_TO, i -> 1);
        if (line == null || !(line.first < half && half < line.last)) {
            return Evidence.unknown(CheckName.HALF_TIME, "fewer than three weighings lie around half of the rise");
        }
        double x = Math.sqrt(half);
        double[] at = new double[space.size()];
        for (int i = 0; i < at.length; i++) {
            at[i] = line.intercept[i] + x * line.slope[i];
        }
        double h = 1e-4 * x;
        double perRoot = rise
                * (estimate.fractions(new double[] {(x + h) * (x + h)})[0]
                        - estimate.fractions(new double[] {(x - h) * (x - h)})[0])
                / (2 * h);
        double rootOfData = x - space.apply(at) / perRoot;
        // a residual above the curve means that half content comes earlier, so D is larger
        double ratio = Math.pow(x / rootOfData, 2);
        ClassicDiffusivity classic = ClassicDiffusivity.NONE;
        if (plain) {
            double[] c = new double[at.length];
            for (int i = 0; i < c.length; i++) {
                c[i] = 2 * at[i] / (perRoot * rootOfData);
            }
            double[] u = new double[level + 1];
            u[level] = -1 / (perRoot * rootOfData);
            u[start] = -1 / (perRoot * rootOfData);
            classic = ClassicDiffusivity.of(
                    HALF_TIME_TAU * path * path / (rootOfData * rootOfData),
                    reachFactor * Math.sqrt(space.formVariance(c, u)));
        }
        return new Evidence(
                CheckName.HALF_TIME,
                classic,
                OptionalDouble.of(ratio),
                space.probability(at),
                List.of(
                        new Check.Figure("halfTimeOfData", rootOfData * rootOfData),
                        new Check.Figure("halfTimeOfFit", half)),
                Finding.of(Code.HALF_TIME_PASS, 1 / ratio),
                Finding.of(Code.HALF_TIME_DIFFERS, 1 / ratio));
    }

    private Evidence lateTime() {
        Line line = lineOverTime(
                i -> space.fraction(i) > 0.5 && 1 - space.fraction(i) > LATE_REMAINDER,
                i -> Math.pow(1 - space.fraction(i), 2));
        if (line == null) {
            return Evidence.unknown(
                    CheckName.LATE_TIME_SLOPE,
                    "fewer than three weighings lie between half of the rise and 97 % of it");
        }
        double slopeOfFit = 0;
        double[] contrast = new double[space.size()];
        double perLevel = 0;
        for (int i = 0; i < contrast.length; i++) {
            if (line.slope[i] != 0) {
                double remaining = 1 - space.fraction(i);
                slopeOfFit += line.slope[i] * Math.log(remaining);
                // to first order in the residual, so that a weighing above the plateau needs no logarithm
                contrast[i] = -line.slope[i] / (rise * remaining);
                perLevel += line.slope[i] / (rise * remaining);
            }
        }
        double slope = slopeOfFit + space.apply(contrast);
        double ratio = slope / slopeOfFit;
        ClassicDiffusivity classic = ClassicDiffusivity.NONE;
        if (plain && slope < 0) {
            double[] c = contrast.clone();
            for (int i = 0; i < c.length; i++) {
                c[i] /= slope;
            }
            double[] u = new double[level + 1];
            u[level] = perLevel / slope;
            classic = ClassicDiffusivity.of(
                    -slope * 4 * path * path / (Math.PI * Math.PI), reachFactor * Math.sqrt(space.formVariance(c, u)));
        }
        return new Evidence(
                CheckName.LATE_TIME_SLOPE,
                classic,
                OptionalDouble.of(ratio),
                space.probability(contrast),
                List.of(new Check.Figure("rate", -slope), new Check.Figure("weighings", line.points)),
                Finding.of(Code.LATE_TIME_PASS, ratio),
                Finding.of(Code.LATE_TIME_DIFFERS, ratio));
    }

    private Evidence meanTime() {
        double[] contrast = new double[space.size()];
        double[] u = new double[level + 1];
        for (int i = 1; i < contrast.length; i++) {
            double width = Math.max(0, space.time(i)) - Math.max(0, space.time(i - 1));
            contrast[i - 1] -= width / 2 / rise;
            contrast[i] -= width / 2 / rise;
        }
        for (int i = 0; i < contrast.length; i++) {
            u[level] -= contrast[i] * space.fraction(i);
            u[start] -= contrast[i] * (1 - space.fraction(i));
        }
        double ofFit = estimate.model().meanTime(estimate.shape());
        double ofData = ofFit + space.apply(contrast);
        double ratio = ofFit / ofData;
        ClassicDiffusivity classic = ClassicDiffusivity.NONE;
        if (plain && ofData > 0) {
            double[] c = contrast.clone();
            for (int i = 0; i < c.length; i++) {
                c[i] /= -ofData;
            }
            u[level] /= -ofData;
            u[start] /= -ofData;
            classic = ClassicDiffusivity.of(
                    path * path / (3 * ofData), reachFactor * Math.sqrt(space.formVariance(c, u)));
        }
        return new Evidence(
                CheckName.MEAN_TIME,
                classic,
                OptionalDouble.of(ratio),
                space.probability(contrast),
                List.of(new Check.Figure("meanTimeOfData", ofData), new Check.Figure("meanTimeOfFit", ofFit)),
                Finding.of(Code.MEAN_TIME_PASS, ratio),
                Finding.of(Code.MEAN_TIME_DIFFERS, ratio));
    }

    /**
     * Content as a power of time: tᵐ in the place of t in the curve, m = 1 for Fick's law, so that content rises as t^(m/2). One
     * Gauss–Newton step in ln m from the fit.
     */
    private Evidence timeExponent() {
        int n = space.size();
        double[] times = new double[n];
        for (int i = 0; i < n; i++) {
            times[i] = space.time(i);
        }
        double[] g = new double[n];
        double[][] dg = new double[estimate.task().shapeCount()][n];
        estimate.model().evaluate(times, n, estimate.shape(), g, dg);
        double[] direction = new double[n];
        double last = times[n - 1];
        for (int i = 0; i < n; i++) {
            direction[i] = times[i] > 0 ? rise * dg[0][i] * Math.log(times[i] / last) : 0;
        }
        double variance = space.contrastVariance(direction);
        OptionalDouble probability = space.probability(direction);
        if (probability.isEmpty() || !(variance > 0)) {
            return Evidence.unknown(CheckName.TIME_EXPONENT, "too few weighings");
        }
        double exponent = 0.5 * (1 + space.apply(direction) / variance);
        double reach = 0.5 * reachFactor / Math.sqrt(variance);
        return new Evidence(
                CheckName.TIME_EXPONENT,
                ClassicDiffusivity.NONE,
                OptionalDouble.empty(),
                probability,
                List.of(
                        new Check.Figure("exponent", exponent),
                        new Check.Figure("exponentLow", exponent - reach),
                        new Check.Figure("exponentHigh", exponent + reach)),
                Finding.of(Code.EXPONENT_PASS, exponent),
                Finding.of(Code.EXPONENT_DIFFERS, exponent));
    }

    private double timeOfFraction(double fraction) {
        double scale = estimate.model().meanTime(estimate.shape());
        return Roots.between(t -> estimate.fractions(new double[] {t})[0] - fraction, scale * 1e-9, scale * 100, 1e-13);
    }

    private Line earlyLine() {
        return line(i -> space.time(i) >= 0 && space.fraction(i) <= SHORT_TIME_FRACTION, i -> 1);
    }

    private double root(int i) {
        return Math.sqrt(Math.max(0, space.time(i)));
    }

    private Line line(IntPredicate member, IntToDoubleFunction weight) {
        return Line.of(space, member, weight, this::root);
    }

    private Line lineOverTime(IntPredicate member, IntToDoubleFunction weight) {
        return Line.of(space, member, weight, space::time);
    }

    private static OptionalDouble eitherOf(OptionalDouble a, OptionalDouble b) {
        if (a.isEmpty()) {
            return b;
        }
        return b.isEmpty() ? a : OptionalDouble.of(Math.min(1, 2 * Math.min(a.getAsDouble(), b.getAsDouble())));
    }
}
