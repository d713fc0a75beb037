package soakline.window.present;

import java.util.List;
import soakline.inference.Verdict;

/**
 * An assessment in words, ready to be shown.
 *
 * @param intervalHead head of the column of intervals, such as {@code 95 % interval}
 * @param contributions what the combined uncertainty is made of; empty when there is none
 */
public record Findings(
        Headline headline,
        List<String> problems,
        String intervalHead,
        List<Row> parameters,
        String contributions,
        List<CheckLine> checks,
        List<String> cautions,
        List<String> notes,
        List<Row> coupon) {

    /**
     * The verdict in large words.
     *
     * @param verdict how much concern it deserves
     */
    public record Headline(Verdict verdict, String large, String small) {}

    /**
     * A line of a table.
     *
     * @param extra empty when there is none
     */
    public record Row(String name, String value, String extra) {}

    /**
     * A check.
     *
     * @param word the verdict as a word
     * @param detail the check's own D; empty when it has none
     */
    public record CheckLine(Verdict verdict, String word, String name, String sentence, String detail) {}

    public Findings {
        problems = List.copyOf(problems);
        parameters = List.copyOf(parameters);
        checks = List.copyOf(checks);
        cautions = List.copyOf(cautions);
        notes = List.copyOf(notes);
        coupon = List.copyOf(coupon);
    }
}
