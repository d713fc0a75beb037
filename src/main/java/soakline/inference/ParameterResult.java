package soakline.inference;

import java.util.Optional;
import java.util.OptionalDouble;
import soakline.estimate.Parameter;

/**
 * A parameter as it is handed to the user, in SI.
 *
 * @param value empty when the data do not determine it
 * @param standardError in the parameter's own unit; empty when fixed or not determined
 * @param interval empty when fixed or not determined
 */
public record ParameterResult(
        Parameter parameter,
        OptionalDouble value,
        OptionalDouble standardError,
        boolean fixed,
        Optional<Interval> interval) {}
