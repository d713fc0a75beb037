package soakline.report;

import java.time.ZonedDateTime;
import java.time.format.DateTimeFormatter;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import soakline.campaign.Replicates;
import soakline.inference.Assessment;
import soakline.inference.IntervalMethod;
import soakline.quantity.ResultUnit;
import soakline.quantity.Scientific;
import soakline.specimen.Edges;
import soakline.wording.Wording;

/**
 * A report as its template shows it.
 *
 * @param forPdf whether it becomes a PDF
 * @param hasUnshown whether it has letters that the fonts of a PDF lack
 * @param footer what the foot of each page says beside its number
 * @param several whether there is more than one coupon
 * @param rank of the headings of a coupon's parts
 * @param unlike what the coupons differ in; empty when in nothing
 */
record ReportPage(
        boolean forPdf,
        boolean hasUnshown,
        Markup css,
        String title,
        String subject,
        String program,
        String made,
        String footer,
        String heading,
        boolean several,
        int rank,
        List<SpreadRow> spreads,
        String unlike,
        List<CouponPage> coupons,
        List<SourceFile> files,
        Method method) {

    private static final int LONGEST_IN_TITLE = 45;
    private static final DateTimeFormatter DATE = DateTimeFormatter.ofPattern("uuuu-MM-dd HH:mm", Locale.ROOT);

    /** A parameter over several coupons. */
    record SpreadRow(String name, String mean, String deviation, String number) {}

    /** Which parts of the method were used. */
    record Method(boolean bareEdges, boolean profile, boolean linearised, boolean combined, boolean notDetermined) {

        static Method of(List<Assessment> assessments) {
            return new Method(
                    assessments.stream()
                            .anyMatch(a -> a.run()
                                    .facts()
                                    .edges()
                                    .filter(e -> e == Edges.BARE)
                                    .isPresent()),
                    uses(assessments, IntervalMethod.PROFILE),
                    uses(assessments, IntervalMethod.LINEARISED),
                    assessments.stream()
                            .anyMatch(a -> a.determined() && a.combined().isPresent()),
                    assessments.stream().anyMatch(a -> !a.determined()));
        }

        private static boolean uses(List<Assessment> assessments, IntervalMethod method) {
            return assessments.stream()
                    .flatMap(a -> a.parameters().stream())
                    .flatMap(p -> p.interval().stream())
                    .anyMatch(i -> i.method() == method);
        }
    }

    static ReportPage of(ReportInput input, boolean forPdf, Markup css, List<CouponPage> coupons) {
        boolean several = coupons.size() > 1;
        String heading = several
                ? "Report on " + coupons.size() + " coupons"
                : coupons.get(0).name();
        String called = InertText.shortened(InertText.of(heading), LONGEST_IN_TITLE);
        Replicates replicates = Replicates.of(input.assessments());
        return new ReportPage(
                forPdf,
                false,
                css,
                called + " – Soakline report",
                "Diffusivity and equilibrium content from weighings, with intervals and checks",
                ProgramVersion.text(),
                date(input.made()),
                several ? InertText.shortened(names(coupons), LONGEST_IN_TITLE) : called,
                heading,
                several,
                several ? 3 : 2,
                spreads(replicates),
                replicates.differences().isEmpty()
                        ? ""
                        : Wording.sentence(ReplicateWords.unlike(replicates.differences())) + ".",
                coupons,
                input.files(),
                Method.of(input.assessments()));
    }

    /** The same, saying that some letters are not shown. */
    ReportPage withUnshown() {
        return new ReportPage(
                forPdf, true, css, title, subject, program, made, footer, heading, several, rank, spreads, unlike,
                coupons, files, method);
    }

    boolean hasSpreads() {
        return !spreads.isEmpty();
    }

    private static String names(List<CouponPage> coupons) {
        return coupons.stream().map(c -> InertText.of(c.name())).collect(Collectors.joining(", "));
    }

    private static String date(ZonedDateTime made) {
        String offset = made.getOffset().getId();
        return DATE.format(made) + (offset.equals("Z") ? " UTC" : " UTC" + offset);
    }

    private static List<SpreadRow> spreads(Replicates replicates) {
        List<SpreadRow> rows = new ArrayList<>();
        for (Replicates.Spread spread : replicates.spreads()) {
            ResultUnit unit = spread.parameter().unit();
            double deviation = unit.fromSi(spread.standardDeviation().orElse(Double.NaN));
            rows.add(new SpreadRow(
                    ParameterWords.of(spread.parameter(), replicates.apparent()),
                    Scientific.value(unit.fromSi(spread.mean()), deviation) + " " + unit.symbol(),
                    deviation > 0 ? Scientific.value(deviation, deviation) + " " + unit.symbol() : "–",
                    Integer.toString(spread.number())));
        }
        return rows;
    }
}
