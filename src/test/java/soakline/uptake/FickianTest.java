package soakline.uptake;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Fractional uptake of the sheet against values computed elsewhere. */
class FickianTest {

    private static double[] valueAndRate(double tau) {
        double[] g = new double[1];
        double[] rate = new double[1];
        FickianKernel.evaluate(new double[] {tau}, 1, 1, g, rate);
        return new double[] {g[0], rate[0]};
    }

    /** {@code outside/uptake-fraction.csv}: mpmath 1.2.1 at 40 digits. */
    @Test
    void agreesWithTheTableToFourteenDecimals() {
        double worst = 0;
        double worstRate = 0;
        for (double[] row : ReferenceTable.rows("uptake-fraction.csv")) {
            double[] found = valueAndRate(row[0]);
            worst = Math.max(worst, Math.abs(found[0] - row[1]));
            worstRate = Math.max(worstRate, Math.abs(found[1] - row[0] * row[2]));
            assertThat(FickianKernel.fraction(row[0])).isEqualTo(found[0]);
            assertThat(FickianKernel.remaining(row[0])).isCloseTo(1 - row[1], within(3e-16));
        }
        assertThat(worst).isLessThan(5e-16);
        assertThat(worstRate).isLessThan(5e-16);
    }

    /** {@code outside/time-to-fraction.csv}: mpmath 1.2.1; the half-time is Crank's 0.0492 (1975, ch. 10). */
    @Test
    void reachesEachFractionWhenItShould() {
        for (double[] row : ReferenceTable.rows("time-to-fraction.csv")) {
            assertThat(FickianKernel.fraction(row[1])).isCloseTo(row[0], within(2e-15));
            assertThat(row[2]).isCloseTo(row[1] / 4, within(1e-16));
        }
        // both faces: D t/h² with the path h/2
        assertThat(FickianModel.through(0.5).fraction(0.04918268488092626, new double[] {0}))
                .isCloseTo(0.5, within(1e-15));
        // one face: the path is the whole thickness, so four times the time
        assertThat(FickianModel.through(1).fraction(4 * 0.04918268488092626, new double[] {0}))
                .isCloseTo(0.5, within(1e-15));
    }

    /**
     * ISO 62:2008, theoretical values of c/c_s against D π² t/d² (printed to two decimals; from memory), and their exact values
     * (mpmath).
     */
    @ParameterizedTest
    @CsvSource({
        "0.5, 0.51, 0.507364",
        "0.7, 0.60, 0.597318",
        "1, 0.70, 0.701797",
        "1.5, 0.82, 0.819137",
        "2, 0.89, 0.890301",
        "3, 0.96, 0.959644"
    })
    void agreesWithTheTableOfTheStandard(double abscissa, double printed, double exact) {
        double g = FickianModel.through(0.5).fraction(abscissa / (Math.PI * Math.PI), new double[] {0});

        assertThat(g).isCloseTo(exact, within(5e-7));
        assertThat(g).isCloseTo(printed, within(0.005));
    }

    @Test
    void meetsItselfAtTheJoints() {
        for (double joint : new double[] {FickianKernel.JOINT, 0.0265}) {
            double[] below = valueAndRate(Math.nextDown(joint));
            double[] at = valueAndRate(joint);
            double[] above = valueAndRate(Math.nextUp(joint));
            for (int k = 0; k < 2; k++) {
                assertThat(above[k]).isCloseTo(below[k], within(4e-16));
                assertThat(at[k]).isCloseTo(below[k], within(4e-16));
            }
        }
    }

    @Test
    void hasItsLimits() {
        for (double tau : new double[] {0, -0.0, -1, Double.NEGATIVE_INFINITY}) {
            assertThat(valueAndRate(tau)).containsExactly(0, 0);
        }
        for (double tau : new double[] {1e3, 1e300, Double.POSITIVE_INFINITY}) {
            assertThat(valueAndRate(tau)).containsExactly(1, 0);
            assertThat(FickianKernel.remaining(tau)).isZero();
        }
        assertThat(valueAndRate(Double.MIN_VALUE)[0]).isPositive();
        // 1 − G keeps its digits where G has none left: 8/π² e^(−25π²) (mpmath 1.3.0)
        assertThat(FickianKernel.remaining(100)).isCloseTo(5.635364250352301e-108, within(1e-120));
    }

    @Test
    void neverFalls() {
        double before = 0;
        for (double tau = 1e-6; tau < 8; tau *= 1.0007) {
            double g = FickianKernel.fraction(tau);
            assertThat(g).as("at " + tau).isGreaterThanOrEqualTo(before);
            before = g;
        }
    }

    /** Bare edges: the plain series in three directions, summed here term by term. */
    @ParameterizedTest
    @ValueSource(doubles = {0.02, 0.1, 0.3, 1})
    void bareEdgesMultiply(double tau) {
        double remaining = 1;
        for (double path : new double[] {1, 5, 2.5}) {
            double sum = 0;
            for (int m = 1; m < 400; m += 2) {
                sum += 8 / (m * m * Math.PI * Math.PI) * Math.exp(-m * m * Math.PI * Math.PI * tau / (4 * path * path));
            }
            remaining *= sum;
        }
        double g = FickianModel.through(1).with(5, 2.5).fraction(tau, new double[] {0});

        assertThat(g).isCloseTo(1 - remaining, within(1e-12));
        assertThat(FickianModel.through(1).with(1e9, 1e9).fraction(tau, new double[] {0}))
                .isCloseTo(FickianKernel.fraction(tau), within(1e-8));
    }

    @Test
    void aPathMustBePositive() {
        for (double path : new double[] {0, -1, Double.NaN, Double.POSITIVE_INFINITY}) {
            assertThatThrownBy(() -> FickianModel.through(path)).isInstanceOf(IllegalArgumentException.class);
        }
    }
}
