package soakline.specimen;

import java.util.Optional;
import java.util.regex.Pattern;
import soakline.quantity.Numbers;

/**
 * Free text in a run file. Most stands there as it is; what would break the form, or be changed by reading, stands in quotation
 * marks with the escapes of a JSON string (RFC 8259, section 7): {@code "first line\nsecond line"}.
 */
public final class QuotedText {

    /** A spreadsheet takes what follows for a cell of its own, and then for a formula. */
    private static final Pattern FORMULA_IN_A_LINE = Pattern.compile("[,;\t][\\s\"']*[=+\\-@]");

    private static final String FORMULA_SIGNS = "=+-@'";
    private static final String DELIMITERS = ",;\t";
    private static final String ESCAPES = "\"\\/nrtbf";
    private static final String ESCAPED = "\"\\/\n\r\t\b\f";

    private QuotedText() {}

    /** A text as the value of a fact. */
    public static String fact(String text) {
        return isPlain(text) ? text : quoted(text);
    }

    /** A text as the name of a fact. */
    public static String name(String text) {
        boolean plain = isPlain(text)
                && Character.isLetterOrDigit(text.codePointAt(0))
                && text.indexOf(':') < 0
                && text.indexOf('"') < 0;
        return plain ? text : quoted(text);
    }

    /** A text as what a cell holds; the cell itself may need quotation marks around that. */
    public static String cell(String text) {
        boolean plain = isPlain(text)
                && FORMULA_SIGNS.indexOf(text.charAt(0)) < 0
                && text.charAt(0) != '#'
                && Numbers.parse(text).isEmpty();
        return plain ? text : quoted(text);
    }

    /** A text in quotation marks. */
    public static String quoted(String text) {
        StringBuilder s = new StringBuilder(text.length() + 2).append('"');
        boolean formula = FORMULA_IN_A_LINE.matcher(text).find();
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            if (c == '"' || c == '\\') {
                s.append('\\').append(c);
            } else if (c == '\n') {
                s.append("\\n");
            } else if (c == '\r') {
                s.append("\\r");
            } else if (c == '\t') {
                s.append("\\t");
            } else if (isUnsafe(text, i) || (formula && DELIMITERS.indexOf(c) >= 0)) {
                s.append("\\u").append(hex(c));
            } else {
                s.append(c);
            }
        }
        return s.append('"').toString();
    }

    /** The text that was written: without the quotation marks and escapes, if it has them around the whole of it. */
    public static String read(String written) {
        int last = written.length() - 1;
        if (last < 1 || written.charAt(0) != '"' || end(written) != last) {
            return written;
        }
        return unescaped(written.substring(1, last)).orElse(written);
    }

    /** Where the quotation mark is that closes the one at the start; -1 when there is none of either. */
    public static int end(String text) {
        if (!text.startsWith("\"")) {
            return -1;
        }
        int at = 1;
        while (at < text.length() && text.charAt(at) != '"') {
            at += text.charAt(at) == '\\' ? 2 : 1;
        }
        return at < text.length() ? at : -1;
    }

    /** Empty when it is not of this form after all, such as a path on a disk. */
    private static Optional<String> unescaped(String inner) {
        StringBuilder s = new StringBuilder(inner.length());
        int at = 0;
        while (at < inner.length()) {
            char c = inner.charAt(at++);
            if (c != '\\') {
                s.append(c);
                continue;
            }
            char escape = at < inner.length() ? inner.charAt(at++) : 0;
            if (escape == 'u') {
                int code = at + 4 <= inner.length() ? code(inner.substring(at, at + 4)) : -1;
                if (code < 0) {
                    return Optional.empty();
                }
                s.append((char) code);
                at += 4;
            } else {
                int known = ESCAPES.indexOf(escape);
                if (known < 0) {
                    return Optional.empty();
                }
                s.append(ESCAPED.charAt(known));
            }
        }
        return Optional.of(s.toString());
    }

    private static int code(String hex) {
        int code = 0;
        for (int i = 0; i < hex.length(); i++) {
            int digit = Character.digit(hex.charAt(i), 16);
            if (digit < 0 || hex.charAt(i) > 'f') {
                return -1;
            }
            code = code * 16 + digit;
        }
        return code;
    }

    private static boolean isPlain(String text) {
        if (text.isEmpty() || text.charAt(0) == '"' || isLoose(text.charAt(0))) {
            return false;
        }
        if (isLoose(text.charAt(text.length() - 1))
                || FORMULA_IN_A_LINE.matcher(text).find()) {
            return false;
        }
        for (int i = 0; i < text.length(); i++) {
            if (isUnsafe(text, i)) {
                return false;
            }
        }
        return true;
    }

    /** What a reader takes away at the ends. */
    private static boolean isLoose(char c) {
        return c == ',' || c == ';' || Character.isWhitespace(c) || Character.isSpaceChar(c);
    }

    /** What does not come through a text file: control characters, half a pair, and the mark that stands for the byte order. */
    private static boolean isUnsafe(String text, int i) {
        char c = text.charAt(i);
        if (Character.isISOControl(c) || c == '\ufeff' || c == '\u2028' || c == '\u2029') {
            return true;
        }
        if (Character.isHighSurrogate(c)) {
            return i + 1 == text.length() || !Character.isLowSurrogate(text.charAt(i + 1));
        }
        return Character.isLowSurrogate(c) && (i == 0 || !Character.isHighSurrogate(text.charAt(i - 1)));
    }

    private static String hex(char c) {
        String digits = Integer.toHexString(c);
        return "0".repeat(4 - digits.length()) + digits;
    }
}
