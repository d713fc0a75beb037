package soakline.quantity;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.OptionalDouble;

/** Values and intervals as people read them: {@code 1.02×10⁻¹²}, {@code (0.98 … 1.07)×10⁻¹²}. */
public final class Scientific {

    private static final String SUPERSCRIPTS = "⁰¹²³⁴⁵⁶⁷⁸⁹";
    private static final double PLAIN_FROM = 1e-3;
    private static final double PLAIN_TO = 1e5;
    private static final int MOST_DECIMALS = 9;

    private Scientific() {}

    /** The value rounded to two digits of its uncertainty, with the power of ten of the larger of the two. */
    public static String value(double value, double uncertainty) {
        if (!(uncertainty > 0) || !Double.isFinite(uncertainty)) {
            return withPower(Numbers.significant(value, 4));
        }
        // a value lost in its uncertainty has no power of ten of its own
        int exponent = exponent(Math.max(Math.abs(value), uncertainty));
        double scale = Math.pow(10, -exponent);
        return rounded(value * scale, decimals(uncertainty * scale)) + power(exponent);
    }

    /** The value with all its digits, for what somebody typed in. */
    public static String exact(double value) {
        int exponent = exponent(value);
        return Numbers.shortest(value * Math.pow(10, -exponent)).replace('-', '−') + power(exponent);
    }

    /** The interval with the power of ten of the value it belongs to, or of its own reach; an open side is said in words. */
    public static String interval(double value, OptionalDouble low, OptionalDouble high) {
        if (low.isEmpty() && high.isEmpty()) {
            return "open on both sides";
        }
        if (low.isEmpty()) {
            return "below " + withPower(Numbers.significant(high.getAsDouble(), 3));
        }
        if (high.isEmpty()) {
            return "above " + withPower(Numbers.significant(low.getAsDouble(), 3));
        }
        double a = low.getAsDouble();
        double b = high.getAsDouble();
        int exponent = exponent(Math.max(Math.abs(value), (b - a) / 2));
        double scale = Math.pow(10, -exponent);
        int decimals = decimals((b - a) / 2 * scale);
        String limits = rounded(a * scale, decimals) + " … " + rounded(b * scale, decimals);
        return exponent == 0 ? limits : "(" + limits + ")" + power(exponent);
    }

    /** Scientific notation of computers turned into that of people. */
    static String withPower(String number) {
        int e = number.indexOf('e');
        return e < 0 ? number : number.substring(0, e) + power(Integer.parseInt(number.substring(e + 1)));
    }

    private static int exponent(double value) {
        double size = Math.abs(value);
        return size == 0 || (size >= PLAIN_FROM && size < PLAIN_TO) ? 0 : (int) Math.floor(Math.log10(size));
    }

    private static int decimals(double uncertainty) {
        if (!(uncertainty > 0)) {
            return 4;
        }
        return Math.max(0, Math.min(MOST_DECIMALS, 1 - (int) Math.floor(Math.log10(uncertainty))));
    }

    private static String rounded(double value, int decimals) {
        BigDecimal number = new BigDecimal(value).setScale(decimals, RoundingMode.HALF_EVEN);
        return number.signum() == 0
                ? number.abs().toPlainString()
                : number.toPlainString().replace('-', '−');
    }

    private static String power(int exponent) {
        if (exponent == 0) {
            return "";
        }
        StringBuilder text = new StringBuilder("×10");
        if (exponent < 0) {
            text.append('⁻');
        }
        for (char digit : Integer.toString(Math.abs(exponent)).toCharArray()) {
            text.append(SUPERSCRIPTS.charAt(digit - '0'));
        }
        return text.toString();
    }
}
