package soakline.command;

import java.util.List;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.Model.PositionalParamSpec;

/** The words of the command {@code estimate}, built without annotations: reading those takes longer than the estimate. */
final class EstimateOptions {

    static final String FILES = "FILE";
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
    static final String COLUMNS = "--columns";
    static final String DATE_PATTERN = "--date-pattern";
    static final String HELP = "--help";

    private EstimateOptions() {}

    static CommandSpec spec() {
        CommandSpec spec = CommandSpec.create().name("soakline estimate");
        spec.usageMessage()
                .description("Estimates diffusivity, equilibrium and start content of each coupon, with intervals.%n")
                .sortOptions(false)
                .width(100)
                .footer(
                        "",
                        "Options hold in place of what a file says. Quantities carry their unit, with a decimal point or",
                        "comma; \"2.03 mm ± 0.01 mm\" also gives the standard uncertainty.",
                        "Results go to standard output, notes and problems to standard error.",
                        "Exit status: 0 done; 1 done, but a result is not usable; 2 wrong use; 3 unusable input.");
        spec.addPositional(PositionalParamSpec.builder()
                .paramLabel(FILES)
                .arity("1..*")
                .type(List.class)
                .auxiliaryTypes(String.class)
                .description("run files: CSV or .xlsx, one or several coupons each")
                .build());
        coupon(spec);
        estimate(spec);
        output(spec);
        spec.addOption(OptionSpec.builder("-h", HELP)
                .usageHelp(true)
                .description("shows this and ends")
                .build());
        return spec;
    }

    private static void coupon(CommandSpec spec) {
        add(spec, THICKNESS, "QUANTITY", "thickness of the coupon, such as \"2.03 mm\"; never assumed");
        add(spec, FACES, "both|one", "which large faces are exposed; never assumed: D differs by a factor of 4");
        add(spec, EDGES, "bare|sealed", "the four edges; sealed when nothing is said");
        add(spec, WIDTH, "QUANTITY", "width of the coupon; needed with bare edges");
        add(spec, LENGTH, "QUANTITY", "length of the coupon; needed with bare edges");
        add(spec, DRY_MASS, "QUANTITY", "mass that contents are relative to, such as \"31.2 g\"");
        add(spec, COLUMNS, "HEADER", "what the columns of a file hold, such as \"time [h],mass [g]\"");
        add(spec, DATE_PATTERN, "PATTERN", "how a file writes its dates, such as \"dd.MM.yyyy HH:mm\"");
    }

    private static void estimate(CommandSpec spec) {
        add(spec, MODEL, "NAME", "model of uptake: fickian");
        addList(
                spec,
                FIX,
                "NAME=VALUE",
                "holds a parameter fixed: diffusivity (m2/s), equilibriumContent or startContent (%%), or with a unit of"
                        + " its own, such as 'diffusivity=1e-6 mm2/s'; may be given several times");
        addList(spec, FREE, "NAME", "estimates a parameter, as is done for all three that are not fixed");
        add(spec, LEVEL, "0.95", "level of the intervals, between 0.5 and 1");
        add(spec, INTERVAL, "profile|linearised", "how intervals are made; profile when nothing is said");
        add(spec, NOISE, "estimated", "where the scatter of the weighings comes from: the residuals");
    }

    private static void output(CommandSpec spec) {
        add(spec, FORMAT, "text|json|csv", "form of the result on standard output; text when nothing is said");
        add(spec, FIGURE, "FILE", "draws all coupons into a file that ends in .svg or .png");
    }

    private static void add(CommandSpec spec, String name, String label, String description) {
        spec.addOption(OptionSpec.builder(name)
                .paramLabel(label)
                .arity("1")
                .type(String.class)
                .description(description)
                .build());
    }

    private static void addList(CommandSpec spec, String name, String label, String description) {
        spec.addOption(OptionSpec.builder(name)
                .paramLabel(label)
                .arity("1")
                .type(List.class)
                .auxiliaryTypes(String.class)
                .description(description)
                .build());
    }
}
