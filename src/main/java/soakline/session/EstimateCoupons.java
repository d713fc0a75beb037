package soakline.session;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleConsumer;
import soakline.inference.Assessment;
import soakline.inference.Assessor;
import soakline.problem.Fault;
import soakline.problem.Finding;
import soakline.problem.Place;
import soakline.specimen.Run;

/** From files to assessments: the use case of the command {@code estimate}. */
public final class EstimateCoupons {

    /** For a caller who does not watch. */
    public static final DoubleConsumer UNWATCHED = share -> {};

    private final RunReader reader;

    public EstimateCoupons(RunReader reader) {
        this.reader = reader;
    }

    /**
     * What became of a request.
     *
     * @param assessments in the order of the files and their coupons; without those that failed
     * @param failures one for each file that could not be read and each coupon that could not be estimated, with its place
     */
    public record Outcome(List<Assessment> assessments, List<Finding> failures) {

        public Outcome {
            assessments = List.copyOf(assessments);
            failures = List.copyOf(failures);
        }
    }

    /**
     * Reads all files and estimates all coupons. A file or coupon that fails does not keep the others from being looked at, so
     * that all that is wrong is said at once.
     *
     * @param progress hears the share of the work that is done, from 0 to 1; it may throw a
     *     {@link java.util.concurrent.CancellationException} to stop the work
     */
    public Outcome run(EstimateRequest request, DoubleConsumer progress) {
        List<Assessment> assessments = new ArrayList<>();
        List<Finding> failures = new ArrayList<>();
        int files = request.files().size();
        for (int i = 0; i < files; i++) {
            Path file = request.files().get(i);
            int before = i;
            // reading takes about half of the time of a long file
            DoubleConsumer reading = share -> progress.accept((before + share / 2) / files);
            try {
                List<Run> runs = reader.read(file, request, reading);
                for (int k = 0; k < runs.size(); k++) {
                    progress.accept((before + 0.5 + 0.5 * k / runs.size()) / files);
                    estimate(runs.get(k), request, assessments, failures);
                }
            } catch (Fault fault) {
                failures.add(placed(fault.finding(), String.valueOf(file.getFileName())));
            }
        }
        progress.accept(1);
        return new Outcome(assessments, failures);
    }

    private static void estimate(
            Run run, EstimateRequest request, List<Assessment> assessments, List<Finding> failures) {
        Run known = run.withFacts(run.facts().overriddenBy(request.overrides()));
        try {
            assessments.add(Assessor.assess(known, request.options()));
        } catch (Fault fault) {
            failures.add(placed(fault.finding(), run.source()));
        }
    }

    /** With the file's name, if the finding has no place yet. */
    private static Finding placed(Finding finding, String source) {
        return finding.place().equals(Place.NONE) ? finding.at(Place.of(source)) : finding;
    }
}
