package soakline.inference;

import java.util.List;
import java.util.Random;
import java.util.stream.Stream;
import soakline.estimate.Estimate;
import soakline.estimate.EstimationTask;
import soakline.estimate.Estimator;
import soakline.quantity.Quantity;
import soakline.quantity.Unit;
import soakline.specimen.ContentSeries;
import soakline.specimen.Faces;
import soakline.specimen.Facts;
import soakline.specimen.Run;
import soakline.specimen.ValueKind;
import soakline.specimen.Weighings;
import soakline.uptake.FickianModel;

/** Simulated tests of a Fickian coupon: invented, each from its own seed, D = 1e-12 m²/s, 1 % of rise. */
final class Simulated {

    static final double D = 1e-12;
    static final double PATH = 1e-3;
    static final double UNIT = PATH * PATH / D;
    static final double RISE = 0.01;
    /** Of the rise: that of the calibration study. */
    static final double SIGMA = 0.0056;

    private Simulated() {}

    /** Times √t-spaced from 0 to τ. */
    static double[] times(int n, double tau) {
        double[] times = new double[n];
        for (int i = 0; i < n; i++) {
            double root = i / (n - 1.0);
            times[i] = tau * UNIT * root * root;
        }
        return times;
    }

    /** Fractional uptake of the true curve, without noise. */
    static double[] fractions(double[] times) {
        double[] fractions = new double[times.length];
        FickianModel.through(PATH).evaluate(times, times.length, new double[] {Math.log(D)}, fractions, null);
        return fractions;
    }

    static double[] contents(double[] times, double correlation, Random random) {
        double[] contents = fractions(times);
        double noise = random.nextGaussian();
        for (int i = 0; i < contents.length; i++) {
            if (i > 0) {
                noise = correlation * noise + Math.sqrt(1 - correlation * correlation) * random.nextGaussian();
            }
            contents[i] = RISE * (contents[i] + SIGMA * noise);
        }
        return contents;
    }

    static Estimate estimate(int n, double tau, double correlation, Random random) {
        double[] times = times(n, tau);
        return Estimator.estimate(EstimationTask.of(
                FickianModel.through(PATH), ContentSeries.of(times, contents(times, correlation, random))));
    }

    /** As a run of contents, with a thickness that gives the path. */
    static Run run(int n, double tau, double correlation, Random random) {
        double[] times = times(n, tau);
        return run(times, contents(times, correlation, random));
    }

    /** Assessments of 1,000 tests with white noise, n = 24, run to τ = 1.5, all as usual. Made once. */
    static List<Assessment> assessments() {
        return Assessments.ALL;
    }

    private static final class Assessments {
        private static final Random RANDOM = new Random(1234);
        static final List<Assessment> ALL = Stream.generate(
                        () -> Assessor.assess(run(24, 1.5, 0, RANDOM), AssessmentOptions.usual()))
                .limit(1000)
                .toList();
    }

    static Run run(double[] times, double[] contents) {
        Facts facts = Facts.of("invented")
                .withThickness(Quantity.of(2 * PATH, Unit.METRE))
                .withFaces(Faces.BOTH);
        return new Run("invented.csv", facts, ValueKind.CONTENT, Weighings.of(times, contents), List.of());
    }
}
