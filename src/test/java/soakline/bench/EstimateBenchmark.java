package soakline.bench;

import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OperationsPerInvocation;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import soakline.Samples;
import soakline.estimate.Estimate;
import soakline.estimate.EstimationTask;
import soakline.estimate.Estimator;
import soakline.inference.Assessment;
import soakline.inference.AssessmentOptions;
import soakline.inference.Assessor;
import soakline.inference.Interval;
import soakline.inference.Intervals;
import soakline.specimen.Run;
import soakline.uptake.FickianModel;

/** One coupon of 40 weighings: the kernel, the estimate and its intervals. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@Fork(2)
@Warmup(iterations = 4, time = 1)
@Measurement(iterations = 5, time = 1)
public class EstimateBenchmark {

    private static final int WEIGHINGS = 40;
    private static final double LONGEST = 1.2;

    private final double[] times = new double[WEIGHINGS];
    private final double[] g = new double[WEIGHINGS];
    private final double[][] dg = new double[1][WEIGHINGS];
    private final FickianModel model = FickianModel.through(1);
    private Run run;
    private EstimationTask task;
    private Estimate estimate;
    private double[] near;

    @Setup
    public void setUp() {
        for (int i = 0; i < WEIGHINGS; i++) {
            double root = i / (WEIGHINGS - 1.0);
            times[i] = LONGEST * root * root;
        }
        run = Samples.run("01-both-faces.csv");
        task = EstimationTask.of(FickianModel.through(1.015e-3), run.contents());
        estimate = Estimator.estimate(task);
        near = estimate.working();
        near[0] += 0.05;
    }

    /** Value and derivative of one weighing, averaged over 40 √t-spaced ones to τ = 1.2. */
    @Benchmark
    @OperationsPerInvocation(WEIGHINGS)
    @OutputTimeUnit(TimeUnit.NANOSECONDS)
    public double kernelPerWeighing() {
        model.evaluate(times, WEIGHINGS, new double[1], g, dg);
        return g[1] + dg[0][1];
    }

    /** For comparison, at the same times. */
    @Benchmark
    @OperationsPerInvocation(WEIGHINGS)
    @OutputTimeUnit(TimeUnit.NANOSECONDS)
    public double expPerWeighing() {
        for (int i = 0; i < WEIGHINGS; i++) {
            g[i] = Math.exp(-times[i]);
        }
        return g[1];
    }

    /** From the contents to D, M∞ and M0 with linearised intervals, the scan for start values included. */
    @Benchmark
    @OutputTimeUnit(TimeUnit.MICROSECONDS)
    public Interval[] estimateWithLinearisedIntervals() {
        Estimate found = Estimator.estimate(task);
        return new Interval[] {
            Intervals.linearised(found, 0, 0.95),
            Intervals.linearised(found, 1, 0.95),
            Intervals.linearised(found, 2, 0.95)
        };
    }

    /** A refit from 5 % off, as a bootstrap or an edit makes it. */
    @Benchmark
    @OutputTimeUnit(TimeUnit.MICROSECONDS)
    public Estimate refitFromNear() {
        return Estimator.refit(task, near);
    }

    @Benchmark
    @OutputTimeUnit(TimeUnit.MICROSECONDS)
    public Interval profileLimitsOfDiffusivity() {
        return Intervals.profile(estimate, 0, 0.95);
    }

    @Benchmark
    @OutputTimeUnit(TimeUnit.MICROSECONDS)
    public Interval[] profileLimitsOfAll() {
        return new Interval[] {
            Intervals.profile(estimate, 0, 0.95),
            Intervals.profile(estimate, 1, 0.95),
            Intervals.profile(estimate, 2, 0.95)
        };
    }

    /** Everything there is to say: estimate, intervals, budget, checks and verdicts. */
    @Benchmark
    @OutputTimeUnit(TimeUnit.MICROSECONDS)
    public Assessment wholeAssessment() {
        return Assessor.assess(run, AssessmentOptions.usual());
    }
}
