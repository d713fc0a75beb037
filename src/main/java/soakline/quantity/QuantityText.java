package soakline.quantity;

import java.util.OptionalDouble;
import soakline.quantity.QuantityFormatException.Reason;

/** Text to {@link Quantity}: {@code 2.03 mm ± 0.01 mm}, {@code 2,03mm}, {@code 31.2041 g +/- 0.1 mg}. */
public final class QuantityText {

    private QuantityText() {}

    /**
     * Reads a number with its unit and, behind {@code ±}, {@code +/-} or {@code +-}, its standard uncertainty. A unit that
     * stands only once counts for both: {@code 2.03 mm ± 0.01}, {@code 2.03 ± 0.01 mm}.
     *
     * @throws QuantityFormatException when the text is not such a quantity, or its unit is of another dimension
     */
    public static Quantity parse(String text, Dimension dimension) throws QuantityFormatException {
        String whole = spaced(text).strip().replace("+/-", "±").replace("+-", "±");
        if (whole.isEmpty()) {
            throw new QuantityFormatException(Reason.EMPTY, text);
        }
        int sign = whole.indexOf('±');
        Parsed value = split(sign < 0 ? whole : whole.substring(0, sign));
        if (sign < 0) {
            Unit unit = unit(value, dimension);
            return new Quantity(finite(unit.toSi(value.number), whole), OptionalDouble.empty(), unit);
        }
        Parsed uncertainty = split(whole.substring(sign + 1));
        Unit unit = unit(value.unit.isEmpty() ? uncertainty : value, dimension);
        Unit uncertaintyUnit = uncertainty.unit.isEmpty() ? unit : unit(uncertainty, dimension);
        if (!(uncertainty.number >= 0)) {
            throw new QuantityFormatException(
                    Reason.UNCERTAINTY_BAD, whole.substring(sign + 1).strip());
        }
        double si = finite(unit.toSi(value.number), whole);
        double siUncertainty = finite(uncertaintyUnit.differenceToSi(uncertainty.number), whole);
        return new Quantity(si, OptionalDouble.of(siUncertainty), unit);
    }

    /** No-break and thin spaces as plain ones. */
    private static String spaced(String text) {
        StringBuilder s = new StringBuilder(text);
        for (int i = 0; i < s.length(); i++) {
            if (Numbers.isSpace(s.charAt(i))) {
                s.setCharAt(i, ' ');
            }
        }
        return s.toString();
    }

    /** A unit can carry a number beyond the doubles. */
    private static double finite(double si, String text) throws QuantityFormatException {
        if (!Double.isFinite(si)) {
            throw new QuantityFormatException(Reason.NOT_FINITE, text);
        }
        return si;
    }

    private static Unit unit(Parsed parsed, Dimension dimension) throws QuantityFormatException {
        if (parsed.unit.isEmpty()) {
            throw new QuantityFormatException(Reason.UNIT_MISSING, parsed.numberText);
        }
        return Unit.find(parsed.unit, dimension)
                .orElseThrow(() -> new QuantityFormatException(Reason.UNIT_UNKNOWN, parsed.unit));
    }

    private static Parsed split(String text) throws QuantityFormatException {
        String s = text.strip();
        int end = 0;
        while (end < s.length() && isNumberPart(s, end)) {
            end++;
        }
        String numberText = s.substring(0, end).strip();
        OptionalDouble number = Numbers.parse(numberText);
        if (number.isEmpty()) {
            throw new QuantityFormatException(Reason.NOT_A_NUMBER, s);
        }
        if (!Double.isFinite(number.getAsDouble())) {
            throw new QuantityFormatException(Reason.NOT_FINITE, s);
        }
        return new Parsed(number.getAsDouble(), numberText, s.substring(end).strip());
    }

    private static boolean isNumberPart(String s, int i) {
        char c = s.charAt(i);
        if (Character.isDigit(c) || c == '.' || c == ',' || c == '+' || c == '-' || c == '\u2212') {
            return true;
        }
        // an exponent only where digits follow, so that a unit may begin with an e
        return (c == 'e' || c == 'E')
                && i > 0
                && i + 1 < s.length()
                && (Character.isDigit(s.charAt(i + 1))
                        || ((s.charAt(i + 1) == '-' || s.charAt(i + 1) == '+')
                                && i + 2 < s.length()
                                && Character.isDigit(s.charAt(i + 2))));
    }

    private record Parsed(double number, String numberText, String unit) {}
}
