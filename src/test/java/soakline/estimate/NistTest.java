package soakline.estimate;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import org.apache.commons.math3.util.Precision;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import soakline.estimate.NistSets.NistSet;
import soakline.numeric.LinearLeastSquares;

/** The optimiser on the nonlinear regression sets of NIST, from both starts: see {@code outside/nist/SOURCE.txt}. */
class NistTest {

    private static final Path FOLDER = Path.of("src/test/resources/outside/nist");

    static List<NistSet> sets() throws IOException {
        return NistSets.all(FOLDER);
    }

    /** Correct digits: −log10 of the largest relative error, 11 at most, as the certified values have no more. */
    static double digits(double[] found, double[] certified) {
        double worst = 11;
        for (int i = 0; i < found.length; i++) {
            double error = Math.abs(found[i] - certified[i]) / Math.abs(certified[i]);
            worst = Math.min(worst, error == 0 ? 11 : -Math.log10(error));
        }
        return worst;
    }

    static double[] standardDeviations(NistSet set, LevenbergMarquardt.Solution solution) {
        int p = set.parameters();
        double[][] covariance = LinearLeastSquares.unscaledCovariance(solution.triangle(), p);
        double variance = solution.sumOfSquares() / (set.observations() - p);
        double[] sd = new double[p];
        for (int k = 0; k < p; k++) {
            sd[k] = Math.sqrt(covariance[k][k] * variance);
        }
        return sd;
    }

    @ParameterizedTest
    @MethodSource("sets")
    void valuesAndStandardDeviations(NistSet set) {
        for (double[] start : set.starts) {
            LevenbergMarquardt.Solution solution = LevenbergMarquardt.solve(set, start);

            assertThat(digits(solution.point(), set.certified)).as(set.name).isGreaterThan(9);
            // the sum of squares of Lanczos1 is 1e-25: nothing but rounding in double precision, and no deviations to
            // be had
            if (!set.name.equals("Lanczos1")) {
                assertThat(solution.ending()).as(set.name).isEqualTo(LevenbergMarquardt.Ending.CONVERGED);
                assertThat(digits(standardDeviations(set, solution), set.certifiedSd))
                        .as(set.name)
                        .isGreaterThan(8);
            }
        }
    }

    /** The files are those that the tests of Apache Commons Math carry, where they carry them. */
    @ParameterizedTest
    @ValueSource(strings = {"Kirby2", "MGH17", "Lanczos1", "Hahn1"})
    void theArtifactHoldsTheSameNumbers(String name) throws IOException {
        NistSet set =
                sets().stream().filter(s -> s.name.equals(name)).findFirst().orElseThrow();
        double[] numbers;
        try (InputStream in = Precision.class.getResourceAsStream(
                "/org/apache/commons/math3/fitting/leastsquares/" + name + ".dat")) {
            String text = new String(in.readAllBytes(), StandardCharsets.UTF_8);
            numbers = Arrays.stream(text.split("[\\s=]+"))
                    .filter(w -> w.matches("[-+]?\\d*\\.?\\d+([eE][-+]?\\d+)?"))
                    .mapToDouble(Double::parseDouble)
                    .sorted()
                    .toArray();
        }
        for (int k = 0; k < set.parameters(); k++) {
            for (double wanted :
                    new double[] {set.starts.get(0)[k], set.starts.get(1)[k], set.certified[k], set.certifiedSd[k]}) {
                assertThat(Arrays.binarySearch(numbers, wanted))
                        .as(name + " " + wanted)
                        .isNotNegative();
            }
        }
        for (double[] row : set.rows) {
            for (double wanted : row) {
                assertThat(Arrays.binarySearch(numbers, wanted))
                        .as(name + " " + wanted)
                        .isNotNegative();
            }
        }
    }
}
