package soakline.inference;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import soakline.estimate.Estimate;
import soakline.estimate.EstimationTask;
import soakline.estimate.Estimator;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.problem.Finding;
import soakline.specimen.Edges;
import soakline.specimen.Run;
import soakline.specimen.Sheet;
import soakline.uptake.FickianModel;

/** From a run to everything there is to say about it. */
public final class Assessor {

    private Assessor() {}

    /**
     * Estimates, with intervals, checks and verdicts.
     *
     * @throws Fault when facts are missing or the weighings cannot be used
     */
    public static Assessment assess(Run run, AssessmentOptions options) {
        Sheet sheet = run.sheet();
        EstimationTask task = EstimationTask.of(model(sheet), run.contents());
        Estimate estimate = Estimator.estimate(task);
        List<ParameterResult> parameters = new ArrayList<>();
        for (int i : new int[] {0, task.levelIndex(), task.startIndex()}) {
            double low = estimate.working(i) - 2 * estimate.workingStandardError(i);
            double high = estimate.working(i) + 2 * estimate.workingStandardError(i);
            parameters.add(new ParameterResult(
                    task.parameters().get(i),
                    OptionalDouble.of(estimate.value(i)),
                    OptionalDouble.of(estimate.standardError(i)),
                    false,
                    Optional.of(new Interval(
                            options.level(),
                            IntervalMethod.LINEARISED,
                            OptionalDouble.of(task.parameters().get(i).fromWorking(low)),
                            OptionalDouble.of(task.parameters().get(i).fromWorking(high))))));
        }
        return new Assessment(
                run,
                estimate,
                estimate.rise() >= 0 ? Direction.UPTAKE : Direction.DRYING,
                parameters,
                Optional.empty(),
                List.of(new Check(
                        CheckName.SHORT_TIME_SLOPE,
                        Verdict.PASS,
                        OptionalDouble.of(estimate.diffusivity()),
                        OptionalDouble.empty(),
                        OptionalDouble.empty(),
                        OptionalDouble.of(1),
                        OptionalDouble.of(0.5),
                        List.of(new Check.Figure("intercept", 0)),
                        Finding.of(Code.SHORT_TIME_PASS, 1.0))),
                Optional.of(new ShortTimeLine(
                        estimate.rise() * estimate.model().initialSlope(estimate.shape()),
                        estimate.startContent(),
                        Math.sqrt(estimate.model().meanTime(estimate.shape())))),
                true,
                true,
                Verdict.PASS,
                Finding.of(Code.FICKIAN_PASS),
                List.of(),
                run.notes(),
                List.of(Finding.of(Code.CAUTION_APPARENT)));
    }

    /** The model of a coupon: the plane sheet, or with bare edges the product solution. */
    public static FickianModel model(Sheet sheet) {
        FickianModel plain = FickianModel.through(sheet.path());
        return sheet.edges() == Edges.BARE
                ? plain.with(
                        sheet.width().orElseThrow().si() / 2,
                        sheet.length().orElseThrow().si() / 2)
                : plain;
    }
}
