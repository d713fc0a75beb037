package soakline.intake;

import java.util.Locale;
import java.util.Optional;

/**
 * One fact as it stands in a file.
 *
 * @param name as written; {@link #REMARK} for a line that names nothing
 * @param value as written
 * @param line from 1
 */
record FactLine(String name, String value, int line) {

    static final String REMARK = "remark";

    /**
     * Reads the text behind {@code #}. Separators at the ends are what a spreadsheet leaves of empty cells.
     *
     * @return empty for a line without a letter or digit
     */
    static Optional<FactLine> of(String text, int line) {
        String trimmed = trim(text);
        if (trimmed.chars().noneMatch(Character::isLetterOrDigit)) {
            return Optional.empty();
        }
        int colon = trimmed.indexOf(':');
        if (colon <= 0) {
            return Optional.of(new FactLine(REMARK, trimmed, line));
        }
        return Optional.of(new FactLine(trim(trimmed.substring(0, colon)), trim(trimmed.substring(colon + 1)), line));
    }

    /** The name without regard to case and spacing. */
    String key() {
        return name.toLowerCase(Locale.ROOT).replaceAll("[\\s_]+", " ").strip();
    }

    /** The same fact under another name. */
    FactLine named(String other) {
        return new FactLine(other, value, line);
    }

    private static String trim(String text) {
        int from = 0;
        int to = text.length();
        while (from < to && isSeparator(text.charAt(from))) {
            from++;
        }
        while (to > from && isSeparator(text.charAt(to - 1))) {
            to--;
        }
        return text.substring(from, to);
    }

    private static boolean isSeparator(char c) {
        return c == ',' || c == ';' || Character.isWhitespace(c) || Character.isSpaceChar(c);
    }
}
