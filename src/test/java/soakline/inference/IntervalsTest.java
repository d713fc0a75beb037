package soakline.inference;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import soakline.Samples;
import soakline.estimate.Estimate;
import soakline.estimate.EstimationTask;
import soakline.estimate.Estimator;
import soakline.specimen.ContentSeries;
import soakline.uptake.FickianModel;

class IntervalsTest {

    /** Content is linear in M∞ and M0, so once D is fixed both kinds are the same and exact. */
    @Test
    void bothKindsAgreeWhereTheModelIsLinear() {
        Estimate free = Simulated.estimate(20, 1.2, 0, new Random(8));
        Estimate held = Estimator.estimate(free.task().withFixed(0, free.working(0)));
        for (int parameter : new int[] {held.task().startIndex(), held.task().levelIndex()}) {
            Interval profile = Intervals.profile(held, parameter, 0.9);
            Interval linearised = Intervals.linearised(held, parameter, 0.9);
            double tolerance = 1e-6 * held.standardError(parameter);
            assertThat(profile.low().getAsDouble()).isCloseTo(linearised.low().getAsDouble(), within(tolerance));
            assertThat(profile.high().getAsDouble()).isCloseTo(linearised.high().getAsDouble(), within(tolerance));
        }
    }

    /** At a limit the best fit is worse by just as much as the t quantile allows (Bates and Watts 1988, ch. 6). */
    @Test
    void limitsLieWhereTheLikelihoodSaysSo() {
        Estimate estimate = Simulated.estimate(15, 0.6, 0, new Random(9));
        double t = Quantiles.twoSidedT(0.95, estimate.degreesOfFreedom());
        Interval interval = Intervals.profile(estimate, 0, 0.95);
        for (double limit :
                new double[] {interval.low().getAsDouble(), interval.high().getAsDouble()}) {
            EstimationTask held = estimate.task().withFixed(0, Math.log(limit));
            double sum = Estimator.estimate(held).sumOfSquares();
            double excess = (sum - estimate.sumOfSquares()) / (estimate.sumOfSquares() / estimate.degreesOfFreedom());
            assertThat(Math.sqrt(excess)).isCloseTo(t, within(1e-5));
        }
    }

    /** A nominal 95 % interval holds the truth so often; within four standard deviations of the count. */
    @ParameterizedTest
    @CsvSource({"12, 11", "40, 12"})
    void profileIntervalsCoverAsTheySay(int n, int seed) {
        Random random = new Random(seed);
        int sets = 3000;
        int[] held = new int[3];
        double[] truth = {Simulated.D, 0, Simulated.RISE};
        for (int k = 0; k < sets; k++) {
            Estimate estimate = Simulated.estimate(n, 1.2, 0, random);
            for (int p = 0; p < 3; p++) {
                Interval interval = Intervals.profile(estimate, p, 0.95);
                held[p] += interval.low().orElse(Double.NEGATIVE_INFINITY) <= truth[p]
                                && truth[p] <= interval.high().orElse(Double.POSITIVE_INFINITY)
                        ? 1
                        : 0;
            }
        }
        for (int p = 0; p < 3; p++) {
            assertThat((double) held[p] / sets).as("parameter " + p).isBetween(0.934, 0.966);
        }
    }

    @ParameterizedTest
    @EnumSource(IntervalMethod.class)
    void theLevelIsTheOneAskedFor(IntervalMethod method) {
        AssessmentOptions options = AssessmentOptions.usual().withLevel(0.8).withMethod(method);
        Interval narrow = interval(options);
        Interval wide = interval(options.withLevel(0.99));
        assertThat(narrow.level()).isEqualTo(0.8);
        assertThat(wide.low().getAsDouble()).isLessThan(narrow.low().getAsDouble());
        assertThat(wide.high().getAsDouble()).isGreaterThan(narrow.high().getAsDouble());
    }

    private static Interval interval(AssessmentOptions options) {
        return Assessor.assess(Samples.run("01-both-faces.csv"), options)
                .parameter("diffusivity")
                .orElseThrow()
                .interval()
                .orElseThrow();
    }

    @Test
    void aFixedParameterHasNoIntervalAndTheOthersNarrow() {
        AssessmentOptions usual = AssessmentOptions.usual();
        AssessmentOptions fixed = usual.withFixed(Map.of("startContent", 0.0));
        Assessment a = Assessor.assess(Samples.run("01-both-faces.csv"), fixed);

        ParameterResult start = a.parameter("startContent").orElseThrow();
        assertThat(start.fixed()).isTrue();
        assertThat(start.interval()).isEmpty();
        assertThat(start.value()).hasValue(0);
        Interval with = a.parameter("diffusivity").orElseThrow().interval().orElseThrow();
        Interval without = interval(usual);
        assertThat(Math.log(with.high().getAsDouble() / with.low().getAsDouble()))
                .isLessThan(
                        Math.log(without.high().getAsDouble() / without.low().getAsDouble()));
    }

    /** The accuracy of the lengths counts twice through the path; with bare edges all lengths together do (method of dimensions). */
    @Test
    void sensitivitiesSumToTwo() {
        CombinedUncertainty plain =
                Samples.assessment("01-both-faces.csv").combined().orElseThrow();
        assertThat(plain.contributions().get(1).sensitivity()).isCloseTo(2, within(1e-5));

        CombinedUncertainty edges =
                Samples.assessment("05-bare-edges.csv").combined().orElseThrow();
        double sum = edges.contributions().stream()
                .filter(c -> !c.source().equals("fit"))
                .mapToDouble(CombinedUncertainty.Contribution::sensitivity)
                .sum();
        assertThat(sum).isCloseTo(2, within(1e-4));
        assertThat(edges.contributions().stream()
                        .mapToDouble(CombinedUncertainty.Contribution::share)
                        .sum())
                .isCloseTo(1, within(1e-12));
    }

    /** A coupon ten times as wide and long as thick, weighed to its plateau: 1.85 and 0.073 each (computed with SciPy). */
    @Test
    void aTenToOneCouponWithBareEdges() {
        FickianModel model = FickianModel.through(1e-3).with(1e-2, 1e-2);
        double[] times = Simulated.times(40, 3);
        double[] contents = new double[40];
        model.evaluate(times, 40, new double[] {Math.log(Simulated.D)}, contents, null);
        Estimate estimate = Estimator.estimate(EstimationTask.of(model, ContentSeries.of(times, contents)));
        double h = 1e-4;
        double byThickness = (lnD(estimate, 1 + h, 1) - lnD(estimate, 1 - h, 1)) / (2 * h);
        double byWidth = (lnD(estimate, 1, 1 + h) - lnD(estimate, 1, 1 - h)) / (2 * h);
        assertThat(byThickness).isCloseTo(1.85, within(0.006));
        assertThat(byWidth).isCloseTo(0.073, within(0.0015));
    }

    private static double lnD(Estimate estimate, double thickness, double width) {
        FickianModel model = FickianModel.through(1e-3 * thickness).with(1e-2 * width, 1e-2);
        return Estimator.refit(estimate.task().withModel(model), estimate.working())
                .working(0);
    }

    /** The sum in quadrature, and the interval by hand: ln D ± t(ν_eff) u. */
    @Test
    void theCombinedIntervalByHand() {
        Assessment a = Samples.assessment("01-both-faces.csv");
        CombinedUncertainty combined = a.combined().orElseThrow();
        double fit = a.estimate().workingStandardError(0);
        double u = Math.hypot(fit, 2 * 0.01 / 2.03);
        double d = a.estimate().diffusivity();
        assertThat(combined.standardUncertainty()).isCloseTo(d * u, within(1e-4 * d * u));
        double t = Quantiles.twoSidedT(0.95, 37 * Math.pow(u / fit, 4));
        assertThat(combined.high().getAsDouble()).isCloseTo(d * Math.exp(t * u), within(1e-5 * d));
    }
}
