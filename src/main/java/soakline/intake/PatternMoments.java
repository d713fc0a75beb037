package soakline.intake;

import java.time.DateTimeException;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.LocalTime;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.time.ZonedDateTime;
import java.time.format.DateTimeFormatter;
import java.time.format.DateTimeFormatterBuilder;
import java.time.temporal.TemporalAccessor;
import java.time.temporal.TemporalQueries;
import java.util.Locale;
import java.util.Optional;
import soakline.problem.Code;
import soakline.problem.Fault;

/** Reads date-times in a pattern that the user states, with the letters of {@link DateTimeFormatter} and English names. */
final class PatternMoments implements MomentFormat {

    /** Day, month, hour and minute are all different, so that a pattern that mixes two of them up shows. */
    private static final ZonedDateTime SAMPLE = ZonedDateTime.of(2026, 3, 17, 8, 45, 0, 0, ZoneOffset.UTC);

    private final DateTimeFormatter formatter;

    /**
     * @throws Fault when it is no pattern, or dates written by it cannot be read back
     */
    PatternMoments(String pattern) {
        try {
            formatter = new DateTimeFormatterBuilder()
                    .parseCaseInsensitive()
                    .appendPattern(pattern.strip())
                    .toFormatter(Locale.ENGLISH);
            LocalDate date = formatter.parse(formatter.format(SAMPLE)).query(TemporalQueries.localDate());
            if (SAMPLE.toLocalDate().equals(date)) {
                return;
            }
        } catch (IllegalArgumentException | DateTimeException e) {
            throw bad(pattern);
        }
        throw bad(pattern);
    }

    private static Fault bad(String pattern) {
        return Fault.of(Code.DATE_PATTERN_BAD, pattern);
    }

    @Override
    public Optional<Moment> read(String text) {
        try {
            TemporalAccessor parsed = formatter.parse(text.strip());
            LocalDate date = parsed.query(TemporalQueries.localDate());
            LocalTime time = parsed.query(TemporalQueries.localTime());
            ZoneId zone = parsed.query(TemporalQueries.zone());
            LocalDateTime clock = LocalDateTime.of(date, time == null ? LocalTime.MIDNIGHT : time);
            ZonedDateTime there = clock.atZone(zone == null ? ZoneOffset.UTC : zone);
            int offset = there.getOffset().getTotalSeconds();
            return Optional.of(new Moment(there.toEpochSecond(), there.getNano(), zone != null, offset));
        } catch (DateTimeException e) {
            return Optional.empty();
        }
    }
}
