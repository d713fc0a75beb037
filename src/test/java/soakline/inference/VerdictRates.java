package soakline.inference;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import soakline.quantity.Quantity;
import soakline.quantity.Unit;
import soakline.specimen.ContentSeries;
import soakline.specimen.Faces;
import soakline.specimen.Facts;
import soakline.specimen.Run;
import soakline.specimen.ValueKind;
import soakline.specimen.Weighings;
import soakline.uptake.FickianModel;

/**
 * How often the verdict on Fick's law says what, over simulated tests: false alarms on Fickian coupons, and power on others. Prints
 * the table of {@code docs/verdict-rates.md}, which says how to run it. A study, not a test: seeds are fixed, nothing is asserted.
 *
 * <p>Every coupon is weighed as a person would do it: √t-spaced, masses rounded to the last digit of the balance, 31 g dry.
 */
public final class VerdictRates {

    private static final double DRY = 31e-3;
    private static final double STEP = 1e-7;
    /** Of one weighing, kg: that of the sample runs, 24 times what the balance shows. */
    private static final double SCATTER = 24 * STEP;

    private static final double RISE = 0.018;
    private static final double THICKNESS = 2e-3;
    private static final double UNIT = THICKNESS * THICKNESS / 4 / 1.1e-12;

    /**
     * A moulded package, fraction of content at hours 0, 4, 8, 24, 48, 72, 96, 120, 144, 168: a mobile–bound curve fitted with SciPy
     * 1.10.1 to the published weighings that stand in {@link VerdictsTest}, residual standard deviation 0.0015 %.
     */
    private static final double[] PACKAGE = {
        0,
        7.17389797e-4,
        1.01946985e-3,
        1.75888829e-3,
        2.31207212e-3,
        2.59268212e-3,
        2.76217375e-3,
        2.87796116e-3,
        2.96262984e-3,
        3.02658961e-3
    };

    private static final double[] PACKAGE_HOURS = {0, 4, 8, 24, 48, 72, 96, 120, 144, 168};
    private static final double PACKAGE_MASS = 0.12363045;
    private static final double PACKAGE_SCATTER = 1.5e-5;
    private static final double PACKAGE_STEP = 5e-8;

    private final int sets;
    private final PrintStream out =
            new PrintStream(new FileOutputStream(FileDescriptor.out), true, StandardCharsets.UTF_8);

    private VerdictRates(int sets) {
        this.sets = sets;
    }

    @FunctionalInterface
    private interface Curve {
        /** Content of the rise at τ = D t/L². */
        double at(double tau);
    }

    public static void main(String[] args) {
        new VerdictRates(args.length > 0 ? Integer.parseInt(args[0]) : 2000).print();
    }

    private void print() {
        say(
                "| coupon | n | ρ | balance | pass | caution | fail | unknown | exponent p < 0.01 | Durbin–Watson p < 0.01 | both |");
        say("|---|---|---|---|---|---|---|---|---|---|---|");
        Curve fick = VerdictRates::fickian;
        for (int n : new int[] {12, 24, 40, 100}) {
            study("Fickian", fick, n, 1.5, 0, STEP);
        }
        for (int n : new int[] {12, 24, 40, 100}) {
            study("Fickian", fick, n, 1.5, 0.6, STEP);
        }
        study("Fickian", fick, 40, 1.5, 0.3, STEP);
        study("Fickian", fick, 40, 1.5, 0.6, SCATTER);
        for (int n : new int[] {12, 24, 36}) {
            study("two stages, 28 % slow", tau -> twoStages(tau, 0.282, 1.5), n, 4.2, 0, STEP);
        }
        study("two stages, 28 % slow", tau -> twoStages(tau, 0.282, 1.5), 36, 4.2, 0.6, STEP);
        for (int percent : new int[] {5, 10, 20}) {
            study("two stages, " + percent + " % slow", tau -> twoStages(tau, percent / 100.0, 2), 40, 3, 0, STEP);
        }
        for (double biot : new double[] {50, 10}) {
            study("film, B = " + (int) biot, tau -> film(tau, biot), 40, 1.5 * (1 + 3 / biot), 0, STEP);
        }
        packages(Map.of(), "package, start free");
        packages(Map.of("startContent", 0.0), "package, start held");
    }

    private void study(String name, Curve curve, int n, double lastTau, double correlation, double balance) {
        double[] times = new double[n];
        double[] contents = new double[n];
        for (int i = 0; i < n; i++) {
            double root = i / (n - 1.0);
            times[i] = lastTau * UNIT * root * root;
            contents[i] = RISE * curve.at(times[i] / UNIT);
        }
        Facts facts = Facts.of("invented")
                .withThickness(Quantity.of(THICKNESS, Unit.METRE))
                .withFaces(Faces.BOTH)
                .withDryMass(Quantity.of(DRY, Unit.KILOGRAM));
        Weigher weigher = new Weigher(facts, DRY, SCATTER, STEP, balance);
        count(name, ContentSeries.of(times, contents), correlation, weigher, AssessmentOptions.usual());
    }

    private void packages(Map<String, Double> fixed, String name) {
        double[] times = new double[PACKAGE_HOURS.length];
        for (int i = 0; i < times.length; i++) {
            times[i] = PACKAGE_HOURS[i] * 3600;
        }
        Facts facts = Facts.of("package")
                .withThickness(Quantity.of(1e-3, Unit.METRE))
                .withFaces(Faces.BOTH)
                .withDryMass(Quantity.of(PACKAGE_MASS, Unit.KILOGRAM));
        Weigher weigher = new Weigher(facts, PACKAGE_MASS, PACKAGE_SCATTER * PACKAGE_MASS, PACKAGE_STEP, PACKAGE_STEP);
        count(
                name,
                ContentSeries.of(times, PACKAGE),
                0,
                weigher,
                AssessmentOptions.usual().withFixed(fixed));
    }

    /** How a coupon is weighed, all in kg. */
    private record Weigher(Facts facts, double dry, double scatter, double step, double balance) {

        Run run(ContentSeries truth, double correlation, Random random) {
            int n = truth.size();
            double[] masses = new double[n];
            double noise = random.nextGaussian();
            for (int i = 0; i < n; i++) {
                if (i > 0) {
                    noise = correlation * noise + Math.sqrt(1 - correlation * correlation) * random.nextGaussian();
                }
                masses[i] = Math.rint((dry * (1 + truth.content(i)) + scatter * noise) / step) * step;
            }
            Facts known = new Facts(
                    facts.specimen(),
                    facts.thickness(),
                    facts.width(),
                    facts.length(),
                    facts.faces(),
                    facts.edges(),
                    facts.temperature(),
                    facts.medium(),
                    facts.dryMass(),
                    Optional.of(Quantity.of(balance, Unit.KILOGRAM)),
                    facts.note(),
                    facts.other());
            return new Run("invented.csv", known, ValueKind.MASS, Weighings.of(truth.times(), masses), List.of());
        }
    }

    private void count(
            String name, ContentSeries truth, double correlation, Weigher weigher, AssessmentOptions options) {
        Random random = new Random(20261201);
        Map<Verdict, Integer> verdicts = new EnumMap<>(Verdict.class);
        int exponent = 0;
        int alike = 0;
        int both = 0;
        for (int k = 0; k < sets; k++) {
            Assessment a = Assessor.assess(weigher.run(truth, correlation, random), options);
            verdicts.merge(a.fickian(), 1, Integer::sum);
            boolean bent = p(a, CheckName.TIME_EXPONENT) < 0.01;
            boolean runs = p(a, CheckName.RESIDUAL_AUTOCORRELATION) < 0.01;
            exponent += bent ? 1 : 0;
            alike += runs ? 1 : 0;
            both += bent && runs ? 1 : 0;
        }
        List<String> cells = new ArrayList<>();
        cells.add(name);
        cells.add(String.valueOf(truth.size()));
        cells.add(String.valueOf(correlation));
        cells.add(String.format(Locale.ROOT, "scatter/%.0f", weigher.scatter / weigher.balance));
        for (Verdict v : new Verdict[] {Verdict.PASS, Verdict.CAUTION, Verdict.FAIL, Verdict.UNKNOWN}) {
            cells.add(percent(verdicts.getOrDefault(v, 0)));
        }
        cells.add(percent(exponent));
        cells.add(percent(alike));
        cells.add(percent(both));
        say("| " + String.join(" | ", cells) + " |");
    }

    private String percent(int count) {
        return String.format(Locale.ROOT, "%.2f", 100.0 * count / sets);
    }

    private static double p(Assessment a, CheckName name) {
        return a.checks().stream()
                .filter(c -> c.name() == name)
                .findFirst()
                .orElseThrow()
                .pValue()
                .orElse(1);
    }

    private static double fickian(double tau) {
        return FickianModel.through(1).fraction(tau, new double[] {0});
    }

    /** Fick's law, and a share of the rise by a relaxation of a first order; 28 % in τ = 1.5 is sample run 07. */
    private static double twoStages(double tau, double share, double relaxation) {
        return (1 - share) * fickian(tau) + share * (1 - Math.exp(-tau / relaxation));
    }

    /** The plane wall with a surface resistance: Crank, The Mathematics of Diffusion, 2nd ed. (1975), ch. 4. */
    private static double film(double tau, double biot) {
        double remaining = 0;
        for (int k = 0; k < 400; k++) {
            double low = k * Math.PI;
            double high = low + Math.PI / 2;
            for (int step = 0; step < 60; step++) {
                double middle = (low + high) / 2;
                if (middle * Math.sin(middle) < biot * Math.cos(middle) == (k % 2 == 0)) {
                    low = middle;
                } else {
                    high = middle;
                }
            }
            double b = low * low;
            remaining += 2 * biot * biot / (b * (b + biot * biot + biot)) * Math.exp(-b * tau);
        }
        return 1 - remaining;
    }

    private void say(String line) {
        out.println(line);
    }
}
