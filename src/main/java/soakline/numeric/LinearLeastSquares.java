package soakline.numeric;

/**
 * What can be read from a {@link Triangle} whose last column is the residual: the least-squares step and the covariance. Both
 * work on columns scaled to length 1, so that parameters of very different size (ln D and a content) do no harm.
 */
public final class LinearLeastSquares {

    /**
     * Below this distance of a unit column from the span of the columns before it, the problem counts as singular: twice as many
     * digits are then lost as double precision can spare in a covariance.
     */
    private static final double SINGULAR = 1e-11;

    private LinearLeastSquares() {}

    /** Whether the first {@code n} columns are independent, as far as double precision can tell. */
    public static boolean isRegular(Triangle triangle, int n) {
        for (int j = 0; j < n; j++) {
            double length = columnLength(triangle, j);
            if (!(length > 0) || !(Math.abs(triangle.get(j, j)) > SINGULAR * length)) {
                return false;
            }
        }
        return true;
    }

    /** The x of least squares, R x = Qᵀr; needs a regular triangle. */
    public static double[] step(Triangle triangle, int n) {
        double[] x = new double[n];
        for (int i = n - 1; i >= 0; i--) {
            double sum = triangle.get(i, n);
            for (int j = i + 1; j < n; j++) {
                sum -= triangle.get(i, j) * x[j];
            }
            x[i] = sum / triangle.get(i, i);
        }
        return x;
    }

    /** Sum of squares of the residual column, removable part included. */
    public static double sumOfSquares(Triangle triangle, int n) {
        return removable(triangle, n) + triangle.get(n, n) * triangle.get(n, n);
    }

    /** The part of the sum of squares that the step would remove, to first order. */
    public static double removable(Triangle triangle, int n) {
        double sum = 0;
        for (int i = 0; i < n; i++) {
            sum += triangle.get(i, n) * triangle.get(i, n);
        }
        return sum;
    }

    /** (JᵀJ)⁻¹ = R⁻¹R⁻ᵀ, not yet scaled by a variance; needs a regular triangle. Shape n × n. */
    public static double[][] unscaledCovariance(Triangle triangle, int n) {
        double[] length = new double[n];
        for (int j = 0; j < n; j++) {
            length[j] = columnLength(triangle, j);
        }
        double[][] inverse = new double[n][n];
        for (int j = 0; j < n; j++) {
            inverse[j][j] = length[j] / triangle.get(j, j);
            for (int i = j - 1; i >= 0; i--) {
                double sum = 0;
                for (int k = i + 1; k <= j; k++) {
                    sum += triangle.get(i, k) / length[k] * inverse[k][j];
                }
                inverse[i][j] = -sum * length[i] / triangle.get(i, i);
            }
        }
        double[][] covariance = new double[n][n];
        for (int i = 0; i < n; i++) {
            for (int j = i; j < n; j++) {
                double sum = 0;
                for (int k = j; k < n; k++) {
                    sum += inverse[i][k] * inverse[j][k];
                }
                covariance[i][j] = sum / (length[i] * length[j]);
                covariance[j][i] = covariance[i][j];
            }
        }
        return covariance;
    }

    private static double columnLength(Triangle triangle, int column) {
        double sum = 0;
        for (int i = 0; i <= column; i++) {
            sum += triangle.get(i, column) * triangle.get(i, column);
        }
        return Math.sqrt(sum);
    }
}
