package soakline.command;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import soakline.estimate.Parameter;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.quantity.Dimension;
import soakline.quantity.Numbers;
import soakline.quantity.Quantity;
import soakline.quantity.ResultUnit;
import soakline.uptake.ShapeParameter;

/** What {@code --fix} and {@code --free} say about the parameters of a Fickian sheet. */
final class FixOptions {

    private static final String DIFFUSIVITY = ShapeParameter.DIFFUSIVITY.name();
    private static final List<String> NAMES =
            List.of(DIFFUSIVITY, Parameter.EQUILIBRIUM_CONTENT.name(), Parameter.START_CONTENT.name());

    private FixOptions() {}

    /** Parameter name to SI value. */
    static Map<String, Double> fixed(List<String> fix, List<String> free) {
        Map<String, Double> fixed = new LinkedHashMap<>();
        for (String text : fix) {
            int sign = text.indexOf('=');
            if (sign < 0) {
                throw Fault.of(
                        Code.OPTION_BAD,
                        EstimateOptions.FIX,
                        "\"" + text + "\" has no value. Write for example " + NAMES.get(2) + "=0");
            }
            String name = known(text.substring(0, sign).strip());
            if (fixed.put(name, value(name, text.substring(sign + 1).strip())) != null) {
                throw Fault.of(Code.OPTION_BAD, EstimateOptions.FIX, name + " is given twice");
            }
        }
        for (String text : free) {
            if (fixed.containsKey(known(text.strip()))) {
                throw Fault.of(Code.OPTION_BAD, EstimateOptions.FREE, text.strip() + " is also held by --fix");
            }
        }
        return fixed;
    }

    private static String known(String name) {
        if (!NAMES.contains(name)) {
            throw Fault.of(Code.OPTION_UNKNOWN_FIX, name, String.join(", ", NAMES));
        }
        return name;
    }

    /** A bare number is in the unit of the machine-readable result. */
    private static double value(String name, String text) {
        boolean diffusivity = name.equals(DIFFUSIVITY);
        String option = EstimateOptions.FIX + " " + name;
        OptionalDouble bare = Numbers.parse(text);
        double si;
        if (bare.isPresent()) {
            si = (diffusivity ? ResultUnit.SQUARE_METRE_PER_SECOND : ResultUnit.PERCENT).toSi(bare.getAsDouble());
        } else {
            Quantity quantity = OptionValues.quantity(
                    option,
                    text,
                    diffusivity ? Dimension.DIFFUSIVITY : Dimension.CONTENT,
                    diffusivity ? "1e-12 m2/s" : "1.8 %");
            if (quantity.standardUncertainty().isPresent()) {
                throw Fault.of(Code.OPTION_BAD, option, "a fixed value has no uncertainty");
            }
            si = quantity.si();
        }
        if (!Double.isFinite(si)) {
            throw Fault.of(Code.OPTION_BAD, option, "\"" + text + "\" is not a finite number");
        }
        if (diffusivity && !(si > 0)) {
            throw Fault.of(Code.FACT_NOT_POSITIVE, option, text);
        }
        return si;
    }
}
