package soakline.intake;

import java.util.Optional;
import soakline.specimen.QuotedText;
import soakline.specimen.RunFileWords;

/**
 * One fact as it stands in a file.
 *
 * @param name as written; {@link RunFileWords#REMARK} for a line that names nothing
 * @param value as written
 * @param line from 1
 */
record FactLine(String name, String value, int line) {

    /**
     * Reads the text behind {@code #}. Separators at the ends are what a spreadsheet leaves of empty cells.
     *
     * @return empty for a line without a letter or digit
     */
    static Optional<FactLine> of(String text, int line) {
        String trimmed = trim(text);
        if (!trimmed.startsWith("\"") && trimmed.chars().noneMatch(Character::isLetterOrDigit)) {
            return Optional.empty();
        }
        int colon = colon(trimmed);
        if (colon <= 0) {
            return Optional.of(new FactLine(RunFileWords.REMARK, trimmed, line));
        }
        return Optional.of(new FactLine(trim(trimmed.substring(0, colon)), trim(trimmed.substring(colon + 1)), line));
    }

    /** The first colon that does not stand in a name in quotation marks. */
    private static int colon(String text) {
        int quote = text.indexOf('"');
        int colon = text.indexOf(':');
        boolean inName = quote == 0 || (quote > 0 && quote < colon && isGap(text.charAt(quote - 1)));
        int end = inName ? QuotedText.end(text.substring(quote)) : -1;
        int behind = quote + end + 1;
        while (end >= 0 && behind < text.length() && isGap(text.charAt(behind))) {
            behind++;
        }
        return end >= 0 && behind < text.length() && text.charAt(behind) == ':' ? behind : colon;
    }

    /** The name without regard to case and spacing. */
    String key() {
        return RunFileWords.key(name);
    }

    /** What the value says, without the quotation marks it may stand in. */
    String text() {
        return QuotedText.read(value);
    }

    /** The same fact under another name. */
    FactLine named(String other) {
        return new FactLine(other, value, line);
    }

    /** The same fact without the coupon's name in front. */
    FactLine without(String coupon) {
        String key = RunFileWords.key(coupon);
        for (int at = 1; at < name.length(); at++) {
            if (isGap(name.charAt(at))
                    && RunFileWords.key(name.substring(0, at)).equals(key)) {
                int from = at;
                while (from < name.length() && isGap(name.charAt(from))) {
                    from++;
                }
                return named(name.substring(from));
            }
        }
        return this;
    }

    private static boolean isGap(char c) {
        return c == '_' || c == ' ' || (c >= '\t' && c <= '\r');
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
