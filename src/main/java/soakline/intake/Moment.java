package soakline.intake;

import java.time.LocalDateTime;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.util.Locale;

/**
 * A date-time as read.
 *
 * @param second from 1970-01-01T00:00, of that zone's clock when not {@code zoned}
 * @param nano of the second
 * @param zoned whether it is an instant; else it is a reading of a plain clock
 * @param offset of the clock it was read from, in seconds east of Greenwich; 0 when not {@code zoned}
 */
record Moment(long second, int nano, boolean zoned, int offset) {

    private static final long MICROS = 1_000_000;
    private static final DateTimeFormatter TO_MINUTES = DateTimeFormatter.ofPattern("uuuu-MM-dd HH:mm", Locale.ROOT);
    private static final DateTimeFormatter TO_SECONDS = DateTimeFormatter.ofPattern("uuuu-MM-dd HH:mm:ss", Locale.ROOT);

    /** A reading of a plain clock. */
    static Moment plain(long second, int nano) {
        return new Moment(second, nano, false, 0);
    }

    /** Seconds from another moment to this one; the difference of whole seconds is exact. */
    double since(Moment other) {
        return (second - other.second) + (nano - other.nano) * 1e-9;
    }

    /** The moment so many seconds later, to the microsecond: over years a double holds no more. */
    Moment plus(double seconds) {
        if (seconds == 0) {
            return this;
        }
        double whole = Math.floor(seconds);
        long micros = Math.round((seconds - whole) * MICROS) + Math.round(nano / 1e3);
        long carried = Math.floorDiv(micros, MICROS);
        return new Moment(second + (long) whole + carried, (int) Math.floorMod(micros, MICROS) * 1000, zoned, offset);
    }

    /** As {@link IsoMoments} reads it: {@code 2026-03-01 08:30}, with seconds, fraction and zone where there are any. */
    String text() {
        LocalDateTime clock = LocalDateTime.ofEpochSecond(second + offset, nano, ZoneOffset.UTC);
        StringBuilder text =
                new StringBuilder((clock.getSecond() == 0 && nano == 0 ? TO_MINUTES : TO_SECONDS).format(clock));
        if (nano != 0) {
            String fraction = String.valueOf(1_000_000_000L + nano).substring(1);
            text.append('.').append(fraction.replaceAll("0+$", ""));
        }
        return zoned ? text.append(ZoneOffset.ofTotalSeconds(offset).getId()).toString() : text.toString();
    }
}
