package soakline.inference;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Supplier;
import soakline.estimate.Estimate;
import soakline.estimate.EstimationTask;
import soakline.estimate.Estimator;
import soakline.estimate.LevelForm;
import soakline.estimate.LevenbergMarquardt;
import soakline.estimate.Parameter;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.problem.Finding;
import soakline.specimen.Run;
import soakline.specimen.Sheet;

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
        EstimationTask task = task(run, sheet, options);
        Estimate estimate = Estimator.estimate(task);
        Optional<Estimate> rootLaw = rootLaw(task, estimate);
        List<Finding> problems = new ArrayList<>(Plausibility.ofInput(run, task.data(), estimate));
        if (!estimate.isOptimum() && rootLaw.isEmpty()) {
            return withoutResult(run, estimate, problems);
        }
        Identifiability identifiability =
                rootLaw.isPresent() ? Identifiability.ofRootLaw() : Identifiability.of(estimate);
        return judge(run, options, rootLaw.orElse(estimate), identifiability, problems);
    }

    /** Where the best fit is the √t law itself, which has no D: the fit of the initial slope in its place. */
    private static Optional<Estimate> rootLaw(EstimationTask task, Estimate estimate) {
        if (estimate.isOptimum() || task.isFixed(0) || task.isFixed(task.levelIndex())) {
            return Optional.empty();
        }
        Estimate slope = Estimator.estimate(task.withInitialSlope());
        boolean asGood = slope.isOptimum() && slope.sumOfSquares() <= estimate.sumOfSquares() * (1 + 1e-6);
        return asGood ? Optional.of(slope) : Optional.empty();
    }

    private static Assessment judge(
            Run run,
            AssessmentOptions options,
            Estimate estimate,
            Identifiability identifiability,
            List<Finding> problems) {
        EstimationTask task = estimate.task();
        boolean determined = identifiability.isDetermined();
        identifiability.refusal().ifPresent(problems::add);
        if (determined) {
            problems.addAll(Plausibility.ofResult(estimate));
        }
        ResidualSpace space = new ResidualSpace(estimate);
        ShapeChecks shape = new ShapeChecks(space, determined, options.level());
        List<Check> checks = checks(space, shape, identifiability);
        Verdict fickian = FickianVerdict.of(checks, run, task.data(), estimate.residualStandardDeviation(), determined);
        if (fickian == Verdict.FAIL) {
            problems.add(Finding.of(Code.NOT_FICKIAN));
        }
        Direction direction = direction(estimate);
        return new Assessment(
                run,
                estimate,
                direction,
                determined
                        ? parameters(estimate, options, identifiability.interval())
                        : parametersOfShortTest(estimate, options),
                determined && !task.isFixed(0)
                        ? Optional.of(UncertaintyBudget.of(estimate, run.sheet(), options.level()))
                        : Optional.empty(),
                checks,
                shape.shortTimeLine(),
                determined,
                determined,
                fickian,
                FickianVerdict.finding(fickian),
                problems,
                Plausibility.notes(run),
                Cautions.of(direction));
    }

    private static EstimationTask task(Run run, Sheet sheet, AssessmentOptions options) {
        EstimationTask task = EstimationTask.of(Coupons.model(sheet), run.contents());
        for (Map.Entry<String, Double> fixed : options.fixed().entrySet()) {
            int parameter = task.indexOf(fixed.getKey());
            task = task.withFixed(parameter, task.parameters().get(parameter).toWorking(fixed.getValue()));
        }
        return task;
    }

    private static Direction direction(Estimate estimate) {
        return estimate.rise() >= 0 ? Direction.UPTAKE : Direction.DRYING;
    }

    private static List<Check> checks(ResidualSpace space, ShapeChecks shape, Identifiability identifiability) {
        List<Check> checks = new ArrayList<>();
        if (space.estimate().isWithoutScatter()) {
            for (CheckName name : CheckName.values()) {
                checks.add(
                        name == CheckName.PLATEAU
                                ? identifiability.plateau(space.estimate())
                                : Check.unknown(name, Finding.of(Code.CHECK_RESIDUALS_ZERO)));
            }
            return checks;
        }
        List<Evidence> evidence = new ArrayList<>();
        Side.<List<Evidence>>bySide(space.size(), List.of(shape::all, new ResidualChecks(space)::all))
                .forEach(evidence::addAll);
        checks.addAll(Evidence.judge(evidence));
        checks.add(identifiability.plateau(space.estimate()));
        checks.sort(Comparator.comparing(Check::name));
        return checks;
    }

    /**
     * @param ofDiffusivity its profile interval at the usual level, which was needed before
     */
    private static List<ParameterResult> parameters(
            Estimate estimate, AssessmentOptions options, Optional<Interval> ofDiffusivity) {
        EstimationTask task = estimate.task();
        List<Supplier<ParameterResult>> results = new ArrayList<>();
        for (int i = 0; i < task.shapeCount(); i++) {
            int shape = i;
            results.add(() -> shape == 0 && ofDiffusivity.isPresent() && isSame(ofDiffusivity.get(), options)
                    ? result(estimate, shape, ofDiffusivity)
                    : result(estimate, shape, options));
        }
        results.add(() -> result(estimate, task.levelIndex(), options));
        results.add(() -> result(estimate, task.startIndex(), options));
        return Side.bySide(task.data().size(), results);
    }

    private static boolean isSame(Interval interval, AssessmentOptions options) {
        return interval.level() == options.level() && interval.method() == options.method();
    }

    private static ParameterResult result(Estimate estimate, int parameter, AssessmentOptions options) {
        return result(
                estimate,
                parameter,
                estimate.task().isFixed(parameter)
                        ? Optional.empty()
                        : Optional.of(Intervals.of(estimate, parameter, options.level(), options.method())));
    }

    private static ParameterResult result(Estimate estimate, int parameter, Optional<Interval> interval) {
        boolean fixed = estimate.task().isFixed(parameter);
        return new ParameterResult(
                estimate.parameters().get(parameter),
                OptionalDouble.of(estimate.value(parameter)),
                fixed ? OptionalDouble.empty() : OptionalDouble.of(estimate.standardError(parameter)),
                fixed,
                interval);
    }

    /** D and M∞ without values; the start content and the initial slope with theirs. */
    private static List<ParameterResult> parametersOfShortTest(Estimate estimate, AssessmentOptions options) {
        EstimationTask task = estimate.task();
        List<ParameterResult> results = new ArrayList<>();
        for (int i = 0; i < task.shapeCount(); i++) {
            results.add(withoutValue(task.parameters().get(i)));
        }
        results.add(withoutValue(Parameter.EQUILIBRIUM_CONTENT));
        if (task.isFixed(task.levelIndex())) {
            results.add(result(estimate, task.startIndex(), options));
            return results;
        }
        // on the way to its limits D may tend to 0 and M∞ grow without end; in this form the fit goes with it
        Estimate slope = inSlopeForm(estimate);
        results.add(result(slope, task.startIndex(), options));
        results.add(result(slope, task.levelIndex(), options));
        return results;
    }

    private static Estimate inSlopeForm(Estimate estimate) {
        EstimationTask task = estimate.task();
        if (task.form() == LevelForm.INITIAL_SLOPE) {
            return estimate;
        }
        double[] start = estimate.working();
        start[task.levelIndex()] = estimate.rise() * estimate.model().initialSlope(estimate.shape());
        return Estimator.refit(task.withInitialSlope(), start);
    }

    private static ParameterResult withoutValue(Parameter parameter) {
        return new ParameterResult(parameter, OptionalDouble.empty(), OptionalDouble.empty(), false, Optional.empty());
    }

    /** The fit itself failed: every parameter without a value, every check without a verdict. */
    private static Assessment withoutResult(Run run, Estimate estimate, List<Finding> problems) {
        problems.add(
                estimate.ending() == LevenbergMarquardt.Ending.SINGULAR
                        ? Finding.of(Code.SINGULAR)
                        : Finding.of(Code.NOT_CONVERGED, estimate.evaluations()));
        EstimationTask task = estimate.task();
        List<ParameterResult> results = new ArrayList<>();
        for (int i = 0; i < task.shapeCount(); i++) {
            results.add(withoutValue(task.parameters().get(i)));
        }
        results.add(withoutValue(Parameter.EQUILIBRIUM_CONTENT));
        results.add(withoutValue(Parameter.START_CONTENT));
        List<Check> checks = new ArrayList<>();
        for (CheckName name : CheckName.values()) {
            checks.add(Check.unknown(name, Finding.of(Code.CHECK_UNKNOWN, "there is no fitted curve")));
        }
        double[] contents = task.data().contents();
        Direction direction = contents[contents.length - 1] >= contents[0] ? Direction.UPTAKE : Direction.DRYING;
        return new Assessment(
                run,
                estimate,
                direction,
                results,
                Optional.empty(),
                checks,
                Optional.empty(),
                false,
                false,
                Verdict.UNKNOWN,
                FickianVerdict.finding(Verdict.UNKNOWN),
                problems,
                Plausibility.notes(run),
                Cautions.of(direction));
    }
}
