package soakline.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import soakline.estimate.Estimate;
import soakline.estimate.Parameter;
import soakline.inference.Assessment;
import soakline.inference.Check;
import soakline.inference.CombinedUncertainty;
import soakline.inference.CombinedUncertainty.Contribution;
import soakline.inference.Interval;
import soakline.inference.ParameterResult;
import soakline.inference.Verdict;
import soakline.problem.Finding;
import soakline.quantity.Numbers;
import soakline.quantity.ResultUnit;
import soakline.specimen.Edges;
import soakline.specimen.Faces;
import soakline.specimen.Facts;
import soakline.wording.Wording;

/** One coupon for people. */
final class CouponText {

    private static final int NAME = 25;
    private static final int VALUE = 20;
    private static final int ERROR = 17;
    private static final int VERDICT = 13;
    private static final double PERCENT = 100;
    private static final double FAR_TOO_LARGE = 100;

    private final Assessment assessment;
    private final TextLines lines;

    CouponText(Assessment assessment, TextLines lines) {
        this.assessment = assessment;
        this.lines = lines;
    }

    void write() {
        coupon();
        verdict();
        parameters();
        assessment.combined().filter(c -> assessment.determined()).ifPresent(this::combined);
        fit();
        checks();
        sentences("Problems", assessment.problems());
        sentences("Cautions", assessment.cautions());
        sentences("Notes", assessment.notes());
    }

    private void coupon() {
        String source = assessment.run().source();
        String name = assessment.run().name();
        lines.wrapped("", source.isEmpty() || source.equals(name) ? name : name + " (" + source + ")");
        Facts facts = assessment.run().facts();
        List<String> known = new ArrayList<>();
        known.add(assessment.direction().code());
        facts.thickness().ifPresent(q -> known.add("thickness " + q));
        facts.faces().ifPresent(f -> known.add(f == Faces.BOTH ? "both faces exposed" : "one face exposed"));
        known.add(facts.edges().filter(e -> e == Edges.BARE).isPresent() ? "edges bare" : "edges sealed");
        facts.width().ifPresent(q -> known.add("width " + q));
        facts.length().ifPresent(q -> known.add("length " + q));
        facts.temperature().ifPresent(q -> known.add("temperature " + q));
        facts.medium().ifPresent(m -> known.add("medium " + m));
        facts.dryMass().ifPresent(q -> known.add("dry mass " + q));
        facts.balance().ifPresent(q -> known.add("balance " + q));
        facts.other().forEach(o -> known.add(o.name() + " " + o.value()));
        lines.listed("  ", known);
        facts.note().ifPresent(n -> lines.wrapped("  note: ", n));
    }

    private void verdict() {
        String usable = assessment.usable() ? "usable" : "NOT USABLE";
        String determined = assessment.determined() ? "" : " D is not determined.";
        lines.blank();
        lines.wrapped("  Result: ", usable + "." + determined + " " + Wording.text(assessment.fickianFinding()));
    }

    private void parameters() {
        lines.blank();
        lines.line("  " + TextLines.cell("", NAME) + TextLines.cell("value", VALUE)
                + TextLines.cell("standard error", ERROR) + intervalHead());
        for (ParameterResult result : assessment.parameters()) {
            Parameter parameter = result.parameter();
            ResultUnit unit = parameter.unit();
            double error = unit.fromSi(result.standardError().orElse(Double.NaN));
            String value = "not determined";
            if (result.value().isPresent()) {
                double shown = unit.fromSi(result.value().getAsDouble());
                value = (result.fixed() ? Numbers.shortest(shown) : Numbers.toUncertainty(shown, error)) + " "
                        + unit.symbol();
            }
            String errorText = Double.isFinite(error) ? Numbers.significant(error, 2) + " " + unit.symbol() : "";
            String last =
                    result.interval().map(i -> interval(i, unit, error)).orElse(result.fixed() ? "held fixed" : "");
            lines.line("  " + TextLines.cell(ParameterWords.of(parameter, assessment.isApparent()), NAME)
                    + TextLines.cell(value, VALUE) + TextLines.cell(errorText, ERROR) + last);
        }
    }

    private String intervalHead() {
        return assessment.parameters().stream()
                .map(ParameterResult::interval)
                .flatMap(Optional::stream)
                .findFirst()
                .map(i -> percent(i.level()) + " interval, " + i.method().code())
                .orElse("");
    }

    private static String interval(Interval interval, ResultUnit unit, double error) {
        return interval(in(unit, interval.low()), in(unit, interval.high()), error);
    }

    /** The limits in the unit of the value; a side that is open is said in words. */
    static String interval(OptionalDouble low, OptionalDouble high, double error) {
        if (low.isEmpty() && high.isEmpty()) {
            return "no lower and no upper limit";
        }
        if (low.isEmpty()) {
            return "no lower limit, up to " + limit(high.getAsDouble(), error);
        }
        if (high.isEmpty()) {
            return "from " + limit(low.getAsDouble(), error) + ", no upper limit";
        }
        return limit(low.getAsDouble(), error) + " to " + limit(high.getAsDouble(), error);
    }

    private static String limit(double value, double error) {
        // an interval that is open on a side goes with an error too large to round by
        return error > 0 && error < FAR_TOO_LARGE * Math.abs(value)
                ? Numbers.toUncertainty(value, error)
                : Numbers.significant(value, 3);
    }

    private static OptionalDouble in(ResultUnit unit, OptionalDouble si) {
        return si.isPresent() ? OptionalDouble.of(unit.fromSi(si.getAsDouble())) : si;
    }

    private void combined(CombinedUncertainty combined) {
        String symbol = assessment.isApparent() ? "apparent D" : "D";
        String unit = " " + ResultUnit.SQUARE_METRE_PER_SECOND.symbol();
        double u = combined.standardUncertainty();
        lines.blank();
        lines.wrapped(
                "  Combined: ",
                "standard uncertainty of " + symbol + " " + Numbers.significant(u, 2) + unit + ", "
                        + percent(combined.level()) + " interval "
                        + interval(combined.low(), combined.high(), u) + unit);
        lines.line("    " + TextLines.cell("source", NAME - 2) + TextLines.cell("share", VALUE)
                + TextLines.cell("sensitivity", VALUE) + "relative uncertainty");
        for (Contribution c : combined.contributions()) {
            lines.line("    " + TextLines.cell(c.source(), NAME - 2)
                    + TextLines.cell(Numbers.significant(c.share() * PERCENT, 3) + " %", VALUE)
                    + TextLines.cell(Numbers.significant(c.sensitivity(), 3), VALUE)
                    + Numbers.significant(c.relativeUncertainty() * PERCENT, 2) + " %");
        }
    }

    private void fit() {
        Estimate estimate = assessment.estimate();
        int used = estimate.task().data().size();
        double deviation = ResultUnit.PERCENT.fromSi(estimate.residualStandardDeviation());
        lines.blank();
        lines.wrapped(
                "  Fit: ",
                "model " + estimate.model().name() + ", " + used + " of "
                        + assessment.run().weighings().size() + " weighings used, " + estimate.degreesOfFreedom()
                        + " degrees of freedom, "
                        + (estimate.isOptimum()
                                ? "residual standard deviation " + Numbers.significant(deviation, 3) + " %"
                                : "not converged")
                        + ", " + estimate.evaluations() + " evaluations");
    }

    private void checks() {
        lines.blank();
        lines.line("  Checks");
        for (Check check : assessment.checks()) {
            StringBuilder words = new StringBuilder(check.name().words());
            words.append(": ").append(Wording.text(check.finding()));
            if (assessment.determined() && check.diffusivity().isPresent()) {
                words.append(classic(check));
            }
            lines.wrapped("    " + TextLines.cell(word(check.verdict()), VERDICT), words.toString());
        }
    }

    /** What the classic formula of a check gives. */
    private String classic(Check check) {
        double d = check.diffusivity().getAsDouble();
        double error = check.low().isPresent() && check.high().isPresent()
                ? (check.high().getAsDouble() - check.low().getAsDouble()) / 4
                : Double.NaN;
        String symbol = assessment.isApparent() ? " Apparent D " : " D ";
        String unit = " " + ResultUnit.SQUARE_METRE_PER_SECOND.symbol();
        String value =
                symbol + (Double.isFinite(error) ? Numbers.toUncertainty(d, error) : Numbers.significant(d, 3)) + unit;
        return Double.isFinite(error) ? value + " (" + interval(check.low(), check.high(), error) + ")." : value + ".";
    }

    private void sentences(String head, List<Finding> findings) {
        if (findings.isEmpty()) {
            return;
        }
        lines.blank();
        lines.line("  " + head);
        for (Finding finding : findings) {
            lines.wrapped("    - ", Wording.text(finding));
        }
    }

    private static String word(Verdict verdict) {
        return verdict == Verdict.UNKNOWN ? "not judged" : verdict.code();
    }

    private static String percent(double fraction) {
        return Numbers.shortest(fraction * PERCENT) + " %";
    }
}
