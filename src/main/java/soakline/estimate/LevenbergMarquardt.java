package soakline.estimate;

import java.util.List;
import java.util.stream.Stream;
import org.apache.commons.math3.exception.ConvergenceException;
import org.apache.commons.math3.exception.MathIllegalStateException;
import org.apache.commons.math3.fitting.leastsquares.LevenbergMarquardtOptimizer;
import org.apache.commons.math3.util.Precision;
import soakline.numeric.LinearLeastSquares;
import soakline.numeric.Triangle;

/**
 * Levenberg–Marquardt by Apache Commons Math, then an undamped Gauss–Newton polish.
 *
 * <p>Residuals and Jacobian are reduced to a triangle first ({@link Triangle}): the optimiser sees as many rows as there are
 * parameters, and one. That leaves its steps unchanged, as they depend on JᵀJ, Jᵀr and rᵀr only, and needs no matrix of the
 * length of the data.
 */
public final class LevenbergMarquardt {

    /** Lower ones are refused near the optimum although the point is right; the polish gives the digits that are left. */
    private static final double TOLERANCE = 1e-14;

    private static final int MOST_EVALUATIONS = 5000;
    /** A log starts from the estimate of a thinned one, so it has no long way to go, and each evaluation takes its time. */
    private static final int MOST_EVALUATIONS_OF_LOG = 100;

    private static final int SHORT = 10_000;
    private static final int MOST_POLISH_STEPS = 60;
    /** A polished point is settled when the step would remove less than this share of the sum of squares. */
    private static final double SETTLED = 1e-24;
    /** A point counts as an optimum when a Gauss–Newton step would not remove more than this share. */
    private static final double OPTIMUM = 1e-8;

    /** Bounds of the first step, tried in turn: a long first step may land where the model is flat. */
    private static final List<LevenbergMarquardtOptimizer> OPTIMISERS = Stream.of(100.0, 1.0, 0.1)
            .map(bound -> new LevenbergMarquardtOptimizer(bound, TOLERANCE, TOLERANCE, TOLERANCE, Precision.SAFE_MIN))
            .toList();

    private LevenbergMarquardt() {}

    /** How a minimisation ended. */
    public enum Ending {
        CONVERGED,
        NOT_CONVERGED,
        /** The Jacobian's columns are not independent at the best point. */
        SINGULAR
    }

    /** The best point found and how it was reached. */
    public static final class Solution {
        private final double[] point;
        private final Triangle triangle;
        private final double sumOfSquares;
        private final int evaluations;
        private final Ending ending;

        Solution(double[] point, Triangle triangle, double sumOfSquares, int evaluations, Ending ending) {
            this.point = point;
            this.triangle = triangle;
            this.sumOfSquares = sumOfSquares;
            this.evaluations = evaluations;
            this.ending = ending;
        }

        /** The free parameters, a copy. */
        public double[] point() {
            return point.clone();
        }

        /** Triangle of [Jacobian | residual] at the point; not to be changed. */
        public Triangle triangle() {
            return triangle;
        }

        /** Sum of squares of the residuals. */
        public double sumOfSquares() {
            return sumOfSquares;
        }

        /** How often residuals and Jacobian were worked out. */
        public int evaluations() {
            return evaluations;
        }

        public Ending ending() {
            return ending;
        }
    }

    /**
     * Minimises the sum of squares from a start point.
     *
     * @param start one value per free parameter; not changed
     */
    public static Solution solve(ResidualModel model, double[] start) {
        int most = model.observations() <= SHORT ? MOST_EVALUATIONS : MOST_EVALUATIONS_OF_LOG;
        if (model.isLinear()) {
            return polish(new ReducedProblem(model, start, most), start.clone());
        }
        Solution best = null;
        for (LevenbergMarquardtOptimizer optimiser : OPTIMISERS) {
            Solution solution = solve(new ReducedProblem(model, start, most), optimiser);
            if (solution.ending() == Ending.CONVERGED) {
                return solution;
            }
            best = best == null || solution.sumOfSquares() < best.sumOfSquares() ? solution : best;
        }
        return best;
    }

    /** Undamped steps alone, from a start that is all but the optimum; the ending says whether it was. */
    static Solution refine(ResidualModel model, double[] start) {
        return polish(new ReducedProblem(model, start, MOST_EVALUATIONS_OF_LOG), start.clone());
    }

    private static Solution solve(ReducedProblem problem, LevenbergMarquardtOptimizer optimiser) {
        double[] point;
        try {
            point = optimiser.optimize(problem).getPoint().toArray();
        } catch (ConvergenceException e) {
            // thrown also when no better point can be told from the best; the polish decides
            point = problem.bestPoint();
        } catch (MathIllegalStateException e) {
            point = problem.bestPoint();
            return new Solution(
                    point,
                    problem.reduce(point),
                    problem.bestSumOfSquares(),
                    problem.evaluations(),
                    Ending.NOT_CONVERGED);
        }
        return polish(problem, point);
    }

    private static Solution polish(ReducedProblem problem, double[] start) {
        int n = start.length;
        double[] point = start;
        Triangle triangle = problem.reduce(point);
        double sum = LinearLeastSquares.sumOfSquares(triangle, n);
        for (int k = 0; k < MOST_POLISH_STEPS; k++) {
            if (!LinearLeastSquares.isRegular(triangle, n)) {
                return new Solution(point, triangle, sum, problem.evaluations(), Ending.SINGULAR);
            }
            double removable = LinearLeastSquares.removable(triangle, n);
            if (removable <= SETTLED * sum) {
                break;
            }
            double[] step = LinearLeastSquares.step(triangle, n);
            double[] next = point.clone();
            boolean moved = false;
            for (int j = 0; j < n; j++) {
                next[j] += step[j];
                moved |= next[j] != point[j];
            }
            if (!moved) {
                break;
            }
            Triangle nextTriangle = problem.reduce(next);
            double nextSum = LinearLeastSquares.sumOfSquares(nextTriangle, n);
            double nextRemovable = LinearLeastSquares.removable(nextTriangle, n);
            // the sum is flat at the optimum, so what a further step would remove is the finer judge
            if (!(nextSum <= sum * (1 + 1e-9)) || !(nextRemovable < removable)) {
                break;
            }
            point = next;
            triangle = nextTriangle;
            sum = nextSum;
        }
        boolean optimum = LinearLeastSquares.removable(triangle, n) <= OPTIMUM * sum || sum <= problem.roundingFloor();
        Ending ending = !LinearLeastSquares.isRegular(triangle, n)
                ? Ending.SINGULAR
                : optimum ? Ending.CONVERGED : Ending.NOT_CONVERGED;
        return new Solution(point, triangle, sum, problem.evaluations(), ending);
    }
}
