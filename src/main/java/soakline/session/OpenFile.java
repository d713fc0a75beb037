package soakline.session;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.CancellationException;
import soakline.inference.AssessmentOptions;
import soakline.intake.Choice;
import soakline.intake.FileCoupon;
import soakline.intake.ReadOptions;
import soakline.intake.RunFile;
import soakline.intake.RunFileReader;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.problem.Finding;
import soakline.session.BackgroundTasks.Progress;
import soakline.specimen.Facts.Other;
import soakline.specimen.Run;
import soakline.workspace.Coupon;
import soakline.workspace.OptionFacts;
import soakline.workspace.Workspace;

/** From a file, or text that is none, to an open document. To be called in the background. */
public final class OpenFile {

    private OpenFile() {}

    /**
     * Opens a file as it stands.
     *
     * @throws Fault when it cannot be read or holds no run, with the place
     * @throws CancellationException when {@code progress} says that it is cancelled
     */
    public static Document open(Path file, Progress progress) {
        return open(file, ReadOptions.of(), progress);
    }

    /** Opens a file of which the user says more than it says itself; see {@link #open(Path, Progress)}. */
    public static Document open(Path file, ReadOptions options, Progress progress) {
        RunFile read = RunFileReader.open(file, options, share -> watch(share, progress));
        Path name = file.getFileName();
        return new Document(
                Optional.of(file.toAbsolutePath()),
                name == null ? file.toString() : name.toString(),
                read.digest(),
                workspace(read),
                read.ownForm());
    }

    /** Opens text that came from no file, such as a sample run or what was pasted. */
    public static Document openText(String name, String text) {
        RunFile read = RunFileReader.openText(name, text, ReadOptions.of());
        return new Document(Optional.empty(), name, "", workspace(read));
    }

    /** Passes the progress on, and stops the work when that is wanted. */
    static void watch(double share, Progress progress) {
        if (progress.isCancelled()) {
            throw new CancellationException();
        }
        progress.at(share);
    }

    /**
     * The coupons of a file with the options that it keeps. What is meant as an option and not known here stays as a fact.
     *
     * @throws Fault when an option makes no sense, with the place
     */
    public static Workspace workspace(RunFile file) {
        return new Workspace(file.coupons().stream().map(OpenFile::coupon).toList());
    }

    private static Coupon coupon(FileCoupon read) {
        Run run = read.run();
        AssessmentOptions options = AssessmentOptions.usual();
        List<Other> others = new ArrayList<>(run.facts().other());
        List<Finding> notes = new ArrayList<>(run.notes());
        for (Choice choice : read.choices()) {
            Optional<AssessmentOptions> with = with(options, choice);
            if (with.isEmpty()) {
                others.add(new Other(choice.name(), choice.value()));
                notes.add(Finding.of(Code.FACT_UNKNOWN_KEPT, choice.name()).at(choice.place()));
            }
            options = with.orElse(options);
        }
        Run kept = new Run(run.source(), run.facts().withOther(others), run.kind(), run.weighings(), notes);
        return new Coupon(kept, options);
    }

    private static Optional<AssessmentOptions> with(AssessmentOptions options, Choice choice) {
        try {
            return OptionFacts.with(options, choice.name(), choice.value());
        } catch (Fault fault) {
            throw fault.at(choice.place());
        }
    }
}
