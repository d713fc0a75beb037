package soakline.inference;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import soakline.problem.Code;
import soakline.problem.Finding;
import soakline.quantity.Dimension;
import soakline.quantity.Quantity;
import soakline.specimen.ContentSeries;
import soakline.specimen.Readability;
import soakline.specimen.Run;
import soakline.specimen.ValueKind;

/**
 * Whether the weighings follow Fick's law with one constant D.
 *
 * <p>Not Fickian when a check of the curve's shape fails; or when two signs meet that each could have come from elsewhere: the time
 * exponent and the likeness of neighbouring residuals both below {@value #BOTH}, while the scatter is more than
 * {@value #BEYOND_BALANCE} times what the balance can tell apart, so that a drift of the balance does not explain it. The second
 * rule is for short tests, in which no single check can reach the limit of a failure.
 */
final class FickianVerdict {

    private static final double BOTH = 0.01;
    private static final double BEYOND_BALANCE = 10;

    private static final List<CheckName> SHAPE = List.of(
            CheckName.SHORT_TIME_SLOPE,
            CheckName.HALF_TIME,
            CheckName.LATE_TIME_SLOPE,
            CheckName.MEAN_TIME,
            CheckName.TIME_EXPONENT);

    private FickianVerdict() {}

    static Verdict of(List<Check> checks, Run run, ContentSeries data, double residualSd, boolean determined) {
        boolean fail = false;
        boolean caution = false;
        boolean judged = false;
        for (Check check : checks) {
            boolean shape = SHAPE.contains(check.name());
            boolean sequence =
                    check.name() == CheckName.RESIDUAL_AUTOCORRELATION || check.name() == CheckName.RESIDUAL_RUNS;
            judged |= shape && check.verdict() != Verdict.UNKNOWN;
            fail |= shape && check.verdict() == Verdict.FAIL;
            caution |= (shape || sequence) && (check.verdict() == Verdict.CAUTION || check.verdict() == Verdict.FAIL);
        }
        boolean bothSigns = probability(checks, CheckName.TIME_EXPONENT).orElse(1) < BOTH
                && probability(checks, CheckName.RESIDUAL_AUTOCORRELATION).orElse(1) < BOTH;
        OptionalDouble readability = readability(run, data);
        boolean beyondBalance = readability.isPresent() && residualSd > BEYOND_BALANCE * readability.getAsDouble();
        if (fail || (bothSigns && beyondBalance)) {
            return Verdict.FAIL;
        }
        if (caution) {
            return Verdict.CAUTION;
        }
        return judged && determined ? Verdict.PASS : Verdict.UNKNOWN;
    }

    static Finding finding(Verdict verdict) {
        return Finding.of(
                switch (verdict) {
                    case PASS -> Code.FICKIAN_PASS;
                    case CAUTION -> Code.FICKIAN_CAUTION;
                    case FAIL -> Code.FICKIAN_FAIL;
                    case UNKNOWN -> Code.FICKIAN_UNKNOWN;
                });
    }

    /** What the balance can tell apart, as a fraction of content: as stated, or else the step between the values. */
    private static OptionalDouble readability(Run run, ContentSeries data) {
        double perContent = run.kind() == ValueKind.MASS ? data.referenceMass() : 1;
        Optional<Quantity> balance = run.facts().balance();
        Dimension wanted = run.kind() == ValueKind.MASS ? Dimension.MASS : Dimension.CONTENT;
        if (balance.isPresent() && balance.get().dimension() == wanted) {
            return OptionalDouble.of(balance.get().si() / perContent);
        }
        OptionalDouble step = Readability.of(run.weighings());
        return step.isPresent() ? OptionalDouble.of(step.getAsDouble() / perContent) : step;
    }

    private static OptionalDouble probability(List<Check> checks, CheckName name) {
        for (Check check : checks) {
            if (check.name() == name) {
                return check.pValue();
            }
        }
        return OptionalDouble.empty();
    }
}
