package soakline.window.present;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;
import java.util.stream.Collectors;
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
import soakline.specimen.Edges;
import soakline.specimen.Faces;
import soakline.specimen.Facts;
import soakline.window.present.Findings.CheckLine;
import soakline.window.present.Findings.Headline;
import soakline.window.present.Findings.Row;
import soakline.wording.Wording;

/** Turns an assessment into {@link Findings}. */
final class FindingsWriter {

    private static final String NOT_DETERMINED = "not determined";
    private static final String NOTHING = "–";
    private static final double PERCENT = 100;

    private final Assessment assessment;

    private FindingsWriter(Assessment assessment) {
        this.assessment = assessment;
    }

    static Findings write(Assessment assessment) {
        FindingsWriter writer = new FindingsWriter(assessment);
        return new Findings(
                writer.headline(),
                sentences(assessment.problems()),
                writer.intervalHead(),
                writer.parameters(),
                writer.contributions(),
                assessment.checks().stream().map(writer::check).toList(),
                sentences(assessment.cautions()),
                sentences(assessment.notes()),
                writer.coupon());
    }

    private static List<String> sentences(List<Finding> findings) {
        return findings.stream().map(Wording::text).toList();
    }

    private Headline headline() {
        Optional<ParameterResult> d =
                assessment.parameter("diffusivity").filter(p -> p.value().isPresent());
        if (!assessment.determined() || d.isEmpty()) {
            return new Headline(Verdict.FAIL, "D not determined", "No diffusivity can be given from these weighings.");
        }
        String fickian = Wording.text(assessment.fickianFinding());
        return new Headline(assessment.fickian(), symbol() + " = " + valueWithUnit(d.get()), fickian);
    }

    private String symbol() {
        return assessment.isApparent() ? "apparent D" : "D";
    }

    private String intervalHead() {
        return assessment.parameters().stream()
                .flatMap(p -> p.interval().stream())
                .findFirst()
                .map(i -> level(i.level()) + " interval")
                .orElse("interval");
    }

    private static String level(double level) {
        return Numbers.shortest(level * PERCENT) + " %";
    }

    private List<Row> parameters() {
        List<Row> rows = new ArrayList<>();
        for (ParameterResult result : assessment.parameters()) {
            rows.add(new Row(
                    name(result.parameter().name()),
                    result.value().isPresent() ? valueWithUnit(result) : NOT_DETERMINED,
                    interval(result)));
            if (result.parameter().name().equals("diffusivity")) {
                assessment.combined().ifPresent(c -> rows.add(combined(c, result)));
            }
        }
        return rows;
    }

    private String name(String parameter) {
        return switch (parameter) {
            case "diffusivity" -> assessment.isApparent() ? "apparent D" : "D, diffusivity";
            case "equilibriumContent" -> "M∞, equilibrium";
            case "startContent" -> "M0, start";
            case "initialSlope" -> "initial slope";
            default -> parameter;
        };
    }

    private Row combined(CombinedUncertainty combined, ParameterResult d) {
        double value = d.value().orElse(0);
        return new Row(symbol() + ", combined", "", Scientific.interval(value, combined.low(), combined.high()));
    }

    private static String valueWithUnit(ParameterResult result) {
        ResultUnit unit = result.parameter().unit();
        double error = unit.fromSi(result.standardError().orElse(Double.NaN));
        return Scientific.value(unit.fromSi(result.value().orElseThrow()), error) + " " + unit.symbol();
    }

    private static String interval(ParameterResult result) {
        if (result.fixed()) {
            return "fixed";
        }
        if (result.interval().isEmpty() || result.value().isEmpty()) {
            return NOTHING;
        }
        ResultUnit unit = result.parameter().unit();
        Interval interval = result.interval().get();
        return Scientific.interval(
                unit.fromSi(result.value().getAsDouble()),
                in(unit::fromSi, interval.low()),
                in(unit::fromSi, interval.high()));
    }

    private static OptionalDouble in(DoubleUnaryOperator unit, OptionalDouble si) {
        return si.isEmpty() ? si : OptionalDouble.of(unit.applyAsDouble(si.getAsDouble()));
    }

    private String contributions() {
        return assessment
                .combined()
                .map(c -> c.contributions().stream()
                        .map(s -> s.source() + " " + Numbers.significant(s.share() * PERCENT, 2) + " %")
                        .collect(Collectors.joining(", ", "Combined variance of D: ", "")))
                .orElse("");
    }

    private CheckLine check(Check check) {
        String detail = "";
        if (check.diffusivity().isPresent()) {
            double d = check.diffusivity().getAsDouble();
            boolean closed = check.low().isPresent() && check.high().isPresent();
            double error = closed ? (check.high().getAsDouble() - check.low().getAsDouble()) / 4 : Double.NaN;
            detail = symbol() + " = " + Scientific.value(d, error) + " m²/s"
                    + (closed ? ", " + Scientific.interval(d, check.low(), check.high()) : "");
        }
        return new CheckLine(
                check.verdict(),
                word(check.verdict()),
                capital(check.name().words()),
                Wording.text(check.finding()),
                detail);
    }

    /** The verdict as a word for people. */
    static String word(Verdict verdict) {
        return verdict == Verdict.UNKNOWN ? "not judged" : verdict.code();
    }

    private List<Row> coupon() {
        Facts facts = assessment.run().facts();
        List<Row> rows = new ArrayList<>();
        facts.thickness().ifPresent(q -> rows.add(new Row("thickness", q.toString(), "")));
        facts.faces().ifPresent(f -> rows.add(new Row("faces exposed", f == Faces.BOTH ? "both" : "one", "")));
        String edges = facts.edges().filter(e -> e == Edges.BARE).isPresent() ? "bare" : "sealed";
        rows.add(new Row("edges", edges, ""));
        facts.width().ifPresent(q -> rows.add(new Row("width", q.toString(), "")));
        facts.length().ifPresent(q -> rows.add(new Row("length", q.toString(), "")));
        facts.dryMass().ifPresent(q -> rows.add(new Row("dry mass", q.toString(), "")));
        facts.temperature().ifPresent(q -> rows.add(new Row("temperature", q.toString(), "")));
        facts.medium().ifPresent(m -> rows.add(new Row("medium", m, "")));
        facts.balance().ifPresent(q -> rows.add(new Row("balance", q.toString(), "")));
        facts.note().ifPresent(n -> rows.add(new Row("note", n, "")));
        facts.other().forEach(o -> rows.add(new Row(o.name(), o.value(), "")));
        rows.add(new Row("direction", assessment.direction().code(), ""));
        return rows;
    }

    private static String capital(String words) {
        return words.substring(0, 1).toUpperCase(Locale.ROOT) + words.substring(1);
    }
}
