package soakline.estimate;

import java.util.List;
import soakline.numeric.Triangle;
import soakline.specimen.ContentSeries;
import soakline.uptake.UptakeModel;

/**
 * The outcome of an {@link EstimationTask}: values, covariance and how the fit ended. Immutable.
 *
 * <p>The covariance is that of the working values (ln D, contents as fractions), from a QR of the Jacobian with scaled columns
 * times the residual variance.
 */
public final class Estimate {

    private final EstimationTask task;
    private final double[] working;
    private final int[] free;
    private final double[][] unscaledCovariance;
    private final double variance;
    private final LevenbergMarquardt.Solution solution;

    Estimate(
            EstimationTask task,
            double[] working,
            double[][] unscaledCovariance,
            double variance,
            LevenbergMarquardt.Solution solution) {
        this.task = task;
        this.working = working;
        this.free = task.free();
        this.unscaledCovariance = unscaledCovariance;
        this.variance = variance;
        this.solution = solution;
    }

    public EstimationTask task() {
        return task;
    }

    public List<Parameter> parameters() {
        return task.parameters();
    }

    public LevenbergMarquardt.Ending ending() {
        return solution.ending();
    }

    /** Whether the fit ended at an optimum with a covariance. */
    public boolean isOptimum() {
        return solution.ending() == LevenbergMarquardt.Ending.CONVERGED;
    }

    /** All working values, a copy. */
    public double[] working() {
        return working.clone();
    }

    /** Working value of a parameter: its logarithm where {@link Parameter#logScale()} says so. */
    public double working(int parameter) {
        return working[parameter];
    }

    /** Value of a parameter in SI. */
    public double value(int parameter) {
        return task.parameters().get(parameter).fromWorking(working[parameter]);
    }

    /** Standard error of a working value; 0 when fixed, NaN when there is no covariance. */
    public double workingStandardError(int parameter) {
        return Math.sqrt(covariance(parameter, parameter));
    }

    /** Standard error in the parameter's own unit (SI); 0 when fixed. */
    public double standardError(int parameter) {
        double error = workingStandardError(parameter);
        return task.parameters().get(parameter).logScale() ? value(parameter) * error : error;
    }

    /** Covariance of two working values; 0 where one is fixed, NaN when there is no covariance. */
    public double covariance(int a, int b) {
        return variance * unscaledCovariance(a, b);
    }

    /** (JᵀJ)⁻¹ of the working values: the covariance per unit of residual variance. */
    public double unscaledCovariance(int a, int b) {
        if (unscaledCovariance.length == 0) {
            return Double.NaN;
        }
        int i = freeIndex(a);
        int j = freeIndex(b);
        return i < 0 || j < 0 ? 0 : unscaledCovariance[i][j];
    }

    /** Correlation of two free parameters' working values. */
    public double correlation(int a, int b) {
        return unscaledCovariance(a, b) / Math.sqrt(unscaledCovariance(a, a) * unscaledCovariance(b, b));
    }

    public double sumOfSquares() {
        return solution.sumOfSquares();
    }

    public int degreesOfFreedom() {
        return task.data().size() - free.length;
    }

    /** √(sum of squares / degrees of freedom), as a fraction of content. */
    public double residualStandardDeviation() {
        return Math.sqrt(variance);
    }

    /** Whether the scatter is no more than rounding, so that nothing can be judged by it. */
    public boolean isWithoutScatter() {
        return sumOfSquares() <= 4 * new ContentResiduals(task).roundingFloor();
    }

    public int evaluations() {
        return solution.evaluations();
    }

    /** m²/s. */
    public double diffusivity() {
        return value(0);
    }

    /** M0, fraction. */
    public double startContent() {
        return working[task.startIndex()];
    }

    /** M∞ − M0, fraction. */
    public double rise() {
        double level = working[task.levelIndex()];
        return task.form() == LevelForm.EQUILIBRIUM
                ? level - startContent()
                : level / task.model().initialSlope(shape());
    }

    /** Logarithms of the shape parameters, a copy. */
    public double[] shape() {
        double[] shape = new double[task.shapeCount()];
        System.arraycopy(working, 0, shape, 0, shape.length);
        return shape;
    }

    /** Fractional uptake of the fitted curve at each time, s. */
    public double[] fractions(double[] times) {
        double[] g = new double[times.length];
        task.model().evaluate(times, times.length, shape(), g, null);
        return g;
    }

    /** Content of the fitted curve at each time, fractions. */
    public double[] contents(double[] times) {
        double[] values = fractions(times);
        double start = startContent();
        double rise = rise();
        for (int i = 0; i < values.length; i++) {
            values[i] = start + rise * values[i];
        }
        return values;
    }

    /** Observed minus fitted content at each weighing that took part, fractions. */
    public double[] residuals() {
        ContentSeries data = task.data();
        double[] residuals = contents(data.times());
        for (int i = 0; i < residuals.length; i++) {
            residuals[i] = data.content(i) - residuals[i];
        }
        return residuals;
    }

    /** Jacobian of the content by the free working values at the optimum, one array per free parameter. */
    public double[][] jacobian() {
        int n = task.data().size();
        double[][] columns = new double[free.length][n];
        ContentResiduals rows = new ContentResiduals(task);
        double[] point = task.reduce(working);
        double[][] block = new double[free.length + 1][Triangle.BLOCK];
        for (int from = 0; from < n; from += Triangle.BLOCK) {
            int count = Math.min(Triangle.BLOCK, n - from);
            rows.fill(point, from, count, block);
            for (int k = 0; k < free.length; k++) {
                System.arraycopy(block[k], 0, columns[k], from, count);
            }
        }
        return columns;
    }

    public UptakeModel model() {
        return task.model();
    }

    private int freeIndex(int parameter) {
        for (int k = 0; k < free.length; k++) {
            if (free[k] == parameter) {
                return k;
            }
        }
        return -1;
    }
}
