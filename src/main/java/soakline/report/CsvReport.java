package soakline.report;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import org.apache.commons.csv.CSVFormat;
import soakline.campaign.Replicates;
import soakline.estimate.Parameter;
import soakline.inference.Assessment;
import soakline.inference.CombinedUncertainty;
import soakline.inference.Interval;
import soakline.inference.ParameterResult;
import soakline.problem.Finding;
import soakline.quantity.ResultUnit;
import soakline.wording.Wording;

/**
 * One row for each coupon and parameter and, with several coupons, rows for mean, standard deviation and number over them.
 * Numbers in SI with contents in percent and in full precision; an empty cell is not known, open or not determined.
 *
 * <p>Safe to open in a spreadsheet: a text that would be taken for a formula is made inert with an apostrophe in front.
 */
public final class CsvReport {

    private static final String[] HEADER = {
        "row",
        "specimen",
        "source",
        "model",
        "direction",
        "parameter",
        "words",
        "unit",
        "value",
        "standardError",
        "fixed",
        "level",
        "method",
        "low",
        "high",
        "combinedStandardUncertainty",
        "combinedLow",
        "combinedHigh",
        "usable",
        "fickian",
        "problems",
        "cautions"
    };
    private static final String NOTHING = "";
    private static final CSVFormat FORMAT =
            CSVFormat.RFC4180.builder().setRecordSeparator("\n").get();

    private final StringBuilder text = new StringBuilder();

    private CsvReport() {}

    public static String write(List<Assessment> assessments) {
        CsvReport report = new CsvReport();
        report.record((Object[]) HEADER);
        for (Assessment assessment : assessments) {
            for (ParameterResult result : assessment.parameters()) {
                report.coupon(assessment, result);
            }
        }
        if (assessments.size() > 1) {
            report.replicates(Replicates.of(assessments));
        }
        return report.text.toString();
    }

    private void record(Object... cells) {
        text.append(FORMAT.format(cells)).append('\n');
    }

    private void coupon(Assessment a, ParameterResult result) {
        Parameter parameter = result.parameter();
        ResultUnit unit = parameter.unit();
        Optional<Interval> interval = result.interval();
        Optional<CombinedUncertainty> combined =
                a.combined().filter(c -> a.determined() && parameter.name().equals("diffusivity") && !result.fixed());
        record(
                "coupon",
                inert(a.run().name()),
                inert(a.run().source()),
                a.estimate().model().name(),
                a.direction().code(),
                parameter.name(),
                result.value().isPresent()
                        ? ParameterWords.of(parameter, a.isApparent())
                        : ParameterWords.of(parameter, a.isApparent()) + ", not determined",
                unit.code(),
                cell(result.value(), unit),
                cell(result.standardError(), unit),
                result.fixed(),
                interval.map(i -> Double.toString(i.level())).orElse(NOTHING),
                interval.map(i -> i.method().code()).orElse(NOTHING),
                interval.map(i -> cell(i.low(), unit)).orElse(NOTHING),
                interval.map(i -> cell(i.high(), unit)).orElse(NOTHING),
                combined.map(c -> cell(OptionalDouble.of(c.standardUncertainty()), unit))
                        .orElse(NOTHING),
                combined.map(c -> cell(c.low(), unit)).orElse(NOTHING),
                combined.map(c -> cell(c.high(), unit)).orElse(NOTHING),
                a.usable(),
                a.fickian().code(),
                sentences(a.problems()),
                sentences(a.cautions()));
    }

    private void replicates(Replicates replicates) {
        for (Replicates.Spread spread : replicates.spreads()) {
            ResultUnit unit = spread.parameter().unit();
            String[] cells = new String[HEADER.length];
            Arrays.fill(cells, NOTHING);
            cells[column("specimen")] = "the usable ones of " + replicates.coupons() + " coupons";
            cells[column("parameter")] = spread.parameter().name();
            cells[column("words")] = ParameterWords.of(spread.parameter(), replicates.apparent());
            if (!replicates.differences().isEmpty()) {
                cells[column("problems")] = Wording.sentence(ReplicateWords.unlike(replicates.differences()));
            }
            statistic("mean", cell(OptionalDouble.of(spread.mean()), unit), unit, cells);
            statistic("standardDeviation", cell(spread.standardDeviation(), unit), unit, cells);
            statistic("number", Integer.toString(spread.number()), ResultUnit.NONE, cells);
        }
    }

    private void statistic(String row, String value, ResultUnit unit, String[] common) {
        String[] cells = common.clone();
        cells[column("row")] = row;
        cells[column("value")] = value;
        cells[column("unit")] = unit.code();
        record((Object[]) cells);
    }

    private static int column(String name) {
        return Arrays.asList(HEADER).indexOf(name);
    }

    private static String cell(OptionalDouble si, ResultUnit unit) {
        double value = si.isPresent() ? unit.fromSi(si.getAsDouble()) : Double.NaN;
        return Double.isFinite(value) ? Double.toString(value) : NOTHING;
    }

    private static String sentences(List<Finding> findings) {
        return inert(findings.stream().map(Wording::sentence).collect(Collectors.joining(". ")));
    }

    /** A text that no spreadsheet takes for a formula. */
    static String inert(String text) {
        boolean formula = !text.isEmpty() && "=+-@\t\r\n".indexOf(text.charAt(0)) >= 0;
        return formula ? "'" + text : text;
    }
}
