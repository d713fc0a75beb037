package soakline.report;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.TreeSet;
import java.util.function.IntToDoubleFunction;
import soakline.estimate.Estimate;
import soakline.figure.CouponFigure;
import soakline.inference.Assessment;
import soakline.quantity.Numbers;
import soakline.quantity.Unit;
import soakline.specimen.ValueKind;
import soakline.specimen.Weighings;

/**
 * The weighings of a coupon as rows of a table: all of them, or of a long log the first, the last and those set aside.
 *
 * @param summary how many there are, and how many of them are left out
 * @param hasMass whether there is a column of masses
 * @param hasResidual whether there is a curve to compare with
 * @param hasAside whether there is a column for those set aside
 */
record WeighingTable(
        String summary, String timeHead, boolean hasMass, boolean hasResidual, boolean hasAside, List<Row> rows) {

    /**
     * A weighing, or a gap where some are left out.
     *
     * @param reason why it is set aside; for a gap, what is left out
     */
    record Row(
            boolean gap,
            boolean aside,
            String number,
            String time,
            String mass,
            String content,
            String residual,
            String reason) {}

    /** Up to this many weighings are all shown. */
    static final int ALL = 120;
    /** Of more than that, so many at either end. */
    static final int ENDS = 15;
    /** And so many of those set aside. */
    static final int MOST_ASIDE = 60;

    private static final int SMALLEST_GAP = 2;
    private static final double PERCENT = 100;
    private static final double GRAMS = 1000;
    private static final int MOST_TIME_DECIMALS = 4;
    private static final int MOST_DECIMALS = 7;

    /** The number of columns. */
    int columns() {
        return 3 + (hasMass ? 1 : 0) + (hasResidual ? 1 : 0) + (hasAside ? 1 : 0);
    }

    static WeighingTable of(Assessment assessment) {
        return new Writer(assessment).table();
    }

    private static final class Writer {

        private final Assessment assessment;
        private final Weighings weighings;
        private final boolean mass;
        private final boolean residual;
        private final Unit unit;
        private final double[] contents;
        private final double[] residuals;
        private final List<Integer> shown;

        Writer(Assessment assessment) {
            this.assessment = assessment;
            this.weighings = assessment.run().weighings();
            this.shown = shown();
            Estimate estimate = assessment.estimate();
            this.mass = assessment.run().kind() == ValueKind.MASS;
            this.residual = estimate.isOptimum();
            this.unit = CouponFigure.timeUnit(estimate.task().data().lastTime());
            double reference = estimate.task().data().referenceMass();
            double[] times = new double[shown.size()];
            this.contents = new double[times.length];
            for (int k = 0; k < times.length; k++) {
                int i = shown.get(k);
                times[k] = weighings.time(i);
                contents[k] =
                        Double.isNaN(reference) ? weighings.value(i) : (weighings.value(i) - reference) / reference;
            }
            this.residuals = residual ? estimate.contents(times) : new double[times.length];
            for (int k = 0; k < times.length; k++) {
                residuals[k] = contents[k] - residuals[k];
            }
        }

        private List<Integer> shown() {
            int n = weighings.size();
            TreeSet<Integer> indices = new TreeSet<>();
            for (int i = 0; i < n; i++) {
                if (n <= ALL || i < ENDS || i >= n - ENDS) {
                    indices.add(i);
                }
            }
            weighings.setAside().keySet().stream().limit(MOST_ASIDE).forEach(indices::add);
            List<Integer> all = new ArrayList<>();
            int last = -1;
            for (int i : indices) {
                // saying that so few are left out would take as much room
                for (int left = last + 1; left < i && i - last - 1 <= SMALLEST_GAP; left++) {
                    all.add(left);
                }
                all.add(i);
                last = i;
            }
            return all;
        }

        WeighingTable table() {
            int timeDecimals = decimals(k -> unit.fromSi(weighings.time(shown.get(k))), MOST_TIME_DECIMALS);
            int massDecimals = mass ? decimals(k -> GRAMS * weighings.value(shown.get(k)), MOST_DECIMALS) : 0;
            int contentDecimals = contentDecimals();
            List<Row> rows = new ArrayList<>();
            int last = -1;
            for (int k = 0; k < contents.length; k++) {
                int i = shown.get(k);
                if (i > last + 1) {
                    rows.add(gap(i - last - 1));
                }
                rows.add(new Row(
                        false,
                        weighings.isSetAside(i),
                        Integer.toString(i + 1),
                        rounded(unit.fromSi(weighings.time(i)), timeDecimals),
                        mass ? rounded(GRAMS * weighings.value(i), massDecimals) : "",
                        rounded(PERCENT * contents[k], contentDecimals),
                        residual ? rounded(PERCENT * residuals[k], contentDecimals) : "",
                        weighings.reason(i).orElse("")));
                last = i;
            }
            return new WeighingTable(
                    summary(), "t [" + unit.symbol() + "]", mass, residual, weighings.used() < weighings.size(), rows);
        }

        private String summary() {
            int n = weighings.size();
            int aside = n - weighings.used();
            String text = grouped(n) + " weighings, " + grouped(weighings.used()) + " used, "
                    + (aside == 0 ? "none set aside" : grouped(aside) + " set aside");
            int left = n - shown.size();
            if (left == 0) {
                return text + ".";
            }
            int asideShown = (int) shown.stream().filter(weighings::isSetAside).count();
            String kept = asideShown == aside ? "all that are set aside" : "the first of those set aside";
            return text + ". The table holds the first and the last " + ENDS + (aside == 0 ? "" : " and " + kept) + "; "
                    + grouped(left) + " are left out"
                    + (asideShown == aside ? "." : ", " + grouped(aside - asideShown) + " of them set aside.");
        }

        private static Row gap(int count) {
            String words = "… " + grouped(count) + (count == 1 ? " weighing" : " weighings") + " left out …";
            return new Row(true, false, "", "", "", "", "", words);
        }

        /** As many decimals as the scatter has in its two leading digits. */
        private int contentDecimals() {
            double deviation = PERCENT * assessment.estimate().residualStandardDeviation();
            int usual = 4;
            return residual && deviation > 0
                    ? Math.max(2, Math.min(MOST_DECIMALS, 1 - (int) Math.floor(Math.log10(deviation))))
                    : usual;
        }

        /** As many decimals as the values were given with. */
        private int decimals(IntToDoubleFunction value, int most) {
            int decimals = 0;
            for (int k = 0; k < contents.length && decimals < most; k++) {
                String text = Numbers.shortest(value.applyAsDouble(k));
                int point = text.indexOf('.');
                decimals = Math.max(decimals, point < 0 || text.contains("E") ? 0 : text.length() - point - 1);
            }
            return Math.min(decimals, most);
        }

        private static String rounded(double value, int decimals) {
            BigDecimal number = new BigDecimal(value).setScale(decimals, RoundingMode.HALF_EVEN);
            return number.signum() == 0
                    ? number.abs().toPlainString()
                    : number.toPlainString().replace('-', '−');
        }

        private static String grouped(int count) {
            return String.format(Locale.ROOT, "%,d", count);
        }
    }
}
