package soakline.window.present;

import java.nio.file.Path;
import java.util.List;
import soakline.inference.Assessment;
import soakline.inference.AssessmentOptions;
import soakline.session.BackgroundTasks.Progress;
import soakline.specimen.Run;

/** What the window asks of the rest of the program. All of it is called in the background only. */
public interface CouponService {

    /**
     * The coupons of a file.
     *
     * @throws soakline.problem.Fault when it cannot be read
     */
    List<Run> read(Path file, Progress progress);

    /** File names of the sample runs that travel with the program, in order. */
    List<String> samples();

    /** The coupons of a sample run. */
    List<Run> readSample(String name, Progress progress);

    /**
     * Estimates one coupon.
     *
     * @throws soakline.problem.Fault when facts are missing or the weighings cannot be used
     */
    Assessment assess(Run run, AssessmentOptions options);
}
