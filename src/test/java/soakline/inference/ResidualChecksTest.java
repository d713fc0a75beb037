package soakline.inference;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Random;
import org.apache.commons.math3.distribution.UniformRealDistribution;
import org.apache.commons.math3.stat.inference.KolmogorovSmirnovTest;
import org.apache.commons.math3.util.CombinatoricsUtils;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

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
        Random random = new Random(1234);
        List<Double> chances = new ArrayList<>();
        for (int k = 0; k < 1000; k++) {
            Assessment a = Assessor.assess(Simulated.run(24, 1.5, 0, random), AssessmentOptions.usual());
            a.checks().stream()
                    .filter(c -> c.name() == name)
                    .findFirst()
                    .orElseThrow()
                    .pValue()
                    .ifPresent(chances::add);
        }
        return chances.stream().mapToDouble(Double::doubleValue).toArray();
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
