package soakline.bench;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.TearDown;
import org.openjdk.jmh.annotations.Warmup;
import soakline.estimate.Estimate;
import soakline.estimate.EstimationTask;
import soakline.estimate.Estimator;
import soakline.inference.Assessment;
import soakline.inference.AssessmentOptions;
import soakline.inference.Assessor;
import soakline.intake.Progress;
import soakline.intake.ReadOptions;
import soakline.intake.RunFileReader;
import soakline.specimen.ContentSeries;
import soakline.specimen.Run;
import soakline.uptake.FickianModel;

/** A log of 1,000,000 weighings: import, estimate, and everything there is to say. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Fork(value = 1, jvmArgs = "-Xmx2g")
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
public class LongLogBenchmark {

    @Param({"hours", "dates"})
    public String times;

    private Path file;
    private Run run;
    private ContentSeries contents;

    @Setup
    public void setUp() throws IOException {
        file = Files.createTempFile("long-log", ".csv");
        LongLog.write(file, 1_000_000, times.equals("dates"));
        run = read().get(0);
        contents = run.contents();
    }

    @TearDown
    public void tearDown() throws IOException {
        Files.delete(file);
    }

    private List<Run> read() {
        return RunFileReader.read(file, ReadOptions.of(), Progress.NONE);
    }

    @Benchmark
    public List<Run> importFile() {
        return read();
    }

    @Benchmark
    public Estimate estimateAlone() {
        return Estimator.estimate(EstimationTask.of(FickianModel.through(1e-3), contents));
    }

    @Benchmark
    public Assessment importAndAssess() {
        return Assessor.assess(read().get(0), AssessmentOptions.usual());
    }
}
