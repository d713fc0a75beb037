package soakline.report;

import java.time.ZonedDateTime;
import java.util.List;
import soakline.inference.Assessment;

/**
 * What a report is made of.
 *
 * @param assessments one or more coupons, in their order
 * @param files where they came from
 * @param made the date of the report
 */
public record ReportInput(List<Assessment> assessments, List<SourceFile> files, ZonedDateTime made) {

    public ReportInput {
        assessments = List.copyOf(assessments);
        files = List.copyOf(files);
        if (assessments.isEmpty()) {
            throw new IllegalArgumentException("a report needs a coupon");
        }
    }
}
