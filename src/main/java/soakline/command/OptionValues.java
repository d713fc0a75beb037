package soakline.command;

import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.List;
import java.util.OptionalDouble;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.quantity.Dimension;
import soakline.quantity.Numbers;
import soakline.quantity.Quantity;
import soakline.quantity.QuantityFormatException;
import soakline.quantity.QuantityText;
import soakline.quantity.Unit;

/** The texts behind options as values. Every fault here names the option, and is wrong use. */
final class OptionValues {

    private OptionValues() {}

    /** A length or mass, which must be positive. */
    static Quantity positive(String option, String text, Dimension dimension, String example) {
        Quantity quantity = quantity(option, text, dimension, example);
        if (!(quantity.si() > 0)) {
            throw Fault.of(Code.FACT_NOT_POSITIVE, option, quantity.toString());
        }
        return quantity;
    }

    static Quantity quantity(String option, String text, Dimension dimension, String example) {
        if (text.indexOf('\ufffd') >= 0) {
            throw Fault.of(
                    Code.OPTION_BAD,
                    option,
                    "\"" + text + "\" holds a sign that this locale does not pass on. Write +/- for ±, um for µm");
        }
        try {
            return QuantityText.parse(text, dimension);
        } catch (QuantityFormatException e) {
            throw switch (e.reason()) {
                case UNIT_MISSING -> Fault.of(Code.FACT_UNIT_MISSING, option, text, example);
                case UNIT_UNKNOWN -> Fault.of(Code.FACT_UNIT_UNKNOWN, option, e.part(), Unit.symbols(dimension));
                case EMPTY, NOT_A_NUMBER, NOT_FINITE, UNCERTAINTY_BAD ->
                    Fault.of(Code.FACT_NOT_A_QUANTITY, option, text, example);
            };
        }
    }

    /** One of a few words. */
    static <T> T oneOf(String option, String text, List<String> words, List<T> values) {
        int index = words.indexOf(text);
        if (index < 0) {
            throw Fault.of(Code.FACT_NOT_ONE_OF, option, text, String.join(", ", words));
        }
        return values.get(index);
    }

    /** The level of intervals: 0.95 or 95 %. */
    static double level(String option, String text) {
        String stripped = text.strip();
        boolean percent = stripped.endsWith("%");
        OptionalDouble number = Numbers.parse(percent ? stripped.substring(0, stripped.length() - 1) : stripped);
        double level = number.orElse(Double.NaN) / (percent ? 100 : 1);
        if (!(level > 0.5 && level < 1)) {
            throw Fault.of(
                    Code.OPTION_BAD,
                    option,
                    "\"" + text + "\" is no level. Write a number between 0.5 and 1, such as 0.95");
        }
        return level;
    }

    static Path path(String name) {
        try {
            return Path.of(name);
        } catch (InvalidPathException e) {
            throw Fault.of(Code.OPTION_BAD, name, "this is not a name for a file");
        }
    }
}
