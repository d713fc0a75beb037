package soakline.inference;

import java.util.OptionalDouble;
import soakline.estimate.Estimate;
import soakline.estimate.Parameter;

/** Confidence intervals of single parameters. */
public final class Intervals {

    private Intervals() {}

    /** The interval of a free parameter by the chosen method, in SI. */
    public static Interval of(Estimate estimate, int parameter, double level, IntervalMethod method) {
        return method == IntervalMethod.PROFILE
                ? profile(estimate, parameter, level)
                : linearised(estimate, parameter, level);
    }

    /** Profile likelihood; a side without a limit is open. */
    public static Interval profile(Estimate estimate, int parameter, double level) {
        ProfileLikelihood.Limits limits = new ProfileLikelihood(estimate, parameter).limits(level);
        return interval(estimate, parameter, level, IntervalMethod.PROFILE, limits.low(), limits.high());
    }

    /** Working value ± t · standard error. */
    public static Interval linearised(Estimate estimate, int parameter, double level) {
        double reach =
                Quantiles.twoSidedT(level, estimate.degreesOfFreedom()) * estimate.workingStandardError(parameter);
        double x = estimate.working(parameter);
        return interval(
                estimate,
                parameter,
                level,
                IntervalMethod.LINEARISED,
                OptionalDouble.of(x - reach),
                OptionalDouble.of(x + reach));
    }

    private static Interval interval(
            Estimate estimate,
            int parameter,
            double level,
            IntervalMethod method,
            OptionalDouble low,
            OptionalDouble high) {
        Parameter p = estimate.parameters().get(parameter);
        return new Interval(level, method, inSi(p, low), inSi(p, high));
    }

    private static OptionalDouble inSi(Parameter parameter, OptionalDouble working) {
        return working.isPresent()
                ? OptionalDouble.of(parameter.fromWorking(working.getAsDouble()))
                : OptionalDouble.empty();
    }
}
