package soakline.inference;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.Map;
import java.util.Random;
import org.apache.commons.math3.distribution.FDistribution;
import org.apache.commons.math3.stat.regression.SimpleRegression;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;
import soakline.Samples;
import soakline.estimate.Estimate;
import soakline.estimate.EstimationTask;
import soakline.estimate.Estimator;
import soakline.problem.Code;
import soakline.specimen.ContentSeries;
import soakline.specimen.Run;
import soakline.uptake.FickianModel;

class IdentifiabilityTest {

    /** S (1 + F/ν), above which a value lies outside the 95 % interval; F from Commons Math. */
    private static double threshold(Estimate estimate) {
        int nu = estimate.degreesOfFreedom();
        return estimate.sumOfSquares() * (1 + new FDistribution(1, nu).inverseCumulativeProbability(0.95) / nu);
    }

    private static Estimate estimate(double[] times, double[] contents) {
        return Estimator.estimate(
                EstimationTask.of(FickianModel.through(Simulated.PATH), ContentSeries.of(times, contents)));
    }

    /**
     * As D tends to 0 and M∞ grows, the curve becomes a straight line in √t. So the lower side is open just when that line, fitted by
     * Commons Math, lies within the threshold.
     */
    @ParameterizedTest
    @CsvSource({"0.25, 120, 150", "0.4, 20, 130", "0.8, 0, 0"})
    void theLowerSideIsOpenWhereTheRootLawFitsAsWell(double tau, int fewestOpen, int mostOpen) {
        Random random = new Random(61);
        double[] times = Simulated.times(24, tau);
        int open = 0;
        for (int k = 0; k < 150; k++) {
            double[] contents = Simulated.contents(times, 0, random);
            Estimate estimate = estimate(times, contents);
            if (!estimate.isOptimum()) {
                // the line is the best fit of all
                open++;
                continue;
            }
            SimpleRegression line = new SimpleRegression();
            for (int i = 0; i < times.length; i++) {
                line.addData(Math.sqrt(times[i]), contents[i]);
            }
            boolean within = line.getSumSquaredErrors() < threshold(estimate);
            Interval interval = Intervals.profile(estimate, 0, 0.95);
            assertThat(interval.low().isEmpty()).as("set " + k).isEqualTo(within);
            assertThat(interval.high()).isPresent();
            open += within ? 1 : 0;
        }
        // both cases must have been met
        assertThat(open).isBetween(fewestOpen, mostOpen);
    }

    /** As D grows, only the weighing at the start is not at the plateau: the upper side is open where that fits as well. */
    @Test
    void theUpperSideIsOpenWhereTheChangeWasOverAtOnce() {
        Random random = new Random(62);
        double[] times = new double[16];
        for (int i = 4; i < times.length; i++) {
            times[i] = (1.2 + 0.2 * i) * Simulated.UNIT;
        }
        int open = 0;
        for (int k = 0; k < 100; k++) {
            double[] contents = Simulated.contents(times, 0, random);
            Estimate estimate = estimate(times, contents);
            double sum = squares(contents, 0, 4) + squares(contents, 4, 16);
            if (!estimate.isOptimum()) {
                open++;
                continue;
            }
            Interval interval = Intervals.profile(estimate, 0, 0.95);
            boolean within = sum < threshold(estimate);
            assertThat(interval.high().isEmpty()).as("set " + k).isEqualTo(within);
            open += within ? 1 : 0;
        }
        assertThat(open).isBetween(40, 99);
    }

    private static double squares(double[] values, int from, int to) {
        double mean = Arrays.stream(values, from, to).average().orElseThrow();
        return Arrays.stream(values, from, to).map(v -> (v - mean) * (v - mean)).sum();
    }

    /** The rule of the contract, on tests around the border: open, or wide together with a strong correlation. */
    @Test
    void theRuleIsTheOneStated() {
        Random random = new Random(63);
        int refused = 0;
        int wide = 0;
        for (int k = 0; k < 100; k++) {
            Run run = Simulated.run(24, 0.3 + 0.004 * k, 0, random);
            Assessment a = Assessor.assess(run, AssessmentOptions.usual());
            Estimate estimate = estimate(run.contents().times(), run.contents().contents());
            boolean expected = !estimate.isOptimum();
            if (!expected) {
                Interval interval = Intervals.profile(estimate, 0, 0.95);
                double correlation = estimate.correlation(0, 2);
                boolean strong = !interval.isOpen()
                        && interval.high().getAsDouble() > 1.5 * interval.low().getAsDouble()
                        && correlation < -0.99;
                wide += strong ? 1 : 0;
                expected = interval.isOpen() || strong;
            }
            assertThat(a.determined()).as("set " + k).isEqualTo(!expected);
            assertThat(a.usable()).isEqualTo(a.determined());
            refused += expected ? 1 : 0;
        }
        assertThat(refused).isBetween(25, 75);
        assertThat(wide).isGreaterThan(2);
    }

    /** Drying is uptake upside down: refused alike, with a falling slope. */
    @Test
    void dryingIsRefusedAlike() {
        Random random = new Random(64);
        int refused = 0;
        for (int k = 0; k < 30; k++) {
            double[] times = Simulated.times(24, 0.25 + 0.02 * k);
            double[] contents = Simulated.contents(times, 0, random);
            double[] falling = Arrays.stream(contents).map(c -> 0.02 - c).toArray();
            Assessment up = Assessor.assess(Simulated.run(times, contents), AssessmentOptions.usual());
            Assessment down = Assessor.assess(Simulated.run(times, falling), AssessmentOptions.usual());
            assertThat(down.direction()).isEqualTo(Direction.DRYING);
            assertThat(down.determined()).as("set " + k).isEqualTo(up.determined());
            if (!up.determined()) {
                refused++;
                ParameterResult rising = up.parameter("initialSlope").orElseThrow();
                ParameterResult sinking = down.parameter("initialSlope").orElseThrow();
                double slope = rising.value().getAsDouble();
                assertThat(slope).isPositive();
                assertThat(sinking.value().getAsDouble()).isCloseTo(-slope, within(1e-6 * slope));
                assertThat(sinking.interval().orElseThrow().low().orElseThrow())
                        .isCloseTo(-rising.interval().orElseThrow().high().orElseThrow(), within(1e-5 * slope));
            }
        }
        assertThat(refused).isBetween(7, 23);
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.6, 0.9, 0.999})
    void theLevelShownDoesNotMatter(double level) {
        AssessmentOptions options = AssessmentOptions.usual().withLevel(level);
        assertThat(Assessor.assess(Samples.run("04-stopped-early.csv"), options).determined())
                .isFalse();
        assertThat(Assessor.assess(Samples.run("01-both-faces.csv"), options).determined())
                .isTrue();
    }

    @ParameterizedTest
    @EnumSource(IntervalMethod.class)
    void aKnownPlateauMakesAnEarlyTestUsable(IntervalMethod method) {
        AssessmentOptions options =
                AssessmentOptions.usual().withMethod(method).withFixed(Map.of("equilibriumContent", 0.0162));
        Assessment a = Assessor.assess(Samples.run("04-stopped-early.csv"), options);

        assertThat(a.usable()).isTrue();
        ParameterResult d = a.parameter("diffusivity").orElseThrow();
        // what the generator put in
        assertThat(4.4e-13)
                .isBetween(
                        d.interval().orElseThrow().low().orElseThrow(),
                        d.interval().orElseThrow().high().orElseThrow());
        assertThat(d.interval().orElseThrow().method()).isEqualTo(method);
    }

    /** Nothing but the plateau was weighed: there is no D, and weighing on would not help. */
    @ParameterizedTest
    @ValueSource(doubles = {1.6, 4})
    void aChangeThatWasOverBeforeTheFirstWeighingHasNoDiffusivity(double first) {
        Random random = new Random(62);
        double[] times = new double[16];
        for (int i = 4; i < times.length; i++) {
            times[i] = (first + 0.2 * i) * Simulated.UNIT;
        }
        double[] contents = Simulated.contents(times, 0, random);
        Assessment a = Assessor.assess(Simulated.run(times, contents), AssessmentOptions.usual());
        assertThat(a.usable()).isFalse();
        assertThat(a.determined()).isFalse();
        assertThat(a.problems()).anySatisfy(p -> assertThat(p.code()).isIn(Code.NOT_DETERMINED_FAST, Code.SINGULAR));
        assertThat(a.parameter("diffusivity").orElseThrow().value()).isEmpty();
    }

    /** Where the content goes on as √t to the last weighing, the straight line is all there is. */
    @Test
    void aStraightLineInTheRootOfTimeHasASlopeAndNoDiffusivity() {
        double[] times = Simulated.times(24, 0.1);
        Random random = new Random(7);
        SimpleRegression line = new SimpleRegression();
        double[] contents = new double[24];
        for (int i = 0; i < 24; i++) {
            // bent upwards a little, so that no plateau helps
            double root = Math.sqrt(times[i]);
            contents[i] = 1e-5 * root * (1 + root / 5e3) + 2e-5 * random.nextGaussian();
            line.addData(root, contents[i]);
        }
        Assessment a = Assessor.assess(Simulated.run(times, contents), AssessmentOptions.usual());

        assertThat(a.determined()).isFalse();
        assertThat(a.parameter("diffusivity").orElseThrow().value()).isEmpty();
        assertThat(a.parameter("equilibriumContent").orElseThrow().value()).isEmpty();
        double slope = a.parameter("initialSlope").orElseThrow().value().getAsDouble();
        assertThat(slope).isCloseTo(line.getSlope(), within(1e-4 * line.getSlope()));
        assertThat(a.parameter("startContent").orElseThrow().value().getAsDouble())
                .isCloseTo(line.getIntercept(), within(1e-3 * line.getInterceptStdErr()));
    }
}
