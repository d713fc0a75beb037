package soakline.window.present;

import java.nio.file.Path;
import java.util.List;
import soakline.figure.InventedRuns;
import soakline.inference.Assessment;
import soakline.inference.AssessmentOptions;
import soakline.inference.Assessor;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.problem.Place;
import soakline.session.BackgroundTasks.Progress;
import soakline.specimen.Facts;
import soakline.specimen.Run;

/** Invented files by name, estimated for real. */
public final class InventedService implements CouponService {

    @Override
    public List<Run> read(Path file, Progress progress) {
        return readSample(file.getFileName().toString(), progress);
    }

    @Override
    public List<String> samples() {
        return List.of("01-plateau.csv", "02-stopped-early.csv", "03-second-stage.csv", "04-several.csv");
    }

    @Override
    public List<Run> readSample(String name, Progress progress) {
        progress.at(0.5);
        return switch (name) {
            case "01-plateau.csv" -> List.of(InventedRuns.plateau());
            case "02-stopped-early.csv" -> List.of(InventedRuns.stoppedEarly());
            case "03-second-stage.csv" -> List.of(InventedRuns.twoStage());
            case "04-several.csv" ->
                List.of(InventedRuns.plateau(), InventedRuns.stoppedEarly(), InventedRuns.tooFew());
            case "no-facts.csv" -> List.of(InventedRuns.withoutFacts());
            case "no-facts-several.csv" ->
                List.of(InventedRuns.withoutFacts(), InventedRuns.withoutFacts().withFacts(Facts.of("P-11")));
            default -> throw Fault.of(Code.COLUMN_UNIT_MISSING, "mass", "g").at(new Place(name, 3, 2));
        };
    }

    @Override
    public Assessment assess(Run run, AssessmentOptions options) {
        return run.name().equals("P-09 second stage") ? InventedRuns.notFickian() : Assessor.assess(run, options);
    }
}
