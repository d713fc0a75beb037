package soakline.estimate;

import java.util.Arrays;
import soakline.numeric.LinearLeastSquares;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.specimen.ContentSeries;

/** From a task to its estimate, by a scan for start values and Levenberg–Marquardt. Stateless. */
public final class Estimator {

    private static final double ROOT_LAW_FRACTION = 1e-5;

    private Estimator() {}

    /**
     * Estimates the free parameters. No start value is ever asked for.
     *
     * <p>Where the fit did not converge or is singular the result says so ({@link Estimate#ending()}); it is for the caller to
     * show no number then.
     *
     * @throws Fault when no parameter is free, or there are fewer weighings than parameters and one
     */
    public static Estimate estimate(EstimationTask task) {
        int free = task.free().length;
        if (free == 0) {
            throw Fault.of(Code.PARAMETER_ALL_FIXED);
        }
        int size = task.data().size();
        if (size <= free) {
            throw Fault.of(Code.TOO_FEW_WEIGHINGS, size, free + 1);
        }
        if (size <= StartScan.MOST_WEIGHINGS) {
            return refit(task, new StartScan(task, task.data()).best());
        }
        ContentSeries thinned = thinned(task.data());
        EstimationTask small = task.withData(thinned);
        double[] start = new StartScan(small, thinned).best();
        Estimate near = refit(small, start);
        return refit(task, near.isOptimum() ? near.working() : start);
    }

    /**
     * Estimates from start values that are known to be near, such as those of a neighbouring task.
     *
     * @param start all working values; those of fixed parameters are not looked at
     */
    public static Estimate refit(EstimationTask task, double[] start) {
        if (task.form() != LevelForm.INITIAL_SLOPE || task.isFixed(0)) {
            return descend(task, start);
        }
        // a start on the flat side would never leave it, so the scan gives another
        Estimate estimate = descend(task, new StartScan(task, thinned(task.data())).best());
        // the best D may be any small one: the content then follows √t alone, which has no D to descend to
        double[] rootLaw = start.clone();
        rootLaw[0] = rootLawDiffusivity(task);
        Estimate limit = descend(task.withFixed(0, rootLaw[0]), rootLaw);
        boolean better =
                limit.isOptimum() && (!estimate.isOptimum() || limit.sumOfSquares() <= estimate.sumOfSquares());
        return better ? limit : estimate;
    }

    /** As {@link #refit}, from start values that are all but the optimum, as along a profile: a few undamped steps, if they will do. */
    public static Estimate refitFromClose(EstimationTask task, double[] start) {
        if (task.form() == LevelForm.EQUILIBRIUM) {
            ContentResiduals residuals = new ContentResiduals(task);
            Estimate close = estimate(task, residuals, LevenbergMarquardt.refine(residuals, task.reduce(start)));
            if (close.isOptimum()) {
                return close;
            }
        }
        return refit(task, start);
    }

    /** ln of a D so small that content follows the root of time to five digits up to the last weighing. */
    private static double rootLawDiffusivity(EstimationTask task) {
        double[] unit = new double[task.shapeCount()];
        for (int k = 1; k < unit.length; k++) {
            unit[k] = task.fixedAt(k).orElse(0);
        }
        double reached = task.model().initialSlope(unit) * Math.sqrt(task.data().lastTime());
        return 2 * Math.log(ROOT_LAW_FRACTION / reached);
    }

    private static Estimate descend(EstimationTask task, double[] start) {
        ContentResiduals residuals = new ContentResiduals(task);
        return estimate(task, residuals, LevenbergMarquardt.solve(residuals, task.reduce(start)));
    }

    private static Estimate estimate(
            EstimationTask task, ContentResiduals residuals, LevenbergMarquardt.Solution solution) {
        int free = task.free().length;
        int degreesOfFreedom = task.data().size() - free;
        // data on the curve to the last digit still carry the rounding of their digits
        double variance = Math.max(solution.sumOfSquares(), residuals.roundingFloor()) / degreesOfFreedom;
        double[][] covariance = new double[0][];
        if (solution.ending() != LevenbergMarquardt.Ending.SINGULAR
                && LinearLeastSquares.isRegular(solution.triangle(), free)) {
            covariance = LinearLeastSquares.unscaledCovariance(solution.triangle(), free);
        }
        return new Estimate(task, task.complete(solution.point()), covariance, variance, solution);
    }

    /** The sum of squares of a task of which every parameter is fixed. */
    public static double sumOfSquares(EstimationTask task) {
        double[] working = new double[task.parameters().size()];
        for (int i = 0; i < working.length; i++) {
            working[i] = task.fixedAt(i).orElseThrow();
        }
        double sum = 0;
        for (double r : new Estimate(task, working, new double[0][], Double.NaN, null).residuals()) {
            sum += r * r;
        }
        return sum;
    }

    /** About 512 weighings: half of them even by number, half crowded towards the start, where a fast coupon does its all. */
    private static ContentSeries thinned(ContentSeries data) {
        int n = data.size();
        if (n <= StartScan.MOST_WEIGHINGS) {
            return data;
        }
        int half = StartScan.MOST_WEIGHINGS / 2;
        int[] picks = new int[2 * half];
        for (int k = 0; k < half; k++) {
            picks[2 * k] = (int) ((long) k * (n - 1) / (half - 1));
            picks[2 * k + 1] = (int) (Math.pow(n, (double) k / (half - 1)) - 1);
        }
        int[] sorted = Arrays.stream(picks).distinct().sorted().toArray();
        double[] times = new double[sorted.length];
        double[] contents = new double[sorted.length];
        for (int k = 0; k < sorted.length; k++) {
            times[k] = data.time(sorted[k]);
            contents[k] = data.content(sorted[k]);
        }
        return ContentSeries.of(times, contents);
    }
}
