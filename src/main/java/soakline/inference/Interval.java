package soakline.inference;

import java.util.OptionalDouble;

/**
 * A confidence interval in SI. A side on which the data give no limit is empty: open, never a large number.
 *
 * @param level such as 0.95
 */
public record Interval(double level, IntervalMethod method, OptionalDouble low, OptionalDouble high) {

    public boolean isOpen() {
        return low.isEmpty() || high.isEmpty();
    }
}
