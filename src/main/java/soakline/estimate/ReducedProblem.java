package soakline.estimate;

import org.apache.commons.math3.fitting.leastsquares.LeastSquaresProblem;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.RealMatrix;
import org.apache.commons.math3.linear.RealVector;
import org.apache.commons.math3.optim.ConvergenceChecker;
import org.apache.commons.math3.util.Incrementor;
import soakline.numeric.LinearLeastSquares;
import soakline.numeric.Triangle;

/** A {@link ResidualModel} as Commons Math wants it, reduced to its triangle: parameters + 1 rows. */
@SuppressWarnings("deprecation") // Incrementor is part of the interface that is implemented here
final class ReducedProblem implements LeastSquaresProblem {

    private final ResidualModel model;
    private final double[] start;
    private final Incrementor evaluations;
    private final Incrementor iterations;
    private final double[][] block;
    private double[] bestPoint;
    private double bestSum = Double.POSITIVE_INFINITY;
    private int reductions;

    ReducedProblem(ResidualModel model, double[] start, int mostEvaluations) {
        this.model = model;
        this.start = start;
        this.evaluations = new Incrementor(mostEvaluations);
        this.iterations = new Incrementor(mostEvaluations);
        this.block = new double[model.parameters() + 1][Math.min(Triangle.BLOCK, model.observations())];
        this.bestPoint = start;
    }

    /** The triangle of [Jacobian | residual] at a point. */
    Triangle reduce(double[] point) {
        reductions++;
        Triangle triangle = new Triangle(block.length);
        int n = model.observations();
        for (int from = 0; from < n; from += Triangle.BLOCK) {
            int count = Math.min(Triangle.BLOCK, n - from);
            model.fill(point, from, count, block);
            triangle.add(block, count);
        }
        return triangle;
    }

    /** How often residuals and Jacobian were worked out, by the optimiser and by the polish. */
    int evaluations() {
        return reductions;
    }

    double roundingFloor() {
        return model.roundingFloor();
    }

    double[] bestPoint() {
        return bestPoint.clone();
    }

    double bestSumOfSquares() {
        return bestSum;
    }

    @Override
    public Evaluation evaluate(RealVector at) {
        double[] point = at.toArray();
        Triangle triangle = reduce(point);
        double sum = LinearLeastSquares.sumOfSquares(triangle, point.length);
        if (sum < bestSum) {
            bestSum = sum;
            bestPoint = point;
        }
        return new ReducedEvaluation(point, triangle);
    }

    @Override
    public RealVector getStart() {
        return new ArrayRealVector(start);
    }

    @Override
    public int getObservationSize() {
        return start.length + 1;
    }

    @Override
    public int getParameterSize() {
        return start.length;
    }

    @Override
    public Incrementor getEvaluationCounter() {
        return evaluations;
    }

    @Override
    public Incrementor getIterationCounter() {
        return iterations;
    }

    @Override
    public ConvergenceChecker<Evaluation> getConvergenceChecker() {
        return null;
    }

    private static final class ReducedEvaluation implements Evaluation {

        private final double[] point;
        private final Triangle triangle;

        ReducedEvaluation(double[] point, Triangle triangle) {
            this.point = point;
            this.triangle = triangle;
        }

        @Override
        public double getCost() {
            return Math.sqrt(LinearLeastSquares.sumOfSquares(triangle, point.length));
        }

        @Override
        public double getRMS() {
            return getCost() / Math.sqrt(point.length + 1);
        }

        @Override
        public RealMatrix getCovariances(double threshold) {
            throw new UnsupportedOperationException("taken from the triangle instead");
        }

        @Override
        public RealVector getSigma(double threshold) {
            throw new UnsupportedOperationException("taken from the triangle instead");
        }

        @Override
        public RealMatrix getJacobian() {
            double[][] rows = new double[point.length + 1][point.length];
            for (int i = 0; i < point.length; i++) {
                for (int j = i; j < point.length; j++) {
                    rows[i][j] = triangle.get(i, j);
                }
            }
            return new Array2DRowRealMatrix(rows, false);
        }

        @Override
        public RealVector getResiduals() {
            double[] residuals = new double[point.length + 1];
            for (int i = 0; i <= point.length; i++) {
                residuals[i] = triangle.get(i, point.length);
            }
            return new ArrayRealVector(residuals, false);
        }

        @Override
        public RealVector getPoint() {
            return new ArrayRealVector(point, false);
        }
    }
}
