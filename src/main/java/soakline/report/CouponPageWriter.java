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
import soakline.report.CouponPage.Contribution;
import soakline.report.CouponPage.Fact;
import soakline.report.CouponPage.Mark;
import soakline.report.CouponPage.ParameterRow;
import soakline.report.CouponPage.Result;
import soakline.specimen.ContentSeries;
import soakline.specimen.Edges;
import soakline.specimen.Faces;
import soakline.specimen.Facts;
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
                writer.facts(),
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
            case FAIL -> "Not Fickian: an apparent D only";
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

    private List<Fact> facts() {
        Facts facts = assessment.run().facts();
        List<Fact> list = new ArrayList<>();
        if (!assessment.run().source().isEmpty()) {
            list.add(new Fact("File", assessment.run().source()));
        }
        facts.thickness().ifPresent(q -> list.add(new Fact("Thickness", q.toString())));
        facts.faces().ifPresent(f -> list.add(new Fact("Faces exposed", f == Faces.BOTH ? "both" : "one")));
        list.add(new Fact("Edges", facts.edges().filter(e -> e == Edges.BARE).isPresent() ? "bare" : "sealed"));
        facts.width().ifPresent(q -> list.add(new Fact("Width", q.toString())));
        facts.length().ifPresent(q -> list.add(new Fact("Length", q.toString())));
        facts.dryMass().ifPresent(q -> list.add(new Fact("Dry mass", q.toString())));
        facts.temperature().ifPresent(q -> list.add(new Fact("Temperature", q.toString())));
        facts.medium().ifPresent(m -> list.add(new Fact("Medium", m)));
        facts.balance().ifPresent(q -> list.add(new Fact("Balance, one weighing", "± " + q)));
        list.add(new Fact("Direction", assessment.direction().code()));
        list.add(new Fact("Content relative to", reference()));
        facts.note().ifPresent(n -> list.add(new Fact("Note", n)));
        facts.other().forEach(o -> list.add(new Fact(o.name(), o.value())));
        return list;
    }

    private String reference() {
        ContentSeries data = assessment.estimate().task().data();
        return switch (data.reference()) {
            case DRY_MASS -> "the dry mass";
            case FIRST_WEIGHING -> "the first weighing";
            case AS_GIVEN -> "as given in the file";
        };
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

    private String combined() {
        if (!assessment.determined() || assessment.combined().isEmpty()) {
            return "";
        }
        CombinedUncertainty c = assessment.combined().get();
        double u = c.standardUncertainty();
        double d = assessment
                .parameter(DIFFUSIVITY)
                .map(ParameterResult::value)
                .orElse(OptionalDouble.empty())
                .orElse(u);
        double freedom = c.effectiveDegreesOfFreedom();
        return "With the stated uncertainties of its lengths, " + symbol() + " has the standard uncertainty "
                + Scientific.value(u, u) + " " + D_UNIT.symbol() + " and the " + level(c.level()) + " interval "
                + Scientific.interval(d, c.low(), c.high()) + " " + D_UNIT.symbol()
                + (Double.isFinite(freedom)
                        ? " (" + Numbers.significant(freedom, 3) + " effective degrees of freedom)."
                        : ".");
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
                        ? "residual standard deviation " + Scientific.value(deviation, deviation / 10) + " %"
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

    private CheckRow check(Check check) {
        String classic = "";
        if (assessment.determined() && check.diffusivity().isPresent()) {
            double d = check.diffusivity().getAsDouble();
            boolean closed = check.low().isPresent() && check.high().isPresent();
            double error = closed ? (check.high().getAsDouble() - check.low().getAsDouble()) / 4 : Double.NaN;
            classic = symbol() + " by this check alone: " + Scientific.value(d, error) + " " + D_UNIT.symbol()
                    + (closed ? ", " + Scientific.interval(d, check.low(), check.high()) : "");
        }
        return new CheckRow(
                mark(check.verdict()), capital(check.name().words()), Wording.sentence(check.finding()) + ".", classic);
    }

    private static String capital(String words) {
        return words.substring(0, 1).toUpperCase(Locale.ROOT) + words.substring(1);
    }
}
