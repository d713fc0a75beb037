package soakline.intake;

import java.time.DateTimeException;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.LocalTime;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.time.ZonedDateTime;
import java.time.temporal.ChronoField;
import java.util.Optional;

/**
 * Reads ISO 8601 date-times: {@code 2026-03-01}, {@code 2026-03-01 08:30}, {@code 2026-03-01T08:30:00.5+01:00},
 * {@code …[Europe/Vienna]}. By hand, as a log of a million rows is read in a tenth of a formatter's time.
 */
final class IsoMoments implements MomentFormat {

    private static final int DATE_LENGTH = 10;
    private static final int NANO_DIGITS = 9;

    @Override
    public Optional<Moment> read(String text) {
        String s = text.strip();
        if (s.length() < DATE_LENGTH || s.charAt(4) != '-' || s.charAt(7) != '-') {
            return Optional.empty();
        }
        try {
            return Optional.of(new Cursor(s).moment());
        } catch (DateTimeException e) {
            return Optional.empty();
        }
    }

    /** Walks through one text; what does not fit is a {@link DateTimeException}. */
    private static final class Cursor {

        private final String text;
        private int at;

        Cursor(String text) {
            this.text = text;
        }

        Moment moment() {
            int year = number(4);
            expect('-');
            int month = number(2);
            expect('-');
            long day = LocalDate.of(year, month, number(2)).toEpochDay();
            int hour = 0;
            int minute = 0;
            int second = 0;
            int nano = 0;
            if (take('T') || take('t') || takeSpaces()) {
                hour = ChronoField.HOUR_OF_DAY.checkValidIntValue(number(2));
                expect(':');
                minute = ChronoField.MINUTE_OF_HOUR.checkValidIntValue(number(2));
                if (take(':')) {
                    second = ChronoField.SECOND_OF_MINUTE.checkValidIntValue(number(2));
                    nano = take('.') || take(',') ? fraction() : 0;
                }
            }
            long local = day * 86_400 + hour * 3600L + minute * 60L + second;
            return at == text.length() ? Moment.plain(local, nano) : zoned(local, nano);
        }

        private Moment zoned(long local, int nano) {
            int bracket = text.indexOf('[', at);
            String offset =
                    text.substring(at, bracket < 0 ? text.length() : bracket).strip();
            if (bracket >= 0 && !text.endsWith("]")) {
                throw new DateTimeException("no closing bracket");
            }
            if (!offset.isEmpty()) {
                int seconds = ZoneOffset.of(offset.equals("z") ? "Z" : offset).getTotalSeconds();
                return new Moment(local - seconds, nano, true, seconds);
            }
            ZoneId zone = ZoneId.of(text.substring(bracket + 1, text.length() - 1));
            LocalDateTime clock = LocalDateTime.of(
                    LocalDate.ofEpochDay(Math.floorDiv(local, 86_400)),
                    LocalTime.ofSecondOfDay(Math.floorMod(local, 86_400)));
            ZonedDateTime there = clock.atZone(zone);
            return new Moment(
                    there.toEpochSecond(), nano, true, there.getOffset().getTotalSeconds());
        }

        private int number(int digits) {
            int value = 0;
            for (int i = 0; i < digits; i++) {
                value = value * 10 + digit();
            }
            return value;
        }

        private int fraction() {
            int value = digit();
            int count = 1;
            while (at < text.length() && text.charAt(at) >= '0' && text.charAt(at) <= '9') {
                int digit = digit();
                value = count < NANO_DIGITS ? value * 10 + digit : value;
                count++;
            }
            for (int i = count; i < NANO_DIGITS; i++) {
                value *= 10;
            }
            return value;
        }

        private int digit() {
            int digit = at < text.length() ? text.charAt(at++) - '0' : -1;
            if (digit < 0 || digit > 9) {
                throw new DateTimeException("not a digit");
            }
            return digit;
        }

        private void expect(char c) {
            if (!take(c)) {
                throw new DateTimeException("unexpected character");
            }
        }

        private boolean take(char c) {
            boolean fits = at < text.length() && text.charAt(at) == c;
            at += fits ? 1 : 0;
            return fits;
        }

        private boolean takeSpaces() {
            int before = at;
            while (take(' ')) {
                // as many as there are
            }
            return at > before;
        }
    }
}
