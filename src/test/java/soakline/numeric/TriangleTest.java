package soakline.numeric;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.LUDecomposition;
import org.apache.commons.math3.linear.QRDecomposition;
import org.apache.commons.math3.linear.RealMatrix;
import org.apache.commons.math3.stat.regression.OLSMultipleLinearRegression;
import org.junit.jupiter.api.Test;

/** Streamed triangles against Apache Commons Math, which holds whole matrices. */
class TriangleTest {

    private static final int ROWS = 1000;
    private static final int COLUMNS = 4;

    private static double[][] invented() {
        Random random = new Random(20261201);
        double[][] rows = new double[ROWS][COLUMNS];
        for (double[] row : rows) {
            // columns of very different size, and two that are nearly alike
            row[0] = random.nextGaussian();
            row[1] = 1e-6 * (row[0] + 1e-3 * random.nextGaussian());
            row[2] = 1e4 * random.nextDouble();
            row[3] = 3 * row[0] + 2e-4 * row[2] + 0.1 * random.nextGaussian();
        }
        return rows;
    }

    private static Triangle inBlocks(double[][] rows, int blockSize) {
        Triangle triangle = new Triangle(COLUMNS);
        for (int from = 0; from < rows.length; from += blockSize) {
            int count = Math.min(blockSize, rows.length - from);
            double[][] block = new double[COLUMNS][blockSize];
            for (int k = 0; k < COLUMNS; k++) {
                for (int i = 0; i < count; i++) {
                    block[k][i] = rows[from + i][k];
                }
            }
            triangle.add(block, count);
        }
        return triangle;
    }

    @Test
    void isTheTriangleOfTheWholeMatrixHoweverItIsCut() {
        double[][] rows = invented();
        RealMatrix expected = new QRDecomposition(new Array2DRowRealMatrix(rows)).getR();
        for (int blockSize : new int[] {1, 2, 7, Triangle.BLOCK, ROWS}) {
            Triangle triangle = inBlocks(rows, blockSize);
            for (int j = 0; j < COLUMNS; j++) {
                for (int i = 0; i <= j; i++) {
                    double wanted = Math.abs(expected.getEntry(i, j));
                    double scale = expected.getColumnVector(j).getNorm();
                    assertThat(Math.abs(triangle.get(i, j)))
                            .as(blockSize + ": " + i + "," + j)
                            .isCloseTo(wanted, within(1e-12 * scale));
                }
            }
        }
    }

    @Test
    void stepSumAndCovarianceAreThoseOfARegression() {
        double[][] rows = invented();
        double[][] x = new double[ROWS][3];
        double[] y = new double[ROWS];
        for (int i = 0; i < ROWS; i++) {
            System.arraycopy(rows[i], 0, x[i], 0, 3);
            y[i] = rows[i][3];
        }
        OLSMultipleLinearRegression regression = new OLSMultipleLinearRegression();
        regression.setNoIntercept(true);
        regression.newSampleData(y, x);
        double[] beta = regression.estimateRegressionParameters();
        double[] errors = regression.estimateRegressionParametersStandardErrors();
        double rss = regression.calculateResidualSumOfSquares();

        Triangle triangle = inBlocks(rows, 64);

        double[] step = LinearLeastSquares.step(triangle, 3);
        double[][] covariance = LinearLeastSquares.unscaledCovariance(triangle, 3);
        double left = triangle.get(3, 3) * triangle.get(3, 3);
        assertThat(left).isCloseTo(rss, within(1e-12 * rss));
        for (int k = 0; k < 3; k++) {
            assertThat(step[k]).isCloseTo(beta[k], within(1e-8 * Math.abs(errors[k])));
            double error = Math.sqrt(covariance[k][k] * left / (ROWS - 3));
            assertThat(error).isCloseTo(errors[k], within(1e-9 * errors[k]));
        }
        RealMatrix jtj = new Array2DRowRealMatrix(x).transpose().multiply(new Array2DRowRealMatrix(x));
        double product = new LUDecomposition(jtj).getSolver().getInverse().getEntry(0, 2);
        assertThat(covariance[0][2]).isCloseTo(product, within(1e-5 * Math.abs(product)));
    }

    @Test
    void dependentColumnsAreSeen() {
        double[][] rows = invented();
        assertThat(LinearLeastSquares.isRegular(inBlocks(rows, 64), 3)).isTrue();
        for (double[] row : rows) {
            row[1] = 1e-6 * row[0];
        }
        assertThat(LinearLeastSquares.isRegular(inBlocks(rows, 64), 3)).isFalse();
        assertThat(LinearLeastSquares.isRegular(new Triangle(COLUMNS), 3)).isFalse();
    }
}
