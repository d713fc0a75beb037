package soakline.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import soakline.estimate.Estimate;
import soakline.estimate.EstimationTask;
import soakline.estimate.Estimator;
import soakline.estimate.Parameter;
import soakline.inference.Assessment;
import soakline.inference.Check;
import soakline.inference.CheckName;
import soakline.inference.CombinedUncertainty;
import soakline.inference.CombinedUncertainty.Contribution;
import soakline.inference.Direction;
import soakline.inference.Interval;
import soakline.inference.IntervalMethod;
import soakline.inference.ParameterResult;
import soakline.inference.ShortTimeLine;
import soakline.inference.Verdict;
import soakline.problem.Code;
import soakline.problem.Finding;
import soakline.quantity.Quantity;
import soakline.quantity.ResultUnit;
import soakline.quantity.Unit;
import soakline.specimen.Faces;
import soakline.specimen.Facts;
import soakline.specimen.Run;
import soakline.specimen.ValueKind;
import soakline.specimen.Weighings;
import soakline.uptake.FickianModel;

/** Assessments built by hand from invented numbers, so that a report is tested against what it was given. */
public final class InventedAssessments {

    public static final double D = 1.2345678901e-12;
    public static final double LOW = 1.1111e-12;
    public static final double HIGH = 1.3579e-12;
    public static final double D_ERROR = 6.5e-14;

    private InventedAssessments() {}

    /** Contents of a coupon with D = 1e-12 m²/s and a path of 1 mm, with a small made-up ripple as noise. */
    public static Run run(String specimen, double lastHours, int count) {
        FickianModel model = FickianModel.through(1e-3);
        Weighings.Builder weighings = new Weighings.Builder();
        for (int i = 0; i < count; i++) {
            double time = 3600 * lastHours * Math.pow((double) i / (count - 1), 2);
            double g = model.fraction(time, new double[] {Math.log(1e-12)});
            weighings.add(time, 0.018 * g + 2e-5 * Math.sin(7.0 * i * i), 12 + i);
        }
        Facts facts = Facts.of(specimen)
                .withThickness(Quantity.of(2, Unit.MILLIMETRE).withStandardUncertainty(0.01))
                .withFaces(Faces.BOTH);
        return new Run("invented.csv", facts, ValueKind.CONTENT, weighings.build(), List.of());
    }

    public static Assessment usable() {
        return usable("P-07", D);
    }

    public static Assessment usable(String specimen, double diffusivity) {
        Run run = run(specimen, 400, 20)
                .withWeighings(run(specimen, 400, 20).weighings().settingAside(3, "dropped"));
        return new Assessment(
                run,
                estimate(run),
                Direction.UPTAKE,
                List.of(
                        diffusivity(diffusivity, OptionalDouble.of(LOW), OptionalDouble.of(HIGH)),
                        content(Parameter.EQUILIBRIUM_CONTENT, 0.018),
                        new ParameterResult(
                                Parameter.START_CONTENT,
                                OptionalDouble.of(0),
                                OptionalDouble.empty(),
                                true,
                                Optional.empty())),
                Optional.of(new CombinedUncertainty(
                        0.95,
                        7e-14,
                        OptionalDouble.of(1.1e-12),
                        OptionalDouble.of(1.4e-12),
                        51.5,
                        List.of(
                                new Contribution("fit", 1, 0.05, 0.75),
                                new Contribution("thickness", 2, 0.015, 0.25)))),
                List.of(shortTimeSlope()),
                Optional.of(new ShortTimeLine(1e-5, 0, 300)),
                true,
                true,
                Verdict.PASS,
                Finding.of(Code.FICKIAN_PASS),
                List.of(),
                List.of(Finding.of(Code.EDGES_TAKEN_SEALED)),
                List.of(Finding.of(Code.CAUTION_APPARENT)));
    }

    /** The same, with Fick's law refused. */
    public static Assessment apparent() {
        Assessment a = usable();
        return new Assessment(
                a.run(),
                a.estimate(),
                a.direction(),
                a.parameters(),
                a.combined(),
                a.checks(),
                a.shortTimeLine(),
                true,
                true,
                Verdict.FAIL,
                Finding.of(Code.FICKIAN_FAIL),
                List.of(Finding.of(Code.NOT_FICKIAN)),
                a.notes(),
                a.cautions());
    }

    /** Stopped before its plateau. The check and the budget carry the number that must not come out. */
    public static Assessment stoppedEarly() {
        Assessment a = usable("P-11", D);
        List<ParameterResult> parameters = new ArrayList<>();
        for (ParameterResult result : a.parameters().subList(0, 2)) {
            parameters.add(new ParameterResult(
                    result.parameter(), OptionalDouble.empty(), OptionalDouble.empty(), false, Optional.empty()));
        }
        parameters.add(content(Parameter.START_CONTENT, 1e-4));
        parameters.add(content(Parameter.INITIAL_SLOPE, 1.5e-5));
        return new Assessment(
                a.run(),
                a.estimate(),
                a.direction(),
                parameters,
                a.combined(),
                a.checks(),
                a.shortTimeLine(),
                false,
                false,
                Verdict.UNKNOWN,
                Finding.of(Code.FICKIAN_UNKNOWN),
                List.of(Finding.of(Code.NOT_DETERMINED_OPEN, 95, "upper")),
                a.notes(),
                a.cautions());
    }

    /** The interval of D left open on a side. */
    public static Assessment open(OptionalDouble low, OptionalDouble high) {
        Assessment a = usable();
        List<ParameterResult> parameters = new ArrayList<>(a.parameters());
        parameters.set(0, diffusivity(D, low, high));
        return new Assessment(
                a.run(),
                a.estimate(),
                a.direction(),
                parameters,
                a.combined(),
                a.checks(),
                a.shortTimeLine(),
                true,
                true,
                a.fickian(),
                a.fickianFinding(),
                a.problems(),
                a.notes(),
                a.cautions());
    }

    private static Estimate estimate(Run run) {
        return Estimator.estimate(EstimationTask.of(FickianModel.through(1e-3), run.contents()));
    }

    private static ParameterResult diffusivity(double value, OptionalDouble low, OptionalDouble high) {
        return new ParameterResult(
                new Parameter("diffusivity", ResultUnit.SQUARE_METRE_PER_SECOND, true),
                OptionalDouble.of(value),
                OptionalDouble.of(D_ERROR),
                false,
                Optional.of(new Interval(0.95, IntervalMethod.PROFILE, low, high)));
    }

    private static ParameterResult content(Parameter parameter, double value) {
        return new ParameterResult(
                parameter,
                OptionalDouble.of(value),
                OptionalDouble.of(Math.abs(value) / 100),
                false,
                Optional.of(new Interval(
                        0.95,
                        IntervalMethod.PROFILE,
                        OptionalDouble.of(value * 0.98),
                        OptionalDouble.of(value * 1.02))));
    }

    private static Check shortTimeSlope() {
        return new Check(
                CheckName.SHORT_TIME_SLOPE,
                Verdict.PASS,
                OptionalDouble.of(D),
                OptionalDouble.of(LOW),
                OptionalDouble.of(HIGH),
                OptionalDouble.of(1.01),
                OptionalDouble.of(Double.NaN),
                List.of(new Check.Figure("intercept", 0.0002), new Check.Figure("weighings", 7)),
                Finding.of(Code.SHORT_TIME_PASS, 1.01));
    }
}
