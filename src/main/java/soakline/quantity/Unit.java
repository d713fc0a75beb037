package soakline.quantity;

import java.util.List;
import java.util.Optional;

/**
 * The units that may stand in a run file or an option, each with the factor to SI.
 *
 * <p>Source of the factors: BIPM, The International System of Units, 9th edition; the inch and its thousandth (mil) are
 * 25.4 mm and 25.4 µm exactly.
 */
public enum Unit {
    SECOND(Dimension.TIME, 1, "s", "sec", "secs", "second", "seconds"),
    MINUTE(Dimension.TIME, 60, "min", "mins", "minute", "minutes"),
    HOUR(Dimension.TIME, 3600, "h", "hr", "hrs", "hour", "hours"),
    DAY(Dimension.TIME, 86_400, "d", "day", "days"),
    WEEK(Dimension.TIME, 604_800, "week", "weeks", "wk"),

    METRE(Dimension.LENGTH, 1, "m", "metre", "meter"),
    CENTIMETRE(Dimension.LENGTH, 1e-2, "cm"),
    MILLIMETRE(Dimension.LENGTH, 1e-3, "mm"),
    MICROMETRE(Dimension.LENGTH, 1e-6, "µm", "um", "micron", "microns"),
    INCH(Dimension.LENGTH, 0.0254, "in", "inch", "inches"),
    MIL(Dimension.LENGTH, 25.4e-6, "mil", "mils"),

    KILOGRAM(Dimension.MASS, 1, "kg"),
    GRAM(Dimension.MASS, 1e-3, "g", "gram", "grams"),
    MILLIGRAM(Dimension.MASS, 1e-6, "mg"),
    MICROGRAM(Dimension.MASS, 1e-9, "µg", "ug"),

    PERCENT(Dimension.CONTENT, 1e-2, "%", "percent", "wt%", "wt %", "wt.%", "wt. %", "% (m/m)"),
    FRACTION(Dimension.CONTENT, 1, "1", "g/g", "kg/kg", "fraction"),

    CELSIUS(Dimension.TEMPERATURE, 1, "°C", "° C", "degC", "C", "℃"),
    KELVIN(Dimension.TEMPERATURE, 1, "K"),

    SQUARE_METRE_PER_SECOND(Dimension.DIFFUSIVITY, 1, "m²/s", "m2/s", "m^2/s"),
    SQUARE_CENTIMETRE_PER_SECOND(Dimension.DIFFUSIVITY, 1e-4, "cm²/s", "cm2/s", "cm^2/s"),
    SQUARE_MILLIMETRE_PER_SECOND(Dimension.DIFFUSIVITY, 1e-6, "mm²/s", "mm2/s", "mm^2/s");

    private static final double ZERO_CELSIUS = 273.15;

    private final Dimension dimension;
    private final double factor;

    @SuppressWarnings("ImmutableEnumChecker") // made by List.of
    private final List<String> spellings;

    Unit(Dimension dimension, double factor, String... spellings) {
        this.dimension = dimension;
        this.factor = factor;
        this.spellings = List.of(spellings);
    }

    public Dimension dimension() {
        return dimension;
    }

    /** The spelling that the program writes. */
    public String symbol() {
        return spellings.get(0);
    }

    /** A value in this unit, in SI (kelvin for temperatures). */
    public double toSi(double value) {
        return this == CELSIUS ? value + ZERO_CELSIUS : value * factor;
    }

    /** An SI value in this unit. */
    public double fromSi(double si) {
        return this == CELSIUS ? si - ZERO_CELSIUS : si / factor;
    }

    /** A difference or an uncertainty in this unit, in SI: no offset. */
    public double differenceToSi(double difference) {
        return difference * factor;
    }

    /** An SI difference or uncertainty in this unit: no offset. */
    public double differenceFromSi(double si) {
        return si / factor;
    }

    /** The unit of a dimension in which values stand inside the program. */
    public static Unit si(Dimension dimension) {
        for (Unit unit : values()) {
            if (unit.dimension == dimension && unit.toSi(1) == 1) {
                return unit;
            }
        }
        throw new IllegalStateException("no SI unit for " + dimension);
    }

    /**
     * The unit with this spelling. Exact spelling first, then without regard to case where that leaves no doubt (so
     * {@code MM} and {@code Hours} are read, but {@code M} is never taken for a metre nor {@code MG} for anything but mg).
     *
     * @return empty when no unit of that dimension is spelled so
     */
    public static Optional<Unit> find(String spelling, Dimension dimension) {
        String wanted = normalised(spelling);
        Unit byCase = null;
        for (Unit unit : values()) {
            if (unit.dimension != dimension) {
                continue;
            }
            for (String s : unit.spellings) {
                if (s.equals(wanted)) {
                    return Optional.of(unit);
                }
                if (wanted.length() > 1 && s.equalsIgnoreCase(wanted)) {
                    byCase = unit;
                }
            }
        }
        return Optional.ofNullable(byCase);
    }

    /** The unit of any dimension with this spelling. */
    public static Optional<Unit> find(String spelling) {
        for (Dimension dimension : Dimension.values()) {
            Optional<Unit> unit = find(spelling, dimension);
            if (unit.isPresent()) {
                return unit;
            }
        }
        return Optional.empty();
    }

    /** The symbols of one dimension, for a message that says what may be written. */
    public static String symbols(Dimension dimension) {
        StringBuilder text = new StringBuilder();
        for (Unit unit : values()) {
            if (unit.dimension == dimension) {
                text.append(text.isEmpty() ? "" : ", ").append(unit.symbol());
            }
        }
        return text.toString();
    }

    private static String normalised(String spelling) {
        // U+03BC (Greek mu) and U+00B5 (micro sign) look alike; keyboards give U+00BA (ordinal) and U+02DA (ring) for °
        return spelling.replace('\u00a0', ' ')
                .strip()
                .replace('\u03bc', '\u00b5')
                .replace('\u00ba', '\u00b0')
                .replace('\u02da', '\u00b0');
    }
}
