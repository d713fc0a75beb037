package soakline.workspace;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeMap;
import soakline.estimate.Parameter;
import soakline.inference.AssessmentOptions;
import soakline.inference.IntervalMethod;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.quantity.Dimension;
import soakline.quantity.ExactText;
import soakline.quantity.Numbers;
import soakline.quantity.QuantityFormatException;
import soakline.quantity.QuantityText;
import soakline.quantity.ResultUnit;
import soakline.quantity.Unit;
import soakline.specimen.RunFileWords;
import soakline.uptake.ShapeParameter;

/** What was chosen for an estimate, as facts of a run file and back. What is as usual needs no fact. */
public final class OptionFacts {

    /** A parameter that may be held fixed. */
    private record Fixable(String name, ResultUnit unit) {}

    private static final List<Fixable> FIXABLE = List.of(
            new Fixable(ShapeParameter.DIFFUSIVITY.name(), ShapeParameter.DIFFUSIVITY.unit()),
            new Fixable(Parameter.EQUILIBRIUM_CONTENT.name(), Parameter.EQUILIBRIUM_CONTENT.unit()),
            new Fixable(Parameter.START_CONTENT.name(), Parameter.START_CONTENT.unit()));

    private OptionFacts() {}

    /** Name to value of the facts, always in the same order. */
    static Map<String, String> write(AssessmentOptions options) {
        AssessmentOptions usual = AssessmentOptions.usual();
        Map<String, String> facts = new LinkedHashMap<>();
        new TreeMap<>(options.fixed()).forEach((name, si) -> facts.put(RunFileWords.FIXED + name, text(name, si)));
        if (options.level() != usual.level()) {
            facts.put(RunFileWords.INTERVAL_LEVEL, ExactText.of(options.level()));
        }
        if (options.method() != usual.method()) {
            facts.put(RunFileWords.INTERVAL_METHOD, options.method().code());
        }
        return facts;
    }

    private static String text(String name, double si) {
        Optional<Dimension> dimension = fixable(name).flatMap(f -> dimension(f.unit()));
        if (dimension.isEmpty()) {
            return ExactText.of(si);
        }
        Unit unit = dimension.get() == Dimension.CONTENT ? Unit.PERCENT : Unit.si(dimension.get());
        Unit held = ExactText.exists(si, unit) ? unit : Unit.si(dimension.get());
        return ExactText.of(si, held).orElseThrow() + " " + held.symbol();
    }

    /**
     * The options with one fact of a file taken into them.
     *
     * @return empty when the fact is none that is known here
     * @throws Fault when its value makes no sense
     */
    public static Optional<AssessmentOptions> with(AssessmentOptions options, String name, String value) {
        String key = RunFileWords.key(name);
        if (key.equals(RunFileWords.INTERVAL_LEVEL)) {
            return Optional.of(options.withLevel(level(name, value)));
        }
        if (key.equals(RunFileWords.INTERVAL_METHOD)) {
            return Optional.of(options.withMethod(method(name, value)));
        }
        if (!key.startsWith(RunFileWords.FIXED)) {
            return Optional.empty();
        }
        return fixable(key.substring(RunFileWords.FIXED.length())).map(parameter -> {
            Map<String, Double> fixed = new LinkedHashMap<>(options.fixed());
            fixed.put(parameter.name(), fixed(name, value, parameter));
            return options.withFixed(fixed);
        });
    }

    /** Whether a name is that of a choice, but of none that is known here. */
    static boolean isUnknown(String name) {
        String key = RunFileWords.key(name);
        return key.startsWith(RunFileWords.FIXED)
                && fixable(key.substring(RunFileWords.FIXED.length())).isEmpty();
    }

    private static Optional<Fixable> fixable(String name) {
        return FIXABLE.stream().filter(f -> f.name().equalsIgnoreCase(name)).findFirst();
    }

    private static Optional<Dimension> dimension(ResultUnit unit) {
        return switch (unit) {
            case PERCENT -> Optional.of(Dimension.CONTENT);
            case SQUARE_METRE_PER_SECOND -> Optional.of(Dimension.DIFFUSIVITY);
            case PERCENT_PER_ROOT_SECOND, PER_SECOND, NONE -> Optional.empty();
        };
    }

    /** A bare number is in the unit of the machine-readable result, as on the command line. */
    private static double fixed(String name, String value, Fixable parameter) {
        OptionalDouble bare = Numbers.parse(value);
        Optional<Dimension> dimension = dimension(parameter.unit());
        double si;
        if (bare.isPresent() || dimension.isEmpty()) {
            si = parameter.unit().toSi(bare.orElse(Double.NaN));
        } else {
            si = quantity(name, value, dimension.get());
        }
        if (!Double.isFinite(si)) {
            throw notAQuantity(name, value, dimension);
        }
        boolean diffusivity = parameter.name().equals(ShapeParameter.DIFFUSIVITY.name());
        if (diffusivity && !(si > 0)) {
            throw Fault.of(Code.FACT_NOT_POSITIVE, name, value);
        }
        return si;
    }

    private static double quantity(String name, String value, Dimension dimension) {
        try {
            return QuantityText.parse(value, dimension).si();
        } catch (QuantityFormatException e) {
            if (e.reason() == QuantityFormatException.Reason.UNIT_UNKNOWN) {
                throw Fault.of(Code.FACT_UNIT_UNKNOWN, name, e.part(), Unit.symbols(dimension));
            }
            throw notAQuantity(name, value, Optional.of(dimension));
        }
    }

    private static Fault notAQuantity(String name, String value, Optional<Dimension> dimension) {
        String example = dimension.isEmpty() ? "0.1" : dimension.get() == Dimension.CONTENT ? "1.8 %" : "1e-12 m2/s";
        return Fault.of(Code.FACT_NOT_A_QUANTITY, name, value, example);
    }

    private static double level(String name, String value) {
        String stripped = value.strip();
        boolean percent = stripped.endsWith("%");
        OptionalDouble number = Numbers.parse(percent ? stripped.substring(0, stripped.length() - 1) : stripped);
        double level = number.orElse(Double.NaN) / (percent ? 100 : 1);
        if (!(level > 0.5 && level < 1)) {
            throw Fault.of(Code.FACT_LEVEL_BAD, name, value);
        }
        return level;
    }

    private static IntervalMethod method(String name, String value) {
        for (IntervalMethod method : IntervalMethod.values()) {
            if (method.code().equals(value.strip().toLowerCase(Locale.ROOT))) {
                return method;
            }
        }
        throw Fault.of(
                Code.FACT_NOT_ONE_OF,
                name,
                value,
                IntervalMethod.PROFILE.code() + ", " + IntervalMethod.LINEARISED.code());
    }
}
