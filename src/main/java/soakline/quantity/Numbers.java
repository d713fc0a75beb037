package soakline.quantity;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Locale;
import java.util.OptionalDouble;
import java.util.regex.Pattern;

/** Numbers to text and back, the same for every output and in every locale. */
public final class Numbers {

    private static final int MOST_EXACT_DIGITS = 15;
    private static final double[] POWERS_OF_TEN = {
        1e0, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9, 1e10, 1e11, 1e12, 1e13, 1e14, 1e15, 1e16, 1e17, 1e18, 1e19,
        1e20, 1e21, 1e22
    };

    private static final Pattern DECIMAL = Pattern.compile("[+-]?(\\d++\\.?\\d*+|\\.\\d++)([eE][+-]?\\d++)?");
    private static final Pattern NOT_FINITE =
            Pattern.compile("[+-]?(nan|inf|infinity|\u221e)", Pattern.CASE_INSENSITIVE);

    private Numbers() {}

    /**
     * A number with a decimal point or a decimal comma and no thousands separators.
     *
     * @return empty when the text is no number; infinities and NaN come back as such, for the caller to refuse
     */
    public static OptionalDouble parse(String text) {
        return parse(text, text.indexOf(',') >= 0 ? ',' : '.');
    }

    /**
     * A number whose decimal sign is known, so that the other sign makes it no number.
     *
     * @return the double nearest to the decimal, as {@link Double#parseDouble} gives it; empty and not finite as above
     */
    public static OptionalDouble parse(String text, char decimalSign) {
        int from = 0;
        int to = text.length();
        while (from < to && isSpace(text.charAt(from))) {
            from++;
        }
        while (to > from && isSpace(text.charAt(to - 1))) {
            to--;
        }
        double plain = plain(text, from, to, decimalSign);
        return Double.isNaN(plain) ? general(text.substring(from, to), decimalSign) : OptionalDouble.of(plain);
    }

    /** Blank for a reader of numbers: also the no-break and thin spaces that spreadsheets and word processors put in. */
    static boolean isSpace(char c) {
        return c <= ' ' || (c >= '\u00a0' && Character.isSpaceChar(c));
    }

    /**
     * The common case without an allocation: sign, digits, decimal sign, digits. Up to 15 digits and 10^22 are exact doubles, so
     * that their quotient is rounded once and is the nearest double.
     *
     * @return NaN when the text is not of that form
     */
    private static double plain(String text, int from, int to, char decimalSign) {
        int at = from;
        boolean negative = at < to && text.charAt(at) == '-';
        if (at < to && (negative || text.charAt(at) == '+')) {
            at++;
        }
        long digits = 0;
        int significant = 0;
        int seen = 0;
        int decimals = -1;
        for (; at < to; at++) {
            char c = text.charAt(at);
            if (c >= '0' && c <= '9') {
                digits = digits * 10 + (c - '0');
                seen++;
                significant += digits > 0 ? 1 : 0;
                decimals += decimals >= 0 ? 1 : 0;
                if (significant > MOST_EXACT_DIGITS) {
                    return Double.NaN;
                }
            } else if (c == decimalSign && decimals < 0) {
                decimals = 0;
            } else {
                return Double.NaN;
            }
        }
        if (seen == 0 || decimals >= POWERS_OF_TEN.length) {
            return Double.NaN;
        }
        double size = decimals > 0 ? digits / POWERS_OF_TEN[decimals] : digits;
        return negative ? -size : size;
    }

    private static OptionalDouble general(String text, char decimalSign) {
        String s = text.replace('\u2212', '-');
        if (NOT_FINITE.matcher(s).matches()) {
            return OptionalDouble.of(s.startsWith("-") ? Double.NEGATIVE_INFINITY : notFinite(s));
        }
        // the other sign must not pass for a decimal sign, and 1f, 1d and 0x1p3 are numbers to Java only
        String pointed = decimalSign == ',' ? s.replace('.', ' ').replace(',', '.') : s;
        return DECIMAL.matcher(pointed).matches()
                ? OptionalDouble.of(Double.parseDouble(pointed))
                : OptionalDouble.empty();
    }

    private static double notFinite(String text) {
        return text.toLowerCase(Locale.ROOT).contains("nan") ? Double.NaN : Double.POSITIVE_INFINITY;
    }

    /** The value to a number of significant digits: plain between 1e-4 and 1e6, scientific outside. */
    public static String significant(double value, int digits) {
        if (!Double.isFinite(value)) {
            return Double.toString(value);
        }
        if (value == 0) {
            return "0";
        }
        BigDecimal rounded = new BigDecimal(value).round(new MathContext(digits));
        double size = Math.abs(rounded.doubleValue());
        if (size >= 1e-4 && size < 1e6) {
            return rounded.toPlainString();
        }
        return scientific(rounded, digits);
    }

    /** As {@code %e} would write it; the formatter itself takes 20 ms to wake up. */
    private static String scientific(BigDecimal rounded, int digits) {
        StringBuilder text = new StringBuilder(rounded.unscaledValue().abs().toString());
        int exponent = text.length() - 1 - rounded.scale();
        text.append("0".repeat(Math.max(0, digits - text.length())));
        if (digits > 1) {
            text.insert(1, '.');
        }
        return (rounded.signum() < 0 ? "-" : "")
                + text
                + (exponent < 0 ? "e-" : "e+")
                + (Math.abs(exponent) < 10 ? "0" : "")
                + Math.abs(exponent);
    }

    /** The value rounded to the decimal place of the second significant digit of its uncertainty. */
    public static String toUncertainty(double value, double uncertainty) {
        if (!(uncertainty > 0) || !Double.isFinite(uncertainty) || value == 0 || !Double.isFinite(value)) {
            return significant(value, 6);
        }
        int magnitude = (int) Math.floor(Math.log10(Math.abs(value)));
        int uncertaintyMagnitude = (int) Math.floor(Math.log10(uncertainty));
        return significant(value, Math.max(2, Math.min(15, magnitude - uncertaintyMagnitude + 2)));
    }

    /** Without digits that come from binary rounding only: 2.03, not 2.0300000000000002. */
    public static String shortest(double value) {
        if (!Double.isFinite(value)) {
            return Double.toString(value);
        }
        BigDecimal rounded = new BigDecimal(value).round(new MathContext(12)).stripTrailingZeros();
        double size = Math.abs(rounded.doubleValue());
        return size == 0 || (size >= 1e-4 && size < 1e9) ? rounded.toPlainString() : rounded.toString();
    }
}
