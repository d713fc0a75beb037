package soakline.workspace;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Random;
import java.util.TreeMap;
import soakline.inference.AssessmentOptions;
import soakline.inference.IntervalMethod;
import soakline.quantity.Quantity;
import soakline.quantity.Unit;
import soakline.specimen.Edges;
import soakline.specimen.Faces;
import soakline.specimen.Facts;
import soakline.specimen.Facts.Other;
import soakline.specimen.Run;
import soakline.specimen.ValueKind;
import soakline.specimen.Weighings;

/** Workspaces that nobody would have, from a seed: every text, number, order and mixture that the form allows. */
public final class InventedWorkspaces {

    private static final String[] NAMES = {
        "P-07",
        "A1",
        "a1",
        "A 1",
        "A_1",
        "A-1",
        "time",
        "mass",
        "set aside",
        "dry",
        "Dry",
        "fixed",
        "interval",
        "Öl 3",
        "=1+1",
        "<script>alert(1)</script>",
        "",
        " ",
        "two\nlines",
        "C2",
        "water of mass",
        "content",
        "A1 thickness",
        "exposed",
        "x,=2",
        "\"quoted\"",
        "#7",
        "a:b",
        "date",
        "1",
        "coupon",
        "\ud83d\ude00",
        "h",
        "İ",
        "ß",
        "ẞ",
        "K",
        "\u212a"
    };
    private static final String[] FACT_NAMES = {
        "batch",
        "resin",
        "thickness",
        "Time Zero",
        "time zero",
        "fixed startContent",
        "run file",
        "A1 colour",
        "dry",
        "a:b",
        "remark",
        "_x",
        "",
        "interval level",
        "note",
        "x  y",
        "dry 2",
        "-",
        "C1 lot",
        "a \"b: c\"",
        "exposed from",
        "A1"
    };
    private static final String LETTERS =
            "aZ9 ,;\t\n\r\"'\\=+-@#:.[]()<>&|_/u0n\u0000\u0007\u00a0\u2028\ufeff\u00e9\u03bc\u00b1\ud83d\ude00\ud800\udc00";
    private static final Unit[] TIME_UNITS = {Unit.SECOND, Unit.MINUTE, Unit.HOUR, Unit.DAY, Unit.WEEK};
    private static final Unit[] MASS_UNITS = {Unit.GRAM, Unit.MILLIGRAM, Unit.KILOGRAM, Unit.MICROGRAM};
    private static final Unit[] CONTENT_UNITS = {Unit.PERCENT, Unit.FRACTION};

    private final Random random;

    private InventedWorkspaces(long seed) {
        random = new Random(seed);
    }

    public static Workspace of(long seed) {
        return new InventedWorkspaces(seed).workspace();
    }

    private Workspace workspace() {
        int count = random.nextInt(3) == 0 ? 1 : 1 + random.nextInt(5);
        boolean alike = random.nextBoolean();
        Facts common = facts();
        AssessmentOptions options = options();
        Unit timeUnit = one(TIME_UNITS);
        List<Coupon> coupons = new ArrayList<>();
        for (int c = 0; c < count; c++) {
            Facts facts = alike ? common.withSpecimen(text(NAMES)) : facts();
            ValueKind kind = random.nextInt(4) == 0 ? ValueKind.CONTENT : ValueKind.MASS;
            Run run = new Run("invented", facts, kind, weighings(kind, timeUnit), List.of());
            coupons.add(new Coupon(run, random.nextBoolean() ? options : options()));
        }
        return new Workspace(coupons);
    }

    private String text(String[] usual) {
        return random.nextInt(4) > 0 ? usual[random.nextInt(usual.length)] : letters();
    }

    private String letters() {
        StringBuilder text = new StringBuilder();
        for (int k = random.nextInt(10); k > 0; k--) {
            text.append(LETTERS.charAt(random.nextInt(LETTERS.length())));
        }
        return text.toString();
    }

    private Facts facts() {
        return new Facts(
                text(NAMES),
                quantity(Unit.MILLIMETRE, Unit.MICROMETRE, Unit.INCH, Unit.MIL, Unit.METRE),
                quantity(Unit.CENTIMETRE, Unit.MILLIMETRE),
                quantity(Unit.CENTIMETRE, Unit.INCH),
                maybe(one(Faces.values())),
                maybe(one(Edges.values())),
                quantity(Unit.CELSIUS, Unit.KELVIN),
                maybe(letters()),
                quantity(MASS_UNITS),
                quantity(Unit.MILLIGRAM, Unit.PERCENT, Unit.FRACTION, Unit.MICROGRAM),
                maybe(letters()),
                others());
    }

    private List<Other> others() {
        List<Other> others = new ArrayList<>();
        for (int k = random.nextInt(4); k > 0; k--) {
            others.add(new Other(text(FACT_NAMES), random.nextBoolean() ? "7" : letters()));
        }
        return others;
    }

    private <T> Optional<T> maybe(T value) {
        return random.nextBoolean() ? Optional.of(value) : Optional.empty();
    }

    @SafeVarargs
    private <T> T one(T... values) {
        return values[random.nextInt(values.length)];
    }

    /** As typed in one unit, with an uncertainty typed in the same or in another. */
    private Optional<Quantity> quantity(Unit... units) {
        if (random.nextInt(3) == 0) {
            return Optional.empty();
        }
        Unit unit = one(units);
        Quantity quantity = Quantity.of(typed(), unit);
        if (random.nextBoolean()) {
            return Optional.of(quantity);
        }
        double u = random.nextBoolean() ? typed() / 100 : random.nextDouble();
        Unit other = one(units);
        Unit of = other.dimension() == unit.dimension() ? other : unit;
        return Optional.of(new Quantity(
                quantity.si(), OptionalDouble.of(of.differenceToSi(random.nextInt(5) == 0 ? 0 : u)), unit));
    }

    /** A positive number with few decimals, or, seldom, with all. */
    private double typed() {
        return random.nextInt(5) == 0
                ? 1e-3 + random.nextDouble() * 100
                : (1 + random.nextInt(100_000)) / Math.pow(10, random.nextInt(5));
    }

    private AssessmentOptions options() {
        AssessmentOptions options = AssessmentOptions.usual();
        if (random.nextBoolean()) {
            return options;
        }
        Map<String, Double> fixed = new TreeMap<>();
        if (random.nextBoolean()) {
            fixed.put("startContent", random.nextBoolean() ? 0.0 : random.nextGaussian() / 100);
        }
        if (random.nextBoolean()) {
            fixed.put("equilibriumContent", random.nextBoolean() ? 1.8 / 100 : random.nextDouble());
        }
        if (random.nextBoolean()) {
            fixed.put("diffusivity", random.nextBoolean() ? 1e-12 : random.nextDouble() * 1e-11);
        }
        return options.withFixed(fixed)
                .withLevel(random.nextBoolean() ? 0.9 : 0.5000001 + random.nextDouble() * 0.49)
                .withMethod(one(IntervalMethod.values()));
    }

    private Weighings weighings(ValueKind kind, Unit timeUnit) {
        Unit unit = kind == ValueKind.MASS ? one(MASS_UNITS) : one(CONTENT_UNITS);
        int style = random.nextInt(4);
        int count = random.nextInt(8) == 0 ? 0 : random.nextInt(30);
        double time = random.nextBoolean() ? 0 : -5;
        Weighings.Builder builder = new Weighings.Builder();
        double last = Double.NEGATIVE_INFINITY;
        for (int k = 0; k < count; k++) {
            // now and then the same time again, and both zeros
            time += random.nextInt(4) == 0 ? 0 : style == 0 ? random.nextDouble() : random.nextInt(300) / 100.0;
            double seconds = Math.max(last, style == 1 ? time * Math.PI : timeUnit.toSi(time));
            seconds = seconds == 0 && random.nextBoolean() ? -seconds : seconds;
            last = seconds;
            double value = style == 2 ? random.nextDouble() : unit.toSi(typed());
            double signed = kind == ValueKind.CONTENT && random.nextInt(3) == 0 ? -value : value;
            boolean aside = random.nextInt(5) == 0;
            if (aside) {
                // a mass of nothing is always set aside
                double nothing = random.nextInt(3) == 0 ? -0.0 : signed;
                builder.addSetAside(seconds, nothing, k, letters());
            } else {
                builder.add(seconds, signed, k);
            }
        }
        return builder.build();
    }
}
