package soakline.intake;

/**
 * A date-time as read.
 *
 * @param second from 1970-01-01T00:00, of that zone's clock when not {@code zoned}
 * @param nano of the second
 * @param zoned whether it is an instant; else it is a reading of a plain clock
 */
record Moment(long second, int nano, boolean zoned) {

    /** Seconds from another moment to this one; the difference of whole seconds is exact. */
    double since(Moment other) {
        return (second - other.second) + (nano - other.nano) * 1e-9;
    }
}
