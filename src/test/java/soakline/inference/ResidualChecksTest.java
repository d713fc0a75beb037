package soakline.inference;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Random;
import org.apache.commons.math3.distribution.TDistribution;
import org.apache.commons.math3.distribution.UniformRealDistribution;
import org.apache.commons.math3.stat.inference.KolmogorovSmirnovTest;
import org.apache.commons.math3.stat.regression.OLSMultipleLinearRegression;
import org.apache.commons.math3.util.CombinatoricsUtils;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;
import soakline.estimate.Estimate;
import soakline.estimate.EstimationTask;
import soakline.estimate.Estimator;
import soakline.specimen.ContentSeries;
import soakline.uptake.FickianModel;

/** The checks against enumeration, simulation and hand calculation; all seeds fixed. */
class ResidualChecksTest {

    /** Four standard deviations of a count: a right program fails once in 16,000 seeds, and the seed is fixed. */
    private static double fourSigma(double p, int n) {
        return 4 * Math.sqrt(p * (1 - p) / n);
    }

    @Test
    void theChanceOfFewRunsIsThatOfCounting() {
        for (int n = 2; n <= 11; n++) {
            for (int positive = 1; positive < n; positive++) {
                int[] byRuns = new int[n + 1];
                int all = 0;
                for (int bits = 0; bits < 1 << n; bits++) {
                    if (Integer.bitCount(bits) == positive) {
                        int changes = Integer.bitCount((bits ^ (bits >> 1)) & ((1 << (n - 1)) - 1));
                        byRuns[changes + 1]++;
                        all++;
                    }
                }
                double sum = 0;
                for (int runs = 2; runs <= n; runs++) {
                    sum += byRuns[runs];
                    assertThat(ResidualChecks.fewRuns(runs, positive, n - positive))
                            .isCloseTo(sum / all, within(1e-12));
                }
            }
        }
    }

    /** Swed and Eisenhart, Annals of Mathematical Statistics 14 (1943) 66: the largest number of runs with a chance of at most 2.5 % (from memory). */
    @ParameterizedTest
    @CsvSource({"5, 5, 2", "8, 8, 4", "10, 10, 6", "12, 12, 7", "15, 15, 10", "20, 20, 14", "10, 15, 7", "10, 20, 9"})
    void fewRunsMeetThePublishedTable(int positive, int negative, int critical) {
        assertThat(ResidualChecks.fewRuns(critical, positive, negative)).isLessThanOrEqualTo(0.025);
        assertThat(ResidualChecks.fewRuns(critical + 1, positive, negative)).isGreaterThan(0.025);
    }

    /** Beyond 200 residuals the normal approximation, against the sum of binomials in logarithms. */
    @ParameterizedTest
    @CsvSource({"86, 100, 101", "130, 150, 150", "60, 60, 160"})
    void manyRunsAreNearlyNormal(int runs, int positive, int negative) {
        double sum = 0;
        for (int r = 2; r <= runs; r++) {
            int half = r / 2;
            sum += r % 2 == 0
                    ? 2 * ways(positive, half, negative, half, positive + negative)
                    : ways(positive, half + 1, negative, half, positive + negative)
                            + ways(positive, half, negative, half + 1, positive + negative);
        }
        assertThat(ResidualChecks.fewRuns(runs, positive, negative)).isCloseTo(sum, within(0.05 * sum + 1e-4));
    }

    /** Chance of one way to cut the signs into so many runs each. */
    private static double ways(int positive, int positiveRuns, int negative, int negativeRuns, int n) {
        return Math.exp(CombinatoricsUtils.binomialCoefficientLog(positive - 1, positiveRuns - 1)
                + CombinatoricsUtils.binomialCoefficientLog(negative - 1, negativeRuns - 1)
                - CombinatoricsUtils.binomialCoefficientLog(n, positive));
    }

    @ParameterizedTest
    @ValueSource(ints = {8, 12, 40, 90})
    void theChanceOfASmallDurbinWatsonIsThatOfSimulation(int n) {
        Random random = new Random(41 + n);
        ResidualSpace space = new ResidualSpace(Simulated.estimate(n, 1.2, 0, random));
        DurbinWatson test = new DurbinWatson(space);
        int draws = 40_000;
        double[] statistics = new double[draws];
        double[] e = new double[n];
        for (int k = 0; k < draws; k++) {
            for (int i = 0; i < n; i++) {
                e[i] = random.nextGaussian();
            }
            statistics[k] = durbinWatson(withoutFit(space, e));
        }
        for (double at : new double[] {1.2, 1.5, 1.8, 2.2}) {
            int count = 0;
            for (double s : statistics) {
                count += s <= at ? 1 : 0;
            }
            double p = test.lowerTail(at);
            assertThat((double) count / draws).as("at " + at).isCloseTo(p, within(fourSigma(p, draws) + 0.002));
        }
    }

    private static double[] withoutFit(ResidualSpace space, double[] e) {
        double[][] j = space.jacobian();
        double[][] inverse = space.inverse();
        double[] r = e.clone();
        for (int a = 0; a < j.length; a++) {
            double weight = 0;
            for (int b = 0; b < j.length; b++) {
                double dot = 0;
                for (int i = 0; i < e.length; i++) {
                    dot += j[b][i] * e[i];
                }
                weight += inverse[a][b] * dot;
            }
            for (int i = 0; i < e.length; i++) {
                r[i] -= weight * j[a][i];
            }
        }
        return r;
    }

    private static double durbinWatson(double[] r) {
        double top = 0;
        double bottom = 0;
        for (int i = 0; i < r.length; i++) {
            bottom += r[i] * r[i];
            top += i > 0 ? (r[i] - r[i - 1]) * (r[i] - r[i - 1]) : 0;
        }
        return top / bottom;
    }

    @ParameterizedTest
    @ValueSource(ints = {10, 40, 200})
    void theChanceOfALargeAndersonDarlingIsThatOfSimulation(int n) {
        Random random = new Random(77 + n);
        int draws = 20_000;
        int[] below = new int[3];
        double[] levels = {0.2, 0.05, 0.01};
        for (int k = 0; k < draws; k++) {
            double[] values = random.doubles(n).map(u -> random.nextGaussian()).toArray();
            double p = ResidualChecks.normalityTail(ResidualChecks.andersonDarling(values));
            for (int l = 0; l < levels.length; l++) {
                below[l] += p < levels[l] ? 1 : 0;
            }
        }
        for (int l = 0; l < levels.length; l++) {
            assertThat((double) below[l] / draws)
                    .isCloseTo(levels[l], within(fourSigma(levels[l], draws) + 0.06 * levels[l]));
        }
    }

    /** SciPy 1.10.1, scipy.stats.anderson(x).statistic = 0.34544393245526805, before the factor for the number of values. */
    @Test
    void andersonDarlingAgainstSciPy() {
        double[] x = {0.31, -0.52, 1.73, 0.08, -1.41, 0.66, -0.23, 2.94, -0.77, 0.12, -0.35, 0.91};
        double factor = 1 + 0.75 / 12 + 2.25 / 144;
        assertThat(ResidualChecks.andersonDarling(x)).isCloseTo(0.34544393245526805 * factor, within(1e-12));
    }

    /** D'Agostino and Stephens (1986), table 4.7, upper 5 % and 1 % points of the modified statistic (from memory). */
    @ParameterizedTest
    @CsvSource({"0.752, 0.05", "1.035, 0.01"})
    void andersonDarlingMeetsItsTable(double statistic, double p) {
        assertThat(ResidualChecks.normalityTail(statistic)).isCloseTo(p, within(0.03 * p));
    }

    /** Worked by hand: 4 × 0.01, 3 × 0.02, 2 × 0.03 held up to 0.06, and 0.6. */
    @Test
    void holmByHand() {
        double[] adjusted = Evidence.holm(List.of(
                OptionalDouble.of(0.6),
                OptionalDouble.of(0.01),
                OptionalDouble.empty(),
                OptionalDouble.of(0.03),
                OptionalDouble.of(0.02)));

        assertThat(adjusted[0]).isCloseTo(0.6, within(1e-15));
        assertThat(adjusted[1]).isCloseTo(0.04, within(1e-15));
        assertThat(adjusted[2]).isNaN();
        assertThat(adjusted[3]).isCloseTo(0.06, within(1e-15));
        assertThat(adjusted[4]).isCloseTo(0.06, within(1e-15));
    }

    /** When model and noise are right every chance between 0 and 1 is equally likely. */
    @ParameterizedTest
    @EnumSource(
            value = CheckName.class,
            names = {"HALF_TIME", "LATE_TIME_SLOPE", "MEAN_TIME", "TIME_EXPONENT", "RESIDUAL_AUTOCORRELATION"})
    void chancesAreEvenWhenAllIsRight(CheckName name) {
        double[] chances = chances(name);
        assertThat(chances).hasSizeGreaterThan(950);
        double p = new KolmogorovSmirnovTest().kolmogorovSmirnovTest(new UniformRealDistribution(0, 1), chances);
        assertThat(p).isGreaterThan(1e-3);
    }

    /** Slope and intercept are judged together by Bonferroni's bound, so its chances are on the safe side. */
    @Test
    void theShortTimeCheckIsNotTooEager() {
        double[] chances = chances(CheckName.SHORT_TIME_SLOPE);
        for (double level : new double[] {0.05, 0.2}) {
            double found = Arrays.stream(chances).filter(p -> p < level).count() / (double) chances.length;
            assertThat(found).isBetween(0.4 * level, level + fourSigma(level, chances.length));
        }
    }

    private static double[] chances(CheckName name) {
        return Simulated.assessments().stream()
                .flatMap(a -> a.checks().stream())
                .filter(c -> c.name() == name && c.pValue().isPresent())
                .mapToDouble(c -> c.pValue().getAsDouble())
                .toArray();
    }

    /**
     * Where the model is a mean, the largest residual is Grubbs' test, whose two-sided critical values are published (ISO 5725-2:1994,
     * table 5, "one largest or one smallest"; from memory).
     */
    @ParameterizedTest
    @CsvSource({
        "5, 0.05, 1.715",
        "10, 0.05, 2.290",
        "20, 0.05, 2.709",
        "30, 0.05, 2.908",
        "10, 0.01, 2.482",
        "20, 0.01, 3.001"
    })
    void theLargestResidualOfAMeanIsGrubbsTest(int n, double level, double critical) {
        // before exposure content is the start content, so it is a mean
        double[] times = new double[n];
        double[] contents = new double[n];
        for (int i = 0; i < n; i++) {
            times[i] = i - n;
            contents[i] = i % 3;
        }
        EstimationTask task = EstimationTask.of(FickianModel.through(1e-3), ContentSeries.of(times, contents));
        task = task.withFixed(0, Math.log(1e-12)).withFixed(task.levelIndex(), 1);
        ResidualSpace space = new ResidualSpace(Estimator.refit(task, new double[] {0, 0, 0}));
        assertThat(space.residualVariance(1)).isCloseTo(1 - 1.0 / n, within(1e-12));
        double unit = Math.sqrt(1 - 1.0 / n);
        assertThat(n * space.tailOfStudentised((critical - 0.001) / unit)).isGreaterThan(level);
        assertThat(n * space.tailOfStudentised((critical + 0.001) / unit)).isLessThan(level);
    }

    /** The same weighing left out, and the rest fitted anew: the deviation over its error is a t variate (linear in the contents here). */
    @Test
    void theChanceOfTheLargestResidualByLeavingItOut() {
        double[] times = Simulated.times(16, 1.2);
        double[] contents = Simulated.contents(times, 0, new Random(16));
        contents[9] += 4 * Simulated.SIGMA * Simulated.RISE;
        EstimationTask task =
                EstimationTask.of(FickianModel.through(Simulated.PATH), ContentSeries.of(times, contents));
        Estimate all = Estimator.estimate(task.withFixed(0, Math.log(Simulated.D)));
        double[] g = all.fractions(times);
        double[][] x = new double[15][1];
        double[] y = new double[15];
        for (int i = 0; i < 16; i++) {
            if (i != 9) {
                x[i < 9 ? i : i - 1][0] = g[i];
                y[i < 9 ? i : i - 1] = contents[i];
            }
        }
        OLSMultipleLinearRegression rest = new OLSMultipleLinearRegression();
        rest.newSampleData(y, x);
        double[] b = rest.estimateRegressionParameters();
        double[][] v = rest.estimateRegressionParametersVariance();
        double error =
                Math.sqrt(rest.estimateErrorVariance() * (1 + v[0][0] + 2 * g[9] * v[0][1] + g[9] * g[9] * v[1][1]));
        double t = (contents[9] - b[0] - b[1] * g[9]) / error;
        double expected = 16 * 2 * new TDistribution(13).cumulativeProbability(-Math.abs(t));

        Evidence largest = new ResidualChecks(new ResidualSpace(all))
                .all().stream()
                        .filter(e -> e.name() == CheckName.LARGEST_RESIDUAL)
                        .findFirst()
                        .orElseThrow();

        assertThat(largest.figures()).contains(new Check.Figure("weighing", 10));
        assertThat(largest.probability().getAsDouble()).isCloseTo(expected, within(1e-9 * expected));
    }

    @Test
    void anOutlierIsFoundAndPlaced() {
        double[] times = Simulated.times(30, 1.5);
        double[] contents = Simulated.contents(times, 0, new Random(5));
        contents[17] += 8 * Simulated.SIGMA * Simulated.RISE;

        Assessment a = Assessor.assess(Simulated.run(times, contents), AssessmentOptions.usual());

        Check largest = a.checks().stream()
                .filter(c -> c.name() == CheckName.LARGEST_RESIDUAL)
                .findFirst()
                .orElseThrow();
        assertThat(largest.verdict()).isIn(Verdict.CAUTION, Verdict.FAIL);
        assertThat(largest.figures()).contains(new Check.Figure("weighing", 18));
    }
}
