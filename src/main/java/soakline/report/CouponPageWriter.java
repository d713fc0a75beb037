package soakline.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import java.util.function.UnaryOperator;
import soakline.estimate.Estimate;
import soakline.estimate.Parameter;
import soakline.inference.Assessment;
import soakline.inference.Check;
import soakline.inference.CombinedUncertainty;
import soakline.inference.Interval;
import soakline.inference.ParameterResult;
import soakline.inference.Verdict;
import soakline.problem.Finding;
import soakline.quantity.Numbers;
import soakline.quantity.ResultUnit;
import soakline.quantity.Scientific;
import soakline.report.CouponPage.CheckRow;
import soakline.report.CouponPage.Combined;
import soakline.report.CouponPage.Contribution;
import soakline.report.CouponPage.Mark;
import soakline.report.CouponPage.ParameterRow;
import soakline.report.CouponPage.Result;
import soakline.wording.Wording;

/** Turns an assessment into a {@link CouponPage}. */
final class CouponPageWriter {

    private static final int LONGEST_NAME = 120;
    private static final double PERCENT = 100;
    private static final String NOTHING = "–";
    private static final String DIFFUSIVITY = "diffusivity";
    private static final ResultUnit D_UNIT = ResultUnit.SQUARE_METRE_PER_SECOND;

    private final Assessment assessment;

    private CouponPageWriter(Assessment assessment) {
        this.assessment = assessment;
    }

    /**
     * The page of a coupon.
     *
     * @param anchor name of its place
     * @param drawings makes the picture, given what it shows in words for those who cannot see it
     */
    static CouponPage write(Assessment assessment, String anchor, UnaryOperator<String> drawings) {
        CouponPageWriter writer = new CouponPageWriter(assessment);
        String whole = assessment.run().name();
        String name = InertText.shortened(whole, LONGEST_NAME);
        return new CouponPage(
                anchor,
                name,
                name.equals(whole) ? "" : whole,
                writer.verdict(),
                writer.headline(),
                writer.sentence(),
                writer.results(),
                writer.overview(),
                sentences(assessment.problems()),
                FactRows.of(assessment),
                assessment.parameters().stream().map(writer::parameter).toList(),
                writer.intervalHead(),
                writer.combined(),
                writer.contributions(),
                writer.fit(),
                new Markup(drawings.apply(writer.figure())),
                assessment.checks().stream().map(writer::check).toList(),
                WeighingTable.of(assessment),
                sentences(assessment.notes()),
                sentences(assessment.cautions()));
    }

    private static List<String> sentences(List<Finding> findings) {
        return findings.stream().map(f -> Wording.withPlace(f) + ".").toList();
    }

    static Mark mark(Verdict verdict) {
        return switch (verdict) {
            case PASS -> new Mark("pass", "✓", "pass");
            case CAUTION -> new Mark("caution", "▲", "caution");
            case FAIL -> new Mark("fail", "✕", "fail");
            case UNKNOWN -> new Mark("unknown", "○", "not judged");
        };
    }

    Mark verdict() {
        return mark(assessment.determined() && assessment.usable() ? assessment.fickian() : Verdict.FAIL);
    }

    /** The verdict in a few plain words. */
    String headline() {
        if (!assessment.determined()) {
            return "D is not determined";
        }
        if (!assessment.usable()) {
            return "Not usable";
        }
        return switch (assessment.fickian()) {
            case PASS -> "Usable";
            case CAUTION -> "Usable with caution";
            case FAIL -> "An apparent D only";
            case UNKNOWN -> "Usable, with Fick’s law not judged";
        };
    }

    private String sentence() {
        return assessment.determined()
                ? Wording.sentence(assessment.fickianFinding()) + "."
                : "No diffusivity can be given from these weighings.";
    }

    List<Result> results() {
        List<Result> results = new ArrayList<>();
        if (assessment.determined()) {
            assessment
                    .parameter(DIFFUSIVITY)
                    .filter(p -> p.value().isPresent())
                    .ifPresent(p -> results.add(result(symbol(), p)));
            assessment
                    .parameter(Parameter.EQUILIBRIUM_CONTENT.name())
                    .filter(p -> p.value().isPresent())
                    .ifPresent(p -> results.add(result("M∞", p)));
        } else {
            assessment
                    .parameter(Parameter.INITIAL_SLOPE.name())
                    .filter(p -> p.value().isPresent())
                    .ifPresent(p -> results.add(result("initial slope", p)));
        }
        return results;
    }

    private List<String> overview() {
        List<String> cells = new ArrayList<>();
        for (String name : List.of(DIFFUSIVITY, Parameter.EQUILIBRIUM_CONTENT.name())) {
            cells.add(assessment
                    .parameter(name)
                    .filter(p -> assessment.determined() && p.value().isPresent())
                    .map(p -> value(p) + " " + p.parameter().unit().symbol())
                    .orElse("not determined"));
        }
        return cells;
    }

    private Result result(String symbol, ParameterResult p) {
        ResultUnit unit = p.parameter().unit();
        String interval = p.fixed() || p.interval().isEmpty()
                ? (p.fixed() ? "held fixed" : "")
                : level(p.interval().get().level()) + " interval " + interval(p) + " " + unit.symbol();
        return new Result(symbol, value(p) + " " + unit.symbol(), interval);
    }

    private String symbol() {
        return assessment.isApparent() ? "apparent D" : "D";
    }

    private static String value(ParameterResult p) {
        ResultUnit unit = p.parameter().unit();
        double value = unit.fromSi(p.value().orElseThrow());
        // what was typed in is shown so, to its last digit
        return p.fixed()
                ? Scientific.exact(value)
                : Scientific.value(value, unit.fromSi(p.standardError().orElse(Double.NaN)));
    }

    private static String interval(ParameterResult p) {
        ResultUnit unit = p.parameter().unit();
        Interval interval = p.interval().orElseThrow();
        return Scientific.interval(
                unit.fromSi(p.value().orElseThrow()), in(unit, interval.low()), in(unit, interval.high()));
    }

    private static OptionalDouble in(ResultUnit unit, OptionalDouble si) {
        return si.isPresent() ? OptionalDouble.of(unit.fromSi(si.getAsDouble())) : si;
    }

    private static String level(double level) {
        return Numbers.shortest(level * PERCENT) + " %";
    }

    private String intervalHead() {
        return assessment.parameters().stream()
                .flatMap(p -> p.interval().stream())
                .findFirst()
                .map(i -> level(i.level()) + " interval, " + i.method().code())
                .orElse("Interval");
    }

    private ParameterRow parameter(ParameterResult p) {
        String name = ParameterWords.of(p.parameter(), assessment.isApparent());
        if (p.value().isEmpty()) {
            return new ParameterRow(name, "not determined", NOTHING, NOTHING, "");
        }
        ResultUnit unit = p.parameter().unit();
        double error = unit.fromSi(p.standardError().orElse(Double.NaN));
        String interval = p.fixed() ? "held fixed" : p.interval().isPresent() ? interval(p) : NOTHING;
        return new ParameterRow(
                name, value(p), error > 0 ? Scientific.value(error, error) : NOTHING, interval, unit.symbol());
    }

    private List<Combined> combined() {
        OptionalDouble d =
                assessment.parameter(DIFFUSIVITY).map(ParameterResult::value).orElse(OptionalDouble.empty());
        if (!assessment.determined() || assessment.combined().isEmpty() || d.isEmpty()) {
            return List.of();
        }
        CombinedUncertainty c = assessment.combined().get();
        double u = c.standardUncertainty();
        double freedom = c.effectiveDegreesOfFreedom();
        return List.of(new Combined(
                symbol(),
                Scientific.value(u, u) + " " + D_UNIT.symbol(),
                level(c.level()),
                Scientific.interval(d.getAsDouble(), c.low(), c.high()) + " " + D_UNIT.symbol(),
                Double.isFinite(freedom) ? Numbers.significant(freedom, 3) : "very many"));
    }

    private List<Contribution> contributions() {
        List<Contribution> rows = new ArrayList<>();
        if (assessment.determined()) {
            assessment.combined().ifPresent(c -> c.contributions().forEach(part -> rows.add(contribution(part))));
        }
        return rows;
    }

    private static Contribution contribution(CombinedUncertainty.Contribution part) {
        double percent = part.share() * PERCENT;
        return new Contribution(
                capital(part.source()),
                Numbers.significant(percent, 3) + " %",
                Long.toString(Math.round(percent)),
                Numbers.significant(part.sensitivity(), 3),
                Numbers.significant(part.relativeUncertainty() * PERCENT, 2) + " %");
    }

    private String fit() {
        Estimate estimate = assessment.estimate();
        double deviation = ResultUnit.PERCENT.fromSi(estimate.residualStandardDeviation());
        return "Model " + estimate.model().name() + ", "
                + estimate.task().data().size() + " of "
                + assessment.run().weighings().size() + " weighings used, " + estimate.degreesOfFreedom()
                + " degrees of freedom, "
                + (estimate.isOptimum()
                        ? "residual standard deviation " + Scientific.value(deviation, deviation / 10) + "\u00a0%"
                        : "not converged")
                + ", " + estimate.evaluations() + " evaluations.";
    }

    private String figure() {
        String parts = "Content in percent against the square root of time: the weighings";
        if (assessment.estimate().isOptimum()) {
            parts += ", the fitted curve";
        }
        if (assessment.shortTimeLine().isPresent()) {
            parts += ", the short-time line";
        }
        if (assessment.determined()) {
            parts += ", the plateau";
        }
        return parts
                + (assessment.estimate().isOptimum()
                        ? "; below, the residuals on the same axis, between dotted lines at one standard deviation."
                        : ".");
    }

    private static String bracketed(String interval) {
        return interval.startsWith("(") ? interval : "(" + interval + ")";
    }

    private CheckRow check(Check check) {
        String classic = "";
        String interval = "";
        if (assessment.determined() && check.diffusivity().isPresent()) {
            double d = check.diffusivity().getAsDouble();
            boolean closed = check.low().isPresent() && check.high().isPresent();
            double error = closed ? (check.high().getAsDouble() - check.low().getAsDouble()) / 4 : Double.NaN;
            classic = symbol() + " = " + Scientific.value(d, error) + " " + D_UNIT.symbol();
            interval = closed ? bracketed(Scientific.interval(d, check.low(), check.high())) : "";
        }
        return new CheckRow(
                mark(check.verdict()),
                capital(check.name().words()),
                Wording.sentence(check.finding()) + ".",
                classic,
                interval);
    }

    private static String capital(String words) {
        return words.substring(0, 1).toUpperCase(Locale.ROOT) + words.substring(1);
    }
}
