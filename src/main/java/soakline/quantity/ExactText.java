package soakline.quantity;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;

/**
 * SI values as decimals in a unit, in as few digits as it takes for {@link Numbers} and {@link Unit} to read back the very same
 * double.
 *
 * <p>Not every double can be had in every unit: a product with 3600 skips some. In the SI unit itself every one can, with at most
 * 17 digits (IEEE 754-2019, 5.12.2).
 */
public final class ExactText {

    private static final int[] DIGITS = {15, 16, 17};
    private static final int MOST_DECIMALS = 12;
    private static final double LARGEST_PLAIN = 1e15;
    private static final double SMALLEST_PLAIN = 1e-7;

    private static final double[] POWERS = new double[MOST_DECIMALS + 1];

    static {
        double power = 1;
        for (int k = 0; k <= MOST_DECIMALS; k++) {
            POWERS[k] = power;
            power *= 10;
        }
    }

    private ExactText() {}

    /** A number without a unit. */
    public static String of(double value) {
        return of(value, x -> x, x -> x).orElseThrow();
    }

    /** A value in a unit; empty when no decimal in that unit reads back to it. */
    public static Optional<String> of(double si, Unit unit) {
        return of(si, unit::fromSi, unit::toSi);
    }

    /** A difference or an uncertainty in a unit, which has no offset; empty as above. */
    public static Optional<String> ofDifference(double si, Unit unit) {
        return of(si, unit::differenceFromSi, unit::differenceToSi);
    }

    /** Whether a decimal in that unit reads back to this value; much faster than to write it. */
    public static boolean exists(double si, Unit unit) {
        return unit.toSi(unit.fromSi(si)) == si;
    }

    private static Optional<String> of(double si, DoubleUnaryOperator fromSi, DoubleUnaryOperator toSi) {
        if (si == 0) {
            boolean negative = Double.doubleToRawLongBits(si) != 0;
            return toSi.applyAsDouble(0) == 0 ? Optional.of(negative ? "-0" : "0") : general(si, fromSi, toSi);
        }
        double near = fromSi.applyAsDouble(si);
        for (int k = 0; k <= MOST_DECIMALS && Math.abs(near) >= SMALLEST_PLAIN; k++) {
            double scaled = Math.rint(near * POWERS[k]);
            if (Math.abs(scaled) >= LARGEST_PLAIN) {
                break;
            }
            // as the reader divides: up to 15 digits give the double nearest to the decimal
            if (scaled != 0 && toSi.applyAsDouble(scaled / POWERS[k]) == si) {
                return Optional.of(plain((long) scaled, k));
            }
        }
        return general(si, fromSi, toSi);
    }

    private static String plain(long scaled, int decimals) {
        String digits = Long.toString(Math.abs(scaled));
        StringBuilder text = new StringBuilder(digits.length() + 4);
        text.append(scaled < 0 ? "-" : "");
        if (decimals == 0) {
            return text.append(digits).toString();
        }
        int whole = digits.length() - decimals;
        if (whole > 0) {
            return text.append(digits, 0, whole)
                    .append('.')
                    .append(digits, whole, digits.length())
                    .toString();
        }
        return text.append("0.").append("0".repeat(-whole)).append(digits).toString();
    }

    /**
     * Of the doubles whose product is the value, if there are any, the quotient is one: where products lie further apart than
     * doubles, half a step of the value is less than half a step of the quotient; where they lie closer, the quotient's product is
     * off by less than half a step of the value.
     */
    private static Optional<String> general(double si, DoubleUnaryOperator fromSi, DoubleUnaryOperator toSi) {
        double value = fromSi.applyAsDouble(si);
        if (!Double.isFinite(value)) {
            return Optional.empty();
        }
        BigDecimal exact = new BigDecimal(value);
        for (int digits : DIGITS) {
            String text = text(exact.round(new MathContext(digits)));
            OptionalDouble read = Numbers.parse(text, '.');
            if (read.isPresent() && toSi.applyAsDouble(read.getAsDouble()) == si) {
                return Optional.of(text);
            }
        }
        return Optional.empty();
    }

    private static String text(BigDecimal value) {
        BigDecimal stripped = value.stripTrailingZeros();
        double size = Math.abs(stripped.doubleValue());
        boolean isPlain = size == 0 || (size >= SMALLEST_PLAIN && size < LARGEST_PLAIN);
        return isPlain ? stripped.toPlainString() : stripped.toString();
    }
}
