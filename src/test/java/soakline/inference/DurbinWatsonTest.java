package soakline.inference;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.Random;
import org.apache.commons.math3.distribution.BetaDistribution;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.EigenDecomposition;
import org.apache.commons.math3.linear.MatrixUtils;
import org.apache.commons.math3.linear.QRDecomposition;
import org.apache.commons.math3.linear.RealMatrix;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class DurbinWatsonTest {

    /**
     * Bounds d_L and d_U of the published tables (Durbin and Watson, Biometrika 38 (1951) 159; from memory), to their two places. They
     * belong to regressors that leave the lowest, or the highest, of the eigenvalues 2(1 − cos πj/n).
     *
     * @param regressors beside the constant
     */
    @ParameterizedTest
    @CsvSource({
        "15, 1, 0.05, 1.08, 1.36",
        "20, 1, 0.05, 1.20, 1.41",
        "40, 1, 0.05, 1.44, 1.54",
        "15, 2, 0.05, 0.95, 1.54",
        "20, 2, 0.05, 1.10, 1.54",
        "15, 1, 0.01, 0.81, 1.07",
        "20, 1, 0.01, 0.95, 1.15"
    })
    void theExactChanceMeetsThePublishedBounds(int n, int regressors, double level, double lower, double upper) {
        double[] all = new double[n - 1];
        for (int j = 1; j < n; j++) {
            all[j - 1] = 2 * (1 - Math.cos(Math.PI * j / n));
        }
        double[] lowest = Arrays.copyOf(all, n - 1 - regressors);
        double[] highest = Arrays.copyOfRange(all, regressors, n - 1);
        assertThat(level)
                .isBetween(DurbinWatson.imhof(lowest, lower - 0.005), DurbinWatson.imhof(lowest, lower + 0.005));
        assertThat(level)
                .isBetween(DurbinWatson.imhof(highest, upper - 0.005), DurbinWatson.imhof(highest, upper + 0.005));
    }

    /** With only two different eigenvalues the ratio is a beta variate; by Commons Math. */
    @ParameterizedTest
    @CsvSource({"4, 5, 1.1", "10, 3, 0.9", "20, 18, 1.6", "30, 30, 1.2"})
    void theExactChanceIsThatOfABetaVariate(int low, int high, double statistic) {
        double[] eigenvalues = new double[low + high];
        Arrays.fill(eigenvalues, 0, high, 3.0);
        Arrays.fill(eigenvalues, high, low + high, 0.5);
        double expected = new BetaDistribution(high / 2.0, low / 2.0).cumulativeProbability((statistic - 0.5) / 2.5);
        assertThat(DurbinWatson.imhof(eigenvalues, statistic)).isCloseTo(expected, within(1e-8));
    }

    /**
     * Up to 64 residuals the program's eigenvalues against those of a projector made in another way; beyond, the matched beta
     * variate against the exact chance, to the share of itself that its Javadoc claims or better.
     */
    @ParameterizedTest
    @CsvSource({"9, 1e-6", "30, 1e-6", "64, 1e-6", "65, 0.05", "120, 0.05"})
    void theChanceIsExactOrNearlySo(int n, double relative) {
        ResidualSpace space = new ResidualSpace(Simulated.estimate(n, 1.2, 0, new Random(n)));
        DurbinWatson test = new DurbinWatson(space);
        double[] eigenvalues = eigenvalues(space);
        for (double level : new double[] {0.5, 0.05, 0.01, 0.001}) {
            double at = quantile(eigenvalues, level);
            double p = test.lowerTail(at);
            assertThat(p).as("at " + at).isCloseTo(DurbinWatson.imhof(eigenvalues, at), within(relative * p + 1e-8));
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {10, 100})
    void theStatisticIsThatOfTheResiduals(int n) {
        ResidualSpace space = new ResidualSpace(Simulated.estimate(n, 1.2, 0.4, new Random(6)));
        double[] r = space.estimate().residuals();
        double top = 0;
        double bottom = r[0] * r[0];
        for (int i = 1; i < n; i++) {
            top += Math.pow(r[i] - r[i - 1], 2);
            bottom += r[i] * r[i];
        }
        assertThat(new DurbinWatson(space).statistic()).isCloseTo(top / bottom, within(1e-9));
    }

    @Test
    void alternatingResidualsAreNotCalledAlike() {
        ResidualSpace space = new ResidualSpace(Simulated.estimate(20, 1.2, -0.8, new Random(3)));
        DurbinWatson test = new DurbinWatson(space);
        assertThat(test.statistic()).isGreaterThan(2.5);
        assertThat(test.lowerTail(test.statistic())).isGreaterThan(0.9);
    }

    private static double quantile(double[] eigenvalues, double level) {
        double low = 0;
        double high = 4;
        for (int k = 0; k < 25; k++) {
            double middle = (low + high) / 2;
            if (DurbinWatson.imhof(eigenvalues, middle) < level) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return low;
    }

    /** Of N'AN, the columns of N spanning what is orthogonal to the Jacobian: no projector, no zero eigenvalues. */
    private static double[] eigenvalues(ResidualSpace space) {
        RealMatrix jacobian = new Array2DRowRealMatrix(space.jacobian()).transpose();
        int n = jacobian.getRowDimension();
        int p = jacobian.getColumnDimension();
        RealMatrix rest = new QRDecomposition(jacobian).getQ().getSubMatrix(0, n - 1, p, n - 1);
        RealMatrix differences = MatrixUtils.createRealMatrix(n - 1, n);
        for (int i = 0; i < n - 1; i++) {
            differences.setEntry(i, i, -1);
            differences.setEntry(i, i + 1, 1);
        }
        RealMatrix d = differences.multiply(rest);
        return new EigenDecomposition(d.transpose().multiply(d)).getRealEigenvalues();
    }
}
