package soakline.report;

import soakline.campaign.Replicates;
import soakline.quantity.Numbers;
import soakline.quantity.ResultUnit;
import soakline.wording.Wording;

/** Mean, standard deviation and number over several coupons, for people. */
final class ReplicateText {

    private ReplicateText() {}

    static void write(Replicates replicates, TextLines lines) {
        lines.blank();
        lines.line("All " + replicates.coupons() + " coupons");
        if (replicates.spreads().isEmpty()) {
            lines.line("  No mean, as none of them has a usable result.");
            return;
        }
        lines.line("  " + TextLines.cell("", 26) + TextLines.cell("mean", 22) + TextLines.cell("standard deviation", 22)
                + "number");
        for (Replicates.Spread spread : replicates.spreads()) {
            ResultUnit unit = spread.parameter().unit();
            double mean = unit.fromSi(spread.mean());
            double deviation = unit.fromSi(spread.standardDeviation().orElse(Double.NaN));
            lines.line("  "
                    + TextLines.cell(ParameterWords.of(spread.parameter(), replicates.apparent()), 26)
                    + TextLines.cell(Numbers.toUncertainty(mean, deviation) + " " + unit.symbol(), 22)
                    + TextLines.cell(
                            spread.standardDeviation().isPresent()
                                    ? Numbers.significant(deviation, 2) + " " + unit.symbol()
                                    : "–",
                            22)
                    + spread.number());
        }
        if (!replicates.differences().isEmpty()) {
            lines.wrapped("  ", Wording.text(ReplicateWords.unlike(replicates.differences())));
        }
    }
}
