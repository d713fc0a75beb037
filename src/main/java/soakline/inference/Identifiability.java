package soakline.inference;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import soakline.estimate.Estimate;
import soakline.estimate.EstimationTask;
import soakline.problem.Code;
import soakline.problem.Finding;

/**
 * Whether the weighings determine D at all. A test that stopped before its plateau knows only (M∞ − M0)√D: the least-squares
 * optimum and its standard error then look like a result and are none.
 *
 * <p>The rule: D is not determined when its 95 % profile interval, whatever level is shown, is open on a side, or when its high
 * over low exceeds {@value #WIDEST} and ln D and M∞ are correlated beyond {@value #STRONGEST}.
 *
 * @param interval the 95 % profile interval of D; empty when D is fixed
 * @param correlation of ln D and M∞; empty when one is fixed
 * @param refusal why D is not determined; empty when it is
 */
record Identifiability(Optional<Interval> interval, OptionalDouble correlation, Optional<Finding> refusal) {

    private static final double LEVEL = 0.95;
    private static final int LEVEL_PERCENT = 95;
    private static final double WIDEST = 1.5;
    private static final double STRONGEST = -0.99;

    /** Below this share of the rise at the last weighing the plateau is an extrapolation (common practice, no source). */
    private static final double SHORT_OF_PLATEAU = 0.9;

    static Identifiability of(Estimate estimate) {
        EstimationTask task = estimate.task();
        if (task.isFixed(0)) {
            return new Identifiability(Optional.empty(), OptionalDouble.empty(), Optional.empty());
        }
        Interval interval = Intervals.profile(estimate, 0, LEVEL);
        OptionalDouble correlation = task.isFixed(task.levelIndex())
                ? OptionalDouble.empty()
                // in drying the content falls, so the sign turns
                : OptionalDouble.of(estimate.correlation(0, task.levelIndex()) * Math.signum(estimate.rise()));
        return new Identifiability(Optional.of(interval), correlation, refusal(interval, correlation));
    }

    /** The best fit is the √t law, whatever D: open below. */
    static Identifiability ofRootLaw() {
        return new Identifiability(
                Optional.empty(),
                OptionalDouble.empty(),
                Optional.of(Finding.of(Code.NOT_DETERMINED_OPEN, LEVEL_PERCENT, "lower")));
    }

    private static Optional<Finding> refusal(Interval interval, OptionalDouble correlation) {
        if (interval.isOpen()) {
            if (interval.low().isPresent()) {
                return Optional.of(Finding.of(Code.NOT_DETERMINED_FAST, LEVEL_PERCENT));
            }
            String side = interval.high().isEmpty() ? "lower or upper" : "lower";
            return Optional.of(Finding.of(Code.NOT_DETERMINED_OPEN, LEVEL_PERCENT, side));
        }
        double ratio = interval.high().getAsDouble() / interval.low().getAsDouble();
        if (ratio > WIDEST && correlation.orElse(0) < STRONGEST) {
            return Optional.of(Finding.of(Code.NOT_DETERMINED_WIDE, LEVEL_PERCENT, ratio, correlation.getAsDouble()));
        }
        return Optional.empty();
    }

    boolean isDetermined() {
        return refusal.isEmpty();
    }

    /** The check that goes with it. */
    Check plateau(Estimate estimate) {
        double reached = lastFraction(estimate);
        Verdict verdict = !isDetermined() ? Verdict.FAIL : reached < SHORT_OF_PLATEAU ? Verdict.CAUTION : Verdict.PASS;
        Finding finding = switch (verdict) {
            case FAIL -> Finding.of(Code.PLATEAU_NOT_REACHED);
            case CAUTION -> Finding.of(Code.PLATEAU_SHORT, reached);
            default -> Finding.of(Code.PLATEAU_PASS, reached);
        };
        List<Check.Figure> figures = new ArrayList<>();
        if (isDetermined()) {
            figures.add(new Check.Figure("lastFraction", reached));
        }
        correlation.ifPresent(c -> figures.add(new Check.Figure("correlation", c)));
        return new Check(
                CheckName.PLATEAU,
                verdict,
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                figures,
                finding);
    }

    private static double lastFraction(Estimate estimate) {
        return estimate.fractions(new double[] {estimate.task().data().lastTime()})[0];
    }
}
