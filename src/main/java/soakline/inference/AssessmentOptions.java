package soakline.inference;

import java.util.Map;

/**
 * What the user may choose about an estimate.
 *
 * @param fixed parameter name to SI value, for parameters held fixed
 * @param level of the intervals, in (0.5, 1)
 */
public record AssessmentOptions(Map<String, Double> fixed, double level, IntervalMethod method) {

    public static final double USUAL_LEVEL = 0.95;

    public AssessmentOptions {
        fixed = Map.copyOf(fixed);
        if (!(level > 0.5 && level < 1)) {
            throw new IllegalArgumentException("the level must lie between 0.5 and 1: " + level);
        }
    }

    /** D, M∞ and M0 free, 95 % profile intervals. */
    public static AssessmentOptions usual() {
        return new AssessmentOptions(Map.of(), USUAL_LEVEL, IntervalMethod.PROFILE);
    }

    public AssessmentOptions withFixed(Map<String, Double> values) {
        return new AssessmentOptions(values, level, method);
    }

    public AssessmentOptions withLevel(double value) {
        return new AssessmentOptions(fixed, value, method);
    }

    public AssessmentOptions withMethod(IntervalMethod value) {
        return new AssessmentOptions(fixed, level, value);
    }
}
