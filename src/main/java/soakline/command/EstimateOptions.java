package soakline.command;

import java.util.HashSet;
import java.util.List;
import java.util.Set;

/** The options of the command {@code estimate}: the one table of them. */
final class EstimateOptions {

    static final String THICKNESS = "--thickness";
    static final String FACES = "--faces";
    static final String EDGES = "--edges";
    static final String WIDTH = "--width";
    static final String LENGTH = "--length";
    static final String DRY_MASS = "--dry-mass";
    static final String MODEL = "--model";
    static final String FIX = "--fix";
    static final String FREE = "--free";
    static final String LEVEL = "--level";
    static final String INTERVAL = "--interval";
    static final String NOISE = "--noise";
    static final String FORMAT = "--format";
    static final String FIGURE = "--figure";
    static final String REPORT = "--report";
    static final String COLUMNS = "--columns";
    static final String DATE_PATTERN = "--date-pattern";

    /**
     * An option with a value.
     *
     * @param often whether it may be given several times
     * @param label what its value is
     */
    record Option(String name, boolean often, String label, String description) {}

    static final List<Option> ALL = List.of(
            once(THICKNESS, "QUANTITY", "thickness of the coupon, such as \"2.03 mm\"; never assumed"),
            once(FACES, "both|one", "which large faces are exposed; never assumed: it changes D by 4"),
            once(EDGES, "bare|sealed", "the four edges; sealed when nothing is said"),
            once(WIDTH, "QUANTITY", "width of the coupon; needed with bare edges"),
            once(LENGTH, "QUANTITY", "length of the coupon; needed with bare edges"),
            once(DRY_MASS, "QUANTITY", "mass that contents are relative to, such as \"31.2 g\""),
            once(COLUMNS, "HEADER", "what the columns of a file hold, such as \"time [h],mass [g]\""),
            once(DATE_PATTERN, "PATTERN", "how a file writes its dates, such as \"dd.MM.yyyy HH:mm\""),
            once(MODEL, "NAME", "model of uptake: fickian"),
            often(
                    FIX,
                    "NAME=VALUE",
                    "holds a parameter fixed: diffusivity (m2/s), equilibriumContent or startContent (%), or with a unit"
                            + " of its own, such as \"diffusivity=1e-6 mm2/s\"; may be given several times"),
            often(FREE, "NAME", "estimates a parameter, as is done for all three that are not fixed"),
            once(LEVEL, "0.95", "level of the intervals, between 0.5 and 1"),
            once(INTERVAL, "profile|linearised", "how intervals are made; profile when nothing is said"),
            once(NOISE, "estimated", "where the scatter of the weighings is taken from: the residuals"),
            once(FORMAT, "text|json|csv", "form of the result on standard output; text when nothing is said"),
            once(FIGURE, "FILE", "draws all coupons into a file that ends in .svg or .png"),
            once(REPORT, "FILE", "writes a report on all coupons into a file that ends in .pdf or .html"));

    static final int WIDTH_OF_HELP = 100;
    static final String DESCRIPTION =
            "Estimates diffusivity, equilibrium and start content of each coupon, with intervals.";
    static final List<String> FOOTER = List.of(
            "",
            "Options hold in place of what a file says. Quantities carry their unit, with a decimal point or",
            "comma; \"2.03 mm ± 0.01 mm\" (or +/-) also gives the standard uncertainty.",
            "Results go to standard output, notes and problems to standard error.",
            "Example: " + Commands.PROGRAM + " estimate run.csv --thickness \"2.03 mm\" --faces both",
            "Exit status: 0 done; 1 done, but a result is not usable; 2 wrong use; 3 unusable input.");

    private EstimateOptions() {}

    /** The names of the options that may be given several times, or of those that may not. */
    static Set<String> names(boolean often) {
        Set<String> names = new HashSet<>();
        for (Option option : ALL) {
            if (option.often() == often) {
                names.add(option.name());
            }
        }
        return names;
    }

    private static Option once(String name, String label, String description) {
        return new Option(name, false, label, description);
    }

    private static Option often(String name, String label, String description) {
        return new Option(name, true, label, description);
    }
}
