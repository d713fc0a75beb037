package soakline.report;

import java.util.List;
import soakline.campaign.Replicates;
import soakline.inference.Assessment;

/** Results for people: monospaced, the verdict first. */
public final class TextReport {

    private TextReport() {}

    public static String write(List<Assessment> assessments) {
        TextLines lines = new TextLines();
        for (Assessment assessment : assessments) {
            lines.separate();
            new CouponText(assessment, lines).write();
        }
        if (assessments.size() > 1) {
            ReplicateText.write(Replicates.of(assessments), lines);
        }
        return lines.toString();
    }
}
