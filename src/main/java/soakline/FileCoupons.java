package soakline;

import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.CancellationException;
import soakline.inference.Assessment;
import soakline.inference.AssessmentOptions;
import soakline.inference.Assessor;
import soakline.intake.ReadOptions;
import soakline.intake.RunFileReader;
import soakline.session.BackgroundTasks.Progress;
import soakline.specimen.Run;
import soakline.window.present.CouponService;

/** The window's coupons: from run files and from the samples. */
final class FileCoupons implements CouponService {

    @Override
    public List<Run> read(Path file, Progress progress) {
        return RunFileReader.read(file, ReadOptions.of(), share -> {
            if (progress.isCancelled()) {
                throw new CancellationException();
            }
            progress.at(share);
        });
    }

    @Override
    public List<String> samples() {
        return SampleRuns.NAMES;
    }

    @Override
    public List<Run> readSample(String name, Progress progress) {
        return RunFileReader.readText(name, SampleRuns.text(name), ReadOptions.of());
    }

    @Override
    public Assessment assess(Run run, AssessmentOptions options) {
        return Assessor.assess(run, options);
    }
}
