package soakline.quantity;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.OptionalDouble;

/** Numbers to text and back, the same for every output and in every locale. */
public final class Numbers {

    private Numbers() {}

    /**
     * A number with a decimal point or a decimal comma and no thousands separators.
     *
     * @return empty when the text is no number; infinities and NaN come back as such, for the caller to refuse
     */
    public static OptionalDouble parse(String text) {
        String s = text.strip();
        if (s.isEmpty()) {
            return OptionalDouble.empty();
        }
        int comma = s.indexOf(',');
        if (comma >= 0) {
            if (s.indexOf('.') >= 0 || s.indexOf(',', comma + 1) >= 0) {
                return OptionalDouble.empty();
            }
            s = s.replace(',', '.');
        }
        char last = s.charAt(s.length() - 1);
        // Double.parseDouble would take 1f, 1d and 0x1p3 for numbers
        if (last == 'f' || last == 'F' || last == 'd' || last == 'D' || s.indexOf('x') >= 0 || s.indexOf('X') >= 0) {
            return OptionalDouble.empty();
        }
        try {
            return OptionalDouble.of(Double.parseDouble(s));
        } catch (NumberFormatException e) {
            return OptionalDouble.empty();
        }
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
        BigDecimal rounded = new BigDecimal(value).round(new MathContext(12)).stripTrailingZeros();
        double size = Math.abs(rounded.doubleValue());
        return size == 0 || (size >= 1e-4 && size < 1e9) ? rounded.toPlainString() : rounded.toString();
    }
}
