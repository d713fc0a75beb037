package soakline;

import java.nio.file.Path;
import java.util.List;
import soakline.inference.Assessment;
import soakline.inference.AssessmentOptions;
import soakline.inference.Assessor;
import soakline.intake.Progress;
import soakline.intake.ReadOptions;
import soakline.intake.RunFileReader;
import soakline.specimen.Run;
import soakline.window.present.CouponService;

/** The sample runs for tests of any room. */
public final class Samples {

    private Samples() {}

    public static Path file(String name) {
        return Path.of("sample-runs", name);
    }

    public static List<Run> runs(String name) {
        return RunFileReader.read(file(name), ReadOptions.of(), Progress.NONE);
    }

    /** What the window of the program works with. */
    public static CouponService service() {
        return new FileCoupons();
    }

    public static List<String> names() {
        return SampleRuns.NAMES;
    }

    /** The first coupon of a sample run. */
    public static Run run(String name) {
        return runs(name).get(0);
    }

    public static Assessment assessment(String name) {
        return Assessor.assess(run(name), AssessmentOptions.usual());
    }

    /** All coupons of a sample run. */
    public static List<Assessment> assessments(String name) {
        return runs(name).stream()
                .map(run -> Assessor.assess(run, AssessmentOptions.usual()))
                .toList();
    }
}
