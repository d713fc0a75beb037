package soakline.inference;

import java.util.OptionalDouble;
import soakline.estimate.Estimate;
import soakline.estimate.EstimationTask;
import soakline.specimen.ContentSeries;

/**
 * The residuals of an estimate together with what the fit has taken out of them, to first order: r = (I − H) y with
 * H = J (JᵀJ)⁻¹ Jᵀ. Every check that is a linear contrast cᵀr, or a linear form cᵀy + uᵀθ̂, gets its exact variance here.
 */
final class ResidualSpace {

    /** From this many weighings on, correlation between neighbours is told from a wrong shape and allowed for. */
    private static final int LONG = 50;

    private final Estimate estimate;
    private final ContentSeries data;
    private final double[] times;
    private final double[] fractions;
    private final double[] residuals;
    private final double[][] jacobian;
    private final double[][] inverse;
    private final int[] free;
    private final double sd;
    private final int degreesOfFreedom;
    private final double sumOfSquares;

    ResidualSpace(Estimate estimate) {
        EstimationTask task = estimate.task();
        this.estimate = estimate;
        this.data = task.data();
        this.times = data.times();
        this.fractions = estimate.fractions(times);
        this.residuals = residuals(data, fractions, estimate.startContent(), estimate.rise());
        this.jacobian = estimate.jacobian();
        this.free = task.free();
        this.inverse = new double[free.length][free.length];
        for (int a = 0; a < free.length; a++) {
            for (int b = 0; b < free.length; b++) {
                inverse[a][b] = estimate.unscaledCovariance(free[a], free[b]);
            }
        }
        this.sd = estimate.residualStandardDeviation();
        this.degreesOfFreedom = estimate.degreesOfFreedom();
        this.sumOfSquares = estimate.sumOfSquares();
    }

    private static double[] residuals(ContentSeries data, double[] fractions, double start, double rise) {
        double[] residuals = new double[fractions.length];
        for (int i = 0; i < residuals.length; i++) {
            residuals[i] = data.content(i) - (start + rise * fractions[i]);
        }
        return residuals;
    }

    Estimate estimate() {
        return estimate;
    }

    int size() {
        return residuals.length;
    }

    int degreesOfFreedom() {
        return degreesOfFreedom;
    }

    double standardDeviation() {
        return sd;
    }

    double sumOfSquares() {
        return sumOfSquares;
    }

    double time(int i) {
        return times[i];
    }

    /** Fractional uptake of the fitted curve. */
    double fraction(int i) {
        return fractions[i];
    }

    double residual(int i) {
        return residuals[i];
    }

    double content(int i) {
        return data.content(i);
    }

    /** Columns of the Jacobian of the free parameters; not to be changed. */
    double[][] jacobian() {
        return jacobian;
    }

    /** (JᵀJ)⁻¹ of the free parameters; not to be changed. */
    double[][] inverse() {
        return inverse;
    }

    /** cᵀr. */
    double apply(double[] c) {
        return dot(c, residuals);
    }

    /** cᵀ(I − H)c: the variance of cᵀr in units of the residual variance. */
    double contrastVariance(double[] c) {
        double[] jc = project(c);
        return dot(c, c) - quadratic(jc, jc);
    }

    /** 1 − H_ii: the variance of a residual in units of the residual variance. */
    double residualVariance(int i) {
        double h = 0;
        for (int a = 0; a < free.length; a++) {
            for (int b = 0; b < free.length; b++) {
                h += jacobian[a][i] * inverse[a][b] * jacobian[b][i];
            }
        }
        return 1 - h;
    }

    /**
     * Variance of cᵀy + uᵀθ̂ in units of the residual variance, θ̂ ≈ (JᵀJ)⁻¹Jᵀy.
     *
     * @param u derivative by each parameter of the task, fixed ones included (they have no variance)
     */
    double formVariance(double[] c, double[] u) {
        double[] jc = project(c);
        double[] uFree = new double[free.length];
        for (int k = 0; k < free.length; k++) {
            uFree[k] = u[free[k]];
        }
        return dot(c, c) + 2 * quadratic(jc, uFree) + quadratic(uFree, uFree);
    }

    /**
     * P of a deviation cᵀr at least this large, both sides: exact for white normal noise and a linear model, as a studentised
     * residual contrast T has T² / ν distributed as Beta(½, (ν − 1)/2). In long series whose neighbours are alike the variance
     * is raised by (1 + ρ)/(1 − ρ) (effective number of observations; common practice, no source).
     */
    OptionalDouble probability(double[] c) {
        double variance = contrastVariance(c);
        if (!(variance > 1e-12 * dot(c, c)) || degreesOfFreedom < 2 || !(sd > 0)) {
            return OptionalDouble.empty();
        }
        double t = apply(c) / (sd * Math.sqrt(variance * inflation()));
        return OptionalDouble.of(tailOfStudentised(t));
    }

    /** P of an internally studentised residual or contrast at least this large, both sides. */
    double tailOfStudentised(double t) {
        double left = degreesOfFreedom - t * t;
        if (left <= 0) {
            return 0;
        }
        double external = t * Math.sqrt((degreesOfFreedom - 1) / left);
        return Quantiles.twoSidedTailOfT(external, degreesOfFreedom - 1);
    }

    /** Σ r_i r_(i+1) / Σ r_i². */
    double lagOneCorrelation() {
        double sum = 0;
        for (int i = 1; i < residuals.length; i++) {
            sum += residuals[i] * residuals[i - 1];
        }
        return sum / sumOfSquares;
    }

    private double inflation() {
        if (residuals.length < LONG) {
            return 1;
        }
        double rho = Math.max(0, Math.min(0.99, lagOneCorrelation()));
        // below the noise of the correlation itself, nothing to allow for
        return rho < 2 / Math.sqrt(residuals.length) ? 1 : (1 + rho) / (1 - rho);
    }

    private double[] project(double[] c) {
        double[] jc = new double[free.length];
        for (int k = 0; k < free.length; k++) {
            jc[k] = dot(jacobian[k], c);
        }
        return jc;
    }

    private double quadratic(double[] a, double[] b) {
        double sum = 0;
        for (int i = 0; i < a.length; i++) {
            for (int j = 0; j < b.length; j++) {
                sum += a[i] * inverse[i][j] * b[j];
            }
        }
        return sum;
    }

    private static double dot(double[] a, double[] b) {
        double sum = 0;
        for (int i = 0; i < a.length; i++) {
            sum += a[i] * b[i];
        }
        return sum;
    }
}
