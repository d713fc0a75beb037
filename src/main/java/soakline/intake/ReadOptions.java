package soakline.intake;

import java.util.Optional;

/**
 * What a user says about a file that the file does not say itself.
 *
 * @param columns a header in place of the file's own, by position, such as {@code time [h],mass [g]}
 * @param datePattern how date-times are written, such as {@code dd.MM.yyyy HH:mm}
 */
public record ReadOptions(Optional<String> columns, Optional<String> datePattern) {

    private static final ReadOptions NONE = new ReadOptions(Optional.empty(), Optional.empty());

    /** Everything as the file says. */
    public static ReadOptions of() {
        return NONE;
    }

    public ReadOptions withColumns(String value) {
        return new ReadOptions(Optional.of(value), datePattern);
    }

    public ReadOptions withDatePattern(String value) {
        return new ReadOptions(columns, Optional.of(value));
    }
}
